package org.ductledger.catalogue;

import java.util.List;

/**
 * An argument of a function: a number with a unit and admissible values, or one of a few words.
 *
 * @param name the name in calls, lower snake case
 * @param symbol the trade's symbol, as in {@code p/p0}
 * @param meaning one phrase
 * @param unit the coherent unit in which the kernel takes it; {@code 1} for a word
 * @param interval the admissible values in that unit
 * @param choices the admissible words; empty for a number. A kernel sees a word as its place in this list
 */
public record Argument(String name, String symbol, String meaning, Unit unit, Interval interval, List<String> choices) {
    public Argument {
        choices = List.copyOf(choices);
    }

    public static Argument number(String name, String symbol, String unit, Interval interval, String meaning) {
        return new Argument(name, symbol, meaning, Unit.named(unit), interval, List.of());
    }

    public static Argument choice(String name, String meaning, String... choices) {
        return new Argument(name, name, meaning, Unit.ONE, Interval.closed(0, choices.length - 1.0), List.of(choices));
    }

    public boolean isText() {
        return !choices.isEmpty();
    }

    /** The same quantity with other admissible values. */
    public Argument within(Interval other) {
        return new Argument(name, symbol, meaning, unit, other, choices);
    }

    /** The same quantity under another name. */
    public Argument named(String otherName, String otherSymbol, String otherMeaning) {
        return new Argument(otherName, otherSymbol, otherMeaning, unit, interval, choices);
    }

    /** What is required, in words and in the unit given. */
    public String requirement(Unit inUnit) {
        return isText() ? "one of " + String.join(", ", choices) : interval.inWords(inUnit);
    }
}
