package org.ductledger.flow;

import org.ductledger.numeric.Degrees;

/** The Mach number from the Prandtl-Meyer angle: a seed right at both ends, and two steps of fourth order. */
final class FanInverse {
    /** A third of the exponent's bias, for the cube root's first guess. */
    private static final long THIRD_BIAS = 0x2A9F7893782DA1CEL;

    /** Below this y the Mach number is 1 to the last digit. */
    private static final double NEAR_SONIC = 1e-9;

    private FanInverse() {}

    /**
     * The Mach number.
     *
     * @param angle nu in degrees, at least 0
     * @param left what nu_max leaves beyond it; given beside it, since near the maximum it alone has digits
     * @return NaN unless both are inside
     */
    static double mach(double angle, double left, double gamma) {
        if (!(angle >= 0 && left > 0)) {
            return Double.NaN;
        }
        double reach = Fan.reach(gamma);
        double root = (gamma - 1) / reach;
        double kappa = 2 / (gamma - 1 + reach);
        double y = seed(Degrees.toRadians(angle), (angle + left) / left, gamma, root, kappa);
        if (y < NEAR_SONIC) {
            return 1;
        }
        return angle < left
                ? fromAngle(y, Degrees.toRadians(angle), gamma, root, kappa)
                : fromLeft(1 / y, Degrees.toRadians(left), gamma, root, kappa);
    }

    private static double fromAngle(double seed, double nu, double gamma, double root, double kappa) {
        double c = root * root;
        double y = seed;
        for (int i = 0; i < 2; i++) {
            y = step(y, 0.5 * (gamma + 1) * (Fan.smallAngleAt(y, root * y, kappa) - nu), c);
        }
        return Math.sqrt(1 + y * y);
    }

    private static double fromLeft(double seed, double left, double gamma, double root, double kappa) {
        double c = root * root;
        double wide = Fan.reach(gamma) / (gamma - 1);
        double u = seed;
        for (int i = 0; i < 2; i++) {
            u = stepOfReciprocal(u, 0.5 * (gamma + 1) * (Fan.leftAt(u, wide * u, kappa) - left), c);
        }
        return Math.sqrt(1 + u * u) / u;
    }

    /**
     * y = sqrt(M^2 - 1) to 4 % at gamma 1.4: the first terms of the series in p = cbrt(3 nu/d), and the pole at nu_max
     * with its residue.
     *
     * @param wholeOverLeft nu_max / (nu_max - nu)
     */
    private static double seed(double nu, double wholeOverLeft, double gamma, double root, double kappa) {
        double c = root * root;
        double greatest = 0.5 * Math.PI * kappa;
        double p = roughCubeRoot(1.5 * (gamma + 1) * nu);
        double q = roughCubeRoot(1.5 * (gamma + 1) * greatest);
        double spread = 0.2 * (1 + c);
        double square = q * q;
        double pole = c * greatest * q;
        double beta = (kappa * root * (1 + root) - spread * square * pole) / (pole * square * square);
        return p * (1 + p * p * (spread + beta * p * p) * wholeOverLeft);
    }

    /** The cube root to 1e-5: a third of the exponent, and one step of Halley. */
    private static double roughCubeRoot(double x) {
        double r = Double.longBitsToDouble(Double.doubleToRawLongBits(x) / 3 + THIRD_BIAS);
        double cube = r * r * r;
        return r * (cube + 2 * x) / (2 * cube + x);
    }

    /** A step to nu(y) = nu, of excess = (nu(y) - nu)/d; the derivatives of nu are rational in y. */
    private static double step(double y, double excess, double c) {
        double s = y * y;
        double m = 1 + s;
        double h = 1 + c * s;
        double r = 1 / (m * h);
        double v = 1 / y;
        double rh = r * m;
        double rm = r * h;
        double second = 2 * (1 - c * s * s) * r * v;
        double third = second * second - 2 * (v * v + (1 - s) * rm * rm + c * (1 - c * s) * rh * rh);
        return y - fourthOrder(excess * m * h * v * v, second, third);
    }

    /** A step to nu_max - nu(1/u) = left, of u = 1/y, in which it is smooth up to vacuum. */
    private static double stepOfReciprocal(double u, double excess, double c) {
        double s = u * u;
        double m = 1 + s;
        double h = c + s;
        double r = 1 / (m * h);
        double rh = r * m;
        double rm = r * h;
        double second = -2 * u * (rm + rh);
        double third = second * second - 2 * ((1 - s) * rm * rm + (c - s) * rh * rh);
        return u - fourthOrder(excess * m * h, second, third);
    }

    /**
     * Householder's step of fourth order.
     *
     * @param newton f/f'
     * @param second f''/f'
     * @param third f'''/f'
     */
    private static double fourthOrder(double newton, double second, double third) {
        return newton * (1 - 0.5 * second * newton) / (1 - newton * (second - third * newton / 6));
    }
}
