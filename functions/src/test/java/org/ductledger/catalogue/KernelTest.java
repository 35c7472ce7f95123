package org.ductledger.catalogue;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class KernelTest {
    private static final int ROWS = 5;

    /** Each weighs its arguments by 1, 10, 100 ..., so that one taken from another place or row is seen. */
    static List<Kernel> kernels() {
        return List.of(
                Kernel.of(a -> a),
                Kernel.of((a, b) -> a + 10 * b),
                Kernel.of((a, b, c) -> a + 10 * b + 100 * c),
                Kernel.of((a, b, c, d) -> a + 10 * b + 100 * c + 1000 * d),
                Kernel.of((a, b, c, d, e) -> a + 10 * b + 100 * c + 1000 * d + 1e4 * e),
                Kernel.of((a, b, c, d, e, f) -> a + 10 * b + 100 * c + 1000 * d + 1e4 * e + 1e5 * f),
                Kernel.of((a, b, c, d, e, f, g) -> a + 10 * b + 100 * c + 1000 * d + 1e4 * e + 1e5 * f + 1e6 * g));
    }

    private static double weighed(double[][] columns, int row) {
        double sum = 0;
        double weight = 1;
        for (double[] column : columns) {
            sum += weight * column[column.length == 1 ? 0 : row];
            weight *= 10;
        }
        return sum;
    }

    @ParameterizedTest
    @MethodSource("kernels")
    void everyMixOfColumnsAndSingleValuesIsTakenRowByRow(Kernel kernel) {
        for (int spread = 0; spread < 1 << kernel.arity(); spread++) {
            double[][] columns = new double[kernel.arity()][];
            for (int j = 0; j < columns.length; j++) {
                int first = j;
                int rows = (spread >> j & 1) == 1 ? 1 : ROWS;
                columns[j] = IntStream.range(0, rows)
                        .mapToDouble(i -> (first + 2 * i) % 9 + 1)
                        .toArray();
            }
            double[] result = new double[ROWS];
            kernel.apply(columns, 0, ROWS, result);
            double[] expected = IntStream.range(0, ROWS)
                    .mapToDouble(row -> weighed(columns, row))
                    .toArray();
            assertArrayEquals(expected, result);
        }
    }

    @ParameterizedTest
    @MethodSource("kernels")
    void onlyTheRowsAskedForAreFilled(Kernel kernel) {
        double[][] columns = new double[kernel.arity()][];
        double[] row = new double[kernel.arity()];
        for (int j = 0; j < columns.length; j++) {
            columns[j] = new double[] {1, 2, 3, 4, 5};
            row[j] = 3;
        }
        double[] result = {-1, -1, -1, -1, -1};
        kernel.apply(columns, 2, 4, result);
        assertArrayEquals(new double[] {-1, -1, weighed(columns, 2), weighed(columns, 3), -1}, result);
        assertEquals(result[2], kernel.at(row));
    }
}
