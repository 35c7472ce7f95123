package org.ductledger.numeric;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import java.util.stream.Stream;
import org.ductledger.exact.FortyDigits;
import org.hipparchus.dfp.Dfp;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class StagnationPowerTest {
    private static final StagnationPower PRESSURE = new StagnationPower(-1, -1, false, Ending.NOTHING);
    private static final StagnationPower DENSITY = new StagnationPower(0, -1, false, Ending.NOTHING);
    private static final StagnationPower SONIC_PRESSURE = new StagnationPower(-1, -1, true, Ending.NOTHING);
    private static final StagnationPower AREA = new StagnationPower(0.5, 1, true, Ending.OVER_MACH);
    private static final StagnationPower MASS_FLOW = new StagnationPower(-0.5, -1, false, Ending.MACH_ROOT_GAMMA);
    private static final StagnationPower DYNAMIC = new StagnationPower(-1, -1, false, Ending.HALF_GAMMA_MACH_SQUARE);

    static Stream<StagnationPower> powers() {
        return Stream.of(PRESSURE, DENSITY, SONIC_PRESSURE, AREA, MASS_FLOW, DYNAMIC);
    }

    /** The limits were measured over a hundred times as many points. */
    @ParameterizedTest
    @MethodSource("powers")
    void staysWithinTwoUnitsDownToGamma1001(StagnationPower power) {
        double limit = power.ending() == Ending.NOTHING ? 0.85 : power.ending() == Ending.OVER_MACH ? 1.5 : 2.6;
        assertTrue(worst(power, 1.001, 1500) <= limit, () -> power + ": " + worst(power, 1.001, 1500));
    }

    @ParameterizedTest
    @MethodSource("powers")
    void staysWithinFiveUnitsForAnyGammaAbove1(StagnationPower power) {
        assertTrue(worst(power, 1, 700) <= 5, () -> power + ": " + worst(power, 1, 700));
    }

    private static double worst(StagnationPower power, double leastGamma, int points) {
        Random random = new Random(7);
        double worst = 0;
        for (int i = 0; i < points; i++) {
            double rise = Math.pow(10, -15 + 17 * random.nextDouble());
            double gamma = leastGamma == 1 ? 1 + rise : leastGamma + 0.7 * random.nextDouble();
            double mach = i % 2 == 0 ? 6 * random.nextDouble() : Math.pow(10, -5 + 8 * random.nextDouble());
            Dfp exact = exact(power, mach, Math.min(gamma, 100));
            double nearest = exact.toDouble();
            if (nearest > 1e-300 && nearest < 1e300) {
                worst = Math.max(worst, FortyDigits.ulps(power.at(mach, Math.min(gamma, 100)), exact));
            }
        }
        return worst;
    }

    private static Dfp exact(StagnationPower power, double mach, double gamma) {
        Dfp m = FortyDigits.of(mach);
        Dfp g = FortyDigits.of(gamma);
        Dfp base = g.subtract(1).divide(2).multiply(m).multiply(m).add(1);
        Dfp sonic = power.overSonic() ? g.add(1).divide(2) : FortyDigits.of(1);
        Dfp exponent = FortyDigits.of(power.b()).divide(g.subtract(1)).add(FortyDigits.of(power.a()));
        Dfp value = FortyDigits.pow(base.divide(sonic), exponent);
        return switch (power.ending()) {
            case NOTHING -> value;
            case OVER_MACH -> value.divide(m);
            case MACH_ROOT_GAMMA -> value.multiply(m).multiply(g.sqrt());
            case HALF_GAMMA_MACH_SQUARE ->
                value.multiply(m).multiply(m).multiply(g).divide(2);
        };
    }

    @ParameterizedTest
    @MethodSource("powers")
    void columnHasTheBitsOfTheOneValue(StagnationPower power) {
        double[] machs = drawn(5000, -8, 4);
        double[] gammas = drawn(5000, -4, -0.1);
        machs[17] = 0;
        machs[300] = 0x1p600;
        machs[4000] = 1;
        for (int i = 0; i < gammas.length; i++) {
            gammas[i] += 1;
        }
        gammas[2600] = 1 + 0x1p-40;
        assertSame(power, machs, gammas);
        assertSame(power, machs, new double[] {1.4});
        assertSame(power, new double[] {2.5}, gammas);
        assertSame(power, machs, new double[] {1.0001});
    }

    private static void assertSame(StagnationPower power, double[] machs, double[] gammas) {
        int rows = Math.max(machs.length, gammas.length);
        double[] expected = new double[rows];
        for (int i = 0; i < rows; i++) {
            expected[i] = power.at(machs[machs.length == 1 ? 0 : i], gammas[gammas.length == 1 ? 0 : i]);
        }
        double[] result = new double[rows];
        PowerColumn column = new PowerColumn(power);
        column.apply(new double[][] {machs, gammas}, 0, 7, result);
        column.apply(new double[][] {machs, gammas}, 7, 107, result);
        column.apply(new double[][] {machs, gammas}, 107, rows, result);
        assertArrayEquals(expected, result);
    }

    private static double[] drawn(int n, double least, double most) {
        Random random = new Random(n);
        return random.doubles(n, least, most).map(x -> Math.pow(10, x)).toArray();
    }

    @Test
    void isExactAtRestAndAtTheThroat() {
        for (double gamma : new double[] {1 + 0x1p-52, 1.0001, 1.001, 1.05, 1.2, 1.3, 1.4, 5.0 / 3, 2, 7, 100}) {
            assertEquals(1, PRESSURE.at(0, gamma));
            assertEquals(1, DENSITY.at(0, gamma));
            assertEquals(0, MASS_FLOW.at(0, gamma));
            assertEquals(Double.POSITIVE_INFINITY, AREA.at(0, gamma));
            assertEquals(1, AREA.at(1, gamma));
            assertEquals(1, SONIC_PRESSURE.at(1, gamma));
        }
    }

    @Test
    void areaIsNeverBelowItsLeast() {
        for (double distance = 0x1p-53; distance < 1e-6; distance *= 1.37) {
            for (double gamma = 1.02; gamma < 2; gamma += 0.013) {
                assertTrue(AREA.at(1 + distance, gamma) >= 1);
                assertTrue(AREA.at(1 - distance, gamma) >= 1);
            }
        }
    }

    @Test
    void goesOnWhereTheSquareOfTheMachNumberOverflows() {
        for (double mach : new double[] {0x1p479, 0x1p481, 1e200, 1e300, Double.MAX_VALUE}) {
            for (StagnationPower power : new StagnationPower[] {DENSITY, AREA, MASS_FLOW, DYNAMIC}) {
                double error = FortyDigits.ulps(power.at(mach, 100), exact(power, mach, 100));
                assertTrue(error <= 2.6, () -> power + " at " + mach + ": " + error);
            }
        }
        assertEquals(0, PRESSURE.at(1e300, 1.4));
        assertEquals(0, MASS_FLOW.at(1e300, 1.0001));
        assertEquals(Double.POSITIVE_INFINITY, AREA.at(1e300, 1.4));
        assertEquals(Double.POSITIVE_INFINITY, AREA.at(1e300, 1 + 0x1p-52));
    }
}
