package org.ductledger.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The factors against NIST SP 811 (2008), appendix B: as it prints them, and from the exact definitions it gives. */
class UnitsValidationTest {
    static List<NamedCsvRecord> rows() throws IOException {
        Reader file = new InputStreamReader(
                Objects.requireNonNull(UnitsValidationTest.class.getResourceAsStream("units-nist-sp811.csv")),
                StandardCharsets.UTF_8);
        try (CsvReader<NamedCsvRecord> csv =
                CsvReader.builder().commentStrategy(CommentStrategy.SKIP).ofNamedCsvRecord(file)) {
            return csv.stream().toList();
        }
    }

    @ParameterizedTest
    @MethodSource("rows")
    void aFactorIsTheDoubleNearestToItsDefinition(NamedCsvRecord row) {
        Unit unit = Unit.named(row.getField("symbol"));
        BigDecimal exact = new BigDecimal(row.getField("numerator"))
                .divide(new BigDecimal(row.getField("denominator")), new MathContext(50));
        assertEquals(exact.doubleValue(), unit.scale(), row.getField("entry"));
        assertEquals(row.getField("coherent"), unit.coherent().symbol());
        assertEquals(0, unit.offset());
    }

    @ParameterizedTest
    @MethodSource("rows")
    void aFactorRoundsToWhatThePublicationPrints(NamedCsvRecord row) {
        String printed = row.getField("printed");
        double factor = Unit.named(row.getField("symbol")).scale();
        if (!printed.isEmpty()) {
            BigDecimal value = new BigDecimal(printed);
            double halfUnit = 0.5 * Math.max(value.ulp().doubleValue(), 1e-7 * Math.abs(value.doubleValue()));
            assertEquals(value.doubleValue(), factor, halfUnit, row.getField("entry"));
        }
    }

    @Test
    void everyUnitWithAFactorIsInTheTable() throws IOException {
        Set<String> checked = new TreeSet<>();
        rows().forEach(row -> checked.add(row.getField("symbol")));
        List<String> unchecked = Unit.all().stream()
                .filter(unit -> !unit.isCoherent() && unit.offset() == 0)
                .map(Unit::symbol)
                .filter(symbol -> !checked.contains(symbol) && !symbol.equals("rad"))
                .toList();
        assertEquals(List.of(), unchecked);
    }

    /** NIST SP 811, B.8: "degree Celsius", "degree Fahrenheit", "degree Rankine" to kelvin. */
    @Test
    void temperaturesHaveTheirZerosWhereThePublicationHasThem() {
        assertEquals(273.15, Unit.named("degC").toCoherent(0));
        assertEquals(373.15, Unit.named("degC").toCoherent(100));
        assertEquals((68 + 459.67) / 1.8, Unit.named("degF").toCoherent(68), 1e-13);
        assertEquals(273.15, Unit.named("degF").toCoherent(32), 1e-13);
        assertEquals(288.15, Unit.named("degR").toCoherent(518.67), 1e-13);
    }

    /** NIST SP 811, B.8: degree (angle) is 1.745 329 E-02 rad; the other way round here. */
    @Test
    void aRadianIsTheInverseOfADegree() {
        assertEquals(180 / Math.PI, Unit.named("rad").scale());
        assertEquals(1.745329e-2, 1 / Unit.named("rad").scale(), 0.5e-8);
    }

    /** The gas constant of air in the units of US handbooks: 53.35 and 1716 (common practice, from memory). */
    @Test
    void theGasConstantOfAirComesOutAsHandbooksPrintIt() {
        assertEquals(53.35, Unit.named("ft.lbf/(lbm.R)").fromCoherent(287.05), 0.005);
        assertEquals(1716, Unit.named("ft.lbf/(slug.R)").fromCoherent(287.05), 1);
        assertTrue(Unit.named("ft2/(s2 R)").equals(Unit.named("ft.lbf/(slug.R)")));
    }
}
