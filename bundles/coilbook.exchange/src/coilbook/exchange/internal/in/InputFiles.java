package coilbook.exchange.internal.in;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.function.ToIntFunction;

import coilbook.fleet.CoilbookException;

/** Opens an input file by what it is, not by what it is called; what cannot be read is refused with what to do instead. */
final class InputFiles {

    private static final int[] COMPOUND = { 0xD0, 0xCF, 0x11, 0xE0 };
    private static final int[] ZIP = { 'P', 'K', 3, 4 };

    private InputFiles() {
    }

    static InputFile open(Path path, ToIntFunction<List<String>> headings) throws CoilbookException {
        Path last = path.getFileName();
        String name = last == null ? path.toString() : last.toString();
        if (!Files.exists(path)) {
            throw Refusal.of(name, "there is no such file; expected an XLSX workbook or a CSV or TSV list");
        } else if (Files.isDirectory(path)) {
            throw Refusal.of(name, "is a folder; expected an XLSX workbook or a CSV or TSV list");
        }
        try {
            long size = Files.size(path);
            if (size == 0) {
                throw Refusal.of(name, "is empty; expected an XLSX workbook or a CSV or TSV list");
            } else if (size > InputLimits.FILE_MEGABYTES << 20) {
                throw Refusal.of(name, "is larger than " + InputLimits.FILE_MEGABYTES + " MB, which is the limit");
            }
            return open(path, name, headings);
        } catch (AccessDeniedException e) {
            throw Refusal.of(name, "", "may not be read by this user", e);
        } catch (IOException e) {
            throw Refusal.of(name, "", "cannot be read", e);
        }
    }

    private static InputFile open(Path path, String name, ToIntFunction<List<String>> headings) throws IOException, CoilbookException {
        byte[] head;
        try (InputStream in = Files.newInputStream(path)) {
            head = in.readNBytes(512);
        }
        if (starts(head, COMPOUND)) {
            throw Refusal.of(name, mentions(path, "EncryptedPackage") ? "is protected by a password; save it without one"
                    : "is a workbook of the old binary form; open it in a spreadsheet program and save it as .xlsx");
        } else if (starts(head, ZIP)) {
            return WorkbookFile.open(path, name);
        }
        String lower = name.toLowerCase(Locale.ROOT);
        if (lower.endsWith(".xlsx") || lower.endsWith(".xlsm") || lower.endsWith(".xls") || lower.endsWith(".xlsb")) {
            throw Refusal.of(name, "is no workbook, whatever its name says; expected an XLSX workbook (a text list is named .csv or .tsv)");
        }
        String start = Texts.strip(new String(head, StandardCharsets.ISO_8859_1)).toLowerCase(Locale.ROOT);
        if (start.startsWith("<!doctype") || start.startsWith("<html") || start.startsWith("<?xml") || start.startsWith("%pdf")) {
            throw Refusal.of(name, "is a page or a document, not a list; expected an XLSX workbook or a CSV or TSV list");
        }
        return DelimitedFile.open(path, name, headings);
    }

    private static boolean starts(byte[] head, int[] mark) {
        for (int i = 0; i < mark.length; i++) {
            if (i >= head.length || (head[i] & 0xFF) != mark[i]) {
                return false;
            }
        }
        return true;
    }

    /** Whether the bytes name a stream of the compound file, as its directory does in UTF-16. */
    private static boolean mentions(Path path, String stream) throws IOException {
        byte[] wanted = stream.getBytes(StandardCharsets.UTF_16LE);
        try (InputStream in = Files.newInputStream(path)) {
            byte[] buffer = new byte[1 << 16];
            int kept = 0;
            for (int read; (read = in.read(buffer, kept, buffer.length - kept)) >= 0;) {
                int filled = kept + read;
                for (int i = 0; i + wanted.length <= filled; i++) {
                    if (java.util.Arrays.equals(buffer, i, i + wanted.length, wanted, 0, wanted.length)) {
                        return true;
                    }
                }
                kept = Math.min(filled, wanted.length - 1);
                System.arraycopy(buffer, filled - kept, buffer, 0, kept);
            }
        }
        return false;
    }
}
