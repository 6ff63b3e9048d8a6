package coilbook.workbench.internal.why;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.e4.ui.di.Focus;
import org.eclipse.jface.resource.FontDescriptor;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.resource.LocalResourceManager;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StyleRange;
import org.eclipse.swt.custom.StyledText;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.Font;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;

import coilbook.workbench.internal.grid.style.GridColours;
import coilbook.workbench.internal.model.Background;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.text.Texts;
import coilbook.workbench.internal.window.PaneHeading;
import jakarta.annotation.PostConstruct;
import jakarta.annotation.PreDestroy;
import jakarta.inject.Inject;

/** The pane that tells why: read-only text, so that it can be read aloud, selected and copied. */
public final class WhyPart implements WhyPresenter.View {

    private final WhyPresenter presenter;
    private final Texts texts = Texts.of(WhyPart.class);
    private StyledText area;
    private Font bold;
    private Font title;
    private GridColours colours = GridColours.of(false);
    private WhyText shown = new WhyText();

    @Inject
    public WhyPart(Session session, Background background) {
        presenter = new WhyPresenter(session, background);
    }

    @PostConstruct
    void create(Composite parent) {
        PaneHeading.column(parent);
        new PaneHeading(parent, texts.get("title"), 0);
        area = new StyledText(parent, SWT.MULTI | SWT.READ_ONLY | SWT.WRAP | SWT.V_SCROLL);
        area.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        area.setMargins(10, 6, 10, 6);
        area.setCaret(null);
        area.setAlwaysShowScrollBars(false);
        LocalResourceManager fonts = new LocalResourceManager(JFaceResources.getResources(), area);
        bold = fonts.create(FontDescriptor.createFrom(area.getFont()).setStyle(SWT.BOLD));
        title = fonts.create(FontDescriptor.createFrom(area.getFont()).setStyle(SWT.BOLD).increaseHeight(1));
        presenter.attach(this);
    }

    @Override
    public void show(WhyText text, boolean keepPlace) {
        if (area.isDisposed()) {
            return;
        }
        int top = area.getTopPixel();
        shown = text;
        area.setText(text.text());
        style();
        area.setTopPixel(keepPlace ? top : 0);
    }

    @Override
    public void look(boolean dark) {
        if (!area.isDisposed()) {
            colours = GridColours.of(dark);
            area.setBackground(colours.background());
            area.setForeground(colours.text());
            style();
        }
    }

    private void style() {
        List<StyleRange> ranges = new ArrayList<>();
        for (WhyText.Piece piece : shown.pieces()) {
            StyleRange range = new StyleRange(piece.start(), piece.length(), colour(piece.style()), null);
            range.font = switch (piece.style()) {
                case TITLE -> title;
                case HAZARD, HEADING, NONCONFORMITY -> bold;
                default -> null;
            };
            ranges.add(range);
        }
        area.setStyleRanges(ranges.toArray(StyleRange[]::new));
    }

    private Color colour(WhyText.Style style) {
        return switch (style) {
            case HAZARD, CAUTION -> colours.hazard();
            case NONCONFORMITY -> colours.caution();
            case MUTED -> colours.muted();
            default -> colours.text();
        };
    }

    @Focus
    void focus() {
        area.setFocus();
    }

    @PreDestroy
    void dispose() {
        presenter.detach();
    }
}
