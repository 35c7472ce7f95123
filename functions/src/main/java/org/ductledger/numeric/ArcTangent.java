package org.ductledger.numeric;

import java.math.BigDecimal;
import java.math.MathContext;

/**
 * The arc tangent in IEEE arithmetic alone: the same bits on every machine, within 0.52 ulp, and faster than a library
 * call. And its lag behind its argument, x - atan x, which is all that is left of a Prandtl-Meyer angle near M = 1.
 *
 * <p>Method: t is x rounded to six significant bits; atan x = atan t + atan r, r = (x-t)/(1+xt), |r| &lt; 1/64; the first
 * from a table, the second from its series.
 */
public final class ArcTangent {
    private static final double SMALL = 0x1p-6;
    private static final double LARGE = 0x1p6;
    private static final int DROPPED_BITS = 47;
    private static final long HALF = 1L << (DROPPED_BITS - 1);
    private static final int FIRST = cell(SMALL);
    private static final double HALF_PI = 0x1.921fb54442d18p+0;
    private static final double HALF_PI_REST = 0x1.1a62633145c07p-54;

    /** For each t: atan t, what its double leaves over, and t - atan t. */
    private static final double[] TABLE = table();

    private static final int WIDTH = 4;

    private ArcTangent() {}

    /** atan x in radians, for x &gt;= 0; NaN of NaN. */
    public static double of(double x) {
        if (!(x >= SMALL)) {
            return x - small(x);
        }
        if (x >= LARGE) {
            double u = 1 / x;
            return HALF_PI - (u - (small(u) + HALF_PI_REST));
        }
        long bits = Double.doubleToRawLongBits(x) + HALF;
        int at = ((int) (bits >>> DROPPED_BITS) - FIRST) * WIDTH;
        double t = Double.longBitsToDouble(bits >>> DROPPED_BITS << DROPPED_BITS);
        double r = (x - t) / (1 + x * t);
        return TABLE[at] + (r + (TABLE[at + 1] - small(r)));
    }

    /** x - atan x in radians, for x &gt;= 0: to the last digits however small x is. */
    public static double lag(double x) {
        if (!(x >= SMALL)) {
            return small(x);
        }
        if (x >= LARGE) {
            return x - of(x);
        }
        long bits = Double.doubleToRawLongBits(x) + HALF;
        int at = ((int) (bits >>> DROPPED_BITS) - FIRST) * WIDTH;
        double t = Double.longBitsToDouble(bits >>> DROPPED_BITS << DROPPED_BITS);
        double r = (x - t) / (1 + x * t);
        return TABLE[at + 2] + (r * (x * t) + small(r));
    }

    /** x - atan x for |x| &lt;= 1/64, by its series. */
    private static double small(double x) {
        double q = x * x;
        return x * q * (1.0 / 3 - q * (1.0 / 5 - q * (1.0 / 7 - q * (1.0 / 9 - q * (1.0 / 11)))));
    }

    private static int cell(double t) {
        return (int) (Double.doubleToRawLongBits(t) >>> DROPPED_BITS);
    }

    private static double[] table() {
        int last = cell(LARGE);
        double[] table = new double[(last - FIRST + 1) * 4];
        BigDecimal t = new BigDecimal(SMALL);
        BigDecimal angle = series(t);
        for (int cell = FIRST; cell <= last; cell++) {
            int at = (cell - FIRST) * 4;
            table[at] = angle.doubleValue();
            table[at + 1] = angle.subtract(new BigDecimal(table[at])).doubleValue();
            table[at + 2] = t.subtract(angle).doubleValue();
            BigDecimal next = new BigDecimal(Double.longBitsToDouble((long) (cell + 1) << DROPPED_BITS));
            BigDecimal between = next.subtract(t).divide(next.multiply(t).add(BigDecimal.ONE), MathContext.DECIMAL128);
            angle = angle.add(series(between), MathContext.DECIMAL128);
            t = next;
        }
        return table;
    }

    /** The arc tangent by its series, to 32 digits for x &lt;= 1/64. */
    private static BigDecimal series(BigDecimal x) {
        BigDecimal square = x.multiply(x, MathContext.DECIMAL128);
        BigDecimal sum = BigDecimal.ZERO;
        for (int n = 19; n >= 1; n -= 2) {
            sum = BigDecimal.ONE
                    .divide(BigDecimal.valueOf(n), MathContext.DECIMAL128)
                    .subtract(square.multiply(sum, MathContext.DECIMAL128), MathContext.DECIMAL128);
        }
        return x.multiply(sum, MathContext.DECIMAL128);
    }
}
