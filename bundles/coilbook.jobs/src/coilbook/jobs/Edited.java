package coilbook.jobs;

import java.util.List;

import coilbook.register.StatusRow;

/**
 * What an edit came to.
 *
 * @param seq its journal sequence, which undo takes back; 0 if nothing differed
 * @param rows the edited stations as they are now, computed and judged, in the order of the edits
 */
public record Edited(long seq, List<StatusRow> rows) {

    public Edited {
        rows = List.copyOf(rows);
    }
}
