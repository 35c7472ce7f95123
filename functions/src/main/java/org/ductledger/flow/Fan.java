package org.ductledger.flow;

import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.MACH;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.Family;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;

/** The centred expansion of Prandtl and Meyer, and isentropic compression, its reverse. Angles in degrees. */
final class Fan {
    private static final Family FAMILY = new Family("fan", "Prandtl-Meyer expansion and isentropic turning");
    private static final double DEGREES = 180 / Math.PI;

    private static final Argument SUPERSONIC_MACH = MACH.within(Interval.atLeast(1));
    private static final Argument ANGLE = Argument.number(
            "prandtl_meyer_angle",
            "nu",
            "deg",
            Interval.atLeast(0),
            "the turn through which sonic flow expands to the Mach number wanted");

    private Fan() {}

    /** The Prandtl-Meyer angle in degrees; M &gt;= 1. */
    static double prandtlMeyerAngle(double mach, double gamma) {
        return DEGREES * angleAt(Math.sqrt(mach - 1) * Math.sqrt(mach + 1), (gamma - 1) / (gamma + 1));
    }

    /** nu in radians from y = sqrt(M^2 - 1) and c = (gamma-1)/(gamma+1). */
    private static double angleAt(double y, double c) {
        double root = Math.sqrt(c);
        return StrictMath.atan(root * y) / root - StrictMath.atan(y);
    }

    /** The Prandtl-Meyer angle of a flow into vacuum, in degrees. */
    static double prandtlMeyerAngleMax(double gamma) {
        return 180 / (gamma - 1 + Math.sqrt((gamma - 1) * (gamma + 1)));
    }

    /** The Mach number from the Prandtl-Meyer angle in degrees; NaN from the maximum on. */
    static double machFromPrandtlMeyerAngle(double angle, double gamma) {
        double z = angle / prandtlMeyerAngleMax(gamma);
        if (!(z < 1)) {
            return Double.NaN;
        }
        double nu = angle / DEGREES;
        double c = (gamma - 1) / (gamma + 1);
        double p = StrictMath.cbrt(1.5 * (gamma + 1) * nu);
        double reach = prandtlMeyerAngleMax(gamma) / DEGREES;
        double greatest = StrictMath.cbrt(1.5 * (gamma + 1) * reach);
        double pole = (1 / c - 1) / (reach * greatest);
        double beta = (pole - (1 + c) * greatest * greatest / 5) / (greatest * greatest * greatest * greatest);
        double y = nu == 0 ? 0 : p * (1 - z + p * p * ((1 + c) / 5 + beta * p * p)) / (1 - z);
        for (int i = 0; i < 4 && y > 0; i++) {
            y = halley(y, nu, c);
        }
        return Math.sqrt(1 + y * y);
    }

    private static double halley(double y, double nu, double c) {
        double m = 1 + y * y;
        double n = 1 + c * y * y;
        double slope = (1 - c) * y * y / (m * n);
        double bend = 2 * (1 / y - y / m - c * y / n);
        double step = (angleAt(y, c) - nu) / slope;
        return y - step / (1 - 0.5 * step * bend);
    }

    private static final FunctionEntry PRANDTL_MEYER_ANGLE = FAMILY.entry("prandtl_meyer_angle")
            .title("Prandtl-Meyer angle")
            .formula("nu = sqrt((gamma+1)/(gamma-1)) atan(sqrt((gamma-1)/(gamma+1) (M^2-1))) - atan(sqrt(M^2-1))")
            .note("The turn through which sonic flow expands to this Mach number.")
            .takes(SUPERSONIC_MACH, GAMMA)
            .gives("nu", "deg", Interval.atLeast(0))
            .kernel(Fan::prandtlMeyerAngle)
            .sources(Sources.NACA_1135.at("eq. (171c)"))
            .example("26.38", 2.0, 1.4)
            .cell("180/PI()*(SQRT(({gamma}+1)/({gamma}-1))*ATAN(SQRT(({gamma}-1)/({gamma}+1)*({mach}-1)*({mach}+1)))"
                    + "-ATAN(SQRT(({mach}-1)*({mach}+1))))")
            .build();

    private static final FunctionEntry PRANDTL_MEYER_ANGLE_MAX = FAMILY.entry("prandtl_meyer_angle_max")
            .title("Greatest Prandtl-Meyer angle, of expansion into vacuum")
            .formula("nu_max = (sqrt((gamma+1)/(gamma-1)) - 1) 90 deg")
            .takes(GAMMA)
            .gives("nu_max", "deg", Interval.above(0))
            .kernel(Fan::prandtlMeyerAngleMax)
            .sources(Sources.NACA_1135.at("eq. (171c), M to infinity"))
            .example("130.45", 1.4)
            .cell("90*(SQRT(({gamma}+1)/({gamma}-1))-1)")
            .build();

    private static final FunctionEntry MACH_FROM_PRANDTL_MEYER_ANGLE = FAMILY.entry("mach_from_prandtl_meyer_angle")
            .title("Mach number from the Prandtl-Meyer angle")
            .formula("the M >= 1 for which prandtl_meyer_angle(M, gamma) = nu")
            .takes(ANGLE, GAMMA)
            .gives("M", "1", Interval.atLeast(1))
            .kernel(Fan::machFromPrandtlMeyerAngle)
            .requiresBelow(
                    FaultKind.NO_SOLUTION,
                    "prandtl_meyer_angle",
                    Kernel.of((angle, gamma) -> prandtlMeyerAngleMax(gamma)),
                    "the angle of expansion into vacuum")
            .sources(Sources.NACA_1135.at("eq. (171c)"))
            .example("2.00", 26.38, 1.4)
            .cell(CellForm.none("an iteration"))
            .build();

    static List<FunctionEntry> entries() {
        return List.of(PRANDTL_MEYER_ANGLE, MACH_FROM_PRANDTL_MEYER_ANGLE, PRANDTL_MEYER_ANGLE_MAX);
    }
}
