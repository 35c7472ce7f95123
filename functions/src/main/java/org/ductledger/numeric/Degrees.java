package org.ductledger.numeric;

import java.math.BigDecimal;
import java.math.MathContext;

/**
 * Angles in degrees: sine, cosine and tangent of a first-quadrant angle, and the angle of a cotangent, in IEEE
 * arithmetic alone and within 1.5, 1.5, 3 and 2.5 ulp.
 *
 * <p>Method: a table of the whole degrees' sines, and the series for the rest of at most half a degree.
 */
public final class Degrees {
    /** One degree in radians, and what its double leaves over. */
    private static final double DEGREE = 0x1.1df46a2529d39p-6;

    private static final double DEGREE_REST = 0x1.5c1d8becdd291p-62;

    /** One radian in degrees, and what its double leaves over. */
    private static final double RADIAN = 0x1.ca5dc1a63c1f8p+5;

    private static final double RADIAN_REST = -0x1.1e7ab456405f9p-49;

    private static final int RIGHT = 90;

    /** For each whole degree: its sine, and what its double leaves over. */
    private static final double[] SINES = sines();

    private Degrees() {}

    /** The angle in radians. */
    public static double toRadians(double angle) {
        return angle * DEGREE + angle * DEGREE_REST;
    }

    /** The angle in degrees. */
    public static double ofRadians(double angle) {
        return angle * RADIAN + angle * RADIAN_REST;
    }

    /** The sine of an angle in degrees, 0 to 90. */
    public static double sin(double angle) {
        int whole = (int) (angle + 0.5);
        double r = toRadians(angle - whole);
        int s = 2 * whole;
        int c = 2 * (RIGHT - whole);
        return SINES[s] + (SINES[c] * sinOf(r) + (SINES[s + 1] - SINES[s] * versineOf(r)));
    }

    /** The cosine of an angle in degrees, 0 to 90. */
    public static double cos(double angle) {
        int whole = (int) (angle + 0.5);
        double r = toRadians(angle - whole);
        int s = 2 * whole;
        int c = 2 * (RIGHT - whole);
        return SINES[c] - (SINES[s] * sinOf(r) + (SINES[c] * versineOf(r) - SINES[c + 1]));
    }

    /** The tangent of an angle in degrees, 0 to less than 90. */
    public static double tan(double angle) {
        return sin(angle) / cos(angle);
    }

    /** The angle in degrees, 0 to 90, that has this cotangent &gt;= 0. */
    public static double ofCotangent(double cotangent) {
        return cotangent < 1 ? RIGHT - ofRadians(ArcTangent.of(cotangent)) : ofRadians(ArcTangent.of(1 / cotangent));
    }

    private static double sinOf(double r) {
        double q = r * r;
        return r - r * q * (1.0 / 6 - q * (1.0 / 120 - q * (1.0 / 5040)));
    }

    /** 1 - cos r. */
    private static double versineOf(double r) {
        double q = r * r;
        return q * (1.0 / 2 - q * (1.0 / 24 - q * (1.0 / 720)));
    }

    private static double[] sines() {
        BigDecimal degree = new BigDecimal("0.017453292519943295769236907684886127134428718885417");
        BigDecimal sin1 = sine(degree);
        BigDecimal half = sine(degree.divide(BigDecimal.valueOf(2), MathContext.DECIMAL128));
        BigDecimal cos1 = BigDecimal.ONE.subtract(half.multiply(half).multiply(BigDecimal.valueOf(2)));
        BigDecimal sin = BigDecimal.ZERO;
        BigDecimal cos = BigDecimal.ONE;
        double[] table = new double[2 * (RIGHT + 1)];
        for (int i = 0; i <= RIGHT; i++) {
            table[2 * i] = sin.doubleValue();
            table[2 * i + 1] = sin.subtract(new BigDecimal(table[2 * i])).doubleValue();
            BigDecimal next = sin.multiply(cos1).add(cos.multiply(sin1), MathContext.DECIMAL128);
            cos = cos.multiply(cos1).subtract(sin.multiply(sin1), MathContext.DECIMAL128);
            sin = next;
        }
        return table;
    }

    /** The sine by its series, to 32 digits for x of a degree or less. */
    private static BigDecimal sine(BigDecimal x) {
        BigDecimal square = x.multiply(x, MathContext.DECIMAL128);
        BigDecimal term = x;
        BigDecimal sum = x;
        for (int n = 2; n <= 16; n += 2) {
            term = term.multiply(square).divide(BigDecimal.valueOf(-n * (n + 1L)), MathContext.DECIMAL128);
            sum = sum.add(term, MathContext.DECIMAL128);
        }
        return sum;
    }
}
