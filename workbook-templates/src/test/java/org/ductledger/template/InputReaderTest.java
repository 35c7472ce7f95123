package org.ductledger.template;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Given;
import org.junit.jupiter.api.Test;

/** What is taken for inputs, and how refused ones are told. */
final class InputReaderTest {
    private static final Template LINE = new CoolingLine();

    private static Inputs read(Map<String, Given.Values> given) throws InputsRefusedException {
        return InputReader.read(LINE, given, UnitSystem.US);
    }

    private static List<InputProblem> problems(Map<String, Given.Values> given) {
        return assertThrows(InputsRefusedException.class, () -> read(given)).problems();
    }

    private static void assertProblem(Map<String, Given.Values> given, String input, String required, String got) {
        assertEquals(List.of(new InputProblem(input, required, got)), problems(given));
    }

    private static Given.Values word(String word) {
        return new Given.Values(new Column.Texts(List.of(word)), true, null);
    }

    @Test
    void whatIsMissingTakesItsDefaultInTheUnitsOfTheWorkbook() throws Exception {
        Inputs inputs = read(Map.of());
        assertEquals("degR", inputs.get("t0").unit());
        assertArrayEquals(new double[] {300}, inputs.coherent("t0"), 1e-13);
        assertTrue(inputs.has("mach"));
        assertFalse(inputs.has("t_ratio"), "the first of its group is taken");
    }

    @Test
    void theAlternativeThatIsGivenIsTaken() throws Exception {
        Inputs inputs = read(Map.of("t_ratio", BuiltWorkbook.number(0.7, "1")));
        assertTrue(inputs.has("t_ratio"));
        assertFalse(inputs.has("mach"));
    }

    @Test
    void aNumberWithoutAUnitIsCoherent() throws Exception {
        Given.Values bare = new Given.Values(new Column.Numbers(270), true, null);
        assertArrayEquals(new double[] {486}, shown(read(Map.of("t0", bare)), "t0"), 1e-12);
        assertArrayEquals(new double[] {486}, shown(read(Map.of("t0", BuiltWorkbook.number(486, "degR"))), "t0"));
    }

    private static double[] shown(Inputs inputs, String name) {
        return ((Column.Numbers) inputs.get(name).column()).values();
    }

    @Test
    void refusalsNameWhatIsRequiredAndWhatWasGiven() {
        assertProblem(
                Map.of("t0", BuiltWorkbook.number(-459.67, "degF")), "t0", "greater than -459.67 degF", "-459.67 degF");
        assertProblem(Map.of("gamma", BuiltWorkbook.number(1, "1")), "gamma", "greater than 1 and at most 3", "1");
        assertProblem(
                Map.of("gamma", BuiltWorkbook.number(Double.NaN, "1")), "gamma", "greater than 1 and at most 3", "NaN");
        assertProblem(Map.of("t0", word("warm")), "t0", "greater than 0 K", "text");
        assertProblem(Map.of("side", word("left")), "side", "one of converging, diverging", "'left'");
        assertProblem(Map.of("side", BuiltWorkbook.number(1, "1")), "side", "one of converging, diverging", "a number");
        assertProblem(Map.of("t0", BuiltWorkbook.number(20, "kPa")), "t0", "a unit of the kind of K", "kPa");
        assertProblem(
                Map.of("point", BuiltWorkbook.number(20, "mm")), "point", "2 values, each a finite number", "1 value");
        assertProblem(
                Map.of("mach", BuiltWorkbook.number(2, "1"), "t_ratio", BuiltWorkbook.number(0.5, "1")),
                "mach",
                "exactly one of mach, t_ratio",
                "mach and t_ratio");
    }

    @Test
    void unknownNamesAndUnitsAreRefusedWithWhatIsKnown() {
        InputProblem stranger =
                problems(Map.of("temperature", BuiltWorkbook.number(20, "K"))).get(0);
        assertEquals("no such input", stranger.given());
        assertTrue(stranger.required().contains("t0"), stranger.required());
        InputProblem gauge =
                problems(Map.of("t0", BuiltWorkbook.number(20, "Kelvins"))).get(0);
        assertTrue(gauge.given().startsWith("Kelvins: "), gauge.given());
    }

    @Test
    void everyProblemIsTold() {
        Map<String, Given.Values> given = new HashMap<>();
        given.put("gamma", BuiltWorkbook.number(0.9, "1"));
        given.put("t0", BuiltWorkbook.number(-1, "K"));
        given.put("side", word("left"));
        given.put("nothing", BuiltWorkbook.number(1, "1"));
        assertEquals(4, problems(given).size());
    }

    @Test
    void whatInputsMustFulfilTogetherIsAsked() {
        Given.Values falling = new Given.Values(new Column.Numbers(50, 20), false, "mm");
        List<InputProblem> problems = assertThrows(
                        InputsRefusedException.class,
                        () -> BuiltWorkbook.bytes(LINE, Map.of("point", falling), UnitSystem.SI))
                .problems();
        assertEquals(
                List.of(new InputProblem(
                        "point", "the first point ahead of the last", "50 mm, which is not less than 20 mm")),
                problems);
    }
}
