package org.ductledger.flow;

import org.ductledger.numeric.Degrees;
import org.ductledger.numeric.Ending;
import org.ductledger.numeric.Power;
import org.ductledger.numeric.StagnationPower;

/** Isentropic flow of a perfect gas: what the Mach number alone says of the state. */
final class Isentropic {
    /** From here on 1 + (gamma-1)/2 M^2 is its second term to the last digit, and its square may overflow. */
    private static final double HYPERSONIC = 1e100;

    /** Below this exponent an exponential less one keeps more digits than a power less one. */
    private static final double SMALL_EXPONENT = 0.7;

    /** From here on the 1 in T0/T - 1 is below the last digit, and T0/T may overflow. */
    private static final double LARGE_EXPONENT = 50;

    static final StagnationPower P_OVER_P0 = new StagnationPower(-1, -1, false, Ending.NOTHING);
    static final StagnationPower RHO_OVER_RHO0 = new StagnationPower(0, -1, false, Ending.NOTHING);
    static final StagnationPower P_OVER_PSTAR = new StagnationPower(-1, -1, true, Ending.NOTHING);
    static final StagnationPower RHO_OVER_RHOSTAR = new StagnationPower(0, -1, true, Ending.NOTHING);
    static final StagnationPower AREA_RATIO = new StagnationPower(0.5, 1, true, Ending.OVER_MACH);
    static final StagnationPower MASS_FLOW = new StagnationPower(-0.5, -1, false, Ending.MACH_ROOT_GAMMA);
    static final StagnationPower Q_OVER_P0 = new StagnationPower(-1, -1, false, Ending.HALF_GAMMA_MACH_SQUARE);
    private static final StagnationPower P0_OVER_P = new StagnationPower(1, 1, false, Ending.NOTHING);

    private Isentropic() {}

    /** (gamma-1)/2. */
    static double h(double gamma) {
        return 0.5 * (gamma - 1);
    }

    static double tOverT0(double mach, double gamma) {
        return mach < HYPERSONIC ? 1 / (1 + h(gamma) * (mach * mach)) : 1 / mach / (h(gamma) * mach);
    }

    static double pOverP0(double mach, double gamma) {
        return P_OVER_P0.at(mach, gamma);
    }

    static double rhoOverRho0(double mach, double gamma) {
        return RHO_OVER_RHO0.at(mach, gamma);
    }

    static double aOverA0(double mach, double gamma) {
        return 1 / rootOfT0OverT(mach, gamma);
    }

    /** sqrt(T0/T) = a0/a. */
    static double rootOfT0OverT(double mach, double gamma) {
        return mach < HYPERSONIC ? Math.sqrt(1 + h(gamma) * (mach * mach)) : Math.sqrt(h(gamma)) * mach;
    }

    static double tOverTstar(double mach, double gamma) {
        double sonic = 1 + h(gamma);
        return mach < HYPERSONIC ? sonic / (1 + h(gamma) * (mach * mach)) : sonic / mach / (h(gamma) * mach);
    }

    static double pOverPstar(double mach, double gamma) {
        return P_OVER_PSTAR.at(mach, gamma);
    }

    static double rhoOverRhostar(double mach, double gamma) {
        return RHO_OVER_RHOSTAR.at(mach, gamma);
    }

    static double vOverAstar(double mach, double gamma) {
        double sonic = Math.sqrt(1 + h(gamma));
        return mach < HYPERSONIC ? mach * sonic / rootOfT0OverT(mach, gamma) : sonic / Math.sqrt(h(gamma));
    }

    static double vOverVmax(double mach, double gamma) {
        return mach < HYPERSONIC ? Math.sqrt(h(gamma)) * mach / rootOfT0OverT(mach, gamma) : 1;
    }

    static double areaRatio(double mach, double gamma) {
        return AREA_RATIO.at(mach, gamma);
    }

    static double qOverP0(double mach, double gamma) {
        return Q_OVER_P0.at(mach, gamma);
    }

    static double qOverP(double mach, double gamma) {
        return 0.5 * gamma * mach * mach;
    }

    /** By exponential less one where p0/p is near 1. */
    static double impactPressureOverP(double mach, double gamma) {
        double m = mach * mach;
        return gamma * m < 1
                ? StrictMath.expm1(gamma / (gamma - 1) * StrictMath.log1p(h(gamma) * m))
                : P0_OVER_P.at(mach, gamma) - 1;
    }

    static double massFlowNumber(double mach, double gamma) {
        return MASS_FLOW.at(mach, gamma);
    }

    static double massFlowNumberStatic(double mach, double gamma) {
        return Math.sqrt(gamma) * mach * rootOfT0OverT(mach, gamma);
    }

    static double chokedMassFlowNumber(double gamma) {
        return MASS_FLOW.at(1, gamma);
    }

    /** As sqrt(1 + y^2), which is 1 at M = 1 and never less: (1 + gamma M^2)^2 is 2 (gamma+1) M^2 T0/T + (1-M^2)^2. */
    static double impulseOverImpulsestar(double mach, double gamma) {
        double root = Math.sqrt(2 * (gamma + 1));
        double y = mach < HYPERSONIC
                ? (mach - 1) * ((mach + 1) / mach) / (root * rootOfT0OverT(mach, gamma))
                : 1 / (root * Math.sqrt(h(gamma)));
        return Math.abs(y) < HYPERSONIC ? Math.sqrt(1 + y * y) : Math.abs(y);
    }

    /** The Mach angle in degrees; M &gt;= 1. */
    static double machAngle(double mach) {
        return Degrees.ofCotangent(Math.sqrt(mach - 1) * Math.sqrt(mach + 1));
    }

    static double machFromTOverT0(double ratio, double gamma) {
        return Math.sqrt((1 - ratio) / h(gamma)) / Math.sqrt(ratio);
    }

    static double machFromPOverP0(double ratio, double gamma) {
        double slope = (gamma - 1) / gamma;
        return machFromPower(ratio, 0, -slope, -Math.fma(-slope, gamma, gamma - 1) / gamma, gamma);
    }

    static double machFromRhoOverRho0(double ratio, double gamma) {
        return machFromPower(ratio, 0, 1 - gamma, 0, gamma);
    }

    static double machFromImpactPressureOverP(double ratio, double gamma) {
        double slope = (gamma - 1) / gamma;
        double head = 1 + ratio;
        double ofRatio = head - 1;
        double tail = (1 - (head - ofRatio)) + (ratio - ofRatio);
        double exponent = slope * StrictMath.log1p(ratio);
        return exponent < SMALL_EXPONENT
                ? Math.sqrt(StrictMath.expm1(exponent) / h(gamma))
                : machFromPower(head, tail, slope, Math.fma(-slope, gamma, gamma - 1) / gamma, gamma);
    }

    /** M from T0/T = (head + tail)^(w0 + w1): by exponential less one where T0/T is near 1. */
    private static double machFromPower(double head, double tail, double w0, double w1, double gamma) {
        double exponent = Math.max(0, w0 * StrictMath.log(head));
        if (exponent < SMALL_EXPONENT) {
            return Math.sqrt(StrictMath.expm1(exponent) / h(gamma));
        }
        return exponent < LARGE_EXPONENT
                ? Math.sqrt((Power.of(head, tail, w0, w1) - 1) / h(gamma))
                : Power.of(head, tail, 0.5 * w0, 0.5 * w1) / Math.sqrt(h(gamma));
    }

    static double machFromAOverA0(double ratio, double gamma) {
        return Math.sqrt((1 - ratio) * (1 + ratio) / h(gamma)) / ratio;
    }

    /** NaN from V/a* = sqrt((gamma+1)/(gamma-1)) on. */
    static double machFromVOverAstar(double ratio, double gamma) {
        double left = leftToVmax(ratio, gamma);
        return left > 0 ? ratio / Math.sqrt(left) : Double.NaN;
    }

    /** (gamma+1)/2 - (gamma-1)/2 (V/a*)^2 as if it were computed exactly and then rounded. */
    static double leftToVmax(double ratio, double gamma) {
        double h = h(gamma);
        double square = ratio * ratio;
        double product = h * square;
        double productRest = Math.fma(h, square, -product) + h * Math.fma(ratio, ratio, -square);
        double sonic = 1 + h;
        double ofH = sonic - 1;
        double sonicRest = (1 - (sonic - ofH)) + (h - ofH);
        return (sonic - product) + (sonicRest - productRest);
    }

    static double machFromVOverVmax(double ratio, double gamma) {
        return ratio / Math.sqrt(h(gamma) * ((1 - ratio) * (1 + ratio)));
    }

    static double machFromQOverP(double ratio, double gamma) {
        return Math.sqrt(ratio / (0.5 * gamma));
    }

    /** By the quadratic for M^2. */
    static double machFromMassFlowNumberStatic(double number, double gamma) {
        double s = number / Math.sqrt(gamma);
        double y = 2 * Math.sqrt(h(gamma)) * s;
        double root = y < HYPERSONIC ? Math.sqrt(1 + y * y) : y;
        return s * Math.sqrt(2 / (1 + root));
    }

    static double machFromMachAngle(double angle) {
        return 1 / Degrees.sin(angle);
    }
}
