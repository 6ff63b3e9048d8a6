package coilbook.exchange.internal.out;

import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;

import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.ss.util.CellReference;
import org.apache.poi.xssf.usermodel.XSSFSheet;

import coilbook.exchange.internal.ExchangeSheets;
import coilbook.exchange.internal.out.Styles.Use;
import coilbook.exchange.internal.out.Tally.Count;

/**
 * The first page: what the workbook covers, counts by verdict with hazards first, cautions, a block to sign, counts by site and by criterion with charts.
 * Every count is a formula over the sheet of findings.
 */
final class SummaryPage {

    private static final Pattern PLAIN = Pattern.compile("\\p{L}[\\p{L}\\p{N} ._()/-]*");
    private static final int[] WIDTHS = { 24, 50, 10, 10, 16, 14, 15, 11, 8 };
    private static final int FIRST_COUNT = 2;
    private static final int TITLE_HEIGHT = 26;
    private static final int CAUTION_HEIGHT = 17;
    private static final int SIGNATURE_HEIGHT = 26;
    private static final int HEADING_HEIGHT = 18;

    private static final Map<Count, String> MEANINGS = Map.of(Count.HAZARDS, "nonconformities that can hurt somebody: shock, burn, fire",
            Count.NONCONFORMITIES,
            "other criteria that are not met", Count.OBSERVATIONS, "met, but with a small margin", Count.UNDETERMINED, "a value is missing",
            Count.CONCEDED,
            "accepted for a time, with a reason and a name");

    private final XSSFSheet sheet;
    private final Styles styles;
    private int next;

    SummaryPage(Book book) {
        this.sheet = book.page(ExchangeSheets.SUMMARY);
        this.styles = book.styles();
        for (int i = 0; i < WIDTHS.length; i++) {
            sheet.setColumnWidth(i, WIDTHS[i] * 256);
        }
        sheet.setDisplayGridlines(false);
    }

    /** What was counted and where the counted rows stand. */
    record Content(String scope, LocalDate asOf, boolean part, boolean past, SheetOut findings, SheetOut stations, int stationSiteColumn,
            Tally bySite,
            Map<String, Long> stationsBySite, Map<String, String> siteNames, Tally byCriterion, Map<String, String> criterionTitles) {
    }

    void write(Content content) {
        title("Audit of solenoid-operated adhesive applicators");
        next++;
        label(ExchangeSheets.SCOPE, content.scope());
        Row asOf = label(ExchangeSheets.AS_OF, null);
        asOf.createCell(1).setCellStyle(styles.get(Use.DATE));
        asOf.getCell(1).setCellValue(content.asOf());
        label(ExchangeSheets.PART_OF_FLEET, content.part() ? ExchangeSheets.YES : ExchangeSheets.NO);
        label(ExchangeSheets.PAST_DATE, content.past() ? ExchangeSheets.YES : ExchangeSheets.NO);
        long stations = content.stationsBySite().values().stream().mapToLong(Long::longValue).sum();
        Row row = label("Stations", null);
        String all = range(content.stations(), content.stationSiteColumn());
        formula(row, 1, "COUNTA(" + all + ")", stations, Use.WHOLE_LEFT);
        next++;
        verdicts(content);
        next++;
        cautions();
        next++;
        signatures();
        sheet.setRowBreak(next - 1);
        int chartTop = next;
        next += Charts.ROWS + 1;
        CountTable sites = new CountTable("Findings by site", "Site", "Name", content.bySite(), content.siteNames(), FindingsSheet.SITE);
        sites.write(content, true);
        next++;
        CountTable criteria = new CountTable("Findings by criterion", "Criterion", "Question", content.byCriterion(),
                content.criterionTitles(),
                FindingsSheet.CRITERION);
        criteria.write(content, false);
        new Charts(sheet, chartTop, 0, FIRST_COUNT).add("Findings by site" + sites.shownInWords(), sites.first, sites.charted(),
                content.bySite(),
                FIRST_COUNT + 1);
        new Charts(sheet, chartTop, FIRST_COUNT, WIDTHS.length).add("Findings by criterion" + criteria.shownInWords(), criteria.first,
                criteria.charted(),
                content.byCriterion(), FIRST_COUNT + 1);
    }

    private void title(String text) {
        Row row = sheet.createRow(next++);
        row.setHeightInPoints(TITLE_HEIGHT);
        text(row, 0, text, Use.TITLE);
    }

    private Row label(String label, String value) {
        Row row = sheet.createRow(next++);
        text(row, 0, label, Use.LABEL);
        if (value != null) {
            text(row, 1, value, Use.TEXT);
        }
        return row;
    }

    private void verdicts(Content content) {
        text(sheet.createRow(next++), 0, "Findings by verdict", Use.SUBTITLE);
        int first = next;
        for (Count count : Count.values()) {
            Row row = sheet.createRow(next++);
            text(row, 0, count.symbol() + "  " + count.word(), FindingsSheet.use(count));
            text(row, 1, MEANINGS.get(count), Use.TEXT);
            formula(row, FIRST_COUNT, countOf(content.findings(), count, null, null, -1), content.bySite().get(count), Use.WHOLE);
        }
        Row row = sheet.createRow(next++);
        text(row, 0, "all findings", Use.TOTAL);
        text(row, 1, "conformities are not listed", Use.TOTAL);
        formula(row, FIRST_COUNT, "SUM(C" + (first + 1) + ":C" + (next - 1) + ")", content.bySite().total(), Use.TOTAL);
    }

    private void cautions() {
        text(sheet.createRow(next++), 0, "Cautions", Use.SUBTITLE);
        for (String caution : Cautions.ALL) {
            Row row = sheet.createRow(next);
            row.setHeightInPoints(CAUTION_HEIGHT);
            for (int i = 0; i < WIDTHS.length; i++) {
                row.createCell(i).setCellStyle(styles.get(Use.CAUTION));
            }
            row.getCell(0).setCellValue(caution);
            sheet.addMergedRegion(new CellRangeAddress(next, next, 0, WIDTHS.length - 1));
            next++;
        }
    }

    private void signatures() {
        text(sheet.createRow(next++), 0, "Signatures", Use.SUBTITLE);
        for (String who : List.of("Audited by", "Electrician in charge", "For the site")) {
            Row row = sheet.createRow(next++);
            row.setHeightInPoints(SIGNATURE_HEIGHT);
            text(row, 0, who, Use.SIGNATURE_LABEL);
            for (int i = 1; i < WIDTHS.length - 1; i++) {
                row.createCell(i).setCellStyle(styles.get(Use.SIGNATURE));
            }
            row.getCell(3).setCellValue("Date");
            row.getCell(5).setCellValue("Signature");
        }
    }

    /** A table of counts, one row a group, the worst first. */
    private final class CountTable {

        private static final int CHARTED = 15;

        private final String title;
        private final String group;
        private final String nameHeading;
        private final Tally tally;
        private final Map<String, String> names;
        private final int findingsColumn;
        private int first;
        private final List<String> groups;

        CountTable(String title, String group, String nameHeading, Tally tally, Map<String, String> names, int findingsColumn) {
            this.title = title;
            this.group = group;
            this.nameHeading = nameHeading;
            this.tally = tally;
            this.names = names;
            this.findingsColumn = findingsColumn;
            this.groups = tally.worstFirst();
        }

        List<String> charted() {
            return groups.subList(0, Math.min(groups.size(), CHARTED));
        }

        String shownInWords() {
            return groups.size() > CHARTED ? " (the " + CHARTED + " worst)" : "";
        }

        void write(Content content, boolean withStations) {
            text(sheet.createRow(next++), 0, title, Use.SUBTITLE);
            headings(withStations);
            first = next;
            for (String code : groups) {
                Row row = sheet.createRow(next++);
                text(row, 0, code, Use.TEXT);
                String name = names.getOrDefault(code, "");
                text(row, 1, name, Use.WRAPPED);
                row.setHeightInPoints(Layout.height(Layout.lines(name, WIDTHS[1])));
                String cell = "$A" + next;
                if (withStations) {
                    String places = range(content.stations(), content.stationSiteColumn());
                    String stations = "COUNTIFS(" + places + "," + criterion(code, cell) + ")";
                    formula(row, FIRST_COUNT, stations, content.stationsBySite().getOrDefault(code, 0L), Use.WHOLE);
                }
                int column = FIRST_COUNT + 1;
                for (Count count : Count.values()) {
                    formula(row, column++, countOf(content.findings(), count, code, cell, findingsColumn), tally.get(code, count),
                            Use.WHOLE);
                }
                formula(row, column, "SUM(D" + next + ":H" + next + ")", tally.total(code), Use.WHOLE);
            }
        }

        private void headings(boolean withStations) {
            Row row = sheet.createRow(next++);
            row.setHeightInPoints(HEADING_HEIGHT);
            text(row, 0, group, Use.HEADING);
            text(row, 1, nameHeading, Use.HEADING);
            text(row, FIRST_COUNT, withStations ? "Stations" : " ", Use.HEADING);
            int column = FIRST_COUNT + 1;
            for (Count count : Count.values()) {
                text(row, column++, count.heading(), Use.HEADING);
            }
            text(row, column, "All", Use.HEADING);
        }
    }

    /** The formula that counts findings of one sort, in all or of one group. */
    private static String countOf(SheetOut findings, Count count, String group, String groupCell, int groupColumn) {
        String verdict = range(findings, FindingsSheet.VERDICT);
        String hazard = range(findings, FindingsSheet.HAZARD);
        String conceded = range(findings, FindingsSheet.CONCEDED);
        StringBuilder formula = new StringBuilder("COUNTIFS(");
        if (group != null) {
            formula.append(range(findings, groupColumn)).append(',').append(criterion(group, groupCell)).append(',');
        }
        condition(formula, conceded, count == Count.CONCEDED ? ExchangeSheets.YES : ExchangeSheets.NO);
        if (count != Count.CONCEDED) {
            condition(formula.append(','), hazard, count == Count.HAZARDS ? ExchangeSheets.YES : ExchangeSheets.NO);
            if (count != Count.HAZARDS) {
                condition(formula.append(','), verdict, count.word());
            }
        }
        return formula.append(')').toString();
    }

    private static void condition(StringBuilder formula, String range, String word) {
        formula.append(range).append(",\"").append(word).append('"');
    }

    /** What makes a counting function take the text in a cell for itself: not for a comparison, nor for a pattern. */
    private static String criterion(String code, String cell) {
        if (PLAIN.matcher(code).matches()) {
            return cell;
        }
        boolean pattern = code.indexOf('*') >= 0 || code.indexOf('?') >= 0 || code.indexOf('~') >= 0;
        return "\"=\"&" + (pattern ? "SUBSTITUTE(SUBSTITUTE(SUBSTITUTE(" + cell + ",\"~\",\"~~\"),\"*\",\"~*\"),\"?\",\"~?\")" : cell);
    }

    private static String range(SheetOut sheet, int column) {
        String letter = CellReference.convertNumToColString(column);
        return sheet.name() + "!$" + letter + "$2:$" + letter + "$" + Math.max(2, sheet.rows() + 1);
    }

    private void text(Row row, int column, String text, Use use) {
        Cell cell = row.createCell(column);
        cell.setCellStyle(styles.forText(use, text));
        cell.setCellValue(text);
    }

    private void formula(Row row, int column, String formula, double value, Use use) {
        Cell cell = row.createCell(column);
        cell.setCellStyle(styles.get(use));
        cell.setCellFormula(formula);
        cell.setCellValue(value);
    }
}
