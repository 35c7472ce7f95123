package org.ductledger.flow;

import static org.ductledger.flow.Arguments.EXIT_AREA_RATIO;
import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.GAS_CONSTANT;
import static org.ductledger.flow.Arguments.T0;
import static org.ductledger.flow.Nozzle.FAMILY;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.numeric.Degrees;

/** A nozzle's thrust, and what it loses to the divergence of its jet. */
final class Thrust {
    private Thrust() {}

    /** F/(p0 At) with the back pressure around the nozzle. */
    static double coefficient(double exit, double pb, double gamma) {
        double mach = NozzleFlow.exitMach(exit, pb, gamma);
        return NozzleFlow.isChoked(exit, pb, gamma)
                ? momentum(mach, gamma) + exit * (NozzleFlow.exitPOverP0(exit, pb, gamma) - pb)
                : gamma * pb * mach * mach * exit;
    }

    static double vacuumCoefficient(double exit, double gamma) {
        double mach = IsentropicBranches.machFromAreaRatioSupersonic(exit, gamma);
        return momentum(mach, gamma) + exit * NozzleFlow.thirdCritical(exit, gamma);
    }

    /** m V/(p0 At) of choked flow: by V/Vmax, which huge areas do not overflow. */
    private static double momentum(double mach, double gamma) {
        return Isentropic.chokedMassFlowNumber(gamma)
                * Math.sqrt(2 * gamma / (gamma - 1))
                * Isentropic.vOverVmax(Math.min(Double.MAX_VALUE, mach), gamma);
    }

    /** The rate of p (1 + gamma M^2) A with A is p alone. */
    static double vacuumCoefficientByExit(double exit, double gamma) {
        return NozzleFlow.thirdCritical(exit, gamma);
    }

    static double characteristicVelocity(double t0, double gamma, double gasConstant) {
        return Math.sqrt(gasConstant) * Math.sqrt(t0) / Isentropic.chokedMassFlowNumber(gamma);
    }

    static double characteristicVelocityByT0(double t0, double gamma, double gasConstant) {
        return 0.5 * characteristicVelocity(t0, gamma, gasConstant) / t0;
    }

    static double characteristicVelocityByGasConstant(double t0, double gamma, double gasConstant) {
        return 0.5 * characteristicVelocity(t0, gamma, gasConstant) / gasConstant;
    }

    static double coneDivergence(double halfAngle) {
        return 0.5 * (1 + Degrees.cos(halfAngle));
    }

    static double coneDivergenceByAngle(double halfAngle) {
        return -0.5 * Degrees.toRadians(Degrees.sin(halfAngle));
    }

    private static final FunctionEntry NOZZLE_THRUST_COEFFICIENT = FAMILY.entry("nozzle_thrust_coefficient")
            .title("Thrust coefficient of a nozzle, with the back pressure around it")
            .formula("Cf = F/(p0 At) = (Ae/At) ((pe/p0) (1 + gamma Me^2) - pb/p0)")
            .note(
                    "One-dimensional theory, the nozzle flowing full: an overexpanded jet that separates from the wall has"
                            + " another thrust.")
            .takes(EXIT_AREA_RATIO, Nozzle.PB_OVER_P0, GAMMA)
            .gives("Cf", "1", Interval.anyNumber())
            .kernel(Thrust::coefficient)
            .sources(Sources.SUTTON_BIBLARZ.at("eq. (3-30)"))
            .example("1.5469", 10.0, 0.01, 1.4)
            .cell(NozzleCells.thrustCoefficient())
            .build();

    private static final FunctionEntry NOZZLE_VACUUM_THRUST_COEFFICIENT = FAMILY.entry(
                    "nozzle_vacuum_thrust_coefficient")
            .title("Thrust coefficient of a nozzle in vacuum")
            .formula("Cf = (Ae/At) (pe/p0) (1 + gamma Me^2)")
            .takes(EXIT_AREA_RATIO, GAMMA)
            .gives("Cf", "1", Interval.above(1))
            .kernel(Thrust::vacuumCoefficient)
            .partials(Kernel.of(Thrust::vacuumCoefficientByExit), null)
            .sources(Sources.SUTTON_BIBLARZ.at("eq. (3-30)"))
            .example("1.5817", 4.0, 1.3)
            .cell(NozzleCells.vacuumThrustCoefficient())
            .build();

    private static final FunctionEntry CHARACTERISTIC_VELOCITY = FAMILY.entry("characteristic_velocity")
            .title("Characteristic velocity p0 At/m")
            .formula("c* = sqrt(R T0/gamma) ((gamma+1)/2)^((gamma+1)/(2 (gamma-1)))")
            .takes(T0, GAMMA, GAS_CONSTANT)
            .gives("c*", "m/s", Interval.above(0))
            .kernel(Thrust::characteristicVelocity)
            .partials(
                    Kernel.of(Thrust::characteristicVelocityByT0),
                    null,
                    Kernel.of(Thrust::characteristicVelocityByGasConstant))
            .sources(Sources.SUTTON_BIBLARZ.at("eq. (3-32)"))
            .example("1313.5", 2222.0, 1.3, 345.7)
            .cell("SQRT({gas_constant}*{t0}/{gamma})*(({gamma}+1)/2)^(({gamma}+1)/(2*({gamma}-1)))")
            .build();

    private static final FunctionEntry CONE_DIVERGENCE_FACTOR = FAMILY.entry("cone_divergence_factor")
            .title("Momentum of a conical nozzle's jet over that of an axial jet")
            .formula("lambda = (1 + cos alpha)/2")
            .note("Multiplies the momentum part of the thrust alone.")
            .takes(Argument.number(
                    "half_angle", "alpha", "deg", Interval.closedOpen(0, 90), "half angle of the nozzle's cone"))
            .gives("lambda", "1", Interval.openClosed(0.5, 1))
            .kernel(Thrust::coneDivergence)
            .partials(Kernel.of(Thrust::coneDivergenceByAngle))
            .sources(Sources.SUTTON_BIBLARZ.at("eq. (3-34)"))
            .example("0.9830", 15.0)
            .cell("(1+COS({half_angle}*PI()/180))/2")
            .build();

    static List<FunctionEntry> entries() {
        return List.of(
                NOZZLE_THRUST_COEFFICIENT,
                NOZZLE_VACUUM_THRUST_COEFFICIENT,
                CHARACTERISTIC_VELOCITY,
                CONE_DIVERGENCE_FACTOR,
                JetTurn.ENTRY);
    }
}
