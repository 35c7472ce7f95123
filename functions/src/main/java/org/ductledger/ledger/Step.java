package org.ductledger.ledger;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Unit;
import org.jspecify.annotations.Nullable;

/** A call that is known to be sound; it is spread where every argument is a single value. */
record Step(Call call, FunctionEntry entry, List<Input> inputs, Unit unit, int rows, boolean spread) {
    /** An argument as the evaluator takes it: given values with their unit, or an earlier step. */
    record Input(
            Argument argument,
            Given.@Nullable Values values,
            Unit unit,
            @Nullable Step earlier) {}
}
