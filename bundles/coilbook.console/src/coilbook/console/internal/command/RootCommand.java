package coilbook.console.internal.command;

import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The program itself: names the commands. */
@Command(name = "coilbook", mixinStandardHelpOptions = true, synopsisSubcommandLabel = "COMMAND", description = "The working register of a fleet of solenoid-operated adhesive applicators: computes whether what stands together at each "
        + "station belongs together, and writes audit workbooks.%nWithout a command, coilbook opens the workbench.", footer = { "",
                "Exit codes: 0 done, 1 --fail-on met, 2 usage, 3 bad input, 4 register cannot be opened, 5 anything unexpected.",
                "Reports say which criteria are met; they never say that a circuit is safe. Local codes and a licensed electrician decide." })
public final class RootCommand implements Runnable {

    @Spec
    private CommandSpec spec;

    @Override
    public void run() {
        throw new ParameterException(spec.commandLine(), "expected a command");
    }
}
