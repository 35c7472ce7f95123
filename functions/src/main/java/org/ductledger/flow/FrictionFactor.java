package org.ductledger.flow;

import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;

/**
 * The Darcy friction factor of a round pipe. Turbulent, x = 1/sqrt(f) solves x + 2/ln 10 ln(a + b x) = 0 with a =
 * (k/D)/3.7 and b = 2.51/Re.
 */
final class FrictionFactor {
    /** The Reynolds number at which pipe flow is taken to turn turbulent. */
    private static final double LAMINAR_END = 2300;

    /** A usual 1/sqrt(f), to begin with. */
    private static final double USUAL = 6;

    private static final int STEPS = 3;

    /** 2/ln 10. */
    private static final double FACTOR = 0.8685889638065036;

    private FrictionFactor() {}

    static double darcy(double reynolds, double roughnessOverD) {
        if (reynolds < LAMINAR_END) {
            return 64 / reynolds;
        }
        double x = inverseRoot(roughnessOverD / 3.7, 2.51 / reynolds);
        return 1 / (x * x);
    }

    private static double inverseRoot(double a, double b) {
        double x = -FACTOR * StrictMath.log(a + b * USUAL);
        for (int i = 0; i < STEPS; i++) {
            double share = FACTOR * b / (a + b * x);
            double n = (x + FACTOR * StrictMath.log(a + b * x)) / (1 + share);
            x -= n * (1 - 0.5 * n * share * share / (FACTOR * (1 + share)));
        }
        return x;
    }

    static double darcyByReynolds(double reynolds, double roughnessOverD) {
        if (reynolds < LAMINAR_END) {
            return -64 / reynolds / reynolds;
        }
        double b = 2.51 / reynolds;
        double x = inverseRoot(roughnessOverD / 3.7, b);
        return -2 * b / reynolds / (x * x) * weight(roughnessOverD / 3.7, b, x);
    }

    static double darcyByRoughness(double reynolds, double roughnessOverD) {
        if (reynolds < LAMINAR_END) {
            return 0;
        }
        double b = 2.51 / reynolds;
        double x = inverseRoot(roughnessOverD / 3.7, b);
        return 2 / (3.7 * x * x * x) * weight(roughnessOverD / 3.7, b, x);
    }

    /** How much x falls as a + b x rises. */
    private static double weight(double a, double b, double x) {
        return FACTOR / (a + b * x + FACTOR * b);
    }

    private static final Source COLEBROOK = new Source(
            "C. F. Colebrook",
            "Turbulent flow in pipes, with particular reference to the transition region between the smooth and rough"
                    + " pipe laws, Journal of the Institution of Civil Engineers 11",
            1939,
            "pages 133-156");
    private static final Source MOODY = new Source(
            "L. F. Moody", "Friction factors for pipe flow, Transactions of the ASME 66", 1944, "pages 671-684");

    static final FunctionEntry FRICTION_FACTOR_DARCY = Fanno.FAMILY
            .entry("friction_factor_darcy")
            .title("Darcy friction factor of a pipe")
            .formula("f = 64/Re below Re = 2300; from there on 1/sqrt(f) = -2 log10((k/D)/3.7 + 2.51/(Re sqrt(f)))")
            .note(
                    "4 times the Fanning factor; laminar, then Colebrook-White, converged. Between Re = 2300 and 4000 pipe"
                            + " flow may be either and no formula is reliable: the turbulent value is given there, which is the"
                            + " larger (common practice). It steps up at 2300.")
            .takes(
                    Argument.number("reynolds", "Re", "1", Interval.above(0), "Reynolds number of the diameter"),
                    Argument.number(
                            "roughness_over_d",
                            "k/D",
                            "1",
                            Interval.closed(0, 0.05),
                            "equivalent sand roughness over diameter, as far as Moody's chart goes"))
            .gives("f", "1", Interval.above(0))
            .kernel(FrictionFactor::darcy)
            .partials(Kernel.of(FrictionFactor::darcyByReynolds), Kernel.of(FrictionFactor::darcyByRoughness))
            .sources(COLEBROOK, MOODY)
            .example("0.018514", 1e5, 1e-4)
            .cell(cell())
            .build();

    private static CellForm cell() {
        CellForm.Builder steps = CellForm.steps()
                .helper("a", "{roughness_over_d}/3.7")
                .helper("b", "2.51/MAX({reynolds},2300)")
                .helper("x0", "0-2*LOG10({a}+6*{b})");
        for (int i = 0; i < STEPS; i++) {
            String x = "{x" + i + "}";
            String sum = "({a}+{b}*" + x + ")";
            steps.helper("x" + (i + 1), x + "-(" + x + "+2*LOG10(" + sum + "))/(1+2*{b}/(LN(10)*" + sum + "))");
        }
        return steps.result("IF({reynolds}<2300,64/{reynolds},1/{x" + STEPS + "}^2)");
    }
}
