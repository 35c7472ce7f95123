package org.ductledger.flow;

import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.MACH;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;

/** Supersonic tunnels, inlets and diffusers: how far the passage may close, and what pressure comes back. */
final class Diffuser {
    private static final Chapter FAMILY = new Chapter("diffuser", "Tunnel start, inlet contraction, pressure recovery");

    private Diffuser() {}

    static double startThroatRatio(double mach, double gamma) {
        return 1 / NormalShock.p02OverP01(mach, gamma);
    }

    private static double startByMach(double mach, double gamma) {
        double ratio = startThroatRatio(mach, gamma);
        return -ratio * ratio * NormalShockSlopes.p02OverP01ByMach(mach, gamma);
    }

    private static double startByGamma(double mach, double gamma) {
        double ratio = startThroatRatio(mach, gamma);
        return -ratio * ratio * NormalShockSlopes.p02OverP01ByGamma(mach, gamma);
    }

    static double selfStartContraction(double mach, double gamma) {
        return Isentropic.areaRatio(NormalShock.mach2(mach, gamma), gamma);
    }

    private static double selfStartByMach(double mach, double gamma) {
        return IsentropicSlopes.areaRatioByMach(NormalShock.mach2(mach, gamma), gamma)
                * NormalShockSlopes.mach2ByMach(mach, gamma);
    }

    private static double selfStartByGamma(double mach, double gamma) {
        double mach2 = NormalShock.mach2(mach, gamma);
        return IsentropicSlopes.areaRatioByGamma(mach2, gamma)
                + IsentropicSlopes.areaRatioByMach(mach2, gamma) * NormalShockSlopes.mach2ByGamma(mach, gamma);
    }

    /** 1 - p/p0, without loss at small Mach numbers. */
    private static double drop(double mach, double gamma) {
        double p = Isentropic.pOverP0(mach, gamma);
        return mach > 1 ? 1 - p : Isentropic.impactPressureOverP(mach, gamma) * p;
    }

    static double pRecovery(double mach, double p02OverP01, double gamma) {
        return p02OverP01 == 1 ? 1 : 1 - (1 - p02OverP01) / drop(mach, gamma);
    }

    private static double pRecoveryByMach(double mach, double p02OverP01, double gamma) {
        double drop = drop(mach, gamma);
        return -(1 - p02OverP01) / (drop * drop) * IsentropicSlopes.pOverP0ByMach(mach, gamma);
    }

    private static double pRecoveryByLoss(double mach, double p02OverP01, double gamma) {
        return 1 / drop(mach, gamma);
    }

    private static double pRecoveryByGamma(double mach, double p02OverP01, double gamma) {
        double drop = drop(mach, gamma);
        return -(1 - p02OverP01) / (drop * drop) * IsentropicSlopes.pOverP0ByGamma(mach, gamma);
    }

    static double pitotInletRecovery(double mach, double gamma) {
        return mach > 1 ? NormalShock.p02OverP01(mach, gamma) : 1;
    }

    private static double pitotByMach(double mach, double gamma) {
        return mach > 1 ? NormalShockSlopes.p02OverP01ByMach(mach, gamma) : 0;
    }

    private static double pitotByGamma(double mach, double gamma) {
        return mach > 1 ? NormalShockSlopes.p02OverP01ByGamma(mach, gamma) : 0;
    }

    private static final Argument TEST_MACH =
            MACH.named("mach", "M", "Mach number ahead of the contraction").within(Interval.atLeast(1));
    private static final Argument P02_OVER_P01 = Argument.number(
            "p02_over_p01",
            "p02/p01",
            "1",
            Interval.openClosed(0, 1),
            "stagnation pressure behind over the one ahead of the losses");

    private static final Source KANTROWITZ_DONALDSON = new Source(
            "A. Kantrowitz and C. duP. Donaldson",
            "NACA ACR L5D20: Preliminary Investigation of Supersonic Diffusers",
            1945,
            "starting contraction ratio");
    private static final Source ANDERSON =
            new Source("J. D. Anderson", "Modern Compressible Flow, 3rd edition", 2003, "section 5.5 and example 5.7");
    private static final Source WHITE = new Source(
            "F. M. White", "Fluid Mechanics, 7th edition", 2011, "section 6.11, pressure-recovery coefficient");

    private static final String SHOCK_LOSS_CELL =
            "(({gamma}+1)*{mach}^2/(({gamma}-1)*{mach}^2+2))^({gamma}/({gamma}-1))"
                    + "*(({gamma}+1)/(2*{gamma}*{mach}^2-({gamma}-1)))^(1/({gamma}-1))";
    private static final String AREA_RATIO_CELL =
            "((2+({gamma}-1)*{m})/({gamma}+1))^(({gamma}+1)/(2*({gamma}-1)))/SQRT({m})";

    private static final FunctionEntry TUNNEL_START_THROAT_RATIO = FAMILY.entry("tunnel_start_throat_ratio")
            .title("Second over first throat area that lets a supersonic tunnel start")
            .formula("At2/At1 = p01/p02 of a normal shock at the test Mach number")
            .note("Start by the passage of a normal shock, at worst at the test section's Mach number. Ideal: the"
                    + " boundary layers ask for more.")
            .takes(TEST_MACH, GAMMA)
            .gives("At2/At1", "1", Interval.atLeast(1))
            .kernel(Diffuser::startThroatRatio)
            .partials(Kernel.of(Diffuser::startByMach), Kernel.of(Diffuser::startByGamma))
            .sources(ANDERSON)
            .example("2.004", 2.5, 1.4)
            .cell("1/(" + SHOCK_LOSS_CELL + ")")
            .build();

    private static final FunctionEntry INLET_SELF_START_CONTRACTION = FAMILY.entry("inlet_self_start_contraction")
            .title("Greatest contraction of an inlet that starts by itself")
            .formula("A1/At = A/A* at the Mach number behind a normal shock at M")
            .note(
                    "Capture area over throat area, internal contraction; the limit of Kantrowitz. A normal shock in front"
                            + " of the entry, the throat just choked.")
            .takes(TEST_MACH, GAMMA)
            .gives("A1/At", "1", Interval.atLeast(1))
            .kernel(Diffuser::selfStartContraction)
            .partials(Kernel.of(Diffuser::selfStartByMach), Kernel.of(Diffuser::selfStartByGamma))
            .sources(KANTROWITZ_DONALDSON)
            .example("1.216", 2.0, 1.4)
            .cell(CellForm.steps()
                    .helper("m", "(2/({mach}^2*({gamma}-1))+1)/(2*{gamma}/({gamma}-1)-1/{mach}^2)")
                    .result(AREA_RATIO_CELL))
            .build();

    private static final FunctionEntry INLET_ISENTROPIC_CONTRACTION = FAMILY.entry("inlet_isentropic_contraction")
            .title("Contraction of an inlet that brings the flow to Mach 1 without loss")
            .formula("A1/At = A/A* at M")
            .note("Capture area over throat area: the greatest contraction that a started inlet can swallow.")
            .takes(TEST_MACH, GAMMA)
            .gives("A1/At", "1", Interval.atLeast(1))
            .kernel(Isentropic::areaRatio)
            .partials(Kernel.of(IsentropicSlopes::areaRatioByMach), Kernel.of(IsentropicSlopes::areaRatioByGamma))
            .sources(Sources.NACA_1135.at("eq. (80)"), KANTROWITZ_DONALDSON)
            .example("1.688", 2.0, 1.4)
            .cell(CellForm.steps().helper("m", "{mach}^2").result(AREA_RATIO_CELL))
            .build();

    private static final FunctionEntry DIFFUSER_P_RECOVERY = FAMILY.entry("diffuser_p_recovery")
            .title("Pressure recovery of a diffuser that brings the flow to rest")
            .formula("Cp = (p02 - p1)/(p01 - p1), p1/p01 at M")
            .note("The rise of static pressure over the greatest one possible: 1 without losses, 0 where all of the"
                    + " impact pressure is lost, less if p02 < p1. Not the ratio to q1.")
            .takes(MACH.within(Interval.above(0)), P02_OVER_P01, GAMMA)
            .gives("Cp", "1", Interval.atMost(1))
            .kernel(Diffuser::pRecovery)
            .partials(
                    Kernel.of(Diffuser::pRecoveryByMach),
                    Kernel.of(Diffuser::pRecoveryByLoss),
                    Kernel.of(Diffuser::pRecoveryByGamma))
            .sources(WHITE)
            .example("0.680", 2.0, 0.7209, 1.4)
            .cell(recoveryCells())
            .build();

    /** A cell has neither log1p nor expm1: the loss of ln(1 + x) is divided out, 1 - exp(-y) has its series. */
    private static CellForm recoveryCells() {
        return CellForm.steps()
                .helper("x", "({gamma}-1)/2*{mach}^2")
                .helper("w", "1+{x}")
                .helper("y", "{gamma}/({gamma}-1)*IF({w}=1,{x},{x}*LN({w})/({w}-1))")
                .helper(
                        "drop",
                        "IF({y}>0.05,1-EXP(-{y})," + "{y}*(1-{y}/2*(1-{y}/3*(1-{y}/4*(1-{y}/5*(1-{y}/6*(1-{y}/7)))))))")
                .result("1-(1-{p02_over_p01})/{drop}");
    }

    private static final FunctionEntry PITOT_INLET_RECOVERY = FAMILY.entry("pitot_inlet_recovery")
            .title("Stagnation pressure recovery of a pitot inlet")
            .formula("p02/p01 of a normal shock at M, 1 up to M = 1")
            .note("The shock stands in front of the entry; losses of the subsonic duct behind it come on top.")
            .takes(MACH, GAMMA)
            .gives("p02/p01", "1", Interval.closed(0, 1))
            .kernel(Diffuser::pitotInletRecovery)
            .partials(Kernel.of(Diffuser::pitotByMach), Kernel.of(Diffuser::pitotByGamma))
            .sources(Sources.NACA_1135.at("eq. (99)"))
            .example("0.7209", 2.0, 1.4)
            .cell("IF({mach}<=1,1," + SHOCK_LOSS_CELL + ")")
            .build();

    static List<FunctionEntry> entries() {
        return List.of(
                TUNNEL_START_THROAT_RATIO,
                INLET_SELF_START_CONTRACTION,
                INLET_ISENTROPIC_CONTRACTION,
                DIFFUSER_P_RECOVERY,
                PITOT_INLET_RECOVERY);
    }
}
