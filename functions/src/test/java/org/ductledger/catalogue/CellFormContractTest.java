package org.ductledger.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.apache.poi.hssf.usermodel.HSSFWorkbook;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.CellValue;
import org.apache.poi.ss.usermodel.FormulaEvaluator;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.ductledger.flow.StandardCatalogue;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every cell form, computed by a spreadsheet's own engine, against its kernel, over drawn ordinary arguments. */
class CellFormContractTest {
    private static final int POINTS = 120;
    private static final double TOLERANCE = 1e-11;
    /** What a form may say in the place of an error value, as a filled cell does. */
    private static final String NO_SOLUTION = "no solution";

    /** What a rounding of the arguments may do where the function is steep. */
    private static final double ROUNDING = 1e-14;

    static List<FunctionEntry> entries() {
        return StandardCatalogue.get().entries().stream()
                .filter(entry -> entry.cellForm().exists())
                .toList();
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void aSpreadsheetComputesWhatTheKernelDoes(FunctionEntry entry) throws Exception {
        Draws draws = new Draws(entry);
        try (HSSFWorkbook workbook = new HSSFWorkbook()) {
            EntryCells cells = new EntryCells(entry, workbook);
            for (int i = 0; i < POINTS; i++) {
                double[] row = i == 0 ? Draws.example(entry) : draws.ordinary();
                agree(entry, row, cells.compute(row));
            }
        }
    }

    private static void agree(FunctionEntry entry, double[] row, CellValue cell) {
        double exact = entry.kernel().at(row);
        String where = entry + Arrays.toString(row);
        if (!Double.isFinite(exact)) {
            boolean told = cell.getCellType() == CellType.ERROR || NO_SOLUTION.equals(cell.getStringValue());
            assertTrue(told, () -> where + " has no value, the cell shows " + cell);
        } else if (entry.result().isText()) {
            assertEquals(entry.result().choices().get((int) exact), cell.getStringValue(), where);
        } else {
            assertEquals(CellType.NUMERIC, cell.getCellType(), where);
            double allowed = TOLERANCE * Math.abs(exact) + ROUNDING * steepness(entry, row);
            double error = Math.abs(cell.getNumberValue() - exact);
            assertTrue(error <= allowed, () -> where + " = " + exact + ", the cell shows " + cell.getNumberValue());
        }
    }

    /** The sum of |x df/dx| over the arguments. */
    private static double steepness(FunctionEntry entry, double[] row) {
        double sum = 0;
        for (int i = 0; i < row.length; i++) {
            double partial = entry.arguments().get(i).isText() ? 0 : Math.abs(row[i] * entry.partial(i, row));
            sum += Double.isFinite(partial) ? partial : 0;
        }
        return sum;
    }

    /** An entry's arguments, helpers and result in cells, each kind in a row of its own. */
    private static final class EntryCells {
        private final FunctionEntry entry;
        private final Row inputs;
        private final Cell result;
        private final FormulaEvaluator engine;

        EntryCells(FunctionEntry entry, HSSFWorkbook workbook) {
            this.entry = entry;
            Sheet sheet = workbook.createSheet();
            inputs = sheet.createRow(0);
            Map<String, String> cells = new HashMap<>();
            for (Argument argument : entry.arguments()) {
                int column = cells.size();
                cells.put(
                        argument.name(), inputs.createCell(column).getAddress().formatAsString());
            }
            int helpers = 1;
            for (CellForm.Helper helper : entry.cellForm().helpers()) {
                Cell cell = sheet.createRow(helpers++).createCell(0);
                cell.setCellFormula(CellForm.render(helper.formula(), cells));
                cells.put(helper.name(), cell.getAddress().formatAsString());
            }
            result = sheet.createRow(helpers).createCell(0);
            result.setCellFormula(CellForm.render(entry.cellForm().formula(), cells));
            engine = workbook.getCreationHelper().createFormulaEvaluator();
        }

        CellValue compute(double[] row) {
            for (int i = 0; i < row.length; i++) {
                Argument argument = entry.arguments().get(i);
                if (argument.isText()) {
                    inputs.getCell(i).setCellValue(argument.choices().get((int) row[i]));
                } else {
                    inputs.getCell(i).setCellValue(row[i]);
                }
            }
            engine.clearAllCachedResultValues();
            return engine.evaluate(result);
        }
    }
}
