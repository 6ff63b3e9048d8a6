package coilbook.exchange.internal;

import java.util.ArrayList;
import java.util.List;

import coilbook.fleet.Duty;
import coilbook.fleet.Field;
import coilbook.fleet.FieldType;
import coilbook.fleet.Kind;
import coilbook.fleet.Provenance;
import coilbook.fleet.Row;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.Station;
import coilbook.fleet.Supply;
import coilbook.fleet.TypeStatus;
import coilbook.fleet.Unit;

/**
 * How the sheets of an exchange workbook are laid out, for the writer and the reader alike. The first row holds headings: {@link Field#headingWithUnit} in
 * the order of the fields, then {@link #PROVENANCE} where the kind has quantities. The sheet Stations carries the present supply, setting choice and duty
 * of each station as well; those have no sheets of their own. Computed columns end in {@link #COMPUTED}; reading passes them over.
 */
public final class ExchangeSheets {

    /** Ends the heading of a computed column. */
    public static final String COMPUTED = " (computed)";
    /** The heading of the column with {@link Kind#provenanceText}. */
    public static final String PROVENANCE = "Provenance";
    /** The heading of the column with the provenance of a station's duty. */
    public static final String DUTY_PROVENANCE = "Duty provenance";
    /** The name of the sheet that says what the workbook covers: a label in one cell, the answer in the cell to its right. */
    public static final String SUMMARY = "Summary";
    /** A label on the summary; to its right {@link #YES} or {@link #NO}. */
    public static final String PART_OF_FLEET = "Part of the fleet";
    /** A label on the summary; to its right {@link #YES} or {@link #NO}. */
    public static final String PAST_DATE = "Past date";
    /** A label on the summary; to its right the scope in words. */
    public static final String SCOPE = "Scope";
    /** A label on the summary; to its right a date. */
    public static final String AS_OF = "As of";
    public static final String YES = "yes";
    public static final String NO = "no";

    /**
     * One input column of a sheet.
     *
     * @param heading as written
     * @param kind whose value it is
     * @param field the field, or {@code null} for a column of provenance texts of that kind
     */
    public record SheetColumn(String heading, Kind<?> kind, Field field) {
    }

    /** Kinds with a sheet, in the order of the workbook. */
    public static final List<Kind<?>> KINDS = Kind.ALL.stream()
            .filter(kind -> kind.type() != Supply.class && kind.type() != SettingChoice.class && kind.type() != Duty.class).toList();

    private ExchangeSheets() {
    }

    /** The input columns of a kind's sheet. */
    public static List<SheetColumn> columns(Kind<?> kind) {
        List<SheetColumn> columns = new ArrayList<>();
        own(kind, columns);
        if (kind.type() == Station.class) {
            present(Kind.of(Supply.class), columns);
            present(Kind.of(SettingChoice.class), columns);
            present(Kind.of(Duty.class), columns);
            columns.add(new SheetColumn(PROVENANCE, kind, null));
            columns.add(new SheetColumn(DUTY_PROVENANCE, Kind.of(Duty.class), null));
        } else if (kind.hasQuantities()) {
            columns.add(new SheetColumn(PROVENANCE, kind, null));
        }
        return List.copyOf(columns);
    }

    private static void own(Kind<?> kind, List<SheetColumn> columns) {
        for (Field field : kind.fields()) {
            columns.add(new SheetColumn(field.headingWithUnit(), kind, field));
        }
    }

    /** What is true of the station today: its values first, then since when. */
    private static void present(Kind<?> kind, List<SheetColumn> columns) {
        for (Field field : kind.fields()) {
            if (!field.isKey() && field.type() != FieldType.DATE) {
                columns.add(new SheetColumn(field.headingWithUnit(), kind, field));
            }
        }
        Field since = kind.field("valid_from");
        columns.add(new SheetColumn(since.headingWithUnit(), kind, since));
    }

    /** The provenance of a kind's quantities where nothing is said: a catalogue's own for types, what a plate says elsewhere. */
    public static Provenance usualProvenance(Kind<?> kind) {
        boolean type = kind.fields().stream().anyMatch(field -> field.id().equals("status") && !field.terms().isEmpty()
                && field.terms().get(0) instanceof TypeStatus);
        return type || kind.type() == coilbook.fleet.InputSetting.class ? Provenance.CATALOGUE : Provenance.NAMEPLATE;
    }

    /**
     * An SI value as a sheet shows it: tidy where that reads back to the same value, else with every digit, so that a round trip changes nothing. The value
     * of a reading is shown in the unit of its quantity.
     */
    public static double shown(Unit unit, double si) {
        double tidy = unit.fromSi(si);
        return unit.toSi(tidy) == si ? tidy : si / unit.toSi(1);
    }

    /** The sheet's kind by its name, or {@code null}. */
    public static Kind<? extends Row> bySheet(String sheet) {
        for (Kind<?> kind : KINDS) {
            if (kind.sheet().equalsIgnoreCase(sheet.strip())) {
                return kind;
            }
        }
        return null;
    }
}
