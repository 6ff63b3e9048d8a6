package coilbook.exchange.internal.out;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;

import coilbook.exchange.internal.ExchangeSheets;
import coilbook.fleet.CoilbookException;
import coilbook.fleet.Kind;
import coilbook.fleet.Progress;
import coilbook.fleet.Row;
import coilbook.fleet.Station;
import coilbook.register.AsOf;
import coilbook.register.FleetScope;
import coilbook.register.Register;

/** Writes the whole fleet as a plain exchange workbook: inputs alone, one sheet a kind, nothing computed. */
public final class ExchangeWriter {

    /**
     * Writes the fleet as it is on a day.
     *
     * @throws CoilbookException with reason BAD_INPUT if the file cannot be written
     */
    public void write(Register register, LocalDate asOf, Path out, Progress progress) throws CoilbookException {
        try {
            AtomicFile.write(out, temporary -> {
                try (Book book = new Book("Coilbook fleet", "The whole fleet, as of " + asOf, asOf)) {
                    Watch watch = new Watch(progress, 0);
                    for (Kind<?> kind : ExchangeSheets.KINDS) {
                        sheet(book, kind, register, asOf, watch);
                    }
                    watch.step("Packing the workbook");
                    book.write(temporary);
                }
            });
        } catch (Watch.Stopped e) {
            throw e.reason();
        }
    }

    private static <R extends Row> void sheet(Book book, Kind<R> kind, Register register, LocalDate asOf, Watch watch)
            throws CoilbookException {
        EntitySheet sheet = new EntitySheet(book, kind, List.of());
        String step = "Writing " + kind.sheet().toLowerCase(java.util.Locale.ROOT);
        if (kind.type() == Station.class) {
            register.stations(FleetScope.all(), AsOf.on(asOf), watch.each(step,
                    view -> sheet.begin(view.station(), view.supply(), view.settingChoice(), view.duty())));
        } else {
            register.read(kind, watch.each(step, row -> sheet.begin(row)));
        }
        sheet.out().end();
    }
}
