package coilbook.criteria.internal.station;

import coilbook.fleet.Circuit;
import coilbook.fleet.FittedKind;
import coilbook.fleet.StationView;

/** How missing inputs are called: the column's heading, and of what; so that "what to measure next" can gather them by datum and type. */
public final class Names {

    private Names() {
    }

    public static String ofStation(String heading, StationView view) {
        return heading + " of station " + view.code();
    }

    public static String ofSite(String heading, StationView view) {
        return heading + " of site " + view.station().site();
    }

    public static String ofCircuit(String heading, Circuit circuit) {
        return heading + " of circuit " + circuit.key();
    }

    public static String ofCoil(String heading, StationView view) {
        return heading + " of coil type " + view.coil().code();
    }

    public static String ofDriver(String heading, StationView view) {
        return heading + " of driver type " + view.driver().code();
    }

    public static String ofValve(String heading, StationView view) {
        return heading + " of valve type " + view.valve().code();
    }

    /** What is missing where the catalogue entry of a fitted part is not known. */
    public static String noType(FittedKind kind, StationView view) {
        String label = kind.label();
        return ofStation(Character.toUpperCase(label.charAt(0)) + label.substring(1) + " type", view);
    }
}
