package org.ductledger.ledger;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeMap;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.Condition;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.Numbers;
import org.ductledger.catalogue.Unit;
import org.jspecify.annotations.Nullable;

/** Gathers the faults of one call's rows: the first one found for a row stays. */
final class Faults {
    private final Plan.Step step;
    private final TreeMap<Integer, Fault> byRow = new TreeMap<>();

    Faults(Plan.Step step) {
        this.step = step;
    }

    List<Fault> list() {
        return new ArrayList<>(byRow.values());
    }

    /** Checks an argument's own values against its interval, in accepting form, so that NaN never passes. */
    void checkGiven(int place, double[] coherent, Column asGiven) {
        Argument argument = step.inputs().get(place).argument();
        double least = argument.interval().least();
        double greatest = argument.interval().greatest();
        for (int i = 0; i < coherent.length; i++) {
            if (!(coherent[i] >= least && coherent[i] <= greatest)) {
                blame(coherent, i, outside(place, given(asGiven, i)));
            }
        }
    }

    /** Checks what an earlier call gave: a row without a value, or a value outside this argument's interval. */
    void checkReferred(int place, double[] coherent, Outcome earlier) {
        Argument argument = step.inputs().get(place).argument();
        double least = argument.interval().least();
        double greatest = argument.interval().greatest();
        for (int i = 0; i < coherent.length; i++) {
            if (Double.isNaN(coherent[i])) {
                blame(coherent, i, withoutValue(argument, earlier, i));
            } else if (!(coherent[i] >= least && coherent[i] <= greatest)) {
                blame(coherent, i, outside(place, (Object) coherent[i]));
            }
        }
    }

    private static Fault withoutValue(Argument argument, Outcome earlier, int row) {
        return new Fault(
                row,
                FaultKind.BAD_REFERENCE,
                argument.name(),
                earlier.id(),
                argument.name() + " refers to " + earlier.id() + ", which has no value in this row");
    }

    private static @Nullable Object given(Column column, int row) {
        if (column instanceof Column.Texts texts) {
            return texts.values().get(row);
        }
        return ((Column.Numbers) column).values()[row];
    }

    private Fault outside(int place, @Nullable Object given) {
        Argument argument = step.inputs().get(place).argument();
        Unit unit = step.inputs().get(place).unit();
        boolean notANumber = given instanceof Double x && Double.isNaN(x);
        String shown =
                given instanceof Double x ? Numbers.brief(x) + (unit.isOne() ? "" : " " + unit) : "'" + given + "'";
        return new Fault(
                0,
                notANumber ? FaultKind.NOT_A_NUMBER : FaultKind.OUTSIDE_DOMAIN,
                argument.name(),
                notANumber ? null : given,
                argument.name() + " must be " + argument.requirement(unit) + ", got " + shown);
    }

    /** Puts a fault on a row, or on every row where a single value is spread. */
    private void blame(double[] column, int row, Fault fault) {
        boolean spread = column.length == 1 && step.rows() > 1;
        int last = spread ? step.rows() - 1 : row;
        for (int i = spread ? 0 : row; i <= last; i++) {
            byRow.putIfAbsent(i, new Fault(i, fault.kind(), fault.argument(), fault.given(), fault.detail()));
        }
    }

    /** Clears the rows that have a fault, and finds the reason for every result that is no finite number. */
    void settle(double[][] arguments, double[] result) {
        byRow.keySet().forEach(row -> result[row] = Double.NaN);
        for (int i = 0; i < result.length; i++) {
            if (!Double.isFinite(result[i]) && !byRow.containsKey(i)) {
                byRow.put(i, explain(i, row(arguments, i), result[i]));
                result[i] = Double.NaN;
            }
        }
    }

    private static double[] row(double[][] arguments, int row) {
        double[] values = new double[arguments.length];
        for (int i = 0; i < values.length; i++) {
            values[i] = arguments[i][arguments[i].length == 1 ? 0 : row];
        }
        return values;
    }

    private Fault explain(int row, double[] arguments, double result) {
        for (Condition condition : step.entry().conditions()) {
            if (!condition.holds().test(arguments)) {
                return broken(row, condition, arguments);
            }
        }
        if (Double.isNaN(result)) {
            return new Fault(
                    row,
                    FaultKind.NOT_CONVERGED,
                    null,
                    null,
                    step.entry().name() + " did not reach its accuracy for these arguments");
        }
        return new Fault(
                row,
                FaultKind.OUTSIDE_DOMAIN,
                null,
                null,
                step.entry().name() + " must stay within the range of a double (about 1.8e308), and is larger here");
    }

    private Fault broken(int row, Condition condition, double[] arguments) {
        int place = step.entry().place(condition.argument());
        Plan.Input input = step.inputs().get(place);
        Argument argument = input.argument();
        double coherent = arguments[place];
        Unit own = argument.unit();
        Object given = argument.isText()
                ? argument.choices().get((int) coherent)
                : (Object) input.unit().fromCoherent(coherent);
        String shown = argument.isText()
                ? argument.choices().get((int) coherent)
                : Numbers.brief(coherent) + (own.isOne() ? "" : " " + own);
        return new Fault(
                row,
                condition.kind(),
                argument.name(),
                given,
                argument.name() + " " + condition.wording().of(arguments) + ", got " + shown);
    }
}
