package coilbook.fleet;

/** Who owns plants. */
public record Customer(@Column(value = "Customer", key = true) String code, @Column("Name") String name,
        @Column(value = "Note", personal = true) String note) implements Row {
}
