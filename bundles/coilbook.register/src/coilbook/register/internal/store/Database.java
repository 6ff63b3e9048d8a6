package coilbook.register.internal.store;

import java.io.IOException;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.logging.Level;
import java.util.logging.Logger;

import org.h2.jdbcx.JdbcConnectionPool;
import org.h2.mvstore.MVStoreException;
import org.h2.store.fs.FilePath;
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
    /**
     * Without a write delay the database writes in the thread that commits. With one it hands pages to a thread of its own, and neither a commit nor
     * forcing the file waits for that thread: an acknowledged Change could be lost with the power, and a full disk be noticed by nobody. Rows come
     * while a query still runs: the first after milliseconds instead of seconds. No trace file.
     */
    private static final String SETTINGS = ";WRITE_DELAY=0;LAZY_QUERY_EXECUTION=1;TRACE_LEVEL_FILE=0;TRACE_LEVEL_SYSTEM_OUT=0;DB_CLOSE_ON_EXIT=FALSE";
    private static final Settings RENDERING = new Settings().withRenderQuotedNames(RenderQuotedNames.NEVER).withExecuteLogging(false)
            .withFetchServerOutputSize(0);

    /** Held so that its level stays: the library greets and advises at level INFO, which would reach a person's console. */
    private static final Logger LIBRARY = Logger.getLogger("org.jooq");

    static {
        LIBRARY.setLevel(Level.WARNING);
        System.setProperty("org.jooq.no-logo", "true");
        System.setProperty("org.jooq.no-tips", "true");
        FilePath.register(new StrictDisk());
    }

    private final JdbcConnectionPool pool;
    private final Connection keeper;
    private volatile Exception lost;

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
        return new Database(
                "jdbc:h2:file:" + StrictDisk.SCHEME + ":" + path + ";FILE_LOCK=FS;IFEXISTS=" + (create ? "FALSE" : "TRUE") + SETTINGS);
    }

    /** Opens a database that lives in memory while it is open. */
    public static Database inMemory() throws SQLException {
        return new Database("jdbc:h2:mem:" + java.util.UUID.randomUUID() + SETTINGS);
    }

    /** A connection of its own, which commits each statement; to be closed soon. */
    public Connection connection() throws SQLException {
        Exception reason = lost;
        if (reason != null) {
            throw new SQLException("the file can no longer be written", reason);
        }
        return pool.getConnection();
    }

    /** What is done in one transaction.
     *
     * @param <T> its result
     * @param <E> why it may be given up
     */
    public interface Work<T, E extends Exception> {
        T run(Connection connection) throws SQLException, E;
    }

    /**
     * Does work in a transaction of its own, wholly or not at all. Once the file could not be written, the database waits for ever at the next
     * statement; so that connection, and all others from then on, are left alone.
     */
    public <T, E extends Exception> T inTransaction(Work<T, E> work) throws SQLException, E {
        Connection connection = connection();
        boolean usable = true;
        boolean done = false;
        try {
            connection.setAutoCommit(false);
            T result = work.run(connection);
            connection.commit();
            done = true;
            return result;
        } catch (SQLException | RuntimeException e) {
            if (isLost(e)) {
                usable = false;
                lost = e;
            }
            throw e;
        } finally {
            if (usable) {
                giveBack(connection, done);
            }
        }
    }

    private static void giveBack(Connection connection, boolean done) throws SQLException {
        try (connection) {
            if (!done) {
                connection.rollback();
            }
            connection.setAutoCommit(true);
        }
    }

    /** Whether the store of pages below the database failed, and not merely a statement. */
    private static boolean isLost(Throwable failure) {
        for (Throwable cause = failure; cause != null; cause = cause.getCause()) {
            if (cause instanceof IOException || cause instanceof MVStoreException) {
                return true;
            }
        }
        return false;
    }

    public static DSLContext dsl(Connection connection) {
        return DSL.using(connection, SQLDialect.H2, RENDERING);
    }

    /** The text of statements that are run many times by plain JDBC. */
    public static DSLContext renderer() {
        return DSL.using(SQLDialect.H2, RENDERING);
    }

    /** Forces everything committed so far to the disk: H2 does not promise it by itself. */
    public void forceToDisk() throws SQLException {
        Connection connection = connection();
        boolean usable = true;
        try (Statement statement = connection.createStatement()) {
            statement.execute("CHECKPOINT SYNC");
        } catch (SQLException | RuntimeException e) {
            usable = false;
            lost = e;
            throw e;
        } finally {
            if (usable) {
                connection.close();
            }
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
        if (lost != null) {
            return;
        }
        keeper.close();
        pool.dispose();
    }
}
