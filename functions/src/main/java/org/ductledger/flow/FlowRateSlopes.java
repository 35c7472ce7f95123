package org.ductledger.flow;

/** The partial derivatives of {@link FlowRates} that are more than the value over an argument. */
final class FlowRateSlopes {
    private FlowRateSlopes() {}

    /** 1 + (gamma-1)/2 M^2 = T0/T. */
    private static double t0OverT(double mach, double gamma) {
        return 1 + 0.5 * (gamma - 1) * mach * mach;
    }

    static double flowSpeedByMach(double mach, double t0, double gamma, double gasConstant) {
        double h = t0OverT(mach, gamma);
        return Math.sqrt(gamma * gasConstant * t0 / h) / h;
    }

    static double flowSpeedByGamma(double mach, double t0, double gamma, double gasConstant) {
        double speed = FlowRates.flowSpeed(mach, t0, gamma, gasConstant);
        return 0.5 * speed * (1 / gamma - 0.5 * mach * mach / t0OverT(mach, gamma));
    }
}
