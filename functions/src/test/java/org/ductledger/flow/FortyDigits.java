package org.ductledger.flow;

import org.hipparchus.dfp.Dfp;
import org.hipparchus.dfp.DfpField;
import org.hipparchus.dfp.DfpMath;

/** Arithmetic to more than 40 digits (Hipparchus Dfp), in which tests evaluate published equations. */
final class FortyDigits {
    private static final DfpField FIELD = new DfpField(48);

    private FortyDigits() {}

    /** Exactly this double. */
    static Dfp of(double x) {
        return FIELD.newDfp(x);
    }

    /** The decimal number as written, to all its digits. */
    static Dfp decimal(String digits) {
        return FIELD.newDfp(digits);
    }

    static Dfp exp(Dfp x) {
        return DfpMath.exp(x);
    }

    static Dfp log(Dfp x) {
        return DfpMath.log(x);
    }

    /** x to the power y, x &gt; 0. */
    static Dfp pow(Dfp x, Dfp y) {
        return x.equals(x.getOne()) ? x : exp(log(x).multiply(y));
    }

    /** How far a double is from the exact value, in units in the last place of that value. */
    static double ulps(double got, Dfp exact) {
        double nearest = exact.toDouble();
        return of(got).subtract(exact).divide(of(Math.ulp(nearest))).abs().toDouble();
    }
}
