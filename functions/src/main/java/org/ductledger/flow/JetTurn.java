package org.ductledger.flow;

import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.MACH;

import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.numeric.ArcTangent;
import org.ductledger.numeric.Degrees;

/** The turn of a supersonic jet at the nozzle's lip, where it meets the back pressure by a fan or an oblique shock. */
final class JetTurn {
    /** From here on M^2 - 1 is M^2 to the last digit. */
    private static final double HYPERSONIC = 1e9;

    /** T1/T2 - 1 from which on the turn is that into vacuum, to the last digit. */
    private static final double VACUUM = 1e280;

    private JetTurn() {}

    /** In degrees, outward positive; NaN where not even a normal shock reaches the back pressure. */
    static double turn(double mach, double pbOverPe, double gamma) {
        return Degrees.ofRadians(
                pbOverPe < 1 ? expansion(mach, pbOverPe, gamma) : 0 - compression(mach, pbOverPe, gamma));
    }

    /** M^2 grows by (2/(gamma-1) + M^2) (T1/T2 - 1). */
    private static double expansion(double mach, double p, double gamma) {
        double log = p > 0.5 ? StrictMath.log1p(p - 1) : StrictMath.log(p);
        double heat = Math.min(VACUUM, StrictMath.expm1(-log * (gamma - 1) / gamma));
        if (mach > HYPERSONIC) {
            double growth = heat * (1 + 2 / (gamma - 1) / mach / mach);
            return fan(mach, mach * (growth / (1 + Math.sqrt(1 + growth))), NormalShock.c(gamma));
        }
        double growth = (2 / (gamma - 1) + mach * mach) * heat;
        double x = NormalShock.strength(mach);
        double y = Math.sqrt(x);
        return fan(y, growth / (y + Math.sqrt(x + growth)), NormalShock.c(gamma));
    }

    /**
     * nu at y + rise less nu at y, for y = sqrt(M^2 - 1), as the difference of two arc tangents; where the turn is small
     * the terms linear in rise are taken off them, because they nearly cancel.
     */
    private static double fan(double y, double rise, double c) {
        double root = Math.sqrt(c);
        double mean = y * (y / rise) + y;
        double wide = 1 / (1 / rise + c * mean);
        double narrow = 1 / (1 / rise + mean);
        return root * wide > 1
                ? ArcTangent.of(root * wide) / root - ArcTangent.of(narrow)
                : narrow * ((1 - c) / (c + 1 / (mean * rise)))
                        + (ArcTangent.lag(narrow) - ArcTangent.lag(root * wide) / root);
    }

    /** The deflection of an oblique shock: NACA 1135 in (p2/p1 - 1)/M^2, which no Mach number overflows. */
    private static double compression(double mach, double p, double gamma) {
        if (p > NormalShock.p2OverP1(mach, gamma)) {
            return Double.NaN;
        }
        double rise = (p - 1) / mach / mach;
        double room = NormalShock.b(gamma) * ((mach - 1) / mach) * (1 + 1 / mach) - rise;
        double spread = (gamma + 1) * rise + 2 * gamma / mach / mach;
        double tangent = rise / (gamma - rise) * Math.sqrt((gamma + 1) * Math.max(0, room) / spread);
        return rise == 0 ? 0 : ArcTangent.of(tangent);
    }

    static final FunctionEntry ENTRY = Nozzle.FAMILY
            .entry("jet_turn_at_lip")
            .title("Turn of a jet's edge at the nozzle's lip")
            .formula("pb < pe: nu(M2) - nu(Me), M2 by isentropic expansion to pb; pb > pe: less the deflection of the"
                    + " oblique shock with p2/p1 = pb/pe")
            .note("Positive outward: the jet swells. Negative inward, by the oblique shock that the pressure ratio asks"
                    + " for; past the greatest deflection it is the strong one, and the free jet stands off from it with"
                    + " a normal shock on the axis.")
            .takes(
                    MACH.named("exit_mach", "Me", "Mach number at the exit").within(Interval.atLeast(1)),
                    Argument.number(
                            "pb_over_pe", "pb/pe", "1", Interval.above(0), "back pressure over the exit pressure"),
                    GAMMA)
            .gives("turn", "deg", Interval.above(-90))
            .kernel(JetTurn::turn)
            .requiresAtMost(
                    FaultKind.NO_SOLUTION,
                    "pb_over_pe",
                    Kernel.of((mach, p, gamma) -> NormalShock.p2OverP1(mach, gamma)),
                    "the pressure ratio of a normal shock, which stands in the nozzle above it")
            .sources(Sources.NACA_1135.at("Prandtl-Meyer angle and oblique shock deflection"))
            .example("22.96", 2.0, 0.22, 1.4)
            .cell(cells())
            .build();

    private static CellForm cells() {
        return CellForm.steps()
                .helper("c", "({gamma}-1)/({gamma}+1)")
                .helper("y1", "SQRT(({exit_mach}-1)*({exit_mach}+1))")
                .helper(
                        "y2",
                        "SQRT(MAX(0,{y1}^2+(2/({gamma}-1)+{exit_mach}^2)*({pb_over_pe}^(-({gamma}-1)/{gamma})-1)))")
                .helper("room", "2*{gamma}/({gamma}+1)*{y1}^2-({pb_over_pe}-1)")
                .result("IF({pb_over_pe}<=1,(ATAN(SQRT({c})*({y2}-{y1})/(1+{c}*{y1}*{y2}))/SQRT({c})"
                        + "-ATAN(({y2}-{y1})/(1+{y1}*{y2})))*180/PI(),"
                        + "IF({room}<0,\"no solution\",-ATAN(({pb_over_pe}-1)/({gamma}*{exit_mach}^2-({pb_over_pe}-1))"
                        + "*SQRT(({gamma}+1)*{room}/(({gamma}+1)*({pb_over_pe}-1)+2*{gamma})))*180/PI()))");
    }
}
