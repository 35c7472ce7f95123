package org.ductledger.numeric;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.function.UnaryOperator;
import org.hipparchus.dfp.Dfp;
import org.hipparchus.dfp.DfpField;
import org.hipparchus.dfp.DfpMath;
import org.junit.jupiter.api.Test;

/** Derives the polynomials and the split constants again, to the bit, by interpolation in 120-digit arithmetic. */
class SeriesTest {
    private static final DfpField FIELD = new DfpField(120);
    private static final Dfp LN2 = FIELD.getLn2();

    @Test
    void logarithmsSeriesInterpolatesAtChebyshevsNodes() {
        assertArrayEquals(Log2.SERIES, interpolated(Log2.REACH, Log2.SERIES.length, SeriesTest::logarithmsBend));
    }

    @Test
    void exponentialsSeriesInterpolatesAtChebyshevsNodes() {
        assertArrayEquals(Exp2.SERIES, interpolated(Exp2.REACH, Exp2.SERIES.length, SeriesTest::exponentialsBend));
    }

    @Test
    void reachCoversEveryBin() {
        double most = 0;
        for (int bin = 0; bin < 128; bin++) {
            double reciprocal = Log2Table.ROWS[4 * bin];
            most = Math.max(most, Math.abs((1 + bin / 128.0) * reciprocal - 1));
            most = Math.max(most, Math.abs((1 + (bin + 1) / 128.0) * reciprocal - 1));
        }
        assertEquals(0x1.148p-8, most);
        assertEquals(true, most < Log2.REACH);
    }

    @Test
    void constantsAreSplitLogarithmsOfTwo() {
        Dfp inverse = LN2.reciprocal();
        assertEquals(nearest(inverse), Log2.INVERSE_LN2);
        assertEquals(nearest(inverse.subtract(exactly(Log2.INVERSE_LN2_HEAD))), Log2.INVERSE_LN2_TAIL);
        assertEquals(nearest(LN2), Exp2.LN2);
        assertEquals(nearest(LN2.subtract(exactly(Exp2.LN2_HEAD))), Exp2.LN2_TAIL);
    }

    /** (log2(1 + z) - z / ln 2) / z^2. */
    private static Dfp logarithmsBend(Dfp z) {
        return DfpMath.log(z.add(1)).subtract(z).divide(LN2).divide(z.multiply(z));
    }

    /** (2^f - 1 - f ln 2) / f^2. */
    private static Dfp exponentialsBend(Dfp f) {
        Dfp y = f.multiply(LN2);
        return DfpMath.exp(y).subtract(y.add(1)).divide(f.multiply(f));
    }

    /** The coefficients of the polynomial through n of Chebyshev's nodes on +-reach, by divided differences. */
    private static double[] interpolated(double reach, int n, UnaryOperator<Dfp> function) {
        Dfp[] x = new Dfp[n];
        Dfp[] divided = new Dfp[n];
        for (int i = 0; i < n; i++) {
            x[i] = DfpMath.cos(FIELD.getPi().multiply(2 * i + 1).divide(2 * n)).multiply(exactly(reach));
            divided[i] = function.apply(x[i]);
        }
        for (int j = 1; j < n; j++) {
            for (int i = n - 1; i >= j; i--) {
                divided[i] = divided[i].subtract(divided[i - 1]).divide(x[i].subtract(x[i - j]));
            }
        }
        Dfp[] coefficients = new Dfp[n];
        Arrays.fill(coefficients, FIELD.getZero());
        for (int i = n - 1; i >= 0; i--) {
            for (int k = n - 1; k > 0; k--) {
                coefficients[k] = coefficients[k - 1].subtract(coefficients[k].multiply(x[i]));
            }
            coefficients[0] = divided[i].subtract(coefficients[0].multiply(x[i]));
        }
        return Arrays.stream(coefficients).mapToDouble(SeriesTest::nearest).toArray();
    }

    private static Dfp exactly(double x) {
        return FIELD.newDfp(new BigDecimal(x).toString());
    }

    private static double nearest(Dfp x) {
        return new BigDecimal(x.toString()).doubleValue();
    }
}
