package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import org.ductledger.ledger.Call;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Given;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.LedgerRefusedException;
import org.ductledger.ledger.Outcome;
import org.junit.jupiter.api.Test;

class ConversionsTest {
    @Test
    void areaAndDiameterInvertEachOther() {
        for (double d = 1e-4; d < 1e3; d *= 1.7) {
            assertEquals(d, Conversions.diameterFromArea(Conversions.areaFromDiameter(d)), 2 * Math.ulp(d));
        }
    }

    @Test
    void aBackPressureAboveTheSupplyIsRefusedInWords() throws LedgerRefusedException {
        Call call = Call.of(
                "ratio",
                "pb_over_p0_from_pb",
                Map.of("pb", Given.number(8, "bar"), "p0", Given.numbers(new double[] {7, 9}, "bar")));
        Outcome outcome =
                new Evaluator(StandardCatalogue.get()).evaluate(Ledger.of(call)).get(0);
        assertEquals(1, outcome.faults().size());
        assertTrue(
                outcome.faults()
                        .get(0)
                        .detail()
                        .startsWith("pb must be at most 700000 Pa (the stagnation pressure p0)"),
                outcome.faults().get(0).detail());
        assertEquals(8.0 / 9, outcome.numbers()[1], 1e-16);
    }
}
