package coilbook.fleet;

import java.time.LocalDate;

/** Which input setting the driver at a station was strapped to, and when; the code is one of its driver type's {@link InputSetting}s. */
public record SettingChoice(@Column(value = "Station", key = true, refersTo = Station.class) String station,
        @Column(value = "Setting since", key = true) LocalDate validFrom, @Column("Setting until") LocalDate validTo,
        @Column(value = "Input setting", required = true) String setting,
        @Column("Setting provenance") Provenance provenance) implements Timed {
}
