package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;
import java.util.Map;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.flow.PublishedTable.Answer;
import org.ductledger.flow.PublishedTable.Row;
import org.junit.jupiter.api.Test;

/**
 * Against published tables of Fanno, Rayleigh and isothermal flow, and against the duct problems of textbooks. The
 * columns {@code source} and {@code provenance} say which values were read and which are from memory.
 */
class DuctsPublishedValidationTest {
    private static final Map<String, String> COLUMNS = Map.ofEntries(
            Map.entry("Fanno 4fL*/D", "fanno_fl_over_d"),
            Map.entry("Fanno T/T*", "fanno_t_over_tstar"),
            Map.entry("Fanno p/p*", "fanno_p_over_pstar"),
            Map.entry("Fanno p0/p0*", "fanno_p0_over_p0star"),
            Map.entry("Fanno rho/rho*", "fanno_rho_over_rhostar"),
            Map.entry("Fanno 4fL*/D limit M->inf", "fanno_fl_over_d"),
            Map.entry("Rayleigh T0/T0*", "rayleigh_t0_over_t0star"),
            Map.entry("Rayleigh T/T*", "rayleigh_t_over_tstar"),
            Map.entry("Rayleigh p/p*", "rayleigh_p_over_pstar"),
            Map.entry("Rayleigh p0/p0*", "rayleigh_p0_over_p0star"),
            Map.entry("Rayleigh rho*/rho (=V/V*)", "rayleigh_v_over_vstar"),
            Map.entry("Rayleigh T0/T0* limit M->inf", "rayleigh_t0_over_t0star"),
            Map.entry("Isothermal 4fL/D", "isothermal_fl_over_d"),
            Map.entry("Isothermal p/p*", "isothermal_p_over_pstar"),
            Map.entry("Isothermal p0/p0*", "isothermal_p0_over_p0star"),
            Map.entry("Isothermal T0/T0*", "isothermal_t0_over_t0star"),
            Map.entry("T*/T0", "t_over_t0"),
            Map.entry("rho*/rho0", "rho_over_rho0"),
            Map.entry("p*/p0", "p_over_p0"));

    /** Where an infinite Mach number is asked for, one at which the limit is reached to the last digit. */
    private static final String AS_GOOD_AS_INFINITE = "1e12";

    private static double call(String name, double... arguments) {
        return StandardCatalogue.get().find(name).orElseThrow().kernel().at(arguments);
    }

    @Test
    void everyRowOfTheTablesIsMet() {
        PublishedTable table = PublishedTable.read("fanno_rayleigh_isothermal.csv");
        assertEquals(Map.of("checked", 293), table.check(row -> Answer.of(ofTable(row))));
    }

    /** The value at the decimal numbers of the table: their doubles' own value and what the decimals have beyond. */
    private static double ofTable(Row row) {
        FunctionEntry entry = StandardCatalogue.get()
                .find(COLUMNS.getOrDefault(row.quantity(), "no function"))
                .orElseThrow();
        String[] decimals = {mach(row), row.decimal("gamma")};
        double[] doubles = {Double.parseDouble(decimals[0]), Double.parseDouble(decimals[1])};
        double value = entry.kernel().at(doubles);
        for (int i = 0; i < doubles.length; i++) {
            BigDecimal beyond = new BigDecimal(decimals[i]).subtract(new BigDecimal(doubles[i]));
            value += beyond.signum() == 0 ? 0 : beyond.doubleValue() * entry.partial(i, doubles);
        }
        return value;
    }

    private static String mach(Row row) {
        if (row.quantity().endsWith("inf")) {
            return AS_GOOD_AS_INFINITE;
        }
        return row.inputs().contains("M=") ? row.decimal("M") : "1";
    }

    @Test
    void everyDuctProblemOfTheTextbooksIsMetOrHasItsReason() {
        String noLogarithm = "the source leaves the logarithm of the pressures out; the functions keep it";
        Map<String, Integer> counts = PublishedTable.read("worked_examples.csv").check(row -> {
            if (!row.quantity().matches("(Fanno|Rayleigh|Isothermal) .*")) {
                return Answer.none("no duct problem");
            }
            return row.quantity().contains("log term neglected") ? Answer.none(noLogarithm) : Answer.of(solve(row));
        });
        assertEquals(14, counts.get("checked"));
        assertEquals(2, counts.get(noLogarithm));
    }

    private static double solve(Row row) {
        return switch (row.quantity()) {
            case "Rayleigh M2 supersonic", "Rayleigh M2 subsonic" -> heatedMach(row);
            case "Rayleigh T2 [K]" -> heatedTemperature(row);
            case "Rayleigh heat to choke [J/kg]" ->
                row.number("cp")
                        * stagnationTemperature(row)
                        * (call("rayleigh_t02_over_t01_max", mach1(row), 1.4) - 1);
            case "Fanno T2 [K]" -> temperatureBehindDuct(row);
            case "Fanno choking length [ft]" ->
                row.number("D") / (4 * row.number("f_Fanning")) * call("fanno_fl_over_d", row.number("M1"), 1.4);
            case "Fanno choking length [m]" ->
                row.number("D") / row.number("f_Darcy") * call("fanno_fl_over_d", row.number("Ma1"), 1.4);
            case "Fanno p2 [kPa]" -> row.number("p1") * ratio(row, "fanno_p_over_pstar");
            case "Fanno p02 [kPa]" ->
                row.number("p1") / call("p_over_p0", row.number("Ma1"), 1.4) * ratio(row, "fanno_p0_over_p0star");
            case "Fanno p* [kPa]" -> row.number("p1") / call("fanno_p_over_pstar", row.number("Ma1"), 1.4);
            case "Fanno V* [m/s]" ->
                row.number("Ma1")
                        * call("speed_of_sound", 1.4, row.number("R"), row.number("T1"))
                        / call("fanno_v_over_vstar", row.number("Ma1"), 1.4);
            case "Fanno inlet Mach from p/p0" -> inletMach(row);
            case "Fanno Mach at B" -> machAtB(row);
            case "Fanno overall length [m]" -> overallLength(row);
            default -> throw new IllegalArgumentException(row.toString());
        };
    }

    private static double mach1(Row row) {
        return row.inputs().contains("M1=")
                ? row.number("M1")
                : row.number("V1") / call("speed_of_sound", 1.4, row.number("R"), row.number("T1"));
    }

    private static double stagnationTemperature(Row row) {
        return row.number("T1") / call("t_over_t0", mach1(row), 1.4);
    }

    /** The heat is in J/kg or in kJ/kg, cp in J/(kg K). */
    private static double heatedMach(Row row) {
        double heat = row.number("q") * (row.inputs().contains("kJ/kg") ? 1000 : 1);
        double ratio = 1 + heat / (row.number("cp") * stagnationTemperature(row));
        return call("rayleigh_mach2", mach1(row), ratio, 1.4);
    }

    private static double heatedTemperature(Row row) {
        return row.number("T1")
                * call("rayleigh_t_over_tstar", heatedMach(row), 1.4)
                / call("rayleigh_t_over_tstar", mach1(row), 1.4);
    }

    private static double temperatureBehindDuct(Row row) {
        double mach1 = row.number("M1");
        double flOverD = 4 * row.number("f_Fanning") * row.number("L") / row.number("D");
        double mach2 = call("fanno_mach2", mach1, flOverD, 1.4);
        return row.number("T1") * call("fanno_t_over_tstar", mach2, 1.4) / call("fanno_t_over_tstar", mach1, 1.4);
    }

    private static double ratio(Row row, String function) {
        return call(function, row.number("Ma2"), 1.4) / call(function, row.number("Ma1"), 1.4);
    }

    private static double inletMach(Row row) {
        return call("mach_from_p_over_p0", row.number("pA") / row.number("p0"), 1.4);
    }

    private static double machAtB(Row row) {
        return machWhere(row, row.number("pB"));
    }

    private static double machWhere(Row row, double pressure) {
        double atA = call("fanno_p_over_pstar", inletMach(row), 1.4);
        return call("mach_from_fanno_p_over_pstar", atA * pressure / row.number("pA"), 1.4);
    }

    /** The friction from the length between A and B, then the length from A to the exhaust at 100 kPa. */
    private static double overallLength(Row row) {
        double fromA = call("fanno_fl_over_d", inletMach(row), 1.4);
        double perLength = (fromA - call("fanno_fl_over_d", machAtB(row), 1.4)) / row.number("l");
        return (fromA - call("fanno_fl_over_d", machWhere(row, 100), 1.4)) / perLength;
    }
}
