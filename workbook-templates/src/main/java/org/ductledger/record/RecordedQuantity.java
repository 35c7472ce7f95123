package org.ductledger.record;

import java.util.List;
import org.ductledger.ledger.Column;

/**
 * What a workbook's calls take that no call gives: an input, a constant of the template, or a remark that no call takes.
 *
 * @param name unique among the quantities of its record
 * @param role where it comes from
 * @param unit the unit of the values; empty for words
 * @param cells where the values stand, a cell each, as in {@code Inputs!$D$6}; none for a constant that stands only in
 *     formulas
 * @param values as they were when the workbook was filled
 */
public record RecordedQuantity(String name, Role role, String unit, List<String> cells, Column values) {
    /** Where a quantity comes from. */
    public enum Role {
        /** An input: the user's to change. */
        INPUT,
        /** A constant of the template. */
        FIXED,
        /** A text on the front sheet, as the name of the project; no result depends on it. */
        REMARK
    }

    public RecordedQuantity {
        cells = List.copyOf(cells);
    }
}
