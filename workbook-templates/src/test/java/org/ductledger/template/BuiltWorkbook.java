package org.ductledger.template;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.apache.poi.ss.SpreadsheetVersion;
import org.apache.poi.ss.util.AreaReference;
import org.apache.poi.ss.util.CellReference;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Given;
import org.ductledger.record.WorkbookFile;

/** Builds workbooks for tests, and finds their cells. */
final class BuiltWorkbook {
    private static final WorkbookBuilder BUILDER = new WorkbookBuilder(new Evaluator(StandardCatalogue.get()));

    private static final Map<String, byte[]> BUILT = new HashMap<>();

    private BuiltWorkbook() {}

    /** Every template of the program, and one that only the tests have. */
    static Stream<Template> templates() {
        return Stream.concat(Stream.of(new CoolingLine()), Templates.all().stream());
    }

    static byte[] bytes(Template template, Map<String, Given.Values> inputs, UnitSystem units)
            throws InputsRefusedException {
        return BUILDER.build(template, inputs, units);
    }

    /** The workbook of a template's defaults, to be changed at will: it is built once and opened anew each time. */
    static XSSFWorkbook of(Template template, UnitSystem units) throws Exception {
        return WorkbookFile.open(defaults(template, units));
    }

    static synchronized byte[] defaults(Template template, UnitSystem units) throws InputsRefusedException {
        String key = template.name() + units;
        byte[] built = BUILT.get(key);
        if (built == null) {
            built = bytes(template, Map.of(), units);
            BUILT.put(key, built);
        }
        return built;
    }

    static Given.Values number(double value, String unit) {
        return new Given.Values(new Column.Numbers(value), true, unit);
    }

    /** The cells of an address or a range, as in {@code Stations!$F$6:$F$54}. */
    static List<XSSFCell> cells(XSSFWorkbook book, String range) {
        List<XSSFCell> cells = new ArrayList<>();
        for (CellReference at : new AreaReference(range, SpreadsheetVersion.EXCEL2007).getAllReferencedCells()) {
            XSSFCell cell = book.getSheet(at.getSheetName()).getRow(at.getRow()).getCell(at.getCol());
            if (cell == null) {
                throw new AssertionError("no cell at " + at.formatAsString());
            }
            cells.add(cell);
        }
        return cells;
    }

    static XSSFCell named(XSSFWorkbook book, String name) {
        return cells(book, book.getName(name).getRefersToFormula()).get(0);
    }
}
