package org.ductledger.flow;

import static org.ductledger.flow.Arguments.AREA;
import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.GAS_CONSTANT;
import static org.ductledger.flow.Arguments.T0;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;

/** A rigid vessel that empties to a constant back pressure, or is filled from a constant supply. */
final class Vessel {
    private static final Chapter FAMILY = new Chapter("vessel", "Blowdown and filling of a rigid vessel");

    private Vessel() {}

    /** Divided step by step, so that no quotient of two overflows arises. */
    static double timeConstant(double volume, double area, double t0, double gamma, double gasConstant) {
        return volume / area / Isentropic.chokedMassFlowNumber(gamma) / Math.sqrt(gasConstant) / Math.sqrt(t0);
    }

    private static double timeConstantByVolume(double volume, double area, double t0, double gamma, double r) {
        return timeConstant(1, area, t0, gamma, r);
    }

    private static double timeConstantByArea(double volume, double area, double t0, double gamma, double r) {
        return -timeConstant(volume, area, t0, gamma, r) / area;
    }

    private static double timeConstantByT0(double volume, double area, double t0, double gamma, double r) {
        return -0.5 * timeConstant(volume, area, t0, gamma, r) / t0;
    }

    private static double timeConstantByGasConstant(double volume, double area, double t0, double gamma, double r) {
        return -0.5 * timeConstant(volume, area, t0, gamma, r) / r;
    }

    static double timeToPressure(double p, double pb, double timeConstant, double gamma, double process) {
        return timeConstant * VesselFlow.time(p, pb, gamma, process);
    }

    private static double logPOverPi(double time, double pb, double timeConstant, double gamma, double process) {
        return VesselFlow.logPressure(time / timeConstant, pb, gamma, process);
    }

    static double pOverPi(double time, double pb, double timeConstant, double gamma, double process) {
        return Math.max(pb, StrictMath.exp(logPOverPi(time, pb, timeConstant, gamma, process)));
    }

    static double tOverTi(double time, double pb, double timeConstant, double gamma, double process) {
        return process == VesselFlow.ADIABATIC
                ? StrictMath.exp((gamma - 1) / gamma * logPOverPi(time, pb, timeConstant, gamma, process))
                : 1;
    }

    static double massOverMi(double time, double pb, double timeConstant, double gamma, double process) {
        double log = logPOverPi(time, pb, timeConstant, gamma, process);
        return StrictMath.exp(process == VesselFlow.ADIABATIC ? log / gamma : log);
    }

    /** Closed throughout: with 1 + k M^2 = (p0/p)^e the integral of the unchoked phase is M / sqrt(1 + k M^2). */
    static double fillTime(double p, double pInitial, double timeConstant, double gamma, double process) {
        if (p < pInitial) {
            return Double.NaN;
        }
        double critical = StrictMath.exp(-VesselFlow.logCritical(gamma));
        double choked = Math.min(p, critical) - Math.min(pInitial, critical);
        double unchoked = jet(Math.max(pInitial, critical), gamma) - jet(Math.max(p, critical), gamma);
        double factor = Isentropic.chokedMassFlowNumber(gamma) * Math.sqrt(gamma);
        double time = timeConstant * (choked + factor * unchoked);
        return process == VesselFlow.ADIABATIC ? time / gamma : time;
    }

    /** M / sqrt(1 + k M^2) of the jet into a vessel at this pressure over the supply's. */
    private static double jet(double p, double gamma) {
        double drop = -StrictMath.expm1((gamma - 1) / gamma * StrictMath.log(p));
        return Math.sqrt(drop / VesselFlow.half(gamma));
    }

    private static double fillTimeByTimeConstant(double p, double pInitial, double tau, double gamma, double process) {
        return fillTime(p, pInitial, 1, gamma, process);
    }

    private static final Argument VOLUME =
            Argument.number("volume", "V", "m3", Interval.above(0), "volume of the vessel");
    private static final Argument EFFECTIVE_AREA =
            AREA.named("area", "A", "effective area of the opening: discharge coefficient times throat area");
    private static final Argument VESSEL_T0 =
            T0.named("t0", "T0", "temperature of the vessel's gas at the start; for filling, of the supply");
    private static final Argument TIME =
            Argument.number("time", "t", "s", Interval.atLeast(0), "time since the opening");
    private static final Argument TIME_CONSTANT = Argument.number(
            "time_constant", "tau", "s", Interval.above(0), "V/(C* A sqrt(R T0)), by vessel_time_constant");
    private static final Argument P_OVER_PI = Argument.number(
            "p_over_pi", "p/pi", "1", Interval.openClosed(0, 1), "pressure in the vessel over that at the start");
    private static final Argument PB_OVER_PI = Argument.number(
            "pb_over_pi",
            "pb/pi",
            "1",
            Interval.closedOpen(0, 1),
            "back pressure over the vessel's pressure at the start");
    private static final Argument P_OVER_P0 = Argument.number(
            "p_over_p0", "p/p0", "1", Interval.openClosed(0, 1), "pressure in the vessel over the supply's");
    private static final Argument PI_OVER_P0 = Argument.number(
            "pi_over_p0", "pi/p0", "1", Interval.closed(0, 1), "vessel's pressure at the start over the supply's");
    private static final Argument PROCESS = Argument.choice(
            "process",
            "what holds for the gas in the vessel: no heat exchanged, or temperature kept",
            "adiabatic",
            "isothermal");

    private static final Source BALMER = new Source(
            "R. T. Balmer",
            "Modern Engineering Thermodynamics",
            2011,
            "chapter 16, converging nozzle and example 16.8; balances of mass and energy of the vessel");
    private static final String OUTFLOW = "Perfect gas, isentropic flow to the throat, choked until pb/p reaches the"
            + " critical ratio, unchoked after that.";
    private static final CellForm NO_CELLS = CellForm.none("the unchoked phase is an integral; the value is filled in");

    private static EntryBuilder blowdown(String name) {
        return FAMILY.entry(name)
                .takes(TIME, PB_OVER_PI, TIME_CONSTANT, GAMMA, PROCESS)
                .sources(BALMER)
                .cell(NO_CELLS);
    }

    private static final FunctionEntry VESSEL_TIME_CONSTANT = FAMILY.entry("vessel_time_constant")
            .title("Time constant of a vessel with an opening")
            .formula("tau = V/(C* A sqrt(R T0)), C* = sqrt(gamma) (2/(gamma+1))^((gamma+1)/(2(gamma-1)))")
            .note(
                    "The mass over the choked mass flow at the start. T0 is the vessel's temperature at the start; to fill"
                            + " a vessel, the supply's.")
            .takes(VOLUME, EFFECTIVE_AREA, VESSEL_T0, GAMMA, GAS_CONSTANT)
            .gives("tau", "s", Interval.above(0))
            .kernel(Vessel::timeConstant)
            .partials(
                    Kernel.of(Vessel::timeConstantByVolume),
                    Kernel.of(Vessel::timeConstantByArea),
                    Kernel.of(Vessel::timeConstantByT0),
                    null,
                    Kernel.of(Vessel::timeConstantByGasConstant))
            .sources(BALMER)
            .example("49.77", 1.0, 1e-4, 300.0, 1.4, 287.0)
            .cell("{volume}/({area}*SQRT({gamma}*{gas_constant}*{t0})"
                    + "*(2/({gamma}+1))^(({gamma}+1)/(2*({gamma}-1))))")
            .build();

    private static final FunctionEntry VESSEL_TIME_TO_PRESSURE = FAMILY.entry("vessel_time_to_pressure")
            .title("Time for a vessel's pressure to fall to a value")
            .formula("choked: t/tau = -ln(p/pi), or ((p/pi)^(-(gamma-1)/(2 gamma)) - 1) 2/(gamma-1) if adiabatic;"
                    + " then t = integral of -dp over the rate at pb/p")
            .note(OUTFLOW + " The vessel reaches the back pressure in a finite time. The integral, over the jet's Mach"
                    + " number, is taken by quadrature to the last few digits.")
            .takes(P_OVER_PI, PB_OVER_PI, TIME_CONSTANT, GAMMA, PROCESS)
            .gives("t", "s", Interval.atLeast(0))
            .kernel(Vessel::timeToPressure)
            .requiresAtLeast(
                    FaultKind.NO_SOLUTION,
                    "p_over_pi",
                    Kernel.of((p, pb, timeConstant, gamma, process) -> pb),
                    "the back pressure pb/pi, at which the vessel comes to rest")
            .partials(
                    Kernel.of(VesselSlopes::timeByP),
                    Kernel.of(VesselSlopes::timeByPb),
                    Kernel.of(VesselSlopes::timeByTimeConstant),
                    null,
                    null)
            .sources(BALMER)
            .example("80.10", 0.2, 0.0, 49.7713, 1.4, "isothermal")
            .cell(NO_CELLS)
            .build();

    private static final FunctionEntry VESSEL_P_OVER_PI = blowdown("vessel_p_over_pi")
            .title("Pressure in a vessel a time after it was opened")
            .formula("choked: p/pi = exp(-t/tau), or (1 + (gamma-1)/2 t/tau)^(-2 gamma/(gamma-1)) if adiabatic;"
                    + " then the inverse of vessel_time_to_pressure")
            .note(OUTFLOW + " From the moment when the vessel reaches the back pressure on, pb/pi.")
            .gives("p/pi", "1", Interval.closed(0, 1))
            .kernel(Vessel::pOverPi)
            .partials(
                    Kernel.of(VesselSlopes::pByTime),
                    Kernel.of(VesselSlopes::pByPb),
                    Kernel.of(VesselSlopes::pByTimeConstant),
                    null,
                    null)
            .example("0.1353", 100.0, 0.0, 50.0, 1.4, "isothermal")
            .build();

    private static final FunctionEntry VESSEL_T_OVER_TI = blowdown("vessel_t_over_ti")
            .title("Temperature in a vessel a time after it was opened")
            .formula("T/Ti = (p/pi)^((gamma-1)/gamma) if adiabatic, 1 if isothermal")
            .note(OUTFLOW + " What stays in an adiabatic vessel expands isentropically.")
            .gives("T/Ti", "1", Interval.closed(0, 1))
            .kernel(Vessel::tOverTi)
            .partials(
                    Kernel.of(VesselSlopes::tByTime),
                    Kernel.of(VesselSlopes::tByPb),
                    Kernel.of(VesselSlopes::tByTimeConstant),
                    null,
                    null)
            .example("0.5102", 100.0, 0.0, 50.0, 1.4, "adiabatic")
            .build();

    private static final FunctionEntry VESSEL_MASS_OVER_MI = blowdown("vessel_mass_over_mi")
            .title("Mass in a vessel a time after it was opened")
            .formula("m/mi = (p/pi)^(1/gamma) if adiabatic, p/pi if isothermal")
            .note(OUTFLOW)
            .gives("m/mi", "1", Interval.closed(0, 1))
            .kernel(Vessel::massOverMi)
            .partials(
                    Kernel.of(VesselSlopes::massByTime),
                    Kernel.of(VesselSlopes::massByPb),
                    Kernel.of(VesselSlopes::massByTimeConstant),
                    null,
                    null)
            .example("0.1859", 100.0, 0.0, 50.0, 1.4, "adiabatic")
            .build();

    private static CellForm fillCells() {
        return CellForm.steps()
                .helper("critical", "(2/({gamma}+1))^({gamma}/({gamma}-1))")
                .helper("choked", "MIN({p_over_p0},{critical})-MIN({pi_over_p0},{critical})")
                .helper("first", fillJetCell("pi_over_p0"))
                .helper("last", fillJetCell("p_over_p0"))
                .helper("factor", "{gamma}*(2/({gamma}+1))^(({gamma}+1)/(2*({gamma}-1)))")
                .helper("unit_time", "{time_constant}/IF({process}=\"adiabatic\",{gamma},1)")
                .result("IF({p_over_p0}<{pi_over_p0},NA(),{unit_time}*({choked}+{factor}*({first}-{last})))");
    }

    private static String fillJetCell(String pressure) {
        return "SQRT(2*(1-MAX({" + pressure + "},{critical})^(({gamma}-1)/{gamma}))/({gamma}-1))";
    }

    private static final FunctionEntry VESSEL_FILL_TIME = FAMILY.entry("vessel_fill_time")
            .title("Time to fill a vessel from a constant supply")
            .formula("isothermal: t/tau = (p - pi)/p0 while choked, then C* sqrt(gamma) (g(pi/p0) - g(p/p0)),"
                    + " g(y) = sqrt(2 (1 - y^((gamma-1)/gamma))/(gamma-1)); adiabatic: 1/gamma of that")
            .note("tau by vessel_time_constant with the supply's temperature. Isothermal: the vessel's gas is kept at"
                    + " the supply's temperature. Adiabatic: no heat is exchanged, whatever the vessel's temperature at"
                    + " the start.")
            .takes(P_OVER_P0, PI_OVER_P0, TIME_CONSTANT, GAMMA, PROCESS)
            .gives("t", "s", Interval.atLeast(0))
            .kernel(Vessel::fillTime)
            .requiresAtLeast(
                    FaultKind.NO_SOLUTION,
                    "p_over_p0",
                    Kernel.of((p, pInitial, timeConstant, gamma, process) -> pInitial),
                    "the pressure at the start pi/p0")
            .partials(
                    Kernel.of(VesselSlopes::fillTimeByP),
                    Kernel.of(VesselSlopes::fillTimeByInitial),
                    Kernel.of(Vessel::fillTimeByTimeConstant),
                    null,
                    null)
            .sources(BALMER)
            .example("17.86", 0.5, 0.0, 50.0, 1.4, "adiabatic")
            .cell(fillCells())
            .build();

    static List<FunctionEntry> entries() {
        return List.of(
                VESSEL_TIME_CONSTANT,
                VESSEL_TIME_TO_PRESSURE,
                VESSEL_P_OVER_PI,
                VESSEL_T_OVER_TI,
                VESSEL_MASS_OVER_MI,
                VESSEL_FILL_TIME);
    }
}
