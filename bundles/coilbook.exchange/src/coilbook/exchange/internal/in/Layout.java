package coilbook.exchange.internal.in;

import java.util.Collection;
import java.util.List;
import java.util.Set;

/** What the columns of one sort of table may be called. */
interface Layout {

    /** What such a table is called in messages. */
    String name();

    /** What a folded heading means, or {@code null}. */
    Named find(String foldedHeading);

    /** The target with that id, or {@code null}: for a person's own column map. */
    Target byId(String id);

    /** Proper headings of columns without which the table cannot be read, given the ids of those that are there. */
    List<String> missing(Set<String> ids);

    /** Every folded heading known, to propose the nearest. */
    Collection<String> names();

    /**
     * A target that goes by some heading.
     *
     * @param unit the unit that the heading implies, or empty
     */
    record Named(Target target, String unit) {
    }
}
