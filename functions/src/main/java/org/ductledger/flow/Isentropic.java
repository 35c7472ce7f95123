package org.ductledger.flow;

import static org.ductledger.flow.Arguments.GAMMA;
import static org.ductledger.flow.Arguments.MACH;

import java.util.List;
import org.ductledger.catalogue.Family;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;

/** Isentropic flow of a perfect gas: what the Mach number alone says of the state. */
final class Isentropic {
    private static final Family FAMILY = new Family("isentropic", "Isentropic flow of a perfect gas");

    private Isentropic() {}

    static double tOverT0(double mach, double gamma) {
        return 1 / (1 + 0.5 * (gamma - 1) * mach * mach);
    }

    static double tOverT0ByMach(double mach, double gamma) {
        double t = tOverT0(mach, gamma);
        return -(gamma - 1) * mach * t * t;
    }

    static double tOverT0ByGamma(double mach, double gamma) {
        double t = tOverT0(mach, gamma);
        return -0.5 * mach * mach * t * t;
    }

    private static final FunctionEntry T_OVER_T0 = FAMILY.entry("t_over_t0")
            .title("Static over stagnation temperature")
            .formula("T/T0 = 1 / (1 + (gamma-1)/2 M^2)")
            .takes(MACH, GAMMA)
            .gives("T/T0", "1", Interval.openClosed(0, 1))
            .kernel(Isentropic::tOverT0)
            .partials(Kernel.of(Isentropic::tOverT0ByMach), Kernel.of(Isentropic::tOverT0ByGamma))
            .sources(Sources.NACA_1135.at("eq. (43)"))
            .example("0.5556", 2.0, 1.4)
            .cell("1/(1+({gamma}-1)/2*{mach}^2)")
            .build();

    static List<FunctionEntry> entries() {
        return List.of(T_OVER_T0);
    }
}
