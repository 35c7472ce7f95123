package org.ductledger.record;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.ductledger.record.RecordedArgument.FromCall;
import org.ductledger.record.RecordedArgument.FromQuantity;
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
        for (int column = RecordForm.FIRST_ARGUMENT_COLUMN; !line.text(column).isEmpty(); column++) {
            arguments.add(argument(column, quantities, ids));
        }
        return new RecordedCall(
                line.required(1),
                line.required(2),
                line.count(3),
                line.text(4),
                arguments,
                line.text(8),
                line.text(9),
                values.column(),
                values.faults());
    }

    private RecordedArgument argument(int column, Map<String, Integer> quantities, Set<String> ids)
            throws UnreadableWorkbookException {
        String text = line.text(column);
        int is = text.indexOf(RecordForm.IS);
        int at = text.lastIndexOf(RecordForm.AT);
        if (is < 0 || at < is) {
            throw line.damaged(column, "an argument as 'name = origin @ cells'");
        }
        Origin origin = origin(text.substring(is + RecordForm.IS.length(), at), column);
        boolean known =
                origin instanceof FromCall call ? ids.contains(call.id()) : has((FromQuantity) origin, quantities);
        if (!known) {
            throw line.damaged(column, "an argument whose origin the record has");
        }
        return new RecordedArgument(text.substring(0, is), origin, text.substring(at + RecordForm.AT.length()));
    }

    private static boolean has(FromQuantity origin, Map<String, Integer> quantities) {
        Integer rows = quantities.get(origin.quantity());
        return rows != null && origin.rows().stream().allMatch(row -> row < rows);
    }

    private Origin origin(String text, int column) throws UnreadableWorkbookException {
        try {
            return OriginText.parse(text);
        } catch (IllegalArgumentException e) {
            throw line.because(column, "an argument whose origin reads 'call id' or 'quantity name'", e);
        }
    }
}
