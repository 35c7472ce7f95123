package org.ductledger.numeric;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.stream.IntStream;
import org.ductledger.exact.FortyDigits;
import org.hipparchus.dfp.Dfp;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Derives the table of logarithms again, to the bit. */
class Log2TableTest {
    static IntStream bins() {
        return IntStream.range(0, 128);
    }

    @ParameterizedTest
    @MethodSource("bins")
    void holdsTheLogarithmOfEachBinsReciprocal(int bin) {
        double centre = 1 + (bin + 0.5) / 128;
        double reciprocal = Math.rint(1024 / centre) / 1024;
        Dfp logarithm = FortyDigits.log(FortyDigits.of(reciprocal)).negate().divide(FortyDigits.log(FortyDigits.of(2)));
        double head = Math.rint(logarithm.toDouble() * 0x1p40) / 0x1p40;
        double tail = logarithm.subtract(FortyDigits.of(head)).toDouble();

        assertEquals(reciprocal, Log2Table.ROWS[4 * bin], "reciprocal");
        assertEquals(head, Log2Table.ROWS[4 * bin + 1], "head");
        assertEquals(tail, Log2Table.ROWS[4 * bin + 2], "tail");
    }
}
