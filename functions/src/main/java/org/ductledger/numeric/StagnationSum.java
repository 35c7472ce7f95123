package org.ductledger.numeric;

/**
 * The steps of 1 + (gamma-1)/2 M^2 as a head of 30 bits and a tail, good to about 2^-75 of it. The names: h is
 * (gamma-1)/2, u the leading part of h M^2, exact.
 */
final class StagnationSum {
    /** Above this Mach number a scaled one is squared. */
    static final double MOST_MACH = 0x1p480;

    private StagnationSum() {}

    static double leading(double mach, double h) {
        double machHead = Split.head(mach, Split.DROP_36);
        return Split.head(h, Split.DROP_34) * (machHead * machHead);
    }

    /** h M^2 less its leading part. */
    static double rest(double mach, double h) {
        double machHead = Split.head(mach, Split.DROP_36);
        return h * ((mach + machHead) * (mach - machHead)) + (h - Split.head(h, Split.DROP_34)) * (machHead * machHead);
    }

    static double head(double u) {
        return Split.head(1 + u, Split.DROP_23);
    }

    /** What the head leaves of 1 + u + rest; the rounding error of 1 + u by Knuth's two-sum, either being larger. */
    static double tail(double u, double rest, double head) {
        double sum = 1 + u;
        double ofU = sum - 1;
        double lost = (1 - (sum - ofU)) + (u - ofU);
        return ((sum - head) + lost) + rest;
    }

    /** The head of the sum over its sonic value; inverse is that of the sonic value, rounded. */
    static double sonicHead(double head, double inverse) {
        return Split.head(head * inverse, Split.DROP_23);
    }

    /** The tail of the sum over its sonic value. */
    static double sonicTail(double head, double tail, double inverse, double sonic, double rest, double sonicHead) {
        return (((head - sonicHead * sonic) - sonicHead * rest) + tail) * inverse;
    }
}
