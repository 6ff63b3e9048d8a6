package coilbook.workbench.internal.model;

import java.nio.file.Path;
import java.util.List;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;
import coilbook.register.FleetScope;
import coilbook.register.Status;
import coilbook.register.StatusColumn;
import coilbook.register.StatusQuery;
import coilbook.register.StatusRow;

/**
 * The open fleet as the window sees it. Everything but {@link #name}, {@link #isEditable} and {@link #hasChoices} may take long and is called away
 * from the window's thread only; reading from several threads at once.
 */
public interface FleetModel {

    /** Where it lives, for the window's title. */
    String name();

    /** Whether a column's cells can be changed in place. */
    boolean isEditable(StatusColumn column);

    /** Whether a column's values are chosen from a list. */
    boolean hasChoices(StatusColumn column);

    /** Brings every status row up to date, and returns how many were computed. */
    long bringUpToDate(Progress progress) throws CoilbookException;

    /** Row ids in the order of the query. */
    long[] ids(StatusQuery query) throws CoilbookException;

    /** Rows by id in that order; {@code null} for those that are gone. */
    List<StatusRow> rows(long[] ids) throws CoilbookException;

    /** The tree customer › site › line with counts. */
    List<Status.Place> places() throws CoilbookException;

    /** Counts of a scope. */
    Status.Counts counts(FleetScope scope) throws CoilbookException;

    /** What a cell of a column with choices may hold at a station. */
    List<String> choices(String station, StatusColumn column) throws CoilbookException;

    /**
     * Changes one cell and checks again whatever that touches.
     *
     * @throws CoilbookException in words, if the cell cannot hold the text
     */
    void edit(String station, StatusColumn column, String text, Progress progress) throws CoilbookException;

    /** The steps that can be taken back and done again. */
    Steps steps() throws CoilbookException;

    /** Takes the latest step back. */
    void undo(Progress progress) throws CoilbookException;

    /** Does the step again that was last taken back. */
    void redo(Progress progress) throws CoilbookException;

    /** Why a station's verdict is what it is; {@code null} if there is no such station. */
    WhyReport why(String station) throws CoilbookException;

    /** The waveform of a station at a corner; {@code null} if there is no such station. */
    WaveformReport waveform(String station, Corner corner) throws CoilbookException;

    /**
     * Brings files in, wholly or, if so wished, as far as they are sound.
     *
     * @param acceptPartial whether sound rows are taken where others are not
     */
    BroughtIn bringIn(List<Path> files, boolean acceptPartial, Progress progress) throws CoilbookException;

    /** Writes the audit workbook of a scope. */
    void audit(FleetScope scope, Path out, Progress progress) throws CoilbookException;

    /** Lets go of the register. */
    void close() throws CoilbookException;
}
