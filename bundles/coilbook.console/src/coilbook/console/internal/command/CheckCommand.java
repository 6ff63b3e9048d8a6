package coilbook.console.internal.command;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;

import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

import coilbook.console.internal.ExitCode;
import coilbook.console.internal.Services;
import coilbook.console.internal.Terminal;
import coilbook.console.internal.Work;
import coilbook.console.internal.text.CheckReport;
import coilbook.criteria.Criteria;
import coilbook.criteria.Criterion;
import coilbook.jobs.CheckedFleet;
import coilbook.register.FleetScope;
import coilbook.register.OpenMode;
import coilbook.register.Register;
import coilbook.register.Status;

/** {@code check}: computes and judges every station of a scope. */
@Command(name = "check", mixinStandardHelpOptions = true, description = "Compute and judge every station, and list the findings.")
public final class CheckCommand implements Callable<Integer> {

    /** What makes the command fail. */
    enum FailOn {
        hazard, nonconformity, observation
    }

    private final Services services;
    private final Terminal terminal;

    @Mixin
    private RegisterOption register;
    @Option(names = "--site", paramLabel = "CODE", description = "only this site; may be given several times")
    private List<String> sites = new ArrayList<>();
    @Option(names = "--as-of", paramLabel = "DATE", converter = DayConverter.class, description = "as of the end of this day at the site; default: today")
    private LocalDate asOf;
    @Option(names = "--remedies", description = "name the kinds of remedy there are for each nonconformity")
    private boolean remedies;
    @Option(names = "--fail-on", paramLabel = "VERDICT", description = "exit with 1 if there is one of these or worse: ${COMPLETION-CANDIDATES}")
    private FailOn failOn;
    @Option(names = "--json", description = "one JSON object on standard output")
    private boolean json;

    public CheckCommand(Services services, Terminal terminal) {
        this.services = services;
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws Exception {
        try (Work work = new Work(terminal);
                Register open = services.registers().get().open(register.base(terminal), OpenMode.EXISTING);
                CheckedFleet fleet = services.check().get().open(open, FleetScope.sites(sites), asOf, work.progress())) {
            work.close();
            CheckReport report = new CheckReport(fleet, remedies ? remedies() : Map.of());
            if (json) {
                report.json(terminal.out());
            } else {
                report.text(terminal.out());
            }
            return isMet(fleet.counts()) ? ExitCode.FAIL_ON_MET : ExitCode.DONE;
        }
    }

    private static Map<String, List<String>> remedies() {
        Map<String, List<String>> remedies = new HashMap<>();
        for (Criterion criterion : Criteria.all()) {
            remedies.put(criterion.id(), criterion.remedies());
        }
        return remedies;
    }

    private boolean isMet(Status.Counts counts) {
        if (failOn == null) {
            return false;
        }
        return counts.hazards() > 0 || failOn != FailOn.hazard && counts.nonconformities() > 0
                || failOn == FailOn.observation && counts.observations() > 0;
    }
}
