package coilbook.register.internal.store;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Types;
import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import coilbook.fleet.Datum;
import coilbook.fleet.Field;
import coilbook.fleet.FieldType;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.Kind;
import coilbook.fleet.Labelled;
import coilbook.fleet.Provenance;
import coilbook.fleet.Row;
import coilbook.fleet.Site;

/**
 * Rows to columns and back. Both ways go through plain JDBC positions, because a fleet is read by the hundred thousand.
 *
 * @param <R> the record
 */
public final class RowCodec<R extends Row> {

    private static final Provenance[] PROVENANCES = Provenance.values();
    /** Ends each text of a list; no text a person types holds it. */
    private static final char LIST_END = '\u001f';

    private final KindTable<R> table;
    private final Field[] fields;
    private final List<Map<String, Labelled>> terms = new ArrayList<>();

    public RowCodec(KindTable<R> table) {
        this.table = table;
        this.fields = table.kind().fields().toArray(Field[]::new);
        for (Field field : fields) {
            Map<String, Labelled> byLabel = new HashMap<>();
            field.terms().forEach(term -> byLabel.put(term.label(), term));
            terms.add(byLabel);
        }
    }

    public KindTable<R> table() {
        return table;
    }

    /** The row whose values begin at that column of the current line. */
    public R read(ResultSet line, int first) throws SQLException {
        Object[] values = new Object[fields.length];
        int at = first;
        for (int i = 0; i < fields.length; i++) {
            if (fields[i].type() == FieldType.QUANTITY) {
                double value = line.getDouble(at);
                if (!line.wasNull()) {
                    values[i] = new Datum(value, PROVENANCES[line.getShort(at + 1) - 1]);
                }
                at += 2;
            } else {
                values[i] = plain(line, at, i);
                at++;
            }
        }
        return table.kind().construct(values);
    }

    private Object plain(ResultSet line, int at, int index) throws SQLException {
        switch (fields[index].type()) {
            case TEXT:
                return line.getString(at);
            case TERM:
                String label = line.getString(at);
                return label == null ? null : term(index, label);
            case TEXTS:
                return list(line.getString(at));
            case NUMBER:
                double number = line.getDouble(at);
                return line.wasNull() ? null : (Object) number;
            case INTEGER:
                int whole = line.getInt(at);
                return line.wasNull() ? null : (Object) whole;
            case YES_NO:
                boolean yes = line.getBoolean(at);
                return line.wasNull() ? null : (Object) yes;
            case DATE:
                return line.getObject(at, LocalDate.class);
            case DATE_TIME:
                return line.getObject(at, LocalDateTime.class);
            case MONEY:
                BigDecimal amount = line.getBigDecimal(at);
                return amount == null ? null : amount.stripTrailingZeros();
            default:
                throw new IllegalStateException(fields[index].type().name());
        }
    }

    private Labelled term(int index, String label) {
        Labelled term = terms.get(index).get(label);
        if (term == null) {
            throw new IllegalStateException(fields[index].heading() + " holds the unknown word " + label);
        }
        return term;
    }

    /** Sets the values from that parameter on. */
    public void bind(PreparedStatement statement, int first, Row row) throws SQLException {
        int at = first;
        for (Field field : fields) {
            Object value = field.get(row);
            if (field.type() == FieldType.QUANTITY) {
                if (value == null) {
                    statement.setNull(at, Types.DOUBLE);
                    statement.setNull(at + 1, Types.SMALLINT);
                } else {
                    Datum datum = (Datum) value;
                    statement.setDouble(at, datum.value());
                    statement.setShort(at + 1, (short) (datum.provenance().ordinal() + 1));
                }
                at += 2;
            } else {
                Object stored = stored(value);
                if (stored == null) {
                    statement.setNull(at, Types.NULL);
                } else {
                    statement.setObject(at, stored);
                }
                at++;
            }
        }
    }

    /** A value other than a quantity as it is stored. */
    static Object stored(Object value) {
        if (value instanceof Labelled term) {
            return term.label();
        } else if (value instanceof List<?> texts) {
            StringBuilder joined = new StringBuilder();
            texts.forEach(text -> joined.append(text).append(LIST_END));
            return joined.toString();
        }
        return value instanceof LocalDateTime time ? time.truncatedTo(ChronoUnit.MICROS) : value;
    }

    private static List<String> list(String stored) {
        if (stored == null) {
            return null;
        }
        List<String> texts = new ArrayList<>();
        int start = 0;
        for (int end = stored.indexOf(LIST_END); end >= 0; end = stored.indexOf(LIST_END, start)) {
            texts.add(stored.substring(start, end));
            start = end + 1;
        }
        return List.copyOf(texts);
    }

    /** Whether two rows hold the same once stored: amounts by their worth, times to the microsecond, zero without its sign. */
    public boolean same(Row one, Row other) {
        for (Field field : fields) {
            Object left = field.get(one);
            Object right = field.get(other);
            if (left == null || right == null ? left != right : !sameValue(left, right)) {
                return false;
            }
        }
        return true;
    }

    private static boolean sameValue(Object left, Object right) {
        if (left instanceof BigDecimal amount) {
            return amount.compareTo((BigDecimal) right) == 0;
        } else if (left instanceof Double number) {
            return number.doubleValue() == (Double) right;
        } else if (left instanceof Datum datum) {
            Datum other = (Datum) right;
            return datum.value() == other.value() && datum.provenance() == other.provenance();
        } else if (left instanceof LocalDateTime time) {
            return time.truncatedTo(ChronoUnit.MICROS).equals(((LocalDateTime) right).truncatedTo(ChronoUnit.MICROS));
        }
        return left.equals(right);
    }

    /**
     * Refuses what could be stored only by altering it, or could not be read as what it is to mean.
     *
     * @throws InvalidValue for the first such value
     */
    void checkStorable(Row row) throws InvalidValue {
        if (row instanceof Site site && site.timeZone() != null) {
            checkZone(site.timeZone());
        }
        for (Field field : fields) {
            Object value = field.get(row);
            if (value instanceof BigDecimal amount && (amount.stripTrailingZeros().scale() > StoredColumn.MONEY_SCALE
                    || amount.setScale(0, RoundingMode.DOWN).precision() > StoredColumn.MONEY_DIGITS - StoredColumn.MONEY_SCALE)) {
                throw new InvalidValue(field.heading(), amount.toPlainString(),
                        "an amount with at most 20 digits before and 10 after the point");
            } else if (value instanceof List<?> && ((String) stored(value)).length() > 4000) {
                throw new InvalidValue(field.heading(), "", "texts of at most 4000 characters together");
            }
        }
    }

    private static void checkZone(String zone) throws InvalidValue {
        try {
            ZoneId.of(zone);
        } catch (DateTimeException e) {
            throw new InvalidValue(Kind.of(Site.class).field("time_zone").heading(), zone, "a time zone such as Europe/Paris");
        }
    }
}
