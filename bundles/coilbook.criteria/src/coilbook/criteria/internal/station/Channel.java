package coilbook.criteria.internal.station;

import coilbook.fleet.CoilConnection;
import coilbook.fleet.StationView;

/**
 * The coils on a station's driver channel, taken together: alike, in series or in parallel; one where nothing else is recorded.
 *
 * @param coils how many; missing where their connection is not known
 * @param connection how they are joined
 */
public record Channel(Fact coils, CoilConnection connection) {

    public static Channel of(StationView view) {
        Integer number = view.station().coilsOnChannel();
        CoilConnection connection = view.station().coilConnection();
        if (number == null || number == 1) {
            return new Channel(Fact.known(1, null), CoilConnection.SINGLE);
        } else if (connection == null || connection == CoilConnection.SINGLE) {
            String why = connection == null ? "" : ", for " + number + " coils cannot be single";
            return new Channel(Fact.missing(Names.ofStation("Coil connection", view) + why), CoilConnection.SINGLE);
        }
        return new Channel(Fact.known(number, null), connection);
    }

    /** Of a resistance or inductance of one coil, that of all. */
    public Fact impedance(Fact ofOne) {
        return ofOne.with(coils, (z, n) -> connection == CoilConnection.PARALLEL ? z / n : z * n);
    }

    /** Of a current of one coil, that of the channel. */
    public Fact current(Fact ofOne) {
        return ofOne.with(coils, (i, n) -> connection == CoilConnection.PARALLEL ? i * n : i);
    }

    /** Of a dissipation of one coil, that of all. */
    public Fact power(Fact ofOne) {
        return ofOne.with(coils, (p, n) -> p * n);
    }

    /** Of a thermal resistance of one coil, that against the dissipation of all. */
    public Fact thermalResistance(Fact ofOne) {
        return ofOne.with(coils, (r, n) -> r / n);
    }

    /** "" for one coil, else for example ", 2 coils in parallel". */
    public String words() {
        return coils.isKnown() && coils.value() > 1 ? ", " + (int) coils.value() + " coils in " + connection.label() : "";
    }
}
