package org.ductledger.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class PartialTest {
    private static double numeric(Kernel.Of1 f, Interval interval, double x) {
        return new Differences(Kernel.of(f), 0, new double[] {x}).within(interval);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 1e-30, 1e-9, 1e-3, 0.5, 1, 3})
    void differencesFollowASmoothFunctionDownToItsEnd(double x) {
        double exact = StrictMath.cos(x) - 2 * x * StrictMath.exp(-x * x);
        double found = numeric(v -> StrictMath.sin(v) + StrictMath.exp(-v * v), Interval.atLeast(0), x);
        assertEquals(exact, found, 1e-9);
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-12, 1e-6, 1e-2, 1, 1e5, 1e12})
    void theStepFitsTheSizeOfTheArgument(double x) {
        assertEquals(0.5 / Math.sqrt(x), numeric(Math::sqrt, Interval.above(0), x), 1e-8 / Math.sqrt(x));
        assertEquals(-1 / x / x, numeric(v -> 1 / v, Interval.above(0), x), 1e-8 / x / x);
    }

    @Test
    void noStepLeavesTheInterval() {
        Kernel.Of1 fragile = x -> {
            assertTrue(x >= 1 && x <= 2, () -> "asked at " + x);
            return x * x;
        };
        for (double x : new double[] {1, Math.nextUp(1.0), 1.5, Math.nextDown(2.0), 2}) {
            assertEquals(2 * x, numeric(fragile, Interval.closed(1, 2), x), 1e-9);
        }
    }

    @Test
    void whereAFunctionHasNoValueItHasNoDerivative() {
        assertTrue(Double.isNaN(numeric(x -> Double.NaN, Interval.anyNumber(), 1)));
        assertTrue(Double.isNaN(numeric(x -> x, Interval.closed(1, 1), 1)));
    }

    @Test
    void anEntryGivesItsExactDerivativeOrElseANumericOne() {
        FunctionEntry entry = new EntryBuilder(new Family("made_up", "Made up for a test"), "scaled_cube")
                .title("A scaled cube")
                .formula("y = a x^3")
                .takes(
                        Argument.number("a", "a", "1", Interval.anyNumber(), "a factor"),
                        Argument.number("x", "x", "1", Interval.anyNumber(), "a number"),
                        Argument.choice("side", "which side", "left", "right"))
                .gives("y", "1", Interval.anyNumber())
                .kernel((a, x, side) -> a * x * x * x)
                .partials(Kernel.of((a, x, side) -> 42), null, null)
                .sources(new Source("A. Body", "A Standard", 2001, ""))
                .example("16", 2.0, 2.0, "left")
                .cell("{a}*{x}^3")
                .build();
        assertEquals(42, entry.partial(0, 2, 2, 0));
        assertEquals(24, entry.partial(1, 2, 2, 0), 1e-9);
        assertThrows(IllegalArgumentException.class, () -> entry.partial(2, 2, 2, 0));
    }
}
