package org.ductledger.flow;

import org.ductledger.catalogue.Numbers;
import org.ductledger.numeric.ArcTangent;
import org.ductledger.numeric.Degrees;

/** The limits of the attached oblique shock: its greatest deflection, the sonic flow behind it, and detachment. */
final class ObliqueLimits {
    private static final int STEPS = 6;

    /** The least that rounding may leave of 1, one ulp before the deflection that no Mach number reaches. */
    private static final double LEAST = 0x1p-53;

    private ObliqueLimits() {}

    /** The shock angle of the greatest deflection, in degrees. */
    static double angleAtDeflectionMax(double mach1, double gamma) {
        double cos2 = cosSquaredAtDeflectionMax(mach1, gamma);
        return Degrees.ofCotangent(Math.sqrt(cos2 / (1 - cos2)));
    }

    /** The shock angle behind which the flow is sonic, in degrees. */
    static double angleAtSonic(double mach1, double gamma) {
        double i = 1 / mach1 / mach1;
        double sum = 3 * gamma
                - 1
                + (3 - gamma) * i
                + Math.sqrt((gamma + 1) * (gamma + 1 - (2 * (3 - gamma) - (gamma + 9) * i) * i));
        double cos2 = 2 * excess(mach1) * (gamma - 1 + 2 * i) / sum;
        return Degrees.ofCotangent(Math.sqrt(cos2 / (1 - cos2)));
    }

    /** The greatest deflection of an attached shock, in degrees. */
    static double deflectionMax(double mach1, double gamma) {
        double i = 1 / mach1 / mach1;
        double root = rootAtDeflectionMax(i, gamma);
        double cos2 = cosSquaredAtDeflectionMax(mach1, gamma);
        double beyondWave = excess(mach1) * ((gamma + 1 + root) / (3 * gamma - 1 + 4 * i + root));
        double tangent = 2 * Math.sqrt(cos2 / (1 - cos2)) * beyondWave / (gamma - 1 + 2 * cos2 + 2 * i);
        return Degrees.ofRadians(ArcTangent.of(tangent));
    }

    /** Says why there is no attached shock, and from what Mach number on there is one. */
    static String attachment(double mach1, double deflection, double gamma) {
        double limit = deflectionLimit(gamma);
        String cure = deflection < limit
                ? "this deflection needs mach1 of at least " + Numbers.brief(mach1AtDetachment(deflection, gamma))
                : "from " + Numbers.brief(limit) + " deg on the shock is detached at every Mach number";
        return "must be at most " + Numbers.brief(deflectionMax(mach1, gamma))
                + " deg (the greatest with an attached shock at this mach1; " + cure + ")";
    }

    /** 1 - 1/M1^2. */
    private static double excess(double mach1) {
        return (mach1 - 1) / mach1 * ((mach1 + 1) / mach1);
    }

    private static double rootAtDeflectionMax(double i, double gamma) {
        return Math.sqrt((gamma + 1) * (gamma + 1 + (8 * (gamma - 1) + 16 * i) * i));
    }

    /** The textbook's root for sin^2, taken from 1 and freed of cancellation. */
    private static double cosSquaredAtDeflectionMax(double mach1, double gamma) {
        double i = 1 / mach1 / mach1;
        return 2 * excess(mach1) * (gamma - 1 + 2 * i) / (3 * gamma - 1 + 4 * i + rootAtDeflectionMax(i, gamma));
    }

    /** The deflection that no Mach number reaches, asin(1/gamma), in degrees. */
    static double deflectionLimit(double gamma) {
        return Degrees.ofCotangent(Math.sqrt((gamma - 1) * (gamma + 1)));
    }

    /**
     * The least Mach number with an attached shock; NaN from the limit of the deflection on. Both f and f' of the cubic
     * in s = cot(shock angle) vanish there; M1 eliminated, that is
     *
     * <p>(gamma+1)(1 + s^4) - 2 (3-gamma) s^2 = 4 s^3/T + 4 T s, with T = tan(deflection), and
     *
     * <p>M1^2 - 1 = s (3 s + (gamma+3) T) / (1 - (gamma+1) T s).
     */
    static double mach1AtDetachment(double deflection, double gamma) {
        if (!(deflection < deflectionLimit(gamma))) {
            return Double.NaN;
        }
        double tangent = Degrees.tan(deflection);
        if (tangent == 0) {
            return 1;
        }
        double s = cotangentAtDetachment(tangent, gamma);
        return Math.sqrt(1 + s * (3 * s + (gamma + 3) * tangent) / rest(tangent, s, gamma));
    }

    /** 1 - (gamma+1) T s; where it is small at a gamma near 1, by way of the quartic. */
    private static double rest(double tangent, double s, double gamma) {
        double g = gamma + 1;
        double direct = 1 - g * tangent * s;
        if (direct > 0.5 || gamma > 2) {
            return Math.max(direct, LEAST);
        }
        double q = s * s;
        double byQuartic = g * q * (0.5 * (3 - gamma) + s / tangent - 0.25 * g * q) - 0.25 * (gamma - 1) * (gamma + 3);
        return Math.max(byQuartic, LEAST * g * q);
    }

    /** The quartic falls and bends down all the way to its root: from the right the steps of Newton come down to it. */
    private static double cotangentAtDetachment(double tangent, double gamma) {
        double g = gamma + 1;
        double f = 2 * (3 - gamma);
        double s = Math.min(1, StrictMath.cbrt(0.25 * g * tangent));
        for (int i = 0; i < STEPS; i++) {
            double q = s * s;
            double value = g * (1 + q * q) - f * q - 4 * s * (q / tangent + tangent);
            double slope = (4 * g * q - 2 * f) * s - 4 * (3 * q / tangent + tangent);
            s -= value / slope;
        }
        return s;
    }
}
