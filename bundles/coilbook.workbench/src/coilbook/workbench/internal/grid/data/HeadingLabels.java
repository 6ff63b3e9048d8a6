package coilbook.workbench.internal.grid.data;

import org.eclipse.nebula.widgets.nattable.layer.LabelStack;
import org.eclipse.nebula.widgets.nattable.layer.cell.IConfigLabelProvider;

/** Marks the headings of computed columns. */
public final class HeadingLabels implements IConfigLabelProvider {

    /** The heading of a computed column. */
    public static final String COMPUTED_HEADING = "coilbook.grid.heading.computed";

    @Override
    public void accumulateConfigLabels(LabelStack labels, int columnPosition, int rowPosition) {
        if (StationColumns.at(columnPosition).isComputed()) {
            labels.addLabelOnTop(COMPUTED_HEADING);
        }
    }

    @Override
    public java.util.Collection<String> getProvidedLabels() {
        return java.util.List.of(COMPUTED_HEADING);
    }
}
