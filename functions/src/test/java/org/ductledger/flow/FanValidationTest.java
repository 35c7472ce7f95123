package org.ductledger.flow;

import static org.ductledger.exact.FortyDigits.pow;
import static org.ductledger.exact.FortyDigits.ulps;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import java.util.SplittableRandom;
import org.ductledger.exact.FortyDigits;
import org.ductledger.flow.PublishedTable.Answer;
import org.ductledger.flow.PublishedTable.Row;
import org.hipparchus.dfp.Dfp;
import org.hipparchus.dfp.DfpMath;
import org.junit.jupiter.api.Test;

/**
 * Against the columns nu and mu of NACA Report 1135's table II, the expansions of the worked examples (J. D. Anderson,
 * Modern Compressible Flow, 1982), and equation (171c) of the report in 40 digits. The columns {@code source} and
 * {@code provenance} of the tables say which values were read and which are from memory.
 */
class FanValidationTest {
    private static final int POINTS = 600;
    private static final double RELATIVE_STEP = 1e-6;
    private static final double ROUNDING = 0x1p-51;

    /** What the rounding of a decimal Mach number to a double can change. */
    private static double slack(double angle, double nearby) {
        return ROUNDING * (angle + Math.abs(nearby - angle) / RELATIVE_STEP);
    }

    private static Answer ofTable(Row row) {
        double mach = row.number("M");
        double near = mach * (1 + RELATIVE_STEP);
        if (row.quantity().equals("nu_deg")) {
            double gamma = row.number("gamma");
            double angle = Fan.prandtlMeyerAngle(mach, gamma);
            return Answer.of(angle, slack(angle, Fan.prandtlMeyerAngle(near, gamma)));
        }
        double angle = Isentropic.machAngle(mach);
        return Answer.of(angle, slack(angle, Isentropic.machAngle(near)));
    }

    @Test
    void everyAngleOfNaca1135IsMet() {
        PublishedTable table = PublishedTable.read("waves_naca1135.csv");
        assertEquals(Map.of("checked", 39), table.check(FanValidationTest::ofTable));
    }

    private static Answer ofExample(Row row) {
        return switch (row.quantity()) {
            case "expansion p2 [lb/ft2]" ->
                Answer.of(row.number("p1") * Fan.p2OverP1(row.number("M1"), 20, row.number("gamma")));
            case "expansion T2 [R]" ->
                Answer.of(row.number("T1") * Fan.t2OverT1(row.number("M1"), 20, row.number("gamma")));
            default -> Answer.none("of another family");
        };
    }

    @Test
    void theExpansionsOfTheWorkedExamplesAreMet() {
        PublishedTable table = PublishedTable.read("worked_examples.csv");
        int rows = (int) table.rows().count();
        assertEquals(Map.of("checked", 2, "of another family", rows - 2), table.check(FanValidationTest::ofExample));
    }

    /** Equation (171c) as printed, in degrees; it loses as many digits as M is near 1, and has them to lose. */
    private static Dfp angle(double mach, double gamma) {
        Dfp y = FortyDigits.of(mach).multiply(FortyDigits.of(mach)).subtract(1).sqrt();
        Dfp root = FortyDigits.of(gamma)
                .add(1)
                .divide(FortyDigits.of(gamma).subtract(1))
                .sqrt();
        Dfp radians = root.multiply(DfpMath.atan(y.divide(root))).subtract(DfpMath.atan(y));
        return radians.multiply(180).divide(FortyDigits.pi());
    }

    private static double drawnGamma(SplittableRandom random, int i) {
        return 1
                + (i % 3 == 0 ? StrictMath.pow(10, -9 + 10.9 * random.nextDouble()) : 0.05 + 0.7 * random.nextDouble());
    }

    @Test
    void theAngleHoldsInFortyDigits() {
        SplittableRandom random = new SplittableRandom(171);
        for (int i = 0; i < POINTS; i++) {
            double mach = 1 + StrictMath.pow(10, -12 + 18 * random.nextDouble());
            double gamma = drawnGamma(random, i);
            double error = ulps(Fan.prandtlMeyerAngle(mach, gamma), angle(mach, gamma));
            assertTrue(error <= 12, () -> error + " ulp at " + mach + ", " + gamma);
        }
    }

    /** The least and the greatest angle left, of expansion into vacuum, from the limit of the same equation. */
    @Test
    void theAngleLeftHoldsInFortyDigits() {
        SplittableRandom random = new SplittableRandom(172);
        for (int i = 0; i < POINTS / 2; i++) {
            double mach = 1 + StrictMath.pow(10, -6 + 14 * random.nextDouble());
            double gamma = drawnGamma(random, i);
            Dfp root = FortyDigits.of(gamma)
                    .add(1)
                    .divide(FortyDigits.of(gamma).subtract(1))
                    .sqrt();
            Dfp most = root.subtract(1).multiply(90);
            assertTrue(ulps(Fan.prandtlMeyerAngleMax(gamma), most) <= 4, () -> "nu_max at " + gamma);
            double error = ulps(Fan.angleLeft(mach, gamma), most.subtract(angle(mach, gamma)));
            assertTrue(error <= 10, () -> error + " ulp left at " + mach + ", " + gamma);
        }
    }

    /** A fan taken apart: the exact angles of the Mach numbers ahead and behind differ by the turn. */
    @Test
    void theTurnIsTheDifferenceOfTheExactAngles() {
        SplittableRandom random = new SplittableRandom(173);
        for (int i = 0; i < POINTS / 2; i++) {
            double mach1 = 1 + StrictMath.pow(10, -3 + 4 * random.nextDouble());
            double gamma = 1.05 + 0.7 * random.nextDouble();
            double least = -Fan.prandtlMeyerAngle(mach1, gamma);
            double turn = least + random.nextDouble() * (Fan.angleLeft(mach1, gamma) - least);
            double mach2 = Fan.mach2(mach1, turn, gamma);
            Dfp missed = angle(mach2, gamma).subtract(angle(mach1, gamma)).subtract(FortyDigits.of(turn));
            double ofMach2 = Math.ulp(mach2) / Math.abs(slope(mach1, turn, gamma));
            double allowed = 8 * (Math.ulp(Fan.prandtlMeyerAngleMax(gamma)) + ofMach2);
            assertTrue(
                    Math.abs(missed.toDouble()) <= allowed, () -> missed + " at " + mach1 + ", " + turn + ", " + gamma);
            ratiosHold(mach1, turn, gamma, mach2);
        }
    }

    private static double slope(double mach1, double turn, double gamma) {
        double step = 1e-6 * (1 + Math.abs(turn));
        return (Fan.mach2(mach1, turn, gamma) - Fan.mach2(mach1, turn - step, gamma)) / step;
    }

    /** Isentropic ratios between the Mach numbers, by equations (43) to (45). */
    private static void ratiosHold(double mach1, double turn, double gamma, double mach2) {
        Dfp less = FortyDigits.of(gamma).subtract(1);
        Dfp t = FortyDigits.of(mach1)
                .multiply(FortyDigits.of(mach1))
                .multiply(less)
                .add(2)
                .divide(FortyDigits.of(mach2)
                        .multiply(FortyDigits.of(mach2))
                        .multiply(less)
                        .add(2));
        double steepness = 8 * (1 + gamma / (gamma - 1) * (1 + Math.abs(Math.log(t.toDouble()))));
        assertTrue(ulps(Fan.t2OverT1(mach1, turn, gamma), t) <= 8, () -> "T at " + mach1 + ", " + turn);
        Dfp rho = pow(t, less.reciprocal());
        assertTrue(ulps(Fan.rho2OverRho1(mach1, turn, gamma), rho) <= steepness, () -> "rho at " + mach1 + ", " + turn);
        Dfp p = t.multiply(rho);
        assertTrue(ulps(Fan.p2OverP1(mach1, turn, gamma), p) <= steepness, () -> "p at " + mach1 + ", " + turn);
    }
}
