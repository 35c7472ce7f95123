package org.ductledger.flow;

import org.ductledger.catalogue.CellForm;
import org.ductledger.numeric.GaussLegendre;

/**
 * The entropy rise over a normal shock, (s2-s1)/R = -ln(p02/p01), which is of third order in x = M1^2 - 1.
 *
 * <p>Its derivative by x has a closed form without a difference in it, (b d/2) x^2 / ((1+x)(1+b x)(1+c x)) with b, c, d
 * as in {@link NormalShock}. Up to {@link #STRONG} it is integrated from there in v = x/(2+x), by the rule of Gauss and
 * Legendre; its own error is far below rounding, since the nearest pole lies at v = 1.
 */
final class ShockEntropy {
    /** From this x on, the logarithms themselves lose no more than two bits. */
    private static final double STRONG = 8;

    private static final String[] CELL_POINTS = {
        "0.0469100770306680", "0.2307653449471585", "0.5", "0.7692346550528415", "0.9530899229693320"
    };

    private static final String[] CELL_WEIGHTS = {
        "0.118463442528095", "0.239314335249683", "0.284444444444444", "0.239314335249683", "0.118463442528095"
    };

    private ShockEntropy() {}

    /** 1 - c^2. */
    private static double bd(double gamma) {
        return NormalShock.b(gamma) * NormalShock.d(gamma);
    }

    static double rise(double mach1, double gamma) {
        double x = NormalShock.strength(mach1);
        if (x <= STRONG) {
            double c = NormalShock.c(gamma);
            double v = x / (2 + x);
            return 4 * bd(gamma) * v * v * v * integral(v, c);
        }
        double logT = mach1 > NormalShock.HUGE_MACH
                ? StrictMath.log(NormalShock.b(gamma) * NormalShock.c(gamma)) + 2 * StrictMath.log(mach1)
                : StrictMath.log1p(NormalShock.heating(mach1, gamma));
        return logT / (gamma - 1) - StrictMath.log1p(NormalShock.compression(mach1, gamma));
    }

    private static double integral(double v, double c) {
        double sum = 0;
        for (int i = 0; i < GaussLegendre.POINTS; i++) {
            sum += 0.5 * GaussLegendre.weight(i) * density(0.5 + 0.5 * GaussLegendre.node(i), v, c);
        }
        return sum;
    }

    private static double density(double t, double v, double c) {
        double u = v * t;
        double q = 1 + 2 * c * u;
        return t * t / ((1 - u * u) * (q * q - u * u));
    }

    static double riseByMach(double mach1, double gamma) {
        double r = 1 / (mach1 * mach1);
        double share = (mach1 - 1) / mach1 * (1 + 1 / mach1);
        double cd = NormalShock.c(gamma) * NormalShock.d(gamma);
        return bd(gamma) * share * share / (mach1 * (r + cd * share * (gamma + r)));
    }

    /** All terms of the integrand have one sign, so that weak shocks lose nothing here either. */
    static double riseByGamma(double mach1, double gamma) {
        double x = NormalShock.strength(mach1);
        if (x <= STRONG) {
            double d = NormalShock.d(gamma);
            double v = x / (2 + x);
            return -2 * d * d * v * v * v * integralByC(v, NormalShock.c(gamma), bd(gamma));
        }
        return riseByGammaOfStrong(mach1, gamma);
    }

    private static double integralByC(double v, double c, double bd) {
        double sum = 0;
        for (int i = 0; i < GaussLegendre.POINTS; i++) {
            sum += 0.5 * GaussLegendre.weight(i) * densityByC(0.5 + 0.5 * GaussLegendre.node(i), v, c, bd);
        }
        return sum;
    }

    private static double densityByC(double t, double v, double c, double bd) {
        double u = v * t;
        double q = 1 + 2 * c * u;
        return density(t, v, c) * (2 * c + bd * 4 * u * q / (q * q - u * u));
    }

    /** ln(T2/T1)/(gamma-1) - ln(rho2/rho1), differentiated with T2/T1 - 1 = (gamma-1) y. */
    private static double riseByGammaOfStrong(double mach1, double gamma) {
        double d = NormalShock.d(gamma);
        double r = 1 / (mach1 * mach1);
        double w = 1 / (gamma - 1);
        double heating = NormalShock.heating(mach1, gamma);
        double rho = NormalShock.rho2OverRho1(mach1, gamma);
        double yByGamma = 0.5 * d * d * NormalShock.strength(mach1) * (1 - d * (gamma + r));
        return -w * w * NormalShockSlopes.logLessRatio(heating)
                + yByGamma / (1 + heating)
                + 0.5 * d * d * rho * (1 - r);
    }

    /** Weak shocks by the rule with five points, strong ones by the logarithms. */
    static CellForm cells() {
        CellForm.Builder form = CellForm.steps()
                .helper("c", "({gamma}-1)/({gamma}+1)")
                .helper("x", "({mach1}-1)*({mach1}+1)")
                .helper("v", "{x}/(2+{x})");
        for (int i = 0; i < CELL_POINTS.length; i++) {
            String u = "({v}*" + CELL_POINTS[i] + ")";
            String poles = "(1-U^2)*((1+2*{c}*U)^2-U^2)".replace("U", u);
            form.helper("f" + (i + 1), CELL_WEIGHTS[i] + "*" + CELL_POINTS[i] + "^2/(" + poles + ")");
        }
        return form.result("IF({x}<0.3,4*(1-{c}^2)*{v}^3*({f1}+{f2}+{f3}+{f4}+{f5}),"
                + "LN(1+{c}*(1-{c})*{x}*({gamma}+1/{mach1}^2))/({gamma}-1)-LN(1+(1-{c})*{x}/(1+{c}*{x})))");
    }
}
