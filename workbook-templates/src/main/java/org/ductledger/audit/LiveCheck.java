package org.ductledger.audit;

import java.util.List;
import org.apache.poi.ss.formula.eval.NotImplementedException;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.CellValue;
import org.apache.poi.ss.usermodel.FormulaEvaluator;
import org.apache.poi.ss.util.CellReference;
import org.apache.poi.xssf.usermodel.XSSFFormulaEvaluator;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Outcome;
import org.ductledger.record.RecordedCall;
import org.ductledger.record.UnreadableWorkbookException;
import org.jspecify.annotations.Nullable;

/** Recalculates the live formulas and holds them against the library, for the inputs as they stand. */
final class LiveCheck {
    private final Cells cells;
    private final FormulaEvaluator recalculation;
    private final List<Finding> findings;
    private int compared;

    LiveCheck(XSSFWorkbook book, Cells cells, List<Finding> findings) {
        this.cells = cells;
        this.findings = findings;
        recalculation = new XSSFFormulaEvaluator(book);
    }

    int compared() {
        return compared;
    }

    void check(RecordedCall call, Outcome today) throws UnreadableWorkbookException {
        List<CellReference> references = Cells.of(call.liveCells());
        Column values = today.values();
        for (int i = 0; i < references.size() && i < values.rows(); i++) {
            compared++;
            check(call, references.get(i), Values.row(values, i), Values.size(values));
        }
    }

    private void check(RecordedCall call, CellReference reference, @Nullable Object library, double size) {
        Cell cell = cells.at(reference);
        if (cell == null || cell.getCellType() != CellType.FORMULA) {
            report(
                    Finding.Kind.FORMULA_REMOVED,
                    call,
                    reference,
                    "a live formula",
                    Values.shown(Cells.value(cell), call.unit()),
                    "the live formula of " + call.id() + " was replaced");
            return;
        }
        try {
            Object found = value(recalculation.evaluate(cell));
            if (!Values.agree(library, found, size)) {
                report(
                        Finding.Kind.LIVE_VALUE_DIFFERS,
                        call,
                        reference,
                        Values.shown(library, call.unit()),
                        Values.shown(found, call.unit()),
                        "recalculated, the formula differs from " + call.function() + " for the inputs as they stand"
                                + Values.difference(library, found));
            }
        } catch (NotImplementedException | IllegalStateException | IllegalArgumentException e) {
            report(
                    Finding.Kind.LIVE_NOT_RECALCULATED,
                    call,
                    reference,
                    Values.shown(library, call.unit()),
                    cell.getCellFormula(),
                    "the formula could not be recalculated here: " + e.getMessage());
        }
    }

    private static @Nullable Object value(@Nullable CellValue recalculated) {
        if (recalculated == null) {
            return null;
        }
        return switch (recalculated.getCellType()) {
            case NUMERIC -> (Object) recalculated.getNumberValue();
            case STRING -> recalculated.getStringValue();
            default -> recalculated.formatAsString();
        };
    }

    private void report(
            Finding.Kind kind, RecordedCall call, CellReference reference, String recorded, String found, String why) {
        findings.add(
                new Finding(kind, reference.getSheetName(), Cells.address(reference), call.id(), recorded, found, why));
    }
}
