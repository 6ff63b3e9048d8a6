package coilbook.jobs;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.Map;

import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;

import coilbook.exchange.AuditWorkbook;
import coilbook.exchange.Incoming;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;
import coilbook.register.FleetScope;
import coilbook.register.Register;
import coilbook.register.Registers;
import coilbook.register.Status;

/** Writes audit workbooks: of a register, or the whole way from files, for which no register is kept. */
@Component(service = Audit.class)
public final class Audit {

    private final Registers registers;
    private final BringIn bringIn;
    private final Check check;
    private final AuditWorkbook workbook;

    @Activate
    public Audit(@Reference Registers registers, @Reference BringIn bringIn, @Reference Check check,
            @Reference AuditWorkbook workbook) {
        this.registers = registers;
        this.bringIn = bringIn;
        this.check = check;
        this.workbook = workbook;
    }

    /**
     * What was audited.
     *
     * @param imported what bringing the files in came to; {@code null} for a register's audit
     * @param counts {@code null} if rows were rejected, so that no audit was written
     */
    public record Audited(LocalDate asOf, ImportResult imported, Status.Counts counts) {

        public boolean isWritten() {
            return counts != null;
        }
    }

    /** Writes the audit of a scope as of a date ({@code null} for today). */
    public Audited ofRegister(Register register, FleetScope scope, LocalDate asOf, Path out, Progress progress) throws CoilbookException {
        OutputFile.check(out);
        return write(register, scope, asOf, out, null, progress);
    }

    /** Reads files into a register that lives only as long as this takes, and writes its audit. If a row is rejected, nothing is written. */
    public Audited ofFiles(List<Path> files, Map<String, String> columns, LocalDate asOf, Path out, Progress progress)
            throws CoilbookException {
        OutputFile.check(out);
        Incoming incoming = bringIn.read(files, columns, progress);
        try (Register register = registers.temporary()) {
            ImportOptions options = new ImportOptions(columns, false, false, "coilbook");
            ImportResult imported = bringIn.bring(register, incoming, BringIn.names(files), options, progress);
            if (!imported.rejected().isEmpty()) {
                return new Audited(asOf == null ? check.today() : asOf, imported, null);
            }
            return write(register, FleetScope.all(), asOf, out, imported, progress);
        }
    }

    private Audited write(Register register, FleetScope scope, LocalDate asOf, Path out, ImportResult imported, Progress progress)
            throws CoilbookException {
        try (CheckedFleet fleet = check.open(register, scope, asOf, progress)) {
            workbook.write(fleet.register(), scope, fleet.asOf(), out, progress);
            return new Audited(fleet.asOf(), imported, fleet.counts());
        }
    }
}
