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
import org.ductledger.ledger.Outcome;
import org.junit.jupiter.api.Test;

class GasesTest {
    private static final double STEP = 1e-3;

    @Test
    void cpLessTheGasConstantIsCv() {
        for (int gas = 0; gas < GasTable.NAMES.length; gas++) {
            double cp = Gases.cp(gas, 500);
            double cv = cp - Gases.gasConstant(gas);
            assertEquals(cp / cv, Gases.gamma(gas, 500), 1e-14);
        }
    }

    @Test
    void theRangesOfAGasMeet() {
        for (double[][][] table : List.of(GasTable.HEAT, GasTable.VISCOSITY)) {
            for (double[][] ranges : table) {
                for (int i = 1; i < ranges.length; i++) {
                    assertEquals(ranges[i - 1][1], ranges[i][0]);
                }
            }
        }
    }

    @Test
    void theFitsJoinWhereTheirRangesMeet() {
        for (int gas = 0; gas < GasTable.NAMES.length; gas++) {
            assertEquals(1, Gases.cp(gas, 1000) / Gases.cp(gas, Math.nextUp(1000)), 1e-4, GasTable.NAMES[gas]);
            double join = GasTable.VISCOSITY[gas][0][1];
            if (GasTable.VISCOSITY[gas].length > 1) {
                assertEquals(1, Gases.viscosity(gas, join) / Gases.viscosity(gas, Math.nextUp(join)), 2e-3);
            }
        }
    }

    @Test
    void eachSlopeIsTheLimitOfADifference() {
        for (int gas = 0; gas < GasTable.NAMES.length; gas++) {
            for (double t = 400.5; t < 1900; t += 150) {
                double cp = (Gases.cp(gas, t + STEP) - Gases.cp(gas, t - STEP)) / (2 * STEP);
                assertEquals(cp, Gases.cpByT(gas, t), 1e-6);
                double gamma = (Gases.gamma(gas, t + STEP) - Gases.gamma(gas, t - STEP)) / (2 * STEP);
                assertEquals(gamma, Gases.gammaByT(gas, t), 1e-11);
                double mu = (Gases.viscosity(gas, t + STEP) - Gases.viscosity(gas, t - STEP)) / (2 * STEP);
                assertEquals(mu, Gases.viscosityByT(gas, t), 1e-15);
            }
        }
    }

    @Test
    void aTemperatureOutsideTheFitIsRefusedInWords() throws LedgerRefusedException {
        Call call = Call.of(
                "cp", "gas_cp_at", Map.of("gas", Given.text("air"), "t", Given.numbers(new double[] {150, 300}, "K")));
        Outcome outcome =
                new Evaluator(StandardCatalogue.get()).evaluate(Ledger.of(call)).get(0);
        assertEquals(1, outcome.faults().size());
        Fault fault = outcome.faults().get(0);
        assertEquals(FaultKind.OUTSIDE_DOMAIN, fault.kind());
        assertTrue(fault.detail().startsWith("t must be at least 200 K (the range of"), fault.detail());
        assertEquals(1004.8, outcome.numbers()[1], 0.05);
    }
}
