package org.ductledger.catalogue;

/** The admissible values of one number; an end is taken or left out, and an infinite end means no limit. */
public record Interval(double lower, boolean lowerTaken, double upper, boolean upperTaken) {
    public Interval {
        if (!(lower <= upper)) {
            throw new IllegalArgumentException("lower end " + lower + " must not exceed upper end " + upper);
        }
        if ((lowerTaken && Double.isInfinite(lower)) || (upperTaken && Double.isInfinite(upper))) {
            throw new IllegalArgumentException("an infinite end is never taken: no value is infinite");
        }
        if ((lowerTaken ? lower : Math.nextUp(lower)) > (upperTaken ? upper : Math.nextDown(upper))) {
            throw new IllegalArgumentException("no number lies between " + lower + " and " + upper);
        }
    }

    public static Interval closed(double lower, double upper) {
        return new Interval(lower, true, upper, true);
    }

    public static Interval open(double lower, double upper) {
        return new Interval(lower, false, upper, false);
    }

    public static Interval openClosed(double lower, double upper) {
        return new Interval(lower, false, upper, true);
    }

    public static Interval closedOpen(double lower, double upper) {
        return new Interval(lower, true, upper, false);
    }

    public static Interval atLeast(double lower) {
        return new Interval(lower, true, Double.POSITIVE_INFINITY, false);
    }

    public static Interval above(double lower) {
        return new Interval(lower, false, Double.POSITIVE_INFINITY, false);
    }

    public static Interval atMost(double upper) {
        return new Interval(Double.NEGATIVE_INFINITY, false, upper, true);
    }

    public static Interval anyNumber() {
        return open(Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);
    }

    /** The least double inside: a check in accepting form, {@code x >= least() && x <= greatest()}, keeps NaN out. */
    public double least() {
        return lowerTaken ? lower : Math.nextUp(lower);
    }

    /** The greatest double inside. */
    public double greatest() {
        return upperTaken ? upper : Math.nextDown(upper);
    }

    public boolean contains(double x) {
        return x >= least() && x <= greatest();
    }

    /** Says in words what is required, as in {@code greater than 1 and at most 100}, with the ends in another unit. */
    public String inWords(Unit unit) {
        String suffix = unit.isOne() ? "" : " " + unit.symbol();
        String low = Double.isInfinite(lower)
                ? ""
                : (lowerTaken ? "at least " : "greater than ") + Numbers.brief(unit.fromCoherent(lower)) + suffix;
        String high = Double.isInfinite(upper)
                ? ""
                : (upperTaken ? "at most " : "less than ") + Numbers.brief(unit.fromCoherent(upper)) + suffix;
        if (low.isEmpty() && high.isEmpty()) {
            return "a finite number";
        }
        return low.isEmpty() ? high : high.isEmpty() ? low : low + " and " + high;
    }
}
