package coilbook.workbench.internal.grid.edit;

import java.util.List;
import java.util.logging.Level;
import java.util.logging.Logger;

import org.eclipse.nebula.widgets.nattable.NatTable;

/**
 * Loads in the background what the first editor needs: its classes and their collections take longer to find than the window's thread may be held up, and
 * the first cell that is opened would pay for them.
 */
public final class EditorWarmUp {

    private static final Logger LOG = Logger.getLogger(EditorWarmUp.class.getName());
    private static final List<String> CLASSES = List.of("org.eclipse.nebula.widgets.nattable.edit.EditController",
            "org.eclipse.nebula.widgets.nattable.edit.InlineEditHandler", "org.eclipse.nebula.widgets.nattable.widget.NatCombo",
            "org.eclipse.nebula.widgets.nattable.edit.editor.ControlDecorationProvider",
            "org.eclipse.nebula.widgets.nattable.edit.editor.TextCellEditor",
            "org.eclipse.nebula.widgets.nattable.edit.CellEditorCreatedEvent",
            "org.eclipse.collections.api.factory.primitive.ObjectIntMaps", "org.eclipse.collections.api.factory.primitive.IntObjectMaps",
            "org.eclipse.collections.api.factory.primitive.IntSets", "org.eclipse.collections.api.factory.primitive.IntLists");

    private EditorWarmUp() {
    }

    /** Loads them; not on the window's thread. */
    public static void run() {
        for (String name : CLASSES) {
            try {
                Class.forName(name, true, NatTable.class.getClassLoader());
            } catch (ClassNotFoundException | LinkageError e) {
                LOG.log(Level.FINE, "The first editor will load it: " + name, e);
            }
        }
    }
}
