package coilbook.workbench.internal.register;

import java.nio.file.Path;

import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;
import coilbook.jobs.Audit;
import coilbook.jobs.BringIn;
import coilbook.jobs.Check;
import coilbook.jobs.Demo;
import coilbook.jobs.Editing;
import coilbook.jobs.RegisterPlace;
import coilbook.register.OpenMode;
import coilbook.register.Register;
import coilbook.register.Registers;
import coilbook.workbench.internal.model.FleetModel;
import coilbook.workbench.internal.model.Fleets;
import coilbook.workbench.internal.text.Texts;

/** Fleets in registers, by the use cases that the command line has too. */
@Component
public final class RegisterFleets implements Fleets {

    private static final int DEMO_STATIONS = 200;
    private static final long DEMO_SEED = 1;

    private final Registers registers;
    private final BringIn bringIn;
    private final Check check;
    private final Audit audit;
    private final Demo demo;
    private final Editing editing;
    private final Texts texts = Texts.of(RegisterFleets.class);
    private final RegisterPlace place = RegisterPlace.ofThisProcess();

    @Activate
    public RegisterFleets(@Reference Registers registers, @Reference BringIn bringIn, @Reference Check check, @Reference Audit audit,
            @Reference Demo demo, @Reference Editing editing) {
        this.registers = registers;
        this.bringIn = bringIn;
        this.check = check;
        this.audit = audit;
        this.demo = demo;
        this.editing = editing;
    }

    @Override
    public Path dataFolder() {
        return place.dataFolder();
    }

    @Override
    public Path defaultRegister() {
        return place.ownRegister();
    }

    @Override
    public boolean exists(Path base) {
        return RegisterPlace.exists(base);
    }

    @Override
    public FleetModel open(Path base, boolean create, Progress progress) throws CoilbookException {
        Register register = registers.open(base, create ? OpenMode.CREATE_IF_MISSING : OpenMode.EXISTING);
        return model(register, register.name());
    }

    /** In memory, so that looking around leaves nothing behind and every visit begins with the same data. */
    @Override
    public FleetModel demo(Progress progress) throws CoilbookException {
        Register register = registers.temporary();
        try {
            demo.fill(register, DEMO_STATIONS, DEMO_SEED, progress);
            return model(register, texts.get("demo"));
        } catch (CoilbookException | RuntimeException e) {
            register.close();
            throw e;
        }
    }

    private FleetModel model(Register register, String name) {
        String who = System.getProperty("user.name", "");
        return new RegisterFleet(name, register, editing.open(register, who.isBlank() ? "workbench" : who), bringIn, check, audit, who);
    }
}
