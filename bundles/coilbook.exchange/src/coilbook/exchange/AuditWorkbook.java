package coilbook.exchange;

import java.nio.file.Path;
import java.time.LocalDate;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;
import coilbook.register.FleetScope;
import coilbook.register.Register;

/** Writes audit workbooks; a declarative service. */
public interface AuditWorkbook {

    /**
     * Writes the audit of a register's status rows, which must be up to date. The file appears whole or not at all; the same register gives the same bytes.
     *
     * @throws CoilbookException with reason BAD_INPUT if the file cannot be written
     */
    void write(Register register, FleetScope scope, LocalDate asOf, Path out, Progress progress) throws CoilbookException;
}
