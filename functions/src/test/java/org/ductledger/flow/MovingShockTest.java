package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class MovingShockTest {
    private static final int POINTS = 100_000;

    @Test
    void theShockTubeReturnsToItsPressureRatio() {
        SplittableRandom random = new SplittableRandom(1);
        for (int i = 0; i < POINTS; i++) {
            double gamma1 = 1.01 + 0.8 * random.nextDouble();
            double gamma4 = 1.01 + 0.8 * random.nextDouble();
            double a = StrictMath.pow(10, -2 + 4 * random.nextDouble());
            double given = 1 + StrictMath.pow(10, -10 + 16 * random.nextDouble());
            double mach1 = ShockTube.mach1(given, gamma1, gamma4, a);
            double back = ShockTube.p4OverP1(mach1, gamma1, gamma4, a);
            double passed = Math.ulp(mach1) / ShockTube.ofMach()[0].at(given, gamma1, gamma4, a);
            double condition =
                    Math.log(given) + Math.abs(a * ShockTube.ofRatio()[3].at(mach1, gamma1, gamma4, a)) / given;
            double allowed = 4 * passed + 8 * (1 + condition) * Math.ulp(given);
            assertEquals(given, back, allowed, () -> given + ", " + gamma1 + ", " + gamma4 + ", " + a);
        }
    }

    @Test
    void noPressureDifferenceDrivesNoShock() {
        assertEquals(1, ShockTube.mach1(1, 1.4, 1.667, 3));
        assertEquals(1, ShockTube.p4OverP1(1, 1.4, 1.667, 3));
        assertEquals(1, ShockTube.mach1(Math.nextUp(1.0), 1.4, 1.667, 3), 1e-15);
        assertEquals(1, MovingShock.mach(1, 1.4));
        assertEquals(0, MovingShock.gasMach2(1, 1.4));
        assertEquals(1, MovingShock.reflectedMach(1, 1.4));
        assertEquals(1, MovingShock.p5OverP1(1, 1.4));
    }

    /** An acoustic wave: p2/p1 - 1 is half of p4/p1 - 1 where both gases are the same. */
    @Test
    void weakShocksFollowAcoustics() {
        double mach1 = ShockTube.mach1(1 + 1e-7, 1.4, 1.4, 1);
        assertEquals(0.5e-7, NormalShock.p2OverP1(mach1, 1.4) - 1, 1e-14);
        assertEquals(2e-7, MovingShock.p5OverP1(1 + 1e-7 * 2.4 / 5.6, 1.4) - 1, 1e-13);
    }

    @Test
    void noPressureRatioDrivesAShockBeyondTheLimit() {
        double limit = ShockTube.mach1Limit(1.4, 1.4, 1);
        assertEquals(3 + Math.sqrt(10), limit, 1e-14);
        assertTrue(ShockTube.p4OverP1(0.999999 * limit, 1.4, 1.4, 1) > 1e40);
        assertEquals(Double.NaN, ShockTube.p4OverP1(limit * (1 + 1e-15), 1.4, 1.4, 1));
        assertEquals(limit, ShockTube.mach1(1e300, 1.4, 1.4, 1), 1e-13);
        assertEquals(limit, ShockTube.mach1(Double.MAX_VALUE, 1.4, 1.4, 1), 1e-13);
    }

    @Test
    void strongShocksTendToTheirLimits() {
        assertEquals(Math.sqrt(2 / (1.4 * 0.4)), MovingShock.gasMach2(1e200, 1.4), 1e-14);
        assertEquals(Math.sqrt(2.8 / 0.4), MovingShock.reflectedMach(1e200, 1.4), 1e-14);
        double p5OverP2 = MovingShock.p5OverP1(1e70, 1.4) / NormalShock.p2OverP1(1e70, 1.4);
        assertEquals(8, p5OverP2, 1e-13);
    }

    @Test
    void aHarderPushDrivesAFasterShock() {
        double last = 1;
        for (double p = 1; p < 1e12; p *= 1.01) {
            double mach1 = ShockTube.mach1(p, 1.4, 1.667, 2.5);
            assertTrue(mach1 >= last);
            last = mach1;
        }
    }
}
