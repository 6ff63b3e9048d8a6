package coilbook.exchange.internal.in;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The merged regions of a sheet. They stand behind the rows in the file, but the rows cannot be read without them: so they are looked for first, in the
 * bytes, which costs a tenth of parsing the sheet twice.
 */
final class MergedCells {

    /** A merged region; rows from 1, columns from 0, both ends included. */
    record Region(int firstRow, int lastRow, int firstColumn, int lastColumn) {
    }

    private static final Pattern MERGED = Pattern
            .compile("<(?:\\w+:)?mergeCell\\s[^>]*?ref\\s*=\\s*[\"']\\$?([A-Z]+)\\$?(\\d+):\\$?([A-Z]+)\\$?(\\d+)[\"']");
    private static final int OVERLAP = 200;

    private MergedCells() {
    }

    /** The regions in the order of their first rows. */
    static List<Region> scan(InputStream in) throws IOException, LimitReached {
        List<Region> regions = new ArrayList<>();
        byte[] buffer = new byte[1 << 16];
        int kept = 0;
        for (int read; (read = in.read(buffer, kept, buffer.length - kept)) >= 0;) {
            int filled = kept + read;
            int from = scan(buffer, filled, regions);
            kept = Math.min(filled - from, OVERLAP);
            System.arraycopy(buffer, filled - kept, buffer, 0, kept);
            if (regions.size() > InputLimits.MERGED_REGIONS) {
                throw new LimitReached("has more than " + InputLimits.MERGED_REGIONS + " merged regions, which is the limit");
            }
        }
        regions.sort(Comparator.comparingInt(Region::firstRow));
        return regions;
    }

    /** Adds what is complete in the buffer and tells where the last one ended. */
    private static int scan(byte[] buffer, int filled, List<Region> regions) {
        int end = 0;
        if (!contains(buffer, filled)) {
            return end;
        }
        Matcher matcher = MERGED.matcher(new String(buffer, 0, filled, StandardCharsets.ISO_8859_1));
        while (matcher.find()) {
            regions.add(new Region(Numbers.whole(matcher.group(2), 1), Numbers.whole(matcher.group(4), 1), Numbers.column(matcher.group(1)),
                    Numbers.column(matcher.group(3))));
            end = matcher.end();
        }
        return end;
    }

    private static boolean contains(byte[] buffer, int filled) {
        for (int i = 0; i + 8 < filled; i++) {
            if (buffer[i] == 'm' && buffer[i + 1] == 'e' && buffer[i + 2] == 'r' && buffer[i + 3] == 'g' && buffer[i + 4] == 'e'
                    && buffer[i + 5] == 'C') {
                return true;
            }
        }
        return false;
    }
}
