package org.ductledger.record;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFRow;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Ledger;
import org.ductledger.record.RecordedArgument.FromCall;
import org.ductledger.record.RecordedArgument.FromQuantity;
import org.ductledger.record.RecordedArgument.FromRows;
import org.ductledger.record.RecordedArgument.Row;
import org.ductledger.record.RecordedCall.RecordedFault;
import org.ductledger.record.RecordedQuantity.Role;
import org.ductledger.sheet.Book;
import org.ductledger.sheet.PageSetup;
import org.junit.jupiter.api.Test;

/** What is written to the Ledger sheet comes back whole, and damage to it is told by its place. */
final class RecordRoundTripTest {
    private static final LedgerRecord RECORD = sealed(new LedgerRecord(
            "some_template", 3, "1.0.0", "us", quantities(), List.of(column(), single(), words()), ""));

    private static List<RecordedQuantity> quantities() {
        return List.of(
                new RecordedQuantity("gamma", Role.INPUT, "1", List.of("Inputs!$C$5"), new Column.Numbers(1.4)),
                new RecordedQuantity(
                        "point",
                        Role.INPUT,
                        "in",
                        List.of("Inputs!$C$6", "Inputs!$C$7"),
                        new Column.Numbers(-1 / 3.0, Double.MIN_VALUE)),
                new RecordedQuantity(
                        "mach",
                        Role.FIXED,
                        "1",
                        List.of("Stations!$B$5:$B$11"),
                        new Column.Numbers(0, 0.1, 1, 2, 1e9, 1.0 / 3, 4)),
                new RecordedQuantity("branch", Role.FIXED, "", List.of(), new Column.Texts(List.of("subsonic"))),
                new RecordedQuantity("project", Role.REMARK, "", List.of("Front!$C$4"), new Column.Texts(List.of(""))));
    }

    private static RecordedCall column() {
        return new RecordedCall(
                "ratio",
                "t_over_t0",
                1,
                "1",
                List.of(
                        new RecordedArgument("mach", new FromQuantity("mach"), "Stations!$B$5:$B$11"),
                        new RecordedArgument("gamma", new FromQuantity("gamma"), "Inputs!$F$5")),
                "Stations!$C$5:$C$11",
                "Stations!$H$5:$H$11",
                new Column.Numbers(1, 0.998, 0.83, Double.NaN, 1e-17, 0.1, 0.2),
                List.of(new RecordedFault(3, FaultKind.NO_SOLUTION, "mach must be less: got more")));
    }

    private static RecordedCall single() {
        return new RecordedCall(
                "one",
                "t_over_t0",
                2,
                "1",
                List.of(
                        new RecordedArgument(
                                "mach",
                                new FromRows(List.of(new Row("point", 1), new Row("point", 1), new Row("point", 0))),
                                "Stations!$Z$5:$Z$7"),
                        new RecordedArgument("gamma", new FromCall("ratio"), "Stations!$C$5:$C$7")),
                "",
                "Results!$E$5",
                new Column.Numbers(-12345.678901234567),
                List.of());
    }

    private static RecordedCall words() {
        return new RecordedCall(
                "kind",
                "t_over_t0",
                1,
                "",
                List.of(),
                "",
                "Results!$E$6",
                new Column.Texts(Arrays.asList("nozzle", null, "diffuser")),
                List.of(new RecordedFault(1, FaultKind.OUTSIDE_DOMAIN, "")));
    }

    private static LedgerRecord sealed(LedgerRecord record) {
        return record.withDigest(RecordDigest.of(record));
    }

    private static XSSFWorkbook written() {
        Book book = new Book();
        RecordWriter.write(book, new PageSetup(PageSetup.Paper.A4, "test"), RECORD);
        return book.poi();
    }

    private static XSSFCell cell(XSSFWorkbook book, String text) {
        for (var row : book.getSheet("Ledger")) {
            for (var cell : (XSSFRow) row) {
                if (List.of(cell.toString().split("\n")).contains(text)) {
                    return (XSSFCell) cell;
                }
            }
        }
        throw new IllegalArgumentException("no cell holds " + text);
    }

    @Test
    void comesBackWhole() throws Exception {
        LedgerRecord back = RecordReader.read(written());
        assertEquals(RecordDigest.canonicalText(RECORD), RecordDigest.canonicalText(back));
        assertEquals(RECORD.digest(), back.digest());
        assertTrue(RecordDigest.holds(back));
    }

    @Test
    void everyDoubleComesBackToTheBit() throws Exception {
        LedgerRecord back = RecordReader.read(written());
        for (String name : List.of("gamma", "point", "mach")) {
            assertArrayEquals(
                    ((Column.Numbers) RECORD.quantity(name).values()).values(),
                    ((Column.Numbers) back.quantity(name).values()).values());
        }
    }

    @Test
    void givesALedgerThatTheEvaluatorTakes() throws Exception {
        LedgerRecord record = new LedgerRecord("t", 1, "1.0.0", "si", quantities(), List.of(column()), "");
        Ledger ledger = record.ledger();
        double[] values =
                new Evaluator(StandardCatalogue.get()).evaluate(ledger).get(0).numbers();
        assertEquals(7, values.length);
        assertEquals(1, values[0]);
        assertEquals(1 / 1.8, values[3], 1e-15);
    }

    @Test
    void aChangedLineBreaksTheDigest() throws Exception {
        XSSFWorkbook book = written();
        cell(book, Digits.of(1.4)).setCellValue(Digits.of(1.41));
        assertFalse(RecordDigest.holds(RecordReader.read(book)));
    }

    @Test
    void damageIsToldByItsPlace() {
        assertDamage("ratio = call", "gamma = call ratio @ Stations!$C$5:$C$7", "gamma call ratio", "K");
        assertDamage("a number", Digits.of(1e9), "1e9 or so", "H");
        assertDamage("not finite", Digits.of(1e9), "1e999", "H");
        assertDamage("rows", "7", "8", "G");
        assertDamage("kind", "call", "cal", "A");
        assertDamage(
                "no such quantity",
                "mach = quantity mach @ Stations!$B$5:$B$11",
                "mach = quantity much @ Stations!$B$5:$B$11",
                "K");
        assertDamage(
                "no such row",
                "mach = rows point:2x2 point:1 @ Stations!$Z$5:$Z$7",
                "mach = rows point:3x2 point:1 @ Stations!$Z$5:$Z$7",
                "K");
    }

    private static void assertDamage(String what, String was, String becomes, String column) {
        XSSFWorkbook book = written();
        XSSFCell cell = cell(book, was);
        cell.setCellValue(cell.getStringCellValue().replace(was, becomes));
        UnreadableWorkbookException damage =
                assertThrows(UnreadableWorkbookException.class, () -> RecordReader.read(book), what);
        assertTrue(damage.place().startsWith("Ledger!" + column), damage::toString);
    }

    @Test
    void whatIsNoWorkbookIsRefused() {
        for (byte[] bytes : List.of(
                new byte[0],
                "PK and then nothing of a zip".getBytes(StandardCharsets.UTF_8),
                "name,value".getBytes(StandardCharsets.UTF_8))) {
            assertThrows(UnreadableWorkbookException.class, () -> WorkbookFile.open(bytes));
        }
    }

    @Test
    void aWorkbookWithoutARecordIsRefused() throws Exception {
        try (XSSFWorkbook book = new XSSFWorkbook()) {
            book.createSheet("Sheet1");
            UnreadableWorkbookException refusal =
                    assertThrows(UnreadableWorkbookException.class, () -> RecordReader.read(book));
            assertTrue(refusal.required().contains("Ledger"), refusal::toString);
        }
    }
}
