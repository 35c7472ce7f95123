package org.ductledger.flow;

import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.GAS_CONSTANT;
import static org.ductledger.flow.Arguments.MACH;
import static org.ductledger.flow.Arguments.P;
import static org.ductledger.flow.Arguments.T;
import static org.ductledger.flow.Arguments.T0;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.Family;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;

/** Speeds, densities and mass flows of a perfect gas, with their dimensions. */
final class FlowRates {
    private static final Family FAMILY = new Family("dimensional", "Speeds, densities and mass flows of a perfect gas");

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

    static double machFromFlowSpeed(double v, double t, double gamma, double gasConstant) {
        return v / speedOfSound(gamma, gasConstant, t);
    }

    private static final Source GAS_LAW = Sources.SHAPIRO.at("chapter 2, equation of state of a perfect gas");
    private static final Source SOUND = Sources.SHAPIRO.at("chapter 3, velocity of sound in a perfect gas");
    private static final Source FLOW = Sources.SHAPIRO.at("chapter 4, isentropic flow of a perfect gas");

    private static final Argument SPEED = Argument.number("v", "V", "m/s", Interval.atLeast(0), "flow speed");
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

    static List<FunctionEntry> entries() {
        return List.of(SPEED_OF_SOUND, GAS_DENSITY, FLOW_SPEED, MAX_FLOW_SPEED, MACH_FROM_FLOW_SPEED);
    }
}
