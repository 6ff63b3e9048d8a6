package coilbook.register.internal.store;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.Set;

import org.jooq.DataType;
import org.jooq.impl.DSL;
import org.jooq.impl.SQLDataType;

import coilbook.fleet.Field;

/**
 * How one field of a kind is stored: its value in SI, and for a quantity its provenance beside it.
 *
 * @param field what is stored
 * @param value the column of the value
 * @param provenance the column of the provenance (1 = the strongest), or {@code null} where the field is no quantity
 */
public record StoredColumn(Field field, org.jooq.Field<?> value, org.jooq.Field<Short> provenance) {

    /** The most digits before and after the decimal point of an amount. */
    static final int MONEY_DIGITS = 30;
    static final int MONEY_SCALE = 10;

    /** Words that a database reads as something else. */
    private static final Set<String> RESERVED = Set.of("value");

    static StoredColumn of(Field field) {
        String name = RESERVED.contains(field.id()) ? field.id() + "_" : field.id();
        org.jooq.Field<Short> provenance = field.type() == coilbook.fleet.FieldType.QUANTITY
                ? DSL.field(DSL.name(field.id() + "_prov"), SQLDataType.SMALLINT)
                : null;
        return new StoredColumn(field, DSL.field(DSL.name(name), type(field)), provenance);
    }

    private static DataType<?> type(Field field) {
        DataType<?> type = switch (field.type()) {
            case QUANTITY, NUMBER -> SQLDataType.DOUBLE;
            case INTEGER -> SQLDataType.INTEGER;
            case YES_NO -> SQLDataType.BOOLEAN;
            case DATE -> SQLDataType.LOCALDATE;
            case DATE_TIME -> SQLDataType.LOCALDATETIME(6);
            case MONEY -> SQLDataType.NUMERIC(MONEY_DIGITS, MONEY_SCALE);
            case TERM -> SQLDataType.VARCHAR(80);
            case TEXT, TEXTS -> SQLDataType.VARCHAR(4000);
        };
        return type.nullable(!field.isRequired());
    }

    /** The Java type of the stored value, for tests. */
    public Class<?> storedType() {
        return switch (field.type()) {
            case QUANTITY, NUMBER -> Double.class;
            case INTEGER -> Integer.class;
            case YES_NO -> Boolean.class;
            case DATE -> LocalDate.class;
            case DATE_TIME -> LocalDateTime.class;
            case MONEY -> BigDecimal.class;
            case TERM, TEXT, TEXTS -> String.class;
        };
    }
}
