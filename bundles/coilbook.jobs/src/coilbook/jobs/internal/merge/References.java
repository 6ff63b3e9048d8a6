package coilbook.jobs.internal.merge;

import java.util.ArrayList;
import java.util.List;

import coilbook.fleet.CableType;
import coilbook.fleet.Circuit;
import coilbook.fleet.CoilType;
import coilbook.fleet.Controller;
import coilbook.fleet.DriverType;
import coilbook.fleet.Field;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.InputSetting;
import coilbook.fleet.Item;
import coilbook.fleet.Kind;
import coilbook.fleet.Line;
import coilbook.fleet.Reading;
import coilbook.fleet.Row;
import coilbook.fleet.Station;
import coilbook.fleet.ValveType;

/** Which other rows a row names: by its columns' own statement, and where the kind of the row decides what a code means. */
public final class References {

    /** A row that must exist. */
    public record Reference(Field field, Kind<?> kind, String key) {
    }

    private References() {
    }

    /** What the row names, in the order of its columns. */
    public static List<Reference> of(Row row) {
        Kind<?> kind = Kind.of(row);
        List<Reference> references = new ArrayList<>();
        for (Field field : kind.fields()) {
            if (field.refersTo() != null && field.get(row) instanceof String code) {
                references.add(new Reference(field, Kind.of(field.refersTo()), qualified(row, field, code)));
            }
        }
        if (row instanceof Fitting fitting && fitting.type() != null) {
            references.add(new Reference(kind.field("type"), catalogue(fitting.kind()), fitting.type()));
        } else if (row instanceof Item item && item.type() != null) {
            references.add(new Reference(kind.field("type"), catalogue(item.kind()), item.type()));
        } else if (row instanceof Reading reading) {
            Kind<?> subject = switch (reading.subjectKind()) {
                case STATION -> Kind.of(Station.class);
                case ITEM -> Kind.of(Item.class);
                case CIRCUIT -> Kind.of(Circuit.class);
            };
            references.add(new Reference(kind.field("subject"), subject, reading.subject()));
        }
        return references;
    }

    private static String qualified(Row row, Field field, String code) {
        if (row instanceof Station station && (field.refersTo() == Line.class || field.refersTo() == Controller.class)) {
            String prefix = station.site() + "/";
            return code.startsWith(prefix) ? code : prefix + code;
        }
        return code;
    }

    /** The catalogue that holds the types of a kind of part. */
    public static Kind<?> catalogue(FittedKind kind) {
        return switch (kind) {
            case VALVE -> Kind.of(ValveType.class);
            case COIL -> Kind.of(CoilType.class);
            case DRIVER -> Kind.of(DriverType.class);
            case CABLE -> Kind.of(CableType.class);
        };
    }

    /** The word for one row of a kind, for messages. */
    public static String noun(Kind<?> kind) {
        return kind.type() == InputSetting.class ? "input setting" : kind.id().replace('_', ' ');
    }
}
