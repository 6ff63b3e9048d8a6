package coilbook.workbench.internal.grid.sort;

import org.eclipse.nebula.widgets.nattable.config.AbstractRegistryConfiguration;
import org.eclipse.nebula.widgets.nattable.config.IConfigRegistry;
import org.eclipse.nebula.widgets.nattable.sort.action.SortColumnAction;
import org.eclipse.nebula.widgets.nattable.sort.event.ColumnHeaderClickEventMatcher;
import org.eclipse.nebula.widgets.nattable.ui.binding.UiBindingRegistry;
import org.eclipse.swt.SWT;

/** A click on a heading sorts, with Ctrl it sorts by one more column. These come before the bindings that select a whole column. */
public final class SortBindings extends AbstractRegistryConfiguration {

    @Override
    public void configureRegistry(IConfigRegistry configRegistry) {
        // the look of sorted headings belongs to the theme
    }

    @Override
    public void configureUiBindings(UiBindingRegistry bindings) {
        bindings.registerFirstSingleClickBinding(new ColumnHeaderClickEventMatcher(SWT.NONE, 1), new SortColumnAction(false));
        bindings.registerFirstSingleClickBinding(new ColumnHeaderClickEventMatcher(SWT.MOD1, 1), new SortColumnAction(true));
    }
}
