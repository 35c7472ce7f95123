package org.ductledger.record;

import java.util.ArrayList;
import java.util.List;
import org.ductledger.record.RecordedArgument.FromCall;
import org.ductledger.record.RecordedArgument.FromQuantity;
import org.ductledger.record.RecordedArgument.FromRows;
import org.ductledger.record.RecordedArgument.Origin;
import org.ductledger.record.RecordedArgument.Row;

/**
 * An argument's origin in words: {@code call exit_mach}, {@code quantity gamma}, or, where only single rows are taken,
 * {@code rows contour_x:1x8 contour_x:2x8 contour_x:3}, which takes the first row eight times, then the second, then the
 * third once.
 */
final class OriginText {
    private static final String CALL = "call ";
    private static final String QUANTITY = "quantity ";
    private static final String ROWS = "rows ";

    /** As many rows as a sheet has: a file cannot ask for more memory than it could hold cells. */
    private static final int MOST_ROWS = 1_048_576;

    private OriginText() {}

    static String of(Origin origin) {
        if (origin instanceof FromCall call) {
            return CALL + call.id();
        }
        return origin instanceof FromRows from
                ? ROWS + runs(from.rows())
                : QUANTITY + ((FromQuantity) origin).quantity();
    }

    private static String runs(List<Row> rows) {
        List<String> runs = new ArrayList<>();
        for (int i = 0; i < rows.size(); ) {
            Row row = rows.get(i);
            int next = i + 1;
            while (next < rows.size() && rows.get(next).equals(row)) {
                next++;
            }
            runs.add(row.quantity() + ":" + (row.row() + 1) + (next - i == 1 ? "" : "x" + (next - i)));
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
        if (text.startsWith(QUANTITY)) {
            return new FromQuantity(text.substring(QUANTITY.length()));
        }
        if (text.startsWith(ROWS)) {
            return new FromRows(rows(text.substring(ROWS.length())));
        }
        throw new IllegalArgumentException("an origin begins with 'call', 'quantity' or 'rows'");
    }

    private static List<Row> rows(String runs) {
        List<Row> rows = new ArrayList<>();
        for (String run : runs.split(" ", -1)) {
            int colon = run.lastIndexOf(':');
            int times = run.indexOf('x', colon);
            if (colon < 0) {
                throw new IllegalArgumentException("a row reads 'quantity:row'");
            }
            int row = Integer.parseInt(run.substring(colon + 1, times < 0 ? run.length() : times)) - 1;
            int count = times < 0 ? 1 : Integer.parseInt(run.substring(times + 1));
            if (row < 0 || count < 1 || rows.size() + count > MOST_ROWS) {
                throw new IllegalArgumentException("rows count from 1, and at most " + MOST_ROWS + " are taken");
            }
            for (int i = 0; i < count; i++) {
                rows.add(new Row(run.substring(0, colon), row));
            }
        }
        return rows;
    }
}
