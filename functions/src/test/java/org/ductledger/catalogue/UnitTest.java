package org.ductledger.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class UnitTest {
    private static String refusal(String symbol) {
        return String.valueOf(assertThrows(UnknownUnitException.class, () -> Unit.named(symbol))
                .getMessage());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "Pa|Pa kPa MPa bar atm psi psia hPa mbar psf lbf/in2",
                "K|K degC degF R degR °C °F °R",
                "m|m mm cm in ft km",
                "m2|m2 cm2 mm2 in2 ft2",
                "kg/s|kg/s g/s kg/h lbm/s lb/s kg/min",
                "m/s|m/s ft/s km/h",
                "N|N kN lbf",
                "kg/m3|kg/m3 lbm/ft3 slug/ft3",
                "deg|deg rad °",
            })
    void whatEngineersTypeIsKnown(String coherent, String symbols) {
        for (String symbol : symbols.split(" ", -1)) {
            assertEquals(coherent, Unit.named(symbol).coherent().symbol(), symbol);
        }
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "J/(kg K)",
                "J/kg/K",
                "J/(kg.K)",
                "kJ/(kg K)",
                "ft.lbf/(slug.R)",
                "ft lbf/(slug R)",
                "ft.lbf/(lbm.R)",
                "Btu/(lbm.R)",
                "m2/(s2 K)"
            })
    void aGasConstantMayBeTypedInMoreThanOneWay(String symbol) {
        assertEquals("J/(kg K)", Unit.named(symbol).coherent().symbol());
    }

    @ParameterizedTest
    @CsvSource({
        "psig,psi",
        "PSIG,psi",
        "barg,bar",
        "bar(g),bar",
        "bar (g),bar",
        "bar_g,bar",
        "bar g,bar",
        "kPag,kPa",
        "kPa gauge,kPa",
        "psi gauge,psi",
        "mbarg,mbar",
        "Pag,Pa"
    })
    void aGaugeUnitIsRefusedWithItsReason(String gauge, String absolute) {
        String message = refusal(gauge);
        assertTrue(message.startsWith(gauge + " is a gauge unit: the pressures here are absolute"), message);
        assertTrue(message.endsWith("give the sum in " + absolute), message);
    }

    @ParameterizedTest
    @CsvSource({"kpa,kPa", "PSI,psi", "degc,degC", "kg/hr,kg/h", "inch,in", "lbm/sec,lbm/s"})
    void aMistypedUnitIsAnsweredWithWhatIsNear(String typed, String meant) {
        String message = refusal(typed);
        assertTrue(message.startsWith("the unit '" + typed + "' is not known"), message);
        assertTrue(message.contains(meant), message);
    }

    @ParameterizedTest
    @ValueSource(strings = {"", " ", "q", "furlong/fortnight", "kg "})
    void anUnknownUnitIsRefused(String typed) {
        assertThrows(UnknownUnitException.class, () -> Unit.named(typed));
    }

    @Test
    void anAbsurdlyLongUnitIsCutInTheMessage() {
        String message = refusal("x".repeat(100_000));
        assertTrue(message.length() < 100, message);
    }

    @Test
    void aTemperatureDifferenceIsNoTemperature() {
        assertFalse(Unit.named("delta_degC").measuresSameKindAs(Unit.named("degC")));
        assertFalse(Unit.named("delta_K").measuresSameKindAs(Unit.named("K")));
        assertEquals(10, Unit.named("delta_degC").toCoherent(10));
        assertEquals(10, Unit.named("delta_degF").toCoherent(18), 1e-15);
    }

    @Test
    void kindsAreToldApart() {
        assertFalse(Unit.named("deg").measuresSameKindAs(Unit.ONE));
        assertFalse(Unit.named("m").measuresSameKindAs(Unit.named("m2")));
        assertTrue(Unit.named("psi").measuresSameKindAs(Unit.named("bar")));
        assertSame(Unit.named("Pa"), Unit.named("psi").coherent());
    }

    @Test
    void goingThereAndBackKeepsTheValue() {
        for (Unit unit : Unit.all()) {
            for (double x : new double[] {0, 1, -1, 20, 98.6, 1013.25, 1e-6, 1e9}) {
                double scale = Math.max(Math.abs(x), Math.abs(unit.offset()));
                assertEquals(x, unit.fromCoherent(unit.toCoherent(x)), 2 * Math.ulp(scale), unit + " " + x);
            }
        }
    }

    @Test
    void everySymbolIsItsOwnAndEveryKindBeginsWithItsCoherentUnit() {
        Set<String> symbols = new HashSet<>();
        Set<String> kinds = new HashSet<>();
        List<Unit> all = Unit.all();
        for (Unit unit : all) {
            assertTrue(symbols.add(unit.symbol()), unit.symbol());
            assertTrue(!kinds.add(unit.coherent().symbol()) || unit.isCoherent(), unit.symbol());
            assertSame(unit, Unit.named(unit.symbol()));
        }
        assertTrue(all.stream().filter(Unit::isCoherent).allMatch(u -> u.scale() == 1 && u.offset() == 0));
    }
}
