package coilbook.fleet;

import java.util.List;

/**
 * What the market tables say of one country: its public supply, the bands its voltages must keep (the rows for the country, else those
 * for {@code *}), the marks it asks for.
 */
public record MarketView(String country, MarketMains mains, List<MarketTolerance> tolerances, List<MarketMark> marks) {

    public MarketView {
        tolerances = List.copyOf(tolerances);
        marks = List.copyOf(marks);
    }

    /** The band for a nominal voltage in V, or {@code null} if no row covers it. */
    public MarketTolerance tolerance(double nominalVolts) {
        for (MarketTolerance row : tolerances) {
            if (nominalVolts >= row.nominalFrom().value() && nominalVolts <= row.nominalTo().value()) {
                return row;
            }
        }
        return null;
    }
}
