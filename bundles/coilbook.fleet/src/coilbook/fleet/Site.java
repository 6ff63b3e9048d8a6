package coilbook.fleet;

/**
 * A plant: where, in which country and time zone, how warm. Ambient temperatures are those of the air round the coils, in °C; without
 * them criteria that need them are undetermined.
 */
public record Site(@Column(value = "Site", key = true) String code,
        @Column(value = "Customer", refersTo = Customer.class) String customer, @Column("Name") String name,
        @Column(value = "Country", required = true) String country, @Column("Time zone") String timeZone,
        @Column(value = "Ambient lowest", unit = Unit.CELSIUS, min = -60, max = 120) Datum ambientLowest,
        @Column(value = "Ambient nominal", unit = Unit.CELSIUS, min = -60, max = 120) Datum ambientNominal,
        @Column(value = "Ambient highest", unit = Unit.CELSIUS, min = -60, max = 120) Datum ambientHighest,
        @Column(value = "Note", personal = true) String note) implements Row {
}
