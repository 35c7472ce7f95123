package org.ductledger.numeric;

/**
 * The steps of 2^y for y = w (s + t), a product of two sums of a head and a tail: y is parted into a whole number n and
 * a fraction f, and 2^f is summed with its head kept apart.
 */
final class Exp2 {
    /** Adding it rounds to a whole number, which then stands in the low bits. */
    private static final double ROUNDER = 0x1.8p52;

    static final double LN2 = 0x1.62e42fefa39efp-1;

    /** ln 2: its leading 21 bits, and the rest. */
    static final double LN2_HEAD = 0x1.62e43p-1;

    static final double LN2_TAIL = -0x1.05c610ca86c39p-29;

    /** (2^f - 1 - f ln 2) / f^2 for |f| below {@link #REACH}: interpolation at Chebyshev's nodes. */
    static final double[] SERIES = {
        0x1.ebfbdff82c591p-3,
        0x1.c6b08d704a0c0p-5,
        0x1.3b2ab6fba3234p-7,
        0x1.5d87fe78a5b23p-10,
        0x1.43091305b603cp-13,
        0x1.ffcbfc63e0467p-17,
        0x1.62bfdc459a794p-20,
        0x1.b525018e653dep-24,
        0x1.e5fbeb6e51062p-28,
        0x1.e9cb2f13c45b0p-32
    };

    /** The half, and what the tail of a logarithm times an exponent of at most 1100 adds to it. */
    static final double REACH = 0.5 + 0x1p-6;

    private static final double C0 = SERIES[0];
    private static final double C1 = SERIES[1];
    private static final double C2 = SERIES[2];
    private static final double C3 = SERIES[3];
    private static final double C4 = SERIES[4];
    private static final double C5 = SERIES[5];
    private static final double C6 = SERIES[6];
    private static final double C7 = SERIES[7];
    private static final double C8 = SERIES[8];
    private static final double C9 = SERIES[9];

    private Exp2() {}

    /** The exponent's leading part, exact: w0 and the head of s have 26 bits each. */
    static double leading(double w0, double s) {
        return w0 * Split.head(s, Split.DROP_27);
    }

    /** y rounded to a whole number, plus a constant. */
    static double rounded(double leading) {
        return leading + ROUNDER;
    }

    /** The fraction of y = (w0 + w1) (s + t). */
    static double fraction(double leading, double rounded, double w0, double w1, double s, double t) {
        double sTail = (s - Split.head(s, Split.DROP_27)) + t;
        return (leading - (rounded - ROUNDER)) + (w0 * sTail + w1 * (s + t));
    }

    /** The terms of 2^f from f^2 on. */
    static double bend(double f) {
        return f
                * f
                * (C0 + f * (C1 + f * (C2 + f * (C3 + f * (C4 + f * (C5 + f * (C6 + f * (C7 + f * (C8 + f * C9)))))))));
    }

    /** 2^f, between 0.7 and 1.42. */
    static double mantissa(double f, double bend) {
        double head = Split.head(f, Split.DROP_27);
        double q = head * LN2_HEAD;
        double rest = (head * LN2_TAIL + (f - head) * LN2) + bend;
        double t = 1 + q;
        return t + (((1 - t) + q) + rest);
    }

    /** The whole number in what {@link #rounded} gave. */
    static int whole(double rounded) {
        return (int) Double.doubleToRawLongBits(rounded);
    }

    /** x 2^n, rounded once. */
    static double scaled(double x, int n) {
        return n >= -900 && n <= 900 ? x * Double.longBitsToDouble((n + 1023L) << 52) : Math.scalb(x, n);
    }
}
