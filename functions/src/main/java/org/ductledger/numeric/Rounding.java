package org.ductledger.numeric;

/** What rounding took from an operation: exact result = rounded result + this. */
public final class Rounding {
    private Rounding() {}

    /** Of a + b, whichever is larger (D. E. Knuth, The Art of Computer Programming, volume 2, section 4.2.2). */
    public static double ofSum(double a, double b) {
        double sum = a + b;
        double partOfB = sum - a;
        return (a - (sum - partOfB)) + (b - partOfB);
    }

    /** Of a b. */
    public static double ofProduct(double a, double b) {
        return Math.fma(a, b, -(a * b));
    }

    /** Of a x x, worked from the left. */
    public static double ofScaledSquare(double a, double x) {
        return ofProduct(a * x, x) + ofProduct(a, x) * x;
    }
}
