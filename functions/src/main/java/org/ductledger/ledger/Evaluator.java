package org.ductledger.ledger;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.ductledger.catalogue.Catalogue;
import org.ductledger.catalogue.Kernel;
import org.jspecify.annotations.Nullable;

/** Evaluates ledgers against a catalogue, column by column. Thread-safe. */
public final class Evaluator {
    /** From this many rows on, a column is computed on all processors, in blocks. */
    private static final int PARALLEL_ROWS = 16_384;

    private static final int BLOCK_ROWS = 8_192;

    private final Catalogue catalogue;

    public Evaluator(Catalogue catalogue) {
        this.catalogue = catalogue;
    }

    public Catalogue catalogue() {
        return catalogue;
    }

    /**
     * Evaluates the calls in their order. A row that cannot be computed has a fault in its outcome and spoils no other
     * row, except those of later calls that lean on it.
     *
     * @return the outcomes that the ledger wants, in the order of its calls
     * @throws LedgerRefusedException if the ledger as a whole is unsound: a name, a unit, a reference or a length
     */
    public List<Outcome> evaluate(Ledger ledger) throws LedgerRefusedException {
        Map<String, Evaluated> done = new HashMap<>();
        List<Outcome> wanted = new ArrayList<>();
        for (Plan.Step step : Plan.of(ledger, catalogue)) {
            Evaluated evaluated = evaluate(step, done);
            done.put(step.call().id(), evaluated);
            if (ledger.want().isEmpty() || ledger.want().contains(step.call().id())) {
                wanted.add(evaluated.outcome());
            }
        }
        return wanted;
    }

    /** A result in coherent units, as later calls take it, and its outcome. */
    private record Evaluated(Column.Numbers coherent, Outcome outcome) {}

    private static Evaluated evaluate(Plan.Step step, Map<String, Evaluated> done) {
        Faults faults = new Faults(step);
        double[][] arguments = new double[step.inputs().size()][];
        for (int i = 0; i < arguments.length; i++) {
            Plan.Input input = step.inputs().get(i);
            Given.Values values = input.values();
            if (values != null) {
                arguments[i] = coherent(values.column(), input);
                faults.checkGiven(i, arguments[i], values.column());
            } else {
                Evaluated earlier = earlier(input, done);
                arguments[i] = earlier.coherent().values();
                faults.checkReferred(i, arguments[i], earlier.outcome());
            }
        }
        double[] result = new double[step.rows()];
        apply(step.entry().kernel(), arguments, result);
        faults.settle(arguments, result);
        return new Evaluated(
                new Column.Numbers(result),
                new Outcome(step.call().id(), step.entry(), step.unit(), shown(step, result), faults.list()));
    }

    private static Evaluated earlier(Plan.Input input, Map<String, Evaluated> done) {
        Plan.Step step = input.earlier();
        Evaluated evaluated = step == null ? null : done.get(step.call().id());
        if (evaluated == null) {
            throw new IllegalStateException("the plan let a reference through that has no result");
        }
        return evaluated;
    }

    private static double[] coherent(Column column, Plan.Input input) {
        if (column instanceof Column.Texts texts) {
            return texts.values().stream()
                    .mapToDouble(word -> place(word, input.argument().choices()))
                    .toArray();
        }
        double[] values = ((Column.Numbers) column).values();
        return input.unit().isCoherent()
                ? values
                : Arrays.stream(values).map(input.unit()::toCoherent).toArray();
    }

    private static double place(@Nullable String word, List<String> choices) {
        int place = word == null ? -1 : choices.indexOf(word);
        return place < 0 ? Double.NaN : place;
    }

    private static void apply(Kernel kernel, double[][] arguments, double[] result) {
        int rows = result.length;
        if (rows < PARALLEL_ROWS) {
            kernel.apply(arguments, 0, rows, result);
            return;
        }
        int blocks = (rows + BLOCK_ROWS - 1) / BLOCK_ROWS;
        IntStream.range(0, blocks)
                .parallel()
                .forEach(b -> kernel.apply(arguments, b * BLOCK_ROWS, Math.min(rows, (b + 1) * BLOCK_ROWS), result));
    }

    private static Column shown(Plan.Step step, double[] result) {
        if (step.entry().result().isText()) {
            List<String> choices = step.entry().result().choices();
            List<@Nullable String> words = new ArrayList<>(result.length);
            for (double place : result) {
                words.add(Double.isNaN(place) ? null : choices.get((int) place));
            }
            return new Column.Texts(words);
        }
        return new Column.Numbers(
                step.unit().isCoherent()
                        ? result
                        : Arrays.stream(result).map(step.unit()::fromCoherent).toArray());
    }
}
