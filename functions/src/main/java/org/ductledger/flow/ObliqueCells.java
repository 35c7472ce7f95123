package org.ductledger.flow;

import org.ductledger.catalogue.CellForm;

/** The oblique shock's functions as a spreadsheet computes them. */
final class ObliqueCells {
    private static final int STEPS = 6;

    /** The cubic in cot(shock angle), see {@link ObliqueAngle}, by its trigonometric roots. */
    static final CellForm SHOCK_ANGLE = CellForm.steps()
            .helper("t", "TAN(PI()/180*{deflection})")
            .helper("x", "({mach1}-1)*({mach1}+1)")
            .helper("b", "(1+({gamma}+1)/2*{mach1}^2)*{t}")
            .helper("e", "(1+({gamma}-1)/2*{mach1}^2)*{t}")
            .helper("h", "SQRT({b}^2+3*{x})")
            .helper("w", "IF({h}=0,0,-(2*{b}^3+9*{b}*{x}+27*{e})/(2*{h}^3))")
            .helper("phi", "ACOS(IF({w}<-1.000000000001,{w},MAX(-1,{w})))")
            .helper("s", "(2*{h}*COS(({phi}-IF({branch}=\"weak\",0,2*PI()))/3)-{b})/3")
            .result("180/PI()*IF({s}>1,ATAN(1/{s}),PI()/2-ATAN({s}))");

    static final CellForm DEFLECTION = CellForm.steps()
            .helper("beta", "PI()/180*{shock_angle}")
            .helper("x", "({mach1}*SIN({beta}))^2-1")
            .result("180/PI()*ATAN(2/TAN({beta})*IF({x}<-1E-12,NA(),MAX(0,{x}))"
                    + "/({mach1}^2*({gamma}+COS(2*{beta}))+2))");

    static final CellForm MACH1 = CellForm.steps()
            .helper("beta", "PI()/180*{shock_angle}")
            .helper("t", "TAN(PI()/180*{deflection})")
            .result("SQRT(2*(1/TAN({beta})+{t})/(SIN(2*{beta})-({gamma}+COS(2*{beta}))*{t}))");

    static final CellForm MACH2 = normal().helper("t", "1+2*({gamma}-1)/({gamma}+1)^2*({n}-1)*({gamma}+1/{n})")
            .result("SQRT((2+({gamma}-1)*{n})/(2*{gamma}*{n}-{gamma}+1)+({mach1}*COS(PI()/180*{shock_angle}))^2/{t})");

    static final CellForm ANGLE_AT_DEFLECTION_MAX = atDeflectionMax().result("180/PI()*ASIN(SQRT({s2}))");

    static final CellForm DEFLECTION_MAX = atDeflectionMax()
            .result("180/PI()*ATAN(2*SQRT(1/{s2}-1)*({mach1}^2*{s2}-1)/({mach1}^2*({gamma}+1-2*{s2})+2))");

    private ObliqueCells() {}

    /** The square of the Mach number normal to the shock, {n}; there is no shock below 1. */
    private static CellForm.Builder normal() {
        return CellForm.steps()
                .helper("x", "({mach1}*SIN(PI()/180*{shock_angle}))^2-1")
                .helper("n", "1+IF({x}<-1E-12,NA(),MAX(0,{x}))");
    }

    /** A ratio that {n} alone decides. */
    static CellForm across(String ofNormal) {
        return normal().result(ofNormal);
    }

    private static CellForm.Builder atDeflectionMax() {
        return CellForm.steps()
                .helper(
                        "s2",
                        "(({gamma}+1)*{mach1}^2-4+SQRT(({gamma}+1)*(({gamma}+1)*{mach1}^4+8*({gamma}-1)*{mach1}^2+16)))"
                                + "/(4*{gamma}*{mach1}^2)");
    }

    /** The quartic of {@link ObliqueLimits}, by steps of Newton. */
    static CellForm mach1AtDetachment() {
        CellForm.Builder cells = CellForm.steps()
                .helper("t", "TAN(PI()/180*MAX({deflection},0.0000001))")
                .helper("s0", "MIN(1,(({gamma}+1)/4*{t})^(1/3))");
        for (int i = 1; i <= STEPS; i++) {
            String s = "{s" + (i - 1) + "}";
            cells.helper(
                    "s" + i,
                    s + "-(({gamma}+1)*(1+" + s + "^4)-2*(3-{gamma})*" + s + "^2-4*" + s + "*(" + s
                            + "^2/{t}+{t}))/((4*({gamma}+1)*" + s + "^2-4*(3-{gamma}))*" + s + "-4*(3*" + s
                            + "^2/{t}+{t}))");
        }
        String s = "{s" + STEPS + "}";
        return cells.result("IF({deflection}>=180/PI()*ASIN(1/{gamma}),NA(),IF({deflection}=0,1,SQRT(1+" + s + "*(3*"
                + s + "+({gamma}+3)*{t})/(1-({gamma}+1)*{t}*" + s + "))))");
    }
}
