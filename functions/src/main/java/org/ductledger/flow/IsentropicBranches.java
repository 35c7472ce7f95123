package org.ductledger.flow;

import org.ductledger.numeric.Power;
import org.ductledger.numeric.SonicBalance;

/** The Mach number where two of them answer: from A/A*, the mass flow number, q/p0 and the impulse function. */
final class IsentropicBranches {
    /** How far above the greatest value a number still counts as it, for the rounding of both. */
    private static final double ROUNDING = 0x1p-50;

    /** Below this q/p0, M^2 is far below the last digit of 1. */
    private static final double NEARLY_AT_REST = 1e-18;

    /** Below this a number has too few bits left to refine with. */
    private static final double NEARLY_NOTHING = 0x1p-960;

    /** Above this a number next to it may overflow. */
    private static final double NEARLY_INFINITE = 0x1p960;

    private static final double HUGE_IMPULSE = 1e100;

    private IsentropicBranches() {}

    static double machFromAreaRatio(double areaRatio, double gamma, double branch) {
        return branch == Arguments.SUBSONIC
                ? machFromAreaRatioSubsonic(areaRatio, gamma)
                : machFromAreaRatioSupersonic(areaRatio, gamma);
    }

    static double machFromAreaRatioSubsonic(double areaRatio, double gamma) {
        double m = 1 / areaRatio;
        return m * m < NEARLY_AT_REST
                ? Isentropic.chokedMassFlowNumber(gamma) / Math.sqrt(gamma) / areaRatio
                : balancedAreaRatio(areaRatio, gamma, false);
    }

    static double machFromAreaRatioSupersonic(double areaRatio, double gamma) {
        return balancedAreaRatio(areaRatio, gamma, true);
    }

    private static double balancedAreaRatio(double areaRatio, double gamma, boolean above) {
        double c = (gamma - 1) / (gamma + 1);
        double d = 2 / (gamma + 1);
        double k = 2 * StrictMath.log1p(areaRatio - 1);
        if (areaRatio > NEARLY_INFINITE) {
            return SonicBalance.solve(k, c, d, above);
        }
        double mach = SonicBalance.approached(k, c, d, above);
        if (SonicBalance.isNear(mach) || mach > Double.MAX_VALUE) {
            return mach;
        }
        double excess = Isentropic.areaRatio(mach, gamma) / areaRatio - 1;
        return SonicBalance.refined(mach, 2 * StrictMath.log1p(excess), c, d);
    }

    static double machFromMassFlowNumber(double number, double gamma, double branch) {
        return branch == Arguments.SUBSONIC
                ? machFromMassFlowNumberSubsonic(number, gamma)
                : machFromMassFlowNumberSupersonic(number, gamma);
    }

    static double machFromMassFlowNumberSubsonic(double number, double gamma) {
        return number * number < NEARLY_AT_REST
                ? number / Math.sqrt(gamma)
                : balancedMassFlowNumber(number, gamma, false);
    }

    static double machFromMassFlowNumberSupersonic(double number, double gamma) {
        return number == 0 ? Double.POSITIVE_INFINITY : balancedMassFlowNumber(number, gamma, true);
    }

    private static double balancedMassFlowNumber(double number, double gamma, boolean above) {
        double choked = Isentropic.chokedMassFlowNumber(gamma);
        if (!isAtMost(number, choked)) {
            return Double.NaN;
        }
        double c = (gamma - 1) / (gamma + 1);
        double d = 2 / (gamma + 1);
        double k = 2 * logOfRatio(choked, number);
        if (number < NEARLY_NOTHING) {
            return SonicBalance.solve(k, c, d, above);
        }
        double mach = SonicBalance.approached(k, c, d, above);
        if (SonicBalance.isNear(mach) || mach > Double.MAX_VALUE) {
            return mach;
        }
        double excess = Isentropic.massFlowNumber(mach, gamma) / number - 1;
        return SonicBalance.refined(mach, -2 * StrictMath.log1p(excess), c, d);
    }

    /** The greatest q/p0, gamma^(-1/(gamma-1)); it stands at M = sqrt(2) for every gamma. */
    static double greatestQOverP0(double gamma) {
        double w = 1 / (gamma - 1);
        return Power.of(gamma, 0, -w, -Math.fma(-w, gamma - 1, 1) / (gamma - 1));
    }

    /** On the branch {@code below} M = sqrt(2), which is at the place of {@code subsonic}, or {@code above}. */
    static double machFromQOverP0(double ratio, double gamma, double branch) {
        return branch == Arguments.SUBSONIC ? machFromQOverP0Below(ratio, gamma) : machFromQOverP0Above(ratio, gamma);
    }

    /** The Mach number below sqrt(2). */
    static double machFromQOverP0Below(double ratio, double gamma) {
        return ratio < NEARLY_AT_REST ? Math.sqrt(ratio / (0.5 * gamma)) : balancedQOverP0(ratio, gamma, false);
    }

    /** The Mach number above sqrt(2). */
    static double machFromQOverP0Above(double ratio, double gamma) {
        return ratio == 0 ? Double.POSITIVE_INFINITY : balancedQOverP0(ratio, gamma, true);
    }

    /** With M/sqrt(2) for M and gamma for (gamma+1)/2 it is the balance of the area ratio, squared. */
    private static double balancedQOverP0(double ratio, double gamma, boolean above) {
        double greatest = greatestQOverP0(gamma);
        if (!isAtMost(ratio, greatest)) {
            return Double.NaN;
        }
        double c = (gamma - 1) / gamma;
        double d = 1 / gamma;
        double root = Math.sqrt(2);
        double k = logOfRatio(greatest, ratio);
        if (ratio < NEARLY_NOTHING) {
            return root * SonicBalance.solve(k, c, d, above);
        }
        double scaled = SonicBalance.approached(k, c, d, above);
        if (SonicBalance.isNear(scaled) || scaled > Double.MAX_VALUE) {
            return root * scaled;
        }
        double excess = Isentropic.qOverP0(root * scaled, gamma) / ratio - 1;
        return root * SonicBalance.refined(scaled, -StrictMath.log1p(excess), c, d);
    }

    /** Whether a number can be reached, the greatest and it being rounded. */
    static boolean isAtMost(double number, double greatest) {
        return number <= greatest * (1 + ROUNDING);
    }

    /** log(a/b), at least 0, to the last digits where a and b are close. */
    private static double logOfRatio(double a, double b) {
        return b > 0.5 * a ? Math.max(0, StrictMath.log1p((a - b) / b)) : StrictMath.log(a) - StrictMath.log(b);
    }

    static double machFromImpulseOverImpulsestar(double ratio, double gamma, double branch) {
        return branch == Arguments.SUBSONIC
                ? machFromImpulseOverImpulsestarSubsonic(ratio, gamma)
                : machFromImpulseOverImpulsestarSupersonic(ratio, gamma);
    }

    static double machFromImpulseOverImpulsestarSubsonic(double ratio, double gamma) {
        if (ratio > HUGE_IMPULSE) {
            return 1 / Math.sqrt(2 * (gamma + 1)) / ratio;
        }
        double root = Math.sqrt(squareLessOne(ratio));
        return 1 / Math.sqrt(1 + (gamma + 1) * root * (ratio + root));
    }

    /** NaN from gamma/sqrt(gamma^2-1) on, which M reaches at infinity. */
    static double machFromImpulseOverImpulsestarSupersonic(double ratio, double gamma) {
        double left = leftToGreatestImpulse(ratio, gamma);
        double root = Math.sqrt(squareLessOne(ratio));
        return left > 0 ? Math.sqrt((ratio + root) * (ratio + gamma * root) / left) : Double.NaN;
    }

    static double greatestImpulse(double gamma) {
        return gamma / Math.sqrt(squareLessOne(gamma));
    }

    /** 1 - (gamma^2-1)(ratio^2-1), as if it were computed exactly and then rounded. */
    static double leftToGreatestImpulse(double ratio, double gamma) {
        double gammaSquare = gamma * gamma;
        double gammaRest = Math.fma(gamma, gamma, -gammaSquare);
        double square = ratio * ratio;
        double rest = Math.fma(ratio, ratio, -square);
        double product = (gammaSquare - 1) * (square - 1);
        double productRest =
                Math.fma(gammaSquare - 1, square - 1, -product) + ((gammaSquare - 1) * rest + gammaRest * (square - 1));
        return (1 - product) - productRest;
    }

    private static double squareLessOne(double x) {
        return (x - 1) * (x + 1);
    }
}
