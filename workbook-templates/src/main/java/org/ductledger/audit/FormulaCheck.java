package org.ductledger.audit;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.ss.util.CellReference;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Given;
import org.ductledger.record.LedgerRecord;
import org.ductledger.record.RecordedQuantity;
import org.ductledger.template.InputsRefusedException;
import org.ductledger.template.Template;
import org.ductledger.template.Templates;
import org.ductledger.template.UnitSystem;
import org.ductledger.template.WorkbookBuilder;
import org.jspecify.annotations.Nullable;

/**
 * Holds every formula against the one that the template writes for the recorded inputs: live formulas, their working
 * cells, and the checks.
 */
final class FormulaCheck {
    private static final String NO_FORMULA = "no formula";

    private final WorkbookBuilder builder;
    private final Cells cells;
    private final List<Finding> findings;

    FormulaCheck(WorkbookBuilder builder, Cells cells, List<Finding> findings) {
        this.builder = builder;
        this.cells = cells;
        this.findings = findings;
    }

    /**
     * Checks all formulas, where the template is known and of the recorded version; otherwise the recalculated values
     * have to speak for them.
     */
    void check(LedgerRecord record) {
        Optional<Template> template =
                Templates.find(record.template()).filter(known -> known.version() == record.templateVersion());
        Optional<UnitSystem> units = UnitSystem.find(record.units());
        if (template.isEmpty() || units.isEmpty()) {
            return;
        }
        Set<String> removed = placesOf(Finding.Kind.FORMULA_REMOVED);
        try (XSSFWorkbook fresh =
                new XSSFWorkbook(new ByteArrayInputStream(rebuilt(template.get(), record, units.get())))) {
            for (Sheet sheet : fresh) {
                for (Row row : sheet) {
                    row.forEach(cell -> check(sheet, cell, removed));
                }
            }
        } catch (InputsRefusedException e) {
            findings.add(new Finding(
                    Finding.Kind.CALL_REFUSED,
                    "Inputs",
                    "",
                    record.template(),
                    "inputs that the template takes",
                    String.valueOf(e.getMessage()),
                    "the recorded inputs are not admissible to today's template, so that its formulas could not be"
                            + " compared"));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private byte[] rebuilt(Template template, LedgerRecord record, UnitSystem units) throws InputsRefusedException {
        Map<String, Given.Values> inputs = new HashMap<>();
        for (RecordedQuantity quantity : record.quantities()) {
            if (quantity.role() != RecordedQuantity.Role.FIXED) {
                Column values = quantity.values();
                String unit = quantity.unit().isEmpty() ? null : quantity.unit();
                inputs.put(quantity.name(), new Given.Values(values, values.rows() == 1, unit));
            }
        }
        return builder.build(template, inputs, units);
    }

    private Set<String> placesOf(Finding.Kind kind) {
        return Set.copyOf(findings.stream()
                .filter(finding -> finding.kind() == kind)
                .map(Finding::place)
                .toList());
    }

    private void check(Sheet sheet, Cell fresh, Set<String> removed) {
        if (fresh.getCellType() != CellType.FORMULA) {
            return;
        }
        CellReference reference =
                new CellReference(sheet.getSheetName(), fresh.getRowIndex(), fresh.getColumnIndex(), false, false);
        String found = formula(cells.at(reference));
        String place = sheet.getSheetName() + "!" + Cells.address(reference);
        if (!found.equals(fresh.getCellFormula()) && !removed.contains(place)) {
            findings.add(new Finding(
                    Finding.Kind.FORMULA_CHANGED,
                    sheet.getSheetName(),
                    Cells.address(reference),
                    "",
                    fresh.getCellFormula(),
                    found,
                    "the formula is not the one that the template writes"));
        }
    }

    private static String formula(@Nullable Cell cell) {
        return cell != null && cell.getCellType() == CellType.FORMULA ? cell.getCellFormula() : NO_FORMULA;
    }
}
