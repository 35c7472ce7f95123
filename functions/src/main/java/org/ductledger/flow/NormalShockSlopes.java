package org.ductledger.flow;

import static org.ductledger.flow.NormalShock.b;
import static org.ductledger.flow.NormalShock.c;
import static org.ductledger.flow.NormalShock.d;
import static org.ductledger.flow.NormalShock.strength;

import org.ductledger.catalogue.Kernel;
import org.ductledger.numeric.LogRest;

/** The partial derivatives of the normal shock's ratios by M1 and by gamma; db/dgamma = dc/dgamma = d^2/2. */
final class NormalShockSlopes {
    private NormalShockSlopes() {}

    static double mach2ByMach(double mach1, double gamma) {
        double p = NormalShock.p2OverP1(mach1, gamma);
        return -mach1 / (p * p * NormalShock.mach2(mach1, gamma));
    }

    static double mach2ByGamma(double mach1, double gamma) {
        double q = strength(mach1) / NormalShock.p2OverP1(mach1, gamma) * d(gamma);
        return 0.25 * q * q / NormalShock.mach2(mach1, gamma);
    }

    static double p2OverP1ByMach(double mach1, double gamma) {
        return 2 * b(gamma) * mach1;
    }

    static double p2OverP1ByGamma(double mach1, double gamma) {
        return 0.5 * d(gamma) * d(gamma) * strength(mach1);
    }

    static double v2OverV1ByMach(double mach1, double gamma) {
        return -2 * d(gamma) / (mach1 * mach1 * mach1);
    }

    static double v2OverV1ByGamma(double mach1, double gamma) {
        return 0.5 * d(gamma) * d(gamma) * (strength(mach1) / (mach1 * mach1));
    }

    static double rho2OverRho1ByMach(double mach1, double gamma) {
        double v = NormalShock.v2OverV1(mach1, gamma);
        return -v2OverV1ByMach(mach1, gamma) / (v * v);
    }

    static double rho2OverRho1ByGamma(double mach1, double gamma) {
        double v = NormalShock.v2OverV1(mach1, gamma);
        return -v2OverV1ByGamma(mach1, gamma) / (v * v);
    }

    static double t2OverT1ByMach(double mach1, double gamma) {
        double r = 1 / (mach1 * mach1);
        return 2 * c(gamma) * d(gamma) * mach1 * (gamma + r * r);
    }

    static double t2OverT1ByGamma(double mach1, double gamma) {
        return p2OverP1ByGamma(mach1, gamma) * NormalShock.v2OverV1(mach1, gamma)
                + NormalShock.p2OverP1(mach1, gamma) * v2OverV1ByGamma(mach1, gamma);
    }

    static double p02OverP01ByMach(double mach1, double gamma) {
        return -NormalShock.p02OverP01(mach1, gamma) * ShockEntropy.riseByMach(mach1, gamma);
    }

    static double p02OverP01ByGamma(double mach1, double gamma) {
        return -NormalShock.p02OverP01(mach1, gamma) * ShockEntropy.riseByGamma(mach1, gamma);
    }

    /** ln(p02/p1) grows with ln(p2/p1) at a rate of 1/2 at M1 = 1, and of 1 far above. */
    static double p02OverP1ByMach(double mach1, double gamma) {
        double t02OverT2 = 1 + 0.5 * (gamma - 1) * NormalShock.mach2Squared(mach1, gamma);
        double p = NormalShock.p2OverP1(mach1, gamma);
        double rate = 1 - 0.25 * (gamma + 1) / (p * t02OverT2);
        return NormalShock.p02OverP1(mach1, gamma) / p * rate * p2OverP1ByMach(mach1, gamma);
    }

    static double p02OverP1ByGamma(double mach1, double gamma) {
        double m2 = NormalShock.mach2Squared(mach1, gamma);
        double m2ByGamma = 2 * NormalShock.mach2(mach1, gamma) * mach2ByGamma(mach1, gamma);
        double w = 1 / (gamma - 1);
        double t = 0.5 * (gamma - 1) * m2;
        double log = p2OverP1ByGamma(mach1, gamma) / NormalShock.p2OverP1(mach1, gamma)
                + 0.5 * (m2 + gamma * m2ByGamma) / (1 + t)
                - w * w * logLessRatio(t);
        return NormalShock.p02OverP1(mach1, gamma) * log;
    }

    /** ln(1+t) - t/(1+t), of second order in t. */
    static double logLessRatio(double t) {
        double q = t / (1 + t);
        return q * q * LogRest.of(t);
    }

    /** The derivative of an inverse by its given ratio. */
    static Kernel ofInverse(Kernel.Of2 inverse, Kernel.Of2 byMach) {
        return Kernel.of((ratio, gamma) -> 1 / byMach.at(inverse.at(ratio, gamma), gamma));
    }

    /** The derivative of an inverse by gamma: the ratio is held. */
    static Kernel ofInverseByGamma(Kernel.Of2 inverse, Kernel.Of2 byMach, Kernel.Of2 byGamma) {
        return Kernel.of((ratio, gamma) -> {
            double mach1 = inverse.at(ratio, gamma);
            return -byGamma.at(mach1, gamma) / byMach.at(mach1, gamma);
        });
    }
}
