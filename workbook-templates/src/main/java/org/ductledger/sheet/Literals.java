package org.ductledger.sheet;

import java.math.BigDecimal;
import java.math.MathContext;

/** Constants as they stand in formulas. */
public final class Literals {
    private static final int MOST_DIGITS = 17;

    private Literals() {}

    /** The shortest decimal that gives the same double back, on every JVM. */
    public static String number(double x) {
        BigDecimal exact = new BigDecimal(x);
        for (int digits = 1; digits < MOST_DIGITS; digits++) {
            BigDecimal rounded = exact.round(new MathContext(digits));
            if (rounded.doubleValue() == x) {
                return plain(rounded);
            }
        }
        return plain(exact.round(new MathContext(MOST_DIGITS)));
    }

    private static String plain(BigDecimal x) {
        BigDecimal stripped = x.stripTrailingZeros();
        int exponent = stripped.precision() - stripped.scale() - 1;
        return Math.abs(exponent) < MOST_DIGITS ? stripped.toPlainString() : stripped.toString();
    }

    public static String text(String word) {
        return '"' + word.replace("\"", "\"\"") + '"';
    }
}
