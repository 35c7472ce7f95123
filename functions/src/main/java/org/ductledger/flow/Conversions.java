package org.ductledger.flow;

import static org.ductledger.flow.Arguments.AREA;
import static org.ductledger.flow.Arguments.P;
import static org.ductledger.flow.Arguments.P0;
import static org.ductledger.flow.Arguments.STATION_AREA_RATIO;
import static org.ductledger.flow.Arguments.T0;
import static org.ductledger.flow.Arguments.THROAT_AREA;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;

/** The way between the ratios of the catalogue and the quantities of a rig: pressures, areas, flows and forces. */
final class Conversions {
    private static final Chapter FAMILY = new Chapter("conversion", "Between ratios and quantities");

    private Conversions() {}

    static double product(double ratio, double reference) {
        return ratio * reference;
    }

    static double productByRatio(double ratio, double reference) {
        return reference;
    }

    static double productByReference(double ratio, double reference) {
        return ratio;
    }

    /** NaN where the part exceeds the whole. */
    static double share(double part, double whole) {
        return part <= whole ? part / whole : Double.NaN;
    }

    static double shareByPart(double part, double whole) {
        return 1 / whole;
    }

    static double shareByWhole(double part, double whole) {
        return -(part / whole) / whole;
    }

    static double areaFromDiameter(double diameter) {
        return Math.PI / 4 * diameter * diameter;
    }

    static double areaByDiameter(double diameter) {
        return Math.PI / 2 * diameter;
    }

    static double diameterFromArea(double area) {
        return 2 * Math.sqrt(area / Math.PI);
    }

    static double diameterByArea(double area) {
        return 1 / Math.sqrt(Math.PI * area);
    }

    static double thrust(double coefficient, double p0, double throatArea) {
        return coefficient * (p0 * throatArea);
    }

    static double thrustByCoefficient(double coefficient, double p0, double throatArea) {
        return p0 * throatArea;
    }

    static double thrustByP0(double coefficient, double p0, double throatArea) {
        return coefficient * throatArea;
    }

    static double thrustByThroatArea(double coefficient, double p0, double throatArea) {
        return coefficient * p0;
    }

    private static final Source NOTATION = Sources.NACA_1135.at("Symbols and Notation");
    private static final Source CIRCLE = new Source(
            "International Organization for Standardization",
            "ISO 80000-3: Quantities and units, Part 3: Space and time",
            2019,
            "length and area");
    private static final Source THRUST = Sources.SUTTON_BIBLARZ.at("section 3.3, Thrust and Thrust Coefficient");

    private static final Interval SHARE = Interval.openClosed(0, 1);
    private static final Argument P_OVER_P0 =
            Argument.number("p_over_p0", "p/p0", "1", SHARE, "static over stagnation pressure");
    private static final Argument T_OVER_T0 =
            Argument.number("t_over_t0", "T/T0", "1", SHARE, "static over stagnation temperature");
    private static final Argument BACK_PRESSURE =
            Argument.number("pb", "pb", "Pa", Interval.atLeast(0), "back pressure, absolute; 0 is vacuum");
    private static final Argument DIAMETER =
            Argument.number("diameter", "D", "m", Interval.above(0), "diameter of a circular section");
    private static final Argument MASS_FLOW_FRACTION = Argument.number(
            "mass_flow_fraction", "qm/qm*", "1", Interval.closed(0, 1), "mass flow over the choked mass flow");
    private static final Argument CHOKED_MASS_FLOW =
            Argument.number("choked_mass_flow", "qm*", "kg/s", Interval.above(0), "mass flow with a sonic throat");
    private static final Argument THRUST_COEFFICIENT = Argument.number(
            "thrust_coefficient", "CF", "1", Interval.anyNumber(), "thrust over p0 At; negative where it is a drag");

    private static EntryBuilder productEntry(String name, Argument ratio, Argument reference) {
        return FAMILY.entry(name)
                .takes(ratio, reference)
                .kernel(Conversions::product)
                .partials(Kernel.of(Conversions::productByRatio), Kernel.of(Conversions::productByReference))
                .cell("{" + ratio.name() + "}*{" + reference.name() + "}");
    }

    private static EntryBuilder shareEntry(String name, Argument pressure) {
        return FAMILY.entry(name)
                .takes(pressure, P0)
                .kernel(Conversions::share)
                .requiresAtMost(
                        FaultKind.OUTSIDE_DOMAIN,
                        pressure.name(),
                        Kernel.of(Conversions::productByRatio),
                        "the stagnation pressure p0")
                .partials(Kernel.of(Conversions::shareByPart), Kernel.of(Conversions::shareByWhole))
                .sources(NOTATION)
                .cell("IF({" + pressure.name() + "}<={p0},{" + pressure.name() + "}/{p0},NA())");
    }

    private static final FunctionEntry P_FROM_P_OVER_P0 = productEntry("p_from_p_over_p0", P_OVER_P0, P0)
            .title("Static pressure from its ratio to the stagnation pressure")
            .formula("p = (p/p0) p0")
            .gives("p", "Pa", Interval.above(0))
            .sources(NOTATION)
            .example("369797", 0.528281788, 7e5)
            .build();

    private static final FunctionEntry T_FROM_T_OVER_T0 = productEntry("t_from_t_over_t0", T_OVER_T0, T0)
            .title("Static temperature from its ratio to the stagnation temperature")
            .formula("T = (T/T0) T0")
            .gives("T", "K", Interval.above(0))
            .sources(NOTATION)
            .example("250", 0.8333333333, 300.0)
            .build();

    private static final FunctionEntry P_OVER_P0_FROM_P = shareEntry("p_over_p0_from_p", P)
            .title("Static over stagnation pressure from the pressures")
            .formula("p/p0")
            .gives("p/p0", "1", SHARE)
            .example("0.25", 2.5e5, 1e6)
            .build();

    private static final FunctionEntry PB_OVER_P0_FROM_PB = shareEntry("pb_over_p0_from_pb", BACK_PRESSURE)
            .title("Back over stagnation pressure from the pressures")
            .formula("pb/p0")
            .note("Above the stagnation pressure the flow would run backward.")
            .gives("pb/p0", "1", Interval.closed(0, 1))
            .example("0.14475", 101325.0, 7e5)
            .build();

    private static final FunctionEntry AREA_FROM_AREA_RATIO = productEntry(
                    "area_from_area_ratio", STATION_AREA_RATIO, THROAT_AREA)
            .title("Area from its ratio to the throat area")
            .formula("A = (A/At) At")
            .gives("A", "m2", Interval.above(0))
            .sources(NOTATION)
            .example("0.003", 2.5, 0.0012)
            .build();

    private static final FunctionEntry AREA_FROM_DIAMETER = FAMILY.entry("area_from_diameter")
            .title("Area of a circular section from its diameter")
            .formula("A = pi/4 D^2")
            .takes(DIAMETER)
            .gives("A", "m2", Interval.above(0))
            .kernel(Conversions::areaFromDiameter)
            .partials(Kernel.of(Conversions::areaByDiameter))
            .sources(CIRCLE)
            .example("0.0078540", 0.1)
            .cell("PI()/4*{diameter}^2")
            .build();

    private static final FunctionEntry DIAMETER_FROM_AREA = FAMILY.entry("diameter_from_area")
            .title("Diameter of a circular section from its area")
            .formula("D = sqrt(4 A/pi)")
            .takes(AREA)
            .gives("D", "m", Interval.above(0))
            .kernel(Conversions::diameterFromArea)
            .partials(Kernel.of(Conversions::diameterByArea))
            .sources(CIRCLE)
            .example("1.12838", 1.0)
            .cell("2*SQRT({area}/PI())")
            .build();

    private static final FunctionEntry MASS_FLOW_FROM_FRACTION = productEntry(
                    "mass_flow_from_fraction", MASS_FLOW_FRACTION, CHOKED_MASS_FLOW)
            .title("Mass flow from its fraction of the choked mass flow")
            .formula("qm = (qm/qm*) qm*")
            .gives("qm", "kg/s", Interval.atLeast(0))
            .sources(Sources.SHAPIRO.at("chapter 4, Isentropic Flow"))
            .example("1.5", 0.75, 2.0)
            .build();

    private static final FunctionEntry THRUST_FROM_THRUST_COEFFICIENT = FAMILY.entry("thrust_from_thrust_coefficient")
            .title("Thrust from the thrust coefficient")
            .formula("F = CF p0 At")
            .takes(THRUST_COEFFICIENT, P0, THROAT_AREA)
            .gives("F", "N", Interval.anyNumber())
            .kernel(Conversions::thrust)
            .partials(
                    Kernel.of(Conversions::thrustByCoefficient),
                    Kernel.of(Conversions::thrustByP0),
                    Kernel.of(Conversions::thrustByThroatArea))
            .sources(THRUST)
            .example("1260", 1.5, 7e5, 0.0012)
            .cell("{thrust_coefficient}*{p0}*{throat_area}")
            .build();

    static List<FunctionEntry> entries() {
        return List.of(
                P_FROM_P_OVER_P0,
                T_FROM_T_OVER_T0,
                P_OVER_P0_FROM_P,
                PB_OVER_P0_FROM_PB,
                AREA_FROM_AREA_RATIO,
                AREA_FROM_DIAMETER,
                DIAMETER_FROM_AREA,
                MASS_FLOW_FROM_FRACTION,
                THRUST_FROM_THRUST_COEFFICIENT);
    }
}
