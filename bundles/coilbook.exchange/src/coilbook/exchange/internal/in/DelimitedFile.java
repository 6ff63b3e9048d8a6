package coilbook.exchange.internal.in;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.StringReader;
import java.io.UncheckedIOException;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.Charset;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.function.ToIntFunction;

import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

import coilbook.fleet.CoilbookException;

/** A CSV or TSV file: comma, semicolon, tab or bar, whichever makes the most of its headings. */
final class DelimitedFile implements InputFile, InputTable {

    private static final char[] DELIMITERS = { ',', ';', '\t', '|' };
    private static final int SAMPLE = 1 << 16;
    private static final String NEUTRALISED = "=+-@\t\r";

    private final Path path;
    private final String name;
    private final Charset charset;
    private final char delimiter;
    private final int skippedLines;

    private DelimitedFile(Path path, String name, Charset charset, char delimiter, int skippedLines) {
        this.path = path;
        this.name = name;
        this.charset = charset;
        this.delimiter = delimiter;
        this.skippedLines = skippedLines;
    }

    /**
     * @param headings how many of a row's texts are known headings
     */
    static DelimitedFile open(Path path, String name, ToIntFunction<List<String>> headings) throws CoilbookException {
        try {
            Charset charset = Charsets.of(path);
            if (charset == null) {
                throw Refusal.of(name, "is neither text nor an XLSX workbook");
            }
            String sample;
            try (Reader reader = reader(path, charset)) {
                char[] chars = new char[SAMPLE];
                int filled = 0;
                for (int read; filled < SAMPLE && (read = reader.read(chars, filled, SAMPLE - filled)) >= 0;) {
                    filled += read;
                }
                sample = new String(chars, 0, filled);
            }
            if (sample.regionMatches(true, 0, "sep=", 0, 4) && sample.length() > 5
                    && (sample.charAt(5) == '\r' || sample.charAt(5) == '\n')) {
                return new DelimitedFile(path, name, charset, sample.charAt(4), 1);
            }
            return new DelimitedFile(path, name, charset, delimiter(sample, headings), 0);
        } catch (IOException e) {
            throw Refusal.of(name, "", "cannot be read", e);
        }
    }

    private static char delimiter(String sample, ToIntFunction<List<String>> headings) throws IOException {
        char best = ',';
        long bestScore = -1;
        for (char candidate : DELIMITERS) {
            long score = 0;
            int rows = 0;
            try (CSVParser parser = format(candidate).parse(new StringReader(sample))) {
                for (CSVRecord line : parser) {
                    List<String> texts = line.toList();
                    score = Math.max(score, headings.applyAsInt(texts) * 1_000_000L + Math.min(texts.size(), 1000));
                    if (++rows > InputLimits.HEADING_ROWS) {
                        break;
                    }
                }
            } catch (UncheckedIOException | IOException e) {
                score = Math.max(score, 0);
            }
            if (score > bestScore) {
                bestScore = score;
                best = candidate;
            }
        }
        return best;
    }

    private static CSVFormat format(char delimiter) {
        return CSVFormat.DEFAULT.builder().setDelimiter(delimiter).setIgnoreEmptyLines(false).setTrailingData(true).setLenientEof(true)
                .get();
    }

    private static Reader reader(Path path, Charset charset) throws IOException {
        InputStream in = Files.newInputStream(path);
        BufferedReader reader = new BufferedReader(new InputStreamReader(in, charset), 1 << 16);
        reader.mark(1);
        if (reader.read() != '\ufeff') {
            reader.reset();
        }
        return reader;
    }

    @Override
    public String name() {
        return name;
    }

    @Override
    public List<InputTable> tables() {
        return List.of(new InputTable() {
            @Override
            public String name() {
                return "";
            }

            @Override
            public boolean commaDecimals() {
                return DelimitedFile.this.commaDecimals();
            }

            @Override
            public void read(RowSink sink) throws CoilbookException {
                DelimitedFile.this.read(sink);
            }
        });
    }

    /** Programs of countries with decimal commas separate with semicolons. */
    @Override
    public boolean commaDecimals() {
        return delimiter == ';';
    }

    @Override
    public void read(RowSink sink) throws CoilbookException {
        CellCount count = new CellCount(name, "");
        try (CSVParser parser = format(delimiter).parse(reader(path, charset))) {
            for (CSVRecord line : parser) {
                int number = (int) line.getRecordNumber();
                if (number > InputLimits.ROWS || line.size() > InputLimits.COLUMNS) {
                    throw Refusal.of(name,
                            "has more than " + InputLimits.ROWS + " rows or " + InputLimits.COLUMNS + " columns, which are the limits");
                }
                if (number > skippedLines) {
                    hand(line, number, sink, count);
                }
            }
        } catch (CharacterCodingException e) {
            throw Refusal.of(name, "", "holds bytes that are no text in " + charset.displayName(), e);
        } catch (IOException | UncheckedIOException e) {
            throw Refusal.of(name, "", "cannot be read to its end; perhaps a quotation mark is not closed", e);
        }
    }

    private void hand(CSVRecord line, int number, RowSink sink, CellCount count) throws CoilbookException {
        Cell[] cells = new Cell[line.size()];
        boolean filled = false;
        for (int i = 0; i < cells.length; i++) {
            String text = line.get(i);
            if (text.length() > InputLimits.CELL_CHARACTERS) {
                throw Refusal.of(name, "has a value of more than " + InputLimits.CELL_CHARACTERS + " characters in row " + number
                        + ", which is the limit; perhaps a quotation mark is not closed");
            }
            if (!Texts.strip(text).isEmpty()) {
                cells[i] = Cell.text(plain(text));
                filled = true;
            }
        }
        if (filled) {
            count.add(cells.length);
            sink.row(number, cells);
        }
    }

    /** Takes off the apostrophe that keeps spreadsheet programs from reading a text as a formula. */
    private static String plain(String text) {
        return text.length() > 1 && text.charAt(0) == '\'' && NEUTRALISED.indexOf(text.charAt(1)) >= 0 ? text.substring(1) : text;
    }

    @Override
    public void close() {
        // each reading opens and closes the file itself
    }
}
