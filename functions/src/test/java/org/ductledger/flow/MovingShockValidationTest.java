package org.ductledger.flow;

import static org.ductledger.exact.FortyDigits.pow;
import static org.ductledger.exact.FortyDigits.ulps;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Map;
import java.util.SplittableRandom;
import org.ductledger.exact.FortyDigits;
import org.ductledger.flow.PublishedTable.Answer;
import org.ductledger.flow.PublishedTable.Row;
import org.hipparchus.dfp.Dfp;
import org.junit.jupiter.api.Test;

/**
 * Against the shock tubes of the worked examples (the equations of J. D. Anderson, Modern Compressible Flow, in 25
 * digits; the exact Riemann problems of E. F. Toro, Riemann Solvers and Numerical Methods for Fluid Dynamics, 1999, table
 * 4.2, from memory), and against the equations in 40 digits.
 */
class MovingShockValidationTest {
    private static final int POINTS = 2000;

    private static double ratio(Row row, String name) {
        return row.number(name);
    }

    private static double machOfTube(Row row) {
        double gamma1 = row.number("gamma1");
        double gamma4 = row.number("gamma4");
        double a4OverA1 = Math.sqrt(gamma4 / gamma1 * ratio(row, "T4/T1") * ratio(row, "R4/R1"));
        return ShockTube.mach1(ratio(row, "p4/p1"), gamma1, gamma4, a4OverA1);
    }

    /**
     * A Riemann problem of one gas at rest is a shock tube. The others have gas in motion on both sides, or no shock, and
     * no function answers them.
     */
    private static Answer ofRiemann(Row row) {
        String state = row.inputs()
                .substring(row.inputs().lastIndexOf('(') + 1, row.inputs().length() - 1);
        double[] s =
                Arrays.stream(state.split(",")).mapToDouble(Double::parseDouble).toArray();
        if (s[1] != 0 || s[4] != 0) {
            return Answer.none("gas in motion on both sides");
        }
        boolean rightward = s[2] > s[5];
        double gamma = row.number("gamma");
        double p1 = Math.min(s[2], s[5]);
        double rho1 = rightward ? s[3] : s[0];
        double p4 = Math.max(s[2], s[5]);
        double rho4 = rightward ? s[0] : s[3];
        double a1 = Math.sqrt(gamma * p1 / rho1);
        double mach1 = ShockTube.mach1(p4 / p1, gamma, gamma, Math.sqrt(gamma * p4 / rho4) / a1);
        double p = p1 * NormalShock.p2OverP1(mach1, gamma);
        double a2 = a1 * Math.sqrt(NormalShock.t2OverT1(mach1, gamma));
        return switch (row.quantity()) {
            case "Riemann p*" -> Answer.of(p);
            case "Riemann u*" -> Answer.of((rightward ? 1 : -1) * a2 * MovingShock.gasMach2(mach1, gamma));
            case "Riemann rho*R" -> Answer.of(rho1 * NormalShock.rho2OverRho1(mach1, gamma));
            case "Riemann rho*L" -> Answer.of(rho4 * isentropicDensity(p / p4, gamma));
            default -> throw new IllegalArgumentException(row.toString());
        };
    }

    private static double isentropicDensity(double pressureRatio, double gamma) {
        return Isentropic.rhoOverRho0(Isentropic.machFromPOverP0(pressureRatio, gamma), gamma);
    }

    private static Answer answer(Row row) {
        double gamma = row.inputs().startsWith("gamma=") ? row.number("gamma") : Double.NaN;
        return switch (row.quantity()) {
            case "shock tube Ms from p4/p1" -> rounded(machOfTube(row));
            case "shock tube reflected shock Mach" ->
                rounded(MovingShock.reflectedMach(machOfTube(row), row.number("gamma1")));
            case "shock tube shock speed" -> {
                double a1 = Math.sqrt(gamma * 0.1 / 0.125);
                yield Answer.of(a1 * ShockTube.mach1(10, gamma, gamma, Math.sqrt(gamma) / a1));
            }
            case "Riemann p*", "Riemann u*", "Riemann rho*R", "Riemann rho*L" -> ofRiemann(row);
            default -> Answer.none("of another family");
        };
    }

    /** The rows of 20 digits hold for the decimal gamma; that of a double differs a little. */
    private static Answer rounded(double value) {
        return Answer.of(value, 4 * Math.ulp(value));
    }

    @Test
    void everyShockTubeOfTheWorkedExamplesIsMet() {
        PublishedTable table = PublishedTable.read("worked_examples.csv");
        int rows = (int) table.rows().count();
        assertEquals(
                Map.of("checked", 11, "gas in motion on both sides", 4, "of another family", rows - 15),
                table.check(MovingShockValidationTest::answer));
    }

    private static void agrees(String what, double got, Dfp exact, double most, double mach1, double gamma) {
        double error = ulps(got, exact);
        assertTrue(error <= most, () -> what + " at " + mach1 + ", " + gamma + ": " + error + " ulp");
    }

    /** The state behind a moving shock is the steady shock's; velocities by the change of frame. */
    @Test
    void theEquationsHoldInFortyDigits() {
        SplittableRandom random = new SplittableRandom(7);
        for (int i = 0; i < POINTS; i++) {
            double mach1 = 1 + StrictMath.pow(10, -12 + 15 * random.nextDouble());
            double gamma = 1.01 + (i % 3 == 0 ? 2 : 0.7) * random.nextDouble();
            Dfp g = FortyDigits.of(gamma);
            Dfp m = FortyDigits.of(mach1).multiply(FortyDigits.of(mach1));
            Dfp p = g.multiply(m).multiply(2).subtract(g.subtract(1)).divide(g.add(1));
            Dfp rho = g.add(1).multiply(m).divide(g.subtract(1).multiply(m).add(2));
            Dfp sound = p.divide(rho).sqrt();
            Dfp gas =
                    FortyDigits.of(mach1).multiply(rho.subtract(1)).divide(rho).divide(sound);
            agrees("u/a2", MovingShock.gasMach2(mach1, gamma), gas, 4, mach1, gamma);
            Dfp reflected = reflected(gas, g);
            agrees("Mr", MovingShock.reflectedMach(mach1, gamma), reflected, 4, mach1, gamma);
            Dfp square = reflected.multiply(reflected);
            Dfp p5 = g.multiply(square)
                    .multiply(2)
                    .subtract(g.subtract(1))
                    .divide(g.add(1))
                    .multiply(p);
            agrees("p5/p1", MovingShock.p5OverP1(mach1, gamma), p5, 6, mach1, gamma);
            double strength = NormalShock.p2OverP1(mach1, gamma);
            Dfp ms = FortyDigits.of(strength)
                    .subtract(1)
                    .multiply(g.add(1))
                    .divide(g.multiply(2))
                    .add(1)
                    .sqrt();
            agrees("Ms", MovingShock.mach(strength, gamma), ms, 4, mach1, gamma);
        }
    }

    /** The reflected shock stops the gas: Mr - 1/Mr = (gamma+1)/2 u/a2. */
    private static Dfp reflected(Dfp gas, Dfp gamma) {
        Dfp half = gamma.add(1).multiply(gas).divide(4);
        return half.add(half.multiply(half).add(1).sqrt());
    }

    @Test
    void theShockTubeHoldsInFortyDigits() {
        SplittableRandom random = new SplittableRandom(794);
        for (int i = 0; i < POINTS; i++) {
            double gamma1 = 1.02 + 0.7 * random.nextDouble();
            double gamma4 =
                    i % 5 == 0 ? 1 + StrictMath.pow(10, -6 * random.nextDouble()) : 1.02 + 0.7 * random.nextDouble();
            double a = StrictMath.pow(10, -1 + 2 * random.nextDouble());
            double given = 1 + StrictMath.pow(10, -8 + 14 * random.nextDouble());
            double mach1 = ShockTube.mach1(given, gamma1, gamma4, a);
            Dfp exact = p4OverP1(mach1, gamma1, gamma4, a);
            double passed = Math.ulp(mach1) / ShockTube.ofMach()[0].at(given, gamma1, gamma4, a);
            double condition =
                    Math.log(given) + Math.abs(a * ShockTube.ofRatio()[3].at(mach1, gamma1, gamma4, a)) / given;
            double steepness = 4 * (1 + condition) * Math.ulp(given);
            String where = given + ", " + gamma1 + ", " + gamma4 + ", " + a;
            assertEquals(0, exact.subtract(FortyDigits.of(given)).toDouble(), 4 * passed + steepness, where);
            double forward = ShockTube.p4OverP1(mach1, gamma1, gamma4, a);
            assertEquals(0, exact.subtract(FortyDigits.of(forward)).toDouble(), 4 * passed + steepness, where);
        }
    }

    private static Dfp p4OverP1(double mach1, double gamma1, double gamma4, double a4OverA1) {
        Dfp m = FortyDigits.of(mach1);
        Dfp g1 = FortyDigits.of(gamma1);
        Dfp less = FortyDigits.of(gamma4).subtract(1);
        Dfp p = g1.multiply(2)
                .divide(g1.add(1))
                .multiply(m.multiply(m).subtract(1))
                .add(1);
        Dfp w = less.divide(g1.add(1)).divide(FortyDigits.of(a4OverA1)).multiply(m.subtract(m.reciprocal()));
        Dfp base = w.negate().add(1);
        return p.divide(pow(base, FortyDigits.of(gamma4).multiply(2).divide(less)));
    }
}
