package org.ductledger.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.ductledger.exact.FortyDigits;
import org.hipparchus.dfp.Dfp;
import org.junit.jupiter.api.Test;

class SonicBalanceTest {
    @Test
    void solvesBothBranchesForEveryCAndK() {
        Random random = new Random(11);
        for (int i = 0; i < 3000; i++) {
            double c = i % 2 == 0 ? random.nextDouble(1e-6, 0.99) : Math.pow(10, -16 * random.nextDouble());
            double k = i % 3 == 0 ? 1400 * random.nextDouble() : Math.pow(10, -16 + 19 * random.nextDouble());
            c = Math.min(c, 0.99);
            check(c, k, false);
            check(c, k, true);
        }
    }

    private static void check(double c, double k, boolean above) {
        double mach = SonicBalance.solve(k, c, 1 - c, above);
        String where = "c " + c + ", K " + k + ", M " + mach;
        assertEquals(above, mach >= 1, where);
        if (mach < Double.MAX_VALUE && mach > Double.MIN_NORMAL && mach != 1) {
            double condition = condition(mach, c);
            double allowed = SonicBalance.isNear(mach) ? 4 * (1 + condition) * 0x1p-53 : 1e-6;
            double error = Math.abs(remainder(c, k, mach)) * condition;
            assertTrue(error <= allowed, () -> where + ": relative error " + error);
        }
    }

    /** |d log M / d K|. */
    private static double condition(double mach, double c) {
        double x = (mach - 1) * (mach + 1);
        double slope = mach > 1e100 ? (1 - c) / c : (1 - c) * x / (1 - c + c * mach * mach);
        return 0.5 / Math.abs(slope);
    }

    private static double remainder(double c, double k, double mach) {
        Dfp square = FortyDigits.of(mach).multiply(FortyDigits.of(mach));
        Dfp sum = square.subtract(1).multiply(FortyDigits.of(c)).add(1);
        return FortyDigits.log(sum)
                .divide(FortyDigits.of(c))
                .subtract(FortyDigits.log(square))
                .subtract(FortyDigits.of(k))
                .toDouble();
    }

    @Test
    void isOneAtZeroAndNothingBelow() {
        assertEquals(1, SonicBalance.solve(0, 0.2, 0.8, true));
        assertEquals(1, SonicBalance.solve(0, 0.2, 0.8, false));
        assertTrue(Double.isNaN(SonicBalance.solve(-1e-300, 0.2, 0.8, true)));
    }

    @Test
    void refinementTakesAwayAnErrorToItsFourthPower() {
        double c = 1.0 / 6;
        double exact = SonicBalance.solve(2 * StrictMath.log1p(0.2), c, 1 - c, true);
        double wrong = exact * 1.001;
        double refined = SonicBalance.refined(wrong, remainder(c, 2 * StrictMath.log1p(0.2), wrong), c, 1 - c);
        assertEquals(exact, refined, 1e-11);
    }
}
