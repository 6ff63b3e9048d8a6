package coilbook.register.internal.store;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.List;
import java.util.UUID;

import org.jooq.Record2;

import coilbook.register.internal.store.Tables.Mark;

/**
 * Brings a register's schema from one version to the next by scripts that are never altered once published. A script is plain SQL of the subset
 * that PostgreSQL takes too: statements end with a semicolon at the end of a line.
 */
public final class Migrations {

    /** The scripts in order; version n is the state after the n-th. */
    private static final List<String> SCRIPTS = List.of("V1__first_schema.sql");

    /** The version that this program reads and writes. */
    public static final int CURRENT = SCRIPTS.size();

    private Migrations() {
    }

    /** The schema's version and the register's id. */
    public record State(int version, String registerId) {
    }

    /** What the mark says. */
    public static State state(Connection connection) {
        Record2<Integer, String> mark = Database.dsl(connection).select(Mark.SCHEMA_VERSION, Mark.REGISTER_ID).from(Mark.TABLE).fetchOne();
        if (mark == null) {
            throw new IllegalStateException("the register carries no mark");
        }
        return new State(mark.value1(), mark.value2());
    }

    /** Makes the schema in an empty database. */
    public static State create(Connection connection) throws SQLException, IOException {
        run(connection, 0);
        State made = new State(CURRENT, UUID.randomUUID().toString());
        Database.dsl(connection).insertInto(Mark.TABLE, Mark.SCHEMA_VERSION, Mark.REGISTER_ID).values(made.version(), made.registerId())
                .execute();
        return made;
    }

    /** Takes an older schema to the current version. */
    public static void migrate(Connection connection, int version) throws SQLException, IOException {
        run(connection, version);
        Database.dsl(connection).update(Mark.TABLE).set(Mark.SCHEMA_VERSION, CURRENT).execute();
    }

    private static void run(Connection connection, int from) throws SQLException, IOException {
        for (String script : SCRIPTS.subList(from, SCRIPTS.size())) {
            try (Statement statement = connection.createStatement()) {
                for (String sql : text(script).split(";\\R")) {
                    if (!sql.isBlank()) {
                        statement.execute(sql);
                    }
                }
            }
        }
    }

    private static String text(String script) throws IOException {
        try (InputStream in = Migrations.class.getResourceAsStream(script)) {
            if (in == null) {
                throw new IOException("the program lacks its script " + script);
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        }
    }
}
