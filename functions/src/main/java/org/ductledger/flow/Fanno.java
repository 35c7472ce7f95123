package org.ductledger.flow;

import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.MACH;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;
import org.ductledger.numeric.LogDefect;
import org.ductledger.numeric.Rounding;

/** Fanno flow: a perfect gas in an adiabatic duct of constant area, with friction. The star is M = 1. */
final class Fanno {
    static final Chapter FAMILY = new Chapter("fanno", "Adiabatic duct flow with friction (Fanno)");

    /** Between this and its reciprocal M^2 may be squared again. */
    private static final double MOST_MACH = 1e70;

    private Fanno() {}

    /** The length in which the flow chokes, as f L/D with the Darcy factor; M &gt; 0. */
    static double flOverD(double mach, double gamma) {
        if (!(mach > 1 / MOST_MACH && mach < MOST_MACH)) {
            return mach > 1 ? flOverDLimit(gamma) : 1 / mach / mach / gamma;
        }
        double m = mach * mach;
        double mRest = Rounding.ofProduct(mach, mach);
        double sum = gamma + 1;
        double sumRest = Rounding.ofSum(gamma, 1);
        double d = sum * m;
        double dRest = Rounding.ofProduct(sum, m) + (sum * mRest + sumRest * m);
        double nRest = Rounding.ofSum(1, -m) - mRest;
        return scaled(LogDefect.ofQuotient(2 * (1 - m), 2 * nRest, d, dRest), gamma);
    }

    /** The length in which a flow of infinite Mach number chokes. */
    static double flOverDLimit(double gamma) {
        return scaled(LogDefect.ofQuotient(-2, 0, gamma + 1, Rounding.ofSum(gamma, 1)), gamma);
    }

    /** Times (gamma+1)/(2 gamma). */
    private static double scaled(double defect, double gamma) {
        return ((gamma + 1) * defect + Rounding.ofSum(gamma, 1) * defect) / (2 * gamma);
    }

    static double flOverDByMach(double mach, double gamma) {
        return -4 * (1 - mach) * (1 + mach) / (gamma * mach * mach * mach * stagnation(mach, gamma));
    }

    static double flOverDByGamma(double mach, double gamma) {
        double x = (1 - mach) * (1 + mach) / mach;
        return -(flOverD(mach, gamma) + 2 * x * x / stagnation(mach, gamma)) / (gamma * (gamma + 1));
    }

    /** 2 + (gamma-1) M^2: twice T0/T. */
    private static double stagnation(double mach, double gamma) {
        return 2 + (gamma - 1) * mach * mach;
    }

    static double tOverTstar(double mach, double gamma) {
        return (gamma + 1) / stagnation(mach, gamma);
    }

    static double tOverTstarByMach(double mach, double gamma) {
        double sum = stagnation(mach, gamma);
        return -2 * (gamma - 1) * (gamma + 1) * mach / (sum * sum);
    }

    static double tOverTstarByGamma(double mach, double gamma) {
        double sum = stagnation(mach, gamma);
        return 2 * (1 - mach) * (1 + mach) / (sum * sum);
    }

    static double pOverPstar(double mach, double gamma) {
        return Math.sqrt(tOverTstar(mach, gamma)) / mach;
    }

    static double pOverPstarByMach(double mach, double gamma) {
        double share = 1 + (gamma - 1) * mach * mach;
        return -2 * pOverPstar(mach, gamma) / mach * share / stagnation(mach, gamma);
    }

    static double pOverPstarByGamma(double mach, double gamma) {
        return pOverPstar(mach, gamma) * relativeByGamma(mach, gamma);
    }

    /** The relative change of V/V*, and of p/p*, by gamma. */
    private static double relativeByGamma(double mach, double gamma) {
        return (1 - mach) * (1 + mach) / ((gamma + 1) * stagnation(mach, gamma));
    }

    static double vOverVstar(double mach, double gamma) {
        return mach < 1
                ? mach * Math.sqrt(tOverTstar(mach, gamma))
                : Math.sqrt((gamma + 1) / ((gamma - 1) + 2 / mach / mach));
    }

    static double vOverVstarByMach(double mach, double gamma) {
        double t = tOverTstar(mach, gamma);
        return 2 * Math.sqrt(t) / stagnation(mach, gamma);
    }

    static double vOverVstarByGamma(double mach, double gamma) {
        return vOverVstar(mach, gamma) * relativeByGamma(mach, gamma);
    }

    static double rhoOverRhostar(double mach, double gamma) {
        return mach < 1
                ? Math.sqrt(stagnation(mach, gamma) / (gamma + 1)) / mach
                : Math.sqrt(((gamma - 1) + 2 / mach / mach) / (gamma + 1));
    }

    static double rhoOverRhostarByMach(double mach, double gamma) {
        return -2 * rhoOverRhostar(mach, gamma) / (mach * stagnation(mach, gamma));
    }

    static double rhoOverRhostarByGamma(double mach, double gamma) {
        return -rhoOverRhostar(mach, gamma) * relativeByGamma(mach, gamma);
    }

    /** The square of I/I* is 1 + (1 - M^2)^2 over 2 (gamma+1) M^2 T0/T: no digits are lost about M = 1. */
    static double impulseOverImpulsestar(double mach, double gamma) {
        if (mach < 0.5) {
            double root = Math.sqrt((gamma + 1) * stagnation(mach, gamma));
            return (1 + gamma * mach * mach) / root / mach;
        }
        double q = (1 - mach) / mach * ((1 + mach) / mach);
        return Math.sqrt(1 + q * q / ((gamma + 1) * ((gamma - 1) + 2 / mach / mach)));
    }

    static double impulseOverImpulsestarByMach(double mach, double gamma) {
        double slope = -2 * (1 - mach) * (1 + mach) / (mach * stagnation(mach, gamma));
        return impulseOverImpulsestar(mach, gamma) * slope / (1 + gamma * mach * mach);
    }

    static double impulseOverImpulsestarByGamma(double mach, double gamma) {
        double x = (1 - mach) * (1 + mach);
        double product = (gamma + 1) * stagnation(mach, gamma) * (1 + gamma * mach * mach);
        return -impulseOverImpulsestar(mach, gamma) * x * x / product;
    }

    static final Source FRICTION = Sources.SHAPIRO.at("chapter 6, Flow in constant-area ducts with friction");
    static final String DARCY = "f is the Darcy friction factor, 4 times the Fanning one, D the hydraulic"
            + " diameter 4 A/perimeter; f is taken constant along the duct.";
    private static final Argument MOVING = MACH.within(Interval.above(0));

    private static EntryBuilder forward(String name, Argument mach) {
        return FAMILY.entry(name).takes(mach, GAMMA).sources(FRICTION);
    }

    static final FunctionEntry FANNO_FL_OVER_D = forward("fanno_fl_over_d", MOVING)
            .title("Duct length in which a Fanno flow chokes")
            .formula("f L*/D = (1-M^2)/(gamma M^2) + (gamma+1)/(2 gamma) ln((gamma+1) M^2/(2+(gamma-1) M^2))")
            .note(DARCY)
            .gives("f L*/D", "1", Interval.atLeast(0))
            .kernel(Fanno::flOverD)
            .partials(Kernel.of(Fanno::flOverDByMach), Kernel.of(Fanno::flOverDByGamma))
            .example("5.29925", 0.3, 1.4)
            .cell(flOverDCell())
            .build();

    private static CellForm flOverDCell() {
        return CellForm.steps()
                .helper("y", "2*(1-{mach})*(1+{mach})/(({gamma}+1)*{mach}^2)")
                .result("({gamma}+1)/(2*{gamma})*" + LogDefectCells.defect("{y}"));
    }

    private static final FunctionEntry FANNO_T_OVER_TSTAR = forward("fanno_t_over_tstar", MACH)
            .title("Temperature over its value where the Fanno flow is sonic")
            .formula("T/T* = (gamma+1)/(2+(gamma-1) M^2)")
            .gives("T/T*", "1", Interval.atLeast(0))
            .kernel(Fanno::tOverTstar)
            .partials(Kernel.of(Fanno::tOverTstarByMach), Kernel.of(Fanno::tOverTstarByGamma))
            .example("1.1788", 0.3, 1.4)
            .cell("({gamma}+1)/(2+({gamma}-1)*{mach}^2)")
            .build();

    private static final FunctionEntry FANNO_P_OVER_PSTAR = forward("fanno_p_over_pstar", MOVING)
            .title("Pressure over its value where the Fanno flow is sonic")
            .formula("p/p* = sqrt((gamma+1)/(2+(gamma-1) M^2))/M")
            .gives("p/p*", "1", Interval.atLeast(0))
            .kernel(Fanno::pOverPstar)
            .partials(Kernel.of(Fanno::pOverPstarByMach), Kernel.of(Fanno::pOverPstarByGamma))
            .example("3.6191", 0.3, 1.4)
            .cell("SQRT(({gamma}+1)/(2+({gamma}-1)*{mach}^2))/{mach}")
            .build();

    /** At one mass flow and one T0 the sonic area and p0 change in inverse proportion. */
    private static final FunctionEntry FANNO_P0_OVER_P0STAR = forward("fanno_p0_over_p0star", MOVING)
            .title("Stagnation pressure over its value where the Fanno flow is sonic")
            .formula("p0/p0* = 1/M ((2+(gamma-1) M^2)/(gamma+1))^((gamma+1)/(2 (gamma-1)))")
            .note("The same function of M as the isentropic A/A*.")
            .gives("p0/p0*", "1", Interval.atLeast(1))
            .kernel(IsentropicRatios.AREA_RATIO.kernel())
            .partials(Kernel.of(IsentropicSlopes::areaRatioByMach), Kernel.of(IsentropicSlopes::areaRatioByGamma))
            .example("2.0351", 0.3, 1.4)
            .cell(IsentropicRatios.AREA_RATIO.cellForm())
            .build();

    private static final FunctionEntry FANNO_RHO_OVER_RHOSTAR = forward("fanno_rho_over_rhostar", MOVING)
            .title("Density over its value where the Fanno flow is sonic")
            .formula("rho/rho* = V*/V = sqrt((2+(gamma-1) M^2)/(gamma+1))/M")
            .gives("rho/rho*", "1", Interval.above(0))
            .kernel(Fanno::rhoOverRhostar)
            .partials(Kernel.of(Fanno::rhoOverRhostarByMach), Kernel.of(Fanno::rhoOverRhostarByGamma))
            .example("3.0702", 0.3, 1.4)
            .cell("SQRT((2+({gamma}-1)*{mach}^2)/({gamma}+1))/{mach}")
            .build();

    private static final FunctionEntry FANNO_V_OVER_VSTAR = forward("fanno_v_over_vstar", MACH)
            .title("Velocity over its value where the Fanno flow is sonic")
            .formula("V/V* = M sqrt((gamma+1)/(2+(gamma-1) M^2))")
            .gives("V/V*", "1", Interval.atLeast(0))
            .kernel(Fanno::vOverVstar)
            .partials(Kernel.of(Fanno::vOverVstarByMach), Kernel.of(Fanno::vOverVstarByGamma))
            .example("0.32572", 0.3, 1.4)
            .cell("{mach}*SQRT(({gamma}+1)/(2+({gamma}-1)*{mach}^2))")
            .build();

    private static final FunctionEntry FANNO_IMPULSE = forward("fanno_impulse_over_impulsestar", MOVING)
            .title("Impulse function over its value where the Fanno flow is sonic")
            .formula("I/I* = (1+gamma M^2)/(M sqrt((gamma+1)(2+(gamma-1) M^2))),  I = p A (1+gamma M^2)")
            .note("The wall's friction on the gas between two stations is the difference of their impulse functions.")
            .gives("I/I*", "1", Interval.atLeast(1))
            .kernel(Fanno::impulseOverImpulsestar)
            .partials(Kernel.of(Fanno::impulseOverImpulsestarByMach), Kernel.of(Fanno::impulseOverImpulsestarByGamma))
            .example("1.6979", 0.3, 1.4)
            .cell("(1+{gamma}*{mach}^2)/({mach}*SQRT(({gamma}+1)*(2+({gamma}-1)*{mach}^2)))")
            .build();

    static List<FunctionEntry> entries() {
        return List.of(
                FANNO_FL_OVER_D,
                FANNO_T_OVER_TSTAR,
                FANNO_P_OVER_PSTAR,
                FANNO_RHO_OVER_RHOSTAR,
                FANNO_P0_OVER_P0STAR,
                FANNO_V_OVER_VSTAR,
                FANNO_IMPULSE,
                FannoInverses.MACH_FROM_FANNO_FL_OVER_D,
                FannoInverses.MACH_FROM_FANNO_T_OVER_TSTAR,
                FannoInverses.MACH_FROM_FANNO_P_OVER_PSTAR,
                FannoInverses.MACH_FROM_FANNO_P0_OVER_P0STAR,
                FannoInverses.FANNO_MACH2,
                FrictionFactor.FRICTION_FACTOR_DARCY);
    }
}
