package org.ductledger.template;

import java.util.List;
import org.apache.poi.ss.util.CellRangeAddress;
import org.ductledger.catalogue.Unit;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Outcome;
import org.ductledger.sheet.Alerts;
import org.ductledger.sheet.Grid;
import org.ductledger.sheet.Literals;
import org.ductledger.sheet.Look;
import org.ductledger.sheet.NumberFormats;

/** The sheet {@code Front}: what the calculation is, who answers for it, whether it holds, and what to heed. */
final class FrontSheet {
    static final String NAME = "Front";

    private static final int LAST = 3;

    private final Layout layout;
    private final Grid grid;
    private int row;

    private FrontSheet(Layout layout, Grid grid) {
        this.layout = layout;
        this.grid = grid;
    }

    /** Writes the sheet; the others stand by then. */
    static void write(Layout layout, Grid grid) {
        new FrontSheet(layout, grid).write();
    }

    private void write() {
        grid.widths(32, 22, 18, 38);
        grid.text(row, 0, Look.TITLE, layout.template().title());
        grid.height(row++, 26);
        grid.across(row++, 0, LAST, Look.NOTE, origin());
        writeRemarks();
        writeCheck();
        writeHeadlines();
        paragraphs("Purpose", List.of(layout.template().purpose()));
        paragraphs("Cautions", layout.template().cautions());
        paragraphs("What it assumes, and where it ends", layout.template().limits());
        writeLegend();
        layout.page().applyToOnePage(grid, false, "$A$1:$D$" + row);
    }

    private String origin() {
        return "Ductledger workbook " + layout.template().name() + ", version "
                + layout.template().version() + "; function library "
                + layout.draft().catalogue().version() + "; units: "
                + layout.draft().inputs().units().label();
    }

    private void heading(String title) {
        row++;
        grid.across(row++, 0, LAST, Look.HEADING, title);
    }

    private void writeRemarks() {
        heading("Document");
        for (TemplateInput input : layout.template().inputs()) {
            if (input.kind() == TemplateInput.Kind.REMARK) {
                Column.Texts given =
                        (Column.Texts) layout.draft().inputs().get(input.name()).column();
                grid.text(row, 0, Look.TEXT, input.label());
                grid.across(
                        row,
                        1,
                        LAST,
                        Look.INPUT_TEXT,
                        String.valueOf(given.values().get(0)));
                layout.book().name(Cells.name(layout.draft(), input.name()), grid.address(row, 1));
                layout.places().show(input.name(), List.of(grid.address(row, 1)));
                row++;
            }
        }
    }

    private void writeCheck() {
        heading("Check of the whole workbook");
        int verdict = row++;
        int changed = count("Inputs changed since the fill", Layout.INPUTS_CHANGED);
        int differing = count("Live values that differ", differences());
        int broken = count("Requirements of inputs broken", broken());
        grid.text(verdict, 0, Look.STRONG, "Master check");
        grid.across(verdict, 1, LAST, Look.CHECK, "");
        grid.formula(
                verdict,
                1,
                Look.CHECK,
                NumberFormats.GENERAL,
                verdict(Grid.inRow(changed, 1), Grid.inRow(differing, 1), Grid.inRow(broken, 1)));
        grid.height(verdict, 30);
        layout.book().name("master_check", grid.address(verdict, 1));
        Alerts.unless(grid, new CellRangeAddress(verdict, verdict, 1, LAST), holds());
    }

    private int count(String label, String formula) {
        grid.text(row, 0, Look.TEXT, label);
        grid.formula(row, 1, Look.LIVE, "0", formula);
        return row++;
    }

    private String differences() {
        StringBuilder sum = new StringBuilder("COUNTIF("
                + layout.places().shown(ResultsSheet.CHECKS).get(0) + "," + Literals.text(Layout.DIFFERS) + ")");
        for (Table table : layout.draft().tables()) {
            for (String range : layout.places().shown(TableSheet.differences(table))) {
                sum.append("+SUM(").append(range).append(')');
            }
        }
        return sum.toString();
    }

    private String broken() {
        List<String> ranges = layout.places().shown(InputsSheet.REQUIREMENTS);
        return ranges.isEmpty() ? "0" : "COUNTIF(" + ranges.get(0) + ",\"BROKEN\")";
    }

    /** What the master check says when all is well. */
    private String holds() {
        return "The inputs are those of the fill, and all " + layout.liveValues()
                + " live values agree with the filled ones.";
    }

    private String verdict(String changed, String differing, String broken) {
        String inputs =
                "IF(" + changed + ">0,\"INPUTS CHANGED since the fill: the filled values belong to other inputs;"
                        + " fill the workbook again.\",";
        String values = "IF(" + differing + ">0,\"LIVE VALUES DIFFER from the filled ones: see the check columns.\","
                + Literals.text(holds()) + "))";
        return "IF(" + broken + ">0,\"A REQUIREMENT of the inputs is broken: see the sheet Inputs. \",\"\")&" + inputs
                + values;
    }

    private void writeHeadlines() {
        heading("Main results, live");
        for (String id : layout.draft().headlines()) {
            Outcome outcome = layout.filled().outcome(id);
            boolean isText = outcome.entry().result().isText();
            String format = isText ? NumberFormats.GENERAL : NumberFormats.of(outcome.numbers());
            Unit unit = outcome.unit();
            DraftCall call = layout.draft().calls().get(id);
            grid.text(row, 0, Look.TEXT, call == null ? id : call.label());
            grid.formula(row, 1, Look.LIVE, format, layout.places().shown(id).get(0));
            grid.text(row, 2, Look.TEXT, isText ? "" : Layout.unit(unit));
            row++;
        }
    }

    private void paragraphs(String title, List<String> sentences) {
        heading(title);
        for (String sentence : sentences) {
            grid.across(row++, 0, LAST, Look.TEXT, sentences.size() == 1 ? sentence : "\u2022 " + sentence);
        }
    }

    private void writeLegend() {
        heading("Kinds of cell");
        legend(
                Look.INPUT,
                "1.23",
                "Input: straw, in a full frame. Yours to change; all others are locked, with no password.");
        legend(Look.LIVE, "1.23", "Live value: plain, a thin line beneath. A formula; it follows the inputs.");
        legend(
                Look.FILLED,
                "1.23",
                "Filled value: mist, slanted, a dotted line beneath. What the function library gave.");
        legend(
                Look.CHECK,
                Layout.AGREES,
                "Check: bold words between two lines. Whether live and filled values agree; tinted if not.");
        legend(
                Look.WORKING,
                "1.23",
                "Working cell: small, grey, a dashed line beneath. A step of a live value; not printed.");
    }

    private void legend(Look look, String sample, String words) {
        grid.text(row, 0, look, sample);
        grid.across(row, 1, LAST, Look.TEXT, words);
        row++;
    }
}
