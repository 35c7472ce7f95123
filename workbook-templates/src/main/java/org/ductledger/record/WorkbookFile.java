package org.ductledger.record;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** Opens workbooks that come from outside. */
public final class WorkbookFile {
    private static final int ZIP_MARK_LENGTH = 2;

    private WorkbookFile() {}

    /**
     * Opens an XLSX file; the caller closes it.
     *
     * @throws UnreadableWorkbookException if the bytes are no such file
     */
    public static XSSFWorkbook open(byte[] file) throws UnreadableWorkbookException {
        if (file.length < ZIP_MARK_LENGTH || file[0] != 'P' || file[1] != 'K') {
            throw new UnreadableWorkbookException(
                    "the file",
                    "an XLSX workbook, which is a zip archive",
                    "no zip archive (" + file.length + " bytes)");
        }
        try {
            return new XSSFWorkbook(new ByteArrayInputStream(file));
        } catch (IOException | RuntimeException e) {
            // The library answers damaged packages, parts and XML with unchecked exceptions of many kinds.
            UnreadableWorkbookException unreadable = new UnreadableWorkbookException(
                    "the file", "an XLSX workbook", "one that cannot be opened: " + e.getMessage());
            unreadable.initCause(e);
            throw unreadable;
        }
    }
}
