package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Set;
import org.ductledger.catalogue.FunctionEntry;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** There and back between Mach number and ratio, and what one unit in the last place does. */
class DuctRoundTripTest {
    private static final int POINTS = 6000;
    private static final double UNIT = 0x1p-52;

    /** Two functions, each allowed 4 units over 1 + its condition. */
    private static final double BOTH = 8;

    static Set<String> inverses() {
        return DuctEquations.INVERSE.keySet();
    }

    /** A function, its inverse, and a point. */
    private record Pair(FunctionEntry forward, FunctionEntry inverse) {
        static Pair of(String inverse) {
            return new Pair(entry(DuctEquations.INVERSE.getOrDefault(inverse, inverse)), entry(inverse));
        }

        private static FunctionEntry entry(String name) {
            return StandardCatalogue.get().find(name).orElseThrow();
        }

        double forward(double mach, double gamma) {
            return forward.kernel().at(mach, gamma);
        }

        double inverse(double given, double gamma, double branch) {
            return inverse.arguments().size() == 3
                    ? inverse.kernel().at(given, gamma, branch)
                    : inverse.kernel().at(given, gamma);
        }

        /** |M f'/f|. */
        double condition(double mach, double gamma) {
            return Math.abs(mach * forward.partial(0, mach, gamma) / forward(mach, gamma));
        }

        double branch(double mach, double gamma) {
            boolean thermal = forward.family().name().equals("isothermal")
                    || forward.name().equals("rayleigh_t_over_tstar");
            return (thermal ? gamma * mach * mach : mach) <= 1 ? 0 : 1;
        }
    }

    @ParameterizedTest
    @MethodSource("inverses")
    void theMachNumberComesBack(String name) {
        Pair pair = Pair.of(name);
        DuctPoints points = new DuctPoints(name.hashCode() + 1);
        int tried = 0;
        for (int i = 0; i < POINTS; i++) {
            double gamma = points.gamma();
            double mach = points.mach(gamma);
            double given = pair.forward(mach, gamma);
            double condition = pair.condition(mach, gamma);
            double allowed = BOTH * UNIT * (2 + 1 / condition + condition);
            if (Double.isFinite(given) && allowed < 0.01) {
                tried++;
                double back = pair.inverse(given, gamma, pair.branch(mach, gamma));
                double width = Math.max(allowed, Math.sqrt(allowed * UNIT));
                assertTrue(
                        Math.abs(back / mach - 1) <= width + nearTheTurn(given),
                        () -> name + ": " + mach + " came back as " + back + " at gamma " + gamma);
            }
        }
        int points1 = tried;
        assertTrue(points1 > POINTS / 2, () -> "only " + points1 + " tried");
    }

    /** Where two branches meet at a rounded value, the Mach number is as good as the root of a unit. */
    private static double nearTheTurn(double given) {
        return given == 1 ? 1e-7 : 0;
    }

    @ParameterizedTest
    @MethodSource("inverses")
    void theRatioComesBack(String name) {
        Pair pair = Pair.of(name);
        DuctPoints points = new DuctPoints(name.hashCode() + 2);
        for (int i = 0; i < POINTS; i++) {
            double gamma = points.gamma();
            double branch = points.random().nextInt(2);
            double given = pair.forward(points.mach(gamma), gamma);
            double mach = Double.isFinite(given) ? pair.inverse(given, gamma, branch) : Double.NaN;
            if (mach > 0 && mach < 1e150) {
                double condition = pair.condition(mach, gamma);
                double back = pair.forward(mach, gamma);
                double allowed = BOTH * UNIT * (2 + condition);
                assertTrue(
                        Math.abs(back - given) <= allowed * Math.abs(given),
                        () -> name + ": " + given + " came back as " + back + " at gamma " + gamma);
            }
        }
    }

    /** Strictly monotonic over steps that rounding cannot hide, and never the wrong way by more than rounding. */
    @ParameterizedTest
    @MethodSource("inverses")
    void functionsAreMonotonicOnEachSideOfTheirTurn(String name) {
        Pair pair = Pair.of(name);
        DuctPoints points = new DuctPoints(name.hashCode() + 3);
        for (int i = 0; i < POINTS; i++) {
            double gamma = points.gamma();
            double mach = points.mach(gamma);
            double up = Math.nextUp(mach);
            double far = mach * (1 + 1e-6);
            double here = pair.forward(mach, gamma);
            double condition = pair.condition(mach, gamma);
            double slope = pair.forward.partial(0, mach, gamma);
            double rounding = BOTH * UNIT * Math.abs(here) * (1 + condition);
            assertTrue(
                    !Double.isFinite(here) || Math.abs(pair.forward(up, gamma) - here) <= rounding,
                    () -> name + " jumps at " + mach + ", " + gamma);
            if (condition > 1e-6 && pair.branch(mach, gamma) == pair.branch(far, gamma) && Double.isFinite(here)) {
                double step = pair.forward(far, gamma) - here;
                assertTrue(step * slope > 0, () -> name + " turns at " + mach + ", " + gamma);
            }
        }
    }
}
