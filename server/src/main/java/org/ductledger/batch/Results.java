package org.ductledger.batch;

import com.fasterxml.jackson.core.io.NumberOutput;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Outcome;

/** Results as plain text. */
public final class Results {
    private Results() {}

    /** One row's value: a number in its shortest round-trip form, or a word. The row must be without a fault. */
    public static String text(Outcome outcome, int row) {
        return outcome.values() instanceof Column.Texts texts
                ? String.valueOf(texts.values().get(row))
                : NumberOutput.toString(outcome.numbers()[row], true);
    }
}
