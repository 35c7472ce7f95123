package org.ductledger.template;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.ductledger.catalogue.Numbers;
import org.ductledger.catalogue.Unit;
import org.ductledger.ledger.Outcome;
import org.ductledger.record.RecordedArgument.FromCall;
import org.ductledger.record.RecordedArgument.FromQuantity;
import org.ductledger.record.RecordedArgument.FromRows;
import org.ductledger.record.RecordedArgument.Row;
import org.ductledger.record.RecordedCall.RecordedFault;

/** A draft and what its calls came to. */
record Filled(Draft draft, Map<String, Outcome> outcomes) {
    static Filled of(Draft draft, List<Outcome> outcomes) {
        Map<String, Outcome> byId = new HashMap<>();
        outcomes.forEach(outcome -> byId.put(outcome.id(), outcome));
        return new Filled(draft, byId);
    }

    Outcome outcome(String id) {
        Outcome outcome = outcomes.get(id);
        if (outcome == null) {
            throw new IllegalArgumentException("no call " + id);
        }
        return outcome;
    }

    /** Why rows of a call have no value. */
    List<RecordedFault> faults(String id) {
        return outcome(id).faults().stream()
                .map(fault -> new RecordedFault(fault.row(), fault.kind(), fault.detail()))
                .toList();
    }

    /** What breaks the draft's requirements; a quantity without a value breaks them. */
    List<InputProblem> problems() {
        List<InputProblem> problems = new ArrayList<>();
        for (Draft.Requirement requirement : draft.requirements()) {
            Single lesser = single(requirement.lesser());
            Single greater = single(requirement.greater());
            if (!(lesser.coherent() < greater.coherent())) {
                Single blamed = requirement.lesser().origin() instanceof FromCall ? greater : lesser;
                problems.add(new InputProblem(
                        blamed.name(), requirement.words(), lesser + ", which is not less than " + greater));
            }
        }
        return problems;
    }

    /** A single number: its name, its value and the unit in which it is shown. */
    private record Single(String name, double coherent, Unit unit) {
        @Override
        public String toString() {
            return Numbers.brief(unit.fromCoherent(coherent)) + (unit.isOne() ? "" : " " + unit);
        }
    }

    private Single single(Term term) {
        if (term.origin() instanceof FromCall call) {
            Outcome outcome = outcome(call.id());
            return new Single(call.id(), outcome.unit().toCoherent(outcome.numbers()[0]), outcome.unit());
        }
        Row row = term.origin() instanceof FromRows from
                ? from.rows().get(0)
                : new Row(((FromQuantity) term.origin()).quantity(), 0);
        double[] values = draft.inputs().coherent(row.quantity());
        String symbol = draft.inputs().get(row.quantity()).unit();
        return new Single(row.quantity(), values[row.row()], symbol == null ? Unit.ONE : Unit.named(symbol));
    }
}
