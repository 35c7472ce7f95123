package org.ductledger.batch;

import java.util.List;
import java.util.stream.Collectors;

/** A document that is not read, or whose ledger is unsound; carries each reason with its place. */
public final class DocumentRefusedException extends Exception {
    private static final long serialVersionUID = 1L;

    private final transient List<Reason> reasons;

    public DocumentRefusedException(Reason reason) {
        this(List.of(reason));
    }

    public DocumentRefusedException(List<Reason> reasons) {
        super(reasons.stream().map(DocumentRefusedException::line).collect(Collectors.joining("; ")));
        this.reasons = List.copyOf(reasons);
    }

    private static String line(Reason reason) {
        return (reason.pointer().isEmpty() ? "" : reason.pointer() + ": ") + reason.detail();
    }

    public List<Reason> reasons() {
        return reasons;
    }

    /** Whether a limit is what refuses it. */
    public boolean isTooLarge() {
        return reasons.stream().anyMatch(reason -> reason.kind().equals(Reason.LIMIT_EXCEEDED));
    }
}
