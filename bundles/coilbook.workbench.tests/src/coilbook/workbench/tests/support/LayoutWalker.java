package coilbook.workbench.tests.support;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.nebula.widgets.nattable.NatTable;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StyledText;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Tree;
import org.eclipse.swt.widgets.TreeColumn;

/** Walks the controls of a window and names what is smaller than it wants to be, sticks out of its parent, or overlaps a sibling. */
public final class LayoutWalker {

    /** Shares of a window that are no whole number of points are rounded up by the platform. */
    private static final int ROUNDING = 1;
    private static final int HEADING_ROW = 0;
    private static final int HEADING_PADDING = 8;

    private final List<String> faults = new ArrayList<>();
    private int looked;

    /** Walks everything below a window. */
    public static LayoutWalker walk(Composite window) {
        LayoutWalker walker = new LayoutWalker();
        walker.children(window);
        return walker;
    }

    public List<String> faults() {
        return faults;
    }

    /** How many controls were looked at. */
    public int looked() {
        return looked;
    }

    private void children(Composite parent) {
        Control[] children = parent.getChildren();
        for (int i = 0; i < children.length; i++) {
            if (!children[i].isVisible()) {
                continue;
            }
            look(parent, children[i]);
            for (int k = i + 1; k < children.length; k++) {
                Rectangle common = children[i].getBounds().intersection(children[k].getBounds());
                if (children[k].isVisible() && common.width > ROUNDING && common.height > ROUNDING) {
                    faults.add(name(children[i]) + " overlaps " + name(children[k]));
                }
            }
            if (children[i] instanceof Composite inner && !(inner instanceof NatTable) && !(inner instanceof Combo)
                    && !(inner instanceof StyledText)) {
                children(inner);
            }
        }
    }

    private void look(Composite parent, Control control) {
        looked++;
        Point size = control.getSize();
        Rectangle area = parent.getClientArea();
        Rectangle bounds = control.getBounds();
        if (bounds.x < area.x || bounds.y < area.y || bounds.x + bounds.width > area.x + area.width + ROUNDING
                || bounds.y + bounds.height > area.y + area.height + ROUNDING) {
            faults.add(name(control) + " at " + bounds + " sticks out of " + area);
        }
        if (control instanceof Label || control instanceof Button || control instanceof Combo) {
            boolean wraps = (control.getStyle() & SWT.WRAP) != 0;
            Point wanted = control.computeSize(wraps ? size.x : SWT.DEFAULT, SWT.DEFAULT);
            if (size.x < wanted.x && !wraps || size.y < wanted.y) {
                faults.add(name(control) + " is " + size + " and wants " + wanted);
            }
        }
        if (control instanceof Tree tree) {
            headings(tree);
        }
        if (control instanceof NatTable grid) {
            headings(grid);
        }
    }

    private void headings(Tree tree) {
        GC gc = new GC(tree);
        for (TreeColumn column : tree.getColumns()) {
            if (column.getWidth() < gc.textExtent(column.getText()).x + HEADING_PADDING) {
                faults.add("tree heading \"" + column.getText() + "\" does not fit into " + column.getWidth());
            }
        }
        gc.dispose();
    }

    private void headings(NatTable grid) {
        GC gc = new GC(grid);
        for (int column = 1; column < grid.getColumnCount(); column++) {
            String heading = String.valueOf(grid.getDataValueByPosition(column, HEADING_ROW));
            boolean whole = grid.getStartXOfColumnPosition(column) + grid.getColumnWidthByPosition(column) <= grid.getSize().x;
            if (whole && grid.getColumnWidthByPosition(column) < gc.textExtent(heading).x + HEADING_PADDING) {
                faults.add("grid heading \"" + heading + "\" wants " + gc.textExtent(heading).x + " and has "
                        + grid.getColumnWidthByPosition(column));
            }
        }
        gc.dispose();
    }

    private static String name(Control control) {
        String text = control instanceof Label label ? label.getText() : control instanceof Button button ? button.getText() : "";
        return control.getClass().getSimpleName() + (text.isEmpty() ? "" : " \"" + text + "\"");
    }
}
