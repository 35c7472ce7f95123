package org.ductledger.flow;

import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.INLET_MACH;
import static org.ductledger.flow.Arguments.MACH;

import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;
import org.ductledger.numeric.Ending;
import org.ductledger.numeric.LogRest;
import org.ductledger.numeric.Rounding;
import org.ductledger.numeric.StagnationPower;

/** Rayleigh flow: a perfect gas heated or cooled in a duct of constant area, without friction. The star is M = 1. */
final class Rayleigh {
    static final Chapter FAMILY = new Chapter("rayleigh", "Frictionless duct flow with heat (Rayleigh)");

    /** Beyond this the 1 in 1 + gamma M^2 is below the last digit. */
    private static final double MOST_MACH = 1e70;

    /** ((2+(gamma-1) M^2)/(gamma+1))^(1/(gamma-1)). */
    private static final StagnationPower STAGNATION = new StagnationPower(0, 1, true, Ending.NOTHING);

    private Rayleigh() {}

    /** (1-M^2)/(1+gamma M^2): 1 - T0/T0* is its square. */
    static double distance(double mach, double gamma) {
        if (mach <= 1) {
            return (1 - mach) * (1 + mach) / (1 + gamma * mach * mach);
        }
        return (1 - mach) / mach * ((1 + mach) / mach) / (1 / mach / mach + gamma);
    }

    static double t0OverT0star(double mach, double gamma) {
        double q = distance(mach, gamma);
        if (Math.abs(q) < 0.5) {
            return 1 - q * q;
        }
        if (mach < 1) {
            double m = mach * mach;
            double sum = 1 + gamma * m;
            return (1 + gamma) * m * (2 + (gamma - 1) * m) / (sum * sum);
        }
        double w = 1 / mach / mach;
        double sum = w + gamma;
        return (1 + gamma) * (2 * w + (gamma - 1)) / (sum * sum);
    }

    static double t0OverT0starByMach(double mach, double gamma) {
        double sum = 1 + gamma * mach * mach;
        return 4 * (1 + gamma) * mach * (1 - mach) * (1 + mach) / (sum * sum * sum);
    }

    static double t0OverT0starByGamma(double mach, double gamma) {
        double q = distance(mach, gamma);
        return 2 * q * q * mach * mach / (1 + gamma * mach * mach);
    }

    /** The square of a/b = (1+gamma) M/(1+gamma M^2), each with what rounding took from it. */
    static double tOverTstar(double mach, double gamma) {
        if (mach > MOST_MACH) {
            double root = (1 + gamma) / gamma / mach;
            return root * root;
        }
        double a = (1 + gamma) * mach;
        double aRest = Rounding.ofProduct(1 + gamma, mach) + Rounding.ofSum(gamma, 1) * mach;
        double g = gamma * mach * mach;
        double b = 1 + g;
        double bRest = Rounding.ofSum(1, g) + Rounding.ofScaledSquare(gamma, mach);
        double root = a / b;
        double rest = (Math.fma(-root, b, a) + (aRest - root * bRest)) / b;
        return Math.fma(root, root, 2 * root * rest);
    }

    static double tOverTstarByMach(double mach, double gamma) {
        double m = gamma * mach * mach;
        double sum = 1 + m;
        return 2 * (1 + gamma) * (1 + gamma) * mach * (1 - m) / (sum * sum * sum);
    }

    static double tOverTstarByGamma(double mach, double gamma) {
        return 2 * tOverTstar(mach, gamma) * distance(mach, gamma) / (1 + gamma);
    }

    static double pOverPstar(double mach, double gamma) {
        return (1 + gamma) / (1 + gamma * mach * mach);
    }

    static double pOverPstarByMach(double mach, double gamma) {
        double sum = 1 + gamma * mach * mach;
        return -2 * gamma * (1 + gamma) * mach / (sum * sum);
    }

    static double pOverPstarByGamma(double mach, double gamma) {
        return distance(mach, gamma) / (1 + gamma * mach * mach);
    }

    static double vOverVstar(double mach, double gamma) {
        return (1 + gamma) / (1 / mach / mach + gamma);
    }

    static double vOverVstarByMach(double mach, double gamma) {
        double sum = 1 + gamma * mach * mach;
        return 2 * (1 + gamma) * mach / (sum * sum);
    }

    static double vOverVstarByGamma(double mach, double gamma) {
        return mach * mach * distance(mach, gamma) / (1 + gamma * mach * mach);
    }

    static double rhoOverRhostar(double mach, double gamma) {
        return (1 / mach / mach + gamma) / (1 + gamma);
    }

    static double rhoOverRhostarByMach(double mach, double gamma) {
        return -2 / ((1 + gamma) * mach * mach * mach);
    }

    static double rhoOverRhostarByGamma(double mach, double gamma) {
        return -(1 - mach) / mach * ((1 + mach) / mach) / ((1 + gamma) * (1 + gamma));
    }

    /**
     * The static pressure ratio times T0/T over its sonic value gives the first factor, 1 + (1-M^2)/(1+gamma M^2); the
     * rest is the power 1/(gamma-1) of the latter.
     */
    static double p0OverP0star(double mach, double gamma) {
        double w = 1 / mach / mach;
        double first = mach < 2 ? 1 + distance(mach, gamma) : (2 * w + (gamma - 1)) / (w + gamma);
        return Math.max(1, first * STAGNATION.at(mach, gamma));
    }

    static double p0OverP0starByMach(double mach, double gamma) {
        double m = mach * mach;
        double slope = -2 * gamma * mach * (1 - mach) * (1 + mach) / ((1 + gamma * m) * (2 + (gamma - 1) * m));
        return p0OverP0star(mach, gamma) * slope;
    }

    static double p0OverP0starByGamma(double mach, double gamma) {
        double x = (mach - 1) * (mach + 1);
        double share = x / (2 + (gamma - 1) * mach * mach);
        double steep = share * share * LogRest.of((gamma - 1) / (gamma + 1) * x);
        double direct = share * -distance(mach, gamma) / (gamma + 1);
        return p0OverP0star(mach, gamma) * (direct - steep);
    }

    /** The heating that chokes the flow, as the ratio of stagnation temperatures. */
    static double t02OverT01Max(double mach1, double gamma) {
        return 1 / t0OverT0star(mach1, gamma);
    }

    static double t02OverT01MaxByMach1(double mach1, double gamma) {
        double t0 = t0OverT0star(mach1, gamma);
        return -t0OverT0starByMach(mach1, gamma) / t0 / t0;
    }

    static double t02OverT01MaxByGamma(double mach1, double gamma) {
        double t0 = t0OverT0star(mach1, gamma);
        return -t0OverT0starByGamma(mach1, gamma) / t0 / t0;
    }

    static final Source HEATING = Sources.SHAPIRO.at("chapter 7, Flow in ducts with heating or cooling");
    private static final Argument MOVING = MACH.within(Interval.above(0));

    private static EntryBuilder forward(String name, Argument mach) {
        return FAMILY.entry(name).takes(mach, GAMMA).sources(HEATING);
    }

    static String t0Cell(String mach) {
        return "({gamma}+1)*M^2*(2+({gamma}-1)*M^2)/(1+{gamma}*M^2)^2".replace("M", mach);
    }

    private static final FunctionEntry RAYLEIGH_T0_OVER_T0STAR = forward("rayleigh_t0_over_t0star", MACH)
            .title("Stagnation temperature over its value where the Rayleigh flow is sonic")
            .formula("T0/T0* = (gamma+1) M^2 (2+(gamma-1) M^2)/(1+gamma M^2)^2")
            .gives("T0/T0*", "1", Interval.closed(0, 1))
            .kernel(Rayleigh::t0OverT0star)
            .partials(Kernel.of(Rayleigh::t0OverT0starByMach), Kernel.of(Rayleigh::t0OverT0starByGamma))
            .example("0.34686", 0.3, 1.4)
            .cell(t0Cell("{mach}"))
            .build();

    private static final FunctionEntry RAYLEIGH_T_OVER_TSTAR = forward("rayleigh_t_over_tstar", MACH)
            .title("Temperature over its value where the Rayleigh flow is sonic")
            .formula("T/T* = ((gamma+1) M/(1+gamma M^2))^2")
            .note(
                    "Its greatest value, (gamma+1)^2/(4 gamma), is at M = 1/sqrt(gamma): from there to M = 1 heating cools.")
            .gives("T/T*", "1", Interval.closed(0, 25.6))
            .kernel(Rayleigh::tOverTstar)
            .partials(Kernel.of(Rayleigh::tOverTstarByMach), Kernel.of(Rayleigh::tOverTstarByGamma))
            .example("0.40887", 0.3, 1.4)
            .cell("(({gamma}+1)*{mach}/(1+{gamma}*{mach}^2))^2")
            .build();

    private static final FunctionEntry RAYLEIGH_P_OVER_PSTAR = forward("rayleigh_p_over_pstar", MACH)
            .title("Pressure over its value where the Rayleigh flow is sonic")
            .formula("p/p* = (gamma+1)/(1+gamma M^2)")
            .gives("p/p*", "1", Interval.closed(0, 101))
            .kernel(Rayleigh::pOverPstar)
            .partials(Kernel.of(Rayleigh::pOverPstarByMach), Kernel.of(Rayleigh::pOverPstarByGamma))
            .example("2.1314", 0.3, 1.4)
            .cell("({gamma}+1)/(1+{gamma}*{mach}^2)")
            .build();

    static final FunctionEntry RAYLEIGH_P0_OVER_P0STAR = forward("rayleigh_p0_over_p0star", MACH)
            .title("Stagnation pressure over its value where the Rayleigh flow is sonic")
            .formula("p0/p0* = (gamma+1)/(1+gamma M^2) ((2+(gamma-1) M^2)/(gamma+1))^(gamma/(gamma-1))")
            .gives("p0/p0*", "1", Interval.atLeast(1))
            .kernel(Rayleigh::p0OverP0star)
            .partials(Kernel.of(Rayleigh::p0OverP0starByMach), Kernel.of(Rayleigh::p0OverP0starByGamma))
            .example("1.1985", 0.3, 1.4)
            .cell("({gamma}+1)/(1+{gamma}*{mach}^2)*((2+({gamma}-1)*{mach}^2)/({gamma}+1))^({gamma}/({gamma}-1))")
            .build();

    private static final FunctionEntry RAYLEIGH_V_OVER_VSTAR = forward("rayleigh_v_over_vstar", MACH)
            .title("Velocity over its value where the Rayleigh flow is sonic")
            .formula("V/V* = rho*/rho = (gamma+1) M^2/(1+gamma M^2)")
            .gives("V/V*", "1", Interval.closed(0, 2))
            .kernel(Rayleigh::vOverVstar)
            .partials(Kernel.of(Rayleigh::vOverVstarByMach), Kernel.of(Rayleigh::vOverVstarByGamma))
            .example("0.19183", 0.3, 1.4)
            .cell("({gamma}+1)*{mach}^2/(1+{gamma}*{mach}^2)")
            .build();

    private static final FunctionEntry RAYLEIGH_RHO_OVER_RHOSTAR = forward("rayleigh_rho_over_rhostar", MOVING)
            .title("Density over its value where the Rayleigh flow is sonic")
            .formula("rho/rho* = (1+gamma M^2)/((gamma+1) M^2)")
            .gives("rho/rho*", "1", Interval.above(0))
            .kernel(Rayleigh::rhoOverRhostar)
            .partials(Kernel.of(Rayleigh::rhoOverRhostarByMach), Kernel.of(Rayleigh::rhoOverRhostarByGamma))
            .example("5.2130", 0.3, 1.4)
            .cell("(1+{gamma}*{mach}^2)/(({gamma}+1)*{mach}^2)")
            .build();

    private static final FunctionEntry RAYLEIGH_T02_OVER_T01_MAX = forward("rayleigh_t02_over_t01_max", INLET_MACH)
            .title("Heating that chokes a Rayleigh flow, as T02/T01")
            .formula("T02/T01 = T0*/T01 = (1+gamma M1^2)^2/((gamma+1) M1^2 (2+(gamma-1) M1^2))")
            .note("More heat than that lowers M1 of a subsonic flow, or drives a shock out of a supersonic one.")
            .gives("T0*/T01", "1", Interval.atLeast(1))
            .kernel(Rayleigh::t02OverT01Max)
            .partials(Kernel.of(Rayleigh::t02OverT01MaxByMach1), Kernel.of(Rayleigh::t02OverT01MaxByGamma))
            .example("2.8830", 0.3, 1.4)
            .cell("1/(" + t0Cell("{mach1}") + ")")
            .build();

    static List<FunctionEntry> entries() {
        return List.of(
                RAYLEIGH_T0_OVER_T0STAR,
                RAYLEIGH_T_OVER_TSTAR,
                RAYLEIGH_P_OVER_PSTAR,
                RAYLEIGH_P0_OVER_P0STAR,
                RAYLEIGH_V_OVER_VSTAR,
                RAYLEIGH_RHO_OVER_RHOSTAR,
                RayleighInverses.MACH_FROM_RAYLEIGH_T0_OVER_T0STAR,
                RayleighInverses.MACH_FROM_RAYLEIGH_T_OVER_TSTAR,
                RayleighInverses.MACH_FROM_RAYLEIGH_P_OVER_PSTAR,
                RayleighInverses.MACH_FROM_RAYLEIGH_P0_OVER_P0STAR,
                RayleighInverses.RAYLEIGH_MACH2,
                RAYLEIGH_T02_OVER_T01_MAX);
    }
}
