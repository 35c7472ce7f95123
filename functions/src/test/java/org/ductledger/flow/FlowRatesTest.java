package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class FlowRatesTest {
    @Test
    void theFlowSpeedTendsToItsGreatestValue() {
        double greatest = FlowRates.maxFlowSpeed(300, 1.4, 287.05);
        assertEquals(greatest, FlowRates.flowSpeed(1e9, 300, 1.4, 287.05), 2 * Math.ulp(greatest));
        assertEquals(greatest, FlowRates.flowSpeed(1e300, 300, 1.4, 287.05), 2 * Math.ulp(greatest));
        assertEquals(0, FlowRates.flowSpeed(0, 300, 1.4, 287.05));
    }

    @Test
    void theFlowSpeedIsOneCurveOnBothSidesOfMachOne() {
        double below = FlowRates.flowSpeed(Math.nextDown(1.0), 300, 1.4, 287.05);
        double above = FlowRates.flowSpeed(1, 300, 1.4, 287.05);
        assertEquals(above, below, 3 * Math.ulp(above));
    }

    @Test
    void noProductLeavesTheRangeOfADoubleOnTheWay() {
        assertEquals(Math.sqrt(1.4), FlowRates.speedOfSound(1.4, 1e200, 1e-200), 1e-15);
        assertEquals(Math.sqrt(1.4) * 1e200, FlowRates.speedOfSound(1.4, 1e200, 1e200), 1e186);
        assertEquals(Math.sqrt(1.4) * 1e-200, FlowRates.speedOfSound(1.4, 1e-200, 1e-200), 1e-214);
    }
}
