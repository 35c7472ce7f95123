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

    static double massFlowByMach(double mach, double p0, double t0, double area, double gamma, double gasConstant) {
        return IsentropicSlopes.massFlowNumberByMach(mach, gamma) * p0 * area / FlowRates.thermalSpeed(gasConstant, t0);
    }

    static double massFlowByGamma(double mach, double p0, double t0, double area, double gamma, double gasConstant) {
        return IsentropicSlopes.massFlowNumberByGamma(mach, gamma)
                * p0
                * area
                / FlowRates.thermalSpeed(gasConstant, t0);
    }

    static double chokedMassFlowByGamma(double p0, double t0, double area, double gamma, double gasConstant) {
        return massFlowByGamma(1, p0, t0, area, gamma, gasConstant);
    }

    static double throatAreaByGamma(double massFlow, double p0, double t0, double gamma, double gasConstant) {
        double relative = IsentropicSlopes.chokedMassFlowNumberByGamma(gamma) / Isentropic.chokedMassFlowNumber(gamma);
        return -FlowRates.throatArea(massFlow, p0, t0, gamma, gasConstant) * relative;
    }

    /** What a relative change of the mass flow number does to the Mach number; without bound where it chokes. */
    private static double machByRelativeNumber(double mach, double gamma) {
        return mach * t0OverT(mach, gamma) / ((1 - mach) * (1 + mach));
    }

    static double machByMassFlow(
            double massFlow, double p0, double t0, double area, double gamma, double gasConstant, double branch) {
        double mach = FlowRates.machFromMassFlow(massFlow, p0, t0, area, gamma, gasConstant, branch);
        return machByRelativeNumber(mach, gamma) / massFlow;
    }

    static double machByP0(
            double massFlow, double p0, double t0, double area, double gamma, double gasConstant, double branch) {
        double mach = FlowRates.machFromMassFlow(massFlow, p0, t0, area, gamma, gasConstant, branch);
        return -machByRelativeNumber(mach, gamma) / p0;
    }

    static double machByT0(
            double massFlow, double p0, double t0, double area, double gamma, double gasConstant, double branch) {
        double mach = FlowRates.machFromMassFlow(massFlow, p0, t0, area, gamma, gasConstant, branch);
        return 0.5 * machByRelativeNumber(mach, gamma) / t0;
    }

    static double machByArea(
            double massFlow, double p0, double t0, double area, double gamma, double gasConstant, double branch) {
        double mach = FlowRates.machFromMassFlow(massFlow, p0, t0, area, gamma, gasConstant, branch);
        return -machByRelativeNumber(mach, gamma) / area;
    }

    static double machByGamma(
            double massFlow, double p0, double t0, double area, double gamma, double gasConstant, double branch) {
        double mach = FlowRates.machFromMassFlow(massFlow, p0, t0, area, gamma, gasConstant, branch);
        return -IsentropicSlopes.massFlowNumberByGamma(mach, gamma)
                / IsentropicSlopes.massFlowNumberByMach(mach, gamma);
    }

    static double machByGasConstant(
            double massFlow, double p0, double t0, double area, double gamma, double gasConstant, double branch) {
        double mach = FlowRates.machFromMassFlow(massFlow, p0, t0, area, gamma, gasConstant, branch);
        return 0.5 * machByRelativeNumber(mach, gamma) / gasConstant;
    }
}
