package coilbook.exchange.internal.out;

import java.util.List;

import coilbook.exchange.internal.ExchangeSheets;
import coilbook.exchange.internal.out.Styles.Use;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Datum;
import coilbook.fleet.Kind;
import coilbook.fleet.MarketTolerance;
import coilbook.fleet.Unit;

/** The sheet of mains circuits, with the band that their voltage must keep as formulas over nominal voltage and tolerance. */
final class CircuitsSheet {

    private static final Kind<Circuit> KIND = Kind.of(Circuit.class);
    private static final int FIRST_COMPUTED = ExchangeSheets.columns(KIND).size();
    /** The columns of the band's ends in V, counted from 0. */
    static final int LOWEST_MAINS = FIRST_COMPUTED + 3;
    static final int HIGHEST_MAINS = FIRST_COMPUTED + 4;

    private final EntitySheet sheet;
    private final int nominal;
    private final int below;
    private final int above;

    CircuitsSheet(Book book) {
        this.sheet = new EntitySheet(book, KIND,
                List.of(Column.computed("Circuit key", 16), Column.computed("Band lowest [%]", 12), Column.computed("Band highest [%]", 12),
                        Column.computed("Lowest mains [V]", 12), Column.computed("Highest mains [V]", 12),
                        Column.computed("Band's source", 34)));
        this.nominal = sheet.column(KIND, "nominal_voltage");
        this.below = sheet.column(KIND, "tolerance_below");
        this.above = sheet.column(KIND, "tolerance_above");
    }

    EntitySheet sheet() {
        return sheet;
    }

    /** The column that holds site and circuit as one key. */
    int keyColumn() {
        return FIRST_COMPUTED;
    }

    void row(Circuit circuit, MarketBands markets) throws CoilbookException {
        SheetOut out = sheet.out();
        sheet.begin(circuit);
        out.formula(out.here(0) + "&\"/\"&" + out.here(1), circuit.key(), Use.COMPUTED_TEXT);
        MarketTolerance band = circuit.nominalVoltage() == null ? null : markets.band(circuit.site(), circuit.nominalVoltage().value());
        end(circuit.toleranceBelow(), out.here(below), -1, band == null ? null : band.lowest());
        end(circuit.toleranceAbove(), out.here(above), 1, band == null ? null : band.highest());
        double volts = Datum.orNaN(circuit.nominalVoltage());
        Expr nominalVolts = Expr.cell(out.here(nominal), volts, Unit.VOLT);
        volts(nominalVolts.times(fraction(circuit.toleranceBelow(), -1, band == null ? null : band.lowest(), FIRST_COMPUTED + 1)));
        volts(nominalVolts.times(fraction(circuit.toleranceAbove(), 1, band == null ? null : band.highest(), FIRST_COMPUTED + 2)));
        boolean own = circuit.toleranceBelow() != null && circuit.toleranceAbove() != null;
        out.text(
                own ? "the circuit's own"
                        : band == null ? "" : (band.standard() == null ? "" : band.standard() + "; ") + text(band.source()),
                Use.COMPUTED_TEXT);
    }

    private void end(Datum own, String ownCell, int sign, Datum market) {
        SheetOut out = sheet.out();
        if (own != null) {
            out.formula("100" + (sign < 0 ? "-" : "+") + ownCell, 100 * (1 + sign * own.value()), Use.COMPUTED);
        } else {
            out.number(market == null ? Double.NaN : Unit.PERCENT.fromSi(market.value()), Use.COMPUTED);
        }
    }

    private Expr fraction(Datum own, int sign, Datum market, int column) {
        double value = own != null ? 1 + sign * own.value() : Datum.orNaN(market);
        return Expr.cell(sheet.out().here(column), value, Unit.PERCENT);
    }

    private void volts(Expr volts) {
        if (volts.isPresent()) {
            sheet.out().formula(volts.text(), volts.value(), Use.COMPUTED);
        } else {
            sheet.out().skip();
        }
    }

    private static String text(String text) {
        return text == null ? "" : text;
    }
}
