package coilbook.criteria.internal.station;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import coilbook.electrics.CoilFigures;
import coilbook.electrics.Corner;
import coilbook.electrics.Data;
import coilbook.electrics.Derived;
import coilbook.electrics.DriverFigures;
import coilbook.electrics.StationCircuit;
import coilbook.electrics.SupplyRange;
import coilbook.fleet.CoilType;
import coilbook.fleet.Datum;
import coilbook.fleet.DriverKind;
import coilbook.fleet.DriverType;
import coilbook.fleet.FittedKind;
import coilbook.fleet.FleetSettings;
import coilbook.fleet.Kind;
import coilbook.fleet.LevelChange;
import coilbook.fleet.Provenance;
import coilbook.fleet.StationView;
import coilbook.fleet.ValveType;

/**
 * What the register knows of a station, as the electrics ask for it: each datum with its provenance, or with what is missing in the words of the columns.
 * Where the temperature of the coil's surroundings is only bounded, the warmer bound counts as the highest and the cooler as the lowest; where the cable is
 * not known it counts as none. Both are the unfavourable side for heat and output current; the criteria know about it.
 */
public final class StationData {

    private static final DriverType NO_DRIVER = Kind.of(DriverType.class).construct(new Object[Kind.of(DriverType.class).fields().size()]);
    private static final double TWO_DIODES = 1.4;
    private static final double ONE_DIODE = 0.7;

    private final StationView view;
    private final Channel channel;
    private final InputVoltage input;
    private final CoilAmbient ambient;
    private final StationDuty duty;
    private final Fact cable;
    private final Map<String, Fact> facts = new HashMap<>();
    private final StationCircuit circuit;

    public StationData(StationView view) {
        this.view = view;
        this.channel = Channel.of(view);
        this.input = InputVoltage.of(view);
        this.ambient = CoilAmbient.of(view);
        this.duty = StationDuty.of(view);
        this.cable = CableResistance.of(view);
        this.circuit = circuit(ambient.highest().to().isKnown() ? ambient.highest().to() : ambient.highest().from());
    }

    /** The circuit as the electrics derive from it. */
    public StationCircuit circuit() {
        return circuit;
    }

    /** The same with the cooler bound of the highest ambient: what is not met even then is not met for certain. */
    public StationCircuit coolestCircuit() {
        return circuit(ambient.highest().from());
    }

    public Channel channel() {
        return channel;
    }

    public InputVoltage input() {
        return input;
    }

    public CoilAmbient ambient() {
        return ambient;
    }

    public StationDuty duty() {
        return duty;
    }

    /** Ω, both conductors; what is missing where it is not known. */
    public Fact cable() {
        return cable;
    }

    /** A datum by its id in {@link Data}. */
    public Fact fact(String id) {
        Fact fact = facts.get(id);
        if (fact == null) {
            throw new IllegalArgumentException("no datum is called " + id);
        }
        return fact;
    }

    /** What a derived value lacks, in the words of the columns. */
    public List<String> missing(Derived derived) {
        return names(derived.missing(), derived.at() == null ? Corner.NOMINAL : derived.at().corner());
    }

    /** What a derived value had to be bounded for, in the words of the columns. */
    public List<String> bounded(Derived derived) {
        return names(derived.bounded(), derived.at() == null ? Corner.NOMINAL : derived.at().corner());
    }

    private List<String> names(List<String> ids, Corner corner) {
        List<String> names = new ArrayList<>();
        for (String id : ids) {
            List<String> missing = id.equals(Data.AMBIENT) ? span(corner).from().missing() : fact(id).missing();
            if (missing.isEmpty()) {
                missing = List.of(Names.ofStation("Values that do not contradict one another", view));
            }
            missing.stream().filter(name -> !names.contains(name)).forEach(names::add);
        }
        return names;
    }

    private CoilAmbient.Span span(Corner corner) {
        return switch (corner) {
            case LOW_HOT, HOT -> ambient.highest();
            case LOW_COLD, HIGH_COLD -> ambient.lowest();
            case NOMINAL -> ambient.nominal();
        };
    }

    /** The weakest provenance of the data named, those that are known. */
    public Provenance weakest(String... ids) {
        Provenance weakest = null;
        for (String id : ids) {
            weakest = Provenance.weaker(weakest, fact(id).provenance());
        }
        return weakest;
    }

    /** The weakest provenance of all that decides the current of this kind of driver. */
    public Provenance weakestOfCurrent() {
        Provenance driver = facts.entrySet().stream().filter(e -> e.getKey().startsWith("driver.")).map(e -> e.getValue().provenance())
                .reduce(null, Provenance::weaker);
        Provenance stated = Provenance.weaker(Provenance.weaker(driver, cable.provenance()),
                weakest(Data.COIL_RESISTANCE, Data.INDUCTANCE));
        return restsOnDefaults() ? Provenance.ASSUMED : stated;
    }

    /** Whether a drop or tolerance that decides the current had to be taken by rule, since the driver type does not state it. */
    private boolean restsOnDefaults() {
        DriverType type = view.driver();
        if (type == null || type.kind() == null) {
            return false;
        }
        return type.switchDrop() == null || type.kind() == DriverKind.LINE_CAPACITOR
                && (type.rectifierDrop() == null || type.seriesResistanceTolerance() == null || type.capacitanceTolerance() == null);
    }

    private StationCircuit circuit(Fact highestAmbient) {
        SupplyRange supply = new SupplyRange(put(Data.MAINS_NOMINAL_VOLTAGE, input.nominal()), put(Data.MAINS_LOWEST_VOLTAGE, input.low()),
                put(Data.MAINS_HIGHEST_VOLTAGE, input.high()), put(Data.MAINS_FREQUENCY, input.frequency()));
        ValveType valve = view.valve();
        Fact noValve = Fact.missing(Names.noType(FittedKind.VALVE, view));
        Fact highestRate = valve == null ? noValve : Fact.of(valve.highestRate(), () -> Names.ofValve("Highest cycle rate", view));
        Fact closingDelay = valve == null ? noValve : Fact.of(valve.closingDelay(), () -> Names.ofValve("Closing delay", view));
        facts.put(Data.AMBIENT, highestAmbient);
        return new StationCircuit(supply, driver(), coil(), cable.isKnown() ? cable.value() : 0, ambient.lowest().from().value(),
                ambient.nominal().isExact() ? ambient.nominal().from().value() : ambient.nominal().to().value(), highestAmbient.value(),
                put(Data.DUTY_RATE, duty.meanRate()), duty.quickRate(), put(Data.DUTY_ON_TIME, duty.onTime()),
                valve == null ? Double.NaN : Datum.orNaN(valve.openingDelay()), put(Data.VALVE_CLOSING_DELAY, closingDelay),
                put(Data.VALVE_HIGHEST_RATE, highestRate));
    }

    private double put(String id, Fact fact) {
        facts.put(id, fact);
        return fact.value();
    }

    private double driver(String id, Datum datum, String heading) {
        return put(id, view.driver() == null ? Fact.missing(Names.noType(FittedKind.DRIVER, view))
                : Fact.of(datum, () -> Names.ofDriver(heading, view)));
    }

    private DriverFigures driver() {
        DriverType type = view.driver() == null ? NO_DRIVER : view.driver();
        facts.put(Data.DRIVER_KIND, kind(view));
        double seriesTolerance = Datum.or(type.seriesResistanceTolerance(),
                view.fleetSettings().get(FleetSettings.SERIES_RESISTANCE_TOLERANCE));
        double capacitorTolerance = Datum.or(type.capacitanceTolerance(), view.fleetSettings().get(FleetSettings.CAPACITANCE_TOLERANCE));
        return new DriverFigures(type.kind(), driver(Data.SERIES_RESISTANCE, type.seriesResistance(), "Series resistance"), seriesTolerance,
                driver(Data.CAPACITANCE, type.capacitance(), "Capacitance"), capacitorTolerance, Datum.or(type.rectifierDrop(), TWO_DIODES),
                Datum.or(type.switchDrop(), 0), Datum.or(type.clampVoltage(), ONE_DIODE), Datum.orNaN(type.bleedResistance()),
                driver(Data.PULL_IN_VOLTAGE, type.pullInVoltage(), "Pull-in voltage"),
                driver(Data.PULL_IN_TIME, type.pullInTime(), "Pull-in time"),
                driver(Data.HOLD_VOLTAGE, type.holdVoltage(), "Hold voltage"),
                type.levelChange() == null ? LevelChange.SOURCE : type.levelChange(),
                driver(Data.BUS_VOLTAGE, type.busVoltage(), "Bus voltage"), driver(Data.PEAK_CURRENT, type.peakCurrent(), "Peak current"),
                driver(Data.PEAK_TIME, type.peakTime(), "Peak time"), driver(Data.HOLD_CURRENT, type.holdCurrent(), "Hold current"),
                driver(Data.OUTPUT_VOLTAGE, type.outputVoltage(), "Output voltage"),
                driver(Data.EFFICIENCY, type.efficiency(), "Efficiency"),
                driver(Data.POWER_FACTOR, type.powerFactor(), "Power factor"), Datum.orNaN(type.standbyPower()));
    }

    /** The kind decides nothing by its value; it is missing where no waveform can be computed. */
    private static Fact kind(StationView view) {
        if (view.driver() == null) {
            return Fact.missing(Names.noType(FittedKind.DRIVER, view));
        } else if (view.driver().kind() == null) {
            return Fact.missing(Names.ofDriver("Kind", view));
        }
        return switch (view.driver().kind()) {
            case LINE_CAPACITOR, TWO_LEVEL, FIXED_DC, CURRENT_REGULATED -> Fact.known(0, null);
            case RECTIFIED_AC, DIRECT_AC ->
                Fact.missing("Waveform of a " + view.driver().kind().label() + " driver, which is not computed yet");
        };
    }

    private Fact coil(Datum datum, String heading) {
        return view.coil() == null ? Fact.missing(Names.noType(FittedKind.COIL, view)) : Fact.of(datum, () -> Names.ofCoil(heading, view));
    }

    private CoilFigures coil() {
        CoilType type = view.coil();
        WindingResistance winding = WindingResistance.of(view);
        boolean known = type != null;
        Fact inductance = channel.impedance(coil(known ? type.inductance() : null, "Inductance"));
        Fact closed = channel.impedance(coil(known ? type.inductanceClosed() : null, "Inductance closed"));
        Fact pullIn = channel.current(coil(known ? type.pullInCurrent() : null, "Pull-in current"));
        Fact dropOut = channel.current(coil(known ? type.dropOutCurrent() : null, "Drop-out current"));
        Fact thermal = channel.thermalResistance(coil(known ? type.thermalResistance() : null, "Thermal resistance"));
        Fact dissipation = channel.power(coil(known ? type.highestDissipation() : null, "Highest dissipation"));
        Fact classLimit = !known ? Fact.missing(Names.noType(FittedKind.COIL, view))
                : type.insulationClass() == null ? Fact.missing(Names.ofCoil("Insulation class", view))
                        : Fact.known(type.insulationClass().limitCelsius(), null);
        return new CoilFigures(channel.impedance(winding.lowest()).value(),
                put(Data.COIL_RESISTANCE, channel.impedance(winding.resistance20().with(winding.tolerance(), (r, tolerance) -> r))),
                channel.impedance(winding.highest()).value(), put(Data.INDUCTANCE, inductance), closed.value(),
                put(Data.PULL_IN_CURRENT, pullIn),
                put(Data.DROP_OUT_CURRENT, dropOut), put(Data.THERMAL_RESISTANCE, thermal), dissipation.value(),
                known ? Datum.orNaN(type.dissipationAmbient()) : Double.NaN, put(Data.INSULATION_CLASS, classLimit),
                view.fleetSettings().get(FleetSettings.HOT_SPOT_ALLOWANCE));
    }
}
