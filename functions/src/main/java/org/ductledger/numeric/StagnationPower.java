package org.ductledger.numeric;

/**
 * Powers of the stagnation ratio T0/T = 1 + (gamma-1)/2 M^2, or of this over its sonic value (gamma+1)/2, to the
 * exponent a + b/(gamma-1). A {@code PowerColumn} gives the same bits, and faster.
 *
 * @param a the exponent's part without gamma, a small multiple of 1/2
 * @param b the exponent's part over gamma - 1, a small whole number
 * @param overSonic whether the base is taken over its sonic value
 * @param ending what the power is multiplied with
 */
public record StagnationPower(double a, double b, boolean overSonic, Ending ending) {
    private static final int HUGE_SHIFT = 600;

    /** The value at one Mach number, M &gt;= 0, gamma &gt; 1. */
    public double at(double mach, double gamma) {
        if (gamma < GammaTerms.LEAST_GAMMA) {
            return steep(Math.min(mach, StagnationSum.MOST_MACH), gamma);
        }
        return mach <= StagnationSum.MOST_MACH ? plain(mach, gamma) : huge(mach, gamma);
    }

    private double plain(double mach, double gamma) {
        double h = GammaTerms.half(gamma);
        double u = StagnationSum.leading(mach, h);
        double head = StagnationSum.head(u);
        double tail = StagnationSum.tail(u, StagnationSum.rest(mach, h), head);
        return power(head, tail, 0, mach, gamma, 0);
    }

    /** With M 2^-600 in the place of M; the 1 of the sum is far below its last bit. */
    private double huge(double mach, double gamma) {
        double scaled = mach * 0x1p-600;
        double h = GammaTerms.half(gamma);
        double u = StagnationSum.leading(scaled, h);
        double head = Split.head(u, Split.DROP_23);
        double tail = (u - head) + StagnationSum.rest(scaled, h);
        return power(head, tail, 2 * HUGE_SHIFT, scaled, gamma, HUGE_SHIFT * ending.machExponent);
    }

    private double power(double head, double tail, int shift, double mach, double gamma, int n) {
        double inverse = 1 / (gamma - 1);
        double w0 = GammaTerms.exponentHead(inverse, a, b);
        double w1 = GammaTerms.exponentTail(gamma, inverse, a, b, w0);
        double x = baseHead(head, gamma);
        return Power.scaled(x, baseTail(head, tail, gamma, x), shift, w0, w1, ending, mach, gamma, n);
    }

    private double baseHead(double head, double gamma) {
        return overSonic ? StagnationSum.sonicHead(head, 1 / (1 + GammaTerms.half(gamma))) : head;
    }

    private double baseTail(double head, double tail, double gamma, double x) {
        if (!overSonic) {
            return tail;
        }
        double h = GammaTerms.half(gamma);
        double sonic = GammaTerms.sonic(h);
        return StagnationSum.sonicTail(head, tail, 1 / (1 + h), sonic, GammaTerms.sonicRest(h, sonic), x);
    }

    /** For gamma next to 1: the sum and the exponent as unevaluated sums of two whole doubles each. */
    private double steep(double mach, double gamma) {
        double h = GammaTerms.half(gamma);
        double square = mach * mach;
        double u = h * square;
        double rest = Math.fma(h, square, -u) + h * Math.fma(mach, mach, -square);
        double sum = 1 + u;
        double tail = StagnationSum.tail(u, rest, sum);
        if (overSonic) {
            double sonic = 1 + h;
            double ratio = sum / sonic;
            tail = (Math.fma(-ratio, sonic, sum) - ratio * GammaTerms.sonicRest(h, sonic) + tail) / sonic;
            sum = ratio;
        }
        double inverse = b / (gamma - 1);
        double w0 = inverse + a;
        double w1 = ((inverse - w0) + a) + Math.fma(-inverse, gamma - 1, b) / (gamma - 1);
        double power = Power.of(sum, tail, w0, w1);
        if (power > 0x1p-900 && power < 0x1p900) {
            return ending.of(power, mach, gamma);
        }
        double root = Power.of(sum, tail, 0.5 * w0, 0.5 * w1);
        return ending.of(root, mach, gamma) * root;
    }
}
