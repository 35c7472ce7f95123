package org.ductledger.sheet;

import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xddf.usermodel.PresetLineDash;
import org.apache.poi.xddf.usermodel.XDDFColor;
import org.apache.poi.xddf.usermodel.XDDFLineProperties;
import org.apache.poi.xddf.usermodel.XDDFPresetLineDash;
import org.apache.poi.xddf.usermodel.XDDFShapeProperties;
import org.apache.poi.xddf.usermodel.XDDFSolidFillProperties;
import org.apache.poi.xddf.usermodel.chart.AxisCrosses;
import org.apache.poi.xddf.usermodel.chart.AxisPosition;
import org.apache.poi.xddf.usermodel.chart.AxisTickLabelPosition;
import org.apache.poi.xddf.usermodel.chart.ChartTypes;
import org.apache.poi.xddf.usermodel.chart.DisplayBlanks;
import org.apache.poi.xddf.usermodel.chart.LegendPosition;
import org.apache.poi.xddf.usermodel.chart.MarkerStyle;
import org.apache.poi.xddf.usermodel.chart.ScatterStyle;
import org.apache.poi.xddf.usermodel.chart.XDDFChartData;
import org.apache.poi.xddf.usermodel.chart.XDDFDataSourcesFactory;
import org.apache.poi.xddf.usermodel.chart.XDDFScatterChartData;
import org.apache.poi.xddf.usermodel.chart.XDDFValueAxis;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFChart;
import org.apache.poi.xssf.usermodel.XSSFClientAnchor;
import org.apache.poi.xssf.usermodel.XSSFDrawing;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.jspecify.annotations.Nullable;

/**
 * A plot of lines over one abscissa, with an ordinate on each side. It is drawn after the sheet's formulas are evaluated,
 * since a chart keeps a copy of the values that it shows.
 */
public final class LinePlot {
    private static final double LINE_POINTS = 2;
    private static final double GRID_POINTS = 0.5;

    private final XSSFSheet sheet;
    private final XSSFChart chart;
    private final XDDFScatterChartData left;
    private final XDDFScatterChartData right;

    /** How a line is told from the others, by more than its colour. */
    public enum Stroke {
        SOLID(Palette.DUCT, PresetLineDash.SOLID),
        DASHED(Palette.BRICK, PresetLineDash.DASH),
        DOTTED(Palette.PLUM, PresetLineDash.SYSTEM_DOT);

        private final Palette color;
        private final PresetLineDash dash;

        Stroke(Palette color, PresetLineDash dash) {
            this.color = color;
            this.dash = dash;
        }
    }

    /**
     * An empty plot over the cells from one corner to the other.
     *
     * @param along the abscissa's title
     * @param leftTitle the left ordinate's title, which begins at 0
     * @param rightTitle the right ordinate's title, which begins at 0
     */
    public LinePlot(
            Grid grid, CellRangeAddress place, String title, String along, String leftTitle, String rightTitle) {
        sheet = grid.poi();
        XSSFDrawing drawing = sheet.createDrawingPatriarch();
        XSSFClientAnchor anchor = drawing.createAnchor(
                0,
                0,
                0,
                0,
                place.getFirstColumn(),
                place.getFirstRow(),
                place.getLastColumn() + 1,
                place.getLastRow() + 1);
        chart = drawing.createChart(anchor);
        chart.setTitleText(title);
        chart.setTitleOverlay(false);
        chart.displayBlanksAs(DisplayBlanks.GAP);
        chart.getOrAddLegend().setPosition(LegendPosition.BOTTOM);
        left = data(axis(AxisPosition.BOTTOM, along), axis(AxisPosition.LEFT, leftTitle));
        XDDFValueAxis hidden = axis(AxisPosition.BOTTOM, "");
        hidden.setVisible(false);
        XDDFValueAxis opposite = axis(AxisPosition.RIGHT, rightTitle);
        opposite.setCrosses(AxisCrosses.MAX);
        right = data(hidden, opposite);
    }

    private XDDFValueAxis axis(AxisPosition position, String title) {
        XDDFValueAxis axis = chart.createValueAxis(position);
        if (!title.isEmpty()) {
            axis.setTitle(title);
        }
        axis.setCrosses(AxisCrosses.MIN);
        axis.setTickLabelPosition(AxisTickLabelPosition.LOW);
        axis.setNumberFormat("General");
        axis.getOrAddShapeProperties().setLineProperties(line(Palette.QUIET, GRID_POINTS, PresetLineDash.SOLID));
        return axis;
    }

    private XDDFScatterChartData data(XDDFValueAxis along, XDDFValueAxis ordinate) {
        ordinate.setMinimum(0);
        along.crossAxis(ordinate);
        ordinate.crossAxis(along);
        if (ordinate.getPosition() == AxisPosition.LEFT) {
            XDDFLineProperties rule = line(Palette.RULE, GRID_POINTS, PresetLineDash.SYSTEM_DOT);
            along.getOrAddMajorGridProperties().setLineProperties(rule);
            ordinate.getOrAddMajorGridProperties().setLineProperties(rule);
        } else {
            ordinate.setTickLabelPosition(AxisTickLabelPosition.HIGH);
        }
        XDDFScatterChartData data = (XDDFScatterChartData) chart.createData(ChartTypes.SCATTER, along, ordinate);
        data.setStyle(ScatterStyle.LINE_MARKER);
        data.setVaryColors(false);
        return data;
    }

    /** A line against the left ordinate. */
    public LinePlot left(String name, CellRangeAddress along, CellRangeAddress values, Stroke stroke) {
        add(left, name, along, values, stroke);
        return this;
    }

    /** A line against the right ordinate. */
    public LinePlot right(String name, CellRangeAddress along, CellRangeAddress values, Stroke stroke) {
        add(right, name, along, values, stroke);
        return this;
    }

    /** Ends the right ordinate at the greatest value that its quantity can have; infinity leaves the end open. */
    public LinePlot rightUpTo(double greatest) {
        if (!Double.isInfinite(greatest)) {
            right.getValueAxes().forEach(axis -> end(axis, greatest));
        }
        return this;
    }

    private static void end(XDDFValueAxis axis, double greatest) {
        if (axis.getPosition() == AxisPosition.RIGHT) {
            axis.setMaximum(greatest);
        }
    }

    private void add(
            XDDFScatterChartData data, String name, CellRangeAddress along, CellRangeAddress values, Stroke stroke) {
        XDDFChartData.Series series = data.addSeries(
                XDDFDataSourcesFactory.fromArray(cached(along), chart.formatRange(along)),
                XDDFDataSourcesFactory.fromArray(cached(values), chart.formatRange(values)));
        XDDFScatterChartData.Series scatter = (XDDFScatterChartData.Series) series;
        scatter.setTitle(name, null);
        scatter.setSmooth(false);
        scatter.setMarkerStyle(MarkerStyle.NONE);
        scatter.setLineProperties(line(stroke.color, LINE_POINTS, stroke.dash));
    }

    /** The values that the evaluated cells of a column hold; null for one that holds no number. */
    private @Nullable Double[] cached(CellRangeAddress range) {
        @Nullable Double[] values = new Double[range.getNumberOfCells()];
        for (int i = 0; i < values.length; i++) {
            XSSFCell cell = sheet.getRow(range.getFirstRow() + i).getCell(range.getFirstColumn());
            boolean isFormula = cell.getCellType() == CellType.FORMULA;
            CellType type = isFormula ? cell.getCachedFormulaResultType() : cell.getCellType();
            values[i] = type == CellType.NUMERIC ? cell.getNumericCellValue() : null;
        }
        return values;
    }

    private static XDDFLineProperties line(Palette color, double points, PresetLineDash dash) {
        XDDFLineProperties line = new XDDFLineProperties(new XDDFSolidFillProperties(XDDFColor.from(color.rgb())));
        line.setWidth(points);
        line.setPresetDash(new XDDFPresetLineDash(dash));
        return line;
    }

    /** Takes the values into the chart, and sets its letters. */
    public void draw() {
        chart.plot(left);
        chart.plot(right);
        // The library numbers the series of each side from 0; a chart wants each number once.
        for (int i = 0; i < right.getSeriesCount(); i++) {
            long number = (long) left.getSeriesCount() + i;
            XDDFScatterChartData.Series series = (XDDFScatterChartData.Series) right.getSeries(i);
            series.getCTScatterSer().getIdx().setVal(number);
            series.getCTScatterSer().getOrder().setVal(number);
        }
        XDDFShapeProperties paper = chart.getOrAddShapeProperties();
        paper.setFillProperties(new XDDFSolidFillProperties(XDDFColor.from(Palette.PAPER.rgb())));
        paper.setLineProperties(line(Palette.RULE, GRID_POINTS, PresetLineDash.SOLID));
        ChartLetters.set(chart);
    }
}
