package org.ductledger.flow;

import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.MACH;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;

/** What a small relative change of area does to a steady isentropic flow. */
final class AreaRule {
    private static final Chapter FAMILY = new Chapter("area_rule", "What a small change of area does");
    private static final Source AREA_CHANGE = Sources.SHAPIRO.at("chapter 4, effects of area change");
    private static final Argument AREA_CHANGE_ARGUMENT =
            Argument.number("area_change", "dA/A", "1", Interval.anyNumber(), "relative change of area along the flow");

    private static final double NOZZLE = 0;
    private static final double DIFFUSER = 1;
    private static final double SONIC = 2;
    private static final double CONSTANT_AREA = 3;

    private AreaRule() {}

    /** 1/(M^2-1). */
    static double dvOverDa(double mach) {
        return 1 / ((mach - 1) * (mach + 1));
    }

    /** M^2/(1-M^2). */
    static double drhoOverDa(double mach) {
        double inverse = 1 / mach;
        return mach < 1 ? mach * mach / ((1 - mach) * (1 + mach)) : 1 / ((inverse - 1) * (inverse + 1));
    }

    static double dpOverDa(double mach, double gamma) {
        return gamma * drhoOverDa(mach);
    }

    static double dtOverDa(double mach, double gamma) {
        return (gamma - 1) * drhoOverDa(mach);
    }

    /** -(1 + (gamma-1)/2 M^2)/(1-M^2): M grows as the speed does and as the speed of sound falls. */
    static double dmachOverDa(double mach, double gamma) {
        return dvOverDa(mach) - 0.5 * dtOverDa(mach, gamma);
    }

    /** Speed grows in a nozzle and falls in a diffuser. */
    static double passageRole(double mach, double areaChange) {
        if (areaChange == 0) {
            return CONSTANT_AREA;
        }
        if (mach == 1) {
            return SONIC;
        }
        return mach > 1 == areaChange > 0 ? NOZZLE : DIFFUSER;
    }

    /** d(M^2/(1-M^2))/dM = 2 M/(1-M^2)^2; the slope of the speed has the same, negative. */
    static double drhoByMach(double mach) {
        double v = dvOverDa(mach);
        return 2 * (mach * v) * v;
    }

    private static EntryBuilder slope(String name) {
        return FAMILY.entry(name)
                .requires(
                        FaultKind.NO_SOLUTION,
                        "mach",
                        row -> row[0] != 1,
                        row -> "must not be 1: there the area must not change, and the slope has no bound")
                .sources(AREA_CHANGE);
    }

    private static final FunctionEntry DV_OVER_DA = slope("dv_over_da")
            .title("Relative change of speed over that of area")
            .formula("(dV/V)/(dA/A) = 1/(M^2-1)")
            .note("For any fluid; negative in subsonic flow.")
            .takes(MACH)
            .gives("(dV/V)/(dA/A)", "1", Interval.anyNumber())
            .kernel(AreaRule::dvOverDa)
            .partials(Kernel.of(mach -> -drhoByMach(mach)))
            .example("0.3333", 2.0)
            .cell("1/(({mach}-1)*({mach}+1))")
            .build();

    private static final FunctionEntry DP_OVER_DA = slope("dp_over_da")
            .title("Relative change of pressure over that of area")
            .formula("(dp/p)/(dA/A) = gamma M^2/(1-M^2)")
            .note("For any fluid whose isentropic exponent gamma is.")
            .takes(MACH, GAMMA)
            .gives("(dp/p)/(dA/A)", "1", Interval.anyNumber())
            .kernel(AreaRule::dpOverDa)
            .partials(
                    Kernel.of((mach, gamma) -> gamma * drhoByMach(mach)), Kernel.of((mach, gamma) -> drhoOverDa(mach)))
            .example("-1.867", 2.0, 1.4)
            .cell("{gamma}*{mach}^2/((1-{mach})*(1+{mach}))")
            .build();

    private static final FunctionEntry DRHO_OVER_DA = slope("drho_over_da")
            .title("Relative change of density over that of area")
            .formula("(drho/rho)/(dA/A) = M^2/(1-M^2)")
            .note("For any fluid; positive in subsonic flow.")
            .takes(MACH)
            .gives("(drho/rho)/(dA/A)", "1", Interval.anyNumber())
            .kernel(AreaRule::drhoOverDa)
            .partials(Kernel.of(AreaRule::drhoByMach))
            .example("-1.333", 2.0)
            .cell("{mach}^2/((1-{mach})*(1+{mach}))")
            .build();

    private static final FunctionEntry DT_OVER_DA = slope("dt_over_da")
            .title("Relative change of temperature over that of area")
            .formula("(dT/T)/(dA/A) = (gamma-1) M^2/(1-M^2)")
            .note("For a perfect gas.")
            .takes(MACH, GAMMA)
            .gives("(dT/T)/(dA/A)", "1", Interval.anyNumber())
            .kernel(AreaRule::dtOverDa)
            .partials(
                    Kernel.of((mach, gamma) -> (gamma - 1) * drhoByMach(mach)),
                    Kernel.of((mach, gamma) -> drhoOverDa(mach)))
            .example("-0.5333", 2.0, 1.4)
            .cell("({gamma}-1)*{mach}^2/((1-{mach})*(1+{mach}))")
            .build();

    private static final FunctionEntry DMACH_OVER_DA = slope("dmach_over_da")
            .title("Relative change of Mach number over that of area")
            .formula("(dM/M)/(dA/A) = -(1 + (gamma-1)/2 M^2)/(1-M^2)")
            .note("For a perfect gas.")
            .takes(MACH, GAMMA)
            .gives("(dM/M)/(dA/A)", "1", Interval.anyNumber())
            .kernel(AreaRule::dmachOverDa)
            .partials(
                    Kernel.of((mach, gamma) -> -0.5 * (gamma + 1) * drhoByMach(mach)),
                    Kernel.of((mach, gamma) -> -0.5 * drhoOverDa(mach)))
            .example("0.6000", 2.0, 1.4)
            .cell("(1+({gamma}-1)/2*{mach}^2)/(({mach}-1)*({mach}+1))")
            .build();

    private static final FunctionEntry PASSAGE_ROLE = FAMILY.entry("passage_role")
            .title("What a passage does to the flow")
            .formula("nozzle where (M-1) dA > 0: the speed grows; diffuser where (M-1) dA < 0: it falls")
            .note("At M = 1 a passage whose area changes is neither; it is called sonic.")
            .takes(MACH, AREA_CHANGE_ARGUMENT)
            .givesOneOf("role", "nozzle", "diffuser", "sonic", "constant_area")
            .kernel(AreaRule::passageRole)
            .sources(AREA_CHANGE)
            .example("nozzle", 2.0, 0.01)
            .cell("IF({area_change}=0,\"constant_area\",IF({mach}=1,\"sonic\","
                    + "IF(({mach}-1)*{area_change}>0,\"nozzle\",\"diffuser\")))")
            .build();

    static List<FunctionEntry> entries() {
        return List.of(DV_OVER_DA, DP_OVER_DA, DRHO_OVER_DA, DT_OVER_DA, DMACH_OVER_DA, PASSAGE_ROLE);
    }
}
