package org.ductledger.flow;

import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.Kernel;
import org.ductledger.numeric.Power;

/**
 * The shock tube: a driver gas (4) at rest and a driven gas (1) at rest, the shock that runs into the driven gas when the
 * diaphragm between them is gone, and the expansion that runs into the driver gas.
 *
 * <p>In x = M1^2 - 1 and q = M1 - 1/M1, with b = 2 gamma1/(gamma1+1), n = 2 gamma4/(gamma4-1) and k = (gamma4-1)/(gamma1+1)
 * a1/a4: p4/p1 = (1 + b x) (1 - k q)^-n, the shock's pressure ratio times the expansion's.
 */
final class ShockTube {
    private static final int MOST_STEPS = 60;

    private static final int CELL_STEPS = 8;

    /** After a step this small, of the logarithm of the shock's pressure ratio, nine digits are right. */
    private static final double LAST_STEP = 1e-4;

    /** A greater excess is that of a shock a last digit short of its limit, where the ratio has no digits. */
    private static final double MOST_EXCESS = 1e-3;

    private static final double LARGEST_FRACTION = 1 - 0x1p-53;

    private ShockTube() {}

    private static double k(double gamma1, double gamma4, double a4OverA1) {
        return (gamma4 - 1) / ((gamma1 + 1) * a4OverA1);
    }

    private static double n(double gamma4) {
        return 2 * gamma4 / (gamma4 - 1);
    }

    /** M - 1/M. */
    private static double q(double mach1) {
        return (mach1 - 1) / mach1 * (mach1 + 1);
    }

    static double p4OverP1(double mach1, double gamma1, double gamma4, double a4OverA1) {
        double w = k(gamma1, gamma4, a4OverA1) * q(mach1);
        double head = 1 - w;
        if (!(head > 0)) {
            return Double.NaN;
        }
        double n = n(gamma4);
        double nTail = Math.fma(-n, gamma4 - 1, 2 * gamma4) / (gamma4 - 1);
        return NormalShock.p2OverP1(mach1, gamma1) * Power.of(head, (1 - head) - w, -n, -nTail);
    }

    /** The Mach number of the shock if the driver gas expanded into vacuum: k q = 1. */
    static double mach1Limit(double gamma1, double gamma4, double a4OverA1) {
        double half = 0.5 / k(gamma1, gamma4, a4OverA1);
        return half + StrictMath.hypot(half, 1);
    }

    /**
     * The shock's Mach number, solved for s = ln(p2/p1): s - n ln(1 - k q(s)) = ln(p4/p1). The left side grows and bends
     * up, so that the steps, of Halley but at most twice those of Newton, come down from a start above the root.
     */
    static double mach1(double p4OverP1, double gamma1, double gamma4, double a4OverA1) {
        double b = NormalShock.b(gamma1);
        double n = n(gamma4);
        double k = k(gamma1, gamma4, a4OverA1);
        double whole = StrictMath.log(p4OverP1);
        double s = Math.min(whole, shockAlone(-StrictMath.expm1(-whole / n) / k, b));
        for (int i = 0; i < MOST_STEPS; i++) {
            double x = StrictMath.expm1(s) / b;
            double m = Math.sqrt(1 + x);
            double w = Math.min(k * x / m, LARGEST_FRACTION);
            double growth = (x + 1 / b) / m;
            double slope = n * k / (1 - w) * growth * (0.5 + 0.5 / (1 + x));
            double bend = slope * (slope / n + 1 - 0.25 * growth / m * (x + 4) / (0.5 * x + 1)) / (1 + slope);
            double step = (s - n * StrictMath.log1p(-w) - whole) / (1 + slope);
            s -= step / (1 - 0.5 * Math.min(1, step * bend));
            if (Math.abs(step) <= LAST_STEP * s) {
                return refined(Math.sqrt(1 + StrictMath.expm1(s) / b), p4OverP1, gamma1, gamma4, a4OverA1);
            }
        }
        return Double.NaN;
    }

    /** A step by the ratio itself, which has more digits than its logarithm. */
    private static double refined(double mach1, double p4OverP1, double gamma1, double gamma4, double a4OverA1) {
        double excess = p4OverP1(mach1, gamma1, gamma4, a4OverA1) / p4OverP1 - 1;
        return Math.abs(excess) < MOST_EXCESS
                ? Math.max(1, mach1 - excess / growth(mach1, gamma1, gamma4, a4OverA1))
                : mach1;
    }

    /** ln(p2/p1) of the shock with this q. */
    private static double shockAlone(double q, double b) {
        double half = 0.5 * q;
        return StrictMath.log1p(b * q * (half + Math.sqrt(1 + half * half)));
    }

    /** d ln(p4/p1)/d M1. */
    private static double growth(double mach1, double gamma1, double gamma4, double a4OverA1) {
        double k = k(gamma1, gamma4, a4OverA1);
        double ofShock = NormalShockSlopes.p2OverP1ByMach(mach1, gamma1) / NormalShock.p2OverP1(mach1, gamma1);
        return ofShock + n(gamma4) * k * (1 + 1 / mach1 / mach1) / (1 - k * q(mach1));
    }

    /** d ln(p4/p1)/d ln w, with w = k q. */
    private static double expansion(double mach1, double gamma1, double gamma4, double a4OverA1) {
        double w = k(gamma1, gamma4, a4OverA1) * q(mach1);
        return n(gamma4) * w / (1 - w);
    }

    private static double logByGamma1(double mach1, double gamma1, double gamma4, double a4OverA1) {
        double ofShock = NormalShockSlopes.p2OverP1ByGamma(mach1, gamma1) / NormalShock.p2OverP1(mach1, gamma1);
        return ofShock - expansion(mach1, gamma1, gamma4, a4OverA1) / (gamma1 + 1);
    }

    private static double logByGamma4(double mach1, double gamma1, double gamma4, double a4OverA1) {
        double w = k(gamma1, gamma4, a4OverA1) * q(mach1);
        double d = gamma4 - 1;
        return (expansion(mach1, gamma1, gamma4, a4OverA1) + 2 * StrictMath.log1p(-w) / d) / d;
    }

    private static double logByA4(double mach1, double gamma1, double gamma4, double a4OverA1) {
        return -expansion(mach1, gamma1, gamma4, a4OverA1) / a4OverA1;
    }

    /** The partial derivatives of p4/p1, in the order of its arguments. */
    static Kernel[] ofRatio() {
        return new Kernel[] {
            ratioTimes(ShockTube::growth),
            ratioTimes(ShockTube::logByGamma1),
            ratioTimes(ShockTube::logByGamma4),
            ratioTimes(ShockTube::logByA4)
        };
    }

    private static Kernel ratioTimes(Kernel.Of4 logarithmic) {
        return Kernel.of((mach1, gamma1, gamma4, a4OverA1) ->
                p4OverP1(mach1, gamma1, gamma4, a4OverA1) * logarithmic.at(mach1, gamma1, gamma4, a4OverA1));
    }

    /** The partial derivatives of the inverse. */
    static Kernel[] ofMach() {
        return new Kernel[] {
            machFrom((m, g1, g4, a) -> -1 / p4OverP1(m, g1, g4, a)),
            machFrom(ShockTube::logByGamma1),
            machFrom(ShockTube::logByGamma4),
            machFrom(ShockTube::logByA4)
        };
    }

    private static Kernel machFrom(Kernel.Of4 logarithmic) {
        return Kernel.of((p4OverP1, gamma1, gamma4, a4OverA1) -> {
            double mach1 = mach1(p4OverP1, gamma1, gamma4, a4OverA1);
            return -logarithmic.at(mach1, gamma1, gamma4, a4OverA1) / growth(mach1, gamma1, gamma4, a4OverA1);
        });
    }

    /** The inverse's steps in cells. */
    static CellForm cells() {
        CellForm.Builder cells = CellForm.steps()
                .helper("b", "2*{gamma1}/({gamma1}+1)")
                .helper("n", "2*{gamma4}/({gamma4}-1)")
                .helper("k", "({gamma4}-1)/(({gamma1}+1)*{a4_over_a1})")
                .helper("whole", "LN({p4_over_p1})")
                .helper("q", "(1-EXP(0-{whole}/{n}))/{k}")
                .helper("s0", "MIN({whole},LN(1+{b}*{q}*({q}/2+SQRT(1+{q}^2/4))))");
        for (int i = 1; i <= CELL_STEPS; i++) {
            String s = "{s" + (i - 1) + "}";
            String m = "{m" + i + "}";
            String w = "{w" + i + "}";
            cells.helper("m" + i, "SQRT(1+(EXP(" + s + ")-1)/{b})")
                    .helper("w" + i, "MIN(1-1E-15,{k}*(" + m + "-1/" + m + "))")
                    .helper("t" + i, "{n}*{k}/(1-" + w + ")*EXP(" + s + ")/{b}*(1+1/" + m + "^2)/(2*" + m + ")")
                    .helper("s" + i, s + "-(" + s + "-{n}*LN(1-" + w + ")-{whole})/(1+{t" + i + "})");
        }
        return cells.result("SQRT(1+(EXP({s" + CELL_STEPS + "})-1)/{b})");
    }
}
