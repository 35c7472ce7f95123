package org.ductledger.flow;

/** What a choked throat passes: C* = qm sqrt(R T0)/(A p0) = sqrt(gamma) (2/(gamma+1))^((gamma+1)/(2(gamma-1))). */
final class Choking {
    private static final int TERMS = 16;

    private Choking() {}

    /** C* / sqrt(gamma). */
    static double factorOverRootGamma(double gamma) {
        double k = 0.5 * (gamma - 1);
        return StrictMath.exp(-0.25 * (gamma + 1) / k * StrictMath.log1p(k));
    }

    static double factor(double gamma) {
        return Math.sqrt(gamma) * factorOverRootGamma(gamma);
    }

    static double factorByGamma(double gamma) {
        double k = 0.5 * (gamma - 1);
        return factor(gamma) * (0.5 / gamma + 0.25 * log1pLessOverSquare(k));
    }

    /** (log1p(k) - k)/k^2, by the series of artanh(k/(2+k)) where the difference would lose digits. */
    private static double log1pLessOverSquare(double k) {
        if (k > 0.5) {
            return (StrictMath.log1p(k) - k) / (k * k);
        }
        double s = k / (2 + k);
        double sum = 0;
        for (int n = TERMS; n > 0; n--) {
            sum = s * s * sum + 1.0 / (2 * n + 1);
        }
        // log1p(k) = 2 (s + s^3/3 + ...) and k = 2 s/(1 - s), so that the difference is 2 s^2 (s (1/3 + ...) - 1/(1-s))
        double halfOfTwoPlusK = 1 / (2 + k);
        return 2 * halfOfTwoPlusK * halfOfTwoPlusK * (s * sum - 1 / (1 - s));
    }
}
