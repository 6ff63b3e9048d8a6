package coilbook.register.internal.store;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.Map;
import java.util.TreeMap;

import org.h2.mvstore.DataUtils;
import org.h2.store.fs.FileBase;
import org.h2.store.fs.FilePathWrapper;

/**
 * The files of a register as the database sees them, with one promise more: what is forced to the disk is found again. The database (2.5.252) writes the
 * file's header before it takes note of the chunk of pages just written, so the header may lead to the chunk before. Whoever opens the file after a
 * crash then never sees the last commit, although it is on the disk. Here every forcing ends with a header that leads to the newest chunk.
 */
public final class StrictDisk extends FilePathWrapper {

    /** What paths on it begin with. */
    static final String SCHEME = "strict";

    private static final int BLOCK = 4096;
    /** The header stands twice, in the first two blocks. */
    private static final int COPIES = 2;
    private static final int LONGEST_LINE = 1000;

    @Override
    public String getScheme() {
        return SCHEME;
    }

    @Override
    public FileChannel open(String mode) throws IOException {
        return new Channel(getBase().open(mode));
    }

    private static final class Channel extends FileBase {
        private final FileChannel file;
        /** What the newest chunk's own heading says, or {@code null}; and where it lies. */
        private Map<String, String> newest;
        private long newestBlock;

        Channel(FileChannel file) {
            this.file = file;
        }

        @Override
        public synchronized int write(ByteBuffer source, long position) throws IOException {
            if (position >= COPIES * BLOCK && position % BLOCK == 0) {
                Map<String, String> chunk = line(source.duplicate(), "chunk:");
                if (chunk.containsKey("version") && (newest == null || version(chunk) >= version(newest))) {
                    newest = chunk;
                    newestBlock = position / BLOCK;
                }
            }
            return file.write(source, position);
        }

        @Override
        public synchronized void force(boolean metaData) throws IOException {
            file.force(metaData);
            if (newest != null) {
                for (int copy = 0; copy < COPIES; copy++) {
                    correct(copy);
                }
            }
        }

        /** One copy after the other, so that one of them is whole at any moment. */
        private void correct(int copy) throws IOException {
            ByteBuffer old = ByteBuffer.allocate(LONGEST_LINE);
            file.read(old, (long) copy * BLOCK);
            old.flip();
            Map<String, String> header = new TreeMap<>(line(old, "H:"));
            if (!header.containsKey("created") || version(header) > version(newest)
                    || version(header) == version(newest) && Long.parseLong(header.get("block"), 16) == newestBlock) {
                return;
            }
            header.put("block", Long.toHexString(newestBlock));
            header.put("chunk", newest.get("chunk"));
            header.put("version", newest.get("version"));
            header.remove("clean");
            header.remove("fletcher");
            StringBuilder text = new StringBuilder();
            header.forEach((name, value) -> text.append(text.length() == 0 ? "" : ",").append(name).append(':').append(value));
            byte[] sum = text.toString().getBytes(StandardCharsets.ISO_8859_1);
            text.append(",fletcher:").append(Integer.toHexString(DataUtils.getFletcher32(sum, 0, sum.length))).append('\n');
            ByteBuffer block = ByteBuffer.allocate(BLOCK);
            block.put(text.toString().getBytes(StandardCharsets.ISO_8859_1)).rewind();
            while (block.hasRemaining()) {
                file.write(block, (long) copy * BLOCK + block.position());
            }
            file.force(false);
        }

        private static long version(Map<String, String> map) {
            return Long.parseLong(map.getOrDefault("version", "0"), 16);
        }

        /** The pairs of a line of the form {@code name:value,…}; none if it begins otherwise. */
        private static Map<String, String> line(ByteBuffer bytes, String start) {
            byte[] head = new byte[Math.min(bytes.remaining(), LONGEST_LINE)];
            bytes.get(head);
            String text = new String(head, StandardCharsets.ISO_8859_1);
            Map<String, String> pairs = new HashMap<>();
            int end = text.indexOf('\n');
            if (text.startsWith(start) && end > 0) {
                for (String pair : text.substring(0, end).strip().split(",")) {
                    int colon = pair.indexOf(':');
                    pairs.put(pair.substring(0, Math.max(0, colon)), pair.substring(colon + 1).strip());
                }
            }
            return pairs;
        }

        @Override
        public int write(ByteBuffer source) throws IOException {
            return file.write(source);
        }

        @Override
        public int read(ByteBuffer target) throws IOException {
            return file.read(target);
        }

        @Override
        public int read(ByteBuffer target, long position) throws IOException {
            return file.read(target, position);
        }

        @Override
        public FileChannel truncate(long size) throws IOException {
            file.truncate(size);
            return this;
        }

        @Override
        public long position() throws IOException {
            return file.position();
        }

        @Override
        public FileChannel position(long position) throws IOException {
            file.position(position);
            return this;
        }

        @Override
        public long size() throws IOException {
            return file.size();
        }

        @Override
        public FileLock tryLock(long position, long size, boolean shared) throws IOException {
            return file.tryLock(position, size, shared);
        }

        @Override
        protected void implCloseChannel() throws IOException {
            file.close();
        }
    }
}
