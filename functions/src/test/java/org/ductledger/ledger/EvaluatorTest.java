package org.ductledger.ledger;

import static org.ductledger.ledger.Bench.edge;
import static org.ductledger.ledger.Bench.evaluate;
import static org.ductledger.ledger.Bench.inUnit;
import static org.ductledger.ledger.Bench.ref;
import static org.ductledger.ledger.Bench.signed;
import static org.ductledger.ledger.Bench.values;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class EvaluatorTest {
    private static final Given RIGHT = Given.text("right");

    @Test
    void aCallOfScalarsGivesOneRow() throws LedgerRefusedException {
        Outcome outcome = evaluate(signed("a", Given.number(3), Given.number(2), Given.text("left")));
        assertEquals(List.of(-6.0), values(outcome));
        assertEquals("a", outcome.id());
        assertEquals("m2", outcome.unit().symbol());
        assertTrue(outcome.isClean());
    }

    @Test
    void scalarsSpreadOverTheRowsOfTheColumns() throws LedgerRefusedException {
        Outcome outcome = evaluate(
                signed("a", Given.number(3), Given.numbers(1, 2, 3), Given.texts(List.of("left", "right", "left"))));
        assertEquals(List.of(-3.0, 6.0, -9.0), values(outcome));
    }

    @Test
    void aReferenceTakesTheColumnOfAnEarlierCall() throws LedgerRefusedException {
        Outcome outcome = evaluate(
                edge("e", Given.numbers(4, 9)), signed("a", ref("e"), Given.number(2), RIGHT), edge("root", ref("a")));
        assertEquals(List.of(2.0, Math.sqrt(6)), values(outcome));
    }

    @Test
    void aReferenceToOneValueSpreadsAsOneValue() throws LedgerRefusedException {
        Outcome outcome = evaluate(edge("e", Given.number(16)), signed("a", ref("e"), Given.numbers(1, 2, 3), RIGHT));
        assertEquals(List.of(4.0, 8.0, 12.0), values(outcome));
    }

    @Test
    void aColumnOfOneRowStaysAColumn() throws LedgerRefusedException {
        assertEquals(List.of(2.0), values(evaluate(edge("e", Given.numbers(4)))));
        LedgerRefusedException refused = assertThrows(
                LedgerRefusedException.class,
                () -> evaluate(edge("e", Given.numbers(4)), signed("a", ref("e"), Given.numbers(1, 2), RIGHT)));
        assertEquals(
                "columns of one call must have the same number of rows, got length with 1, other with 2",
                refused.getMessage());
    }

    @Test
    void wordsGoInAndOutByName() throws LedgerRefusedException {
        Outcome side = evaluate(Call.of("s", "side_of", Map.of("length", Given.numbers(0.5, 2))));
        assertEquals(List.of("left", "right"), ((Column.Texts) side.values()).values());
        Outcome area = evaluate(
                Call.of("s", "side_of", Map.of("length", Given.numbers(0.5, 2))),
                signed("a", Given.number(5), Given.number(2), ref("s")));
        assertEquals(List.of(-10.0, 10.0), values(area));
        assertThrows(IllegalStateException.class, side::numbers);
    }

    @Test
    void unitsAreTakenAndGivenAsWanted() throws LedgerRefusedException {
        Outcome outcome = evaluate(inUnit(signed("a", Given.number(30, "cm"), Given.number(1, "in"), RIGHT), "cm2"));
        assertEquals(76.2, outcome.numbers()[0], 1e-13);
        assertEquals("cm2", outcome.unit().symbol());
    }

    @Test
    void aReferenceCarriesTheCoherentValueWhateverTheUnitShown() throws LedgerRefusedException {
        List<Outcome> outcomes = Bench.EVALUATOR.evaluate(
                Ledger.of(inUnit(edge("e", Given.number(4)), "mm"), signed("a", ref("e"), Given.number(2), RIGHT)));
        assertEquals(List.of(2000.0), values(outcomes.get(0)));
        assertEquals(List.of(4.0), values(outcomes.get(1)));
    }

    @Test
    void temperaturesAreShiftedBothWays() throws LedgerRefusedException {
        Call call = Call.of("w", "warmer_by_half", Map.of("t", Given.number(26.85, "degC")));
        assertEquals(350.33, evaluate(inUnit(call, "degF")).numbers()[0], 1e-10);
    }

    @Test
    void onlyWhatIsWantedIsAnswered() throws LedgerRefusedException {
        List<Call> calls =
                List.of(edge("e", Given.number(4)), edge("f", Given.number(9)), signed("a", ref("f"), ref("e"), RIGHT));
        List<Outcome> outcomes = Bench.EVALUATOR.evaluate(new Ledger(calls, List.of("a", "e", "a")));
        assertEquals(List.of("e", "a"), outcomes.stream().map(Outcome::id).toList());
        assertEquals(List.of(6.0), values(outcomes.get(1)));
    }

    @Test
    void anEmptyLedgerHasNoOutcomes() throws LedgerRefusedException {
        assertEquals(List.of(), Bench.EVALUATOR.evaluate(Ledger.of()));
    }

    @Test
    void aLongColumnInBlocksEqualsItsRowsToTheBit() throws LedgerRefusedException {
        double[] areas = IntStream.range(1, 20_001).mapToDouble(i -> i / 7.0).toArray();
        Outcome outcome = evaluate(
                edge("e", Given.numbers(areas)), signed("a", ref("e"), ref("e"), RIGHT), edge("back", ref("a")));
        double[] single = new double[areas.length];
        for (int i = 0; i < areas.length; i++) {
            double edge = Math.sqrt(areas[i]);
            single[i] = Math.sqrt(edge * edge);
        }
        assertArrayEquals(single, outcome.numbers());
    }

    @Test
    void aLongColumnWithFaultsIsComputedAroundThem() throws LedgerRefusedException {
        double[] areas =
                IntStream.range(0, 20_000).mapToDouble(i -> i % 3 == 0 ? -1 : i).toArray();
        Outcome outcome = evaluate(edge("e", Given.numbers(areas)));
        assertEquals(6667, outcome.faults().size());
        for (int i = 0; i < areas.length; i++) {
            assertEquals(i % 3 == 0 ? Double.NaN : Math.sqrt(i), outcome.numbers()[i]);
        }
    }

    @Test
    void givenArraysAreLeftAsTheyWere() throws LedgerRefusedException {
        double[] areas = {4, -1, 9};
        evaluate(inUnit(edge("e", Given.numbers(areas)), "mm"));
        evaluate(edge("e", Given.numbers(areas, "cm2")));
        assertArrayEquals(new double[] {4, -1, 9}, areas);
    }

    @Test
    void minusZeroIsZero() throws LedgerRefusedException {
        Outcome outcome = evaluate(signed("a", Given.numbers(-0.0, 3), Given.numbers(-0.0, 2), RIGHT));
        assertTrue(outcome.isClean());
        assertEquals(0, outcome.numbers()[0], 0.0);
        assertEquals(6, outcome.numbers()[1]);
    }
}
