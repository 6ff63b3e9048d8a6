package coilbook.register.internal.store;

import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.function.Consumer;

import org.jooq.Condition;
import org.jooq.Cursor;
import org.jooq.OrderField;
import org.jooq.Record;
import org.jooq.Record1;
import org.jooq.ResultQuery;
import org.jooq.Table;
import org.jooq.impl.DSL;

import coilbook.fleet.Row;

/**
 * Reads the versions of one kind.
 *
 * @param <R> the record
 */
public final class Versions<R extends Row> {

    private final RowCodec<R> codec;
    private final KindTable<R> table;

    /**
     * One version of a row.
     *
     * @param rowId the number of the row's first version
     * @param to the sequence at which it was replaced or removed, or 0
     */
    public record Version<R extends Row>(long versionId, long rowId, String key, long from, long to, R row) {
    }

    public Versions(RowCodec<R> codec) {
        this.codec = codec;
        this.table = codec.table();
    }

    /** Hands over each version that meets the condition while the query still runs. */
    public void each(Connection connection, Condition condition, List<? extends OrderField<?>> order, Consumer<Version<R>> consumer)
            throws SQLException {
        each(Database.dsl(connection).select(table.fields()).from(table.table()).where(condition).orderBy(order), consumer);
    }

    /** The same for the first so many versions. */
    public void each(Connection connection, Condition condition, List<? extends OrderField<?>> order, int max,
            Consumer<Version<R>> consumer)
            throws SQLException {
        each(Database.dsl(connection).select(table.fields()).from(table.table()).where(condition).orderBy(order).limit(max), consumer);
    }

    private void each(ResultQuery<? extends Record> query, Consumer<Version<R>> consumer) throws SQLException {
        try (Cursor<? extends Record> cursor = query.fetchLazy()) {
            ResultSet line = cursor.resultSet();
            while (line.next()) {
                long to = line.getLong(5);
                consumer.accept(
                        new Version<>(line.getLong(1), line.getLong(2), line.getString(3), line.getLong(4), to, codec.read(line, 6)));
            }
        }
    }

    /** The versions whose lookup column holds one of the texts. */
    public void lookedUp(Connection connection, Collection<String> lookups, Condition condition, Consumer<Version<R>> consumer)
            throws SQLException {
        anyOf(connection, table.lookup(), lookups, condition, consumer);
    }

    /** The versions whose text column holds one of the texts. */
    public void anyOf(Connection connection, org.jooq.Field<String> column, Collection<String> texts, Condition condition,
            Consumer<Version<R>> consumer)
            throws SQLException {
        if (!texts.isEmpty()) {
            Table<Record1<String>> sought = Sought.texts(texts);
            each(Database.dsl(connection).select(table.fields()).from(sought).join(table.table()).on(column.eq(Sought.TEXT))
                    .where(condition), consumer);
        }
    }

    /** The versions that a Change opened, in the order of their numbers. */
    public List<Version<R>> opened(Connection connection, Journal.Part part) throws SQLException {
        List<Version<R>> found = new ArrayList<>(part.opened());
        if (part.opened() > 0) {
            each(connection, KindTable.VERSION.between(part.firstVersion(), part.firstVersion() + part.opened() - 1),
                    List.of(KindTable.VERSION),
                    found::add);
        }
        return found;
    }

    /** The versions that a Change closed, in the order of their numbers. */
    public List<Version<R>> closed(Connection connection, Journal.Part part) throws SQLException {
        List<Version<R>> found = new ArrayList<>(part.closed());
        if (part.closed() > 0) {
            each(connection, KindTable.TO.eq(part.seq()), List.of(KindTable.VERSION), found::add);
        }
        return found;
    }

    /** The next free number. */
    long nextVersion(Connection connection) {
        Long last = Database.dsl(connection).select(DSL.max(KindTable.VERSION)).from(table.table()).fetchOne(0, Long.class);
        return last == null ? 1 : last + 1;
    }
}
