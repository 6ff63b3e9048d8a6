package coilbook.exchange.internal.in;

import coilbook.fleet.Field;
import coilbook.fleet.Kind;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.Unit;

/**
 * What a column of an input file holds.
 *
 * @param id {@code kind.field}, a flat list's own name, or {@code kind.provenance}
 * @param heading its proper heading, for messages
 * @param kind the kind whose field it is, or {@code null}
 * @param field the field, or {@code null} for texts that are taken apart and for provenance
 * @param quantity the quantity of a reading, or {@code null}
 */
record Target(String id, String heading, Kind<?> kind, Field field, ReadingQuantity quantity) {

    /** A column that is passed over on purpose. */
    static final Target IGNORED = new Target("", "", null, null, null);

    Unit unit() {
        return quantity != null ? quantity.unit() : field != null ? field.unit() : Unit.NONE;
    }

    boolean isIgnored() {
        return id.isEmpty();
    }
}
