package org.ductledger.flow;

import org.ductledger.catalogue.CellForm;

/**
 * The expansibility of ISO 5167 for nozzles and Venturi tubes and its slopes, in forms that lose nothing as p2/p1 goes
 * to 1. With r = p2/p1, L = ln r, e = (gamma-1)/gamma, w = r^(2/gamma), b = beta^4:
 * eps^2 = w (1 - r^e)/(e (1 - r)) (1 - b)/(1 - b w).
 */
final class Expansibility {
    private static final int TERMS = 14;

    private Expansibility() {}

    static double of(double pressureRatio, double diameterRatio, double gamma) {
        double drop = 1 - pressureRatio;
        if (drop == 0) {
            return 1;
        }
        double log = StrictMath.log1p(-drop);
        double e = (gamma - 1) / gamma;
        double work = StrictMath.expm1(e * log) / (e * -drop);
        double rest = rest(diameterRatio);
        double speed = rest / (rest + (1 - rest) * -StrictMath.expm1(2 / gamma * log));
        return Math.sqrt(StrictMath.exp(2 / gamma * log) * work * speed);
    }

    /** 1 - beta^4. */
    private static double rest(double diameterRatio) {
        return (1 - diameterRatio) * (1 + diameterRatio) * (1 + diameterRatio * diameterRatio);
    }

    /** 1 - beta^4 r^(2/gamma). */
    private static double restAtThroat(double log, double diameterRatio, double gamma) {
        double fourth = diameterRatio * diameterRatio * diameterRatio * diameterRatio;
        return rest(diameterRatio) - fourth * StrictMath.expm1(2 / gamma * log);
    }

    /** exp(x) - 1 - x for |x| &lt; 0.3. */
    private static double expm1LessX(double x) {
        double sum = 0;
        for (int n = TERMS; n > 2; n--) {
            sum = x / n * (1 + sum);
        }
        return 0.5 * x * x * (1 + sum);
    }

    static double byPressureRatio(double pressureRatio, double diameterRatio, double gamma) {
        double drop = 1 - pressureRatio;
        double log = StrictMath.log1p(-drop);
        double e = (gamma - 1) / gamma;
        double ofSpeed = 2 / (gamma * pressureRatio * restAtThroat(log, diameterRatio, gamma));
        double y = e * log;
        double difference = -expm1LessX(y) + y * StrictMath.expm1(y) - e * StrictMath.exp(y) * expm1LessX(-log);
        double ofWork = drop == 0 ? -0.5 / gamma : difference / (-StrictMath.expm1(y) * drop);
        return 0.5 * of(pressureRatio, diameterRatio, gamma) * (ofSpeed + ofWork);
    }

    static double byDiameterRatio(double pressureRatio, double diameterRatio, double gamma) {
        double log = StrictMath.log(pressureRatio);
        double cube = diameterRatio * diameterRatio * diameterRatio;
        return of(pressureRatio, diameterRatio, gamma)
                * 2
                * cube
                * StrictMath.expm1(2 / gamma * log)
                / (rest(diameterRatio) * restAtThroat(log, diameterRatio, gamma));
    }

    static double byGamma(double pressureRatio, double diameterRatio, double gamma) {
        if (pressureRatio == 1) {
            return 0;
        }
        double log = StrictMath.log(pressureRatio);
        double e = (gamma - 1) / gamma;
        double y = e * log;
        double ofWork = (expm1LessX(y) - y * StrictMath.expm1(y)) / (-e * StrictMath.expm1(y));
        double ofSpeed = -2 * log / restAtThroat(log, diameterRatio, gamma);
        return of(pressureRatio, diameterRatio, gamma) * 0.5 / (gamma * gamma) * (ofWork + ofSpeed);
    }

    /** Below a drop of 0.002 the series of (1 - r^e)/(e (1 - r)), since a cell has no expm1. */
    static CellForm cells() {
        return CellForm.steps()
                .helper("drop", "1-{pressure_ratio}")
                .helper("e", "({gamma}-1)/{gamma}")
                .helper(
                        "work",
                        "IF({drop}<0.002,1+(1-{e})*{drop}/2*(1+(2-{e})*{drop}/3*(1+(3-{e})*{drop}/4*(1+(4-{e})*{drop}/5))),"
                                + "(1-{pressure_ratio}^{e})/({e}*{drop}))")
                .helper("w", "{pressure_ratio}^(2/{gamma})")
                .result("SQRT({w}*{work}*(1-{diameter_ratio}^4)/(1-{diameter_ratio}^4*{w}))");
    }
}
