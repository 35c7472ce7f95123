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
}
