package coilbook.workbench.internal.window;

import java.util.List;

import org.eclipse.e4.ui.model.application.MApplication;
import org.eclipse.e4.ui.model.application.ui.MUIElement;
import org.eclipse.e4.ui.model.application.ui.advanced.MArea;
import org.eclipse.e4.ui.model.application.ui.basic.MWindow;
import org.eclipse.e4.ui.workbench.modeling.EModelService;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Display;

import coilbook.workbench.internal.WorkbenchIds;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.text.Texts;

/** Where the window stands, how it is divided, and what its title says. */
public final class WindowFrame implements Session.Listener {

    private static final int LEAST_WIDTH = 640;
    private static final int LEAST_HEIGHT = 480;

    private final MApplication application;
    private final EModelService models;
    private final WindowState state;
    private final Session session;
    private final Texts texts = Texts.of(WindowFrame.class);

    public WindowFrame(MApplication application, EModelService models, WindowState state, Session session) {
        this.application = application;
        this.models = models;
        this.state = state;
        this.session = session;
        session.add(this);
    }

    private MWindow window() {
        return (MWindow) models.find(WorkbenchIds.WINDOW, application);
    }

    /** Puts the window where it stood, as far as that is on a screen now. */
    public void restore() {
        MWindow window = window();
        Rectangle screen = Display.getCurrent().getPrimaryMonitor().getClientArea();
        int width = Math.max(LEAST_WIDTH, Math.min(screen.width, state.number("width", screen.width * 9 / 10)));
        int height = Math.max(LEAST_HEIGHT, Math.min(screen.height, state.number("height", screen.height * 9 / 10)));
        Rectangle all = Display.getCurrent().getBounds();
        window.setX(Math.max(all.x, Math.min(state.number("x", screen.x + (screen.width - width) / 2), all.x + all.width - LEAST_WIDTH)));
        window.setY(
                Math.max(all.y, Math.min(state.number("y", screen.y + (screen.height - height) / 2), all.y + all.height - LEAST_HEIGHT)));
        window.setWidth(width);
        window.setHeight(height);
        for (String id : divided()) {
            MUIElement part = models.find(id, application);
            if (part != null && state.number("share." + id, 0) > 0) {
                part.setContainerData(Integer.toString(state.number("share." + id, 0)));
            }
        }
    }

    /** Remembers where the window stands. */
    public void remember() {
        MWindow window = window();
        state.put("x", window.getX());
        state.put("y", window.getY());
        state.put("width", window.getWidth());
        state.put("height", window.getHeight());
        for (String id : divided()) {
            MUIElement part = models.find(id, application);
            if (part != null && part.getContainerData() != null && !(part instanceof MArea)) {
                state.put("share." + id, part.getContainerData());
            }
        }
        state.save();
    }

    private static List<String> divided() {
        return List.of(WorkbenchIds.PLACES, WorkbenchIds.RIGHT, WorkbenchIds.STATIONS, WorkbenchIds.BELOW, WorkbenchIds.WHY,
                WorkbenchIds.WAVEFORM);
    }

    @Override
    public void fleetChanged() {
        window().setLabel(session.fleet() == null ? WorkbenchIds.NAME : texts.get("title", session.fleet().name()));
    }
}
