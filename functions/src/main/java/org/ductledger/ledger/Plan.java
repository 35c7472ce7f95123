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
import org.jspecify.annotations.Nullable;

/** Checks a ledger as a whole before anything is computed: names, units, references, lengths. */
final class Plan {
    private final Catalogue catalogue;
    private final List<Refusal> refusals = new ArrayList<>();
    /** The calls so far; an unsound one maps to null, so that what leans on it is not blamed again. */
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
                refuse(FaultKind.BAD_REFERENCE, i, "the id " + call.id() + " is given to two calls");
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
                refuse(FaultKind.BAD_REFERENCE, -1, "want names " + id + ", but no call has that id");
            }
        }
        if (!refusals.isEmpty()) {
            throw new LedgerRefusedException(refusals);
        }
        return steps;
    }

    private void refuse(FaultKind kind, int call, String detail) {
        refusals.add(new Refusal(kind, call, null, detail));
    }

    private @Nullable Step step(Call call, int place) {
        FunctionEntry entry = catalogue.find(call.function()).orElse(null);
        if (entry == null) {
            List<String> near = catalogue.near(call.function());
            String hint = near.isEmpty() ? "" : "; near it: " + String.join(", ", near);
            refuse(FaultKind.UNKNOWN_FUNCTION, place, "no function is named " + call.function() + hint);
            return null;
        }
        int before = refusals.size();
        CallCheck check = new CallCheck(call, place, entry, refusals);
        check.refuseUnknownArguments();
        List<Step.Input> inputs = new ArrayList<>();
        for (Argument argument : entry.arguments()) {
            Step.Input input = input(call, argument, check);
            if (input != null) {
                inputs.add(input);
            }
        }
        Unit unit = check.resultUnit();
        int rows = rows(place, inputs);
        if (refusals.size() > before || inputs.size() < entry.arguments().size() || unit == null) {
            return null;
        }
        return new Step(call, entry, List.copyOf(inputs), unit, Math.max(rows, 1), rows < 0);
    }

    private Step.@Nullable Input input(Call call, Argument argument, CallCheck check) {
        Given given = call.arguments().get(argument.name());
        if (given == null) {
            return check.missing(argument);
        }
        if (given instanceof Given.Values values) {
            return check.values(values, argument);
        }
        String id = ((Reference) given).id();
        if (!byId.containsKey(id)) {
            return check.noEarlierCall(id, argument, allIds.contains(id));
        }
        Step earlier = byId.get(id);
        return earlier == null ? null : check.reference(earlier, argument);
    }

    /** The common number of rows; -1 where every argument is a single value. */
    private int rows(int place, List<Step.Input> inputs) {
        Map<Integer, String> lengths = new LinkedHashMap<>();
        for (Step.Input input : inputs) {
            Given.Values values = input.values();
            Step earlier = input.earlier();
            if (values != null && !values.spread()) {
                lengths.putIfAbsent(values.column().rows(), input.argument().name());
            } else if (earlier != null && !earlier.spread()) {
                lengths.putIfAbsent(earlier.rows(), input.argument().name());
            }
        }
        if (lengths.size() > 1) {
            List<String> each = new ArrayList<>();
            lengths.forEach((rows, name) -> each.add(name + " with " + rows));
            refuse(
                    FaultKind.BAD_REFERENCE,
                    place,
                    "columns of one call must have the same number of rows, got " + String.join(", ", each));
        }
        return lengths.isEmpty() ? -1 : lengths.keySet().iterator().next();
    }
}
