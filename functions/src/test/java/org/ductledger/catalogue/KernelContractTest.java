package org.ductledger.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Collection;
import java.util.function.Supplier;
import java.util.stream.Stream;
import org.ductledger.flow.StandardCatalogue;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What every kernel owes the evaluator, over drawn admissible arguments; a new one is found by itself. */
class KernelContractTest {
    private static final int POINTS = 2_000;

    static Collection<FunctionEntry> entries() {
        return StandardCatalogue.get().entries();
    }

    private static Condition[] broken(FunctionEntry entry, double[] row) {
        return entry.conditions().stream()
                .filter(condition -> !condition.holds().test(row))
                .toArray(Condition[]::new);
    }

    private static Supplier<String> at(FunctionEntry entry, double[] row, double result) {
        return () -> entry + Arrays.toString(row) + " = " + result;
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void ordinaryArgumentsGiveAFiniteResultInItsRangeOrAReason(FunctionEntry entry) {
        Draws draws = new Draws(entry);
        Interval range = entry.result().range();
        int finite = 0;
        for (int i = 0; i < POINTS; i++) {
            double[] row = draws.ordinary();
            double result = entry.kernel().at(row);
            boolean hasReason = broken(entry, row).length > 0;
            assertEquals(!hasReason, Double.isFinite(result), at(entry, row, result));
            if (!hasReason) {
                finite++;
                assertTrue(result >= range.lower() && result <= range.upper(), at(entry, row, result));
            }
        }
        int answered = finite;
        assertTrue(answered > POINTS / 50, () -> "only " + answered + " points have a result: nothing is tried");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void noAdmissibleArgumentsGiveNaNWithoutAReason(FunctionEntry entry) {
        Draws draws = new Draws(entry);
        for (int i = 0; i < POINTS; i++) {
            double[] row = draws.extreme();
            double result = entry.kernel().at(row);
            Condition[] broken = broken(entry, row);
            assertTrue(!Double.isNaN(result) || broken.length > 0, at(entry, row, result));
            for (Condition condition : broken) {
                assertTrue(!Double.isFinite(result), at(entry, row, result));
                assertTrue(
                        condition.wording().of(row).startsWith("must "),
                        condition.wording().of(row));
            }
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void aColumnEqualsItsRowsToTheBit(FunctionEntry entry) {
        Draws draws = new Draws(entry);
        double[][] rows = Stream.generate(draws::ordinary).limit(POINTS).toArray(double[][]::new);
        double[][] columns = columns(rows, entry.arguments().size());
        double[] result = new double[POINTS];
        int split = 777;
        entry.kernel().apply(columns, split, POINTS, result);
        entry.kernel().apply(columns, 0, split, result);
        for (int i = 0; i < POINTS; i++) {
            assertEquals(entry.kernel().at(rows[i]), result[i], at(entry, rows[i], result[i]));
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void aSpreadArgumentEqualsItsColumnToTheBit(FunctionEntry entry) {
        Draws draws = new Draws(entry);
        double[][] rows = Stream.generate(draws::ordinary).limit(300).toArray(double[][]::new);
        for (int spread = 0; spread < entry.arguments().size(); spread++) {
            for (double[] row : rows) {
                row[spread] = rows[0][spread];
            }
            double[][] columns = columns(rows, entry.arguments().size());
            columns[spread] = new double[] {rows[0][spread]};
            double[] result = new double[rows.length];
            entry.kernel().apply(columns, 0, rows.length, result);
            for (int i = 0; i < rows.length; i++) {
                assertEquals(entry.kernel().at(rows[i]), result[i], at(entry, rows[i], result[i]));
            }
        }
    }

    private static double[][] columns(double[][] rows, int arity) {
        double[][] columns = new double[arity][rows.length];
        for (int i = 0; i < rows.length; i++) {
            for (int j = 0; j < arity; j++) {
                columns[j][i] = rows[i][j];
            }
        }
        return columns;
    }
}
