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
        double d = 2 / (gamma + 1);
        double c = 0.5 * (gamma - 1) * d;
        double root = Math.sqrt(c);
        double kappa = d / (root + c);
        double y = seed(Degrees.toRadians(angle), left / (angle + left), d, c, kappa);
        if (y < NEAR_SONIC) {
            return 1;
        }
        return angle < left
                ? fromAngle(y, Degrees.toRadians(angle), d, c, kappa)
                : fromLeft(1 / y, Degrees.toRadians(left), d, c, kappa);
    }

    private static double fromAngle(double seed, double nu, double d, double c, double kappa) {
        double root = Math.sqrt(c);
        double y = seed;
        for (int i = 0; i < 2; i++) {
            y = step(y, Fan.angleAt(y, root * y, kappa) - nu, d, c);
        }
        return Math.sqrt(1 + y * y);
    }

    private static double fromLeft(double seed, double left, double d, double c, double kappa) {
        double root = Math.sqrt(c);
        double u = seed;
        for (int i = 0; i < 2; i++) {
            u = stepOfReciprocal(u, Fan.leftAt(u, u / root, kappa) - left, d, c);
        }
        return Math.sqrt(1 + u * u) / u;
    }

    /**
     * y = sqrt(M^2 - 1) to 4 % at gamma 1.4: the first terms of the series in p = cbrt(3 nu/d), and the pole at nu_max
     * with its residue.
     */
    private static double seed(double nu, double leftShare, double d, double c, double kappa) {
        double greatest = 0.5 * Math.PI * kappa;
        double p = roughCubeRoot(3 * nu / d);
        double q = roughCubeRoot(3 * greatest / d);
        double atPole = d / (c * greatest * q);
        double beta = (atPole - (1 + c) * q * q / 5) / (q * q * q * q);
        return p * (leftShare + p * p * ((1 + c) / 5 + beta * p * p)) / leftShare;
    }

    /** The cube root to 1e-5: a third of the exponent, and one step of Halley. */
    private static double roughCubeRoot(double x) {
        double r = Double.longBitsToDouble(Double.doubleToRawLongBits(x) / 3 + THIRD_BIAS);
        double cube = r * r * r;
        return r * (cube + 2 * x) / (2 * cube + x);
    }

    /** A step to nu(y) = nu; the derivatives of nu are rational in y. */
    private static double step(double y, double excess, double d, double c) {
        double s = y * y;
        double m = 1 / (1 + s);
        double h = 1 / (1 + c * s);
        double second = 2 * (1 - c * s * s) * m * h / y;
        double third = second * second - 2 * (1 / s + (1 - s) * m * m + c * (1 - c * s) * h * h);
        return y - fourthOrder(excess / (d * s * m * h), second, third);
    }

    /** A step to nu_max - nu(1/u) = left, of u = 1/y, in which it is smooth up to vacuum. */
    private static double stepOfReciprocal(double u, double excess, double d, double c) {
        double s = u * u;
        double m = 1 / (1 + s);
        double h = 1 / (c + s);
        double second = -2 * u * (m + h);
        double third = second * second - 2 * ((1 - s) * m * m + (c - s) * h * h);
        return u - fourthOrder(excess / (d * m * h), second, third);
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
