package coilbook.register.internal.file;

import java.nio.ByteBuffer;
import java.util.List;

import org.h2.mvstore.DataUtils;
import org.h2.mvstore.WriteBuffer;
import org.h2.mvstore.type.BasicDataType;

/**
 * Reads the lines of a data file's schema (number, kind of object, statement) as text, without the database's own classes, which would act on them.
 * Of a line that a transaction was changing both states are read.
 */
final class SchemaRows extends BasicDataType<List<SchemaRows.Entry>> {

    /** One line: the kind of object as the database numbers it, and the statement that makes it. */
    record Entry(int type, String sql) {
    }

    private static final int NULL = 0;
    private static final int INTEGER = 4;
    private static final int INT_0_15 = 32;
    private static final int INT_NEGATIVE = 66;
    private static final int STRING_0_31 = 68;
    private static final int TEXT = 13;
    /** The value types of text in the file format, plain text first. */
    private static final int CHARACTER_VARYING = 2;

    @Override
    @SuppressWarnings("unchecked")
    public void read(ByteBuffer buffer, Object storage, int count) {
        List<Entry>[] rows = (List<Entry>[]) storage;
        boolean plain = buffer.get() == 0;
        for (int i = 0; i < count; i++) {
            rows[i] = plain ? List.of(row(buffer)) : read(buffer);
        }
    }

    @Override
    public List<Entry> read(ByteBuffer buffer) {
        if (DataUtils.readVarLong(buffer) == 0) {
            return List.of(row(buffer));
        }
        int flags = buffer.get();
        List<Entry> states = new java.util.ArrayList<>(2);
        for (int flag = 1; flag <= 2; flag++) {
            if ((flags & flag) != 0) {
                states.add(row(buffer));
            }
        }
        return states;
    }

    private static Entry row(ByteBuffer buffer) {
        number(buffer);
        number(buffer);
        int type = number(buffer);
        return new Entry(type, text(buffer));
    }

    private static int number(ByteBuffer buffer) {
        int tag = buffer.get() & 255;
        if (tag >= INT_0_15 && tag < INT_0_15 + 16) {
            return tag - INT_0_15;
        } else if (tag == INT_NEGATIVE) {
            return -DataUtils.readVarInt(buffer);
        } else if (tag == INTEGER) {
            return DataUtils.readVarInt(buffer);
        }
        throw new ForeignContent("a schema in a form unknown to this version");
    }

    private static String text(ByteBuffer buffer) {
        int tag = buffer.get() & 255;
        if (tag == NULL) {
            return "";
        } else if (tag >= STRING_0_31 && tag < STRING_0_31 + 32) {
            return DataUtils.readString(buffer, tag - STRING_0_31);
        } else if (tag == TEXT || tag == CHARACTER_VARYING) {
            return DataUtils.readString(buffer, DataUtils.readVarInt(buffer));
        }
        throw new ForeignContent("a schema in a form unknown to this version");
    }

    @Override
    public int getMemory(List<Entry> row) {
        return 1000;
    }

    @Override
    public void write(WriteBuffer buffer, List<Entry> row) {
        throw new UnsupportedOperationException("the file is only read");
    }

    @Override
    @SuppressWarnings("unchecked")
    public List<Entry>[] createStorage(int size) {
        return new List[size];
    }
}
