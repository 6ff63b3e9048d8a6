package coilbook.register.internal.status;

import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Types;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

import coilbook.criteria.Evidence;
import coilbook.criteria.Finding;
import coilbook.criteria.Verdict;
import coilbook.fleet.Provenance;
import coilbook.fleet.Unit;

/** A finding to the columns of {@link ViewTables#FINDING_FIELDS} and back. */
final class FindingCodec {

    private static final String END = "\u001f";
    private static final String BETWEEN = "\u001e";

    private FindingCodec() {
    }

    static void bind(PreparedStatement statement, long id, Finding finding) throws SQLException {
        Evidence evidence = finding.evidence();
        statement.setLong(1, id);
        statement.setString(2, finding.criterion());
        statement.setInt(3, finding.verdict().ordinal());
        statement.setBoolean(4, finding.hazard());
        statement.setBoolean(5, finding.conceded());
        number(statement, 6, evidence.value());
        number(statement, 7, evidence.limit());
        statement.setString(8, evidence.unit().name());
        statement.setString(9, evidence.corner());
        statement.setString(10, evidence.sentence());
        if (evidence.provenance() == null) {
            statement.setNull(11, Types.INTEGER);
        } else {
            statement.setInt(11, evidence.provenance().ordinal());
        }
        StringBuilder numbers = new StringBuilder();
        evidence.numbers().forEach((name, value) -> numbers.append(name).append(BETWEEN).append(value).append(END));
        statement.setString(12, numbers.toString());
        statement.setString(13, String.join(END, finding.missing()));
    }

    /** An infinite value is kept as it is; one that compares nothing is empty. */
    private static void number(PreparedStatement statement, int at, double value) throws SQLException {
        if (Double.isNaN(value)) {
            statement.setNull(at, Types.DOUBLE);
        } else {
            statement.setDouble(at, value);
        }
    }

    static Finding read(ResultSet line) throws SQLException {
        double value = line.getDouble(6);
        value = line.wasNull() ? Double.NaN : value;
        double limit = line.getDouble(7);
        limit = line.wasNull() ? Double.NaN : limit;
        int provenance = line.getInt(11);
        Provenance weakest = line.wasNull() ? null : Provenance.values()[provenance];
        Map<String, Double> numbers = new LinkedHashMap<>();
        for (String pair : split(line.getString(12))) {
            int between = pair.lastIndexOf(BETWEEN);
            Double number = pair.endsWith(BETWEEN + "null") ? null : (Double) Double.parseDouble(pair.substring(between + 1));
            numbers.put(pair.substring(0, between), number);
        }
        return new Finding(line.getString(2), Verdict.values()[line.getInt(3)], line.getBoolean(4),
                new Evidence(value, limit, Unit.valueOf(line.getString(8)), line.getString(9), line.getString(10), weakest, numbers),
                split(line.getString(13)), line.getBoolean(5));
    }

    private static List<String> split(String text) {
        return text.isEmpty() ? List.of() : List.of(text.split(END));
    }
}
