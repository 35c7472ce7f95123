package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.TreeMap;
import java.util.function.Function;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

/** A table of published values in the test resources: each row has its inputs, its value as printed, and its source. */
final class PublishedTable {
    private final List<Row> rows;

    private PublishedTable(List<Row> rows) {
        this.rows = rows;
    }

    /** Reads {@code /reference/NAME}. */
    static PublishedTable read(String name) {
        try (CsvReader<NamedCsvRecord> csv = CsvReader.builder()
                .ofNamedCsvRecord(new InputStreamReader(
                        Objects.requireNonNull(PublishedTable.class.getResourceAsStream("/reference/" + name), name),
                        StandardCharsets.UTF_8))) {
            return new PublishedTable(csv.stream().map(Row::new).toList());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    Stream<Row> rows() {
        return rows.stream();
    }

    /**
     * Checks the rows that the answerer gives a value for, each within its tolerance; a value just half way to the next
     * printed one passes.
     *
     * @return how many rows were checked, and how many were not for each reason
     */
    Map<String, Integer> check(Function<Row, Answer> answerer) {
        Map<String, Integer> counts = new TreeMap<>();
        for (Row row : rows) {
            Answer answer = answerer.apply(row);
            if (answer.reason().isEmpty()) {
                double halfWay = Math.ulp(row.expected());
                assertEquals(row.expected(), answer.value(), row.tolerance() + halfWay + answer.slack(), row::toString);
            }
            counts.merge(answer.reason().isEmpty() ? "checked" : answer.reason(), 1, Integer::sum);
        }
        return counts;
    }

    /**
     * What the catalogue says to a row: a value, or why no function answers it.
     *
     * @param slack what the rounding of decimal inputs to doubles may change
     */
    record Answer(double value, double slack, String reason) {
        static Answer of(double value) {
            return of(value, 0);
        }

        static Answer of(double value, double slack) {
            return new Answer(value, slack, "");
        }

        static Answer none(String reason) {
            return new Answer(Double.NaN, 0, reason);
        }
    }

    /** One published value. */
    static final class Row {
        private final NamedCsvRecord csv;

        Row(NamedCsvRecord csv) {
            this.csv = csv;
        }

        String quantity() {
            return csv.getField("quantity");
        }

        String inputs() {
            return csv.getField("inputs");
        }

        double expected() {
            return Double.parseDouble(csv.getField("expected"));
        }

        /** The 25 digits of the published equation, as text; empty where it does not apply. */
        String exact() {
            return csv.getField("exact");
        }

        double tolerance() {
            String text = csv.getField("tolerance");
            return text.startsWith("rel ")
                    ? Double.parseDouble(text.substring(4)) * Math.abs(expected())
                    : Double.parseDouble(text);
        }

        /** The number of {@code NAME=number unit} in the inputs, its unit left off. */
        double number(String name) {
            return Double.parseDouble(decimal(name));
        }

        /** The same number as written. */
        String decimal(String name) {
            return input(name, "[-+0-9.eE]+");
        }

        /** The word of {@code NAME=word} in the inputs. */
        String word(String name) {
            return input(name, "\\w+");
        }

        private String input(String name, String form) {
            Matcher match = Pattern.compile("(?:^|; )" + Pattern.quote(name) + "=(" + form + ")")
                    .matcher(inputs());
            if (!match.find()) {
                throw new IllegalArgumentException("no " + name + " in " + this);
            }
            return match.group(1);
        }

        @Override
        public String toString() {
            return csv.getField("id") + " " + quantity() + " [" + inputs() + "] " + csv.getField("source") + ", "
                    + csv.getField("locator");
        }
    }
}
