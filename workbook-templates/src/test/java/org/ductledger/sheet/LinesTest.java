package org.ductledger.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/** How many lines a wrapped text takes. */
final class LinesTest {
    private static int lines(String text, int width) {
        return Lines.needed(text, width, Look.Font.PLAIN.points);
    }

    @Test
    void wordsBreakAtTheEndOfALine() {
        assertEquals(1, lines("", 12));
        assertEquals(1, lines("ten digits", 12));
        assertEquals(2, lines("eleven, digits", 12));
        assertEquals(3, lines("one two\nthree\nfour", 20));
    }

    @Test
    void aLongWordBreaksWhereItMust() {
        assertEquals(6, lines("a".repeat(64), 12));
        assertEquals(7, lines("so " + "a".repeat(64), 12));
    }

    @Test
    void smallLettersTakeFewerLines() {
        String text = "a word ".repeat(30);
        assertTrue(Lines.needed(text, 20, Look.Font.SMALL.points) < Lines.needed(text, 20, Look.Font.TITLE.points));
    }
}
