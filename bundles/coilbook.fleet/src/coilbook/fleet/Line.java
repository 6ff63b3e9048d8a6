package coilbook.fleet;

/** A machine at a site; its speed is that of the web or product past the applicators, in m/s. */
public record Line(@Column(value = "Site", key = true, refersTo = Site.class) String site,
        @Column(value = "Line", key = true) String code, @Column("Machine") String machine,
        @Column(value = "Line speed", unit = Unit.METRE_PER_SECOND, min = 0, above = true, max = 100) Datum speed,
        @Column(value = "Note", personal = true) String note) implements Row {
}
