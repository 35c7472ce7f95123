package org.ductledger.catalogue;

import java.nio.ByteBuffer;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import org.ductledger.flow.StandardCatalogue;

/** A digest of the bits of every function over fixed arguments, so that JVMs and versions can be compared by name. */
final class BitsDigest {
    private static final int WIDE_ROWS = 500;
    private static final int EXTREME_ROWS = 100;
    /** A function that integrates an equation at each row is asked for this part of the rows. */
    private static final int FEWER = 20;

    private BitsDigest() {}

    /** Prints a line for each function, after as many rounds as the one argument says: a compiler needs a few. */
    public static void main(String[] args) {
        List<String> lines = lines();
        for (int i = 1; i < Integer.parseInt(args[0]); i++) {
            if (!lines.equals(lines())) {
                throw new IllegalStateException("the bits changed from one round to the next");
            }
        }
        lines.forEach(System.out::println);
    }

    /** For each function its name, its revision and the digest of its results. */
    static List<String> lines() {
        return StandardCatalogue.get().entries().stream()
                .map(entry -> entry.name() + " " + entry.revision() + " " + digest(entry))
                .toList();
    }

    private static String digest(FunctionEntry entry) {
        Draws draws = new Draws(entry);
        List<double[]> rows = new ArrayList<>();
        int part = entry.family().name().equals("cone") ? FEWER : 1;
        for (int i = 0; i < (WIDE_ROWS + EXTREME_ROWS) / part; i++) {
            rows.add(i < WIDE_ROWS / part ? draws.wide() : draws.extreme());
        }
        double[][] columns = new double[entry.arguments().size()][rows.size()];
        for (int i = 0; i < rows.size(); i++) {
            for (int j = 0; j < columns.length; j++) {
                columns[j][i] = rows.get(i)[j];
            }
        }
        double[] result = new double[rows.size()];
        entry.kernel().apply(columns, 0, result.length, result);
        ByteBuffer bits = ByteBuffer.allocate(2 * Long.BYTES * result.length);
        for (int i = 0; i < result.length; i++) {
            bits.putLong(Double.doubleToLongBits(result[i]));
            bits.putLong(Double.doubleToLongBits(entry.kernel().at(rows.get(i))));
        }
        return HexFormat.of().formatHex(sha256(bits.array()), 0, 8);
    }

    private static byte[] sha256(byte[] bytes) {
        try {
            return MessageDigest.getInstance("SHA-256").digest(bytes);
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }
}
