package org.ductledger.reference;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.ductledger.support.Service;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/**
 * The tables of NACA Report 1135 (Ames Research Staff, 1953) and of handbooks that restate them, asked over the
 * socket. Each row of the file names its source; those that are recalled say {@code memory}.
 */
final class Naca1135ValidationTest {
    /** How a column of the report is asked for: the function, its argument, and whether the report has the reciprocal. */
    private record Asked(String function, String argument, boolean reciprocal) {}

    private static final Map<String, Asked> COLUMNS = Map.ofEntries(
            Map.entry("p/pt", new Asked("p_over_p0", "mach", false)),
            Map.entry("rho/rhot", new Asked("rho_over_rho0", "mach", false)),
            Map.entry("T/Tt", new Asked("t_over_t0", "mach", false)),
            Map.entry("q/pt", new Asked("q_over_p0", "mach", false)),
            Map.entry("A/A*", new Asked("area_ratio", "mach", false)),
            Map.entry("V/a*", new Asked("v_over_astar", "mach", false)),
            Map.entry("nu_deg", new Asked("prandtl_meyer_angle", "mach", false)),
            Map.entry("mu_deg", new Asked("mach_angle", "mach", false)),
            Map.entry("M2", new Asked("shock_mach2", "mach1", false)),
            Map.entry("p2/p1", new Asked("shock_p2_over_p1", "mach1", false)),
            Map.entry("rho2/rho1", new Asked("shock_rho2_over_rho1", "mach1", false)),
            Map.entry("T2/T1", new Asked("shock_t2_over_t1", "mach1", false)),
            Map.entry("pt2/pt1", new Asked("shock_p02_over_p01", "mach1", false)),
            // The report prints p1/pt2, the reciprocal of the pitot ratio.
            Map.entry("p1/pt2", new Asked("shock_p02_over_p1", "mach1", true)),
            Map.entry("T*/Tt", new Asked("t_over_t0", "mach", false)),
            Map.entry("p*/pt", new Asked("p_over_p0", "mach", false)),
            Map.entry("rho*/rhot", new Asked("rho_over_rho0", "mach", false)));

    /** Rows that no function answers, with the reason. */
    private static final Map<String, String> NOT_ANSWERED = Map.of(
            "beta", "sqrt|1 - M^2| is arithmetic of one step, and no function of the catalogue",
            "rho2/rho1 limit", "the limit of an infinite Mach number, which no double is");

    private static final List<PublishedRow> ROWS = PublishedRow.of("naca1135.csv");

    private static Service service;

    @BeforeAll
    static void start() {
        service = Service.start();
    }

    @AfterAll
    static void stop() {
        service.close();
    }

    @TestFactory
    Stream<DynamicTest> everyColumn() {
        return COLUMNS.entrySet().stream()
                .map(column ->
                        DynamicTest.dynamicTest(column.getKey(), () -> check(column.getKey(), column.getValue())));
    }

    private static void check(String quantity, Asked asked) {
        List<PublishedRow> rows =
                ROWS.stream().filter(row -> row.quantity().equals(quantity)).toList();
        assertTrue(!rows.isEmpty(), "the file has no row of " + quantity);
        List<Double> machs = new ArrayList<>();
        List<Double> gammas = new ArrayList<>();
        for (PublishedRow row : rows) {
            machs.add(row.hasInput("M") ? row.input("M") : 1.0);
            gammas.add(row.input("gamma"));
        }
        Map<String, List<Double>> arguments = asked.function().equals("mach_angle")
                ? Map.of(asked.argument(), machs)
                : Map.of(asked.argument(), machs, "gamma", gammas);
        double[] values = service.values(asked.function(), arguments);
        for (int i = 0; i < values.length; i++) {
            rows.get(i).check(asked.reciprocal() ? 1 / values[i] : values[i]);
        }
    }

    @Test
    void everyRowIsAskedOrNamedWithItsReason() {
        for (PublishedRow row : ROWS) {
            assertTrue(
                    COLUMNS.containsKey(row.quantity()) || NOT_ANSWERED.containsKey(row.quantity()),
                    () -> row.id() + " (" + row.quantity() + ") is neither asked nor named");
        }
    }
}
