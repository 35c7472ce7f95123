package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class ConeTest {
    @Test
    void noConeDisturbsNothing() {
        for (double mach1 : new double[] {1, 1.2, 3, 1e8}) {
            assertEquals(Isentropic.machAngle(mach1), Cone.shockAngle(mach1, 0, 1.4));
            assertEquals(mach1, Cone.surfaceMach(mach1, 0, 1.4));
            assertEquals(1, Cone.surfacePOverP1(mach1, 0, 1.4));
            assertEquals(1, Cone.p02OverP01(mach1, 0, 1.4));
        }
        assertEquals(0, Cone.halfAngleMax(1, 1.4));
        assertEquals(Double.NaN, Cone.shockAngle(1, 0.001, 1.4));
    }

    @Test
    void needlesTendToNoCone() {
        for (double halfAngle : new double[] {1e-3, 1e-6, 1e-9, 1e-100}) {
            assertEquals(2, Cone.surfaceMach(2, halfAngle, 1.4), 1e-4 * halfAngle + 1e-11);
            assertEquals(30, Cone.shockAngle(2, halfAngle, 1.4), 1e-9 * halfAngle + 1e-13);
            assertEquals(1, Cone.surfacePOverP1(2, halfAngle, 1.4), 1e-4 * halfAngle + 1e-11);
        }
    }

    /**
     * Slender-body theory (common practice): Cp = theta^2 (2 ln(2/(B theta)) - 1) with B^2 = M1^2 - 1, as theta tends
     * to 0.
     */
    @Test
    void slenderConesFollowSlenderBodyTheory() {
        double theta = Math.toRadians(0.05);
        double expected = theta * theta * (2 * Math.log(2 / (Math.sqrt(3) * theta)) - 1);
        double cp = (Cone.surfacePOverP1(2, 0.05, 1.4) - 1) / (0.7 * 4);
        assertEquals(expected, cp, 1e-4 * expected);
    }

    @Test
    void aConeIsGentlerThanAWedge() {
        SplittableRandom random = new SplittableRandom(1);
        for (int i = 0; i < 300; i++) {
            double mach1 = 1.05 + 10 * random.nextDouble();
            double gamma = 1.1 + 0.6 * random.nextDouble();
            double most = ObliqueLimits.deflectionMax(mach1, gamma);
            double angle = most * random.nextDouble();
            double wedge = ObliqueAngle.shockAngle(mach1, angle, gamma, ObliqueAngle.WEAK);
            assertTrue(Cone.shockAngle(mach1, angle, gamma) < wedge);
            assertTrue(Cone.surfacePOverP1(mach1, angle, gamma) < ObliqueShock.p2OverP1(mach1, wedge, gamma));
            assertTrue(Cone.halfAngleMax(mach1, gamma) > most);
        }
    }

    /** The weak shock of either side of the wedge's greatest deflection, where the search changes its start. */
    @Test
    void allGrowsWithTheHalfAngleUpToTheGreatest() {
        for (double mach1 : new double[] {1.1, 2, 6}) {
            double most = Cone.halfAngleMax(mach1, 1.4);
            double angle = Isentropic.machAngle(mach1);
            double mach = mach1;
            double p = 1;
            for (int i = 1; i <= 60; i++) {
                double halfAngle = most * i / 60;
                assertTrue(Cone.shockAngle(mach1, halfAngle, 1.4) > angle);
                assertTrue(Cone.surfaceMach(mach1, halfAngle, 1.4) < mach);
                assertTrue(Cone.surfacePOverP1(mach1, halfAngle, 1.4) > p);
                angle = Cone.shockAngle(mach1, halfAngle, 1.4);
                mach = Cone.surfaceMach(mach1, halfAngle, 1.4);
                p = Cone.surfacePOverP1(mach1, halfAngle, 1.4);
            }
        }
    }

    @Test
    void beyondTheGreatestConeTheShockIsDetached() {
        double most = Cone.halfAngleMax(2, 1.4);
        assertTrue(Cone.shockAngle(2, most, 1.4) > 0);
        assertTrue(Cone.shockAngle(2, Math.nextDown(most), 1.4) > 0);
        assertEquals(Double.NaN, Cone.shockAngle(2, Math.nextUp(most), 1.4));
        assertEquals(Double.NaN, Cone.surfaceMach(2, 50, 1.4));
        assertEquals(Double.NaN, Cone.surfacePOverP1(2, 50, 1.4));
        assertEquals(Double.NaN, Cone.p02OverP01(2, 50, 1.4));
    }

    @Test
    void hypersonicConesNoLongerKnowTheMachNumber() {
        assertEquals(Cone.shockAngle(1e6, 20, 1.4), Cone.shockAngle(1e200, 20, 1.4), 1e-9);
        assertEquals(Cone.surfaceMach(1e6, 20, 1.4), Cone.surfaceMach(1e200, 20, 1.4), 1e-9);
    }

    /** Drawn from all of the domain, gamma near 1 and far above, M1 from sonic to far up: always a value. */
    @Test
    void everyConeBelowTheGreatestHasItsFlow() {
        SplittableRandom random = new SplittableRandom(2);
        for (int i = 0; i < 300; i++) {
            double gamma = 1 + StrictMath.pow(10, -6 + 7.5 * random.nextDouble());
            double mach1 = 1 + StrictMath.pow(10, -8 + 14 * random.nextDouble());
            double halfAngle = Cone.halfAngleMax(mach1, gamma) * (1 - StrictMath.pow(10, -9 * random.nextDouble()));
            double angle = Cone.shockAngle(mach1, halfAngle, gamma);
            double mach = Cone.surfaceMach(mach1, halfAngle, gamma);
            String where = mach1 + ", " + halfAngle + ", " + gamma;
            assertTrue(angle >= Isentropic.machAngle(mach1) * (1 - 1e-15) && angle <= 90, where);
            assertTrue(mach > 0 && mach <= mach1 * (1 + 1e-11), where);
        }
    }
}
