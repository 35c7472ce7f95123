package org.ductledger.numeric;

/**
 * The two solutions of log(1 + c (M^2 - 1)) / c - log M^2 = K about M = 1, for 0 &lt; c &lt; 1 and K &gt;= 0. The area
 * ratio, the mass flow number and q/p0 all lead to it, each with a c of its own.
 *
 * <p>It is solved for log M, in which both branches are nearly straight, by Householder's steps of order 4, whose
 * derivatives need no transcendental function.
 */
public final class SonicBalance {
    /** From here on log(1 + c (M^2 - 1)) is log c + log M^2 to the last digit. */
    private static final double FAR_MACH = 0x1p330;

    private static final double LOG_FAR_MACH = 228;

    /** Between these the logarithms keep all digits of M; beyond, their own rounding grows and a refinement is due. */
    private static final double NEAR_LEAST = 0.6;

    private static final double NEAR_MOST = 1.7;

    /** A step this small leaves an error of its fourth power: far below the last digit of M. */
    private static final double LAST_STEP = 3e-5;

    /** As small as a step must be where a refinement follows. */
    private static final double LAST_STEP_BEFORE_REFINEMENT = 0.02;

    private static final int MOST_STEPS = 12;

    private SonicBalance() {}

    /**
     * The solution below 1 or above it, as well as the logarithms have it: to the last digits near M = 1.
     *
     * @param k the right-hand side, finite
     * @param c between 0 and 1
     * @param d 1 - c
     * @return M; infinity beyond the range of a double; NaN for a K below 0
     */
    public static double solve(double k, double c, double d, boolean above) {
        return iterated(k, c, d, above, LAST_STEP);
    }

    /** The solution, to the last digits where {@link #isNear} holds of it, else to about six for a refinement. */
    public static double approached(double k, double c, double d, boolean above) {
        return iterated(k, c, d, above, LAST_STEP_BEFORE_REFINEMENT);
    }

    private static double iterated(double k, double c, double d, boolean above, double lastFarStep) {
        if (!(k > 0)) {
            return k == 0 ? 1 : Double.NaN;
        }
        double logMach = seed(k, c, d, above);
        if (logMach > LOG_FAR_MACH) {
            return StrictMath.exp(0.5 * (c * k - StrictMath.log(c)) / d);
        }
        double mach = StrictMath.exp(logMach);
        for (int i = 0; i < MOST_STEPS; i++) {
            double step = step(mach, residual(mach, k, c, d), c, d);
            mach = moved(mach, step);
            if (Math.abs(step) < (isNear(mach) ? LAST_STEP : lastFarStep)) {
                return mach;
            }
        }
        return Double.NaN;
    }

    /** Whether {@link #approached} gave all digits. */
    public static boolean isNear(double mach) {
        return mach > NEAR_LEAST && mach < NEAR_MOST;
    }

    /**
     * One more step.
     *
     * @param residual the left-hand side less K at this M, better known than as a difference of logarithms
     */
    public static double refined(double mach, double residual, double c, double d) {
        return moved(mach, step(Math.min(mach, FAR_MACH), residual, c, d));
    }

    /** The logarithm of M by a rational function with three terms of the series about M = 1 and the slope far off. */
    private static double seed(double k, double c, double d, boolean above) {
        double s = Math.sqrt(0.5 * k / d);
        double t = above ? s : -s;
        double skew = 1 - 2 * c;
        double second = -skew / 3;
        double third = 5 * skew * skew / 18 - (1 - 6 * c * d) / 6;
        double far = above ? c : -d;
        double pole = third / (far - second);
        return t * (1 + t * ((pole + second) + t * far * pole)) / (1 + pole * t);
    }

    private static double residual(double mach, double k, double c, double d) {
        double x = (mach - 1) * (mach + 1);
        double cx = c * x;
        double logSum = cx > -0.5 ? StrictMath.log1p(cx) : StrictMath.log(d + c * mach * mach);
        double logSquare = x > -0.5 ? StrictMath.log1p(x) : 2 * StrictMath.log(mach);
        return logSum / c - logSquare - k;
    }

    /** The step of log M^2. */
    private static double step(double mach, double residual, double c, double d) {
        double m = mach * mach;
        double sum = d + c * m;
        double x = (mach - 1) * (mach + 1);
        double n = residual * sum / (d * x);
        double a = m / (sum * x);
        double b = a * (d - c * m) / sum;
        double an = a * n;
        return -n * (1 - 0.5 * an) / (1 - an + b * n * n / 6);
    }

    private static double moved(double mach, double step) {
        double h = 0.5 * step;
        return Math.abs(h) < 1e-4 ? mach + mach * (h + 0.5 * h * h) : mach * StrictMath.exp(h);
    }
}
