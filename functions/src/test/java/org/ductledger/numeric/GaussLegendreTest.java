package org.ductledger.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class GaussLegendreTest {
    @Test
    void polynomialsToDegree63AreIntegratedExactly() {
        for (int degree = 0; degree < 2 * GaussLegendre.POINTS; degree++) {
            double sum = 0;
            for (int i = 0; i < GaussLegendre.POINTS; i++) {
                sum += GaussLegendre.weight(i) * Math.pow(GaussLegendre.node(i), degree);
            }
            assertEquals(degree % 2 == 0 ? 2.0 / (degree + 1) : 0, sum, 2e-15, "degree " + degree);
        }
    }

    /** Abramowitz and Stegun, Handbook of Mathematical Functions, table 25.4, n = 32 (from memory). */
    @Test
    void theNodesNearestToTheMiddleAreThoseOfTheHandbook() {
        assertEquals(0.04830766568773832, GaussLegendre.node(16), 1e-16);
        assertEquals(0.0965400885147278, GaussLegendre.weight(16), 1e-16);
        assertEquals(0.9972638618494816, GaussLegendre.node(31), 1e-15);
        assertEquals(0.007018610009470097, GaussLegendre.weight(31), 1e-16);
    }
}
