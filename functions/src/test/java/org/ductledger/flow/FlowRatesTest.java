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

    @Test
    void theChokedFlowAsItIsComputedGivesMachOneOnBothBranches() {
        for (double gamma = 1.01; gamma < 1.7; gamma += 0.0137) {
            double choked = FlowRates.chokedMassFlow(6.3e5, 291, 1.7e-3, gamma, 296.8);
            assertEquals(1, FlowRates.machFromMassFlow(choked, 6.3e5, 291, 1.7e-3, gamma, 296.8, 0));
            assertEquals(1, FlowRates.machFromMassFlow(choked, 6.3e5, 291, 1.7e-3, gamma, 296.8, 1));
            double above = Math.nextUp(choked);
            assertEquals(Double.NaN, FlowRates.machFromMassFlow(above, 6.3e5, 291, 1.7e-3, gamma, 296.8, 0));
        }
    }

    @Test
    void theThroatPassesTheMassFlowItWasSizedFor() {
        double area = FlowRates.throatArea(2, 7e5, 300, 1.4, 287.05);
        assertEquals(2, FlowRates.chokedMassFlow(7e5, 300, area, 1.4, 287.05), 1e-15);
        assertEquals(2, FlowRates.massFlow(1, 7e5, 300, area, 1.4, 287.05), 1e-15);
    }
}
