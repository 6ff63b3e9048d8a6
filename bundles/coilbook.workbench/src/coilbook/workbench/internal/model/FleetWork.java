package coilbook.workbench.internal.model;

import java.nio.file.Path;
import java.util.List;
import java.util.function.Consumer;

import coilbook.fleet.CoilbookException;
import coilbook.register.FleetScope;
import coilbook.register.StatusColumn;
import coilbook.workbench.internal.text.Texts;

/**
 * What a person can do to the fleet, as work in the background that tells the session when it is done. Handlers and presenters call this; errors go
 * to the one who asked.
 */
public final class FleetWork {

    private final Session session;
    private final Fleets fleets;
    private final Background background;
    private final Texts texts = Texts.of(FleetWork.class);

    public FleetWork(Session session, Fleets fleets, Background background) {
        this.session = session;
        this.fleets = fleets;
        this.background = background;
    }

    /** Whether the person's own register is there. */
    public boolean hasRegister() {
        return fleets.exists(fleets.defaultRegister());
    }

    /** Opens the person's own register. */
    public void openOwn(boolean create, Runnable then, Consumer<CoilbookException> failed) {
        open(fleets.defaultRegister(), create, then, failed);
    }

    /** Opens a register and lets go of the one that was open. */
    public void open(Path base, boolean create, Runnable then, Consumer<CoilbookException> failed) {
        replace(texts.get("opening", base.getFileName()), progress -> fleets.open(base, create, progress), then, failed);
    }

    /** Opens the demo fleet. */
    public void openDemo(Consumer<CoilbookException> failed) {
        replace(texts.get("openingDemo"), fleets::demo, () -> {
        }, failed);
    }

    private void replace(String name, Background.Task<FleetModel> opening, Runnable then, Consumer<CoilbookException> failed) {
        session.opening(true);
        background.start(name, Background.Lane.LONG, progress -> {
            FleetModel opened = opening.run(progress);
            try {
                opened.bringUpToDate(progress);
                return opened;
            } catch (CoilbookException | RuntimeException e) {
                opened.close();
                throw e;
            }
        }, opened -> {
            FleetModel before = session.fleet();
            session.open(opened);
            readSteps();
            close(before);
            then.run();
        }, error -> {
            session.opening(false);
            failed.accept(error);
        });
    }

    private void close(FleetModel model) {
        if (model != null) {
            background.start(texts.get("closing"), Background.Lane.WRITE, progress -> {
                model.close();
                return null;
            }, nothing -> {
                // the next fleet is open already
            }, error -> {
                // what was acknowledged is safe whether or not closing went well, and nobody can do anything about it
            });
        }
    }

    /** Changes one cell. */
    public void edit(String station, StatusColumn column, String text, Consumer<CoilbookException> failed) {
        write(texts.get("editing", column.heading()), Background.Lane.WRITE,
                (model, progress) -> model.edit(station, column, text, progress), failed);
    }

    /** Takes the latest step back. */
    public void undo(Consumer<CoilbookException> failed) {
        write(texts.get("undoing"), Background.Lane.LONG, FleetModel::undo, failed);
    }

    /** Does the step again that was taken back. */
    public void redo(Consumer<CoilbookException> failed) {
        write(texts.get("redoing"), Background.Lane.LONG, FleetModel::redo, failed);
    }

    /** Brings files in. */
    public void bringIn(List<Path> files, boolean acceptPartial, Consumer<BroughtIn> done, Consumer<CoilbookException> failed) {
        FleetModel model = session.fleet();
        background.start(texts.get("bringingIn"), Background.Lane.LONG, progress -> {
            BroughtIn result = model.bringIn(files, acceptPartial, progress);
            model.bringUpToDate(progress);
            return result;
        }, result -> {
            if (model == session.fleet()) {
                session.changed();
                readSteps();
            }
            done.accept(result);
        }, failed);
    }

    /** Writes the audit workbook of what is looked at. */
    public void audit(Path out, Runnable done, Consumer<CoilbookException> failed) {
        FleetModel model = session.fleet();
        FleetScope scope = session.scope();
        background.start(texts.get("auditing", out.getFileName()), Background.Lane.LONG, progress -> {
            model.bringUpToDate(progress);
            model.audit(scope, out, progress);
            return null;
        }, nothing -> done.run(), failed);
    }

    private interface Write {
        void run(FleetModel model, coilbook.fleet.Progress progress) throws CoilbookException;
    }

    private void write(String name, Background.Lane lane, Write what, Consumer<CoilbookException> failed) {
        FleetModel model = session.fleet();
        if (model == null) {
            return;
        }
        background.start(name, lane, progress -> {
            what.run(model, progress);
            return model.steps();
        }, steps -> {
            if (model == session.fleet()) {
                session.changed();
                session.steps(steps);
            }
        }, failed);
    }

    private void readSteps() {
        FleetModel model = session.fleet();
        background.start(texts.get("reading"), Background.Lane.READ, progress -> model.steps(), steps -> {
            if (model == session.fleet()) {
                session.steps(steps);
            }
        }, error -> session.steps(Steps.NONE));
    }
}
