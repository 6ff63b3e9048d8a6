package coilbook.workbench.internal.grid.style;

import org.eclipse.nebula.widgets.nattable.config.CellConfigAttributes;
import org.eclipse.nebula.widgets.nattable.config.IConfigRegistry;
import org.eclipse.nebula.widgets.nattable.grid.GridRegion;
import org.eclipse.nebula.widgets.nattable.painter.cell.TextPainter;
import org.eclipse.nebula.widgets.nattable.painter.cell.decorator.PaddingDecorator;
import org.eclipse.nebula.widgets.nattable.style.CellStyleAttributes;
import org.eclipse.nebula.widgets.nattable.style.DisplayMode;
import org.eclipse.nebula.widgets.nattable.style.HorizontalAlignmentEnum;
import org.eclipse.nebula.widgets.nattable.style.Style;
import org.eclipse.nebula.widgets.nattable.style.theme.IThemeExtension;
import org.eclipse.swt.graphics.Font;

import coilbook.workbench.internal.grid.data.CellLabels;
import coilbook.workbench.internal.grid.data.HeadingLabels;
import coilbook.workbench.internal.stations.VerdictMark;

/** Verdicts in the colours of warnings, numbers to the right, computed values muted under an italic heading. */
public final class MarkStyles implements IThemeExtension {

    private static final int PADDING = 4;
    /** The height of the headings, beside which the corner's word does not stand. */
    private static final int HEADING = 26;

    private final GridColours colours;
    private final Font bold;
    private final Font italic;

    public MarkStyles(GridColours colours, Font bold, Font italic) {
        this.colours = colours;
        this.bold = bold;
        this.italic = italic;
    }

    @Override
    public void registerStyles(IConfigRegistry registry) {
        painters(registry);
        for (DisplayMode mode : new DisplayMode[] { DisplayMode.NORMAL, DisplayMode.SELECT }) {
            Style hazard = new Style();
            hazard.setAttributeValue(CellStyleAttributes.FOREGROUND_COLOR, colours.hazard());
            hazard.setAttributeValue(CellStyleAttributes.FONT, bold);
            register(registry, hazard, mode, CellLabels.mark(VerdictMark.HAZARD));
            Style caution = new Style();
            caution.setAttributeValue(CellStyleAttributes.FOREGROUND_COLOR, colours.caution());
            register(registry, caution, mode, CellLabels.mark(VerdictMark.NONCONFORMITY));
            Style number = new Style();
            number.setAttributeValue(CellStyleAttributes.HORIZONTAL_ALIGNMENT, HorizontalAlignmentEnum.RIGHT);
            register(registry, number, mode, CellLabels.NUMBER);
            Style heading = new Style();
            heading.setAttributeValue(CellStyleAttributes.FONT, italic);
            register(registry, heading, mode, HeadingLabels.COMPUTED_HEADING);
        }
    }

    private static void painters(IConfigRegistry registry) {
        registry.registerConfigAttribute(CellConfigAttributes.CELL_PAINTER,
                new PaddingDecorator(new TextPainter(), HEADING, PADDING, 0, PADDING),
                DisplayMode.NORMAL, GridRegion.CORNER);
    }

    private static void register(IConfigRegistry registry, Style style, DisplayMode mode, String label) {
        registry.registerConfigAttribute(CellConfigAttributes.CELL_STYLE, style, mode, label);
    }

    @Override
    public void unregisterStyles(IConfigRegistry registry) {
        for (DisplayMode mode : new DisplayMode[] { DisplayMode.NORMAL, DisplayMode.SELECT }) {
            for (String label : new String[] { CellLabels.mark(VerdictMark.HAZARD), CellLabels.mark(VerdictMark.NONCONFORMITY),
                    CellLabels.NUMBER, HeadingLabels.COMPUTED_HEADING }) {
                registry.unregisterConfigAttribute(CellConfigAttributes.CELL_STYLE, mode, label);
            }
        }
    }
}
