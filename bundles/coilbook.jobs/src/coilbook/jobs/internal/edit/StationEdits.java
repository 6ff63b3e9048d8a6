package coilbook.jobs.internal.edit;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.TreeSet;

import coilbook.fleet.Circuit;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Duty;
import coilbook.fleet.Field;
import coilbook.fleet.FieldText;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.InputProblem;
import coilbook.fleet.InputSetting;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Item;
import coilbook.fleet.ItemStatus;
import coilbook.fleet.Kind;
import coilbook.fleet.Provenance;
import coilbook.fleet.Row;
import coilbook.fleet.RowChange;
import coilbook.fleet.SettingChoice;
import coilbook.fleet.StationView;
import coilbook.fleet.Supply;
import coilbook.fleet.Timed;
import coilbook.jobs.CellEdit;
import coilbook.fleet.NearestWord;
import coilbook.jobs.internal.merge.References;
import coilbook.register.AsOf;
import coilbook.register.Register;
import coilbook.register.StatusColumn;

/** Turns typed cells into row changes, one cell after another, so that several cells of one row become one change of that row. */
public final class StationEdits {

    private record RowId(Kind<?> kind, String key) {
    }

    private record Step(Row before, Row after) {
    }

    private final Register register;
    private final LocalDate today;
    private final Map<RowId, Step> steps = new LinkedHashMap<>();

    public StationEdits(Register register, LocalDate today) {
        this.register = register;
        this.today = today;
    }

    /**
     * Takes one cell.
     *
     * @throws CoilbookException with reason BAD_INPUT if the cell cannot hold the text
     */
    public void take(CellEdit edit) throws CoilbookException {
        EditColumns.Target target = EditColumns.target(edit.column());
        if (target == null) {
            throw refused(edit, "this column is computed or fixed and cannot be typed into");
        }
        StationView view = register.station(edit.station(), AsOf.on(today));
        if (view == null) {
            throw refused(edit, "the register has no such station");
        }
        String text = edit.text() == null ? "" : edit.text().strip();
        try {
            if (target.row() == Fitting.class) {
                part(edit, view, target, text);
            } else if (target.row() == Supply.class) {
                circuit(edit, view, text);
            } else if (target.row() == SettingChoice.class) {
                setting(edit, view, text);
            } else if (target.row() == Duty.class) {
                Duty duty = view.duty() != null ? view.duty()
                        : new Duty(edit.station(), edit.since(), null, null, null, null, null, null, null, null, null);
                follow(edit, view.duty(), duty, target.field(), text);
            } else if (target.row() == Circuit.class) {
                if (view.circuit() == null) {
                    throw refused(edit, "no circuit is recorded for this station yet");
                }
                replace(view.circuit(), target.field(), text);
            } else {
                replace(view.station(), target.field(), text);
            }
        } catch (InvalidValue e) {
            throw refused(edit, "expected " + e.expected());
        }
    }

    /** What the cells come to, referenced rows first; empty if nothing differs. */
    public List<RowChange> changes() {
        List<RowChange> changes = new ArrayList<>();
        for (Step step : steps.values()) {
            if (!Objects.equals(step.before(), step.after())) {
                changes.add(new RowChange(step.before(), step.after()));
            }
        }
        changes.sort(Comparator.comparingInt(change -> Kind.ALL.indexOf(change.kind())));
        return changes;
    }

    private void part(CellEdit edit, StationView view, EditColumns.Target target, String text) throws CoilbookException, InvalidValue {
        Fitting present = view.fitting(target.part());
        boolean isType = "type".equals(target.field());
        if (isType && !text.isEmpty()) {
            requireKnown(edit, References.catalogue(target.part()), text);
        } else if (!isType && present == null) {
            throw refused(edit, "no type is recorded for this part yet; type that first");
        }
        if (isType && text.isEmpty()) {
            if (present != null) {
                put(now(present), null);
            }
            return;
        }
        if (present == null) {
            put(null, fitting(edit, target.part(), text));
        } else if (isType && begins(edit, present)) {
            put(now(present), with(now(present), "valid_to", edit.since()));
            put(null, fitting(edit, target.part(), text));
        } else {
            Fitting after = replace(present, target.field(), text);
            keepItem(after, isType);
        }
        if (isType && target.part() == FittedKind.DRIVER) {
            dropForeignSetting(view, text);
        }
    }

    private static Fitting fitting(CellEdit edit, FittedKind part, String type) {
        return new Fitting(edit.station(), part, edit.since(), null, type, null, null, null, null, null, null, null, null, null, null);
    }

    /** A piece that is known by its serial is of the type that was typed, and exists. */
    private void keepItem(Fitting fitting, boolean typeChanged) throws CoilbookException {
        if (fitting.serial() == null) {
            return;
        }
        Kind<Item> kind = Kind.of(Item.class);
        Row item = now(kind, fitting.itemKey());
        if (item == null) {
            put(null, new Item(fitting.kind(), fitting.serial(), fitting.type(), ItemStatus.IN_SERVICE, null));
        } else if (typeChanged) {
            Item was = (Item) item;
            put(was, new Item(was.kind(), was.serial(), fitting.type(), was.status(), was.note()));
        }
    }

    /** A strap of the driver that stood there before says nothing of the new one. */
    private void dropForeignSetting(StationView view, String driver) throws CoilbookException {
        if (view.settingChoice() != null
                && register.find(Kind.of(InputSetting.class), driver + "/" + view.settingChoice().setting()) == null) {
            put(now(view.settingChoice()), null);
        }
    }

    private void circuit(CellEdit edit, StationView view, String text) throws CoilbookException, InvalidValue {
        Supply present = view.supply();
        if (text.isEmpty()) {
            if (present != null) {
                put(now(present), null);
            }
            return;
        }
        String prefix = view.station().site() + "/";
        String key = text.startsWith(prefix) ? text : prefix + text;
        requireKnown(edit, Kind.of(Circuit.class), key);
        follow(edit, present, present != null ? present : new Supply(edit.station(), edit.since(), null, key), "circuit", key);
    }

    private void setting(CellEdit edit, StationView view, String text) throws CoilbookException, InvalidValue {
        SettingChoice present = view.settingChoice();
        if (text.isEmpty()) {
            if (present != null) {
                put(now(present), null);
            }
            return;
        }
        String driver = view.driver() == null ? null : view.driver().code();
        Fitting fitted = view.fitting(FittedKind.DRIVER);
        if (fitted != null && now(fitted) instanceof Fitting current) {
            driver = current.type();
        }
        if (driver == null) {
            throw refused(edit, "no driver type is recorded for this station yet; type that first");
        }
        requireKnown(edit, Kind.of(InputSetting.class), driver + "/" + text);
        follow(edit, present, present != null ? present : new SettingChoice(edit.station(), edit.since(), null, text, Provenance.MEASURED),
                "setting",
                text);
    }

    /** Corrects the present row, or ends it and begins another. */
    private void follow(CellEdit edit, Timed present, Timed base, String field, String text) throws CoilbookException, InvalidValue {
        if (present != null && begins(edit, present)) {
            Row changed = with(withKey(now(present), edit.since()), field, text);
            put(now(present), with(now(present), "valid_to", edit.since()));
            put(null, changed);
        } else if (present == null) {
            Row known = now(Kind.of(base), base.key());
            put(null, with(known == null ? base : known, field, text));
        } else {
            replace(present, field, text);
        }
    }

    private boolean begins(CellEdit edit, Timed present) throws CoilbookException {
        if (edit.since() == null || Objects.equals(edit.since(), present.validFrom())) {
            return false;
        }
        if (present.validFrom() != null && edit.since().isBefore(present.validFrom())) {
            throw refused(edit, "expected a date after " + present.validFrom() + ", since when the present one stands");
        }
        return true;
    }

    @SuppressWarnings("unchecked")
    private <R extends Row> R replace(R present, String field, String text) throws CoilbookException, InvalidValue {
        Row current = now(present);
        Row after = with(current == null ? present : current, field, text);
        put(current, after);
        return (R) after;
    }

    private static Row with(Row row, String fieldId, String text) throws InvalidValue {
        Field field = Kind.of(row).field(fieldId);
        return with(row, fieldId, FieldText.parse(field, text, Provenance.MEASURED));
    }

    @SuppressWarnings("unchecked")
    private static <R extends Row> Row with(Row row, String fieldId, Object value) throws InvalidValue {
        Kind<R> kind = (Kind<R>) Kind.of(row);
        return kind.with((R) row, kind.field(fieldId), value);
    }

    private static Row withKey(Row row, LocalDate since) throws InvalidValue {
        return with(row, "valid_from", since);
    }

    /** The row as the cells taken so far leave it. */
    private Row now(Row row) {
        Step step = steps.get(new RowId(Kind.of(row), row.key()));
        return step == null ? row : step.after();
    }

    private Row now(Kind<?> kind, String key) throws CoilbookException {
        Step step = steps.get(new RowId(kind, key));
        return step == null ? register.find(kind, key) : step.after();
    }

    private void put(Row before, Row after) {
        Row row = after == null ? before : after;
        if (row == null) {
            return;
        }
        RowId id = new RowId(Kind.of(row), row.key());
        Step step = steps.get(id);
        steps.put(id, new Step(step == null ? before : step.before(), after));
    }

    private <R extends Row> void requireKnown(CellEdit edit, Kind<R> kind, String key) throws CoilbookException {
        if (now(kind, key) == null) {
            TreeSet<String> known = new TreeSet<>();
            register.read(kind, row -> known.add(row.key()));
            String nearest = NearestWord.of(key, known);
            String shown = nearest == null ? null : nearest.startsWith(head(key)) ? nearest.substring(head(key).length()) : nearest;
            throw refused(edit,
                    "expected a " + References.noun(kind) + " of the register" + (shown == null ? "" : "; the nearest is " + shown));
        }
    }

    private static String head(String key) {
        return key.substring(0, key.lastIndexOf('/') + 1);
    }

    private static CoilbookException refused(CellEdit edit, String problem) {
        StatusColumn column = edit.column();
        InputProblem detail = new InputProblem("", "", 0, column.heading(), edit.text() == null ? "" : edit.text(), problem);
        return new CoilbookException(CoilbookException.Reason.BAD_INPUT, edit.station() + ", " + column.heading() + ", \""
                + detail.value() + "\": " + problem + ".", List.of(detail), null);
    }
}
