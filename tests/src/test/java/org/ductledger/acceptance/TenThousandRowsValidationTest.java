package org.ductledger.acceptance;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.ductledger.server.Main;
import org.hipparchus.analysis.UnivariateFunction;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * A table of real size through {@code evaluate --csv}, each value against a general-purpose root finder (Hipparchus'
 * bracketing Brent solver) on the textbook's area relation (NACA Report 1135, eq. (80)).
 */
final class TenThousandRowsValidationTest {
    private static final int ROWS = 10_000;

    private record Row(double areaRatio, double gamma, String branch) {
        /** A/A* as a textbook writes it, in logarithms, against which the solver closes the bracket. */
        double mach() {
            double exponent = (gamma + 1) / (2 * (gamma - 1));
            UnivariateFunction residual =
                    mach -> exponent * Math.log(2 / (gamma + 1) * (1 + (gamma - 1) / 2 * mach * mach))
                            - Math.log(mach)
                            - Math.log(areaRatio);
            boolean subsonic = branch.equals("subsonic");
            return new BracketingNthOrderBrentSolver(1e-15, 1e-15, 5)
                    .solve(1000, residual, subsonic ? 1e-6 : 1, subsonic ? 1 : 1000);
        }
    }

    @Test
    void tenThousandAreaRatiosAgreeWithAnIndependentSolver(@TempDir Path folder) throws IOException {
        List<Row> rows = drawn();
        Path table = folder.resolve("areas.csv");
        StringBuilder csv = new StringBuilder("area_ratio,gamma,branch\n");
        for (Row row : rows) {
            csv.append(row.areaRatio)
                    .append(',')
                    .append(row.gamma)
                    .append(',')
                    .append(row.branch)
                    .append('\n');
        }
        Files.writeString(table, csv);

        List<String> answered = evaluate("mach_from_area_ratio", "--csv", table.toString());

        assertEquals("area_ratio,gamma,branch,mach_from_area_ratio,fault", answered.get(0));
        assertEquals(ROWS + 1, answered.size());
        for (int i = 0; i < ROWS; i++) {
            double mach = Double.parseDouble(answered.get(i + 1).split(",", -1)[3]);
            double expected = rows.get(i).mach();
            // The textbook form keeps about 1e-16 of ln(A/A*), which near the throat is magnified by 1/|M^2 - 1|.
            double allowed = 1e-14 * (1 + 1 / Math.abs(expected * expected - 1)) * expected;
            assertEquals(expected, mach, allowed, rows.get(i)::toString);
        }
    }

    private static List<Row> drawn() {
        Random random = new Random(20_260_801L);
        List<Row> rows = new ArrayList<>();
        for (int i = 0; i < ROWS; i++) {
            double areaRatio = 1 + Math.exp(Math.log(1e-4) + random.nextDouble() * Math.log(1e6));
            rows.add(new Row(areaRatio, 1.05 + 0.62 * random.nextDouble(), i % 2 == 0 ? "subsonic" : "supersonic"));
        }
        return rows;
    }

    private static List<String> evaluate(String... arguments) {
        List<String> all = new ArrayList<>(List.of("evaluate"));
        all.addAll(List.of(arguments));
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int code = Main.run(
                new ByteArrayInputStream(new byte[0]),
                new PrintStream(out, true, StandardCharsets.UTF_8),
                new PrintStream(err, true, StandardCharsets.UTF_8),
                all.toArray(String[]::new));
        assertEquals(0, code, err.toString(StandardCharsets.UTF_8));
        return out.toString(StandardCharsets.UTF_8).lines().toList();
    }
}
