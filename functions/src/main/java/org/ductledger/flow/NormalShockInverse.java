package org.ductledger.flow;

import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.NormalShock.FAMILY;
import static org.ductledger.flow.NormalShock.b;
import static org.ductledger.flow.NormalShock.c;
import static org.ductledger.flow.NormalShock.d;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.numeric.Power;

/** The Mach number ahead of a normal shock, from one ratio across it. */
final class NormalShockInverse {
    /** Below this, the seed of {@link #fromP02OverP01} is right to the last digit. */
    private static final double WEAK = 1e-4;

    private static final double LEAST_DENOMINATOR = 0x1p-110;

    private NormalShockInverse() {}

    /** The relation of M1 and M2 is its own inverse; near the least M2 the denominator is what counts. */
    static double fromMach2(double mach2, double gamma) {
        double m = mach2 * mach2;
        double k = 0.5 * (gamma - 1);
        double p = gamma * m;
        double pTail = Math.fma(gamma, m, -p) + gamma * Math.fma(mach2, mach2, -m);
        return mach2 > leastMach2(gamma) ? rootOfRatio(1 + k * m, (p - k) + pTail) : Double.NaN;
    }

    /** Next to the limit, which is rounded, the denominator may come out below zero. */
    private static double rootOfRatio(double numerator, double denominator) {
        return Math.sqrt(numerator / Math.max(denominator, LEAST_DENOMINATOR));
    }

    static double leastMach2(double gamma) {
        return Math.sqrt(0.5 * (gamma - 1) / gamma);
    }

    static double fromP2OverP1(double p2OverP1, double gamma) {
        return Math.sqrt(1 + (p2OverP1 - 1) / b(gamma));
    }

    /** The positive root of gamma m^2 - (gamma-1+s) m - 1 = 0, where s = (T2/T1 - 1)/(c d). */
    static double fromT2OverT1(double t2OverT1, double gamma) {
        double s = (t2OverT1 - 1) * (gamma + 1) * (gamma + 1) / (2 * (gamma - 1));
        double half = (gamma - 1 + s) / (2 * gamma);
        return Math.sqrt(half * (1 + Math.sqrt(1 + 1 / (gamma * half * half))));
    }

    static double fromRho2OverRho1(double rho2OverRho1, double gamma) {
        double a = gamma + 1;
        double p = (gamma - 1) * rho2OverRho1;
        double pTail = Math.fma(gamma - 1, rho2OverRho1, -p);
        double denominator = (a - p) + (((gamma - a) + 1) - pTail);
        return rho2OverRho1 < greatestRho2OverRho1(gamma) ? rootOfRatio(2 * rho2OverRho1, denominator) : Double.NaN;
    }

    static double greatestRho2OverRho1(double gamma) {
        return (gamma + 1) / (gamma - 1);
    }

    /**
     * From p02/p01, solved for ln x, x = M1^2 - 1, by steps of fourth order on the entropy rise; strong shocks end with
     * a step on p02/p01 itself, because their logarithms have fewer digits.
     */
    static double fromP02OverP01(double p02OverP01, double gamma) {
        if (p02OverP01 < NormalShock.p02OverP01(NormalShock.HUGE_MACH, gamma)) {
            return hugeFromP02OverP01(p02OverP01, gamma);
        }
        double rise = p02OverP01 > 0.5 ? -StrictMath.log1p(p02OverP01 - 1) : -StrictMath.log(p02OverP01);
        double x = seed(rise, gamma);
        if (x < WEAK) {
            return Math.sqrt(1 + x);
        }
        x = refined(refined(x, rise, gamma), rise, gamma);
        double mach1 = Math.sqrt(1 + x);
        return mach1 + (NormalShock.p02OverP01(mach1, gamma) / p02OverP01 - 1) / ShockEntropy.riseByMach(mach1, gamma);
    }

    /** From p02/p01 = (b c M1^2)^(-1/(gamma-1))/c. */
    private static double hugeFromP02OverP01(double p02OverP01, double gamma) {
        double c = c(gamma);
        return Power.of(c * p02OverP01, 0, -0.5 * (gamma - 1), 0) / Math.sqrt(b(gamma) * c);
    }

    /**
     * Within 17 % of x for every gamma: x = (e^z - 1)/a, where z is fitted to the series in s = (3 G/(b c))^(1/3) for weak
     * shocks and tends to G = (gamma-1)(s2-s1)/R for strong ones, for which x = e^G/a, a = b c^gamma.
     */
    private static double seed(double rise, double gamma) {
        double b = b(gamma);
        double c = c(gamma);
        double g = (gamma - 1) * rise;
        double s = StrictMath.cbrt(3 * g / (b * c));
        double a = b * StrictMath.exp(gamma * StrictMath.log(c));
        double first = 0.5 * (b - a);
        double second = 0.75 * b * b - 0.2 * (1 + b * b + c * c + b + c + b * c) - 0.5 * a * b + a * a / 3;
        double bend = b * c / (3 * a) - second;
        double z = g + a * s * (1 + first * s) / (1 + bend * s * s);
        return StrictMath.expm1(z) / a;
    }

    private static double refined(double x, double rise, double gamma) {
        double w = 1 / (gamma - 1);
        double b = b(gamma);
        double c = c(gamma);
        double d = d(gamma);
        double f1 = x / (1 + x);
        double fb = b * x / (1 + b * x);
        double fc = c * x / (1 + c * x);
        double excess =
                w * StrictMath.log1p(c * d * x * (gamma + 1 / (1 + x))) - StrictMath.log1p(d * x / (1 + c * x)) - rise;
        double slope = 0.5 * d * f1 * fb * x / (1 + c * x);
        double a1 = 3 - f1 - fb - fc;
        double a2 = a1 * a1 - f1 * (1 - f1) - fb * (1 - fb) - fc * (1 - fc);
        return x * StrictMath.exp(step(excess / slope, a1, a2));
    }

    /** A step of fourth order, from n = f/f', a = f''/f', b = f'''/f'. */
    static double step(double n, double a, double b) {
        return -n * (1 - 0.5 * a * n) / (1 - a * n + b * n * n / 6);
    }

    private static final Argument MACH2 =
            Argument.number("mach2", "M2", "1", Interval.openClosed(0, 1), "Mach number behind the shock");
    private static final Argument P2_OVER_P1 = Argument.number(
            "p2_over_p1", "p2/p1", "1", Interval.atLeast(1), "static pressure behind the shock over that ahead of it");
    private static final Argument T2_OVER_T1 = Argument.number(
            "t2_over_t1",
            "T2/T1",
            "1",
            Interval.atLeast(1),
            "static temperature behind the shock over that ahead of it");
    private static final Argument RHO2_OVER_RHO1 = Argument.number(
            "rho2_over_rho1", "rho2/rho1", "1", Interval.atLeast(1), "density behind the shock over that ahead of it");
    private static final Argument P02_OVER_P01 = Argument.number(
            "p02_over_p01",
            "p02/p01",
            "1",
            Interval.openClosed(0, 1),
            "stagnation pressure behind the shock over that ahead of it");

    /** What the entries of the inverses have in common. */
    static EntryBuilder entry(String name, Argument given, Kernel.Of2 inverse, Kernel.Of2 byMach, Kernel.Of2 byGamma) {
        return FAMILY.entry(name)
                .takes(given, GAMMA)
                .gives("M1", "1", Interval.atLeast(1))
                .kernel(inverse)
                .partials(
                        NormalShockSlopes.ofInverse(inverse, byMach),
                        NormalShockSlopes.ofInverseByGamma(inverse, byMach, byGamma));
    }

    private static final FunctionEntry MACH1_FROM_SHOCK_MACH2 = entry(
                    "mach1_from_shock_mach2",
                    MACH2,
                    NormalShockInverse::fromMach2,
                    NormalShockSlopes::mach2ByMach,
                    NormalShockSlopes::mach2ByGamma)
            .title("Mach number ahead of a normal shock from that behind it")
            .formula("M1^2 = (1 + (gamma-1)/2 M2^2) / (gamma M2^2 - (gamma-1)/2)")
            .requiresAbove(
                    FaultKind.NO_SOLUTION,
                    "mach2",
                    Kernel.of((mach2, gamma) -> leastMach2(gamma)),
                    "the Mach number behind an infinitely strong shock")
            .sources(Sources.NACA_1135.at("eq. (96)"))
            .example("2.000", 0.57735, 1.4)
            .cell("IF({gamma}*{mach2}^2<=({gamma}-1)/2,\"no solution\","
                    + "SQRT((1+({gamma}-1)/2*{mach2}^2)/({gamma}*{mach2}^2-({gamma}-1)/2)))")
            .build();

    private static final FunctionEntry MACH1_FROM_SHOCK_P2_OVER_P1 = entry(
                    "mach1_from_shock_p2_over_p1",
                    P2_OVER_P1,
                    NormalShockInverse::fromP2OverP1,
                    NormalShockSlopes::p2OverP1ByMach,
                    NormalShockSlopes::p2OverP1ByGamma)
            .title("Mach number ahead of a normal shock from the static pressure ratio")
            .formula("M1^2 = 1 + (gamma+1)/(2 gamma) (p2/p1 - 1)")
            .sources(Sources.NACA_1135.at("eq. (93)"))
            .example("2.000", 4.5, 1.4)
            .cell("SQRT(1+({gamma}+1)/(2*{gamma})*({p2_over_p1}-1))")
            .build();

    private static final FunctionEntry MACH1_FROM_SHOCK_T2_OVER_T1 = entry(
                    "mach1_from_shock_t2_over_t1",
                    T2_OVER_T1,
                    NormalShockInverse::fromT2OverT1,
                    NormalShockSlopes::t2OverT1ByMach,
                    NormalShockSlopes::t2OverT1ByGamma)
            .title("Mach number ahead of a normal shock from the static temperature ratio")
            .formula("gamma M1^4 - (gamma-1+s) M1^2 - 1 = 0, s = (gamma+1)^2/(2 (gamma-1)) (T2/T1 - 1)")
            .sources(Sources.NACA_1135.at("eq. (95)"))
            .example("2.000", 1.6875, 1.4)
            .cell(CellForm.steps()
                    .helper("half", "({gamma}-1+({gamma}+1)^2/(2*({gamma}-1))*({t2_over_t1}-1))/(2*{gamma})")
                    .result("SQRT({half}*(1+SQRT(1+1/({gamma}*{half}^2))))"))
            .build();

    private static final FunctionEntry MACH1_FROM_SHOCK_RHO2_OVER_RHO1 = entry(
                    "mach1_from_shock_rho2_over_rho1",
                    RHO2_OVER_RHO1,
                    NormalShockInverse::fromRho2OverRho1,
                    NormalShockSlopes::rho2OverRho1ByMach,
                    NormalShockSlopes::rho2OverRho1ByGamma)
            .title("Mach number ahead of a normal shock from the density ratio")
            .formula("M1^2 = 2 r / (gamma+1 - (gamma-1) r), r = rho2/rho1")
            .requiresBelow(
                    FaultKind.NO_SOLUTION,
                    "rho2_over_rho1",
                    Kernel.of((ratio, gamma) -> greatestRho2OverRho1(gamma)),
                    "the density ratio of an infinitely strong shock")
            .sources(Sources.NACA_1135.at("eq. (94)"))
            .example("2.000", 2.6666666666666665, 1.4)
            .cell("IF(({gamma}-1)*({rho2_over_rho1}-1)>=2,\"no solution\","
                    + "SQRT(2*{rho2_over_rho1}/(2-({gamma}-1)*({rho2_over_rho1}-1))))")
            .build();

    private static final FunctionEntry MACH1_FROM_SHOCK_P02_OVER_P01 = entry(
                    "mach1_from_shock_p02_over_p01",
                    P02_OVER_P01,
                    NormalShockInverse::fromP02OverP01,
                    NormalShockSlopes::p02OverP01ByMach,
                    NormalShockSlopes::p02OverP01ByGamma)
            .title("Mach number ahead of a normal shock from the stagnation pressure ratio")
            .formula("the M1 >= 1 for which shock_p02_over_p01(M1, gamma) = p02/p01")
            .note("Near M1 = 1 the loss is of third order in M1^2 - 1, so that a digit of p02/p01 tells little of M1.")
            .sources(Sources.NACA_1135.at("eq. (99)"))
            .example("2.000", 0.7208738614847455, 1.4)
            .cell(p02OverP01Cells())
            .build();

    /** The kernel's seed, then three steps of third order in ln x. */
    static CellForm p02OverP01Cells() {
        CellForm.Builder form = CellForm.steps()
                .helper("c", "({gamma}-1)/({gamma}+1)")
                .helper("g", "-({gamma}-1)*LN({p02_over_p01})")
                .helper("s", "(3*{g}/({c}*(1+{c})))^(1/3)")
                .helper("a", "(1+{c})*{c}^{gamma}")
                .helper("bend", "{c}*(1+{c})/(3*{a})-0.75*(1+{c})^2+0.2*(3+4*{c}+3*{c}^2)+0.5*{a}*(1+{c})-{a}^2/3")
                .helper("x0", "(EXP({g}+{a}*{s}*(1+(1+{c}-{a})/2*{s})/(1+{bend}*{s}^2))-1)/{a}");
        for (int i = 0; i < 3; i++) {
            String x = "{x" + i + "}";
            form.helper("n" + (i + 1), CELL_STEP.replace("{x}", x));
            form.helper("x" + (i + 1), CELL_NEXT.replace("{x}", x).replace("{n}", "{n" + (i + 1) + "}"));
        }
        return form.result("SQRT(1+{x3})");
    }

    private static final String CELL_STEP = "IF({x}=0,0,(LN(1+{c}*(1-{c})*{x}*({gamma}+1/(1+{x})))"
            + "-({gamma}-1)*LN(1+(1-{c})*{x}/(1+{c}*{x}))-{g})"
            + "*(1+{x})*(1+(1+{c})*{x})*(1+{c}*{x})/({c}*(1+{c})*{x}^3))";

    private static final String CELL_NEXT = "{x}*EXP(-{n}/(1-{n}/2*(1/(1+{x})+1/(1+(1+{c})*{x})+1/(1+{c}*{x}))))";

    static List<FunctionEntry> entries() {
        return List.of(
                MACH1_FROM_SHOCK_MACH2,
                MACH1_FROM_SHOCK_P2_OVER_P1,
                MACH1_FROM_SHOCK_T2_OVER_T1,
                MACH1_FROM_SHOCK_RHO2_OVER_RHO1,
                MACH1_FROM_SHOCK_P02_OVER_P01);
    }
}
