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

    /** The place of {@code subsonic} in {@link #BRANCH}. */
    static final double SUBSONIC = 0;

    /** The place of {@code converging} in {@link #STATION_SIDE}. */
    static final double CONVERGING = 0;

    private Arguments() {}
}
