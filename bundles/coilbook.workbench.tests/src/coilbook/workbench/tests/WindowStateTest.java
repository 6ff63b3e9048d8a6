package coilbook.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.nio.file.Files;
import java.nio.file.Path;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import coilbook.workbench.internal.window.WindowState;

/** What the window remembers comes back, and whatever is wrong with its file costs no more than that. */
class WindowStateTest {

    @TempDir
    Path folder;

    @Test
    void whatWasRememberedComesBack() {
        Path file = folder.resolve("new folder/window.properties");
        WindowState state = new WindowState(file);
        state.put("width", 1234);
        state.put("look", "dark");
        state.save();
        WindowState again = new WindowState(file);
        assertEquals(1234, again.number("width", 1));
        assertEquals("dark", again.word("look", ""));
        assertEquals(7, again.number("height", 7));
        assertFalse(Files.exists(folder.resolve("new folder/window.properties.new")), "nothing half written is left");
    }

    @Test
    void aDamagedFileIsAsGoodAsNone() throws Exception {
        Path file = folder.resolve("window.properties");
        Files.write(file, new byte[] { 'w', 'i', 'd', 't', 'h', '=', (byte) 0xff, (byte) 0xfe, '\\', 'u', 'z', 'z' });
        assertEquals(5, new WindowState(file).number("width", 5));
        Files.writeString(file, "width=wide\n");
        assertEquals(5, new WindowState(file).number("width", 5));
    }

    @Test
    void aPlaceThatCannotBeWrittenStopsNothing() throws Exception {
        Path file = folder.resolve("a file");
        Files.writeString(file, "not a folder");
        WindowState state = new WindowState(file.resolve("window.properties"));
        state.put("x", 3);
        state.save();
        assertEquals("not a folder", Files.readString(file));
        new WindowState(null).save();
    }
}
