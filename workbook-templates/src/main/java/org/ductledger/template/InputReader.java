package org.ductledger.template;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.ductledger.catalogue.Numbers;
import org.ductledger.catalogue.Unit;
import org.ductledger.catalogue.UnknownUnitException;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Given;
import org.jspecify.annotations.Nullable;

/** Takes what was given for a template's inputs: fills in the defaults, converts the units, and gathers every problem. */
final class InputReader {
    private final Template template;
    private final Map<String, Given.Values> given;
    private final UnitSystem units;
    private final List<InputProblem> problems = new ArrayList<>();

    private InputReader(Template template, Map<String, Given.Values> given, UnitSystem units) {
        this.template = template;
        this.given = given;
        this.units = units;
    }

    static Inputs read(Template template, Map<String, Given.Values> given, UnitSystem units)
            throws InputsRefusedException {
        return new InputReader(template, given, units).inputs();
    }

    private Inputs inputs() throws InputsRefusedException {
        refuseStrangers();
        Map<String, Given.Values> values = new LinkedHashMap<>();
        for (TemplateInput input : template.inputs()) {
            if (isChosen(input)) {
                Given.Values read = read(input, given.getOrDefault(input.name(), input.preset()));
                if (read != null) {
                    values.put(input.name(), read);
                }
            }
        }
        if (!problems.isEmpty()) {
            throw new InputsRefusedException(problems);
        }
        return new Inputs(units, values);
    }

    private void refuseStrangers() {
        List<String> names = template.inputs().stream().map(TemplateInput::name).toList();
        for (String name : given.keySet()) {
            if (!names.contains(name)) {
                problems.add(new InputProblem(
                        name,
                        "to be an input of " + template.name() + ": " + String.join(", ", names),
                        "no such input"));
            }
        }
    }

    /** An input stands for itself, or is the one of its group that was given, or the group's first if none was. */
    private boolean isChosen(TemplateInput input) {
        if (input.group().isEmpty()) {
            return true;
        }
        List<String> group = template.inputs().stream()
                .filter(other -> other.group().equals(input.group()))
                .map(TemplateInput::name)
                .toList();
        List<String> taken = group.stream().filter(given::containsKey).toList();
        if (taken.size() > 1 && taken.get(0).equals(input.name())) {
            problems.add(new InputProblem(
                    input.name(), "exactly one of " + String.join(", ", group), String.join(" and ", taken)));
        }
        return taken.isEmpty() ? group.get(0).equals(input.name()) : taken.contains(input.name());
    }

    private Given.@Nullable Values read(TemplateInput input, Given.Values values) {
        boolean wantsWords = input.kind() != TemplateInput.Kind.NUMBER;
        boolean words = values.column() instanceof Column.Texts;
        if (wantsWords != words) {
            refuse(input, input.coherent(), words ? "text" : "a number");
            return null;
        }
        if (values.column().rows() != input.rows()) {
            refuse(
                    input,
                    input.coherent(),
                    values.column().rows() + (values.column().rows() == 1 ? " value" : " values"));
            return null;
        }
        return values.column() instanceof Column.Texts texts ? readWords(input, texts) : readNumbers(input, values);
    }

    private Given.@Nullable Values readWords(TemplateInput input, Column.Texts texts) {
        for (String word : texts.values()) {
            if (word == null
                    || (input.kind() == TemplateInput.Kind.WORD
                            && !input.choices().contains(word))) {
                refuse(input, Unit.ONE, "'" + word + "'");
                return null;
            }
        }
        return new Given.Values(texts, input.rows() == 1, null);
    }

    private Given.@Nullable Values readNumbers(TemplateInput input, Given.Values values) {
        Unit from = unit(input, values.unit());
        if (from == null) {
            return null;
        }
        Unit shown = input.unit(units);
        double[] taken = ((Column.Numbers) values.column()).values().clone();
        for (int i = 0; i < taken.length; i++) {
            double asShown = from.equals(shown) ? taken[i] : shown.fromCoherent(from.toCoherent(taken[i]));
            if (!input.interval().contains(shown.toCoherent(asShown))) {
                String unit = from.isOne() ? "" : " " + from;
                String place = taken.length == 1 ? "" : " as value " + (i + 1);
                refuse(input, from, Numbers.brief(taken[i]) + unit + place);
                return null;
            }
            taken[i] = asShown;
        }
        return new Given.Values(new Column.Numbers(taken), input.rows() == 1, shown.symbol());
    }

    private @Nullable Unit unit(TemplateInput input, @Nullable String symbol) {
        if (symbol == null) {
            return input.coherent();
        }
        try {
            Unit unit = Unit.named(symbol);
            if (unit.measuresSameKindAs(input.coherent())) {
                return unit;
            }
            problems.add(new InputProblem(input.name(), "a unit of the kind of " + input.coherent(), symbol));
        } catch (UnknownUnitException e) {
            problems.add(new InputProblem(
                    input.name(), "a unit of the kind of " + input.coherent(), symbol + ": " + e.getMessage()));
        }
        return null;
    }

    private void refuse(TemplateInput input, Unit inUnit, String got) {
        problems.add(new InputProblem(input.name(), input.requirement(inUnit), got));
    }
}
