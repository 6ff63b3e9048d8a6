package coilbook.jobs;

import java.time.Clock;

import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;

import coilbook.criteria.Assessor;
import coilbook.register.Register;

/** Lets a person edit an open register, cell by cell, with undo and redo. */
@Component(service = Editing.class)
public final class Editing {

    /** One person looks at few stations; a whole check remembers more. */
    private static final int CIRCUITS_REMEMBERED = 256;

    private final Clock clock;

    @Activate
    public Editing() {
        this(Clock.systemDefaultZone());
    }

    /** With a clock of one's own, for tests. */
    public Editing(Clock clock) {
        this.clock = clock;
    }

    /** A session on a register, which stays the caller's to close. */
    public EditSession open(Register register, String who) {
        return new EditSession(register, new Assessor(CIRCUITS_REMEMBERED), who, clock);
    }
}
