package org.ductledger.benchmark;

import java.util.Random;
import org.ductledger.catalogue.Kernel;
import org.ductledger.flow.StandardCatalogue;

/** Argument columns drawn from a fixed seed, and the catalogue's kernels. */
final class Columns {
    private static final long SEED = 4_717;

    private Columns() {}

    static Kernel kernel(String name) {
        return StandardCatalogue.get().find(name).orElseThrow().kernel();
    }

    static double[] drawn(int rows, double low, double high) {
        return new Random(SEED).doubles(rows, low, high).toArray();
    }

    /** One gamma for all rows, or one drawn for each. */
    static double[] gammas(boolean oneGamma, int rows) {
        return oneGamma ? new double[] {1.4} : new Random(SEED + 1).doubles(rows, 1.05, 1.667).toArray();
    }

    static double at(double[] column, int row) {
        return column[column.length == 1 ? 0 : row];
    }
}
