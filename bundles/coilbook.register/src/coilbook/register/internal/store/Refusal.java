package coilbook.register.internal.store;

import java.util.List;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;
import coilbook.fleet.InputProblem;
import coilbook.fleet.Kind;

/** Why a Change is not recorded, in words that name the row. */
final class Refusal {

    private Refusal() {
    }

    static CoilbookException of(Kind<?> kind, String key, String column, String value, String problem) {
        String what = column.isEmpty() ? "" : ", column " + column + (value.isEmpty() ? "" : ", value \"" + value + "\"");
        return new CoilbookException(Reason.BAD_INPUT, kind.sheet() + ", row " + key + what + ": " + problem + ". Nothing was changed.",
                List.of(new InputProblem("", kind.sheet(), 0, column, value.isEmpty() ? key : value, problem)), null);
    }

    static CoilbookException stale(Kind<?> kind, String key, String problem) {
        return of(kind, key, "", "", problem);
    }
}
