package org.ductledger.sheet;

/** Number formats that show about six digits in fixed notation, so that a column's points stand under each other. */
public final class NumberFormats {
    public static final String GENERAL = "General";
    private static final String SCIENTIFIC = "0.00000E+00";
    private static final int DIGITS = 6;

    private NumberFormats() {}

    /** A format for values of which this is the largest magnitude; for zero and for none, a middling one. */
    public static String of(double magnitude) {
        if (!(magnitude > 0)) {
            return "0.0000";
        }
        int exponent = (int) Math.floor(StrictMath.log10(magnitude));
        if (exponent < -2 || exponent >= 8) {
            return SCIENTIFIC;
        }
        int decimals = Math.max(DIGITS - 1 - exponent, 0);
        return decimals == 0 ? "0" : "0." + "0".repeat(decimals);
    }

    /** A format for a column, by its largest magnitude; NaN counts for nothing. */
    public static String of(double[] values) {
        double largest = 0;
        for (double x : values) {
            largest = Math.abs(x) > largest ? Math.abs(x) : largest;
        }
        return of(largest);
    }
}
