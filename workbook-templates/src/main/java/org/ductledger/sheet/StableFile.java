package org.ductledger.sheet;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.time.Instant;
import java.time.LocalDateTime;
import java.util.Date;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;
import org.apache.poi.ooxml.POIXMLProperties;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** Writes a workbook so that the same content gives the same bytes: fixed dates, parts in a fixed order. */
public final class StableFile {
    private static final String FIRST_PART = "[Content_Types].xml";
    private static final LocalDateTime PART_TIME = LocalDateTime.of(1980, 2, 1, 0, 0);
    private static final Date DOCUMENT_TIME = Date.from(Instant.parse("2026-01-01T00:00:00Z"));

    private StableFile() {}

    /** The file's bytes. */
    public static byte[] of(XSSFWorkbook book, String title) {
        properties(book.getProperties(), title);
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try {
            book.write(out);
            return sorted(out.toByteArray());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static void properties(POIXMLProperties properties, String title) {
        POIXMLProperties.CoreProperties core = properties.getCoreProperties();
        core.setTitle(title);
        core.setCreator("Ductledger");
        core.setCreated(Optional.of(DOCUMENT_TIME));
        core.setModified(Optional.of(DOCUMENT_TIME));
    }

    private static byte[] sorted(byte[] file) throws IOException {
        Map<String, byte[]> parts = new TreeMap<>();
        try (ZipInputStream in = new ZipInputStream(new ByteArrayInputStream(file))) {
            for (ZipEntry part = in.getNextEntry(); part != null; part = in.getNextEntry()) {
                parts.put(part.getName(), in.readAllBytes());
            }
        }
        ByteArrayOutputStream out = new ByteArrayOutputStream(file.length);
        try (ZipOutputStream zip = new ZipOutputStream(out)) {
            byte[] first = parts.remove(FIRST_PART);
            if (first != null) {
                put(zip, FIRST_PART, first);
            }
            for (Map.Entry<String, byte[]> part : parts.entrySet()) {
                put(zip, part.getKey(), part.getValue());
            }
        }
        return out.toByteArray();
    }

    private static void put(ZipOutputStream zip, String name, byte[] content) throws IOException {
        ZipEntry entry = new ZipEntry(name);
        entry.setTimeLocal(PART_TIME);
        zip.putNextEntry(entry);
        zip.write(content);
        zip.closeEntry();
    }
}
