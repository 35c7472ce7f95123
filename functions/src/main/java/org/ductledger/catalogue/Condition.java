package org.ductledger.catalogue;

import java.util.function.Predicate;

/**
 * What arguments must fulfil together, beyond the interval of each. The kernel answers NaN or infinity wherever a
 * condition fails, so that it is looked at only for rows without a finite result, to say why.
 *
 * @param kind the fault it makes
 * @param argument the argument to blame
 * @param holds the test, over the arguments in the order of the entry and in coherent units
 * @param wording what is required, over the same arguments: {@code must be at most 0.8215 (the length to choking)}
 */
public record Condition(FaultKind kind, String argument, Predicate<double[]> holds, Wording wording) {
    /** What is required, worded for these arguments. */
    @FunctionalInterface
    public interface Wording {
        String of(double[] arguments);
    }
}
