package coilbook.fleet;

import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/**
 * What a component of an entity record is called and may hold. Storage, exchange workbook and grids take their columns from here, so a
 * new column is one line in its record (and a migration).
 */
@Retention(RetentionPolicy.RUNTIME)
@Target(ElementType.RECORD_COMPONENT)
public @interface Column {

    /** The heading without its unit, in the words of the trade; unique within its entity. */
    String value();

    /** The unit in which files and screens show the value. */
    Unit unit() default Unit.NONE;

    /** Whether the component is part of the row's key. A key part is required. */
    boolean key() default false;

    /** Whether a row without this value is refused. */
    boolean required() default false;

    /** Least value allowed, in SI. */
    double min() default Double.NEGATIVE_INFINITY;

    /** Greatest value allowed, in SI. */
    double max() default Double.POSITIVE_INFINITY;

    /** Whether {@link #min} itself is refused: a resistance must be above zero. */
    boolean above() default false;

    /** The kind whose key this text names ({@code Row.class} = no reference). */
    Class<? extends Row> refersTo() default Row.class;

    /** Whether the text names a person or may hold personal words; such cells can be blanked later. */
    boolean personal() default false;
}
