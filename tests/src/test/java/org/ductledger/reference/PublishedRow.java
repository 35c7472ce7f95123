package org.ductledger.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;

/**
 * A published value with its source.
 *
 * @param inputs as the source gives them: {@code gamma=1.4; M=0.10}
 * @param expected as printed
 * @param tolerance half a unit of the last printed digit, absolute
 */
record PublishedRow(
        String id,
        String quantity,
        String inputs,
        double expected,
        double tolerance,
        String source,
        String locator,
        String provenance) {
    /**
     * What the decimal inputs cost: 1.4 or 1.001 is not exactly the double nearest to it, so that a value that is
     * published to more digits than a double holds is met to this relative difference (next to Mach 1 the rounding of
     * the Mach number is magnified a thousandfold).
     */
    private static final double ROUNDED_INPUTS = 1e-12;

    /** A value half way between two printed ones (14.125, printed 14.13) is half a unit away, give or take a rounding. */
    private static final double HALF_WAY = 1 + 1e-9;

    static List<PublishedRow> of(String resource) {
        InputStream stream = Objects.requireNonNull(PublishedRow.class.getResourceAsStream("/reference/" + resource));
        try (CsvReader<NamedCsvRecord> csv =
                CsvReader.builder().ofNamedCsvRecord(new InputStreamReader(stream, StandardCharsets.UTF_8))) {
            return csv.stream().map(PublishedRow::of).toList();
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    private static PublishedRow of(NamedCsvRecord row) {
        double expected = Double.parseDouble(row.getField("expected"));
        String tolerance = row.getField("tolerance");
        double absolute = tolerance.startsWith("rel ")
                ? Double.parseDouble(tolerance.substring(4)) * Math.abs(expected)
                : Double.parseDouble(tolerance);
        return new PublishedRow(
                row.getField("id"),
                row.getField("quantity"),
                row.getField("inputs"),
                expected,
                absolute,
                row.getField("source"),
                row.getField("locator"),
                row.getField("provenance"));
    }

    /** One of the inputs by its name, as in {@code M} of {@code gamma=1.4; M=0.10}. */
    double input(String name) {
        for (String part : inputs.split(";\\s*", -1)) {
            if (part.startsWith(name + "=")) {
                return Double.parseDouble(part.substring(name.length() + 1).replace(" (decimal, exact)", ""));
            }
        }
        throw new IllegalArgumentException(id + " has no input " + name + ": " + inputs);
    }

    boolean hasInput(String name) {
        return inputs.startsWith(name + "=") || inputs.contains("; " + name + "=");
    }

    void check(double value) {
        assertEquals(
                expected,
                value,
                Math.max(tolerance * HALF_WAY, ROUNDED_INPUTS * Math.abs(expected)),
                () -> id + ", " + quantity + " for " + inputs + ": " + source + ", " + locator + " (" + provenance
                        + ")");
    }
}
