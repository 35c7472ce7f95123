package org.ductledger.flow;

import org.ductledger.catalogue.Kernel;
import org.ductledger.numeric.Degrees;

/** The partial derivatives of the oblique shock's functions; with S and C the squares of sine and cosine of its angle. */
final class ObliqueSlopes {
    private ObliqueSlopes() {}

    /** D in tan(deflection) = 2 cot x/M1^2 / D. */
    private static double denominator(double mach1, double cos, double gamma) {
        return gamma - 1 + 2 * cos * cos + 2 / mach1 / mach1;
    }

    static double deflectionByShockAngle(double mach1, double shockAngle, double gamma) {
        double sin = Degrees.sin(shockAngle);
        double cos = Degrees.cos(shockAngle);
        double t = Degrees.tan(ObliqueShock.deflection(mach1, shockAngle, gamma));
        double n = ObliqueShock.strength(mach1, shockAngle) / mach1 / mach1;
        double slope = 2 * (2 * cos * cos + 2 * t * sin * cos - n / (sin * sin)) / denominator(mach1, cos, gamma);
        return slope / (1 + t * t);
    }

    static double deflectionByMach1(double mach1, double shockAngle, double gamma) {
        double cos = Degrees.cos(shockAngle);
        double t = Degrees.tan(ObliqueShock.deflection(mach1, shockAngle, gamma));
        double slope = 4 * (cos / Degrees.sin(shockAngle) + t) / denominator(mach1, cos, gamma);
        return Degrees.ofRadians(slope / mach1 / mach1 / mach1 / (1 + t * t));
    }

    static double deflectionByGamma(double mach1, double shockAngle, double gamma) {
        double t = Degrees.tan(ObliqueShock.deflection(mach1, shockAngle, gamma));
        return -Degrees.ofRadians(t / denominator(mach1, Degrees.cos(shockAngle), gamma) / (1 + t * t));
    }

    static double angleByMach1(double mach1, double deflection, double gamma, double branch) {
        double angle = ObliqueAngle.shockAngle(mach1, deflection, gamma, branch);
        return -deflectionByMach1(mach1, angle, gamma) / deflectionByShockAngle(mach1, angle, gamma);
    }

    static double angleByDeflection(double mach1, double deflection, double gamma, double branch) {
        double angle = ObliqueAngle.shockAngle(mach1, deflection, gamma, branch);
        return 1 / deflectionByShockAngle(mach1, angle, gamma);
    }

    static double angleByGamma(double mach1, double deflection, double gamma, double branch) {
        double angle = ObliqueAngle.shockAngle(mach1, deflection, gamma, branch);
        return -deflectionByGamma(mach1, angle, gamma) / deflectionByShockAngle(mach1, angle, gamma);
    }

    static double deflectionMaxByMach1(double mach1, double gamma) {
        return deflectionByMach1(mach1, ObliqueLimits.angleAtDeflectionMax(mach1, gamma), gamma);
    }

    static double deflectionMaxByGamma(double mach1, double gamma) {
        return deflectionByGamma(mach1, ObliqueLimits.angleAtDeflectionMax(mach1, gamma), gamma);
    }

    static double detachmentByDeflection(double deflection, double gamma) {
        return 1 / deflectionMaxByMach1(ObliqueLimits.mach1AtDetachment(deflection, gamma), gamma);
    }

    static double detachmentByGamma(double deflection, double gamma) {
        double mach1 = ObliqueLimits.mach1AtDetachment(deflection, gamma);
        return -deflectionMaxByGamma(mach1, gamma) / deflectionMaxByMach1(mach1, gamma);
    }

    static double angleAtSonicByMach1(double mach1, double gamma) {
        double angle = ObliqueLimits.angleAtSonic(mach1, gamma);
        return -mach2ByMach1(mach1, angle, gamma) / mach2ByShockAngle(mach1, angle, gamma);
    }

    static double angleAtSonicByGamma(double mach1, double gamma) {
        double angle = ObliqueLimits.angleAtSonic(mach1, gamma);
        return -mach2ByGamma(mach1, angle, gamma) / mach2ByShockAngle(mach1, angle, gamma);
    }

    static double mach1ByDeflection(double deflection, double shockAngle, double gamma) {
        return 1 / deflectionByMach1(ObliqueShock.mach1(deflection, shockAngle, gamma), shockAngle, gamma);
    }

    static double mach1ByShockAngle(double deflection, double shockAngle, double gamma) {
        double mach1 = ObliqueShock.mach1(deflection, shockAngle, gamma);
        return -deflectionByShockAngle(mach1, shockAngle, gamma) / deflectionByMach1(mach1, shockAngle, gamma);
    }

    static double mach1ByGamma(double deflection, double shockAngle, double gamma) {
        double mach1 = ObliqueShock.mach1(deflection, shockAngle, gamma);
        return -deflectionByGamma(mach1, shockAngle, gamma) / deflectionByMach1(mach1, shockAngle, gamma);
    }

    /** d(M2^2)/dx at a fixed flow along the shock: -1/p^2 - along^2/h d ln h/dx, with p = p2/p1, h = T2/T1. */
    private static double mach2SquaredByStrength(double x, double along, double gamma) {
        double p = 1 + NormalShock.b(gamma) * x;
        double slowing = NormalShock.c(gamma) + NormalShock.d(gamma) / (1 + x);
        double heatingSlope = NormalShock.b(gamma) / p - NormalShock.d(gamma) / ((1 + x) * (1 + x) * slowing);
        return -1 / (p * p) - along * along / (p * slowing) * heatingSlope;
    }

    static double mach2ByMach1(double mach1, double shockAngle, double gamma) {
        double sin = Degrees.sin(shockAngle);
        double cos = Degrees.cos(shockAngle);
        double x = ObliqueShock.strength(mach1, shockAngle);
        double heating = (1 + NormalShock.b(gamma) * x) * (NormalShock.c(gamma) + NormalShock.d(gamma) / (1 + x));
        double slope = mach2SquaredByStrength(x, mach1 * cos, gamma) * sin * sin + cos * cos / heating;
        return mach1 * slope / ObliqueShock.mach2(mach1, shockAngle, gamma);
    }

    static double mach2ByShockAngle(double mach1, double shockAngle, double gamma) {
        double sin = Degrees.sin(shockAngle);
        double cos = Degrees.cos(shockAngle);
        double x = ObliqueShock.strength(mach1, shockAngle);
        double heating = (1 + NormalShock.b(gamma) * x) * (NormalShock.c(gamma) + NormalShock.d(gamma) / (1 + x));
        double slope = mach2SquaredByStrength(x, mach1 * cos, gamma) - 1 / heating;
        return Degrees.toRadians(mach1 * sin * mach1 * cos * slope / ObliqueShock.mach2(mach1, shockAngle, gamma));
    }

    /** With db/dgamma = dc/dgamma = -dd/dgamma = 2/(gamma+1)^2. */
    static double mach2ByGamma(double mach1, double shockAngle, double gamma) {
        double along = mach1 * Degrees.cos(shockAngle);
        double x = ObliqueShock.strength(mach1, shockAngle);
        double p = 1 + NormalShock.b(gamma) * x;
        double slowing = NormalShock.c(gamma) + NormalShock.d(gamma) / (1 + x);
        double heatingByGamma = x * (slowing + p / (1 + x));
        double slope = x * x / (p * p) - along * along * heatingByGamma / (p * p * slowing * slowing);
        return slope / ((gamma + 1) * (gamma + 1) * ObliqueShock.mach2(mach1, shockAngle, gamma));
    }

    /** What a normal shock does, of M1 sin(shock angle): its derivative by M1. */
    static Kernel acrossByMach1(Kernel.Of2 byNormalMach) {
        return Kernel.of((mach1, shockAngle, gamma) ->
                byNormalMach.at(ObliqueShock.normalMach(mach1, shockAngle), gamma) * Degrees.sin(shockAngle));
    }

    static Kernel acrossByShockAngle(Kernel.Of2 byNormalMach) {
        return Kernel.of((mach1, shockAngle, gamma) -> Degrees.toRadians(
                byNormalMach.at(ObliqueShock.normalMach(mach1, shockAngle), gamma) * mach1 * Degrees.cos(shockAngle)));
    }

    static Kernel acrossByGamma(Kernel.Of2 byGamma) {
        return Kernel.of((mach1, shockAngle, gamma) -> byGamma.at(ObliqueShock.normalMach(mach1, shockAngle), gamma));
    }
}
