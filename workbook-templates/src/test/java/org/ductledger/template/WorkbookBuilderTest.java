package org.ductledger.template;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TimeZone;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import org.apache.poi.ss.usermodel.PrintSetup;
import org.apache.poi.ss.usermodel.SheetVisibility;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFDataValidation;
import org.apache.poi.xssf.usermodel.XSSFName;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.record.LedgerRecord;
import org.ductledger.record.RecordDigest;
import org.ductledger.record.RecordReader;
import org.ductledger.record.RecordedQuantity;
import org.ductledger.record.RecordedQuantity.Role;
import org.ductledger.sheet.Book;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What every workbook of every template owes its user. */
final class WorkbookBuilderTest {
    private static final String TEMPLATES = "org.ductledger.template.BuiltWorkbook#templates";

    @ParameterizedTest
    @MethodSource(TEMPLATES)
    void sheetsStandInTheirOrderAndNoneIsHidden(Template template) throws Exception {
        XSSFWorkbook book = BuiltWorkbook.of(template, UnitSystem.SI);
        List<String> names = new ArrayList<>();
        for (int i = 0; i < book.getNumberOfSheets(); i++) {
            names.add(book.getSheetName(i));
            assertEquals(SheetVisibility.VISIBLE, book.getSheetVisibility(i));
        }
        assertEquals(List.of("Front", "Inputs", "Results"), names.subList(0, 3));
        assertEquals(List.of("Ledger", "Sources"), names.subList(names.size() - 2, names.size()));
        assertTrue(names.size() > 5, "a table stands between the results and the record");
    }

    @ParameterizedTest
    @MethodSource(TEMPLATES)
    void theFileHasNoMacrosAndNoLinksToOutside(Template template) throws Exception {
        for (String part : parts(BuiltWorkbook.defaults(template, UnitSystem.SI))) {
            assertFalse(part.contains("vbaProject") || part.contains("externalLink"), part);
        }
    }

    private static List<String> parts(byte[] file) throws Exception {
        List<String> parts = new ArrayList<>();
        try (ZipInputStream zip = new ZipInputStream(new ByteArrayInputStream(file))) {
            for (ZipEntry entry = zip.getNextEntry(); entry != null; entry = zip.getNextEntry()) {
                parts.add(entry.getName());
            }
        }
        return parts;
    }

    @ParameterizedTest
    @MethodSource(TEMPLATES)
    void theSameInputsGiveTheSameBytes(Template template) throws Exception {
        byte[] first = BuiltWorkbook.defaults(template, UnitSystem.US);
        Locale locale = Locale.getDefault();
        TimeZone zone = TimeZone.getDefault();
        try {
            Locale.setDefault(Locale.GERMANY);
            TimeZone.setDefault(TimeZone.getTimeZone("Asia/Tokyo"));
            assertArrayEquals(first, BuiltWorkbook.bytes(template, Map.of(), UnitSystem.US));
        } finally {
            Locale.setDefault(locale);
            TimeZone.setDefault(zone);
        }
    }

    @ParameterizedTest
    @MethodSource(TEMPLATES)
    void onlyInputsCanBeChanged(Template template) throws Exception {
        XSSFWorkbook book = BuiltWorkbook.of(template, UnitSystem.SI);
        Set<String> inputs = new HashSet<>();
        for (RecordedQuantity quantity : RecordReader.read(book).quantities()) {
            if (quantity.role() != Role.FIXED) {
                inputs.addAll(quantity.cells());
            }
        }
        for (var sheet : book) {
            assertTrue(((XSSFSheet) sheet).isSheetLocked(), sheet.getSheetName());
            assertFalse(((XSSFSheet) sheet).validateSheetPassword("any"), "no password");
        }
        for (String input : inputs) {
            XSSFCell cell = BuiltWorkbook.cells(book, input).get(0);
            assertFalse(cell.getCellStyle().getLocked(), input);
        }
        for (RecordedQuantity quantity : RecordReader.read(book).quantities()) {
            if (quantity.role() == Role.INPUT) {
                quantity.cells().forEach(cell -> assertValidated(book, cell));
            }
        }
    }

    private static void assertValidated(XSSFWorkbook book, String address) {
        XSSFCell cell = BuiltWorkbook.cells(book, address).get(0);
        for (XSSFDataValidation validation : cell.getSheet().getDataValidations()) {
            for (var range : validation.getRegions().getCellRangeAddresses()) {
                if (range.isInRange(cell)) {
                    assertTrue(validation.getShowErrorBox(), address);
                    assertNotNull(validation.getErrorBoxText(), address);
                    return;
                }
            }
        }
        throw new AssertionError(address + " takes anything");
    }

    @ParameterizedTest
    @MethodSource(TEMPLATES)
    void everyNameIsLegalAndHidesNoFunction(Template template) throws Exception {
        for (XSSFName name : BuiltWorkbook.of(template, UnitSystem.SI).getAllNames()) {
            if (!name.getNameName().startsWith("_xlnm")) {
                assertTrue(Book.isLegalName(name.getNameName()), name.getNameName());
                assertTrue(StandardCatalogue.get().find(name.getNameName()).isEmpty(), name.getNameName());
                assertEquals(-1, name.getSheetIndex(), "for the whole workbook");
            }
        }
    }

    @ParameterizedTest
    @MethodSource(TEMPLATES)
    void theRecordIsWholeAndItsDigestHolds(Template template) throws Exception {
        for (UnitSystem units : UnitSystem.values()) {
            LedgerRecord record = RecordReader.read(BuiltWorkbook.of(template, units));
            assertEquals(template.name(), record.template());
            assertEquals(template.version(), record.templateVersion());
            assertEquals(units.label(), record.units());
            assertEquals(StandardCatalogue.VERSION, record.library());
            assertTrue(RecordDigest.holds(record));
            record.calls().forEach(call -> {
                assertFalse(call.filledCells().isEmpty(), call.id());
                call.arguments().forEach(argument -> assertNotNull(argument.cells(), call.id()));
            });
        }
    }

    @ParameterizedTest
    @MethodSource(TEMPLATES)
    void itPrintsOnThePaperOfItsUnits(Template template) throws Exception {
        assertPaper(PrintSetup.A4_PAPERSIZE, BuiltWorkbook.of(template, UnitSystem.SI));
        assertPaper(PrintSetup.LETTER_PAPERSIZE, BuiltWorkbook.of(template, UnitSystem.US));
    }

    private static void assertPaper(short paper, XSSFWorkbook book) {
        for (int i = 0; i < book.getNumberOfSheets(); i++) {
            XSSFSheet sheet = book.getSheetAt(i);
            assertEquals(paper, sheet.getPrintSetup().getPaperSize(), sheet.getSheetName());
            assertEquals(1, sheet.getPrintSetup().getFitWidth(), sheet.getSheetName());
            assertTrue(sheet.getFitToPage(), sheet.getSheetName());
            assertNotNull(book.getPrintArea(i), sheet.getSheetName());
            assertEquals("&8&A", sheet.getHeader().getRight());
            assertEquals("&8&F", sheet.getFooter().getLeft());
            assertEquals("&8page &P of &N", sheet.getFooter().getRight());
        }
    }
}
