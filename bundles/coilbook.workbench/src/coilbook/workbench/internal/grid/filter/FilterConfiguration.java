package coilbook.workbench.internal.grid.filter;

import org.eclipse.nebula.widgets.nattable.config.IConfigRegistry;
import org.eclipse.nebula.widgets.nattable.data.convert.DefaultDisplayConverter;
import org.eclipse.nebula.widgets.nattable.filterrow.config.DefaultFilterRowConfiguration;
import org.eclipse.nebula.widgets.nattable.filterrow.config.FilterRowConfigAttributes;

/** The filter row takes what the register's expressions take: words, or a comparison. What is typed reaches it as it is. */
public final class FilterConfiguration extends DefaultFilterRowConfiguration {

    @Override
    public void configureRegistry(IConfigRegistry configRegistry) {
        super.configureRegistry(configRegistry);
        configRegistry.registerConfigAttribute(FilterRowConfigAttributes.FILTER_DISPLAY_CONVERTER, new DefaultDisplayConverter());
        configRegistry.unregisterConfigAttribute(FilterRowConfigAttributes.TEXT_DELIMITER);
    }
}
