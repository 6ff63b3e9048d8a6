package coilbook.jobs;

import java.time.Clock;
import java.time.LocalDate;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;

import coilbook.criteria.Assessment;
import coilbook.criteria.Assessor;
import coilbook.electrics.CircuitCase;
import coilbook.electrics.Corner;
import coilbook.electrics.IllegalCaseException;
import coilbook.electrics.Trace;
import coilbook.electrics.Waveforms;
import coilbook.fleet.Change;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;
import coilbook.fleet.RowChange;
import coilbook.fleet.StationView;
import coilbook.jobs.internal.edit.Choices;
import coilbook.jobs.internal.edit.EditColumns;
import coilbook.jobs.internal.edit.StationEdits;
import coilbook.register.AsOf;
import coilbook.register.FleetScope;
import coilbook.register.JournalEntry;
import coilbook.register.Register;
import coilbook.register.StatusColumn;
import coilbook.register.StatusQuery;
import coilbook.register.StatusRow;

/**
 * One person's editing of an open register: cells become Changes, the stations they touch are computed and judged again at once, and steps can be taken
 * back and done again. Safe to call from several threads; never from a screen's own.
 */
public final class EditSession {

    private static final int TRACE_POINTS = 1500;
    private static final int TRACE_CYCLES = 2;

    private final Register register;
    private final Assessor assessor;
    private final String who;
    private final Clock clock;
    private final Deque<Long> undone = new ArrayDeque<>();

    EditSession(Register register, Assessor assessor, String who, Clock clock) {
        this.register = register;
        this.assessor = assessor;
        this.who = who;
        this.clock = clock;
    }

    /** Whether a column's cells can be typed into. */
    public static boolean isEditable(StatusColumn column) {
        return EditColumns.isEditable(column);
    }

    /** Whether a column's values are chosen from a list. */
    public static boolean hasChoices(StatusColumn column) {
        return EditColumns.hasChoices(column);
    }

    /** What a cell may hold, in order; empty for columns that take any value. */
    public List<String> choices(String station, StatusColumn column) throws CoilbookException {
        return Choices.of(register, station, column, today());
    }

    /** Corrects one cell. */
    public Edited edit(String station, StatusColumn column, String text, Progress progress) throws CoilbookException {
        return edit(List.of(CellEdit.correct(station, column, text)), progress);
    }

    /**
     * Takes cells, as typed, pasted or filled down, as one Change, and computes and judges again what they touch.
     *
     * @throws CoilbookException with reason BAD_INPUT for the first cell that cannot hold its text; then nothing is changed
     */
    public synchronized Edited edit(List<CellEdit> cells, Progress progress) throws CoilbookException {
        StationEdits edits = new StationEdits(register, today());
        for (CellEdit cell : cells) {
            edits.take(cell);
            progress.check();
        }
        List<RowChange> changes = edits.changes();
        long seq = 0;
        if (!changes.isEmpty()) {
            seq = register.apply(new Change(who, clock.instant(), why(cells), changes), progress);
            undone.clear();
        }
        register.status().bringUpToDate(today(), progress);
        return new Edited(seq, rows(cells.stream().map(CellEdit::station).distinct().toList()));
    }

    private static String why(List<CellEdit> cells) {
        CellEdit first = cells.get(0);
        if (cells.size() > 1) {
            return cells.size() + " cells typed, from " + first.column().heading() + " at " + first.station();
        }
        String text = first.text() == null || first.text().isBlank() ? "blank" : first.text().strip();
        return first.column().heading() + " at " + first.station() + ": " + text;
    }

    private List<StatusRow> rows(List<String> stations) throws CoilbookException {
        List<StatusRow> rows = new ArrayList<>();
        for (String station : stations) {
            StatusQuery query = new StatusQuery(new FleetScope(List.of(), List.of(), List.of(), List.of(station)), List.of(), List.of());
            rows.addAll(register.status().rows(register.status().ids(query)));
        }
        return rows;
    }

    /** The step that {@link #undo} would take back, or {@code null}. */
    public JournalEntry undoable() throws CoilbookException {
        return register.undoable();
    }

    /** What {@link #redo} would do again, in words, or {@code null}. */
    public synchronized String redoable() throws CoilbookException {
        return undone.isEmpty() ? null : register.change(undone.peek()).why();
    }

    /** Takes the latest step back and judges again what it touched; returns the new sequence, or 0 if there is nothing to take back. */
    public synchronized long undo(Progress progress) throws CoilbookException {
        JournalEntry entry = register.undoable();
        if (entry == null) {
            return 0;
        }
        long seq = register.undo(entry.seq(), who, progress);
        undone.push(entry.seq());
        register.status().bringUpToDate(today(), progress);
        return seq;
    }

    /** Does again the step that was last taken back; returns the new sequence, or 0 if there is none. */
    public synchronized long redo(Progress progress) throws CoilbookException {
        if (undone.isEmpty()) {
            return 0;
        }
        Change change = register.change(undone.peek());
        long seq = register.apply(new Change(who, clock.instant(), change.why(), change.rows()), progress);
        undone.pop();
        register.status().bringUpToDate(today(), progress);
        return seq;
    }

    /** Every finding of a station, conformity included, with its electrics; {@code null} if there is no such station. */
    public Assessment assess(String station) throws CoilbookException {
        StationView view = register.station(station, AsOf.on(today()));
        return view == null ? null : assessor.assess(view);
    }

    /** The waveform of a station at a corner, two cycles long; {@code null} where inputs are missing. */
    public Trace trace(Assessment assessment, Corner corner) {
        CircuitCase circuit = assessment.electrics().cases().get(corner);
        if (circuit == null) {
            return null;
        }
        CircuitCase shown = new CircuitCase(circuit.mains(), circuit.driver(), circuit.coil(), circuit.loopResistance(),
                circuit.cyclesPerSecond(), circuit.onTime(), TRACE_CYCLES, circuit.openingDelay());
        try {
            return Waveforms.traceWith(shown, TRACE_POINTS);
        } catch (IllegalCaseException e) {
            return null;
        }
    }

    private LocalDate today() {
        return LocalDate.now(clock);
    }
}
