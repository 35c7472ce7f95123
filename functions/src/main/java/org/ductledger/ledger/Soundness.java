package org.ductledger.ledger;

/** Quick looks at a stretch of a column; written without branches in their loops, about 0.3 ns a number. */
final class Soundness {
    private Soundness() {}

    /** Whether every number lies between the ends; neither NaN nor an infinity ever does. */
    static boolean allWithin(double least, double greatest, double[] column, int from, int to) {
        return Double.doubleToRawLongBits(least) >= 0
                ? allWithinPositive(least, greatest, column, from, to)
                : allWithinAny(least, greatest, column, from, to);
    }

    /**
     * Positive doubles stand in the order of their bits, and one unsigned comparison sees both ends: below the lower one
     * the difference wraps, and so do negative numbers. NaN lies beyond the greatest double. Minus zero is refused where
     * zero is admissible, for the caller to look again.
     */
    private static boolean allWithinPositive(double least, double greatest, double[] column, int from, int to) {
        long low = Double.doubleToRawLongBits(least);
        long span = Double.doubleToRawLongBits(greatest) - low + Long.MIN_VALUE;
        boolean outside = false;
        for (int i = from; i < to; i++) {
            outside |= Double.doubleToRawLongBits(column[i]) - low + Long.MIN_VALUE > span;
        }
        return !outside;
    }

    private static boolean allWithinAny(double least, double greatest, double[] column, int from, int to) {
        boolean within = true;
        for (int i = from; i < to; i++) {
            within &= column[i] >= least && column[i] <= greatest;
        }
        return within;
    }

    /** Whether every number is finite: zero times any other is NaN, and stays so in a sum. */
    static boolean allFinite(double[] column, int from, int to) {
        double even = 0;
        double odd = 0;
        int i = from;
        for (; i + 1 < to; i += 2) {
            even += column[i] * 0;
            odd += column[i + 1] * 0;
        }
        double last = i < to ? column[i] * 0 : 0;
        return even + odd + last == 0;
    }
}
