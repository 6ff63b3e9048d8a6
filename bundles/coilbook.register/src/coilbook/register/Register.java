package coilbook.register;

import java.util.List;
import java.util.function.Consumer;

import coilbook.fleet.Change;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.fleet.StationView;

/**
 * An open register. Safe to use from several threads; never to be called on a UI thread. Every method that reads sees the state after the last
 * acknowledged Change.
 */
public interface Register extends AutoCloseable {

    /** Where it lives, for messages. */
    String name();

    /**
     * Records a Change wholly or not at all; once this returns the change survives the death of the process.
     *
     * @return its journal sequence
     * @throws CoilbookException with reason BAD_INPUT if a value is invalid, a reference leads nowhere, or a row is no longer what {@code before} says
     */
    long apply(Change change, Progress progress) throws CoilbookException;

    /** Takes back the Change of that sequence by a compensating one, and returns the new sequence.
     *
     * @throws CoilbookException if a later Change touched the same rows, naming it
     */
    long undo(long seq, String who, Progress progress) throws CoilbookException;

    /** The latest Change that {@link #undo} would take back (neither undone nor itself an undo), or {@code null}. */
    JournalEntry undoable() throws CoilbookException;

    /** The latest sequence, 0 for an empty register. */
    long head() throws CoilbookException;

    /** Journal entries after a sequence, the oldest first, at most {@code max}. */
    List<JournalEntry> journal(long afterSeq, int max) throws CoilbookException;

    /** What a Change did. */
    Change change(long seq) throws CoilbookException;

    /** The present row of a key, or {@code null}. */
    <R extends Row> R find(Kind<R> kind, String key) throws CoilbookException;

    /** Every present row of a kind (all intervals of timed kinds) in the order of their keys, without loading them all. */
    <R extends Row> void read(Kind<R> kind, Consumer<R> consumer) throws CoilbookException;

    /** Every row of a kind as of a past: known then and, for timed kinds, true then. */
    <R extends Row> void read(Kind<R> kind, AsOf asOf, Consumer<R> consumer) throws CoilbookException;

    /** The view of one station by its code, or {@code null}. */
    StationView station(String code, AsOf asOf) throws CoilbookException;

    /** Views of all stations of a scope in the order of their codes, without loading them all. */
    void stations(FleetScope scope, AsOf asOf, Consumer<StationView> consumer) throws CoilbookException;

    /** The status rows of today. They may be behind: {@link Status#bringUpToDate} first. */
    Status status() throws CoilbookException;

    /**
     * The status rows of a past, of part of the fleet, computed and judged now; for reading like those of today. To be closed after use.
     */
    PastStatus statusAsOf(AsOf asOf, FleetScope scope, Progress progress) throws CoilbookException;

    @Override
    void close() throws CoilbookException;
}
