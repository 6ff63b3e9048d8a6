package coilbook.console.internal.command;

import java.time.LocalDate;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;

import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

import coilbook.console.internal.ExitCode;
import coilbook.console.internal.Json;
import coilbook.console.internal.Services;
import coilbook.console.internal.Terminal;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Field;
import coilbook.fleet.RowChange;
import coilbook.fleet.Station;
import coilbook.register.JournalEntry;
import coilbook.register.OpenMode;
import coilbook.register.Register;

/** {@code history}: what was recorded, by whom, when and why. */
@Command(name = "history", mixinStandardHelpOptions = true, description = "List what was recorded, by whom, when and why.")
public final class HistoryCommand implements Callable<Integer> {

    private static final int PAGE = 500;
    private static final DateTimeFormatter MINUTE = DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm", Locale.ROOT);

    private final Services services;
    private final Terminal terminal;

    @Mixin
    private RegisterOption register;
    @Option(names = "--station", paramLabel = "CODE", description = "only what touched this station's own rows (SITE/LINE/TAG)")
    private String station;
    @Option(names = "--since", paramLabel = "DATE", converter = DayConverter.class, description = "only from this day on")
    private LocalDate since;
    @Option(names = "--json", description = "one JSON object on standard output")
    private boolean json;

    public HistoryCommand(Services services, Terminal terminal) {
        this.services = services;
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws Exception {
        List<JournalEntry> entries = new ArrayList<>();
        try (Register open = services.registers().get().open(register.base(terminal), OpenMode.EXISTING)) {
            long after = 0;
            List<JournalEntry> page = open.journal(after, PAGE);
            while (!page.isEmpty()) {
                for (JournalEntry entry : page) {
                    if (isWanted(open, entry)) {
                        entries.add(entry);
                    }
                    after = entry.seq();
                }
                page = open.journal(after, PAGE);
            }
        }
        if (json) {
            writeJson(entries);
        } else {
            for (JournalEntry entry : entries) {
                terminal.out()
                        .println(entry.seq() + "  " + MINUTE.format(entry.when().atZone(ZoneId.systemDefault())) + "  " + entry.who() + "  "
                                + entry.rows() + (entry.rows() == 1 ? " row  " : " rows  ") + entry.why());
            }
        }
        return ExitCode.DONE;
    }

    private boolean isWanted(Register open, JournalEntry entry) throws CoilbookException {
        if (since != null && entry.when().atZone(ZoneId.systemDefault()).toLocalDate().isBefore(since)) {
            return false;
        }
        if (station == null) {
            return true;
        }
        for (RowChange row : open.change(entry.seq()).rows()) {
            if (touches(row)) {
                return true;
            }
        }
        return false;
    }

    private boolean touches(RowChange row) {
        if (row.row() instanceof Station) {
            return row.key().equals(station);
        }
        for (Field field : row.kind().keyFields()) {
            if (field.refersTo() == Station.class && station.equals(field.get(row.row()))) {
                return true;
            }
        }
        return false;
    }

    private void writeJson(List<JournalEntry> entries) throws CoilbookException {
        Json.write(terminal.out(), generator -> {
            generator.writeArrayFieldStart("entries");
            for (JournalEntry entry : entries) {
                generator.writeStartObject();
                generator.writeNumberField("seq", entry.seq());
                generator.writeStringField("when", entry.when().toString());
                generator.writeStringField("who", entry.who());
                generator.writeStringField("why", entry.why());
                generator.writeNumberField("rows", entry.rows());
                if (entry.compensates() == 0) {
                    generator.writeNullField("compensates");
                } else {
                    generator.writeNumberField("compensates", entry.compensates());
                }
                generator.writeStringField("digest", entry.digest());
                generator.writeEndObject();
            }
            generator.writeEndArray();
        });
    }
}
