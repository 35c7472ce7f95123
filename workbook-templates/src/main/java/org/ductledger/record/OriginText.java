package org.ductledger.record;

import java.util.ArrayList;
import java.util.List;
import org.ductledger.record.RecordedArgument.FromCall;
import org.ductledger.record.RecordedArgument.FromQuantity;
import org.ductledger.record.RecordedArgument.Origin;

/**
 * An argument's origin in words: {@code call exit_mach}, {@code quantity gamma}, or, where only some rows of a quantity
 * are taken, {@code quantity contour_x rows 1x8 2x8 3}, which takes the first row eight times, then the second, then
 * the third once.
 */
final class OriginText {
    private static final String CALL = "call ";
    private static final String QUANTITY = "quantity ";
    private static final String ROWS = " rows ";

    private OriginText() {}

    static String of(Origin origin) {
        if (origin instanceof FromCall call) {
            return CALL + call.id();
        }
        FromQuantity from = (FromQuantity) origin;
        return QUANTITY + from.quantity() + (from.rows().isEmpty() ? "" : ROWS + runs(from.rows()));
    }

    private static String runs(List<Integer> rows) {
        List<String> runs = new ArrayList<>();
        for (int i = 0; i < rows.size(); ) {
            int next = i + 1;
            while (next < rows.size() && rows.get(next).equals(rows.get(i))) {
                next++;
            }
            runs.add((rows.get(i) + 1) + (next - i == 1 ? "" : "x" + (next - i)));
            i = next;
        }
        return String.join(" ", runs);
    }

    /**
     * Reads an origin back.
     *
     * @throws IllegalArgumentException if the text is none
     */
    static Origin parse(String text) {
        if (text.startsWith(CALL)) {
            return new FromCall(text.substring(CALL.length()));
        }
        if (!text.startsWith(QUANTITY)) {
            throw new IllegalArgumentException("an origin begins with 'call' or 'quantity'");
        }
        String rest = text.substring(QUANTITY.length());
        int at = rest.indexOf(ROWS);
        return at < 0
                ? new FromQuantity(rest, List.of())
                : new FromQuantity(rest.substring(0, at), rows(rest.substring(at + ROWS.length())));
    }

    private static List<Integer> rows(String runs) {
        List<Integer> rows = new ArrayList<>();
        for (String run : runs.split(" ", -1)) {
            int times = run.indexOf('x');
            int row = Integer.parseInt(times < 0 ? run : run.substring(0, times)) - 1;
            int count = times < 0 ? 1 : Integer.parseInt(run.substring(times + 1));
            if (row < 0 || count < 1 || rows.size() + count > MOST_ROWS) {
                throw new IllegalArgumentException("rows count from 1, and at most " + MOST_ROWS + " are taken");
            }
            for (int i = 0; i < count; i++) {
                rows.add(row);
            }
        }
        return rows;
    }

    /** As many rows as a sheet has: a file cannot ask for more memory than it could hold cells. */
    private static final int MOST_ROWS = 1_048_576;
}
