package org.ductledger.flow;

import org.ductledger.numeric.Degrees;
import org.ductledger.numeric.Ending;
import org.ductledger.numeric.LogRest;
import org.ductledger.numeric.StagnationPower;

/**
 * The partial derivatives of the isentropic relations by M and by gamma.
 *
 * <p>Those by gamma are written with u = M^2/(2 T0/T), or with w = (M^2-1)/(2 T0/T) where the ratio is that to the
 * sonic value, and with what the logarithm leaves beyond its first term, so that nothing cancels as gamma goes to 1.
 */
final class IsentropicSlopes {
    /** Beyond it the slopes are at their limits, and squares overflow. */
    private static final double HYPERSONIC = 1e100;

    private static final StagnationPower MASS_FLOW_SLOPE = new StagnationPower(-1.5, -1, false, Ending.NOTHING);

    private IsentropicSlopes() {}

    private static double square(double mach) {
        return Math.min(mach * mach, HYPERSONIC);
    }

    /** T0/T. */
    private static double sum(double mach, double gamma) {
        return 1 + Isentropic.h(gamma) * square(mach);
    }

    private static double u(double mach, double gamma) {
        return 0.5 * square(mach) / sum(mach, gamma);
    }

    private static double w(double mach, double gamma) {
        return 0.5 * (square(mach) - 1) / sum(mach, gamma);
    }

    /** d log(rho/rho0)/d gamma. */
    private static double logRhoByGamma(double mach, double gamma) {
        double u = u(mach, gamma);
        return LogRest.of(Isentropic.h(gamma) * square(mach)) * u * u;
    }

    /** The same of a ratio to the sonic value, with the area ratio's sign: -d log(A/A*)/d gamma. */
    private static double logSonicByGamma(double mach, double gamma) {
        double w = w(mach, gamma);
        return LogRest.of((gamma - 1) / (gamma + 1) * (square(mach) - 1)) * w * w;
    }

    static double tOverT0ByMach(double mach, double gamma) {
        double t = Isentropic.tOverT0(mach, gamma);
        return -(gamma - 1) * mach * t * t;
    }

    static double tOverT0ByGamma(double mach, double gamma) {
        return -u(mach, gamma) * Isentropic.tOverT0(mach, gamma);
    }

    static double pOverP0ByMach(double mach, double gamma) {
        return -gamma * mach * Isentropic.pOverP0(mach, gamma) / sum(mach, gamma);
    }

    static double pOverP0ByGamma(double mach, double gamma) {
        return (logRhoByGamma(mach, gamma) - u(mach, gamma)) * Isentropic.pOverP0(mach, gamma);
    }

    static double rhoOverRho0ByMach(double mach, double gamma) {
        return -mach * Isentropic.rhoOverRho0(mach, gamma) / sum(mach, gamma);
    }

    static double rhoOverRho0ByGamma(double mach, double gamma) {
        return logRhoByGamma(mach, gamma) * Isentropic.rhoOverRho0(mach, gamma);
    }

    static double aOverA0ByMach(double mach, double gamma) {
        return -Isentropic.h(gamma) * mach * Isentropic.aOverA0(mach, gamma) / sum(mach, gamma);
    }

    static double aOverA0ByGamma(double mach, double gamma) {
        return -0.5 * u(mach, gamma) * Isentropic.aOverA0(mach, gamma);
    }

    static double tOverTstarByMach(double mach, double gamma) {
        return -(gamma - 1) * mach * Isentropic.tOverTstar(mach, gamma) / sum(mach, gamma);
    }

    static double tOverTstarByGamma(double mach, double gamma) {
        return -2 / (gamma + 1) * w(mach, gamma) * Isentropic.tOverTstar(mach, gamma);
    }

    static double pOverPstarByMach(double mach, double gamma) {
        return -gamma * mach * Isentropic.pOverPstar(mach, gamma) / sum(mach, gamma);
    }

    static double pOverPstarByGamma(double mach, double gamma) {
        double log = logSonicByGamma(mach, gamma) - w(mach, gamma) / (gamma + 1);
        return log * Isentropic.pOverPstar(mach, gamma);
    }

    static double rhoOverRhostarByMach(double mach, double gamma) {
        return -mach * Isentropic.rhoOverRhostar(mach, gamma) / sum(mach, gamma);
    }

    static double rhoOverRhostarByGamma(double mach, double gamma) {
        double log = logSonicByGamma(mach, gamma) + w(mach, gamma) / (gamma + 1);
        return log * Isentropic.rhoOverRhostar(mach, gamma);
    }

    static double vOverAstarByMach(double mach, double gamma) {
        double sum = sum(mach, gamma);
        return Math.sqrt((1 + Isentropic.h(gamma)) / sum) / sum;
    }

    static double vOverAstarByGamma(double mach, double gamma) {
        return -w(mach, gamma) / (gamma + 1) * Isentropic.vOverAstar(mach, gamma);
    }

    static double vOverVmaxByMach(double mach, double gamma) {
        double sum = sum(mach, gamma);
        return Math.sqrt(Isentropic.h(gamma) / sum) / sum;
    }

    static double vOverVmaxByGamma(double mach, double gamma) {
        return 0.5 / (gamma - 1) / sum(mach, gamma) * Isentropic.vOverVmax(mach, gamma);
    }

    static double areaRatioByMach(double mach, double gamma) {
        return (mach - 1) * ((mach + 1) / mach) * Isentropic.areaRatio(mach, gamma) / sum(mach, gamma);
    }

    static double areaRatioByGamma(double mach, double gamma) {
        return -logSonicByGamma(mach, gamma) * Isentropic.areaRatio(mach, gamma);
    }

    static double qOverP0ByMach(double mach, double gamma) {
        double sum = sum(mach, gamma);
        return gamma * mach * (1 - 0.5 * square(mach)) / sum * Isentropic.pOverP0(mach, gamma);
    }

    static double qOverP0ByGamma(double mach, double gamma) {
        double log = 1 / gamma + logRhoByGamma(mach, gamma) - u(mach, gamma);
        return log * Isentropic.qOverP0(mach, gamma);
    }

    static double qOverPByMach(double mach, double gamma) {
        return gamma * mach;
    }

    static double qOverPByGamma(double mach, double gamma) {
        return 0.5 * mach * mach;
    }

    static double impactPressureOverPByMach(double mach, double gamma) {
        return gamma * mach / sum(mach, gamma) * (1 + Isentropic.impactPressureOverP(mach, gamma));
    }

    static double impactPressureOverPByGamma(double mach, double gamma) {
        return (u(mach, gamma) - logRhoByGamma(mach, gamma)) * (1 + Isentropic.impactPressureOverP(mach, gamma));
    }

    static double massFlowNumberByMach(double mach, double gamma) {
        return Math.sqrt(gamma) * (1 - mach) * (1 + mach) * MASS_FLOW_SLOPE.at(mach, gamma);
    }

    static double massFlowNumberByGamma(double mach, double gamma) {
        double log = 0.5 / gamma + logRhoByGamma(mach, gamma) - 0.5 * u(mach, gamma);
        return log * Isentropic.massFlowNumber(mach, gamma);
    }

    static double chokedMassFlowNumberByGamma(double gamma) {
        return massFlowNumberByGamma(1, gamma);
    }

    static double massFlowNumberStaticByMach(double mach, double gamma) {
        return Math.sqrt(gamma) * (1 + (gamma - 1) * square(mach)) / Math.sqrt(sum(mach, gamma));
    }

    static double massFlowNumberStaticByGamma(double mach, double gamma) {
        return 0.5 * (1 / gamma + u(mach, gamma)) * Isentropic.massFlowNumberStatic(mach, gamma);
    }

    static double impulseOverImpulsestarByMach(double mach, double gamma) {
        double m = square(mach);
        double log = (mach - 1) * ((mach + 1) / mach) / (sum(mach, gamma) * (1 + gamma * m));
        return log * Isentropic.impulseOverImpulsestar(mach, gamma);
    }

    /** With I/I* = sqrt(1 + Y), Y of (1-M^2)^2. */
    static double impulseOverImpulsestarByGamma(double mach, double gamma) {
        double impulse = Isentropic.impulseOverImpulsestar(mach, gamma);
        double perImpulse = (impulse - 1) * ((impulse + 1) / impulse);
        return -0.5 * perImpulse * (1 / (gamma + 1) + u(mach, gamma));
    }

    static double machAngleByMach(double mach) {
        return -Degrees.ofRadians(1) / (mach * Math.sqrt(mach - 1) * Math.sqrt(mach + 1));
    }
}
