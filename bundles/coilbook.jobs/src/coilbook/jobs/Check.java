package coilbook.jobs;

import java.time.Clock;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.TreeSet;

import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Customer;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.NearestWord;
import coilbook.jobs.internal.PastRegister;
import coilbook.register.AsOf;
import coilbook.register.FleetScope;
import coilbook.register.Register;

/** Computes and judges a fleet as of a date; never gives a row that is behind the register. */
@Component(service = Check.class)
public final class Check {

    private final Clock clock;

    @Activate
    public Check() {
        this(Clock.systemDefaultZone());
    }

    /** With a clock of one's own, for tests. */
    public Check(Clock clock) {
        this.clock = clock;
    }

    public LocalDate today() {
        return LocalDate.now(clock);
    }

    /**
     * Brings the status rows of the date up to date.
     *
     * @param asOf the day, at the site; {@code null} for today
     * @throws CoilbookException with reason BAD_INPUT if the scope names what the register does not have
     */
    public CheckedFleet open(Register register, FleetScope scope, LocalDate asOf, Progress progress) throws CoilbookException {
        refuseUnknown(register, scope);
        LocalDate today = today();
        if (asOf == null || asOf.equals(today)) {
            register.status().bringUpToDate(today, progress);
            return new CheckedFleet(register, false, scope, today);
        }
        return new CheckedFleet(new PastRegister(register, AsOf.on(asOf), scope, progress), true, scope, asOf);
    }

    /** A misspelt site must not pass for one without findings. */
    private static void refuseUnknown(Register register, FleetScope scope) throws CoilbookException {
        refuseUnknown(register, Kind.of(Customer.class), "customer", scope.customers());
        refuseUnknown(register, Kind.of(Site.class), "site", scope.sites());
        refuseUnknown(register, Kind.of(Line.class), "line", scope.lines());
        refuseUnknown(register, Kind.of(Station.class), "station", scope.stations());
    }

    private static <R extends Row> void refuseUnknown(Register register, Kind<R> kind, String noun, List<String> codes)
            throws CoilbookException {
        for (String code : codes) {
            if (register.find(kind, code) == null) {
                TreeSet<String> known = new TreeSet<>();
                register.read(kind, row -> known.add(Objects.toString(row.key())));
                String nearest = NearestWord.of(code, new ArrayList<>(known));
                throw new CoilbookException(CoilbookException.Reason.BAD_INPUT, "The register has no " + noun + " called " + code
                        + (nearest == null ? "." : "; the nearest is " + nearest + "."));
            }
        }
    }
}
