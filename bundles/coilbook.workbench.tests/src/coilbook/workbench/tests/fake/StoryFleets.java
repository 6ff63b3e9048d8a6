package coilbook.workbench.tests.fake;

import java.nio.file.Path;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;
import coilbook.workbench.internal.model.FleetModel;
import coilbook.workbench.internal.model.Fleets;

/** The real fleets for a person whose data lie in a folder of the test's own, and invented ones with awkward data by relative names. */
public final class StoryFleets implements Fleets {

    private final Fleets real;
    private final FakeFleets invented;
    private final Path folder;
    private volatile FleetModel last;

    public StoryFleets(Fleets real, Path folder) {
        this.real = real;
        this.invented = new FakeFleets(folder, false);
        this.folder = folder;
    }

    @Override
    public Path dataFolder() {
        return folder;
    }

    @Override
    public Path defaultRegister() {
        return folder.resolve("fleet");
    }

    @Override
    public boolean exists(Path base) {
        return real.exists(base);
    }

    @Override
    public FleetModel open(Path base, boolean create, Progress progress) throws CoilbookException {
        last = base.isAbsolute() ? real.open(base, create, progress) : invented.open(base, create, progress);
        return last;
    }

    /** The fleet that was opened last. */
    public FleetModel last() {
        return last;
    }

    @Override
    public FleetModel demo(Progress progress) throws CoilbookException {
        return real.demo(progress);
    }
}
