package coilbook.workbench.internal;

import java.nio.file.Path;
import java.util.logging.Level;
import java.util.logging.Logger;

import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.e4.core.contexts.IEclipseContext;
import org.eclipse.e4.core.services.events.IEventBroker;
import org.eclipse.e4.ui.di.UISynchronize;
import org.eclipse.e4.ui.internal.workbench.swt.IEventLoopAdvisor;
import org.eclipse.e4.ui.model.application.MApplication;
import org.eclipse.e4.ui.workbench.UIEvents;
import org.eclipse.e4.ui.workbench.lifecycle.PostContextCreate;
import org.eclipse.e4.ui.workbench.lifecycle.PreSave;
import org.eclipse.e4.ui.workbench.lifecycle.ProcessAdditions;
import org.eclipse.e4.ui.workbench.modeling.EModelService;
import org.eclipse.swt.widgets.Display;

import coilbook.fleet.CoilbookException;
import coilbook.workbench.internal.model.Background;
import coilbook.workbench.internal.model.FleetWork;
import coilbook.workbench.internal.model.Fleets;
import coilbook.workbench.internal.model.RunningWork;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.statusline.RowCounts;
import coilbook.workbench.internal.window.EventLoop;
import coilbook.workbench.internal.window.FileQuestions;
import coilbook.workbench.internal.window.JobBackground;
import coilbook.workbench.internal.window.LogFile;
import coilbook.workbench.internal.window.Look;
import coilbook.workbench.internal.window.UncaughtErrors;
import coilbook.workbench.internal.window.WindowFrame;
import coilbook.workbench.internal.window.WindowState;

/** Wires what the parts share into the application's context, before any of them is made. */
@SuppressWarnings("restriction")
public final class LifeCycle {

    private static final Logger LOG = Logger.getLogger(LifeCycle.class.getName());
    private static final long LONGEST_END_MS = 20_000;
    private static final long POLL_MS = 20;

    private LogFile log;
    private WindowFrame frame;

    @PostContextCreate
    void wire(IEclipseContext context, Display display, UISynchronize window, Fleets fleets) {
        Display.setAppName(WorkbenchIds.NAME);
        log = new LogFile(fleets.dataFolder());
        UncaughtErrors errors = UncaughtErrors.install(display, log.place());
        WindowState state = new WindowState(settings(fleets));
        Session session = new Session();
        RunningWork running = new RunningWork();
        Background background = new JobBackground(window, running, errors);
        FleetWork work = new FleetWork(session, fleets, background);
        Look look = new Look(session, state);
        look.begin();
        session.opening(work.hasRegister());
        context.set(IEventLoopAdvisor.class, new EventLoop(errors));
        context.set(Session.class, session);
        context.set(RunningWork.class, running);
        context.set(Background.class, background);
        context.set(FleetWork.class, work);
        context.set(RowCounts.class, new RowCounts());
        context.set(FileQuestions.class, new FileQuestions(session, work));
        context.set(WindowState.class, state);
        context.set(Look.class, look);
        context.set("cssTheme", look.sheet());
    }

    private static Path settings(Fleets fleets) {
        return fleets.dataFolder().resolve("window.properties");
    }

    @ProcessAdditions
    void place(MApplication application, EModelService models, WindowState state, Session session, IEventBroker events,
            FileQuestions questions) {
        frame = new WindowFrame(application, models, state, session);
        frame.restore();
        events.subscribe(UIEvents.UILifeCycle.APP_STARTUP_COMPLETE, event -> questions.openAtStart());
    }

    @PreSave
    void end(Session session) throws InterruptedException {
        frame.remember();
        Job.getJobManager().cancel(JobBackground.class);
        long end = System.currentTimeMillis() + LONGEST_END_MS;
        while (Job.getJobManager().find(JobBackground.class).length > 0 && System.currentTimeMillis() < end) {
            Thread.sleep(POLL_MS);
        }
        if (session.fleet() != null) {
            try {
                session.fleet().close();
            } catch (CoilbookException e) {
                LOG.log(Level.WARNING, "The register was not closed in order; what was recorded is safe", e);
            }
        }
        log.close();
    }
}
