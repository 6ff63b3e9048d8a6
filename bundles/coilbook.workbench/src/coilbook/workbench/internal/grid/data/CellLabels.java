package coilbook.workbench.internal.grid.data;

import org.eclipse.nebula.widgets.nattable.layer.LabelStack;
import org.eclipse.nebula.widgets.nattable.layer.cell.IConfigLabelProvider;

import coilbook.register.StatusColumn;
import coilbook.register.StatusRow;
import coilbook.workbench.internal.stations.CellText;
import coilbook.workbench.internal.stations.StationsPresenter;
import coilbook.workbench.internal.stations.VerdictMark;

/** Says of a cell what it is, so that styles and editors can be registered for it. */
public final class CellLabels implements IConfigLabelProvider {

    /** A number, set to the right. */
    public static final String NUMBER = "coilbook.grid.number";
    /** A computed value. */
    public static final String COMPUTED = "coilbook.grid.computed";
    /** A value that can be typed. */
    public static final String EDITABLE = "coilbook.grid.editable";
    /** A value that is chosen from a list. */
    public static final String CHOICE = "coilbook.grid.choice";

    private final StationsPresenter rows;

    public CellLabels(StationsPresenter rows) {
        this.rows = rows;
    }

    /** The label of a verdict's cell. */
    public static String mark(VerdictMark mark) {
        return "coilbook.grid.mark." + mark.name();
    }

    @Override
    public void accumulateConfigLabels(LabelStack labels, int columnPosition, int rowPosition) {
        StatusColumn column = StationColumns.at(columnPosition);
        if (column == StatusColumn.VERDICT || column == StatusColumn.HAZARDS) {
            StatusRow row = rows.row(rowPosition);
            VerdictMark mark = row == null ? null : VerdictMark.of(row);
            if (mark != null && (column == StatusColumn.VERDICT || mark == VerdictMark.HAZARD)) {
                labels.addLabel(mark(mark));
            }
        }
        if (rows.hasChoices(column)) {
            labels.addLabel(CHOICE);
        }
        if (rows.isEditable(column)) {
            labels.addLabel(EDITABLE);
        }
        addTypeLabels(labels, column);
    }

    @Override
    public java.util.Collection<String> getProvidedLabels() {
        java.util.List<String> all = new java.util.ArrayList<>(java.util.List.of(NUMBER, COMPUTED, EDITABLE, CHOICE));
        for (VerdictMark mark : VerdictMark.values()) {
            all.add(mark(mark));
        }
        return all;
    }

    static void addTypeLabels(LabelStack labels, StatusColumn column) {
        if (CellText.isNumeric(column)) {
            labels.addLabel(NUMBER);
        }
        if (column.isComputed()) {
            labels.addLabel(COMPUTED);
        }
    }
}
