package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import java.util.SplittableRandom;
import org.ductledger.exact.FortyDigits;
import org.ductledger.flow.PublishedTable.Answer;
import org.ductledger.flow.PublishedTable.Row;
import org.hipparchus.dfp.Dfp;
import org.junit.jupiter.api.Test;

/**
 * Against the U.S. Standard Atmosphere, 1976 (NOAA, NASA, USAF; public domain): its table I, its layer bases, and its
 * defining equations in 40 digits. The columns {@code source} and {@code provenance} of the table say which values were
 * read and which are from memory.
 */
class AtmosphereValidationTest {
    private static final double AIR = 0;
    private static final PublishedTable TABLE = PublishedTable.read("standard_atmosphere_1976.csv");
    private static final String[] LAPSE = {"-0.0065", "0", "0.001", "0.0028", "0", "-0.0028", "-0.002"};
    private static final int[] BASE = {0, 11_000, 20_000, 32_000, 47_000, 51_000, 71_000, 84_852};

    private static double geopotential(Row row) {
        return row.inputs().startsWith("H=") ? row.number("H") : Atmosphere.geopotentialFromGeometric(row.number("Z"));
    }

    private static double answer(Row row) {
        double h = geopotential(row);
        String quantity = row.quantity();
        return switch (quantity.substring(0, quantity.indexOf(' '))) {
            case "T" -> Atmosphere.t(h);
            case "p" -> Atmosphere.p(h);
            case "rho" -> Atmosphere.rho(h);
            case "a" -> Atmosphere.speedOfSound(h);
            case "mu" -> Gases.viscosity(AIR, Atmosphere.t(h));
            default -> throw new IllegalArgumentException(row.toString());
        };
    }

    @Test
    void everyRowOfTheTableIsMet() {
        assertEquals(Map.of("checked", 142), TABLE.check(row -> Answer.of(answer(row))));
    }

    @Test
    void everyRowHoldsToTheLastDigitsOfTheDefiningEquations() {
        TABLE.rows().forEach(row -> {
            Dfp exact = FortyDigits.decimal(row.exact());
            double condition = 1 + geopotential(row) * 0.0341632 / Atmosphere.t(geopotential(row));
            assertTrue(FortyDigits.ulps(answer(row), exact) <= 4 * condition, row::toString);
        });
    }

    @Test
    void theEquationsHoldInFortyDigitsBetweenTheRows() {
        SplittableRandom random = new SplittableRandom(1976);
        for (int i = 0; i < 3000; i++) {
            double h = i < 8 ? BASE[i] : random.nextDouble() * BASE[7];
            Dfp[] state = state(h);
            double condition = 1 + h * 0.0341632 / Atmosphere.t(h);
            assertTrue(FortyDigits.ulps(Atmosphere.t(h), state[0]) <= 4, () -> "T at " + h);
            assertTrue(FortyDigits.ulps(Atmosphere.p(h), state[1]) <= 4 * condition, () -> "p at " + h);
            Dfp gasConstant = FortyDigits.decimal("8314.32").divide(FortyDigits.decimal("28.9644"));
            Dfp rho = state[1].divide(gasConstant.multiply(state[0]));
            assertTrue(FortyDigits.ulps(Atmosphere.rho(h), rho) <= 4 * condition, () -> "rho at " + h);
            Dfp a = FortyDigits.decimal("1.4")
                    .multiply(gasConstant)
                    .multiply(state[0])
                    .sqrt();
            assertTrue(FortyDigits.ulps(Atmosphere.speedOfSound(h), a) <= 4, () -> "a at " + h);
        }
    }

    @Test
    void theBasePressuresAreTheRecursionOfTheStandard() {
        for (int i = 0; i < Atmosphere.BASE_P.length; i++) {
            assertEquals(state(BASE[i])[1].toDouble(), Atmosphere.BASE_P[i]);
        }
    }

    @Test
    void theGeopotentialAltitudeOfTheTopIsThatOf86Kilometres() {
        // Table I of the standard: Z = 86 000 m, H = 84 852 m (rounded there to whole metres).
        assertEquals(84_852, Atmosphere.geopotentialFromGeometric(86_000), 0.5);
        Dfp z = FortyDigits.of(12_345.678);
        Dfp r0 = FortyDigits.of(6_356_766);
        Dfp h = r0.multiply(z).divide(r0.add(z));
        assertTrue(FortyDigits.ulps(Atmosphere.geopotentialFromGeometric(12_345.678), h) <= 2);
    }

    /** Temperature and pressure from the defining equations, carried up through the layers. */
    private static Dfp[] state(double geopotential) {
        Dfp gradient = FortyDigits.decimal("9.80665")
                .multiply(FortyDigits.decimal("28.9644"))
                .divide(FortyDigits.decimal("8314.32"));
        Dfp h = FortyDigits.of(geopotential);
        Dfp t = FortyDigits.decimal("288.15");
        Dfp p = FortyDigits.decimal("101325");
        for (int i = 0; i < LAPSE.length; i++) {
            boolean inside = geopotential < BASE[i + 1] || i == LAPSE.length - 1;
            Dfp rise = (inside ? h : FortyDigits.of(BASE[i + 1])).subtract(FortyDigits.of(BASE[i]));
            Dfp lapse = FortyDigits.decimal(LAPSE[i]);
            Dfp next = t.add(lapse.multiply(rise));
            p = lapse.isZero()
                    ? p.multiply(
                            FortyDigits.exp(gradient.multiply(rise).divide(t).negate()))
                    : p.multiply(FortyDigits.pow(t.divide(next), gradient.divide(lapse)));
            t = next;
            if (inside) {
                break;
            }
        }
        return new Dfp[] {t, p};
    }
}
