package org.ductledger.flow;

import static org.ductledger.flow.Arguments.ABOVE;
import static org.ductledger.flow.Arguments.BELOW;
import static org.ductledger.flow.Arguments.FL_OVER_D;
import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.INLET_MACH;
import static org.ductledger.flow.Arguments.MACH;
import static org.ductledger.flow.Arguments.SIGNED_FL_OVER_D;
import static org.ductledger.flow.Arguments.THERMAL_BRANCH;

import java.util.List;
import java.util.Map;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;
import org.ductledger.numeric.LogDefect;
import org.ductledger.numeric.LogDefectRoot;
import org.ductledger.numeric.LogRest;
import org.ductledger.numeric.Power;
import org.ductledger.numeric.Rounding;

/**
 * Isothermal duct flow with friction: a perfect gas in a long duct of constant area that keeps it at one temperature.
 * The star is M = 1/sqrt(gamma), where such a flow chokes. With y = 1/(gamma M^2) - 1 the length to it is y - ln(1 + y).
 */
final class Isothermal {
    private static final Chapter FAMILY = new Chapter("isothermal", "Isothermal duct flow with friction");

    /** Between this and its reciprocal M^2 may be squared again. */
    private static final double MOST_MACH = 1e70;

    /** A length to choking beside which the logarithm in it, and any admissible duct length, is below the last digit. */
    private static final double LONG = 1e200;

    /** From here on 1 + y is too small for a double, and nothing to ln(1 + y). */
    private static final double FAR = 600;

    /** Above this Mach number 1 + y is so small that its logarithm is better taken by itself. */
    private static final double FAST = 1e4;

    /** Above this Mach number a length to choking is less exact than a difference of two. */
    private static final double DULL = 2;

    private Isothermal() {}

    /** The length in which the flow chokes, as f L/D with the Darcy factor; M &gt; 0. */
    static double flOverD(double mach, double gamma) {
        if (mach > FAST) {
            return 2 * StrictMath.log(mach) + StrictMath.log(gamma) - 1 + 1 / mach / mach / gamma;
        }
        if (mach < 1 / MOST_MACH) {
            return 1 / mach / mach / gamma;
        }
        double g = gamma * mach * mach;
        return LogDefect.ofQuotient(1 - g, overChoking(mach, gamma), g, Rounding.ofScaledSquare(gamma, mach));
    }

    /** What rounding took from 1 - gamma M^2. */
    private static double overChoking(double mach, double gamma) {
        return Rounding.ofSum(1, -(gamma * mach * mach)) - Rounding.ofScaledSquare(gamma, mach);
    }

    static double flOverDByMach(double mach, double gamma) {
        return mach > MOST_MACH ? 2 / mach : -2 * distance(mach, gamma) / (gamma * mach * mach * mach);
    }

    static double flOverDByGamma(double mach, double gamma) {
        return -distance(mach, gamma) / (gamma * gamma * mach * mach);
    }

    /** 1 - gamma M^2: above 0 before choking from low Mach numbers. */
    static double distance(double mach, double gamma) {
        return (1 - gamma * mach * mach) + overChoking(mach, gamma);
    }

    static double pOverPstar(double mach, double gamma) {
        return 1 / (Math.sqrt(gamma) * mach);
    }

    static double pOverPstarByMach(double mach, double gamma) {
        return -pOverPstar(mach, gamma) / mach;
    }

    static double pOverPstarByGamma(double mach, double gamma) {
        return -0.5 * pOverPstar(mach, gamma) / gamma;
    }

    static double t0OverT0star(double mach, double gamma) {
        return (2 * gamma + gamma * (gamma - 1) * mach * mach) / (3 * gamma - 1);
    }

    static double t0OverT0starByMach(double mach, double gamma) {
        return 2 * gamma * (gamma - 1) * mach / (3 * gamma - 1);
    }

    static double t0OverT0starByGamma(double mach, double gamma) {
        double sum = 3 * gamma - 1;
        return ((3 * gamma * gamma - 2 * gamma + 1) * mach * mach - 2) / (sum * sum);
    }

    /**
     * With r = T0/T0* = (2 gamma + (gamma-1) gamma M^2)/(3 gamma-1): r to the power (gamma+1)/(2 (gamma-1)), times
     * sqrt(r)/(sqrt(gamma) M), so that no factor leaves the range of a double before the result does.
     */
    static double p0OverP0star(double mach, double gamma) {
        if (mach > MOST_MACH) {
            double root = Math.sqrt(stagnationShare(gamma));
            return root * power(root * Math.sqrt(gamma) * mach, 0, 1, gamma);
        }
        double gain = (gamma - 1) * (gamma * mach * mach);
        double gainRest = Rounding.ofProduct(gamma - 1, gamma * mach * mach)
                + (gamma - 1) * Rounding.ofScaledSquare(gamma, mach)
                + Rounding.ofSum(gamma, -1) * (gamma * mach * mach);
        double d = 3 * gamma - 1;
        double dRest = Rounding.ofProduct(3, gamma) + Rounding.ofSum(3 * gamma, -1);
        double n = 2 * gamma + gain;
        double nRest = Rounding.ofSum(2 * gamma, gain) + gainRest;
        double r = n / d;
        double rest = (Math.fma(-r, d, n) + (nRest - r * dRest)) / d;
        return power(r, rest, 0.5, gamma) * (Math.sqrt(r) * pOverPstar(mach, gamma));
    }

    /** base^(share (gamma+1)/(gamma-1)). */
    private static double power(double base, double baseRest, double share, double gamma) {
        double n = share * (gamma + 1);
        double nRest = share * Rounding.ofSum(gamma, 1);
        double d = gamma - 1;
        double exponent = n / d;
        double rest = (Math.fma(-exponent, d, n) + (nRest - exponent * Rounding.ofSum(gamma, -1))) / d;
        return Power.of(Math.min(base, Double.MAX_VALUE), baseRest, exponent, rest);
    }

    private static double stagnationShare(double gamma) {
        return (gamma - 1) / (3 * gamma - 1);
    }

    static double p0OverP0starByMach(double mach, double gamma) {
        double m = mach * mach;
        return p0OverP0star(mach, gamma) * ((gamma + 1) * m - 2) / (mach * (2 + (gamma - 1) * m));
    }

    static double p0OverP0starByGamma(double mach, double gamma) {
        double m = mach * mach;
        double share = distance(mach, gamma) / ((3 * gamma - 1) * t0OverT0star(mach, gamma));
        double steep = share * share * LogRest.of(-stagnationShare(gamma) * distance(mach, gamma));
        double direct = (1 + gamma * (3 * gamma - 2) * m) / (gamma * (3 * gamma - 1) * (2 + (gamma - 1) * m));
        return p0OverP0star(mach, gamma) * (direct - 0.5 / gamma - steep);
    }

    static double machFromFlOverD(double flOverD, double gamma, double branch) {
        if (branch == BELOW) {
            return flOverD > LONG
                    ? 1 / Math.sqrt(gamma) / Math.sqrt(flOverD)
                    : Math.sqrt(1 / (gamma * (1 + LogDefectRoot.above(flOverD))));
        }
        return flOverD > FAR
                ? StrictMath.exp(0.5 * (flOverD + 1)) / Math.sqrt(gamma)
                : Math.sqrt(1 / (gamma * LogDefectRoot.sumBelow(flOverD)));
    }

    /** The Mach number a signed length further down; NaN where the flow chokes first. */
    static double mach2(double mach1, double flOverD, double gamma) {
        double toChoking = flOverD(mach1, gamma);
        if (flOverD == 0 || toChoking > LONG) {
            return mach1;
        }
        if (flOverD > toChoking || !hasOnePast(mach1, flOverD, gamma)) {
            return Double.NaN;
        }
        double left = toChoking - flOverD;
        if (distance(mach1, gamma) >= 0) {
            return machFromFlOverD(left, gamma, BELOW);
        }
        double mach2 = machFromFlOverD(left, gamma, ABOVE);
        return mach2 > DULL && mach2 < Double.MAX_VALUE ? corrected(mach1, flOverD, gamma, mach2) : mach2;
    }

    /**
     * One step of Newton by the difference of the lengths, which does not carry their rounding errors. For the change r
     * of 1 + y in parts of it, y - ln(1 + y) changes by r - ln(1 + r) + r y.
     */
    private static double corrected(double mach1, double flOverD, double gamma, double mach2) {
        double ratio = mach1 / mach2;
        double r = (mach1 - mach2) / mach2 * (1 + ratio);
        double sum = 1 / mach1 / mach1 / gamma;
        double difference = Math.abs(r) < 0.5 ? LogDefect.of(r) + r * (sum - 1) : r * sum - 2 * StrictMath.log(ratio);
        return mach2 - (flOverD + difference) / flOverDByMach(mach2, gamma);
    }

    /** Whether the flow is not one at M = 1/sqrt(gamma) looked back from: flows from both sides lead there. */
    static boolean hasOnePast(double mach1, double flOverD, double gamma) {
        return flOverD >= 0 || distance(mach1, gamma) != 0;
    }

    static double mach2ByMach1(double mach1, double flOverD, double gamma) {
        return flOverDByMach(mach1, gamma) / flOverDByMach(mach2(mach1, flOverD, gamma), gamma);
    }

    static double mach2ByFlOverD(double mach1, double flOverD, double gamma) {
        return -1 / flOverDByMach(mach2(mach1, flOverD, gamma), gamma);
    }

    static double mach2ByGamma(double mach1, double flOverD, double gamma) {
        double mach2 = mach2(mach1, flOverD, gamma);
        return (flOverDByGamma(mach1, gamma) - flOverDByGamma(mach2, gamma)) / flOverDByMach(mach2, gamma);
    }

    private static final Source FRICTION =
            Sources.SHAPIRO.at("chapter 6, Flow in constant-area ducts with friction, isothermal flow in long ducts");
    private static final String DARCY = "f is the Darcy friction factor, 4 times the Fanning one, D the hydraulic"
            + " diameter 4 A/perimeter; f is taken constant along the duct.";
    private static final String STAR = "The star is M = 1/sqrt(gamma), where the flow chokes: not M = 1.";
    private static final Argument MOVING = MACH.within(Interval.above(0));

    private static EntryBuilder forward(String name, Argument mach) {
        return FAMILY.entry(name).takes(mach, GAMMA).sources(FRICTION).note(STAR);
    }

    private static final FunctionEntry ISOTHERMAL_FL_OVER_D = forward("isothermal_fl_over_d", MOVING)
            .title("Duct length in which an isothermal flow chokes")
            .formula("f Lmax/D = (1-gamma M^2)/(gamma M^2) + ln(gamma M^2)")
            .note(DARCY + " The length is that to M = 1/sqrt(gamma), from either side.")
            .gives("f Lmax/D", "1", Interval.atLeast(0))
            .kernel(Isothermal::flOverD)
            .partials(Kernel.of(Isothermal::flOverDByMach), Kernel.of(Isothermal::flOverDByGamma))
            .example("4.8650", 0.3, 1.4)
            .cell(flOverDCell())
            .build();

    private static CellForm flOverDCell() {
        return CellForm.steps()
                .helper("y", "(1-{gamma}*{mach}^2)/({gamma}*{mach}^2)")
                .result(LogDefectCells.defect("{y}"));
    }

    private static final FunctionEntry ISOTHERMAL_P_OVER_PSTAR = forward("isothermal_p_over_pstar", MOVING)
            .title("Pressure over its value where the isothermal flow chokes")
            .formula("p/p* = rho/rho* = V*/V = 1/(sqrt(gamma) M)")
            .gives("p/p*", "1", Interval.above(0))
            .kernel(Isothermal::pOverPstar)
            .partials(Kernel.of(Isothermal::pOverPstarByMach), Kernel.of(Isothermal::pOverPstarByGamma))
            .example("2.8172", 0.3, 1.4)
            .cell("1/(SQRT({gamma})*{mach})")
            .build();

    private static final FunctionEntry ISOTHERMAL_P0_OVER_P0STAR = forward("isothermal_p0_over_p0star", MOVING)
            .title("Stagnation pressure over its value where the isothermal flow chokes")
            .formula("p0/p0* = (2 gamma/(3 gamma-1) (1+(gamma-1)/2 M^2))^(gamma/(gamma-1))/(sqrt(gamma) M)")
            .gives("p0/p0*", "1", Interval.above(0))
            .kernel(Isothermal::p0OverP0star)
            .partials(Kernel.of(Isothermal::p0OverP0starByMach), Kernel.of(Isothermal::p0OverP0starByGamma))
            .example("1.8791", 0.3, 1.4)
            .cell("(2*{gamma}/(3*{gamma}-1)*(1+({gamma}-1)/2*{mach}^2))^({gamma}/({gamma}-1))"
                    + "/(SQRT({gamma})*{mach})")
            .build();

    private static final FunctionEntry ISOTHERMAL_T0_OVER_T0STAR = forward("isothermal_t0_over_t0star", MACH)
            .title("Stagnation temperature over its value where the isothermal flow chokes")
            .formula("T0/T0* = 2 gamma/(3 gamma-1) (1+(gamma-1)/2 M^2)")
            .gives("T0/T0*", "1", Interval.above(0))
            .kernel(Isothermal::t0OverT0star)
            .partials(Kernel.of(Isothermal::t0OverT0starByMach), Kernel.of(Isothermal::t0OverT0starByGamma))
            .example("0.89075", 0.3, 1.4)
            .cell("2*{gamma}/(3*{gamma}-1)*(1+({gamma}-1)/2*{mach}^2)")
            .build();

    private static final FunctionEntry MACH_FROM_ISOTHERMAL_FL_OVER_D = FAMILY.entry("mach_from_isothermal_fl_over_d")
            .title("Mach number of an isothermal flow that chokes after a given duct length")
            .formula("the M on this side of 1/sqrt(gamma) for which isothermal_fl_over_d(M, gamma) = f L/D")
            .note(DARCY)
            .takes(FL_OVER_D, GAMMA, THERMAL_BRANCH)
            .gives("M", "1", Interval.atLeast(0))
            .kernel(Isothermal::machFromFlOverD)
            .partials(InverseSlopes.ofBranches(
                    Isothermal::machFromFlOverD, Isothermal::flOverDByMach, Isothermal::flOverDByGamma))
            .sources(FRICTION)
            .example("0.3000", 4.86503, 1.4, "below")
            .cell(machFromFlOverDCell())
            .build();

    private static CellForm machFromFlOverDCell() {
        return CellForm.steps()
                .use(
                        "log",
                        LogDefectCells.ROOT_LOG,
                        Map.of("defect", "{fl_over_d}", "sign", "IF({branch}=\"below\",1,0-1)"))
                .result("EXP(0-{log}/2)/SQRT({gamma})");
    }

    private static final FunctionEntry ISOTHERMAL_MACH2 = FAMILY.entry("isothermal_mach2")
            .title("Mach number of an isothermal flow a duct length further on")
            .formula("the M2 on the side of M1 for which f Lmax/D(M2) = f Lmax/D(M1) - f L/D")
            .note(DARCY + " A negative length looks upstream. " + STAR)
            .takes(INLET_MACH, SIGNED_FL_OVER_D, GAMMA)
            .gives("M2", "1", Interval.above(0))
            .kernel(Isothermal::mach2)
            .requiresAtMost(
                    FaultKind.NO_SOLUTION,
                    "fl_over_d",
                    Kernel.of((mach1, flOverD, gamma) -> flOverD(mach1, gamma)),
                    "the length in which the flow chokes: in a longer duct it cannot have this mach1")
            .requires(
                    FaultKind.OUTSIDE_DOMAIN,
                    "mach1",
                    row -> hasOnePast(row[0], row[1], row[2]),
                    row -> "must not be 1/sqrt(gamma) where fl_over_d is negative (flows from below and above lead"
                            + " there: mach_from_isothermal_fl_over_d takes the branch)")
            .partials(
                    Kernel.of(Isothermal::mach2ByMach1),
                    Kernel.of(Isothermal::mach2ByFlOverD),
                    Kernel.of(Isothermal::mach2ByGamma))
            .sources(FRICTION)
            .example("0.4000", 0.3, 2.89686, 1.4)
            .cell(mach2Cell())
            .build();

    private static CellForm mach2Cell() {
        return CellForm.steps()
                .use("choking", flOverDCell(), Map.of("mach", "{mach1}", "gamma", "{gamma}"))
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
                                "IF({gamma}*{mach1}^2<=1,\"below\",\"above\")"))
                .result("IF(OR({left}<0,AND({gamma}*{mach1}^2=1,{fl_over_d}<0)),NA(),{there})");
    }

    static List<FunctionEntry> entries() {
        return List.of(
                ISOTHERMAL_FL_OVER_D,
                ISOTHERMAL_P_OVER_PSTAR,
                ISOTHERMAL_P0_OVER_P0STAR,
                ISOTHERMAL_T0_OVER_T0STAR,
                MACH_FROM_ISOTHERMAL_FL_OVER_D,
                ISOTHERMAL_MACH2);
    }
}
