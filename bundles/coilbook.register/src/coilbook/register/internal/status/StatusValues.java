package coilbook.register.internal.status;

import java.util.Map;

import coilbook.criteria.Verdict;
import coilbook.fleet.Datum;
import coilbook.fleet.FittedKind;
import coilbook.fleet.Fitting;
import coilbook.fleet.StationView;
import coilbook.register.Status.Counts;
import coilbook.register.StatusColumn;

/** The values of a status row, from what is recorded of a station and what was computed of it. */
final class StatusValues {

    private StatusValues() {
    }

    /** In the order of {@link StatusColumn}. */
    static Object[] of(StationView view, Judged judged) {
        Object[] values = new Object[StatusColumn.values().length];
        for (StatusColumn column : StatusColumn.values()) {
            values[column.ordinal()] = column.isComputed() ? computed(column, judged) : recorded(column, view);
        }
        return values;
    }

    /** Where the verdict stands among the verdicts, the worst first; a hazard before all. */
    static int rank(Judged judged) {
        return judged.counts().hazards() > 0 ? 0 : judged.worst().ordinal() + 1;
    }

    private static Object computed(StatusColumn column, Judged judged) {
        Counts counts = judged.counts();
        return switch (column) {
            case VERDICT -> counts.hazards() > 0 ? "hazard"
                    : judged.worst() == Verdict.NOT_APPLICABLE ? Verdict.CONFORMITY.label() : judged.worst().label();
            case HAZARDS -> (int) counts.hazards();
            case NONCONFORMITIES -> (int) counts.nonconformities();
            case OBSERVATIONS -> (int) counts.observations();
            case UNDETERMINED -> (int) counts.undetermined();
            case CONCEDED -> (int) counts.conceded();
            default -> finite(judged.computed(), column);
        };
    }

    private static Object finite(Map<StatusColumn, Object> computed, StatusColumn column) {
        Object value = computed.get(column);
        return value instanceof Double number && !Double.isFinite(number) ? null : value;
    }

    private static Object recorded(StatusColumn column, StationView view) {
        return switch (column) {
            case STATION -> view.code();
            case CUSTOMER -> view.customer() == null ? null : view.customer().code();
            case SITE -> view.station().site();
            case LINE -> view.station().line();
            case TAG -> view.station().tag();
            case DESCRIPTION -> view.station().description();
            case COUNTRY -> view.site() == null ? null : view.site().country();
            case CIRCUIT -> view.circuit() == null ? null : view.circuit().code();
            case MAINS_VOLTAGE -> view.circuit() == null ? null : value(view.circuit().nominalVoltage());
            case MAINS_FREQUENCY -> view.circuit() == null ? null : value(view.circuit().nominalFrequency());
            case VALVE_TYPE -> type(view.fitting(FittedKind.VALVE));
            case COIL_TYPE -> type(view.fitting(FittedKind.COIL));
            case COIL_SERIAL -> serial(view.fitting(FittedKind.COIL));
            case DRIVER_TYPE -> type(view.fitting(FittedKind.DRIVER));
            case DRIVER_SERIAL -> serial(view.fitting(FittedKind.DRIVER));
            case INPUT_SETTING -> view.settingChoice() == null ? null : view.settingChoice().setting();
            case CABLE_TYPE -> type(view.fitting(FittedKind.CABLE));
            case CABLE_LENGTH -> value(view.station().cableLength());
            case CYCLE_RATE -> view.duty() == null ? null : value(view.duty().cycleRate());
            case ON_TIME -> view.duty() == null ? null : value(view.duty().onTime());
            default -> throw new IllegalArgumentException(column.id() + " is not recorded");
        };
    }

    private static Object type(Fitting fitting) {
        return fitting == null ? null : fitting.type();
    }

    private static Object serial(Fitting fitting) {
        return fitting == null ? null : fitting.serial();
    }

    private static Object value(Datum datum) {
        return datum == null ? null : (Object) datum.value();
    }
}
