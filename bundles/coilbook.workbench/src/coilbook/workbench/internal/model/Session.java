package coilbook.workbench.internal.model;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;

import coilbook.register.FleetScope;

/**
 * What the parts of the window share: the open fleet, the place looked at, the selected station, the steps that can be undone. Belongs to the
 * window's thread.
 */
public final class Session {

    /** Told on the window's thread. */
    public interface Listener {
        /** Another fleet is open, or none. */
        default void fleetChanged() {
        }

        /** A fleet is about to be shown, or will not be. */
        default void openingChanged() {
        }

        /** Another part of the fleet is looked at. */
        default void scopeChanged() {
        }

        /** Another station is selected, or none. */
        default void stationChanged() {
        }

        /** Rows of the fleet have changed. */
        default void dataChanged() {
        }

        /** Other steps can be undone or redone. */
        default void stepsChanged() {
        }

        /** The look has changed between light and dark. */
        default void lookChanged() {
        }
    }

    private final List<Listener> listeners = new ArrayList<>();
    private FleetModel fleet;
    private FleetScope scope = FleetScope.all();
    private String station;
    private Steps steps = Steps.NONE;
    private boolean dark;
    private boolean opening;

    /** Adds a listener. */
    public void add(Listener listener) {
        listeners.add(listener);
    }

    /** Removes a listener, for parts that end before the window does. */
    public void remove(Listener listener) {
        listeners.remove(listener);
    }

    /** The open fleet, or {@code null}. */
    public FleetModel fleet() {
        return fleet;
    }

    /** Shows another fleet, all of it. */
    public void open(FleetModel opened) {
        fleet = opened;
        scope = FleetScope.all();
        station = null;
        steps = Steps.NONE;
        opening = false;
        tell(Listener::fleetChanged);
        tell(Listener::stationChanged);
        tell(Listener::stepsChanged);
    }

    /** Whether a fleet is about to be shown, so that nothing else need be offered meanwhile. */
    public boolean isOpening() {
        return opening;
    }

    /** Says that a fleet is about to be shown, or that it will not be. */
    public void opening(boolean isOpening) {
        if (opening != isOpening) {
            opening = isOpening;
            tell(Listener::openingChanged);
        }
    }

    public FleetScope scope() {
        return scope;
    }

    /** Looks at part of the fleet. */
    public void look(FleetScope part) {
        if (!scope.equals(part)) {
            scope = part;
            tell(Listener::scopeChanged);
        }
    }

    /** The selected station's code, or {@code null}. */
    public String station() {
        return station;
    }

    /** Selects a station. */
    public void select(String code) {
        if (!Objects.equals(station, code)) {
            station = code;
            tell(Listener::stationChanged);
        }
    }

    /** Says that rows have changed. */
    public void changed() {
        tell(Listener::dataChanged);
    }

    public Steps steps() {
        return steps;
    }

    /** Says what can be undone and redone now. */
    public void steps(Steps now) {
        if (!steps.equals(now)) {
            steps = now;
            tell(Listener::stepsChanged);
        }
    }

    public boolean isDark() {
        return dark;
    }

    /** Chooses the look. */
    public void dark(boolean isDark) {
        if (dark != isDark) {
            dark = isDark;
            tell(Listener::lookChanged);
        }
    }

    private void tell(java.util.function.Consumer<Listener> what) {
        List.copyOf(listeners).forEach(what);
    }
}
