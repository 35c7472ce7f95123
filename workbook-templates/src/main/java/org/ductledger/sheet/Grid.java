package org.ductledger.sheet;

import java.util.HashMap;
import java.util.Map;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.ss.util.CellReference;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFRow;
import org.apache.poi.xssf.usermodel.XSSFSheet;

/** A sheet in the making. Rows and columns count from 0 here; addresses are absolute and carry the sheet's name. */
public final class Grid {
    private static final int POINTS_PER_LINE = 12;

    private static final int UNITS_PER_CHARACTER = 256;
    private static final int DEFAULT_WIDTH = 8;

    private final XSSFSheet sheet;
    private final Styles styles;
    /** In characters; the library looks each up in a list. */
    private final Map<Integer, Integer> widths = new HashMap<>();

    Grid(XSSFSheet sheet, Styles styles) {
        this.sheet = sheet;
        this.styles = styles;
        sheet.setDisplayGridlines(false);
        sheet.setDefaultRowHeightInPoints(POINTS_PER_LINE + 1.5f);
    }

    public XSSFSheet poi() {
        return sheet;
    }

    public String name() {
        return sheet.getSheetName();
    }

    /** The widths of the first columns, in characters. */
    public Grid widths(int... characters) {
        for (int i = 0; i < characters.length; i++) {
            width(i, characters[i]);
        }
        return this;
    }

    public void width(int column, int characters) {
        widths.put(column, characters);
        sheet.setColumnWidth(column, characters * UNITS_PER_CHARACTER);
    }

    /** A text; where its look wraps, the row is made high enough for it. */
    public void text(int row, int column, Look look, String text) {
        cell(row, column, look, NumberFormats.GENERAL).setCellValue(text);
        fit(row, column, column, look, text);
    }

    public void number(int row, int column, Look look, String format, double value) {
        cell(row, column, look, format).setCellValue(value);
    }

    /** A formula, without a leading equals sign. */
    public void formula(int row, int column, Look look, String format, String formula) {
        cell(row, column, look, format).setCellFormula(formula);
    }

    private XSSFCell cell(int row, int column, Look look, String format) {
        XSSFCell cell = row(row).createCell(column);
        cell.setCellStyle(styles.of(look, format));
        return cell;
    }

    /** The heads of columns, from one column on. */
    public void heads(int row, int firstColumn, Look look, String... heads) {
        for (int i = 0; i < heads.length; i++) {
            text(row, firstColumn + i, look, heads[i]);
        }
    }

    /** A text over several columns, in as many lines as it needs by the widths of the columns. */
    public void across(int row, int first, int last, Look look, String text) {
        cell(row, first, look, NumberFormats.GENERAL).setCellValue(text);
        for (int column = first + 1; column <= last; column++) {
            cell(row, column, look, NumberFormats.GENERAL);
        }
        if (last > first) {
            sheet.addMergedRegion(new CellRangeAddress(row, row, first, last));
        }
        fit(row, first, last, look, text);
    }

    /** Makes a row high enough for a text between two columns; never lower than it is. */
    private void fit(int row, int first, int last, Look look, String text) {
        if (!look.wraps || text.isEmpty()) {
            return;
        }
        int width = 0;
        for (int column = first; column <= last; column++) {
            width += widths.getOrDefault(column, DEFAULT_WIDTH);
        }
        float height = Lines.needed(text, width, look.font.points) * POINTS_PER_LINE + 1.5f;
        XSSFRow made = row(row);
        made.setHeightInPoints(Math.max(made.getHeightInPoints(), height));
    }

    public void height(int row, float points) {
        row(row).setHeightInPoints(points);
    }

    private XSSFRow row(int row) {
        XSSFRow made = sheet.getRow(row);
        return made == null ? sheet.createRow(row) : made;
    }

    /** The address as in {@code Inputs!$F$6}. */
    public String address(int row, int column) {
        return new CellReference(name(), row, column, true, true).formatAsString();
    }

    /** The address of a stretch of one column as in {@code Stations!$F$6:$F$54}. */
    public String range(int firstRow, int lastRow, int column) {
        return address(firstRow, column) + ":" + new CellReference(lastRow, column, true, true).formatAsString();
    }

    /** The address within this sheet, fixed: {@code $F$6}. */
    public static String fixed(int row, int column) {
        return new CellReference(row, column, true, true).formatAsString();
    }

    /** The address within this sheet, with a fixed column and a row that moves: {@code $F6}. */
    public static String inRow(int row, int column) {
        return new CellReference(row, column, false, true).formatAsString();
    }
}
