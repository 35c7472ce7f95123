package org.ductledger.template;

import java.util.ArrayList;
import java.util.List;
import org.ductledger.catalogue.Unit;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.Outcome;
import org.ductledger.record.LedgerRecord;
import org.ductledger.record.RecordDigest;
import org.ductledger.record.RecordedArgument;
import org.ductledger.record.RecordedArgument.FromCall;
import org.ductledger.record.RecordedArgument.FromQuantity;
import org.ductledger.record.RecordedArgument.FromRows;
import org.ductledger.record.RecordedArgument.Row;
import org.ductledger.record.RecordedCall;
import org.ductledger.record.RecordedCall.RecordedFault;
import org.ductledger.record.RecordedQuantity;
import org.ductledger.record.RecordedQuantity.Role;

/** Turns a draft into its record: into a ledger before it is filled, and into the whole of it afterwards. */
final class DraftRecord {
    private final Template template;
    private final Draft draft;
    private final Places places;

    private DraftRecord(Template template, Draft draft, Places places) {
        this.template = template;
        this.draft = draft;
        this.places = places;
    }

    /** The draft's calls, ready to be evaluated. */
    static Ledger ledger(Template template, Draft draft) {
        DraftRecord maker = new DraftRecord(template, draft, new Places());
        Column none = new Column.Numbers();
        return maker.record(draft.calls().values().stream()
                        .map(call -> maker.call(call, 1, none, List.of()))
                        .toList())
                .ledger();
    }

    /** The record of a filled workbook. */
    static LedgerRecord of(Template template, Filled filled, Places places) {
        DraftRecord maker = new DraftRecord(template, filled.draft(), places);
        List<RecordedCall> calls = new ArrayList<>();
        for (DraftCall call : filled.draft().calls().values()) {
            Outcome outcome = filled.outcome(call.id());
            calls.add(maker.call(call, outcome.entry().revision(), outcome.values(), filled.faults(call.id())));
        }
        LedgerRecord record = maker.record(calls);
        return record.withDigest(RecordDigest.of(record));
    }

    private LedgerRecord record(List<RecordedCall> calls) {
        return new LedgerRecord(
                template.name(),
                template.version(),
                draft.catalogue().version(),
                draft.inputs().units().label(),
                quantities(),
                calls,
                "");
    }

    private List<RecordedQuantity> quantities() {
        List<RecordedQuantity> quantities = new ArrayList<>();
        for (TemplateInput input : template.inputs()) {
            if (draft.has(input.name())) {
                Role role = input.kind() == TemplateInput.Kind.REMARK ? Role.REMARK : Role.INPUT;
                String unit = input.kind() == TemplateInput.Kind.NUMBER
                        ? input.unit(draft.inputs().units()).symbol()
                        : "";
                Column values = draft.inputs().get(input.name()).column();
                quantities.add(new RecordedQuantity(input.name(), role, unit, places.shown(input.name()), values));
            }
        }
        draft.constants()
                .forEach((name, values) -> quantities.add(new RecordedQuantity(
                        name,
                        Role.FIXED,
                        values instanceof Column.Numbers ? Unit.ONE.symbol() : "",
                        places.shown(name),
                        values)));
        return quantities;
    }

    private RecordedCall call(DraftCall call, int revision, Column values, List<RecordedFault> faults) {
        List<RecordedArgument> arguments = new ArrayList<>();
        for (int i = 0; i < call.terms().size(); i++) {
            String name = call.entry().arguments().get(i).name();
            arguments.add(new RecordedArgument(name, call.terms().get(i).origin(), cells(call, i)));
        }
        String unit = call.entry().result().isText()
                ? ""
                : draft.inputs().units().shown(call.entry().result().unit()).symbol();
        String live = call.entry().cellForm().exists() ? String.join(" ", places.shown(call.id())) : "";
        return new RecordedCall(
                call.id(),
                call.entry().name(),
                revision,
                unit,
                arguments,
                live,
                places.filled(call.id()),
                values,
                faults);
    }

    private String cells(DraftCall call, int place) {
        String ofItsOwn = places.argument(call.id(), place);
        if (!ofItsOwn.isEmpty()) {
            return ofItsOwn;
        }
        if (call.terms().get(place).origin() instanceof FromCall from) {
            return String.join(" ", places.held(from.id()));
        }
        if (call.terms().get(place).origin() instanceof FromRows from) {
            Row row = from.rows().get(0);
            List<String> held = places.held(row.quantity());
            return held.isEmpty() ? "" : held.get(row.row());
        }
        return String.join(
                " ", places.held(((FromQuantity) call.terms().get(place).origin()).quantity()));
    }
}
