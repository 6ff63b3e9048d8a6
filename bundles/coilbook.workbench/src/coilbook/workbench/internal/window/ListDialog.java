package coilbook.workbench.internal.window;

import java.util.List;

import org.eclipse.jface.dialogs.Dialog;
import org.eclipse.jface.dialogs.IDialogConstants;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.swt.widgets.Text;

import coilbook.workbench.internal.text.Texts;

/** A sentence with a list of lines that can be read, selected and copied, and perhaps something to do about them. */
final class ListDialog extends Dialog {

    private static final int WIDTH = 760;
    private static final int HEIGHT = 420;
    private static final int MOST_LINES = 2_000;

    private final String title;
    private final String sentence;
    private final List<String> lines;
    private final String action;
    private final Texts texts = Texts.of(ListDialog.class);

    /** @param action the button that goes on; {@code null} for none */
    ListDialog(Shell parent, String title, String sentence, List<String> lines, String action) {
        super(parent);
        this.title = title;
        this.sentence = sentence;
        this.lines = lines;
        this.action = action;
        setShellStyle(getShellStyle() | SWT.RESIZE);
    }

    @Override
    protected void configureShell(Shell shell) {
        super.configureShell(shell);
        shell.setText(title);
    }

    @Override
    protected Control createDialogArea(Composite parent) {
        Composite area = (Composite) super.createDialogArea(parent);
        Label label = new Label(area, SWT.WRAP);
        label.setText(sentence);
        GridData labelData = new GridData(SWT.FILL, SWT.TOP, true, false);
        labelData.widthHint = WIDTH;
        label.setLayoutData(labelData);
        Text text = new Text(area, SWT.MULTI | SWT.READ_ONLY | SWT.BORDER | SWT.V_SCROLL | SWT.H_SCROLL);
        String shown = String.join("\n", lines.subList(0, Math.min(MOST_LINES, lines.size())));
        text.setText(lines.size() > MOST_LINES ? shown + "\n…" : shown);
        GridData textData = new GridData(SWT.FILL, SWT.FILL, true, true);
        textData.heightHint = HEIGHT / 2;
        textData.widthHint = WIDTH;
        text.setLayoutData(textData);
        return area;
    }

    @Override
    protected void createButtonsForButtonBar(Composite parent) {
        if (action != null) {
            createButton(parent, IDialogConstants.OK_ID, action, false);
        }
        createButton(parent, IDialogConstants.CANCEL_ID, texts.get(action == null ? "close" : "cancel"), true);
    }

    @Override
    protected Point getInitialSize() {
        return new Point(WIDTH, HEIGHT);
    }
}
