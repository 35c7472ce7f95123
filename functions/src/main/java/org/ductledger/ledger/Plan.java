package org.ductledger.ledger;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.Catalogue;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Unit;
import org.ductledger.catalogue.UnknownUnitException;
import org.jspecify.annotations.Nullable;

/** Checks a ledger as a whole before anything is computed: names, units, references, lengths. */
final class Plan {
    /** An argument as the evaluator takes it: given values with their unit, or an earlier step. */
    record Input(
            Argument argument,
            Given.@Nullable Values values,
            Unit unit,
            @Nullable Step earlier) {}

    /** A call that is known to be sound. */
    record Step(Call call, FunctionEntry entry, List<Input> inputs, Unit unit, int rows, boolean spread) {}

    private final Catalogue catalogue;
    private final List<Refusal> refusals = new ArrayList<>();
    /** The sound calls so far; an unsound one maps to null, so that what leans on it is not blamed again. */
    private final Map<String, @Nullable Step> byId = new HashMap<>();

    private final Set<String> allIds = new HashSet<>();

    private Plan(Catalogue catalogue) {
        this.catalogue = catalogue;
    }

    static List<Step> of(Ledger ledger, Catalogue catalogue) throws LedgerRefusedException {
        return new Plan(catalogue).steps(ledger);
    }

    private List<Step> steps(Ledger ledger) throws LedgerRefusedException {
        ledger.calls().forEach(call -> allIds.add(call.id()));
        List<Step> steps = new ArrayList<>();
        for (int i = 0; i < ledger.calls().size(); i++) {
            Call call = ledger.calls().get(i);
            if (byId.containsKey(call.id())) {
                refuse(FaultKind.BAD_REFERENCE, i, null, "the id " + call.id() + " is given to two calls");
                continue;
            }
            Step step = step(call, i);
            byId.put(call.id(), step);
            if (step != null) {
                steps.add(step);
            }
        }
        for (String id : ledger.want()) {
            if (!allIds.contains(id)) {
                refuse(FaultKind.BAD_REFERENCE, -1, null, "want names " + id + ", but no call has that id");
            }
        }
        if (!refusals.isEmpty()) {
            throw new LedgerRefusedException(refusals);
        }
        return steps;
    }

    private void refuse(FaultKind kind, int call, @Nullable String argument, String detail) {
        refusals.add(new Refusal(kind, call, argument, detail));
    }

    private @Nullable Step step(Call call, int place) {
        FunctionEntry entry = catalogue.find(call.function()).orElse(null);
        if (entry == null) {
            List<String> near = catalogue.near(call.function());
            refuse(
                    FaultKind.UNKNOWN_FUNCTION,
                    place,
                    null,
                    "no function is named " + call.function()
                            + (near.isEmpty() ? "" : "; near it: " + String.join(", ", near)));
            return null;
        }
        int before = refusals.size();
        for (String name : call.arguments().keySet()) {
            if (entry.place(name) < 0) {
                refuse(
                        FaultKind.MISSING_ARGUMENT,
                        place,
                        name,
                        entry.name() + " takes no argument " + name + "; it takes " + names(entry));
            }
        }
        List<Input> inputs = new ArrayList<>();
        for (Argument argument : entry.arguments()) {
            Input input = input(call, place, entry, argument);
            if (input != null) {
                inputs.add(input);
            }
        }
        Unit unit = resultUnit(call, place, entry);
        int rows = rows(place, inputs);
        if (refusals.size() > before || inputs.size() < entry.arguments().size() || unit == null) {
            return null;
        }
        return new Step(call, entry, inputs, unit, Math.max(rows, 1), rows < 0);
    }

    private static String names(FunctionEntry entry) {
        return String.join(", ", entry.arguments().stream().map(Argument::name).toList());
    }

    private @Nullable Input input(Call call, int place, FunctionEntry entry, Argument argument) {
        Given given = call.arguments().get(argument.name());
        if (given == null) {
            refuse(
                    FaultKind.MISSING_ARGUMENT,
                    place,
                    argument.name(),
                    entry.name() + " requires " + argument.name() + ", " + argument.requirement(argument.unit())
                            + (argument.isText() ? "" : " in " + argument.unit()) + ", and it is not given");
            return null;
        }
        if (given instanceof Reference reference) {
            return reference(reference, place, argument);
        }
        return values((Given.Values) given, place, argument);
    }

    private @Nullable Input values(Given.Values given, int place, Argument argument) {
        String name = argument.name();
        if (argument.isText() != given.column() instanceof Column.Texts) {
            refuse(
                    FaultKind.NOT_A_NUMBER,
                    place,
                    name,
                    name + " must be " + (argument.isText() ? argument.requirement(Unit.ONE) : "a number") + ", got "
                            + (argument.isText() ? "a number" : "text"));
            return null;
        }
        if (given.column().rows() == 0) {
            refuse(FaultKind.MISSING_ARGUMENT, place, name, name + " has no rows; at least one is required");
            return null;
        }
        Unit unit = unitFor(given.unit(), argument.unit(), place, name);
        return unit == null ? null : new Input(argument, given, unit, null);
    }

    private @Nullable Unit unitFor(@Nullable String symbol, Unit own, int place, @Nullable String name) {
        if (symbol == null) {
            return own;
        }
        String what = name == null ? "the result" : name;
        try {
            Unit unit = Unit.named(symbol);
            if (unit.measuresSameKindAs(own)) {
                return unit;
            }
            String reason = own.symbol().equals("K") && unit.coherent().symbol().equals("delta_K")
                    ? "; a temperature difference is not a temperature"
                    : "";
            refuse(
                    FaultKind.UNKNOWN_UNIT,
                    place,
                    name,
                    what + " requires a unit of the kind of " + own + ", got " + symbol + reason);
        } catch (UnknownUnitException e) {
            refuse(
                    FaultKind.UNKNOWN_UNIT,
                    place,
                    name,
                    what + " requires a unit of the kind of " + own + ": " + e.getMessage());
        }
        return null;
    }

    private @Nullable Input reference(Reference reference, int place, Argument argument) {
        String name = argument.name();
        if (!byId.containsKey(reference.id())) {
            String reason = allIds.contains(reference.id())
                    ? name + " refers to " + reference.id() + ", which is not an earlier call: a ledger is"
                            + " evaluated in its order, so that no call can lean on itself or a later one"
                    : name + " refers to " + reference.id() + ", but no call has that id";
            refuse(FaultKind.BAD_REFERENCE, place, name, reason);
            return null;
        }
        Step earlier = byId.get(reference.id());
        if (earlier == null) {
            return null;
        }
        Unit gives = earlier.entry().result().unit();
        boolean text = earlier.entry().result().isText();
        if (text != argument.isText() || !gives.measuresSameKindAs(argument.unit())) {
            refuse(
                    FaultKind.BAD_REFERENCE,
                    place,
                    name,
                    name + " requires " + (argument.isText() ? "a word" : "a value in " + argument.unit()) + ", but "
                            + reference.id() + " gives " + (text ? "a word" : "a value in " + gives));
            return null;
        }
        return new Input(argument, null, argument.unit(), earlier);
    }

    private @Nullable Unit resultUnit(Call call, int place, FunctionEntry entry) {
        if (call.unit() != null && entry.result().isText()) {
            refuse(FaultKind.UNKNOWN_UNIT, place, null, call.id() + " gives a word, which has no unit");
            return null;
        }
        return unitFor(call.unit(), entry.result().unit(), place, null);
    }

    /** The common number of rows; -1 where every argument is a single value. */
    private int rows(int place, List<Input> inputs) {
        Map<Integer, String> lengths = new LinkedHashMap<>();
        for (Input input : inputs) {
            Given.Values values = input.values();
            Step earlier = input.earlier();
            if (values != null && !values.spread()) {
                lengths.putIfAbsent(values.column().rows(), input.argument().name());
            } else if (earlier != null && !earlier.spread()) {
                lengths.putIfAbsent(earlier.rows(), input.argument().name());
            }
        }
        if (lengths.size() > 1) {
            StringBuilder detail = new StringBuilder("columns of one call must have the same number of rows, got ");
            lengths.forEach((rows, name) ->
                    detail.append(name).append(" with ").append(rows).append(", "));
            detail.setLength(detail.length() - 2);
            refuse(FaultKind.BAD_REFERENCE, place, null, detail.toString());
        }
        return lengths.isEmpty() ? -1 : lengths.keySet().iterator().next();
    }
}
