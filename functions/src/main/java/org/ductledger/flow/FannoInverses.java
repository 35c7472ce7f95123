package org.ductledger.flow;

import static org.ductledger.flow.Arguments.BRANCH;
import static org.ductledger.flow.Arguments.FL_OVER_D;
import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.INLET_MACH;
import static org.ductledger.flow.Arguments.P0_OVER_P0STAR;
import static org.ductledger.flow.Arguments.SIGNED_FL_OVER_D;
import static org.ductledger.flow.Arguments.SUBSONIC;

import java.util.Map;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Numbers;
import org.ductledger.numeric.LogDefect;
import org.ductledger.numeric.LogDefectRoot;
import org.ductledger.numeric.Rounding;

/**
 * Mach numbers of a Fanno flow from its duct length, its ratios, or a first Mach number. With d = 2/(gamma+1), c = 1 - d
 * and y = d (1 - M^2)/M^2 the length to choking is y - ln(1 + y) over d gamma: no gamma is left in the equation for y.
 */
final class FannoInverses {
    /** A length to choking beside which the logarithm in it, and any admissible duct length, is below the last digit. */
    private static final double LONG = 1e200;

    /** How near the limit of infinite Mach number, over d^2, the series about it is taken. */
    private static final double NEAR_LIMIT = 0.03;

    /** Above this Mach number a length to choking is less exact than a difference of two. */
    private static final double DULL = 2;

    private FannoInverses() {}

    /** NaN where the supersonic branch ends before. */
    static double machFromFlOverD(double flOverD, double gamma, double branch) {
        return branch == SUBSONIC ? subsonic(flOverD, gamma) : supersonic(flOverD, gamma);
    }

    private static double subsonic(double flOverD, double gamma) {
        if (flOverD > LONG) {
            return 1 / Math.sqrt(gamma) / Math.sqrt(flOverD);
        }
        double y = LogDefectRoot.above(2 * gamma / (gamma + 1) * flOverD);
        return Math.sqrt(2 / (2 + (gamma + 1) * y));
    }

    private static double supersonic(double flOverD, double gamma) {
        double d = 2 / (gamma + 1);
        double c = 0.5 * (gamma - 1) * d;
        double defect = d * gamma * flOverD;
        double sum = defect < 0.19 ? d + LogDefectRoot.below(defect) : LogDefectRoot.sumBelow(defect) - c;
        if (sum > NEAR_LIMIT * c * d) {
            return Math.sqrt(d / sum);
        }
        double left = Fanno.flOverDLimit(gamma) - flOverD;
        return left > 0 ? nearTheLimit(d * gamma * left, gamma) : Double.NaN;
    }

    /**
     * The Mach number of a flow that comes close to the limit of infinite Mach number: d z - (z - ln(1 + z)) = left for
     * z = 2/((gamma-1) M^2), by the first terms of its series and a step of third order.
     */
    private static double nearTheLimit(double left, double gamma) {
        double d = 2 / (gamma + 1);
        double n = left / d;
        double b = 0.5 / d;
        double z = n * (1 + n * b * (1 + n * (2 * b - 2 / 3.0)));
        double slope = 1 - (1 - d) * (1 + z);
        double h = (left - (d * z - LogDefect.of(z))) / slope;
        z += (1 + z) * h * (1 + 0.5 * h / slope);
        return Math.sqrt(2 / (gamma - 1)) / Math.sqrt(z);
    }

    /** What the length to choking lacks to its limit for infinite Mach number; M &gt; 1. */
    static double lengthToLimit(double mach, double gamma) {
        return defectToLimit(mach, gamma) * (0.5 * (gamma + 1) / gamma);
    }

    /** ln(1 + z) - (gamma-1)/(gamma+1) z for z = 2/((gamma-1) M^2). */
    private static double defectToLimit(double mach, double gamma) {
        double z = 2 / (gamma - 1) / mach / mach;
        return z < 1 ? 2 / (gamma + 1) * z - LogDefect.of(z) : StrictMath.log1p(z) - (gamma - 1) / (gamma + 1) * z;
    }

    /** The Mach number a signed length further down; NaN where the flow chokes first, or has no such past. */
    static double mach2(double mach1, double flOverD, double gamma) {
        double toChoking = Fanno.flOverD(mach1, gamma);
        if (flOverD == 0 || toChoking > LONG) {
            return mach1;
        }
        if (flOverD > toChoking || !hasOnePast(mach1, flOverD) || !hasAPast(mach1, flOverD, gamma)) {
            return Double.NaN;
        }
        return mach1 > 1 ? supersonicMach2(mach1, flOverD, gamma, toChoking) : subsonic(toChoking - flOverD, gamma);
    }

    private static double supersonicMach2(double mach1, double flOverD, double gamma, double toChoking) {
        double d = 2 / (gamma + 1);
        double left = defectToLimit(mach1, gamma) + d * gamma * flOverD;
        if (left < NEAR_LIMIT * d * d) {
            return nearTheLimit(left, gamma);
        }
        double mach2 = supersonic(toChoking - flOverD, gamma);
        return mach2 > DULL ? corrected(mach1, flOverD, gamma, mach2) : mach2;
    }

    /**
     * At high Mach numbers the length to choking hardly depends on the Mach number, and its rounding errors would count:
     * one step of Newton by the difference of the lengths. For the change r of 1 + y in parts of it, y - ln(1 + y)
     * changes by r - ln(1 + r) + r y.
     */
    private static double corrected(double mach1, double flOverD, double gamma, double mach2) {
        double d = 2 / (gamma + 1);
        double change = d * ((mach1 - mach2) / mach1 * (1 + mach2 / mach1) / (mach2 * mach2));
        double sum = d * (0.5 * (gamma - 1) + 1 / mach1 / mach1);
        double y = -d * ((mach1 - 1) / mach1) * (1 + 1 / mach1);
        double sum2 = d * (0.5 * (gamma - 1) + 1 / mach2 / mach2);
        double r = change / sum;
        double difference = Math.abs(r) < 0.5 ? LogDefect.of(r) + r * y : change - StrictMath.log(sum2 / sum);
        return mach2 - (flOverD + difference / (d * gamma)) / Fanno.flOverDByMach(mach2, gamma);
    }

    /** Whether the flow is not one at M = 1 looked back from: a subsonic and a supersonic flow lead there. */
    static boolean hasOnePast(double mach1, double flOverD) {
        return mach1 != 1 || flOverD >= 0;
    }

    /** Whether the Mach number upstream is not beyond infinity. */
    static boolean hasAPast(double mach1, double flOverD, double gamma) {
        return mach1 <= 1 || flOverD == 0 || flOverD > -lengthToLimit(mach1, gamma);
    }

    /** (gamma+1)/2: T/T* at rest, rounded. */
    static double tOverTstarAtRest(double gamma) {
        return Fanno.tOverTstar(0, gamma);
    }

    /** NaN where T/T* exceeds its value at rest. */
    static double machFromTOverTstar(double tOverTstar, double gamma) {
        if (tOverTstar > tOverTstarAtRest(gamma)) {
            return Double.NaN;
        }
        double below = (gamma + 1 - 2 * tOverTstar) + Rounding.ofSum(gamma, 1);
        return Math.sqrt(Math.max(0, below) / (gamma - 1)) / Math.sqrt(tOverTstar);
    }

    static double machFromPOverPstar(double pOverPstar, double gamma) {
        double p = pOverPstar;
        double product = (gamma - 1) * (gamma + 1);
        double root = Math.sqrt(gamma + 1);
        return p > 1
                ? root / p / Math.sqrt(1 + Math.sqrt(1 + product / p / p))
                : root / (Math.sqrt(p) * Math.sqrt(p + Math.sqrt(p * p + product)));
    }

    static double mach2ByMach1(double mach1, double flOverD, double gamma) {
        return Fanno.flOverDByMach(mach1, gamma) / Fanno.flOverDByMach(mach2(mach1, flOverD, gamma), gamma);
    }

    static double mach2ByFlOverD(double mach1, double flOverD, double gamma) {
        return -1 / Fanno.flOverDByMach(mach2(mach1, flOverD, gamma), gamma);
    }

    static double mach2ByGamma(double mach1, double flOverD, double gamma) {
        double mach2 = mach2(mach1, flOverD, gamma);
        return (Fanno.flOverDByGamma(mach1, gamma) - Fanno.flOverDByGamma(mach2, gamma))
                / Fanno.flOverDByMach(mach2, gamma);
    }

    private static EntryBuilder inverse(String name, String wanted) {
        return Fanno.FAMILY
                .entry(name)
                .formula(wanted)
                .gives("M", "1", Interval.atLeast(0))
                .sources(Fanno.FRICTION);
    }

    static final FunctionEntry MACH_FROM_FANNO_FL_OVER_D = inverse(
                    "mach_from_fanno_fl_over_d", "the M on this branch for which fanno_fl_over_d(M, gamma) = f L/D")
            .title("Mach number of a Fanno flow that chokes after a given duct length")
            .note(Fanno.DARCY + " A supersonic flow chokes within the limit for infinite M, 0.8215 at gamma = 1.4.")
            .takes(FL_OVER_D, GAMMA, BRANCH)
            .kernel(FannoInverses::machFromFlOverD)
            .requiresBelow(
                    FaultKind.NO_SOLUTION,
                    "fl_over_d",
                    Kernel.of((flOverD, gamma, branch) ->
                            branch == SUBSONIC ? Double.POSITIVE_INFINITY : Fanno.flOverDLimit(gamma)),
                    "the length in which a supersonic flow of infinite Mach number chokes")
            .partials(InverseSlopes.ofBranches(
                    FannoInverses::machFromFlOverD, Fanno::flOverDByMach, Fanno::flOverDByGamma))
            .example("0.3000", 5.29925, 1.4, "subsonic")
            .cell(machFromFlOverDCell())
            .build();

    private static CellForm machFromFlOverDCell() {
        return CellForm.steps()
                .helper("limit", "({gamma}+1)/(2*{gamma})*LN(({gamma}+1)/({gamma}-1))-1/{gamma}")
                .use(
                        "log",
                        LogDefectCells.ROOT_LOG,
                        Map.of(
                                "defect",
                                "2*{gamma}/({gamma}+1)*{fl_over_d}",
                                "sign",
                                "IF({branch}=\"subsonic\",1,0-1)"))
                .result("IF(OR({branch}=\"subsonic\",{fl_over_d}<{limit}),"
                        + "SQRT(2/(({gamma}+1)*EXP({log})-({gamma}-1))),NA())");
    }

    static final FunctionEntry MACH_FROM_FANNO_T_OVER_TSTAR = inverse(
                    "mach_from_fanno_t_over_tstar", "M = sqrt((gamma+1 - 2 T/T*)/((gamma-1) T/T*))")
            .title("Mach number of a Fanno flow from T/T*")
            .takes(
                    Argument.number(
                            "t_over_tstar", "T/T*", "1", Interval.above(0), "temperature over its value at M = 1"),
                    GAMMA)
            .kernel(FannoInverses::machFromTOverTstar)
            .requiresAtMost(
                    FaultKind.NO_SOLUTION,
                    "t_over_tstar",
                    Kernel.of((tOverTstar, gamma) -> tOverTstarAtRest(gamma)),
                    "its value at rest")
            .partials(InverseSlopes.of(
                    FannoInverses::machFromTOverTstar, Fanno::tOverTstarByMach, Fanno::tOverTstarByGamma))
            .example("2.000", 0.66667, 1.4)
            .cell("IF({t_over_tstar}<=({gamma}+1)/2,"
                    + "SQRT(({gamma}+1-2*{t_over_tstar})/(({gamma}-1)*{t_over_tstar})),NA())")
            .build();

    static final FunctionEntry MACH_FROM_FANNO_P_OVER_PSTAR = inverse(
                    "mach_from_fanno_p_over_pstar", "M^2 = ((gamma+1)/(p/p*)^2)/(1 + sqrt(1 + (gamma^2-1)/(p/p*)^2))")
            .title("Mach number of a Fanno flow from p/p*")
            .takes(
                    Argument.number("p_over_pstar", "p/p*", "1", Interval.above(0), "pressure over its value at M = 1"),
                    GAMMA)
            .kernel(FannoInverses::machFromPOverPstar)
            .partials(InverseSlopes.of(
                    FannoInverses::machFromPOverPstar, Fanno::pOverPstarByMach, Fanno::pOverPstarByGamma))
            .example("2.000", 0.408248, 1.4)
            .cell("SQRT(({gamma}+1)/(1+SQRT(1+({gamma}^2-1)/{p_over_pstar}^2)))/{p_over_pstar}")
            .build();

    static final FunctionEntry MACH_FROM_FANNO_P0_OVER_P0STAR = inverse(
                    "mach_from_fanno_p0_over_p0star",
                    "the M on this branch for which fanno_p0_over_p0star(M, gamma) = p0/p0*")
            .title("Mach number of a Fanno flow from p0/p0*")
            .takes(P0_OVER_P0STAR, GAMMA, BRANCH)
            .kernel(IsentropicBranches::machFromAreaRatio)
            .partials(InverseSlopes.ofBranches(
                    IsentropicBranches::machFromAreaRatio,
                    IsentropicSlopes::areaRatioByMach,
                    IsentropicSlopes::areaRatioByGamma))
            .example("2.000", 1.6875, 1.4, "supersonic")
            .cell(CellForm.steps()
                    .use(
                            "mach",
                            IsentropicInverses.MACH_FROM_AREA_RATIO.cellForm(),
                            Map.of("area_ratio", "{p0_over_p0star}", "gamma", "{gamma}", "branch", "{branch}"))
                    .result("{mach}"))
            .build();

    static final FunctionEntry FANNO_MACH2 = Fanno.FAMILY
            .entry("fanno_mach2")
            .title("Mach number of a Fanno flow a duct length further on")
            .formula("the M2 on the side of M1 for which f L*/D(M2) = f L*/D(M1) - f L/D")
            .note(Fanno.DARCY + " A negative length looks upstream.")
            .takes(INLET_MACH, SIGNED_FL_OVER_D, GAMMA)
            .gives("M2", "1", Interval.above(0))
            .kernel(FannoInverses::mach2)
            .requiresAtMost(
                    FaultKind.NO_SOLUTION,
                    "fl_over_d",
                    Kernel.of((mach1, flOverD, gamma) -> Fanno.flOverD(mach1, gamma)),
                    "the length in which the flow chokes: in a longer duct it cannot have this mach1")
            .requires(
                    FaultKind.OUTSIDE_DOMAIN,
                    "mach1",
                    row -> hasOnePast(row[0], row[1]),
                    row -> "must not be 1 where fl_over_d is negative (a subsonic and a supersonic flow lead there:"
                            + " mach_from_fanno_fl_over_d takes the branch)")
            .requires(
                    FaultKind.NO_SOLUTION,
                    "fl_over_d",
                    row -> hasAPast(row[0], row[1], row[2]),
                    row -> "must be greater than " + Numbers.brief(-lengthToLimit(row[0], row[2]))
                            + " (that far upstream the Mach number is infinite)")
            .partials(
                    Kernel.of(FannoInverses::mach2ByMach1),
                    Kernel.of(FannoInverses::mach2ByFlOverD),
                    Kernel.of(FannoInverses::mach2ByGamma))
            .sources(Fanno.FRICTION)
            .example("0.4000", 0.3, 2.99076, 1.4)
            .cell(mach2Cell())
            .build();

    private static CellForm mach2Cell() {
        return CellForm.steps()
                .use("choking", Fanno.FANNO_FL_OVER_D.cellForm(), Map.of("mach", "{mach1}", "gamma", "{gamma}"))
                .helper("left", "{choking}-{fl_over_d}")
                .use(
                        "there",
                        machFromFlOverDCell(),
                        Map.of(
                                "fl_over_d",
                                "MAX({left},0)",
                                "gamma",
                                "{gamma}",
                                "branch",
                                "IF({mach1}<=1,\"subsonic\",\"supersonic\")"))
                .result("IF(OR({left}<0,AND({mach1}=1,{fl_over_d}<0)),NA(),{there})");
    }
}
