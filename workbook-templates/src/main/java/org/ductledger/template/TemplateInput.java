package org.ductledger.template;

import java.util.List;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Unit;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Given;

/**
 * What a template asks for: a number or a short column of numbers, one of a few words, or a remark for the front sheet.
 *
 * @param name the name in calls and files, lower snake case
 * @param label what the workbook writes beside it
 * @param symbol the trade's symbol; empty for a remark
 * @param meaning one sentence
 * @param kind what may be given
 * @param coherent the coherent unit of a number; {@code 1} otherwise
 * @param interval the admissible values of a number, in the coherent unit
 * @param choices the admissible words of a choice
 * @param preset the value taken where none is given
 * @param group the name of the alternatives it belongs to, of which exactly one is given; empty where it stands alone
 * @param rowNames what each value of a column is called; empty for a single value
 */
public record TemplateInput(
        String name,
        String label,
        String symbol,
        String meaning,
        Kind kind,
        Unit coherent,
        Interval interval,
        List<String> choices,
        Given.Values preset,
        String group,
        List<String> rowNames) {
    /** What may be given for an input. */
    public enum Kind {
        NUMBER,
        WORD,
        REMARK
    }

    public TemplateInput {
        choices = List.copyOf(choices);
        rowNames = List.copyOf(rowNames);
    }

    /** A number, with its default in the unit given. */
    public static TemplateInput number(
            String name, String label, String symbol, Interval interval, String meaning, double preset, String unit) {
        Unit coherent = Unit.named(unit).coherent();
        Given.Values values = new Given.Values(new Column.Numbers(preset), true, unit);
        return new TemplateInput(
                name, label, symbol, meaning, Kind.NUMBER, coherent, interval, List.of(), values, "", List.of());
    }

    /** A column of numbers, one for each of the names, with its default in the unit given. */
    public static TemplateInput column(
            String name,
            String label,
            String symbol,
            Interval interval,
            String meaning,
            List<String> rowNames,
            String unit,
            double... preset) {
        Unit coherent = Unit.named(unit).coherent();
        Given.Values values = new Given.Values(new Column.Numbers(preset), false, unit);
        return new TemplateInput(
                name, label, symbol, meaning, Kind.NUMBER, coherent, interval, List.of(), values, "", rowNames);
    }

    /** One of a few words, the first of them the default. */
    public static TemplateInput choice(String name, String label, String symbol, String meaning, String... choices) {
        return new TemplateInput(
                name,
                label,
                symbol,
                meaning,
                Kind.WORD,
                Unit.ONE,
                Interval.anyNumber(),
                List.of(choices),
                words(choices[0]),
                "",
                List.of());
    }

    /** A text for the front sheet, which no call takes; it may be blank. */
    public static TemplateInput remark(String name, String label, String meaning, String preset) {
        return new TemplateInput(
                name,
                label,
                "",
                meaning,
                Kind.REMARK,
                Unit.ONE,
                Interval.anyNumber(),
                List.of(),
                words(preset),
                "",
                List.of());
    }

    private static Given.Values words(String word) {
        return new Given.Values(new Column.Texts(List.of(word)), true, null);
    }

    /** The same input as one of several alternatives, of which exactly one is given. */
    public TemplateInput oneOf(String alternatives) {
        return new TemplateInput(
                name, label, symbol, meaning, kind, coherent, interval, choices, preset, alternatives, rowNames);
    }

    /** The number of values it takes: 1, or more for a column. */
    public int rows() {
        return Math.max(1, rowNames.size());
    }

    /** The unit in which a workbook of the given system shows it. */
    public Unit unit(UnitSystem system) {
        return system.shown(coherent);
    }

    /** What is required, in words and in the unit given. */
    public String requirement(Unit inUnit) {
        return switch (kind) {
            case NUMBER -> (rows() == 1 ? "" : rows() + " values, each ") + interval.inWords(inUnit);
            case WORD -> "one of " + String.join(", ", choices);
            case REMARK -> "a text, which may be blank";
        };
    }
}
