package org.ductledger.flow;

import org.ductledger.catalogue.CellForm;

/** y - ln(1 + y) and its roots in plain cells: what the length of a duct with friction leads to. */
final class LogDefectCells {
    /**
     * t = ln(1 + y) from y - ln(1 + y), as e^t - 1 - t = {defect}, on the side of {sign} = 1 or -1: a seed, three steps
     * of Halley, and about 0 the series instead.
     */
    static final CellForm ROOT_LOG = rootLog();

    private LogDefectCells() {}

    /** The formula of y - ln(1 + y) for a y that stands in a cell: {@code {y}}. */
    static String defect(String y) {
        String series = "Y^2*(1/2-Y*(1/3-Y*(1/4-Y*(1/5-Y*(1/6-Y*(1/7-Y/8))))))";
        return ("IF(ABS(Y)<0.02," + series + ",Y-LN(1+Y))").replace("Y", y);
    }

    private static CellForm rootLog() {
        CellForm.Builder steps = CellForm.steps()
                .helper("root", "SQRT(2*{defect})")
                .helper("k", "MAX({defect},0.0001)")
                .helper("s", "SQRT(2*{k})")
                .helper("t0", "IF({sign}>0,LN(1+{k}+{s}/(1+{s}/6)),0-{k}-{s}/(1+{s}/3))");
        for (int i = 0; i < 3; i++) {
            String t = "{t" + i + "}";
            String y = "({e" + i + "}-1)";
            String f = "(" + y + "-" + t + "-{k})";
            steps.helper("e" + i, "EXP(" + t + ")")
                    .helper("t" + (i + 1), t + "-2*" + f + "*" + y + "/(2*" + y + "^2-" + f + "*{e" + i + "})");
        }
        String near = "{sign}*{root}-{root}^2*(1/6-{sign}*{root}*(1/36-{sign}*{root}*(1/270-{sign}*{root}/4320)))";
        return steps.result("IF({defect}<0.0001," + near + ",{t3})");
    }
}
