package org.ductledger.template;

import java.util.ArrayList;
import java.util.List;
import org.apache.poi.ss.usermodel.DataValidation;
import org.apache.poi.ss.usermodel.DataValidationConstraint;
import org.apache.poi.ss.usermodel.DataValidationHelper;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.ss.util.CellRangeAddressList;
import org.ductledger.catalogue.Unit;
import org.ductledger.ledger.Column;
import org.ductledger.sheet.Alerts;
import org.ductledger.sheet.Grid;
import org.ductledger.sheet.Literals;
import org.ductledger.sheet.Look;
import org.ductledger.sheet.NumberFormats;
import org.ductledger.template.TemplateInput.Kind;

/** The sheet {@code Inputs}: what the user may change, what is admissible, and the value in coherent units beside it. */
final class InputsSheet {
    static final String NAME = "Inputs";

    private static final String[] HEADS = {
        "Quantity",
        "Symbol",
        "Value",
        "Unit",
        "Admissible",
        "Now",
        "Factor to SI",
        "SI value",
        "SI unit",
        "Name of the SI cell",
        "Meaning"
    };
    private static final String IN_RANGE = "in range";
    private static final String HOLDS = "holds";
    private static final int LABEL = 0;
    private static final int SYMBOL = 1;
    private static final int VALUE = 2;
    private static final int UNIT = 3;
    private static final int RANGE = 4;
    private static final int STATE = 5;
    private static final int FACTOR = 6;
    private static final int COHERENT = 7;
    private static final int COHERENT_UNIT = 8;
    private static final int CELL_NAME = 9;
    private static final int MEANING = 10;

    private final Layout layout;
    private final Grid grid;
    private int row = 3;

    private InputsSheet(Layout layout, Grid grid) {
        this.layout = layout;
        this.grid = grid;
    }

    static void write(Layout layout, Grid grid) {
        new InputsSheet(layout, grid).write();
    }

    private void write() {
        grid.widths(32, 8, 14, 15, 33, 14, 16, 14, 11, 20, 60);
        Layout.head(grid, "Inputs", MEANING);
        grid.heads(row, LABEL, Look.COLUMN_HEAD, HEADS);
        row++;
        int first = row;
        for (TemplateInput input : layout.template().inputs()) {
            if (input.kind() != Kind.REMARK && layout.draft().has(input.name())) {
                write(input);
            }
        }
        writeRequirements();
        Alerts.unless(grid, new CellRangeAddress(first, row - 1, STATE, STATE), IN_RANGE, HOLDS);
        grid.poi().createFreezePane(0, 4);
        layout.page().applyToOnePage(grid, true, "$A$1:$K$" + row);
    }

    private void write(TemplateInput input) {
        List<String> shown = new ArrayList<>();
        List<String> held = new ArrayList<>();
        for (int i = 0; i < input.rows(); i++) {
            write(input, i);
            shown.add(grid.address(row, VALUE));
            held.add(grid.address(row, COHERENT));
            row++;
        }
        layout.places().show(input.name(), shown);
        layout.places().hold(input.name(), held);
    }

    private void write(TemplateInput input, int i) {
        boolean isColumn = !input.rowNames().isEmpty();
        Unit unit = input.unit(layout.draft().inputs().units());
        grid.text(
                row,
                LABEL,
                Look.TEXT,
                input.label() + (isColumn ? ": " + input.rowNames().get(i) : ""));
        grid.text(row, SYMBOL, Look.CENTRED, input.symbol());
        grid.text(row, UNIT, Look.TEXT, Layout.unit(unit));
        grid.text(row, RANGE, Look.TEXT, requirement(input, unit));
        grid.text(row, MEANING, Look.NOTE, i == 0 ? input.meaning() + alternatives(input) : "");
        if (layout.draft().inputs().get(input.name()).column() instanceof Column.Texts texts) {
            writeWord(input, String.valueOf(texts.values().get(i)));
        } else {
            Column.Numbers numbers =
                    (Column.Numbers) layout.draft().inputs().get(input.name()).column();
            writeNumber(input, unit, numbers.values()[i]);
        }
        String name = isColumn ? Cells.name(layout.draft(), input.name(), i) : Cells.name(layout.draft(), input.name());
        grid.text(row, CELL_NAME, Look.TEXT, name);
        layout.book().name(name, grid.address(row, COHERENT));
    }

    private static String requirement(TemplateInput input, Unit unit) {
        return input.kind() == Kind.WORD
                ? "one of " + String.join(", ", input.choices())
                : input.interval().inWords(unit);
    }

    private String alternatives(TemplateInput input) {
        List<String> others = layout.template().inputs().stream()
                .filter(other -> !input.group().isEmpty() && other.group().equals(input.group()))
                .filter(other -> !other.name().equals(input.name()))
                .map(TemplateInput::name)
                .toList();
        return others.isEmpty() ? "" : "; given instead of " + String.join(", ", others);
    }

    private void writeNumber(TemplateInput input, Unit unit, double value) {
        String cell = Grid.inRow(row, VALUE);
        String factor = Grid.inRow(row, FACTOR);
        grid.number(row, VALUE, Look.INPUT, NumberFormats.GENERAL, value);
        grid.number(row, FACTOR, Look.CENTRED, NumberFormats.GENERAL, unit.scale());
        grid.text(row, COHERENT_UNIT, Look.TEXT, Layout.unit(unit.coherent()));
        List<String> bounds = LiveFormula.bounds(cell + "*" + factor, input.interval());
        String inside = bounds.isEmpty() ? "TRUE()" : "AND(" + String.join(",", bounds) + ")";
        String admissible = "IF(ISNUMBER(" + cell + ")," + inside + ",FALSE())";
        hold(
                admissible,
                cell + "*" + factor,
                NumberFormats.of(input.coherent().isOne() ? value : unit.toCoherent(value)));
        validate(input, unit, helper().createCustomConstraint(admissible));
    }

    private void writeWord(TemplateInput input, String word) {
        String cell = Grid.inRow(row, VALUE);
        grid.text(row, VALUE, Look.INPUT, word);
        grid.text(row, FACTOR, Look.TEXT, "");
        List<String> conditions = input.choices().stream()
                .map(choice -> cell + "=" + Literals.text(choice))
                .toList();
        hold("OR(" + String.join(",", conditions) + ")", cell, NumberFormats.GENERAL);
        validate(
                input,
                Unit.ONE,
                helper().createExplicitListConstraint(input.choices().toArray(new String[0])));
    }

    private void hold(String admissible, String value, String format) {
        grid.formula(
                row,
                COHERENT,
                Look.LIVE,
                format,
                "IF(" + admissible + "," + value + "," + Literals.text(LiveFormula.NO_VALUE) + ")");
        grid.formula(
                row,
                STATE,
                Look.CHECK,
                NumberFormats.GENERAL,
                "IF(" + admissible + "," + Literals.text(IN_RANGE) + ",\"OUT OF RANGE\")");
    }

    private DataValidationHelper helper() {
        return grid.poi().getDataValidationHelper();
    }

    private void validate(TemplateInput input, Unit unit, DataValidationConstraint constraint) {
        DataValidation validation =
                helper().createValidation(constraint, new CellRangeAddressList(row, row, VALUE, VALUE));
        String required = input.label() + " must be " + requirement(input, unit) + ".";
        validation.setErrorStyle(DataValidation.ErrorStyle.STOP);
        validation.setEmptyCellAllowed(false);
        validation.setShowErrorBox(true);
        validation.createErrorBox("Not admissible", required);
        validation.setShowPromptBox(true);
        validation.createPromptBox(input.label(), required);
        validation.setSuppressDropDownArrow(true);
        grid.poi().addValidationData(validation);
    }

    private void writeRequirements() {
        if (layout.draft().requirements().isEmpty()) {
            return;
        }
        row++;
        grid.across(row, LABEL, MEANING, Look.HEADING, "What the inputs must fulfil together");
        row++;
        int first = row;
        for (Draft.Requirement requirement : layout.draft().requirements()) {
            String lesser = Cells.single(layout.draft(), requirement.lesser()).text();
            String greater = Cells.single(layout.draft(), requirement.greater()).text();
            grid.across(row, LABEL, RANGE, Look.TEXT, requirement.words());
            grid.formula(
                    row,
                    STATE,
                    Look.CHECK,
                    NumberFormats.GENERAL,
                    "IF(COUNT(" + lesser + "," + greater + ")<2,\"BROKEN\",IF(" + lesser + "<" + greater + ","
                            + Literals.text(HOLDS) + ",\"BROKEN\"))");
            row++;
        }
        layout.places().show(REQUIREMENTS, List.of(grid.range(first, row - 1, STATE)));
    }

    /** Where the states of the requirements stand among the places. */
    static final String REQUIREMENTS = "requirements";
}
