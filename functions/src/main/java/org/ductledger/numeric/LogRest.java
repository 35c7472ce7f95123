package org.ductledger.numeric;

/** What a logarithm leaves beyond its first term: the partial derivatives with respect to gamma are made of it. */
public final class LogRest {
    /** Below this |q| the series is summed: its 26 terms reach the last digit. */
    private static final double SERIES_REACH = 0.25;

    private static final int SERIES_TERMS = 26;

    private LogRest() {}

    /** (log(1 + z) - q) / q^2 with q = z / (1 + z), for z &gt; -1: 1/2 at z = 0. */
    public static double of(double z) {
        double q = z / (1 + z);
        if (Math.abs(q) >= SERIES_REACH) {
            return (StrictMath.log1p(z) - q) / (q * q);
        }
        double sum = 0;
        for (int n = SERIES_TERMS + 1; n >= 2; n--) {
            sum = sum * q + 1.0 / n;
        }
        return sum;
    }
}
