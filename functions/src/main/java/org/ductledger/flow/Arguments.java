package org.ductledger.flow;

import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.Interval;

/** The arguments that many families share: the same name means the same quantity everywhere. */
final class Arguments {
    static final Argument GAMMA = Argument.number(
            "gamma", "gamma", "1", Interval.openClosed(1, 100), "ratio of the specific heats cp/cv, constant");
    static final Argument MACH = Argument.number("mach", "M", "1", Interval.atLeast(0), "Mach number");
    static final Argument SUPERSONIC_MACH1 =
            Argument.number("mach1", "M1", "1", Interval.atLeast(1), "Mach number ahead of the shock");
    static final Argument GAS_CONSTANT = Argument.number(
            "gas_constant", "R", "J/(kg K)", Interval.above(0), "specific gas constant, Ru over the molar mass");
    static final Argument P0 = Argument.number("p0", "p0", "Pa", Interval.above(0), "stagnation pressure, absolute");
    static final Argument T0 = Argument.number("t0", "T0", "K", Interval.above(0), "stagnation temperature");
    static final Argument P = Argument.number("p", "p", "Pa", Interval.above(0), "static pressure, absolute");
    static final Argument T = Argument.number("t", "T", "K", Interval.above(0), "static temperature");
    static final Argument AREA = Argument.number("area", "A", "m2", Interval.above(0), "flow area");
    static final Argument AREA_RATIO = Argument.number(
            "area_ratio", "A/A*", "1", Interval.atLeast(1), "area over the area at which this flow is sonic");
    static final Argument THROAT_AREA =
            Argument.number("throat_area", "At", "m2", Interval.above(0), "flow area at the throat");
    static final Argument EXIT_AREA_RATIO =
            Argument.number("exit_area_ratio", "Ae/At", "1", Interval.atLeast(1), "exit area over the throat area");
    static final Argument STATION_AREA_RATIO = AREA_RATIO.named("area_ratio", "A/At", "area over the throat area");
    static final Argument STATION_SIDE =
            Argument.choice("station_side", "side of the throat on which the station lies", "converging", "diverging");
    static final Argument BRANCH = Argument.choice("branch", "which of the two solutions", "subsonic", "supersonic");

    static final Argument P0_OVER_P0STAR = Argument.number(
            "p0_over_p0star", "p0/p0*", "1", Interval.atLeast(1), "stagnation pressure over its value at M = 1");
    static final Argument THERMAL_BRANCH =
            Argument.choice("branch", "which of the two solutions about M = 1/sqrt(gamma)", "below", "above");
    static final Argument INLET_MACH =
            Argument.number("mach1", "M1", "1", Interval.above(0), "Mach number at the first station");
    static final Argument FL_OVER_D = Argument.number(
            "fl_over_d",
            "f L/D",
            "1",
            Interval.atLeast(0),
            "Darcy friction factor (4 x Fanning) times length over hydraulic diameter");
    /** A duct length with its sign; beyond these ends it is no duct. */
    static final Argument SIGNED_FL_OVER_D = FL_OVER_D
            .within(Interval.closed(-1e12, 1e12))
            .named(
                    "fl_over_d",
                    "f L/D",
                    "Darcy friction factor (4 x Fanning) times length over hydraulic diameter; negative upstream");

    /** The place of {@code subsonic} in {@link #BRANCH}. */
    static final double SUBSONIC = 0;

    /** The place of {@code below} in {@link #THERMAL_BRANCH}. */
    static final double BELOW = 0;

    /** The place of {@code above} in {@link #THERMAL_BRANCH}. */
    static final double ABOVE = 1;

    /** The place of {@code converging} in {@link #STATION_SIDE}. */
    static final double CONVERGING = 0;

    private Arguments() {}
}
