package coilbook.register.internal.status;

import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.sql.Types;
import java.time.LocalDate;
import java.util.Arrays;
import java.util.Collection;
import java.util.List;

import org.jooq.Field;
import org.jooq.Record;
import org.jooq.Table;
import org.jooq.impl.DSL;

import coilbook.criteria.Finding;
import coilbook.register.internal.store.Database;

/** Writes status rows and findings, a batch in one transaction. */
final class StatusWriter {

    private final Database database;
    private final String engine;
    private final String registerId;

    StatusWriter(Database database, String engine, String registerId) {
        this.database = database;
        this.engine = engine;
        this.registerId = registerId;
    }

    /**
     * One row to be written.
     *
     * @param known whether a row with this id is there to be replaced
     * @param values in the order of the shown columns
     */
    record Line(long id, boolean known, String fingerprint, LocalDate judgedOn, LocalDate recheckOn, int rank, Object[] values,
            List<Finding> findings) {
    }

    void write(Collection<Line> lines) throws SQLException {
        database.<Void, SQLException>inTransaction(connection -> {
            List<Long> old = lines.stream().filter(Line::known).map(Line::id).toList();
            remove(connection, old);
            try (PreparedStatement status = connection.prepareStatement(insertion(ViewTables.STATUS, ViewTables.statusFields()));
                    PreparedStatement finding = connection.prepareStatement(insertion(ViewTables.FINDING, ViewTables.FINDING_FIELDS))) {
                for (Line line : lines) {
                    bind(status, line);
                    status.addBatch();
                    int number = 0;
                    for (Finding each : line.findings()) {
                        FindingCodec.bind(finding, line.id() * ViewTables.FINDINGS + number++, each);
                        finding.addBatch();
                    }
                }
                status.executeBatch();
                finding.executeBatch();
            }
            return null;
        });
    }

    private static void bind(PreparedStatement statement, Line line) throws SQLException {
        statement.setLong(1, line.id());
        statement.setString(2, line.fingerprint());
        statement.setObject(3, line.judgedOn());
        if (line.recheckOn() == null) {
            statement.setNull(4, Types.DATE);
        } else {
            statement.setObject(4, line.recheckOn());
        }
        statement.setInt(5, line.rank());
        for (int i = 0; i < line.values().length; i++) {
            if (line.values()[i] == null) {
                statement.setNull(6 + i, Types.NULL);
            } else {
                statement.setObject(6 + i, line.values()[i]);
            }
        }
    }

    /** Removes rows and their findings. */
    void remove(Collection<Long> ids) throws SQLException {
        if (!ids.isEmpty()) {
            database.<Void, SQLException>inTransaction(connection -> {
                remove(connection, ids);
                return null;
            });
        }
    }

    private static void remove(Connection connection, Collection<Long> ids) throws SQLException {
        if (ids.isEmpty()) {
            return;
        }
        Field<Long> low = DSL.param("low", Long.class);
        Field<Long> high = DSL.param("high", Long.class);
        String findings = Database.renderer().deleteFrom(ViewTables.FINDING)
                .where(ViewTables.FINDING_ID.ge(low).and(ViewTables.FINDING_ID.lt(high)))
                .getSQL();
        String status = Database.renderer().deleteFrom(ViewTables.STATUS).where(ViewTables.ID.eq(low)).getSQL();
        try (PreparedStatement finding = connection.prepareStatement(findings);
                PreparedStatement row = connection.prepareStatement(status)) {
            for (long id : ids) {
                finding.setLong(1, id * ViewTables.FINDINGS);
                finding.setLong(2, (id + 1) * ViewTables.FINDINGS);
                finding.addBatch();
                row.setLong(1, id);
                row.addBatch();
            }
            finding.executeBatch();
            row.executeBatch();
        }
    }

    /** Says which state of the register the rows reflect. */
    void reached(long seq, LocalDate day) throws SQLException {
        database.<Void, SQLException>inTransaction(connection -> {
            Database.dsl(connection).deleteFrom(ViewTables.STATE).execute();
            Database.dsl(connection).insertInto(ViewTables.STATE)
                    .columns(ViewTables.VIEW_VERSION, ViewTables.ENGINE, ViewTables.REGISTER_ID, ViewTables.SEQ, ViewTables.STATE_DAY)
                    .values(ViewTables.VERSION, engine, registerId, seq, day).execute();
            return null;
        });
    }

    private static String insertion(Table<Record> table, List<Field<?>> fields) {
        Object[] parameters = new Object[fields.size()];
        Arrays.setAll(parameters, i -> DSL.param("p" + i, fields.get(i)));
        return Database.renderer().insertInto(table).columns(fields).values(parameters).getSQL();
    }
}
