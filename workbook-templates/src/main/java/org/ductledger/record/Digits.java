package org.ductledger.record;

import java.math.BigDecimal;
import java.math.MathContext;

/** Doubles as the record writes them. */
final class Digits {
    private static final MathContext SEVENTEEN = new MathContext(17);

    private Digits() {}

    /**
     * Seventeen significant digits, trailing zeros left out: enough to give the same double back, and the same text on
     * every JVM.
     */
    static String of(double x) {
        return new BigDecimal(x).round(SEVENTEEN).stripTrailingZeros().toString();
    }
}
