package coilbook.exchange.internal.out;

import java.util.ArrayList;
import java.util.List;

import coilbook.electrics.StationElectrics;
import coilbook.exchange.internal.ExchangeSheets;
import coilbook.exchange.internal.out.Styles.Use;
import coilbook.exchange.internal.out.Tally.Count;
import coilbook.fleet.CableType;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilType;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.DriverType;
import coilbook.fleet.Fitting;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Kind;
import coilbook.fleet.Site;
import coilbook.fleet.Station;
import coilbook.fleet.StationView;
import coilbook.register.StatusColumn;
import coilbook.register.StatusRow;

/**
 * The sheet of stations: every input, what is fitted, the verdict, and the key figures: as formulas over cells of the same row wherever they have a closed form.
 */
final class StationsSheet {

    /** The kinds that a station's formulas take values from. */
    static final List<Kind<?>> LOOKED_UP = List.of(Kind.of(Circuit.class), Kind.of(CoilType.class), Kind.of(DriverType.class),
            Kind.of(CableType.class),
            Kind.of(Site.class));

    private static final List<StatusColumn> COUNTS = List.of(StatusColumn.HAZARDS, StatusColumn.NONCONFORMITIES, StatusColumn.OBSERVATIONS,
            StatusColumn.UNDETERMINED, StatusColumn.CONCEDED);

    private final EntitySheet sheet;
    private final Lookups lookups;
    private final FigureCase.Keys keys;

    StationsSheet(Book book, Lookups lookups) {
        List<Column> computed = new ArrayList<>();
        computed.add(Column.computed("Station", 22));
        computed.add(Column.computed("Mark", 10));
        computed.add(Column.computed("Verdict", 15));
        for (StatusColumn count : COUNTS) {
            computed.add(Column.computed(count.heading(), FieldCells.longestWord(count.heading()) + 3));
        }
        computed.add(Column.computed("Valve type", 16));
        computed.add(Column.computed("Coil type", 16));
        computed.add(Column.computed("Coil serial", 14));
        computed.add(Column.computed("Driver type", 16));
        computed.add(Column.computed("Driver serial", 14));
        computed.add(Column.computed("Cable type", 16));
        computed.add(Column.computed("Driver kind", 18));
        computed.addAll(KeyFigures.columns());
        computed.add(Column.computed("Weakest provenance", 18));
        this.sheet = new EntitySheet(book, Kind.of(Station.class), computed);
        this.lookups = lookups;
        int valve = ExchangeSheets.columns(Kind.of(Station.class)).size() + COUNTS.size() + 3;
        this.keys = new FigureCase.Keys(valve + 1, valve + 3, valve + 5);
    }

    SheetOut out() {
        return sheet.out();
    }

    /**
     * Writes a station.
     *
     * @param electrics what was derived for it
     * @param status its status row; {@code null} if it has none
     */
    void row(StationView view, StationElectrics electrics, StatusRow status) throws CoilbookException {
        SheetOut out = sheet.out();
        sheet.begin(view.station(), view.supply(), view.settingChoice(), view.duty());
        out.text(view.code(), Use.COMPUTED_TEXT);
        verdict(out, status);
        out.text(type(view, FittedKind.VALVE), Use.COMPUTED_TEXT);
        out.text(type(view, FittedKind.COIL), Use.COMPUTED_TEXT);
        out.text(serial(view, FittedKind.COIL), Use.COMPUTED_TEXT);
        out.text(type(view, FittedKind.DRIVER), Use.COMPUTED_TEXT);
        out.text(serial(view, FittedKind.DRIVER), Use.COMPUTED_TEXT);
        out.text(type(view, FittedKind.CABLE), Use.COMPUTED_TEXT);
        out.text(view.driver() == null || view.driver().kind() == null ? "" : view.driver().kind().label(), Use.COMPUTED_TEXT);
        KeyFigures.write(out, new FigureCase(sheet, lookups, keys, view, electrics));
        out.text(status == null ? "" : (String) status.get(StatusColumn.PROVENANCE), Use.COMPUTED_TEXT);
    }

    private static void verdict(SheetOut out, StatusRow status) {
        if (status == null) {
            for (int i = 0; i < COUNTS.size() + 2; i++) {
                out.skip();
            }
            return;
        }
        Count worst = worst(status);
        Use mark = worst == null ? Use.CONFORMITY : FindingsSheet.use(worst);
        out.text(worst == null ? "✓" : worst.symbol(), mark);
        out.text((String) status.get(StatusColumn.VERDICT), mark);
        for (StatusColumn count : COUNTS) {
            out.number(status.get(count) instanceof Number number ? number.doubleValue() : Double.NaN, Use.COMPUTED_WHOLE);
        }
    }

    private static Count worst(StatusRow status) {
        StatusColumn[] worstFirst = { StatusColumn.HAZARDS, StatusColumn.NONCONFORMITIES, StatusColumn.UNDETERMINED,
                StatusColumn.OBSERVATIONS };
        Count[] counts = { Count.HAZARDS, Count.NONCONFORMITIES, Count.UNDETERMINED, Count.OBSERVATIONS };
        for (int i = 0; i < counts.length; i++) {
            if (status.get(worstFirst[i]) instanceof Number number && number.longValue() > 0) {
                return counts[i];
            }
        }
        return null;
    }

    private static String type(StationView view, FittedKind kind) {
        Fitting fitting = view.fitting(kind);
        return fitting == null ? "" : fitting.type();
    }

    private static String serial(StationView view, FittedKind kind) {
        Fitting fitting = view.fitting(kind);
        return fitting == null || fitting.serial() == null ? "" : fitting.serial();
    }

    void end() {
        sheet.out().end();
    }
}
