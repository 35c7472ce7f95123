package org.ductledger.flow;

import static org.ductledger.flow.Arguments.AREA;
import static org.ductledger.flow.Arguments.BRANCH;
import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.GAS_CONSTANT;
import static org.ductledger.flow.Arguments.MACH;
import static org.ductledger.flow.Arguments.P;
import static org.ductledger.flow.Arguments.P0;
import static org.ductledger.flow.Arguments.T;
import static org.ductledger.flow.Arguments.T0;

import java.util.List;
import java.util.Map;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;

/** Speeds, densities and mass flows of a perfect gas, with their dimensions. */
final class FlowRates {
    private static final Chapter FAMILY =
            new Chapter("dimensional", "Speeds, densities and mass flows of a perfect gas");

    private FlowRates() {}

    static double speedOfSound(double gamma, double gasConstant, double t) {
        double square = gamma * gasConstant * t;
        return inRange(square) ? Math.sqrt(square) : Math.sqrt(gamma) * (Math.sqrt(gasConstant) * Math.sqrt(t));
    }

    /** sqrt(R T), also where the product leaves the range of a double. */
    static double thermalSpeed(double gasConstant, double t) {
        double square = gasConstant * t;
        return inRange(square) ? Math.sqrt(square) : Math.sqrt(gasConstant) * Math.sqrt(t);
    }

    private static boolean inRange(double x) {
        return x >= Double.MIN_NORMAL && x <= Double.MAX_VALUE;
    }

    static double gasDensity(double p, double t, double gasConstant) {
        return p / (gasConstant * t);
    }

    /** V = M sqrt(gamma R T), the Mach number taken into the root from M = 1 on, so that its square never overflows. */
    static double flowSpeed(double mach, double t0, double gamma, double gasConstant) {
        double k = 0.5 * (gamma - 1);
        double perThermalSpeed =
                mach < 1 ? mach * Math.sqrt(gamma / (1 + k * mach * mach)) : Math.sqrt(gamma / (k + 1 / mach / mach));
        return perThermalSpeed * thermalSpeed(gasConstant, t0);
    }

    static double maxFlowSpeed(double t0, double gamma, double gasConstant) {
        return Math.sqrt(2 * gamma / (gamma - 1) * gasConstant * t0);
    }

    static double massFlow(double mach, double p0, double t0, double area, double gamma, double gasConstant) {
        return Isentropic.massFlowNumber(mach, gamma) * p0 * area / thermalSpeed(gasConstant, t0);
    }

    static double chokedMassFlow(double p0, double t0, double area, double gamma, double gasConstant) {
        return Isentropic.chokedMassFlowNumber(gamma) * p0 * area / thermalSpeed(gasConstant, t0);
    }

    static double throatArea(double massFlow, double p0, double t0, double gamma, double gasConstant) {
        return massFlow / p0 * thermalSpeed(gasConstant, t0) / Isentropic.chokedMassFlowNumber(gamma);
    }

    static double machFromFlowSpeed(double v, double t, double gamma, double gasConstant) {
        return v / speedOfSound(gamma, gasConstant, t);
    }

    /** Goes by the share of the choked flow, so that the choked flow itself, as computed here, gives M = 1. */
    static double machFromMassFlow(
            double massFlow, double p0, double t0, double area, double gamma, double gasConstant, double branch) {
        double share = massFlow / chokedMassFlow(p0, t0, area, gamma, gasConstant);
        return share <= 1
                ? IsentropicBranches.machFromMassFlowNumber(
                        share * Isentropic.chokedMassFlowNumber(gamma), gamma, branch)
                : Double.NaN;
    }

    private static final Source GAS_LAW = Sources.SHAPIRO.at("chapter 2, equation of state of a perfect gas");
    private static final Source SOUND = Sources.SHAPIRO.at("chapter 3, velocity of sound in a perfect gas");
    private static final Source FLOW = Sources.SHAPIRO.at("chapter 4, isentropic flow of a perfect gas");
    private static final String STAGNATION = "Isentropic from rest: p0 and T0 are those of the supply.";

    private static final Argument SPEED = Argument.number("v", "V", "m/s", Interval.atLeast(0), "flow speed");
    private static final Argument MASS_FLOW =
            Argument.number("mass_flow", "qm", "kg/s", Interval.above(0), "mass flow");

    private static final FunctionEntry SPEED_OF_SOUND = FAMILY.entry("speed_of_sound")
            .title("Speed of sound")
            .formula("a = sqrt(gamma R T)")
            .takes(GAMMA, GAS_CONSTANT, T)
            .gives("a", "m/s", Interval.above(0))
            .kernel(FlowRates::speedOfSound)
            .partials(
                    Kernel.of((gamma, r, t) -> 0.5 * speedOfSound(gamma, r, t) / gamma),
                    Kernel.of((gamma, r, t) -> 0.5 * speedOfSound(gamma, r, t) / r),
                    Kernel.of((gamma, r, t) -> 0.5 * speedOfSound(gamma, r, t) / t))
            .sources(SOUND)
            .example("340.29", 1.4, 287.05287, 288.15)
            .cell("SQRT({gamma}*{gas_constant}*{t})")
            .build();

    private static final FunctionEntry GAS_DENSITY = FAMILY.entry("gas_density")
            .title("Density of a perfect gas")
            .formula("rho = p / (R T)")
            .takes(P, T, GAS_CONSTANT)
            .gives("rho", "kg/m3", Interval.above(0))
            .kernel(FlowRates::gasDensity)
            .partials(
                    Kernel.of((p, t, r) -> 1 / (r * t)),
                    Kernel.of((p, t, r) -> -gasDensity(p, t, r) / t),
                    Kernel.of((p, t, r) -> -gasDensity(p, t, r) / r))
            .sources(GAS_LAW)
            .example("1.2250", 101325.0, 288.15, 287.05287)
            .cell("{p}/({gas_constant}*{t})")
            .build();

    private static final FunctionEntry FLOW_SPEED = FAMILY.entry("flow_speed")
            .title("Flow speed from the Mach number and the stagnation temperature")
            .formula("V = M sqrt(gamma R T0 / (1 + (gamma-1)/2 M^2))")
            .takes(MACH, T0, GAMMA, GAS_CONSTANT)
            .gives("V", "m/s", Interval.atLeast(0))
            .kernel(FlowRates::flowSpeed)
            .partials(
                    Kernel.of(FlowRateSlopes::flowSpeedByMach),
                    Kernel.of((mach, t0, gamma, r) -> 0.5 * flowSpeed(mach, t0, gamma, r) / t0),
                    Kernel.of(FlowRateSlopes::flowSpeedByGamma),
                    Kernel.of((mach, t0, gamma, r) -> 0.5 * flowSpeed(mach, t0, gamma, r) / r))
            .sources(FLOW)
            .example("517.60", 2.0, 300.0, 1.4, 287.05)
            .cell("{mach}*SQRT({gamma}*{gas_constant}*{t0}/(1+({gamma}-1)/2*{mach}^2))")
            .build();

    private static final FunctionEntry MAX_FLOW_SPEED = FAMILY.entry("max_flow_speed")
            .title("Greatest flow speed, of expansion into vacuum")
            .formula("Vmax = sqrt(2 gamma/(gamma-1) R T0)")
            .takes(T0, GAMMA, GAS_CONSTANT)
            .gives("Vmax", "m/s", Interval.above(0))
            .kernel(FlowRates::maxFlowSpeed)
            .partials(
                    Kernel.of((t0, gamma, r) -> 0.5 * maxFlowSpeed(t0, gamma, r) / t0),
                    Kernel.of((t0, gamma, r) -> -0.5 * maxFlowSpeed(t0, gamma, r) / (gamma * (gamma - 1))),
                    Kernel.of((t0, gamma, r) -> 0.5 * maxFlowSpeed(t0, gamma, r) / r))
            .sources(FLOW)
            .example("776.4", 300.0, 1.4, 287.05)
            .cell("SQRT(2*{gamma}/({gamma}-1)*{gas_constant}*{t0})")
            .build();

    private static final FunctionEntry MASS_FLOW_ENTRY = FAMILY.entry("mass_flow")
            .title("Mass flow through an area from the Mach number and the stagnation state")
            .formula("qm = p0 A/sqrt(R T0) sqrt(gamma) M (1 + (gamma-1)/2 M^2)^(-(gamma+1)/(2(gamma-1)))")
            .note(STAGNATION)
            .takes(MACH, P0, T0, AREA, GAMMA, GAS_CONSTANT)
            .gives("qm", "kg/s", Interval.atLeast(0))
            .kernel(FlowRates::massFlow)
            .partials(
                    Kernel.of(FlowRateSlopes::massFlowByMach),
                    Kernel.of((mach, p0, t0, area, gamma, r) -> massFlow(mach, p0, t0, area, gamma, r) / p0),
                    Kernel.of((mach, p0, t0, area, gamma, r) -> -0.5 * massFlow(mach, p0, t0, area, gamma, r) / t0),
                    Kernel.of((mach, p0, t0, area, gamma, r) -> massFlow(mach, p0, t0, area, gamma, r) / area),
                    Kernel.of(FlowRateSlopes::massFlowByGamma),
                    Kernel.of((mach, p0, t0, area, gamma, r) -> -0.5 * massFlow(mach, p0, t0, area, gamma, r) / r))
            .sources(FLOW)
            .example("1.2191", 0.5, 7e5, 300.0, 0.001, 1.4, 287.05)
            .cell(CellForm.steps()
                    .use(
                            "number",
                            IsentropicRatios.MASS_FLOW_NUMBER.cellForm(),
                            Map.of("mach", "{mach}", "gamma", "{gamma}"))
                    .result("{number}*{p0}*{area}/SQRT({gas_constant}*{t0})"))
            .build();

    private static final FunctionEntry CHOKED_MASS_FLOW = FAMILY.entry("choked_mass_flow")
            .title("Greatest mass flow through an area, sonic there")
            .formula("qm* = p0 A/sqrt(R T0) sqrt(gamma) (2/(gamma+1))^((gamma+1)/(2(gamma-1)))")
            .note(STAGNATION)
            .takes(P0, T0, AREA, GAMMA, GAS_CONSTANT)
            .gives("qm*", "kg/s", Interval.above(0))
            .kernel(FlowRates::chokedMassFlow)
            .partials(
                    Kernel.of((p0, t0, area, gamma, r) -> chokedMassFlow(p0, t0, area, gamma, r) / p0),
                    Kernel.of((p0, t0, area, gamma, r) -> -0.5 * chokedMassFlow(p0, t0, area, gamma, r) / t0),
                    Kernel.of((p0, t0, area, gamma, r) -> chokedMassFlow(p0, t0, area, gamma, r) / area),
                    Kernel.of(FlowRateSlopes::chokedMassFlowByGamma),
                    Kernel.of((p0, t0, area, gamma, r) -> -0.5 * chokedMassFlow(p0, t0, area, gamma, r) / r))
            .sources(FLOW)
            .example("1.6333", 7e5, 300.0, 0.001, 1.4, 287.05)
            .cell(chokedCell("{p0}*{area}/SQRT({gas_constant}*{t0})*{number}"))
            .build();

    private static final FunctionEntry THROAT_AREA_FROM_MASS_FLOW = FAMILY.entry("throat_area_from_mass_flow")
            .title("Throat area that passes a mass flow when choked")
            .formula("At = qm sqrt(R T0) / (p0 sqrt(gamma) (2/(gamma+1))^((gamma+1)/(2(gamma-1))))")
            .note(STAGNATION)
            .takes(MASS_FLOW, P0, T0, GAMMA, GAS_CONSTANT)
            .gives("At", "m2", Interval.above(0))
            .kernel(FlowRates::throatArea)
            .partials(
                    Kernel.of((m, p0, t0, gamma, r) -> throatArea(1, p0, t0, gamma, r)),
                    Kernel.of((m, p0, t0, gamma, r) -> -throatArea(m, p0, t0, gamma, r) / p0),
                    Kernel.of((m, p0, t0, gamma, r) -> 0.5 * throatArea(m, p0, t0, gamma, r) / t0),
                    Kernel.of(FlowRateSlopes::throatAreaByGamma),
                    Kernel.of((m, p0, t0, gamma, r) -> 0.5 * throatArea(m, p0, t0, gamma, r) / r))
            .sources(FLOW)
            .example("0.00122448", 2.0, 7e5, 300.0, 1.4, 287.05)
            .cell(chokedCell("{mass_flow}*SQRT({gas_constant}*{t0})/({p0}*{number})"))
            .build();

    private static CellForm chokedCell(String result) {
        return CellForm.steps()
                .use("number", IsentropicRatios.CHOKED_MASS_FLOW_NUMBER.cellForm(), Map.of("gamma", "{gamma}"))
                .result(result);
    }

    private static final FunctionEntry MACH_FROM_FLOW_SPEED = FAMILY.entry("mach_from_flow_speed")
            .title("Mach number from the flow speed and the static temperature")
            .formula("M = V / sqrt(gamma R T)")
            .note("T is the static temperature, not the stagnation temperature.")
            .takes(SPEED, T, GAMMA, GAS_CONSTANT)
            .gives("M", "1", Interval.atLeast(0))
            .kernel(FlowRates::machFromFlowSpeed)
            .partials(
                    Kernel.of((v, t, gamma, r) -> 1 / speedOfSound(gamma, r, t)),
                    Kernel.of((v, t, gamma, r) -> -0.5 * machFromFlowSpeed(v, t, gamma, r) / t),
                    Kernel.of((v, t, gamma, r) -> -0.5 * machFromFlowSpeed(v, t, gamma, r) / gamma),
                    Kernel.of((v, t, gamma, r) -> -0.5 * machFromFlowSpeed(v, t, gamma, r) / r))
            .sources(SOUND)
            .example("0.5877", 200.0, 288.15, 1.4, 287.05)
            .cell("{v}/SQRT({gamma}*{gas_constant}*{t})")
            .build();

    private static final FunctionEntry MACH_FROM_MASS_FLOW = FAMILY.entry("mach_from_mass_flow")
            .title("Mach number from the mass flow through an area and the stagnation state")
            .formula("the M of the branch for which mass_flow(M, p0, T0, A, gamma, R) = qm")
            .note(STAGNATION)
            .takes(MASS_FLOW, P0, T0, AREA, GAMMA, GAS_CONSTANT, BRANCH)
            .gives("M", "1", Interval.atLeast(0))
            .kernel(FlowRates::machFromMassFlow)
            .requiresAtMost(
                    FaultKind.NO_SOLUTION,
                    "mass_flow",
                    Kernel.of((m, p0, t0, area, gamma, r, branch) -> chokedMassFlow(p0, t0, area, gamma, r)),
                    "the choked mass flow of this area")
            .partials(
                    Kernel.of(FlowRateSlopes::machByMassFlow),
                    Kernel.of(FlowRateSlopes::machByP0),
                    Kernel.of(FlowRateSlopes::machByT0),
                    Kernel.of(FlowRateSlopes::machByArea),
                    Kernel.of(FlowRateSlopes::machByGamma),
                    Kernel.of(FlowRateSlopes::machByGasConstant),
                    null)
            .sources(FLOW)
            .example("0.500", 1.2191, 7e5, 300.0, 0.001, 1.4, 287.05, "subsonic")
            .cell(machCell())
            .build();

    private static CellForm machCell() {
        return CellForm.steps()
                .use("choked", IsentropicRatios.CHOKED_MASS_FLOW_NUMBER.cellForm(), Map.of("gamma", "{gamma}"))
                .helper("share", "{mass_flow}*SQRT({gas_constant}*{t0})/({p0}*{area}*{choked})")
                .use(
                        "mach",
                        IsentropicInverses.MACH_FROM_MASS_FLOW_NUMBER.cellForm(),
                        Map.of("mass_flow_number", "MIN(1,{share})*{choked}", "gamma", "{gamma}", "branch", "{branch}"))
                .result("IF({share}>1,NA(),{mach})");
    }

    static List<FunctionEntry> entries() {
        return List.of(
                SPEED_OF_SOUND,
                GAS_DENSITY,
                FLOW_SPEED,
                MAX_FLOW_SPEED,
                MASS_FLOW_ENTRY,
                CHOKED_MASS_FLOW,
                THROAT_AREA_FROM_MASS_FLOW,
                MACH_FROM_FLOW_SPEED,
                MACH_FROM_MASS_FLOW);
    }
}
