package coilbook.workbench.internal.grid.edit;

import java.util.HashMap;
import java.util.List;
import java.util.Map;

import coilbook.register.StatusColumn;
import coilbook.register.StatusRow;
import coilbook.workbench.internal.model.Background;
import coilbook.workbench.internal.model.FleetModel;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.stations.StationsPresenter;
import coilbook.workbench.internal.text.Texts;

/** What the drop-downs offer, fetched when a cell is selected so that it is there when the cell is opened. */
public final class ChoiceLists implements Session.Listener {

    /** Told when a list has come. */
    @FunctionalInterface
    interface Arrival {
        void arrived(int row, StatusColumn column, List<String> choices);
    }

    private record Place(String station, StatusColumn column) {
    }

    private static final int KEPT = 200;

    private final Session session;
    private final StationsPresenter rows;
    private final Background background;
    private final Texts texts = Texts.of(ChoiceLists.class);
    private final Map<Place, List<String>> lists = new HashMap<>();
    private Arrival arrival = (row, column, choices) -> {
    };

    public ChoiceLists(Session session, StationsPresenter rows, Background background) {
        this.session = session;
        this.rows = rows;
        this.background = background;
        session.add(this);
        background.start(texts.get("choices"), Background.Lane.READ, progress -> {
            EditorWarmUp.run();
            return null;
        }, nothing -> {
            // the first editor opens faster
        }, error -> {
            // it opens all the same
        });
    }

    /** Stops listening. */
    public void dispose() {
        session.remove(this);
    }

    void onArrival(Arrival told) {
        arrival = told;
    }

    /** What is known by now; the rest is fetched. */
    List<String> known(int row, StatusColumn column) {
        StatusRow station = rows.row(row);
        if (station == null) {
            return List.of();
        }
        List<String> known = lists.get(new Place(station.station(), column));
        if (known != null) {
            return known;
        }
        prepare(row, column);
        Object value = station.get(column);
        return value == null ? List.of() : List.of(value.toString());
    }

    /** Fetches the list of a cell. */
    public void prepare(int row, StatusColumn column) {
        StatusRow station = rows.row(row);
        FleetModel fleet = session.fleet();
        if (station == null || fleet == null || !fleet.hasChoices(column)) {
            return;
        }
        Place place = new Place(station.station(), column);
        if (lists.containsKey(place)) {
            return;
        }
        background.start(texts.get("choices"), Background.Lane.READ, progress -> fleet.choices(place.station, column), choices -> {
            if (fleet == session.fleet()) {
                if (lists.size() >= KEPT) {
                    lists.clear();
                }
                lists.put(place, choices);
                arrival.arrived(row, column, choices);
            }
        }, error -> arrival.arrived(row, column, List.of()));
    }

    @Override
    public void fleetChanged() {
        lists.clear();
    }

    @Override
    public void dataChanged() {
        lists.clear();
    }
}
