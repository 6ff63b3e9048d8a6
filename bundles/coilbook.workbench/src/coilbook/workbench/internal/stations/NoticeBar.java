package coilbook.workbench.internal.stations;

import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;

import coilbook.workbench.internal.grid.style.GridColours;

/** A line over the grid that says what could not be done, and stays until it is read. */
final class NoticeBar {

    private final Composite bar;
    private final Label label;
    private final GridData place = new GridData(SWT.FILL, SWT.TOP, true, false);

    NoticeBar(Composite parent, String dismiss) {
        bar = new Composite(parent, SWT.NONE);
        GridLayout layout = new GridLayout(2, false);
        layout.marginHeight = 2;
        layout.marginWidth = 8;
        bar.setLayout(layout);
        bar.setLayoutData(place);
        label = new Label(bar, SWT.WRAP);
        label.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
        Button close = new Button(bar, SWT.PUSH);
        close.setText(dismiss);
        close.addListener(SWT.Selection, event -> show(null));
        place.exclude = true;
        bar.setVisible(false);
    }

    void show(String words) {
        boolean shown = words != null && !words.isBlank();
        if (shown) {
            label.setText("⚠ " + words);
        }
        if (shown || !place.exclude) {
            place.exclude = !shown;
            bar.setVisible(shown);
            bar.getParent().layout(true, true);
        }
    }

    void look(boolean dark) {
        GridColours colours = GridColours.of(dark);
        bar.setBackground(colours.filter());
        label.setBackground(colours.filter());
        label.setForeground(colours.hazard());
    }
}
