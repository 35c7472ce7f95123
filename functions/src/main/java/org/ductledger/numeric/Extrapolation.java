package org.ductledger.numeric;

/**
 * Integrates a small system of ordinary differential equations: Gragg's modified midpoint rule with 2, 4, ... steps, the
 * results extrapolated to none (Bulirsch and Stoer; Hairer, Norsett and Wanner, Solving Ordinary Differential Equations
 * I, 1993, section II.9), with a step that follows the error of each unknown relative to itself. One for each run; not
 * for several threads.
 */
public final class Extrapolation {
    /** The system: the slopes of the unknowns towards the end. */
    @FunctionalInterface
    public interface Slopes {
        void at(double left, double[] unknowns, double[] slopes);
    }

    /** The extrapolated result is of order 16 in the step. */
    private static final int COLUMNS = 8;

    private static final double EXPONENT = 1.0 / (2 * COLUMNS - 1);
    private static final int MOST_STEPS = 5_000;
    private static final double LEAST_SCALE = 0.2;
    private static final double MOST_SCALE = 4;
    private static final double CAUTION = 0.9;

    private final Slopes system;
    private final double tolerance;
    private final int size;
    private final double[] start;
    private final double[] slopes;
    private final double[] before;
    private final double[] now;
    private final double[] fresh;
    private final double[][] table;

    /**
     * An integrator.
     *
     * @param size the number of unknowns, none of which may pass through zero
     * @param tolerance the error of a step, relative to each unknown
     */
    public Extrapolation(Slopes system, int size, double tolerance) {
        this.system = system;
        this.size = size;
        this.tolerance = tolerance;
        start = new double[size];
        slopes = new double[size];
        before = new double[size];
        now = new double[size];
        fresh = new double[size];
        table = new double[COLUMNS][size];
    }

    /**
     * Follows the unknowns to the end.
     *
     * @param length how far the end is
     * @param firstStep a guess
     * @return whether it got there
     */
    public boolean run(double[] unknowns, double length, double firstStep) {
        double left = length;
        double step = firstStep;
        for (int i = 0; i < MOST_STEPS && left > 0; i++) {
            step = Math.min(step, left);
            system.at(left, unknowns, start);
            for (int row = 0; row < COLUMNS; row++) {
                midpoint(left, unknowns, step / (2 * (row + 1)), 2 * (row + 1));
                extrapolate(row);
            }
            double error = error();
            if (error <= tolerance) {
                System.arraycopy(table[COLUMNS - 1], 0, unknowns, 0, size);
                left = step == left ? 0 : left - step;
            }
            step *= scale(error);
        }
        return left <= 0;
    }

    private void midpoint(double left, double[] unknowns, double h, int steps) {
        for (int i = 0; i < size; i++) {
            before[i] = unknowns[i];
            now[i] = unknowns[i] + h * start[i];
        }
        for (int k = 1; k < steps; k++) {
            system.at(left - k * h, now, slopes);
            for (int i = 0; i < size; i++) {
                double next = before[i] + 2 * h * slopes[i];
                before[i] = now[i];
                now[i] = next;
            }
        }
        system.at(Math.max(0, left - steps * h), now, slopes);
        for (int i = 0; i < size; i++) {
            fresh[i] = 0.5 * (before[i] + now[i] + h * slopes[i]);
        }
    }

    /** Puts a new row of Neville's scheme in the place of the last one. */
    private void extrapolate(int row) {
        for (int i = 0; i < size; i++) {
            double value = fresh[i];
            for (int column = 0; column < row; column++) {
                double last = table[column][i];
                table[column][i] = value;
                double ratio = (row + 1.0) / (row - column);
                value += (value - last) / (ratio * ratio - 1);
            }
            table[row][i] = value;
        }
    }

    private double error() {
        double error = 0;
        for (int i = 0; i < size; i++) {
            double best = table[COLUMNS - 1][i];
            error = Math.max(error, Math.abs((best - table[COLUMNS - 2][i]) / best));
        }
        return error;
    }

    /** By how much the next step is longer; a step that failed altogether gives NaN, and is shortened. */
    private double scale(double error) {
        double wanted = CAUTION * StrictMath.pow(tolerance / error, EXPONENT);
        return wanted >= LEAST_SCALE ? Math.min(MOST_SCALE, wanted) : LEAST_SCALE;
    }
}
