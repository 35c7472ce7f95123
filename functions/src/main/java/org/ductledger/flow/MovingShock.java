package org.ductledger.flow;

import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.SUPERSONIC_MACH1;
import static org.ductledger.flow.NormalShock.b;
import static org.ductledger.flow.NormalShock.c;
import static org.ductledger.flow.NormalShock.d;
import static org.ductledger.flow.NormalShock.strength;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Numbers;
import org.ductledger.catalogue.Source;

/**
 * The normal shock that runs into gas at rest, what is left behind it, its reflection at a closed end, and the shock
 * tube. Its Mach number is its own speed over the speed of sound ahead: the same as that of the steady shock.
 */
final class MovingShock {
    private MovingShock() {}

    static double mach(double p2OverP1, double gamma) {
        return Math.sqrt(1 + (p2OverP1 - 1) / b(gamma));
    }

    private static double machByRatio(double p2OverP1, double gamma) {
        return 0.5 / (b(gamma) * mach(p2OverP1, gamma));
    }

    private static double machByGamma(double p2OverP1, double gamma) {
        return -0.25 * (p2OverP1 - 1) / (gamma * gamma * mach(p2OverP1, gamma));
    }

    /** u/a2 = d x / sqrt((1 + b x)(1 + c x)), x = M1^2 - 1, written so that no M1 overflows. */
    static double gasMach2(double mach1, double gamma) {
        double r = 1 / strength(mach1);
        return d(gamma) / (Math.sqrt(b(gamma) + r) * Math.sqrt(c(gamma) + r));
    }

    /** d ln/dx is 1/x less the halves of b/(1 + b x) and c/(1 + c x), together (2 + (b + c) x) / (2 x (1 + b x)(1 + c x)). */
    private static double gasMach2ByMach1(double mach1, double gamma) {
        double x = strength(mach1);
        double p = 1 + b(gamma) * x;
        double q = 1 + c(gamma) * x;
        return mach1 * d(gamma) * ((2 + (b(gamma) + c(gamma)) * x) / p / q) / (Math.sqrt(p) * Math.sqrt(q));
    }

    private static double gasMach2ByGamma(double mach1, double gamma) {
        double r = 1 / strength(mach1);
        double rate = -0.5 * d(gamma) - 0.25 * d(gamma) * d(gamma) * (1 / (b(gamma) + r) + 1 / (c(gamma) + r));
        return gasMach2(mach1, gamma) * rate;
    }

    /** The reflected shock leaves the gas at rest: its Mach number is the reciprocal of M2 behind the steady shock. */
    static double reflectedMach(double mach1, double gamma) {
        return 1 / NormalShock.mach2(mach1, gamma);
    }

    private static double reflectedMachByMach1(double mach1, double gamma) {
        double m2 = NormalShock.mach2(mach1, gamma);
        return -NormalShockSlopes.mach2ByMach(mach1, gamma) / (m2 * m2);
    }

    private static double reflectedMachByGamma(double mach1, double gamma) {
        double m2 = NormalShock.mach2(mach1, gamma);
        return -NormalShockSlopes.mach2ByGamma(mach1, gamma) / (m2 * m2);
    }

    /** p5/p2 - 1 = b (M^2 - 1) of the reflected shock, M^2 - 1 = x/(1 + c x). */
    private static double reflectedRise(double mach1, double gamma) {
        return b(gamma) / (c(gamma) + 1 / strength(mach1));
    }

    static double p5OverP1(double mach1, double gamma) {
        double p = NormalShock.p2OverP1(mach1, gamma);
        return Math.fma(p, reflectedRise(mach1, gamma), p);
    }

    private static double p5OverP1ByMach1(double mach1, double gamma) {
        double q = 1 + c(gamma) * strength(mach1);
        return NormalShockSlopes.p2OverP1ByMach(mach1, gamma)
                * (1 + reflectedRise(mach1, gamma) + NormalShock.p2OverP1(mach1, gamma) / (q * q));
    }

    private static double p5OverP1ByGamma(double mach1, double gamma) {
        double x = strength(mach1);
        double q = 1 + c(gamma) * x;
        double riseByGamma = 0.5 * d(gamma) * d(gamma) * (x / q) * ((1 - x) / q);
        return NormalShockSlopes.p2OverP1ByGamma(mach1, gamma) * (1 + reflectedRise(mach1, gamma))
                + NormalShock.p2OverP1(mach1, gamma) * riseByGamma;
    }

    private static final Source ANDERSON =
            new Source("J. D. Anderson", "Modern Compressible Flow, With Historical Perspective", 1982, "");

    private static final Argument P2_OVER_P1 = Argument.number(
            "p2_over_p1", "p2/p1", "1", Interval.atLeast(1), "static pressure behind the shock over that ahead of it");
    private static final Argument MACH1 = SUPERSONIC_MACH1.named(
            "mach1", "Ms", "Mach number of the shock: its speed over the speed of sound in the gas at rest ahead");
    private static final Argument GAMMA1 =
            GAMMA.named("gamma1", "gamma1", "ratio of the specific heats of the driven gas");
    private static final Argument GAMMA4 =
            GAMMA.named("gamma4", "gamma4", "ratio of the specific heats of the driver gas");
    private static final Argument A4_OVER_A1 = Argument.number(
            "a4_over_a1",
            "a4/a1",
            "1",
            Interval.closed(1e-6, 1e6),
            "speed of sound in the driver gas over that in the driven gas, both at rest");
    private static final Argument P4_OVER_P1 = Argument.number(
            "p4_over_p1",
            "p4/p1",
            "1",
            Interval.atLeast(1),
            "pressure of the driver gas over that of the driven gas before the diaphragm opens");

    private static final FunctionEntry MOVING_SHOCK_MACH = NormalShock.FAMILY
            .entry("moving_shock_mach")
            .title("Mach number of a shock that runs into gas at rest")
            .formula("Ms = sqrt(1 + (gamma+1)/(2 gamma) (p2/p1 - 1))")
            .note("The shock's speed is Ms times the speed of sound ahead of it.")
            .takes(P2_OVER_P1, GAMMA)
            .gives("Ms", "1", Interval.atLeast(1))
            .kernel(MovingShock::mach)
            .partials(Kernel.of(MovingShock::machByRatio), Kernel.of(MovingShock::machByGamma))
            .sources(ANDERSON.at("eq. (7.13)"))
            .example("1.6475", 3.0, 1.4)
            .cell("SQRT(1+({gamma}+1)/(2*{gamma})*({p2_over_p1}-1))")
            .build();

    private static final FunctionEntry MOVING_SHOCK_GAS_MACH2 = NormalShock.FAMILY
            .entry("moving_shock_gas_mach2")
            .title("Mach number of the gas set in motion by a moving shock")
            .formula("u/a2 = 2 (Ms^2 - 1) / sqrt((2 gamma Ms^2 - (gamma-1)) ((gamma-1) Ms^2 + 2))")
            .note("In the frame in which the gas ahead is at rest. It tends to sqrt(2/(gamma (gamma-1))).")
            .takes(MACH1, GAMMA)
            .gives("u/a2", "1", Interval.atLeast(0))
            .kernel(MovingShock::gasMach2)
            .partials(Kernel.of(MovingShock::gasMach2ByMach1), Kernel.of(MovingShock::gasMach2ByGamma))
            .sources(ANDERSON.at("eqs. (7.16) and (7.17)"))
            .example("0.962", 2.0, 1.4)
            .cell("2*({mach1}-1)*({mach1}+1)/SQRT((2*{gamma}*{mach1}^2-{gamma}+1)*(({gamma}-1)*{mach1}^2+2))")
            .build();

    private static final FunctionEntry REFLECTED_SHOCK_MACH = NormalShock.FAMILY
            .entry("reflected_shock_mach")
            .title("Mach number of a shock reflected at a closed end")
            .formula("Mr = sqrt((2 gamma Ms^2 - (gamma-1)) / ((gamma-1) Ms^2 + 2))")
            .note("Its speed relative to the gas ahead of it, which the first shock has set in motion and heated,"
                    + " over the speed of sound there.")
            .takes(MACH1, GAMMA)
            .gives("Mr", "1", Interval.atLeast(1))
            .kernel(MovingShock::reflectedMach)
            .partials(Kernel.of(MovingShock::reflectedMachByMach1), Kernel.of(MovingShock::reflectedMachByGamma))
            .sources(ANDERSON.at("eq. (7.23), solved for the reflected shock"))
            .example("1.732", 2.0, 1.4)
            .cell("SQRT((2*{gamma}*{mach1}^2-{gamma}+1)/(({gamma}-1)*{mach1}^2+2))")
            .build();

    private static final FunctionEntry REFLECTED_SHOCK_P5_OVER_P1 = NormalShock.FAMILY
            .entry("reflected_shock_p5_over_p1")
            .title("Pressure behind a reflected shock over that ahead of the first one")
            .formula("p5/p1 = (1 + 2 gamma/(gamma+1) (Ms^2 - 1)) (1 + 2 gamma/(gamma+1) (Mr^2 - 1))")
            .note("The pressure at a closed end after the reflection.")
            .takes(MACH1, GAMMA)
            .gives("p5/p1", "1", Interval.atLeast(1))
            .kernel(MovingShock::p5OverP1)
            .partials(Kernel.of(MovingShock::p5OverP1ByMach1), Kernel.of(MovingShock::p5OverP1ByGamma))
            .sources(ANDERSON.at("eqs. (7.12) and (7.23)"))
            .example("15.00", 2.0, 1.4)
            .cell("(1+2*{gamma}/({gamma}+1)*({mach1}-1)*({mach1}+1))"
                    + "*(1+2*{gamma}*({mach1}-1)*({mach1}+1)/(({gamma}-1)*{mach1}^2+2))")
            .build();

    private static final FunctionEntry SHOCK_TUBE_P4_OVER_P1 = NormalShock.FAMILY
            .entry("shock_tube_p4_over_p1")
            .title("Pressure ratio over the diaphragm that drives a shock of this Mach number")
            .formula("p4/p1 = (1 + 2 gamma1/(gamma1+1) (Ms^2 - 1))"
                    + " (1 - (gamma4-1)/(gamma1+1) a1/a4 (Ms - 1/Ms))^(-2 gamma4/(gamma4-1))")
            .note("Both gases at rest, a tube of one area, a diaphragm that opens at once.")
            .takes(MACH1, GAMMA1, GAMMA4, A4_OVER_A1)
            .gives("p4/p1", "1", Interval.atLeast(1))
            .kernel(ShockTube::p4OverP1)
            .partials(ShockTube.ofRatio())
            .requires(
                    FaultKind.NO_SOLUTION,
                    "mach1",
                    row -> !Double.isNaN(ShockTube.p4OverP1(row[0], row[1], row[2], row[3])),
                    row -> "must be less than " + Numbers.brief(ShockTube.mach1Limit(row[1], row[2], row[3]))
                            + " (the shock that the driver gas would drive by expanding into vacuum)")
            .sources(ANDERSON.at("eq. (7.94)"))
            .example("33.71", 2.0, 1.4, 1.4, 1.0)
            .cell(CellForm.steps()
                    .helper("w", "({gamma4}-1)/(({gamma1}+1)*{a4_over_a1})*({mach1}-1/{mach1})")
                    .result("(1+2*{gamma1}/({gamma1}+1)*({mach1}-1)*({mach1}+1))"
                            + "*IF({w}<1,1-{w},NA())^(-2*{gamma4}/({gamma4}-1))"))
            .build();

    private static final FunctionEntry SHOCK_MACH_FROM_P4_OVER_P1 = NormalShock.FAMILY
            .entry("shock_mach_from_p4_over_p1")
            .title("Mach number of the shock that a pressure ratio over the diaphragm drives")
            .formula("the Ms for which shock_tube_p4_over_p1(Ms, gamma1, gamma4, a4_over_a1) = p4/p1")
            .note("Both gases at rest, a tube of one area, a diaphragm that opens at once.")
            .takes(P4_OVER_P1, GAMMA1, GAMMA4, A4_OVER_A1)
            .gives("Ms", "1", Interval.atLeast(1))
            .kernel(ShockTube::mach1)
            .partials(ShockTube.ofMach())
            .sources(ANDERSON.at("eq. (7.94)"))
            .example("1.608", 10.0, 1.4, 1.4, 1.0)
            .cell(ShockTube.cells())
            .build();

    static List<FunctionEntry> entries() {
        return List.of(
                MOVING_SHOCK_MACH,
                MOVING_SHOCK_GAS_MACH2,
                REFLECTED_SHOCK_MACH,
                REFLECTED_SHOCK_P5_OVER_P1,
                SHOCK_TUBE_P4_OVER_P1,
                SHOCK_MACH_FROM_P4_OVER_P1);
    }
}
