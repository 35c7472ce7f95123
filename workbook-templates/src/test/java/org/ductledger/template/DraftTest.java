package org.ductledger.template;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.ledger.Column;
import org.ductledger.record.RecordedArgument.FromQuantity;
import org.ductledger.record.RecordedArgument.FromRows;
import org.ductledger.record.RecordedArgument.Row;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** What a template may write on a draft, and what is refused to its author. */
final class DraftTest {
    private Draft draft = new Draft(StandardCatalogue.get(), new Inputs(UnitSystem.SI, Map.of()));

    @BeforeEach
    void begin() throws InputsRefusedException {
        draft = new Draft(StandardCatalogue.get(), InputReader.read(new CoolingLine(), Map.of(), UnitSystem.SI));
        draft.section("Results");
        draft.bind("gamma", draft.input("gamma"));
    }

    private void assertRefused(String reason, Runnable writing) {
        String message =
                assertThrows(IllegalArgumentException.class, writing::run).toString();
        assertTrue(message.contains(reason), message);
    }

    @Test
    void argumentsAreTakenByNameAndElseAsBound() {
        draft.result("ratio", "Ratio", "T/T0", "t_over_t0", Map.of("mach", draft.input("mach")));
        assertEquals(
                List.of(new FromQuantity("mach"), new FromQuantity("gamma")),
                draft.calls().values().iterator().next().terms().stream()
                        .map(Term::origin)
                        .toList());
    }

    @Test
    void aNameStandsOnceAndHidesNoFunction() {
        Map<String, Term> mach = Map.of("mach", draft.input("mach"));
        draft.result("ratio", "Ratio", "T/T0", "t_over_t0", mach);
        for (String taken : List.of("ratio", "gamma", "p_over_p0")) {
            assertRefused("taken", () -> draft.result(taken, "Ratio", "T/T0", "t_over_t0", mach));
        }
        assertRefused("two quantities", () -> draft.constant("ratio", 1));
    }

    @Test
    void aCallIsWhole() {
        assertRefused("lacks mach", () -> draft.result("ratio", "Ratio", "T/T0", "t_over_t0", Map.of()));
        assertRefused(
                "takes no area",
                () -> draft.result(
                        "ratio",
                        "Ratio",
                        "T/T0",
                        "t_over_t0",
                        Map.of("mach", draft.input("mach"), "area", draft.input("mach"))));
        assertRefused("no function", () -> draft.result("ratio", "Ratio", "T/T0", "t_over", Map.of()));
        assertRefused("no input", () -> draft.input("t_ratio"));
        assertRefused("not bound", () -> draft.bound("mach"));
    }

    @Test
    void aColumnIsMadeOfInputsAndConstants() {
        Term column = Draft.each(List.of(draft.input("point", 1), draft.constant("zero", 0), draft.input("mach")));
        assertEquals(
                new FromRows(List.of(new Row("point", 1), new Row("zero", 0), new Row("mach", 0))), column.origin());
        Term result = draft.result("ratio", "Ratio", "T/T0", "t_over_t0", Map.of("mach", draft.input("mach")));
        assertRefused("made of inputs and constants", () -> Draft.each(List.of(result)));
    }

    @Test
    void aTableTakesColumnsOfItsOwnLengthOnly() {
        Table table = draft.table("Line", "Line", 2);
        draft.column(table, "places", "Places", new Column.Numbers(1, 2));
        assertRefused("2 rows", () -> draft.column(table, "more", "More", new Column.Numbers(1, 2, 3)));
    }
}
