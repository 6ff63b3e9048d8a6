package coilbook.workbench.internal.grid.filter;

import java.util.EnumMap;
import java.util.Map;

import org.eclipse.nebula.widgets.nattable.filterrow.IFilterStrategy;

import coilbook.register.StatusColumn;
import coilbook.register.StatusRow;
import coilbook.workbench.internal.grid.data.StationColumns;
import coilbook.workbench.internal.stations.StationsPresenter;

/** Filtering by asking the register again. */
public final class StatusFilterStrategy implements IFilterStrategy<StatusRow> {

    private final StationsPresenter rows;

    public StatusFilterStrategy(StationsPresenter rows) {
        this.rows = rows;
    }

    @Override
    public void applyFilter(Map<Integer, Object> filterIndexToObjectMap) {
        Map<StatusColumn, String> expressions = new EnumMap<>(StatusColumn.class);
        filterIndexToObjectMap.forEach((index, expression) -> {
            String text = expression == null ? "" : expression.toString().strip();
            if (!text.isEmpty()) {
                expressions.put(StationColumns.at(index), text);
            }
        });
        rows.filter(expressions);
    }
}
