package coilbook.workbench.internal.stations;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Deque;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;

import coilbook.fleet.CoilbookException;
import coilbook.register.FleetScope;
import coilbook.register.StatusColumn;
import coilbook.register.StatusQuery;
import coilbook.register.StatusRow;
import coilbook.workbench.internal.model.Background;
import coilbook.workbench.internal.model.FleetModel;
import coilbook.workbench.internal.model.FleetWork;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.text.Texts;

/**
 * The stations in the order of a query, of which only what is looked at is in memory: eight bytes for every row's id, and the rows of the last pages.
 */
public final class StationsPresenter implements Session.Listener {

    /** What shows the rows. */
    public interface View {
        /**
         * There are other rows now, or in another order.
         *
         * @param select the row to select, or -1
         */
        void rowsReplaced(int select);

        /** Rows that were pending have come, or have changed. */
        void rowsArrived();

        /** Another row is selected, or another number of rows. */
        void selectionChanged();

        /** Something could not be done; {@code null} takes the last such notice away. */
        void notice(String words);

        /** Whether there is a fleet, and whether anything is in it. */
        void welcome(boolean shown);
    }

    static final int PAGE = 100;
    private static final int ROWS_KEPT = 6_000;
    private static final int PAGES_WANTED = 4;

    private final Session session;
    private final FleetWork work;
    private final Background background;
    private final Texts texts = Texts.of(StationsPresenter.class);
    private final RowCache cache = new RowCache(ROWS_KEPT);
    private final Deque<Integer> wanted = new ArrayDeque<>();
    private final Map<StatusColumn, String> filters = new EnumMap<>(StatusColumn.class);
    private List<StatusQuery.Sort> sorts = List.of();
    private View view;
    private long[] ids = {};
    private long total;
    private FleetScope counted;
    private Background.Handle query = () -> {
    };
    private boolean fetching;
    private int selected = -1;
    private int selectedCount;

    public StationsPresenter(Session session, FleetWork work, Background background) {
        this.session = session;
        this.work = work;
        this.background = background;
    }

    /** Starts telling the view. */
    public void attach(View shown) {
        view = shown;
        session.add(this);
        fleetChanged();
    }

    /** Stops. */
    public void detach() {
        session.remove(this);
        query.cancel();
    }

    // --- what the grid asks ---

    public int rowCount() {
        return ids.length;
    }

    /** How many stations the fleet has in the part looked at, filtered or not. */
    public long total() {
        return total;
    }

    /** The row at an index, or {@code null}: it is then fetched, and the view is told when it has come. */
    public StatusRow row(int index) {
        if (index < 0 || index >= ids.length) {
            return null;
        }
        if (!cache.isFresh(ids[index])) {
            want(index / PAGE);
        }
        return cache.get(ids[index]);
    }

    /** The index of a station among the rows that are in memory, or -1. */
    public int indexOf(String station) {
        for (int i = 0; i < ids.length; i++) {
            StatusRow row = cache.get(ids[i]);
            if (row != null && row.station().equals(station)) {
                return i;
            }
        }
        return -1;
    }

    public boolean isEditable(StatusColumn column) {
        return session.fleet() != null && session.fleet().isEditable(column);
    }

    public boolean hasChoices(StatusColumn column) {
        return session.fleet() != null && session.fleet().hasChoices(column);
    }

    public List<StatusQuery.Sort> sorts() {
        return sorts;
    }

    public Map<StatusColumn, String> filters() {
        return filters;
    }

    // --- what the person does ---

    /** Orders the rows. */
    public void sort(List<StatusQuery.Sort> order) {
        sorts = List.copyOf(order);
        load();
    }

    /** Shows only rows that match an expression for each column. */
    public void filter(Map<StatusColumn, String> expressions) {
        if (!filters.equals(expressions)) {
            filters.clear();
            filters.putAll(expressions);
            load();
        }
    }

    /** Says which row is selected, and how many. */
    public void select(int index, int count) {
        selected = index;
        selectedCount = count;
        row(index);
        tellSelection();
        view.selectionChanged();
    }

    public int selectedCount() {
        return selectedCount;
    }

    /** Changes a cell. */
    public void edit(int index, StatusColumn column, String text) {
        StatusRow row = row(index);
        if (row == null) {
            return;
        }
        view.notice(null);
        work.edit(row.station(), column, text,
                error -> view.notice(texts.get("notTaken", row.station(), column.heading(), error.getMessage())));
    }

    // --- what the session tells ---

    @Override
    public void fleetChanged() {
        cache.clear();
        wanted.clear();
        ids = new long[0];
        filters.clear();
        sorts = List.of();
        selected = -1;
        selectedCount = 0;
        total = 0;
        counted = null;
        view.rowsReplaced(-1);
        view.notice(null);
        if (session.fleet() == null) {
            view.welcome(!session.isOpening());
        } else {
            view.welcome(false);
            load();
        }
    }

    @Override
    public void openingChanged() {
        if (session.fleet() == null) {
            view.welcome(!session.isOpening());
        }
    }

    @Override
    public void scopeChanged() {
        load();
    }

    @Override
    public void dataChanged() {
        cache.touch();
        counted = null;
        if (ids.length == 0) {
            load();
        } else {
            view.rowsArrived();
        }
    }

    /** Reads the order again: rows keep their place while they are edited, until the person asks for it. */
    public void load() {
        query.cancel();
        FleetModel fleet = session.fleet();
        if (fleet == null) {
            return;
        }
        List<StatusQuery.Filter> conditions = new ArrayList<>();
        filters.forEach((column, expression) -> conditions.add(new StatusQuery.Filter(column, expression)));
        StatusQuery asked = new StatusQuery(session.scope(), conditions, sorts);
        FleetScope scope = asked.scope();
        boolean filtered = !conditions.isEmpty();
        long known = scope.equals(counted) ? total : -1;
        record Answer(long[] ids, long total) {
        }
        query = background.start(texts.get("ordering"), Background.Lane.READ,
                progress -> {
                    long[] found = fleet.ids(asked);
                    return new Answer(found, !filtered ? found.length : known >= 0 ? known : fleet.counts(scope).stations());
                }, answer -> {
                    long before = selected >= 0 && selected < ids.length ? ids[selected] : -1;
                    ids = answer.ids;
                    total = answer.total;
                    counted = scope;
                    wanted.clear();
                    view.notice(null);
                    view.welcome(total == 0 && asked.scope().isAll());
                    view.rowsReplaced(position(before));
                }, this::failed);
    }

    /** Where the row that was selected stands now; else the first, so that its findings and its waveform show what the panes are for. */
    private int position(long id) {
        for (int i = 0; i < ids.length; i++) {
            if (ids[i] == id) {
                return i;
            }
        }
        return ids.length == 0 ? -1 : 0;
    }

    private void failed(CoilbookException error) {
        view.notice(error.getMessage());
    }

    private void want(int page) {
        if (wanted.contains(page)) {
            return;
        }
        wanted.addFirst(page);
        while (wanted.size() > PAGES_WANTED) {
            wanted.removeLast();
        }
        fetch();
    }

    private void fetch() {
        FleetModel fleet = session.fleet();
        if (fetching || wanted.isEmpty() || fleet == null) {
            return;
        }
        int page = wanted.peekFirst();
        int from = page * PAGE;
        if (from >= ids.length) {
            wanted.clear();
            return;
        }
        long[] asked = Arrays.copyOfRange(ids, from, Math.min(ids.length, from + PAGE));
        long age = cache.age();
        fetching = true;
        background.start(texts.get("fetching"), Background.Lane.READ, progress -> fleet.rows(asked), rows -> {
            fetching = false;
            wanted.remove(page);
            if (fleet == session.fleet()) {
                for (int i = 0; i < asked.length; i++) {
                    cache.put(asked[i], rows.get(i), age);
                }
                view.rowsArrived();
                tellSelection();
            }
            fetch();
        }, error -> {
            fetching = false;
            wanted.clear();
            failed(error);
        });
    }

    private void tellSelection() {
        StatusRow row = selected < 0 || selected >= ids.length ? null : cache.get(ids[selected]);
        if (row != null) {
            session.select(row.station());
        } else if (selected < 0) {
            session.select(null);
        }
    }
}
