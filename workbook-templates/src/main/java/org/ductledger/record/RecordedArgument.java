package org.ductledger.record;

import java.util.List;

/**
 * An argument of a recorded call.
 *
 * @param name the argument's name
 * @param origin where its values come from
 * @param cells the cell or the range that holds them in coherent units for the live formulas, as in
 *     {@code Inputs!$F$6}; empty where they stand only in formulas
 */
public record RecordedArgument(String name, Origin origin, String cells) {
    /** Where an argument's values come from. */
    public sealed interface Origin {}

    /** A quantity of the record, all its rows in their order. */
    public record FromQuantity(String quantity) implements Origin {}

    /** Single rows of quantities, one for each row of the call, any of them more than once. */
    public record FromRows(List<Row> rows) implements Origin {
        public FromRows {
            rows = List.copyOf(rows);
        }
    }

    /** One row of a quantity, counted from 0. */
    public record Row(String quantity, int row) {}

    /** The result of an earlier call. */
    public record FromCall(String id) implements Origin {}
}
