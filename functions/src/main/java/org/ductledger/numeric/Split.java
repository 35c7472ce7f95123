package org.ductledger.numeric;

/**
 * The leading bits of a double, by Veltkamp's splitting (T. J. Dekker, A floating-point technique for extending the
 * available precision, Numerische Mathematik 18, 1971): products of short factors are exact.
 */
final class Split {
    /** Keeps 30 bits. */
    static final double DROP_23 = 0x1p23 + 1;

    /** Keeps 26 bits. */
    static final double DROP_27 = 0x1p27 + 1;

    /** Keeps 23 bits. */
    static final double DROP_30 = 0x1p30 + 1;

    /** Keeps 19 bits. */
    static final double DROP_34 = 0x1p34 + 1;

    /** Keeps 17 bits. */
    static final double DROP_36 = 0x1p36 + 1;

    private Split() {}

    /** The leading bits of x; |x| must be below 2^985. */
    static double head(double x, double drop) {
        double c = drop * x;
        return c + (x - c);
    }
}
