package org.ductledger.flow;

import java.util.Map;
import org.ductledger.catalogue.CellForm;

/**
 * How plain cells compute a nozzle's flow, with no more iterations than the area relation needs: whether the flow is
 * choked shows in the area at which it would be sonic, and whether a station lies behind the shock shows in the
 * stagnation pressure that a shock at the station would leave.
 */
final class NozzleCells {
    private static final String LOW = "*(1-1E-9)";
    private static final String HIGH = "*(1+1E-9)";
    private static final String NO_SOLUTION = "\"no solution\"";
    private static final String PRESSURE_EXPONENT = "({gamma}/({gamma}-1))";

    private NozzleCells() {}

    private static CellForm.Builder begin() {
        return CellForm.steps().helper("c", "({gamma}-1)/({gamma}+1)").helper("k", "({gamma}+1)/(2*({gamma}-1))");
    }

    /** p/p0 of a squared Mach number. */
    private static String pressure(String square) {
        return "(1+({gamma}-1)/2*" + square + ")^(-" + PRESSURE_EXPONENT + ")";
    }

    /** p2/p1 over a normal shock, of a squared Mach number. */
    private static String shock(String square) {
        return "(1+(1+{c})*(" + square + "-1))";
    }

    /**
     * M^2 from an area ratio, as helper {@code name}: a seed right near the throat and far from it, then three steps of
     * third order in ln M^2, which leave less than 1e-12.
     */
    private static CellForm.Builder square(CellForm.Builder form, String name, String area, boolean supersonic) {
        String log = "{" + name + "_l}";
        String seed = supersonic
                ? "EXP(MIN({s}/(1+{q}*{s}),({l}-{k}*LN({c}))/({k}-0.5)))"
                : "EXP(MAX(-{s}*(1+{q}*{s}),2*({k}*LN(1-{c})-{l})))";
        form.helper(name + "_l", "LN(" + area + ")");
        form.helper(
                name + "_m0",
                seed.replace("{s}", "SQRT(4*{l}/(1-{c}))")
                        .replace("{q}", "((1-2*{c})/6)")
                        .replace("{l}", log));
        for (int i = 1; i <= 3; i++) {
            String m = "{" + name + "_m" + (i - 1) + "}";
            String rest = "{" + name + "_r" + i + "}";
            String z = "{c}*({m}-1)";
            String log1p = "IF(1+{z}=1,{z},{z}*LN(1+{z})/((1+{z})-1))".replace("{z}", z);
            form.helper(
                    name + "_r" + i,
                    ("{k}*" + log1p + "-LN({m})/2-{l}").replace("{m}", m).replace("{l}", log));
            String next = "IF({m}=1,1,{m}*EXP(-2*{r}*({m}-1)*(1+" + z + ")/((1-{c})*({m}-1)^2-{r}*{m})))";
            form.helper(i == 3 ? name : name + "_m" + i, next.replace("{m}", m).replace("{r}", rest));
        }
        return form;
    }

    /**
     * What the back pressure tells without an iteration: {@code t} = (gamma-1)/2 M^2 of flow that expands to it, {@code
     * sonic} = the sonic area of that flow over the throat's, {@code above} = how far, relatively, the back pressure lies
     * above the first critical one, {@code behind} = M^2 and {@code loss} = p02/p01 at the exit of choked flow with a
     * shock inside; 1/(Ae/At), below any shock's, where no such flow exists.
     */
    private static CellForm.Builder backPressure(CellForm.Builder form) {
        String h = "(-({gamma}-1)/{gamma}*LN({pb_over_p0}))";
        String n = "((1-{c})^{k}/({pb_over_p0}*{exit_area_ratio}))^2";
        return form.helper("t", "IF(EXP({h})=1,{h},(EXP({h})-1)*{h}/LN(EXP({h})))".replace("{h}", h))
                .helper("sonic", "{exit_area_ratio}*SQRT(2*{t}/({gamma}-1))*(({gamma}+1)/2/(1+{t}))^{k}")
                .helper(
                        "above",
                        "IF({pb_over_p0}=1,1,IF({exit_area_ratio}=1,LN({pb_over_p0})+" + PRESSURE_EXPONENT
                                + "*LN(({gamma}+1)/2),IF(2*{t}>={gamma}-1,-1,"
                                + "(1-{sonic})*2*{gamma}*{t}/({gamma}-1-2*{t}))))")
                .helper("behind", "2*{n}/(1+SQRT(1+2*({gamma}-1)*{n}))".replace("{n}", n))
                .helper(
                        "loss",
                        "IF({behind}>=1,1/{exit_area_ratio},MIN(1,{pb_over_p0}*(1+({gamma}-1)/2*{behind})^"
                                + PRESSURE_EXPONENT + "))");
    }

    /** The full supersonic expansion, {@code full} = M^2 at the exit, and {@code second}, the second critical ratio. */
    private static CellForm.Builder fullExpansion(CellForm.Builder form) {
        return square(form, "full", "{exit_area_ratio}", true)
                .helper("second", pressure("{full}") + "*" + shock("{full}"));
    }

    private static CellForm.Builder exit() {
        return fullExpansion(backPressure(begin()));
    }

    private static String byBackPressure(String shockInside, String shockAtExit, String beyond) {
        return "IF({pb_over_p0}>{second}" + HIGH + "," + shockInside + ",IF({pb_over_p0}>={second}" + LOW + ","
                + shockAtExit + "," + beyond + "))";
    }

    static CellForm firstCritical() {
        return square(begin(), "m", "{exit_area_ratio}", false).result(pressure("{m}"));
    }

    static CellForm secondCritical() {
        return square(begin(), "m", "{exit_area_ratio}", true).result(pressure("{m}") + "*" + shock("{m}"));
    }

    static CellForm thirdCritical() {
        return square(begin(), "m", "{exit_area_ratio}", true).result(pressure("{m}"));
    }

    static CellForm regime() {
        String beyond = "IF({pb_over_p0}>{third}" + HIGH + ",\"overexpanded\",IF({pb_over_p0}>={third}" + LOW
                + ",\"design\",\"underexpanded\"))";
        return fullExpansion(square(begin(), "m", "{exit_area_ratio}", false))
                .helper("first", pressure("{m}"))
                .helper("third", pressure("{full}"))
                .result("IF({pb_over_p0}=1,\"no_flow\",IF({pb_over_p0}>{first}" + HIGH
                        + ",\"unchoked\",IF({pb_over_p0}>={first}" + LOW + ",\"first_critical\","
                        + byBackPressure("\"shock_in_nozzle\"", "\"shock_at_exit\"", beyond) + ")))");
    }

    private static final String EXIT_SQUARE =
            "IF({above}>1E-9,2*{t}/({gamma}-1)," + byBackPressure("{behind}", "{behind}", "{full}") + ")";

    private static final String EXIT_PRESSURE = byBackPressure("{pb_over_p0}", "{pb_over_p0}", pressure("{full}"));

    static CellForm exitMach() {
        return exit().result("SQRT(" + EXIT_SQUARE + ")");
    }

    static CellForm exitPOverP0() {
        return fullExpansion(begin()).result(EXIT_PRESSURE);
    }

    static CellForm exitP0OverP0() {
        return exit().result("IF({above}>=-1E-9,1," + byBackPressure("{loss}", "{loss}", "1") + ")");
    }

    static CellForm shockMach1() {
        return shockMach(exit())
                .result("IF({above}>=-1E-9," + NO_SOLUTION + ","
                        + byBackPressure("{shock}", "SQRT({full})", NO_SOLUTION) + ")");
    }

    private static CellForm.Builder shockMach(CellForm.Builder form) {
        return form.use(
                "shock", NormalShockInverse.p02OverP01Cells(), Map.of("p02_over_p01", "{loss}", "gamma", "{gamma}"));
    }

    static CellForm shockAreaRatio() {
        return shockMach(exit())
                .result("IF({above}>=-1E-9," + NO_SOLUTION + ","
                        + byBackPressure(
                                "MIN({exit_area_ratio},(1+{c}*({shock}^2-1))^{k}/{shock})",
                                "{exit_area_ratio}",
                                NO_SOLUTION)
                        + ")");
    }

    static CellForm massFlowFraction() {
        return backPressure(begin()).result("IF({pb_over_p0}=1,0,IF({above}>1E-9,MIN(1,{sonic}),1))");
    }

    static CellForm thrustCoefficient() {
        return exit().helper("square", EXIT_SQUARE)
                .helper("p", EXIT_PRESSURE)
                .result("{exit_area_ratio}*({gamma}*{p}*{square}+({p}-{pb_over_p0}))");
    }

    static CellForm vacuumThrustCoefficient() {
        return square(begin(), "m", "{exit_area_ratio}", true)
                .result("{exit_area_ratio}*" + pressure("{m}") + "*(1+{gamma}*{m})");
    }

    /**
     * A station's flow as {@code ahead}, M^2 of supersonic flow there, and {@code rest}, M^2 of subsonic flow with the
     * sonic area that it has there; {@code takes} is 1 where the station has the former.
     */
    private static CellForm.Builder station() {
        CellForm.Builder form = square(backPressure(begin()), "ahead", "{area_ratio}", true);
        String rise = "LN(1+{c}*(1-{c})*({ahead}-1)*({gamma}+1/{ahead}))/({gamma}-1)"
                + "-LN(1+(1-{c})*({ahead}-1)/(1+{c}*({ahead}-1)))";
        form.helper(
                "takes",
                "IF(OR({station_side}=\"converging\",{above}>=-1E-9),0,IF(" + rise + "+LN({loss})<=1E-9*(1-1/"
                        + shock("{ahead}") + "),1,0))");
        String area = "IF({above}>1E-9,MAX(1,{area_ratio}/MAX({sonic},1E-9)),"
                + "IF(OR({station_side}=\"converging\",{above}>=-1E-9),{area_ratio},MAX(1,{area_ratio}*{loss})))";
        return square(form, "rest", area, false);
    }

    private static String atStation(String noFlow, String exit, String ahead, String rest) {
        return "IF(AND({station_side}=\"diverging\",{area_ratio}>{exit_area_ratio}" + HIGH + ")," + NO_SOLUTION
                + ",IF({pb_over_p0}=1," + noFlow + ",IF(AND({above}>1E-9,{area_ratio}={exit_area_ratio})," + exit
                + ",IF({takes}=1," + ahead + "," + rest + "))))";
    }

    static CellForm machAt() {
        return station().result(atStation("0", "SQRT(2*{t}/({gamma}-1))", "SQRT({ahead})", "SQRT({rest})"));
    }

    static CellForm pOverP0At() {
        String rest = "IF(OR({station_side}=\"converging\",{above}>=-1E-9),1,{loss})*" + pressure("{rest}");
        return station().result(atStation("1", "{pb_over_p0}", pressure("{ahead}"), rest));
    }
}
