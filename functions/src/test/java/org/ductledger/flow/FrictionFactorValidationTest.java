package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.ductledger.exact.FortyDigits;
import org.hipparchus.dfp.Dfp;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The Darcy friction factor against the equation of C. F. Colebrook (Journal of the Institution of Civil Engineers 11,
 * 1939) in 40 digits, and against what engineers remember of L. F. Moody's chart (1944) and of the laws it joins.
 */
class FrictionFactorValidationTest {
    /** 1/sqrt(f) + 2 log10((k/D)/3.7 + 2.51/(Re sqrt(f))). */
    private static Dfp residual(Dfp f, double reynolds, double roughness) {
        Dfp root = f.sqrt().reciprocal();
        Dfp sum = FortyDigits.of(roughness)
                .divide(FortyDigits.decimal("3.7"))
                .add(FortyDigits.decimal("2.51").multiply(root).divide(FortyDigits.of(reynolds)));
        return root.add(FortyDigits.log(sum).multiply(2).divide(FortyDigits.log(FortyDigits.of(10))));
    }

    @Test
    void colebrooksEquationChangesItsSignWithinFourUnitsOfTheLastPlace() {
        SplittableRandom random = new SplittableRandom(1939);
        Dfp width = FortyDigits.of(4 * 0x1p-52);
        for (int i = 0; i < 2000; i++) {
            double reynolds = 2300
                    * StrictMath.pow(10, random.nextInt(8) == 0 ? 40 * random.nextDouble() : 6 * random.nextDouble());
            double roughness = random.nextInt(4) == 0 ? 0 : 0.05 * StrictMath.pow(10, -6 * random.nextDouble());
            double got = FrictionFactor.darcy(reynolds, roughness);
            Dfp f = FortyDigits.of(got);
            Dfp below = residual(f.multiply(width.negate().add(1)), reynolds, roughness);
            Dfp above = residual(f.multiply(width.add(1)), reynolds, roughness);
            assertTrue(below.multiply(above).toDouble() < 0, () -> got + " at " + reynolds + ", " + roughness);
        }
    }

    /** From memory: readings of Moody's chart, to its two or three digits. */
    @ParameterizedTest
    @CsvSource({
        "1e4, 0, 0.0309, 0.0003",
        "1e5, 0, 0.0180, 0.0002",
        "1e6, 0, 0.0116, 0.0001",
        "1e5, 0.001, 0.0222, 0.0002",
        "1e6, 0.01, 0.0380, 0.0004",
        "1e8, 0.05, 0.0716, 0.0007",
        "1e8, 0.0001, 0.0120, 0.0001"
    })
    void readingsOfMoodysChartAreMet(double reynolds, double roughness, double read, double tolerance) {
        assertEquals(read, FrictionFactor.darcy(reynolds, roughness), tolerance);
    }

    /** The law of rough pipes, to which Colebrook's equation tends: 1/sqrt(f) = 2 log10(3.7 D/k). */
    @Test
    void farOutOnlyTheRoughnessCounts() {
        double f = FrictionFactor.darcy(1e14, 0.01);
        assertEquals(2 * Math.log10(370), 1 / Math.sqrt(f), 1e-9);
    }

    /** Common practice: laminar below 2300, and the turbulent value, the larger, through the range that is neither. */
    @Test
    void theTransitionTakesTheTurbulentValue() {
        double last = Math.nextDown(2300.0);
        assertEquals(64 / last, FrictionFactor.darcy(last, 0.03));
        assertEquals(64 / last, FrictionFactor.darcy(last, 0));
        for (double reynolds = 2300; reynolds <= 4000; reynolds += 50) {
            assertTrue(FrictionFactor.darcy(reynolds, 0) > 1.5 * 64 / reynolds);
        }
        assertTrue(FrictionFactor.darcy(2300, 0) > FrictionFactor.darcy(4000, 0));
    }

    @Test
    void theFactorFallsWithTheReynoldsNumberAndRisesWithTheRoughness() {
        for (double reynolds = 2300; reynolds < 1e9; reynolds *= 1.37) {
            for (double roughness = 0; roughness < 0.049; roughness += 0.0012) {
                double f = FrictionFactor.darcy(reynolds, roughness);
                assertTrue(FrictionFactor.darcy(reynolds * 1.01, roughness) < f);
                assertTrue(FrictionFactor.darcy(reynolds, roughness + 0.001) > f);
            }
        }
    }
}
