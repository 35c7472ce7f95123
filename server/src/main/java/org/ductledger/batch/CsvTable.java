package org.ductledger.batch;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import de.siegmar.fastcsv.reader.FieldMismatchStrategy;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/**
 * A CSV document (RFC 4180, UTF-8): a header and rows of as many fields.
 *
 * @param header the names of the columns
 * @param rows the fields as they stand
 */
record CsvTable(List<String> header, List<List<String>> rows) {
    private static final char BYTE_ORDER_MARK = '\uFEFF';

    /**
     * Reads a table.
     *
     * @throws DocumentRefusedException if it is no CSV, is ragged, has no header, or too many rows
     */
    static CsvTable read(byte[] csv, Limits limits) throws DocumentRefusedException {
        List<String> header = List.of();
        List<List<String>> rows = new ArrayList<>();
        try (CsvReader<CsvRecord> reader = CsvReader.builder()
                .extraFieldStrategy(FieldMismatchStrategy.IGNORE)
                .missingFieldStrategy(FieldMismatchStrategy.IGNORE)
                .allowUnclosedQuote(false)
                .ofCsvRecord(text(csv))) {
            for (CsvRecord line : reader) {
                if (header.isEmpty()) {
                    header = List.copyOf(line.getFields());
                } else {
                    rows.add(row(line, header, rows.size(), limits));
                }
            }
        } catch (CsvParseException e) {
            throw refused(Reason.MALFORMED, "the document is no valid CSV: " + e.getMessage());
        } catch (IOException e) {
            throw new UncheckedIOException("a document in memory could not be read", e);
        }
        if (header.isEmpty()) {
            throw refused(Reason.MALFORMED, "the document is empty; a header with the arguments' names is required");
        }
        return new CsvTable(header, rows);
    }

    private static List<String> row(CsvRecord line, List<String> header, int rowsSoFar, Limits limits)
            throws DocumentRefusedException {
        if (line.getFieldCount() != header.size()) {
            throw refused(
                    Reason.MALFORMED,
                    "line " + line.getStartingLineNumber() + " must have " + header.size()
                            + " fields as the header has, got " + line.getFieldCount());
        }
        if (rowsSoFar == limits.rows()) {
            throw refused(Reason.LIMIT_EXCEEDED, "a table may have at most " + limits.rows() + " rows");
        }
        return line.getFields();
    }

    private static String text(byte[] csv) throws DocumentRefusedException {
        try {
            String text = StandardCharsets.UTF_8
                    .newDecoder()
                    .decode(ByteBuffer.wrap(csv))
                    .toString();
            return !text.isEmpty() && text.charAt(0) == BYTE_ORDER_MARK ? text.substring(1) : text;
        } catch (CharacterCodingException e) {
            throw refused(Reason.MALFORMED, "the document must be UTF-8, and is not");
        }
    }

    private static DocumentRefusedException refused(String kind, String detail) {
        return new DocumentRefusedException(new Reason(kind, "", detail));
    }
}
