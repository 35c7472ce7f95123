package org.ductledger.template;

import org.ductledger.ledger.Column;
import org.ductledger.record.RecordedArgument.FromCall;
import org.ductledger.record.RecordedArgument.FromQuantity;
import org.ductledger.record.RecordedArgument.FromRows;
import org.ductledger.record.RecordedArgument.Row;
import org.ductledger.sheet.Literals;
import org.ductledger.template.LiveFormula.Operand;

/** What stands in formulas for single quantities: the name of the cell that holds it in its coherent unit, or a literal. */
final class Cells {
    private Cells() {}

    /** The name of a single quantity's cell; a name that is also a function's would hide the function. */
    static String name(Draft draft, String quantity) {
        return draft.catalogue().find(quantity).isPresent() ? quantity + "_given" : quantity;
    }

    /** The name of one cell of an input that is a column, by its row from 0. */
    static String name(Draft draft, String quantity, int row) {
        return name(draft, quantity + "_" + (row + 1));
    }

    /** What stands for a single value in formulas. */
    static Operand single(Draft draft, Term term) {
        if (term.origin() instanceof FromCall call) {
            return new Operand(name(draft, call.id()), true);
        }
        return term.origin() instanceof FromRows from
                ? single(draft, from.rows().get(0))
                : single(draft, new Row(((FromQuantity) term.origin()).quantity(), 0));
    }

    /** What stands for one row of a quantity in formulas. */
    static Operand single(Draft draft, Row row) {
        Column constant = draft.constants().get(row.quantity());
        if (constant instanceof Column.Numbers numbers) {
            return new Operand(Literals.number(numbers.values()[row.row()]), false);
        }
        if (constant instanceof Column.Texts texts) {
            return new Operand(Literals.text(String.valueOf(texts.values().get(row.row()))), false);
        }
        return new Operand(
                draft.inputs().get(row.quantity()).spread()
                        ? name(draft, row.quantity())
                        : name(draft, row.quantity(), row.row()),
                true);
    }
}
