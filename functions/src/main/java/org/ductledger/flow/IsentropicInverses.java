package org.ductledger.flow;

import static org.ductledger.flow.Arguments.AREA_RATIO;
import static org.ductledger.flow.Arguments.BRANCH;
import static org.ductledger.flow.Arguments.GAMMA;

import java.util.List;
import java.util.Map;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Numbers;
import org.ductledger.catalogue.Source;

/** The Mach number from each of the isentropic ratios and numbers. */
final class IsentropicInverses {
    private static final Chapter FAMILY = IsentropicRatios.FAMILY;
    private static final Interval SHARE = Interval.openClosed(0, 1);
    private static final Interval POSITIVE = Interval.atLeast(0);

    private static final Argument T_OVER_T0 =
            Argument.number("t_over_t0", "T/T0", "1", SHARE, "static over stagnation temperature");
    private static final Argument P_OVER_P0 =
            Argument.number("p_over_p0", "p/p0", "1", SHARE, "static over stagnation pressure");
    private static final Argument RHO_OVER_RHO0 =
            Argument.number("rho_over_rho0", "rho/rho0", "1", SHARE, "static over stagnation density");
    private static final Argument A_OVER_A0 =
            Argument.number("a_over_a0", "a/a0", "1", SHARE, "static over stagnation speed of sound");
    private static final Argument V_OVER_ASTAR = Argument.number(
            "v_over_astar", "V/a*", "1", POSITIVE, "speed over the speed of sound where this flow is sonic");
    private static final Argument V_OVER_VMAX = Argument.number(
            "v_over_vmax", "V/Vmax", "1", Interval.closedOpen(0, 1), "speed over that of expansion into vacuum");
    private static final Argument Q_OVER_P0 =
            Argument.number("q_over_p0", "q/p0", "1", POSITIVE, "dynamic over stagnation pressure");
    private static final Argument Q_OVER_P =
            Argument.number("q_over_p", "q/p", "1", POSITIVE, "dynamic over static pressure");
    private static final Argument IMPACT_PRESSURE_OVER_P = Argument.number(
            "impact_pressure_over_p", "(p0-p)/p", "1", POSITIVE, "stagnation less static over static pressure");
    private static final Argument MASS_FLOW_NUMBER = Argument.number(
            "mass_flow_number", "qm sqrt(R T0)/(p0 A)", "1", POSITIVE, "mass flow with the stagnation pressure");
    private static final Argument MASS_FLOW_NUMBER_STATIC = Argument.number(
            "mass_flow_number_static", "qm sqrt(R T0)/(p A)", "1", POSITIVE, "mass flow with the static pressure");
    private static final Argument IMPULSE_OVER_IMPULSESTAR = Argument.number(
            "impulse_over_impulsestar",
            "I/I*",
            "1",
            Interval.atLeast(1),
            "impulse function over its value where this flow is sonic");
    private static final Argument MACH_ANGLE =
            Argument.number("mach_angle", "mu", "deg", Interval.openClosed(0, 90), "Mach angle");
    /** q/p0 is greatest at M = sqrt(2), so that subsonic and supersonic would not part its two solutions. */
    private static final Argument SIDE = Argument.choice("branch", "which side of M = sqrt(2)", "below", "above");

    private IsentropicInverses() {}

    /** What all of them share; sources and ends of the argument are those of the function turned round. */
    private static EntryBuilder inverse(FunctionEntry function, Argument given) {
        return FAMILY.entry("mach_from_" + function.name())
                .title("Mach number from " + given.meaning())
                .formula("the M for which " + function.formula())
                .sources(function.sources().toArray(Source[]::new))
                .gives("M", "1", POSITIVE);
    }

    /** log(1 + x) / x x, by the rounded sum: a spreadsheet has no log1p. */
    private static CellForm.Builder sumAndLogarithm(String x) {
        return CellForm.steps()
                .helper("sum", "1+" + x)
                .helper("logarithm", "IF({sum}=1," + x + "," + x + "*LN({sum})/({sum}-1))");
    }

    /** sqrt(2/(gamma-1) (exp(y) - 1)), by the rounded exponential: a spreadsheet has no expm1. */
    private static CellForm fromExponent(CellForm.Builder steps, String exponent) {
        return steps.helper("exponent", exponent)
                .helper("power", "EXP({exponent})")
                .helper("rise", "IF({power}=1,{exponent},{exponent}*({power}-1)/LN({power}))")
                .result("SQRT(2*{rise}/({gamma}-1))");
    }

    static final FunctionEntry MACH_FROM_T_OVER_T0 = inverse(IsentropicRatios.T_OVER_T0, T_OVER_T0)
            .takes(T_OVER_T0, GAMMA)
            .kernel(Isentropic::machFromTOverT0)
            .partials(InverseSlopes.of(
                    Isentropic::machFromTOverT0, IsentropicSlopes::tOverT0ByMach, IsentropicSlopes::tOverT0ByGamma))
            .example("2.000", 0.5556, 1.4)
            .cell("SQRT(2/({gamma}-1)*(1-{t_over_t0})/{t_over_t0})")
            .build();

    static final FunctionEntry MACH_FROM_P_OVER_P0 = inverse(IsentropicRatios.P_OVER_P0, P_OVER_P0)
            .takes(P_OVER_P0, GAMMA)
            .kernel(Isentropic::machFromPOverP0)
            .partials(InverseSlopes.of(
                    Isentropic::machFromPOverP0, IsentropicSlopes::pOverP0ByMach, IsentropicSlopes::pOverP0ByGamma))
            .example("2.000", 0.1278, 1.4)
            .cell(fromExponent(CellForm.steps(), "(1-{gamma})/{gamma}*LN({p_over_p0})"))
            .build();

    static final FunctionEntry MACH_FROM_RHO_OVER_RHO0 = inverse(IsentropicRatios.RHO_OVER_RHO0, RHO_OVER_RHO0)
            .takes(RHO_OVER_RHO0, GAMMA)
            .kernel(Isentropic::machFromRhoOverRho0)
            .partials(InverseSlopes.of(
                    Isentropic::machFromRhoOverRho0,
                    IsentropicSlopes::rhoOverRho0ByMach,
                    IsentropicSlopes::rhoOverRho0ByGamma))
            .example("2.00", 0.23, 1.4)
            .cell(fromExponent(CellForm.steps(), "(1-{gamma})*LN({rho_over_rho0})"))
            .build();

    static final FunctionEntry MACH_FROM_A_OVER_A0 = inverse(IsentropicRatios.A_OVER_A0, A_OVER_A0)
            .takes(A_OVER_A0, GAMMA)
            .kernel(Isentropic::machFromAOverA0)
            .partials(InverseSlopes.of(
                    Isentropic::machFromAOverA0, IsentropicSlopes::aOverA0ByMach, IsentropicSlopes::aOverA0ByGamma))
            .example("2.000", 0.7454, 1.4)
            .cell("SQRT(2/({gamma}-1)*(1-{a_over_a0})*(1+{a_over_a0}))/{a_over_a0}")
            .build();

    static final FunctionEntry MACH_FROM_V_OVER_ASTAR = inverse(IsentropicRatios.V_OVER_ASTAR, V_OVER_ASTAR)
            .takes(V_OVER_ASTAR, GAMMA)
            .kernel(Isentropic::machFromVOverAstar)
            .requires(
                    FaultKind.NO_SOLUTION,
                    "v_over_astar",
                    row -> Isentropic.leftToVmax(row[0], row[1]) > 0,
                    row -> "must be less than " + Numbers.brief(Math.sqrt((row[1] + 1) / (row[1] - 1)))
                            + " (the speed of expansion into vacuum)")
            .partials(InverseSlopes.of(
                    Isentropic::machFromVOverAstar,
                    IsentropicSlopes::vOverAstarByMach,
                    IsentropicSlopes::vOverAstarByGamma))
            .example("2.000", 1.633, 1.4)
            .cell("{v_over_astar}/SQRT(({gamma}+1)/2-({gamma}-1)/2*{v_over_astar}^2)")
            .build();

    static final FunctionEntry MACH_FROM_V_OVER_VMAX = inverse(IsentropicRatios.V_OVER_VMAX, V_OVER_VMAX)
            .takes(V_OVER_VMAX, GAMMA)
            .kernel(Isentropic::machFromVOverVmax)
            .partials(InverseSlopes.of(
                    Isentropic::machFromVOverVmax,
                    IsentropicSlopes::vOverVmaxByMach,
                    IsentropicSlopes::vOverVmaxByGamma))
            .example("2.000", 0.6667, 1.4)
            .cell("{v_over_vmax}*SQRT(2/(({gamma}-1)*(1-{v_over_vmax})*(1+{v_over_vmax})))")
            .build();

    static final FunctionEntry MACH_FROM_AREA_RATIO = inverse(IsentropicRatios.AREA_RATIO, AREA_RATIO)
            .note("Two flows have this area ratio; at A/A* = 1 both are sonic.")
            .takes(AREA_RATIO, GAMMA, BRANCH)
            .kernel(IsentropicBranches::machFromAreaRatio)
            .partials(InverseSlopes.ofBranches(
                    IsentropicBranches::machFromAreaRatio,
                    IsentropicSlopes::areaRatioByMach,
                    IsentropicSlopes::areaRatioByGamma))
            .example("2.000", 1.6875, 1.4, "supersonic")
            .cell(CellForm.steps()
                    .helper("c", "({gamma}-1)/({gamma}+1)")
                    .use("square", SonicBalanceCells.MACH_SQUARE, balance("LN({area_ratio})", "subsonic"))
                    .result("SQRT({square})"))
            .build();

    static final FunctionEntry MACH_FROM_Q_OVER_P0 = inverse(IsentropicRatios.Q_OVER_P0, Q_OVER_P0)
            .note("Two flows have this q/p0, one below M = sqrt(2) and one above.")
            .takes(Q_OVER_P0, GAMMA, SIDE)
            .kernel(IsentropicBranches::machFromQOverP0)
            .requires(
                    FaultKind.NO_SOLUTION,
                    "q_over_p0",
                    row -> IsentropicBranches.isAtMost(row[0], IsentropicBranches.greatestQOverP0(row[1])),
                    row -> "must be at most " + Numbers.brief(IsentropicBranches.greatestQOverP0(row[1]))
                            + " (its value at M = sqrt(2))")
            .partials(InverseSlopes.ofBranches(
                    IsentropicBranches::machFromQOverP0,
                    IsentropicSlopes::qOverP0ByMach,
                    IsentropicSlopes::qOverP0ByGamma))
            .example("2.000", 0.35785, 1.4, "above")
            .cell(CellForm.steps()
                    .helper("c", "({gamma}-1)/{gamma}")
                    .use(
                            "square",
                            SonicBalanceCells.MACH_SQUARE,
                            balance("-LN({q_over_p0})/2-LN({gamma})/(2*({gamma}-1))", "below"))
                    .result("SQRT(2*{square})"))
            .build();

    static final FunctionEntry MACH_FROM_Q_OVER_P = inverse(IsentropicRatios.Q_OVER_P, Q_OVER_P)
            .takes(Q_OVER_P, GAMMA)
            .kernel(Isentropic::machFromQOverP)
            .partials(InverseSlopes.of(
                    Isentropic::machFromQOverP, IsentropicSlopes::qOverPByMach, IsentropicSlopes::qOverPByGamma))
            .example("2.000", 2.8, 1.4)
            .cell("SQRT(2*{q_over_p}/{gamma})")
            .build();

    static final FunctionEntry MACH_FROM_IMPACT_PRESSURE_OVER_P = inverse(
                    IsentropicRatios.IMPACT_PRESSURE_OVER_P, IMPACT_PRESSURE_OVER_P)
            .takes(IMPACT_PRESSURE_OVER_P, GAMMA)
            .kernel(Isentropic::machFromImpactPressureOverP)
            .partials(InverseSlopes.of(
                    Isentropic::machFromImpactPressureOverP,
                    IsentropicSlopes::impactPressureOverPByMach,
                    IsentropicSlopes::impactPressureOverPByGamma))
            .example("1.0000", 0.89293, 1.4)
            .cell(fromExponent(sumAndLogarithm("{impact_pressure_over_p}"), "({gamma}-1)/{gamma}*{logarithm}"))
            .build();

    static final FunctionEntry MACH_FROM_MASS_FLOW_NUMBER = inverse(IsentropicRatios.MASS_FLOW_NUMBER, MASS_FLOW_NUMBER)
            .note("Two flows have this mass flow number; at that of choked flow both are sonic.")
            .takes(MASS_FLOW_NUMBER, GAMMA, BRANCH)
            .kernel(IsentropicBranches::machFromMassFlowNumber)
            .requires(
                    FaultKind.NO_SOLUTION,
                    "mass_flow_number",
                    row -> IsentropicBranches.isAtMost(row[0], Isentropic.chokedMassFlowNumber(row[1])),
                    row -> "must be at most " + Numbers.brief(Isentropic.chokedMassFlowNumber(row[1]))
                            + " (that of choked flow)")
            .partials(InverseSlopes.ofBranches(
                    IsentropicBranches::machFromMassFlowNumber,
                    IsentropicSlopes::massFlowNumberByMach,
                    IsentropicSlopes::massFlowNumberByGamma))
            .example("0.3000", 0.33643, 1.4, "subsonic")
            .cell(CellForm.steps()
                    .helper("c", "({gamma}-1)/({gamma}+1)")
                    .use("choked", IsentropicRatios.CHOKED_MASS_FLOW_NUMBER.cellForm(), Map.of("gamma", "{gamma}"))
                    .use(
                            "square",
                            SonicBalanceCells.MACH_SQUARE,
                            balance("LN({choked}/{mass_flow_number})", "subsonic"))
                    .result("SQRT({square})"))
            .build();

    static final FunctionEntry MACH_FROM_MASS_FLOW_NUMBER_STATIC = inverse(
                    IsentropicRatios.MASS_FLOW_NUMBER_STATIC, MASS_FLOW_NUMBER_STATIC)
            .takes(MASS_FLOW_NUMBER_STATIC, GAMMA)
            .kernel(Isentropic::machFromMassFlowNumberStatic)
            .partials(InverseSlopes.of(
                    Isentropic::machFromMassFlowNumberStatic,
                    IsentropicSlopes::massFlowNumberStaticByMach,
                    IsentropicSlopes::massFlowNumberStaticByGamma))
            .example("1.0000", 1.29615, 1.4)
            .cell(CellForm.steps()
                    .helper("square", "{mass_flow_number_static}^2/{gamma}")
                    .result("SQRT(2*{square}/(1+SQRT(1+2*({gamma}-1)*{square})))"))
            .build();

    static final FunctionEntry MACH_FROM_IMPULSE_OVER_IMPULSESTAR = inverse(
                    IsentropicRatios.IMPULSE_OVER_IMPULSESTAR, IMPULSE_OVER_IMPULSESTAR)
            .note("Two flows have this impulse function; at I/I* = 1 both are sonic.")
            .takes(IMPULSE_OVER_IMPULSESTAR, GAMMA, BRANCH)
            .kernel(IsentropicBranches::machFromImpulseOverImpulsestar)
            .requires(
                    FaultKind.NO_SOLUTION,
                    "impulse_over_impulsestar",
                    row -> row[2] == Arguments.SUBSONIC || IsentropicBranches.leftToGreatestImpulse(row[0], row[1]) > 0,
                    row -> "must be less than " + Numbers.brief(IsentropicBranches.greatestImpulse(row[1]))
                            + " (that of expansion into vacuum) on the supersonic branch")
            .partials(InverseSlopes.ofBranches(
                    IsentropicBranches::machFromImpulseOverImpulsestar,
                    IsentropicSlopes::impulseOverImpulsestarByMach,
                    IsentropicSlopes::impulseOverImpulsestarByGamma))
            .example("2.000", 1.12268, 1.4, "supersonic")
            .cell(CellForm.steps()
                    .helper("excess", "({impulse_over_impulsestar}-1)*({impulse_over_impulsestar}+1)")
                    .helper("root", "SQRT({excess})")
                    .helper("sum", "{impulse_over_impulsestar}+{root}")
                    .result("IF({branch}=\"subsonic\",1/SQRT(1+({gamma}+1)*{root}*{sum}),"
                            + "SQRT({sum}*({impulse_over_impulsestar}+{gamma}*{root})"
                            + "/(1-({gamma}-1)*({gamma}+1)*{excess})))"))
            .build();

    static final FunctionEntry MACH_FROM_MACH_ANGLE = inverse(IsentropicRatios.MACH_ANGLE, MACH_ANGLE)
            .takes(MACH_ANGLE)
            .gives("M", "1", Interval.atLeast(1))
            .kernel(Isentropic::machFromMachAngle)
            .partials(Kernel.of(angle -> 1 / IsentropicSlopes.machAngleByMach(Isentropic.machFromMachAngle(angle))))
            .example("2.000", 30.0)
            .cell("1/SIN({mach_angle}*PI()/180)")
            .build();

    /** What the two branches' common form is bound to; its helper c stands before it. */
    private static Map<String, String> balance(String logarithm, String belowWord) {
        return Map.of("l", logarithm, "c", "{c}", "below", "{branch}=\"" + belowWord + "\"");
    }

    static List<FunctionEntry> entries() {
        return List.of(
                MACH_FROM_T_OVER_T0,
                MACH_FROM_P_OVER_P0,
                MACH_FROM_RHO_OVER_RHO0,
                MACH_FROM_A_OVER_A0,
                MACH_FROM_V_OVER_ASTAR,
                MACH_FROM_V_OVER_VMAX,
                MACH_FROM_AREA_RATIO,
                MACH_FROM_Q_OVER_P0,
                MACH_FROM_Q_OVER_P,
                MACH_FROM_IMPACT_PRESSURE_OVER_P,
                MACH_FROM_MASS_FLOW_NUMBER,
                MACH_FROM_MASS_FLOW_NUMBER_STATIC,
                MACH_FROM_IMPULSE_OVER_IMPULSESTAR,
                MACH_FROM_MACH_ANGLE);
    }
}
