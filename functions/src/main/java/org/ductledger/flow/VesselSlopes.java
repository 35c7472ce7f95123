package org.ductledger.flow;

import static org.ductledger.flow.VesselFlow.ADIABATIC;

/**
 * Slopes of the blowdown. With f the mass flow over the choked one, d ln(p/pi)/ds is -f where the gas is kept at its
 * temperature, and -gamma f sqrt(T/Ti) where no heat is exchanged. The back pressure acts only after unchoking.
 */
final class VesselSlopes {
    private VesselSlopes() {}

    /** -d ln(p/pi)/ds. */
    private static double decay(double mach, double rootT, double gamma, double process) {
        double fraction = VesselFlow.flowFraction(mach, gamma);
        return process == ADIABATIC ? gamma * fraction * rootT : fraction;
    }

    /** d ln(p/pi)/d ln(pb/pi) at a given time. */
    private static double followed(double mach, double rootT, double s, double pb, double gamma, double process) {
        if (mach == 1) {
            return 0;
        }
        double first = VesselFlow.jetMach(-StrictMath.log(pb), gamma);
        double cooling = process == ADIABATIC ? VesselFlow.half(gamma) * s : 0;
        double start = 1 / VesselFlow.flowFraction(first, gamma);
        return 1 - rootT * VesselFlow.flowFraction(mach, gamma) * (cooling + start);
    }

    private static double machAtP(double p, double pb, double gamma) {
        return pb == 0 ? 1 : VesselFlow.jetMach(VesselFlow.logOver(p, pb), gamma);
    }

    private static double rootTAtP(double p, double gamma, double process) {
        return StrictMath.exp(0.5 * tExponent(gamma, process) * StrictMath.log(p));
    }

    static double timeByP(double p, double pb, double timeConstant, double gamma, double process) {
        double rootT = rootTAtP(p, gamma, process);
        return -timeConstant / (p * decay(machAtP(p, pb, gamma), rootT, gamma, process));
    }

    static double timeByPb(double p, double pb, double timeConstant, double gamma, double process) {
        double mach = machAtP(p, pb, gamma);
        double rootT = rootTAtP(p, gamma, process);
        double s = VesselFlow.time(p, pb, gamma, process);
        double followed = followed(mach, rootT, s, pb, gamma, process);
        return followed == 0 ? 0 : timeConstant * followed / (pb * decay(mach, rootT, gamma, process));
    }

    static double timeByTimeConstant(double p, double pb, double timeConstant, double gamma, double process) {
        return VesselFlow.time(p, pb, gamma, process);
    }

    /** d ln(p/pi)/dt. */
    private static double logPByTime(double time, double pb, double timeConstant, double gamma, double process) {
        double mach = VesselFlow.machAt(time / timeConstant, pb, gamma, process);
        double rootT = Math.sqrt(Vessel.tOverTi(time, pb, timeConstant, gamma, process));
        return -decay(mach, rootT, gamma, process) / timeConstant;
    }

    private static double logPByPb(double time, double pb, double timeConstant, double gamma, double process) {
        double s = time / timeConstant;
        double mach = VesselFlow.machAt(s, pb, gamma, process);
        double rootT = Math.sqrt(Vessel.tOverTi(time, pb, timeConstant, gamma, process));
        double followed = followed(mach, rootT, s, pb, gamma, process);
        return followed == 0 ? 0 : followed / pb;
    }

    static double pByTime(double time, double pb, double timeConstant, double gamma, double process) {
        return Vessel.pOverPi(time, pb, timeConstant, gamma, process)
                * logPByTime(time, pb, timeConstant, gamma, process);
    }

    static double pByPb(double time, double pb, double timeConstant, double gamma, double process) {
        return Vessel.pOverPi(time, pb, timeConstant, gamma, process)
                * logPByPb(time, pb, timeConstant, gamma, process);
    }

    static double pByTimeConstant(double time, double pb, double timeConstant, double gamma, double process) {
        return -time / timeConstant * pByTime(time, pb, timeConstant, gamma, process);
    }

    private static double tExponent(double gamma, double process) {
        return process == ADIABATIC ? (gamma - 1) / gamma : 0;
    }

    static double tByTime(double time, double pb, double timeConstant, double gamma, double process) {
        return tExponent(gamma, process)
                * Vessel.tOverTi(time, pb, timeConstant, gamma, process)
                * logPByTime(time, pb, timeConstant, gamma, process);
    }

    static double tByPb(double time, double pb, double timeConstant, double gamma, double process) {
        return tExponent(gamma, process)
                * Vessel.tOverTi(time, pb, timeConstant, gamma, process)
                * logPByPb(time, pb, timeConstant, gamma, process);
    }

    static double tByTimeConstant(double time, double pb, double timeConstant, double gamma, double process) {
        return -time / timeConstant * tByTime(time, pb, timeConstant, gamma, process);
    }

    private static double massExponent(double gamma, double process) {
        return process == ADIABATIC ? 1 / gamma : 1;
    }

    static double massByTime(double time, double pb, double timeConstant, double gamma, double process) {
        return massExponent(gamma, process)
                * Vessel.massOverMi(time, pb, timeConstant, gamma, process)
                * logPByTime(time, pb, timeConstant, gamma, process);
    }

    static double massByPb(double time, double pb, double timeConstant, double gamma, double process) {
        return massExponent(gamma, process)
                * Vessel.massOverMi(time, pb, timeConstant, gamma, process)
                * logPByPb(time, pb, timeConstant, gamma, process);
    }

    static double massByTimeConstant(double time, double pb, double timeConstant, double gamma, double process) {
        return -time / timeConstant * massByTime(time, pb, timeConstant, gamma, process);
    }

    static double fillTimeByP(double p, double pInitial, double timeConstant, double gamma, double process) {
        return timeConstant / rise(p, gamma, process);
    }

    static double fillTimeByInitial(double p, double pInitial, double timeConstant, double gamma, double process) {
        return -timeConstant / rise(pInitial, gamma, process);
    }

    /** d(p/p0)/ds while a vessel at this pressure is filled. */
    private static double rise(double p, double gamma, double process) {
        double fraction = VesselFlow.flowFraction(VesselFlow.jetMach(-StrictMath.log(p), gamma), gamma);
        return process == ADIABATIC ? gamma * fraction : fraction;
    }
}
