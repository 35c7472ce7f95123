package org.ductledger.flow;

import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.SUPERSONIC_MACH1;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Numbers;
import org.ductledger.catalogue.Source;
import org.ductledger.numeric.Degrees;

/** A circular cone along supersonic flow, with an attached shock. Angles in degrees. */
final class Cone {
    private static final Chapter FAMILY = new Chapter("cone", "Circular cone in supersonic flow, without incidence");

    private Cone() {}

    static double shockAngle(double mach1, double halfAngle, double gamma) {
        double strength = ConeShock.strength(mach1, halfAngle, gamma);
        return strength == 0
                ? Isentropic.machAngle(mach1)
                : Degrees.ofCotangent(ConeFlow.shockCotangent(mach1, strength));
    }

    static double surfaceMach(double mach1, double halfAngle, double gamma) {
        double strength = ConeShock.strength(mach1, halfAngle, gamma);
        return strength == 0 ? mach1 : new ConeFlow(mach1, gamma, strength).wallMach();
    }

    /** The pressure ratio of the shock, and of the isentropic compression from there to the wall. */
    static double surfacePOverP1(double mach1, double halfAngle, double gamma) {
        double strength = ConeShock.strength(mach1, halfAngle, gamma);
        if (strength == 0) {
            return 1;
        }
        double overShock = NormalShock.p2OverP1(ConeFlow.normalMach(mach1, strength), gamma);
        double heating = new ConeFlow(mach1, gamma, strength).heating();
        return overShock * NormalShock.p0OverP(Math.max(0, heating), gamma);
    }

    static double p02OverP01(double mach1, double halfAngle, double gamma) {
        double strength = ConeShock.strength(mach1, halfAngle, gamma);
        return NormalShock.p02OverP01(ConeFlow.normalMach(mach1, strength), gamma);
    }

    static double halfAngleMax(double mach1, double gamma) {
        return ConeShock.greatest(mach1, gamma).halfAngle();
    }

    private static final Source TAYLOR_MACCOLL = new Source(
            "G. I. Taylor and J. W. Maccoll",
            "The Air Pressure on a Cone Moving at High Speeds, Proceedings of the Royal Society A, volume 139",
            1933,
            "");
    private static final Argument HALF_ANGLE = Argument.number(
            "half_angle",
            "theta_c",
            "deg",
            Interval.closedOpen(0, 90),
            "angle between the cone's axis and its surface");

    private static EntryBuilder cone(String name) {
        return FAMILY.entry(name)
                .takes(SUPERSONIC_MACH1, HALF_ANGLE, GAMMA)
                .requires(
                        FaultKind.NO_SOLUTION,
                        "half_angle",
                        row -> ConeShock.strength(row[0], row[1], row[2]) >= 0,
                        row -> "must be at most " + Numbers.brief(halfAngleMax(row[0], row[2]))
                                + " deg (the greatest with an attached shock at this mach1)")
                .sources(TAYLOR_MACCOLL.at("pp. 278-297"))
                .cell(CellForm.none("its differential equation is integrated"));
    }

    private static final FunctionEntry CONE_SHOCK_ANGLE = cone("cone_shock_angle")
            .title("Shock angle of a cone")
            .formula("the weak shock angle for which the flow of Taylor and Maccoll has no velocity across the ray of"
                    + " the cone: v'' (a^2 - v'^2) = v'^2 v - a^2 (2 v + v' cot(theta)), v' = 0 at theta_c")
            .note("Of the two solutions the weak one, which is the one that is found (common practice).")
            .gives("beta", "deg", Interval.openClosed(0, 90))
            .kernel(Cone::shockAngle)
            .example("31.21", 2.0, 10.0, 1.4)
            .build();

    private static final FunctionEntry CONE_SURFACE_MACH = cone("cone_surface_mach")
            .title("Mach number on a cone's surface")
            .formula(
                    "Mc = v/a at theta_c in the flow of Taylor and Maccoll behind cone_shock_angle(M1, theta_c, gamma)")
            .gives("Mc", "1", Interval.above(0))
            .kernel(Cone::surfaceMach)
            .example("1.834", 2.0, 10.0, 1.4)
            .build();

    private static final FunctionEntry CONE_SURFACE_P_OVER_P1 = cone("cone_surface_p_over_p1")
            .title("Static pressure on a cone's surface over that ahead of the shock")
            .formula("pc/p1 = p02/p01 p_over_p0(Mc, gamma) / p_over_p0(M1, gamma)")
            .note("The pressure coefficient is (pc/p1 - 1) / (gamma/2 M1^2).")
            .gives("pc/p1", "1", Interval.atLeast(1))
            .kernel(Cone::surfacePOverP1)
            .example("1.293", 2.0, 10.0, 1.4)
            .build();

    private static final FunctionEntry CONE_P02_OVER_P01 = cone("cone_p02_over_p01")
            .title("Stagnation pressure behind a cone's shock over that ahead of it")
            .formula("p02/p01 = shock_p02_over_p01(M1 sin(beta), gamma), beta = cone_shock_angle(M1, theta_c, gamma)")
            .gives("p02/p01", "1", Interval.closed(0, 1))
            .kernel(Cone::p02OverP01)
            .example("0.9999", 2.0, 10.0, 1.4)
            .build();

    private static final FunctionEntry CONE_HALF_ANGLE_MAX = FAMILY.entry("cone_half_angle_max")
            .title("Greatest half angle of a cone with an attached shock")
            .formula("the greatest theta_c over all shock angles in the flow of Taylor and Maccoll")
            .note("Greater than the greatest deflection of a plane shock at the same Mach number.")
            .takes(SUPERSONIC_MACH1, GAMMA)
            .gives("theta_c max", "deg", Interval.closedOpen(0, 90))
            .kernel(Cone::halfAngleMax)
            .sources(TAYLOR_MACCOLL.at("pp. 278-297"))
            .cell(CellForm.none("its differential equation is integrated"))
            .example("40.7", 2.0, 1.4)
            .build();

    static List<FunctionEntry> entries() {
        return List.of(
                CONE_SHOCK_ANGLE, CONE_SURFACE_MACH, CONE_SURFACE_P_OVER_P1, CONE_P02_OVER_P01, CONE_HALF_ANGLE_MAX);
    }
}
