package org.ductledger.flow;

import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.MACH;

import java.util.List;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;
import org.ductledger.numeric.PowerColumn;
import org.ductledger.numeric.StagnationPower;

/** The isentropic ratios and numbers that the Mach number gives. */
final class IsentropicRatios {
    static final Chapter FAMILY = new Chapter("isentropic", "Isentropic flow of a perfect gas");

    private static final Source USEFUL_RATIOS = Sources.NACA_1135.at("Continuous one-dimensional flow, useful ratios");
    private static final Source STREAM_TUBE = Sources.NACA_1135.at("eq. (80)");
    private static final Source FLOW_PER_AREA = Sources.SHAPIRO.at("chapter 4, flow per unit area");
    private static final Source IMPULSE_FUNCTION = Sources.SHAPIRO.at("chapter 4, impulse function");
    private static final Interval SHARE = Interval.closed(0, 1);
    private static final Interval POSITIVE = Interval.atLeast(0);

    private IsentropicRatios() {}

    private static Kernel column(StagnationPower power) {
        return Kernel.ofColumns(2, new PowerColumn(power)::apply);
    }

    static final FunctionEntry T_OVER_T0 = FAMILY.entry("t_over_t0")
            .title("Static over stagnation temperature")
            .formula("T/T0 = 1/(1 + (gamma-1)/2 M^2)")
            .takes(MACH, GAMMA)
            .gives("T/T0", "1", SHARE)
            .kernel(Isentropic::tOverT0)
            .partials(Kernel.of(IsentropicSlopes::tOverT0ByMach), Kernel.of(IsentropicSlopes::tOverT0ByGamma))
            .sources(Sources.NACA_1135.at("eq. (43)"))
            .example("0.5556", 2.0, 1.4)
            .cell("1/(1+({gamma}-1)/2*{mach}^2)")
            .build();

    static final FunctionEntry P_OVER_P0 = FAMILY.entry("p_over_p0")
            .title("Static over stagnation pressure")
            .formula("p/p0 = (1 + (gamma-1)/2 M^2)^(-gamma/(gamma-1))")
            .takes(MACH, GAMMA)
            .gives("p/p0", "1", SHARE)
            .kernel(column(Isentropic.P_OVER_P0))
            .partials(Kernel.of(IsentropicSlopes::pOverP0ByMach), Kernel.of(IsentropicSlopes::pOverP0ByGamma))
            .sources(Sources.NACA_1135.at("eq. (44)"))
            .example("0.1278", 2.0, 1.4)
            .cell("(1+({gamma}-1)/2*{mach}^2)^(-{gamma}/({gamma}-1))")
            .build();

    static final FunctionEntry RHO_OVER_RHO0 = FAMILY.entry("rho_over_rho0")
            .title("Static over stagnation density")
            .formula("rho/rho0 = (1 + (gamma-1)/2 M^2)^(-1/(gamma-1))")
            .takes(MACH, GAMMA)
            .gives("rho/rho0", "1", SHARE)
            .kernel(column(Isentropic.RHO_OVER_RHO0))
            .partials(Kernel.of(IsentropicSlopes::rhoOverRho0ByMach), Kernel.of(IsentropicSlopes::rhoOverRho0ByGamma))
            .sources(Sources.NACA_1135.at("eq. (45)"))
            .example("0.2300", 2.0, 1.4)
            .cell("(1+({gamma}-1)/2*{mach}^2)^(-1/({gamma}-1))")
            .build();

    static final FunctionEntry A_OVER_A0 = FAMILY.entry("a_over_a0")
            .title("Static over stagnation speed of sound")
            .formula("a/a0 = (1 + (gamma-1)/2 M^2)^(-1/2)")
            .takes(MACH, GAMMA)
            .gives("a/a0", "1", SHARE)
            .kernel(Isentropic::aOverA0)
            .partials(Kernel.of(IsentropicSlopes::aOverA0ByMach), Kernel.of(IsentropicSlopes::aOverA0ByGamma))
            .sources(USEFUL_RATIOS)
            .example("0.7454", 2.0, 1.4)
            .cell("1/SQRT(1+({gamma}-1)/2*{mach}^2)")
            .build();

    static final FunctionEntry T_OVER_TSTAR = FAMILY.entry("t_over_tstar")
            .title("Static temperature over that where this flow is sonic")
            .formula("T/T* = (gamma+1)/2 / (1 + (gamma-1)/2 M^2)")
            .takes(MACH, GAMMA)
            .gives("T/T*", "1", POSITIVE)
            .kernel(Isentropic::tOverTstar)
            .partials(Kernel.of(IsentropicSlopes::tOverTstarByMach), Kernel.of(IsentropicSlopes::tOverTstarByGamma))
            .sources(Sources.NACA_1135.at("eq. (43), over its value at M = 1"))
            .example("0.6667", 2.0, 1.4)
            .cell("({gamma}+1)/(2+({gamma}-1)*{mach}^2)")
            .build();

    static final FunctionEntry P_OVER_PSTAR = FAMILY.entry("p_over_pstar")
            .title("Static pressure over that where this flow is sonic")
            .formula("p/p* = ((1 + (gamma-1)/2 M^2) / ((gamma+1)/2))^(-gamma/(gamma-1))")
            .takes(MACH, GAMMA)
            .gives("p/p*", "1", POSITIVE)
            .kernel(column(Isentropic.P_OVER_PSTAR))
            .partials(Kernel.of(IsentropicSlopes::pOverPstarByMach), Kernel.of(IsentropicSlopes::pOverPstarByGamma))
            .sources(Sources.NACA_1135.at("eq. (44), over its value at M = 1"))
            .example("0.2419", 2.0, 1.4)
            .cell("((2+({gamma}-1)*{mach}^2)/({gamma}+1))^(-{gamma}/({gamma}-1))")
            .build();

    static final FunctionEntry RHO_OVER_RHOSTAR = FAMILY.entry("rho_over_rhostar")
            .title("Static density over that where this flow is sonic")
            .formula("rho/rho* = ((1 + (gamma-1)/2 M^2) / ((gamma+1)/2))^(-1/(gamma-1))")
            .takes(MACH, GAMMA)
            .gives("rho/rho*", "1", POSITIVE)
            .kernel(column(Isentropic.RHO_OVER_RHOSTAR))
            .partials(
                    Kernel.of(IsentropicSlopes::rhoOverRhostarByMach),
                    Kernel.of(IsentropicSlopes::rhoOverRhostarByGamma))
            .sources(Sources.NACA_1135.at("eq. (45), over its value at M = 1"))
            .example("0.3629", 2.0, 1.4)
            .cell("((2+({gamma}-1)*{mach}^2)/({gamma}+1))^(-1/({gamma}-1))")
            .build();

    static final FunctionEntry V_OVER_ASTAR = FAMILY.entry("v_over_astar")
            .title("Speed over the speed of sound where this flow is sonic")
            .formula("V/a* = M sqrt((gamma+1)/2 / (1 + (gamma-1)/2 M^2))")
            .note("Also written M*; it is at most sqrt((gamma+1)/(gamma-1)).")
            .takes(MACH, GAMMA)
            .gives("V/a*", "1", POSITIVE)
            .kernel(Isentropic::vOverAstar)
            .partials(Kernel.of(IsentropicSlopes::vOverAstarByMach), Kernel.of(IsentropicSlopes::vOverAstarByGamma))
            .sources(USEFUL_RATIOS)
            .example("1.633", 2.0, 1.4)
            .cell("{mach}*SQRT(({gamma}+1)/(2+({gamma}-1)*{mach}^2))")
            .build();

    static final FunctionEntry V_OVER_VMAX = FAMILY.entry("v_over_vmax")
            .title("Speed over that of expansion into vacuum")
            .formula("V/Vmax = sqrt(1 - T/T0)")
            .takes(MACH, GAMMA)
            .gives("V/Vmax", "1", SHARE)
            .kernel(Isentropic::vOverVmax)
            .partials(Kernel.of(IsentropicSlopes::vOverVmaxByMach), Kernel.of(IsentropicSlopes::vOverVmaxByGamma))
            .sources(USEFUL_RATIOS)
            .example("0.6667", 2.0, 1.4)
            .cell("{mach}*SQRT(({gamma}-1)/(2+({gamma}-1)*{mach}^2))")
            .build();

    static final FunctionEntry AREA_RATIO = FAMILY.entry("area_ratio")
            .title("Area over that at which this flow is sonic")
            .formula("A/A* = 1/M ((1 + (gamma-1)/2 M^2) / ((gamma+1)/2))^((gamma+1)/(2 (gamma-1)))")
            .takes(MACH.within(Interval.above(0)), GAMMA)
            .gives("A/A*", "1", Interval.atLeast(1))
            .kernel(column(Isentropic.AREA_RATIO))
            .partials(Kernel.of(IsentropicSlopes::areaRatioByMach), Kernel.of(IsentropicSlopes::areaRatioByGamma))
            .sources(STREAM_TUBE)
            .example("1.688", 2.0, 1.4)
            .cell("((2+({gamma}-1)*{mach}^2)/({gamma}+1))^(({gamma}+1)/(2*({gamma}-1)))/{mach}")
            .build();

    static final FunctionEntry Q_OVER_P0 = FAMILY.entry("q_over_p0")
            .title("Dynamic over stagnation pressure")
            .formula("q/p0 = gamma/2 M^2 p/p0, with q = rho V^2/2")
            .note("Greatest at M = sqrt(2), for every gamma.")
            .takes(MACH, GAMMA)
            .gives("q/p0", "1", POSITIVE)
            .kernel(column(Isentropic.Q_OVER_P0))
            .partials(Kernel.of(IsentropicSlopes::qOverP0ByMach), Kernel.of(IsentropicSlopes::qOverP0ByGamma))
            .sources(USEFUL_RATIOS)
            .example("0.3579", 2.0, 1.4)
            .cell("{gamma}/2*{mach}^2*(1+({gamma}-1)/2*{mach}^2)^(-{gamma}/({gamma}-1))")
            .build();

    static final FunctionEntry Q_OVER_P = FAMILY.entry("q_over_p")
            .title("Dynamic over static pressure")
            .formula("q/p = gamma/2 M^2, with q = rho V^2/2")
            .takes(MACH, GAMMA)
            .gives("q/p", "1", POSITIVE)
            .kernel(Isentropic::qOverP)
            .partials(Kernel.of(IsentropicSlopes::qOverPByMach), Kernel.of(IsentropicSlopes::qOverPByGamma))
            .sources(USEFUL_RATIOS)
            .example("2.800", 2.0, 1.4)
            .cell("{gamma}/2*{mach}^2")
            .build();

    static final FunctionEntry IMPACT_PRESSURE_OVER_P = FAMILY.entry("impact_pressure_over_p")
            .title("Impact over static pressure, isentropic")
            .formula("(p0-p)/p = (1 + (gamma-1)/2 M^2)^(gamma/(gamma-1)) - 1")
            .note("The flow comes to rest without a shock; behind the shock of a pitot tube see shock_p02_over_p1.")
            .takes(MACH, GAMMA)
            .gives("(p0-p)/p", "1", POSITIVE)
            .kernel(Isentropic::impactPressureOverP)
            .partials(
                    Kernel.of(IsentropicSlopes::impactPressureOverPByMach),
                    Kernel.of(IsentropicSlopes::impactPressureOverPByGamma))
            .sources(Sources.NACA_1135.at("eq. (44)"))
            .example("0.8929", 1.0, 1.4)
            .cell(CellForm.steps()
                    .helper("rise", "({gamma}-1)/2*{mach}^2")
                    .helper("sum", "1+{rise}")
                    .helper("exponent", "{gamma}/({gamma}-1)*IF({sum}=1,{rise},{rise}*LN({sum})/({sum}-1))")
                    .helper("ratio", "EXP({exponent})")
                    .result("IF({ratio}=1,{exponent},{exponent}*({ratio}-1)/LN({ratio}))"))
            .build();

    static final FunctionEntry MASS_FLOW_NUMBER = FAMILY.entry("mass_flow_number")
            .title("Mass flow number, with the stagnation pressure")
            .formula("qm sqrt(R T0)/(p0 A) = sqrt(gamma) M (1 + (gamma-1)/2 M^2)^(-(gamma+1)/(2 (gamma-1)))")
            .note("Greatest at M = 1, where the flow chokes.")
            .takes(MACH, GAMMA)
            .gives("qm sqrt(R T0)/(p0 A)", "1", POSITIVE)
            .kernel(column(Isentropic.MASS_FLOW))
            .partials(
                    Kernel.of(IsentropicSlopes::massFlowNumberByMach),
                    Kernel.of(IsentropicSlopes::massFlowNumberByGamma))
            .sources(FLOW_PER_AREA)
            .example("0.6847", 1.0, 1.4)
            .cell("SQRT({gamma})*{mach}*(1+({gamma}-1)/2*{mach}^2)^(-({gamma}+1)/(2*({gamma}-1)))")
            .build();

    static final FunctionEntry MASS_FLOW_NUMBER_STATIC = FAMILY.entry("mass_flow_number_static")
            .title("Mass flow number, with the static pressure")
            .formula("qm sqrt(R T0)/(p A) = sqrt(gamma) M (1 + (gamma-1)/2 M^2)^(1/2)")
            .takes(MACH, GAMMA)
            .gives("qm sqrt(R T0)/(p A)", "1", POSITIVE)
            .kernel(Isentropic::massFlowNumberStatic)
            .partials(
                    Kernel.of(IsentropicSlopes::massFlowNumberStaticByMach),
                    Kernel.of(IsentropicSlopes::massFlowNumberStaticByGamma))
            .sources(FLOW_PER_AREA)
            .example("1.296", 1.0, 1.4)
            .cell("SQRT({gamma}*(1+({gamma}-1)/2*{mach}^2))*{mach}")
            .build();

    static final FunctionEntry CHOKED_MASS_FLOW_NUMBER = FAMILY.entry("choked_mass_flow_number")
            .title("Mass flow number of choked flow")
            .formula("qm sqrt(R T0)/(p0 A*) = sqrt(gamma) (2/(gamma+1))^((gamma+1)/(2 (gamma-1)))")
            .takes(GAMMA)
            .gives("qm sqrt(R T0)/(p0 A*)", "1", POSITIVE)
            .kernel(Isentropic::chokedMassFlowNumber)
            .partials(Kernel.of(IsentropicSlopes::chokedMassFlowNumberByGamma))
            .sources(FLOW_PER_AREA)
            .example("0.6847", 1.4)
            .cell("SQRT({gamma})*(2/({gamma}+1))^(({gamma}+1)/(2*({gamma}-1)))")
            .build();

    static final FunctionEntry IMPULSE_OVER_IMPULSESTAR = FAMILY.entry("impulse_over_impulsestar")
            .title("Impulse function over its value where this flow is sonic")
            .formula("I/I* = (1 + gamma M^2)/(M sqrt(2 (gamma+1) (1 + (gamma-1)/2 M^2))), with I = p A (1 + gamma M^2)")
            .note("Least at M = 1; for the same mass flow and stagnation temperature.")
            .takes(MACH.within(Interval.above(0)), GAMMA)
            .gives("I/I*", "1", Interval.atLeast(1))
            .kernel(Isentropic::impulseOverImpulsestar)
            .partials(
                    Kernel.of(IsentropicSlopes::impulseOverImpulsestarByMach),
                    Kernel.of(IsentropicSlopes::impulseOverImpulsestarByGamma))
            .sources(IMPULSE_FUNCTION)
            .example("1.123", 2.0, 1.4)
            .cell("SQRT(1+(({mach}-1)*({mach}+1))^2/(2*({gamma}+1)*{mach}^2*(1+({gamma}-1)/2*{mach}^2)))")
            .build();

    static final FunctionEntry MACH_ANGLE = FAMILY.entry("mach_angle")
            .title("Mach angle")
            .formula("sin mu = 1/M")
            .takes(MACH.within(Interval.atLeast(1)))
            .gives("mu", "deg", Interval.closed(0, 90))
            .kernel(Isentropic::machAngle)
            .partials(Kernel.of(IsentropicSlopes::machAngleByMach))
            .sources(Sources.NACA_1135.at("Symbols and notation, mu"))
            .example("30.00", 2.0)
            .cell("IF({mach}=1,90,180/PI()*ATAN(1/SQRT(({mach}-1)*({mach}+1))))")
            .build();

    static List<FunctionEntry> entries() {
        return List.of(
                T_OVER_T0,
                P_OVER_P0,
                RHO_OVER_RHO0,
                A_OVER_A0,
                T_OVER_TSTAR,
                P_OVER_PSTAR,
                RHO_OVER_RHOSTAR,
                V_OVER_ASTAR,
                V_OVER_VMAX,
                AREA_RATIO,
                Q_OVER_P0,
                Q_OVER_P,
                IMPACT_PRESSURE_OVER_P,
                MASS_FLOW_NUMBER,
                MASS_FLOW_NUMBER_STATIC,
                CHOKED_MASS_FLOW_NUMBER,
                IMPULSE_OVER_IMPULSESTAR,
                MACH_ANGLE);
    }
}
