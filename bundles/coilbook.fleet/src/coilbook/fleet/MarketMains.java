package coilbook.fleet;

import java.util.List;

/**
 * What a country's public supply is, as a default to offer for an empty field and never as evidence. {@code askTheSite} marks countries with several
 * systems or with sources that disagree.
 */
public record MarketMains(@Column(value = "Country", key = true) String country, @Column("Name") String name,
        @Column("Voltages in V") List<String> voltages, @Column("Frequencies in Hz") List<String> frequencies,
        @Column("Three-phase voltages in V") String threePhase, @Column("Ask the site") Boolean askTheSite, @Column("Remark") String remark,
        @Column("Source") String source) implements Row {
}
