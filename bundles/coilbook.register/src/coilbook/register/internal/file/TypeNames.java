package coilbook.register.internal.file;

import java.nio.ByteBuffer;
import java.util.Set;

import org.h2.mvstore.DataUtils;
import org.h2.mvstore.WriteBuffer;
import org.h2.mvstore.type.BasicDataType;

/**
 * Reads the registry of data types in a data file as text. The database itself would load each class that is named there, whatever it is; so a name
 * other than the database's own plain types is refused before it gets to see the file.
 */
final class TypeNames extends BasicDataType<String> {

    private static final String DB = "org.h2.mvstore.db.";
    private static final String TYPE = "org.h2.mvstore.type.";
    /** Types that are nothing but their name. */
    private static final Set<String> PLAIN = Set.of(DB + "NullValueDataType", DB + "LobStorageMap$BlobMeta$Type",
            DB + "LobStorageMap$BlobReference$Type",
            TYPE + "LongDataType", TYPE + "IntegerDataType", TYPE + "StringDataType", TYPE + "ByteArrayDataType");

    @Override
    public String read(ByteBuffer buffer) {
        int length = DataUtils.readVarInt(buffer);
        if (length < 1 || length > 200) {
            throw new ForeignContent("a data type without a name");
        }
        String name = DataUtils.readString(buffer, length);
        if (PLAIN.contains(name)) {
            return name;
        }
        switch (name) {
            case DB + "RowDataType$Factory":
                DataUtils.readVarInt(buffer);
                skipNumbers(buffer);
                skipNumbers(buffer);
                buffer.get();
                return name;
            case DB + "ValueDataType$Factory":
                skipNumbers(buffer);
                return name;
            case "org.h2.mvstore.tx.VersionedValueType$Factory":
                return name + " of " + read(buffer);
            default:
                throw new ForeignContent("the data type " + name);
        }
    }

    private static void skipNumbers(ByteBuffer buffer) {
        int count = DataUtils.readVarInt(buffer) - 1;
        for (int i = 0; i < count; i++) {
            DataUtils.readVarInt(buffer);
        }
    }

    @Override
    public int getMemory(String name) {
        return 100;
    }

    @Override
    public void write(WriteBuffer buffer, String name) {
        throw new UnsupportedOperationException("the file is only read");
    }

    @Override
    public String[] createStorage(int size) {
        return new String[size];
    }
}
