package coilbook.workbench.tests.story;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Shell;

import coilbook.workbench.internal.model.FleetWork;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.window.FileQuestions;
import coilbook.workbench.tests.support.WindowRun;

/** What goes wrong is told once, in plain words, and the window lives on. */
public final class ErrorsStory implements Story {

    @Override
    public String name() {
        return "an uncaught error is shown once with a number, a missing register is named, and the window lives on";
    }

    @Override
    public void play(WindowRun window) throws Exception {
        Shell shell = window.shell();
        for (int i = 0; i < 3; i++) {
            window.display().asyncExec(() -> {
                throw new IllegalStateException("planted by a test; belongs in the log");
            });
        }
        String words = dismiss(window, shell);
        assertTrue(words.contains("log under the number"), words);
        assertFalse(words.contains("Exception") || words.contains("planted"), words);
        assertTrue(window.get(shell::isVisible));

        Session session = window.service(Session.class);
        FleetWork work = window.service(FleetWork.class);
        FileQuestions questions = window.service(FileQuestions.class);
        String open = window.get(() -> session.fleet().name());
        window.display().asyncExec(() -> work.open(Path.of("missing"), false, () -> {
        }, questions::failed));
        String missing = dismiss(window, shell);
        assertTrue(missing.contains("There is no register at missing."), missing);
        assertEquals(open, window.get(() -> session.fleet().name()), "the open register stays open");
    }

    private static String dismiss(WindowRun window, Shell shell) throws InterruptedException {
        window.await("a message is shown", () -> dialogs(window, shell).size() == 1);
        String words = window.get(() -> words(dialogs(window, shell).get(0)));
        window.run(() -> dialogs(window, shell).get(0).close());
        window.await("the message is gone", () -> dialogs(window, shell).isEmpty());
        return words;
    }

    private static List<Shell> dialogs(WindowRun window, Shell main) {
        return Stream.of(window.display().getShells()).filter(shell -> shell != main && shell.isVisible() && !shell.getText().isEmpty())
                .toList();
    }

    private static String words(Shell dialog) {
        StringBuilder words = new StringBuilder();
        WindowRun.each(dialog, Label.class, label -> words.append(label.getText()).append(' '));
        return words.toString();
    }
}
