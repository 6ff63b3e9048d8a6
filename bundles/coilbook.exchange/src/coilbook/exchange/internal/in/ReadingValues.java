package coilbook.exchange.internal.in;

import coilbook.fleet.FieldText;
import coilbook.fleet.InvalidValue;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.Unit;

/** What values a reading may have: the column itself holds any quantity, so the range depends on which one it is. */
final class ReadingValues {

    private ReadingValues() {
    }

    /**
     * @param si the value in SI
     * @throws InvalidValue if nobody can have measured it
     */
    static void check(String heading, String shown, ReadingQuantity quantity, double si) throws InvalidValue {
        double least = leastShown(quantity);
        double value = quantity.unit().fromSi(si);
        boolean mayBeZero = switch (quantity) {
            case INSULATION_RESISTANCE, EARTH_CONTINUITY, COUNTER, CYCLE_RATE, HOLD_VOLTAGE, MAINS_VOLTAGE -> true;
            default -> quantity.unit() == Unit.CELSIUS;
        };
        boolean low = value < least || !mayBeZero && value == least;
        boolean high = quantity.unit() == Unit.CELSIUS && value > 400;
        if (low || high || Double.isNaN(value)) {
            String unit = quantity.unit().symbol().isEmpty() ? "" : " " + quantity.unit().symbol();
            throw new InvalidValue(heading, shown, "a " + quantity.label()
                    + (high ? " up to 400" : (mayBeZero ? " of at least " : " above ") + FieldText.number(least)) + unit);
        }
    }

    private static double leastShown(ReadingQuantity quantity) {
        return quantity.unit() == Unit.CELSIUS ? -90 : 0;
    }
}
