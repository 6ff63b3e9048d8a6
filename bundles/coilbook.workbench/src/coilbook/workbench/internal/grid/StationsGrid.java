package coilbook.workbench.internal.grid;

import org.eclipse.nebula.widgets.nattable.NatTable;
import org.eclipse.nebula.widgets.nattable.config.ConfigRegistry;
import org.eclipse.nebula.widgets.nattable.config.DefaultNatTableStyleConfiguration;
import org.eclipse.nebula.widgets.nattable.coordinate.PositionCoordinate;
import org.eclipse.nebula.widgets.nattable.data.IDataProvider;
import org.eclipse.nebula.widgets.nattable.edit.config.DefaultEditConfiguration;
import org.eclipse.nebula.widgets.nattable.filterrow.FilterRowHeaderComposite;
import org.eclipse.nebula.widgets.nattable.freeze.CompositeFreezeLayer;
import org.eclipse.nebula.widgets.nattable.freeze.FreezeLayer;
import org.eclipse.nebula.widgets.nattable.freeze.command.FreezeColumnCommand;
import org.eclipse.nebula.widgets.nattable.grid.GridRegion;
import org.eclipse.nebula.widgets.nattable.grid.cell.AlternatingRowConfigLabelAccumulator;
import org.eclipse.nebula.widgets.nattable.grid.data.DefaultRowHeaderDataProvider;
import org.eclipse.nebula.widgets.nattable.grid.layer.ColumnHeaderLayer;
import org.eclipse.nebula.widgets.nattable.grid.layer.CornerLayer;
import org.eclipse.nebula.widgets.nattable.grid.layer.GridLayer;
import org.eclipse.nebula.widgets.nattable.grid.layer.RowHeaderLayer;
import org.eclipse.nebula.widgets.nattable.layer.DataLayer;
import org.eclipse.nebula.widgets.nattable.layer.cell.AggregateConfigLabelAccumulator;
import org.eclipse.nebula.widgets.nattable.layer.cell.IConfigLabelAccumulator;
import org.eclipse.nebula.widgets.nattable.layer.event.RowStructuralRefreshEvent;
import org.eclipse.nebula.widgets.nattable.layer.event.VisualRefreshEvent;
import org.eclipse.nebula.widgets.nattable.selection.SelectionLayer;
import org.eclipse.nebula.widgets.nattable.selection.command.ClearAllSelectionsCommand;
import org.eclipse.nebula.widgets.nattable.selection.command.SelectCellCommand;
import org.eclipse.nebula.widgets.nattable.sort.SortHeaderLayer;
import org.eclipse.nebula.widgets.nattable.style.theme.ThemeConfiguration;
import org.eclipse.nebula.widgets.nattable.viewport.ViewportLayer;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Font;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Display;

import coilbook.register.StatusRow;
import coilbook.workbench.internal.grid.access.GridAccess;
import coilbook.workbench.internal.grid.access.HeadingTips;
import coilbook.workbench.internal.grid.data.CellLabels;
import coilbook.workbench.internal.grid.data.CornerDataProvider;
import coilbook.workbench.internal.grid.data.HeadingLabels;
import coilbook.workbench.internal.grid.data.HeadingsDataProvider;
import coilbook.workbench.internal.grid.data.RowsDataProvider;
import coilbook.workbench.internal.grid.data.StationColumns;
import coilbook.workbench.internal.grid.edit.ChoiceLists;
import coilbook.workbench.internal.grid.edit.EditConfiguration;
import coilbook.workbench.internal.grid.edit.EditProblems;
import coilbook.workbench.internal.grid.filter.FilterConfiguration;
import coilbook.workbench.internal.grid.filter.StatusFilterStrategy;
import coilbook.workbench.internal.grid.keys.CopyCells;
import coilbook.workbench.internal.grid.keys.GridKeys;
import coilbook.workbench.internal.grid.sort.SortBindings;
import coilbook.workbench.internal.grid.sort.StatusSortModel;
import coilbook.workbench.internal.grid.style.GridColours;
import coilbook.workbench.internal.grid.style.GridTheme;
import coilbook.workbench.internal.grid.style.MarkStyles;
import coilbook.workbench.internal.stations.CellText;
import coilbook.workbench.internal.stations.StationsPresenter;
import coilbook.workbench.internal.text.Texts;

/** The grid of stations, put together from its capabilities. Knows no register: rows come from the presenter. */
public final class StationsGrid {

    private static final int ROW_HEIGHT = 24;
    private static final int ROW_NUMBER_WIDTH = 70;

    private final StationsPresenter rows;
    private final NatTable table;
    private final DataLayer body;
    private final DataLayer numbers;
    private final SelectionLayer selection;
    private final FilterRowHeaderComposite<StatusRow> filter;
    private final Font bold;
    private final Font italic;

    /** @param notice takes what is wrong with a text that is being typed, or {@code null} */
    public StationsGrid(Composite parent, StationsPresenter rows, CellText text, ChoiceLists choices,
            java.util.function.Consumer<String> notice) {
        this.rows = rows;
        Display display = parent.getDisplay();
        bold = org.eclipse.jface.resource.FontDescriptor.createFrom(display.getSystemFont()).setStyle(SWT.BOLD).createFont(display);
        italic = org.eclipse.jface.resource.FontDescriptor.createFrom(display.getSystemFont()).setStyle(SWT.ITALIC).createFont(display);
        Texts texts = Texts.of(StationsPresenter.class);
        ConfigRegistry registry = new ConfigRegistry();

        IDataProvider cells = new RowsDataProvider(rows, text);
        body = new DataLayer(cells, 110, ROW_HEIGHT);
        widths(body);
        body.setConfigLabelAccumulator(labels(new CellLabels(rows)));
        selection = new SelectionLayer(body, false);
        selection.addConfiguration(new SelectionConfiguration());
        ViewportLayer viewport = new ViewportLayer(selection);
        FreezeLayer freeze = new FreezeLayer(selection);
        CompositeFreezeLayer centre = new CompositeFreezeLayer(freeze, viewport, selection);
        centre.setConfigLabelAccumulator(new AlternatingRowConfigLabelAccumulator(centre));

        IDataProvider headings = new HeadingsDataProvider(text);
        DataLayer headingCells = new DataLayer(headings, 110, ROW_HEIGHT + 2);
        headingCells.setConfigLabelAccumulator(new HeadingLabels());
        ColumnHeaderLayer heading = new ColumnHeaderLayer(headingCells, centre, selection);
        SortHeaderLayer<StatusRow> sorted = new SortHeaderLayer<>(heading, new StatusSortModel(rows), false);
        filter = new FilterRowHeaderComposite<>(new StatusFilterStrategy(rows), sorted, headings, registry);

        IDataProvider rowNumbers = new DefaultRowHeaderDataProvider(cells);
        numbers = new DataLayer(rowNumbers, ROW_NUMBER_WIDTH, ROW_HEIGHT);
        RowHeaderLayer rowHeader = new RowHeaderLayer(numbers, centre, selection);
        CornerLayer corner = new CornerLayer(new DataLayer(new CornerDataProvider(texts.get("filter"))), rowHeader, filter);
        GridLayer grid = new GridLayer(centre, filter, rowHeader, corner, false);

        table = new NatTable(parent, NatTable.DEFAULT_STYLE_OPTIONS, grid, false);
        table.setConfigRegistry(registry);
        grid.addConfiguration(new DefaultEditConfiguration());
        table.addConfiguration(new DefaultNatTableStyleConfiguration());
        table.addConfiguration(new EditConfiguration(text, choices, new EditProblems(notice)));
        table.addConfiguration(new FilterConfiguration());
        table.addConfiguration(new SortBindings());
        table.addConfiguration(new GridKeys(selection, filter, registry));
        table.configure();
        selection.registerCommandHandler(new CopyCells(selection, rows, text, notice));
        centre.doCommand(new FreezeColumnCommand(centre, StationColumns.FROZEN - 1));
        new HeadingTips(table, text, rows);
        GridAccess.install(table, selection, rows, text);
        selection.addLayerListener(new SelectionListener(selection, rows, choices));
        table.addDisposeListener(event -> {
            bold.dispose();
            italic.dispose();
        });
    }

    private static IConfigLabelAccumulator labels(CellLabels labels) {
        AggregateConfigLabelAccumulator all = new AggregateConfigLabelAccumulator();
        all.add(labels);
        return all;
    }

    private static void widths(DataLayer layer) {
        for (int i = 0; i < StationColumns.count(); i++) {
            layer.setColumnWidthByPosition(i, StationColumns.width(StationColumns.at(i)));
        }
    }

    public NatTable table() {
        return table;
    }

    /** Light or dark. */
    public void look(boolean dark) {
        GridColours colours = GridColours.of(dark);
        ThemeConfiguration theme = GridTheme.of(dark, table.getDisplay(), colours);
        theme.addThemeExtension(new MarkStyles(colours, bold, italic));
        table.setTheme(theme);
        table.setBackground(colours.background());
    }

    /** There are other rows. */
    public void rowsReplaced(int select) {
        selection.doCommand(new ClearAllSelectionsCommand());
        body.fireLayerEvent(new RowStructuralRefreshEvent(body));
        numbers.setDefaultColumnWidth(Math.max(ROW_NUMBER_WIDTH - 20, 24 + 9 * Integer.toString(rows.rowCount()).length()));
        if (select >= 0) {
            PositionCoordinate at = selection.getSelectionAnchor();
            int column = Math.max(0, at.getColumnPosition());
            selection.doCommand(new SelectCellCommand(selection, column, select, false, false));
        }
        table.refresh(false);
    }

    /** Rows look different. */
    public void rowsArrived() {
        body.fireLayerEvent(new VisualRefreshEvent(body));
    }

    /** Takes all filters away. */
    public void clearFilters() {
        filter.getFilterRowDataLayer().getFilterRowDataProvider().clearAllFilters();
        table.refresh(false);
    }

    /** Region label of the body, for tests and tools that walk the grid. */
    public static String bodyRegion() {
        return GridRegion.BODY;
    }
}
