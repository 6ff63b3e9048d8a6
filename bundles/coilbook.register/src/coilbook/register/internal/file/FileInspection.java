package coilbook.register.internal.file;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;

import org.h2.mvstore.DataUtils;
import org.h2.mvstore.MVMap;
import org.h2.mvstore.MVStore;
import org.h2.mvstore.MVStoreException;
import org.h2.mvstore.tx.Transaction;
import org.h2.mvstore.tx.TransactionStore;
import org.h2.mvstore.type.LongDataType;
import org.h2.mvstore.type.MetaType;
import org.h2.mvstore.type.StringDataType;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;

/**
 * Reads what a data file would make the database do, without letting it. Merely connecting to a file runs the triggers it holds, whatever the user
 * or password; so the file is first opened as a plain store of pages, read-only, and its schema is read as text.
 */
public final class FileInspection {

    private static final String TYPES = "_";
    private static final String SCHEMA = "table.0";
    private static final String PREPARED = "openTransactions";

    private FileInspection() {
    }

    /** What a file was found to be, apart from sound. */
    public static final class Busy extends CoilbookException {

        private static final long serialVersionUID = 1L;

        Busy(String message, Throwable cause) {
            super(Reason.REGISTER, message, cause);
        }
    }

    /**
     * @param file the data file
     * @param mark the table that every file of this sort has
     * @throws Busy if another process, or this one, has it open
     * @throws CoilbookException with reason REGISTER if it is damaged, foreign or holds anything that could run code
     */
    public static void check(Path file, String mark) throws CoilbookException {
        FileHeader.check(file);
        guarded(file, store -> checkSchema(file, store, mark));
        guarded(file, FileInspection::checkUnfinished);
    }

    /** One look at the pages of a file. */
    private interface Look {
        void at(MVStore store) throws CoilbookException;
    }

    private static void checkSchema(Path file, MVStore store, String mark) throws CoilbookException {
        checkTypes(store);
        SchemaWords words = new SchemaWords();
        for (List<SchemaRows.Entry> states : schema(store)) {
            states.forEach(words::take);
        }
        if (!words.tables().contains(mark)) {
            throw new CoilbookException(Reason.REGISTER, file + " is a database of another program.");
        }
    }

    /** A fresh store for each look: once opened, a map keeps the types it was opened with. */
    private static void guarded(Path file, Look look) throws CoilbookException {
        try (MVStore store = new MVStore.Builder().fileName(file.toString()).readOnly().open()) {
            look.at(store);
        } catch (ForeignContent e) {
            throw foreign(file, e);
        } catch (MVStoreException e) {
            throw failed(file, e);
        } catch (StackOverflowError e) {
            throw damaged(file, e); // pages that point at each other
        } catch (RuntimeException e) {
            throw e.getCause() instanceof ForeignContent found ? foreign(file, found) : damaged(file, e);
        }
    }

    private static CoilbookException foreign(Path file, ForeignContent found) {
        return new CoilbookException(Reason.REGISTER, file + " holds " + found.getMessage()
                + ", which no register has and which could run code: it is not opened.", found);
    }

    private static CoilbookException failed(Path file, MVStoreException e) {
        if (e.getErrorCode() == DataUtils.ERROR_FILE_LOCKED) {
            return new Busy(file + " is in use.", e);
        } else if (e.getErrorCode() == DataUtils.ERROR_UNSUPPORTED_FORMAT) {
            return new CoilbookException(Reason.REGISTER,
                    file + " was written by a newer version of the database; this version cannot read it.", e);
        }
        for (Throwable cause = e; cause != null; cause = cause.getCause()) {
            if (cause instanceof ForeignContent found) {
                return foreign(file, found);
            }
        }
        return damaged(file, e);
    }

    private static CoilbookException damaged(Path file, Throwable e) {
        return new CoilbookException(Reason.REGISTER, file + " is damaged. Restore it from a backup copy.", e);
    }

    private static void checkTypes(MVStore store) {
        if (store.hasMap(TYPES)) {
            MVMap<String, String> types = store.openMap(TYPES,
                    new MVMap.Builder<String, String>().keyType(StringDataType.INSTANCE).valueType(new TypeNames()));
            for (Iterator<String> keys = types.keyIterator(null); keys.hasNext();) {
                types.get(keys.next());
            }
        }
        if (store.hasMap(PREPARED) && store.hasData(PREPARED)) {
            throw new ForeignContent("a prepared transaction");
        }
    }

    private static List<List<SchemaRows.Entry>> schema(MVStore store) {
        List<List<SchemaRows.Entry>> rows = new ArrayList<>();
        if (store.hasMap(SCHEMA)) {
            MVMap<Long, List<SchemaRows.Entry>> map = store.openMap(SCHEMA,
                    new MVMap.Builder<Long, List<SchemaRows.Entry>>().keyType(LongDataType.INSTANCE).valueType(new SchemaRows()));
            for (Iterator<Long> keys = map.keyIterator(null); keys.hasNext();) {
                rows.add(map.get(keys.next()));
            }
        }
        return rows;
    }

    /**
     * The log of a long transaction names its maps by number; beyond its first page the database finds only those that are open already, and takes
     * the rest for damage.
     */
    private static void openChangedMaps(MVStore store, Transaction transaction) {
        for (String name : store.getMapNames()) {
            if (!name.startsWith(TransactionStore.UNDO_LOG_NAME_PREFIX) && !TYPES.equals(name) && !PREPARED.equals(name)) {
                transaction.openMap(name);
            }
        }
    }

    /**
     * What a killed process left unfinished is completed or taken back on connecting. We never change the schema of a register in place, so an
     * unfinished transaction that touches it is not ours.
     */
    @SuppressWarnings("resource") // closing it would write; the store below it is closed by the caller
    private static void checkUnfinished(MVStore store) {
        if (store.getMapNames().stream().noneMatch(name -> name.startsWith(TransactionStore.UNDO_LOG_NAME_PREFIX) && store.hasData(name))) {
            return;
        }
        TransactionStore transactions = new TransactionStore(store, new MetaType<>(null, null), StringDataType.INSTANCE, 1000);
        // what a transaction did can be read only once the maps it touched are open
        store.getMapNames().stream().filter(name -> name.startsWith("table.") || name.startsWith("index."))
                .forEach(name -> transactions.openMap(name, null, null));
        transactions.init();
        for (Transaction transaction : transactions.getOpenTransactions()) {
            openChangedMaps(store, transaction);
            for (Iterator<TransactionStore.Change> changes = transaction.getChanges(0); changes.hasNext();) {
                TransactionStore.Change change = changes.next();
                if (change != null && (SCHEMA.equals(change.mapName) || TYPES.equals(change.mapName))) {
                    throw new ForeignContent("an unfinished change of its structure");
                }
            }
        }
    }
}
