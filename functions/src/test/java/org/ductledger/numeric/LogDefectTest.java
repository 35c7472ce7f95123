package org.ductledger.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.ductledger.exact.FortyDigits;
import org.hipparchus.dfp.Dfp;
import org.junit.jupiter.api.Test;

class LogDefectTest {
    private static final int POINTS = 800;
    private static final double UNIT = 0x1p-53;

    private final SplittableRandom random = new SplittableRandom(11);

    private double decade(double low, double high) {
        return StrictMath.pow(10, low + (high - low) * random.nextDouble());
    }

    /** y - ln(1 + y); 64 digits leave 34 of it for the smallest y asked. */
    private static Dfp exact(Dfp y) {
        return y.subtract(FortyDigits.log(y.add(1)));
    }

    @Test
    void theDifferenceKeepsItsDigitsEverywhere() {
        for (int i = 0; i < POINTS; i++) {
            double y = random.nextBoolean() ? decade(-15, 20) : -decade(-15, 0);
            double got = LogDefect.of(y);
            double condition = y / (1 + y) * y / got;
            double ulps = FortyDigits.ulps(got, exact(FortyDigits.of(y)));
            assertTrue(ulps <= 2 + 0.5 * condition, () -> "at " + y + ": " + ulps);
        }
    }

    @Test
    void aQuotientCountsToTwiceTheDigits() {
        for (int i = 0; i < POINTS; i++) {
            double d = decade(-3, 3);
            double dRest = (random.nextDouble() - 0.5) * Math.ulp(d);
            double n = -d * (1 - decade(-12, 0));
            double nRest = (random.nextDouble() - 0.5) * 1e-3 * (d + n);
            Dfp y = FortyDigits.of(n)
                    .add(FortyDigits.of(nRest))
                    .divide(FortyDigits.of(d).add(FortyDigits.of(dRest)));
            double got = LogDefect.ofQuotient(n, nRest, d, dRest);
            double ulps = FortyDigits.ulps(got, exact(y));
            assertTrue(ulps <= 3, () -> "at " + n + "/" + d + ": " + ulps);
        }
    }

    @Test
    void bothRootsSolveTheEquation() {
        for (int i = 0; i < POINTS; i++) {
            double k = decade(-28, i % 2 == 0 ? 1.7 : 0.5);
            assertRoot(k, FortyDigits.of(LogDefectRoot.above(k)), "above");
            Dfp y = k < 0.19
                    ? FortyDigits.of(LogDefectRoot.below(k))
                    : FortyDigits.of(LogDefectRoot.sumBelow(k)).subtract(1);
            assertRoot(k, y, "below");
        }
    }

    /** The residual over the slope is the error of ln(1 + y): a few roundings of it and of K. */
    private static void assertRoot(double k, Dfp y, String side) {
        double slope = y.toDouble();
        double error = Math.abs(exact(y).subtract(FortyDigits.of(k)).divide(y).toDouble());
        double size = Math.min(Math.abs(slope), 1) + Math.max(1, k) * Math.min(1, k / Math.abs(slope));
        assertTrue(error <= 4 * UNIT * size, () -> side + " at " + k + ": " + error / UNIT / size);
    }

    @Test
    void theSeedsComeAsNearAsOneStepNeeds() {
        for (double s = 0.001; s < 20; s += 0.001) {
            double k = 0.5 * s * s;
            double above = LogDefectRoot.above(k);
            assertEquals(above, LogDefectRoot.aboveSeed(s, k), 1e-5 * above);
            double below = k < 0.19 ? LogDefectRoot.below(k) : LogDefectRoot.sumBelow(k) - 1;
            double gap = Math.min(-below, 1 + below);
            assertEquals(below, LogDefectRoot.belowSeed(s, k), 2e-5 * gap + 1e-15);
        }
    }

    @Test
    void atZeroBothRootsAreZero() {
        assertEquals(0, LogDefectRoot.above(0));
        assertEquals(0, LogDefectRoot.below(0));
        assertEquals(1, LogDefectRoot.sumBelow(0));
        assertEquals(0, LogDefect.of(0));
    }

    @Test
    void farOutTheUpperRootIsTheNumberPlusItsLogarithm() {
        for (double k = 1e6; k < 1e300; k *= 1e7) {
            double y = LogDefectRoot.above(k);
            assertEquals(k + StrictMath.log1p(y), y, 2 * Math.ulp(y));
        }
    }
}
