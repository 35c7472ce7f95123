package org.ductledger.flow;

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
 * Against the tables and charts of oblique shocks in {@code oblique_cone_expansion.csv} (Aerodynamics for Students; NACA
 * Report 1135), the worked examples (J. D. Anderson, Modern Compressible Flow, and Fundamentals of Aerodynamics), and the
 * equations of NACA Report 1135 in 40 digits. The columns {@code source} and {@code provenance} of the tables say which
 * values were read and which are from memory.
 */
class ObliqueShockValidationTest {
    private static final double WEAK = 0;
    private static final double STRONG = 1;
    private static final int POINTS = 1500;
    private static final double HUGE = 1e12;

    private static double weak(double mach1, double deflection, double gamma) {
        return ObliqueAngle.shockAngle(mach1, deflection, gamma, WEAK);
    }

    private static double mach(Row row) {
        return row.inputs().contains("M=infinity") ? HUGE : row.number("M");
    }

    private static Answer ofTable(Row row) {
        String quantity = row.quantity();
        if (quantity.startsWith("cone") || quantity.startsWith("nu")) {
            return Answer.none("of another family");
        }
        double gamma = row.number("gamma");
        double mach1 = mach(row);
        return switch (quantity) {
            case "theta_max_deg" -> rounded(ObliqueLimits.deflectionMax(mach1, gamma));
            case "beta_at_theta_max_deg" -> rounded(ObliqueLimits.angleAtDeflectionMax(mach1, gamma));
            case "beta_weak_deg" -> rounded(weak(mach1, row.number("theta_deg"), gamma));
            case "beta_strong_deg" -> rounded(ObliqueAngle.shockAngle(mach1, row.number("theta_deg"), gamma, STRONG));
            case "p2/p1 weak" ->
                rounded(ObliqueShock.p2OverP1(mach1, weak(mach1, row.number("theta_deg"), gamma), gamma));
            case "M2 weak" -> rounded(ObliqueShock.mach2(mach1, weak(mach1, row.number("theta_deg"), gamma), gamma));
            default -> throw new IllegalArgumentException(row.toString());
        };
    }

    /** The rows of 20 digits hold for the decimal gamma; that of a double, and the result's own rounding, differ a little. */
    private static Answer rounded(double value) {
        return Answer.of(value, 4 * Math.ulp(value));
    }

    @Test
    void everyObliqueShockOfTheTablesIsMet() {
        PublishedTable table = PublishedTable.read("oblique_cone_expansion.csv");
        assertEquals(Map.of("checked", 60, "of another family", 68), table.check(ObliqueShockValidationTest::ofTable));
    }

    private static Answer ofExample(Row row) {
        String quantity = row.quantity();
        if (!quantity.startsWith("oblique") && !quantity.startsWith("wedge") && !quantity.startsWith("expansion inv")) {
            return Answer.none("of another family");
        }
        if (quantity.startsWith("expansion inverse")) {
            return diamondFront(row);
        }
        double gamma = row.number("gamma");
        double mach1 = row.number("M1");
        if (row.inputs().contains("beta_deg")) {
            double angle = row.number("beta_deg");
            return quantity.contains("theta")
                    ? Answer.of(ObliqueShock.deflection(mach1, angle, gamma))
                    : Answer.of(ObliqueShock.mach2(mach1, angle, gamma));
        }
        double deflection = quantity.startsWith("wedge") ? 15 : row.number("theta_deg");
        double angle = weak(mach1, deflection, gamma);
        double p = ObliqueShock.p2OverP1(mach1, angle, gamma);
        return switch (quantity.replace(" (chart reading)", "")) {
            case "oblique beta_deg" -> Answer.of(angle);
            case "oblique p2 [atm]" -> Answer.of(p * row.number("p1"));
            case "oblique T2 [K]" -> Answer.of(ObliqueShock.t2OverT1(mach1, angle, gamma) * row.number("T1"));
            case "oblique M2" -> Answer.of(ObliqueShock.mach2(mach1, angle, gamma));
            case "oblique p02 [atm]" ->
                Answer.of(ObliqueShock.p02OverP01(mach1, angle, gamma)
                        / Isentropic.pOverP0(mach1, gamma)
                        * row.number("p1"));
            case "wedge pressure coefficient" -> Answer.of((p - 1) / (0.5 * gamma * mach1 * mach1));
            default -> throw new IllegalArgumentException(row.toString());
        };
    }

    /** From the pitot on the rear face of a diamond of twice 15 degrees, back through its expansion of 30 degrees. */
    private static Answer diamondFront(Row row) {
        assertTrue(row.inputs().contains("p04=2.596 atm; rear face static p3=0.1 atm"), row::toString);
        double rear = Pitot.supersonic(2.596 / 0.1, row.number("gamma"));
        return Answer.of(Fan.mach2(rear, -30, row.number("gamma")));
    }

    @Test
    void theObliqueShocksOfTheWorkedExamplesAreMet() {
        PublishedTable table = PublishedTable.read("worked_examples.csv");
        int rows = (int) table.rows().count();
        assertEquals(
                Map.of("checked", 12, "of another family", rows - 12),
                table.check(ObliqueShockValidationTest::ofExample));
    }

    /** The equations as printed, of the sine and the tangent of the shock angle, written apart from the kernels. */
    private record Equations(Dfp m, Dfp angle, Dfp gamma) {
        static Equations of(double mach1, double shockAngle, double gamma) {
            Dfp mach = FortyDigits.of(mach1);
            Dfp radians = FortyDigits.of(shockAngle).multiply(FortyDigits.pi()).divide(180);
            return new Equations(mach.multiply(mach), radians, FortyDigits.of(gamma));
        }

        Dfp normal() {
            Dfp sin = DfpMath.sin(angle);
            return m.multiply(sin).multiply(sin);
        }

        Dfp tangent() {
            Dfp cotangent = DfpMath.cos(angle).divide(DfpMath.sin(angle));
            Dfp double2 = DfpMath.cos(angle.multiply(2)).add(gamma).multiply(m).add(2);
            return cotangent.multiply(2).multiply(normal().subtract(1)).divide(double2);
        }

        Dfp p2OverP1() {
            return gamma.multiply(normal())
                    .multiply(2)
                    .subtract(gamma.subtract(1))
                    .divide(gamma.add(1));
        }

        Dfp rho2OverRho1() {
            return gamma.add(1)
                    .multiply(normal())
                    .divide(gamma.subtract(1).multiply(normal()).add(2));
        }

        /** Equation (132). */
        Dfp mach2() {
            Dfp n = normal();
            Dfp more = gamma.add(1);
            Dfp less = gamma.subtract(1);
            Dfp top = more.multiply(more)
                    .multiply(m)
                    .multiply(n)
                    .subtract(n.subtract(1).multiply(gamma.multiply(n).add(1)).multiply(4));
            Dfp bottom = gamma.multiply(n)
                    .multiply(2)
                    .subtract(less)
                    .multiply(less.multiply(n).add(2));
            return top.divide(bottom).sqrt();
        }
    }

    private static void agrees(String what, double got, Dfp exact, double most, double mach1, double angle) {
        double error = ulps(got, exact);
        assertTrue(error <= most, () -> what + " at " + mach1 + ", " + angle + ": " + error + " ulp");
    }

    @Test
    void theEquationsHoldInFortyDigits() {
        SplittableRandom random = new SplittableRandom(128);
        for (int i = 0; i < POINTS; i++) {
            double mach1 = 1 + StrictMath.pow(10, -9 + 13 * random.nextDouble());
            double gamma = 1.01 + (i % 3 == 0 ? 2 : 0.7) * random.nextDouble();
            double least = Isentropic.machAngle(mach1);
            double angle = least + (90 - least) * (0.001 + 0.999 * random.nextDouble());
            Equations exact = Equations.of(mach1, angle, gamma);
            double ofAngle = ObliqueSlopes.deflectionByShockAngle(mach1, angle, gamma);
            double deflection = ObliqueShock.deflection(mach1, angle, gamma);
            Dfp degrees = DfpMath.atan(exact.tangent()).multiply(180).divide(FortyDigits.pi());
            double condition = Math.abs(angle * ofAngle / deflection);
            agrees("deflection", deflection, degrees, 4 * (1 + condition), mach1, angle);
            agrees("p2/p1", ObliqueShock.p2OverP1(mach1, angle, gamma), exact.p2OverP1(), 6, mach1, angle);
            agrees("rho2/rho1", ObliqueShock.rho2OverRho1(mach1, angle, gamma), exact.rho2OverRho1(), 8, mach1, angle);
            Dfp t = exact.p2OverP1().divide(exact.rho2OverRho1());
            agrees("T2/T1", ObliqueShock.t2OverT1(mach1, angle, gamma), t, 8, mach1, angle);
            agrees("M2", ObliqueShock.mach2(mach1, angle, gamma), exact.mach2(), 6, mach1, angle);
            stagnationPressureHolds(mach1, angle, gamma, exact);
            mach1Holds(mach1, angle, gamma);
        }
    }

    /** Equation (142). The double M1 sin(beta) moves it by its own slope. */
    private static void stagnationPressureHolds(double mach1, double angle, double gamma, Equations exact) {
        Dfp less = exact.gamma().subtract(1);
        Dfp log = FortyDigits.log(exact.rho2OverRho1())
                .multiply(exact.gamma())
                .subtract(FortyDigits.log(exact.p2OverP1()))
                .divide(less);
        double normal = ObliqueShock.normalMach(mach1, angle);
        double slope = normal * ShockEntropy.riseByMach(normal, gamma);
        if (log.toDouble() > -690) {
            Dfp p02 = FortyDigits.exp(log);
            agrees("p02/p01", ObliqueShock.p02OverP01(mach1, angle, gamma), p02, 6 + 4 * slope, mach1, angle);
        }
    }

    /** M1 from the two angles: the angles it belongs to exactly, by the equation for the deflection. */
    private static void mach1Holds(double mach1, double angle, double gamma) {
        double deflection = ObliqueShock.deflection(mach1, angle, gamma);
        if (angle == 90 || !(deflection < ObliqueShock.deflectionAtInfiniteMach(angle, gamma))) {
            return;
        }
        double found = ObliqueShock.mach1(deflection, angle, gamma);
        double byDeflection = deflection * ObliqueSlopes.mach1ByDeflection(deflection, angle, gamma);
        double byAngle = angle * ObliqueSlopes.mach1ByShockAngle(deflection, angle, gamma);
        double condition = (Math.abs(byDeflection) + Math.abs(byAngle)) / found;
        assertEquals(mach1, found, 8 * (1 + condition) * Math.ulp(mach1), () -> "M1 at " + mach1 + ", " + angle);
    }

    /** Detachment: at the least Mach number for a deflection, the greatest deflection by the exact equations is that one. */
    @Test
    void detachmentHoldsInFortyDigits() {
        SplittableRandom random = new SplittableRandom(168);
        for (int i = 0; i < POINTS; i++) {
            double gamma = i % 3 == 0
                    ? 1 + StrictMath.pow(10, -6 + 7.5 * random.nextDouble())
                    : 1.05 + 0.7 * random.nextDouble();
            double limit = ObliqueLimits.deflectionLimit(gamma);
            double deflection =
                    limit * (i % 2 == 0 ? StrictMath.pow(10, -8 * random.nextDouble()) : random.nextDouble());
            double mach1 = ObliqueLimits.mach1AtDetachment(deflection, gamma);
            double slope = ObliqueSlopes.deflectionMaxByMach1(mach1, gamma);
            Dfp missed = greatestDeflection(mach1, gamma).subtract(FortyDigits.of(deflection));
            double allowed = 8 * (Math.ulp(deflection) + slope * Math.ulp(mach1));
            assertTrue(Math.abs(missed.toDouble()) <= allowed, () -> missed + " at " + deflection + ", " + gamma);
        }
    }

    /** Equation (168) for the shock angle, in the equation for the deflection. */
    private static Dfp greatestDeflection(double mach1, double gamma) {
        Dfp g = FortyDigits.of(gamma);
        Dfp m = FortyDigits.of(mach1).multiply(FortyDigits.of(mach1));
        Dfp more = g.add(1);
        Dfp root = more.multiply(m)
                .multiply(m)
                .add(g.subtract(1).multiply(m).multiply(8))
                .add(16)
                .multiply(more)
                .sqrt();
        Dfp sin2 = more.multiply(m).subtract(4).add(root).divide(g.multiply(m).multiply(4));
        Dfp cotangent = sin2.reciprocal().subtract(1).sqrt();
        Dfp bottom = more.subtract(sin2.multiply(2)).multiply(m).add(2);
        Dfp tangent =
                cotangent.multiply(2).multiply(m.multiply(sin2).subtract(1)).divide(bottom);
        return DfpMath.atan(tangent).multiply(180).divide(FortyDigits.pi());
    }
}
