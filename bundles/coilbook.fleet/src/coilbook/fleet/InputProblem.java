package coilbook.fleet;

/**
 * A value of an input file that could not be taken: where it stands, what it is, what was expected.
 *
 * @param file the file's name
 * @param sheet the sheet, or an empty text for CSV and JSON
 * @param row the row counted from 1, or 0 where the problem is not in a row
 * @param column the heading or column letter, or an empty text
 * @param value what stands there
 * @param problem what was expected, in words
 */
public record InputProblem(String file, String sheet, int row, String column, String value, String problem) {

    /** One line for a person. */
    public String sentence() {
        StringBuilder text = new StringBuilder(file);
        if (!sheet.isEmpty()) {
            text.append(", sheet ").append(sheet);
        }
        if (row > 0) {
            text.append(", row ").append(row);
        }
        if (!column.isEmpty()) {
            text.append(", column ").append(column);
        }
        if (!value.isEmpty()) {
            text.append(", value \"").append(value).append('"');
        }
        return text.append(": ").append(problem).toString();
    }
}
