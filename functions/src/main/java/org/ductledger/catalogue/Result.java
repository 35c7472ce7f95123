package org.ductledger.catalogue;

import java.util.List;

/**
 * The result of a function.
 *
 * @param symbol the trade's symbol
 * @param unit the coherent unit of the value; {@code 1} for a word
 * @param range the values it can take
 * @param choices the words it can be; empty for a number. A kernel returns a word as its place in this list
 */
public record Result(String symbol, Unit unit, Interval range, List<String> choices) {
    public Result {
        choices = List.copyOf(choices);
    }

    public boolean isText() {
        return !choices.isEmpty();
    }
}
