package coilbook.register.internal.file;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.Map;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.CoilbookException.Reason;

/**
 * The first blocks of a data file: text such as {@code H:2,block:e,blockSize:1000,chunk:3,clean:1,…} in hex. The database would take a file whose
 * end is cut off for an older state of it and go on; a cleanly closed file that is shorter than it says is therefore refused here.
 */
final class FileHeader {

    private static final int BLOCK = 4096;

    private FileHeader() {
    }

    static void check(Path file) throws CoilbookException {
        try (RandomAccessFile in = new RandomAccessFile(file.toFile(), "r")) {
            long length = in.length();
            if (length == 0) {
                throw new CoilbookException(Reason.REGISTER, file + " is empty and no register.");
            }
            Map<String, String> first = header(in, 0);
            Map<String, String> header = first.isEmpty() ? header(in, BLOCK) : first;
            if (header.isEmpty()) {
                throw new CoilbookException(Reason.REGISTER, file + " is no register: it is a file of another kind.");
            }
            if ("1".equals(header.get("clean"))) {
                checkLastChunk(file, in, length, header);
            }
        } catch (IOException | NumberFormatException e) {
            throw new CoilbookException(Reason.REGISTER, file + " cannot be read: it is damaged or not readable for this user.", e);
        }
    }

    private static void checkLastChunk(Path file, RandomAccessFile in, long length, Map<String, String> header)
            throws IOException, CoilbookException {
        long start = Long.parseLong(header.getOrDefault("block", "0"), 16) * BLOCK;
        Map<String, String> chunk = start + BLOCK <= length ? map(in, start, "chunk:") : Map.of();
        long blocks = Long.parseLong(chunk.getOrDefault("len", "0"), 16);
        if (blocks <= 0 || start + blocks * BLOCK > length) {
            throw new CoilbookException(Reason.REGISTER, file + " is damaged: its end is missing. Restore it from a backup copy.");
        }
    }

    private static Map<String, String> header(RandomAccessFile in, long at) throws IOException {
        return map(in, at, "H:2,");
    }

    private static Map<String, String> map(RandomAccessFile in, long at, String start) throws IOException {
        byte[] bytes = new byte[512];
        in.seek(at);
        int read = Math.max(0, in.read(bytes));
        String text = new String(bytes, 0, read, StandardCharsets.ISO_8859_1);
        Map<String, String> map = new HashMap<>();
        if (text.startsWith(start)) {
            for (String pair : text.split("[\\n\\x00]", 2)[0].strip().split(",")) {
                int colon = pair.indexOf(':');
                if (colon > 0) {
                    map.put(pair.substring(0, colon), pair.substring(colon + 1).strip());
                }
            }
        }
        return map;
    }
}
