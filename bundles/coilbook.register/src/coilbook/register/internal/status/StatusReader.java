package coilbook.register.internal.status;

import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import java.util.stream.LongStream;

import org.jooq.Cursor;
import org.jooq.Field;
import org.jooq.OrderField;
import org.jooq.Record;
import org.jooq.impl.DSL;

import coilbook.criteria.Finding;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.FieldType;
import coilbook.register.FleetScope;
import coilbook.register.Status;
import coilbook.register.StatusColumn;
import coilbook.register.StatusQuery;
import coilbook.register.StatusRow;
import coilbook.register.internal.store.Database;
import coilbook.register.internal.store.Sought;

/** Reads status rows and findings. */
final class StatusReader {

    /** How many rows are fetched together. */
    private static final int WINDOW = 500;
    private static final int MOST_COUNTED = 6;

    private final Database database;

    StatusReader(Database database) {
        this.database = database;
    }

    long[] ids(StatusQuery query) throws SQLException, CoilbookException {
        LongStream.Builder ids = LongStream.builder();
        try (Connection connection = database.connection();
                Cursor<?> cursor = Database.dsl(connection).select(ViewTables.ID).from(ViewTables.STATUS).where(Filters.of(query))
                        .orderBy(order(query.sorts())).fetchLazy()) {
            ResultSet line = cursor.resultSet();
            while (line.next()) {
                ids.add(line.getLong(1));
            }
        }
        return ids.build().toArray();
    }

    private static List<OrderField<?>> order(List<StatusQuery.Sort> sorts) {
        List<OrderField<?>> order = new ArrayList<>();
        for (StatusQuery.Sort sort : sorts) {
            Field<?> field = sort.column() == StatusColumn.VERDICT ? ViewTables.RANK : ViewTables.column(sort.column());
            order.add(sort.descending() ? field.desc().nullsLast() : field.asc().nullsLast());
        }
        order.addAll(byPlace());
        return order;
    }

    private static List<Field<String>> byPlace() {
        return List.of(ViewTables.text(StatusColumn.SITE), ViewTables.text(StatusColumn.LINE), ViewTables.text(StatusColumn.STATION));
    }

    List<StatusRow> rows(long[] ids) throws SQLException {
        StatusRow[] rows = new StatusRow[ids.length];
        Map<Long, Integer> places = new HashMap<>(ids.length * 2);
        for (int i = 0; i < ids.length; i++) {
            places.put(ids[i], i);
        }
        List<Field<?>> fields = new ArrayList<>(List.of(ViewTables.ID));
        fields.addAll(ViewTables.shown());
        try (Connection connection = database.connection()) {
            for (int start = 0; start < ids.length; start += WINDOW) {
                long[] window = Arrays.copyOfRange(ids, start, Math.min(ids.length, start + WINDOW));
                try (Cursor<Record> cursor = Database.dsl(connection).select(fields).from(Sought.numbers(window)).join(ViewTables.STATUS)
                        .on(ViewTables.ID.eq(Sought.NUMBER)).fetchLazy()) {
                    ResultSet line = cursor.resultSet();
                    while (line.next()) {
                        rows[places.get(line.getLong(1))] = row(line);
                    }
                }
            }
        }
        return Arrays.asList(rows);
    }

    private static StatusRow row(ResultSet line) throws SQLException {
        StatusColumn[] columns = StatusColumn.values();
        Object[] values = new Object[columns.length];
        for (int i = 0; i < columns.length; i++) {
            values[i] = value(line, i + 2, columns[i].type());
        }
        return new StatusRow(line.getLong(1), values);
    }

    private static Object value(ResultSet line, int at, FieldType type) throws SQLException {
        if (type == FieldType.TEXT) {
            return line.getString(at);
        }
        Object value = type == FieldType.INTEGER ? (Object) line.getInt(at) : (Object) line.getDouble(at);
        return line.wasNull() ? null : value;
    }

    void each(StatusQuery query, Consumer<StatusRow> consumer) throws SQLException, CoilbookException {
        long[] ids = ids(query);
        for (int start = 0; start < ids.length; start += WINDOW) {
            for (StatusRow row : rows(Arrays.copyOfRange(ids, start, Math.min(ids.length, start + WINDOW)))) {
                if (row != null) {
                    consumer.accept(row);
                }
            }
        }
    }

    void findings(FleetScope scope, Consumer<Status.StationFinding> consumer) throws SQLException, CoilbookException {
        long[] ids = ids(new StatusQuery(scope, List.of(), List.of()));
        for (int start = 0; start < ids.length; start += WINDOW) {
            long[] window = Arrays.copyOfRange(ids, start, Math.min(ids.length, start + WINDOW));
            Map<Long, List<Finding>> findings = findings(window);
            for (StatusRow row : rows(window)) {
                if (row != null) {
                    for (Finding finding : findings.getOrDefault(row.id(), List.of())) {
                        consumer.accept(
                                new Status.StationFinding((String) row.get(StatusColumn.CUSTOMER), (String) row.get(StatusColumn.SITE),
                                        (String) row.get(StatusColumn.LINE), row.station(), finding));
                    }
                }
            }
        }
    }

    /** Findings of a few stations lie together where the stations do: one stretch is read, and what is not asked for is passed over. */
    private Map<Long, List<Finding>> findings(long[] ids) throws SQLException {
        long[] sorted = ids.clone();
        Arrays.sort(sorted);
        Map<Long, List<Finding>> found = new HashMap<>();
        try (Connection connection = database.connection()) {
            int start = 0;
            for (int i = 1; i <= sorted.length; i++) {
                if (i == sorted.length || sorted[i] - sorted[i - 1] > 20) {
                    read(connection, sorted[start], sorted[i - 1], found);
                    start = i;
                }
            }
        }
        found.values().forEach(list -> list.sort(Comparator.comparing(Finding::criterion)));
        return found;
    }

    private static void read(Connection connection, long first, long last, Map<Long, List<Finding>> into) throws SQLException {
        try (Cursor<Record> cursor = Database.dsl(connection).select(ViewTables.FINDING_FIELDS).from(ViewTables.FINDING)
                .where(ViewTables.FINDING_ID.ge(first * ViewTables.FINDINGS)
                        .and(ViewTables.FINDING_ID.lt((last + 1) * ViewTables.FINDINGS)))
                .orderBy(ViewTables.FINDING_ID).fetchLazy()) {
            ResultSet line = cursor.resultSet();
            while (line.next()) {
                into.computeIfAbsent(line.getLong(1) / ViewTables.FINDINGS, id -> new ArrayList<>()).add(FindingCodec.read(line));
            }
        }
    }

    Status.Counts counts(FleetScope scope) throws SQLException {
        try (Connection connection = database.connection()) {
            Record line = Database.dsl(connection).select(counted()).from(ViewTables.STATUS).where(Filters.of(scope)).fetchOne();
            return counts(line, 0);
        }
    }

    private static List<Field<?>> counted() {
        List<Field<?>> fields = new ArrayList<>(MOST_COUNTED);
        fields.add(DSL.count());
        for (StatusColumn column : List.of(StatusColumn.HAZARDS, StatusColumn.NONCONFORMITIES, StatusColumn.OBSERVATIONS,
                StatusColumn.UNDETERMINED,
                StatusColumn.CONCEDED)) {
            fields.add(DSL.sum(DSL.field(DSL.name(column.id()), Integer.class)));
        }
        return fields;
    }

    private static Status.Counts counts(Record line, int first) {
        long[] numbers = new long[MOST_COUNTED];
        for (int i = 0; i < numbers.length; i++) {
            Long number = line.get(first + i, Long.class);
            numbers[i] = number == null ? 0 : number;
        }
        return new Status.Counts(numbers[0], numbers[1], numbers[2], numbers[3], numbers[4], numbers[5]);
    }

    /** Counts of each line, by site and line; one scan without an index, which would be slower. */
    Map<List<String>, Status.Counts> byLine() throws SQLException {
        Map<List<String>, Status.Counts> counts = new HashMap<>();
        List<Field<?>> fields = new ArrayList<>(List.of(ViewTables.text(StatusColumn.SITE), ViewTables.text(StatusColumn.LINE)));
        fields.addAll(counted());
        try (Connection connection = database.connection()) {
            Database.dsl(connection).select(fields).from(ViewTables.STATUS).groupBy(fields.subList(0, 2))
                    .forEach(line -> counts.put(List.of(line.get(0, String.class), line.get(1, String.class)), counts(line, 2)));
        }
        return counts;
    }
}
