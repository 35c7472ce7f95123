package org.ductledger.record;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.ductledger.record.RecordedArgument.FromCall;
import org.ductledger.record.RecordedArgument.FromQuantity;
import org.ductledger.record.RecordedArgument.FromRows;
import org.ductledger.record.RecordedArgument.Origin;

/** A {@code call} line as it is read, and the values that belong to it. */
record CallLine(RecordLine line, ValueLines values) {
    /**
     * The call.
     *
     * @param quantities the record's quantities and their numbers of rows
     * @param ids the record's calls
     */
    RecordedCall call(Map<String, Integer> quantities, Set<String> ids) throws UnreadableWorkbookException {
        List<RecordedArgument> arguments = new ArrayList<>();
        if (!line.text(RecordForm.ARGUMENTS).isEmpty()) {
            for (String text : line.text(RecordForm.ARGUMENTS).split(RecordForm.NEXT, -1)) {
                arguments.add(argument(text, quantities, ids));
            }
        }
        return new RecordedCall(
                line.required(RecordForm.NAME),
                line.required(RecordForm.WHAT),
                line.count(RecordForm.REVISION),
                line.text(RecordForm.UNIT),
                arguments,
                line.text(RecordForm.LIVE),
                line.text(RecordForm.FILLED),
                values.column(),
                values.faults());
    }

    private RecordedArgument argument(String text, Map<String, Integer> quantities, Set<String> ids)
            throws UnreadableWorkbookException {
        int column = RecordForm.ARGUMENTS;
        int is = text.indexOf(RecordForm.IS);
        int at = text.lastIndexOf(RecordForm.AT);
        if (is < 0 || at < is) {
            throw line.damaged(column, "an argument as 'name = origin @ cells'");
        }
        Origin origin = origin(text.substring(is + RecordForm.IS.length(), at), column);
        boolean known = origin instanceof FromCall call ? ids.contains(call.id()) : has(origin, quantities);
        if (!known) {
            throw line.damaged(column, "an argument whose origin the record has");
        }
        return new RecordedArgument(text.substring(0, is), origin, text.substring(at + RecordForm.AT.length()));
    }

    private static boolean has(Origin origin, Map<String, Integer> quantities) {
        return origin instanceof FromRows from
                ? from.rows().stream().allMatch(row -> row.row() < quantities.getOrDefault(row.quantity(), 0))
                : quantities.containsKey(((FromQuantity) origin).quantity());
    }

    private Origin origin(String text, int column) throws UnreadableWorkbookException {
        try {
            return OriginText.parse(text);
        } catch (IllegalArgumentException e) {
            throw line.because(
                    column, "an argument whose origin reads 'call id', 'quantity name' or 'rows name:row'", e);
        }
    }
}
