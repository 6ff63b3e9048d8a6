package coilbook.exchange.internal.out;

import java.util.EnumMap;
import java.util.Map;
import java.util.function.Function;

import coilbook.electrics.CircuitCase;
import coilbook.electrics.Copper;
import coilbook.electrics.Corner;
import coilbook.electrics.Derived;
import coilbook.electrics.StationElectrics;
import coilbook.fleet.CableType;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilType;
import coilbook.fleet.Datum;
import coilbook.fleet.DriverKind;
import coilbook.fleet.DriverType;
import coilbook.fleet.Duty;
import coilbook.fleet.Field;
import coilbook.fleet.Kind;
import coilbook.fleet.Row;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.StationView;
import coilbook.fleet.Supply;
import coilbook.fleet.Unit;

/** One station while its key figures are written: what was computed for it, and the cells that its formulas may take values from. */
final class FigureCase {

    private static final Expr NONE = Expr.none();

    private final EntitySheet sheet;
    private final Lookups lookups;
    private final Keys keys;
    private final StationView view;
    private final StationElectrics electrics;
    private final Map<KeyFigure, Expr> written = new EnumMap<>(KeyFigure.class);

    /** The columns that name the types fitted, counted from 0. */
    record Keys(int coil, int driver, int cable) {
    }

    FigureCase(EntitySheet sheet, Lookups lookups, Keys keys, StationView view, StationElectrics electrics) {
        this.sheet = sheet;
        this.lookups = lookups;
        this.keys = keys;
        this.view = view;
        this.electrics = electrics;
    }

    StationView view() {
        return view;
    }

    boolean is(DriverKind kind) {
        return view.driver() != null && view.driver().kind() == kind;
    }

    /** A value of the circuit at a corner; NaN if that corner cannot be computed. */
    double at(Corner corner, Function<CircuitCase, Double> value) {
        CircuitCase circuit = electrics.cases().get(corner);
        return circuit == null ? Double.NaN : value.apply(circuit);
    }

    double value(Function<StationElectrics, Derived> which) {
        return which.apply(electrics).value();
    }

    Derived derived(Function<StationElectrics, Derived> which) {
        return which.apply(electrics);
    }

    StationElectrics electrics() {
        return electrics;
    }

    /** The cell of a figure that was written before; missing if it holds none. */
    Expr cell(KeyFigure figure) {
        return written.getOrDefault(figure, NONE);
    }

    void wrote(KeyFigure figure, int column, double si) {
        written.put(figure, Expr.cell(sheet.out().here(column), si, figure.unit()));
    }

    Expr station(String fieldId) {
        return input(Kind.of(Station.class), view.station(), fieldId);
    }

    Expr duty(String fieldId) {
        return input(Kind.of(Duty.class), view.duty(), fieldId);
    }

    private Expr input(Kind<?> kind, Row row, String fieldId) {
        Field field = kind.field(fieldId);
        return row == null ? NONE
                : Expr.cell(sheet.out().here(sheet.column(kind, fieldId)), Datum.orNaN((Datum) field.get(row)), field.unit());
    }

    Expr coil(String fieldId) {
        return lookup(Kind.of(CoilType.class), view.coil(), keys.coil(), fieldId);
    }

    Expr driver(String fieldId) {
        return lookup(Kind.of(DriverType.class), view.driver(), keys.driver(), fieldId);
    }

    Expr cable(String fieldId) {
        return lookup(Kind.of(CableType.class), view.cable(), keys.cable(), fieldId);
    }

    Expr site(String fieldId) {
        return lookup(Kind.of(Site.class), view.site(), sheet.column(Kind.of(Station.class), "site"), fieldId);
    }

    Expr circuit(String fieldId) {
        return lookup(Kind.of(Circuit.class), view.circuit(), circuitKey(), fieldId);
    }

    private int circuitKey() {
        return sheet.column(Kind.of(Supply.class), "circuit");
    }

    /** A column of volts that the sheet of circuits computes. */
    Expr circuitVolts(int column, double volts) {
        String formula = view.circuit() == null ? null
                : lookups.formula(Kind.of(Circuit.class), view.circuit().key(), sheet.out().here(circuitKey()), column);
        return formula == null ? NONE : Expr.cell(formula, volts, Unit.VOLT);
    }

    private Expr lookup(Kind<?> kind, Row row, int keyColumn, String fieldId) {
        Field field = kind.field(fieldId);
        Datum datum = row == null ? null : (Datum) field.get(row);
        String formula = datum == null ? null : lookups.formula(kind, row.key(), sheet.out().here(keyColumn), fieldId);
        return formula == null ? NONE : Expr.cell(formula, datum.value(), field.unit());
    }

    /** Copper's resistance at a temperature as a factor of that at 20 °C. */
    static Expr copper(Expr celsius) {
        return celsius.plus(Copper.ZERO_RESISTANCE).over(Expr.number(Copper.ZERO_RESISTANCE + 20));
    }

    /** What a current is on its way from one value to another after a time, in a coil of a time constant. */
    static Expr approach(Expr from, Expr to, Expr time, Expr timeConstant) {
        return to.plus(from.minus(to).times(time.over(timeConstant).negated().exp()));
    }
}
