package org.ductledger.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.apache.poi.ss.usermodel.DataFormatter;
import org.junit.jupiter.api.Test;

/** Six digits, whatever the magnitude. */
final class NumberFormatsTest {
    private static String shown(double x) {
        DataFormatter formatter = new DataFormatter(java.util.Locale.ROOT);
        return formatter.formatRawCellContents(x, -1, NumberFormats.of(Math.abs(x)));
    }

    @Test
    void sixDigitsAreShown() {
        assertEquals("1.40000", shown(1.4));
        assertEquals("296.800", shown(296.8));
        assertEquals("700000", shown(700_000));
        assertEquals("0.123457", shown(0.1234567));
        assertEquals("0.0123457", shown(0.01234567));
        assertEquals("1.23457E-03", shown(0.001234567));
        assertEquals("1.23457E+09", shown(1.234567e9));
        assertEquals("0.0000", shown(0));
    }

    @Test
    void aColumnGoesByItsLargestValue() {
        assertEquals(NumberFormats.of(130), NumberFormats.of(new double[] {-130, 0.01, Double.NaN, 50}));
    }
}
