package coilbook.criteria.internal.station;

import coilbook.criteria.internal.Shown;
import coilbook.fleet.Datum;
import coilbook.fleet.Duty;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.StationView;
import coilbook.fleet.Unit;

/**
 * What a station does: as recorded, else as read, else from speed and pattern: on-time = length ÷ speed, off-time = gap ÷ speed, burst rate = speed ÷
 * (length + gap), mean rate = speed ÷ pitch.
 *
 * @param meanRate cycles per second; rules heat
 * @param burstRate highest cycles per second; the mean rate where no burst is recorded
 * @param onTime shortest, s
 * @param offTime shortest, s
 */
public record StationDuty(Fact meanRate, Fact burstRate, Fact onTime, Fact offTime) {

    private static final double LONG_REST = 10;

    public static StationDuty of(StationView view) {
        Duty duty = view.duty();
        Fact rate = recorded(view, duty == null ? null : duty.cycleRate(), ReadingQuantity.CYCLE_RATE, "Cycle rate");
        Fact onTime = recorded(view, duty == null ? null : duty.onTime(), ReadingQuantity.ON_TIME, "On-time");
        Fact burst = Fact.of(duty == null ? null : duty.burstRate(), () -> Names.ofStation("Burst rate", view));
        Fact gapTime = Fact.missing(Names.ofStation("Gap", view));
        if (duty != null) {
            Datum lineSpeed = view.line() == null ? null : view.line().speed();
            Fact speed = Fact.of(duty.speed() != null ? duty.speed() : lineSpeed, () -> "Line speed of line " + view.station().lineKey());
            Fact length = Fact.of(duty.beadLength(), () -> Names.ofStation("Bead length", view));
            Fact gap = Fact.of(duty.gap(), () -> Names.ofStation("Gap", view));
            Fact pitch = Fact.of(duty.pitch(), () -> Names.ofStation("Pitch", view));
            onTime = onTime.orElse(length.with(speed, (l, v) -> l / v));
            gapTime = gap.with(speed, (g, v) -> g / v);
            burst = burst.orElse(speed.with(length.with(gap, Double::sum), (v, l) -> v / l));
            rate = rate.orElse(speed.with(pitch, (v, p) -> v / p)).orElse(burst);
        }
        burst = burst.isKnown() ? burst : rate;
        onTime = fitting(view, fitting(view, onTime, burst), rate);
        Fact rest = burst.with(onTime, (f, t) -> 1 / f - t);
        return new StationDuty(rate, burst, onTime, gapTime.orElse(rest));
    }

    /** An on-time that fills the whole period contradicts the rate. */
    private static Fact fitting(StationView view, Fact onTime, Fact rate) {
        if (!onTime.isKnown() || !rate.isKnown() || onTime.value() * rate.value() < 1) {
            return onTime;
        }
        return Fact.missing(Names.ofStation("On-time", view) + ", for " + Shown.of(onTime.value(), Unit.MILLISECOND) + " does not fit into "
                + Shown.of(rate.value(), Unit.PER_SECOND));
    }

    /** Cycles per second that rule recovery and release; of a station that stands still, one cycle after a long rest. */
    public double quickRate() {
        return burstRate.isKnown() && burstRate.value() == 0 ? 1 / (LONG_REST + (onTime.isKnown() ? onTime.value() : 0))
                : burstRate.value();
    }

    private static Fact recorded(StationView view, Datum duty, ReadingQuantity quantity, String heading) {
        return Fact.of(duty != null ? duty : Readings.newestOnStation(view, quantity), () -> Names.ofStation(heading, view));
    }
}
