package org.ductledger.record;

import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.util.CellReference;

/** One line of the {@code Ledger} sheet, as texts. */
final class RecordLine {
    /** As many as a sheet has rows: a file cannot ask for more memory than it could hold cells. */
    private static final int MOST_ROWS = 1_048_576;

    private final Row row;

    RecordLine(Row row) {
        this.row = row;
    }

    String kind() {
        return text(0);
    }

    /** The text of a cell; empty where there is none, and for a number, which no line has where a text is read. */
    String text(int column) {
        Cell cell = row.getCell(column);
        return cell != null && cell.getCellType() == CellType.STRING ? cell.getStringCellValue() : "";
    }

    String required(int column) throws UnreadableWorkbookException {
        String text = text(column);
        if (text.isEmpty()) {
            throw damaged(column, "a text");
        }
        return text;
    }

    boolean isNumber(int column) throws UnreadableWorkbookException {
        String kind = text(column);
        if (!kind.equals(RecordForm.NUMBER) && !kind.equals(RecordForm.WORD)) {
            throw damaged(column, RecordForm.NUMBER + " or " + RecordForm.WORD);
        }
        return kind.equals(RecordForm.NUMBER);
    }

    /** A count from 1. */
    int count(int column) throws UnreadableWorkbookException {
        try {
            int count = Integer.parseInt(text(column));
            if (count >= 1 && count <= MOST_ROWS) {
                return count;
            }
        } catch (NumberFormatException e) {
            throw because(column, "a count from 1 to " + MOST_ROWS, e);
        }
        throw damaged(column, "a count from 1 to " + MOST_ROWS);
    }

    UnreadableWorkbookException damaged(int column, String required) {
        String text = text(column);
        return new UnreadableWorkbookException(place(column), required, text.isEmpty() ? "no text" : "'" + text + "'");
    }

    UnreadableWorkbookException because(int column, String required, Exception cause) {
        UnreadableWorkbookException damaged = damaged(column, required);
        damaged.initCause(cause);
        return damaged;
    }

    private String place(int column) {
        return RecordForm.SHEET + "!" + new CellReference(row.getRowNum(), column, false, false).formatAsString();
    }
}
