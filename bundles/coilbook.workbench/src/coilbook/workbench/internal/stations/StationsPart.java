package coilbook.workbench.internal.stations;

import org.eclipse.e4.core.di.annotations.Optional;
import org.eclipse.e4.ui.di.Focus;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StackLayout;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Shell;

import coilbook.workbench.internal.grid.StationsGrid;
import coilbook.workbench.internal.grid.edit.ChoiceLists;
import coilbook.workbench.internal.model.Background;
import coilbook.workbench.internal.model.FleetWork;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.statusline.RowCounts;
import coilbook.workbench.internal.text.Texts;
import coilbook.workbench.internal.window.FileQuestions;
import coilbook.workbench.internal.window.PaneHeading;
import jakarta.annotation.PostConstruct;
import jakarta.annotation.PreDestroy;
import jakarta.inject.Inject;

/** The pane in the middle: the grid of stations, or, while there is nothing in it, what one can begin with. */
public final class StationsPart implements StationsPresenter.View, Session.Listener {

    private final Session session;
    private final StationsPresenter presenter;
    private final ChoiceLists choices;
    private final RowCounts counts;
    private final FileQuestions questions;
    private final Texts texts = Texts.of(StationsPart.class);
    private final StackLayout stack = new StackLayout();
    private Composite stacked;
    private Composite gridPane;
    private WelcomePane welcome;
    private NoticeBar notice;
    private StationsGrid grid;
    private Button clear;

    @Inject
    public StationsPart(Session session, FleetWork work, Background background, RowCounts counts, FileQuestions questions) {
        this.session = session;
        this.counts = counts;
        this.questions = questions;
        presenter = new StationsPresenter(session, work, background);
        choices = new ChoiceLists(session, presenter, background);
    }

    @PostConstruct
    void create(Composite parent, @Optional Shell shell) {
        PaneHeading.column(parent);
        PaneHeading heading = new PaneHeading(parent, texts.get("title"), 2);
        clear = button(heading.row(), "clearFilters", () -> grid.clearFilters());
        button(heading.row(), "refresh", presenter::load);
        notice = new NoticeBar(parent, texts.get("dismiss"));
        stacked = new Composite(parent, SWT.NONE);
        stacked.setLayout(stack);
        stacked.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        gridPane = new Composite(stacked, SWT.NONE);
        gridPane.setLayout(new org.eclipse.swt.layout.FillLayout());
        grid = new StationsGrid(gridPane, presenter, new CellText(), choices, this::notice);
        welcome = new WelcomePane(stacked, texts, questions);
        stack.topControl = welcome.control();
        session.add(this);
        lookChanged();
        presenter.attach(this);
    }

    private Button button(Composite row, String key, Runnable action) {
        Button button = new Button(row, SWT.PUSH);
        button.setText(texts.get(key));
        button.addListener(SWT.Selection, event -> action.run());
        return button;
    }

    @Override
    public void rowsReplaced(int select) {
        if (!stacked.isDisposed()) {
            grid.rowsReplaced(select);
            clear.setEnabled(!presenter.filters().isEmpty());
            tellCounts();
        }
    }

    @Override
    public void rowsArrived() {
        if (!stacked.isDisposed()) {
            grid.rowsArrived();
            tellCounts();
        }
    }

    @Override
    public void selectionChanged() {
        tellCounts();
    }

    private void tellCounts() {
        counts.set(presenter.rowCount(), presenter.total(), presenter.selectedCount());
    }

    @Override
    public void notice(String words) {
        if (!stacked.isDisposed()) {
            notice.show(words);
        }
    }

    @Override
    public void welcome(boolean shown) {
        if (!stacked.isDisposed()) {
            stack.topControl = shown ? welcome.control() : gridPane;
            stacked.layout();
        }
    }

    @Override
    public void lookChanged() {
        grid.look(session.isDark());
        notice.look(session.isDark());
        welcome.look(session.isDark());
    }

    @Focus
    void focus() {
        if (stack.topControl == gridPane) {
            grid.table().setFocus();
        } else {
            welcome.control().setFocus();
        }
    }

    @PreDestroy
    void dispose() {
        session.remove(this);
        choices.dispose();
        presenter.detach();
    }
}
