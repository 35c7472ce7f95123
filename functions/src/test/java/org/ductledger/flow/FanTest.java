package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class FanTest {
    private static final int POINTS = 100_000;

    private static double conditionAt(double mach, double angle, double gamma) {
        double slope =
                Math.toDegrees(Math.sqrt((mach - 1) * (mach + 1)) / mach / (1 + 0.5 * (gamma - 1) * mach * mach));
        return angle / (mach * slope);
    }

    @Test
    void theInverseReturnsToTheMachNumber() {
        SplittableRandom random = new SplittableRandom(1);
        for (int i = 0; i < POINTS; i++) {
            double gamma = 1 + StrictMath.pow(10, -6 + 8 * random.nextDouble());
            double mach = 1 + StrictMath.pow(10, -13 + 20 * random.nextDouble());
            double angle = Fan.prandtlMeyerAngle(mach, gamma);
            double left = Fan.angleLeft(mach, gamma);
            double found = FanInverse.mach(angle, left, gamma);
            double condition = conditionAt(mach, Math.min(angle, left), gamma);
            double error = Math.abs(found - mach) / Math.ulp(mach);
            assertTrue(error <= 6 * (1 + condition), () -> error + " ulp at " + mach + ", " + gamma);
        }
    }

    @Test
    void theAngleGrowsWithTheMachNumber() {
        SplittableRandom random = new SplittableRandom(2);
        for (int i = 0; i < POINTS; i++) {
            double gamma = 1.01 + random.nextDouble();
            double mach = 1 + StrictMath.pow(10, -12 + 14 * random.nextDouble());
            double more = 1 + (mach - 1) * (1 + 1e-9);
            assertTrue(Fan.prandtlMeyerAngle(more, gamma) >= Fan.prandtlMeyerAngle(mach, gamma) * (1 - 8e-16));
        }
    }

    @Test
    void theLimitsAreMet() {
        assertEquals(0, Fan.prandtlMeyerAngle(1, 1.4));
        assertEquals(1, Fan.machFromPrandtlMeyerAngle(0, 1.4));
        assertEquals(Fan.prandtlMeyerAngleMax(1.4), Fan.prandtlMeyerAngle(1e300, 1.4), 1e-13);
        assertEquals(90 * (Math.sqrt(6) - 1), Fan.prandtlMeyerAngleMax(1.4), 1e-13);
        double last = Math.nextDown(Fan.prandtlMeyerAngleMax(1.4));
        assertTrue(Fan.machFromPrandtlMeyerAngle(last, 1.4) > 1e14);
        assertEquals(Double.NaN, Fan.machFromPrandtlMeyerAngle(Fan.prandtlMeyerAngleMax(1.4), 1.4));
    }

    /** Near M = 1 nu = (2/(gamma+1)) (M^2-1)^(3/2)/3 in radians, the first term of its series. */
    @Test
    void nearSonicFlowFollowsTheSeries() {
        double excess = 0x1p-40;
        double leading = Math.toDegrees(Math.pow(2 * excess, 1.5) / 3 / 1.2);
        assertEquals(leading, Fan.prandtlMeyerAngle(1 + excess, 1.4), 1e-11 * leading);
    }

    /** As gamma tends to 1 nu tends to sqrt(M^2-1) - atan sqrt(M^2-1), in radians. */
    @Test
    void gammaNearOneTendsToItsLimit() {
        double y = Math.sqrt(3);
        assertEquals(Math.toDegrees(y - Math.PI / 3), Fan.prandtlMeyerAngle(2, Math.nextUp(1.0)), 1e-12);
    }

    @Test
    void noTurnLeavesTheFlowAsItIs() {
        for (double mach1 : new double[] {1, 1.0000001, 1.3, 2, 25, 1e6, 1e200}) {
            assertEquals(mach1, Fan.mach2(mach1, 0, 1.4), 4e-9 * (mach1 - 1) + 1e-15);
            assertEquals(1, Fan.p2OverP1(mach1, 0, 1.4), 1e-7);
        }
    }

    @Test
    void aTurnAndItsReverseCancel() {
        SplittableRandom random = new SplittableRandom(3);
        for (int i = 0; i < 1000; i++) {
            double mach1 = 1.1 + 5 * random.nextDouble();
            double gamma = 1.1 + 0.6 * random.nextDouble();
            double turn = 0.8 * random.nextDouble() * Fan.angleLeft(mach1, gamma);
            double mach2 = Fan.mach2(mach1, turn, gamma);
            assertEquals(mach1, Fan.mach2(mach2, -turn, gamma), 1e-12 * mach1);
            assertEquals(
                    1,
                    Fan.p2OverP1(mach1, turn, gamma) * Fan.p2OverP1(mach2, -turn, gamma),
                    1e-10,
                    () -> "at " + mach1);
        }
    }

    @Test
    void compressionEndsAtSonicFlowAndExpansionAtVacuum() {
        double angle = Fan.prandtlMeyerAngle(2, 1.4);
        assertEquals(1, Fan.mach2(2, -angle, 1.4));
        assertEquals(Double.NaN, Fan.mach2(2, -Math.nextUp(angle), 1.4));
        double left = Fan.angleLeft(2, 1.4);
        assertEquals(Double.NaN, Fan.mach2(2, left, 1.4));
        assertTrue(Fan.mach2(2, Math.nextDown(left), 1.4) > 1e14);
        assertTrue(Fan.p2OverP1(2, Math.nextDown(left), 1.4) < 1e-90);
    }
}
