package org.ductledger.template;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.IntFunction;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.sheet.Literals;

/**
 * A function's cell form with the cells of one call in the place of its names, guarded so that it shows words instead of
 * an error where an argument has no value, lies outside the function's domain, or has no solution with the others.
 *
 * @param helpers formulas of the helper cells, in their order
 * @param result the formula of the result
 */
record LiveFormula(List<String> helpers, String result) {
    /** What a live cell shows where there is no value. */
    static final String NO_VALUE = "no value";

    /** What stands for an argument in a formula: a cell (an address or a name), or a literal. */
    record Operand(String text, boolean isCell) {}

    /**
     * Puts the cells in.
     *
     * @param operands in the order of the function's arguments
     * @param helperCell the address of the helper cell with this place, from 0
     */
    static LiveFormula of(FunctionEntry entry, List<Operand> operands, IntFunction<String> helperCell) {
        Map<String, String> cells = new HashMap<>();
        for (int i = 0; i < operands.size(); i++) {
            cells.put(entry.arguments().get(i).name(), operands.get(i).text());
        }
        List<String> helpers = new ArrayList<>();
        for (CellForm.Helper helper : entry.cellForm().helpers()) {
            String formula = CellForm.render(helper.formula(), cells);
            cells.put(helper.name(), helperCell.apply(helpers.size()));
            helpers.add(formula);
        }
        String result =
                "IFERROR(" + CellForm.render(entry.cellForm().formula(), cells) + "," + Literals.text(NO_VALUE) + ")";
        return new LiveFormula(helpers, guarded(entry, operands, result));
    }

    private static String guarded(FunctionEntry entry, List<Operand> operands, String formula) {
        List<String> numbers = new ArrayList<>();
        List<String> inside = new ArrayList<>();
        for (int i = 0; i < operands.size(); i++) {
            Argument argument = entry.arguments().get(i);
            String cell = operands.get(i).text();
            if (operands.get(i).isCell() && argument.isText()) {
                inside.add(cell + "<>" + Literals.text(NO_VALUE));
            } else if (operands.get(i).isCell()) {
                numbers.add(cell);
                inside.addAll(bounds(cell, argument.interval()));
            }
        }
        return ifAll(numbers, ifInside(inside, formula));
    }

    private static String ifAll(List<String> numbers, String formula) {
        return numbers.isEmpty()
                ? formula
                : "IF(COUNT(" + String.join(",", numbers) + ")<" + numbers.size() + "," + Literals.text(NO_VALUE) + ","
                        + formula + ")";
    }

    private static String ifInside(List<String> conditions, String formula) {
        return conditions.isEmpty()
                ? formula
                : "IF(AND(" + String.join(",", conditions) + ")," + formula + "," + Literals.text(NO_VALUE) + ")";
    }

    /** The conditions that a cell lies in an interval. */
    static List<String> bounds(String cell, Interval interval) {
        List<String> conditions = new ArrayList<>();
        if (!Double.isInfinite(interval.lower())) {
            conditions.add(cell + (interval.lowerTaken() ? ">=" : ">") + Literals.number(interval.lower()));
        }
        if (!Double.isInfinite(interval.upper())) {
            conditions.add(cell + (interval.upperTaken() ? "<=" : "<") + Literals.number(interval.upper()));
        }
        return conditions;
    }
}
