package coilbook.register.internal.file;

import java.util.HashSet;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Whether a schema statement of a data file is one that our own tables need. What is allowed is listed, not what is forbidden: no expression,
 * default, check, function, trigger, alias, linked table or view has a form that passes.
 */
final class SchemaWords {

    private static final Pattern NAME = Pattern.compile("\"[A-Z0-9_]{1,128}\"");
    private static final Pattern WORD = Pattern.compile("[A-Z_]+");
    private static final Pattern PLAIN = Pattern.compile("[A-Z0-9_(),.\\s]*");
    private static final Pattern TABLE = Pattern.compile("CREATE CACHED TABLE \"PUBLIC\"\\.\"([A-Z0-9_]+)\"\\(");
    private static final Pattern SETTING = Pattern.compile("SET (CREATE_BUILD|WRITE_DELAY) \\d{1,6}");
    private static final Pattern USER = Pattern.compile("CREATE USER IF NOT EXISTS \"COILBOOK\" SALT '[0-9a-f]*' HASH '[0-9a-f]*' ADMIN");
    private static final Set<String> TABLE_WORDS = Set.of("CREATE", "CACHED", "TABLE", "NOT", "NULL", "SELECTIVITY", "BIGINT", "INTEGER",
            "SMALLINT",
            "DOUBLE", "PRECISION", "BOOLEAN", "DATE", "TIMESTAMP", "NUMERIC", "CHARACTER", "VARYING");
    private static final Set<String> INDEX_WORDS = Set.of("CREATE", "PRIMARY", "KEY", "INDEX", "UNIQUE", "ON", "NULLS", "FIRST", "LAST",
            "DISTINCT",
            "ASC", "DESC");
    private static final Set<String> CONSTRAINT_WORDS = Set.of("ALTER", "TABLE", "ADD", "CONSTRAINT", "PRIMARY", "KEY", "INDEX");
    private static final String[] OBJECTS = { "a table or view", "an index", "a user", "a sequence", "a trigger", "a constraint",
            "a setting", "a role",
            "a right", "a function of its own", "a schema", "a constant", "a domain", "a comment", "an aggregate of its own", "a synonym" };

    private final Set<String> tables = new HashSet<>();

    /** The tables seen so far. */
    Set<String> tables() {
        return tables;
    }

    /** Takes one line of the schema.
     *
     * @throws ForeignContent if none of our tables needs it
     */
    void take(SchemaRows.Entry entry) {
        String sql = entry.sql();
        boolean ours = switch (entry.type()) {
            case 0 -> isTable(sql);
            case 1 -> words(sql, "CREATE ", INDEX_WORDS);
            case 2 -> USER.matcher(sql).matches();
            case 5 -> words(sql, "ALTER TABLE ", CONSTRAINT_WORDS);
            case 6 -> SETTING.matcher(sql).matches();
            default -> false;
        };
        if (!ours) {
            throw new ForeignContent(entry.type() >= 0 && entry.type() < OBJECTS.length ? OBJECTS[entry.type()] : "an unknown object");
        }
    }

    private boolean isTable(String sql) {
        Matcher start = TABLE.matcher(sql);
        if (!start.lookingAt() || !words(sql, "CREATE CACHED TABLE ", TABLE_WORDS)) {
            return false;
        }
        tables.add(start.group(1));
        return true;
    }

    private static boolean words(String sql, String start, Set<String> allowed) {
        String plain = NAME.matcher(sql).replaceAll(" ");
        if (!sql.startsWith(start) || !PLAIN.matcher(plain).matches()) {
            return false;
        }
        return WORD.matcher(plain).results().allMatch(word -> allowed.contains(word.group()));
    }
}
