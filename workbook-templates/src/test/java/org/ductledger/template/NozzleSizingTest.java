package org.ductledger.template;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Given;
import org.ductledger.record.LedgerRecord;
import org.ductledger.record.RecordReader;
import org.ductledger.record.RecordedCall;
import org.ductledger.record.WorkbookFile;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The sizing of a nozzle: its alternatives, its regimes, its shock, its refusals. */
final class NozzleSizingTest {
    private static final Template NOZZLE = new NozzleSizing();

    private static LedgerRecord record(Map<String, Given.Values> inputs) throws Exception {
        return RecordReader.read(WorkbookFile.open(BuiltWorkbook.bytes(NOZZLE, inputs, UnitSystem.SI)));
    }

    private static RecordedCall call(LedgerRecord record, String id) {
        return record.calls().stream()
                .filter(call -> call.id().equals(id))
                .findFirst()
                .orElseThrow(() -> new AssertionError("no call " + id));
    }

    private static double value(LedgerRecord record, String id) {
        return ((Column.Numbers) call(record, id).values()).values()[0];
    }

    private static String word(LedgerRecord record, String id) {
        return String.valueOf(
                ((Column.Texts) call(record, id).values()).values().get(0));
    }

    /** A back pressure, or the one that the result of that name gives, in the regime that the definitions give it. */
    @ParameterizedTest
    @CsvSource({
        "690, unchoked",
        "first_critical_pressure, first_critical",
        "380, shock_in_nozzle",
        "second_critical_pressure, shock_at_exit",
        "100, overexpanded",
        "third_critical_pressure, design",
        "5, underexpanded"
    })
    void everyRegimeIsReachedAndItsLiveValuesAgree(String back, String regime) throws Exception {
        double pb = Character.isDigit(back.charAt(0))
                ? Double.parseDouble(back)
                : value(RecordReader.read(BuiltWorkbook.of(NOZZLE, UnitSystem.SI)), back);
        byte[] file = BuiltWorkbook.bytes(NOZZLE, Map.of("pb", BuiltWorkbook.number(pb, "kPa")), UnitSystem.US);
        XSSFWorkbook book = WorkbookFile.open(file);
        LedgerRecord record = RecordReader.read(book);
        assertEquals(regime, word(record, "regime"));
        RecalculationTest.assertAgreement(book, record);
        boolean shock = regime.startsWith("shock");
        assertEquals(shock, call(record, "shock_x").faults().isEmpty());
        assertEquals(shock ? 0 : 1, call(record, "shock_m2").faults().size());
    }

    @Test
    void theAlternativesLeadToTheSameNozzle() throws Exception {
        LedgerRecord byFlow = RecordReader.read(BuiltWorkbook.of(NOZZLE, UnitSystem.SI));
        LedgerRecord bySize = record(Map.of(
                "throat_diameter", BuiltWorkbook.number(value(byFlow, "throat_diameter"), "mm"),
                "exit_pressure", BuiltWorkbook.number(value(byFlow, "design_pressure"), "kPa")));
        for (String id : List.of("throat_area", "exit_diameter", "choked_flow", "thrust", "shock_x")) {
            double expected = value(byFlow, id);
            assertEquals(expected, value(bySize, id), 1e-12 * Math.abs(expected), id);
        }
        assertEquals(2.5, value(bySize, "exit_mach"), 1e-13);
    }

    @Test
    void theShockOfTheStationsStandsWhereItIsCalculated() throws Exception {
        LedgerRecord record = RecordReader.read(BuiltWorkbook.of(NOZZLE, UnitSystem.SI));
        double[] x = ((Column.Numbers) call(record, "station_x").values()).values();
        double[] mach = ((Column.Numbers) call(record, "station_mach").values()).values();
        double shock = value(record, "shock_x");
        assertEquals(49, x.length);
        assertEquals(1, mach[24], 0, "the throat is sonic");
        for (int i = 0; i < x.length; i++) {
            assertEquals(x[i] > 0 && x[i] < shock, mach[i] > 1, "station " + (i + 1) + " at " + x[i] + " mm");
        }
    }

    @Test
    void aDesignThatIsNoneIsRefused() {
        assertRefused(Map.of("pb", BuiltWorkbook.number(8, "bar")), "pb");
        assertRefused(Map.of("exit_pressure", BuiltWorkbook.number(5, "bar")), "exit_pressure");
        assertRefused(
                Map.of("contour_x", new Given.Values(new Column.Numbers(-80, -50, -50, 0, 35, 75, 130), false, "mm")),
                "contour_x");
        assertRefused(
                Map.of("contour_opening", new Given.Values(new Column.Numbers(0.1, 0.2, 0.3, 0.4), false, "1")),
                "contour_opening");
    }

    private static void assertRefused(Map<String, Given.Values> inputs, String blamed) {
        List<InputProblem> problems = assertThrows(
                        InputsRefusedException.class, () -> BuiltWorkbook.bytes(NOZZLE, inputs, UnitSystem.SI))
                .problems();
        assertEquals(1, problems.size(), problems::toString);
        assertEquals(blamed, problems.get(0).input());
        assertFalse(problems.get(0).required().isEmpty());
        assertTrue(problems.get(0).given().contains("not less than"), problems::toString);
    }

    /** Each number just outside its interval is refused by its name, with what it should be. */
    @Test
    void everyInputKeepsItsRange() {
        Map<String, Given.Values> outside = new LinkedHashMap<>();
        for (TemplateInput input : NOZZLE.inputs()) {
            if (input.kind() == TemplateInput.Kind.NUMBER
                    && Double.isFinite(input.interval().lower())) {
                double[] low = new double[input.rows()];
                java.util.Arrays.fill(low, Math.nextDown(input.interval().least()));
                outside.put(input.name(), new Given.Values(new Column.Numbers(low), input.rows() == 1, null));
            }
        }
        for (String alternative : List.of("throat_diameter", "exit_pressure")) {
            Map<String, Given.Values> one = new HashMap<>();
            one.put(alternative, outside.remove(alternative));
            assertRange(one);
        }
        assertRange(outside);
    }

    private static void assertRange(Map<String, Given.Values> outside) {
        List<InputProblem> problems = assertThrows(
                        InputsRefusedException.class, () -> BuiltWorkbook.bytes(NOZZLE, outside, UnitSystem.SI))
                .problems();
        assertEquals(
                outside.keySet().stream().sorted().toList(),
                problems.stream().map(InputProblem::input).sorted().toList());
        problems.forEach(problem -> assertTrue(problem.required().contains("greater than")
                || problem.required().contains("at least")));
    }
}
