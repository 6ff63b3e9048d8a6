package coilbook.fleet;

import java.math.BigDecimal;
import java.util.List;

/**
 * A catalogue entry of a coil. Resistance at 20 °C with its tolerance as a fraction; inductance with the plunger open and, where known,
 * closed; pull-in current at the stated pressure; highest dissipation at the stated ambient; thermal resistance from mean winding to
 * ambient.
 */
public record CoilType(@Column(value = "Type", key = true) String code, @Column("Maker") String maker, @Column("Status") TypeStatus status,
        @Column("Family") String family, @Column("Rated kind") CoilKind ratedKind,
        @Column(value = "Rated voltage", unit = Unit.VOLT, min = 0, above = true, max = 1000) Datum ratedVoltage,
        @Column(value = "Rated frequency", unit = Unit.HERTZ, min = 10, max = 400) Datum ratedFrequency,
        @Column(value = "Resistance at 20 °C", unit = Unit.OHM, min = 0, above = true, max = 1e7) Datum resistance20,
        @Column(value = "Resistance tolerance", unit = Unit.PERCENT, min = 0, max = 0.5) Datum resistanceTolerance,
        @Column(value = "Inductance", unit = Unit.MILLIHENRY, min = 0, above = true, max = 1000) Datum inductance,
        @Column(value = "Inductance closed", unit = Unit.MILLIHENRY, min = 0, above = true, max = 1000) Datum inductanceClosed,
        @Column(value = "Pull-in current", unit = Unit.AMPERE, min = 0, above = true, max = 1000) Datum pullInCurrent,
        @Column(value = "Pull-in pressure", unit = Unit.BAR, min = 0, max = 1e9) Datum pullInPressure,
        @Column(value = "Drop-out current", unit = Unit.AMPERE, min = 0, above = true, max = 1000) Datum dropOutCurrent,
        @Column(value = "Ride-through time", unit = Unit.MILLISECOND, min = 0, max = 1) Datum rideThrough,
        @Column(value = "Highest dissipation", unit = Unit.WATT, min = 0, above = true, max = 1e5) Datum highestDissipation,
        @Column(value = "Dissipation ambient", unit = Unit.CELSIUS, min = -60, max = 300) Datum dissipationAmbient,
        @Column(value = "Thermal resistance", unit = Unit.KELVIN_PER_WATT, min = 0, above = true, max = 1e4) Datum thermalResistance,
        @Column(value = "Thermal time constant", unit = Unit.SECOND, min = 0, above = true, max = 1e6) Datum thermalTimeConstant,
        @Column("Insulation class") InsulationClass insulationClass,
        @Column(value = "Insulation voltage", unit = Unit.VOLT, min = 0, above = true, max = 1e5) Datum insulationVoltage,
        @Column(value = "Insulation peak voltage", unit = Unit.VOLT, min = 0, above = true, max = 1e5) Datum insulationPeakVoltage,
        @Column("Connector") String connector, @Column("Pinout") String pinout,
        @Column("Approved driver types") List<String> approvedDrivers,
        @Column(value = "Expected life", min = 0, above = true, max = 1e12) Datum expectedLifeCycles,
        @Column(value = "Price", min = 0) BigDecimal price,
        @Column(value = "Labour", unit = Unit.MINUTE, min = 0, max = 360000) Datum labour,
        @Column(value = "Stock on hand", min = 0, max = 1e6) Integer stock, @Column("Source") String source) implements Row {
}
