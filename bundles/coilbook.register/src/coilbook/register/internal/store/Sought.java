package coilbook.register.internal.store;

import java.util.Arrays;
import java.util.Collection;

import org.jooq.Field;
import org.jooq.Record1;
import org.jooq.Table;
import org.jooq.impl.DSL;
import org.jooq.impl.SQLDataType;

/**
 * A list of values as a table to join with: each is looked up through the index once. In a list behind IN the database compares every row found with
 * every value again.
 */
public final class Sought {

    /** The one column of a list of texts. */
    public static final Field<String> TEXT = DSL.field(DSL.name("sought", "sought_text"), SQLDataType.VARCHAR);
    /** The one column of a list of numbers. */
    public static final Field<Long> NUMBER = DSL.field(DSL.name("sought", "sought_number"), SQLDataType.BIGINT);

    private Sought() {
    }

    /** Texts without repetition. */
    @SuppressWarnings("unchecked")
    public static Table<Record1<String>> texts(Collection<String> texts) {
        return (Table<Record1<String>>) DSL.unnest(texts.stream().distinct().toArray(String[]::new)).as("sought", "sought_text");
    }

    /** Numbers, none twice. */
    @SuppressWarnings("unchecked")
    public static Table<Record1<Long>> numbers(long[] numbers) {
        return (Table<Record1<Long>>) DSL.unnest(Arrays.stream(numbers).boxed().toArray(Long[]::new)).as("sought", "sought_number");
    }
}
