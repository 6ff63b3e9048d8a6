package coilbook.register;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.sql.Connection;
import java.sql.ResultSet;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

import org.junit.jupiter.api.Test;

import coilbook.register.internal.store.Database;
import coilbook.register.internal.store.KindTable;
import coilbook.register.internal.store.Migrations;
import coilbook.register.internal.store.StoredColumn;

/** The migrated schema holds exactly the columns of the kinds, so that a new column cannot be forgotten in the scripts. */
class SchemaTest {

    @Test
    void theScriptsMakeTheColumnsOfEveryKind() throws Exception {
        try (Database database = Database.inMemory(); Connection connection = database.connection()) {
            Migrations.create(connection);
            for (KindTable<?> table : KindTable.ALL) {
                assertEquals(expected(table), found(connection, table), table.toString());
            }
        }
    }

    private static List<String> expected(KindTable<?> table) {
        List<String> columns = new ArrayList<>(List.of("version_id BIGINT NO", "row_id BIGINT NO", "row_key CHARACTER VARYING(8000) NO",
                "seq_from BIGINT NO", "seq_to BIGINT YES"));
        for (StoredColumn column : table.columns()) {
            String type = switch (column.field().type()) {
                case QUANTITY, NUMBER -> "DOUBLE PRECISION";
                case INTEGER -> "INTEGER";
                case YES_NO -> "BOOLEAN";
                case DATE -> "DATE";
                case DATE_TIME -> "TIMESTAMP(6)";
                case MONEY -> "NUMERIC(30, 10)";
                case TERM -> "CHARACTER VARYING(80)";
                case TEXT, TEXTS -> "CHARACTER VARYING(4000)";
            };
            columns.add(column.value().getName() + " " + type + (column.field().isRequired() ? " NO" : " YES"));
            if (column.provenance() != null) {
                columns.add(column.provenance().getName() + " SMALLINT YES");
            }
        }
        return columns;
    }

    private static List<String> found(Connection connection, KindTable<?> table) throws Exception {
        List<String> columns = new ArrayList<>();
        String sql = "select column_name, data_type, character_maximum_length, numeric_precision, numeric_scale, datetime_precision, is_nullable "
                + "from information_schema.columns where lower(table_name) = ? order by ordinal_position";
        try (var statement = connection.prepareStatement(sql)) {
            statement.setString(1, table.toString());
            try (ResultSet line = statement.executeQuery()) {
                while (line.next()) {
                    String type = line.getString(2);
                    type = switch (type) {
                        case "CHARACTER VARYING" -> type + "(" + line.getInt(3) + ")";
                        case "NUMERIC" -> type + "(" + line.getInt(4) + ", " + line.getInt(5) + ")";
                        case "TIMESTAMP" -> type + "(" + line.getInt(6) + ")";
                        default -> type;
                    };
                    columns.add(line.getString(1).toLowerCase(Locale.ROOT) + " " + type + " " + line.getString(7));
                }
            }
        }
        assertTrue(columns.size() > 5, table + " has columns");
        return columns;
    }
}
