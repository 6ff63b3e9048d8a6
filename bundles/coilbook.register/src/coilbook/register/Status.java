package coilbook.register;

import java.time.LocalDate;
import java.util.List;
import java.util.function.Consumer;

import coilbook.criteria.Finding;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;

/**
 * The read model: one row a station with derived electrics and counts, and its reported findings. Disposable; rebuilt whenever it is behind the journal.
 */
public interface Status {

    /** Whether it reflects the latest Change and the given day. */
    boolean isUpToDate(LocalDate today) throws CoilbookException;

    /**
     * Computes and judges again whatever is behind; commits in batches of at most 2,000 rows, on all cores, and can be cancelled and resumed.
     *
     * @return how many stations were computed
     */
    long bringUpToDate(LocalDate today, Progress progress) throws CoilbookException;

    /** Row ids in the order of the query. */
    long[] ids(StatusQuery query) throws CoilbookException;

    /** Rows by id, in the order of the ids; rows that are gone are {@code null}. */
    List<StatusRow> rows(long[] ids) throws CoilbookException;

    /** Every row of a query in order, without loading them all. */
    void each(StatusQuery query, Consumer<StatusRow> consumer) throws CoilbookException;

    /** The reported findings of a scope in the order site, line, station, criterion, without loading them all. */
    void findings(FleetScope scope, Consumer<StationFinding> consumer) throws CoilbookException;

    /** Counts of a scope. */
    Counts counts(FleetScope scope) throws CoilbookException;

    /** The tree customer › site › line with counts, in the order of codes. */
    List<Place> places() throws CoilbookException;

    /** A reported finding with its place. */
    record StationFinding(String customer, String site, String line, String station, Finding finding) {
    }

    /** Counts as CONTRACT's JSON has them: nonconformities leave out hazards, and all but conceded leave out the conceded. */
    record Counts(long stations, long hazards, long nonconformities, long observations, long undetermined, long conceded) {
    }

    /** A customer ({@code site} null), site ({@code line} null) or line; {@code customer} may be empty. */
    record Place(String customer, String site, String line, Counts counts) {
    }
}
