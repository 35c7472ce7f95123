package org.ductledger.template;

import org.apache.poi.ss.util.CellRangeAddress;
import org.ductledger.record.RecordedArgument.FromCall;
import org.ductledger.sheet.Grid;
import org.ductledger.sheet.LinePlot;
import org.ductledger.sheet.LinePlot.Stroke;
import org.ductledger.sheet.Look;
import org.ductledger.sheet.NumberFormats;
import org.ductledger.template.Table.Jump;
import org.ductledger.template.Table.Plot;

/**
 * Draws the plot of a table. Where its columns may jump, as at a shock, the plotted points are two more than the rows of
 * the table, so that the lines stand upright there; these points are live formulas in working columns.
 */
final class TablePlot {
    private final Layout layout;
    private final Table table;
    private final TableFrame frame;
    private final Plot plot;

    private TablePlot(Layout layout, Table table, TableFrame frame, Plot plot) {
        this.layout = layout;
        this.table = table;
        this.frame = frame;
        this.plot = plot;
    }

    /** The plot, to be drawn once the book's formulas are evaluated. */
    static Runnable of(Layout layout, Table table, TableFrame frame, TableWorking working) {
        Plot plot = table.plot();
        if (plot == null) {
            return () -> {};
        }
        TablePlot maker = new TablePlot(layout, table, frame, plot);
        Jump jump = plot.jump();
        if (jump == null) {
            return () -> maker.lines(maker.rows(plot.along()), maker.rows(plot.left()), maker.rows(plot.right()))
                    .draw();
        }
        CellRangeAddress[] points = maker.points(jump, working);
        CellRangeAddress[] mark = maker.mark(jump, working, points[1]);
        return () -> maker.lines(points[0], points[1], points[2])
                .left(jump.label(), mark[0], mark[1], Stroke.DOTTED)
                .draw();
    }

    private LinePlot lines(CellRangeAddress along, CellRangeAddress left, CellRangeAddress right) {
        double most = call(plot.right()).entry().result().range().upper();
        CellRangeAddress place = new CellRangeAddress(
                TableFrame.FIRST_PLOT_ROW, TableFrame.FIRST_PLOT_ROW + TableFrame.PLOT_ROWS - 1, 0, frame.check());
        return new LinePlot(
                        frame.grid(),
                        place,
                        table.title(),
                        title(plot.along()),
                        title(plot.left()),
                        title(plot.right()))
                .left(call(plot.left()).label(), along, left, Stroke.SOLID)
                .right(call(plot.right()).label(), along, right, Stroke.DASHED)
                .rightUpTo(most);
    }

    private DraftCall call(Term term) {
        String id = ((FromCall) term.origin()).id();
        DraftCall call = layout.draft().calls().get(id);
        if (call == null) {
            throw new IllegalArgumentException("the plot of " + table.sheet() + " shows " + id + ", which is no call");
        }
        return call;
    }

    private String title(Term term) {
        DraftCall call = call(term);
        String unit = layout.filled().outcome(call.id()).unit().symbol();
        return call.label() + " (" + call.symbol() + (unit.equals("1") ? ")" : ", " + unit + ")");
    }

    /** The cells of a column of the live block. */
    private CellRangeAddress rows(Term column) {
        return CellRangeAddress.valueOf(shown(column));
    }

    private String shown(Term term) {
        return layout.places().shown(call(term).id()).get(0);
    }

    /** Columns of points for the abscissa and the two ordinates. */
    private CellRangeAddress[] points(Jump jump, TableWorking working) {
        int before = working.column("plot", "1: before", jump.label());
        String jumpAt = shown(jump.along());
        for (int i = 0; i < frame.rows(); i++) {
            String row = "INDEX(" + shown(plot.along()) + "," + (i + 1) + ")";
            String formula = "IF(ISNUMBER(" + jumpAt + "),IF(" + row + "<" + jumpAt + ",1,0),1)";
            frame.grid().formula(frame.firstRow() + i, before, Look.WORKING, "0", formula);
        }
        int sum = working.column("plot", "rows before", jump.label());
        frame.grid().formula(frame.firstRow(), sum, Look.WORKING, "0", "SUM(" + frame.range(before) + ")");
        String rowsBefore = Grid.fixed(frame.firstRow(), sum);
        return new CellRangeAddress[] {
            points(working, rowsBefore, plot.along(), jump.along(), jump.along()),
            points(working, rowsBefore, plot.left(), jump.leftBefore(), jump.leftAfter()),
            points(working, rowsBefore, plot.right(), jump.rightBefore(), jump.rightAfter())
        };
    }

    private CellRangeAddress points(TableWorking working, String rowsBefore, Term rows, Term before, Term after) {
        int column = working.column("plot", call(rows).symbol(), "points");
        int count = frame.rows() + 2;
        for (int i = 1; i <= count; i++) {
            // Past the jump the rows come two points later; without a jump the last row stands three times.
            String formula = "IF(" + i + "<=" + rowsBefore + ",INDEX(" + shown(rows) + "," + Math.min(i, frame.rows())
                    + "),IF(ISNUMBER(" + shown(before) + "),IF(" + i + "=" + rowsBefore + "+1," + shown(before) + ",IF("
                    + i + "=" + rowsBefore + "+2," + shown(after) + ",INDEX(" + shown(rows) + "," + Math.max(1, i - 2)
                    + "))),INDEX(" + shown(rows) + "," + frame.rows() + ")))";
            frame.grid().formula(frame.firstRow() + i - 1, column, Look.WORKING, NumberFormats.GENERAL, formula);
        }
        return new CellRangeAddress(frame.firstRow(), frame.firstRow() + count - 1, column, column);
    }

    /** A line from the foot of the plot to a little above the highest point of the left ordinate, where the jump stands. */
    private CellRangeAddress[] mark(Jump jump, TableWorking working, CellRangeAddress left) {
        int along = working.column("plot", jump.label(), "#N/A: none");
        int height = working.column("plot", "height", "#N/A: none");
        String top = "1.1*MAX(" + left.formatAsString() + ")";
        for (int i = 0; i < 2; i++) {
            int row = frame.firstRow() + i;
            String jumpAt = shown(jump.along());
            frame.grid().formula(row, along, Look.WORKING, NumberFormats.GENERAL, where(jumpAt, jumpAt));
            frame.grid().formula(row, height, Look.WORKING, NumberFormats.GENERAL, where(jumpAt, i == 0 ? "0" : top));
        }
        int last = frame.firstRow() + 1;
        return new CellRangeAddress[] {
            new CellRangeAddress(frame.firstRow(), last, along, along),
            new CellRangeAddress(frame.firstRow(), last, height, height)
        };
    }

    private static String where(String jumpAt, String value) {
        return "IF(ISNUMBER(" + jumpAt + ")," + value + ",NA())";
    }
}
