package coilbook.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.DynamicTest.dynamicTest;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

import org.eclipse.nebula.widgets.nattable.NatTable;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;
import org.junit.jupiter.api.io.TempDir;

import coilbook.workbench.internal.model.Fleets;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.window.WindowState;
import coilbook.workbench.tests.fake.FakeFleet;
import coilbook.workbench.tests.fake.StoryFleets;
import coilbook.workbench.tests.story.EditStory;
import coilbook.workbench.tests.story.ErrorsStory;
import coilbook.workbench.tests.story.LargeFleetStory;
import coilbook.workbench.tests.story.LayoutStory;
import coilbook.workbench.tests.story.RefusedStory;
import coilbook.workbench.tests.story.SortFilterStory;
import coilbook.workbench.tests.story.Story;
import coilbook.workbench.tests.support.Services;
import coilbook.workbench.tests.support.WindowRun;

/** The whole window, started once: GTK does not bear a second display in one process, so the stories are played one after the other in the same window. */
class WindowTest {

    @TempDir
    Path folder;

    @TestFactory
    Stream<DynamicTest> stories() throws Exception {
        Path base = folder.resolve("fleet");
        EditStory edit = EditStory.prepare(base);
        List<Story> stories = List.of(edit, new RefusedStory(), new SortFilterStory(), new ErrorsStory(), new LargeFleetStory(),
                new LayoutStory());
        Map<Story, Throwable> failures = new LinkedHashMap<>();
        StoryFleets fleets = new StoryFleets(Services.get(Fleets.class), folder);
        WindowRun.run(fleets, window -> {
            NatTable grid = window.grid();
            Session session = window.service(Session.class);
            window.await("the person's own register is shown", () -> session.station() != null && grid.getRowCount() > 5);
            for (Story story : stories) {
                try {
                    story.play(window);
                } catch (Throwable failure) {
                    failures.put(story, failure);
                }
            }
        });
        return Stream.concat(stories.stream().map(story -> dynamicTest(story.name(), () -> {
            if (failures.containsKey(story)) {
                throw failures.get(story);
            }
        })), Stream.of(dynamicTest("what was typed is in the file", () -> edit.checkFile(base)),
                dynamicTest("the window lets go of the fleet and remembers its place", () -> {
                    assertTrue(((FakeFleet) fleets.last()).isClosed());
                    assertEquals("dark", new WindowState(folder.resolve("window.properties")).word("look", ""));
                })));
    }
}
