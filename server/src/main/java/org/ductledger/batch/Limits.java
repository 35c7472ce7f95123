package org.ductledger.batch;

import java.util.HashMap;
import java.util.Map;
import org.ductledger.ledger.Call;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Given;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.Reference;

/**
 * How large a document may be.
 *
 * @param calls calls of one ledger
 * @param rows rows of one column
 * @param results values of one document, and results of one ledger, over all calls and rows
 * @param references references of one ledger
 * @param nesting arrays and objects within each other
 * @param textLength characters of one text or name
 * @param numberLength characters of one number; a double written out in plain decimals has up to 1076
 */
public record Limits(int calls, int rows, int results, int references, int nesting, int textLength, int numberLength) {
    public static final Limits STANDARD = new Limits(1_000, 2_000_000, 8_000_000, 10_000, 8, 1_000, 1_100);

    /**
     * Refuses a ledger that would make more results than one ledger may.
     *
     * @throws DocumentRefusedException naming the call that passes the limit
     */
    void check(Ledger ledger) throws DocumentRefusedException {
        Map<String, Integer> rowsOf = new HashMap<>();
        long all = 0;
        for (int i = 0; i < ledger.calls().size(); i++) {
            Call call = ledger.calls().get(i);
            int rows = 1;
            for (Given given : call.arguments().values()) {
                rows = Math.max(rows, rows(given, rowsOf));
            }
            rowsOf.put(call.id(), rows);
            all += rows;
            if (all > results) {
                throw new DocumentRefusedException(new Reason(
                        Reason.LIMIT_EXCEEDED,
                        "/ledger/" + i,
                        "a ledger may have at most " + results + " results over all its calls and rows;"
                                + " post it in parts"));
            }
        }
    }

    private static int rows(Given given, Map<String, Integer> rowsOf) {
        if (given instanceof Reference reference) {
            return rowsOf.getOrDefault(reference.id(), 1);
        }
        Column column = ((Given.Values) given).column();
        return column.rows();
    }
}
