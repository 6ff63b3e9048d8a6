package coilbook.fleet;

/** One piece with a serial number; its type is a key of the catalogue of its kind. */
public record Item(@Column(value = "Kind", key = true) FittedKind kind, @Column(value = "Serial", key = true) String serial,
        @Column(value = "Type", required = true) String type, @Column("Status") ItemStatus status,
        @Column(value = "Note", personal = true) String note) implements Row {
}
