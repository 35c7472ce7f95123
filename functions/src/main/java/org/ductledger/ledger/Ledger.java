package org.ductledger.ledger;

import java.util.List;

/**
 * An ordered list of calls.
 *
 * @param calls each may refer to earlier ones
 * @param want the ids whose results are wanted; empty means all
 */
public record Ledger(List<Call> calls, List<String> want) {
    public Ledger {
        calls = List.copyOf(calls);
        want = List.copyOf(want);
    }

    public static Ledger of(Call... calls) {
        return new Ledger(List.of(calls), List.of());
    }
}
