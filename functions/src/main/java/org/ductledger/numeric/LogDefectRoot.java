package org.ductledger.numeric;

/**
 * The roots of y - ln(1 + y) = K for K >= 0: one above 0, one between -1 and 0. A seed within 2e-5 and one step by the
 * reverted series of the equation reach rounding.
 */
public final class LogDefectRoot {
    /** Where the seed of the lower root changes: sqrt(2K) of its fit's end. */
    private static final double FIT_END = 2.5;

    /** Below this the lower root is nearer to 0 than to -1. */
    private static final double NEAR = 0.19;

    /** From here on any logarithm of the right size will do in the seed of the upper root. */
    private static final double FAR = 1000;

    private static final double FAR_LOGARITHM = 14;

    private LogDefectRoot() {}

    /** The root above 0. */
    public static double above(double defect) {
        if (defect == 0) {
            return 0;
        }
        double y = aboveSeed(Math.sqrt(2 * defect), defect);
        return y + (1 + y) * step(y, 0, defect);
    }

    /** The root y between -1 and 0; use {@link #sumBelow} where 1 + y is wanted and y may be near -1. */
    public static double below(double defect) {
        if (defect == 0) {
            return 0;
        }
        double y = belowSeed(Math.sqrt(2 * defect), defect);
        return y + (1 + y) * step(y, 0, defect);
    }

    /** 1 + y for the root y between -1 and 0. */
    public static double sumBelow(double defect) {
        if (defect < NEAR) {
            return 1 + below(defect);
        }
        double s = Math.sqrt(2 * defect);
        double sum = s > FIT_END ? sumSeed(defect) : 1 + belowSeed(s, defect);
        double y = sum - 1;
        return sum + sum * step(y, sum - (1 + y), defect);
    }

    /** y = K + ln(1 + y); the logarithm over s by a rational fit for s up to 20, rougher and rougher beyond. */
    static double aboveSeed(double s, double defect) {
        if (s > FAR) {
            return defect + FAR_LOGARITHM;
        }
        double p = 0.99999406 + s * (0.42925946 + s * 0.019348762);
        double q = 1 + s * (0.59580108 + s * (0.091247066 + s * 0.0019518324));
        return defect + s * p / q;
    }

    /** -y over s by a rational fit for s up to {@link #FIT_END}. */
    static double belowSeed(double s, double defect) {
        if (s > FIT_END) {
            return sumSeed(defect) - 1;
        }
        double p = 1.0000058 + s * (-0.46120239 + s * (0.10122836 - s * 0.0075825693));
        double q = 1 + s * (-0.12775023 + s * (0.030435801 + s * 0.0030230833));
        return -s * p / q;
    }

    /** 1 + y = E exp(1 + y), E = exp(-1 - K): the first terms of its series in E. */
    static double sumSeed(double defect) {
        double e = StrictMath.exp(-1 - defect);
        return e * (1 + e * (1 + e * 1.5));
    }

    /**
     * The relative correction of 1 + y: y ratio + ratio^2/2 - ratio^3/3 + ... = K - (y - ln(1 + y)), reverted.
     */
    private static double step(double y, double tail, double defect) {
        double inverse = 1 / y;
        double n = (defect - LogDefect.at(y, tail)) * inverse;
        double h = n * inverse;
        return n * (1 - h * (0.5 - 0.5 * h - n / 3));
    }
}
