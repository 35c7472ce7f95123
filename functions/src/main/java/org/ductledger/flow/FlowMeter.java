package org.ductledger.flow;

import static org.ductledger.flow.Arguments.AREA;
import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.GAS_CONSTANT;
import static org.ductledger.flow.Arguments.P0;
import static org.ductledger.flow.Arguments.T0;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;

/** Gas meters: the critical flow Venturi nozzle, and the expansibility of nozzles and Venturi tubes. */
final class FlowMeter {
    private static final Chapter FAMILY = new Chapter("meter", "Gas flow meters: critical nozzles, expansibility");

    private FlowMeter() {}

    static double criticalMassFlow(double cd, double criticalFlowFactor, double area, double p0, double t0, double r) {
        return p0 / Math.sqrt(r) / Math.sqrt(t0) * area * criticalFlowFactor * cd;
    }

    private static double massFlowByCd(double cd, double factor, double area, double p0, double t0, double r) {
        return criticalMassFlow(1, factor, area, p0, t0, r);
    }

    private static double massFlowByFactor(double cd, double factor, double area, double p0, double t0, double r) {
        return criticalMassFlow(cd, 1, area, p0, t0, r);
    }

    private static double massFlowByArea(double cd, double factor, double area, double p0, double t0, double r) {
        return criticalMassFlow(cd, factor, 1, p0, t0, r);
    }

    private static double massFlowByP0(double cd, double factor, double area, double p0, double t0, double r) {
        return criticalMassFlow(cd, factor, area, 1, t0, r);
    }

    private static double massFlowByT0(double cd, double factor, double area, double p0, double t0, double r) {
        return -0.5 * criticalMassFlow(cd, factor, area, p0, t0, r) / t0;
    }

    private static double massFlowByGasConstant(double cd, double factor, double area, double p0, double t0, double r) {
        return -0.5 * criticalMassFlow(cd, factor, area, p0, t0, r) / r;
    }

    static double reynolds(double massFlow, double diameter, double viscosity) {
        return massFlow / diameter / viscosity * (4 / Math.PI);
    }

    private static double reynoldsByMassFlow(double massFlow, double diameter, double viscosity) {
        return reynolds(1, diameter, viscosity);
    }

    private static double reynoldsByDiameter(double massFlow, double diameter, double viscosity) {
        return -reynolds(massFlow, diameter, viscosity) / diameter;
    }

    private static double reynoldsByViscosity(double massFlow, double diameter, double viscosity) {
        return -reynolds(massFlow, diameter, viscosity) / viscosity;
    }

    static double dischargeCoefficient(double reynolds, double throatForm) {
        return 0.9959 - 2.720 / Math.sqrt(reynolds);
    }

    private static double dischargeByReynolds(double reynolds, double throatForm) {
        return 1.360 / (reynolds * Math.sqrt(reynolds));
    }

    private static final Source ISO_9300 =
            new Source("ISO", "ISO 9300: Measurement of gas flow by means of critical flow Venturi nozzles", 2005, "");
    private static final Source ISO_5167 = new Source(
            "ISO",
            "ISO 5167: Measurement of fluid flow by means of pressure differential devices, parts 3 and 4",
            2003,
            "");

    private static final Argument DISCHARGE_COEFFICIENT = Argument.number(
            "discharge_coefficient", "Cd", "1", Interval.above(0), "mass flow over that of loss-free uniform flow");
    private static final Argument CRITICAL_FLOW_FACTOR = Argument.number(
            "critical_flow_factor", "C*", "1", Interval.above(0), "qm sqrt(R T0)/(A p0) of the gas, ideal or real");
    private static final Argument THROAT = AREA.named("area", "A", "area of the nozzle throat");
    private static final Argument MASS_FLOW =
            Argument.number("mass_flow", "qm", "kg/s", Interval.above(0), "mass flow");
    private static final Argument THROAT_DIAMETER =
            Argument.number("throat_diameter", "d", "m", Interval.above(0), "diameter of the throat");
    private static final Argument VISCOSITY = Argument.number(
            "viscosity", "mu0", "Pa.s", Interval.above(0), "dynamic viscosity, for a critical nozzle at p0 and T0");
    private static final Argument REYNOLDS = Argument.number(
            "reynolds", "Re", "1", Interval.closed(2.1e4, 3.2e7), "throat Reynolds number, by meter_reynolds");
    private static final Argument THROAT_FORM =
            Argument.choice("throat_form", "form of the throat by ISO 9300", "toroidal_normal");
    private static final Argument PRESSURE_RATIO = Argument.number(
            "pressure_ratio", "p2/p1", "1", Interval.closed(0.75, 1), "throat over upstream static pressure");
    private static final Argument DIAMETER_RATIO =
            Argument.number("diameter_ratio", "beta", "1", Interval.closedOpen(0, 1), "throat over upstream diameter");

    private static final FunctionEntry METER_CRITICAL_FLOW_FACTOR = FAMILY.entry("meter_critical_flow_factor")
            .title("Critical flow factor of the ideal gas")
            .formula("C*i = sqrt(gamma) (2/(gamma+1))^((gamma+1)/(2(gamma-1)))")
            .note(
                    "The same as choked_mass_flow_number. The C* of a real gas differs from it: of nitrogen by 0.03 % near"
                            + " the ambient state, by per cents at 10 MPa.")
            .takes(GAMMA)
            .gives("C*i", "1", Interval.open(0.6, 1.02))
            .kernel(Isentropic::chokedMassFlowNumber)
            .partials(Kernel.of(IsentropicSlopes::chokedMassFlowNumberByGamma))
            .sources(ISO_9300.at("critical flow factor of an ideal gas"))
            .example("0.6847", 1.4)
            .cell("SQRT({gamma})*(2/({gamma}+1))^(({gamma}+1)/(2*({gamma}-1)))")
            .build();

    private static final FunctionEntry METER_CRITICAL_MASS_FLOW = FAMILY.entry("meter_critical_mass_flow")
            .title("Mass flow through a critical flow nozzle")
            .formula("qm = Cd C* A p0 / sqrt(R T0)")
            .note(
                    "C* of the ideal gas by meter_critical_flow_factor; a real gas has its own. The nozzle must be choked.")
            .takes(DISCHARGE_COEFFICIENT, CRITICAL_FLOW_FACTOR, THROAT, P0, T0, GAS_CONSTANT)
            .gives("qm", "kg/s", Interval.atLeast(0))
            .kernel(FlowMeter::criticalMassFlow)
            .partials(
                    Kernel.of(FlowMeter::massFlowByCd),
                    Kernel.of(FlowMeter::massFlowByFactor),
                    Kernel.of(FlowMeter::massFlowByArea),
                    Kernel.of(FlowMeter::massFlowByP0),
                    Kernel.of(FlowMeter::massFlowByT0),
                    Kernel.of(FlowMeter::massFlowByGasConstant))
            .sources(ISO_9300.at("basic equation of the mass flow"))
            .example("0.1168", 0.99, 0.6847, 5e-5, 1e6, 293.15, 287.0)
            .cell("{discharge_coefficient}*{critical_flow_factor}*{area}*{p0}/SQRT({gas_constant}*{t0})")
            .build();

    private static final FunctionEntry METER_REYNOLDS = FAMILY.entry("meter_reynolds")
            .title("Reynolds number of a meter's throat")
            .formula("Re = 4 qm / (pi d mu)")
            .note("For a critical nozzle ISO 9300 takes the viscosity at the stagnation state.")
            .takes(MASS_FLOW, THROAT_DIAMETER, VISCOSITY)
            .gives("Re", "1", Interval.above(0))
            .kernel(FlowMeter::reynolds)
            .partials(
                    Kernel.of(FlowMeter::reynoldsByMassFlow),
                    Kernel.of(FlowMeter::reynoldsByDiameter),
                    Kernel.of(FlowMeter::reynoldsByViscosity))
            .sources(ISO_9300.at("nozzle throat Reynolds number"))
            .example("1.018E6", 0.144, 0.01, 1.801e-5)
            .cell("4*{mass_flow}/(PI()*{throat_diameter}*{viscosity})")
            .build();

    private static final FunctionEntry METER_DISCHARGE_COEFFICIENT = FAMILY.entry("meter_discharge_coefficient")
            .title("Discharge coefficient of a critical flow nozzle")
            .formula("Cd = 0.9959 - 2.720 Re^-0.5")
            .note("Toroidal throat, normally machined, 2.1e4 <= Re <= 3.2e7, uncertainty 0.3 %. These coefficients were"
                    + " read in public restatements of the standard; those of the accurately machined and of the"
                    + " cylindrical throat were found in no readable source and are left out. For such nozzles, for"
                    + " another edition of the standard and for a calibrated nozzle give meter_critical_mass_flow its"
                    + " Cd.")
            .takes(REYNOLDS, THROAT_FORM)
            .gives("Cd", "1", Interval.open(0.97, 1))
            .kernel(FlowMeter::dischargeCoefficient)
            .partials(Kernel.of(FlowMeter::dischargeByReynolds), null)
            .sources(ISO_9300.at("discharge coefficient, toroidal throat, normally machined"))
            .example("0.9932", 1e6, "toroidal_normal")
            .cell("IF({throat_form}=\"toroidal_normal\",0.9959-2.72/SQRT({reynolds}),NA())")
            .build();

    private static final FunctionEntry METER_EXPANSIBILITY = FAMILY.entry("meter_expansibility")
            .title("Expansibility of a nozzle or a Venturi tube")
            .formula("eps^2 = (k r^(2/k)/(k-1)) (1 - beta^4)/(1 - beta^4 r^(2/k)) (1 - r^((k-1)/k))/(1 - r),"
                    + " r = p2/p1, k = gamma")
            .note("Isentropic expansion; the standard limits it to p2/p1 >= 0.75, and each device to its own range of"
                    + " beta. gamma stands for the isentropic exponent.")
            .takes(PRESSURE_RATIO, DIAMETER_RATIO, GAMMA)
            .gives("eps", "1", Interval.openClosed(0, 1))
            .kernel(Expansibility::of)
            .partials(
                    Kernel.of(Expansibility::byPressureRatio),
                    Kernel.of(Expansibility::byDiameterRatio),
                    Kernel.of(Expansibility::byGamma))
            .sources(ISO_5167.at("expansibility factor of ISA 1932 nozzles and of Venturi tubes"))
            .example("0.9405", 0.9, 0.5, 1.4)
            .cell(Expansibility.cells())
            .build();

    static List<FunctionEntry> entries() {
        return List.of(
                METER_CRITICAL_FLOW_FACTOR,
                METER_CRITICAL_MASS_FLOW,
                METER_DISCHARGE_COEFFICIENT,
                METER_EXPANSIBILITY,
                METER_REYNOLDS);
    }
}
