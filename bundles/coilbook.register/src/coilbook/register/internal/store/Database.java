package coilbook.register.internal.store;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.logging.Level;
import java.util.logging.Logger;

import org.h2.jdbcx.JdbcConnectionPool;
import org.jooq.DSLContext;
import org.jooq.SQLDialect;
import org.jooq.conf.RenderQuotedNames;
import org.jooq.conf.Settings;
import org.jooq.impl.DSL;

/**
 * One open H2 database: the only class that knows which engine it is. The URL is made here from a path that was checked before and fixed settings;
 * nothing a person types gets into it otherwise.
 */
public final class Database implements AutoCloseable {

    private static final int MOST_CONNECTIONS = 64;
    /** Rows come while a query still runs: the first after milliseconds instead of seconds. Names are those of the script; no trace file. */
    private static final String SETTINGS = ";LAZY_QUERY_EXECUTION=1;TRACE_LEVEL_FILE=0;TRACE_LEVEL_SYSTEM_OUT=0;DB_CLOSE_ON_EXIT=FALSE";
    private static final Settings RENDERING = new Settings().withRenderQuotedNames(RenderQuotedNames.NEVER).withExecuteLogging(false)
            .withFetchServerOutputSize(0);

    /** Held so that its level stays: the library greets and advises at level INFO, which would reach a person's console. */
    private static final Logger LIBRARY = Logger.getLogger("org.jooq");

    static {
        LIBRARY.setLevel(Level.WARNING);
        System.setProperty("org.jooq.no-logo", "true");
        System.setProperty("org.jooq.no-tips", "true");
    }

    private final JdbcConnectionPool pool;
    private final Connection keeper;

    private Database(String url) throws SQLException {
        pool = JdbcConnectionPool.create(url, "coilbook", "");
        pool.setMaxConnections(MOST_CONNECTIONS);
        try {
            keeper = pool.getConnection();
        } catch (SQLException | RuntimeException e) {
            pool.dispose();
            throw e;
        }
    }

    /**
     * Opens the database of a file.
     *
     * @param path the absolute path without its ending, free of semicolons
     * @param create whether a missing file is made
     */
    public static Database open(String path, boolean create) throws SQLException {
        return new Database("jdbc:h2:file:" + path + ";FILE_LOCK=FS;IFEXISTS=" + (create ? "FALSE" : "TRUE") + SETTINGS);
    }

    /** Opens a database that lives in memory while it is open. */
    public static Database inMemory() throws SQLException {
        return new Database("jdbc:h2:mem:" + java.util.UUID.randomUUID() + SETTINGS);
    }

    /** A connection of its own, which commits each statement; to be closed soon. */
    public Connection connection() throws SQLException {
        return pool.getConnection();
    }

    public static DSLContext dsl(Connection connection) {
        return DSL.using(connection, SQLDialect.H2, RENDERING);
    }

    /** The text of statements that are run many times by plain JDBC. */
    public static DSLContext renderer() {
        return DSL.using(SQLDialect.H2, RENDERING);
    }

    /** Forces everything committed so far to the disk: H2 does not promise it by itself. */
    public static void forceToDisk(Connection connection) throws SQLException {
        try (Statement statement = connection.createStatement()) {
            statement.execute("CHECKPOINT SYNC");
        }
    }

    /** Writes a consistent copy of the file, zipped, while it is in use. */
    public static void backup(Connection connection, Path copy) throws SQLException {
        try (PreparedStatement statement = connection.prepareStatement("BACKUP TO ?")) {
            statement.setString(1, copy.toString());
            statement.execute();
        }
    }

    @Override
    public void close() throws SQLException {
        keeper.close();
        pool.dispose();
    }
}
