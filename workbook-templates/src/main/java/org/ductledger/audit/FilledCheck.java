package org.ductledger.audit;

import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.apache.poi.ss.util.CellReference;
import org.ductledger.ledger.Outcome;
import org.ductledger.record.RecordedCall;
import org.ductledger.record.RecordedCall.RecordedFault;
import org.ductledger.record.UnreadableWorkbookException;
import org.jspecify.annotations.Nullable;

/** Holds the filled cells against the record, and the record against today's library, to the bit. */
final class FilledCheck {
    private final Cells cells;
    private final List<Finding> findings;
    private int compared;

    FilledCheck(Cells cells, List<Finding> findings) {
        this.cells = cells;
        this.findings = findings;
    }

    int compared() {
        return compared;
    }

    /**
     * One call.
     *
     * @param today what today's library gives for the recorded arguments
     */
    void check(RecordedCall call, Outcome today) throws UnreadableWorkbookException {
        Map<Integer, RecordedFault> faults =
                call.faults().stream().collect(Collectors.toMap(RecordedFault::row, Function.identity(), (a, b) -> a));
        List<CellReference> references = Cells.of(call.filledCells());
        for (int row = 0; row < references.size() && row < call.values().rows(); row++) {
            compared++;
            CellReference reference = references.get(row);
            Object recorded = Values.row(call.values(), row);
            RecordedFault fault = faults.get(row);
            checkCell(call, reference, recorded == null && fault != null ? fault.inWords() : recorded);
            checkLibrary(
                    call, reference, recorded, row < today.values().rows() ? Values.row(today.values(), row) : null);
        }
    }

    private void checkCell(RecordedCall call, CellReference reference, @Nullable Object recorded) {
        Object found = Cells.value(cells.at(reference));
        if (!Values.same(recorded, found)) {
            report(
                    Finding.Kind.FILLED_VALUE_CHANGED,
                    call,
                    reference,
                    recorded,
                    found,
                    "the filled value of " + call.id() + " is not the recorded one");
        }
    }

    private void checkLibrary(
            RecordedCall call, CellReference reference, @Nullable Object recorded, @Nullable Object today) {
        if (!Values.same(recorded, today)) {
            report(
                    Finding.Kind.RESULT_CHANGED,
                    call,
                    reference,
                    recorded,
                    today,
                    "today's " + call.function() + " gives another value than the record");
        }
    }

    private void report(
            Finding.Kind kind,
            RecordedCall call,
            CellReference reference,
            @Nullable Object recorded,
            @Nullable Object found,
            String why) {
        findings.add(new Finding(
                kind,
                reference.getSheetName(),
                Cells.address(reference),
                call.id(),
                Values.shown(recorded, call.unit()),
                Values.shown(found, call.unit()),
                why + Values.difference(recorded, found)));
    }
}
