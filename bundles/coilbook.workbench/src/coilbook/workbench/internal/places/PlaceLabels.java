package coilbook.workbench.internal.places;

import org.eclipse.jface.viewers.ITableColorProvider;
import org.eclipse.jface.viewers.ITableLabelProvider;
import org.eclipse.jface.viewers.LabelProvider;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.Image;

import coilbook.register.Status;
import coilbook.workbench.internal.grid.style.GridColours;
import coilbook.workbench.internal.stations.VerdictMark;

/** Name and counts of a place; a count of nothing stays blank, so that what is there stands out. */
final class PlaceLabels extends LabelProvider implements ITableLabelProvider, ITableColorProvider {

    private GridColours colours = GridColours.of(false);

    void look(boolean dark) {
        colours = GridColours.of(dark);
    }

    @Override
    public Image getColumnImage(Object element, int columnIndex) {
        return null;
    }

    @Override
    public String getColumnText(Object element, int columnIndex) {
        PlaceNode node = (PlaceNode) element;
        Status.Counts counts = node.counts();
        return switch (columnIndex) {
            case 0 -> node.name();
            case 1 -> count(VerdictMark.HAZARD, counts.hazards());
            case 2 -> count(VerdictMark.NONCONFORMITY, counts.nonconformities());
            default -> count(VerdictMark.UNDETERMINED, counts.undetermined());
        };
    }

    private static String count(VerdictMark mark, long number) {
        return number == 0 ? "" : mark.symbol() + " " + String.format("%,d", number);
    }

    @Override
    public Color getForeground(Object element, int columnIndex) {
        return switch (columnIndex) {
            case 1 -> colours.hazard();
            case 2 -> colours.caution();
            default -> colours.text();
        };
    }

    @Override
    public Color getBackground(Object element, int columnIndex) {
        return null;
    }
}
