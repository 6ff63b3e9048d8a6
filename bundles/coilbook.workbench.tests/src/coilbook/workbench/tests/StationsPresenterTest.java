package coilbook.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;

import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import coilbook.register.FleetScope;
import coilbook.register.StatusColumn;
import coilbook.register.StatusQuery;
import coilbook.workbench.internal.model.FleetWork;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.stations.StationsPresenter;
import coilbook.workbench.tests.fake.FakeFleet;
import coilbook.workbench.tests.fake.FakeFleets;
import coilbook.workbench.tests.fake.ManualBackground;

/** The grid's presenter, without a display. */
class StationsPresenterTest {

    private final Session session = new Session();
    private final ManualBackground background = new ManualBackground();
    private final FleetWork work = new FleetWork(session, new FakeFleets(Path.of("nowhere"), false), background);
    private final StationsPresenter presenter = new StationsPresenter(session, work, background);
    private final Told view = new Told();

    private static final class Told implements StationsPresenter.View {
        private int replaced;
        private int arrived;
        private int select = -1;
        private String notice;
        private boolean welcome;

        @Override
        public void rowsReplaced(int selected) {
            replaced++;
            select = selected;
        }

        @Override
        public void rowsArrived() {
            arrived++;
        }

        @Override
        public void selectionChanged() {
            // counted by nobody
        }

        @Override
        public void notice(String words) {
            notice = words;
        }

        @Override
        public void welcome(boolean shown) {
            welcome = shown;
        }
    }

    @BeforeEach
    void attach() {
        presenter.attach(view);
    }

    private void open(int stations) {
        session.open(new FakeFleet("f", stations, false));
        background.runAll();
    }

    @Test
    void withoutAFleetOrWithAnEmptyOneTheBeginningIsOffered() {
        assertTrue(view.welcome);
        open(0);
        assertTrue(view.welcome);
        open(3);
        assertFalse(view.welcome);
        assertEquals(3, presenter.rowCount());
        assertEquals(0, view.select);
    }

    @Test
    void aRowIsPendingUntilItsPageHasCome() {
        open(1_000);
        assertNull(presenter.row(450));
        assertNull(presenter.row(451));
        assertEquals(1, background.waiting(), "one question for one page");
        background.runAll();
        assertNotNull(presenter.row(450));
        assertNotNull(presenter.row(499));
        assertEquals(0, background.waiting(), "the page is known by now");
        assertEquals(1, view.arrived);
    }

    @Test
    void onlyTheLastPagesLookedAtAreFetched() {
        open(100_000);
        for (int row = 0; row < 100_000; row += 100) {
            presenter.row(row);
        }
        background.runAll();
        assertTrue(view.arrived <= 5, "scrolling past a thousand pages fetches a few, not " + view.arrived);
        assertNotNull(presenter.row(99_999));
    }

    @Test
    void anEditShowsTheOldRowUntilTheNewHasCome() {
        open(50);
        presenter.row(3);
        background.runAll();
        assertEquals(FakeFleet.BAD_COIL, presenter.row(3).get(StatusColumn.COIL_TYPE));
        presenter.edit(3, StatusColumn.COIL_TYPE, FakeFleet.GOOD_COIL);
        background.runOne();
        assertEquals(FakeFleet.BAD_COIL, presenter.row(3).get(StatusColumn.COIL_TYPE), "not blank meanwhile");
        background.runAll();
        assertEquals(FakeFleet.GOOD_COIL, presenter.row(3).get(StatusColumn.COIL_TYPE));
        assertEquals("Coil type at PLT000/L1/=V4: C-24", session.steps().undo());
        work.undo(error -> view.notice(error.getMessage()));
        background.runAll();
        presenter.row(3);
        background.runAll();
        assertEquals(FakeFleet.BAD_COIL, presenter.row(3).get(StatusColumn.COIL_TYPE));
        assertNull(session.steps().undo());
        assertEquals("Coil type at PLT000/L1/=V4: C-24", session.steps().redo());
    }

    @Test
    void whatCannotBeRecordedIsSaidWithStationAndColumn() {
        open(50);
        presenter.row(3);
        background.runAll();
        presenter.edit(3, StatusColumn.COIL_TYPE, "nonsense");
        background.runAll();
        assertTrue(view.notice.contains("PLT000/L1/=V4") && view.notice.contains("Coil type") && view.notice.contains("nonsense"),
                view.notice);
        assertEquals(FakeFleet.BAD_COIL, presenter.row(3).get(StatusColumn.COIL_TYPE));
    }

    @Test
    void aSortKeepsTheSelectedStationSelected() {
        open(50);
        presenter.row(3);
        background.runAll();
        presenter.select(3, 1);
        assertEquals("PLT000/L1/=V4", session.station());
        presenter.sort(List.of(new StatusQuery.Sort(StatusColumn.COIL_TYPE, false), new StatusQuery.Sort(StatusColumn.STATION, true)));
        background.runAll();
        presenter.row(view.select);
        background.runAll();
        assertEquals("PLT000/L1/=V4", presenter.row(view.select).station());
        assertEquals(FakeFleet.BAD_COIL, presenter.row(0).get(StatusColumn.COIL_TYPE));
    }

    @Test
    void filterAndPlaceNarrowTheRows() {
        open(400);
        presenter.filter(Map.of(StatusColumn.COIL_TYPE, "110"));
        background.runAll();
        assertEquals(57, presenter.rowCount(), "3, 10, 17 … 395");
        assertEquals(400, presenter.total());
        session.look(FleetScope.sites(List.of("PLT000")));
        background.runAll();
        assertEquals(6, presenter.rowCount(), "3, 10, 17, 24, 31, 38");
        assertEquals(40, presenter.total());
        int before = view.replaced;
        presenter.filter(Map.of());
        background.runAll();
        assertEquals(40, presenter.rowCount());
        assertEquals(before + 1, view.replaced);
    }

    @Test
    void anAnswerThatComesLateIsNotShown() {
        open(400);
        presenter.filter(Map.of(StatusColumn.COIL_TYPE, "110"));
        presenter.filter(Map.of(StatusColumn.COIL_TYPE, "24"));
        background.runAll();
        assertEquals(343, presenter.rowCount());
    }
}
