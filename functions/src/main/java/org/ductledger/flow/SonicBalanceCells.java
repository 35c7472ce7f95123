package org.ductledger.flow;

import java.util.Map;
import org.ductledger.catalogue.CellForm;

/**
 * How a plain spreadsheet solves log(1 + c (M^2-1)) / c - log M^2 = 2 L: a seed and two steps of order 4. In the
 * arithmetic of doubles they reach 1e-13 for A/A* up to 1e10 and any gamma up to 10.
 */
final class SonicBalanceCells {
    /** From a {@code square} near M^2 to a nearer one. */
    private static final CellForm STEP = CellForm.steps()
            .helper("x", "{square}-1")
            .helper("sum", "1+{c}*{x}")
            .helper("left", "{x}*IF({sum}=1,1,LN({sum})/({sum}-1))-LN({square})-2*{l}")
            .helper("newton", "IF({x}=0,0,{left}*{sum}/((1-{c})*{x}))")
            .helper("bend", "IF({x}=0,0,{square}/({sum}*{x}))")
            .helper("twist", "{bend}*(1-{c}-{c}*{square})/{sum}")
            .result("{square}*EXP({newton}*({bend}*{newton}/2-1)/(1-{bend}*{newton}+{twist}*{newton}^2/6))");

    /** Its arguments are {@code l}, {@code c} and the truth value {@code below}; it gives M^2. */
    static final CellForm MACH_SQUARE = CellForm.steps()
            .helper("s", "IF({below},-1,1)*SQRT({l}/(1-{c}))")
            .helper("second", "(2*{c}-1)/3")
            .helper("third", "5*(1-2*{c})^2/18-(1-6*{c}*(1-{c}))/6")
            .helper("far", "IF({below},{c}-1,{c})")
            .helper("pole", "{third}/({far}-{second})")
            .helper("seed", "EXP(2*{s}*(1+{s}*({pole}+{second}+{s}*{far}*{pole}))/(1+{pole}*{s}))")
            .use("one", STEP, Map.of("square", "{seed}", "l", "{l}", "c", "{c}"))
            .use("two", STEP, Map.of("square", "{one}", "l", "{l}", "c", "{c}"))
            .result("{two}");

    private SonicBalanceCells() {}
}
