package org.ductledger.flow;

import static org.ductledger.flow.Arguments.CONVERGING;

/**
 * One-dimensional flow through a nozzle between a supply and a back pressure: isentropic but for a normal shock.
 *
 * <p>The back pressure {@code pb} and all static pressures are over the stagnation pressure of the supply, areas over
 * the throat's; {@code exit} is Ae/At. Three flows exist at one back pressure only: the first critical (just choked,
 * subsonic to the exit), the second (a shock in the exit plane) and the third (the design point). Each is taken within
 * {@link #NEAR} of its back pressure.
 */
final class NozzleFlow {
    /** How far, relatively, a back pressure may lie from a critical one, or a station from the shock. */
    static final double NEAR = 1e-9;

    static final double NO_FLOW = 0;
    static final double UNCHOKED = 1;
    static final double FIRST_CRITICAL = 2;
    static final double SHOCK_IN_NOZZLE = 3;
    static final double SHOCK_AT_EXIT = 4;
    static final double OVEREXPANDED = 5;
    static final double DESIGN = 6;
    static final double UNDEREXPANDED = 7;

    private NozzleFlow() {}

    static double firstCritical(double exit, double gamma) {
        return pOverP0(subsonic(exit, gamma), gamma);
    }

    /** p2/p01 as p02/p01 p2/p02, which no Mach number overflows. */
    static double secondCritical(double exit, double gamma) {
        double mach = Math.min(Double.MAX_VALUE, supersonic(exit, gamma));
        return NormalShock.p02OverP01(mach, gamma) * pOverP0(NormalShock.mach2(mach, gamma), gamma);
    }

    static double thirdCritical(double exit, double gamma) {
        return pOverP0(supersonic(exit, gamma), gamma);
    }

    /** At a Mach number beyond the doubles nothing is left of p/p0 either. */
    private static double pOverP0(double mach, double gamma) {
        return Isentropic.pOverP0(Math.min(Double.MAX_VALUE, mach), gamma);
    }

    /** From d ln p / d ln A = gamma M^2 / (1 - M^2). */
    static double firstCriticalByExit(double exit, double gamma) {
        double mach = subsonic(exit, gamma);
        return pOverP0(mach, gamma) / exit * pressureRate(mach, gamma);
    }

    static double secondCriticalByExit(double exit, double gamma) {
        double mach = supersonic(exit, gamma);
        double p = pOverP0(mach, gamma);
        double machByExit = (1 + 0.5 * (gamma - 1) * mach * mach) * mach / ((mach - 1) * (mach + 1) * exit);
        return p / exit * pressureRate(mach, gamma) * NormalShock.p2OverP1(mach, gamma)
                + p * NormalShockSlopes.p2OverP1ByMach(mach, gamma) * machByExit;
    }

    static double thirdCriticalByExit(double exit, double gamma) {
        double mach = supersonic(exit, gamma);
        return pOverP0(mach, gamma) / exit * pressureRate(mach, gamma);
    }

    private static double pressureRate(double mach, double gamma) {
        return gamma * mach * mach / ((1 - mach) * (1 + mach));
    }

    private static double subsonic(double area, double gamma) {
        return IsentropicBranches.machFromAreaRatioSubsonic(area, gamma);
    }

    private static double supersonic(double area, double gamma) {
        return IsentropicBranches.machFromAreaRatioSupersonic(area, gamma);
    }

    /** The regime's place in the list of the entry. */
    static double regime(double exit, double pb, double gamma) {
        if (pb == 1) {
            return NO_FLOW;
        }
        double first = firstCritical(exit, gamma);
        if (pb > first * (1 + NEAR)) {
            return UNCHOKED;
        }
        if (pb >= first * (1 - NEAR)) {
            return FIRST_CRITICAL;
        }
        double second = secondCritical(exit, gamma);
        if (pb >= second * (1 - NEAR)) {
            return pb > second * (1 + NEAR) ? SHOCK_IN_NOZZLE : SHOCK_AT_EXIT;
        }
        double third = thirdCritical(exit, gamma);
        return pb > third * (1 + NEAR) ? OVEREXPANDED : pb >= third * (1 - NEAR) ? DESIGN : UNDEREXPANDED;
    }

    static boolean isChoked(double exit, double pb, double gamma) {
        return regime(exit, pb, gamma) > UNCHOKED;
    }

    /** Whether a shock stands in the nozzle or in its exit plane. */
    static boolean hasShock(double exit, double pb, double gamma) {
        double regime = regime(exit, pb, gamma);
        return regime == SHOCK_IN_NOZZLE || regime == SHOCK_AT_EXIT;
    }

    /** With a shock in the exit plane: the Mach number behind it. */
    static double exitMach(double exit, double pb, double gamma) {
        double regime = regime(exit, pb, gamma);
        return regime <= UNCHOKED
                ? Isentropic.machFromPOverP0(pb, gamma)
                : regime <= SHOCK_AT_EXIT ? shockedExitMach(exit, pb, gamma) : supersonic(exit, gamma);
    }

    /** Choked flow that leaves at the back pressure: m sqrt(R T0)/(p A) at the exit is known, and it tells M. */
    private static double shockedExitMach(double exit, double pb, double gamma) {
        return Isentropic.machFromMassFlowNumberStatic(Isentropic.chokedMassFlowNumber(gamma) / (pb * exit), gamma);
    }

    static double exitPOverP0(double exit, double pb, double gamma) {
        return regime(exit, pb, gamma) <= SHOCK_AT_EXIT ? pb : thirdCritical(exit, gamma);
    }

    /** The stagnation pressure at the exit over that of the supply. */
    static double exitP0OverP0(double exit, double pb, double gamma) {
        return hasShock(exit, pb, gamma) ? shockLoss(exit, pb, gamma) : 1;
    }

    private static double shockLoss(double exit, double pb, double gamma) {
        return Math.min(1, pb / pOverP0(shockedExitMach(exit, pb, gamma), gamma));
    }

    /** The Mach number ahead of the shock; NaN where none stands in the nozzle. */
    static double shockMach1(double exit, double pb, double gamma) {
        double regime = regime(exit, pb, gamma);
        if (regime == SHOCK_AT_EXIT) {
            return supersonic(exit, gamma);
        }
        return regime == SHOCK_IN_NOZZLE
                ? NormalShockInverse.fromP02OverP01(shockLoss(exit, pb, gamma), gamma)
                : Double.NaN;
    }

    /** Where the shock stands, as area over the throat area; NaN where none stands in the nozzle. */
    static double shockAreaRatio(double exit, double pb, double gamma) {
        return regime(exit, pb, gamma) == SHOCK_AT_EXIT
                ? exit
                : Math.min(exit, Isentropic.areaRatio(shockMach1(exit, pb, gamma), gamma));
    }

    /** Mass flow over that of the choked nozzle. */
    static double massFlowFraction(double exit, double pb, double gamma) {
        double regime = regime(exit, pb, gamma);
        return regime == NO_FLOW ? 0 : regime == UNCHOKED ? sonicArea(exit, pb, gamma) : 1;
    }

    /** In unchoked flow: the area at which it would be sonic, over the throat area. */
    private static double sonicArea(double exit, double pb, double gamma) {
        return Math.min(1, exit / Isentropic.areaRatio(Isentropic.machFromPOverP0(pb, gamma), gamma));
    }

    /** The Mach number at a station; a station in the shock is ahead of it. NaN beyond the exit. */
    static double machAt(double area, double side, double exit, double pb, double gamma) {
        if (side != CONVERGING && area > exit * (1 + NEAR)) {
            return Double.NaN;
        }
        double regime = regime(exit, pb, gamma);
        if (regime <= UNCHOKED) {
            return unchokedMachAt(area, exit, pb, gamma);
        }
        if (side == CONVERGING || regime == FIRST_CRITICAL) {
            return subsonic(area, gamma);
        }
        return isBehindShock(area, regime, exit, pb, gamma)
                ? subsonic(Math.max(1, area * shockLoss(exit, pb, gamma)), gamma)
                : supersonic(area, gamma);
    }

    /** Where the area is that of the exit it is told by the back pressure alone, to the last digit near sonic flow. */
    private static double unchokedMachAt(double area, double exit, double pb, double gamma) {
        return pb == 1
                ? 0
                : area == exit
                        ? Isentropic.machFromPOverP0(pb, gamma)
                        : subsonic(area / sonicArea(exit, pb, gamma), gamma);
    }

    private static boolean isBehindShock(double area, double regime, double exit, double pb, double gamma) {
        return regime == SHOCK_IN_NOZZLE && area > shockAreaRatio(exit, pb, gamma) * (1 + NEAR);
    }

    /** The static pressure at a station over the stagnation pressure of the supply. */
    static double pOverP0At(double area, double side, double exit, double pb, double gamma) {
        double ideal = pOverP0(machAt(area, side, exit, pb, gamma), gamma);
        return side != CONVERGING && isBehindShock(area, regime(exit, pb, gamma), exit, pb, gamma)
                ? ideal * shockLoss(exit, pb, gamma)
                : ideal;
    }
}
