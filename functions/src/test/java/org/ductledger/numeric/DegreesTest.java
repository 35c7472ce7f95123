package org.ductledger.numeric;

import static org.ductledger.exact.FortyDigits.ulps;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.ductledger.exact.FortyDigits;
import org.hipparchus.dfp.Dfp;
import org.hipparchus.dfp.DfpMath;
import org.junit.jupiter.api.Test;

class DegreesTest {
    private static void assertClose(double got, Dfp exact, double most, double angle) {
        double error = ulps(got, exact);
        assertTrue(error <= most, () -> got + " is " + error + " ulp off at " + angle);
    }

    private static double drawn(SplittableRandom random, int i) {
        double near = StrictMath.pow(10, -9 + 10.6 * random.nextDouble());
        return switch (i % 3) {
            case 0 -> near;
            case 1 -> 90 - near;
            default -> 90 * random.nextDouble();
        };
    }

    @Test
    void theFunctionsAreRightInFortyDigits() {
        SplittableRandom random = new SplittableRandom(5);
        for (int i = 0; i < 3000; i++) {
            double angle = drawn(random, i);
            Dfp radians = FortyDigits.of(angle).multiply(FortyDigits.pi()).divide(180);
            Dfp sin = DfpMath.sin(radians);
            Dfp cos = DfpMath.sin(FortyDigits.pi().divide(2).subtract(radians));
            assertClose(Degrees.toRadians(angle), radians, 1, angle);
            assertClose(
                    Degrees.ofRadians(angle),
                    FortyDigits.of(angle).multiply(180).divide(FortyDigits.pi()),
                    1,
                    angle);
            assertClose(Degrees.sin(angle), sin, 1.5, angle);
            assertClose(Degrees.cos(angle), cos, 1.5, angle);
            assertClose(Degrees.tan(angle), sin.divide(cos), 3, angle);
            double cotangent = cos.divide(sin).toDouble();
            Dfp back = DfpMath.atan(FortyDigits.of(cotangent).reciprocal())
                    .multiply(180)
                    .divide(FortyDigits.pi());
            assertClose(Degrees.ofCotangent(cotangent), back, 2.5, angle);
        }
    }

    @Test
    void theEndsAreExact() {
        assertEquals(0, Degrees.sin(0));
        assertEquals(1, Degrees.sin(90));
        assertEquals(1, Degrees.cos(0));
        assertEquals(0, Degrees.cos(90));
        assertEquals(90, Degrees.ofCotangent(0));
        assertEquals(45, Degrees.ofCotangent(1));
        assertEquals(0, Degrees.ofCotangent(Double.POSITIVE_INFINITY));
        assertEquals(1, Degrees.tan(45), 0x1p-52);
        assertEquals(0.5, Degrees.sin(30), 0x1p-53);
    }
}
