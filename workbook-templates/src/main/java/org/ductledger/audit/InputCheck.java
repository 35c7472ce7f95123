package org.ductledger.audit;

import java.util.ArrayList;
import java.util.List;
import org.apache.poi.ss.util.CellReference;
import org.ductledger.ledger.Column;
import org.ductledger.record.LedgerRecord;
import org.ductledger.record.RecordedQuantity;
import org.ductledger.record.UnreadableWorkbookException;
import org.jspecify.annotations.Nullable;

/** Holds the input cells against the record, and gives the record as it would read for the inputs as they stand. */
final class InputCheck {
    private final Cells cells;
    private final List<Finding> findings;
    private int compared;

    InputCheck(Cells cells, List<Finding> findings) {
        this.cells = cells;
        this.findings = findings;
    }

    int compared() {
        return compared;
    }

    /** The record with the inputs that the cells hold now; the same record where none has changed. */
    LedgerRecord asItStands(LedgerRecord record) throws UnreadableWorkbookException {
        List<RecordedQuantity> now = new ArrayList<>();
        int before = findings.size();
        for (RecordedQuantity quantity : record.quantities()) {
            now.add(check(quantity));
        }
        return findings.size() == before
                ? record
                : new LedgerRecord(
                        record.template(),
                        record.templateVersion(),
                        record.library(),
                        record.units(),
                        now,
                        record.calls(),
                        record.digest());
    }

    private RecordedQuantity check(RecordedQuantity quantity) throws UnreadableWorkbookException {
        List<CellReference> references = new ArrayList<>();
        for (String cellOrRange : quantity.cells()) {
            references.addAll(Cells.of(cellOrRange));
        }
        if (references.isEmpty()) {
            return quantity;
        }
        if (references.size() != quantity.values().rows()) {
            throw new UnreadableWorkbookException(
                    "the cells of " + quantity.name() + " on sheet Ledger",
                    quantity.values().rows() + ", one for each value",
                    String.valueOf(references.size()));
        }
        List<@Nullable Object> found = new ArrayList<>();
        for (int i = 0; i < references.size(); i++) {
            found.add(check(quantity, i, references.get(i)));
        }
        return new RecordedQuantity(
                quantity.name(), quantity.role(), quantity.unit(), quantity.cells(), column(quantity, found));
    }

    private @Nullable Object check(RecordedQuantity quantity, int row, CellReference reference) {
        compared++;
        Object recorded = Values.row(quantity.values(), row);
        Object found = Cells.value(cells.at(reference));
        boolean blank = found == null && "".equals(recorded);
        if (!blank && !Values.same(recorded, found)) {
            findings.add(new Finding(
                    Finding.Kind.INPUT_CHANGED,
                    reference.getSheetName(),
                    Cells.address(reference),
                    quantity.name(),
                    Values.shown(recorded, quantity.unit()),
                    Values.shown(found, quantity.unit()),
                    quantity.name() + " was changed after the fill" + Values.difference(recorded, found)));
        }
        return found;
    }

    private static Column column(RecordedQuantity quantity, List<@Nullable Object> found) {
        if (quantity.values() instanceof Column.Numbers) {
            return new Column.Numbers(found.stream()
                    .mapToDouble(x -> x instanceof Double d ? d : Double.NaN)
                    .toArray());
        }
        List<@Nullable String> words = new ArrayList<>();
        found.forEach(word -> words.add(word == null ? "" : word.toString()));
        return new Column.Texts(words);
    }
}
