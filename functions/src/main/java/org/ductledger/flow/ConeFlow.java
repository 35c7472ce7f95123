package org.ductledger.flow;

import org.ductledger.numeric.Extrapolation;

/**
 * The conical flow between a shock and the cone that it belongs to (Taylor and Maccoll), in units of the speed ahead.
 *
 * <p>Along the rays, at the angle theta from the axis, u is the velocity along the ray and w that across it, inwards. In
 * place of the textbook's pair the unknowns are c = cot(theta), P = u - w c and Q = a^2 - w^2: a flow that no shock has
 * disturbed has P = 0, and a shock without strength Q = 0, so that however weak the shock is, both are kept to their own
 * last digits. With D = a^2 P/Q the equations are, inwards, by the angle passed,
 *
 * <p>c' = 1 + c^2, P' = c (P + D), Q' = w (2 u + (gamma+1) D), w' = -(u + D), a^2 = Q + w^2.
 *
 * <p>From the shock on ln P is the independent variable, in which both the layer behind a weak shock and the flow far from
 * a slender cone are smooth; near the wall it is w, which is 0 there.
 */
final class ConeFlow {
    private static final double TOLERANCE = 1e-13;

    /** Where w takes over from ln P: P has grown to this part of the speed behind the shock. */
    private static final double CHANGE = 0.2;

    private final double gamma;
    private final double soundSquaredBehindShock;
    private final double speedBehindShock;
    private final double[] wall;

    /**
     * The flow behind a shock.
     *
     * @param strength greater than 0 and less than 1, see {@link ConeShock}
     */
    ConeFlow(double mach1, double gamma, double strength) {
        double i = 1 / mach1 / mach1;
        double beyond = beyond(mach1, strength);
        double sin2 = i + beyond;
        double across = Math.sqrt(sin2) * (NormalShock.c(gamma) + NormalShock.d(gamma) * i / sin2);
        double p = NormalShock.d(gamma) * cosine(mach1, strength) * beyond / sin2;
        double q = across * across * (beyond / (i + NormalShock.c(gamma) * beyond));
        this.gamma = gamma;
        soundSquaredBehindShock = q + across * across;
        speedBehindShock = Math.sqrt(cosine(mach1, strength) * cosine(mach1, strength) + across * across);
        wall = atWall(new double[] {shockCotangent(mach1, strength), p, q, across});
    }

    /** 1 - 1/M1^2. */
    private static double most(double mach1) {
        return (mach1 - 1) / mach1 * ((mach1 + 1) / mach1);
    }

    /** sin^2(shock angle) - 1/M1^2. */
    private static double beyond(double mach1, double strength) {
        double root = strength * strength;
        return most(mach1) * root * root;
    }

    private static double cosine(double mach1, double strength) {
        double root = strength * strength;
        return Math.sqrt(most(mach1) * (1 - root) * (1 + root));
    }

    static double shockCotangent(double mach1, double strength) {
        return cosine(mach1, strength) / Math.sqrt(1 / mach1 / mach1 + beyond(mach1, strength));
    }

    /** M1 sin(shock angle). */
    static double normalMach(double mach1, double strength) {
        return Math.max(1, mach1 * Math.sqrt(1 / mach1 / mach1 + beyond(mach1, strength)));
    }

    /** The unknowns at the wall, NaN if they were not reached. */
    private double[] atWall(double[] y) {
        double change = CHANGE * speedBehindShock;
        boolean reached = true;
        if (y[1] < change) {
            double length = StrictMath.log(change / y[1]);
            reached = new Extrapolation(this::byLogOfP, 4, TOLERANCE).run(y, length, 0.5);
        }
        double[] inner = {y[0], y[1], y[2]};
        reached &= new Extrapolation(this::byW, 3, TOLERANCE).run(inner, y[3], 0.5 * y[3]);
        return reached ? inner : new double[] {Double.NaN, Double.NaN, Double.NaN};
    }

    private void byLogOfP(double left, double[] y, double[] slopes) {
        double u = y[1] + y[3] * y[0];
        double d = (y[2] + y[3] * y[3]) * y[1] / y[2];
        double scale = y[1] / (y[0] * (y[1] + d));
        slopes[0] = (1 + y[0] * y[0]) * scale;
        slopes[1] = y[1];
        slopes[2] = y[3] * (2 * u + (gamma + 1) * d) * scale;
        slopes[3] = -(u + d) * scale;
    }

    private void byW(double w, double[] y, double[] slopes) {
        double u = y[1] + w * y[0];
        double d = (y[2] + w * w) * y[1] / y[2];
        double scale = 1 / (u + d);
        slopes[0] = (1 + y[0] * y[0]) * scale;
        slopes[1] = y[0] * (y[1] + d) * scale;
        slopes[2] = w * (2 * u + (gamma + 1) * d) * scale;
    }

    double wallCotangent() {
        return wall[0];
    }

    double wallMach() {
        return wall[1] / Math.sqrt(wall[2]);
    }

    /** T at the wall over T behind the shock, less 1: by energy where gamma is near 1, and a^2 says little of T. */
    double heating() {
        double bySpeed = 0.5 * (gamma - 1) * (speedBehindShock - wall[1]) * (speedBehindShock + wall[1]);
        boolean nearOne = (gamma - 1) * speedBehindShock * speedBehindShock < soundSquaredBehindShock;
        return (nearOne ? bySpeed : wall[2] - soundSquaredBehindShock) / soundSquaredBehindShock;
    }
}
