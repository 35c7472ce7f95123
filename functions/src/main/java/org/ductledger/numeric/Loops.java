package org.ductledger.numeric;

/**
 * The steps of a power over a block of rows, a loop each, over scratch arrays that are never the same array twice in a
 * call unless a step writes over what it reads.
 *
 * <p>Their shape is what the compiler turns into vector instructions: small bodies, arrays indexed by the counter
 * alone, and every read of a row before the first write.
 */
final class Loops {
    private Loops() {}

    static void exponents(double[] gamma, double[] h, double[] w0, double[] w1, double a, double b, int n) {
        for (int i = 0; i < n; i++) {
            double g = gamma[i];
            double half = GammaTerms.half(g);
            double inverse = 1 / (g - 1);
            double w = GammaTerms.exponentHead(inverse, a, b);
            double rest = GammaTerms.exponentTail(g, inverse, a, b, w);
            h[i] = half;
            w0[i] = w;
            w1[i] = rest;
        }
    }

    static void leading(double[] mach, double[] h, double[] u, double[] rest, int n) {
        for (int i = 0; i < n; i++) {
            double m = mach[i];
            double half = h[i];
            double first = StagnationSum.leading(m, half);
            double second = StagnationSum.rest(m, half);
            u[i] = first;
            rest[i] = second;
        }
    }

    static void sum(double[] u, double[] rest, double[] head, double[] tail, int n) {
        for (int i = 0; i < n; i++) {
            double first = u[i];
            double sum = StagnationSum.head(first);
            double left = StagnationSum.tail(first, rest[i], sum);
            head[i] = sum;
            tail[i] = left;
        }
    }

    static void sonicTerms(double[] h, double[] sonic, double[] rest, double[] inverse, int n) {
        for (int i = 0; i < n; i++) {
            double half = h[i];
            double first = GammaTerms.sonic(half);
            double second = GammaTerms.sonicRest(half, first);
            sonic[i] = first;
            rest[i] = second;
            inverse[i] = 1 / (1 + half);
        }
    }

    static void overSonic(double[] head, double[] tail, double[] sonic, double[] rest, double[] inverse, int n) {
        for (int i = 0; i < n; i++) {
            double sum = head[i];
            double reciprocal = inverse[i];
            double x = StagnationSum.sonicHead(sum, reciprocal);
            double left = StagnationSum.sonicTail(sum, tail[i], reciprocal, sonic[i], rest[i], x);
            head[i] = x;
            tail[i] = left;
        }
    }

    static void gather(double[] head, double[] scale, double[] k, double[] tableTail, int n) {
        for (int i = 0; i < n; i++) {
            long bits = Double.doubleToRawLongBits(head[i]);
            int row = Log2.row(bits);
            double factor = Log2.scale(bits, row);
            double whole = Log2.exponent(bits) + Log2Table.ROWS[row + 1];
            double left = Log2Table.ROWS[row + 2];
            scale[i] = factor;
            k[i] = whole;
            tableTail[i] = left;
        }
    }

    static void reduce(double[] head, double[] tail, double[] scale, int n) {
        for (int i = 0; i < n; i++) {
            double factor = scale[i];
            double zHead = Log2.reduced(head[i], factor);
            double zTail = tail[i] * factor;
            head[i] = zHead;
            tail[i] = zTail;
        }
    }

    static void logarithmHead(
            double[] head, double[] tail, double[] k, double[] tableTail, double[] s, double[] z, int n) {
        for (int i = 0; i < n; i++) {
            double whole = k[i];
            double zHead = head[i];
            double zTail = tail[i];
            double sum = Log2.head(whole, zHead);
            double left = Log2.tail(whole, tableTail[i], zHead, zTail, sum);
            s[i] = sum;
            tail[i] = left;
            z[i] = zHead + zTail;
        }
    }

    static void logarithmTail(double[] tail, double[] z, int n) {
        for (int i = 0; i < n; i++) {
            tail[i] = tail[i] + Log2.bend(z[i]);
        }
    }

    static void fraction(double[] w0, double[] w1, double[] s, double[] t, double[] f, double[] whole, int n) {
        for (int i = 0; i < n; i++) {
            double w = w0[i];
            double sum = s[i];
            double y = Exp2.leading(w, sum);
            double rounded = Exp2.rounded(y);
            double left = Exp2.fraction(y, rounded, w, w1[i], sum, t[i]);
            whole[i] = rounded;
            f[i] = left;
        }
    }

    static void exponentialTail(double[] f, double[] bend, int n) {
        for (int i = 0; i < n; i++) {
            bend[i] = Exp2.bend(f[i]);
        }
    }

    static void mantissa(double[] f, double[] bend, double[] mantissa, int n) {
        for (int i = 0; i < n; i++) {
            mantissa[i] = Exp2.mantissa(f[i], bend[i]);
        }
    }

    static void overMach(double[] x, double[] mach, int n) {
        for (int i = 0; i < n; i++) {
            x[i] = Ending.overMach(x[i], mach[i]);
        }
    }

    static void machRootGamma(double[] x, double[] mach, double[] gamma, int n) {
        for (int i = 0; i < n; i++) {
            x[i] = Ending.machRootGamma(x[i], mach[i], gamma[i]);
        }
    }

    static void halfGammaMachSquare(double[] x, double[] mach, double[] gamma, int n) {
        for (int i = 0; i < n; i++) {
            x[i] = Ending.halfGammaMachSquare(x[i], mach[i], gamma[i]);
        }
    }

    static void scale(double[] x, double[] whole, double[] result, int start, int n) {
        for (int i = 0; i < n; i++) {
            result[start + i] = Exp2.scaled(x[i], Exp2.whole(whole[i]));
        }
    }
}
