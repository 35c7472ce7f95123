package org.ductledger.record;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.ductledger.record.RecordedQuantity.Role;

/** Reads a workbook's record back from its {@code Ledger} sheet, in the form of {@link RecordForm}. */
public final class RecordReader {
    private final Map<String, String> head = new HashMap<>();
    private final Map<String, QuantityLines> quantities = new LinkedHashMap<>();
    private final Map<String, CallLine> calls = new LinkedHashMap<>();
    private final Map<String, ValueLines> columns = new HashMap<>();

    private RecordReader() {}

    /**
     * Reads the record; whether its digest holds is not asked here, see {@link RecordDigest#holds}.
     *
     * @throws UnreadableWorkbookException if there is no such sheet, or a line of it is damaged
     */
    public static LedgerRecord read(XSSFWorkbook book) throws UnreadableWorkbookException {
        XSSFSheet sheet = book.getSheet(RecordForm.SHEET);
        if (sheet == null) {
            throw new UnreadableWorkbookException(
                    "the workbook", "one with a sheet " + RecordForm.SHEET, "one without it");
        }
        RecordReader reader = new RecordReader();
        for (Row row : sheet) {
            reader.take(new RecordLine(row));
        }
        return reader.record();
    }

    private void take(RecordLine line) throws UnreadableWorkbookException {
        switch (line.kind()) {
            case RecordForm.RECORD -> head.put(line.required(RecordForm.NAME), line.required(RecordForm.WHAT));
            case RecordForm.INPUT, RecordForm.REMARK -> takeInput(line);
            case RecordForm.FIXED -> takeFixed(line);
            case RecordForm.CALL -> takeCall(line);
            case RecordForm.VALUE -> takeValues(line);
            case "" -> {
                // a heading, a note, or nothing
            }
            default -> throw line.damaged(0, "record, input, remark, fixed, call, value or empty");
        }
    }

    private void takeInput(RecordLine line) throws UnreadableWorkbookException {
        Role role = line.kind().equals(RecordForm.INPUT) ? Role.INPUT : Role.REMARK;
        String name = line.required(RecordForm.NAME);
        QuantityLines quantity = quantities.get(name);
        if (quantity == null) {
            ValueLines values = new ValueLines(line.isNumber(RecordForm.KIND));
            quantity = new QuantityLines(name, role, line.text(RecordForm.UNIT), values);
            quantities.put(name, quantity);
        }
        if (quantity.role != role) {
            throw line.damaged(RecordForm.NAME, "a name that no other quantity has");
        }
        if (line.count(RecordForm.ROWS) != quantity.values.size() + 1) {
            throw line.damaged(RecordForm.ROWS, (quantity.values.size() + 1) + ", the next row");
        }
        quantity.cells.add(line.required(RecordForm.WHAT));
        quantity.values.add(line, RecordForm.VALUES);
    }

    private void takeFixed(RecordLine line) throws UnreadableWorkbookException {
        String name = line.required(RecordForm.NAME);
        ValueLines values = new ValueLines(line.isNumber(RecordForm.KIND));
        QuantityLines quantity = new QuantityLines(name, Role.FIXED, line.text(RecordForm.UNIT), values);
        if (!line.text(RecordForm.WHAT).isEmpty()) {
            quantity.cells.addAll(List.of(line.text(RecordForm.WHAT).split(" ")));
        }
        if (quantities.put(name, quantity) != null) {
            throw line.damaged(RecordForm.NAME, "a name that no other quantity has");
        }
        takeOwnValue(line, name, values);
    }

    private void takeCall(RecordLine line) throws UnreadableWorkbookException {
        String id = line.required(RecordForm.NAME);
        ValueLines values = new ValueLines(line.isNumber(RecordForm.KIND));
        if (calls.put(id, new CallLine(line, values)) != null) {
            throw line.damaged(RecordForm.NAME, "an id that no other call has");
        }
        takeOwnValue(line, id, values);
    }

    /** The value of a single row stands in the line; a column's values follow in lines of their own. */
    private void takeOwnValue(RecordLine line, String owner, ValueLines values) throws UnreadableWorkbookException {
        int rows = line.count(RecordForm.ROWS);
        values.expect(rows, line);
        if (rows == 1) {
            values.add(line, RecordForm.VALUES);
        } else if (columns.put(owner, values) != null) {
            throw line.damaged(RecordForm.NAME, "a name that no other column has");
        }
    }

    private void takeValues(RecordLine line) throws UnreadableWorkbookException {
        ValueLines values = columns.get(line.required(RecordForm.NAME));
        if (values == null) {
            throw line.damaged(RecordForm.NAME, "the name of a column in a line above");
        }
        if (line.count(RecordForm.ROWS) != values.size() + 1) {
            throw line.damaged(RecordForm.ROWS, (values.size() + 1) + ", the next row");
        }
        int end = RecordForm.VALUES + RecordForm.VALUES_PER_LINE;
        for (int column = RecordForm.VALUES; column < end && !line.text(column).isEmpty(); column++) {
            values.add(line, column);
        }
    }

    private LedgerRecord record() throws UnreadableWorkbookException {
        List<RecordedQuantity> read = new ArrayList<>();
        Map<String, Integer> rows = new HashMap<>();
        for (QuantityLines quantity : quantities.values()) {
            read.add(quantity.quantity());
            rows.put(quantity.name, quantity.values.size());
        }
        List<RecordedCall> readCalls = new ArrayList<>();
        for (CallLine call : calls.values()) {
            readCalls.add(call.call(rows, calls.keySet()));
        }
        return new LedgerRecord(
                said(RecordForm.TEMPLATE),
                version(said(RecordForm.TEMPLATE_VERSION)),
                said(RecordForm.LIBRARY),
                said(RecordForm.UNITS),
                read,
                readCalls,
                said(RecordForm.DIGEST));
    }

    private String said(String key) throws UnreadableWorkbookException {
        String text = head.get(key);
        if (text == null) {
            throw new UnreadableWorkbookException(RecordForm.SHEET, "a record with a line for " + key, "none");
        }
        return text;
    }

    private static int version(String text) throws UnreadableWorkbookException {
        try {
            return Integer.parseInt(text);
        } catch (NumberFormatException e) {
            UnreadableWorkbookException damaged = new UnreadableWorkbookException(
                    RecordForm.SHEET + ", " + RecordForm.TEMPLATE_VERSION, "a whole number", "'" + text + "'");
            damaged.initCause(e);
            throw damaged;
        }
    }

    /** The lines of one quantity, as they come. */
    private static final class QuantityLines {
        final String name;
        final Role role;
        final String unit;
        final ValueLines values;
        final List<String> cells = new ArrayList<>();

        QuantityLines(String name, Role role, String unit, ValueLines values) {
            this.name = name;
            this.role = role;
            this.unit = unit;
            this.values = values;
        }

        RecordedQuantity quantity() throws UnreadableWorkbookException {
            return new RecordedQuantity(name, role, unit, cells, values.column());
        }
    }
}
