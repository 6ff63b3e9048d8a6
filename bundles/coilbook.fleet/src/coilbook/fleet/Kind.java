package coilbook.fleet;

import java.lang.invoke.MethodHandle;
import java.lang.invoke.MethodHandles;
import java.lang.reflect.RecordComponent;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.StringJoiner;
import java.util.function.Function;
import java.util.stream.Collectors;

/**
 * What one kind of row is made of. Storage, exchange and grids read columns from here instead of naming them again.
 *
 * @param <R> the record
 */
public final class Kind<R extends Row> {

    /** Every kind, in an order in which a row comes after the rows it refers to. */
    public static final List<Kind<?>> ALL = List.of(make(Customer.class, "Customers"), make(Site.class, "Sites"),
            make(TransformerType.class, "Transformer types"), make(Circuit.class, "Circuits"), make(Line.class, "Lines"),
            make(ValveType.class, "Valve types"), make(CoilType.class, "Coil types"), make(DriverType.class, "Driver types"),
            make(InputSetting.class, "Input settings"), make(CableType.class, "Cable types"), make(Controller.class, "Controllers"),
            make(Station.class, "Stations"), make(Supply.class, "Supplies"), make(SettingChoice.class, "Setting choices"),
            make(Duty.class, "Duties"), make(Item.class, "Items"), make(Fitting.class, "Fittings"), make(Reading.class, "Readings"),
            make(Concession.class, "Concessions"), make(MarketMains.class, "Mains by country"),
            make(MarketTolerance.class, "Mains tolerances"), make(MarketMark.class, "Marks by country"),
            make(FleetSetting.class, "Fleet settings"));

    private static final Map<Class<?>, Kind<?>> BY_CLASS = ALL.stream()
            .collect(Collectors.toUnmodifiableMap(Kind::type, Function.identity()));

    private final Class<R> type;
    private final String id;
    private final String sheet;
    private final List<Field> fields;
    private final List<Field> keyFields;
    private final MethodHandle constructor;

    private Kind(Class<R> type, String sheet) {
        this.type = type;
        this.sheet = sheet;
        this.id = type.getSimpleName().replaceAll("([a-z0-9])([A-Z])", "$1_$2").toLowerCase(Locale.ROOT);
        RecordComponent[] components = type.getRecordComponents();
        this.fields = Arrays.stream(components).map(Field::new).toList();
        this.keyFields = fields.stream().filter(Field::isKey).toList();
        try {
            Class<?>[] types = Arrays.stream(components).map(RecordComponent::getType).toArray(Class<?>[]::new);
            this.constructor = MethodHandles.lookup().unreflectConstructor(type.getDeclaredConstructor(types))
                    .asSpreader(Object[].class, components.length);
        } catch (ReflectiveOperationException e) {
            throw new IllegalStateException(e);
        }
    }

    private static <R extends Row> Kind<R> make(Class<R> type, String sheet) {
        return new Kind<>(type, sheet);
    }

    /** The kind of a record class. */
    @SuppressWarnings("unchecked")
    public static <R extends Row> Kind<R> of(Class<R> type) {
        Kind<?> kind = BY_CLASS.get(type);
        if (kind == null) {
            throw new IllegalArgumentException(type + " is no kind of row");
        }
        return (Kind<R>) kind;
    }

    /** The kind of a row. */
    @SuppressWarnings("unchecked")
    public static <R extends Row> Kind<R> of(R row) {
        return of((Class<R>) row.getClass());
    }

    public Class<R> type() {
        return type;
    }

    /** The stable name used in storage, for example {@code coil_type}. */
    public String id() {
        return id;
    }

    /** The name of the sheet in the exchange workbook. */
    public String sheet() {
        return sheet;
    }

    public List<Field> fields() {
        return fields;
    }

    public List<Field> keyFields() {
        return keyFields;
    }

    /** Whether rows were true for an interval. */
    public boolean isTimed() {
        return Timed.class.isAssignableFrom(type);
    }

    /** Whether any column holds a quantity, so that rows carry provenance. */
    public boolean hasQuantities() {
        return fields.stream().anyMatch(f -> f.type() == FieldType.QUANTITY);
    }

    /** The field with that id.
     *
     * @throws IllegalArgumentException if there is none
     */
    public Field field(String fieldId) {
        for (Field field : fields) {
            if (field.id().equals(fieldId)) {
                return field;
            }
        }
        throw new IllegalArgumentException(id + " has no column " + fieldId);
    }

    /** The row's key: its key parts joined by {@code /}. */
    public String key(Row row) {
        StringJoiner joined = new StringJoiner("/");
        for (Field field : keyFields) {
            Object part = field.get(row);
            joined.add(part == null ? ""
                    : part instanceof Labelled term ? term.label()
                            : part instanceof Datum d ? FieldText.format(field, d)
                                    : part.toString());
        }
        return joined.toString();
    }

    /** The row's values in the order of {@link #fields()}. */
    public Object[] values(Row row) {
        Object[] values = new Object[fields.size()];
        for (int i = 0; i < values.length; i++) {
            values[i] = fields.get(i).get(row);
        }
        return values;
    }

    /**
     * A row from values in the order of {@link #fields()}, each checked.
     *
     * @throws InvalidValue for the first value that its column cannot hold
     */
    public R create(Object[] values) throws InvalidValue {
        for (int i = 0; i < values.length; i++) {
            fields.get(i).check(values[i]);
        }
        R row = construct(values);
        validateInterval(row);
        return row;
    }

    /** The same row with one value changed.
     *
     * @throws InvalidValue if the column cannot hold it
     */
    public R with(R row, Field field, Object value) throws InvalidValue {
        Object[] values = values(row);
        values[fields.indexOf(field)] = value;
        return create(values);
    }

    /** A row from values that were checked when they were stored. */
    @SuppressWarnings("unchecked")
    public R construct(Object[] values) {
        try {
            return (R) constructor.invoke(values);
        } catch (RuntimeException | Error e) {
            throw e;
        } catch (Throwable e) {
            throw new IllegalStateException(e);
        }
    }

    /**
     * Checks every value of a row.
     *
     * @throws InvalidValue for the first value that its column cannot hold, or an interval that runs backwards
     */
    public void validate(Row row) throws InvalidValue {
        for (Field field : fields) {
            field.check(field.get(row));
        }
        validateInterval(row);
    }

    private static void validateInterval(Row row) throws InvalidValue {
        if (row instanceof Timed timed && !(row instanceof Fitting) && timed.validFrom() != null && timed.validTo() != null
                && timed.validTo().isBefore(timed.validFrom())) {
            throw new InvalidValue("until", timed.validTo(), "a day not before " + timed.validFrom());
        }
    }

    /** The provenance of a row's quantities as one text: the commonest word, then exceptions by heading; empty if there are none. */
    public String provenanceText(Row row) {
        return ProvenanceText.of(this, row);
    }

    /** Types that a value of a field of this kind may be stored as, for tests. */
    public List<Class<?>> storedTypes() {
        List<Class<?>> types = new ArrayList<>();
        for (Field field : fields) {
            types.add(switch (field.type()) {
                case QUANTITY, NUMBER -> Double.class;
                case INTEGER -> Integer.class;
                case YES_NO -> Boolean.class;
                case DATE -> LocalDate.class;
                case DATE_TIME -> LocalDateTime.class;
                case MONEY -> java.math.BigDecimal.class;
                case TEXT, TERM, TEXTS -> String.class;
            });
        }
        return types;
    }

    @Override
    public String toString() {
        return id;
    }
}
