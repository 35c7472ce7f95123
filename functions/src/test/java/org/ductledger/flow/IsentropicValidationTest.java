package org.ductledger.flow;

import static org.ductledger.exact.FortyDigits.pow;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.Map;
import java.util.SplittableRandom;
import java.util.function.BinaryOperator;
import java.util.stream.Stream;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Sensitivity;
import org.ductledger.exact.FortyDigits;
import org.ductledger.flow.PublishedTable.Answer;
import org.ductledger.flow.PublishedTable.Row;
import org.hipparchus.dfp.Dfp;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Against the tables of NACA Report 1135 and of a data book of their kind, and against the published equations in 40
 * digits. The columns {@code source} and {@code provenance} of the table say which values were read and which are from
 * memory.
 */
class IsentropicValidationTest {
    private static final int POINTS = 1500;

    private static final Map<String, String> COLUMNS = Map.of(
            "p/pt", "p_over_p0",
            "p*/pt", "p_over_p0",
            "T/Tt", "t_over_t0",
            "T*/Tt", "t_over_t0",
            "rho/rhot", "rho_over_rho0",
            "rho*/rhot", "rho_over_rho0",
            "A/A*", "area_ratio",
            "V/a*", "v_over_astar",
            "q/pt", "q_over_p0",
            "mu_deg", "mach_angle");

    @Test
    void everyIsentropicColumnOfNaca1135IsMet() {
        PublishedTable table = PublishedTable.read("isentropic_naca1135.csv");
        assertEquals(
                Map.of("checked", (int) table.rows().count()),
                table.check(row ->
                        Answer.of(ofTable(row, entry(COLUMNS.getOrDefault(row.quantity(), "no function"))))));
    }

    private static FunctionEntry entry(String name) {
        return StandardCatalogue.get().find(name).orElseThrow();
    }

    /** The value at the decimal numbers of the table: their doubles' own value and what the decimals have beyond. */
    private static double ofTable(Row row, FunctionEntry entry) {
        boolean sonic = row.quantity().contains("*/");
        String[] decimals = {sonic ? "1" : row.decimal("M"), row.decimal("gamma")};
        double[] doubles = Arrays.stream(decimals)
                .limit(entry.arguments().size())
                .mapToDouble(Double::parseDouble)
                .toArray();
        double value = entry.kernel().at(doubles);
        for (int i = 0; i < doubles.length; i++) {
            double beyond = new BigDecimal(decimals[i])
                    .subtract(new BigDecimal(doubles[i]))
                    .doubleValue();
            if (beyond != 0 && entry.sensitivities().get(i) instanceof Sensitivity.Exact exact) {
                value += beyond * exact.derivative().at(doubles);
            }
        }
        return value;
    }

    /**
     * A function and its equation.
     *
     * @param peak the Mach number at which it turns; 0 where it does not
     */
    private record Case(String function, double peak, BinaryOperator<Dfp> equation) {
        @Override
        public String toString() {
            return function;
        }
    }

    private static Dfp sum(Dfp m, Dfp g) {
        return g.subtract(1).divide(2).multiply(m).multiply(m).add(1);
    }

    private static Dfp sonic(Dfp m, Dfp g) {
        return sum(m, g).divide(g.add(1).divide(2));
    }

    private static Dfp pressure(Dfp base, Dfp g) {
        return pow(base, g.divide(g.subtract(1)).negate());
    }

    private static Dfp dynamic(Dfp m, Dfp g) {
        return m.multiply(m).multiply(g).divide(2);
    }

    private static Dfp density(Dfp base, Dfp g) {
        return pow(base, g.subtract(1).reciprocal().negate());
    }

    private static Dfp area(Dfp m, Dfp g) {
        return pow(sonic(m, g), g.add(1).divide(g.subtract(1).multiply(2))).divide(m);
    }

    private static Dfp massFlow(Dfp m, Dfp g) {
        Dfp exponent = g.add(1).divide(g.subtract(1).multiply(2)).negate();
        return g.sqrt().multiply(m).multiply(pow(sum(m, g), exponent));
    }

    private static Dfp impulse(Dfp m, Dfp g) {
        Dfp root = sum(m, g).multiply(g.add(1)).multiply(2).sqrt();
        return g.multiply(m).multiply(m).add(1).divide(m.multiply(root));
    }

    // spotless:off
    static Stream<Case> cases() {
        return Stream.of(
                new Case("t_over_t0", 0, (m, g) -> sum(m, g).reciprocal()),
                new Case("p_over_p0", 0, (m, g) -> pressure(sum(m, g), g)),
                new Case("rho_over_rho0", 0, (m, g) -> density(sum(m, g), g)),
                new Case("a_over_a0", 0, (m, g) -> sum(m, g).sqrt().reciprocal()),
                new Case("t_over_tstar", 0, (m, g) -> sonic(m, g).reciprocal()),
                new Case("p_over_pstar", 0, (m, g) -> pressure(sonic(m, g), g)),
                new Case("rho_over_rhostar", 0, (m, g) -> density(sonic(m, g), g)),
                new Case("v_over_astar", 0, (m, g) -> m.divide(sonic(m, g).sqrt())),
                new Case("v_over_vmax", 0, (m, g) -> sum(m, g).reciprocal().negate().add(1).sqrt()),
                new Case("area_ratio", 1, IsentropicValidationTest::area),
                new Case("q_over_p0", Math.sqrt(2), (m, g) -> dynamic(m, g).multiply(pressure(sum(m, g), g))),
                new Case("q_over_p", 0, IsentropicValidationTest::dynamic),
                new Case("impact_pressure_over_p", 0, (m, g) -> pressure(sum(m, g), g).reciprocal().subtract(1)),
                new Case("mass_flow_number", 1, IsentropicValidationTest::massFlow),
                new Case("mass_flow_number_static", 0, (m, g) -> m.multiply(g.multiply(sum(m, g)).sqrt())),
                new Case("impulse_over_impulsestar", 1, IsentropicValidationTest::impulse));
    }
    // spotless:on

    @ParameterizedTest
    @MethodSource("cases")
    void equationsAreMetWithinTheirCondition(Case one) {
        SplittableRandom random = new SplittableRandom(one.function().hashCode());
        FunctionEntry entry = entry(one.function());
        for (int i = 0; i < POINTS; i++) {
            double mach = drawnMach(random);
            double gamma = drawnGamma(random);
            Dfp exact = one.equation().apply(FortyDigits.of(mach), FortyDigits.of(gamma));
            if (isOrdinary(exact)) {
                double condition = Math.abs(mach * slope(one, mach, gamma) / exact.toDouble());
                double error = FortyDigits.ulps(entry.kernel().at(mach, gamma), exact) / (1 + condition);
                assertTrue(error <= 4, () -> one + " at " + mach + ", " + gamma + ": " + error);
            }
        }
    }

    static Stream<Case> turnedCases() {
        return cases().filter(one ->
                !one.function().endsWith("star") || one.function().matches("v_.*|impulse_.*"));
    }

    /** The inverse's error is told by the equation at the Mach number that it gives. */
    @ParameterizedTest
    @MethodSource("turnedCases")
    void inversesMeetTheEquationsWithinTheirCondition(Case one) {
        SplittableRandom random = new SplittableRandom(-one.function().hashCode());
        FunctionEntry inverse = entry("mach_from_" + one.function());
        for (int i = 0; i < POINTS; i++) {
            double drawn = drawnMach(random);
            double gamma = drawnGamma(random);
            double given = entry(one.function()).kernel().at(drawn, gamma);
            if (isOrdinary(FortyDigits.of(given))
                    && inverse.arguments().get(0).interval().contains(given)) {
                double mach = one.peak() == 0
                        ? inverse.kernel().at(given, gamma)
                        : inverse.kernel().at(given, gamma, drawn < one.peak() ? 0 : 1);
                double error = errorOverCondition(one, mach, given, gamma);
                assertTrue(
                        error <= 4,
                        () -> "mach_from_" + one + " of " + given + ", " + gamma + ", drawn " + drawn + ": " + mach
                                + ", error " + error);
            }
        }
    }

    /** In ulp, over 1 + condition; 0 where the equation does not tell M apart, at the peak and at rest. */
    private static double errorOverCondition(Case one, double mach, double given, double gamma) {
        double slope = mach > 0 ? slope(one, mach, gamma) : 0;
        if (slope == 0) {
            return 0;
        }
        double excess = one.equation()
                .apply(FortyDigits.of(mach), FortyDigits.of(gamma))
                .subtract(FortyDigits.of(given))
                .toDouble();
        return Math.abs(excess / slope) / Math.ulp(mach) / (1 + Math.abs(given / (mach * slope)));
    }

    private static double drawnMach(SplittableRandom random) {
        return switch (random.nextInt(4)) {
            case 0 -> 1 + (random.nextBoolean() ? 1 : -1) * StrictMath.pow(10, -12 + 11 * random.nextDouble());
            case 1 -> StrictMath.pow(10, -8 + 12 * random.nextDouble());
            case 2 -> Math.sqrt(2) * (1 + (random.nextDouble() - 0.5) * StrictMath.pow(10, -8 * random.nextDouble()));
            default -> 5 * random.nextDouble();
        };
    }

    private static double drawnGamma(SplittableRandom random) {
        return switch (random.nextInt(4)) {
            case 0 -> 1 + StrictMath.pow(10, -6 + 7.9 * random.nextDouble());
            case 1 -> 1.4;
            default -> 1.01 + 0.7 * random.nextDouble();
        };
    }

    private static boolean isOrdinary(Dfp x) {
        double nearest = Math.abs(x.toDouble());
        return nearest > 1e-280 && nearest < 1e280;
    }

    private static double slope(Case one, double mach, double gamma) {
        Dfp m = FortyDigits.of(mach);
        Dfp step = m.multiply(FortyDigits.of(0x1p-70));
        return one.equation()
                .apply(m.add(step), FortyDigits.of(gamma))
                .subtract(one.equation().apply(m.subtract(step), FortyDigits.of(gamma)))
                .divide(step.multiply(2))
                .toDouble();
    }
}
