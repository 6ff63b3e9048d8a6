package coilbook.register;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;

import org.h2.api.Trigger;

/** Hostile code in a file: it leaves a trace as soon as the database merely loads it. */
public final class MarkerTrigger implements Trigger {

    /** The system property that says where to leave the trace. */
    static final String WHERE = "coilbook.marker";

    @Override
    public void init(Connection connection, String schema, String name, String table, boolean before, int type) {
        try {
            Files.createFile(Path.of(System.getProperty(WHERE)));
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    @Override
    public void fire(Connection connection, Object[] oldRow, Object[] newRow) {
        // loading it is enough
    }
}
