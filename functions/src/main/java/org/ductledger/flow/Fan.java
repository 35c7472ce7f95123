package org.ductledger.flow;

import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.MACH;
import static org.ductledger.flow.Arguments.SUPERSONIC_MACH1;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.numeric.ArcTangent;
import org.ductledger.numeric.Degrees;

/** The centred expansion of Prandtl and Meyer, and isentropic compression, its reverse. Angles in degrees. */
final class Fan {
    private static final Chapter FAMILY = new Chapter("fan", "Prandtl-Meyer expansion and isentropic turning");

    /** From here on M^2 - 1 is M^2 to the last digit. */
    private static final double HYPERSONIC = 1e9;

    private static final double SMALL_Z = 0.75;

    private Fan() {}

    /** The Prandtl-Meyer angle in degrees; M &gt;= 1. */
    static double prandtlMeyerAngle(double mach, double gamma) {
        double reach = reach(gamma);
        double y = cotangent(mach);
        return Degrees.ofRadians(angleAt(y, (gamma - 1) / reach * y, 2 / (gamma - 1 + reach)));
    }

    /** The Prandtl-Meyer angle of expansion into vacuum, in degrees. */
    static double prandtlMeyerAngleMax(double gamma) {
        return 180 / (gamma - 1 + reach(gamma));
    }

    /** What is left of the angle up to expansion into vacuum, in degrees, to its own last digits. */
    static double angleLeft(double mach, double gamma) {
        double reach = reach(gamma);
        double u = 1 / cotangent(mach);
        return Degrees.ofRadians(leftAt(u, reach / (gamma - 1) * u, 2 / (gamma - 1 + reach)));
    }

    /** sqrt(gamma^2 - 1), with which sqrt(c) = (gamma-1)/reach and kappa = 2/(gamma-1+reach). */
    static double reach(double gamma) {
        return Math.sqrt((gamma - 1) * (gamma + 1));
    }

    /** y = sqrt(M^2 - 1), the cotangent of the Mach angle. */
    private static double cotangent(double mach) {
        return mach < HYPERSONIC ? Math.sqrt((mach - 1) * (mach + 1)) : mach;
    }

    /**
     * nu in radians: kappa atan z - atan(kappa z/(1 + y z)), in which nothing cancels as gamma grows.
     *
     * @param z sqrt(c) y, with c = (gamma-1)/(gamma+1)
     * @param kappa 1/sqrt(c) - 1
     */
    private static double angleAt(double y, double z, double kappa) {
        return z < SMALL_Z
                ? smallAngleAt(y, z, kappa)
                : kappa * ArcTangent.of(z) - ArcTangent.of(kappa * z / (1 + y * z));
    }

    /** The same less the terms that cancel for small z; it holds as far as the angle of z = 1.5. */
    static double smallAngleAt(double y, double z, double kappa) {
        double delta = kappa * z / (1 + y * z);
        return ArcTangent.lag(delta) + (delta * (y * z) - kappa * ArcTangent.lag(z));
    }

    /** nu_max - nu in radians, a sum of positive terms, of u = 1/y and w = 1/z. */
    static double leftAt(double u, double w, double kappa) {
        return kappa * ArcTangent.of(w) + ArcTangent.of(kappa / (w + 1 / u));
    }

    /** d nu/d M, in degrees. */
    private static double angleByMach(double mach, double gamma) {
        double inverse = 1 / mach;
        double slope = cotangent(mach) * inverse / (inverse * inverse + 0.5 * (gamma - 1));
        return Degrees.ofRadians(slope * inverse * inverse);
    }

    /** d nu/d gamma, in degrees. */
    private static double angleByGamma(double mach, double gamma) {
        double root = Math.sqrt((gamma - 1) / (gamma + 1));
        double z = root * cotangent(mach);
        double square = z * z;
        double bulge =
                z < SMALL_Z ? z * (square / (1 + square)) - ArcTangent.lag(z) : ArcTangent.of(z) - 1 / (z + 1 / z);
        return -Degrees.ofRadians(root / (gamma - 1) * bulge / (gamma - 1));
    }

    /** The Mach number from the Prandtl-Meyer angle in degrees; NaN from the maximum on. */
    static double machFromPrandtlMeyerAngle(double angle, double gamma) {
        return FanInverse.mach(angle, prandtlMeyerAngleMax(gamma) - angle, gamma);
    }

    private static double machByAngle(double angle, double gamma) {
        return 1 / angleByMach(machFromPrandtlMeyerAngle(angle, gamma), gamma);
    }

    private static double machByGamma(double angle, double gamma) {
        double mach = machFromPrandtlMeyerAngle(angle, gamma);
        return -angleByGamma(mach, gamma) / angleByMach(mach, gamma);
    }

    /** The Mach number after an isentropic turn, in degrees; NaN beyond vacuum, or if it compresses past M = 1. */
    static double mach2(double mach1, double turn, double gamma) {
        return FanInverse.mach(prandtlMeyerAngle(mach1, gamma) + turn, angleLeft(mach1, gamma) - turn, gamma);
    }

    private static double mach2ByMach1(double mach1, double turn, double gamma) {
        return angleByMach(mach1, gamma) / angleByMach(mach2(mach1, turn, gamma), gamma);
    }

    private static double mach2ByTurn(double mach1, double turn, double gamma) {
        return 1 / angleByMach(mach2(mach1, turn, gamma), gamma);
    }

    private static double mach2ByGamma(double mach1, double turn, double gamma) {
        double mach2 = mach2(mach1, turn, gamma);
        return (angleByGamma(mach1, gamma) - angleByGamma(mach2, gamma)) / angleByMach(mach2, gamma);
    }

    /** T2/T1, in a form that no Mach number overflows. */
    static double t2OverT1(double mach1, double turn, double gamma) {
        double mach2 = mach2(mach1, turn, gamma);
        double k = 0.5 * (gamma - 1);
        double ratio = mach1 / mach2;
        return (1 / mach1 / mach1 + k) / (1 / mach2 / mach2 + k) * ratio * ratio;
    }

    static double p2OverP1(double mach1, double turn, double gamma) {
        return StrictMath.exp(gamma / (gamma - 1) * StrictMath.log(t2OverT1(mach1, turn, gamma)));
    }

    static double rho2OverRho1(double mach1, double turn, double gamma) {
        return StrictMath.exp(StrictMath.log(t2OverT1(mach1, turn, gamma)) / (gamma - 1));
    }

    /** d ln(rho2/rho1)/d turn: M2^2/sqrt(M2^2-1), a degree. ln p changes gamma times, ln T gamma - 1 times as much. */
    private static double densityByTurn(double mach1, double turn, double gamma) {
        double mach2 = mach2(mach1, turn, gamma);
        return -Degrees.toRadians(mach2 * (mach2 / cotangent(mach2)));
    }

    /** d ln(rho2/rho1)/d M1. */
    private static double densityByMach1(double mach1, double turn, double gamma) {
        double mach2 = mach2(mach1, turn, gamma);
        double turned = mach2 / cotangent(mach2) * (mach2 / mach1) * (cotangent(mach1) / mach1);
        return (1 - turned) / mach1 / (1 / mach1 / mach1 + 0.5 * (gamma - 1));
    }

    private static final Argument SUPERSONIC_MACH = MACH.within(Interval.atLeast(1));
    private static final Argument MACH1 = SUPERSONIC_MACH1.named("mach1", "M1", "Mach number ahead of the turn");
    private static final Argument ANGLE = Argument.number(
            "prandtl_meyer_angle",
            "nu",
            "deg",
            Interval.atLeast(0),
            "the turn through which sonic flow expands to the Mach number wanted");
    private static final Argument TURN = Argument.number(
            "turn",
            "delta",
            "deg",
            Interval.anyNumber(),
            "turn of the flow: positive away from itself (expansion), negative into itself (isentropic compression)");

    private static final FunctionEntry PRANDTL_MEYER_ANGLE = FAMILY.entry("prandtl_meyer_angle")
            .title("Prandtl-Meyer angle")
            .formula("nu = sqrt((gamma+1)/(gamma-1)) atan(sqrt((gamma-1)/(gamma+1) (M^2-1))) - atan(sqrt(M^2-1))")
            .note("The turn through which sonic flow expands to this Mach number.")
            .takes(SUPERSONIC_MACH, GAMMA)
            .gives("nu", "deg", Interval.atLeast(0))
            .kernel(Fan::prandtlMeyerAngle)
            .partials(Kernel.of(Fan::angleByMach), Kernel.of(Fan::angleByGamma))
            .sources(Sources.NACA_1135.at("eq. (171c)"))
            .example("26.38", 2.0, 1.4)
            .cell("180/PI()*(SQRT(({gamma}+1)/({gamma}-1))*ATAN(SQRT(({gamma}-1)/({gamma}+1)*({mach}-1)*({mach}+1)))"
                    + "-ATAN(SQRT(({mach}-1)*({mach}+1))))")
            .build();

    private static final FunctionEntry PRANDTL_MEYER_ANGLE_MAX = FAMILY.entry("prandtl_meyer_angle_max")
            .title("Prandtl-Meyer angle of expansion into vacuum")
            .formula("nu_max = 90 deg (sqrt((gamma+1)/(gamma-1)) - 1)")
            .note("No turn from sonic flow can be greater.")
            .takes(GAMMA)
            .gives("nu_max", "deg", Interval.above(0))
            .kernel(Fan::prandtlMeyerAngleMax)
            .partials(Kernel.of((double gamma) -> -90 / ((gamma - 1) * Math.sqrt((gamma - 1) * (gamma + 1)))))
            .sources(Sources.NACA_1135.at("eq. (171c) as M grows without limit"))
            .example("130.45", 1.4)
            .cell("180/({gamma}-1+SQRT(({gamma}-1)*({gamma}+1)))")
            .build();

    private static final FunctionEntry MACH_FROM_PRANDTL_MEYER_ANGLE = FAMILY.entry("mach_from_prandtl_meyer_angle")
            .title("Mach number from the Prandtl-Meyer angle")
            .formula("the M >= 1 for which prandtl_meyer_angle(M, gamma) = nu")
            .takes(ANGLE, GAMMA)
            .gives("M", "1", Interval.atLeast(1))
            .kernel(Fan::machFromPrandtlMeyerAngle)
            .partials(Kernel.of(Fan::machByAngle), Kernel.of(Fan::machByGamma))
            .requiresBelow(
                    FaultKind.NO_SOLUTION,
                    "prandtl_meyer_angle",
                    Kernel.of((double angle, double gamma) -> prandtlMeyerAngleMax(gamma)),
                    "the angle of expansion into vacuum")
            .sources(Sources.NACA_1135.at("eq. (171c)"))
            .example("2.00", 26.38, 1.4)
            .cell(FanCells.MACH_FROM_ANGLE)
            .build();

    private static EntryBuilder turned(String name) {
        return FAMILY.entry(name)
                .takes(MACH1, TURN, GAMMA)
                .requiresBelow(
                        FaultKind.NO_SOLUTION,
                        "turn",
                        Kernel.of((double mach1, double turn, double gamma) -> angleLeft(mach1, gamma)),
                        "expansion into vacuum")
                .requiresAtLeast(
                        FaultKind.NO_SOLUTION,
                        "turn",
                        Kernel.of((double mach1, double turn, double gamma) -> -prandtlMeyerAngle(mach1, gamma)),
                        "compression to M = 1");
    }

    private static final FunctionEntry FAN_MACH2 = turned("fan_mach2")
            .title("Mach number after an isentropic turn")
            .formula("nu(M2) = nu(M1) + turn")
            .gives("M2", "1", Interval.atLeast(1))
            .kernel(Fan::mach2)
            .partials(Kernel.of(Fan::mach2ByMach1), Kernel.of(Fan::mach2ByTurn), Kernel.of(Fan::mach2ByGamma))
            .sources(Sources.NACA_1135.at("eqs. (171a) to (171c)"))
            .example("2.385", 2.0, 10.0, 1.4)
            .cell(FanCells.MACH2)
            .build();

    private static final FunctionEntry FAN_P2_OVER_P1 = turned("fan_p2_over_p1")
            .title("Static pressure after over before an isentropic turn")
            .formula(
                    "p2/p1 = ((1 + (gamma-1)/2 M1^2) / (1 + (gamma-1)/2 M2^2))^(gamma/(gamma-1)), nu(M2) = nu(M1) + turn")
            .gives("p2/p1", "1", Interval.above(0))
            .kernel(Fan::p2OverP1)
            .partials(
                    Kernel.of((double m, double t, double g) -> g * p2OverP1(m, t, g) * densityByMach1(m, t, g)),
                    Kernel.of((double m, double t, double g) -> g * p2OverP1(m, t, g) * densityByTurn(m, t, g)),
                    null)
            .sources(Sources.NACA_1135.at("eqs. (44) and (171c)"))
            .example("0.548", 2.0, 10.0, 1.4)
            .cell(FanCells.after("({t})^({gamma}/({gamma}-1))"))
            .build();

    private static final FunctionEntry FAN_T2_OVER_T1 = turned("fan_t2_over_t1")
            .title("Static temperature after over before an isentropic turn")
            .formula("T2/T1 = (1 + (gamma-1)/2 M1^2) / (1 + (gamma-1)/2 M2^2), nu(M2) = nu(M1) + turn")
            .gives("T2/T1", "1", Interval.above(0))
            .kernel(Fan::t2OverT1)
            .partials(
                    Kernel.of((double m, double t, double g) -> (g - 1) * t2OverT1(m, t, g) * densityByMach1(m, t, g)),
                    Kernel.of((double m, double t, double g) -> (g - 1) * t2OverT1(m, t, g) * densityByTurn(m, t, g)),
                    null)
            .sources(Sources.NACA_1135.at("eqs. (43) and (171c)"))
            .example("0.842", 2.0, 10.0, 1.4)
            .cell(FanCells.after("{t}"))
            .build();

    private static final FunctionEntry FAN_RHO2_OVER_RHO1 = turned("fan_rho2_over_rho1")
            .title("Density after over before an isentropic turn")
            .formula(
                    "rho2/rho1 = ((1 + (gamma-1)/2 M1^2) / (1 + (gamma-1)/2 M2^2))^(1/(gamma-1)), nu(M2) = nu(M1) + turn")
            .gives("rho2/rho1", "1", Interval.above(0))
            .kernel(Fan::rho2OverRho1)
            .partials(
                    Kernel.of((double m, double t, double g) -> rho2OverRho1(m, t, g) * densityByMach1(m, t, g)),
                    Kernel.of((double m, double t, double g) -> rho2OverRho1(m, t, g) * densityByTurn(m, t, g)),
                    null)
            .sources(Sources.NACA_1135.at("eqs. (45) and (171c)"))
            .example("0.651", 2.0, 10.0, 1.4)
            .cell(FanCells.after("({t})^(1/({gamma}-1))"))
            .build();

    static List<FunctionEntry> entries() {
        return List.of(
                PRANDTL_MEYER_ANGLE,
                MACH_FROM_PRANDTL_MEYER_ANGLE,
                PRANDTL_MEYER_ANGLE_MAX,
                FAN_MACH2,
                FAN_P2_OVER_P1,
                FAN_T2_OVER_T1,
                FAN_RHO2_OVER_RHO1);
    }
}
