package org.ductledger.sheet;

import java.util.HashMap;
import java.util.Map;
import org.apache.poi.ss.usermodel.FillPatternType;
import org.apache.poi.ss.usermodel.HorizontalAlignment;
import org.apache.poi.ss.usermodel.VerticalAlignment;
import org.apache.poi.xssf.usermodel.XSSFCellStyle;
import org.apache.poi.xssf.usermodel.XSSFFont;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** The cell styles of one workbook, each made once. */
final class Styles {
    private static final String FACE = "Arial";

    private final XSSFWorkbook book;
    private final Map<String, XSSFCellStyle> made = new HashMap<>();
    private final Map<String, XSSFFont> fonts = new HashMap<>();

    Styles(XSSFWorkbook book) {
        this.book = book;
        XSSFFont body = book.getFontAt(0);
        body.setFontName(FACE);
        body.setFontHeightInPoints(Look.Font.PLAIN.points);
    }

    /** The style of a look with a number format. */
    XSSFCellStyle of(Look look, String format) {
        XSSFCellStyle style = made.get(look + format);
        if (style == null) {
            style = make(look, format);
            made.put(look + format, style);
        }
        return style;
    }

    private XSSFCellStyle make(Look look, String format) {
        XSSFCellStyle style = book.createCellStyle();
        style.setFont(font(look));
        style.setAlignment(look.align);
        style.setVerticalAlignment(VerticalAlignment.CENTER);
        if (look.align != HorizontalAlignment.CENTER && look != Look.TITLE) {
            style.setIndention((short) 1);
        }
        style.setWrapText(look.wraps);
        style.setLocked(!look.isUnlocked());
        style.setDataFormat(book.createDataFormat().getFormat(format));
        if (look.fill != Palette.PAPER) {
            style.setFillPattern(FillPatternType.SOLID_FOREGROUND);
            style.setFillForegroundColor(look.fill.color());
        }
        edge(style, look.edge);
        return style;
    }

    private static void edge(XSSFCellStyle style, Look.Edge edge) {
        style.setBorderTop(edge.top);
        style.setBorderBottom(edge.bottom);
        style.setBorderLeft(edge.sides);
        style.setBorderRight(edge.sides);
        style.setTopBorderColor(Palette.RULE.color());
        style.setBottomBorderColor(Palette.RULE.color());
        style.setLeftBorderColor(Palette.RULE.color());
        style.setRightBorderColor(Palette.RULE.color());
    }

    private XSSFFont font(Look look) {
        return fonts.computeIfAbsent(look.font + "" + look.ink, key -> {
            XSSFFont font = book.createFont();
            font.setFontName(FACE);
            font.setFontHeightInPoints(look.font.points);
            font.setBold(look.font.bold);
            font.setItalic(look.font.italic);
            font.setColor(look.ink.color());
            return font;
        });
    }
}
