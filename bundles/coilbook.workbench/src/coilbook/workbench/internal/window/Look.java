package coilbook.workbench.internal.window;

import org.eclipse.e4.ui.css.swt.theme.IThemeEngine;
import org.eclipse.swt.widgets.Display;

import coilbook.workbench.internal.model.Session;

/** Light or dark, for everything at once: native widgets, style sheets, grid and charts. */
public final class Look {

    /** The id of the light style sheet. */
    public static final String LIGHT = "coilbook.theme.light";
    /** The id of the dark style sheet. */
    public static final String DARK = "coilbook.theme.dark";
    static final String KEY = "look";

    private final Session session;
    private final WindowState state;

    public Look(Session session, WindowState state) {
        this.session = session;
        this.state = state;
    }

    /** The look to start with: the remembered one, else the system's. */
    public void begin() {
        String remembered = state.word(KEY, "");
        boolean dark = remembered.isEmpty() ? Display.isSystemDarkTheme() : "dark".equals(remembered);
        NativeLook.prefer(dark);
        session.dark(dark);
    }

    /** Changes the look while the window is open. */
    public void choose(boolean dark, IThemeEngine engine) {
        NativeLook.prefer(dark);
        if (engine != null) {
            engine.setTheme(dark ? DARK : LIGHT, false);
        }
        session.dark(dark);
        state.put(KEY, dark ? "dark" : "light");
    }

    /** The id of the style sheet of the present look. */
    public String sheet() {
        return session.isDark() ? DARK : LIGHT;
    }
}
