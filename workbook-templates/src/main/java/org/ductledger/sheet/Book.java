package org.ductledger.sheet;

import java.util.HashMap;
import java.util.Map;
import java.util.Set;
import java.util.regex.Pattern;
import org.apache.poi.ss.usermodel.Name;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** A workbook in the making. */
public final class Book {
    /** What reads as a cell: one to three letters and a row that is not 0; or R and C of the other notation. */
    private static final Pattern READS_AS_A_CELL =
            Pattern.compile("(?i)[a-z]{1,3}0*[1-9][0-9]*|r[0-9]*|c[0-9]*|r[0-9]*c[0-9]*");

    private static final Pattern WORD = Pattern.compile("[a-z][a-z0-9_]*");
    private static final Set<String> TRUTH = Set.of("true", "false");
    private static final int LONGEST_NAME = 255;

    private final XSSFWorkbook book = new XSSFWorkbook();
    private final Styles styles = new Styles(book);
    private final Map<String, Grid> sheets = new HashMap<>();

    /** An empty workbook. */
    public Book() {
        // Each formula is parsed when it is evaluated, which is soon enough to refuse it.
        book.setCellFormulaValidation(false);
    }

    public XSSFWorkbook poi() {
        return book;
    }

    /** The sheet of that name; a new one stands at the end. */
    public Grid sheet(String name) {
        return sheets.computeIfAbsent(name, key -> new Grid(book.createSheet(key), styles));
    }

    /** Whether every spreadsheet takes this as the name of a cell. */
    public static boolean isLegalName(String name) {
        return WORD.matcher(name).matches()
                && name.length() <= LONGEST_NAME
                && !READS_AS_A_CELL.matcher(name).matches()
                && !TRUTH.contains(name);
    }

    /**
     * Names a cell or a range, for the whole workbook.
     *
     * @param cells absolute and with the sheet, as in {@code Inputs!$F$6}
     * @throws IllegalArgumentException if the name is not legal everywhere, or is that of other cells
     */
    public void name(String name, String cells) {
        if (!isLegalName(name)) {
            throw new IllegalArgumentException(name + " is no legal name of a cell");
        }
        Name taken = book.getName(name);
        if (taken != null) {
            if (!taken.getRefersToFormula().equals(cells)) {
                throw new IllegalArgumentException(name + " is the name of " + taken.getRefersToFormula());
            }
            return;
        }
        Name made = book.createName();
        made.setNameName(name);
        made.setRefersToFormula(cells);
    }

    /** Locks every sheet, without a password: only cells of an unlocked look can be changed. */
    public void lock() {
        for (int i = 0; i < book.getNumberOfSheets(); i++) {
            XSSFSheet sheet = book.getSheetAt(i);
            sheet.enableLocking();
            sheet.lockFormatColumns(false);
            sheet.lockFormatRows(false);
        }
    }
}
