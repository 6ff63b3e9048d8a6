package coilbook.workbench.internal.window;

import java.util.function.Consumer;
import java.util.logging.Level;
import java.util.logging.Logger;

import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.ISchedulingRule;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.e4.ui.di.UISynchronize;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;
import coilbook.workbench.internal.model.Background;
import coilbook.workbench.internal.model.RunningWork;
import coilbook.workbench.internal.text.Texts;

/** Background work as platform jobs. */
public final class JobBackground implements Background {

    private static final Logger LOG = Logger.getLogger(JobBackground.class.getName());

    /** Work that writes waits for work that writes. */
    private static final class OneAtATime implements ISchedulingRule {
        @Override
        public boolean contains(ISchedulingRule rule) {
            return rule == this;
        }

        @Override
        public boolean isConflicting(ISchedulingRule rule) {
            return rule == this;
        }
    }

    private final UISynchronize window;
    private final RunningWork running;
    private final Consumer<Throwable> uncaught;
    private final ISchedulingRule writing = new OneAtATime();
    private final Texts texts = Texts.of(JobBackground.class);

    /** @param uncaught takes what no task should throw */
    public JobBackground(UISynchronize window, RunningWork running, Consumer<Throwable> uncaught) {
        this.window = window;
        this.running = running;
        this.uncaught = uncaught;
    }

    @Override
    public <T> Handle start(String name, Lane lane, Task<T> task, Consumer<T> done, Consumer<CoilbookException> failed) {
        Work<T> work = new Work<>(name, lane, task, done, failed);
        work.setSystem(lane != Lane.LONG);
        work.setPriority(lane == Lane.LONG ? Job.LONG : Job.SHORT);
        if (lane != Lane.READ) {
            work.setRule(writing);
        }
        work.schedule();
        return () -> {
            work.unwanted = true;
            work.cancel();
        };
    }

    private final class Work<T> extends Job {

        private final Lane lane;
        private final Task<T> task;
        private final Consumer<T> done;
        private final Consumer<CoilbookException> failed;
        private volatile boolean unwanted;

        Work(String name, Lane lane, Task<T> task, Consumer<T> done, Consumer<CoilbookException> failed) {
            super(name);
            this.lane = lane;
            this.task = task;
            this.done = done;
            this.failed = failed;
        }

        @Override
        public boolean belongsTo(Object family) {
            return family == JobBackground.class;
        }

        @Override
        protected IStatus run(IProgressMonitor monitor) {
            Progress progress = new Telling(monitor);
            progress.report("", 0, 0);
            try {
                T result = task.run(progress);
                tell(() -> done.accept(result));
            } catch (CoilbookException e) {
                if (e.getCause() != null) {
                    LOG.log(Level.WARNING, getName(), e);
                }
                tell(() -> failed.accept(e));
            } catch (RuntimeException | Error e) {
                uncaught.accept(e);
                tell(() -> failed.accept(new CoilbookException(CoilbookException.Reason.REGISTER, texts.get("unexpected"))));
            } finally {
                if (lane == Lane.LONG) {
                    running.put(this, null);
                }
            }
            return Status.OK_STATUS;
        }

        private void tell(Runnable what) {
            if (!unwanted) {
                window.asyncExec(() -> {
                    if (!unwanted) {
                        what.run();
                    }
                });
            }
        }

        private final class Telling implements Progress {

            private final IProgressMonitor monitor;

            Telling(IProgressMonitor monitor) {
                this.monitor = monitor;
            }

            @Override
            public void report(String step, long reached, long total) {
                if (lane == Lane.LONG) {
                    running.put(Work.this, new RunningWork.Item(getName(), step, reached, total, Work.this::cancel));
                }
            }

            @Override
            public boolean isCancelled() {
                return monitor.isCanceled();
            }
        }
    }
}
