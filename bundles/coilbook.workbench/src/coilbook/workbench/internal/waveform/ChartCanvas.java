package coilbook.workbench.internal.waveform;

import org.eclipse.swt.SWT;
import org.eclipse.swt.accessibility.AccessibleAdapter;
import org.eclipse.swt.accessibility.AccessibleEvent;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.ImageDataProvider;
import org.eclipse.swt.graphics.PaletteData;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Canvas;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;

import coilbook.charts.ChartImage;
import coilbook.charts.ChartSize;
import coilbook.workbench.internal.grid.style.GridColours;
import coilbook.workbench.internal.model.Session;
import coilbook.workbench.internal.text.Texts;

/** Shows a chart pixel for pixel at the display's zoom, and over it a cursor that follows the mouse. */
final class ChartCanvas implements WaveformPresenter.View {

    private static final int FULL = 100;
    private static final int MARGIN = 6;
    private static final int BITS = 24;
    private static final int BYTES = 3;

    private final Canvas canvas;
    private final Session session;
    private final WaveformPresenter presenter;
    private final Texts texts = Texts.of(ChartCanvas.class);
    private Image image;
    private ChartImage chart;
    private String words = "";
    private int cursor = -1;

    ChartCanvas(Composite parent, Session session, WaveformPresenter presenter) {
        this.session = session;
        this.presenter = presenter;
        canvas = new Canvas(parent, SWT.DOUBLE_BUFFERED | SWT.NO_BACKGROUND);
        canvas.addPaintListener(event -> paint(event.gc));
        canvas.addListener(SWT.Resize, event -> presenter.draw());
        canvas.addListener(SWT.ZoomChanged, event -> presenter.draw());
        canvas.addListener(SWT.MouseMove, event -> moveCursor(event.x));
        canvas.addListener(SWT.MouseExit, event -> moveCursor(-1));
        canvas.addListener(SWT.Dispose, event -> drop());
        canvas.getAccessible().addAccessibleListener(new AccessibleAdapter() {
            @Override
            public void getName(AccessibleEvent event) {
                event.result = texts.get("accessible") + (words.isEmpty() ? "" : ": " + words);
            }
        });
    }

    Control control() {
        return canvas;
    }

    @Override
    public ChartSize size() {
        if (canvas.isDisposed()) {
            return null;
        }
        Rectangle area = canvas.getClientArea();
        boolean room = area.width >= ChartSize.LEAST_WIDTH && area.height >= ChartSize.LEAST_HEIGHT;
        return room ? new ChartSize(area.width, area.height, canvas.getMonitor().getZoom() / (double) FULL) : null;
    }

    @Override
    public void show(ChartPicture drawn, String note) {
        if (canvas.isDisposed()) {
            return;
        }
        drop();
        chart = drawn.chart();
        words = note;
        image = new Image(canvas.getDisplay(), provider(drawn));
        canvas.redraw();
    }

    private ImageDataProvider provider(ChartPicture drawn) {
        int zoom = canvas.getMonitor().getZoom();
        ImageData pixels = data(drawn.chart(), drawn.pixels());
        ImageData plain = data(drawn.plain(), drawn.plainPixels());
        return asked -> asked == FULL ? plain : asked == zoom ? pixels : null;
    }

    private static ImageData data(ChartImage drawn, byte[] pixels) {
        int width = drawn.image().getWidth();
        return new ImageData(width, drawn.image().getHeight(), BITS, new PaletteData(0xff0000, 0xff00, 0xff), BYTES * width, pixels);
    }

    @Override
    public void showWords(String told) {
        if (canvas.isDisposed()) {
            return;
        }
        drop();
        words = told;
        canvas.redraw();
    }

    private void drop() {
        if (image != null) {
            image.dispose();
        }
        image = null;
        chart = null;
    }

    private void moveCursor(int x) {
        if (cursor != x) {
            cursor = x;
            canvas.redraw();
        }
    }

    private void paint(GC gc) {
        GridColours colours = GridColours.of(session.isDark());
        Rectangle area = canvas.getClientArea();
        gc.setBackground(colours.background());
        gc.setForeground(colours.text());
        gc.fillRectangle(area);
        if (image == null) {
            paintWords(gc, area);
            return;
        }
        gc.drawImage(image, 0, 0);
        String readout = chart == null ? "" : presenter.readout(chart.timeAt(cursor));
        if (!readout.isEmpty()) {
            int top = (int) chart.curves().getMinY();
            gc.setLineStyle(SWT.LINE_SOLID);
            gc.drawLine(cursor, top, cursor, (int) chart.curves().getMaxY());
            Point extent = gc.textExtent(readout);
            int left = Math.min(Math.max(MARGIN, cursor + MARGIN), area.width - extent.x - 2 * MARGIN);
            gc.fillRectangle(left, top, extent.x + MARGIN, extent.y);
            gc.drawText(readout, left + MARGIN / 2, top, true);
        }
    }

    private void paintWords(GC gc, Rectangle area) {
        gc.setForeground(GridColours.of(session.isDark()).muted());
        int width = Math.max(60, area.width - 4 * MARGIN);
        org.eclipse.swt.graphics.TextLayout layout = new org.eclipse.swt.graphics.TextLayout(canvas.getDisplay());
        layout.setText(words);
        layout.setFont(canvas.getFont());
        layout.setWidth(width);
        layout.draw(gc, 2 * MARGIN, 2 * MARGIN);
        layout.dispose();
    }
}
