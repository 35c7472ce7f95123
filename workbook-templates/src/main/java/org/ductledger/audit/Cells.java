package org.ductledger.audit;

import java.util.ArrayList;
import java.util.List;
import org.apache.poi.ss.SpreadsheetVersion;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.util.AreaReference;
import org.apache.poi.ss.util.CellReference;
import org.apache.poi.xssf.usermodel.XSSFRow;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.ductledger.record.UnreadableWorkbookException;
import org.jspecify.annotations.Nullable;

/** The cells of a workbook under audit, by the references that its record holds. */
final class Cells {
    private final XSSFWorkbook book;

    Cells(XSSFWorkbook book) {
        this.book = book;
    }

    /**
     * The cells of a reference such as {@code Inputs!$D$6} or {@code Stations!$C$7:$C$55}, in their order.
     *
     * @throws UnreadableWorkbookException if the text is no such reference
     */
    static List<CellReference> of(String reference) throws UnreadableWorkbookException {
        if (reference.isEmpty()) {
            return List.of();
        }
        try {
            List<CellReference> cells = new ArrayList<>();
            for (CellReference cell :
                    new AreaReference(reference, SpreadsheetVersion.EXCEL2007).getAllReferencedCells()) {
                if (cell.getSheetName() == null) {
                    throw new IllegalArgumentException("no sheet is named");
                }
                cells.add(cell);
            }
            return cells;
        } catch (IllegalArgumentException e) {
            throw new UnreadableWorkbookException(
                    "a cell reference on sheet Ledger",
                    "a sheet and its cells, as in Inputs!$D$6",
                    "'" + reference + "'");
        }
    }

    /** The address alone, without the sheet. */
    static String address(CellReference reference) {
        return new CellReference(reference.getRow(), reference.getCol()).formatAsString(false);
    }

    @Nullable
    Cell at(CellReference reference) {
        XSSFSheet sheet = book.getSheet(reference.getSheetName());
        XSSFRow row = sheet == null ? null : sheet.getRow(reference.getRow());
        return row == null ? null : row.getCell(reference.getCol());
    }

    /** What a cell holds: a {@code Double}, a {@code String}, or null where it is empty or holds neither. */
    static @Nullable Object value(@Nullable Cell cell) {
        if (cell == null) {
            return null;
        }
        CellType type = cell.getCellType() == CellType.FORMULA ? cell.getCachedFormulaResultType() : cell.getCellType();
        return switch (type) {
            case NUMERIC -> (Object) cell.getNumericCellValue();
            case STRING -> cell.getStringCellValue();
            case BOOLEAN -> cell.getBooleanCellValue() ? "TRUE" : "FALSE";
            default -> null;
        };
    }
}
