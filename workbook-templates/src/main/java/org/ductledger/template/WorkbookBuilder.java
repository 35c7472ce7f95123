package org.ductledger.template;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Map;
import org.apache.poi.xssf.usermodel.XSSFRow;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Given;

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
        Inputs chosen = InputReader.read(template, inputs, units);
        try (XSSFWorkbook book = new XSSFWorkbook();
                ByteArrayOutputStream out = new ByteArrayOutputStream()) {
            XSSFSheet sheet = book.createSheet("Inputs");
            sheet.createRow(0)
                    .createCell(0)
                    .setCellValue(template.title() + ", library "
                            + evaluator.catalogue().version());
            for (TemplateInput input : template.inputs()) {
                if (chosen.has(input.name())) {
                    list(sheet.createRow(sheet.getLastRowNum() + 1), input, chosen.get(input.name()));
                }
            }
            book.write(out);
            return out.toByteArray();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static void list(XSSFRow row, TemplateInput input, Given.Values values) {
        row.createCell(0).setCellValue(input.label());
        for (int i = 0; i < values.column().rows(); i++) {
            if (values.column() instanceof Column.Numbers numbers) {
                row.createCell(i + 1).setCellValue(numbers.values()[i]);
            } else {
                row.createCell(i + 1)
                        .setCellValue(((Column.Texts) values.column()).values().get(i));
            }
        }
    }
}
