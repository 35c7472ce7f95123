package org.ductledger.catalogue;

/**
 * A partial derivative by differences, extrapolated to step 0 (C. J. F. Ridders, Accurate computation of F'(x) and
 * F'(x)F''(x), Advances in Engineering Software 4, 1982): about ten digits where the function is smooth.
 */
final class Differences {
    private static final int LEVELS = 14;

    private final Kernel kernel;
    private final int place;
    private final double[] row;

    private double best = Double.NaN;
    private double leastError = Double.POSITIVE_INFINITY;

    /** The derivative of a kernel by the argument at this place, at this row. */
    Differences(Kernel kernel, int place, double[] row) {
        this.kernel = kernel;
        this.place = place;
        this.row = row;
    }

    /** The best of the central and the one-sided estimates; no step leaves the interval. NaN where there is none. */
    double within(Interval interval) {
        double x = row[place];
        double most = 0.25 * Math.max(1, Math.abs(x));
        double below = Math.min(most, 0.5 * (x - interval.least()));
        double above = Math.min(most, 0.5 * (interval.greatest() - x));
        extrapolate(Math.min(below, above), true);
        extrapolate(above, false);
        extrapolate(-below, false);
        return best;
    }

    /** How far the estimates that led to the last answer lie apart; infinite before there is one. */
    double error() {
        return leastError;
    }

    /** Halves the step level by level and keeps the estimate on which its neighbours agree best. */
    private void extrapolate(double firstStep, boolean central) {
        double[][] table = new double[LEVELS][LEVELS];
        double step = firstStep;
        double ulp = Math.ulp(kernel.at(row));
        for (int i = 0; i < LEVELS && step != 0; i++, step /= 2) {
            table[i][0] = quotient(step, central);
            double rounding = ulp / Math.abs(step);
            double factor = 1;
            for (int j = 1; j <= i; j++) {
                factor *= central ? 4 : 2;
                double finer = table[i][j - 1];
                double coarser = table[i - 1][j - 1];
                table[i][j] = finer + (finer - coarser) / (factor - 1);
                double spread = Math.max(Math.abs(table[i][j] - finer), Math.abs(table[i][j] - coarser));
                keep(table[i][j], spread + rounding);
            }
        }
    }

    private void keep(double estimate, double error) {
        if (error < leastError) {
            leastError = error;
            best = estimate;
        }
    }

    private double quotient(double step, boolean central) {
        double x = row[place];
        double from = central ? x - step : x;
        double to = x + step;
        return (at(to) - at(from)) / (to - from);
    }

    private double at(double x) {
        double[] moved = row.clone();
        moved[place] = x;
        return kernel.at(moved);
    }
}
