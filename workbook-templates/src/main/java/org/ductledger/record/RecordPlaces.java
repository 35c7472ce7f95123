package org.ductledger.record;

import java.util.HashMap;
import java.util.Map;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.util.CellReference;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** Where the lines of a record stand on its {@code Ledger} sheet. */
public final class RecordPlaces {
    private final Map<String, String> lines = new HashMap<>();

    /** The places in a workbook whose record {@link RecordReader} has read. */
    public RecordPlaces(XSSFWorkbook book) {
        for (Row row : book.getSheet(RecordForm.SHEET)) {
            RecordLine line = new RecordLine(row);
            String cell = new CellReference(row.getRowNum(), 1).formatAsString(false);
            lines.putIfAbsent(key(line.kind(), line.text(1)), cell);
        }
    }

    /** The sheet of the record. */
    public String sheet() {
        return RecordForm.SHEET;
    }

    /** The cell that names the call, or an empty text where there is none. */
    public String ofCall(String id) {
        return lines.getOrDefault(key(RecordForm.CALL, id), "");
    }

    /** The cell that heads the digest, or an empty text where there is none. */
    public String ofDigest() {
        return lines.getOrDefault(key(RecordForm.RECORD, RecordForm.DIGEST), "");
    }

    private static String key(String kind, String name) {
        return kind + ' ' + name;
    }
}
