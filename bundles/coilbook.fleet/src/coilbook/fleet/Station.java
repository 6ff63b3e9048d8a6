package coilbook.fleet;

import java.time.LocalDate;

/**
 * One place on a line where a valve sits. Its code is {@code SITE/LINE/TAG}; a tag may begin with {@code =}, {@code +} or {@code -}
 * (IEC 81346). What is fitted there, which circuit feeds it, how its driver is strapped and what duty it does are rows of their own
 * ({@link Fitting}, {@link Supply}, {@link SettingChoice}, {@link Duty}), because they change with time.
 */
public record Station(@Column(value = "Site", key = true, refersTo = Site.class) String site,
        @Column(value = "Line", key = true, refersTo = Line.class) String line, @Column(value = "Tag", key = true) String tag,
        @Column("Description") String description,
        @Column(value = "Order on the line", min = 0, max = 1e6) Integer position,
        @Column(value = "Controller", refersTo = Controller.class) String controller,
        @Column(value = "Driver channel", min = 1, max = 999) Integer channel,
        @Column(value = "Coils on the channel", min = 1, max = 99) Integer coilsOnChannel,
        @Column("Coil connection") CoilConnection coilConnection,
        @Column(value = "Cable length", unit = Unit.METRE, min = 0, max = 1000) Datum cableLength,
        @Column(value = "Cable temperature", unit = Unit.CELSIUS, min = -60, max = 250) Datum cableTemperature,
        @Column(value = "Coil ambient lowest", unit = Unit.CELSIUS, min = -60, max = 300) Datum coilAmbientLowest,
        @Column(value = "Coil ambient nominal", unit = Unit.CELSIUS, min = -60, max = 300) Datum coilAmbientNominal,
        @Column(value = "Coil ambient highest", unit = Unit.CELSIUS, min = -60, max = 300) Datum coilAmbientHighest,
        @Column(value = "Body temperature", unit = Unit.CELSIUS, min = -60, max = 300) Datum bodyTemperature,
        @Column(value = "Conductance to air", unit = Unit.WATT_PER_KELVIN, min = 0, above = true, max = 1000) Datum conductanceToAir,
        @Column(value = "Conductance to body", unit = Unit.WATT_PER_KELVIN, min = 0, above = true, max = 1000) Datum conductanceToBody,
        @Column(value = "Fluid temperature", unit = Unit.CELSIUS, min = -60, max = 400) Datum fluidTemperature,
        @Column(value = "Fluid pressure", unit = Unit.BAR, min = 0, max = 1e8) Datum fluidPressure,
        @Column("Stuck-on guard") Boolean stuckOnGuard,
        @Column(value = "Discharge warning", unit = Unit.SECOND, min = 0, max = 3600) Datum dischargeWarning,
        @Column("Circuit is SELV or PELV") Boolean extraLowVoltage, @Column("Last inspection") LocalDate lastInspection,
        @Column(value = "Note", personal = true) String note) implements Row {

    /** {@code SITE/LINE}. */
    public String lineKey() {
        return site + "/" + line;
    }
}
