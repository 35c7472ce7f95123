package org.ductledger.catalogue;

import java.math.BigDecimal;
import java.math.MathContext;

/** Numbers as messages show them. */
public final class Numbers {
    private static final MathContext TWELVE_DIGITS = new MathContext(12);

    private Numbers() {}

    /** At most twelve digits, without trailing zeros: {@code 1}, {@code 0.1}, {@code 273.15}, {@code 1E-9}. */
    public static String brief(double x) {
        if (!Double.isFinite(x)) {
            return Double.toString(x);
        }
        BigDecimal rounded = new BigDecimal(x).round(TWELVE_DIGITS).stripTrailingZeros();
        int exponent = rounded.precision() - rounded.scale() - 1;
        return (exponent >= -5 && exponent <= 12) || rounded.signum() == 0
                ? rounded.toPlainString()
                : rounded.toString();
    }
}
