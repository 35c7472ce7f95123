package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class FlowRatesValidationTest {
    /** US Standard Atmosphere 1976, sea level: rho0 = 1.2250 kg/m3, a0 = 340.294 m/s (from memory), R = 287.05287. */
    @Test
    void seaLevelAirHasItsDensityAndSpeedOfSound() {
        assertEquals(340.294, FlowRates.speedOfSound(1.4, 287.05287, 288.15), 5e-4);
        assertEquals(1.2250, FlowRates.gasDensity(101325, 288.15, 287.05287), 5e-5);
        assertEquals(1, FlowRates.machFromFlowSpeed(340.294, 288.15, 1.4, 287.05287), 2e-6);
    }

    /**
     * NACA Report 1135, table II, M = 2: V/a* = 1.6330; and V/Vmax there is V/a* sqrt((gamma-1)/(gamma+1)) = 0.66667
     * (from memory). a* = sqrt(2 gamma R T0/(gamma+1)) by the report's definition.
     */
    @Test
    void theSpeedAtMachTwoHasThePublishedRatioToTheSonicSpeed() {
        double sonic = Math.sqrt(2 * 1.4 * 287.05 * 300 / 2.4);
        assertEquals(1.6330, FlowRates.flowSpeed(2, 300, 1.4, 287.05) / sonic, 5e-5);
        assertEquals(sonic, FlowRates.flowSpeed(1, 300, 1.4, 287.05), 1e-12);
        assertEquals(
                0.66667, FlowRates.flowSpeed(2, 300, 1.4, 287.05) / FlowRates.maxFlowSpeed(300, 1.4, 287.05), 5e-6);
    }

    /**
     * The choked flow of air by Fliegner's formula, m sqrt(T0)/(p0 A) = 0.04042 in SI units for gamma = 1.4 and
     * R = 287 J/(kg K) (common practice, from memory: 0.532 in lbm/s, degR, lbf).
     */
    @Test
    void airChokesAsFliegnerFound() {
        assertEquals(0.04042, FlowRates.chokedMassFlow(1, 1, 1, 1.4, 287), 5e-6);
        assertEquals(0.532, 0.04042 * POUNDS_FORCE / POUNDS * ROOT_RANKINE, 5e-4);
        assertEquals(1, FlowRates.throatArea(0.04042, 1, 1, 1.4, 287), 2e-4);
    }

    private static final double POUNDS_FORCE = 4.4482216152605;
    private static final double POUNDS = 0.45359237;
    private static final double ROOT_RANKINE = Math.sqrt(1.8);

    /** NACA Report 1135, tables I and II: at M = 0.5 and at M = 2 A/A* is 1.3398 and 1.6875 (from memory). */
    @Test
    void theMassFlowFallsFromItsChokedValueAsTheAreaRatioRises() {
        double choked = FlowRates.chokedMassFlow(7e5, 300, 1e-3, 1.4, 287.05);
        assertEquals(1.3398, choked / FlowRates.massFlow(0.5, 7e5, 300, 1e-3, 1.4, 287.05), 5e-5);
        assertEquals(1.6875, choked / FlowRates.massFlow(2, 7e5, 300, 1e-3, 1.4, 287.05), 5e-5);
        assertEquals(0.5, FlowRates.machFromMassFlow(choked / 1.3398, 7e5, 300, 1e-3, 1.4, 287.05, 0), 5e-5);
        assertEquals(2, FlowRates.machFromMassFlow(choked / 1.6875, 7e5, 300, 1e-3, 1.4, 287.05, 1), 5e-5);
    }
}
