package org.ductledger.numeric;

/**
 * The steps of a binary logarithm to about 69 bits after the point. Each is one small expression, so that a loop over
 * a block and a single value run the same operations in the same order.
 *
 * <p>The argument is head + tail, the head of 30 bits. With c from the table near the reciprocal of the head's
 * mantissa, z = (head + tail) c - 1 is small and its head is exact; log2 = (exponent - log2 c) + log2(1 + z).
 */
final class Log2 {
    private static final long ONE = 0x3FF0_0000_0000_0000L;
    private static final long EXPONENT = 0xFFF0_0000_0000_0000L;

    /** 1 / ln 2: all of it, its leading 21 bits, and the rest. */
    static final double INVERSE_LN2 = 0x1.71547652b82fep+0;

    static final double INVERSE_LN2_HEAD = 1512775.0 / (1 << 20);
    static final double INVERSE_LN2_TAIL = 0x1.94ae0bf85ddf4p-22;

    /** (log2(1 + z) - z / ln 2) / z^2 for |z| below {@link #REACH}: interpolation at Chebyshev's nodes. */
    static final double[] SERIES = {
        -0x1.71547652b82fep-1,
        0x1.ec709dc3a03fep-2,
        -0x1.7154765229cc6p-2,
        0x1.2776c50e7b2e9p-2,
        -0x1.ec7326631e103p-3,
        0x1.a619a33580e74p-3
    };

    static final double REACH = 0x1.15p-8;

    private static final double C0 = SERIES[0];
    private static final double C1 = SERIES[1];
    private static final double C2 = SERIES[2];
    private static final double C3 = SERIES[3];
    private static final double C4 = SERIES[4];
    private static final double C5 = SERIES[5];

    private Log2() {}

    /** Where the table's row for a head begins. */
    static int row(long headBits) {
        return (int) (headBits >>> 43) & 508;
    }

    /** The factor that brings the head to 1 + z. */
    static double scale(long headBits, int row) {
        long reciprocal = Double.doubleToRawLongBits(Log2Table.ROWS[row]);
        return Double.longBitsToDouble(reciprocal - ((headBits - ONE) & EXPONENT));
    }

    /** The exponent of the head, without the table's part. */
    static double exponent(long headBits) {
        return (headBits - ONE) >> 52;
    }

    /** The head of z, exact. */
    static double reduced(double head, double scale) {
        return head * scale - 1;
    }

    /** The head of the logarithm; k is the exponent plus the table's head. */
    static double head(double k, double zHead) {
        return k + zHead * INVERSE_LN2_HEAD;
    }

    /** The tail of the logarithm up to the terms of z^2. */
    static double tail(double k, double tableTail, double zHead, double zTail, double head) {
        double p = zHead * INVERSE_LN2_HEAD;
        return ((p - (head - k)) + tableTail) + (zHead * INVERSE_LN2_TAIL + zTail * INVERSE_LN2);
    }

    /** The terms from z^2 on. */
    static double bend(double z) {
        return z * z * (C0 + z * (C1 + z * (C2 + z * (C3 + z * (C4 + z * C5)))));
    }
}
