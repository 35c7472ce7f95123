package org.ductledger.ledger;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.Condition;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.Numbers;
import org.ductledger.catalogue.Unit;
import org.jspecify.annotations.Nullable;

/** Gathers the faults of one call's rows: the first one found for a row stays. */
final class Faults {
    private final Step step;
    private final BitSet faulty = new BitSet();
    private final List<Fault> found = new ArrayList<>();

    Faults(Step step) {
        this.step = step;
    }

    boolean isEmpty() {
        return found.isEmpty();
    }

    /** The faults in the order of their rows. */
    List<Fault> list() {
        found.sort(Comparator.comparingInt(Fault::row));
        return List.copyOf(found);
    }

    /** The rows of a block without a fault, in order. */
    int[] soundRows(int from, int to) {
        return IntStream.range(from, to).filter(row -> !faulty.get(row)).toArray();
    }

    /** Checks rows of an argument's column against its interval, in accepting form, so that NaN never passes. */
    void check(int place, double[] coherent, int from, int to) {
        Argument argument = step.inputs().get(place).argument();
        double least = argument.interval().least();
        double greatest = argument.interval().greatest();
        for (int i = from; i < to; i++) {
            if (!(coherent[i] >= least && coherent[i] <= greatest)) {
                blame(coherent, i, outside(place, coherent[i], i));
            }
        }
    }

    private Fault outside(int place, double coherent, int row) {
        Step.Input input = step.inputs().get(place);
        Step earlier = input.earlier();
        String name = input.argument().name();
        if (earlier != null && Double.isNaN(coherent)) {
            String id = earlier.call().id();
            String detail = name + " refers to " + id + ", which has no value in this row";
            return new Fault(row, FaultKind.BAD_REFERENCE, name, id, detail);
        }
        Object given = given(input, coherent, row);
        boolean notANumber = given instanceof Double x && Double.isNaN(x);
        return new Fault(
                row,
                notANumber ? FaultKind.NOT_A_NUMBER : FaultKind.OUTSIDE_DOMAIN,
                name,
                notANumber ? null : given,
                name + " must be " + input.argument().requirement(input.unit()) + ", got " + shown(input, given));
    }

    /** What stands in the ledger for this row, as it was given; a referred value in its coherent unit. */
    private static @Nullable Object given(Step.Input input, double coherent, int row) {
        Given.Values values = input.values();
        if (values != null) {
            int own = values.column().rows() == 1 ? 0 : row;
            return values.column() instanceof Column.Texts texts
                    ? texts.values().get(own)
                    : (Object) ((Column.Numbers) values.column()).values()[own];
        }
        return input.argument().isText() ? input.argument().choices().get((int) coherent) : (Object) coherent;
    }

    private static String shown(Step.Input input, @Nullable Object given) {
        String text = given instanceof Double x ? Numbers.brief(x) + suffix(input.unit()) : "'" + given + "'";
        Step earlier = input.earlier();
        return earlier == null ? text : text + " from " + earlier.call().id();
    }

    private static String suffix(Unit unit) {
        return unit.isOne() ? "" : " " + unit;
    }

    /** Puts a fault on a row, or on every row where a single value is spread. */
    private void blame(double[] column, int row, Fault fault) {
        boolean spread = column.length == 1;
        int end = spread ? step.rows() : row + 1;
        for (int i = spread ? 0 : row; i < end; i++) {
            add(new Fault(i, fault.kind(), fault.argument(), fault.given(), fault.detail()));
        }
    }

    private void add(Fault fault) {
        if (!faulty.get(fault.row())) {
            faulty.set(fault.row());
            found.add(fault);
        }
    }

    /** Finds the reason for every result of a block's sound rows that is no finite number, and clears it. */
    void settle(double[][] arguments, double[] result, int from, int to) {
        for (int i = from; i < to; i++) {
            if (!Double.isFinite(result[i]) && !faulty.get(i)) {
                add(explain(i, row(arguments, i), result[i]));
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
            String detail = step.entry().name() + " did not reach its accuracy for these arguments";
            return new Fault(row, FaultKind.NOT_CONVERGED, null, null, detail);
        }
        return beyondDouble(row, step.entry().result().unit());
    }

    private Fault broken(int row, Condition condition, double[] arguments) {
        int place = step.entry().place(condition.argument());
        Step.Input input = step.inputs().get(place);
        Object given = given(input, arguments[place], row);
        String inCoherent = input.unit().isCoherent()
                ? ""
                : " = " + Numbers.brief(arguments[place])
                        + suffix(input.argument().unit());
        return new Fault(
                row,
                condition.kind(),
                condition.argument(),
                given,
                condition.argument() + " " + condition.wording().of(arguments) + ", got " + shown(input, given)
                        + inCoherent);
    }

    /** A result that is finite in its coherent unit but not in the unit wanted. */
    void addBeyondDouble(int row) {
        add(beyondDouble(row, step.unit()));
    }

    private Fault beyondDouble(int row, Unit unit) {
        String detail = step.entry().name() + " must stay within the range of a double (about 1.8e308)"
                + (unit.isOne() ? "" : " in " + unit) + ", and is larger here";
        return new Fault(row, FaultKind.OUTSIDE_DOMAIN, null, null, detail);
    }
}
