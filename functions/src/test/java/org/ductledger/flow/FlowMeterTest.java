package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class FlowMeterTest {
    @Test
    void theCriticalMassFlowIsTheVesselsAtItsStart() {
        double factor = Isentropic.chokedMassFlowNumber(1.4);
        double flow = FlowMeter.criticalMassFlow(1, factor, 3e-5, 6e5, 300, 287);
        double mass = 6e5 * 0.25 / (287 * 300);
        assertEquals(mass / Vessel.timeConstant(0.25, 3e-5, 300, 1.4, 287), flow, 1e-15);
    }

    @Test
    void theExpansibilityIsThatOfIsentropicFlowBetweenTheSections() {
        double ratio = 0.85;
        double beta = 0.6;
        double gamma = 1.3;
        double density = Math.pow(ratio, 1 / gamma);
        // p1 = rho1 = upstream area = 1; energy: V2^2/2 - V1^2/2 = gamma/(gamma-1) (1 - ratio/density).
        double throat = beta * beta;
        double drop = 2 * gamma / (gamma - 1) * (1 - ratio / density);
        double flow = throat * density * Math.sqrt(drop / (1 - throat * throat * density * density));
        double incompressible = throat / Math.sqrt(1 - throat * throat) * Math.sqrt(2 * (1 - ratio));
        assertEquals(flow / incompressible, Expansibility.of(ratio, beta, gamma), 1e-14);
    }

    @Test
    void withoutAPressureDropNothingExpands() {
        assertEquals(1, Expansibility.of(1, 0.7, 1.4));
        assertEquals(1, Expansibility.of(Math.nextDown(1.0), 0.7, 1.4), 1e-15);
        double slope = Expansibility.byPressureRatio(1, 0.7, 1.4);
        assertEquals(slope, Expansibility.byPressureRatio(1 - 1e-9, 0.7, 1.4), 1e-8);
        assertEquals(0, Expansibility.byGamma(1, 0.7, 1.4));
    }

    @Test
    void theExpansibilityFallsWithThePressureRatio() {
        double last = 1;
        for (double ratio = 0.9999; ratio >= 0.75; ratio -= 1e-4) {
            double next = Expansibility.of(ratio, 0.5, 1.4);
            assertTrue(next < last, "at " + ratio);
            last = next;
        }
    }
}
