package org.ductledger.flow;

import org.ductledger.numeric.GaussLegendre;

/**
 * The outflow from a rigid vessel in normalised time s = t/tau, tau = V/(C* A sqrt(R Ti)).
 *
 * <p>While the throat is choked, p/pi = exp(-s) if the gas is kept at its temperature, (1 + k s)^(-gamma/k) if no heat
 * is exchanged, k = (gamma-1)/2. After that the Mach number M of the jet, (p/pb)^e = 1 + k M^2 with e = (gamma-1)/gamma,
 * is the variable in which the time is the integral of a smooth function: ds = -F (1 + k M^2)^a dM. It stays finite to
 * the end, M = 0 and p = pb.
 */
final class VesselFlow {
    /** The places of the processes in the argument's choices. */
    static final double ADIABATIC = 0;

    private static final int MOST_STEPS = 20;

    private VesselFlow() {}

    private static boolean isAdiabatic(double process) {
        return process == ADIABATIC;
    }

    static double half(double gamma) {
        return 0.5 * (gamma - 1);
    }

    /** ln(p0/p*), the logarithm of the pressure ratio that just chokes. */
    static double logCritical(double gamma) {
        return 0.5 * gamma / half(gamma) * StrictMath.log1p(half(gamma));
    }

    /** ln(p/pb), without loss where p is near pb. */
    static double logOver(double p, double pb) {
        return p < 2 * pb ? StrictMath.log1p((p - pb) / pb) : StrictMath.log(p / pb);
    }

    /** The Mach number of the jet, at most 1, from ln(p/pb). */
    static double jetMach(double logOver, double gamma) {
        if (logOver >= logCritical(gamma)) {
            return 1;
        }
        double e = (gamma - 1) / gamma;
        return Math.min(1, Math.sqrt(StrictMath.expm1(e * logOver) / half(gamma)));
    }

    /** The time to reach ln(p/pi) while choked. */
    static double chokedTime(double logPressure, double gamma, double process) {
        if (!isAdiabatic(process)) {
            return -logPressure;
        }
        double k = half(gamma);
        return StrictMath.expm1(-k / gamma * logPressure) / k;
    }

    private static double chokedLogPressure(double s, double gamma, double process) {
        double k = half(gamma);
        return isAdiabatic(process) ? -gamma / k * StrictMath.log1p(k * s) : -s;
    }

    /** The moment when the throat unchokes: 0 if it never was choked, infinite if it stays so. */
    static double unchokingTime(double pb, double gamma, double process) {
        double logUnchoking = StrictMath.log(pb) + logCritical(gamma);
        return logUnchoking >= 0 ? 0 : chokedTime(logUnchoking, gamma, process);
    }

    private static double exponent(double gamma, double process) {
        double k = half(gamma);
        return isAdiabatic(process) ? 0.5 * (2 - gamma) / k : 0.25 * (3 - gamma) / k;
    }

    /** The factor F of the integral. */
    private static double factor(double pb, double gamma, double process) {
        double choked = Isentropic.chokedMassFlowNumber(gamma);
        return isAdiabatic(process)
                ? choked / Math.sqrt(gamma) * StrictMath.exp(-half(gamma) / gamma * StrictMath.log(pb))
                : choked * Math.sqrt(gamma);
    }

    private static double integrand(double mach, double k, double a) {
        return StrictMath.exp(a * StrictMath.log1p(k * mach * mach));
    }

    /** The integral of (1 + k M^2)^a from one Mach number to a greater one, both at most 1. */
    private static double integral(double from, double to, double k, double a) {
        double middle = 0.5 * (from + to);
        double half = 0.5 * (to - from);
        double sum = 0;
        for (int i = 0; i < GaussLegendre.POINTS; i++) {
            sum += GaussLegendre.weight(i) * integrand(middle + half * GaussLegendre.node(i), k, a);
        }
        return half * sum;
    }

    /** The time from the first jet Mach number of the unchoked phase down to another. */
    static double unchokedTime(double mach, double pb, double gamma, double process) {
        double first = jetMach(-StrictMath.log(pb), gamma);
        return factor(pb, gamma, process) * integral(mach, first, half(gamma), exponent(gamma, process));
    }

    /** The time in which p/pi falls to this value, pb/pi &lt;= p/pi &lt;= 1. */
    static double time(double p, double pb, double gamma, double process) {
        double logOver = pb == 0 ? Double.POSITIVE_INFINITY : logOver(p, pb);
        if (logOver >= logCritical(gamma)) {
            return chokedTime(StrictMath.log(p), gamma, process);
        }
        return unchokingTime(pb, gamma, process) + unchokedTime(jetMach(logOver, gamma), pb, gamma, process);
    }

    /** ln(p/pi) at a time; ln(pb/pi) from the end on. */
    static double logPressure(double s, double pb, double gamma, double process) {
        double unchoking = unchokingTime(pb, gamma, process);
        if (s < unchoking) {
            return chokedLogPressure(s, gamma, process);
        }
        double k = half(gamma);
        double mach = machAfter(s - unchoking, pb, gamma, process);
        return StrictMath.log(pb) + 0.5 * gamma / k * StrictMath.log1p(k * mach * mach);
    }

    /** The jet's Mach number a time after the unchoked phase began: Halley's steps on the integral from rest. */
    private static double machAfter(double s, double pb, double gamma, double process) {
        double k = half(gamma);
        double a = exponent(gamma, process);
        double first = jetMach(-StrictMath.log(pb), gamma);
        double wanted = integral(0, first, k, a) - s / factor(pb, gamma, process);
        if (!(wanted > 0)) {
            return 0;
        }
        double mach = Math.min(wanted, first);
        for (int i = 0; i < MOST_STEPS; i++) {
            double newton = (integral(0, mach, k, a) - wanted) / integrand(mach, k, a);
            double bend = a * k * mach / (1 + k * mach * mach);
            double step = newton / (1 - newton * bend);
            mach = Math.min(first, mach - step);
            if (Math.abs(step) <= Math.ulp(mach)) {
                break;
            }
        }
        return mach;
    }

    /** The Mach number of the jet at a time: 1 while choked, 0 from the end on. */
    static double machAt(double s, double pb, double gamma, double process) {
        double unchoking = unchokingTime(pb, gamma, process);
        return s < unchoking ? 1 : machAfter(s - unchoking, pb, gamma, process);
    }

    /** The mass flow over the choked one, from the Mach number of the jet. */
    static double flowFraction(double mach, double gamma) {
        double k = half(gamma);
        double sonicOver = (1 + k) / (1 + k * mach * mach);
        return mach * StrictMath.exp(0.25 * (gamma + 1) / k * StrictMath.log(sonicOver));
    }
}
