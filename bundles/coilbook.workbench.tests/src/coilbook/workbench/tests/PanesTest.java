package coilbook.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;

import org.junit.jupiter.api.Test;

import coilbook.charts.ChartSize;
import coilbook.register.FleetScope;
import coilbook.workbench.internal.model.Corner;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.places.PlaceNode;
import coilbook.workbench.internal.places.PlacesPresenter;
import coilbook.workbench.internal.waveform.ChartPicture;
import coilbook.workbench.internal.waveform.WaveformPresenter;
import coilbook.workbench.internal.why.WhyPresenter;
import coilbook.workbench.internal.why.WhyText;
import coilbook.workbench.tests.fake.FakeFleet;
import coilbook.workbench.tests.fake.ManualBackground;

/** The presenters of the panes around the grid, without a display. */
class PanesTest {

    private final Session session = new Session();
    private final ManualBackground background = new ManualBackground();

    private void select(String station) {
        session.open(new FakeFleet("f", 200, false));
        session.select(station);
        background.runAll();
    }

    @Test
    void whyTellsHazardsFirstUnderTheCautions() {
        List<WhyText> shown = new ArrayList<>();
        WhyPresenter why = new WhyPresenter(session, background);
        why.attach(new WhyPresenter.View() {
            @Override
            public void show(WhyText text, boolean keepPlace) {
                shown.add(text);
            }

            @Override
            public void look(boolean dark) {
                // nothing to paint
            }
        });
        select("PLT000/L1/=V4");
        String text = shown.get(shown.size() - 1).text();
        int caution = text.indexOf("isolate and lock out");
        int hazard = text.indexOf("▲ hazard  Is the coil made for this driver's output?");
        int nonconformity = text.indexOf("✖ nonconformity  Does the current reach the pull-in current?");
        int met = text.indexOf("✔ Criteria met (1)");
        assertTrue(caution > 0 && hazard > caution && nonconformity > hazard && met > nonconformity, text);
        assertTrue(text.contains("Peak current 0.21 A at 207 V") && text.contains("Limit: catalogue entry")
                && text.contains("licensed electrician"), text);
        assertTrue(!text.contains(" is safe"), text);
    }

    @Test
    void whyNamesWhatIsMissing() {
        List<WhyText> shown = new ArrayList<>();
        new WhyPresenter(session, background).attach(new WhyPresenter.View() {
            @Override
            public void show(WhyText text, boolean keepPlace) {
                shown.add(text);
            }

            @Override
            public void look(boolean dark) {
                // nothing to paint
            }
        });
        select("PLT000/L1/=V1");
        String text = shown.get(shown.size() - 1).text();
        assertTrue(text.contains("? undetermined") && text.contains("Missing: Closing delay"), text);
    }

    @Test
    void waveformFollowsStationCornerAndSize() {
        List<Object> shown = new ArrayList<>();
        ChartSize[] size = { null };
        WaveformPresenter waveform = new WaveformPresenter(session, background);
        waveform.attach(new WaveformPresenter.View() {
            @Override
            public ChartSize size() {
                return size[0];
            }

            @Override
            public void show(ChartPicture chart, String note) {
                shown.add(chart);
            }

            @Override
            public void showWords(String words) {
                shown.add(words);
            }
        });
        select("PLT000/L1/=V4");
        assertEquals(0, shown.stream().filter(ChartPicture.class::isInstance).count(), "no room, no chart");
        size[0] = new ChartSize(400, 300, 2);
        waveform.draw();
        background.runAll();
        ChartPicture picture = (ChartPicture) shown.get(shown.size() - 1);
        assertEquals(800, picture.chart().image().getWidth());
        assertEquals(3 * 800 * 600, picture.pixels().length);
        assertEquals(3 * 400 * 300, picture.plainPixels().length);
        waveform.choose(Corner.LOW);
        background.runAll();
        assertNotNull(shown.get(shown.size() - 1));
        // 60 ms on, then 0.85 A · exp(-120 t) at the low corner: 0.252 A at the sample nearest to 70 ms, which is that of 70.1 ms
        assertTrue(waveform.readout(0.070).contains("0.252 A"), waveform.readout(0.070));
        assertEquals("", waveform.readout(Double.NaN));
    }

    @Test
    void placesFormATreeAndChoosingOneNarrowsTheScope() {
        PlaceNode[] root = new PlaceNode[1];
        PlacesPresenter places = new PlacesPresenter(session, background);
        places.attach(new PlacesPresenter.View() {
            @Override
            public void show(PlaceNode shown) {
                root[0] = shown;
            }

            @Override
            public void failed(String words) {
                throw new AssertionError(words);
            }

            @Override
            public void look(boolean dark) {
                // nothing to paint
            }
        });
        assertNull(root[0]);
        select(null);
        assertEquals(200, root[0].counts().stations());
        assertEquals(List.of("Aldmoor", "Brennholm"), root[0].children().stream().map(PlaceNode::name).toList());
        PlaceNode site = root[0].children().get(1).children().get(0);
        assertEquals("PLT001", site.name());
        assertEquals(4, site.children().size());
        places.choose(site.children().get(2));
        assertEquals(new FleetScope(List.of(), List.of(), List.of("PLT001/L3"), List.of()), session.scope());
    }
}
