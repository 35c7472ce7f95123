package org.ductledger.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.ductledger.exact.FortyDigits;
import org.hipparchus.dfp.Dfp;
import org.junit.jupiter.api.Test;

class PowerTest {
    @Test
    void isGoodToTheLastDigitOverTheRangeOfADouble() {
        Random random = new Random(3);
        for (int i = 0; i < 1500; i++) {
            double head = Math.pow(10, -320 + 628 * random.nextDouble());
            double tail = head * 0x1p-54 * (2 * random.nextDouble() - 1);
            double most = 700 / Math.abs(StrictMath.log(head));
            double w0 = Math.min(most, 1000) * (2 * random.nextDouble() - 1);
            double w1 = w0 * 0x1p-54 * random.nextDouble();
            Dfp exact = FortyDigits.pow(
                    FortyDigits.of(head).add(FortyDigits.of(tail)),
                    FortyDigits.of(w0).add(FortyDigits.of(w1)));
            double error = FortyDigits.ulps(Power.of(head, tail, w0, w1), exact);
            assertTrue(error <= 0.85, () -> error + " units at " + head + "^" + w0);
        }
    }

    @Test
    void holdsForSteepExponentsNextToOne() {
        Random random = new Random(4);
        for (int i = 0; i < 500; i++) {
            double w0 = Math.pow(10, 4 + 11 * random.nextDouble());
            double head = 1 + 600 * (random.nextDouble() - 0.5) / w0;
            double tail = 0x1p-54 * random.nextDouble();
            Dfp exact = FortyDigits.pow(FortyDigits.of(head).add(FortyDigits.of(tail)), FortyDigits.of(w0));
            double error = FortyDigits.ulps(Power.of(head, tail, w0, 0), exact);
            assertTrue(error <= 2.5, () -> error + " units at " + head + "^" + w0);
        }
    }

    @Test
    void reachesZeroAndInfinityWhereThePowerLeavesTheRange() {
        assertEquals(0, Power.of(1e-300, 0, 7, 0));
        assertEquals(Double.POSITIVE_INFINITY, Power.of(1e300, 0, 7, 0));
        assertEquals(Double.MIN_VALUE, Power.of(2, 0, -1074, 0));
        assertEquals(0x1p-1022, Power.of(Double.MIN_VALUE, 0, 1022.0 / 1074, 0), 0x1p-1063);
    }
}
