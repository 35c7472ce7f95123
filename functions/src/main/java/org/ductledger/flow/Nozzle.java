package org.ductledger.flow;

import static org.ductledger.flow.Arguments.EXIT_AREA_RATIO;
import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.STATION_AREA_RATIO;
import static org.ductledger.flow.Arguments.STATION_SIDE;

import java.util.List;
import java.util.stream.Stream;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Numbers;

/** A nozzle between a supply and a back pressure: its regimes, its exit, its shock and its stations. */
final class Nozzle {
    static final Chapter FAMILY = new Chapter("nozzle", "Converging-diverging nozzle at a back pressure");

    static final Argument PB_OVER_P0 = Argument.number(
            "pb_over_p0",
            "pb/p0",
            "1",
            Interval.openClosed(0, 1),
            "back pressure over the stagnation pressure of the supply");

    private static final Interval SHARE = Interval.closed(0, 1);

    private static final String ONE_PRESSURE =
            "first_critical, shock_at_exit and design each hold at one back pressure;"
                    + " they are told within a relative 1e-9 of it.";

    private Nozzle() {}

    private static final FunctionEntry NOZZLE_REGIME = FAMILY.entry("nozzle_regime")
            .title("Regime of a nozzle at a back pressure")
            .formula("pb/p0 against 1 and the first, second and third critical ratios")
            .note(ONE_PRESSURE + " Of a converging nozzle (exit_area_ratio 1) the three are the sonic ratio, named"
                    + " first_critical: just choked.")
            .takes(EXIT_AREA_RATIO, PB_OVER_P0, GAMMA)
            .givesOneOf(
                    "regime",
                    "no_flow",
                    "unchoked",
                    "first_critical",
                    "shock_in_nozzle",
                    "shock_at_exit",
                    "overexpanded",
                    "design",
                    "underexpanded")
            .kernel(NozzleFlow::regime)
            .sources(Sources.SHAPIRO.at("ch. 5"))
            .example("shock_in_nozzle", 2.0, 0.75, 1.4)
            .cell(NozzleCells.regime())
            .build();

    private static EntryBuilder critical(String name, Kernel.Of2 kernel, Kernel.Of2 byExit) {
        return FAMILY.entry(name)
                .takes(EXIT_AREA_RATIO, GAMMA)
                .gives("pb/p0", "1", SHARE)
                .kernel(kernel)
                .partials(Kernel.of(byExit), null)
                .sources(Sources.SHAPIRO.at("ch. 5"));
    }

    private static final FunctionEntry NOZZLE_FIRST_CRITICAL = critical(
                    "nozzle_first_critical", NozzleFlow::firstCritical, NozzleFlow::firstCriticalByExit)
            .title("First critical back pressure: just choked, subsonic to the exit")
            .formula("p/p0 at the subsonic Mach number of Ae/At")
            .example("0.9372", 2.0, 1.4)
            .cell(NozzleCells.firstCritical())
            .build();

    private static final FunctionEntry NOZZLE_SECOND_CRITICAL = critical(
                    "nozzle_second_critical", NozzleFlow::secondCritical, NozzleFlow::secondCriticalByExit)
            .title("Second critical back pressure: a normal shock in the exit plane")
            .formula("p/p0 at the supersonic Mach number of Ae/At, times p2/p1 over a normal shock there")
            .example("0.5134", 2.0, 1.4)
            .cell(NozzleCells.secondCritical())
            .build();

    private static final FunctionEntry NOZZLE_THIRD_CRITICAL = critical(
                    "nozzle_third_critical", NozzleFlow::thirdCritical, NozzleFlow::thirdCriticalByExit)
            .title("Third critical back pressure: the design point, full expansion to the back pressure")
            .formula("p/p0 at the supersonic Mach number of Ae/At")
            .example("0.09393", 2.0, 1.4)
            .cell(NozzleCells.thirdCritical())
            .build();

    private static EntryBuilder atBackPressure(String name, Kernel.Of3 kernel) {
        return FAMILY.entry(name)
                .takes(EXIT_AREA_RATIO, PB_OVER_P0, GAMMA)
                .kernel(kernel)
                .sources(Sources.SHAPIRO.at("ch. 5"));
    }

    private static final FunctionEntry NOZZLE_EXIT_MACH = atBackPressure("nozzle_exit_mach", NozzleFlow::exitMach)
            .title("Mach number at a nozzle's exit")
            .formula(
                    "by regime: isentropic to pb; with a shock inside, m sqrt(R T0)/(pb Ae) gives it; else that of Ae/At")
            .note("With the shock in the exit plane it is that behind the shock.")
            .gives("Me", "1", Interval.atLeast(0))
            .example("0.3803", 2.0, 0.75, 1.4)
            .cell(NozzleCells.exitMach())
            .build();

    private static final FunctionEntry NOZZLE_EXIT_P_OVER_P0 = atBackPressure(
                    "nozzle_exit_p_over_p0", NozzleFlow::exitPOverP0)
            .title("Static pressure at a nozzle's exit over the stagnation pressure of the supply")
            .formula("pb/p0 down to the second critical ratio, below it the third critical ratio")
            .gives("pe/p0", "1", Interval.openClosed(0, 1))
            .example("0.09393", 2.0, 0.3, 1.4)
            .cell(NozzleCells.exitPOverP0())
            .build();

    private static final FunctionEntry NOZZLE_EXIT_P0_OVER_P0 = atBackPressure(
                    "nozzle_exit_p0_over_p0", NozzleFlow::exitP0OverP0)
            .title("Stagnation pressure at a nozzle's exit over that of the supply")
            .formula("p02/p01 over the shock in the nozzle, 1 where there is none")
            .gives("p0e/p0", "1", Interval.openClosed(0, 1))
            .example("0.8287", 2.0, 0.75, 1.4)
            .cell(NozzleCells.exitP0OverP0())
            .build();

    /** An entry that has a value only where a shock stands in the nozzle. */
    private static EntryBuilder ofShock(String name, Kernel.Of3 kernel) {
        return atBackPressure(name, kernel)
                .requires(
                        FaultKind.NO_SOLUTION,
                        "pb_over_p0",
                        row -> NozzleFlow.hasShock(row[0], row[1], row[2]),
                        row -> "must be below the first critical ratio "
                                + Numbers.brief(NozzleFlow.firstCritical(row[0], row[2]))
                                + " and at least the second, "
                                + Numbers.brief(NozzleFlow.secondCritical(row[0], row[2]))
                                + ", for a shock to stand in the nozzle")
                .note("Near the first critical ratio the shock is weak, and its place a steep function of pb/p0.");
    }

    private static final FunctionEntry NOZZLE_SHOCK_AREA_RATIO = ofShock(
                    "nozzle_shock_area_ratio", NozzleFlow::shockAreaRatio)
            .title("Area at which the shock stands in a nozzle, over the throat area")
            .formula("A/A* at the Mach number ahead of the shock")
            .gives("As/At", "1", Interval.atLeast(1))
            .example("1.400", 2.0, 0.75, 1.4)
            .cell(NozzleCells.shockAreaRatio())
            .build();

    private static final FunctionEntry NOZZLE_SHOCK_MACH1 = ofShock("nozzle_shock_mach1", NozzleFlow::shockMach1)
            .title("Mach number ahead of the shock in a nozzle")
            .formula("the M1 for which p02/p01 = (pb/p0) / (pe/p02) at the exit Mach number")
            .gives("M1", "1", Interval.atLeast(1))
            .example("1.763", 2.0, 0.75, 1.4)
            .cell(NozzleCells.shockMach1())
            .build();

    private static final FunctionEntry NOZZLE_MASS_FLOW_FRACTION = atBackPressure(
                    "nozzle_mass_flow_fraction", NozzleFlow::massFlowFraction)
            .title("Mass flow of a nozzle over its choked mass flow")
            .formula("(Ae/At) / (A/A* at the exit Mach number) where the flow is not choked, else 1")
            .gives("m/m*", "1", SHARE)
            .example("0.8986", 2.0, 0.95, 1.4)
            .cell(NozzleCells.massFlowFraction())
            .build();

    private static EntryBuilder atStation(String name, Kernel.Of5 kernel) {
        return FAMILY.entry(name)
                .takes(STATION_AREA_RATIO, STATION_SIDE, EXIT_AREA_RATIO, PB_OVER_P0, GAMMA)
                .kernel(kernel)
                .requires(
                        FaultKind.OUTSIDE_DOMAIN,
                        "area_ratio",
                        row -> row[1] == Arguments.CONVERGING || row[0] <= row[2] * (1 + NozzleFlow.NEAR),
                        row -> "must be at most " + Numbers.brief(row[2])
                                + " (the exit area ratio) on the diverging side")
                .note("A station where the shock stands, within a relative 1e-9 of its area, is ahead of it.")
                .sources(Sources.SHAPIRO.at("ch. 5"));
    }

    private static final FunctionEntry NOZZLE_MACH_AT = atStation("nozzle_mach_at", NozzleFlow::machAt)
            .title("Mach number at a station of a nozzle")
            .formula(
                    "that of A/At: subsonic before the throat, supersonic to the shock; behind it that of A/At p02/p01,"
                            + " subsonic; in unchoked flow that of A/A*, A* < At")
            .gives("M", "1", Interval.atLeast(0))
            .example("0.3803", 2.0, "diverging", 2.0, 0.75, 1.4)
            .cell(NozzleCells.machAt())
            .build();

    private static final FunctionEntry NOZZLE_P_OVER_P0_AT = atStation("nozzle_p_over_p0_at", NozzleFlow::pOverP0At)
            .title("Static pressure at a station of a nozzle over the stagnation pressure of the supply")
            .formula("p/p0 at the station's Mach number, times p02/p01 behind the shock")
            .gives("p/p0", "1", SHARE)
            .example("0.750", 2.0, "diverging", 2.0, 0.75, 1.4)
            .cell(NozzleCells.pOverP0At())
            .build();

    static List<FunctionEntry> entries() {
        return Stream.concat(
                        Stream.of(
                                NOZZLE_REGIME,
                                NOZZLE_FIRST_CRITICAL,
                                NOZZLE_SECOND_CRITICAL,
                                NOZZLE_THIRD_CRITICAL,
                                NOZZLE_EXIT_MACH,
                                NOZZLE_EXIT_P_OVER_P0,
                                NOZZLE_EXIT_P0_OVER_P0,
                                NOZZLE_SHOCK_AREA_RATIO,
                                NOZZLE_SHOCK_MACH1,
                                NOZZLE_MASS_FLOW_FRACTION,
                                NOZZLE_MACH_AT,
                                NOZZLE_P_OVER_P0_AT),
                        Thrust.entries().stream())
                .toList();
    }
}
