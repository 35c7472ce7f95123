package org.ductledger.flow;

import org.ductledger.numeric.Degrees;

/**
 * The two shock angles of a deflection. With s = cot(shock angle), T = tan(deflection) and m = M1^2 they are the positive
 * roots of
 *
 * <p>f(s) = s^3 + b s^2 - (m-1) s + e, b = (1 + (gamma+1)/2 m) T, e = (1 + (gamma-1)/2 m) T,
 *
 * <p>which stays regular as T tends to 0. Between the roots, at s0, f is least; where f(s0) is positive the shock is
 * detached. With s = s0 + h t and h = 3 s0 + b the larger root, the weak shock, has t^2 (1 + t) = q^2 = -f(s0)/h^3, t as a
 * series in q. The strong shock is the positive root of f(s)/(s - weak), a quadratic in which nothing cancels.
 */
final class ObliqueAngle {
    /** The place of {@code weak} among the branches. */
    static final double WEAK = 0;

    /** A deflection that the rounding of its last digits has put past the greatest one is taken as that. */
    private static final double ROUNDING = 2e-15;

    /** Beyond, powers of M1 would leave a double. */
    private static final double HUGE_MACH = 1e40;

    /** A slope of which the square is lost beside 1, for any gamma. */
    private static final double SMALL_SLOPE = 1e-11;

    private ObliqueAngle() {}

    /** The shock angle in degrees; NaN where the shock is detached. */
    static double shockAngle(double mach1, double deflection, double gamma, double branch) {
        double tangent = Degrees.tan(deflection);
        double stretch = mach1 <= HUGE_MACH || branch != WEAK ? 1 : stretch(mach1, tangent);
        double cotangent = cotangent(Math.min(mach1, HUGE_MACH), tangent * stretch, gamma, branch);
        return Degrees.ofCotangent(stretch * cotangent);
    }

    /** Hypersonic similarity: at small angles the weak shock angle over the deflection depends on M1 T alone. */
    private static double stretch(double mach1, double tangent) {
        return Math.max(1, Math.min(mach1 / HUGE_MACH, SMALL_SLOPE / tangent));
    }

    private static double cotangent(double mach1, double tangent, double gamma, double branch) {
        double m = mach1 * mach1;
        double x = (mach1 - 1) * (mach1 + 1);
        double b = (1 + 0.5 * (gamma + 1) * m) * tangent;
        double e = (1 + 0.5 * (gamma - 1) * m) * tangent;
        double weak = weak(x, b, e, ROUNDING * e * (1 + tangent));
        if (branch == WEAK || weak == 0) {
            return weak;
        }
        double sum = b + weak;
        double product = e / weak;
        return 2 * product / (sum + Math.sqrt(sum * sum + 4 * product));
    }

    private static double weak(double x, double b, double e, double rounding) {
        double h = Math.sqrt(b * b + 3 * x);
        if (h == 0) {
            return 0;
        }
        double least = x / (b + h);
        double depth = least * (x - (least + b) * least) - e;
        if (!(depth >= -rounding)) {
            return Double.NaN;
        }
        double square = Math.max(0, depth) / (h * h * h);
        return least + h * offset(square);
    }

    /** The root t of t^2 (1 + t) = q^2 for 0 &lt;= q^2 &lt;= 2/27: the first terms of its series in q, and two steps. */
    private static double offset(double square) {
        double q = Math.sqrt(square);
        double t = q * (1 - q * (0.5 - q * (5 / 8.0 - q * (1 - q * (231 / 128.0 - q * 3.5)))));
        return q == 0 ? 0 : refined(refined(t, square), square);
    }

    /** A step of Halley. */
    private static double refined(double t, double square) {
        double slope = (3 * t + 2) * t;
        double newton = ((t + 1) * t * t - square) / slope;
        return t - newton / (1 - newton * (3 * t + 1) / slope);
    }
}
