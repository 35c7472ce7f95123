package org.ductledger.template;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.ductledger.catalogue.Unit;
import org.ductledger.record.RecordedArgument.FromCall;
import org.ductledger.record.RecordedArgument.FromQuantity;
import org.ductledger.record.RecordedArgument.FromRows;
import org.ductledger.record.RecordedArgument.Origin;
import org.ductledger.sheet.Grid;
import org.ductledger.sheet.Look;
import org.ductledger.sheet.NumberFormats;
import org.ductledger.template.LiveFormula.Operand;

/**
 * The working columns of a table: the inputs that each row takes, the helper cells of each column's live formula, its
 * value in coherent units, and whether it differs from the filled one.
 */
final class TableWorking {
    private static final int WIDTH = 14;
    private static final int NONE = -1;

    private final Layout layout;
    private final TableFrame frame;
    private final Grid grid;
    private final Map<Origin, Integer> taken = new HashMap<>();
    private int next;

    TableWorking(Layout layout, TableFrame frame) {
        this.layout = layout;
        this.frame = frame;
        this.grid = frame.grid();
        this.next = frame.firstWorking();
        grid.text(
                frame.headRow() - 1,
                frame.firstWorking() - 1,
                Look.ASIDE,
                "Working columns: what the live values are computed from, step by step; an error value in a step belongs"
                        + " to a branch that this case does not take.");
    }

    /** A column of constants that the live block shows. */
    void constants(String name, int column) {
        taken.put(new FromQuantity(name), column);
    }

    /** A new column with its head. */
    int column(String label, String symbol, String unit) {
        int column = next++;
        grid.width(column, WIDTH);
        grid.text(frame.headRow(), column, Look.WORKING_HEAD, label);
        grid.text(frame.headRow() + 1, column, Look.WORKING_HEAD, symbol);
        grid.text(frame.headRow() + 2, column, Look.WORKING_HEAD, unit);
        return column;
    }

    /** The last working column so far. */
    int lastColumn() {
        return next - 1;
    }

    /** Writes the live formulas of a column, in coherent units, and says in which column their results stand. */
    int live(DraftCall call) {
        List<Integer> columns = columnsOf(call);
        int firstHelper = next;
        call.entry().cellForm().helpers().forEach(helper -> column(call.id(), helper.name(), ""));
        Unit unit = call.entry().result().unit();
        int result = column(call.id(), "live, SI", call.entry().result().isText() ? "" : Layout.unit(unit));
        for (int row = frame.firstRow(); row <= frame.lastRow(); row++) {
            int at = row;
            LiveFormula live =
                    LiveFormula.of(call.entry(), operands(call, columns, row), i -> Grid.inRow(at, firstHelper + i));
            for (int i = 0; i < live.helpers().size(); i++) {
                working(row, firstHelper + i, live.helpers().get(i));
            }
            working(row, result, live.result());
        }
        taken.put(new FromCall(call.id()), result);
        return result;
    }

    /** Writes the filled values in coherent units in the place of live ones, for a function that has no cell form. */
    int filled(DraftCall call, int filled, String factor) {
        int result = column(
                call.id(), "filled, SI", Layout.unit(call.entry().result().unit()));
        for (int row = frame.firstRow(); row <= frame.lastRow(); row++) {
            working(row, result, Layout.coherent(Grid.inRow(row, filled), factor));
        }
        taken.put(new FromCall(call.id()), result);
        return result;
    }

    private void working(int row, int column, String formula) {
        grid.formula(row, column, Look.WORKING, NumberFormats.GENERAL, formula);
    }

    private List<Integer> columnsOf(DraftCall call) {
        List<Integer> columns = new ArrayList<>();
        for (int i = 0; i < call.terms().size(); i++) {
            int column = columnOf(call.terms().get(i).origin());
            columns.add(column);
            if (column != NONE) {
                layout.places().argument(call.id(), i, frame.range(column));
            }
        }
        return columns;
    }

    /** The column of this sheet that holds an origin's values, or none if it is the same in every row. */
    private int columnOf(Origin origin) {
        Integer column = taken.get(origin);
        if (column != null) {
            return column;
        }
        if (origin instanceof FromRows from && from.rows().size() > 1) {
            int picked = pick(from);
            taken.put(origin, picked);
            return picked;
        }
        return NONE;
    }

    /** A column of cells that look up single inputs and constants. */
    private int pick(FromRows from) {
        if (from.rows().size() != frame.rows()) {
            throw new IllegalArgumentException("a column of " + from.rows().size()
                    + " single values stands in a table of " + frame.rows() + " rows");
        }
        int column = column("inputs", "of the row, SI", "");
        for (int i = 0; i < frame.rows(); i++) {
            Operand single = Cells.single(layout.draft(), from.rows().get(i));
            working(frame.firstRow() + i, column, single.text());
        }
        return column;
    }

    private List<Operand> operands(DraftCall call, List<Integer> columns, int row) {
        List<Operand> operands = new ArrayList<>();
        for (int i = 0; i < columns.size(); i++) {
            operands.add(
                    columns.get(i) == NONE
                            ? Cells.single(layout.draft(), call.terms().get(i))
                            : new Operand(Grid.inRow(row, columns.get(i)), true));
        }
        return operands;
    }

    /** Writes 1 where live and filled values differ, 0 where they agree, and says in which column. */
    int differences(DraftCall call, int live, int filled) {
        int column = column(call.id(), "differs", "0 or 1");
        for (int row = frame.firstRow(); row <= frame.lastRow(); row++) {
            String same = layout.same(call, row - frame.firstRow(), Grid.inRow(row, live), Grid.inRow(row, filled));
            grid.formula(row, column, Look.WORKING, "0", "IF(" + same + ",0,1)");
        }
        return column;
    }

    /** A column whose first cell holds a unit's factor to the coherent unit. */
    String factor(String label, Unit unit) {
        int column = column(label, "factor to SI", unit.symbol());
        grid.number(frame.firstRow(), column, Look.WORKING, NumberFormats.GENERAL, unit.scale());
        return Grid.fixed(frame.firstRow(), column);
    }
}
