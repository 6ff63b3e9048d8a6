package coilbook.workbench.internal.grid.data;

import coilbook.register.StatusColumn;
import coilbook.workbench.internal.stations.CellText;

/** The grid's columns by index, and how wide they start. Widths come from what a column holds: measuring the rows would mean loading them. */
public final class StationColumns {

    /** Columns that stay in view while the others scroll. */
    public static final int FROZEN = 2;

    private StationColumns() {
    }

    /** The column at an index. */
    public static StatusColumn at(int index) {
        return StatusColumn.values()[index];
    }

    public static int count() {
        return StatusColumn.values().length;
    }

    /** The width to start with, in points. */
    public static int width(StatusColumn column) {
        return switch (column) {
            case STATION -> 190;
            case VERDICT -> 140;
            case CUSTOMER, SITE, VALVE_TYPE, COIL_TYPE, DRIVER_TYPE, CABLE_TYPE, INPUT_SETTING, CIRCUIT -> 130;
            case DESCRIPTION, RULING_LIMIT -> 200;
            case PROVENANCE -> 140;
            case LINE, TAG, COUNTRY -> 80;
            case COIL_SERIAL, DRIVER_SERIAL -> 110;
            case WINDING_READING -> 230;
            default -> CellText.isNumeric(column) ? Math.max(90, 30 + 8 * new CellText().heading(column).length()) : 120;
        };
    }
}
