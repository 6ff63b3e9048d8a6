package coilbook.workbench.internal.waveform;

import org.eclipse.e4.ui.di.Focus;
import org.eclipse.swt.SWT;
import org.eclipse.swt.accessibility.AccessibleAdapter;
import org.eclipse.swt.accessibility.AccessibleEvent;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;

import coilbook.workbench.internal.model.Background;
import coilbook.workbench.internal.model.Corner;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.text.Texts;
import coilbook.workbench.internal.window.PaneHeading;
import jakarta.annotation.PostConstruct;
import jakarta.annotation.PreDestroy;
import jakarta.inject.Inject;

/** The pane with the waveform of the selected station, at a corner of choice. */
public final class WaveformPart {

    private final Session session;
    private final WaveformPresenter presenter;
    private final Texts texts = Texts.of(WaveformPart.class);
    private Combo corner;

    @Inject
    public WaveformPart(Session session, Background background) {
        this.session = session;
        presenter = new WaveformPresenter(session, background);
    }

    @PostConstruct
    void create(Composite parent) {
        PaneHeading.column(parent);
        PaneHeading heading = new PaneHeading(parent, texts.get("title"), 1);
        corner = new Combo(heading.row(), SWT.DROP_DOWN | SWT.READ_ONLY);
        for (Corner choice : Corner.values()) {
            corner.add(texts.get("corner." + choice.name()));
        }
        corner.setToolTipText(texts.get("corner"));
        corner.getAccessible().addAccessibleListener(new AccessibleAdapter() {
            @Override
            public void getName(AccessibleEvent event) {
                event.result = texts.get("corner");
            }
        });
        corner.select(presenter.corner().ordinal());
        corner.addListener(SWT.Selection, event -> presenter.choose(Corner.values()[corner.getSelectionIndex()]));
        ChartCanvas canvas = new ChartCanvas(parent, session, presenter);
        canvas.control().setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        presenter.attach(canvas);
    }

    @Focus
    void focus() {
        corner.setFocus();
    }

    @PreDestroy
    void dispose() {
        presenter.detach();
    }
}
