package org.ductledger.template;

import org.ductledger.catalogue.Unit;
import org.ductledger.record.RecordWriter;
import org.ductledger.sheet.Book;
import org.ductledger.sheet.Grid;
import org.ductledger.sheet.Literals;
import org.ductledger.sheet.Look;
import org.ductledger.sheet.NumberFormats;
import org.ductledger.sheet.PageSetup;

/** What the sheets of one workbook share while they are written. */
record Layout(Template template, Filled filled, Book book, PageSetup page, Places places) {
    /** The cell whose number counts the inputs that differ from those of the fill. */
    static final String INPUTS_CHANGED = RecordWriter.INPUTS_CHANGED;

    static final String CHANGED = "inputs changed since the fill";
    static final String AGREES = "agrees";
    static final String DIFFERS = "differs";
    static final String FILLED_ONLY = "filled value only";
    static final String TOLERANCE = "check_tolerance";

    Draft draft() {
        return filled.draft();
    }

    /** How many single values are live. */
    int liveValues() {
        return draft().calls().values().stream()
                .filter(call -> call.entry().cellForm().exists())
                .mapToInt(call -> filled().outcome(call.id()).values().rows())
                .sum();
    }

    /** A title, and under it a line that says whether the filled values belong to the inputs as they are now. */
    static void head(Grid grid, String title, int lastColumn) {
        grid.text(0, 0, Look.TITLE, title);
        grid.height(0, 24);
        grid.across(1, 0, lastColumn, Look.STRONG, "");
        grid.formula(
                1,
                0,
                Look.STRONG,
                NumberFormats.GENERAL,
                "IF(" + INPUTS_CHANGED
                        + ">0,\"INPUTS CHANGED since the fill: the filled values belong to the inputs kept"
                        + " on the Ledger sheet; live values follow the inputs as they are now.\","
                        + "\"The inputs are those of the fill.\")");
    }

    /** A unit as cells show it: a pure number has a dash. */
    static String unit(Unit unit) {
        return unit.isOne() ? "-" : unit.symbol();
    }

    /** A check's formula, in the place of which changed inputs have their own words. */
    static String unlessChanged(String formula) {
        return "IF(" + INPUTS_CHANGED + ">0," + Literals.text(CHANGED) + "," + formula + ")";
    }

    /** The formula of a cell that shows a coherent value in its unit, or the words that stand in its place. */
    static String shown(String coherentCell, String factorCell) {
        return factorCell.isEmpty()
                ? coherentCell
                : "IF(ISNUMBER(" + coherentCell + ")," + coherentCell + "/" + factorCell + "," + coherentCell + ")";
    }

    /** The formula of a cell that holds a filled value in its coherent unit, or words. */
    static String coherent(String filledCell, String factorCell) {
        return factorCell.isEmpty()
                ? filledCell
                : "IF(ISNUMBER(" + filledCell + ")," + filledCell + "*" + factorCell + "," + filledCell + ")";
    }

    /**
     * The condition that a live and a filled cell say the same: numbers within the tolerance, the same word, or no value
     * in either.
     *
     * @param row the row of the call, from 0
     */
    String same(DraftCall call, int row, String live, String filled) {
        boolean faulty = filled().faults(call.id()).stream().anyMatch(fault -> fault.row() == row);
        if (call.entry().result().isText()) {
            return faulty ? live + "=" + Literals.text(LiveFormula.NO_VALUE) : "EXACT(" + live + "," + filled + ")";
        }
        return "IF(AND(ISNUMBER(" + live + "),ISNUMBER(" + filled + ")),ABS(" + live + "-" + filled + ")<=" + TOLERANCE
                + "*ABS(" + filled + "),AND(ISTEXT(" + live + "),ISTEXT(" + filled + ")))";
    }
}
