package coilbook.workbench.internal.stations;

import org.eclipse.jface.resource.FontDescriptor;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.resource.LocalResourceManager;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;

import coilbook.workbench.internal.grid.style.GridColours;
import coilbook.workbench.internal.text.Texts;
import coilbook.workbench.internal.window.FileQuestions;

/** What one can begin with while nothing is in the register. */
final class WelcomePane {

    private static final int TEXT_WIDTH = 460;

    private final Composite pane;
    private final Texts texts;

    WelcomePane(Composite parent, Texts texts, FileQuestions questions) {
        this.texts = texts;
        pane = new Composite(parent, SWT.NONE);
        pane.setLayout(new GridLayout(1, false));
        Composite middle = new Composite(pane, SWT.NONE);
        GridLayout layout = new GridLayout(1, false);
        layout.verticalSpacing = 6;
        middle.setLayout(layout);
        middle.setLayoutData(new GridData(SWT.CENTER, SWT.CENTER, true, true));
        Label title = new Label(middle, SWT.NONE);
        title.setText(texts.get("welcome.title"));
        LocalResourceManager fonts = new LocalResourceManager(JFaceResources.getResources(), title);
        title.setFont(fonts.create(FontDescriptor.createFrom(title.getFont()).setStyle(SWT.BOLD).increaseHeight(4)));
        paragraph(middle, "welcome.text", 0);
        choice(middle, "welcome.bringIn", questions::bringIn);
        choice(middle, "welcome.demo", questions::openDemo);
        choice(middle, "welcome.open", questions::openRegister);
    }

    private void choice(Composite parent, String key, java.util.function.Consumer<org.eclipse.swt.widgets.Shell> action) {
        Button button = new Button(parent, SWT.PUSH);
        button.setText(texts.get(key));
        GridData data = new GridData(SWT.FILL, SWT.CENTER, true, false);
        data.verticalIndent = 14;
        button.setLayoutData(data);
        button.addListener(SWT.Selection, event -> action.accept(button.getShell()));
        paragraph(parent, key + ".text", 4);
    }

    private void paragraph(Composite parent, String key, int indent) {
        Label label = new Label(parent, SWT.WRAP);
        label.setText(texts.get(key));
        GridData data = new GridData(SWT.FILL, SWT.CENTER, true, false);
        data.widthHint = TEXT_WIDTH;
        data.horizontalIndent = indent;
        label.setLayoutData(data);
    }

    Control control() {
        return pane;
    }

    void look(boolean dark) {
        GridColours colours = GridColours.of(dark);
        paint(pane, colours);
    }

    private static void paint(Control control, GridColours colours) {
        if (!(control instanceof Button)) {
            control.setBackground(colours.background());
            control.setForeground(colours.text());
        }
        if (control instanceof Composite composite) {
            for (Control child : composite.getChildren()) {
                paint(child, colours);
            }
        }
    }
}
