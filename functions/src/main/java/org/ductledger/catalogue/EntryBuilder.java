package org.ductledger.catalogue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.Predicate;
import org.jspecify.annotations.Nullable;

/** Gathers what an entry says, and refuses one that says too little. */
public final class EntryBuilder {
    private final Family family;
    private final String name;
    private String title = "";
    private String formula = "";
    private String note = "";
    private List<Argument> arguments = List.of();

    private @Nullable Result result;

    private @Nullable Kernel kernel;

    private final List<Condition> conditions = new ArrayList<>();
    private List<Sensitivity> sensitivities = List.of();
    private List<Source> sources = List.of();

    private @Nullable Example example;

    private final List<Revision> revisions = new ArrayList<>();

    private @Nullable CellForm cellForm;

    /** Begins the entry of one of the family's functions. */
    public EntryBuilder(Family family, String name) {
        this.family = family;
        this.name = name;
    }

    public EntryBuilder title(String oneLine) {
        title = oneLine;
        return this;
    }

    /** The definition as one would write it on paper, in ASCII. */
    public EntryBuilder formula(String equation) {
        formula = equation;
        return this;
    }

    /** What a user must know beside the formula: which friction factor, which star, where a limit lies. */
    public EntryBuilder note(String sentence) {
        note = sentence;
        return this;
    }

    public EntryBuilder takes(Argument... inOrder) {
        arguments = List.of(inOrder);
        return this;
    }

    public EntryBuilder gives(String symbol, String unit, Interval range) {
        result = new Result(symbol, Unit.named(unit), range, List.of());
        return this;
    }

    /** The result is a word; the kernel returns its place in this list. */
    public EntryBuilder givesOneOf(String symbol, String... choices) {
        result = new Result(symbol, Unit.ONE, Interval.closed(0, choices.length - 1.0), List.of(choices));
        return this;
    }

    public EntryBuilder kernel(Kernel function) {
        kernel = function;
        return this;
    }

    public EntryBuilder kernel(Kernel.Of1 f) {
        return kernel(Kernel.of(f));
    }

    public EntryBuilder kernel(Kernel.Of2 f) {
        return kernel(Kernel.of(f));
    }

    public EntryBuilder kernel(Kernel.Of3 f) {
        return kernel(Kernel.of(f));
    }

    public EntryBuilder kernel(Kernel.Of4 f) {
        return kernel(Kernel.of(f));
    }

    public EntryBuilder kernel(Kernel.Of5 f) {
        return kernel(Kernel.of(f));
    }

    public EntryBuilder kernel(Kernel.Of6 f) {
        return kernel(Kernel.of(f));
    }

    public EntryBuilder kernel(Kernel.Of7 f) {
        return kernel(Kernel.of(f));
    }

    /**
     * What the arguments must fulfil together; the kernel answers NaN or infinity where it fails.
     *
     * @param wording begins after the argument's name: {@code must be ...}
     */
    public EntryBuilder requires(
            FaultKind kind, String argument, Predicate<double[]> holds, Condition.Wording wording) {
        conditions.add(new Condition(kind, argument, holds, wording));
        return this;
    }

    /** An argument that must stay below a bound that other arguments set. */
    public EntryBuilder requiresBelow(FaultKind kind, String argument, Kernel bound, String boundInWords) {
        return requiresBound(kind, argument, bound, "less than ", boundInWords, -1, false);
    }

    public EntryBuilder requiresAtMost(FaultKind kind, String argument, Kernel bound, String boundInWords) {
        return requiresBound(kind, argument, bound, "at most ", boundInWords, -1, true);
    }

    public EntryBuilder requiresAbove(FaultKind kind, String argument, Kernel bound, String boundInWords) {
        return requiresBound(kind, argument, bound, "greater than ", boundInWords, 1, false);
    }

    public EntryBuilder requiresAtLeast(FaultKind kind, String argument, Kernel bound, String boundInWords) {
        return requiresBound(kind, argument, bound, "at least ", boundInWords, 1, true);
    }

    private EntryBuilder requiresBound(
            FaultKind kind, String argument, Kernel bound, String relation, String inWords, int side, boolean taken) {
        int place = arguments.stream().map(Argument::name).toList().indexOf(argument);
        if (place < 0) {
            throw new IllegalArgumentException(name + ": no argument " + argument + " to bound");
        }
        String unit = arguments.get(place).unit().isOne()
                ? ""
                : " " + arguments.get(place).unit().symbol();
        return requires(
                kind,
                argument,
                row -> {
                    double distance = (row[place] - bound.at(row)) * side;
                    return taken ? distance >= 0 : distance > 0;
                },
                row -> "must be " + relation + Numbers.brief(bound.at(row)) + unit + " (" + inWords + ")");
    }

    /** The partial derivatives in the order of the arguments; {@code null} for one that is taken numerically. */
    public EntryBuilder partials(@Nullable Kernel... inOrder) {
        List<Sensitivity> list = new ArrayList<>();
        for (Kernel partial : inOrder) {
            list.add(partial == null ? new Sensitivity.Numeric() : new Sensitivity.Exact(partial));
        }
        sensitivities = list;
        return this;
    }

    public EntryBuilder sources(Source... all) {
        sources = List.of(all);
        return this;
    }

    /** Arguments in order, numbers as {@code double} in coherent units; the result as printed. */
    public EntryBuilder example(String printed, Object... inOrder) {
        example = new Example(Arrays.asList(inOrder), printed);
        return this;
    }

    public EntryBuilder cell(String closedFormula) {
        return cell(CellForm.closed(closedFormula));
    }

    public EntryBuilder cell(CellForm form) {
        cellForm = form;
        return this;
    }

    /** One revision; without any, an entry is at revision 1, its first release. */
    public EntryBuilder revision(int number, String reason) {
        revisions.add(new Revision(number, reason));
        return this;
    }

    /**
     * The entry.
     *
     * @throws IllegalStateException if a part is missing or does not fit the others, naming it
     */
    public FunctionEntry build() {
        if (!sensitivities.isEmpty() && sensitivities.size() != arguments.size()) {
            throw new IllegalStateException(name + " lacks a partial, or null, for each argument");
        }
        return new FunctionEntry(
                name,
                family,
                title,
                formula,
                note,
                arguments,
                said(result, "a result"),
                said(kernel, "a kernel"),
                conditions,
                eachSensitivity(),
                sources,
                said(example, "an example"),
                revisions.isEmpty() ? List.of(new Revision(1, "first release")) : revisions,
                said(cellForm, "a cell form"));
    }

    private <T> T said(@Nullable T part, String what) {
        if (part == null) {
            throw new IllegalStateException(name + " lacks " + what);
        }
        return part;
    }

    private List<Sensitivity> eachSensitivity() {
        List<Sensitivity> each = new ArrayList<>();
        for (int i = 0; i < arguments.size(); i++) {
            if (arguments.get(i).isText()) {
                each.add(new Sensitivity.None());
            } else {
                each.add(sensitivities.isEmpty() ? new Sensitivity.Numeric() : sensitivities.get(i));
            }
        }
        return each;
    }
}
