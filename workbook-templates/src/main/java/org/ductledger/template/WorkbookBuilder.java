package org.ductledger.template;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.apache.poi.xssf.usermodel.XSSFFormulaEvaluator;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Given;
import org.ductledger.ledger.LedgerRefusedException;
import org.ductledger.record.RecordWriter;
import org.ductledger.sheet.Book;
import org.ductledger.sheet.PageSetup;
import org.ductledger.sheet.PageSetup.Paper;
import org.ductledger.sheet.StableFile;

/** Makes workbooks of templates. Thread-safe. */
public final class WorkbookBuilder {
    private final Evaluator evaluator;

    public WorkbookBuilder(Evaluator evaluator) {
        this.evaluator = evaluator;
    }

    /**
     * Builds a workbook and fills it.
     *
     * @param inputs by name; one that is missing takes the template's default, and a number without a unit is in the
     *     coherent unit of its kind
     * @param units the system in which the workbook shows its quantities
     * @return the XLSX file; the same bytes for the same inputs and library
     * @throws InputsRefusedException with every problem of the inputs
     */
    public byte[] build(Template template, Map<String, Given.Values> inputs, UnitSystem units)
            throws InputsRefusedException {
        Draft draft = new Draft(evaluator.catalogue(), InputReader.read(template, inputs, units));
        template.write(draft);
        Filled filled = fill(template, draft);
        if (!filled.problems().isEmpty()) {
            throw new InputsRefusedException(filled.problems());
        }
        return write(template, filled);
    }

    private Filled fill(Template template, Draft draft) {
        try {
            return Filled.of(draft, evaluator.evaluate(DraftRecord.ledger(template, draft)));
        } catch (LedgerRefusedException e) {
            throw new IllegalStateException("the template " + template.name() + " writes an unsound ledger", e);
        }
    }

    private static byte[] write(Template template, Filled filled) {
        Book book = new Book();
        Paper paper = filled.draft().inputs().units() == UnitSystem.US ? Paper.LETTER : Paper.A4;
        PageSetup page = new PageSetup(paper, template.title());
        Layout layout = new Layout(template, filled, book, page, new Places());
        declare(layout);
        InputsSheet.write(layout, book.sheet(InputsSheet.NAME));
        ResultsSheet.write(layout, book.sheet(ResultsSheet.NAME));
        List<Runnable> plots = new ArrayList<>();
        for (Table table : filled.draft().tables()) {
            plots.add(TableSheet.write(layout, table, book.sheet(table.sheet())));
        }
        FrontSheet.write(layout, book.sheet(FrontSheet.NAME));
        RecordWriter.write(book, page, DraftRecord.of(template, filled, layout.places()));
        SourcesSheet.write(layout, book.sheet(SourcesSheet.NAME));
        book.lock();
        XSSFFormulaEvaluator.evaluateAllFormulaCells(book.poi());
        plots.forEach(Runnable::run);
        book.poi().setForceFormulaRecalculation(true);
        return StableFile.of(book.poi(), template.title());
    }

    /** Makes the sheets in their order, and the names that formulas lean on before their cells are written. */
    private static void declare(Layout layout) {
        Book book = layout.book();
        book.sheet(FrontSheet.NAME);
        book.sheet(InputsSheet.NAME);
        book.sheet(ResultsSheet.NAME);
        layout.draft().tables().forEach(table -> book.sheet(table.sheet()));
        RecordWriter.declare(book);
        ResultsSheet.declare(book);
        book.sheet(SourcesSheet.NAME);
    }
}
