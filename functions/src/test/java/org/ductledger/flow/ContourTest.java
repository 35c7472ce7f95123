package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class ContourTest {
    private static final double DIVERGING = 1 - Arguments.CONVERGING;

    @Test
    void aConeHasADiameterLinearInX() {
        double throat = 0.02;
        double end = 0.05;
        double opening = 0.3;
        double diameter = throat + opening * (end - throat);
        double ratio = (end / throat) * (end / throat);
        assertEquals((diameter / throat) * (diameter / throat), Contour.areaRatio(opening, DIVERGING, 9, ratio), 1e-14);
    }

    @Test
    void theThroatAndTheEndsAreExact() {
        SplittableRandom random = new SplittableRandom(1);
        for (int i = 0; i < 10_000; i++) {
            double inlet = 1 + random.nextDouble() * 50;
            double exit = 1 + random.nextDouble() * 50;
            assertEquals(1, Contour.areaRatio(0, DIVERGING, inlet, exit));
            assertEquals(inlet, Contour.areaRatio(1, Arguments.CONVERGING, inlet, exit));
            assertEquals(exit, Contour.areaRatio(1, DIVERGING, inlet, exit));
            assertEquals(exit, Contour.between(1, inlet, exit));
            assertEquals(inlet, Contour.between(0, inlet, exit));
        }
    }

    @Test
    void noStationOpensBeyondItsEnd() {
        SplittableRandom random = new SplittableRandom(2);
        for (int i = 0; i < 100_000; i++) {
            double end = 1 + random.nextDouble();
            double opening = 1 - random.nextDouble() * 1e-14;
            double area = Contour.areaRatio(opening, DIVERGING, 9, end);
            assertTrue(area >= 1 && area <= end, () -> opening + " of " + end);
            double back = Contour.openingFromAreaRatio(area, end);
            assertTrue(back >= 0 && back <= 1, () -> opening + " of " + end);
        }
    }

    @Test
    void theOpeningAndThePlaceInvertTheContour() {
        SplittableRandom random = new SplittableRandom(3);
        for (int i = 0; i < 10_000; i++) {
            double opening = random.nextDouble();
            double end = 1.01 + random.nextDouble() * 20;
            double area = Contour.areaRatio(opening, DIVERGING, 9, end);
            double roundingOfArea = 2 * Math.ulp(area) * Contour.openingByArea(area, end);
            assertEquals(opening, Contour.openingFromAreaRatio(area, end), roundingOfArea + 4 * Math.ulp(opening));
            double x = Contour.between(opening, 0.1, 0.4);
            double o = Contour.between(opening, 0.25, 0.75);
            assertEquals(x, Contour.xFromOpening(o, 0, 0.1, 0.4, 0.6, 0.25, 0.75), 1e-15);
        }
    }

    @Test
    void onACylinderThePlaceNearestToTheThroatIsTaken() {
        assertEquals(0, Contour.xFromOpening(0, 0, 0.1, 0.4, 0.6, 0, 0.5));
        assertEquals(0.1, Contour.xFromOpening(0.5, 0, 0.1, 0.4, 0.6, 0.5, 0.5));
        assertEquals(0.4, Contour.xFromOpening(1, 0, 0.1, 0.4, 0.6, 0.5, 1));
    }
}
