package org.ductledger.template;

import java.util.List;
import org.apache.poi.ss.util.CellRangeAddress;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.Unit;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Outcome;
import org.ductledger.sheet.Alerts;
import org.ductledger.sheet.Book;
import org.ductledger.sheet.Grid;
import org.ductledger.sheet.Literals;
import org.ductledger.sheet.Look;
import org.ductledger.sheet.NumberFormats;
import org.ductledger.sheet.PageSetup;
import org.ductledger.template.LiveFormula.Operand;

/**
 * The sheet {@code Results}: each single result as a live formula, beside it the filled value and a check in words. The
 * live formula computes in coherent units in the working columns to the right, its helper cells on the same row.
 */
final class ResultsSheet {
    static final String NAME = "Results";

    /** Where the checks stand among the places. */
    static final String CHECKS = "results_checks";

    private static final String[] HEADS = {
        "Quantity", "Symbol", "Live value", "Unit", "Filled value", "Check", "Function", "Revision", "Note"
    };
    private static final double TOLERANCE = 1e-9;
    private static final int TOLERANCE_ROW = 2;
    private static final int LABEL = 0;
    private static final int SYMBOL = 1;
    private static final int LIVE = 2;
    private static final int UNIT = 3;
    private static final int FILLED = 4;
    private static final int CHECK = 5;
    private static final int FUNCTION = 6;
    private static final int REVISION = 7;
    private static final int NOTE = 8;
    private static final int FACTOR = 10;
    private static final int COHERENT = 11;
    private static final int CELL_NAME = 12;
    private static final int FIRST_HELPER = 13;

    private final Layout layout;
    private final Grid grid;
    private int row = 3;
    private int mostHelpers;

    private ResultsSheet(Layout layout, Grid grid) {
        this.layout = layout;
        this.grid = grid;
    }

    /** Names the cell of the tolerance, for checks to lean on. */
    static void declare(Book book) {
        book.name(Layout.TOLERANCE, book.sheet(NAME).address(TOLERANCE_ROW, LIVE));
    }

    static void write(Layout layout, Grid grid) {
        new ResultsSheet(layout, grid).write();
    }

    private void write() {
        grid.widths(42, 10, 16, 14, 16, 28, 34, 9, 44, 3, 16, 18, 24);
        Layout.head(grid, "Results", NOTE);
        grid.text(TOLERANCE_ROW, LABEL, Look.TEXT, "Tolerance of the checks, relative");
        grid.number(TOLERANCE_ROW, LIVE, Look.LIVE, "0E+00", TOLERANCE);
        grid.heads(row, LABEL, Look.COLUMN_HEAD, HEADS);
        grid.heads(row, FACTOR, Look.WORKING_HEAD, "Factor to SI", "SI value, live", "Name of the SI cell");
        int headRow = row++;
        int first = row;
        for (Draft.Section section : layout.draft().sections()) {
            grid.across(row++, LABEL, NOTE, Look.HEADING, section.title());
            section.calls().forEach(this::write);
        }
        layout.places().show(CHECKS, List.of(grid.range(first, row - 1, CHECK)));
        headHelpers(headRow);
        writeAlerts(first);
        grid.poi().createFreezePane(0, headRow + 1);
        PageSetup.repeat(grid, headRow, headRow);
        layout.page().apply(grid, true, "$A$1:$I$" + row);
    }

    private void writeAlerts(int first) {
        Alerts.unless(grid, new CellRangeAddress(first, row - 1, CHECK, CHECK), Layout.AGREES, Layout.FILLED_ONLY);
        if (mostHelpers > 0) {
            int last = FIRST_HELPER + 2 * mostHelpers - 1;
            Alerts.quietErrors(grid, new CellRangeAddress(first, row - 1, FIRST_HELPER, last));
        }
    }

    private void headHelpers(int headRow) {
        for (int i = 0; i < mostHelpers; i++) {
            grid.text(headRow, FIRST_HELPER + 2 * i, Look.WORKING_HEAD, "Step " + (i + 1));
            grid.text(headRow, FIRST_HELPER + 2 * i + 1, Look.WORKING_HEAD, "its value");
            grid.width(FIRST_HELPER + 2 * i, 14);
            grid.width(FIRST_HELPER + 2 * i + 1, 14);
        }
        grid.text(
                1,
                FACTOR,
                Look.ASIDE,
                "Working columns: what the live values are computed from, step by step; an error value in a step belongs to"
                        + " a branch that this case does not take.");
    }

    private void write(DraftCall call) {
        Outcome outcome = layout.filled().outcome(call.id());
        boolean isText = call.entry().result().isText();
        Unit unit = outcome.unit();
        String format = isText ? NumberFormats.GENERAL : NumberFormats.of(outcome.numbers());
        grid.text(row, LABEL, Look.TEXT, call.label());
        grid.text(row, SYMBOL, Look.CENTRED, call.symbol());
        grid.text(row, UNIT, Look.TEXT, isText ? "" : Layout.unit(unit));
        grid.text(row, FUNCTION, Look.TEXT, call.entry().name());
        grid.text(row, REVISION, Look.CENTRED, Integer.toString(outcome.entry().revision()));
        writeFilled(outcome, format);
        writeNote(call, outcome);
        writeCoherent(call, unit, isText);
        String factor = isText || unit.isCoherent() ? "" : Grid.inRow(row, FACTOR);
        grid.formula(row, LIVE, Look.LIVE, format, Layout.shown(Grid.inRow(row, COHERENT), factor));
        grid.formula(row, CHECK, Look.CHECK, NumberFormats.GENERAL, check(call));
        layout.places().show(call.id(), List.of(grid.address(row, LIVE)));
        layout.places().fill(call.id(), grid.address(row, FILLED));
        layout.places().hold(call.id(), List.of(grid.address(row, COHERENT)));
        row++;
    }

    private void writeFilled(Outcome outcome, String format) {
        if (!outcome.isClean()) {
            grid.text(
                    row,
                    FILLED,
                    Look.FILLED,
                    layout.filled().faults(outcome.id()).get(0).inWords());
        } else if (outcome.values() instanceof Column.Texts texts) {
            grid.text(row, FILLED, Look.FILLED, String.valueOf(texts.values().get(0)));
        } else {
            grid.number(row, FILLED, Look.FILLED, format, outcome.numbers()[0]);
        }
    }

    private void writeNote(DraftCall call, Outcome outcome) {
        String note = "";
        if (!outcome.isClean()) {
            note = layout.filled().faults(call.id()).get(0).whole();
        } else if (!call.entry().cellForm().exists()) {
            note = "filled value only: " + call.entry().cellForm().reason();
        }
        grid.text(row, NOTE, Look.NOTE, note);
    }

    private void writeCoherent(DraftCall call, Unit unit, boolean isText) {
        String name = Cells.name(layout.draft(), call.id());
        layout.book().name(name, grid.address(row, COHERENT));
        grid.text(row, CELL_NAME, Look.WORKING, name);
        if (!isText && !unit.isCoherent()) {
            grid.number(row, FACTOR, Look.WORKING, NumberFormats.GENERAL, unit.scale());
        }
        if (call.entry().cellForm().exists()) {
            writeLive(call);
            return;
        }
        String factor = isText || unit.isCoherent() ? "" : Grid.inRow(row, FACTOR);
        working(COHERENT, Layout.coherent(Grid.inRow(row, FILLED), factor));
    }

    private void writeLive(DraftCall call) {
        List<Operand> operands = call.terms().stream()
                .map(term -> Cells.single(layout.draft(), term))
                .toList();
        int at = row;
        LiveFormula live = LiveFormula.of(call.entry(), operands, i -> Grid.inRow(at, FIRST_HELPER + 2 * i + 1));
        List<CellForm.Helper> helpers = call.entry().cellForm().helpers();
        for (int i = 0; i < helpers.size(); i++) {
            grid.text(row, FIRST_HELPER + 2 * i, Look.WORKING, helpers.get(i).name());
            working(FIRST_HELPER + 2 * i + 1, live.helpers().get(i));
        }
        mostHelpers = Math.max(mostHelpers, helpers.size());
        working(COHERENT, live.result());
    }

    private void working(int column, String formula) {
        grid.formula(row, column, Look.WORKING, NumberFormats.GENERAL, formula);
    }

    private String check(DraftCall call) {
        String live = Grid.inRow(row, LIVE);
        String filled = Grid.inRow(row, FILLED);
        if (!call.entry().cellForm().exists()) {
            return Layout.unlessChanged(Literals.text(Layout.FILLED_ONLY));
        }
        String same = layout.same(call, 0, live, filled);
        return Layout.unlessChanged(
                "IF(" + same + "," + Literals.text(Layout.AGREES) + "," + Literals.text(Layout.DIFFERS) + ")");
    }
}
