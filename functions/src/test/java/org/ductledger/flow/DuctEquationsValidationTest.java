package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Set;
import java.util.function.BinaryOperator;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.exact.FortyDigits;
import org.hipparchus.dfp.Dfp;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The functions of a Mach number and gamma against their equations in 40 digits, over drawn points of every region. */
class DuctEquationsValidationTest {
    private static final int POINTS = 500;

    /** In units in the last place, over 1 + the condition of the function there. */
    private static final double GREATEST = 4;

    private static final double ROOT_MEAN_SQUARE = 1;

    static Set<String> names() {
        return DuctEquations.FORWARD.keySet();
    }

    private static FunctionEntry entry(String name) {
        return StandardCatalogue.get().find(name).orElseThrow();
    }

    @ParameterizedTest
    @MethodSource("names")
    void theEquationHoldsToTheLastDigits(String name) {
        BinaryOperator<Dfp> equation = DuctEquations.of(name);
        FunctionEntry entry = entry(name);
        DuctPoints points = new DuctPoints(name.hashCode());
        double squares = 0;
        for (int i = 0; i < POINTS; i++) {
            double gamma = points.gamma();
            double mach = points.mach(gamma);
            Dfp exact = equation.apply(FortyDigits.of(mach), FortyDigits.of(gamma));
            double got = entry.kernel().at(mach, gamma);
            if (!(exact.toDouble() > 1e-300 && exact.toDouble() < 1e300)) {
                continue;
            }
            double condition = DuctEquations.condition(equation, FortyDigits.of(mach), FortyDigits.of(gamma));
            double error = FortyDigits.ulps(got, exact) / (1 + condition);
            assertTrue(error <= GREATEST, () -> name + "(" + mach + ", " + gamma + ") = " + got + " by " + error);
            squares += error * error;
        }
        assertEquals(0, Math.sqrt(squares / POINTS), ROOT_MEAN_SQUARE, name);
    }

    /** The partials by forward arithmetic differences of 40 digits. */
    @ParameterizedTest
    @MethodSource("names")
    void thePartialsAreThoseOfTheEquation(String name) {
        BinaryOperator<Dfp> equation = DuctEquations.of(name);
        FunctionEntry entry = entry(name);
        DuctPoints points = new DuctPoints(31 + name.hashCode());
        Dfp h = FortyDigits.decimal("1e-14");
        for (int i = 0; i < 100; i++) {
            double gamma = 1.02 + 0.7 * points.random().nextDouble();
            double mach = 0.05 + 5 * points.random().nextDouble();
            Dfp m = FortyDigits.of(mach);
            Dfp g = FortyDigits.of(gamma);
            double byMach = equation.apply(m.add(h), g)
                    .subtract(equation.apply(m.subtract(h), g))
                    .divide(h.multiply(2))
                    .toDouble();
            double byGamma = equation.apply(m, g.add(h))
                    .subtract(equation.apply(m, g.subtract(h)))
                    .divide(h.multiply(2))
                    .toDouble();
            double size = Math.abs(entry.kernel().at(mach, gamma));
            assertEquals(byMach, entry.partial(0, mach, gamma), 1e-13 * (Math.abs(byMach) + size), name);
            assertEquals(byGamma, entry.partial(1, mach, gamma), 1e-13 * (Math.abs(byGamma) + size), name);
        }
    }
}
