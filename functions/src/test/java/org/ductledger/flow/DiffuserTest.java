package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class DiffuserTest {
    @Test
    void atMachOneNothingMayContractAndNothingIsLost() {
        assertEquals(1, Diffuser.startThroatRatio(1, 1.4));
        assertEquals(1, Diffuser.selfStartContraction(1, 1.4));
        assertEquals(1, Isentropic.areaRatio(1, 1.4));
        assertEquals(1, Diffuser.pitotInletRecovery(1, 1.4));
        assertEquals(1, Diffuser.pitotInletRecovery(0.3, 1.4));
    }

    @Test
    void theSelfStartingContractionIsTheIsentropicOneLessTheShocksLoss() {
        for (double mach = 1.05; mach < 8; mach += 0.05) {
            double loss = NormalShock.p02OverP01(mach, 1.4);
            double contraction = Isentropic.areaRatio(mach, 1.4) * loss;
            assertEquals(contraction, Diffuser.selfStartContraction(mach, 1.4), 1e-14);
        }
    }

    @Test
    void theSelfStartingContractionGoesToTheLimitOfStrongShocks() {
        double mach2 = Math.sqrt(1 / 7.0);
        double limit = Math.pow((2 + 0.4 / 7) / 2.4, 3) / mach2;
        assertEquals(limit, Diffuser.selfStartContraction(1e9, 1.4), 1e-14);
        double last = 1;
        for (double mach = 1.01; mach < 50; mach *= 1.01) {
            double next = Diffuser.selfStartContraction(mach, 1.4);
            assertTrue(next > last && next < limit, "at " + mach);
            last = next;
        }
    }

    @Test
    void aLossOfAllImpactPressureRecoversNothing() {
        for (double mach : new double[] {1e-3, 0.2, 0.9, 1.1, 3}) {
            double p = Isentropic.pOverP0(mach, 1.4);
            assertEquals(0, Diffuser.pRecovery(mach, p, 1.4), 1e-15 + 1e-16 / (mach * mach));
            assertEquals(1, Diffuser.pRecovery(mach, 1, 1.4));
        }
    }
}
