package coilbook.register.internal.file;

import java.nio.file.Files;
import java.nio.file.Path;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;

/**
 * Where a register lives: the truth is {@code R.mv.db}, what can be rebuilt from it {@code R.view.mv.db}, who has it open {@code R.lock-info}.
 */
public final class RegisterPath {

    /** The ending of the files, given by the database. */
    static final String ENDING = ".mv.db";

    private final Path base;

    private RegisterPath(Path base) {
        this.base = base;
    }

    /**
     * A base path that the database cannot misread: its settings begin at the first semicolon.
     *
     * @throws CoilbookException if the path cannot be that of a register
     */
    public static RegisterPath of(Path given) throws CoilbookException {
        Path absolute = given.toAbsolutePath().normalize();
        String text = absolute.toString();
        if (absolute.getFileName() == null || Files.isDirectory(absolute)) {
            throw new CoilbookException(Reason.REGISTER,
                    absolute + " is a folder; a register needs a name in it, for example " + absolute.resolve("fleet") + ".");
        } else if (text.indexOf(';') >= 0 || text.chars().anyMatch(c -> c < 0x20 || c == 0x7f)) {
            throw new CoilbookException(Reason.REGISTER, "A register's path may hold no semicolon and no control character: "
                    + text.replaceAll("\\p{Cntrl}", "?") + ".");
        }
        String name = absolute.getFileName().toString();
        return new RegisterPath(name.endsWith(ENDING) && name.length() > ENDING.length()
                ? absolute.resolveSibling(name.substring(0, name.length() - ENDING.length()))
                : absolute);
    }

    public Path base() {
        return base;
    }

    public Path folder() {
        return base.getParent();
    }

    public Path data() {
        return with(ENDING);
    }

    public Path view() {
        return with(".view" + ENDING);
    }

    public Path lockNote() {
        return with(".lock-info");
    }

    /** The path that begins like this one and ends otherwise; no part of it is a pattern. */
    public Path with(String ending) {
        return base.resolveSibling(base.getFileName() + ending);
    }

    @Override
    public String toString() {
        return base.toString();
    }
}
