package org.ductledger.flow;

import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.NormalShock.b;
import static org.ductledger.flow.NormalShock.c;

import java.util.List;
import java.util.Map;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;

/**
 * The Mach number from a pitot pressure over the static pressure of the stream. With y = p2/p1, c = (gamma-1)/(gamma+1)
 * and e = gamma/(gamma-1), the supersonic ratio is ((gamma+1)^2/(4 gamma))^e y (1 + c/y)^e.
 */
final class Pitot {
    private Pitot() {}

    /** The ratio in sonic flow: ((gamma+1)/2)^(gamma/(gamma-1)). */
    static double sonicRatio(double gamma) {
        return NormalShock.p0OverP(0.5 * (gamma - 1), gamma);
    }

    static double mach(double p02OverP, double gamma) {
        if (p02OverP < sonicRatio(gamma)) {
            double rise = StrictMath.log1p(p02OverP - 1) * (gamma - 1) / gamma;
            return Math.min(1, Math.sqrt(2 * StrictMath.expm1(rise) / (gamma - 1)));
        }
        return supersonic(p02OverP, gamma);
    }

    /** From Rayleigh's formula, the supersonic part alone; NaN below the sonic ratio. */
    static double supersonic(double p02OverP1, double gamma) {
        if (p02OverP1 < sonicRatio(gamma)) {
            return Double.NaN;
        }
        double q = p02OverP1 / NormalShock.p0OverP(0.5 * c(gamma) * (gamma - 1) / b(gamma), gamma);
        double y = refined(seed(q, gamma), q, gamma);
        double mach1 = Math.sqrt(Math.max(1, 1 + (y - 1) / b(gamma)));
        if (mach1 > NormalShock.HUGE_MACH) {
            return mach1;
        }
        double excess = NormalShock.p02OverP1(mach1, gamma) - p02OverP1;
        return Math.max(1, mach1 - excess / NormalShockSlopes.p02OverP1ByMach(mach1, gamma));
    }

    /** From q = y (1 + c/y)^e, expanded in 1/y as far as 1/y^2; e c = b/2. */
    private static double seed(double q, double gamma) {
        double first = 0.5 * b(gamma);
        double second = 0.5 * first * first / gamma;
        double third = second * first * (2 - gamma) / (3 * gamma);
        double sum = q - first;
        double y = 0.5 * sum * (1 + Math.sqrt(Math.max(0, 1 - 4 * second / (sum * sum))));
        return Math.max(1, y - third / (y * y - second));
    }

    /** One step of fourth order in ln y. */
    private static double refined(double y, double q, double gamma) {
        double e = gamma / (gamma - 1);
        double t = c(gamma) / (y + c(gamma));
        double excess = StrictMath.log(y / q) + e * StrictMath.log1p(c(gamma) / y);
        double slope = 1 - e * t;
        double second = e * t * (1 - t) / slope;
        return y * StrictMath.exp(NormalShockInverse.step(excess / slope, second, second * (2 * t - 1)));
    }

    private static double machByRatio(double p02OverP, double gamma) {
        double mach = mach(p02OverP, gamma);
        return mach < 1
                ? (1 + 0.5 * (gamma - 1) * mach * mach) / (gamma * mach * p02OverP)
                : 1 / NormalShockSlopes.p02OverP1ByMach(mach, gamma);
    }

    /** Subsonic: from ln(p02/p) (gamma-1)/gamma = ln(1 + t), t = (gamma-1)/2 M^2, with p02/p held. */
    private static double machByGamma(double p02OverP, double gamma) {
        double mach = mach(p02OverP, gamma);
        if (mach >= 1) {
            return -NormalShockSlopes.p02OverP1ByGamma(mach, gamma) / NormalShockSlopes.p02OverP1ByMach(mach, gamma);
        }
        double k = gamma - 1;
        double t = 0.5 * k * mach * mach;
        double log = StrictMath.log1p(p02OverP - 1);
        return mach == 0 ? 0 : ((1 + t) * log / (gamma * gamma) - t / k) / (k * mach);
    }

    private static final Argument P02_OVER_P1 = Argument.number(
            "p02_over_p1",
            "p02/p1",
            "1",
            Interval.above(1),
            "pitot pressure, behind the shock, over the static pressure ahead of it");
    private static final Argument P02_OVER_P = Argument.number(
            "p02_over_p", "p02/p", "1", Interval.atLeast(1), "pitot pressure over the static pressure of the stream");

    private static final String SONIC_CELLS = "(({gamma}+1)/2)^({gamma}/({gamma}-1))";
    private static final String MACH_CELLS = "SQRT(1+({gamma}+1)/(2*{gamma})*({y}-1))";

    private static final FunctionEntry MACH1_FROM_SHOCK_P02_OVER_P1 = NormalShockInverse.entry(
                    "mach1_from_shock_p02_over_p1",
                    P02_OVER_P1,
                    Pitot::supersonic,
                    NormalShockSlopes::p02OverP1ByMach,
                    NormalShockSlopes::p02OverP1ByGamma)
            .title("Mach number ahead of a normal shock from the pitot ratio")
            .formula("the M1 >= 1 for which shock_p02_over_p1(M1, gamma) = p02/p1")
            .note("Supersonic flow only; mach_from_pitot covers subsonic flow too.")
            .requiresAtLeast(
                    FaultKind.NO_SOLUTION,
                    "p02_over_p1",
                    Kernel.of((ratio, gamma) -> sonicRatio(gamma)),
                    "the ratio in sonic flow")
            .sources(Sources.NACA_1135.at("eq. (100)"))
            .example("2.000", 5.640441, 1.4)
            .cell(CellForm.steps()
                    .use("y", cells(), Map.of("p02_over_p", "{p02_over_p1}", "gamma", "{gamma}"))
                    .result("IF({p02_over_p1}<" + SONIC_CELLS + "*(1-1E-14),\"no solution\"," + MACH_CELLS + ")"))
            .build();

    private static final FunctionEntry MACH_FROM_PITOT = NormalShock.FAMILY
            .entry("mach_from_pitot")
            .title("Mach number from a pitot pressure and the static pressure of the stream")
            .formula(
                    "M <= 1: p02/p = (1 + (gamma-1)/2 M^2)^(gamma/(gamma-1)); M >= 1: p02/p = shock_p02_over_p1(M, gamma)")
            .note(
                    "The branches meet at the sonic ratio ((gamma+1)/2)^(gamma/(gamma-1)), 1.893 for gamma = 1.4. Above it"
                            + " a normal shock stands ahead of the probe.")
            .takes(P02_OVER_P, GAMMA)
            .gives("M", "1", Interval.atLeast(0))
            .kernel(Pitot::mach)
            .partials(Kernel.of(Pitot::machByRatio), Kernel.of(Pitot::machByGamma))
            .sources(Sources.NACA_1135.at("eqs. (44) and (100)"))
            .example("0.500", 1.186213, 1.4)
            .cell(CellForm.steps()
                    .use("y", cells(), Map.of("p02_over_p", "{p02_over_p}", "gamma", "{gamma}"))
                    .helper("h", "({gamma}-1)/{gamma}*LN({p02_over_p})")
                    .helper("t", "IF(EXP({h})=1,{h},(EXP({h})-1)*{h}/LN(EXP({h})))")
                    .result("IF({p02_over_p}<" + SONIC_CELLS + ",SQRT(2/({gamma}-1)*{t})," + MACH_CELLS + ")"))
            .build();

    /** y = p2/p1: the kernel's seed without its last term, then two steps of third order in ln y. */
    private static CellForm cells() {
        String n = "(LN({y}/{q})+{gamma}/({gamma}-1)*LN(1+{c}/{y}))/(1-{gamma}/({gamma}+1)/({y}+{c}))";
        String next = "{y}*EXP(-{n}/(1-{n}/2*{gamma}/({gamma}+1)*{y}/({y}+{c})/({y}+{c}-{gamma}/({gamma}+1))))";
        return CellForm.steps()
                .helper("c", "({gamma}-1)/({gamma}+1)")
                .helper("q", "{p02_over_p}*(4*{gamma}/({gamma}+1)^2)^({gamma}/({gamma}-1))")
                .helper("sum", "{q}-{gamma}/({gamma}+1)")
                .helper("y0", "MAX(1,({sum}+SQRT(MAX(0,{sum}^2-2*{gamma}/({gamma}+1)^2)))/2)")
                .helper("n1", n.replace("{y}", "{y0}"))
                .helper("y1", next.replace("{y}", "{y0}").replace("{n}", "{n1}"))
                .helper("n2", n.replace("{y}", "{y1}"))
                .result(next.replace("{y}", "{y1}").replace("{n}", "{n2}"));
    }

    static List<FunctionEntry> entries() {
        return List.of(MACH1_FROM_SHOCK_P02_OVER_P1, MACH_FROM_PITOT);
    }
}
