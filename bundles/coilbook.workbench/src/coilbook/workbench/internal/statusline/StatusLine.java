package coilbook.workbench.internal.statusline;

import java.util.concurrent.atomic.AtomicBoolean;

import org.eclipse.e4.ui.di.UISynchronize;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.ProgressBar;

import coilbook.workbench.internal.model.RunningWork;
import coilbook.workbench.internal.text.Texts;
import jakarta.annotation.PostConstruct;
import jakarta.inject.Inject;

/** The line at the foot of the window: how many rows are shown and selected, and the work under way with a way to cancel it. */
public final class StatusLine {

    private static final int BAR_STEPS = 1000;

    private final RunningWork running;
    private final RowCounts counts;
    private final UISynchronize window;
    private final Texts texts = Texts.of(StatusLine.class);
    private final AtomicBoolean queued = new AtomicBoolean();
    private Composite line;
    private Label rows;
    private Label work;
    private ProgressBar bar;
    private Button cancel;

    @Inject
    public StatusLine(RunningWork running, RowCounts counts, UISynchronize window) {
        this.running = running;
        this.counts = counts;
        this.window = window;
    }

    @PostConstruct
    void create(Composite parent) {
        line = new Composite(parent, SWT.NONE);
        GridLayout layout = new GridLayout(4, false);
        layout.marginHeight = 2;
        layout.marginWidth = 8;
        line.setLayout(layout);
        rows = new Label(line, SWT.NONE);
        rows.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
        work = new Label(line, SWT.NONE);
        work.setLayoutData(new GridData(SWT.END, SWT.CENTER, false, false));
        bar = new ProgressBar(line, SWT.HORIZONTAL | SWT.SMOOTH);
        bar.setMaximum(BAR_STEPS);
        GridData barData = new GridData(SWT.END, SWT.CENTER, false, false);
        barData.widthHint = 160;
        bar.setLayoutData(barData);
        cancel = new Button(line, SWT.PUSH);
        cancel.setText(texts.get("cancel"));
        cancel.setLayoutData(new GridData(SWT.END, SWT.CENTER, false, false));
        cancel.addListener(SWT.Selection, event -> {
            RunningWork.Item item = running.current();
            if (item != null) {
                item.cancel().run();
            }
        });
        running.onChange(this::queue);
        counts.onChange(this::showRows);
        showRows();
        showWork();
    }

    /** Work reports far more often than a person can read: at most one update waits. */
    private void queue() {
        if (queued.compareAndSet(false, true)) {
            window.asyncExec(() -> {
                queued.set(false);
                showWork();
            });
        }
    }

    private void showRows() {
        if (!rows.isDisposed()) {
            String text = texts.get("rows", counts.shown(), counts.total(), counts.selected());
            rows.setText(counts.total() == 0 ? "" : text);
            line.layout();
        }
    }

    private void showWork() {
        if (line.isDisposed()) {
            return;
        }
        RunningWork.Item item = running.current();
        boolean busy = item != null;
        work.setVisible(busy);
        bar.setVisible(busy);
        cancel.setVisible(busy);
        if (busy) {
            String step = item.step().isEmpty() ? item.name() : texts.get("step", item.name(), item.step());
            work.setText(item.total() > 0 ? texts.get("progress", step, item.done(), item.total()) : step);
            bar.setSelection(item.total() > 0 ? (int) (BAR_STEPS * Math.min(item.done(), item.total()) / item.total()) : 0);
        }
        line.layout();
    }
}
