package org.ductledger.ledger;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.ductledger.catalogue.Catalogue;
import org.jspecify.annotations.Nullable;

/** Evaluates ledgers against a catalogue, column by column. Thread-safe. */
public final class Evaluator {
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
        Map<String, double[]> done = new HashMap<>();
        List<Outcome> wanted = new ArrayList<>();
        Set<String> want = Set.copyOf(ledger.want());
        for (Step step : Plan.of(ledger, catalogue)) {
            Faults faults = new Faults(step);
            double[] result = evaluate(step, done, faults);
            done.put(step.call().id(), result);
            if (want.isEmpty() || want.contains(step.call().id())) {
                Column shown = shown(step, result, faults);
                wanted.add(new Outcome(step.call().id(), step.entry(), step.unit(), shown, faults.list()));
            }
        }
        return wanted;
    }

    /** The result in coherent units, as later calls take it; NaN in the rows with a fault. */
    private static double[] evaluate(Step step, Map<String, double[]> done, Faults faults) {
        double[][] arguments = new double[step.inputs().size()][];
        for (int i = 0; i < arguments.length; i++) {
            arguments[i] = coherent(step.inputs().get(i), done);
        }
        return new Rows(step, arguments, faults).compute();
    }

    private static double[] coherent(Step.Input input, Map<String, double[]> done) {
        Given.Values values = input.values();
        if (values == null) {
            return earlier(input.earlier(), done);
        }
        if (values.column() instanceof Column.Texts texts) {
            return texts.values().stream()
                    .mapToDouble(word -> place(word, input.argument().choices()))
                    .toArray();
        }
        double[] given = ((Column.Numbers) values.column()).values();
        return input.unit().isCoherent()
                ? given
                : Arrays.stream(given).map(input.unit()::toCoherent).toArray();
    }

    private static double[] earlier(@Nullable Step step, Map<String, double[]> done) {
        double[] result = step == null ? null : done.get(step.call().id());
        if (result == null) {
            throw new IllegalStateException("the plan let a reference through that has no result");
        }
        return result;
    }

    private static double place(@Nullable String word, List<String> choices) {
        int place = word == null ? -1 : choices.indexOf(word);
        return place < 0 ? Double.NaN : place;
    }

    private static Column shown(Step step, double[] result, Faults faults) {
        if (step.entry().result().isText()) {
            return words(step.entry().result().choices(), result);
        }
        if (step.unit().isCoherent()) {
            return new Column.Numbers(result);
        }
        double[] shown = Arrays.stream(result).map(step.unit()::fromCoherent).toArray();
        for (int i = 0; i < shown.length; i++) {
            if (Double.isInfinite(shown[i])) {
                faults.addBeyondDouble(i);
                shown[i] = Double.NaN;
            }
        }
        return new Column.Numbers(shown);
    }

    private static Column.Texts words(List<String> choices, double[] places) {
        List<@Nullable String> words = new ArrayList<>(places.length);
        for (double place : places) {
            words.add(Double.isNaN(place) ? null : choices.get((int) place));
        }
        return new Column.Texts(words);
    }
}
