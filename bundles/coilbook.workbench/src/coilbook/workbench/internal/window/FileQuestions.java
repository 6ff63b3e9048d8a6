package coilbook.workbench.internal.window;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;

import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.FileDialog;
import org.eclipse.swt.widgets.Shell;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.InputProblem;
import coilbook.workbench.internal.model.BroughtIn;
import coilbook.workbench.internal.model.FleetWork;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.model.Steps;
import coilbook.workbench.internal.text.Texts;

/** Asks for files, hands them to the fleet's work, and tells what came of it. */
public final class FileQuestions {

    /** One cell can change a few rows; an import changes hundreds, and one keystroke must not take it away unasked. */
    private static final int ROWS_WITHOUT_ASKING = 20;
    private static final String REGISTER_SUFFIX = ".mv.db";

    private final Session session;
    private final FleetWork work;
    private final Texts texts = Texts.of(FileQuestions.class);

    public FileQuestions(Session session, FleetWork work) {
        this.session = session;
        this.work = work;
    }

    /** Opens the person's own register if there is one; else the window offers what to begin with. */
    public void openAtStart() {
        if (work.hasRegister()) {
            work.openOwn(false, () -> {
            }, this::failed);
        }
    }

    /** Asks for a register and opens it. */
    public void openRegister(Shell shell) {
        FileDialog dialog = new FileDialog(shell, SWT.OPEN);
        dialog.setText(texts.get("open.title"));
        dialog.setFilterExtensions(new String[] { "*" + REGISTER_SUFFIX });
        dialog.setFilterNames(new String[] { texts.get("open.filter") });
        String chosen = dialog.open();
        if (chosen != null) {
            work.open(base(Path.of(chosen)), false, () -> {
            }, this::failed);
        }
    }

    /** The base path of a register from the name of its file. */
    static Path base(Path file) {
        String name = file.toString();
        return name.endsWith(REGISTER_SUFFIX) ? Path.of(name.substring(0, name.length() - REGISTER_SUFFIX.length())) : file;
    }

    /** Opens the demo fleet. */
    public void openDemo(Shell shell) {
        work.openDemo(this::failed);
    }

    /** Asks for spreadsheets and brings them in; into the person's own register where none is open. */
    public void bringIn(Shell shell) {
        FileDialog dialog = new FileDialog(shell, SWT.OPEN | SWT.MULTI);
        dialog.setText(texts.get("bringIn.title"));
        dialog.setFilterExtensions(new String[] { "*.xlsx;*.csv;*.tsv", "*.*" });
        dialog.setFilterNames(new String[] { texts.get("bringIn.filter"), texts.get("anyFile") });
        if (dialog.open() == null) {
            return;
        }
        Path folder = Path.of(dialog.getFilterPath());
        List<Path> files = Arrays.stream(dialog.getFileNames()).map(folder::resolve).toList();
        if (session.fleet() == null) {
            work.openOwn(true, () -> bringIn(shell, files, false), this::failed);
        } else {
            bringIn(shell, files, false);
        }
    }

    private void bringIn(Shell shell, List<Path> files, boolean partial) {
        work.bringIn(files, partial, result -> tell(shell, files, partial, result), this::failed);
    }

    private void tell(Shell shell, List<Path> files, boolean partial, BroughtIn result) {
        if (shell.isDisposed()) {
            return;
        }
        String counts = texts.get("bringIn.counts", result.read(), result.created(), result.changed(), result.unchanged(),
                result.rejected().size());
        List<String> problems = result.rejected().stream().map(InputProblem::sentence).toList();
        if (problems.isEmpty()) {
            MessageDialog.openInformation(shell, texts.get("bringIn.title"), counts);
        } else if (partial || result.written()) {
            new ListDialog(shell, texts.get("bringIn.title"), counts, problems, null).open();
        } else if (new ListDialog(shell, texts.get("bringIn.title"), texts.get("bringIn.nothing", counts), problems,
                texts.get("bringIn.sound")).open() == org.eclipse.jface.window.Window.OK) {
            bringIn(shell, files, true);
        }
    }

    /** Asks where to write the audit workbook of what is looked at, and writes it. */
    public void audit(Shell shell) {
        FileDialog dialog = new FileDialog(shell, SWT.SAVE);
        dialog.setText(texts.get("audit.title"));
        dialog.setFilterExtensions(new String[] { "*.xlsx" });
        dialog.setFileName("audit.xlsx");
        dialog.setOverwrite(true);
        String chosen = dialog.open();
        if (chosen == null) {
            return;
        }
        Path out = Path.of(chosen.endsWith(".xlsx") ? chosen : chosen + ".xlsx");
        if (!chosen.endsWith(".xlsx") && Files.exists(out) && !MessageDialog.openQuestion(shell, texts.get("audit.title"),
                texts.get("audit.replace", out.getFileName()))) {
            return;
        }
        work.audit(out, () -> {
            if (!shell.isDisposed()) {
                MessageDialog.openInformation(shell, texts.get("audit.title"), texts.get("audit.done", out));
            }
        }, this::failed);
    }

    /** Takes the latest step back; a large one, such as an import, only if that is really meant. */
    public void undo(Shell shell) {
        Steps steps = session.steps();
        if (steps.undoRows() > ROWS_WITHOUT_ASKING
                && !MessageDialog.openQuestion(shell, texts.get("undo.none"), texts.get("undo.sure", steps.undo(), steps.undoRows()))) {
            return;
        }
        work.undo(this::failed);
    }

    /** Does the step again that was taken back. */
    public void redo() {
        work.redo(this::failed);
    }

    /** Tells what went wrong; a cancelled piece of work was the person's own wish and needs no words. */
    public void failed(CoilbookException error) {
        if (error.reason() == CoilbookException.Reason.CANCELLED) {
            return;
        }
        Display display = Display.getCurrent();
        Shell shell = display.getActiveShell();
        List<String> problems = error.problems().stream().map(InputProblem::sentence).toList();
        if (problems.isEmpty()) {
            MessageDialog.openError(shell, texts.get("failed.title"), error.getMessage());
        } else {
            new ListDialog(shell, texts.get("failed.title"), error.getMessage(), problems, null).open();
        }
    }
}
