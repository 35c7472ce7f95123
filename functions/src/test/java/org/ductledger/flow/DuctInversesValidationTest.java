package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Set;
import java.util.function.BinaryOperator;
import java.util.function.UnaryOperator;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Kernel;
import org.ductledger.exact.FortyDigits;
import org.hipparchus.dfp.Dfp;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The Mach numbers that solve the equations of duct flow: in 40 digits the equation must change its sign within the
 * width of the accuracy promised about each of them.
 */
class DuctInversesValidationTest {
    private static final int POINTS = 400;

    /** In units in the last place, over 1 + the condition of the inverse there. */
    private static final double GREATEST = 4;

    private static final Dfp UNIT = FortyDigits.of(0x1p-52);

    static Set<String> inverses() {
        return DuctEquations.INVERSE.keySet();
    }

    private static FunctionEntry entry(String name) {
        return StandardCatalogue.get().find(name).orElseThrow();
    }

    /** That the residual changes its sign, or is zero, about the root, on its side of the turn. */
    private static boolean holdsRoot(UnaryOperator<Dfp> residual, double root, double condition, Dfp turn) {
        Dfp m = FortyDigits.of(root);
        double worth = root == turn.toDouble() ? 0 : condition;
        Dfp width = UNIT.multiply(FortyDigits.of(GREATEST * (1 + worth)));
        Dfp below = m.multiply(width.negate().add(1));
        Dfp above = m.multiply(width.add(1));
        if (root <= turn.toDouble()) {
            below = below.lessThan(m.getZero()) ? m.getZero() : below;
            above = turn.lessThan(above) ? turn : above;
        } else {
            below = below.lessThan(turn) ? turn : below;
        }
        return residual.apply(below).multiply(residual.apply(above)).toDouble() <= 0;
    }

    /** Whether the function's value is, to its last digits, that at rest, at infinite M, or at the turn. */
    private static boolean isAtAnEnd(Kernel forward, double mach, double gamma, Dfp turn) {
        double slack = 4 * Math.ulp(forward.at(mach, gamma));
        return Math.abs(forward.at(0.5 * mach, gamma) - forward.at(mach, gamma)) <= slack
                || Math.abs(forward.at(2 * mach, gamma) - forward.at(mach, gamma)) <= slack
                || Math.abs(forward.at(turn.toDouble(), gamma) - forward.at(mach, gamma)) <= slack;
    }

    /** Where the two branches of a flow meet. */
    private static Dfp turn(String name, double gamma) {
        boolean thermal = name.contains("isothermal") || name.contains("rayleigh_t_over");
        Dfp one = FortyDigits.of(1);
        return thermal ? one.divide(FortyDigits.of(gamma).sqrt()) : one;
    }

    @ParameterizedTest
    @MethodSource("inverses")
    void theEquationChangesItsSignAtTheMachNumber(String name) {
        BinaryOperator<Dfp> equation = DuctEquations.of(name);
        Kernel forward = entry(DuctEquations.INVERSE.getOrDefault(name, name)).kernel();
        FunctionEntry entry = entry(name);
        boolean branched = entry.arguments().size() == 3;
        DuctPoints points = new DuctPoints(name.hashCode());
        for (int i = 0; i < POINTS; i++) {
            double gamma = points.gamma();
            double mach = points.mach(gamma);
            Dfp turn = turn(name, gamma);
            double given = forward.at(mach, gamma);
            if (!Double.isFinite(given)) {
                continue;
            }
            double root = branched
                    ? entry.kernel().at(given, gamma, mach <= turn.toDouble() ? 0 : 1)
                    : entry.kernel().at(given, gamma);
            if (isAtAnEnd(forward, mach, gamma, turn) || isAtAnEnd(forward, root, gamma, turn)) {
                continue;
            }
            Dfp g = FortyDigits.of(gamma);
            double condition = 1 / DuctEquations.condition(equation, FortyDigits.of(root), g);
            UnaryOperator<Dfp> residual = m -> equation.apply(m, g).subtract(FortyDigits.of(given));
            assertTrue(
                    holdsRoot(residual, root, condition, turn),
                    () -> name + "(" + given + ", " + gamma + ") = " + root + " for " + mach + ", condition "
                            + condition);
        }
    }

    @Test
    void behindADuctOfFannoFlowTheLengthToChokingIsShorterByIt() {
        behind("fanno_mach2", "fanno_fl_over_d", (k, step) -> k.subtract(step));
    }

    @Test
    void behindADuctOfIsothermalFlowTheLengthToChokingIsShorterByIt() {
        behind("isothermal_mach2", "isothermal_fl_over_d", (k, step) -> k.subtract(step));
    }

    @Test
    void behindHeatingTheStagnationTemperatureIsHigherByIt() {
        behind("rayleigh_mach2", "rayleigh_t0_over_t0star", Dfp::multiply);
    }

    private static void behind(String name, String carrier, BinaryOperator<Dfp> change) {
        BinaryOperator<Dfp> equation = DuctEquations.of(carrier);
        FunctionEntry entry = entry(name);
        DuctPoints points = new DuctPoints(name.hashCode());
        int solved = 0;
        for (int i = 0; i < 3 * POINTS; i++) {
            double gamma = points.gamma();
            double mach1 = points.mach(gamma);
            double step = step(points, entry(carrier).kernel().at(mach1, gamma), name.startsWith("rayleigh"));
            double mach2 = entry.kernel().at(mach1, step, gamma);
            if (Double.isNaN(mach2) || mach2 > 1e8) {
                continue;
            }
            Dfp g = FortyDigits.of(gamma);
            Dfp wanted = change.apply(equation.apply(FortyDigits.of(mach1), g), FortyDigits.of(step));
            double slope = DuctEquations.condition(equation, FortyDigits.of(mach2), g)
                    * equation.apply(FortyDigits.of(mach2), g).toDouble();
            double slope1 = DuctEquations.condition(equation, FortyDigits.of(mach1), g)
                    * equation.apply(FortyDigits.of(mach1), g).toDouble();
            double condition = (slope1 + Math.abs(step)) / slope;
            if (condition > 1e14) {
                continue; // Choked to the last digit.
            }
            solved++;
            Dfp turn = turn(name, gamma);
            assertTrue(
                    holdsRoot(m -> equation.apply(m, g).subtract(wanted), mach2, condition, turn),
                    () -> name + "(" + mach1 + ", " + step + ", " + gamma + ") = " + mach2 + ", condition "
                            + condition);
            assertEquals(
                    mach1 <= turn.toDouble(), mach2 <= turn.toDouble(), () -> name + " changes its side at " + mach1);
        }
        int found = solved;
        assertTrue(found > POINTS, () -> "only " + found + " solved");
    }

    /** A length, down or up the duct, of the size of that to choking; or a heating. */
    private static double step(DuctPoints points, double carrier, boolean heating) {
        double part = 2 * points.random().nextDouble() - 1;
        double small = points.random().nextBoolean()
                ? 1
                : StrictMath.pow(10, -12 * points.random().nextDouble());
        return heating ? 1 + part * small * Math.max(0, 1 / carrier - 1) : part * small * carrier;
    }
}
