package coilbook.workbench.tests;

import java.nio.file.Path;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledIfSystemProperty;
import org.junit.jupiter.api.io.TempDir;

import coilbook.workbench.internal.model.Fleets;
import coilbook.workbench.tests.fake.StoryFleets;
import coilbook.workbench.tests.story.LayoutStory;
import coilbook.workbench.tests.support.Services;
import coilbook.workbench.tests.support.WindowRun;

/** Keeps pictures of the window: what {@code releng/screens} runs at 100 % and at 200 %. Without a folder for them {@link WindowTest} walks the layout. */
@EnabledIfSystemProperty(named = LayoutStory.PROPERTY, matches = "(?!none$).+")
class ScreensTest {

    @TempDir
    Path folder;

    @Test
    void nothingIsCutOffOrOverlapsInAnyLook() throws Exception {
        WindowRun.run(new StoryFleets(Services.get(Fleets.class), folder), window -> new LayoutStory().play(window));
    }
}
