package coilbook.workbench.internal.model;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The long work that is under way, for the status line. Told from any thread; the view comes back to the window's thread itself. */
public final class RunningWork {

    /** One piece of long work. */
    public record Item(String name, String step, long done, long total, Runnable cancel) {
    }

    private final Map<Object, Item> items = new LinkedHashMap<>();
    private final List<Runnable> listeners = new ArrayList<>();

    /** Adds someone who is told whenever {@link #current} may have changed. */
    public synchronized void onChange(Runnable told) {
        listeners.add(told);
    }

    /** Says how far a piece of work is; {@code null} that it has ended. */
    public void put(Object key, Item item) {
        List<Runnable> told;
        synchronized (this) {
            if (item == null) {
                items.remove(key);
            } else {
                items.put(key, item);
            }
            told = List.copyOf(listeners);
        }
        told.forEach(Runnable::run);
    }

    /** The work that was started first of those under way, or {@code null}. */
    public synchronized Item current() {
        return items.isEmpty() ? null : items.values().iterator().next();
    }
}
