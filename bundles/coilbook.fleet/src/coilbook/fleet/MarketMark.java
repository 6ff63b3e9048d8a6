package coilbook.fleet;

/** A conformity mark that a country asks for on equipment of this sort; to be checked with the local authority. */
public record MarketMark(@Column(value = "Country", key = true) String country, @Column(value = "Mark", key = true) String mark,
        @Column("Alternatives") String alternatives, @Column("Applies") String applies, @Column("Remark") String remark,
        @Column("Source") String source) implements Row {
}
