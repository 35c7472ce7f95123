package org.ductledger.numeric;

/** Powers (head + tail)^(w0 + w1), good to the last digit or two, with the same bits on every machine. */
public final class Power {
    /**
     * Beyond this magnitude of the exponent the tail of the logarithm is not small in the product, and next to 0 the
     * logarithm needs more than the table's 69 bits.
     */
    private static final double STEEP_EXPONENT = 1100;

    /** How far from 1 the series of the logarithm reaches. */
    private static final double NEAR_ONE = 0x1p-7;

    /** A greater exponent of a base that is not near 1 leads to zero or infinity as well. */
    private static final double MOST_EXPONENT = 0x1p20;

    private Power() {}

    /**
     * The power of a sum: to about 0.8 units in the last place where the exponent is at most 1100, to 2 beyond.
     *
     * @param head a positive, finite double
     * @param tail at most a few units in the last place of it
     * @param w0 the exponent, rounded
     * @param w1 the rest of the exponent
     */
    public static double of(double head, double tail, double w0, double w1) {
        if (Math.abs(w0) > STEEP_EXPONENT && Math.abs(head - 1) < NEAR_ONE) {
            return steep(head, tail, w0, w1);
        }
        double exponent = Math.max(-MOST_EXPONENT, Math.min(w0, MOST_EXPONENT));
        double w = Split.head(exponent, Split.DROP_27);
        double rest = (exponent - w) + w1;
        if (head < 0x1p-900) {
            return split(head * 0x1p200, tail * 0x1p200, -200, w, rest);
        }
        return head > 0x1p900 ? split(head * 0x1p-200, tail * 0x1p-200, 200, w, rest) : split(head, tail, 0, w, rest);
    }

    private static double split(double head, double tail, int shift, double w0, double w1) {
        double h = Split.head(head, Split.DROP_23);
        return scaled(h, (head - h) + tail, shift, w0, w1, Ending.NOTHING, 1, 1, 0);
    }

    /**
     * (2^shift (head + tail))^(w0 + w1), its ending, and 2^n; head has at most 30 bits, w0 at most 26. The ending comes
     * in before the powers of two, so that nothing is lost to underflow on the way.
     */
    static double scaled(
            double head,
            double tail,
            int shift,
            double w0,
            double w1,
            Ending ending,
            double mach,
            double gamma,
            int n) {
        long bits = Double.doubleToRawLongBits(head);
        int row = Log2.row(bits);
        double scale = Log2.scale(bits, row);
        double k = Log2.exponent(bits) + shift + Log2Table.ROWS[row + 1];
        double zHead = Log2.reduced(head, scale);
        double zTail = tail * scale;
        double s = Log2.head(k, zHead);
        double t = Log2.tail(k, Log2Table.ROWS[row + 2], zHead, zTail, s) + Log2.bend(zHead + zTail);
        if (Math.abs(w0) > STEEP_EXPONENT) {
            double sum = s + t;
            t = (s - sum) + t;
            s = sum;
        }
        double leading = Exp2.leading(w0, s);
        double rounded = Exp2.rounded(leading);
        double f = Exp2.fraction(leading, rounded, w0, w1, s, t);
        double mantissa = Exp2.mantissa(f, Exp2.bend(f));
        return Exp2.scaled(ending.of(mantissa, mach, gamma), Exp2.whole(rounded) + n);
    }

    /** By log(1 + t) = t - t^2/2 + ..., the first two terms kept to twice the digits. */
    private static double steep(double head, double tail, double w0, double w1) {
        double t = head - 1;
        double square = t * t;
        double bend = 1.0 / 3 - t * (0.25 - t * (0.2 - t * (1.0 / 6 - t * (1.0 / 7 - t * (0.125 - t * (1.0 / 9))))));
        double log = t - 0.5 * square;
        double rest = ((t - log) - 0.5 * square) - 0.5 * Math.fma(t, t, -square) + tail / head + t * square * bend;
        double y = w0 * log;
        double yRest = Math.fma(w0, log, -y) + (w0 * rest + w1 * log);
        double sum = y + yRest;
        return StrictMath.exp(sum) * (1 + ((y - sum) + yRest));
    }
}
