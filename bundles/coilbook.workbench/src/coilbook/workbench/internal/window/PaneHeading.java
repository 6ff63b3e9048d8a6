package coilbook.workbench.internal.window;

import org.eclipse.jface.resource.FontDescriptor;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.resource.LocalResourceManager;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;

/** The heading of a part: its name on the left, room for its few controls on the right. */
public final class PaneHeading {

    private static final String CSS_CLASS = "org.eclipse.e4.ui.css.CssClassName";

    private final Composite row;
    private final Label label;

    /** @param columns how many controls stand to the right of the name */
    public PaneHeading(Composite parent, String name, int columns) {
        row = new Composite(parent, SWT.NONE);
        GridLayout layout = new GridLayout(1 + columns, false);
        layout.marginHeight = 3;
        layout.marginWidth = 8;
        row.setLayout(layout);
        GridData place = new GridData(SWT.FILL, SWT.TOP, true, false);
        place.heightHint = controlHeight(parent) + 2 * layout.marginHeight;
        row.setLayoutData(place);
        row.setData(CSS_CLASS, "coilbook-heading");
        label = new Label(row, SWT.NONE);
        label.setText(name);
        LocalResourceManager fonts = new LocalResourceManager(JFaceResources.getResources(), label);
        label.setFont(fonts.create(FontDescriptor.createFrom(label.getFont()).setStyle(SWT.BOLD)));
        label.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, true));
    }

    /** Headings with and without controls are of one height, so that panes side by side line up. */
    private static int controlHeight(Composite parent) {
        Combo combo = new Combo(parent, SWT.DROP_DOWN | SWT.READ_ONLY);
        Button button = new Button(parent, SWT.PUSH);
        button.setText("X");
        int height = Math.max(combo.computeSize(SWT.DEFAULT, SWT.DEFAULT).y, button.computeSize(SWT.DEFAULT, SWT.DEFAULT).y);
        combo.dispose();
        button.dispose();
        return height;
    }

    /** Where the controls go. */
    public Composite row() {
        return row;
    }

    /** Lays a part out in one column without margins. */
    public static void column(Composite parent) {
        GridLayout layout = new GridLayout(1, false);
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        layout.verticalSpacing = 0;
        parent.setLayout(layout);
    }
}
