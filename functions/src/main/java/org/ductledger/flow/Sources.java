package org.ductledger.flow;

import org.ductledger.catalogue.Source;

/** The works that several families lean on. */
final class Sources {
    static final Source NACA_1135 = new Source(
            "Ames Research Staff", "NACA Report 1135: Equations, Tables, and Charts for Compressible Flow", 1953, "");

    static final Source SUTTON_BIBLARZ =
            new Source("G. P. Sutton and O. Biblarz", "Rocket Propulsion Elements, 8th edition", 2010, "");
    static final Source SHAPIRO = new Source(
            "A. H. Shapiro", "The Dynamics and Thermodynamics of Compressible Fluid Flow, volume I", 1953, "");

    private Sources() {}
}
