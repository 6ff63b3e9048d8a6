package coilbook.workbench.internal.window;

import java.util.logging.Level;
import java.util.logging.Logger;

import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Display;

/**
 * Asks GTK for its dark widgets. SWT has no public call for it, and style sheets do not reach menus, scroll bars and file dialogs, which would stay white in
 * a dark window; where the call is gone they stay white and nothing else happens.
 */
final class NativeLook {

    private static final Logger LOG = Logger.getLogger(NativeLook.class.getName());

    private NativeLook() {
    }

    static void prefer(boolean dark) {
        if (!"gtk".equals(SWT.getPlatform())) {
            return;
        }
        try {
            Class.forName("org.eclipse.swt.internal.gtk.OS", true, Display.class.getClassLoader())
                    .getMethod("setDarkThemePreferred", boolean.class).invoke(null, dark);
        } catch (ReflectiveOperationException | LinkageError e) {
            LOG.log(Level.FINE, "GTK keeps its own look", e);
        }
    }
}
