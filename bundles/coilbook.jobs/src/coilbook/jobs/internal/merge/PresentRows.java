package coilbook.jobs.internal.merge;

import java.util.List;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Kind;
import coilbook.fleet.Row;
import coilbook.fleet.Timed;

/** What the register holds now, as far as a merge needs it. */
public interface PresentRows {

    /** The row with that key, or {@code null}. */
    Row find(Kind<?> kind, String key) throws CoilbookException;

    /** All intervals of one subject (see {@link Intervals#subject}) of a timed kind. */
    List<Timed> intervals(Kind<?> kind, String subject) throws CoilbookException;
}
