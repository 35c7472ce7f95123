package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.ledger.Call;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Fault;
import org.ductledger.ledger.Given;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.LedgerRefusedException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class NormalShockTest {
    @ParameterizedTest
    @ValueSource(doubles = {1.05, 1.2, 1.4, 1.6666666666666667, 3})
    void aShockOfNoStrengthChangesNothing(double gamma) {
        assertEquals(1, NormalShock.mach2(1, gamma));
        assertEquals(1, NormalShock.p2OverP1(1, gamma));
        assertEquals(1, NormalShock.t2OverT1(1, gamma));
        assertEquals(1, NormalShock.rho2OverRho1(1, gamma));
        assertEquals(1, NormalShock.p02OverP01(1, gamma));
        assertEquals(0, ShockEntropy.rise(1, gamma));
        assertEquals(Pitot.sonicRatio(gamma), NormalShock.p02OverP1(1, gamma), 4e-16 * Pitot.sonicRatio(gamma));
    }

    /** Common practice: of a weak shock (s2-s1)/R = 2 gamma/(3 (gamma+1)^2) (M1^2-1)^3. */
    @ParameterizedTest
    @ValueSource(doubles = {1.05, 1.4, 1.6666666666666667})
    void theEntropyOfAWeakShockRisesWithTheCubeOfItsStrength(double gamma) {
        for (double strength = 1e-15; strength < 1e-8; strength *= 7) {
            double mach1 = 1 + 0.5 * strength;
            double x = (mach1 - 1) * (mach1 + 1);
            double cubic = 2 * gamma / (3 * (gamma + 1) * (gamma + 1)) * x * x * x;
            assertEquals(cubic, ShockEntropy.rise(mach1, gamma), cubic * (1e-14 + 3 * x));
        }
    }

    @Test
    void anInfinitelyStrongShockCompressesToItsLimit() {
        assertEquals(6, NormalShock.rho2OverRho1(1e200, 1.4), 1e-14);
        assertEquals(Math.sqrt(1 / 7.0), NormalShock.mach2(1e200, 1.4), 1e-15);
        assertEquals(0, NormalShock.p02OverP01(1e200, 1.4));
    }

    /** Of huge Mach numbers p02/p01 is c^-1 (b c M1^2)^(-1/(gamma-1)); the two ways meet where they change over. */
    @Test
    void theStagnationPressureLossGoesOnWhereSquaresOverflow() {
        double below = NormalShock.p02OverP01(NormalShock.HUGE_MACH, 3);
        double above = NormalShock.p02OverP01(Math.nextUp(NormalShock.HUGE_MACH), 3);
        assertEquals(1, above / below, 1e-14);
        double mach1 = NormalShockInverse.fromP02OverP01(0.5 * below, 3);
        assertEquals(0.5, NormalShock.p02OverP01(mach1, 3) / below, 1e-14);
    }

    @ParameterizedTest
    @ValueSource(doubles = {1.05, 1.2, 1.4, 1.6666666666666667, 3})
    void theBranchesOfThePitotMeetAtTheSonicRatio(double gamma) {
        double sonic = Pitot.sonicRatio(gamma);
        assertEquals(1, Pitot.mach(Math.nextDown(sonic), gamma), 4e-16);
        assertEquals(1, Pitot.mach(sonic, gamma), 4e-16);
        double before = 0;
        for (double ratio = 1.01; ratio < 40; ratio *= 1.01) {
            double mach = Pitot.mach(ratio, gamma);
            assertTrue(mach > before);
            before = mach;
        }
    }

    private static Fault fault(String call, String argument, double ratio) throws LedgerRefusedException {
        Evaluator evaluator = new Evaluator(StandardCatalogue.get());
        Map<String, Given> with = Map.of(argument, Given.number(ratio), "gamma", Given.number(1.4));
        List<Fault> faults =
                evaluator.evaluate(Ledger.of(Call.of("x", call, with))).get(0).faults();
        assertEquals(1, faults.size(), call);
        return faults.get(0);
    }

    @ParameterizedTest
    @CsvSource({
        "mach1_from_shock_mach2, mach2, 0.377, greater than 0.377964473009",
        "mach1_from_shock_rho2_over_rho1, rho2_over_rho1, 6.1, less than 6",
        "mach1_from_shock_p02_over_p1, p02_over_p1, 1.5, at least 1.89292915874"
    })
    void aRatioBeyondItsLimitIsExplained(String call, String argument, double ratio, String limit)
            throws LedgerRefusedException {
        Fault fault = fault(call, argument, ratio);
        assertEquals(FaultKind.NO_SOLUTION, fault.kind());
        assertEquals(argument, fault.argument());
        assertTrue(fault.detail().contains(limit), fault.detail());
    }
}
