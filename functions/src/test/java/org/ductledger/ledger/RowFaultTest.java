package org.ductledger.ledger;

import static org.ductledger.ledger.Bench.edge;
import static org.ductledger.ledger.Bench.evaluate;
import static org.ductledger.ledger.Bench.inUnit;
import static org.ductledger.ledger.Bench.ref;
import static org.ductledger.ledger.Bench.signed;
import static org.ductledger.ledger.Bench.values;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.ductledger.catalogue.FaultKind;
import org.junit.jupiter.api.Test;

class RowFaultTest {
    private static final Given RIGHT = Given.text("right");

    @Test
    void aBadRowSpoilsNoOther() throws LedgerRefusedException {
        Outcome outcome = evaluate(edge("e", Given.numbers(4, -1, 9, Double.NaN, 16, Double.POSITIVE_INFINITY)));
        assertEquals(List.of(2.0, Double.NaN, 3.0, Double.NaN, 4.0, Double.NaN), values(outcome));
        assertEquals(
                List.of(
                        new Fault(
                                1, FaultKind.OUTSIDE_DOMAIN, "area", -1.0, "area must be greater than 0 m2, got -1 m2"),
                        new Fault(
                                3, FaultKind.NOT_A_NUMBER, "area", null, "area must be greater than 0 m2, got NaN m2"),
                        new Fault(
                                5,
                                FaultKind.OUTSIDE_DOMAIN,
                                "area",
                                Double.POSITIVE_INFINITY,
                                "area must be greater than 0 m2, got Infinity m2")),
                outcome.faults());
    }

    @Test
    void aFaultSpeaksInTheUnitOfWhoeverGaveTheValue() throws LedgerRefusedException {
        Outcome outcome =
                evaluate(Call.of("w", "warmer_by_half", Map.of("t", Given.numbers(new double[] {20, -300}, "degC"))));
        assertEquals(
                List.of(new Fault(
                        1,
                        FaultKind.OUTSIDE_DOMAIN,
                        "t",
                        -300.0,
                        "t must be greater than -273.15 degC, got -300 degC")),
                outcome.faults());
    }

    @Test
    void aBrokenConditionNamesTheValueAsGivenAndAsComputed() throws LedgerRefusedException {
        Outcome outcome =
                evaluate(signed("a", Given.number(1), Given.numbers(new double[] {99.7, 100.1}, "cm"), RIGHT));
        assertEquals(
                List.of(new Fault(
                        1,
                        FaultKind.NO_SOLUTION,
                        "other",
                        100.1,
                        "other must be at most 1 m (the length), got 100.1 cm = 1.001 m")),
                outcome.faults());
    }

    @Test
    void aSpreadValueOutsideItsDomainFaultsEveryRow() throws LedgerRefusedException {
        Outcome outcome = evaluate(signed("a", Given.number(-1), Given.numbers(1, 2), RIGHT));
        assertEquals(List.of(0, 1), outcome.faults().stream().map(Fault::row).toList());
        assertEquals(
                "length must be at least 0 m, got -1 m", outcome.faults().get(1).detail());
        assertEquals(List.of(Double.NaN, Double.NaN), values(outcome));
    }

    @Test
    void theFirstArgumentAtFaultIsBlamedAndTheRowsStayInOrder() throws LedgerRefusedException {
        Outcome outcome = evaluate(signed(
                "a", Given.numbers(5, -2, 5), Given.numbers(-1, -1, 9), Given.texts(List.of("right", "x", "right"))));
        assertEquals(
                List.of("other", "length", "other"),
                outcome.faults().stream().map(Fault::argument).toList());
        assertEquals(List.of(0, 1, 2), outcome.faults().stream().map(Fault::row).toList());
    }

    @Test
    void anUnknownWordIsAFaultOfItsRow() throws LedgerRefusedException {
        Outcome outcome =
                evaluate(signed("a", Given.number(3), Given.number(2), Given.texts(List.of("left", "top", "Left"))));
        assertEquals(List.of(-6.0, Double.NaN, Double.NaN), values(outcome));
        assertEquals(
                new Fault(1, FaultKind.OUTSIDE_DOMAIN, "side", "top", "side must be one of left, right, got 'top'"),
                outcome.faults().get(0));
        assertEquals("Left", outcome.faults().get(1).given());
    }

    @Test
    void aRowThatLeansOnARowWithoutAValueSaysSo() throws LedgerRefusedException {
        Outcome outcome = evaluate(edge("e", Given.numbers(4, -1)), signed("a", ref("e"), Given.number(1), RIGHT));
        assertEquals(List.of(2.0, Double.NaN), values(outcome));
        assertEquals(
                List.of(new Fault(
                        1,
                        FaultKind.BAD_REFERENCE,
                        "length",
                        "e",
                        "length refers to e, which has no value in this row")),
                outcome.faults());
    }

    @Test
    void aFaultInOneSpreadValueReachesEveryRowThatLeansOnIt() throws LedgerRefusedException {
        Outcome outcome = evaluate(edge("e", Given.number(-1)), signed("a", ref("e"), Given.numbers(1, 2, 3), RIGHT));
        assertEquals(List.of(0, 1, 2), outcome.faults().stream().map(Fault::row).toList());
        assertEquals(FaultKind.BAD_REFERENCE, outcome.faults().get(2).kind());
    }

    @Test
    void aReferredValueOutsideTheDomainNamesItsCall() throws LedgerRefusedException {
        Outcome outcome = evaluate(
                inUnit(signed("a", Given.number(3), Given.numbers(1, 2), Given.texts(List.of("right", "left"))), "cm2"),
                edge("e", ref("a")));
        assertEquals(
                List.of(new Fault(
                        1, FaultKind.OUTSIDE_DOMAIN, "area", -6.0, "area must be greater than 0 m2, got -6 m2 from a")),
                outcome.faults());
    }

    @Test
    void aReferredWordWithoutAValueIsAFault() throws LedgerRefusedException {
        Outcome side = evaluate(Call.of("s", "side_of", Map.of("length", Given.numbers(2, -1))));
        assertEquals(Arrays.asList("right", null), ((Column.Texts) side.values()).values());
        Outcome area = evaluate(
                Call.of("s", "side_of", Map.of("length", Given.numbers(2, -1))),
                signed("a", Given.number(3), Given.number(2), ref("s")));
        assertEquals(List.of(6.0, Double.NaN), values(area));
        assertEquals(FaultKind.BAD_REFERENCE, area.faults().get(0).kind());
    }

    @Test
    void aLostIterationAndAnOverflowAreTold() throws LedgerRefusedException {
        Outcome outcome = evaluate(Call.of("x", "lost_iteration", Map.of("length", Given.numbers(0.5, 1.5, 3))));
        assertEquals(List.of(Double.NaN, 1.5, Double.NaN), values(outcome));
        Fault lost = outcome.faults().get(0);
        assertEquals(FaultKind.NOT_CONVERGED, lost.kind());
        assertEquals("lost_iteration did not reach its accuracy for these arguments", lost.detail());
        assertNull(lost.argument());
        Fault overflow = outcome.faults().get(1);
        assertEquals(FaultKind.OUTSIDE_DOMAIN, overflow.kind());
        assertEquals(
                "lost_iteration must stay within the range of a double (about 1.8e308) in m, and is larger here",
                overflow.detail());
    }

    @Test
    void aResultBeyondDoubleInTheUnitWantedIsAFaultOfItsRow() throws LedgerRefusedException {
        Call huge = inUnit(signed("a", Given.number(1e306), Given.numbers(1, 2), RIGHT), "mm2");
        List<Outcome> outcomes = Bench.EVALUATOR.evaluate(Ledger.of(huge, edge("e", ref("a"))));
        assertEquals(List.of(Double.NaN, Double.NaN), values(outcomes.get(0)));
        assertEquals(
                "signed_area must stay within the range of a double (about 1.8e308) in mm2, and is larger here",
                outcomes.get(0).faults().get(1).detail());
        assertEquals(1e153, outcomes.get(1).numbers()[0], 1e138);
    }

    @Test
    void aGivenValueBeyondDoubleInTheCoherentUnitIsOutside() throws LedgerRefusedException {
        Outcome outcome = evaluate(signed("a", Given.number(1e308, "km"), Given.number(1), RIGHT));
        assertEquals(FaultKind.OUTSIDE_DOMAIN, outcome.faults().get(0).kind());
        assertEquals(1e308, outcome.faults().get(0).given());
    }
}
