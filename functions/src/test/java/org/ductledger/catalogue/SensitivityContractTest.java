package org.ductledger.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Collection;
import org.ductledger.flow.StandardCatalogue;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every closed partial derivative against differences of its kernel, over drawn ordinary arguments. */
class SensitivityContractTest {
    private static final int POINTS = 60;
    private static final double TOLERANCE = 1e-6;

    static Collection<FunctionEntry> entries() {
        return StandardCatalogue.get().entries();
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void partialsAgreeWithDifferences(FunctionEntry entry) {
        for (int i = 0; i < entry.arguments().size(); i++) {
            if (entry.sensitivities().get(i) instanceof Sensitivity.Exact exact) {
                agree(entry, i, exact.derivative());
            }
        }
    }

    private static void agree(FunctionEntry entry, int place, Kernel derivative) {
        Draws draws = new Draws(entry);
        int sharp = 0;
        for (int i = 0; i < POINTS; i++) {
            double[] row = draws.ordinary();
            double value = entry.kernel().at(row);
            if (Double.isFinite(value)) {
                sharp += agreesAt(entry, place, derivative, row, value) ? 1 : 0;
            }
        }
        int compared = sharp;
        assertTrue(compared > 0, () -> entry + ": no point at which differences are sharp");
    }

    /** Whether the differences are sharp here; where they are, the closed derivative must agree. */
    private static boolean agreesAt(FunctionEntry entry, int place, Kernel derivative, double[] row, double value) {
        Argument argument = entry.arguments().get(place);
        Differences differences = new Differences(entry.kernel(), place, row);
        double numeric = differences.within(argument.interval());
        double exact = derivative.at(row);
        double size = Math.abs(numeric) + 1e-6 * Math.abs(value) / Math.max(Math.abs(row[place]), 1e-3);
        if (!(differences.error() <= TOLERANCE / 2 * size)) {
            return false;
        }
        assertEquals(numeric, exact, TOLERANCE * size, () -> entry + Arrays.toString(row) + " by " + argument.name());
        return true;
    }
}
