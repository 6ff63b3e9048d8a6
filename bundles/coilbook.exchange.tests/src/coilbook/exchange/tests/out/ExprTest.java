package coilbook.exchange.tests.out;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.util.List;
import java.util.Random;

import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;

import coilbook.exchange.internal.out.Expr;
import coilbook.fleet.Unit;

/** Text and value of an expression say the same, however it is nested; the spreadsheet library's evaluator is the judge. */
class ExprTest {

    private static final long SEED = 20260331;

    @Test
    void bracketsStandWhereTheyMustAndNowhereElse() {
        Expr a = Expr.cell("A1", 2, Unit.OHM);
        Expr b = Expr.cell("B1", 0.003, Unit.MILLISECOND);
        assertEquals("A1*(1+B1/1000)", a.times(Expr.number(1).plus(b)).text());
        assertEquals("A1-(A1+A1)", a.minus(a.plus(a)).text());
        assertEquals("A1/(B1/1000)", a.over(b).text());
        assertEquals("EXP(-A1/(B1/1000))", a.over(b).negated().exp().text());
        assertEquals("B1", b.shownIn(Unit.MILLISECOND));
        assertEquals("1000*(A1+B1/1000)", a.plus(b).shownIn(Unit.MILLISECOND));
    }

    @Test
    void missingIsCarriedAlong() {
        assertFalse(Expr.number(1).plus(Expr.none()).times(Expr.number(2)).isPresent());
        assertFalse(Expr.number(1).over(Expr.number(0)).isPresent());
    }

    @Test
    void randomExpressionsAreWorthWhatTheirTextSays() throws Exception {
        Random random = new Random(SEED);
        try (XSSFWorkbook workbook = new XSSFWorkbook()) {
            Row inputs = workbook.createSheet().createRow(0);
            List<Unit> units = List.of(Unit.OHM, Unit.MILLISECOND, Unit.PERCENT, Unit.KILOOHM, Unit.MICROFARAD);
            Expr[] cells = new Expr[units.size()];
            for (int i = 0; i < cells.length; i++) {
                double shown = 1 + random.nextInt(90) / 10.0;
                inputs.createCell(i).setCellValue(shown);
                cells[i] = Expr.cell((char) ('A' + i) + "1", units.get(i).toSi(shown), units.get(i));
            }
            for (int n = 0; n < 500; n++) {
                Expr expression = random(random, cells, 4);
                if (!expression.isPresent()) {
                    continue;
                }
                Cell cell = inputs.createCell(20);
                cell.setCellFormula(expression.text());
                double theirs = workbook.getCreationHelper().createFormulaEvaluator().evaluate(cell).getNumberValue();
                assertEquals(expression.value(), theirs, 1e-9 * Math.abs(expression.value()), expression.text());
            }
        }
    }

    private static Expr random(Random random, Expr[] cells, int depth) {
        if (depth == 0 || random.nextInt(6) == 0) {
            return cells[random.nextInt(cells.length)];
        }
        Expr one = random(random, cells, depth - 1);
        Expr other = random(random, cells, depth - 1);
        return switch (random.nextInt(8)) {
            case 0, 1 -> one.plus(other);
            case 2, 3 -> one.minus(other);
            case 4 -> one.times(other);
            case 5, 6 -> one.over(other);
            default -> one.least(other).negated();
        };
    }
}
