package org.ductledger.batch;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Given;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class TypedTest {
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
        2.5           | 2.5     |
        2,5           | 2.5     |
        -0,25         | -0.25   |
        .5            | 0.5     |
        ,5            | 0.5     |
        5.            | 5       |
        +1e3          | 1000    |
        1,5E-3        | 0.0015  |
        7 bar         | 7       | bar
        7bar          | 7       | bar
        7,5bar        | 7.5     | bar
        1E3K          | 1000    | K
        12ft.lbf/(slug.R) | 12  | ft.lbf/(slug.R)
        0             | 0       |
        -0.0e5        | -0.0    |
        1,234.5       | 1.234   | .5
        1.234,5       | 1.234   | ,5
        """)
    void readsACellsNumberWithEitherDecimalSign(String text, double value, @Nullable String unit)
            throws DocumentRefusedException {
        Given.Values read = Typed.cell("x", text);
        assertArrayEquals(new double[] {value}, ((Column.Numbers) read.column()).values());
        assertEquals(unit, read.unit());
    }

    @ParameterizedTest
    @ValueSource(strings = {"subsonic", "NaN", "Infinity", "-Infinity", "-", ".", "#VALUE!", "e5", "--1"})
    void whatBeginsAsNoNumberIsAWord(String text) throws DocumentRefusedException {
        assertEquals(List.of(text), ((Column.Texts) Typed.cell("x", text).column()).values());
        assertEquals(List.of(text), ((Column.Texts) Typed.list("x", text).column()).values());
    }

    @Test
    void readsListsWithOneUnitAfterTheLast() throws DocumentRefusedException {
        Given.Values read = Typed.list("p0", "1, 2.5,3e2 bar");
        assertArrayEquals(new double[] {1, 2.5, 300}, ((Column.Numbers) read.column()).values());
        assertEquals("bar", read.unit());
        assertEquals(false, read.spread());
        assertEquals(true, Typed.list("p0", "7bar").spread());
        assertEquals(
                List.of("weak", "strong"),
                ((Column.Texts) Typed.list("branch", "weak, strong").column()).values());
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "  ", "1,,2", "1,", "1e400", "1e-400", "1 bar,2", "weak,", "1,weak"})
    void refusesNamingTheArgument(String text) {
        DocumentRefusedException refused = assertThrows(DocumentRefusedException.class, () -> Typed.list("p0", text));
        assertTrue(refused.reasons().get(0).detail().startsWith("p0"));
    }
}
