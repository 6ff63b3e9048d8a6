package coilbook.register.internal.file;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;
import coilbook.register.internal.store.RegisterStore;

/**
 * Refuses a Change that the disk may not hold, before it begins: a database that runs out of disk in the middle has to be closed before it can be
 * used again.
 */
public final class DiskRoom implements RegisterStore.Room {

    private static final long KEPT_FREE = 20_000_000;
    /** Generous: a row takes some 200 bytes, and for a while more than once. */
    private static final long BYTES_A_ROW = 1000;

    private final Path folder;

    /** @param folder in which the register lies */
    public DiskRoom(Path folder) {
        this.folder = folder;
    }

    @Override
    public void check(int rows) throws CoilbookException {
        long free;
        try {
            free = Files.getFileStore(folder).getUsableSpace();
        } catch (IOException e) {
            return; // a system that does not say is left to fail by itself
        }
        if (free < KEPT_FREE + BYTES_A_ROW * rows) {
            throw new CoilbookException(Reason.REGISTER, "The disk of " + folder + " is nearly full: " + free / 1_000_000
                    + " MB are free. Nothing was changed; make room first.");
        }
    }
}
