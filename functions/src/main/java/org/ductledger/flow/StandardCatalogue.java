package org.ductledger.flow;

import java.util.List;
import java.util.stream.Stream;
import org.ductledger.catalogue.Catalogue;
import org.ductledger.catalogue.FunctionEntry;

/** The table of contents. */
public final class StandardCatalogue {
    /** The library's version; a changed value of a function is a new one. */
    public static final String VERSION = "1.0.0";

    private static final Catalogue CATALOGUE =
            new Catalogue(VERSION, families().flatMap(List::stream).toList());

    private StandardCatalogue() {}

    public static Catalogue get() {
        return CATALOGUE;
    }

    // spotless:off
    private static Stream<List<FunctionEntry>> families() {
        return Stream.of(
                IsentropicRatios.entries(),
                IsentropicInverses.entries(),
                AreaRule.entries(),
                FlowRates.entries(),
                NormalShock.entries(),
                MovingShock.entries(),
                ObliqueShock.entries(),
                Cone.entries(),
                Nozzle.entries(),
                Fan.entries(),
                Fanno.entries(),
                Rayleigh.entries(),
                Isothermal.entries(),
                Atmosphere.entries(),
                Gases.entries(),
                Diffuser.entries(),
                Vessel.entries(),
                FlowMeter.entries(),
                Contour.entries(),
                Conversions.entries());
    }
    // spotless:on
}
