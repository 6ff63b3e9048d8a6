package coilbook.workbench.internal.grid;

import org.eclipse.nebula.widgets.nattable.selection.config.DefaultSelectionLayerConfiguration;

/** Selection as it is usual in grids, without the stock search and tick bindings: both would ask every row on the window's thread. */
final class SelectionConfiguration extends DefaultSelectionLayerConfiguration {

    @Override
    protected void addSearchUIBindings() {
        // the filter row searches, by asking the register
    }

    @Override
    protected void addTickUpdateConfig() {
        // numbers are typed
    }
}
