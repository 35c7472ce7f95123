package org.ductledger.batch;

import java.util.ArrayList;
import java.util.List;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.LedgerRefusedException;
import org.ductledger.ledger.Reference;
import org.ductledger.ledger.Refusal;
import org.ductledger.template.InputsRefusedException;

/** Finds the places, in a document, of what the evaluator or a template refuses. */
public final class Refusals {
    private Refusals() {}

    /** The refusal of a ledger as that of its document. */
    public static DocumentRefusedException placed(Ledger ledger, LedgerRefusedException refused) {
        List<Reason> reasons = new ArrayList<>();
        for (Refusal refusal : refused.refusals()) {
            reasons.add(new Reason(refusal.kind().label(), pointer(ledger, refusal), refusal.detail()));
        }
        return new DocumentRefusedException(reasons);
    }

    /** The refusal of a template's inputs as that of their document. */
    public static DocumentRefusedException placed(InputsRefusedException refused) {
        return new DocumentRefusedException(refused.problems().stream()
                .map(problem -> new Reason(Reason.UNFIT_INPUT, Reason.step(problem.input()), problem.detail()))
                .toList());
    }

    private static String pointer(Ledger ledger, Refusal refusal) {
        if (refusal.call() < 0) {
            return "/want";
        }
        String call = "/ledger/" + refusal.call();
        String argument = refusal.argument();
        if (argument == null) {
            return call
                    + switch (refusal.kind()) {
                        case UNKNOWN_FUNCTION -> "/call";
                        case UNKNOWN_UNIT -> "/unit";
                        default -> "";
                    };
        }
        String place = call + "/with" + Reason.step(argument);
        if (refusal.kind() == FaultKind.UNKNOWN_UNIT) {
            return place + "/unit";
        }
        boolean refers = ledger.calls().get(refusal.call()).arguments().get(argument) instanceof Reference;
        return refers ? place + "/ref" : place;
    }
}
