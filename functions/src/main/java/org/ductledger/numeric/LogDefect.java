package org.ductledger.numeric;

import java.math.BigDecimal;
import java.math.MathContext;

/**
 * y - ln(1 + y): by how much the logarithm falls short of its argument. It is near y^2/2 about 0, where the plain
 * difference loses every digit; this one keeps them. Made of IEEE operations alone: the same bits everywhere.
 *
 * <p>1 + y = 2^e (1 + w), with e = 0 from 1/2 to 2. With c from a table near 1/(1 + w), r = c (1 + w) - 1 is small, and
 * w - ln(1 + w) = (1 - c) w + ((1 - c) + ln c) + (r - ln(1 + r)), in which each term is of the size of the sum.
 */
public final class LogDefect {
    private static final int BINS_AN_OCTAVE = 128;
    private static final int BIN_SHIFT = 45;
    private static final long ONE = 0x3FF0_0000_0000_0000L;

    /** The bits where the first bin begins, half a bin below 1/2, so that 1 lies inside the middle bin. */
    private static final long FIRST = ONE - (1L << 52) - (1L << (BIN_SHIFT - 1));

    /** Each c has 9 bits after the point. */
    private static final double STEPS_OF_C = 512;

    /** ln 2: its leading bits, with room for an exact product with e, and the rest. */
    private static final double LN2_HEAD = 0x1.62e42feep-1;

    private static final double LN2_TAIL = 0x1.a39ef35793c76p-33;

    /** For each bin c and (1 - c) + ln c. */
    private static final double[] TABLE = table();

    private LogDefect() {}

    /** y - ln(1 + y), y > -1. */
    public static double of(double y) {
        return at(y, 0);
    }

    /** y - ln(1 + y) for y = (n + nTail) / (d + dTail), d + dTail > 0; of the tails only dTail must be small. */
    public static double ofQuotient(double n, double nTail, double d, double dTail) {
        double sum = n + nTail;
        double rest = (n - sum) + nTail;
        double inverse = 1 / d;
        double y = sum * inverse;
        return at(y, (Math.fma(-y, d, sum) + (rest - y * dTail)) * inverse);
    }

    /** y - ln(1 + y) for y = head + tail > -1: where y is a difference or nears -1, its tail counts. */
    public static double at(double head, double tail) {
        double near = 1 + head;
        double sum = near + tail;
        double lost = ((near - sum) + tail) + (head > 1 ? 1 - (near - head) : head - (near - 1));
        long bits = Double.doubleToRawLongBits(sum);
        long octave = (bits - FIRST) >> 52;
        long e = octave == 1 ? 0 : octave;
        long mantissa = bits - (e << 52);
        int row = 2 * (int) ((mantissa - FIRST) >> BIN_SHIFT);
        double c = TABLE[row];
        double d = 1 - c;
        double w = e == 0 ? head : Double.longBitsToDouble(mantissa) - 1;
        double wTail = e == 0 ? tail : lost * Double.longBitsToDouble(ONE - (e << 52));
        double r = c * w - d;
        double rest = (tail - wTail * (c * (1 - r))) - e * LN2_TAIL;
        return ((head - w) - e * LN2_HEAD) + ((d * w + TABLE[row + 1]) + (bend(r) + rest));
    }

    /** r - ln(1 + r) for |r| < 2^-7. */
    private static double bend(double r) {
        return r
                * r
                * (1 / 2.0 - r * (1 / 3.0 - r * (1 / 4.0 - r * (1 / 5.0 - r * (1 / 6.0 - r * (1 / 7.0 - r / 8))))));
    }

    private static double[] table() {
        double[] rows = new double[2 * (2 * BINS_AN_OCTAVE + 1)];
        for (int bin = 0; bin <= 2 * BINS_AN_OCTAVE; bin++) {
            double c = bin == BINS_AN_OCTAVE ? 1 : Math.rint(STEPS_OF_C / centre(bin)) / STEPS_OF_C;
            rows[2 * bin] = c;
            rows[2 * bin + 1] = -defectInDecimals(c - 1);
        }
        return rows;
    }

    private static double centre(int bin) {
        long begin = FIRST + ((long) bin << BIN_SHIFT);
        return 0.5 * (Double.longBitsToDouble(begin) + Double.longBitsToDouble(begin + (1L << BIN_SHIFT)));
    }

    /** y - 2 (s + s^3/3 + s^5/5 + ...), s = y/(2 + y), for the |y| <= 1 of the table. */
    private static double defectInDecimals(double y) {
        MathContext digits = new MathContext(40);
        BigDecimal exact = new BigDecimal(y);
        BigDecimal s = exact.divide(exact.add(BigDecimal.valueOf(2)), digits);
        BigDecimal square = s.multiply(s, digits);
        BigDecimal sum = BigDecimal.ZERO;
        BigDecimal power = s;
        for (int n = 1; n < 80; n += 2) {
            sum = sum.add(power.divide(BigDecimal.valueOf(n), digits), digits);
            power = power.multiply(square, digits);
        }
        return exact.subtract(sum.add(sum)).doubleValue();
    }
}
