package coilbook.register;

/** One station as grids show it: values by {@link StatusColumn}: String, Integer, Double (SI) or {@code null}. */
public final class StatusRow {

    private final long id;
    private final Object[] values;

    /**
     * @param id stable while the station exists
     * @param values in the order of {@link StatusColumn}; taken over, not copied
     */
    public StatusRow(long id, Object[] values) {
        this.id = id;
        this.values = values;
    }

    public long id() {
        return id;
    }

    public Object get(StatusColumn column) {
        return values[column.ordinal()];
    }

    public String station() {
        return (String) get(StatusColumn.STATION);
    }
}
