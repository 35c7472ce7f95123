package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import java.util.SplittableRandom;
import org.ductledger.flow.PublishedTable.Answer;
import org.ductledger.flow.PublishedTable.Row;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.ODEStateAndDerivative;
import org.hipparchus.ode.OrdinaryDifferentialEquation;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;

/**
 * Against the cone tables in {@code oblique_cone_expansion.csv} (J. L. Sims, NASA SP-3004, of which the note says how far
 * it is to be trusted; values of the equation of Taylor and Maccoll to 11 digits), and against that equation in its
 * textbook form, integrated by Hipparchus.
 */
class ConeValidationTest {
    private static Answer answer(Row row) {
        if (!row.quantity().startsWith("cone")) {
            return Answer.none("of another family");
        }
        double mach1 = row.number("M");
        double halfAngle = row.number("cone_half_angle_deg");
        double gamma = row.number("gamma");
        double p = Cone.surfacePOverP1(mach1, halfAngle, gamma);
        return switch (row.quantity()) {
            case "cone shock angle_deg" -> Answer.of(Cone.shockAngle(mach1, halfAngle, gamma));
            case "cone shock angle_rad" -> Answer.of(Math.toRadians(Cone.shockAngle(mach1, halfAngle, gamma)));
            case "cone surface Mach" -> Answer.of(Cone.surfaceMach(mach1, halfAngle, gamma));
            case "cone surface pc/p1" -> Answer.of(p);
            case "cone surface Cp" -> Answer.of((p - 1) / (0.5 * gamma * mach1 * mach1));
            case "cone shock p02/p01" -> Answer.of(Cone.p02OverP01(mach1, halfAngle, gamma));
            case "cone surface rhoc/rho1" -> {
                double surfaceMach = Cone.surfaceMach(mach1, halfAngle, gamma);
                yield Answer.of(p * Isentropic.tOverT0(mach1, gamma) / Isentropic.tOverT0(surfaceMach, gamma));
            }
            default -> throw new IllegalArgumentException(row.toString());
        };
    }

    @Test
    void everyConeOfTheTablesIsMet() {
        PublishedTable table = PublishedTable.read("oblique_cone_expansion.csv");
        assertEquals(Map.of("checked", 65, "of another family", 63), table.check(ConeValidationTest::answer));
    }

    /** The rows of 11 digits to their last one. */
    @Test
    void theFlowHoldsToTenDigits() {
        PublishedTable.read("oblique_cone_expansion.csv")
                .rows()
                .filter(row ->
                        row.quantity().startsWith("cone") && !row.toString().contains("SP-3004"))
                .forEach(row -> {
                    double exact = Double.parseDouble(row.exact());
                    assertEquals(exact, answer(row).value(), 1e-10 * exact, row::toString);
                });
    }

    /**
     * The equation of Taylor and Maccoll for (v, v') over theta, in units of the greatest speed: v'' (a^2 - v'^2) =
     * v'^2 v - a^2 (2 v + v' cot(theta)), a^2 = (gamma-1)/2 (1 - v^2 - v'^2).
     */
    private record TextbookForm(double gamma) implements OrdinaryDifferentialEquation {
        @Override
        public int getDimension() {
            return 2;
        }

        @Override
        public double[] computeDerivatives(double theta, double[] y) {
            double a2 = 0.5 * (gamma - 1) * (1 - y[0] * y[0] - y[1] * y[1]);
            double bend = (y[1] * y[1] * y[0] - a2 * (2 * y[0] + y[1] / Math.tan(theta))) / (a2 - y[1] * y[1]);
            return new double[] {y[1], bend};
        }
    }

    /** The flow at the cone, from the state behind the shock of this angle by the oblique-shock relations. */
    private static double[] atCone(double mach1, double shockAngle, double halfAngle, double gamma) {
        double mach2 = ObliqueShock.mach2(mach1, shockAngle, gamma);
        double deflection = Math.toRadians(ObliqueShock.deflection(mach1, shockAngle, gamma));
        double speed = 1 / Math.sqrt(1 + 2 / ((gamma - 1) * mach2 * mach2));
        double inclination = Math.toRadians(shockAngle) - deflection;
        double[] start = {speed * Math.cos(inclination), -speed * Math.sin(inclination)};
        ODEStateAndDerivative end = new DormandPrince853Integrator(1e-12, 1, 1e-14, 1e-13)
                .integrate(
                        new TextbookForm(gamma),
                        new ODEState(Math.toRadians(shockAngle), start),
                        Math.toRadians(halfAngle));
        return end.getPrimaryState();
    }

    @Test
    void theTextbookFormHasNoFlowThroughTheCone() {
        SplittableRandom random = new SplittableRandom(1933);
        for (int i = 0; i < 200; i++) {
            double mach1 = 1.1 + 9 * random.nextDouble();
            double gamma = 1.1 + 0.6 * random.nextDouble();
            double halfAngle = Cone.halfAngleMax(mach1, gamma) * (0.2 + 0.78 * random.nextDouble());
            double shockAngle = Cone.shockAngle(mach1, halfAngle, gamma);
            double[] v = atCone(mach1, shockAngle, halfAngle, gamma);
            String where = mach1 + ", " + halfAngle + ", " + gamma;
            assertEquals(0, v[1], 1e-9, where);
            double surfaceMach = Math.sqrt(2 / (gamma - 1) / (1 / (v[0] * v[0]) - 1));
            assertEquals(surfaceMach, Cone.surfaceMach(mach1, halfAngle, gamma), 1e-9, where);
            double p = ObliqueShock.p02OverP01(mach1, shockAngle, gamma)
                    * Isentropic.pOverP0(surfaceMach, gamma)
                    / Isentropic.pOverP0(mach1, gamma);
            assertEquals(p, Cone.surfacePOverP1(mach1, halfAngle, gamma), 1e-9 * p, where);
        }
    }

    /** By the textbook form too, shocks to both sides of the strongest weak one belong to more slender cones. */
    @Test
    void theGreatestConeIsGreatest() {
        for (double mach1 : new double[] {1.05, 1.5, 2, 5, 30}) {
            double most = Cone.halfAngleMax(mach1, 1.4);
            double shockAngle = Cone.shockAngle(mach1, most, 1.4);
            assertEquals(0, atCone(mach1, shockAngle, most, 1.4)[1], 1e-8);
            for (double other : new double[] {0.97 * shockAngle, 0.5 * (shockAngle + 90)}) {
                assertTrue(atCone(mach1, other, most, 1.4)[1] < -1e-7, () -> "at " + mach1 + ", " + other);
            }
        }
    }

    /** NACA Report 1135, chart 5, from memory: the shock detaches from a cone of about 40.7 degrees at M1 = 2, 57.5 far up. */
    @Test
    void theGreatestConesOfTheChart() {
        assertEquals(40.7, Cone.halfAngleMax(2, 1.4), 0.1);
        assertEquals(57.5, Cone.halfAngleMax(50, 1.4), 0.2);
    }
}
