package org.ductledger.ledger;

import java.util.List;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Unit;

/**
 * What a call came to.
 *
 * @param id the call's id
 * @param entry its function
 * @param unit the unit of the values
 * @param values one a row; NaN, or {@code null} for a word, where the row has a fault
 * @param faults in the order of their rows, one a row at most
 */
public record Outcome(String id, FunctionEntry entry, Unit unit, Column values, List<Fault> faults) {
    /** The numbers; only for a function whose result is one. */
    public double[] numbers() {
        if (values instanceof Column.Numbers numbers) {
            return numbers.values();
        }
        throw new IllegalStateException(id + " gives words");
    }

    public boolean isClean() {
        return faults.isEmpty();
    }
}
