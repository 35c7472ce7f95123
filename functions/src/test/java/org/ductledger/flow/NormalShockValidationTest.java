package org.ductledger.flow;

import static org.ductledger.exact.FortyDigits.decimal;
import static org.ductledger.exact.FortyDigits.exp;
import static org.ductledger.exact.FortyDigits.log;
import static org.ductledger.exact.FortyDigits.pow;
import static org.ductledger.exact.FortyDigits.ulps;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import java.util.SplittableRandom;
import org.ductledger.catalogue.Kernel;
import org.ductledger.exact.FortyDigits;
import org.ductledger.flow.PublishedTable.Answer;
import org.ductledger.flow.PublishedTable.Row;
import org.hipparchus.dfp.Dfp;
import org.junit.jupiter.api.Test;

/**
 * Against NACA Report 1135 (table II, its equations, and its equations (93) to (100) in 40 digits) and against textbook
 * examples. The columns {@code source} and {@code provenance} of the tables say which values were read and which are
 * from memory.
 */
class NormalShockValidationTest {
    private static final int POINTS = 3000;

    /** What the decimal 1.4 of the tables has beyond the double of that name; strong shocks feel it. */
    private static final double BEYOND_DOUBLE = 0x1.999999999999ap-54;

    private static double ofTable(Row row) {
        double gamma = row.number("gamma");
        if (row.quantity().equals("rho2/rho1 limit")) {
            return NormalShockInverse.greatestRho2OverRho1(gamma);
        }
        double mach1 = row.number("M");
        return switch (row.quantity()) {
            case "M2" -> NormalShock.mach2(mach1, gamma);
            case "p2/p1" -> NormalShock.p2OverP1(mach1, gamma);
            case "T2/T1" -> NormalShock.t2OverT1(mach1, gamma);
            case "rho2/rho1" -> NormalShock.rho2OverRho1(mach1, gamma);
            case "pt2/pt1" ->
                NormalShock.p02OverP01(mach1, gamma)
                        + BEYOND_DOUBLE * NormalShockSlopes.p02OverP01ByGamma(mach1, gamma);
            case "p1/pt2" -> 1 / NormalShock.p02OverP1(mach1, gamma);
            default -> throw new IllegalArgumentException(row.toString());
        };
    }

    @Test
    void everyShockColumnOfNaca1135IsMet() {
        PublishedTable table = PublishedTable.read("normal_shock_naca1135.csv");
        assertEquals(Map.of("checked", 116), table.check(row -> Answer.of(ofTable(row))));
    }

    private static Answer ofExample(Row row) {
        return switch (row.quantity()) {
            case "normal shock p2 [atm]" ->
                Answer.of(row.number("p1") * NormalShock.p2OverP1(row.number("M1"), row.number("gamma")));
            case "normal shock T2 [K]" ->
                Answer.of(row.number("T1") * NormalShock.t2OverT1(row.number("M1"), row.number("gamma")));
            case "normal shock u2 [m/s]" ->
                Answer.of(row.number("M1")
                        * Math.sqrt(row.number("gamma") * row.number("R") * row.number("T1"))
                        * NormalShock.v2OverV1(row.number("M1"), row.number("gamma")));
            case "pitot Mach number (Rayleigh)" ->
                Answer.of(Pitot.mach(row.number("pitot pressure p02") / row.number("p1"), row.number("gamma")));
            case "normal shock M2" -> Answer.of(NormalShock.mach2(row.number("M1"), row.number("k")));
            case "exit shock entropy rise [kJ/kg.K]" ->
                Answer.of(row.number("R") / 1000 * ShockEntropy.rise(row.number("Me"), row.number("k")));
            default -> Answer.none("of another family");
        };
    }

    @Test
    void textbookExamplesAreMet() {
        PublishedTable table = PublishedTable.read("worked_examples.csv");
        assertEquals(Map.of("checked", 6, "of another family", 111), table.check(NormalShockValidationTest::ofExample));
    }

    /** The equations as printed, written apart from the kernels. */
    private record Equations(Dfp m, Dfp gamma) {
        Dfp less() {
            return gamma.subtract(1);
        }

        Dfp more() {
            return gamma.add(1);
        }

        Dfp p2OverP1() {
            return gamma.multiply(m).multiply(2).subtract(less()).divide(more());
        }

        Dfp rho2OverRho1() {
            return more().multiply(m).divide(less().multiply(m).add(2));
        }

        Dfp mach2() {
            Dfp square = less().multiply(m).add(2).divide(p2OverP1().multiply(more()));
            return square.sqrt();
        }

        Dfp entropyRise() {
            return log(p2OverP1()).subtract(gamma.multiply(log(rho2OverRho1()))).divide(less());
        }

        Dfp p02OverP1() {
            return pow(more().multiply(m).divide(2), gamma.divide(less())).divide(pow(p2OverP1(), less().reciprocal()));
        }
    }

    private static double drawnMach(SplittableRandom random) {
        return 1 + StrictMath.pow(10, -12 + 15 * random.nextDouble());
    }

    private static void agrees(String what, double got, Dfp exact, double most, double mach1, double gamma) {
        double error = ulps(got, exact);
        assertTrue(error <= most, () -> what + " at " + mach1 + ", " + gamma + ": " + error + " ulp");
    }

    @Test
    void theEquationsHoldInFortyDigits() {
        SplittableRandom random = new SplittableRandom(1135);
        for (int i = 0; i < POINTS; i++) {
            double mach1 = drawnMach(random);
            double gamma = 1.001 + (i % 3 == 0 ? 2 : 0.7) * random.nextDouble();
            Equations exact =
                    new Equations(FortyDigits.of(mach1).multiply(FortyDigits.of(mach1)), FortyDigits.of(gamma));
            agrees("M2", NormalShock.mach2(mach1, gamma), exact.mach2(), 4, mach1, gamma);
            agrees("p2/p1", NormalShock.p2OverP1(mach1, gamma), exact.p2OverP1(), 4, mach1, gamma);
            agrees("rho2/rho1", NormalShock.rho2OverRho1(mach1, gamma), exact.rho2OverRho1(), 4, mach1, gamma);
            Dfp t = exact.p2OverP1().divide(exact.rho2OverRho1());
            agrees("T2/T1", NormalShock.t2OverT1(mach1, gamma), t, 4, mach1, gamma);
            Dfp v = exact.rho2OverRho1().reciprocal();
            agrees("V2/V1", NormalShock.v2OverV1(mach1, gamma), v, 4, mach1, gamma);
            agrees("p02/p1", NormalShock.p02OverP1(mach1, gamma), exact.p02OverP1(), 4, mach1, gamma);
            Dfp rise = exact.entropyRise();
            agrees("(s2-s1)/R", ShockEntropy.rise(mach1, gamma), rise, 12, mach1, gamma);
            if (rise.lessThan(decimal("690"))) {
                Dfp p02 = exp(rise.negate());
                agrees("p02/p01", NormalShock.p02OverP01(mach1, gamma), p02, 4, mach1, gamma);
            }
        }
    }

    /** An inverse answers within 4 (1 + condition) ulp of the Mach number whose exact ratio rounds to what it is given. */
    private static void returns(Kernel.Of2 inverse, Kernel.Of2 forward, Kernel.Of2 slope, double mach1, double gamma) {
        double ratio = forward.at(mach1, gamma);
        double condition = ratio / (mach1 * Math.abs(slope.at(mach1, gamma)));
        double error = Math.abs(inverse.at(ratio, gamma) - mach1) / Math.ulp(mach1);
        assertTrue(error <= 4 * (1 + condition), () -> error + " ulp at " + mach1 + ", " + gamma + ": " + condition);
    }

    @Test
    void inversesReturnToTheMachNumber() {
        SplittableRandom random = new SplittableRandom(100);
        for (int i = 0; i < POINTS; i++) {
            double mach1 = drawnMach(random);
            double gamma = 1.05 + 0.7 * random.nextDouble();
            returns(NormalShockInverse::fromMach2, NormalShock::mach2, NormalShockSlopes::mach2ByMach, mach1, gamma);
            returns(
                    NormalShockInverse::fromP2OverP1,
                    NormalShock::p2OverP1,
                    NormalShockSlopes::p2OverP1ByMach,
                    mach1,
                    gamma);
            returns(
                    NormalShockInverse::fromT2OverT1,
                    NormalShock::t2OverT1,
                    NormalShockSlopes::t2OverT1ByMach,
                    mach1,
                    gamma);
            returns(
                    NormalShockInverse::fromRho2OverRho1,
                    NormalShock::rho2OverRho1,
                    NormalShockSlopes::rho2OverRho1ByMach,
                    mach1,
                    gamma);
            returns(
                    NormalShockInverse::fromP02OverP01,
                    NormalShock::p02OverP01,
                    NormalShockSlopes::p02OverP01ByMach,
                    mach1,
                    gamma);
            returns(Pitot::supersonic, NormalShock::p02OverP1, NormalShockSlopes::p02OverP1ByMach, mach1, gamma);
        }
    }
}
