package org.ductledger.record;

import java.math.BigDecimal;
import java.math.MathContext;

/** Doubles as the record writes them. */
final class Digits {
    private static final MathContext SEVENTEEN = new MathContext(17);

    /** From here on an exponent is shorter than zeros. */
    private static final int MOST_ZEROS = 6;

    private Digits() {}

    /**
     * Seventeen significant digits, trailing zeros left out: enough to give the same double back, and the same text on
     * every JVM.
     */
    static String of(double x) {
        BigDecimal rounded = new BigDecimal(x).round(SEVENTEEN).stripTrailingZeros();
        int exponent = rounded.precision() - rounded.scale() - 1;
        return Math.abs(exponent) < MOST_ZEROS ? rounded.toPlainString() : rounded.toString();
    }
}
