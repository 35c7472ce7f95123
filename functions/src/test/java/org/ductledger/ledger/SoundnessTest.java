package org.ductledger.ledger;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.ductledger.catalogue.Interval;
import org.junit.jupiter.api.Test;

class SoundnessTest {
    private static final double[] TRIED = {
        0,
        Double.MIN_VALUE,
        Double.MIN_NORMAL,
        0.5,
        1,
        1.5,
        2,
        1e300,
        Double.MAX_VALUE,
        Double.POSITIVE_INFINITY,
        Double.NaN
    };

    /** A NaN with every bit set, sign included, as a file can carry it. */
    private static final double NEGATIVE_NAN = Double.longBitsToDouble(-1);

    private static boolean within(Interval interval, double x) {
        return Soundness.allWithin(interval.least(), interval.greatest(), new double[] {x}, 0, 1);
    }

    @Test
    void itAgreesWithTheInterval() {
        Interval[] intervals = {
            Interval.atLeast(0), Interval.above(0), Interval.closed(1, 2), Interval.openClosed(1, 2),
            Interval.open(0.5, 1e300), Interval.anyNumber(), Interval.closed(-2, 1), Interval.atMost(-1)
        };
        for (Interval interval : intervals) {
            for (double end : new double[] {interval.least(), interval.greatest()}) {
                for (double x : new double[] {end, Math.nextUp(end), Math.nextDown(end)}) {
                    assertAgrees(interval, x);
                }
            }
            for (double x : TRIED) {
                assertAgrees(interval, x);
                assertAgrees(interval, -x);
            }
            assertFalse(within(interval, NEGATIVE_NAN), interval.toString());
        }
    }

    private static void assertAgrees(Interval interval, double x) {
        boolean minusZero = x == 0 && Double.compare(x, 0) < 0;
        assertEquals(
                interval.contains(x) && !(minusZero && interval.least() == 0),
                within(interval, x),
                () -> x + " in " + interval);
    }

    @Test
    void onlyTheStretchIsLookedAt() {
        double[] column = {-1, 1, 2, 3, Double.NaN};
        assertTrue(Soundness.allWithin(0, 5, column, 1, 4));
        assertFalse(Soundness.allWithin(0, 5, column, 0, 4));
        assertFalse(Soundness.allWithin(0, 5, column, 1, 5));
        assertTrue(Soundness.allFinite(column, 0, 4));
        assertFalse(Soundness.allFinite(column, 0, 5));
    }

    @Test
    void oneNumberThatIsNotFiniteIsSeenWhereverItStands() {
        for (int rows = 1; rows < 6; rows++) {
            for (int at = 0; at < rows; at++) {
                for (double bad : new double[] {Double.NaN, 1 / 0.0, -1 / 0.0}) {
                    double[] column = new double[rows];
                    assertTrue(Soundness.allFinite(column, 0, rows));
                    column[at] = bad;
                    assertFalse(Soundness.allFinite(column, 0, rows), at + " of " + rows);
                }
            }
        }
        assertTrue(Soundness.allFinite(new double[] {Double.MAX_VALUE, -Double.MAX_VALUE, -0.0}, 0, 3));
    }
}
