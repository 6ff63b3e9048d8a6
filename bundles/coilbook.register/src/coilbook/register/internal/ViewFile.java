package coilbook.register.internal;

import java.nio.file.Files;
import java.sql.SQLException;

import org.h2.mvstore.MVStoreException;
import org.jooq.exception.DataAccessException;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;
import coilbook.register.internal.file.FileInspection;
import coilbook.register.internal.file.RegisterPath;
import coilbook.register.internal.read.Truth;
import coilbook.register.internal.status.Judging;
import coilbook.register.internal.status.LiveStatus;
import coilbook.register.internal.store.Database;

/**
 * The file of status rows. Whatever is wrong with it, it is thrown away and made anew: everything in it can be computed again.
 */
final class ViewFile implements AutoCloseable {

    private final Database database;
    private final LiveStatus status;

    private ViewFile(Database database, LiveStatus status) {
        this.database = database;
        this.status = status;
    }

    static ViewFile open(RegisterPath path, Truth truth, Judging judging) throws SQLException, CoilbookException {
        StoredRegister.InWords words = new StoredRegister.InWords(path.toString());
        if (Files.exists(path.view())) {
            ViewFile left = left(path, truth, judging, words);
            if (left != null) {
                return left;
            }
            if (!path.view().toFile().delete()) {
                throw new CoilbookException(Reason.REGISTER,
                        path.view() + " is of no use and cannot be removed; remove it, it will be made anew.");
            }
        }
        Database made = Database.open(path.with(".view").toString(), true);
        LiveStatus status = new LiveStatus(truth, made, judging, words);
        status.create();
        return new ViewFile(made, status);
    }

    /** What a former run left, or {@code null} if it is of no use. */
    private static ViewFile left(RegisterPath path, Truth truth, Judging judging, StoredRegister.InWords words) throws SQLException {
        Database database = null;
        boolean useful = false;
        try {
            FileInspection.check(path.view(), LiveStatus.mark());
            database = Database.open(path.with(".view").toString(), false);
            LiveStatus status = new LiveStatus(truth, database, judging, words);
            useful = status.resume();
            return useful ? new ViewFile(database, status) : null;
        } catch (CoilbookException | SQLException | DataAccessException | MVStoreException e) {
            return null;
        } finally {
            if (database != null && !useful) {
                database.close();
            }
        }
    }

    LiveStatus status() {
        return status;
    }

    @Override
    public void close() throws SQLException {
        database.close();
    }
}
