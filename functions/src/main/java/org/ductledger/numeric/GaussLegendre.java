package org.ductledger.numeric;

/**
 * The nodes and weights of Gauss and Legendre's quadrature with 32 points on (-1, 1), found from the polynomial itself.
 * It is exact for polynomials to degree 63, and for an integrand without a singularity nearby as good as rounding.
 */
public final class GaussLegendre {
    public static final int POINTS = 32;

    private static final int NEWTON_STEPS = 6;
    private static final double[] NODE = new double[POINTS];
    private static final double[] WEIGHT = new double[POINTS];

    static {
        for (int i = 0; i < POINTS / 2; i++) {
            double x = StrictMath.cos(Math.PI * (i + 0.75) / (POINTS + 0.5));
            for (int step = 0; step < NEWTON_STEPS; step++) {
                x -= legendre(x) / slope(x);
            }
            NODE[i] = -x;
            NODE[POINTS - 1 - i] = x;
            double slope = slope(x);
            WEIGHT[i] = 2 / ((1 - x) * (1 + x) * slope * slope);
            WEIGHT[POINTS - 1 - i] = WEIGHT[i];
        }
    }

    private GaussLegendre() {}

    /** Node number i, from 0, in rising order. */
    public static double node(int i) {
        return NODE[i];
    }

    /** The weight of node i; all weights add up to 2. */
    public static double weight(int i) {
        return WEIGHT[i];
    }

    private static double legendre(double x) {
        double before = 1;
        double value = x;
        for (int n = 2; n <= POINTS; n++) {
            double next = ((2 * n - 1) * x * value - (n - 1) * before) / n;
            before = value;
            value = next;
        }
        return value;
    }

    /** The derivative of the polynomial, from its neighbour of one degree less. */
    private static double slope(double x) {
        double before = 1;
        double value = x;
        for (int n = 2; n < POINTS; n++) {
            double next = ((2 * n - 1) * x * value - (n - 1) * before) / n;
            before = value;
            value = next;
        }
        double last = ((2 * POINTS - 1) * x * value - (POINTS - 1) * before) / POINTS;
        return POINTS * (x * last - value) / ((x - 1) * (x + 1));
    }
}
