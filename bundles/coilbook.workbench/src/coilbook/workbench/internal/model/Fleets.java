package coilbook.workbench.internal.model;

import java.nio.file.Path;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;

/** Opens fleets. */
public interface Fleets {

    /** The program's folder among the person's data; the window keeps its own file there. */
    Path dataFolder();

    /** The base path of the person's own register. */
    Path defaultRegister();

    /** Whether there is a register at a base path. */
    boolean exists(Path base);

    /**
     * Opens a register.
     *
     * @param create whether a missing one is made
     */
    FleetModel open(Path base, boolean create, Progress progress) throws CoilbookException;

    /** Opens the fleet of invented data; made on first use. */
    FleetModel demo(Progress progress) throws CoilbookException;
}
