package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;

class AtmosphereTest {
    private static final double[] BASES = {11_000, 20_000, 32_000, 47_000, 51_000, 71_000};

    @Test
    void pressureAndDensityFallAllTheWayUp() {
        double p = Double.POSITIVE_INFINITY;
        double rho = Double.POSITIVE_INFINITY;
        for (double h = 0; h <= 84_852; h += 0.5) {
            assertTrue(Atmosphere.p(h) < p && Atmosphere.rho(h) < rho, "at " + h);
            p = Atmosphere.p(h);
            rho = Atmosphere.rho(h);
        }
    }

    @Test
    void theLayersJoinWithoutAStep() {
        for (double h : BASES) {
            double below = Math.nextDown(h);
            assertEquals(Atmosphere.t(h), Atmosphere.t(below), 1e-12);
            assertEquals(1, Atmosphere.p(below) / Atmosphere.p(h), 1e-14);
        }
    }

    @Test
    void eachSlopeIsTheLimitOfADifference() {
        SplittableRandom random = new SplittableRandom(3);
        for (int i = 0; i < 2000; i++) {
            double h = 10 + random.nextDouble() * 84_800;
            if (isNearABase(h)) {
                continue;
            }
            assertSlope(Atmosphere::t, Atmosphere.tByGeopotential(h), h);
            assertSlope(Atmosphere::p, Atmosphere.pByGeopotential(h), h);
            assertSlope(Atmosphere::rho, Atmosphere.rhoByGeopotential(h), h);
            assertSlope(Atmosphere::speedOfSound, Atmosphere.speedOfSoundByGeopotential(h), h);
            assertSlope(Atmosphere::geopotentialFromGeometric, Atmosphere.geopotentialByGeometric(h), h);
        }
    }

    private static boolean isNearABase(double h) {
        for (double base : BASES) {
            if (Math.abs(h - base) < 3) {
                return true;
            }
        }
        return false;
    }

    private static void assertSlope(DoubleUnaryOperator f, double slope, double h) {
        double difference = (f.applyAsDouble(h + 1) - f.applyAsDouble(h - 1)) / 2;
        assertEquals(difference, slope, 1e-7 * Math.abs(slope) + 1e-12 * f.applyAsDouble(h), () -> "at " + h);
    }
}
