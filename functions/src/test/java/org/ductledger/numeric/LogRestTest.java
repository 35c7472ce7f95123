package org.ductledger.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.ductledger.exact.FortyDigits;
import org.hipparchus.dfp.Dfp;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LogRestTest {
    @ParameterizedTest
    @ValueSource(doubles = {-0.9, -0.5, -0.21, -0.19, -1e-3, -1e-12, 1e-300, 1e-8, 0.1, 0.33, 0.34, 1, 50, 1e10})
    void keepsItsDigitsOnBothSidesOfTheSeries(double z) {
        Dfp exactly = FortyDigits.of(z);
        Dfp q = exactly.divide(exactly.add(1));
        Dfp exact = Math.abs(z) < 1e-10
                ? FortyDigits.of(0.5).add(q.divide(3))
                : FortyDigits.log(exactly.add(1)).subtract(q).divide(q.multiply(q));
        double error = FortyDigits.ulps(LogRest.of(z), exact);
        assertTrue(error <= 16, () -> error + " units");
    }

    @Test
    void isOneHalfAtZero() {
        assertEquals(0.5, LogRest.of(0));
    }
}
