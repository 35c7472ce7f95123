package org.ductledger.flow;

import java.util.Map;
import org.ductledger.catalogue.CellForm;

/** The fan's inverses as a spreadsheet computes them: the kernel's seed, and three steps of Halley. */
final class FanCells {
    private static final int STEPS = 3;

    /** Of the arguments prandtl_meyer_angle and gamma. */
    static final CellForm MACH_FROM_ANGLE = steps("{prandtl_meyer_angle}").result("SQRT(1+{y" + STEPS + "}^2)");

    /** Of the arguments mach1, turn and gamma. */
    static final CellForm MACH2 = after().result("{mach2}");

    private FanCells() {}

    /** What a fan does to the state, by its temperature ratio {t}. */
    static CellForm after(String ofTemperatureRatio) {
        return after().helper("t", "(2+({gamma}-1)*{mach1}^2)/(2+({gamma}-1)*{mach2}^2)")
                .result(ofTemperatureRatio);
    }

    private static CellForm.Builder after() {
        return CellForm.steps()
                .helper(
                        "nu1",
                        "180/PI()*(SQRT(({gamma}+1)/({gamma}-1))"
                                + "*ATAN(SQRT(({gamma}-1)/({gamma}+1)*({mach1}-1)*({mach1}+1)))"
                                + "-ATAN(SQRT(({mach1}-1)*({mach1}+1))))")
                .use(
                        "mach2",
                        MACH_FROM_ANGLE,
                        Map.of(
                                "prandtl_meyer_angle",
                                "IF({nu1}+{turn}<-1E-9,NA(),MAX(0,{nu1}+{turn}))",
                                "gamma",
                                "{gamma}"));
    }

    /** Below p = 0.001 the seed is right to the last digits that the angle has, and no step is taken. */
    private static CellForm.Builder steps(String angle) {
        CellForm.Builder cells = CellForm.steps()
                .helper("nu", "PI()/180*" + angle)
                .helper("c", "({gamma}-1)/({gamma}+1)")
                .helper("b", "SQRT(1/{c})")
                .helper("kappa", "2/({gamma}-1+SQRT(({gamma}-1)*({gamma}+1)))")
                .helper("share", "{nu}/(PI()/2*{kappa})")
                .helper("p", "(1.5*({gamma}+1)*{nu})^(1/3)")
                .helper("pmax", "(0.75*PI()*({gamma}+1)*{kappa})^(1/3)")
                .helper("beta", "((1/{c}-1)/(PI()/2*{kappa}*{pmax})-(1+{c})*{pmax}^2/5)/{pmax}^4")
                .helper("y0", "{p}*(1-{share}+{p}^2*((1+{c})/5+{beta}*{p}^2))/(1-{share})");
        for (int i = 1; i <= STEPS; i++) {
            String y = "{y" + (i - 1) + "}";
            String newton = "{n" + i + "}";
            cells.helper(
                            "n" + i,
                            "IF({p}<0.001,0,({kappa}*ATAN(" + y + "/{b})-ATAN({kappa}*" + y + "/{b}/(1+" + y
                                    + "^2/{b}))-{nu})*(1+" + y + "^2)*(1+{c}*" + y + "^2)/((1-{c})*" + y + "^2))")
                    .helper(
                            "y" + i,
                            "IF({p}<0.001,{y0}," + y + "-" + newton + "/(1-" + newton + "*(1-{c}*" + y + "^4)/(" + y
                                    + "*(1+" + y + "^2)*(1+{c}*" + y + "^2))))");
        }
        return cells;
    }
}
