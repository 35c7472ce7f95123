package org.ductledger.record;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
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

    private static final int LAST_PRINTED_COLUMN = 9;

    private final Grid grid;
    private final LedgerRecord record;
    private int row;

    private RecordWriter(Grid grid, LedgerRecord record) {
        this.grid = grid;
        this.record = record;
    }

    /** Adds the sheet {@code Ledger} at the end of the book, and names the cell that counts changed inputs. */
    public static void write(Book book, PageSetup page, LedgerRecord record) {
        new RecordWriter(book.sheet(RecordForm.SHEET), record).write(book, page);
    }

    private void write(Book book, PageSetup page) {
        grid.widths(8, 26, 30, 22, 16, 24, 24, 24, 24, 24, 40, 40, 40, 40, 40, 40, 40);
        grid.text(row++, 1, Look.TITLE, "Ledger");
        grid.across(
                row++,
                1,
                LAST_PRINTED_COLUMN,
                Look.NOTE,
                "The machine-readable record of this workbook: what was given, every call, what it came to. Column A tells"
                        + " the kind of a line; the digest is the SHA-256 of all lines but itself.");
        int changedRow = row++;
        writeHead();
        int firstInput = row + 2;
        writeInputs();
        String states = grid.range(firstInput, Math.max(firstInput, row - 1), 8);
        grid.text(changedRow, 1, Look.STRONG, "Inputs changed since the fill");
        grid.formula(changedRow, 2, Look.CHECK, "0", "COUNTIF(" + states + ",\"changed\")");
        book.name(INPUTS_CHANGED, grid.address(changedRow, 2));
        writeFixed();
        writeCalls();
        writeValues();
        page.apply(grid, true, "$A$1:$J$" + row);
    }

    private void heads(String title, String... names) {
        row++;
        grid.text(row, 1, Look.STRONG, title);
        row++;
        for (int i = 0; i < names.length; i++) {
            grid.text(row, i + 1, Look.COLUMN_HEAD, names[i]);
        }
        row++;
    }

    private void line(String kind, List<String> texts) {
        grid.text(row, 0, Look.WORKING, kind);
        for (int i = 0; i < texts.size(); i++) {
            grid.text(row, i + 1, Look.RECORD, texts.get(i));
        }
        row++;
    }

    private void writeHead() {
        heads("Record", "Key", "Text");
        line(RecordForm.RECORD, List.of(RecordForm.TEMPLATE, record.template()));
        line(RecordForm.RECORD, List.of(RecordForm.TEMPLATE_VERSION, Integer.toString(record.templateVersion())));
        line(RecordForm.RECORD, List.of(RecordForm.LIBRARY, record.library()));
        line(RecordForm.RECORD, List.of(RecordForm.UNITS, record.units()));
        line(RecordForm.RECORD, List.of(RecordForm.DIGEST, record.digest()));
    }

    private void writeInputs() {
        heads("Inputs", "Name", "Role", "Cell", "Unit", "Kind", "Value, 17 digits", "At the fill", "State now");
        for (RecordedQuantity quantity : record.quantities()) {
            for (int i = 0;
                    quantity.role() != Role.FIXED && i < quantity.values().rows();
                    i++) {
                writeInput(quantity, i);
            }
        }
    }

    private void writeInput(RecordedQuantity quantity, int i) {
        int at = row;
        String cell = quantity.cells().get(i);
        line(
                label(quantity.role()),
                List.of(
                        quantity.name(),
                        label(quantity.role()),
                        cell,
                        quantity.unit(),
                        kind(quantity.values()),
                        value(quantity.values(), i, List.of())));
        String kept = Grid.inRow(at, 7);
        if (quantity.values() instanceof Column.Numbers numbers) {
            grid.number(at, 7, Look.FILLED, NumberFormats.GENERAL, numbers.values()[i]);
            state(at, quantity.role(), "AND(ISNUMBER(" + cell + ")," + cell + "=" + kept + ")");
        } else {
            grid.text(at, 7, Look.FILLED, value(quantity.values(), i, List.of()));
            state(at, quantity.role(), "EXACT(" + cell + "," + kept + ")");
        }
    }

    private void state(int at, Role role, String same) {
        if (role == Role.REMARK) {
            grid.text(at, 8, Look.NOTE, "not compared");
        } else {
            grid.formula(at, 8, Look.CHECK, NumberFormats.GENERAL, "IF(" + same + ",\"as filled\",\"changed\")");
        }
    }

    private void writeFixed() {
        heads("Constants of the template", "Name", "Cells", "Unit", "Kind", "Rows", "Value, 17 digits");
        for (RecordedQuantity quantity : record.quantities()) {
            if (quantity.role() == Role.FIXED) {
                line(
                        RecordForm.FIXED,
                        List.of(
                                quantity.name(),
                                String.join(" ", quantity.cells()),
                                quantity.unit(),
                                kind(quantity.values()),
                                Integer.toString(quantity.values().rows()),
                                ownValue(quantity.values(), List.of())));
            }
        }
    }

    private void writeCalls() {
        heads(
                "Calls",
                "Id",
                "Function",
                "Revision",
                "Unit",
                "Kind",
                "Rows",
                "Value, 17 digits",
                "Live cells",
                "Filled cells",
                "Argument 1",
                "Argument 2",
                "Argument 3",
                "Argument 4",
                "Argument 5",
                "Argument 6",
                "Argument 7");
        for (RecordedCall call : record.calls()) {
            List<String> texts = new ArrayList<>(List.of(
                    call.id(),
                    call.function(),
                    Integer.toString(call.revision()),
                    call.unit(),
                    kind(call.values()),
                    Integer.toString(call.values().rows()),
                    ownValue(call.values(), call.faults()),
                    call.liveCells(),
                    call.filledCells()));
            call.arguments()
                    .forEach(a -> texts.add(
                            a.name() + RecordForm.IS + OriginText.of(a.origin()) + RecordForm.AT + a.cells()));
            line(RecordForm.CALL, texts);
        }
    }

    private void writeValues() {
        heads("Values of columns", "Of", "First row", "Value, 17 digits", "and the next", "", "", "");
        record.quantities().stream()
                .filter(quantity -> quantity.role() == Role.FIXED)
                .forEach(quantity -> writeColumn(quantity.name(), quantity.values(), List.of()));
        record.calls().forEach(call -> writeColumn(call.id(), call.values(), call.faults()));
    }

    private void writeColumn(String owner, Column column, List<RecordedFault> faults) {
        int rows = column.rows() == 1 ? 0 : column.rows();
        for (int first = 0; first < rows; first += RecordForm.VALUES_PER_LINE) {
            List<String> texts = new ArrayList<>(List.of(owner, Integer.toString(first + 1)));
            for (int i = first; i < Math.min(rows, first + RecordForm.VALUES_PER_LINE); i++) {
                texts.add(value(column, i, faults));
            }
            line(RecordForm.VALUE, texts);
        }
    }

    private static String label(Enum<?> role) {
        return role.name().toLowerCase(Locale.ROOT);
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
