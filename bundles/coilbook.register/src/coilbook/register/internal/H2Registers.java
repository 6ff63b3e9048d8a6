package coilbook.register.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.sql.Connection;
import java.sql.SQLException;
import java.time.LocalDate;
import java.util.List;
import java.util.UUID;
import java.util.function.Supplier;

import org.osgi.service.component.annotations.Component;

import coilbook.criteria.Assessor;
import coilbook.criteria.MarketTables;
import coilbook.fleet.Change;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.register.OpenMode;
import coilbook.register.Register;
import coilbook.register.Registers;
import coilbook.register.internal.file.DiskRoom;
import coilbook.register.internal.file.FileInspection;
import coilbook.register.internal.file.Folders;
import coilbook.register.internal.file.LockNote;
import coilbook.register.internal.file.RegisterPath;
import coilbook.register.internal.read.Truth;
import coilbook.register.internal.status.CriteriaJudging;
import coilbook.register.internal.status.Judging;
import coilbook.register.internal.status.LiveStatus;
import coilbook.register.internal.store.Codecs;
import coilbook.register.internal.store.Database;
import coilbook.register.internal.store.Journal;
import coilbook.register.internal.store.Migrations;
import coilbook.register.internal.store.RegisterStore;

/** Registers in embedded H2 databases. */
@Component(service = Registers.class)
public final class H2Registers implements Registers {

    /** Why the first Change of every register was made. */
    static final String FIRST_TABLES = "First tables";

    private static final String PROGRAM = "Coilbook";
    private static final String MARK = "COILBOOK_REGISTER";

    private final Judging judging;
    private final Supplier<List<Row>> firstRows;

    /** Judges by the criteria and begins with their market tables. */
    public H2Registers() {
        this(new CriteriaJudging(new Assessor()), MarketTables::rows);
    }

    /**
     * @param judging computes and judges stations for the status rows
     * @param firstRows the rows with which every new register begins: the market tables
     */
    public H2Registers(Judging judging, Supplier<List<Row>> firstRows) {
        this.judging = judging;
        this.firstRows = firstRows;
    }

    @Override
    public Register open(Path base, OpenMode mode) throws CoilbookException {
        RegisterPath path = RegisterPath.of(base);
        boolean exists = Files.exists(path.data());
        if (exists && mode == OpenMode.CREATE_NEW) {
            throw new CoilbookException(Reason.BAD_INPUT, "There is a register " + path + " already; it is not replaced.");
        } else if (!exists && mode == OpenMode.EXISTING) {
            throw new CoilbookException(Reason.REGISTER, "There is no register " + path + ".");
        } else if (!exists) {
            create(path);
        }
        return openExisting(path);
    }

    @Override
    public Register temporary() throws CoilbookException {
        String name = "in memory";
        return Failures.translating(name, () -> {
            Database data = Database.inMemory();
            Database view = Database.inMemory();
            Migrations.State state;
            try (Connection connection = data.connection()) {
                state = Migrations.create(connection);
            } catch (IOException e) {
                throw new IllegalStateException(e);
            }
            Parts parts = new Parts(data, state.registerId(), RegisterStore.Room.ENDLESS);
            seed(parts.store());
            Truth truth = parts.truth();
            LiveStatus status = new LiveStatus(truth, view, judging, new StoredRegister.InWords(name));
            status.create();
            return new StoredRegister(name, parts.store(), truth, status, judging, () -> {
                view.close();
                data.close();
            });
        });
    }

    /** The parts of an open register that share its database. */
    private static final class Parts {
        private final Database data;
        private final String registerId;
        private final Codecs codecs = new Codecs();
        private final Journal journal = new Journal();
        private final RegisterStore store;

        Parts(Database data, String registerId, RegisterStore.Room room) throws SQLException {
            this.data = data;
            this.registerId = registerId;
            this.store = new RegisterStore(data, codecs, journal, room);
        }

        RegisterStore store() {
            return store;
        }

        Truth truth() {
            return new Truth(data, codecs, journal, registerId, store.head());
        }
    }

    private void seed(RegisterStore store) throws SQLException, CoilbookException {
        List<RowChange> rows = firstRows.get().stream().map(RowChange::insert).toList();
        if (!rows.isEmpty()) {
            store.apply(new Change(PROGRAM, RegisterStore.now(), FIRST_TABLES, rows), Progress.NONE, (seq, change) -> {
            });
        }
    }

    /** Makes the register under another name and gives it its own only when it is complete. */
    private void create(RegisterPath path) throws CoilbookException {
        try (Folders folders = Folders.make(path.folder())) {
            String unfinished = path.with(".new-" + UUID.randomUUID()).toString();
            Path file = Path.of(unfinished + ".mv.db");
            try {
                Failures.translating(path.toString(), () -> {
                    try (Database data = Database.open(unfinished, true)) {
                        try (Connection connection = data.connection()) {
                            Migrations.create(connection);
                        } catch (IOException e) {
                            throw new IllegalStateException(e);
                        }
                        seed(new RegisterStore(data, new Codecs(), new Journal(), new DiskRoom(path.folder())));
                    }
                    return null;
                });
                Files.move(file, path.data(), StandardCopyOption.ATOMIC_MOVE);
                folders.keep();
            } catch (IOException e) {
                throw new CoilbookException(Reason.REGISTER,
                        "The register " + path + " cannot be made: " + path.folder() + " may not be written.", e);
            } finally {
                file.toFile().delete();
            }
        }
    }

    private Register openExisting(RegisterPath path) throws CoilbookException {
        Folders.checkWritable(path.data());
        inspect(path);
        Database data = Failures.translating(path.toString(), () -> Database.open(path.base().toString(), false));
        boolean complete = false;
        try {
            LockNote.write(path.lockNote());
            Register register = Failures.translating(path.toString(), () -> assemble(path, data));
            complete = true;
            return register;
        } finally {
            if (!complete) {
                Failures.translating(path.toString(), () -> {
                    data.close();
                    return null;
                });
                LockNote.remove(path.lockNote());
            }
        }
    }

    private static void inspect(RegisterPath path) throws CoilbookException {
        try {
            FileInspection.check(path.data(), MARK);
        } catch (FileInspection.Busy e) {
            throw new CoilbookException(Reason.REGISTER, "The register " + path + " is in use " + LockNote.holder(path.lockNote()) + ".",
                    e);
        }
    }

    private Register assemble(RegisterPath path, Database data) throws SQLException, CoilbookException {
        Migrations.State state;
        try (Connection connection = data.connection()) {
            state = Migrations.state(connection);
            if (state.version() > Migrations.CURRENT) {
                throw new CoilbookException(Reason.REGISTER,
                        "The register " + path + " was written by a newer version of Coilbook (schema " + state.version()
                                + "; this version knows " + Migrations.CURRENT + "). Install the newer version.");
            } else if (state.version() < Migrations.CURRENT) {
                migrate(path, connection, state.version());
            }
        }
        Parts parts = new Parts(data, state.registerId(), new DiskRoom(path.folder()));
        Truth truth = parts.truth();
        ViewFile view = ViewFile.open(path, truth, judging);
        return new StoredRegister(path.toString(), parts.store(), truth, view.status(), judging, () -> {
            view.close();
            data.close();
            LockNote.remove(path.lockNote());
        });
    }

    private static void migrate(RegisterPath path, Connection connection, int version) throws SQLException, CoilbookException {
        Path copy = path.with(".schema-" + version + "." + LocalDate.now() + ".backup.zip");
        try {
            Database.backup(connection, copy);
            Migrations.migrate(connection, version);
        } catch (IOException e) {
            throw new CoilbookException(Reason.REGISTER,
                    "The register " + path + " cannot be brought to this version's form; it is as it was in "
                            + copy + ".",
                    e);
        }
    }
}
