package coilbook.register.internal.status;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import org.jooq.Condition;
import org.jooq.Field;
import org.jooq.impl.DSL;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;
import coilbook.fleet.FieldType;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.QuantityText;
import coilbook.register.FleetScope;
import coilbook.register.StatusColumn;
import coilbook.register.StatusQuery;

/** What a query asks for, as conditions on status rows. */
final class Filters {

    private static final Pattern COMPARISON = Pattern.compile("(<=|>=|!=|<>|=|<|>)\\s*(.*)", Pattern.DOTALL);
    private static final Pattern RANGE = Pattern.compile("(.+?)\\s+to\\s+(.+)", Pattern.CASE_INSENSITIVE);
    /** Numbers count as equal within this fraction, so that what is shown rounded can be asked for. */
    private static final double EQUAL = 1e-6;

    private Filters() {
    }

    static Condition of(StatusQuery query) throws CoilbookException {
        Condition all = of(query.scope());
        for (StatusQuery.Filter filter : query.filters()) {
            if (!filter.expression().isBlank()) {
                all = all.and(of(filter.column(), filter.expression().strip()));
            }
        }
        return all;
    }

    /** The rows of a scope. */
    static Condition of(FleetScope scope) {
        if (scope.isAll()) {
            return DSL.noCondition();
        }
        Condition any = DSL.falseCondition();
        if (!scope.customers().isEmpty()) {
            any = any.or(text(StatusColumn.CUSTOMER).in(scope.customers()));
        }
        if (!scope.sites().isEmpty()) {
            any = any.or(text(StatusColumn.SITE).in(scope.sites()));
        }
        for (String line : scope.lines()) {
            int slash = line.indexOf('/');
            if (slash > 0) {
                any = any.or(
                        text(StatusColumn.SITE).eq(line.substring(0, slash)).and(text(StatusColumn.LINE).eq(line.substring(slash + 1))));
            }
        }
        for (String station : scope.stations()) {
            int slash = Math.max(0, station.indexOf('/'));
            any = any.or(text(StatusColumn.SITE).eq(station.substring(0, slash)).and(text(StatusColumn.STATION).eq(station)));
        }
        return any;
    }

    private static Field<String> text(StatusColumn column) {
        return ViewTables.text(column);
    }

    private static Condition of(StatusColumn column, String expression) throws CoilbookException {
        Matcher comparison = COMPARISON.matcher(expression);
        if (column.type() == FieldType.TEXT) {
            return comparison.matches() ? compared(text(column), comparison.group(1), comparison.group(2).strip())
                    : words(text(column), expression);
        }
        Matcher range = RANGE.matcher(expression);
        if (comparison.matches()) {
            return compared(column, comparison.group(1), comparison.group(2).strip());
        } else if (range.matches()) {
            return compared(column, ">=", range.group(1)).and(compared(column, "<=", range.group(2)));
        }
        return compared(column, "=", expression);
    }

    private static Condition words(Field<String> field, String expression) {
        Condition all = DSL.noCondition();
        for (String word : expression.split("\\s+")) {
            all = all.and(field.containsIgnoreCase(word));
        }
        return all;
    }

    private static Condition compared(Field<String> field, String sign, String value) {
        if (value.isEmpty()) {
            return sign.equals("=") ? field.isNull() : field.isNotNull();
        }
        Field<String> low = DSL.lower(field);
        String wanted = value.toLowerCase(Locale.ROOT);
        return switch (sign) {
            case "=" -> low.eq(wanted);
            case "<" -> low.lt(wanted);
            case "<=" -> low.le(wanted);
            case ">" -> low.gt(wanted);
            case ">=" -> low.ge(wanted);
            default -> field.isNull().or(low.ne(wanted));
        };
    }

    private static Condition compared(StatusColumn column, String sign, String value) throws CoilbookException {
        Field<Double> field = DSL.field(DSL.name(column.id()), Double.class);
        if (value.isEmpty()) {
            return sign.equals("=") ? field.isNull() : field.isNotNull();
        }
        double number;
        try {
            number = QuantityText.parse(column.heading(), value, column.unit());
        } catch (InvalidValue e) {
            throw new CoilbookException(Reason.BAD_INPUT,
                    column.heading() + ": " + value + " is no value to look for; expected " + e.expected() + ".", e);
        }
        double slack = Math.abs(number) * EQUAL;
        return switch (sign) {
            case "=" -> field.between(number - slack, number + slack);
            case "<" -> field.lt(number - slack);
            case "<=" -> field.le(number + slack);
            case ">" -> field.gt(number + slack);
            case ">=" -> field.ge(number - slack);
            default -> field.isNull().or(field.notBetween(number - slack, number + slack));
        };
    }
}
