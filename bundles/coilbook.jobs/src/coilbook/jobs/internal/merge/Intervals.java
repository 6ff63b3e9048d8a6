package coilbook.jobs.internal.merge;

import java.util.StringJoiner;

import coilbook.fleet.Concession;
import coilbook.fleet.Field;
import coilbook.fleet.FieldType;
import coilbook.fleet.Kind;
import coilbook.fleet.Row;

/** What all kinds have in common whose rows follow one another in time: a subject, a day since which, a day until which. */
public final class Intervals {

    private Intervals() {
    }

    /** Whether rows of the kind follow one another; a concession states its own dates and stands alone. */
    public static boolean isSequence(Kind<?> kind) {
        return kind.isTimed() && kind.type() != Concession.class;
    }

    public static Field since(Kind<?> kind) {
        return kind.field("valid_from");
    }

    public static Field until(Kind<?> kind) {
        return kind.field("valid_to");
    }

    /** The key without its date: whose sequence it is. */
    public static String subject(Kind<?> kind, Row row) {
        StringJoiner subject = new StringJoiner("\u0000");
        for (Field field : kind.keyFields()) {
            if (field.type() != FieldType.DATE) {
                subject.add(String.valueOf(field.get(row)));
            }
        }
        return subject.toString();
    }
}
