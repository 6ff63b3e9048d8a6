package coilbook.console.internal;

import java.util.function.Supplier;

import coilbook.jobs.Audit;
import coilbook.jobs.BringIn;
import coilbook.jobs.CaseFiles;
import coilbook.jobs.Check;
import coilbook.jobs.Demo;
import coilbook.register.Registers;

/** What the commands work with; each is fetched when a command first needs it, so that a waveform starts without a register's machinery. */
public record Services(Supplier<Registers> registers, Supplier<BringIn> bringIn, Supplier<Check> check, Supplier<Audit> audit,
        Supplier<Demo> demo, Supplier<CaseFiles> caseFiles) {
}
