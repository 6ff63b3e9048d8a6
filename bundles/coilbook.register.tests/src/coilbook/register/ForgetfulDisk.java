package coilbook.register;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.concurrent.ConcurrentHashMap;

import org.h2.store.fs.FileBase;
import org.h2.store.fs.FilePathWrapper;

/**
 * A file system that remembers which writes were forced to the disk. When the power fails, whatever was not forced is lost, or reached the disk by
 * chance and in any order. Database files under the scheme {@code forgetful:} live on it. The database makes objects of this class itself, so what
 * they share is held by the class.
 */
public final class ForgetfulDisk extends FilePathWrapper {

    static final String SCHEME = "forgetful";

    private static final Map<String, Remembered> FILES = new ConcurrentHashMap<>();

    /** One write since the last forcing; no bytes: the file is cut at the place. */
    private record Write(long at, byte[] bytes) {
    }

    /** What is for certain on the disk of one file, and what may be. */
    private static final class Remembered {
        private byte[] forced;
        private final List<Write> since = new ArrayList<>();

        Remembered(byte[] forced) {
            this.forced = forced;
        }

        private static byte[] apply(byte[] content, List<Write> writes) {
            byte[] result = content;
            for (Write write : writes) {
                if (write.bytes() == null) {
                    result = Arrays.copyOf(result, (int) write.at());
                } else {
                    int end = (int) write.at() + write.bytes().length;
                    result = end > result.length ? Arrays.copyOf(result, end) : result;
                    System.arraycopy(write.bytes(), 0, result, (int) write.at(), write.bytes().length);
                }
            }
            return result;
        }

        synchronized void add(Write write) {
            since.add(write);
        }

        synchronized void force() {
            forced = apply(forced.clone(), since);
            since.clear();
        }

        synchronized byte[] afterPowerLoss(Random chance) {
            List<Write> arrived = new ArrayList<>();
            if (chance != null) {
                since.stream().filter(write -> write.bytes() != null && chance.nextInt(3) == 0).forEach(arrived::add);
                Collections.shuffle(arrived, chance);
            }
            return apply(forced.clone(), arrived);
        }
    }

    @Override
    public String getScheme() {
        return SCHEME;
    }

    @Override
    public FileChannel open(String mode) throws IOException {
        Path file = Path.of(getBase().toString()).toAbsolutePath();
        Remembered remembered = FILES.get(file.toString());
        if (remembered == null) {
            remembered = new Remembered(Files.exists(file) ? Files.readAllBytes(file) : new byte[0]);
            FILES.put(file.toString(), remembered);
        }
        return new Channel(getBase().open(mode), remembered);
    }

    /** Writes what the disk holds of a file after the power failed.
     *
     * @param chance decides what else arrived; {@code null}: nothing
     */
    static void afterPowerLoss(Path file, Path into, Random chance) throws IOException {
        Files.write(into, FILES.get(file.toAbsolutePath().toString()).afterPowerLoss(chance));
    }

    private static final class Channel extends FileBase {
        private final FileChannel channel;
        private final Remembered remembered;

        Channel(FileChannel channel, Remembered remembered) {
            this.channel = channel;
            this.remembered = remembered;
        }

        @Override
        public int read(ByteBuffer target) throws IOException {
            return channel.read(target);
        }

        @Override
        public int read(ByteBuffer target, long position) throws IOException {
            return channel.read(target, position);
        }

        @Override
        public int write(ByteBuffer source) throws IOException {
            long at = channel.position();
            int written = write(source, at);
            channel.position(at + written);
            return written;
        }

        @Override
        public synchronized int write(ByteBuffer source, long position) throws IOException {
            byte[] bytes = new byte[source.remaining()];
            source.duplicate().get(bytes);
            int written = channel.write(source, position);
            remembered.add(new Write(position, Arrays.copyOf(bytes, written)));
            return written;
        }

        @Override
        public synchronized FileChannel truncate(long size) throws IOException {
            if (size < channel.size()) {
                channel.truncate(size);
                remembered.add(new Write(size, null));
            }
            return this;
        }

        @Override
        public synchronized void force(boolean metaData) {
            remembered.force();
        }

        @Override
        public long position() throws IOException {
            return channel.position();
        }

        @Override
        public FileChannel position(long position) throws IOException {
            channel.position(position);
            return this;
        }

        @Override
        public long size() throws IOException {
            return channel.size();
        }

        @Override
        public FileLock tryLock(long position, long size, boolean shared) throws IOException {
            return channel.tryLock(position, size, shared);
        }

        @Override
        protected void implCloseChannel() throws IOException {
            channel.close();
        }
    }
}
