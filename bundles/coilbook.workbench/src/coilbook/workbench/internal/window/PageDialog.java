package coilbook.workbench.internal.window;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.jface.dialogs.Dialog;
import org.eclipse.jface.dialogs.IDialogConstants;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StyleRange;
import org.eclipse.swt.custom.StyledText;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Shell;

import coilbook.workbench.internal.text.Texts;

/** A page to read. Understands as much Markdown as the help pages use: headings, bold words, bullets, code. */
public final class PageDialog extends Dialog {

    private static final int WIDTH = 760;
    private static final int HEIGHT = 600;

    private final String title;
    private final String page;
    private final Texts texts = Texts.of(PageDialog.class);

    public PageDialog(Shell parent, String title, String page) {
        super(parent);
        this.title = title;
        this.page = page;
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
        StyledText text = new StyledText(area, SWT.MULTI | SWT.READ_ONLY | SWT.WRAP | SWT.V_SCROLL | SWT.BORDER);
        text.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        text.setMargins(12, 8, 12, 8);
        Read read = Read.of(page);
        text.setText(read.text);
        List<StyleRange> ranges = new ArrayList<>();
        for (int[] bold : read.bold) {
            ranges.add(new StyleRange(bold[0], bold[1], null, null, SWT.BOLD));
        }
        text.setStyleRanges(ranges.toArray(StyleRange[]::new));
        return area;
    }

    @Override
    protected void createButtonsForButtonBar(Composite parent) {
        createButton(parent, IDialogConstants.OK_ID, texts.get("close"), true);
    }

    @Override
    protected Point getInitialSize() {
        return new Point(WIDTH, HEIGHT);
    }

    /** A page without its marks. */
    record Read(String text, List<int[]> bold) {

        static Read of(String page) {
            StringBuilder out = new StringBuilder();
            List<int[]> bold = new ArrayList<>();
            boolean joined = false;
            for (String line : page.split("\n", -1)) {
                String stripped = line.strip();
                if (stripped.startsWith("#")) {
                    int start = out.length();
                    out.append(stripped.replaceFirst("#+\\s*", ""));
                    bold.add(new int[] { start, out.length() - start });
                    out.append('\n');
                    joined = false;
                } else if (stripped.isEmpty() || stripped.startsWith("|") || stripped.startsWith("```")) {
                    out.append(joined ? "\n" : "").append(stripped.isEmpty() ? "\n" : line + "\n");
                    joined = false;
                } else {
                    boolean item = stripped.startsWith("- ");
                    out.append(joined ? item ? "\n" : " " : "");
                    words(item ? "•  " + stripped.substring(2) : stripped, out, bold);
                    joined = true;
                }
            }
            return new Read(out.toString().stripTrailing() + "\n", bold);
        }

        private static void words(String line, StringBuilder out, List<int[]> bold) {
            String[] parts = line.replace("`", "").split("\\*\\*", -1);
            for (int i = 0; i < parts.length; i++) {
                int start = out.length();
                out.append(parts[i]);
                if (i % 2 != 0) {
                    bold.add(new int[] { start, parts[i].length() });
                }
            }
        }
    }
}
