package org.ductledger.architecture;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaMethodCall;
import java.util.Set;

/** Calls of the methods of Math whose last bit may differ between machines and JIT levels. */
final class NotTheSameBits extends DescribedPredicate<JavaMethodCall> {
    private static final Set<String> METHODS = Set.of(
            "pow", "exp", "log", "log10", "log1p", "expm1", "sin", "cos", "tan", "asin", "acos", "atan", "atan2",
            "sinh", "cosh", "tanh", "cbrt", "hypot");

    NotTheSameBits() {
        super("calls a method of Math whose last bit may differ between machines");
    }

    @Override
    public boolean test(JavaMethodCall call) {
        return call.getTargetOwner().isEquivalentTo(Math.class)
                && METHODS.contains(call.getTarget().getName());
    }
}
