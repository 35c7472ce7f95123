package org.ductledger.record;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.ledger.Column;
import org.ductledger.record.RecordedCall.RecordedFault;
import org.jspecify.annotations.Nullable;

/** Values as they are read, line by line: numbers or words, and the faults of the rows that have neither. */
final class ValueLines {
    private final boolean numbers;
    private final List<@Nullable Object> values = new ArrayList<>();
    private final List<RecordedFault> faults = new ArrayList<>();
    private int expected = -1;

    private @Nullable RecordLine declaredBy;

    ValueLines(boolean numbers) {
        this.numbers = numbers;
    }

    /** Says how many there must be in the end, and which line says so. */
    void expect(int rows, RecordLine line) {
        expected = rows;
        declaredBy = line;
    }

    int size() {
        return values.size();
    }

    List<RecordedFault> faults() {
        return faults;
    }

    void add(RecordLine line, int column) throws UnreadableWorkbookException {
        String text = line.text(column);
        if (text.startsWith(RecordForm.FAULT)) {
            faults.add(fault(text.substring(RecordForm.FAULT.length()), line, column));
            values.add(null);
        } else {
            values.add(numbers ? (Object) number(text, line, column) : text);
        }
    }

    private static double number(String text, RecordLine line, int column) throws UnreadableWorkbookException {
        try {
            double x = Double.parseDouble(text);
            if (Double.isFinite(x)) {
                return x;
            }
        } catch (NumberFormatException e) {
            throw line.because(column, "a number or a fault", e);
        }
        throw line.damaged(column, "a finite number or a fault");
    }

    private RecordedFault fault(String text, RecordLine line, int column) throws UnreadableWorkbookException {
        String[] parts = text.split(": ", 2);
        try {
            FaultKind kind = FaultKind.valueOf(parts[0].toUpperCase(Locale.ROOT));
            return new RecordedFault(values.size(), kind, parts.length == 2 ? parts[1] : "");
        } catch (IllegalArgumentException e) {
            throw line.because(column, "a fault of a known kind", e);
        }
    }

    Column column() throws UnreadableWorkbookException {
        if (declaredBy != null && values.size() != expected) {
            throw declaredBy.damaged(RecordForm.ROWS, values.size() + ", the number of its values in the record");
        }
        if (numbers) {
            return new Column.Numbers(values.stream()
                    .mapToDouble(x -> x instanceof Double number ? number : Double.NaN)
                    .toArray());
        }
        List<@Nullable String> words = new ArrayList<>();
        values.forEach(word -> words.add((String) word));
        return new Column.Texts(words);
    }
}
