package org.ductledger.record;

import java.util.List;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.ledger.Column;

/**
 * One call of a workbook and what it came to when the workbook was filled.
 *
 * @param id names the result within the record, and the named cell of a single result
 * @param function the catalogue's name
 * @param revision of the function, at the fill
 * @param unit the unit of the values; empty for words
 * @param arguments in the order of the function
 * @param liveCells the cell or range of the live formula as shown, in {@code unit}; empty if the function has no cell form
 * @param filledCells the cell or range of the filled value, in {@code unit}
 * @param values one a row; NaN, or {@code null} for a word, where the row has a fault
 * @param faults in the order of their rows, one a row at most
 */
public record RecordedCall(
        String id,
        String function,
        int revision,
        String unit,
        List<RecordedArgument> arguments,
        String liveCells,
        String filledCells,
        Column values,
        List<RecordedFault> faults) {
    /** Why one row, counted from 0, has no value. */
    public record RecordedFault(int row, FaultKind kind, String detail) {
        /** What a filled cell shows in the place of the value: {@code no solution}, {@code outside domain}. */
        public String inWords() {
            return kind == FaultKind.BAD_REFERENCE ? "no value" : kind.label().replace('_', ' ');
        }

        /** The words of the cell, and the reason. */
        public String whole() {
            return inWords() + ": " + detail;
        }
    }

    public RecordedCall {
        arguments = List.copyOf(arguments);
        faults = List.copyOf(faults);
    }
}
