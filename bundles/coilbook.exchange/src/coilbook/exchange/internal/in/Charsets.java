package coilbook.exchange.internal.in;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.Charset;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

/** In which character set a text file is written: by its byte-order mark, else UTF-8 if every byte fits, else the one of Western desktops. */
final class Charsets {

    private Charsets() {
    }

    /** The character set, or {@code null} if the file is no text. */
    static Charset of(Path path) throws IOException {
        try (InputStream in = Files.newInputStream(path)) {
            byte[] head = in.readNBytes(4096);
            if (starts(head, 0xEF, 0xBB, 0xBF)) {
                return StandardCharsets.UTF_8;
            } else if (starts(head, 0xFF, 0xFE)) {
                return StandardCharsets.UTF_16LE;
            } else if (starts(head, 0xFE, 0xFF)) {
                return StandardCharsets.UTF_16BE;
            }
            Charset wide = withoutMark(head);
            if (wide != null) {
                return wide;
            } else if (indexOfZero(head) >= 0) {
                return null;
            }
        }
        try (InputStream in = Files.newInputStream(path)) {
            return isUtf8(in) ? StandardCharsets.UTF_8 : Charset.forName("windows-1252");
        }
    }

    private static boolean starts(byte[] head, int... mark) {
        for (int i = 0; i < mark.length; i++) {
            if (i >= head.length || (head[i] & 0xFF) != mark[i]) {
                return false;
            }
        }
        return true;
    }

    private static int indexOfZero(byte[] head) {
        for (int i = 0; i < head.length; i++) {
            if (head[i] == 0) {
                return i;
            }
        }
        return -1;
    }

    /** UTF-16 without a mark: every other byte of Western text is zero. */
    private static Charset withoutMark(byte[] head) {
        int even = 0;
        int odd = 0;
        for (int i = 0; i + 1 < head.length; i += 2) {
            even += head[i] == 0 ? 1 : 0;
            odd += head[i + 1] == 0 ? 1 : 0;
        }
        int pairs = head.length / 2;
        if (pairs > 1 && odd > pairs * 0.7 && even == 0) {
            return StandardCharsets.UTF_16LE;
        }
        return pairs > 1 && even > pairs * 0.7 && odd == 0 ? StandardCharsets.UTF_16BE : null;
    }

    private static boolean isUtf8(InputStream in) throws IOException {
        CharsetDecoder decoder = StandardCharsets.UTF_8.newDecoder().onMalformedInput(CodingErrorAction.REPORT)
                .onUnmappableCharacter(CodingErrorAction.REPORT);
        ByteBuffer bytes = ByteBuffer.allocate(1 << 16);
        CharBuffer chars = CharBuffer.allocate(1 << 16);
        boolean end = false;
        while (!end) {
            int read = in.read(bytes.array(), bytes.position(), bytes.remaining());
            end = read < 0;
            bytes.position(bytes.position() + Math.max(0, read));
            bytes.flip();
            chars.clear();
            if (decoder.decode(bytes, chars, end).isError()) {
                return false;
            }
            bytes.compact();
        }
        return true;
    }
}
