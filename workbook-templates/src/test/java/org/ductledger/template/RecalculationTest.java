package org.ductledger.template;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.CellValue;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFFormulaEvaluator;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.ductledger.ledger.Column;
import org.ductledger.record.LedgerRecord;
import org.ductledger.record.RecordReader;
import org.ductledger.record.RecordedCall;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Live formulas, recalculated, against the filled values; and what the workbook says when its inputs change. */
final class RecalculationTest {
    private static final String TEMPLATES = "org.ductledger.template.BuiltWorkbook#templates";
    private static final double AGREEMENT = 1e-11;

    @ParameterizedTest
    @MethodSource(TEMPLATES)
    void liveValuesAgreeWithFilledOnes(Template template) throws Exception {
        for (UnitSystem units : UnitSystem.values()) {
            XSSFWorkbook book = BuiltWorkbook.of(template, units);
            assertAgreement(book, RecordReader.read(book));
        }
    }

    /** Every live cell, recalculated, against the record. */
    static void assertAgreement(XSSFWorkbook book, LedgerRecord record) {
        XSSFFormulaEvaluator evaluator = new XSSFFormulaEvaluator(book);
        for (RecordedCall call : record.calls()) {
            if (!call.liveCells().isEmpty()) {
                List<XSSFCell> live = BuiltWorkbook.cells(book, call.liveCells());
                List<XSSFCell> filled = BuiltWorkbook.cells(book, call.filledCells());
                assertEquals(call.values().rows(), live.size(), call.id());
                for (int i = 0; i < live.size(); i++) {
                    assertSame(call, i, evaluator.evaluate(live.get(i)), filled.get(i));
                }
            }
        }
    }

    private static void assertSame(RecordedCall call, int row, CellValue live, XSSFCell filled) {
        String what = call.id() + " row " + (row + 1);
        boolean faulty = call.faults().stream().anyMatch(fault -> fault.row() == row);
        if (faulty) {
            assertEquals(CellType.STRING, live.getCellType(), what);
            assertEquals(CellType.STRING, filled.getCellType(), what);
        } else if (call.values() instanceof Column.Texts texts) {
            assertEquals(texts.values().get(row), live.getStringValue(), what);
            assertEquals(texts.values().get(row), filled.getStringCellValue(), what);
        } else {
            double recorded = ((Column.Numbers) call.values()).values()[row];
            assertEquals(CellType.NUMERIC, live.getCellType(), what);
            assertEquals(recorded, filled.getNumericCellValue(), what);
            assertEquals(recorded, live.getNumberValue(), AGREEMENT * Math.abs(recorded), what);
        }
    }

    @ParameterizedTest
    @MethodSource(TEMPLATES)
    void theMasterCheckHolds(Template template) throws Exception {
        XSSFWorkbook book = BuiltWorkbook.of(template, UnitSystem.US);
        assertTrue(master(book).startsWith("The inputs are those of the fill, and all"), master(book));
        assertEquals(0, count(book, "differs") + count(book, Layout.CHANGED));
    }

    private static String master(XSSFWorkbook book) {
        return new XSSFFormulaEvaluator(book)
                .evaluate(BuiltWorkbook.named(book, "master_check"))
                .getStringValue();
    }

    /** How many cells of the workbook show this text. */
    private static int count(XSSFWorkbook book, String text) {
        int count = 0;
        for (var sheet : book) {
            for (Row row : sheet) {
                for (Cell cell : row) {
                    boolean isText = cell.getCellType() == CellType.FORMULA
                            && cell.getCachedFormulaResultType() == CellType.STRING;
                    count += isText && cell.getStringCellValue().equals(text) ? 1 : 0;
                }
            }
        }
        return count;
    }

    @ParameterizedTest
    @MethodSource(TEMPLATES)
    void aChangedInputShowsInEveryCheck(Template template) throws Exception {
        XSSFWorkbook book = BuiltWorkbook.of(template, UnitSystem.SI);
        int agreeing = count(book, Layout.AGREES);
        XSSFCell t0 = input(book, "t0");
        t0.setCellValue(t0.getNumericCellValue() + 1);
        XSSFFormulaEvaluator.evaluateAllFormulaCells(book);
        assertEquals(0, count(book, Layout.AGREES));
        assertEquals(agreeing, count(book, Layout.CHANGED));
        assertTrue(master(book).startsWith("INPUTS CHANGED"), master(book));
        assertEquals("changed", state(book, "t0"));
    }

    private static XSSFCell input(XSSFWorkbook book, String name) throws Exception {
        return BuiltWorkbook.cells(
                        book, RecordReader.read(book).quantity(name).cells().get(0))
                .get(0);
    }

    /** The word that the Ledger sheet has for an input. */
    private static String state(XSSFWorkbook book, String input) {
        for (Row row : book.getSheet("Ledger")) {
            if (row.getCell(0) != null
                    && row.getCell(0).toString().equals("input")
                    && row.getCell(1).toString().equals(input)) {
                return row.getCell(9).getStringCellValue();
            }
        }
        throw new AssertionError("no line for " + input);
    }

    @ParameterizedTest
    @MethodSource(TEMPLATES)
    void anInadmissibleInputGivesWordsAndNoErrorValues(Template template) throws Exception {
        for (Object bad : List.of(-5.0, "hot")) {
            XSSFWorkbook book = BuiltWorkbook.of(template, UnitSystem.SI);
            XSSFCell t0 = input(book, "t0");
            if (bad instanceof Double number) {
                t0.setCellValue(number);
            } else {
                t0.setCellValue((String) bad);
            }
            XSSFFormulaEvaluator.evaluateAllFormulaCells(book);
            assertEquals(1, count(book, "OUT OF RANGE"));
            assertTrue(count(book, LiveFormula.NO_VALUE) > 2);
            for (RecordedCall call : RecordReader.read(book).calls()) {
                for (XSSFCell cell : BuiltWorkbook.cells(book, call.liveCells())) {
                    assertTrue(cell.getCachedFormulaResultType() != CellType.ERROR, call.id());
                }
            }
            assertTrue(master(book).startsWith("INPUTS CHANGED"), master(book));
        }
    }
}
