package org.ductledger.template;

import org.ductledger.sheet.Grid;

/**
 * Where the parts of a table's sheet stand: the live block, to its right the filled block, and beyond it, outside the
 * print area, the working columns. The rows of all three are the same.
 *
 * @param headRow the first of three head rows: label, symbol, unit
 * @param rows the number of data rows
 * @param liveColumns the number of columns between the row numbers and the check
 * @param filledColumns the number of columns that have a filled value
 */
record TableFrame(Grid grid, int headRow, int rows, int liveColumns, int filledColumns) {
    static final int NUMBER = 0;
    static final int FIRST_LIVE = 1;

    /** The rows that a plot takes above the head. */
    static final int PLOT_ROWS = 32;

    static final int FIRST_PLOT_ROW = 3;
    static final int HEAD_ROWS = 3;

    int firstRow() {
        return headRow + HEAD_ROWS;
    }

    int lastRow() {
        return firstRow() + rows - 1;
    }

    int check() {
        return FIRST_LIVE + liveColumns;
    }

    int filledNumber() {
        return check() + 2;
    }

    int firstFilled() {
        return filledNumber() + 1;
    }

    int lastFilled() {
        return filledNumber() + filledColumns;
    }

    int firstWorking() {
        return lastFilled() + 2;
    }

    /** The data rows of one column, with the sheet's name. */
    String range(int column) {
        return grid.range(firstRow(), lastRow(), column);
    }
}
