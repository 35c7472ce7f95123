package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class ObliqueShockTest {
    private static final double WEAK = 0;
    private static final double STRONG = 1;
    private static final int POINTS = 50_000;

    private static double drawnMach(SplittableRandom random) {
        return 1 + StrictMath.pow(10, -9 + 15 * random.nextDouble());
    }

    private static double drawnGamma(SplittableRandom random, int i) {
        return i % 3 == 0 ? 1 + StrictMath.pow(10, -6 + 7.5 * random.nextDouble()) : 1.05 + 0.7 * random.nextDouble();
    }

    @Test
    void theDeflectionOfTheShockAngleIsTheOneGiven() {
        SplittableRandom random = new SplittableRandom(1);
        for (int i = 0; i < POINTS; i++) {
            double mach1 = drawnMach(random);
            double gamma = drawnGamma(random, i);
            double share = i % 4 == 0 ? StrictMath.pow(10, -12 * random.nextDouble()) : random.nextDouble();
            double given = share * ObliqueLimits.deflectionMax(mach1, gamma);
            for (double branch = WEAK; branch <= STRONG; branch++) {
                double angle = ObliqueAngle.shockAngle(mach1, given, gamma, branch);
                double back = ObliqueShock.deflection(mach1, angle, gamma);
                double ofAngle = Math.abs(ObliqueSlopes.deflectionByShockAngle(mach1, angle, gamma)) * Math.ulp(angle);
                assertEquals(
                        given, back, 8 * ofAngle + 16 * Math.ulp(given), () -> mach1 + ", " + given + ", " + gamma);
            }
        }
    }

    @Test
    void theWeakShockIsTheFlatterOne() {
        SplittableRandom random = new SplittableRandom(2);
        for (int i = 0; i < POINTS; i++) {
            double mach1 = drawnMach(random);
            double gamma = drawnGamma(random, i);
            double given = random.nextDouble() * ObliqueLimits.deflectionMax(mach1, gamma);
            double most = ObliqueLimits.angleAtDeflectionMax(mach1, gamma);
            double weak = ObliqueAngle.shockAngle(mach1, given, gamma, WEAK);
            assertTrue(weak <= most * (1 + 1e-12), () -> mach1 + ", " + given + ", " + gamma);
            assertTrue(weak >= Isentropic.machAngle(mach1) * (1 - 1e-15));
            assertTrue(ObliqueAngle.shockAngle(mach1, given, gamma, STRONG) >= most * (1 - 1e-12));
        }
    }

    @Test
    void theGreatestDeflectionHasBothShocksInOneAndAnUlpMoreHasNone() {
        SplittableRandom random = new SplittableRandom(3);
        for (int i = 0; i < POINTS; i++) {
            double mach1 = 1.01 + StrictMath.pow(10, -2 + 6 * random.nextDouble());
            double gamma = 1.05 + 0.7 * random.nextDouble();
            double most = ObliqueLimits.deflectionMax(mach1, gamma);
            double angle = ObliqueLimits.angleAtDeflectionMax(mach1, gamma);
            assertEquals(angle, ObliqueAngle.shockAngle(mach1, most, gamma, WEAK), 1e-5);
            assertEquals(angle, ObliqueAngle.shockAngle(mach1, most, gamma, STRONG), 1e-5);
            assertEquals(Double.NaN, ObliqueAngle.shockAngle(mach1, most * (1 + 1e-14), gamma, WEAK));
        }
    }

    @Test
    void noDeflectionHasTheMachWaveAndTheNormalShock() {
        for (double mach1 : new double[] {1.0000001, 1.5, 3, 40, 1e8, 1e200}) {
            double wave = Isentropic.machAngle(mach1);
            assertEquals(wave, ObliqueAngle.shockAngle(mach1, 0, 1.4, WEAK), 1e-15 * wave);
            assertEquals(90, ObliqueAngle.shockAngle(mach1, 0, 1.4, STRONG));
            double tiny = 1e-12 * ObliqueLimits.deflectionMax(mach1, 1.4);
            double above = ObliqueAngle.shockAngle(mach1, mach1 > 1e6 ? 0 : tiny, 1.4, WEAK);
            assertEquals(wave, above, 1e-10 * wave + 1.3e-12 * (90 - wave));
            assertEquals(0, ObliqueShock.deflection(mach1, 90, 1.4));
        }
        assertEquals(90, ObliqueAngle.shockAngle(1, 0, 1.4, WEAK));
        assertEquals(Double.NaN, ObliqueAngle.shockAngle(1, 1e-9, 1.4, WEAK));
    }

    /** Weak shocks near the Mach wave: the shock angle exceeds it by (gamma+1)/4 / cos^2 of it times the deflection. */
    @Test
    void weakShocksFollowTheLinearTheory() {
        double wave = Isentropic.machAngle(2);
        double deflection = 1e-5;
        double expected = wave + 0.6 / 0.75 * deflection;
        assertEquals(expected, ObliqueAngle.shockAngle(2, deflection, 1.4, WEAK), 1e-9);
    }

    /** Hypersonic similarity: M1 to infinity at a fixed M1 times deflection keeps shock angle over deflection. */
    @Test
    void hypersonicSmallDeflectionsAreSimilar() {
        double one = ObliqueAngle.shockAngle(1e5, 1e-4, 1.4, WEAK) / 1e-4;
        double other = ObliqueAngle.shockAngle(1e60, 1e-59, 1.4, WEAK) / 1e-59;
        assertEquals(one, other, 1e-9 * one);
        assertEquals(
                ObliqueAngle.shockAngle(1e30, 20, 1.4, WEAK), ObliqueAngle.shockAngle(1e300, 20, 1.4, WEAK), 1e-13);
    }

    @Test
    void aNormalShockIsTheObliqueOneOfNinetyDegrees() {
        for (double mach1 : new double[] {1, 1.2, 3, 30}) {
            assertEquals(NormalShock.mach2(mach1, 1.4), ObliqueShock.mach2(mach1, 90, 1.4), 1e-15);
            assertEquals(NormalShock.t2OverT1(mach1, 1.4), ObliqueShock.t2OverT1(mach1, 90, 1.4));
            assertEquals(NormalShock.p02OverP01(mach1, 1.4), ObliqueShock.p02OverP01(mach1, 90, 1.4));
        }
    }

    @Test
    void belowTheMachAngleThereIsNoShock() {
        double wave = Isentropic.machAngle(2);
        assertEquals(0, ObliqueShock.deflection(2, wave, 1.4), 1e-14);
        assertEquals(1, ObliqueShock.p2OverP1(2, wave, 1.4), 1e-14);
        assertEquals(Double.NaN, ObliqueShock.deflection(2, wave * (1 - 1e-14), 1.4));
        assertEquals(Double.NaN, ObliqueShock.mach2(2, wave * (1 - 1e-14), 1.4));
        assertEquals(Double.NaN, ObliqueShock.t2OverT1(2, wave * (1 - 1e-14), 1.4));
    }

    @Test
    void theSonicAngleLeavesSonicFlow() {
        SplittableRandom random = new SplittableRandom(4);
        for (int i = 0; i < POINTS; i++) {
            double mach1 = 1 + StrictMath.pow(10, -6 + 9 * random.nextDouble());
            double gamma = drawnGamma(random, i);
            double angle = ObliqueLimits.angleAtSonic(mach1, gamma);
            double ofAngle = Math.abs(ObliqueSlopes.mach2ByShockAngle(mach1, angle, gamma)) * Math.ulp(angle);
            assertEquals(1, ObliqueShock.mach2(mach1, angle, gamma), 4 * ofAngle + 2e-15, () -> mach1 + ", " + gamma);
            assertTrue(angle <= ObliqueLimits.angleAtDeflectionMax(mach1, gamma) * (1 + 1e-14));
        }
    }

    @Test
    void detachmentReturnsToTheMachNumber() {
        SplittableRandom random = new SplittableRandom(5);
        for (int i = 0; i < POINTS; i++) {
            double mach1 = 1 + StrictMath.pow(10, -9 + 13 * random.nextDouble());
            double gamma = drawnGamma(random, i);
            double most = ObliqueLimits.deflectionMax(mach1, gamma);
            double condition = most / (mach1 * ObliqueSlopes.deflectionMaxByMach1(mach1, gamma));
            double found = ObliqueLimits.mach1AtDetachment(most, gamma);
            assertEquals(mach1, found, 8 * (1 + condition) * Math.ulp(mach1), () -> mach1 + ", " + gamma);
        }
        assertEquals(1, ObliqueLimits.mach1AtDetachment(0, 1.4));
        double limit = ObliqueLimits.deflectionLimit(1.4);
        assertEquals(Math.toDegrees(Math.asin(1 / 1.4)), limit, 1e-13);
        assertTrue(ObliqueLimits.mach1AtDetachment(Math.nextDown(limit), 1.4) > 1e7);
        assertEquals(Double.NaN, ObliqueLimits.mach1AtDetachment(limit, 1.4));
    }

    @Test
    void aDetachedShockSaysWhatItNeeds() {
        String says = ObliqueLimits.attachment(2, 30, 1.4);
        assertTrue(says.startsWith("must be at most 22.973531"), says);
        assertTrue(says.contains("this deflection needs mach1 of at least 2.5"), says);
        assertTrue(ObliqueLimits.attachment(2, 60, 1.4).contains("from 45.58469"), says);
        assertFalse(ObliqueLimits.attachment(2, 60, 1.4).contains("needs"));
    }
}
