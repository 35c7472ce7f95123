package org.ductledger.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Random;
import org.junit.jupiter.api.Test;

/** Constants in formulas give the same double back. */
final class LiteralsTest {
    @Test
    void theShortestDecimalIsTaken() {
        assertEquals("1.4", Literals.number(1.4));
        assertEquals("0", Literals.number(0));
        assertEquals("-0.001", Literals.number(-0.001));
        assertEquals("100", Literals.number(100));
        assertEquals("0.30000000000000004", Literals.number(0.1 + 0.2));
        assertEquals("1E-300", Literals.number(1e-300));
    }

    @Test
    void everyDoubleComesBack() {
        Random random = new Random(17);
        for (int i = 0; i < 10_000; i++) {
            double x = Double.longBitsToDouble(random.nextLong());
            if (Double.isFinite(x)) {
                assertEquals(x, Double.parseDouble(Literals.number(x)));
            }
        }
    }

    @Test
    void quotesInWordsAreDoubled() {
        assertEquals("\"say \"\"no\"\"\"", Literals.text("say \"no\""));
    }
}
