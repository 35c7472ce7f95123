package org.ductledger.acceptance;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.ductledger.catalogue.Catalogue;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.ledger.Given;

/** Input sets of {@code nozzle_sizing}, drawn from a fixed seed so that they reach every regime. */
final class DrawnNozzles {
    /** The regimes, in the words of {@code nozzle_regime}. */
    static final List<String> REGIMES = List.of(
            "unchoked",
            "first_critical",
            "shock_in_nozzle",
            "shock_at_exit",
            "overexpanded",
            "design",
            "underexpanded");

    private static final Catalogue CATALOGUE = StandardCatalogue.get();

    private final Random random;

    DrawnNozzles(long seed) {
        random = new Random(seed);
    }

    /** One input set whose back pressure makes this regime. */
    Map<String, Given.Values> of(String regime) {
        double gamma = between(1.08, 1.66);
        double exitMach = between(1.3, 4.5);
        double p0 = between(2e5, 4e6);
        double exitAreaRatio = kernel("area_ratio", exitMach, gamma);
        Map<String, Given.Values> inputs = new LinkedHashMap<>();
        put(inputs, "gamma", gamma);
        put(inputs, "gas_constant", between(180, 2100));
        put(inputs, "p0", p0);
        put(inputs, "t0", between(260, 900));
        put(inputs, "pb", p0 * backPressureRatio(regime, exitAreaRatio, gamma));
        if (random.nextBoolean()) {
            put(inputs, "mass_flow", between(0.01, 20));
        } else {
            put(inputs, "throat_diameter", between(0.003, 0.3));
        }
        if (random.nextBoolean()) {
            put(inputs, "exit_mach", exitMach);
        } else {
            put(inputs, "exit_pressure", p0 * kernel("p_over_p0", exitMach, gamma));
        }
        put(inputs, "inlet_area_ratio", between(1.5, 12));
        double[] x = {
            -between(0.2, 0.3),
            -between(0.1, 0.15),
            -between(0.02, 0.08),
            0,
            between(0.02, 0.05),
            between(0.1, 0.2),
            between(0.3, 0.6)
        };
        inputs.put("contour_x", (Given.Values) Given.numbers(x));
        inputs.put("contour_opening", (Given.Values)
                Given.numbers(between(0.5, 0.9), between(0.05, 0.4), between(0.1, 0.4), between(0.5, 0.9)));
        return inputs;
    }

    private double backPressureRatio(String regime, double exitAreaRatio, double gamma) {
        double first = kernel("nozzle_first_critical", exitAreaRatio, gamma);
        double second = kernel("nozzle_second_critical", exitAreaRatio, gamma);
        double third = kernel("nozzle_third_critical", exitAreaRatio, gamma);
        return switch (regime) {
            case "unchoked" -> first + (1 - first) * between(0.1, 0.9);
            case "first_critical" -> first;
            case "shock_in_nozzle" -> second + (first - second) * between(0.05, 0.95);
            case "shock_at_exit" -> second;
            case "overexpanded" -> third + (second - third) * between(0.1, 0.9);
            case "design" -> third;
            case "underexpanded" -> third * between(0.1, 0.9);
            default -> throw new IllegalArgumentException(regime);
        };
    }

    private double between(double low, double high) {
        return low + (high - low) * random.nextDouble();
    }

    private static void put(Map<String, Given.Values> inputs, String name, double value) {
        inputs.put(name, (Given.Values) Given.number(value));
    }

    private static double kernel(String name, double... row) {
        return CATALOGUE.find(name).orElseThrow().kernel().at(row);
    }
}
