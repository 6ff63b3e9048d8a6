package coilbook.workbench.internal.grid.style;

import org.eclipse.nebula.widgets.nattable.style.theme.DarkNatTableThemeConfiguration;
import org.eclipse.nebula.widgets.nattable.style.theme.DefaultNatTableThemeConfiguration;
import org.eclipse.nebula.widgets.nattable.style.theme.ModernNatTableThemeConfiguration;
import org.eclipse.nebula.widgets.nattable.style.theme.ThemeConfiguration;
import org.eclipse.swt.graphics.Font;
import org.eclipse.swt.widgets.Display;

/** The grid's look, light and dark, in the window's own font and colours. */
public final class GridTheme {

    private GridTheme() {
    }

    /** The theme of a look. */
    public static ThemeConfiguration of(boolean dark, Display display, GridColours c) {
        DefaultNatTableThemeConfiguration theme = dark ? new DarkNatTableThemeConfiguration() : new ModernNatTableThemeConfiguration();
        Font font = display.getSystemFont();
        theme.defaultFont = font;
        theme.cHeaderFont = font;
        theme.rHeaderFont = font;
        theme.cornerFont = font;
        theme.filterRowFont = font;
        theme.defaultSelectionFont = font;
        theme.cHeaderSelectionFont = font;
        theme.rHeaderSelectionFont = font;
        theme.selectionAnchorFont = font;
        theme.selectionAnchorSelectionFont = font;
        theme.sortHeaderFont = font;
        theme.selectedSortHeaderFont = font;
        theme.defaultBgColor = c.background();
        theme.defaultFgColor = c.text();
        theme.evenRowBgColor = c.background();
        theme.evenRowFgColor = c.text();
        theme.oddRowBgColor = c.stripe();
        theme.oddRowFgColor = c.text();
        theme.cHeaderBgColor = c.heading();
        theme.cHeaderFgColor = c.text();
        theme.rHeaderBgColor = c.heading();
        theme.rHeaderFgColor = c.muted();
        theme.cornerBgColor = c.heading();
        theme.cornerFgColor = c.text();
        theme.filterRowBgColor = c.filter();
        theme.filterRowFgColor = c.text();
        theme.cHeaderSelectionBgColor = c.headingSelected();
        theme.cHeaderSelectionFgColor = c.text();
        theme.rHeaderSelectionBgColor = c.headingSelected();
        theme.rHeaderSelectionFgColor = c.text();
        theme.cHeaderFullSelectionBgColor = c.headingSelected();
        theme.cHeaderFullSelectionFgColor = c.text();
        theme.rHeaderFullSelectionBgColor = c.headingSelected();
        theme.rHeaderFullSelectionFgColor = c.text();
        theme.defaultSelectionBgColor = c.selection();
        theme.defaultSelectionFgColor = c.text();
        theme.selectionAnchorBgColor = c.selection();
        theme.selectionAnchorFgColor = c.text();
        theme.selectionAnchorSelectionBgColor = c.anchor();
        theme.selectionAnchorSelectionFgColor = c.text();
        theme.gridLineColor = c.line();
        theme.freezeSeparatorColor = c.separator();
        theme.conversionErrorFgColor = c.hazard();
        theme.validationErrorFgColor = c.hazard();
        theme.defaultGradientBgColor = c.background();
        theme.defaultGradientFgColor = c.background();
        theme.evenRowGradientBgColor = c.background();
        theme.evenRowGradientFgColor = c.background();
        theme.oddRowGradientBgColor = c.stripe();
        theme.oddRowGradientFgColor = c.stripe();
        theme.cHeaderGradientBgColor = c.heading();
        theme.cHeaderGradientFgColor = c.heading();
        theme.rHeaderGradientBgColor = c.heading();
        theme.rHeaderGradientFgColor = c.heading();
        theme.cornerGradientBgColor = c.heading();
        theme.cornerGradientFgColor = c.heading();
        theme.filterRowGradientBgColor = c.filter();
        theme.filterRowGradientFgColor = c.filter();
        theme.cHeaderSelectionGradientBgColor = c.headingSelected();
        theme.cHeaderSelectionGradientFgColor = c.headingSelected();
        theme.rHeaderSelectionGradientBgColor = c.headingSelected();
        theme.rHeaderSelectionGradientFgColor = c.headingSelected();
        theme.cHeaderFullSelectionGradientBgColor = c.headingSelected();
        theme.cHeaderFullSelectionGradientFgColor = c.headingSelected();
        theme.rHeaderFullSelectionGradientBgColor = c.headingSelected();
        theme.rHeaderFullSelectionGradientFgColor = c.headingSelected();
        theme.defaultSelectionGradientBgColor = c.selection();
        theme.defaultSelectionGradientFgColor = c.selection();
        theme.selectionAnchorGradientBgColor = c.selection();
        theme.selectionAnchorGradientFgColor = c.selection();
        theme.selectionAnchorSelectionGradientBgColor = c.anchor();
        theme.selectionAnchorSelectionGradientFgColor = c.anchor();
        theme.cornerFgColor = c.muted();
        theme.sortHeaderBgColor = c.heading();
        theme.sortHeaderFgColor = c.text();
        theme.selectedSortHeaderBgColor = c.headingSelected();
        theme.selectedSortHeaderFgColor = c.text();
        theme.cornerSelectionBgColor = c.heading();
        return theme;
    }
}
