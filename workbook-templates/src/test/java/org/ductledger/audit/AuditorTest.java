package org.ductledger.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import org.apache.poi.ss.util.CellReference;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFRow;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.ductledger.catalogue.Catalogue;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Revision;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.ledger.Evaluator;
import org.ductledger.record.LedgerRecord;
import org.ductledger.record.RecordReader;
import org.ductledger.record.RecordedCall;
import org.ductledger.record.UnreadableWorkbookException;
import org.ductledger.template.InputsRefusedException;
import org.ductledger.template.Templates;
import org.ductledger.template.UnitSystem;
import org.ductledger.template.WorkbookBuilder;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** What an audit sees: nothing in a clean workbook, and each change by its sheet and cell. */
final class AuditorTest {
    private static final Evaluator EVALUATOR = new Evaluator(StandardCatalogue.get());
    private static final Auditor AUDITOR = new Auditor(EVALUATOR);

    private static byte[] clean = new byte[0];

    /** Something done to a workbook. */
    @FunctionalInterface
    private interface Change {
        void make(XSSFWorkbook book, LedgerRecord record) throws Exception;
    }

    @BeforeAll
    static void build() throws InputsRefusedException {
        clean = new WorkbookBuilder(EVALUATOR)
                .build(Templates.find("nozzle_sizing").orElseThrow(), Map.of(), UnitSystem.SI);
    }

    private static byte[] changed(Change change) throws Exception {
        try (XSSFWorkbook book = new XSSFWorkbook(new ByteArrayInputStream(clean));
                ByteArrayOutputStream out = new ByteArrayOutputStream()) {
            change.make(book, RecordReader.read(book));
            book.write(out);
            return out.toByteArray();
        }
    }

    private static AuditReport audit(Change change) throws Exception {
        return AUDITOR.audit(changed(change));
    }

    private static XSSFCell cell(XSSFWorkbook book, String reference) {
        CellReference at = new CellReference(reference.split(":", -1)[0]);
        return book.getSheet(at.getSheetName()).getRow(at.getRow()).getCell(at.getCol());
    }

    private static RecordedCall call(LedgerRecord record, String function) {
        return record.calls().stream()
                .filter(call -> call.function().equals(function))
                .findFirst()
                .orElseThrow();
    }

    private static List<Finding> of(AuditReport report, Finding.Kind kind) {
        return report.findings().stream().filter(f -> f.kind() == kind).toList();
    }

    private static Set<Finding.Kind> kinds(AuditReport report) {
        return report.findings().stream().map(Finding::kind).collect(Collectors.toSet());
    }

    private static String place(String reference) {
        return reference.split(":", -1)[0].replace("$", "");
    }

    @Test
    void aCleanWorkbookHasNoFinding() throws Exception {
        AuditReport report = AUDITOR.audit(clean);
        assertEquals(List.of(), report.findings());
        assertEquals("nozzle_sizing", report.template());
        assertTrue(report.cells() > 1000, report.verdict());
        assertTrue(report.verdict().endsWith("no difference"), report.verdict());
    }

    @Test
    void aWorkbookSavedByAnotherProgramIsStillClean() throws Exception {
        assertEquals(List.of(), audit((book, record) -> {}).findings());
    }

    @Test
    void aChangedInputIsNamedAndTheLiveFormulasAreHeldAgainstIt() throws Exception {
        AuditReport report = audit((book, record) ->
                cell(book, record.quantity("t0").cells().get(0)).setCellValue(350));
        assertEquals(Set.of(Finding.Kind.INPUT_CHANGED), kinds(report), report.findings()::toString);
        Finding finding = report.findings().get(0);
        assertEquals("t0", finding.quantity());
        assertEquals("Inputs", finding.sheet());
        assertTrue(finding.found().startsWith("350"), finding.toString());
    }

    @Test
    void aChangedFilledValueIsNamedByItsCell() throws Exception {
        String[] at = new String[1];
        AuditReport report = audit((book, record) -> {
            at[0] = call(record, "choked_mass_flow").filledCells();
            cell(book, at[0]).setCellValue(1.25);
        });
        assertEquals(Set.of(Finding.Kind.FILLED_VALUE_CHANGED), kinds(report));
        assertEquals(place(at[0]), report.findings().get(0).place());
    }

    @Test
    void aLiveFormulaReplacedByANumberIsNamed() throws Exception {
        String[] at = new String[1];
        AuditReport report = audit((book, record) -> {
            at[0] = call(record, "choked_mass_flow").liveCells();
            XSSFCell live = cell(book, at[0]);
            double value = live.getNumericCellValue();
            live.removeFormula();
            live.setCellValue(value);
        });
        assertEquals(Set.of(Finding.Kind.FORMULA_REMOVED), kinds(report));
        assertEquals(place(at[0]), report.findings().get(0).place());
    }

    @Test
    void anAlteredLiveFormulaIsFoundByItsTextAndByItsValue() throws Exception {
        AuditReport report = audit((book, record) -> {
            XSSFCell live = cell(book, call(record, "choked_mass_flow").liveCells());
            live.setCellFormula("(" + live.getCellFormula() + ")*1.001");
        });
        assertTrue(
                kinds(report).contains(Finding.Kind.FORMULA_CHANGED),
                report.findings().toString());
        assertTrue(
                kinds(report).contains(Finding.Kind.LIVE_VALUE_DIFFERS),
                report.findings().toString());
    }

    @Test
    void anAlteredLineOfTheLedgerBreaksTheDigest() throws Exception {
        AuditReport report = audit((book, record) -> {
            for (var row : book.getSheet("Ledger")) {
                XSSFCell function = ((XSSFRow) row).getCell(2);
                if (function != null && function.toString().equals("choked_mass_flow")) {
                    ((XSSFRow) row).getCell(3).setCellValue("7");
                }
            }
        });
        List<Finding> digest = of(report, Finding.Kind.DIGEST_DIFFERS);
        assertEquals(1, digest.size(), report.findings().toString());
        assertTrue(digest.get(0).place().matches("Ledger![A-Z]+[0-9]+"), digest.toString());
        assertEquals(1, of(report, Finding.Kind.REVISION_CHANGED).size());
    }

    @Test
    void aMendedFunctionIsNamedWithItsReasonAndEveryCellThatItMoves() throws Exception {
        Catalogue mended = new Catalogue(
                "1.1.0",
                StandardCatalogue.get().entries().stream()
                        .map(entry -> entry.name().equals("choked_mass_flow") ? mended(entry) : entry)
                        .toList());
        AuditReport report = new Auditor(new Evaluator(mended)).audit(clean);
        assertEquals("1.1.0", report.libraryNow());
        List<Finding> revised = of(report, Finding.Kind.REVISION_CHANGED);
        assertEquals(1, revised.size());
        assertTrue(revised.get(0).detail().contains("a test mends it"), revised.toString());
        List<Finding> moved = of(report, Finding.Kind.RESULT_CHANGED);
        assertTrue(moved.stream().anyMatch(f -> f.detail().contains("choked_mass_flow")), moved.toString());
        assertTrue(moved.get(0).place().matches("[A-Z][a-z]+![A-Z]+[0-9]+"), moved.toString());
    }

    private static FunctionEntry mended(FunctionEntry e) {
        Kernel twice = Kernel.ofColumns(e.kernel().arity(), (arguments, from, to, result) -> {
            e.kernel().apply(arguments, from, to, result);
            for (int i = from; i < to; i++) {
                result[i] *= 1 + 1e-6;
            }
        });
        List<Revision> revisions = List.of(new Revision(1, "first release"), new Revision(2, "a test mends it"));
        return new FunctionEntry(
                e.name(),
                e.family(),
                e.title(),
                e.formula(),
                e.note(),
                e.arguments(),
                e.result(),
                twice,
                e.conditions(),
                e.sensitivities(),
                e.sources(),
                e.example(),
                revisions,
                e.cellForm());
    }

    @Test
    void whatIsNoWorkbookOrHasNoRecordIsRefusedWithThePlace() throws Exception {
        byte[] text = "a plain text".getBytes(StandardCharsets.UTF_8);
        assertThrows(UnreadableWorkbookException.class, () -> AUDITOR.audit(text));
        byte[] cut = Arrays.copyOf(clean, clean.length / 2);
        assertThrows(UnreadableWorkbookException.class, () -> AUDITOR.audit(cut));
        byte[] without = changed((book, record) -> book.removeSheetAt(book.getSheetIndex("Ledger")));
        UnreadableWorkbookException e = assertThrows(UnreadableWorkbookException.class, () -> AUDITOR.audit(without));
        assertTrue(String.valueOf(e.getMessage()).contains("Ledger"), e.toString());
    }
}
