package coilbook.workbench.internal.grid.sort;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

import org.eclipse.nebula.widgets.nattable.sort.ISortModel;
import org.eclipse.nebula.widgets.nattable.sort.SortDirectionEnum;

import coilbook.register.StatusColumn;
import coilbook.register.StatusQuery;
import coilbook.workbench.internal.grid.data.StationColumns;
import coilbook.workbench.internal.stations.StationsPresenter;

/** Sorting by asking the register again: nothing is compared here. */
public final class StatusSortModel implements ISortModel {

    private final StationsPresenter rows;

    public StatusSortModel(StationsPresenter rows) {
        this.rows = rows;
    }

    @Override
    public List<Integer> getSortedColumnIndexes() {
        return rows.sorts().stream().map(sort -> sort.column().ordinal()).toList();
    }

    @Override
    public boolean isColumnIndexSorted(int columnIndex) {
        return getSortOrder(columnIndex) >= 0;
    }

    @Override
    public SortDirectionEnum getSortDirection(int columnIndex) {
        int order = getSortOrder(columnIndex);
        if (order < 0) {
            return SortDirectionEnum.NONE;
        }
        return rows.sorts().get(order).descending() ? SortDirectionEnum.DESC : SortDirectionEnum.ASC;
    }

    @Override
    public int getSortOrder(int columnIndex) {
        return getSortedColumnIndexes().indexOf(columnIndex);
    }

    @SuppressWarnings("rawtypes")
    @Override
    public List<Comparator> getComparatorsForColumnIndex(int columnIndex) {
        return List.of();
    }

    @Override
    public Comparator<?> getColumnComparator(int columnIndex) {
        return null;
    }

    @Override
    public void sort(int columnIndex, SortDirectionEnum sortDirection, boolean accumulate) {
        StatusColumn column = StationColumns.at(columnIndex);
        List<StatusQuery.Sort> order = new ArrayList<>();
        if (accumulate) {
            rows.sorts().stream().filter(sort -> sort.column() != column).forEach(order::add);
        }
        if (sortDirection != SortDirectionEnum.NONE) {
            order.add(new StatusQuery.Sort(column, sortDirection == SortDirectionEnum.DESC));
        }
        rows.sort(order);
    }

    @Override
    public void clear() {
        rows.sort(List.of());
    }
}
