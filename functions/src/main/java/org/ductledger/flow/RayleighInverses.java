package org.ductledger.flow;

import static org.ductledger.flow.Arguments.BELOW;
import static org.ductledger.flow.Arguments.BRANCH;
import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.INLET_MACH;
import static org.ductledger.flow.Arguments.P0_OVER_P0STAR;
import static org.ductledger.flow.Arguments.SUBSONIC;
import static org.ductledger.flow.Arguments.THERMAL_BRANCH;

import java.util.Map;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Numbers;
import org.ductledger.numeric.Rounding;
import org.ductledger.numeric.SonicBalance;

/**
 * Mach numbers of a Rayleigh flow from its ratios, or from a first Mach number and the heat. With s = sqrt(1 - T0/T0*)
 * they are closed: M^2 = (1-s)/(1+gamma s) or (1+s)/(1-gamma s).
 */
final class RayleighInverses {
    /** Above this the 1 in 1 + gamma M^2 is below the last digit. */
    private static final double HUGE = 1e70;

    private static final double ROUNDING = 0x1p-51;

    /** Above this a ratio next to it may overflow. */
    private static final double NEARLY_INFINITE = 0x1p960;

    private RayleighInverses() {}

    /** 1 - gamma^2 (1 - T0/T0*): above 0 as far as a supersonic flow has T0/T0*. */
    static double aboveLimit(double t0OverT0star, double gamma) {
        double square = 1 - t0OverT0star;
        double product = gamma * square;
        double rest = Rounding.ofProduct(gamma, square) + gamma * Rounding.ofSum(1, -t0OverT0star);
        return Math.fma(-gamma, product, 1) - gamma * rest;
    }

    /** NaN where a supersonic flow has no such T0/T0*. */
    static double machFromT0OverT0star(double t0OverT0star, double gamma, double branch) {
        double s = Math.sqrt(1 - t0OverT0star);
        double product = (1 + s) * (1 + gamma * s);
        if (branch == SUBSONIC) {
            return Math.sqrt(t0OverT0star / product);
        }
        double above = aboveLimit(t0OverT0star, gamma);
        return above > 0 ? Math.sqrt(product / above) : Double.NaN;
    }

    /** (gamma+1)^2/(4 gamma), the greatest T/T*, and what rounding may do to it. */
    static double greatestTOverTstar(double gamma) {
        return (1 + (gamma - 1) * (gamma - 1) / (4 * gamma)) * (1 + ROUNDING);
    }

    /** NaN where T/T* exceeds its greatest value. */
    static double machFromTOverTstar(double tOverTstar, double gamma, double branch) {
        if (tOverTstar > greatestTOverTstar(gamma)) {
            return Double.NaN;
        }
        double root = Math.sqrt(tOverTstar);
        double sum = gamma + 1 + Math.sqrt(Math.max(0, discriminant(tOverTstar, gamma)));
        return branch == BELOW ? 2 * root / sum : sum / (2 * gamma * root);
    }

    /** (gamma+1)^2 - 4 gamma T/T*. */
    private static double discriminant(double tOverTstar, double gamma) {
        double sum = gamma + 1;
        double square = sum * sum;
        double squareRest = Rounding.ofProduct(sum, sum) + 2 * sum * Rounding.ofSum(gamma, 1);
        double product = 4 * gamma * tOverTstar;
        return (square - product) + (squareRest - Rounding.ofProduct(4 * gamma, tOverTstar));
    }

    /** NaN where p/p* exceeds its value at rest. */
    static double machFromPOverPstar(double pOverPstar, double gamma) {
        if (pOverPstar > gamma + 1) {
            return Double.NaN;
        }
        double below = (gamma + 1 - pOverPstar) + Rounding.ofSum(gamma, 1);
        return Math.sqrt(Math.max(0, below) / gamma) / Math.sqrt(pOverPstar);
    }

    /**
     * NaN where a subsonic flow has no such p0/p0*. With N^2 = (1+gamma M^2)/(1+gamma), log(p0/p0*) is
     * log(1 + c (N^2-1))/c - log N^2 for c = (gamma-1)/gamma.
     */
    static double machFromP0OverP0star(double p0OverP0star, double gamma, double branch) {
        boolean above = branch != SUBSONIC;
        if (!above && p0OverP0star > Rayleigh.p0OverP0star(0, gamma)) {
            return Double.NaN;
        }
        double c = (gamma - 1) / gamma;
        double k = StrictMath.log1p(p0OverP0star - 1);
        if (p0OverP0star > NEARLY_INFINITE) {
            return unbalanced(SonicBalance.solve(k, c, 1 / gamma, true), gamma);
        }
        double balanced = SonicBalance.approached(k, c, 1 / gamma, above);
        if (SonicBalance.isNear(balanced) || balanced > Double.MAX_VALUE) {
            return unbalanced(balanced, gamma);
        }
        double mach = unbalanced(balanced, gamma);
        double excess = Rayleigh.p0OverP0star(mach, gamma) / p0OverP0star - 1;
        double refined = SonicBalance.refined(balanced(mach, gamma), StrictMath.log1p(excess), c, 1 / gamma);
        return unbalanced(refined, gamma);
    }

    private static double balanced(double mach, double gamma) {
        return mach > HUGE ? mach / Math.sqrt(1 + 1 / gamma) : Math.sqrt((1 + gamma * mach * mach) / (1 + gamma));
    }

    private static double unbalanced(double balanced, double gamma) {
        if (balanced > HUGE) {
            return balanced * Math.sqrt(1 + 1 / gamma);
        }
        return Math.sqrt(Math.max(0, Math.fma((1 + gamma) * balanced, balanced, -1)) / gamma);
    }

    /** The Mach number behind heating or cooling; NaN where the flow chokes first, or cools beyond infinite M. */
    static double mach2(double mach1, double ratio, double gamma) {
        if (ratio == 1) {
            return mach1;
        }
        if (ratio > Rayleigh.t02OverT01Max(mach1, gamma)
                || !hasOneFuture(mach1, ratio)
                || !hasAFuture(mach1, ratio, gamma)) {
            return Double.NaN;
        }
        double s = behind(mach1, ratio, gamma);
        double product = (1 + s) * (1 + gamma * s);
        if (mach1 > 1) {
            return Math.sqrt(product / aboveLimitBehind(mach1, ratio, gamma));
        }
        double s1 = Rayleigh.distance(mach1, gamma);
        return mach1 * Math.sqrt(ratio) * Math.sqrt((1 + s1) * (1 + gamma * s1) / product);
    }

    /** sqrt(1 - T02/T0*). */
    private static double behind(double mach1, double ratio, double gamma) {
        double q = Rayleigh.distance(mach1, gamma);
        return Math.sqrt(Math.max(0, q * q - Rayleigh.t0OverT0star(mach1, gamma) * (ratio - 1)));
    }

    /** 1 - gamma^2 (1 - T02/T0*) behind a supersonic flow, in which 1 + gamma q is p/p* and exact where M is large. */
    private static double aboveLimitBehind(double mach1, double ratio, double gamma) {
        double q = Rayleigh.distance(mach1, gamma);
        double ahead = Rayleigh.pOverPstar(mach1, gamma) * (1 - gamma * q);
        return ahead + gamma * gamma * Rayleigh.t0OverT0star(mach1, gamma) * (ratio - 1);
    }

    /** Whether the flow is not cooled at M = 1, from where it may turn subsonic or supersonic. */
    static boolean hasOneFuture(double mach1, double ratio) {
        return mach1 != 1 || ratio >= 1;
    }

    /** Whether the Mach number does not pass infinity. */
    static boolean hasAFuture(double mach1, double ratio, double gamma) {
        return mach1 <= 1 || ratio >= 1 || aboveLimitBehind(mach1, ratio, gamma) > 0;
    }

    /** The cooling at which a supersonic flow reaches infinite Mach number. */
    static double leastT02OverT01(double mach1, double gamma) {
        return (gamma - 1) * (gamma + 1) / (gamma * gamma) * Rayleigh.t02OverT01Max(mach1, gamma);
    }

    static double mach2ByMach1(double mach1, double ratio, double gamma) {
        double mach2 = mach2(mach1, ratio, gamma);
        return ratio * Rayleigh.t0OverT0starByMach(mach1, gamma) / Rayleigh.t0OverT0starByMach(mach2, gamma);
    }

    static double mach2ByT02OverT01(double mach1, double ratio, double gamma) {
        double mach2 = mach2(mach1, ratio, gamma);
        return Rayleigh.t0OverT0star(mach1, gamma) / Rayleigh.t0OverT0starByMach(mach2, gamma);
    }

    static double mach2ByGamma(double mach1, double ratio, double gamma) {
        double mach2 = mach2(mach1, ratio, gamma);
        return (ratio * Rayleigh.t0OverT0starByGamma(mach1, gamma) - Rayleigh.t0OverT0starByGamma(mach2, gamma))
                / Rayleigh.t0OverT0starByMach(mach2, gamma);
    }

    private static final Argument T0_OVER_T0STAR = Argument.number(
            "t0_over_t0star",
            "T0/T0*",
            "1",
            Interval.openClosed(0, 1),
            "stagnation temperature over its value at M = 1");
    private static final Argument T_OVER_TSTAR =
            Argument.number("t_over_tstar", "T/T*", "1", Interval.above(0), "temperature over its value at M = 1");
    private static final Argument P_OVER_PSTAR =
            Argument.number("p_over_pstar", "p/p*", "1", Interval.above(0), "pressure over its value at M = 1");
    private static final Argument T02_OVER_T01 = Argument.number(
            "t02_over_t01",
            "T02/T01",
            "1",
            Interval.above(0),
            "stagnation temperature behind over ahead: above 1 heats, below 1 cools");

    private static EntryBuilder inverse(String name, Argument... given) {
        return Rayleigh.FAMILY
                .entry(name)
                .takes(given)
                .gives("M", "1", Interval.atLeast(0))
                .sources(Rayleigh.HEATING);
    }

    static final FunctionEntry MACH_FROM_RAYLEIGH_T0_OVER_T0STAR = inverse(
                    "mach_from_rayleigh_t0_over_t0star", T0_OVER_T0STAR, GAMMA, BRANCH)
            .title("Mach number of a Rayleigh flow from T0/T0*")
            .formula("M^2 = (1-s)/(1+gamma s) subsonic, (1+s)/(1-gamma s) supersonic,  s = sqrt(1 - T0/T0*)")
            .note("Supersonic, T0/T0* falls to 1 - 1/gamma^2 as M grows: 0.4898 at gamma = 1.4.")
            .kernel(RayleighInverses::machFromT0OverT0star)
            .requires(
                    FaultKind.NO_SOLUTION,
                    "t0_over_t0star",
                    row -> row[2] == SUBSONIC || aboveLimit(row[0], row[1]) > 0,
                    row -> "must be greater than " + Numbers.brief((row[1] - 1) * (row[1] + 1) / (row[1] * row[1]))
                            + " (its limit for infinite Mach number)")
            .partials(InverseSlopes.ofBranches(
                    RayleighInverses::machFromT0OverT0star,
                    Rayleigh::t0OverT0starByMach,
                    Rayleigh::t0OverT0starByGamma))
            .example("0.3000", 0.346860, 1.4, "subsonic")
            .cell(machFromT0OverT0starCell())
            .build();

    private static CellForm machFromT0OverT0starCell() {
        return CellForm.steps()
                .helper("s", "SQRT(1-{t0_over_t0star})")
                .helper("above_limit", "1-{gamma}^2*(1-{t0_over_t0star})")
                .result("IF({branch}=\"subsonic\",SQRT({t0_over_t0star}/((1+{s})*(1+{gamma}*{s}))),"
                        + "IF({above_limit}>0,SQRT((1+{s})*(1+{gamma}*{s})/{above_limit}),NA()))");
    }

    static final FunctionEntry MACH_FROM_RAYLEIGH_T_OVER_TSTAR = inverse(
                    "mach_from_rayleigh_t_over_tstar", T_OVER_TSTAR, GAMMA, THERMAL_BRANCH)
            .title("Mach number of a Rayleigh flow from T/T*")
            .formula("gamma r M^2 - (gamma+1) M + r = 0,  r = sqrt(T/T*)")
            .note("The branches meet at M = 1/sqrt(gamma), where T/T* is greatest.")
            .kernel(RayleighInverses::machFromTOverTstar)
            .requiresAtMost(
                    FaultKind.NO_SOLUTION,
                    "t_over_tstar",
                    Kernel.of((tOverTstar, gamma, branch) -> greatestTOverTstar(gamma)),
                    "its greatest value, at M = 1/sqrt(gamma)")
            .partials(InverseSlopes.ofBranches(
                    RayleighInverses::machFromTOverTstar, Rayleigh::tOverTstarByMach, Rayleigh::tOverTstarByGamma))
            .example("0.3000", 0.408873, 1.4, "below")
            .cell(machFromTOverTstarCell())
            .build();

    private static CellForm machFromTOverTstarCell() {
        return CellForm.steps()
                .helper("root", "SQRT({t_over_tstar})")
                .helper("discriminant", "({gamma}-1)^2+4*{gamma}*(1-{t_over_tstar})")
                .helper("sum", "{gamma}+1+SQRT(MAX({discriminant},0))")
                .result("IF({discriminant}>=0,IF({branch}=\"below\",2*{root}/{sum},{sum}/(2*{gamma}*{root})),NA())");
    }

    static final FunctionEntry MACH_FROM_RAYLEIGH_P_OVER_PSTAR = inverse(
                    "mach_from_rayleigh_p_over_pstar", P_OVER_PSTAR, GAMMA)
            .title("Mach number of a Rayleigh flow from p/p*")
            .formula("M^2 = ((gamma+1)/(p/p*) - 1)/gamma")
            .kernel(RayleighInverses::machFromPOverPstar)
            .requiresAtMost(
                    FaultKind.NO_SOLUTION,
                    "p_over_pstar",
                    Kernel.of((pOverPstar, gamma) -> gamma + 1),
                    "its value at rest")
            .partials(InverseSlopes.of(
                    RayleighInverses::machFromPOverPstar, Rayleigh::pOverPstarByMach, Rayleigh::pOverPstarByGamma))
            .example("0.3000", 2.131439, 1.4)
            .cell("IF({p_over_pstar}<={gamma}+1,SQRT(({gamma}+1-{p_over_pstar})/({gamma}*{p_over_pstar})),NA())")
            .build();

    static final FunctionEntry MACH_FROM_RAYLEIGH_P0_OVER_P0STAR = inverse(
                    "mach_from_rayleigh_p0_over_p0star", P0_OVER_P0STAR, GAMMA, BRANCH)
            .title("Mach number of a Rayleigh flow from p0/p0*")
            .formula("the M on this branch for which rayleigh_p0_over_p0star(M, gamma) = p0/p0*")
            .note("Subsonic, p0/p0* grows to its value at rest: 1.2679 at gamma = 1.4.")
            .kernel(RayleighInverses::machFromP0OverP0star)
            .requiresAtMost(
                    FaultKind.NO_SOLUTION,
                    "p0_over_p0star",
                    Kernel.of((p0OverP0star, gamma, branch) ->
                            branch == SUBSONIC ? Rayleigh.p0OverP0star(0, gamma) : Double.POSITIVE_INFINITY),
                    "its value at rest")
            .partials(InverseSlopes.ofBranches(
                    RayleighInverses::machFromP0OverP0star,
                    Rayleigh::p0OverP0starByMach,
                    Rayleigh::p0OverP0starByGamma))
            .example("0.3000", 1.198549, 1.4, "subsonic")
            .cell(machFromP0OverP0starCell())
            .build();

    private static CellForm machFromP0OverP0starCell() {
        return CellForm.steps()
                .helper("at_rest", "2*(2/({gamma}+1))^(1/({gamma}-1))")
                .helper("c", "({gamma}-1)/{gamma}")
                .use(
                        "square",
                        SonicBalanceCells.MACH_SQUARE,
                        Map.of("l", "LN({p0_over_p0star})/2", "c", "{c}", "below", "{branch}=\"subsonic\""))
                .result("IF(AND({branch}=\"subsonic\",{p0_over_p0star}>{at_rest}),NA(),"
                        + "SQRT(MAX(0,1+({square}-1)*({gamma}+1)/{gamma})))");
    }

    static final FunctionEntry RAYLEIGH_MACH2 = Rayleigh.FAMILY
            .entry("rayleigh_mach2")
            .title("Mach number of a Rayleigh flow behind heating or cooling")
            .formula("the M2 on the side of M1 for which T0/T0*(M2) = T02/T01 T0/T0*(M1)")
            .note("T02/T01 = 1 + q/(cp T01) with the heat q per unit of mass.")
            .takes(INLET_MACH, T02_OVER_T01, GAMMA)
            .gives("M2", "1", Interval.above(0))
            .kernel(RayleighInverses::mach2)
            .requiresAtMost(
                    FaultKind.NO_SOLUTION,
                    "t02_over_t01",
                    Kernel.of((mach1, ratio, gamma) -> Rayleigh.t02OverT01Max(mach1, gamma)),
                    "the heating that chokes the flow: with more it cannot have this mach1")
            .requires(
                    FaultKind.OUTSIDE_DOMAIN,
                    "mach1",
                    row -> hasOneFuture(row[0], row[1]),
                    row -> "must not be 1 where t02_over_t01 is less than 1 (cooled, it turns subsonic or supersonic:"
                            + " mach_from_rayleigh_t0_over_t0star takes the branch)")
            .requires(
                    FaultKind.NO_SOLUTION,
                    "t02_over_t01",
                    row -> hasAFuture(row[0], row[1], row[2]),
                    row -> "must be greater than " + Numbers.brief(leastT02OverT01(row[0], row[2]))
                            + " (cooled to that, the Mach number is infinite)")
            .partials(
                    Kernel.of(RayleighInverses::mach2ByMach1),
                    Kernel.of(RayleighInverses::mach2ByT02OverT01),
                    Kernel.of(RayleighInverses::mach2ByGamma))
            .sources(Rayleigh.HEATING)
            .example("0.3142", 0.170178, 2.88868, 1.4)
            .cell(mach2Cell())
            .build();

    private static CellForm mach2Cell() {
        return CellForm.steps()
                .helper("q", "(1-{mach1})*(1+{mach1})/(1+{gamma}*{mach1}^2)")
                .helper("ahead", Rayleigh.t0Cell("{mach1}"))
                .helper("square", "{q}^2-{ahead}*({t02_over_t01}-1)")
                .helper("s", "SQRT(MAX({square},0))")
                .helper("above_limit", "(1-{gamma}^2*{q}^2)+{gamma}^2*{ahead}*({t02_over_t01}-1)")
                .helper("fault", "OR({square}<0,AND({mach1}=1,{t02_over_t01}<1),AND({mach1}>1,{above_limit}<=0))")
                .result("IF({fault},NA(),IF({mach1}<=1,"
                        + "SQRT({ahead}*{t02_over_t01}/((1+{s})*(1+{gamma}*{s}))),"
                        + "SQRT((1+{s})*(1+{gamma}*{s})/{above_limit})))");
    }
}
