package org.ductledger.acceptance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import org.apache.poi.ss.SpreadsheetVersion;
import org.apache.poi.ss.util.AreaReference;
import org.apache.poi.ss.util.CellReference;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Given;
import org.ductledger.record.LedgerRecord;
import org.ductledger.record.RecordReader;
import org.ductledger.record.RecordedCall;
import org.ductledger.support.LibreOffice;
import org.ductledger.template.Template;
import org.ductledger.template.Templates;
import org.ductledger.template.UnitSystem;
import org.ductledger.template.WorkbookBuilder;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;

/**
 * Another spreadsheet engine, LibreOffice Calc, recalculates the live formulas; each must give what the service filled
 * in beside it, for the default inputs and for drawn ones that reach every regime.
 */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
final class LibreOfficeValidationTest {
    private static final double RELATIVE = 1e-11;
    private static final int DRAWN = 20;
    private static final long SEED = 20_260_731L;
    private static final double PLANTED = 12_345.0;

    private final Map<String, Path> recalculated = new LinkedHashMap<>();
    private final TreeSet<String> regimes = new TreeSet<>();
    private String planted = "";

    @BeforeAll
    void buildAndRecalculate(@TempDir Path work) throws Exception {
        WorkbookBuilder builder = new WorkbookBuilder(new Evaluator(StandardCatalogue.get()));
        Template template = Templates.find("nozzle_sizing").orElseThrow();
        List<Path> files = new ArrayList<>();
        files.add(write(work, "default-si", builder.build(template, Map.of(), UnitSystem.SI)));
        files.add(write(work, "default-us", builder.build(template, Map.of(), UnitSystem.US)));
        DrawnNozzles drawn = new DrawnNozzles(SEED);
        for (int i = 0; i < DRAWN; i++) {
            String regime = DrawnNozzles.REGIMES.get(i % DrawnNozzles.REGIMES.size());
            Map<String, Given.Values> inputs = drawn.of(regime);
            UnitSystem units = i % 4 == 3 ? UnitSystem.US : UnitSystem.SI;
            files.add(write(work, "drawn-" + i + "-" + regime, builder.build(template, inputs, units)));
        }
        files.add(plant(files.get(0), work.resolve("planted.xlsx")));
        Path out = new LibreOffice(work).recalculated(files);
        files.forEach(file -> recalculated.put(
                file.getFileName().toString(), out.resolve(file.getFileName().toString())));
        // The temporary folder outlives this method: it is deleted after the last test of the class.
    }

    private static Path write(Path folder, String name, byte[] workbook) throws IOException {
        return Files.write(folder.resolve(name + ".xlsx"), workbook);
    }

    /** A copy in which a live cell carries a wrong cached value, as if an engine had not recalculated it. */
    private Path plant(Path original, Path copy) throws Exception {
        try (XSSFWorkbook book = open(original);
                OutputStream out = Files.newOutputStream(copy)) {
            planted = RecordReader.read(book).calls().stream()
                    .filter(call ->
                            call.id().equals("choked_flow") || call.function().equals("choked_mass_flow"))
                    .findFirst()
                    .orElseThrow()
                    .liveCells();
            cell(book, new CellReference(planted)).getCTCell().setV(Double.toString(PLANTED));
            book.write(out);
        }
        return copy;
    }

    private static XSSFWorkbook open(Path file) throws IOException {
        try (InputStream in = Files.newInputStream(file)) {
            return new XSSFWorkbook(in);
        }
    }

    private static XSSFCell cell(XSSFWorkbook book, CellReference reference) {
        return book.getSheet(reference.getSheetName())
                .getRow(reference.getRow())
                .getCell(reference.getCol());
    }

    @Test
    void aPlantedWrongValueIsGoneSoThatCalcDidRecalculate() throws IOException {
        try (XSSFWorkbook book = open(recalculated("planted.xlsx"))) {
            double value = cell(book, new CellReference(planted)).getNumericCellValue();
            assertNotEquals(PLANTED, value);
            assertTrue(value > 0);
        }
    }

    private Path recalculated(String name) {
        Path path = recalculated.get(name);
        if (path == null) {
            throw new IllegalStateException(name + " was not recalculated");
        }
        return path;
    }

    @Test
    void everyLiveFormulaGivesItsFilledValue() throws Exception {
        for (Map.Entry<String, Path> file : recalculated.entrySet()) {
            try (XSSFWorkbook book = open(file.getValue())) {
                LedgerRecord record = RecordReader.read(book);
                int compared = 0;
                for (RecordedCall call : record.calls()) {
                    compared += compare(file.getKey(), book, call);
                }
                assertTrue(compared > 500, file.getKey() + ": only " + compared + " formulas compared");
            }
        }
        assertEquals(new TreeSet<>(DrawnNozzles.REGIMES), regimes, "the drawn inputs must reach every regime");
    }

    private int compare(String file, XSSFWorkbook book, RecordedCall call) {
        if (call.liveCells().isEmpty()) {
            return 0;
        }
        CellReference[] live = cells(call.liveCells());
        double size = size(call.values());
        for (int row = 0; row < live.length; row++) {
            XSSFCell cell = cell(book, live[row]);
            String place = file + ", " + call.id() + " in " + live[row].formatAsString();
            if (call.values() instanceof Column.Texts texts) {
                assertEquals(texts.values().get(row), cell.getStringCellValue(), place);
                if (file.startsWith("drawn") && call.function().equals("nozzle_regime")) {
                    regimes.add(cell.getStringCellValue());
                }
                continue;
            }
            double filled = ((Column.Numbers) call.values()).values()[row];
            if (Double.isNaN(filled)) {
                assertTrue(cell.getCachedFormulaResultType().name().equals("STRING"), place + " must show words");
            } else {
                // Where a value cancels to about zero (a place at the throat) the column's size is the measure.
                double allowed = RELATIVE * Math.max(Math.abs(filled), 1e-3 * size);
                assertEquals(filled, cell.getNumericCellValue(), allowed, place);
            }
        }
        return live.length;
    }

    private static CellReference[] cells(String reference) {
        return new AreaReference(reference, SpreadsheetVersion.EXCEL2007).getAllReferencedCells();
    }

    private static double size(Column column) {
        double size = 0;
        if (column instanceof Column.Numbers numbers) {
            for (double x : numbers.values()) {
                size = Math.max(size, Double.isNaN(x) ? 0 : Math.abs(x));
            }
        }
        return size;
    }
}
