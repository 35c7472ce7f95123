package org.ductledger.ledger;

import java.util.List;
import org.jspecify.annotations.Nullable;

/** What a call gives an argument: values of its own, or the result of an earlier call. */
public sealed interface Given permits Given.Values, Reference {
    /**
     * Values of the call's own.
     *
     * @param column the values
     * @param spread true for a single value that is spread over all rows, false for a column
     * @param unit the unit's symbol as typed; {@code null} means the argument's own unit
     */
    record Values(Column column, boolean spread, @Nullable String unit) implements Given {}

    static Given number(double value) {
        return new Values(new Column.Numbers(value), true, null);
    }

    static Given number(double value, String unit) {
        return new Values(new Column.Numbers(value), true, unit);
    }

    static Given numbers(double... values) {
        return new Values(new Column.Numbers(values), false, null);
    }

    static Given numbers(double[] values, String unit) {
        return new Values(new Column.Numbers(values), false, unit);
    }

    static Given text(String word) {
        return new Values(new Column.Texts(List.of(word)), true, null);
    }

    static Given texts(List<String> words) {
        return new Values(new Column.Texts(List.copyOf(words)), false, null);
    }
}
