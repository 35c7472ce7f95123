package org.ductledger.flow;

import java.util.SplittableRandom;

/** Draws Mach numbers and gammas for duct flow: ordinary ones, and those where a plain formula loses its digits. */
final class DuctPoints {
    private final SplittableRandom random;

    DuctPoints(long seed) {
        random = new SplittableRandom(seed);
    }

    SplittableRandom random() {
        return random;
    }

    private double between(double low, double high) {
        return low + (high - low) * random.nextDouble();
    }

    private double decade(double low, double high) {
        return StrictMath.pow(10, between(low, high));
    }

    /** From next to 1 to a hundred, most of them gases. */
    double gamma() {
        return switch (random.nextInt(8)) {
            case 0 -> 1 + decade(-9, -2);
            case 1 -> between(2, 100);
            default -> between(1.01, 1.7);
        };
    }

    /** Ordinary, about M = 1 and 1/sqrt(gamma), tiny, huge. */
    double mach(double gamma) {
        double sign = random.nextBoolean() ? 1 : -1;
        return switch (random.nextInt(8)) {
            case 0 -> 1 + sign * decade(-15, -1);
            case 1 -> (1 + sign * decade(-15, -1)) / Math.sqrt(gamma);
            case 2 -> decade(-12, -2);
            case 3 -> decade(1, 5);
            default -> decade(-2, 1);
        };
    }
}
