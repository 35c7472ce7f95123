package org.ductledger.flow;

import org.ductledger.numeric.Degrees;

/**
 * Finds the shock of a cone. The strength of a shock is here the fourth root of (sin^2(shock angle) - 1/M1^2) / (1 -
 * 1/M1^2), 0 for a Mach wave and 1 for a normal shock: the cone's angle grows with it in proportion at first, is greatest
 * at some strength, and falls to 0 for the strong shocks beyond.
 *
 * @param strength the strength at which the half angle is greatest
 * @param halfAngle the greatest half angle of a cone with an attached shock, in degrees
 */
record ConeShock(double strength, double halfAngle) {
    /** Below this M1^2 sin^2(shock angle) - 1 the shock changes nothing to the last digit. */
    private static final double NO_SHOCK = 1e-60;

    private static final double LAST_INTERVAL = 1e-3;
    private static final double ACCURACY = 2e-13;
    private static final double LAST_BRACKET = 0x1p-51;
    private static final int MOST_STEPS = 100;

    private static double halfAngle(double mach1, double gamma, double strength) {
        return Degrees.ofCotangent(new ConeFlow(mach1, gamma, strength).wallCotangent());
    }

    /** The strength of which the cosine of the shock angle is this part of that of a Mach wave. */
    private static double ofCosine(double part) {
        return Math.sqrt(Math.sqrt((1 - part) * (1 + part)));
    }

    /**
     * The greatest cone with an attached shock: the vertex of a parabola through three points, drawn in by and by, over
     * the logarithm of the cosine of the shock angle.
     */
    static ConeShock greatest(double mach1, double gamma) {
        if (mach1 == 1) {
            return new ConeShock(0, 0);
        }
        double angle = ObliqueLimits.angleAtDeflectionMax(mach1, gamma);
        double part = 0.9 * Degrees.cos(angle) / Degrees.cos(Isentropic.machAngle(mach1));
        double interval = 0.2;
        double best = halfAngle(mach1, gamma, ofCosine(part));
        for (int i = 0; i < MOST_STEPS && interval >= LAST_INTERVAL; i++) {
            double stretch = 1 + interval;
            double low = halfAngle(mach1, gamma, ofCosine(part / stretch));
            double high = halfAngle(mach1, gamma, ofCosine(Math.min(part * stretch, 0.5 + 0.5 * part)));
            double bend = 2 * best - low - high;
            double shift = 0.5 * (high - low) / bend;
            double moved = bend > 0 ? Math.max(-2, Math.min(2, shift)) : Math.copySign(2, high - low);
            part *= StrictMath.pow(stretch, moved);
            best = halfAngle(mach1, gamma, ofCosine(part));
            interval *= Math.abs(moved) < 1 ? 0.1 : 1;
        }
        return new ConeShock(ofCosine(part), best);
    }

    /** The strength of the weak shock of a cone, with its half angle in degrees; NaN if it has none. */
    static double strength(double mach1, double halfAngle, double gamma) {
        if (halfAngle < ObliqueLimits.deflectionMax(mach1, gamma)) {
            return slender(mach1, halfAngle, gamma);
        }
        ConeShock most = greatest(mach1, gamma);
        if (!(halfAngle <= most.halfAngle)) {
            return Double.NaN;
        }
        return halfAngle == most.halfAngle ? most.strength : most.weaker(mach1, halfAngle, gamma);
    }

    /** A cone's shock is weaker than that of a wedge of the same angle, which ends the search. */
    private static double slender(double mach1, double halfAngle, double gamma) {
        double wedge = ObliqueAngle.shockAngle(mach1, halfAngle, gamma, ObliqueAngle.WEAK);
        double cosine = Degrees.cos(wedge) / Degrees.cos(Isentropic.machAngle(mach1));
        double strength = ofCosine(Math.min(1, cosine));
        return strength == 0
                ? 0
                : new ConeShock(strength, halfAngle(mach1, gamma, strength)).weaker(mach1, halfAngle, gamma);
    }

    /** z = sqrt(1 - angle/greatest angle) falls nearly in proportion from 1 at no strength to 0 at the greatest angle. */
    private double z(double angle) {
        return Math.sqrt(Math.max(0, (halfAngle - angle) / halfAngle));
    }

    /** By secants within a bracket of z. */
    private double weaker(double mach1, double wanted, double gamma) {
        double target = z(wanted);
        double below = 0;
        double above = strength;
        double last = above;
        double lastExcess = target;
        double next = above * (wanted / halfAngle) / (1 + target);
        for (int i = 0; i < MOST_STEPS; i++) {
            double scale = next * next * mach1;
            if (scale * scale * (1 - 1 / mach1) < NO_SHOCK) {
                return 0;
            }
            double angle = halfAngle(mach1, gamma, next);
            double excess = (angle - wanted) / halfAngle / (z(angle) + target);
            below = excess <= 0 ? next : below;
            above = excess >= 0 ? next : above;
            if (Math.abs(angle - wanted) <= ACCURACY * wanted || above - below <= LAST_BRACKET * above) {
                return next;
            }
            double secant = next - excess * (next - last) / (excess - lastExcess);
            last = next;
            lastExcess = excess;
            next = secant > below && secant < above ? secant : 0.5 * (below + above);
        }
        return Double.NaN;
    }
}
