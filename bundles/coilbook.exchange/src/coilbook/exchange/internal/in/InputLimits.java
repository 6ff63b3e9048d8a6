package coilbook.exchange.internal.in;

/**
 * What an input file may be at most, so that a hostile or a mistaken file ends in a sentence and not in a full heap. Each is named in the message that
 * refuses the file.
 */
final class InputLimits {

    /** Size of a file on disk. */
    static final long FILE_MEGABYTES = 200;
    /** Size of any one part of a workbook once unpacked. */
    static final long PART_MEGABYTES = 600;
    /** How many times larger than packed a part of a workbook may be; a sheet of real data reaches 30. */
    static final long PACKING_RATIO = 100;
    /** Parts below this size are harmless whatever their ratio. */
    static final long RATIO_FREE_BYTES = 1L << 20;
    /** Parts in a workbook. */
    static final int PARTS = 2_000;
    static final int SHEETS = 250;
    /** Rows of one sheet, which is what spreadsheet programs can hold. */
    static final int ROWS = 1_048_576;
    /** Columns of one sheet, which is what spreadsheet programs can hold. */
    static final int COLUMNS = 16_384;
    /** Filled cells of one sheet, those that merged cells cover included. */
    static final long CELLS = 9_000_000;
    /** Characters of one cell, which is what spreadsheet programs can hold. */
    static final int CELL_CHARACTERS = 32_767;
    /** Characters of all texts of a workbook's text table together. */
    static final long TEXT_CHARACTERS = 60_000_000;
    static final int MERGED_REGIONS = 100_000;
    static final int CELL_STYLES = 65_536;
    /** A heading row is looked for among this many filled rows. */
    static final int HEADING_ROWS = 40;

    /** Values that cannot be taken, and remarks, of all files of one reading. */
    static final int REJECTIONS = 20_000;
    /** Headings are looked for in this many columns. */
    static final int HEADING_COLUMNS = 600;
    /** A longer text is no heading. */
    static final int HEADING_CHARACTERS = 200;

    private InputLimits() {
    }
}
