package org.ductledger.ledger;

import java.util.Arrays;
import java.util.stream.IntStream;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;

/**
 * Computes one step's column, block by block. A block whose rows are all sound costs its kernel and one look at each
 * number; only in the others are the rows told apart.
 */
final class Rows {
    /** From this many rows on, the blocks are computed on all processors. */
    private static final int PARALLEL_ROWS = 16_384;

    private static final int BLOCK_ROWS = 8_192;

    private final Step step;
    private final double[][] arguments;
    private final Faults faults;
    private final double[] result;

    /**
     * A step's rows.
     *
     * @param arguments a column each in coherent units: one value, or one a row
     * @param faults takes the rows without a result
     */
    Rows(Step step, double[][] arguments, Faults faults) {
        this.step = step;
        this.arguments = arguments;
        this.faults = faults;
        result = new double[step.rows()];
    }

    /** The result in coherent units; NaN in the rows with a fault. */
    double[] compute() {
        for (int i = 0; i < arguments.length; i++) {
            if (arguments[i].length == 1) {
                faults.check(i, arguments[i], 0, 1);
            }
        }
        if (!faults.isEmpty()) {
            Arrays.fill(result, Double.NaN);
            return result;
        }
        boolean[] sound = new boolean[(result.length + BLOCK_ROWS - 1) / BLOCK_ROWS];
        IntStream blocks = IntStream.range(0, sound.length);
        (result.length < PARALLEL_ROWS ? blocks : blocks.parallel())
                .forEach(block -> sound[block] = computeSound(block * BLOCK_ROWS, end(block)));
        for (int block = 0; block < sound.length; block++) {
            if (!sound[block]) {
                computeAround(block * BLOCK_ROWS, end(block));
            }
        }
        return result;
    }

    private int end(int block) {
        return Math.min(result.length, (block + 1) * BLOCK_ROWS);
    }

    /** Computes a block, unless a row is outside its domain; whether every row has a result. */
    private boolean computeSound(int from, int to) {
        for (int i = 0; i < arguments.length; i++) {
            Interval interval = step.inputs().get(i).argument().interval();
            if (arguments[i].length > 1
                    && !Soundness.allWithin(interval.least(), interval.greatest(), arguments[i], from, to)) {
                return false;
            }
        }
        step.entry().kernel().apply(arguments, from, to, result);
        return Soundness.allFinite(result, from, to);
    }

    /** Computes a block's sound rows alone: a kernel is never asked outside its domain. */
    private void computeAround(int from, int to) {
        for (int i = 0; i < arguments.length; i++) {
            if (arguments[i].length > 1) {
                faults.check(i, arguments[i], from, to);
            }
        }
        int[] rows = faults.soundRows(from, to);
        double[] computed = computed(step.entry().kernel(), rows);
        Arrays.fill(result, from, to, Double.NaN);
        for (int i = 0; i < rows.length; i++) {
            result[rows[i]] = computed[i];
        }
        faults.settle(arguments, result, from, to);
    }

    private double[] computed(Kernel kernel, int[] rows) {
        double[][] some = new double[arguments.length][];
        for (int i = 0; i < some.length; i++) {
            double[] all = arguments[i];
            some[i] = all.length == 1
                    ? all
                    : Arrays.stream(rows).mapToDouble(row -> all[row]).toArray();
        }
        double[] computed = new double[rows.length];
        kernel.apply(some, 0, rows.length, computed);
        return computed;
    }
}
