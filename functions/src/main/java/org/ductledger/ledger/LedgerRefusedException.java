package org.ductledger.ledger;

import java.util.List;
import java.util.stream.Collectors;

/** A ledger that cannot be evaluated as a whole; carries every reason found, not only the first. */
public final class LedgerRefusedException extends Exception {
    private static final long serialVersionUID = 1L;

    private final transient List<Refusal> refusals;

    LedgerRefusedException(List<Refusal> refusals) {
        super(refusals.stream().map(Refusal::detail).collect(Collectors.joining("; ")));
        this.refusals = List.copyOf(refusals);
    }

    public List<Refusal> refusals() {
        return refusals;
    }
}
