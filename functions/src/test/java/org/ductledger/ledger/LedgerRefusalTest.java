package org.ductledger.ledger;

import static org.ductledger.ledger.Bench.edge;
import static org.ductledger.ledger.Bench.inUnit;
import static org.ductledger.ledger.Bench.ref;
import static org.ductledger.ledger.Bench.signed;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Map;
import org.ductledger.catalogue.FaultKind;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;

class LedgerRefusalTest {
    private static final Given RIGHT = Given.text("right");

    private static List<Refusal> refusals(Ledger ledger) {
        return assertThrows(LedgerRefusedException.class, () -> Bench.EVALUATOR.evaluate(ledger))
                .refusals();
    }

    private static void refused(FaultKind kind, int call, @Nullable String argument, String detail, Call... calls) {
        assertEquals(List.of(new Refusal(kind, call, argument, detail)), refusals(Ledger.of(calls)));
    }

    @Test
    void anUnknownFunctionIsAnsweredWithWhatIsNear() {
        refused(
                FaultKind.UNKNOWN_FUNCTION,
                0,
                null,
                "no function is named edge_off; near it: edge_of",
                Call.of("e", "edge_off", Map.of("area", Given.number(4))));
        refused(
                FaultKind.UNKNOWN_FUNCTION,
                0,
                null,
                "no function is named viscosity",
                Call.of("e", "viscosity", Map.of()));
    }

    @Test
    void aMissingArgumentIsNamedWithItsUnitAndDomain() {
        refused(
                FaultKind.MISSING_ARGUMENT,
                0,
                "other",
                "signed_area requires other (in m), at least 0 m, and it is not given",
                Call.of("a", "signed_area", Map.of("length", Given.number(1), "side", RIGHT)));
        refused(
                FaultKind.MISSING_ARGUMENT,
                0,
                "side",
                "signed_area requires side, one of left, right, and it is not given",
                Call.of("a", "signed_area", Map.of("length", Given.number(1), "other", Given.number(1))));
    }

    @Test
    void anArgumentThatTheFunctionDoesNotTakeIsRefused() {
        refused(
                FaultKind.MISSING_ARGUMENT,
                0,
                "gamma",
                "edge_of takes no argument gamma; it takes area",
                Call.of("e", "edge_of", Map.of("area", Given.number(4), "gamma", Given.number(1.4))));
    }

    @Test
    void numbersAndWordsAreNotExchanged() {
        refused(FaultKind.NOT_A_NUMBER, 0, "area", "area must be a number, got text", edge("e", Given.text("four")));
        refused(
                FaultKind.NOT_A_NUMBER,
                0,
                "side",
                "side must be one of left, right, got a number",
                signed("a", Given.number(1), Given.number(1), Given.number(0)));
    }

    @Test
    void aColumnNeedsARow() {
        refused(
                FaultKind.MISSING_ARGUMENT,
                0,
                "area",
                "area has no rows; at least one is required",
                edge("e", Given.numbers()));
    }

    @Test
    void aUnitOfAnotherKindIsRefused() {
        refused(
                FaultKind.UNKNOWN_UNIT,
                0,
                "area",
                "area requires a unit of the kind of m2, got m",
                edge("e", Given.number(4, "m")));
        refused(
                FaultKind.UNKNOWN_UNIT,
                0,
                null,
                "the result requires a unit of the kind of m, got m2",
                inUnit(edge("e", Given.number(4)), "m2"));
        refused(
                FaultKind.UNKNOWN_UNIT,
                0,
                "area",
                "area requires a unit of the kind of m2: the unit 'cm^2' is not known; near it: cm2",
                edge("e", Given.number(4, "cm^2")));
    }

    @Test
    void aTemperatureDifferenceIsNoTemperature() {
        refused(
                FaultKind.UNKNOWN_UNIT,
                0,
                "t",
                "t requires a unit of the kind of K, got delta_degC; a temperature difference is not a temperature",
                Call.of("w", "warmer_by_half", Map.of("t", Given.number(4, "delta_degC"))));
    }

    @Test
    void aWordHasNoUnit() {
        refused(
                FaultKind.UNKNOWN_UNIT,
                0,
                null,
                "s gives a word, which has no unit; got m",
                inUnit(Call.of("s", "side_of", Map.of("length", Given.number(1))), "m"));
        Given word = new Given.Values(new Column.Texts(List.of("left")), true, "m");
        refused(
                FaultKind.UNKNOWN_UNIT,
                0,
                "side",
                "side is a word, which has no unit; got m",
                signed("a", Given.number(1), Given.number(1), word));
    }

    @Test
    void aReferenceMustNameAnEarlierCall() {
        String reason = ", which is not an earlier call: a ledger is evaluated in its order, so that no call can lean"
                + " on itself or a later one";
        refused(FaultKind.BAD_REFERENCE, 0, "area", "area refers to z, but no call has that id", edge("e", ref("z")));
        refused(FaultKind.BAD_REFERENCE, 0, "area", "area refers to e" + reason, edge("e", ref("e")));
        assertEquals(
                List.of(new Refusal(FaultKind.BAD_REFERENCE, 0, "length", "length refers to e" + reason)),
                refusals(Ledger.of(signed("a", ref("e"), Given.number(1), RIGHT), edge("e", ref("a")))));
    }

    @Test
    void aReferenceMustBeOfTheRightKind() {
        refused(
                FaultKind.BAD_REFERENCE,
                1,
                "area",
                "area requires a value in m2, but e gives a value in m",
                edge("e", Given.number(4)),
                edge("f", ref("e")));
        refused(
                FaultKind.BAD_REFERENCE,
                1,
                "side",
                "side requires one of left, right, but e gives a value in m",
                edge("e", Given.number(4)),
                signed("a", Given.number(1), Given.number(1), ref("e")));
        refused(
                FaultKind.BAD_REFERENCE,
                1,
                "length",
                "length requires a value in m, but s gives one of left, right",
                Call.of("s", "side_of", Map.of("length", Given.number(1))),
                signed("a", ref("s"), Given.number(1), RIGHT));
    }

    @Test
    void aWordIsPassedOnOnlyToTheSameWords() {
        refused(
                FaultKind.BAD_REFERENCE,
                1,
                "hand",
                "hand requires one of port, starboard, but s gives one of left, right",
                Call.of("s", "side_of", Map.of("length", Given.number(1))),
                Call.of("h", "hand_of", Map.of("hand", ref("s"))));
    }

    @Test
    void anIdIsGivenOnce() {
        refused(
                FaultKind.BAD_REFERENCE,
                1,
                null,
                "the id e is given to two calls",
                edge("e", Given.number(4)),
                edge("e", Given.number(9)));
    }

    @Test
    void columnsOfOneCallHaveOneLength() {
        refused(
                FaultKind.BAD_REFERENCE,
                1,
                null,
                "columns of one call must have the same number of rows, got length with 2, side with 3",
                edge("e", Given.numbers(4, 9)),
                signed("a", ref("e"), Given.number(1), Given.texts(List.of("left", "left", "left"))));
    }

    @Test
    void wantNamesCallsOfTheLedger() {
        assertEquals(
                List.of(new Refusal(FaultKind.BAD_REFERENCE, -1, null, "want names f, but no call has that id")),
                refusals(new Ledger(List.of(edge("e", Given.number(4))), List.of("e", "f"))));
    }

    @Test
    void everyReasonIsGivenAtOnceButNoneTwice() {
        List<Refusal> refusals = refusals(Ledger.of(
                Call.of("a", "nothing_known", Map.of()),
                edge("e", ref("a")),
                edge("f", Given.number(1, "psig")),
                signed("g", ref("f"), Given.number(1, "bar"), Given.number(2))));
        assertEquals(List.of(0, 2, 3, 3), refusals.stream().map(Refusal::call).toList());
        assertEquals(
                "area requires a unit of the kind of m2: psig is a gauge unit: the pressures here are absolute; add the"
                        + " barometric pressure of the site and give the sum in psi",
                refusals.get(1).detail());
    }
}
