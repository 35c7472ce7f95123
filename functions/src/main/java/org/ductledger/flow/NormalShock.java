package org.ductledger.flow;

import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.SUPERSONIC_MACH1;

import java.util.List;
import java.util.stream.Stream;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.numeric.Power;

/**
 * The steady normal shock in a perfect gas: kernels of the state behind it.
 *
 * <p>All of them are written in x = M1^2 - 1, the strength of the shock, and in c = (gamma-1)/(gamma+1), d = 1 - c,
 * b = 1 + c, so that nothing cancels as M1 tends to 1: p2/p1 = 1 + b x, rho2/rho1 = 1 + d x/(1 + c x),
 * M2^2 = (1 + c x)/(1 + b x).
 */
final class NormalShock {
    static final Chapter FAMILY = new Chapter("shock", "Normal shock in a perfect gas");

    /** From here on M1^2 leaves no room for products in a double. */
    static final double HUGE_MACH = 1e150;

    private NormalShock() {}

    /** M1^2 - 1, rounded once. */
    static double strength(double mach1) {
        return Math.fma(mach1, mach1, -1);
    }

    static double b(double gamma) {
        return 2 * gamma / (gamma + 1);
    }

    static double c(double gamma) {
        return (gamma - 1) / (gamma + 1);
    }

    static double d(double gamma) {
        return 2 / (gamma + 1);
    }

    static double mach2Squared(double mach1, double gamma) {
        double x = strength(mach1);
        if (x <= 1) {
            return (1 + c(gamma) * x) / (1 + b(gamma) * x);
        }
        double r = 1 / (mach1 * mach1);
        return Math.fma(d(gamma), r, c(gamma)) / Math.fma(-c(gamma), r, b(gamma));
    }

    static double mach2(double mach1, double gamma) {
        return Math.sqrt(mach2Squared(mach1, gamma));
    }

    static double p2OverP1(double mach1, double gamma) {
        return Math.fma(b(gamma), strength(mach1), 1);
    }

    static double t2OverT1(double mach1, double gamma) {
        return p2OverP1(mach1, gamma) * v2OverV1(mach1, gamma);
    }

    static double rho2OverRho1(double mach1, double gamma) {
        return 1 + compression(mach1, gamma);
    }

    /** rho2/rho1 - 1. */
    static double compression(double mach1, double gamma) {
        return d(gamma) / (c(gamma) + 1 / strength(mach1));
    }

    static double v2OverV1(double mach1, double gamma) {
        return 1 / rho2OverRho1(mach1, gamma);
    }

    /** T2/T1 - 1. */
    static double heating(double mach1, double gamma) {
        return c(gamma) * d(gamma) * strength(mach1) * (gamma + 1 / (mach1 * mach1));
    }

    /**
     * p02/p01 = rho2/rho1 (T2/T1)^(-1/(gamma-1)). The exponent is large where gamma is near 1, so that T2/T1 - 1 =
     * 2 (gamma-1) (M1^2-1) (gamma + 1/M1^2) / (gamma+1)^2 is carried as a head and a tail.
     */
    static double p02OverP01(double mach1, double gamma) {
        if (mach1 > HUGE_MACH) {
            return p02OverP01OfHuge(mach1, gamma);
        }
        double m = mach1 * mach1;
        double x = m - 1;
        double xTail = ((m - x) - 1) + Math.fma(mach1, mach1, -m);
        double r = 1 / m;
        double s = gamma + r;
        double sTail = ((gamma - s) + r) + (Math.fma(-r, m, 1) - r * Math.fma(mach1, mach1, -m)) * r;
        double f = 2 * (gamma - 1);
        double fx = f * x;
        double n = fx * s;
        double nTail = Math.fma(fx, s, -n) + (fx * sTail + (Math.fma(f, x, -fx) + f * xTail) * s);
        double a = gamma + 1;
        double aa = a * a;
        double aaTail = Math.fma(a, a, -aa) + 2 * a * ((gamma - a) + 1);
        double t = n / aa;
        double tTail = (Math.fma(-t, aa, n) + (nTail - t * aaTail)) / aa;
        double w = 1 / (gamma - 1);
        double p = power(t, tTail, -w, -Math.fma(-w, gamma - 1, 1) * w);
        return Math.fma(p, compression(mach1, gamma), p);
    }

    /** With T2/T1 = b c M1^2, rho2/rho1 = 1/c; 0 where the exponent leaves nothing in a double. */
    private static double p02OverP01OfHuge(double mach1, double gamma) {
        double w = 1 / (gamma - 1);
        if (w > 2) {
            return 0;
        }
        double wTail = Math.fma(-w, gamma - 1, 1) * w;
        double ofMach = Power.of(mach1, 0, -2 * w, -2 * wTail);
        return Power.of(b(gamma) * c(gamma), 0, -w, -wTail) * ofMach / c(gamma);
    }

    /** (1 + t + tTail)^(e + eTail) for t >= 0. */
    private static double power(double t, double tTail, double e, double eTail) {
        double h = 1 + t;
        return Power.of(h, (t <= 1 ? (1 - h) + t : (t - h) + 1) + tTail, e, eTail);
    }

    /** The pitot ratio p02/p1 = p2/p1 (1 + (gamma-1)/2 M2^2)^(gamma/(gamma-1)). */
    static double p02OverP1(double mach1, double gamma) {
        return p2OverP1(mach1, gamma) * p0OverP(0.5 * (gamma - 1) * mach2Squared(mach1, gamma), gamma);
    }

    /** (1 + t)^(gamma/(gamma-1)) for t >= 0. */
    static double p0OverP(double t, double gamma) {
        double w = 1 / (gamma - 1);
        double e = gamma * w;
        return power(t, 0, e, Math.fma(-e, gamma - 1, gamma) * w);
    }

    private static final FunctionEntry SHOCK_MACH2 = FAMILY.entry("shock_mach2")
            .title("Mach number behind a normal shock")
            .formula("M2^2 = (1 + (gamma-1)/2 M1^2) / (gamma M1^2 - (gamma-1)/2)")
            .takes(SUPERSONIC_MACH1, GAMMA)
            .gives("M2", "1", Interval.openClosed(0, 1))
            .kernel(NormalShock::mach2)
            .partials(Kernel.of(NormalShockSlopes::mach2ByMach), Kernel.of(NormalShockSlopes::mach2ByGamma))
            .sources(Sources.NACA_1135.at("eq. (96)"))
            .example("0.5774", 2.0, 1.4)
            .cell("SQRT((1+({gamma}-1)/2*{mach1}^2)/({gamma}*{mach1}^2-({gamma}-1)/2))")
            .build();

    private static final FunctionEntry SHOCK_P2_OVER_P1 = FAMILY.entry("shock_p2_over_p1")
            .title("Static pressure ratio over a normal shock")
            .formula("p2/p1 = 1 + 2 gamma/(gamma+1) (M1^2 - 1)")
            .takes(SUPERSONIC_MACH1, GAMMA)
            .gives("p2/p1", "1", Interval.atLeast(1))
            .kernel(NormalShock::p2OverP1)
            .partials(Kernel.of(NormalShockSlopes::p2OverP1ByMach), Kernel.of(NormalShockSlopes::p2OverP1ByGamma))
            .sources(Sources.NACA_1135.at("eq. (93)"))
            .example("4.500", 2.0, 1.4)
            .cell("1+2*{gamma}/({gamma}+1)*({mach1}-1)*({mach1}+1)")
            .build();

    private static final FunctionEntry SHOCK_T2_OVER_T1 = FAMILY.entry("shock_t2_over_t1")
            .title("Static temperature ratio over a normal shock")
            .formula("T2/T1 = (2 gamma M1^2 - (gamma-1)) ((gamma-1) M1^2 + 2) / ((gamma+1)^2 M1^2)")
            .takes(SUPERSONIC_MACH1, GAMMA)
            .gives("T2/T1", "1", Interval.atLeast(1))
            .kernel(NormalShock::t2OverT1)
            .partials(Kernel.of(NormalShockSlopes::t2OverT1ByMach), Kernel.of(NormalShockSlopes::t2OverT1ByGamma))
            .sources(Sources.NACA_1135.at("eq. (95)"))
            .example("1.687", 2.0, 1.4)
            .cell("1+2*({gamma}-1)/({gamma}+1)^2*({mach1}-1)*({mach1}+1)*({gamma}+1/{mach1}^2)")
            .build();

    private static final FunctionEntry SHOCK_RHO2_OVER_RHO1 = FAMILY.entry("shock_rho2_over_rho1")
            .title("Density ratio over a normal shock")
            .formula("rho2/rho1 = (gamma+1) M1^2 / ((gamma-1) M1^2 + 2)")
            .note("Tends to (gamma+1)/(gamma-1) as the shock becomes infinitely strong.")
            .takes(SUPERSONIC_MACH1, GAMMA)
            .gives("rho2/rho1", "1", Interval.atLeast(1))
            .kernel(NormalShock::rho2OverRho1)
            .partials(
                    Kernel.of(NormalShockSlopes::rho2OverRho1ByMach), Kernel.of(NormalShockSlopes::rho2OverRho1ByGamma))
            .sources(Sources.NACA_1135.at("eq. (94)"))
            .example("2.667", 2.0, 1.4)
            .cell("({gamma}+1)*{mach1}^2/(({gamma}-1)*{mach1}^2+2)")
            .build();

    private static final FunctionEntry SHOCK_V2_OVER_V1 = FAMILY.entry("shock_v2_over_v1")
            .title("Velocity ratio over a normal shock")
            .formula("V2/V1 = ((gamma-1) M1^2 + 2) / ((gamma+1) M1^2)")
            .note("In the frame of the shock; the reciprocal of the density ratio.")
            .takes(SUPERSONIC_MACH1, GAMMA)
            .gives("V2/V1", "1", Interval.openClosed(0, 1))
            .kernel(NormalShock::v2OverV1)
            .partials(Kernel.of(NormalShockSlopes::v2OverV1ByMach), Kernel.of(NormalShockSlopes::v2OverV1ByGamma))
            .sources(Sources.NACA_1135.at("eq. (94)"))
            .example("0.3750", 2.0, 1.4)
            .cell("(({gamma}-1)*{mach1}^2+2)/(({gamma}+1)*{mach1}^2)")
            .build();

    private static final FunctionEntry SHOCK_P02_OVER_P01 = FAMILY.entry("shock_p02_over_p01")
            .title("Stagnation pressure ratio over a normal shock")
            .formula("p02/p01 = (rho2/rho1)^(gamma/(gamma-1)) (p2/p1)^(-1/(gamma-1))")
            .note("Equals A1*/A2*, the ratio of the sonic areas of the flows ahead of and behind the shock.")
            .takes(SUPERSONIC_MACH1, GAMMA)
            .gives("p02/p01", "1", Interval.closed(0, 1))
            .kernel(NormalShock::p02OverP01)
            .partials(Kernel.of(NormalShockSlopes::p02OverP01ByMach), Kernel.of(NormalShockSlopes::p02OverP01ByGamma))
            .sources(Sources.NACA_1135.at("eq. (99)"))
            .example("0.7209", 2.0, 1.4)
            .cell("({gamma}+1)*{mach1}^2/(({gamma}-1)*{mach1}^2+2)"
                    + "*(1+2*({gamma}-1)/({gamma}+1)^2*({mach1}-1)*({mach1}+1)*({gamma}+1/{mach1}^2))"
                    + "^(-1/({gamma}-1))")
            .build();

    private static final FunctionEntry SHOCK_P02_OVER_P1 = FAMILY.entry("shock_p02_over_p1")
            .title("Stagnation pressure behind a normal shock over the static pressure ahead of it")
            .formula(
                    "p02/p1 = ((gamma+1)/2 M1^2)^(gamma/(gamma-1)) ((gamma+1)/(2 gamma M1^2 - (gamma-1)))^(1/(gamma-1))")
            .note("Rayleigh's pitot formula. Tables often print its reciprocal, p1/p02.")
            .takes(SUPERSONIC_MACH1, GAMMA)
            .gives("p02/p1", "1", Interval.above(1))
            .kernel(NormalShock::p02OverP1)
            .partials(Kernel.of(NormalShockSlopes::p02OverP1ByMach), Kernel.of(NormalShockSlopes::p02OverP1ByGamma))
            .sources(Sources.NACA_1135.at("eq. (100)"))
            .example("5.640", 2.0, 1.4)
            .cell("(1+2*{gamma}/({gamma}+1)*({mach1}-1)*({mach1}+1))"
                    + "*(1+({gamma}-1)/2*(1+({gamma}-1)/2*{mach1}^2)/({gamma}*{mach1}^2-({gamma}-1)/2))"
                    + "^({gamma}/({gamma}-1))")
            .build();

    private static final FunctionEntry SHOCK_ENTROPY_RISE = FAMILY.entry("shock_entropy_rise")
            .title("Entropy rise over a normal shock, over the gas constant")
            .formula("(s2-s1)/R = -ln(p02/p01)")
            .note("Of third order in M1^2 - 1, and kept to its own last digits for weak shocks too.")
            .takes(SUPERSONIC_MACH1, GAMMA)
            .gives("(s2-s1)/R", "1", Interval.atLeast(0))
            .kernel(ShockEntropy::rise)
            .partials(Kernel.of(ShockEntropy::riseByMach), Kernel.of(ShockEntropy::riseByGamma))
            .sources(Sources.NACA_1135.at("eq. (99)"))
            .example("0.3273", 2.0, 1.4)
            .cell(ShockEntropy.cells())
            .build();

    static List<FunctionEntry> entries() {
        return Stream.of(
                        List.of(
                                SHOCK_MACH2,
                                SHOCK_P2_OVER_P1,
                                SHOCK_T2_OVER_T1,
                                SHOCK_RHO2_OVER_RHO1,
                                SHOCK_V2_OVER_V1,
                                SHOCK_P02_OVER_P01,
                                SHOCK_P02_OVER_P1,
                                SHOCK_ENTROPY_RISE),
                        NormalShockInverse.entries(),
                        Pitot.entries())
                .flatMap(List::stream)
                .toList();
    }
}
