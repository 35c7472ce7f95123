package org.ductledger.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NumbersTest {
    @ParameterizedTest
    @CsvSource({
        "1,1",
        "0,0",
        "-0.0,0",
        "0.1,0.1",
        "273.15,273.15",
        "-459.67,-459.67",
        "100000,100000",
        "1e12,1000000000000",
        "1e13,1E+13",
        "1e-5,0.00001",
        "1e-6,0.000001",
        "1e-9,1E-9",
        "1.23456789012345,1.23456789012",
        "0.30000000000000004,0.3",
        "1.7976931348623157e308,1.79769313486E+308",
        "NaN,NaN",
        "Infinity,Infinity",
        "-Infinity,-Infinity"
    })
    void aMessageShowsTwelveDigitsAtMost(double x, String shown) {
        assertEquals(shown, Numbers.brief(x));
    }
}
