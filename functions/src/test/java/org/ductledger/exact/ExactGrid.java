package org.ductledger.exact;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.flow.StandardCatalogue;

/**
 * A file of exact values in the resources {@code exact/}, and the function of the catalogue that it is of. Its header
 * says what each column is: the inputs are exact doubles, {@code expected} is the function of them to 25 digits.
 */
final class ExactGrid {
    /** 180/pi to 40 digits (OEIS A072097). */
    private static final BigDecimal DEGREES = new BigDecimal("57.29577951308232087679815481410517033240547246656");

    private final String file;
    private final String function;
    private final List<String> inputs;
    private final Map<String, String> words = new HashMap<>();
    private String firstFunction = "";
    private String passedArgument = "";
    private boolean inputInRadians;
    private boolean resultInRadians;

    private ExactGrid(String file, String function, List<String> inputs) {
        this.file = file;
        this.function = function;
        this.inputs = inputs;
    }

    /**
     * A file's row in the table.
     *
     * @param inputs the function's names for input1 and input2; a column gamma goes by its name
     */
    static ExactGrid of(String file, String function, String... inputs) {
        return new ExactGrid(file, function, List.of(inputs));
    }

    /** A word that is the same in all rows. */
    ExactGrid with(String argument, String word) {
        words.put(argument, word);
        return this;
    }

    /** The file has input1 in radians, the function takes degrees. */
    ExactGrid takingRadians() {
        inputInRadians = true;
        return this;
    }

    /** The file has the result in radians, the function gives degrees. */
    ExactGrid givingRadians() {
        resultInRadians = true;
        return this;
    }

    /** The inputs are those of a first function, whose result goes into this argument. */
    ExactGrid through(String first, String argument) {
        firstFunction = first;
        passedArgument = argument;
        return this;
    }

    String file() {
        return file;
    }

    /** One value against the exact one: the error in ulp, and the condition number of the function there. */
    record Comparison(String row, double error, double condition) {
        /** The error over that of a result computed without error from an input rounded to a double. */
        double relativeToCondition() {
            return error / (1 + condition);
        }
    }

    List<Comparison> compare() {
        FunctionEntry entry = StandardCatalogue.get().find(function).orElseThrow();
        try (CsvReader<NamedCsvRecord> csv = CsvReader.builder()
                .ofNamedCsvRecord(new InputStreamReader(
                        Objects.requireNonNull(ExactGrid.class.getResourceAsStream("/exact/" + file), file),
                        StandardCharsets.UTF_8))) {
            return csv.stream().map(row -> compare(entry, row)).toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private Comparison compare(FunctionEntry entry, NamedCsvRecord csv) {
        double[] row = row(entry, csv);
        BigDecimal expected = new BigDecimal(csv.getField("expected"));
        BigDecimal exact = resultInRadians ? expected.multiply(DEGREES) : expected;
        return new Comparison(
                csv.getField("region") + " gamma " + csv.getField("gamma") + " input " + csv.getField("input1") + " "
                        + csv.getField("input2"),
                Math.max(0, ulps(entry.kernel().at(row), exact) - passedOn(entry, row, exact)),
                Double.parseDouble(csv.getField("rel_condition_input1")));
    }

    private double[] row(FunctionEntry entry, NamedCsvRecord csv) {
        return entry.arguments().stream()
                .mapToDouble(argument -> value(argument, csv))
                .toArray();
    }

    /** What half an ulp of the value passed on, which rounding has cost it, is worth in ulp of the result. */
    private double passedOn(FunctionEntry entry, double[] row, BigDecimal exact) {
        int place = entry.place(passedArgument);
        return place < 0
                ? 0
                : Math.abs(0.5 * Math.ulp(row[place]) * entry.partial(place, row)) / Math.ulp(exact.doubleValue());
    }

    private double value(Argument argument, NamedCsvRecord csv) {
        if (argument.name().equals(passedArgument)) {
            FunctionEntry first = StandardCatalogue.get().find(firstFunction).orElseThrow();
            return first.kernel().at(row(first, csv));
        }
        if (argument.isText()) {
            return argument.choices().indexOf(words.get(argument.name()));
        }
        int place = inputs.indexOf(argument.name());
        if (place < 0) {
            return Double.parseDouble(csv.getField(argument.name() + "_hex"));
        }
        double given = Double.parseDouble(csv.getField("input" + (place + 1) + "_hex"));
        return place == 0 && inputInRadians
                ? new BigDecimal(given).multiply(DEGREES).doubleValue()
                : given;
    }

    /** The distance in units of the exact value's last place; infinite for no finite number. */
    private static double ulps(double computed, BigDecimal exact) {
        if (!Double.isFinite(computed)) {
            return Double.POSITIVE_INFINITY;
        }
        return new BigDecimal(computed)
                .subtract(exact)
                .abs()
                .divide(new BigDecimal(Math.ulp(exact.doubleValue())), MathContext.DECIMAL64)
                .doubleValue();
    }

    @Override
    public String toString() {
        return function + " " + words.values() + " on " + file;
    }
}
