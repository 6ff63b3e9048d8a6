package coilbook.workbench.internal.why;

import coilbook.workbench.internal.model.Background;
import coilbook.workbench.internal.model.FleetModel;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.text.Texts;

/** Follows the selected station and tells why its verdict is what it is. */
public final class WhyPresenter implements Session.Listener {

    /** What shows the text. */
    public interface View {
        /** @param keepPlace whether it is the same station's text, so that the reader's place is kept */
        void show(WhyText text, boolean keepPlace);

        /** The look has changed. */
        void look(boolean dark);
    }

    private final Session session;
    private final Background background;
    private final WhyComposer composer = new WhyComposer();
    private final Texts texts = Texts.of(WhyPresenter.class);
    private View view;
    private String shown;
    private Background.Handle reading = () -> {
    };

    public WhyPresenter(Session session, Background background) {
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

    @Override
    public void fleetChanged() {
        read();
    }

    @Override
    public void stationChanged() {
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

    private void read() {
        reading.cancel();
        FleetModel fleet = session.fleet();
        String station = session.station();
        if (fleet == null || station == null) {
            shown = null;
            view.show(composer.nothing(), false);
            return;
        }
        reading = background.start(texts.get("reading"), Background.Lane.READ, progress -> fleet.why(station), report -> {
            view.show(report == null ? composer.nothing() : composer.compose(report), station.equals(shown));
            shown = station;
        }, error -> view.show(composer.failed(error.getMessage()), false));
    }
}
