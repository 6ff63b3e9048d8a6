package coilbook.workbench.tests.fake;

import java.nio.file.Path;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;
import coilbook.workbench.internal.model.FleetModel;
import coilbook.workbench.internal.model.Fleets;

/** Fleets in memory, of as many stations as asked for. */
public final class FakeFleets implements Fleets {

    private final Path folder;
    private final boolean own;

    /** @param own whether the person has a register, of 40 stations */
    public FakeFleets(Path folder, boolean own) {
        this.folder = folder;
        this.own = own;
    }

    @Override
    public Path dataFolder() {
        return folder;
    }

    @Override
    public Path defaultRegister() {
        return folder.resolve("fleet-40");
    }

    @Override
    public boolean exists(Path base) {
        return own;
    }

    @Override
    public FleetModel open(Path base, boolean create, Progress progress) throws CoilbookException {
        String name = base.getFileName().toString();
        if (name.equals("missing")) {
            throw new CoilbookException(CoilbookException.Reason.REGISTER, "There is no register at " + base + ".");
        }
        return new FakeFleet(name, Integer.parseInt(name.replaceAll("\\D", "")), name.startsWith("long"));
    }

    @Override
    public FleetModel demo(Progress progress) {
        return new FakeFleet("demo-200", 200, false);
    }
}
