package coilbook.exchange.internal.out;

import java.io.BufferedOutputStream;
import java.io.File;
import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.Comparator;
import java.util.Date;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

import org.apache.commons.compress.archivers.zip.Zip64Mode;
import org.apache.poi.ooxml.POIXMLProperties;
import org.apache.poi.ss.usermodel.PageMargin;
import org.apache.poi.ss.usermodel.PrintSetup;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.util.Reproducibility;
import org.apache.poi.util.TempFile;
import org.apache.poi.util.TempFileCreationStrategy;
import org.apache.poi.xssf.streaming.SXSSFSheet;
import org.apache.poi.xssf.streaming.SXSSFWorkbook;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/**
 * A workbook being written: sheets that stream to a folder of temporary files, styles, what print-outs carry. The same content gives the same bytes: the
 * document's dates are the date of the audit and entries of the archive carry no time.
 */
final class Book implements AutoCloseable {

    /** Rows of a sheet kept in memory. */
    private static final int WINDOW = 100;
    /** Characters that fit across a landscape page at a size that can be read without effort. */
    private static final int READABLE_WIDTH = 215;

    private final Path folder;
    private final XSSFWorkbook workbook;
    private final SXSSFWorkbook streamed;
    private final Styles styles;
    private final String footer;
    private boolean written;

    /**
     * @param title for the document's properties and the page headers
     * @param footer scope and date, as printed on every page
     * @param date the document's date
     */
    Book(String title, String footer, LocalDate date) throws IOException {
        this.folder = Files.createTempDirectory("coilbook-sheets");
        this.footer = footer.replace("&", "&&");
        this.workbook = new XSSFWorkbook();
        this.streamed = within(() -> new SXSSFWorkbook(workbook, WINDOW, false, false));
        this.styles = new Styles(workbook);
        POIXMLProperties.CoreProperties core = workbook.getProperties().getCoreProperties();
        Optional<Date> day = Optional.of(Date.from(date.atStartOfDay(ZoneOffset.UTC).toInstant()));
        core.setCreated(day);
        core.setModified(day);
        core.setCreator("Coilbook");
        core.setTitle(title);
        core.setSubjectProperty(footer);
        workbook.getProperties().getExtendedProperties().setApplication("Coilbook");
    }

    Styles styles() {
        return styles;
    }

    /** A sheet that is kept whole in memory, for what is drawn rather than listed. */
    XSSFSheet page(String name) {
        XSSFSheet sheet = workbook.createSheet(name);
        within(() -> streamed.getSheet(name));
        print(sheet, 1);
        return sheet;
    }

    /** A sheet of rows. */
    SheetOut sheet(String name, List<Column> columns, int frozenColumns) {
        return within(() -> {
            var sheet = streamed.createSheet(name);
            print(sheet, pagesWide(columns, frozenColumns));
            return new SheetOut(sheet, styles, columns, frozenColumns);
        });
    }

    /** How many pages side by side a sheet needs to stay readable; the frozen columns are repeated on each. */
    private static int pagesWide(List<Column> columns, int frozenColumns) {
        int frozen = columns.subList(0, frozenColumns).stream().mapToInt(Column::width).sum();
        int rest = columns.subList(frozenColumns, columns.size()).stream().mapToInt(Column::width).sum();
        int room = READABLE_WIDTH - frozen;
        return Math.max(1, (rest + room - 1) / room);
    }

    private void print(Sheet sheet, int pagesWide) {
        sheet.setFitToPage(true);
        PrintSetup setup = sheet.getPrintSetup();
        setup.setLandscape(true);
        setup.setPaperSize(PrintSetup.A4_PAPERSIZE);
        setup.setFitWidth((short) pagesWide);
        setup.setFitHeight((short) 0);
        setup.setLeftToRight(true);
        sheet.setMargin(PageMargin.LEFT, 0.4);
        sheet.setMargin(PageMargin.RIGHT, 0.4);
        sheet.setMargin(PageMargin.TOP, 0.75);
        sheet.setMargin(PageMargin.BOTTOM, 0.75);
        sheet.getHeader().setLeft("Coilbook");
        sheet.getHeader().setRight("&A");
        sheet.getFooter().setLeft(footer);
        sheet.getFooter().setRight("Page &P of &N");
    }

    void write(Path file) throws IOException {
        streamed.setZip64Mode(Zip64Mode.AsNeeded);
        written = true;
        try (OutputStream out = new BufferedOutputStream(Files.newOutputStream(file), 1 << 16)) {
            within(() -> {
                try {
                    Reproducibility.runWithSourceDateEpoch(() -> streamed.write(out));
                } catch (IOException e) {
                    throw new UncheckedIOException(e);
                }
                return null;
            });
        } catch (UncheckedIOException e) {
            throw e.getCause();
        }
    }

    /** Temporary files go to this workbook's own folder, whichever thread writes it, so that closing leaves none behind. */
    private <T> T within(java.util.function.Supplier<T> work) {
        return TempFile.withStrategy(new OwnFolder(folder), work);
    }

    @Override
    public void close() throws IOException {
        if (!written) {
            flush();
        }
        streamed.close();
        try (Stream<Path> left = Files.walk(folder)) {
            for (Path path : left.sorted(Comparator.reverseOrder()).toList()) {
                Files.deleteIfExists(path);
            }
        }
    }

    /** Rows still in memory would otherwise be written to closed files, with a warning for each sheet. */
    private void flush() throws IOException {
        for (Sheet sheet : streamed) {
            if (sheet instanceof SXSSFSheet rows) {
                rows.flushRows();
            }
        }
    }

    private record OwnFolder(Path folder) implements TempFileCreationStrategy {

        @Override
        public File createTempFile(String prefix, String suffix) throws IOException {
            return Files.createTempFile(folder, prefix, suffix).toFile();
        }

        @Override
        public File createTempDirectory(String prefix) throws IOException {
            return Files.createTempDirectory(folder, prefix).toFile();
        }
    }
}
