package org.ductledger.record;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.ductledger.ledger.Column;
import org.ductledger.record.RecordedCall.RecordedFault;
import org.ductledger.record.RecordedQuantity.Role;
import org.ductledger.sheet.Book;
import org.ductledger.sheet.Grid;
import org.ductledger.sheet.Look;
import org.ductledger.sheet.NumberFormats;
import org.ductledger.sheet.PageSetup;

/** Writes a record to its sheet, in the form of {@link RecordForm}. */
public final class RecordWriter {
    /** The name of the cell that counts the inputs that differ from those of the fill. */
    public static final String INPUTS_CHANGED = "inputs_changed";

    private static final Map<Integer, String> COMMON_HEADS = Map.of(
            RecordForm.NAME, "Name",
            RecordForm.UNIT, "Unit",
            RecordForm.KIND, "Kind",
            RecordForm.ROWS, "Rows",
            RecordForm.VALUES, "Value, 17 digits");
    private static final int CHANGED_ROW = 2;
    private static final int CHANGED_COLUMN = 2;

    private final Grid grid;
    private final LedgerRecord record;
    private int row;

    private RecordWriter(Grid grid, LedgerRecord record) {
        this.grid = grid;
        this.record = record;
    }

    /** Makes the sheet {@code Ledger} and the name of the cell that counts changed inputs, for formulas to lean on. */
    public static void declare(Book book) {
        book.name(INPUTS_CHANGED, book.sheet(RecordForm.SHEET).address(CHANGED_ROW, CHANGED_COLUMN));
    }

    /** Writes the record to the sheet {@code Ledger}. */
    public static void write(Book book, PageSetup page, LedgerRecord record) {
        declare(book);
        new RecordWriter(book.sheet(RecordForm.SHEET), record).write(page);
    }

    private void write(PageSetup page) {
        grid.widths(9, 20, 28, 8, 14, 8, 6, 21, 22, 22, 48);
        grid.text(row++, 1, Look.TITLE, RecordForm.SHEET);
        grid.across(
                row++,
                1,
                RecordForm.ARGUMENTS,
                Look.NOTE,
                "The machine-readable record of this workbook: what was given, every call, what it came to. Column A tells"
                        + " the kind of a line; the digest is the SHA-256 of all lines but itself.");
        row = CHANGED_ROW + 1;
        writeHead();
        int firstInput = row + 2;
        writeInputs();
        String states = grid.range(firstInput, Math.max(firstInput, row - 1), RecordForm.STATE);
        grid.text(CHANGED_ROW, 1, Look.STRONG, "Inputs changed");
        grid.formula(CHANGED_ROW, CHANGED_COLUMN, Look.CHECK, "0", "COUNTIF(" + states + ",\"changed\")");
        writeFixed();
        writeCalls();
        writeValues();
        page.apply(grid, true, "$A$1:$K$" + row);
    }

    private void heads(String title, Map<Integer, String> names) {
        row++;
        grid.text(row++, 1, Look.STRONG, title);
        for (int column = 0; column <= RecordForm.ARGUMENTS; column++) {
            String name = names.getOrDefault(column, "");
            // Column A stays empty: it tells lines of the record from all others.
            grid.text(row, column, Look.COLUMN_HEAD, column == 0 ? "" : name);
        }
        row++;
    }

    private void line(String kind, Map<Integer, String> texts) {
        for (int column = 0; column <= RecordForm.ARGUMENTS; column++) {
            String text = column == 0 ? kind : texts.getOrDefault(column, "");
            grid.text(row, column, Look.RECORD, text);
        }
        row++;
    }

    private void writeHead() {
        heads("Record", Map.of(RecordForm.NAME, "Key", RecordForm.WHAT, "Text"));
        head(RecordForm.TEMPLATE, record.template());
        head(RecordForm.TEMPLATE_VERSION, Integer.toString(record.templateVersion()));
        head(RecordForm.LIBRARY, record.library());
        head(RecordForm.UNITS, record.units());
        head(RecordForm.DIGEST, record.digest());
    }

    private void head(String key, String text) {
        line(RecordForm.RECORD, Map.of(RecordForm.NAME, key, RecordForm.WHAT, text));
    }

    private void writeInputs() {
        Map<Integer, String> names = new HashMap<>(COMMON_HEADS);
        names.put(RecordForm.WHAT, "Cell");
        names.put(RecordForm.ROWS, "Row");
        names.put(RecordForm.AT_THE_FILL, "At the fill");
        names.put(RecordForm.STATE, "State now");
        heads("Inputs, and remarks on the front sheet", names);
        for (RecordedQuantity quantity : record.quantities()) {
            int rows = quantity.role() == Role.FIXED ? 0 : quantity.values().rows();
            for (int i = 0; i < rows; i++) {
                writeInput(quantity, i);
            }
        }
    }

    private void writeInput(RecordedQuantity quantity, int i) {
        int at = row;
        boolean isRemark = quantity.role() == Role.REMARK;
        String cell = quantity.cells().get(i);
        String value = value(quantity.values(), i, List.of());
        Map<Integer, String> texts = common(quantity.name(), quantity.unit(), quantity.values());
        texts.put(RecordForm.WHAT, cell);
        texts.put(RecordForm.ROWS, Integer.toString(i + 1));
        texts.put(RecordForm.VALUES, value);
        line(isRemark ? RecordForm.REMARK : RecordForm.INPUT, texts);
        if (isRemark) {
            grid.text(at, RecordForm.STATE, Look.NOTE, "not compared");
            return;
        }
        String kept = Grid.inRow(at, RecordForm.AT_THE_FILL);
        if (quantity.values() instanceof Column.Numbers numbers) {
            grid.number(at, RecordForm.AT_THE_FILL, Look.FILLED, NumberFormats.GENERAL, numbers.values()[i]);
            state(at, "AND(ISNUMBER(" + cell + ")," + cell + "=" + kept + ")");
        } else {
            grid.text(at, RecordForm.AT_THE_FILL, Look.FILLED, value);
            state(at, "EXACT(" + cell + "," + kept + ")");
        }
    }

    private void state(int at, String same) {
        String formula = "IF(" + same + ",\"as filled\",\"changed\")";
        grid.formula(at, RecordForm.STATE, Look.CHECK, NumberFormats.GENERAL, formula);
    }

    private void writeFixed() {
        Map<Integer, String> names = new HashMap<>(COMMON_HEADS);
        names.put(RecordForm.WHAT, "Cells");
        heads("Constants of the template", names);
        for (RecordedQuantity quantity : record.quantities()) {
            if (quantity.role() == Role.FIXED) {
                Map<Integer, String> texts = common(quantity.name(), quantity.unit(), quantity.values());
                texts.put(RecordForm.WHAT, String.join(" ", quantity.cells()));
                texts.put(RecordForm.VALUES, ownValue(quantity.values(), List.of()));
                line(RecordForm.FIXED, texts);
            }
        }
    }

    private void writeCalls() {
        Map<Integer, String> names = new HashMap<>(COMMON_HEADS);
        names.put(RecordForm.NAME, "Id");
        names.put(RecordForm.WHAT, "Function");
        names.put(RecordForm.REVISION, "Revision");
        names.put(RecordForm.LIVE, "Live cells");
        names.put(RecordForm.FILLED, "Filled cells");
        names.put(RecordForm.ARGUMENTS, "Arguments, with the cells that hold them");
        heads("Calls", names);
        for (RecordedCall call : record.calls()) {
            Map<Integer, String> texts = common(call.id(), call.unit(), call.values());
            texts.put(RecordForm.WHAT, call.function());
            texts.put(RecordForm.REVISION, Integer.toString(call.revision()));
            texts.put(RecordForm.VALUES, ownValue(call.values(), call.faults()));
            texts.put(RecordForm.LIVE, call.liveCells());
            texts.put(RecordForm.FILLED, call.filledCells());
            texts.put(
                    RecordForm.ARGUMENTS,
                    call.arguments().stream().map(RecordWriter::argument).collect(Collectors.joining(RecordForm.NEXT)));
            line(RecordForm.CALL, texts);
        }
    }

    private static String argument(RecordedArgument argument) {
        return argument.name() + RecordForm.IS + OriginText.of(argument.origin()) + RecordForm.AT + argument.cells();
    }

    private void writeValues() {
        Map<Integer, String> names = new HashMap<>();
        names.put(RecordForm.NAME, "Of");
        names.put(RecordForm.ROWS, "Row");
        names.put(RecordForm.VALUES, "Value, 17 digits");
        names.put(RecordForm.VALUES + 1, "and those of the next rows");
        heads("Values of columns", names);
        record.quantities().stream()
                .filter(quantity -> quantity.role() == Role.FIXED)
                .forEach(quantity -> writeColumn(quantity.name(), quantity.values(), List.of()));
        record.calls().forEach(call -> writeColumn(call.id(), call.values(), call.faults()));
    }

    private void writeColumn(String owner, Column column, List<RecordedFault> faults) {
        int rows = column.rows() == 1 ? 0 : column.rows();
        for (int first = 0; first < rows; first += RecordForm.VALUES_PER_LINE) {
            Map<Integer, String> texts = new HashMap<>();
            texts.put(RecordForm.NAME, owner);
            texts.put(RecordForm.ROWS, Integer.toString(first + 1));
            for (int i = first; i < Math.min(rows, first + RecordForm.VALUES_PER_LINE); i++) {
                texts.put(RecordForm.VALUES + i - first, value(column, i, faults));
            }
            line(RecordForm.VALUE, texts);
        }
    }

    private static Map<Integer, String> common(String name, String unit, Column values) {
        Map<Integer, String> texts = new HashMap<>();
        texts.put(RecordForm.NAME, name);
        texts.put(RecordForm.UNIT, unit);
        texts.put(RecordForm.KIND, kind(values));
        texts.put(RecordForm.ROWS, Integer.toString(values.rows()));
        return texts;
    }

    private static String kind(Column column) {
        return column instanceof Column.Numbers ? RecordForm.NUMBER : RecordForm.WORD;
    }

    /** The value of a single row; a column's values stand in lines of their own. */
    private static String ownValue(Column column, List<RecordedFault> faults) {
        return column.rows() == 1 ? value(column, 0, faults) : "";
    }

    private static String value(Column column, int row, List<RecordedFault> faults) {
        for (RecordedFault fault : faults) {
            if (fault.row() == row) {
                return RecordForm.FAULT + fault.kind().label() + ": " + fault.detail();
            }
        }
        if (column instanceof Column.Numbers numbers) {
            return Digits.of(numbers.values()[row]);
        }
        String word = ((Column.Texts) column).values().get(row);
        return word == null ? "" : word;
    }
}
