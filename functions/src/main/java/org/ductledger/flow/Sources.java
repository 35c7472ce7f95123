package org.ductledger.flow;

import org.ductledger.catalogue.Source;

/** The works that several families lean on. */
final class Sources {
    static final Source NACA_1135 = new Source(
            "Ames Research Staff", "NACA Report 1135: Equations, Tables, and Charts for Compressible Flow", 1953, "");

    private Sources() {}
}
