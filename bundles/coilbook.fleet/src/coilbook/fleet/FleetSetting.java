package coilbook.fleet;

/** One of the fleet's own limits and habits, by name; {@link FleetSettings} holds the defaults. */
public record FleetSetting(@Column(value = "Name", key = true) String name, @Column(value = "Value", required = true) Double value,
        @Column("Why") String why) implements Row {
}
