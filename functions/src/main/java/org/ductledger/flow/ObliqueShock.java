package org.ductledger.flow;

import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.SUPERSONIC_MACH1;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Numbers;
import org.ductledger.numeric.ArcTangent;
import org.ductledger.numeric.Degrees;

/** The plane oblique shock in a perfect gas: a normal shock at M1 sin(shock angle). Angles in degrees. */
final class ObliqueShock {
    /** A shock angle that rounding has put below the Mach angle is taken as that. */
    private static final double ROUNDING = 2e-15;

    /** What rounding may leave of 1/M1^2, over its value for a Mach wave, one ulp before M1 grows without limit. */
    private static final double LEAST = 0x1p-53;

    private static final double HALF_RIGHT = 45;

    private static final double HYPERSONIC = 1e9;

    private ObliqueShock() {}

    /** (M1 sin)^2 - 1, the strength of the shock, to its own last digits; NaN for an angle below the Mach angle. */
    static double strength(double mach1, double shockAngle) {
        double x;
        if (shockAngle < HALF_RIGHT || mach1 > HYPERSONIC) {
            double beyond = Math.fma(mach1, Degrees.sin(shockAngle), -1);
            x = beyond * (beyond + 2);
        } else {
            double along = mach1 * Degrees.cos(shockAngle);
            x = (mach1 - 1) * (mach1 + 1) - along * along;
        }
        return x > 0 ? x : x >= -ROUNDING ? 0 : Double.NaN;
    }

    /** The Mach number of the flow normal to the shock; NaN for a shock angle below the Mach angle. */
    static double normalMach(double mach1, double shockAngle) {
        double x = strength(mach1, shockAngle);
        return x >= 0 ? Math.max(1, mach1 * Degrees.sin(shockAngle)) : x;
    }

    /** tan(deflection) = 2 cot(b) x/M1^2 / (gamma - 1 + 2 cos^2(b) + 2/M1^2), x = (M1 sin(b))^2 - 1. */
    static double deflection(double mach1, double shockAngle, double gamma) {
        double cos = Degrees.cos(shockAngle);
        double sin = Degrees.sin(shockAngle);
        double i = 1 / mach1;
        double x = strength(mach1, shockAngle);
        double beyond = mach1 < HYPERSONIC ? x * i * i : Math.max(0, (sin - i) * (sin + i));
        double tangent = 2 * (cos / sin) * beyond / (gamma - 1 + 2 * cos * cos + 2 * i * i);
        return x >= 0 ? Degrees.ofRadians(ArcTangent.of(tangent)) : x;
    }

    /** The flow along the shock is kept: M2^2 = M2n^2 + (M1 cos)^2 / (T2/T1), a sum of positive terms. */
    static double mach2(double mach1, double shockAngle, double gamma) {
        double x = strength(mach1, shockAngle);
        double b = NormalShock.b(gamma);
        double c = NormalShock.c(gamma);
        double slowing = c + NormalShock.d(gamma) / (1 + x);
        double cos = Degrees.cos(shockAngle);
        if (x > 1) {
            double r = 1 / x;
            double cotangent = cos / Degrees.sin(shockAngle);
            return Math.sqrt((c + r) / (b + r) + cotangent * cotangent * (1 + r) / ((b + r) * slowing));
        }
        double along = mach1 * cos;
        return Math.sqrt((1 + c * x) / (1 + b * x) + along * along / ((1 + b * x) * slowing));
    }

    static double p2OverP1(double mach1, double shockAngle, double gamma) {
        return Math.fma(NormalShock.b(gamma), strength(mach1, shockAngle), 1);
    }

    static double t2OverT1(double mach1, double shockAngle, double gamma) {
        return NormalShock.t2OverT1(normalMach(mach1, shockAngle), gamma);
    }

    static double rho2OverRho1(double mach1, double shockAngle, double gamma) {
        return NormalShock.rho2OverRho1(normalMach(mach1, shockAngle), gamma);
    }

    static double p02OverP01(double mach1, double shockAngle, double gamma) {
        return NormalShock.p02OverP01(normalMach(mach1, shockAngle), gamma);
    }

    /** 1/M1^2 = (sin 2b - (gamma - 1 + 2 cos^2 b) tan(deflection)) / (2 (cot b + tan(deflection))). */
    static double mach1(double deflection, double shockAngle, double gamma) {
        if (!(deflection < deflectionAtInfiniteMach(shockAngle, gamma))) {
            return Double.NaN;
        }
        double sin = Degrees.sin(shockAngle);
        double cos = Degrees.cos(shockAngle);
        double tangent = Degrees.tan(deflection);
        double i = (sin * cos - (0.5 * (gamma - 1) + cos * cos) * tangent) / (cos / sin + tangent);
        return 1 / Math.sqrt(Math.max(i, LEAST * sin * sin));
    }

    /** The deflection of this shock angle as M1 grows without limit, in degrees. */
    static double deflectionAtInfiniteMach(double shockAngle, double gamma) {
        double cos = Degrees.cos(shockAngle);
        return Degrees.ofRadians(ArcTangent.of(2 * Degrees.sin(shockAngle) * cos / (gamma - 1 + 2 * cos * cos)));
    }

    private static final Chapter FAMILY = new Chapter("oblique", "Plane oblique shock in a perfect gas");

    private static final Argument SHOCK_ANGLE = Argument.number(
            "shock_angle",
            "beta",
            "deg",
            Interval.openClosed(0, 90),
            "angle between the shock and the flow ahead of it");
    private static final Argument DEFLECTION = Argument.number(
            "deflection", "theta", "deg", Interval.closedOpen(0, 90), "turn of the flow through the shock");
    private static final Argument BRANCH =
            Argument.choice("branch", "which of the two shocks: the smaller or the larger angle", "weak", "strong");

    /** A function of the flow ahead and the shock's angle. */
    private static EntryBuilder across(String name) {
        return FAMILY.entry(name)
                .takes(SUPERSONIC_MACH1, SHOCK_ANGLE, GAMMA)
                .requires(
                        FaultKind.NO_SOLUTION,
                        "shock_angle",
                        row -> strength(row[0], row[1]) >= 0,
                        row -> "must be at least " + Numbers.brief(Isentropic.machAngle(row[0]))
                                + " deg (the Mach angle, at which a shock has no strength)");
    }

    /** A ratio that is the normal shock's at M1 sin(shock angle). */
    private static EntryBuilder normal(String name, Kernel.Of2 byMach1, Kernel.Of2 byGamma) {
        return across(name)
                .partials(
                        ObliqueSlopes.acrossByMach1(byMach1),
                        ObliqueSlopes.acrossByShockAngle(byMach1),
                        ObliqueSlopes.acrossByGamma(byGamma));
    }

    private static final FunctionEntry OBLIQUE_DEFLECTION = across("oblique_deflection")
            .title("Deflection of the flow by an oblique shock")
            .formula("tan(theta) = 2 cot(beta) (M1^2 sin^2(beta) - 1) / (M1^2 (gamma + cos(2 beta)) + 2)")
            .gives("theta", "deg", Interval.closedOpen(0, 90))
            .kernel(ObliqueShock::deflection)
            .partials(
                    Kernel.of(ObliqueSlopes::deflectionByMach1),
                    Kernel.of(ObliqueSlopes::deflectionByShockAngle),
                    Kernel.of(ObliqueSlopes::deflectionByGamma))
            .sources(Sources.NACA_1135.at("eq. (138)"))
            .example("9.99", 2.0, 39.3, 1.4)
            .cell(ObliqueCells.DEFLECTION)
            .build();

    private static final FunctionEntry OBLIQUE_SHOCK_ANGLE = FAMILY.entry("oblique_shock_angle")
            .title("Shock angle from the deflection")
            .formula("the beta for which oblique_deflection(M1, beta, gamma) = theta")
            .note(
                    "On a wedge in free flow the weak shock is the one that is found (common practice). As theta tends to 0"
                            + " the weak shock tends to the Mach wave, the strong one to the normal shock.")
            .takes(SUPERSONIC_MACH1, DEFLECTION, GAMMA, BRANCH)
            .gives("beta", "deg", Interval.openClosed(0, 90))
            .kernel(ObliqueAngle::shockAngle)
            .partials(
                    Kernel.of(ObliqueSlopes::angleByMach1),
                    Kernel.of(ObliqueSlopes::angleByDeflection),
                    Kernel.of(ObliqueSlopes::angleByGamma),
                    null)
            .requires(
                    FaultKind.NO_SOLUTION,
                    "deflection",
                    row -> ObliqueAngle.shockAngle(row[0], row[1], row[2], row[3]) >= 0,
                    row -> ObliqueLimits.attachment(row[0], row[1], row[2]))
            .sources(Sources.NACA_1135.at("eq. (150a)"))
            .example("39.31", 2.0, 10.0, 1.4, "weak")
            .cell(ObliqueCells.SHOCK_ANGLE)
            .build();

    private static final FunctionEntry OBLIQUE_DEFLECTION_MAX = FAMILY.entry("oblique_deflection_max")
            .title("Greatest deflection with an attached shock")
            .formula("theta_max = oblique_deflection(M1, oblique_angle_at_deflection_max(M1, gamma), gamma)")
            .note(
                    "A flow that must turn further has a detached, curved shock. Not the angle of sonic flow behind the shock.")
            .takes(SUPERSONIC_MACH1, GAMMA)
            .gives("theta_max", "deg", Interval.closedOpen(0, 90))
            .kernel(ObliqueLimits::deflectionMax)
            .partials(Kernel.of(ObliqueSlopes::deflectionMaxByMach1), Kernel.of(ObliqueSlopes::deflectionMaxByGamma))
            .sources(Sources.NACA_1135.at("eqs. (138) and (168)"))
            .example("22.97", 2.0, 1.4)
            .cell(ObliqueCells.DEFLECTION_MAX)
            .build();

    private static final FunctionEntry OBLIQUE_ANGLE_AT_DEFLECTION_MAX = FAMILY.entry("oblique_angle_at_deflection_max")
            .title("Shock angle of the greatest deflection")
            .formula("sin^2(beta) = ((gamma+1) M1^2 - 4 + sqrt((gamma+1) ((gamma+1) M1^4 + 8 (gamma-1) M1^2 + 16)))"
                    + " / (4 gamma M1^2)")
            .note("Smaller angles are the weak shocks, larger ones the strong.")
            .takes(SUPERSONIC_MACH1, GAMMA)
            .gives("beta", "deg", Interval.openClosed(0, 90))
            .kernel(ObliqueLimits::angleAtDeflectionMax)
            .sources(Sources.NACA_1135.at("eq. (168)"))
            .example("65.24", 3.0, 1.4)
            .cell(ObliqueCells.ANGLE_AT_DEFLECTION_MAX)
            .build();

    private static final FunctionEntry OBLIQUE_ANGLE_AT_SONIC = FAMILY.entry("oblique_angle_at_sonic")
            .title("Shock angle behind which the flow is sonic")
            .formula("sin^2(beta) = ((gamma+1) M1^2 - (3-gamma)"
                    + " + sqrt((gamma+1) ((gamma+1) M1^4 - 2 (3-gamma) M1^2 + gamma + 9))) / (4 gamma M1^2)")
            .note("A little smaller than the angle of the greatest deflection.")
            .takes(SUPERSONIC_MACH1, GAMMA)
            .gives("beta", "deg", Interval.openClosed(0, 90))
            .kernel(ObliqueLimits::angleAtSonic)
            .partials(Kernel.of(ObliqueSlopes::angleAtSonicByMach1), Kernel.of(ObliqueSlopes::angleAtSonicByGamma))
            .sources(Sources.NACA_1135.at("eq. (167)"))
            .example("61.49", 2.0, 1.4)
            .cell("180/PI()*ASIN(SQRT((({gamma}+1)*{mach1}^2-3+{gamma}"
                    + "+SQRT(({gamma}+1)*(({gamma}+1)*{mach1}^4-2*(3-{gamma})*{mach1}^2+{gamma}+9)))"
                    + "/(4*{gamma}*{mach1}^2)))")
            .build();

    private static final FunctionEntry OBLIQUE_MACH2 = across("oblique_mach2")
            .title("Mach number behind an oblique shock")
            .formula("M2^2 = M2n^2 + (M1 cos(beta))^2 / (T2/T1), M2n = shock_mach2(M1 sin(beta), gamma)")
            .gives("M2", "1", Interval.above(0))
            .kernel(ObliqueShock::mach2)
            .partials(
                    Kernel.of(ObliqueSlopes::mach2ByMach1),
                    Kernel.of(ObliqueSlopes::mach2ByShockAngle),
                    Kernel.of(ObliqueSlopes::mach2ByGamma))
            .sources(Sources.NACA_1135.at("eq. (132)"))
            .example("1.641", 2.0, 39.3, 1.4)
            .cell(ObliqueCells.MACH2)
            .build();

    private static final FunctionEntry OBLIQUE_P2_OVER_P1 = normal(
                    "oblique_p2_over_p1", NormalShockSlopes::p2OverP1ByMach, NormalShockSlopes::p2OverP1ByGamma)
            .title("Static pressure ratio over an oblique shock")
            .formula("p2/p1 = 1 + 2 gamma/(gamma+1) (M1^2 sin^2(beta) - 1)")
            .gives("p2/p1", "1", Interval.atLeast(1))
            .kernel(ObliqueShock::p2OverP1)
            .sources(Sources.NACA_1135.at("eq. (128)"))
            .example("1.705", 2.0, 39.3, 1.4)
            .cell(ObliqueCells.across("1+2*{gamma}/({gamma}+1)*({n}-1)"))
            .build();

    private static final FunctionEntry OBLIQUE_T2_OVER_T1 = normal(
                    "oblique_t2_over_t1", NormalShockSlopes::t2OverT1ByMach, NormalShockSlopes::t2OverT1ByGamma)
            .title("Static temperature ratio over an oblique shock")
            .formula("T2/T1 = (2 gamma n - (gamma-1)) ((gamma-1) n + 2) / ((gamma+1)^2 n), n = M1^2 sin^2(beta)")
            .gives("T2/T1", "1", Interval.atLeast(1))
            .kernel(ObliqueShock::t2OverT1)
            .sources(Sources.NACA_1135.at("eq. (130)"))
            .example("1.170", 2.0, 39.3, 1.4)
            .cell(ObliqueCells.across("1+2*({gamma}-1)/({gamma}+1)^2*({n}-1)*({gamma}+1/{n})"))
            .build();

    private static final FunctionEntry OBLIQUE_RHO2_OVER_RHO1 = normal(
                    "oblique_rho2_over_rho1",
                    NormalShockSlopes::rho2OverRho1ByMach,
                    NormalShockSlopes::rho2OverRho1ByGamma)
            .title("Density ratio over an oblique shock")
            .formula("rho2/rho1 = (gamma+1) n / ((gamma-1) n + 2), n = M1^2 sin^2(beta)")
            .gives("rho2/rho1", "1", Interval.atLeast(1))
            .kernel(ObliqueShock::rho2OverRho1)
            .sources(Sources.NACA_1135.at("eq. (129)"))
            .example("1.458", 2.0, 39.3, 1.4)
            .cell(ObliqueCells.across("({gamma}+1)*{n}/(({gamma}-1)*{n}+2)"))
            .build();

    private static final FunctionEntry OBLIQUE_P02_OVER_P01 = normal(
                    "oblique_p02_over_p01", NormalShockSlopes::p02OverP01ByMach, NormalShockSlopes::p02OverP01ByGamma)
            .title("Stagnation pressure ratio over an oblique shock")
            .formula("p02/p01 = (rho2/rho1)^(gamma/(gamma-1)) (p2/p1)^(-1/(gamma-1))")
            .gives("p02/p01", "1", Interval.closed(0, 1))
            .kernel(ObliqueShock::p02OverP01)
            .sources(Sources.NACA_1135.at("eq. (142)"))
            .example("0.9847", 2.0, 39.3, 1.4)
            .cell(ObliqueCells.across("(({gamma}+1)*{n}/(({gamma}-1)*{n}+2))^({gamma}/({gamma}-1))"
                    + "*(1+2*{gamma}/({gamma}+1)*({n}-1))^(-1/({gamma}-1))"))
            .build();

    private static final FunctionEntry MACH1_FROM_OBLIQUE = FAMILY.entry("mach1_from_oblique")
            .title("Mach number ahead of an oblique shock from its two angles")
            .formula("M1^2 = 2 (cot(beta) + tan(theta)) / (sin(2 beta) - (gamma + cos(2 beta)) tan(theta))")
            .note(
                    "What a schlieren picture of a wedge gives. A normal shock has no deflection and tells nothing of M1.")
            .takes(DEFLECTION, SHOCK_ANGLE.within(Interval.open(0, 90)), GAMMA)
            .gives("M1", "1", Interval.atLeast(1))
            .kernel(ObliqueShock::mach1)
            .partials(
                    Kernel.of(ObliqueSlopes::mach1ByDeflection),
                    Kernel.of(ObliqueSlopes::mach1ByShockAngle),
                    Kernel.of(ObliqueSlopes::mach1ByGamma))
            .requiresBelow(
                    FaultKind.NO_SOLUTION,
                    "deflection",
                    Kernel.of((deflection, shockAngle, gamma) -> deflectionAtInfiniteMach(shockAngle, gamma)),
                    "the deflection by a shock of this angle as M1 grows without limit")
            .sources(Sources.NACA_1135.at("eq. (138), solved for M1"))
            .example("2.00", 10.0, 39.31, 1.4)
            .cell(ObliqueCells.MACH1)
            .build();

    private static final FunctionEntry MACH1_AT_DETACHMENT = FAMILY.entry("mach1_at_detachment")
            .title("Least Mach number with an attached shock at this deflection")
            .formula("the M1 for which oblique_deflection_max(M1, gamma) = theta")
            .takes(DEFLECTION, GAMMA)
            .gives("M1", "1", Interval.atLeast(1))
            .kernel(ObliqueLimits::mach1AtDetachment)
            .partials(Kernel.of(ObliqueSlopes::detachmentByDeflection), Kernel.of(ObliqueSlopes::detachmentByGamma))
            .requiresBelow(
                    FaultKind.NO_SOLUTION,
                    "deflection",
                    Kernel.of((double deflection, double gamma) -> ObliqueLimits.deflectionLimit(gamma)),
                    "asin(1/gamma), beyond which the shock is detached at every Mach number")
            .sources(Sources.NACA_1135.at("eqs. (138) and (168)"))
            .example("2.00", 22.97, 1.4)
            .cell(ObliqueCells.mach1AtDetachment())
            .build();

    static List<FunctionEntry> entries() {
        return List.of(
                OBLIQUE_DEFLECTION,
                OBLIQUE_SHOCK_ANGLE,
                OBLIQUE_DEFLECTION_MAX,
                OBLIQUE_ANGLE_AT_DEFLECTION_MAX,
                OBLIQUE_ANGLE_AT_SONIC,
                OBLIQUE_MACH2,
                OBLIQUE_P2_OVER_P1,
                OBLIQUE_T2_OVER_T1,
                OBLIQUE_RHO2_OVER_RHO1,
                OBLIQUE_P02_OVER_P01,
                MACH1_FROM_OBLIQUE,
                MACH1_AT_DETACHMENT);
    }
}
