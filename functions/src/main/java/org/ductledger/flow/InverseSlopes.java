package org.ductledger.flow;

import org.ductledger.catalogue.Kernel;
import org.jspecify.annotations.Nullable;

/** The partial derivatives of an inverse, from those of its function: 1/f' by the given value, -f_gamma/f' by gamma. */
final class InverseSlopes {
    private InverseSlopes() {}

    static Kernel[] of(Kernel.Of2 inverse, Kernel.Of2 byMach, Kernel.Of2 byGamma) {
        return new Kernel[] {
            Kernel.of((given, gamma) -> 1 / byMach.at(inverse.at(given, gamma), gamma)),
            Kernel.of((given, gamma) -> byGammaAt(inverse.at(given, gamma), gamma, byMach, byGamma))
        };
    }

    /** With two branches, and {@code null} for the word that chooses. */
    static @Nullable Kernel[] ofBranches(Kernel.Of3 inverse, Kernel.Of2 byMach, Kernel.Of2 byGamma) {
        return new @Nullable Kernel[] {
            Kernel.of((given, gamma, branch) -> 1 / byMach.at(inverse.at(given, gamma, branch), gamma)),
            Kernel.of((given, gamma, branch) -> byGammaAt(inverse.at(given, gamma, branch), gamma, byMach, byGamma)),
            null
        };
    }

    /** 0 where gamma does not move M, as at M = 1 and at rest, though M may then be infinitely sensitive to the given. */
    private static double byGammaAt(double mach, double gamma, Kernel.Of2 byMach, Kernel.Of2 byGamma) {
        double slope = byGamma.at(mach, gamma);
        return slope == 0 ? 0 : -slope / byMach.at(mach, gamma);
    }
}
