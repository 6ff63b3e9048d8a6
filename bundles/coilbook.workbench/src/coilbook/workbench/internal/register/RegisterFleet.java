package coilbook.workbench.internal.register;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.logging.Level;
import java.util.logging.Logger;
import java.util.stream.Collectors;

import coilbook.charts.WaveformPlot;
import coilbook.criteria.Assessment;
import coilbook.criteria.Criteria;
import coilbook.criteria.Criterion;
import coilbook.criteria.Finding;
import coilbook.electrics.CircuitCase;
import coilbook.electrics.Trace;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;
import coilbook.jobs.Audit;
import coilbook.jobs.BringIn;
import coilbook.jobs.Check;
import coilbook.jobs.EditSession;
import coilbook.jobs.ImportOptions;
import coilbook.jobs.ImportResult;
import coilbook.register.FleetScope;
import coilbook.register.JournalEntry;
import coilbook.register.Register;
import coilbook.register.Status;
import coilbook.register.StatusColumn;
import coilbook.register.StatusQuery;
import coilbook.register.StatusRow;
import coilbook.workbench.internal.model.BroughtIn;
import coilbook.workbench.internal.model.Corner;
import coilbook.workbench.internal.model.FleetModel;
import coilbook.workbench.internal.model.Steps;
import coilbook.workbench.internal.model.WaveformReport;
import coilbook.workbench.internal.model.WhyReport;
import coilbook.workbench.internal.text.Texts;

/** An open register as the window sees it. */
final class RegisterFleet implements FleetModel {

    private static final Logger LOG = Logger.getLogger(RegisterFleet.class.getName());

    private final String name;
    private final Register register;
    private final EditSession session;
    private final BringIn bringIn;
    private final Check check;
    private final Audit audit;
    private final String who;
    private final Map<String, Criterion> criteria = Criteria.all().stream().collect(Collectors.toMap(Criterion::id, Function.identity()));
    private final Texts texts = Texts.of(RegisterFleet.class);

    RegisterFleet(String name, Register register, EditSession session, BringIn bringIn, Check check, Audit audit, String who) {
        this.name = name;
        this.register = register;
        this.session = session;
        this.bringIn = bringIn;
        this.check = check;
        this.audit = audit;
        this.who = who.isBlank() ? "workbench" : who;
    }

    @Override
    public String name() {
        return name;
    }

    @Override
    public boolean isEditable(StatusColumn column) {
        return EditSession.isEditable(column);
    }

    @Override
    public boolean hasChoices(StatusColumn column) {
        return EditSession.hasChoices(column);
    }

    @Override
    public long bringUpToDate(Progress progress) throws CoilbookException {
        return register.status().bringUpToDate(check.today(), progress);
    }

    @Override
    public long[] ids(StatusQuery query) throws CoilbookException {
        return register.status().ids(query);
    }

    @Override
    public List<StatusRow> rows(long[] ids) throws CoilbookException {
        return register.status().rows(ids);
    }

    @Override
    public List<Status.Place> places() throws CoilbookException {
        try {
            return register.status().places();
        } catch (CoilbookException e) {
            // Right after a large file is opened the database tidies it up, and a scan of all rows can find a part moved away ("chunk not found",
            // seen with 100,000 stations); the same scan begun afterwards is right.
            LOG.log(Level.WARNING, "The places are read once more", e);
            return register.status().places();
        }
    }

    @Override
    public Status.Counts counts(FleetScope scope) throws CoilbookException {
        return register.status().counts(scope);
    }

    @Override
    public List<String> choices(String station, StatusColumn column) throws CoilbookException {
        return session.choices(station, column);
    }

    @Override
    public void edit(String station, StatusColumn column, String text, Progress progress) throws CoilbookException {
        session.edit(station, column, text, progress);
    }

    @Override
    public Steps steps() throws CoilbookException {
        JournalEntry undo = session.undoable();
        return new Steps(undo == null ? null : undo.why(), undo == null ? 0 : undo.rows(), session.redoable());
    }

    @Override
    public void undo(Progress progress) throws CoilbookException {
        session.undo(progress);
    }

    @Override
    public void redo(Progress progress) throws CoilbookException {
        session.redo(progress);
    }

    @Override
    public WhyReport why(String station) throws CoilbookException {
        Assessment assessment = session.assess(station);
        if (assessment == null) {
            return null;
        }
        List<WhyReport.Item> items = new ArrayList<>();
        for (Finding finding : assessment.findings()) {
            Criterion criterion = criteria.get(finding.criterion());
            items.add(criterion == null ? new WhyReport.Item(finding, finding.criterion(), "", "")
                    : new WhyReport.Item(finding, criterion.title(), criterion.limitSource(), criterion.hazardRule()));
        }
        return new WhyReport(station, items);
    }

    @Override
    public WaveformReport waveform(String station, Corner corner) throws CoilbookException {
        Assessment assessment = session.assess(station);
        if (assessment == null) {
            return null;
        }
        coilbook.electrics.Corner at = electric(corner);
        Trace trace = session.trace(assessment, at);
        CircuitCase circuit = assessment.electrics().cases().get(at);
        if (trace == null || circuit == null) {
            return new WaveformReport(station, corner, null, texts.get("noWaveform"));
        }
        String degrees = Long.toString(Math.round(circuit.coil().temperature()));
        String title = circuit.mains() == null ? texts.get("title.regulated", station, degrees)
                : texts.get("title", station, Long.toString(Math.round(circuit.mains().voltageRms())), degrees);
        return new WaveformReport(station, corner,
                new WaveformPlot(title, trace, circuit.coil().pullInCurrent(), circuit.coil().dropOutCurrent()), title);
    }

    private static coilbook.electrics.Corner electric(Corner corner) {
        return switch (corner) {
            case LOW -> coilbook.electrics.Corner.LOW_HOT;
            case NOMINAL -> coilbook.electrics.Corner.NOMINAL;
            case HIGH -> coilbook.electrics.Corner.HIGH_COLD;
            case HOT -> coilbook.electrics.Corner.HOT;
        };
    }

    @Override
    public BroughtIn bringIn(List<Path> files, boolean acceptPartial, Progress progress) throws CoilbookException {
        ImportResult result = bringIn.run(register, files, new ImportOptions(Map.of(), acceptPartial, false, who), progress);
        return new BroughtIn(result.read(), result.created(), result.changed(), result.unchanged(), result.rejected(), result.written());
    }

    @Override
    public void audit(FleetScope scope, Path out, Progress progress) throws CoilbookException {
        audit.ofRegister(register, scope, null, out, progress);
    }

    @Override
    public void close() throws CoilbookException {
        register.close();
    }
}
