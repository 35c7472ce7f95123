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

    /**
     * A quantity of the record.
     *
     * @param rows the rows of the quantity that are taken, from 0, one for each row of the call, any of them more than
     *     once; empty means all in their order
     */
    public record FromQuantity(String quantity, List<Integer> rows) implements Origin {
        public FromQuantity {
            rows = List.copyOf(rows);
        }
    }

    /** The result of an earlier call. */
    public record FromCall(String id) implements Origin {}
}
