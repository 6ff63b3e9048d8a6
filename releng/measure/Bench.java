import coilbook.fleet.Progress;
import coilbook.register.FleetScope;
import coilbook.register.OpenMode;
import coilbook.register.Register;
import coilbook.register.Status;
import coilbook.register.StatusColumn;
import coilbook.register.StatusQuery;
import coilbook.register.internal.H2Registers;
import java.io.BufferedInputStream;
import java.io.BufferedOutputStream;
import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.Statement;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;
import javax.xml.stream.XMLInputFactory;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamReader;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.xssf.streaming.SXSSFWorkbook;

/**
 * Measures Coilbook on an invented fleet: the commands as a person runs them, the windows of the grid, and, beside them, the least that the
 * same rows and cells cost with nothing of ours in between. Run by {@code releng/bench}. Times are medians in milliseconds.
 */
final class Bench {

    private final Path product;
    private final Path folder;
    private final int stations;
    private final int rounds;

    private Bench(Path product, Path folder, int stations, int rounds) {
        this.product = product;
        this.folder = folder;
        this.stations = stations;
        this.rounds = rounds;
    }

    public static void main(String[] arguments) throws Exception {
        new Bench(Path.of(arguments[0]), Path.of(arguments[1]), Integer.parseInt(arguments[2]), Integer.parseInt(arguments[3])).run();
    }

    private void run() throws Exception {
        System.out.printf("%d stations, %d rounds, heap %s, %d processors, Java %s%n%n", stations, rounds,
                System.getenv().getOrDefault("COILBOOK_JAVA_OPTS", "-Xmx1g"), Runtime.getRuntime().availableProcessors(),
                System.getProperty("java.version"));
        String register = folder.resolve("bench").toString();
        Path view = folder.resolve("bench.view.mv.db");
        Path audit = folder.resolve("bench.xlsx");
        tell("start: --version", medianOf(() -> command("--version")));
        tell("demo", once(() -> command("demo", "--register", register, "--stations", Integer.toString(stations), "--seed", "1")));
        double computed = tell("check, every station computed", medianOf(() -> {
            Files.deleteIfExists(view);
            command("check", "--register", register, "--json");
        }));
        double check = tell("check, status rows up to date", medianOf(() -> command("check", "--register", register, "--json")));
        double scan = tell("  bare lazy scan of the same rows", medianOf(() -> bareScan(folder.resolve("bench.view").toString())));
        double export = tell("audit", medianOf(() -> command("audit", "--register", register, "--out", audit.toString())));
        Path cells = folder.resolve("cells");
        long count = spool(audit, cells);
        double bare = tell("  bare streaming writer of the same " + count + " cells", medianOf(() -> bareWrite(cells)));
        System.out.println();
        grid(Path.of(register));
        System.out.printf("%nratio: check to bare scan %.1f; computing check to bare scan %.1f; audit to bare writer %.1f%n", check / scan,
                computed / scan, export / bare);
        System.out.printf("sizes: register %d MB, status rows %d MB, audit workbook %d MB%n", Files.size(folder.resolve("bench.mv.db")) >> 20,
                Files.size(view) >> 20, Files.size(audit) >> 20);
    }

    /** What the grid asks for: ids in order, a window of rows, an edit's worth of status rows is in the tests. */
    private void grid(Path base) throws Exception {
        try (Register register = new H2Registers().open(base, OpenMode.EXISTING)) {
            Status status = register.status();
            status.bringUpToDate(LocalDate.now(), Progress.NONE);
            long[][] ids = new long[1][];
            tell("grid: ids in the order of codes", medianOf(() -> ids[0] = status.ids(StatusQuery.all())));
            StatusColumn last = StatusColumn.values()[StatusColumn.values().length - 1];
            tell("grid: ids sorted by " + last, medianOf(() -> status
                    .ids(new StatusQuery(FleetScope.all(), List.of(), List.of(new StatusQuery.Sort(last, true))))));
            int middle = ids[0].length / 2;
            long[] window = Arrays.copyOfRange(ids[0], middle, Math.min(ids[0].length, middle + 200));
            tell("grid: a window of 200 rows", medianOf(() -> status.rows(window)));
            tell("tree of places with counts", medianOf(status::places));
        }
    }

    private void command(String... arguments) throws IOException, InterruptedException {
        List<String> line = new ArrayList<>(List.of(product.resolve("coilbook").toString()));
        line.addAll(List.of(arguments));
        Path errors = folder.resolve("errors");
        int code = new ProcessBuilder(line).redirectOutput(folder.resolve("output").toFile()).redirectError(errors.toFile()).start().waitFor();
        if (code != 0) {
            throw new IllegalStateException(String.join(" ", line) + " ended with " + code + "\n" + Files.readString(errors));
        }
    }

    private static void bareScan(String view) throws Exception {
        try (Connection connection = DriverManager.getConnection("jdbc:h2:file:" + view + ";IFEXISTS=TRUE;LAZY_QUERY_EXECUTION=1", "coilbook", "");
                Statement statement = connection.createStatement()) {
            for (String table : List.of("status", "finding")) {
                try (ResultSet rows = statement.executeQuery("select * from " + table)) {
                    int columns = rows.getMetaData().getColumnCount();
                    while (rows.next()) {
                        for (int i = 1; i <= columns; i++) {
                            rows.getObject(i);
                        }
                    }
                }
            }
        }
    }

    /** Puts every cell of a workbook into a plain file: 's' a sheet, 'r' a row, 't' a text, 'n' a number. Returns the count of cells. */
    private static long spool(Path workbook, Path cells) throws Exception {
        long count = 0;
        List<String> shared = new ArrayList<>();
        try (ZipFile zip = new ZipFile(workbook.toFile());
                DataOutputStream out = new DataOutputStream(new BufferedOutputStream(Files.newOutputStream(cells), 1 << 16))) {
            ZipEntry strings = zip.getEntry("xl/sharedStrings.xml");
            if (strings != null) {
                readShared(zip.getInputStream(strings), shared);
            }
            for (ZipEntry entry : Collections.list(zip.entries())) {
                if (entry.getName().startsWith("xl/worksheets/sheet")) {
                    out.writeByte('s');
                    count += spoolSheet(zip.getInputStream(entry), shared, out);
                }
            }
            out.writeByte('e');
        }
        return count;
    }

    private static void readShared(InputStream in, List<String> shared) throws Exception {
        XMLStreamReader xml = XMLInputFactory.newFactory().createXMLStreamReader(new BufferedInputStream(in));
        StringBuilder text = new StringBuilder();
        while (xml.hasNext()) {
            int event = xml.next();
            if (event == XMLStreamConstants.CHARACTERS) {
                text.append(xml.getText());
            } else if (event == XMLStreamConstants.END_ELEMENT && xml.getLocalName().equals("si")) {
                shared.add(text.toString());
                text.setLength(0);
            }
        }
    }

    private static long spoolSheet(InputStream in, List<String> shared, DataOutputStream out) throws Exception {
        XMLStreamReader xml = XMLInputFactory.newFactory().createXMLStreamReader(new BufferedInputStream(in));
        long count = 0;
        String type = null;
        boolean inValue = false;
        StringBuilder text = new StringBuilder();
        while (xml.hasNext()) {
            switch (xml.next()) {
                case XMLStreamConstants.START_ELEMENT -> {
                    String name = xml.getLocalName();
                    if (name.equals("row")) {
                        out.writeByte('r');
                    } else if (name.equals("c")) {
                        type = xml.getAttributeValue(null, "t");
                        text.setLength(0);
                    }
                    inValue = name.equals("v") || name.equals("t");
                }
                case XMLStreamConstants.CHARACTERS -> {
                    if (inValue) {
                        text.append(xml.getText());
                    }
                }
                case XMLStreamConstants.END_ELEMENT -> {
                    inValue = false;
                    if (xml.getLocalName().equals("c") && text.length() > 0) {
                        count++;
                        if (type == null || type.equals("n") || type.equals("b")) {
                            out.writeByte('n');
                            out.writeDouble(Double.parseDouble(text.toString()));
                        } else {
                            byte[] bytes = (type.equals("s") ? shared.get(Integer.parseInt(text.toString())) : text.toString()).getBytes("UTF-8");
                            out.writeByte('t');
                            out.writeInt(bytes.length);
                            out.write(bytes);
                        }
                    }
                }
                default -> {
                }
            }
        }
        return count;
    }

    private void bareWrite(Path cells) throws Exception {
        try (DataInputStream in = new DataInputStream(new BufferedInputStream(Files.newInputStream(cells), 1 << 16));
                SXSSFWorkbook book = new SXSSFWorkbook(100);
                OutputStream out = new BufferedOutputStream(Files.newOutputStream(folder.resolve("bare.xlsx")))) {
            Sheet sheet = null;
            Row row = null;
            int rows = 0;
            int columns = 0;
            for (int kind = in.readByte(); kind != 'e'; kind = in.readByte()) {
                if (kind == 's') {
                    sheet = book.createSheet();
                    rows = 0;
                } else if (kind == 'r') {
                    row = sheet.createRow(rows++);
                    columns = 0;
                } else if (kind == 'n') {
                    row.createCell(columns++).setCellValue(in.readDouble());
                } else {
                    byte[] bytes = new byte[in.readInt()];
                    in.readFully(bytes);
                    row.createCell(columns++).setCellValue(new String(bytes, "UTF-8"));
                }
            }
            book.write(out);
        }
    }

    private interface Work {
        void run() throws Exception;
    }

    private double once(Work work) throws Exception {
        long begun = System.nanoTime();
        work.run();
        return (System.nanoTime() - begun) / 1e6;
    }

    private double medianOf(Work work) throws Exception {
        double[] times = new double[rounds];
        for (int i = 0; i < rounds; i++) {
            times[i] = once(work);
        }
        Arrays.sort(times);
        return times[rounds / 2];
    }

    private static double tell(String what, double milliseconds) {
        System.out.printf("%-60s %12.1f ms%n", what, milliseconds);
        return milliseconds;
    }
}
