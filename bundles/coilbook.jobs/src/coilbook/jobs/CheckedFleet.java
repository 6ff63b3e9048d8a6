package coilbook.jobs;

import java.time.LocalDate;
import java.util.function.Consumer;

import coilbook.fleet.CoilbookException;
import coilbook.register.FleetScope;
import coilbook.register.Register;
import coilbook.register.Status;

/**
 * A fleet computed and judged as of a date, ready to be read. Where the date is not today's it holds status rows of its own, which go when it is closed;
 * it never closes the register that was asked for.
 */
public final class CheckedFleet implements AutoCloseable {

    private final Register register;
    private final boolean own;
    private final FleetScope scope;
    private final LocalDate asOf;

    CheckedFleet(Register register, boolean own, FleetScope scope, LocalDate asOf) {
        this.register = register;
        this.own = own;
        this.scope = scope;
        this.asOf = asOf;
    }

    public LocalDate asOf() {
        return asOf;
    }

    /** The register that holds the status rows: the one asked for, or a view of it on another date. */
    public Register register() {
        return register;
    }

    public FleetScope scope() {
        return scope;
    }

    public Status.Counts counts() throws CoilbookException {
        return register.status().counts(scope);
    }

    /** The reported findings in the order site, line, station, criterion. */
    public void findings(Consumer<Status.StationFinding> consumer) throws CoilbookException {
        register.status().findings(scope, consumer);
    }

    @Override
    public void close() throws CoilbookException {
        if (own) {
            register.close();
        }
    }
}
