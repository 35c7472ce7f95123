package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.ductledger.exact.FortyDigits;
import org.ductledger.flow.PublishedTable.Answer;
import org.ductledger.flow.PublishedTable.Row;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Against NASA/TP-2002-211556 (McBride, Zehe, Gordon, 2002; public domain), the NIST-JANAF Thermochemical Tables (4th
 * edition, 1998), and reference values of the viscosity of dilute gases.
 */
class GasesValidationTest {
    private static final PublishedTable TABLE = PublishedTable.read("nasa9_gas_properties.csv");
    private static final List<String> SPECIES = List.of("Air", "N2", "O2", "Ar", "He", "H2", "CO2", "CH4", "H2O", "CO");

    private static Answer answer(Row row) {
        String quantity = row.quantity();
        if (quantity.startsWith("h")) {
            return Answer.none("no function gives an enthalpy");
        }
        if (quantity.startsWith("s0")) {
            return Answer.none("no function gives an entropy");
        }
        if (quantity.startsWith("isentropic") || quantity.startsWith("normal shock")) {
            return Answer.none("flow of a thermally perfect gas: the flow families hold gamma constant");
        }
        double gas = SPECIES.indexOf(row.word("species"));
        double t = row.number("T");
        return Answer.of(quantity.startsWith("gamma") ? Gases.gamma(gas, t) : Gases.cp(gas, t) * Gases.molarMass(gas));
    }

    @Test
    void everyHeatCapacityAndGammaOfTheTableIsMet() {
        assertEquals(
                Map.of(
                        "checked", 140,
                        "no function gives an enthalpy", 65,
                        "no function gives an entropy", 65,
                        "flow of a thermally perfect gas: the flow families hold gamma constant", 76),
                TABLE.check(GasesValidationTest::answer));
    }

    @Test
    void theComputedRowsHoldToTheLastDigits() {
        TABLE.rows()
                .filter(row -> row.inputs().contains("R=8.314510"))
                .filter(row -> answer(row).reason().isEmpty())
                .forEach(row -> assertTrue(
                        FortyDigits.ulps(answer(row).value(), FortyDigits.decimal(row.exact())) <= 16, row::toString));
    }

    /** The table of the program holds the coefficients of the file to the last digit. */
    @Test
    void everyCoefficientIsThatOfTheReport() throws IOException {
        String file = resource("/reference/nasa9.json");
        for (int gas = 0; gas < SPECIES.size(); gas++) {
            List<Double> published = new ArrayList<>();
            Matcher blocks = Pattern.compile("\"a\": \\[([^]]*)]").matcher(species(file, SPECIES.get(gas)));
            while (blocks.find()) {
                for (String number : blocks.group(1).split(",", -1)) {
                    published.add(Double.valueOf(number.strip().replace("\"", "")));
                }
            }
            List<Double> held = new ArrayList<>();
            for (double[] range : GasTable.HEAT[gas]) {
                for (int i = 2; i < range.length; i++) {
                    held.add(range[i]);
                }
            }
            assertEquals(published, held, SPECIES.get(gas));
        }
    }

    @Test
    void everyMolarMassIsThatOfTheReport() throws IOException {
        String file = resource("/reference/nasa9.json");
        for (int gas = 0; gas < SPECIES.size(); gas++) {
            Matcher mass =
                    Pattern.compile("\"molar_mass_g_mol\": \"([0-9.]+)\"").matcher(species(file, SPECIES.get(gas)));
            assertTrue(mass.find());
            assertEquals(Double.parseDouble(mass.group(1)), Gases.molarMass(gas) * 1000, 1e-12);
        }
    }

    private static String resource(String name) throws IOException {
        try (InputStream in = Objects.requireNonNull(GasesValidationTest.class.getResourceAsStream(name), name)) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        }
    }

    private static String species(String file, String name) {
        int from = file.indexOf("\"" + name + "\": {");
        int to = file.indexOf("\"dHf298_J_mol\"", from + name.length());
        int next = file.indexOf("\"molar_mass_g_mol\"", to);
        return file.substring(from, next < 0 ? file.length() : next);
    }

    /**
     * Reference correlations of the dilute gas, values in micropascal seconds, all from memory: Lemmon and Jacobsen
     * (2004) for air, nitrogen, oxygen and argon; Cencek et al. (2012) for helium; Muzny et al. (2013) for hydrogen;
     * Laesecke and Muzny (2017) for carbon dioxide; Vogel et al. (2000) for methane; IAPWS R12-08 for steam at 1 kg/m3.
     */
    @ParameterizedTest
    @CsvSource({
        "air, 100, 7.09559, 0.03",
        "air, 300, 18.5230, 0.005",
        "nitrogen, 300, 17.8771, 0.005",
        "oxygen, 300, 20.6307, 0.01",
        "argon, 300, 22.7241, 0.005",
        "helium, 298.15, 19.825, 0.005",
        "hydrogen, 298.15, 8.90, 0.01",
        "carbon_dioxide, 300, 15.0, 0.01",
        "methane, 298.15, 11.06, 0.01",
        "steam, 873.15, 32.619974, 0.005",
        "steam, 1173.15, 44.217245, 0.005"
    })
    void theViscositiesAgreeWithReferenceCorrelations(
            String gas, double t, double micropascalSeconds, double relative) {
        double place = List.of(GasTable.NAMES).indexOf(gas);
        double expected = micropascalSeconds * 1e-6;
        assertEquals(expected, Gases.viscosity(place, t), relative * expected);
    }
}
