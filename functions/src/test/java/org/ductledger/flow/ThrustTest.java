package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class ThrustTest {
    private static final double GAMMA = 1.25;

    /** Common practice: at a given back pressure the nozzle that expands just to it has the greatest thrust. */
    @ParameterizedTest
    @ValueSource(doubles = {2, 6, 40})
    void theDesignAreaRatioHasTheGreatestThrust(double design) {
        double pb = NozzleFlow.thirdCritical(design, GAMMA);
        double best = Thrust.coefficient(design, pb, GAMMA);
        assertTrue(Thrust.coefficient(design * 0.97, pb, GAMMA) < best);
        assertTrue(Thrust.coefficient(design * 1.03, pb, GAMMA) < best);
    }

    /** Over a normal shock p + rho V^2 is the same on both sides, and so is the thrust with the shock in the exit. */
    @Test
    void theThrustIsContinuousWhereTheShockLeavesTheNozzle() {
        double second = NozzleFlow.secondCritical(5, GAMMA);
        double inside = Thrust.coefficient(5, second, GAMMA);
        assertEquals(inside, Thrust.coefficient(5, second * (1 - 2e-9), GAMMA), 1e-8);
        assertEquals(inside, Thrust.coefficient(5, second * (1 + 2e-9), GAMMA), 1e-8);
    }

    @Test
    void inVacuumTheBackPressureIsGone() {
        assertEquals(Thrust.vacuumCoefficient(20, GAMMA), Thrust.coefficient(20, 1e-300, GAMMA), 1e-15);
    }

    /** F = m V + (pe - pb) Ae, with p0 = 1, At = 1 and m = p0 At/c*. */
    @Test
    void theThrustIsMassFlowTimesSpeedAndPressureTimesArea() {
        double exit = 7;
        double pb = 0.02;
        double mach = NozzleFlow.exitMach(exit, pb, GAMMA);
        double speed = FlowRates.flowSpeed(mach, 3000, GAMMA, 340);
        double massFlow = 1 / Thrust.characteristicVelocity(3000, GAMMA, 340);
        double force = massFlow * speed + (NozzleFlow.exitPOverP0(exit, pb, GAMMA) - pb) * exit;
        assertEquals(force, Thrust.coefficient(exit, pb, GAMMA), 1e-14);
    }

    @Test
    void aConeLosesMomentumWithItsAngle() {
        assertEquals(1, Thrust.coneDivergence(0));
        assertEquals(0.75, Thrust.coneDivergence(60), 1e-15);
    }
}
