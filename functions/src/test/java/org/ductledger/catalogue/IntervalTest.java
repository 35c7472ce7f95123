package org.ductledger.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

class IntervalTest {
    private static final double INFINITE = Double.POSITIVE_INFINITY;

    @Test
    void anEndIsTakenOrLeftOut() {
        Interval gamma = Interval.openClosed(1, 2);
        assertFalse(gamma.contains(1));
        assertTrue(gamma.contains(Math.nextUp(1.0)));
        assertTrue(gamma.contains(2));
        assertFalse(gamma.contains(Math.nextUp(2.0)));
        Interval right = Interval.closedOpen(0, 1);
        assertTrue(right.contains(0));
        assertTrue(right.contains(-0.0));
        assertFalse(right.contains(-Double.MIN_VALUE));
        assertFalse(right.contains(1));
    }

    @Test
    void neitherNaNNorInfinityIsEverInside() {
        for (Interval interval : List.of(
                Interval.anyNumber(),
                Interval.atLeast(0),
                Interval.above(0),
                Interval.atMost(0),
                Interval.open(0, 1))) {
            assertFalse(interval.contains(Double.NaN), interval.toString());
            assertFalse(interval.contains(INFINITE), interval.toString());
            assertFalse(interval.contains(-INFINITE), interval.toString());
        }
        assertTrue(Interval.anyNumber().contains(-Double.MAX_VALUE));
        assertTrue(Interval.above(0).contains(Double.MIN_VALUE));
        assertTrue(Interval.atLeast(0).contains(Double.MAX_VALUE));
    }

    @Test
    void theEndsAreSaidInWordsAndInTheUnitGiven() {
        assertEquals(
                "greater than 1 and at most 100", Interval.openClosed(1, 100).inWords(Unit.ONE));
        assertEquals("at least 0 Pa", Interval.atLeast(0).inWords(Unit.named("Pa")));
        assertEquals("greater than -273.15 degC", Interval.above(0).inWords(Unit.named("degC")));
        assertEquals("greater than -459.67 degF", Interval.above(0).inWords(Unit.named("degF")));
        assertEquals("at most 1000 mm", Interval.atMost(1).inWords(Unit.named("mm")));
        assertEquals("less than 90 deg", new Interval(-INFINITE, false, 90, false).inWords(Unit.named("deg")));
        assertEquals("a finite number", Interval.anyNumber().inWords(Unit.ONE));
    }

    @Test
    void anIntervalWithoutANumberIsRefused() {
        assertThrows(IllegalArgumentException.class, () -> Interval.closed(2, 1));
        assertThrows(IllegalArgumentException.class, () -> Interval.open(1, 1));
        assertThrows(IllegalArgumentException.class, () -> Interval.open(1, Math.nextUp(1.0)));
        assertThrows(IllegalArgumentException.class, () -> Interval.closed(Double.NaN, 1));
        assertThrows(IllegalArgumentException.class, () -> Interval.closed(0, INFINITE));
        assertThrows(IllegalArgumentException.class, () -> Interval.closed(-INFINITE, 0));
        assertTrue(Interval.closed(1, 1).contains(1));
    }
}
