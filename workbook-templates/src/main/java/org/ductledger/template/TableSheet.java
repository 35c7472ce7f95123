package org.ductledger.template;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.apache.poi.ss.util.CellRangeAddress;
import org.ductledger.catalogue.Unit;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Outcome;
import org.ductledger.record.RecordedCall.RecordedFault;
import org.ductledger.sheet.Alerts;
import org.ductledger.sheet.Grid;
import org.ductledger.sheet.Literals;
import org.ductledger.sheet.Look;
import org.ductledger.sheet.NumberFormats;
import org.ductledger.sheet.PageSetup;
import org.ductledger.template.Table.CalledColumn;
import org.ductledger.template.Table.FixedColumn;
import org.ductledger.template.Table.TableColumn;

/** The sheet of a table: its plot, its live block with a check for each row, its filled block, its working columns. */
final class TableSheet {
    private static final int NUMBER_WIDTH = 5;
    private static final int VALUE_WIDTH = 13;
    private static final int CHECK_WIDTH = 14;
    private static final int GAP_WIDTH = 3;

    private final Layout layout;
    private final Table table;
    private final TableFrame frame;
    private final Grid grid;
    private final TableWorking working;
    private final List<Integer> differences = new ArrayList<>();

    private TableSheet(Layout layout, Table table, Grid grid) {
        this.layout = layout;
        this.table = table;
        this.grid = grid;
        int headRow = TableFrame.FIRST_PLOT_ROW + (table.plot() == null ? 1 : TableFrame.PLOT_ROWS + 1);
        int filled = (int)
                table.columns().stream().filter(CalledColumn.class::isInstance).count();
        this.frame = new TableFrame(grid, headRow, table.rows(), table.columns().size(), filled);
        this.working = new TableWorking(layout, frame);
    }

    /** Writes the sheet, and gives the plot, to be drawn once the book's formulas are evaluated. */
    static Runnable write(Layout layout, Table table, Grid grid) {
        TableSheet sheet = new TableSheet(layout, table, grid);
        sheet.write();
        return TablePlot.of(layout, table, sheet.frame, sheet.working);
    }

    /** Where the differences of a table stand among the places. */
    static String differences(Table table) {
        return table.sheet() + "_differences";
    }

    private void write() {
        Layout.head(grid, table.title(), frame.check());
        for (int column = 0; column < frame.firstWorking(); column++) {
            grid.width(column, VALUE_WIDTH);
        }
        numbers(TableFrame.NUMBER);
        numbers(frame.filledNumber());
        int live = TableFrame.FIRST_LIVE;
        int filled = frame.firstFilled();
        for (TableColumn column : table.columns()) {
            if (column instanceof FixedColumn constants) {
                write(constants, live++);
            } else {
                write(((CalledColumn) column).call(), live++, filled++);
            }
        }
        writeChecks();
        int last = writeFaults();
        Alerts.quietErrors(
                grid,
                new CellRangeAddress(frame.firstRow(), frame.lastRow(), frame.firstWorking(), working.lastColumn()));
        grid.poi().createFreezePane(TableFrame.FIRST_LIVE, frame.firstRow());
        print(last);
    }

    private void print(int last) {
        PageSetup.repeat(grid, frame.headRow(), frame.headRow() + 2);
        String plot = table.plot() == null ? "" : area(0, frame.headRow() - 2, 0, frame.check()) + ",";
        String live = area(table.plot() == null ? 0 : frame.headRow(), last, 0, frame.check());
        String filled = area(frame.headRow(), frame.lastRow(), frame.filledNumber(), frame.lastFilled() + 1);
        layout.page().apply(grid, true, plot + live + "," + filled);
    }

    private static String area(int firstRow, int lastRow, int firstColumn, int lastColumn) {
        return Grid.fixed(firstRow, firstColumn) + ":" + Grid.fixed(lastRow, lastColumn);
    }

    private void head(int column, String label, String symbol, String unit) {
        grid.text(frame.headRow(), column, Look.COLUMN_HEAD, label);
        grid.text(frame.headRow() + 1, column, Look.COLUMN_HEAD, symbol);
        grid.text(frame.headRow() + 2, column, Look.COLUMN_HEAD, unit);
    }

    private void numbers(int column) {
        grid.width(column, NUMBER_WIDTH);
        head(column, "No.", "", "");
        for (int i = 0; i < frame.rows(); i++) {
            grid.number(frame.firstRow() + i, column, Look.CENTRED, "0", i + 1.0);
        }
    }

    private void write(FixedColumn constants, int column) {
        head(column, constants.label(), "", "");
        Column values = layout.draft().constants().get(constants.name());
        for (int i = 0; i < frame.rows(); i++) {
            if (values instanceof Column.Numbers numbers) {
                grid.number(frame.firstRow() + i, column, Look.CENTRED, NumberFormats.GENERAL, numbers.values()[i]);
            } else if (values instanceof Column.Texts texts) {
                grid.text(
                        frame.firstRow() + i,
                        column,
                        Look.CENTRED,
                        String.valueOf(texts.values().get(i)));
            }
        }
        working.constants(constants.name(), column);
        layout.places().show(constants.name(), List.of(frame.range(column)));
    }

    private void write(DraftCall call, int live, int filled) {
        Outcome outcome = layout.filled().outcome(call.id());
        Unit unit = outcome.unit();
        boolean isText = call.entry().result().isText();
        String format = isText ? NumberFormats.GENERAL : NumberFormats.of(outcome.numbers());
        head(live, call.label(), call.symbol(), isText ? "" : Layout.unit(unit));
        head(filled, call.label() + ", filled", call.symbol(), isText ? "" : Layout.unit(unit));
        writeFilled(outcome, filled, format);
        String factor = isText || unit.isCoherent() ? "" : working.factor(call.id(), unit);
        int coherent = call.entry().cellForm().exists() ? working.live(call) : working.filled(call, filled, factor);
        for (int row = frame.firstRow(); row <= frame.lastRow(); row++) {
            grid.formula(row, live, Look.LIVE, format, Layout.shown(Grid.inRow(row, coherent), factor));
        }
        differences.add(working.differences(call, live, filled));
        layout.places().show(call.id(), List.of(frame.range(live)));
        layout.places().fill(call.id(), frame.range(filled));
        layout.places().hold(call.id(), List.of(frame.range(coherent)));
    }

    private void writeFilled(Outcome outcome, int column, String format) {
        for (int i = 0; i < frame.rows(); i++) {
            if (outcome.values() instanceof Column.Texts texts) {
                grid.text(
                        frame.firstRow() + i,
                        column,
                        Look.FILLED,
                        String.valueOf(texts.values().get(i)));
            } else if (!Double.isNaN(outcome.numbers()[i])) {
                grid.number(frame.firstRow() + i, column, Look.FILLED, format, outcome.numbers()[i]);
            }
        }
        for (RecordedFault fault : layout.filled().faults(outcome.id())) {
            grid.text(frame.firstRow() + fault.row(), column, Look.FILLED, fault.inWords());
        }
    }

    private void writeChecks() {
        head(frame.check(), "Check", "live = filled", "");
        grid.width(frame.check(), CHECK_WIDTH);
        grid.width(frame.check() + 1, GAP_WIDTH);
        grid.width(frame.lastFilled() + 1, GAP_WIDTH);
        for (int row = frame.firstRow(); row <= frame.lastRow(); row++) {
            int at = row;
            String sum = String.join(
                    "+",
                    differences.stream().map(column -> Grid.inRow(at, column)).toList());
            grid.formula(
                    row,
                    frame.check(),
                    Look.CHECK,
                    NumberFormats.GENERAL,
                    Layout.unlessChanged("IF(" + sum + "=0," + Literals.text(Layout.AGREES) + ","
                            + Literals.text(Layout.DIFFERS) + ")"));
        }
        Alerts.unless(
                grid,
                new CellRangeAddress(frame.firstRow(), frame.lastRow(), frame.check(), frame.check()),
                Layout.AGREES);
        layout.places()
                .show(differences(table), differences.stream().map(frame::range).toList());
    }

    /** Writes under the table why rows have no value, each reason once; says which row is the last. */
    private int writeFaults() {
        Set<String> reasons = new LinkedHashSet<>();
        for (TableColumn column : table.columns()) {
            if (column instanceof CalledColumn called) {
                layout.filled()
                        .faults(called.name())
                        .forEach(fault -> reasons.add(called.label() + ": " + fault.whole()));
            }
        }
        int row = frame.lastRow();
        for (String reason : reasons) {
            row++;
            grid.across(row, 0, frame.check(), Look.NOTE, reason);
        }
        return row;
    }
}
