package org.ductledger.numeric;

import static org.ductledger.exact.FortyDigits.ulps;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.ductledger.exact.FortyDigits;
import org.hipparchus.dfp.Dfp;
import org.hipparchus.dfp.DfpMath;
import org.junit.jupiter.api.Test;

class ArcTangentTest {
    private static void assertClose(double x) {
        Dfp exact = DfpMath.atan(FortyDigits.of(x));
        double error = ulps(ArcTangent.of(x), exact);
        assertTrue(error <= 0.52, () -> error + " ulp at " + x);
        double errorOfLag = ulps(ArcTangent.lag(x), FortyDigits.of(x).subtract(exact));
        assertTrue(errorOfLag <= 3, () -> errorOfLag + " ulp of the lag at " + x);
    }

    @Test
    void bothAreRightInFortyDigits() {
        SplittableRandom random = new SplittableRandom(4);
        for (int i = 0; i < 1500; i++) {
            assertClose(StrictMath.pow(10, -7 + 10 * random.nextDouble()));
        }
    }

    @Test
    void bothAreRightAtTheSeamsOfTheTable() {
        for (double seam : new double[] {0x1p-6, 0x1.08p-6, 1, 1.015625, 0x1p6}) {
            assertClose(Math.nextDown(seam));
            assertClose(seam);
            assertClose(Math.nextUp(seam));
        }
    }

    @Test
    void theEndsAreExact() {
        assertEquals(0, ArcTangent.of(0));
        assertEquals(0, ArcTangent.lag(0));
        assertEquals(Math.PI / 2, ArcTangent.of(Double.POSITIVE_INFINITY));
        assertEquals(Math.PI / 2, ArcTangent.of(Double.MAX_VALUE));
        assertEquals(1e-300, ArcTangent.of(1e-300));
        assertEquals(Double.NaN, ArcTangent.of(Double.NaN));
        assertEquals(Double.NaN, ArcTangent.lag(Double.NaN));
    }
}
