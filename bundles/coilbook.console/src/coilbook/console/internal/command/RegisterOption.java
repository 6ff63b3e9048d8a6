package coilbook.console.internal.command;

import java.nio.file.Path;

import picocli.CommandLine.Option;

import coilbook.console.internal.Terminal;

/** Which register a command works on. */
public final class RegisterOption {

    @Option(names = "--register", paramLabel = "PATH", description = "base path of the register; default: $COILBOOK_REGISTER, else coilbook/fleet in your data folder")
    private Path path;

    boolean isGiven() {
        return path != null;
    }

    Path base(Terminal terminal) {
        return terminal.resolve(path == null ? terminal.place().ownRegister() : path);
    }
}
