package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import java.util.SplittableRandom;
import org.ductledger.exact.FortyDigits;
import org.ductledger.flow.PublishedTable.Answer;
import org.ductledger.flow.PublishedTable.Row;
import org.hipparchus.dfp.Dfp;
import org.junit.jupiter.api.Test;

/**
 * Against J. D. Anderson, Modern Compressible Flow, example 5.7; the normal shock column of NACA Report 1135 and of
 * tables of its kind; the equations in 40 digits.
 */
class DiffuserValidationTest {
    private static Answer worked(Row row) {
        return row.quantity().equals("tunnel start second-throat ratio At2/At1")
                ? Answer.of(Diffuser.startThroatRatio(row.number("M"), row.number("gamma")))
                : Answer.none("of another family");
    }

    @Test
    void theTunnelStartOfTheWorkedExamplesIsMet() {
        PublishedTable table = PublishedTable.read("worked_examples.csv");
        int rows = (int) table.rows().count();
        assertEquals(Map.of("checked", 1, "of another family", rows - 1), table.check(DiffuserValidationTest::worked));
    }

    private static Answer tabulated(Row row) {
        if (!row.quantity().equals("pt2/pt1")) {
            return Answer.none("of another family");
        }
        return row.inputs().contains("decimal, exact")
                ? Answer.none("for the decimal 1.4, which no double is, to more digits than that allows")
                : Answer.of(Diffuser.pitotInletRecovery(row.number("M"), row.number("gamma")));
    }

    @Test
    void theRecoveryBehindANormalShockIsThatOfTheTables() {
        assertEquals(
                Map.of(
                        "checked", 10,
                        "for the decimal 1.4, which no double is, to more digits than that allows", 9,
                        "of another family", 425),
                PublishedTable.read("naca1135.csv").check(DiffuserValidationTest::tabulated));
    }

    /** M2 of NACA 1135, eq. (96), and A/A* of eq. (80), from exact M and gamma. */
    @Test
    void theSelfStartingContractionHoldsInFortyDigits() {
        SplittableRandom random = new SplittableRandom(1945);
        for (int i = 0; i < 2000; i++) {
            double mach = 1 + Math.pow(10, -6 + 8 * random.nextDouble());
            double gamma = 1.02 + 0.7 * random.nextDouble();
            Dfp g = FortyDigits.of(gamma);
            Dfp m1 = FortyDigits.of(mach).pow(2);
            Dfp m2 = g.subtract(1)
                    .multiply(m1)
                    .add(2)
                    .divide(g.multiply(m1).multiply(2).subtract(g).add(1));
            Dfp base = g.subtract(1).multiply(m2).add(2).divide(g.add(1));
            Dfp exact = FortyDigits.pow(base, g.add(1).divide(g.subtract(1).multiply(2)))
                    .divide(m2.sqrt());
            double got = Diffuser.selfStartContraction(mach, gamma);
            assertTrue(FortyDigits.ulps(got, exact) <= 8, () -> mach + " " + gamma);
        }
    }

    @Test
    void theRecoveryHoldsInFortyDigits() {
        SplittableRandom random = new SplittableRandom(6);
        for (int i = 0; i < 2000; i++) {
            double mach = Math.pow(10, -6 + 7 * random.nextDouble());
            double gamma = 1.02 + 0.7 * random.nextDouble();
            double kept = 1 - random.nextDouble() * Math.min(1, mach * mach);
            Dfp g = FortyDigits.of(gamma);
            Dfp h = FortyDigits.of(mach)
                    .pow(2)
                    .multiply(g.subtract(1))
                    .divide(2)
                    .add(1);
            Dfp p = FortyDigits.pow(h, g.divide(g.subtract(1)).negate());
            Dfp exact = FortyDigits.of(kept).subtract(p).divide(g.getOne().subtract(p));
            double got = Diffuser.pRecovery(mach, kept, gamma);
            assertEquals(exact.toDouble(), got, 1e-15 * (1 + Math.abs(1 - got)) * 4, () -> mach + " " + kept);
        }
    }
}
