package coilbook.exchange.internal.in;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

import org.apache.poi.openxml4j.exceptions.OpenXML4JException;
import org.apache.poi.openxml4j.exceptions.OpenXML4JRuntimeException;
import org.apache.poi.openxml4j.opc.OPCPackage;
import org.apache.poi.openxml4j.opc.PackageAccess;
import org.apache.poi.openxml4j.opc.PackagePart;
import org.apache.poi.openxml4j.util.ZipSecureFile;
import org.apache.poi.xssf.eventusermodel.XSSFReader;
import org.xml.sax.SAXException;
import org.xml.sax.helpers.DefaultHandler;

import coilbook.exchange.internal.in.MergedCells.Region;
import coilbook.fleet.CoilbookException;

/**
 * An XLSX workbook, read as a stream: no sheet is ever held whole. Macros are not run, links to other files are not followed, formulas count by the values
 * saved with them.
 */
final class WorkbookFile implements InputFile {

    private final String name;
    private final OPCPackage book;
    private final List<InputTable> tables = new ArrayList<>();
    private final TextTable texts = new TextTable();
    private final FormatTable formats = new FormatTable();
    private final BookSettings settings = new BookSettings();

    private WorkbookFile(String name, OPCPackage book) {
        this.name = name;
        this.book = book;
    }

    static WorkbookFile open(Path path, String name) throws CoilbookException {
        ZipCheck.check(path, name);
        ZipSecureFile.setMinInflateRatio(1.0 / InputLimits.PACKING_RATIO);
        ZipSecureFile.setMaxEntrySize(InputLimits.PART_MEGABYTES << 20);
        ZipSecureFile.setMaxFileCount(InputLimits.PARTS);
        try {
            WorkbookFile file = new WorkbookFile(name, OPCPackage.open(path.toFile(), PackageAccess.READ));
            try {
                file.readParts();
            } catch (CoilbookException | RuntimeException e) {
                file.close();
                throw e;
            }
            return file;
        } catch (OpenXML4JException | OpenXML4JRuntimeException e) {
            throw ZipCheck.damaged(name, e);
        }
    }

    private void readParts() throws CoilbookException {
        try {
            XSSFReader reader = new XSSFReader(book);
            parse(reader.getWorkbookData(), settings);
            parse(reader.getSharedStringsData(), texts);
            parse(reader.getStylesData(), formats);
            XSSFReader.SheetIterator sheets = (XSSFReader.SheetIterator) reader.getSheetsData();
            while (sheets.hasNext()) {
                sheets.next().close();
                if (tables.size() == InputLimits.SHEETS) {
                    throw Refusal.of(name, "has more than " + InputLimits.SHEETS + " sheets, which is the limit");
                }
                tables.add(new Sheet(sheets.getSheetName(), sheets.getSheetPart()));
            }
        } catch (IOException | SAXException | OpenXML4JException | RuntimeException e) {
            throw refusal("", e);
        }
    }

    private static void parse(InputStream in, DefaultHandler handler) throws IOException, SAXException {
        if (in != null) {
            try (in) {
                SafeXml.parse(in, handler);
            }
        }
    }

    private CoilbookException refusal(String sheet, Exception e) {
        if (e instanceof SheetParser.Stopped stopped && stopped.getException() instanceof CoilbookException ours) {
            return ours;
        } else if (e instanceof LimitReached) {
            return Refusal.of(name, sheet, e.getMessage(), null);
        }
        String words = String.valueOf(e.getMessage());
        if (words.contains("Zip bomb")) {
            return ZipCheck.bomb(name, e);
        } else if (words.contains("DOCTYPE")) {
            return Refusal.of(name, sheet, "declares a document type, which no workbook needs; it is refused", e);
        }
        return ZipCheck.damaged(name, e);
    }

    @Override
    public String name() {
        return name;
    }

    @Override
    public List<InputTable> tables() {
        return List.copyOf(tables);
    }

    @Override
    public void close() {
        book.revert();
    }

    private final class Sheet implements InputTable {

        private final String sheet;
        private final PackagePart part;

        Sheet(String sheet, PackagePart part) {
            this.sheet = sheet;
            this.part = part;
        }

        @Override
        public String name() {
            return sheet;
        }

        @Override
        public boolean commaDecimals() {
            return false;
        }

        @Override
        public void read(RowSink sink) throws CoilbookException {
            CellCount count = new CellCount(name, sheet);
            try {
                List<Region> regions;
                try (InputStream in = part.getInputStream()) {
                    regions = MergedCells.scan(in);
                }
                MergedRows merged = new MergedRows(sink, regions, count);
                try (InputStream in = part.getInputStream()) {
                    SafeXml.parse(in, new SheetParser(texts, formats, settings.from1904(), regions.isEmpty() ? sink : merged, count));
                }
                merged.finish();
            } catch (IOException | SAXException e) {
                throw refusal(sheet, e);
            }
        }
    }
}
