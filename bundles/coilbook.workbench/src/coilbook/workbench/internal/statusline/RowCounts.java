package coilbook.workbench.internal.statusline;

/** How many rows the grid shows, of how many, and how many are selected. Belongs to the window's thread. */
public final class RowCounts {

    private Runnable listener = () -> {
    };
    private long shown;
    private long total;
    private int selected;

    /** Sets who is told of every change. */
    public void onChange(Runnable told) {
        listener = told;
    }

    /** Says what the grid shows now. */
    public void set(long nowShown, long nowTotal, int nowSelected) {
        boolean changed = shown != nowShown || total != nowTotal || selected != nowSelected;
        shown = nowShown;
        total = nowTotal;
        selected = nowSelected;
        if (changed) {
            listener.run();
        }
    }

    public long shown() {
        return shown;
    }

    public long total() {
        return total;
    }

    public int selected() {
        return selected;
    }
}
