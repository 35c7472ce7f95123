package org.ductledger.exact;

import java.util.function.UnaryOperator;
import org.hipparchus.dfp.Dfp;
import org.hipparchus.dfp.DfpField;
import org.hipparchus.dfp.DfpMath;

/** Arithmetic to more than 40 digits (Hipparchus Dfp), in which tests evaluate published equations. */
public final class FortyDigits {
    private static final DfpField FIELD = new DfpField(64);

    private static final double RULE_DENSITY = 8;
    private static final int RULE_REACH = 28;

    private FortyDigits() {}

    /** Exactly this double. */
    public static Dfp of(double x) {
        return FIELD.newDfp(x);
    }

    /** The decimal number as written, to all its digits. */
    public static Dfp decimal(String digits) {
        return FIELD.newDfp(digits);
    }

    public static Dfp pi() {
        return FIELD.getPi();
    }

    public static Dfp exp(Dfp x) {
        return DfpMath.exp(x);
    }

    public static Dfp log(Dfp x) {
        return DfpMath.log(x);
    }

    /** x to the power y, x &gt; 0. */
    public static Dfp pow(Dfp x, Dfp y) {
        return x.equals(x.getOne()) ? x : exp(log(x).multiply(y));
    }

    /** The integral of a function without a singularity in between, by Takahasi and Mori's tanh-sinh rule. */
    public static Dfp integral(UnaryOperator<Dfp> f, Dfp from, Dfp to) {
        Dfp half = to.subtract(from).divide(2);
        Dfp sum = FIELD.getZero();
        Dfp quarterTurn = FIELD.getPi().divide(2);
        for (int i = -RULE_REACH; i <= RULE_REACH; i++) {
            Dfp t = exp(of(i / RULE_DENSITY));
            Dfp sinh = t.subtract(t.reciprocal()).divide(2);
            Dfp cosh = t.add(t.reciprocal()).divide(2);
            Dfp grown = exp(quarterTurn.multiply(sinh));
            Dfp spread = grown.add(grown.reciprocal()).divide(2);
            Dfp place =
                    grown.subtract(grown.reciprocal()).divide(2).divide(spread).add(1);
            Dfp weight = quarterTurn.multiply(cosh).divide(spread.multiply(spread));
            sum = sum.add(weight.multiply(f.apply(from.add(half.multiply(place)))));
        }
        return sum.multiply(half).divide(of(RULE_DENSITY));
    }

    /** How far a double is from the exact value, in units in the last place of that value; infinite for no finite one. */
    public static double ulps(double got, Dfp exact) {
        if (!Double.isFinite(got)) {
            return Double.POSITIVE_INFINITY;
        }
        double nearest = exact.toDouble();
        return of(got).subtract(exact).divide(of(Math.ulp(nearest))).abs().toDouble();
    }
}
