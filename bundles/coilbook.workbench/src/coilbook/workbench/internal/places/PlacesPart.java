package coilbook.workbench.internal.places;

import org.eclipse.e4.ui.di.Focus;
import org.eclipse.jface.layout.TreeColumnLayout;
import org.eclipse.jface.viewers.ColumnPixelData;
import org.eclipse.jface.viewers.ColumnWeightData;
import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.jface.viewers.ITreeContentProvider;
import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.jface.viewers.TreeViewer;
import org.eclipse.swt.SWT;
import org.eclipse.swt.accessibility.AccessibleAdapter;
import org.eclipse.swt.accessibility.AccessibleEvent;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableItem;
import org.eclipse.swt.widgets.Tree;
import org.eclipse.swt.widgets.TreeColumn;

import coilbook.workbench.internal.grid.style.GridColours;
import coilbook.workbench.internal.model.Background;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.stations.VerdictMark;
import coilbook.workbench.internal.text.Texts;
import coilbook.workbench.internal.window.PaneHeading;
import jakarta.annotation.PostConstruct;
import jakarta.annotation.PreDestroy;
import jakarta.inject.Inject;

/** The pane of places: customer, site and line with how many findings stand there. */
public final class PlacesPart implements PlacesPresenter.View {

    private static final int COUNT_WIDTH = 94;
    private static final int LEAST_NAME_WIDTH = 130;

    private final PlacesPresenter presenter;
    private final Texts texts = Texts.of(PlacesPart.class);
    private final PlaceLabels labels = new PlaceLabels();
    private TreeViewer viewer;
    private Table stations;

    @Inject
    public PlacesPart(Session session, Background background) {
        presenter = new PlacesPresenter(session, background);
    }

    @PostConstruct
    void create(Composite parent) {
        PaneHeading.column(parent);
        new PaneHeading(parent, texts.get("title"), 0);
        stations = new Table(parent, SWT.SINGLE | SWT.FULL_SELECTION | SWT.NO_SCROLL);
        stations.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        new TableItem(stations, SWT.NONE).setText(texts.get("stations"));
        stations.select(0);
        Composite holder = new Composite(parent, SWT.NONE);
        holder.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        TreeColumnLayout widths = new TreeColumnLayout();
        holder.setLayout(widths);
        viewer = new TreeViewer(holder, SWT.SINGLE | SWT.FULL_SELECTION | SWT.V_SCROLL | SWT.H_SCROLL);
        Tree tree = viewer.getTree();
        tree.setHeaderVisible(true);
        widths.setColumnData(column(tree, texts.get("place"), "", SWT.LEFT), new ColumnWeightData(1, LEAST_NAME_WIDTH));
        count(tree, widths, "hazards", VerdictMark.HAZARD);
        count(tree, widths, "nonconformities", VerdictMark.NONCONFORMITY);
        count(tree, widths, "undetermined", VerdictMark.UNDETERMINED);
        tree.getAccessible().addAccessibleListener(new AccessibleAdapter() {
            @Override
            public void getName(AccessibleEvent event) {
                if (event.childID == org.eclipse.swt.accessibility.ACC.CHILDID_SELF) {
                    event.result = texts.get("tree");
                }
            }
        });
        viewer.setContentProvider(new Content());
        viewer.setLabelProvider(labels);
        viewer.setUseHashlookup(true);
        viewer.addSelectionChangedListener(event -> {
            if (((IStructuredSelection) event.getSelection()).getFirstElement() instanceof PlaceNode place) {
                presenter.choose(place);
            }
        });
        presenter.attach(this);
    }

    private void count(Tree tree, TreeColumnLayout widths, String key, VerdictMark mark) {
        TreeColumn column = column(tree, texts.get(key, mark.symbol()), texts.get(key + ".help"), SWT.RIGHT);
        widths.setColumnData(column, new ColumnPixelData(COUNT_WIDTH, true));
    }

    private static TreeColumn column(Tree tree, String name, String help, int style) {
        TreeColumn column = new TreeColumn(tree, style);
        column.setText(name);
        column.setToolTipText(help.isEmpty() ? null : help);
        return column;
    }

    @Override
    public void show(PlaceNode root) {
        if (viewer.getTree().isDisposed()) {
            return;
        }
        stations.getItem(0).setText(root == null ? texts.get("stations") : texts.get("stations.count", root.counts().stations()));
        if (root == null) {
            viewer.setInput(null);
            return;
        }
        viewer.getTree().setToolTipText(null);
        Object[] open = viewer.getExpandedElements();
        Object selected = viewer.getStructuredSelection().getFirstElement();
        boolean first = viewer.getInput() == null;
        viewer.getTree().setRedraw(false);
        try {
            viewer.setInput(new PlaceNode[] { root });
            viewer.setExpandedElements(first ? opening(root) : open);
            viewer.setSelection(new StructuredSelection(selected instanceof PlaceNode ? selected : root));
        } finally {
            viewer.getTree().setRedraw(true);
        }
    }

    /** The whole fleet and its customers; their sites too where there are few of them. */
    private static Object[] opening(PlaceNode root) {
        int sites = root.children().stream().mapToInt(customer -> customer.children().size()).sum();
        java.util.List<PlaceNode> open = new java.util.ArrayList<>();
        open.add(root);
        if (sites <= 60) {
            open.addAll(root.children());
        }
        return open.toArray();
    }

    @Override
    public void failed(String words) {
        if (!viewer.getTree().isDisposed()) {
            viewer.setInput(new PlaceNode[] { PlaceNode.note(words) });
            viewer.getTree().setToolTipText(words);
        }
    }

    @Override
    public void look(boolean dark) {
        if (!viewer.getTree().isDisposed()) {
            labels.look(dark);
            GridColours colours = GridColours.of(dark);
            Tree tree = viewer.getTree();
            tree.setBackground(colours.background());
            tree.setForeground(colours.text());
            tree.setHeaderBackground(colours.heading());
            tree.setHeaderForeground(colours.text());
            stations.setBackground(colours.background());
            stations.setForeground(colours.text());
            viewer.refresh();
        }
    }

    @Focus
    void focus() {
        viewer.getTree().setFocus();
    }

    @PreDestroy
    void dispose() {
        presenter.detach();
    }

    private static final class Content implements ITreeContentProvider {
        @Override
        public Object[] getElements(Object input) {
            return (PlaceNode[]) input;
        }

        @Override
        public Object[] getChildren(Object parent) {
            return ((PlaceNode) parent).children().toArray();
        }

        @Override
        public Object getParent(Object element) {
            return null;
        }

        @Override
        public boolean hasChildren(Object element) {
            return !((PlaceNode) element).children().isEmpty();
        }
    }
}
