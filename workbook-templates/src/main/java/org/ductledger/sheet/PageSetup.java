package org.ductledger.sheet;

import org.apache.poi.ss.usermodel.PageMargin;
import org.apache.poi.ss.usermodel.PrintSetup;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xssf.usermodel.XSSFPrintSetup;
import org.apache.poi.xssf.usermodel.XSSFSheet;

/** How a sheet prints: its paper, one page wide, with file, sheet and page in header and footer. */
public final class PageSetup {
    /** The paper of a workbook. */
    public enum Paper {
        A4(PrintSetup.A4_PAPERSIZE),
        LETTER(PrintSetup.LETTER_PAPERSIZE);

        private final short code;

        Paper(short code) {
            this.code = code;
        }
    }

    private final Paper paper;
    private final String title;

    /** A set-up for the sheets of one workbook, with this title in their headers. */
    public PageSetup(Paper paper, String title) {
        this.paper = paper;
        this.title = title;
    }

    /**
     * Sets a sheet up, as many pages high as it needs.
     *
     * @param area the ranges to print, as in {@code $A$1:$H$40}; each begins a page
     */
    public void apply(Grid grid, boolean landscape, String area) {
        apply(grid, landscape, area, 0);
    }

    /** Sets a sheet up to print on a single page. */
    public void applyToOnePage(Grid grid, boolean landscape, String area) {
        apply(grid, landscape, area, 1);
    }

    private void apply(Grid grid, boolean landscape, String area, int pagesHigh) {
        XSSFSheet sheet = grid.poi();
        sheet.setFitToPage(true);
        XSSFPrintSetup setup = sheet.getPrintSetup();
        setup.setPaperSize(paper.code);
        setup.setLandscape(landscape);
        setup.setFitWidth((short) 1);
        setup.setFitHeight((short) pagesHigh);
        sheet.setHorizontallyCenter(true);
        margins(sheet);
        sheet.getHeader().setLeft("&8" + title);
        sheet.getHeader().setRight("&8&A");
        sheet.getFooter().setLeft("&8&F");
        sheet.getFooter().setRight("&8page &P of &N");
        sheet.getWorkbook().setPrintArea(sheet.getWorkbook().getSheetIndex(sheet), area);
    }

    private static void margins(XSSFSheet sheet) {
        sheet.setMargin(PageMargin.LEFT, 0.5);
        sheet.setMargin(PageMargin.RIGHT, 0.5);
        sheet.setMargin(PageMargin.TOP, 0.75);
        sheet.setMargin(PageMargin.BOTTOM, 0.7);
        sheet.setMargin(PageMargin.HEADER, 0.35);
        sheet.setMargin(PageMargin.FOOTER, 0.35);
    }

    /** Rows, from 0, that every page of a long table repeats. */
    public static void repeat(Grid grid, int firstRow, int lastRow) {
        grid.poi().setRepeatingRows(new CellRangeAddress(firstRow, lastRow, -1, -1));
    }
}
