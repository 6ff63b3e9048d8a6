package coilbook.workbench.internal.places;

import java.util.List;

import coilbook.register.Status;
import coilbook.workbench.internal.model.Background;
import coilbook.workbench.internal.model.FleetModel;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.text.Texts;

/** The tree of places with its counts, and which of them is looked at. */
public final class PlacesPresenter implements Session.Listener {

    /** What shows the tree. */
    public interface View {
        /** @param root {@code null} while no fleet is open */
        void show(PlaceNode root);

        /** The tree could not be read. */
        void failed(String words);

        /** The look has changed. */
        void look(boolean dark);
    }

    private final Session session;
    private final Background background;
    private final Texts texts = Texts.of(PlacesPresenter.class);
    private View view;
    private Background.Handle reading = () -> {
    };

    public PlacesPresenter(Session session, Background background) {
        this.session = session;
        this.background = background;
    }

    /** Starts telling the view. */
    public void attach(View told) {
        view = told;
        session.add(this);
        view.look(session.isDark());
        read();
    }

    /** Stops. */
    public void detach() {
        session.remove(this);
        reading.cancel();
    }

    /** Looks at a place. */
    public void choose(PlaceNode place) {
        session.look(place.scope());
    }

    @Override
    public void fleetChanged() {
        read();
    }

    @Override
    public void dataChanged() {
        read();
    }

    @Override
    public void lookChanged() {
        view.look(session.isDark());
    }

    /** The sum over the sites: asking the register for it would read every row once more. */
    private static Status.Counts total(List<Status.Place> places) {
        long[] sums = new long[6];
        for (Status.Place place : places) {
            if (place.site() != null && place.line() == null) {
                Status.Counts counts = place.counts();
                sums[0] += counts.stations();
                sums[1] += counts.hazards();
                sums[2] += counts.nonconformities();
                sums[3] += counts.observations();
                sums[4] += counts.undetermined();
                sums[5] += counts.conceded();
            }
        }
        return new Status.Counts(sums[0], sums[1], sums[2], sums[3], sums[4], sums[5]);
    }

    private void read() {
        reading.cancel();
        FleetModel fleet = session.fleet();
        if (fleet == null) {
            view.show(null);
            return;
        }
        reading = background.start(texts.get("reading"), Background.Lane.READ, progress -> fleet.places(),
                places -> view.show(PlaceNode.tree(places, total(places), texts.get("all"), texts.get("nobody"))),
                error -> view.failed(error.getMessage()));
    }
}
