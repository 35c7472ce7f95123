package org.ductledger.catalogue;

import java.util.List;
import java.util.Set;
import java.util.TreeSet;

/**
 * Everything the catalogue knows of one function; help, page, errors, workbooks and tests are rendered from it.
 *
 * @param name lower snake case, by the grammar of the catalogue
 * @param family the family it belongs to
 * @param title one line
 * @param formula the definition as one would write it on paper, in ASCII
 * @param note what a user must know beside the formula; may be empty
 * @param arguments in their order
 * @param result its symbol, unit and range
 * @param kernel the arithmetic, in coherent units
 * @param conditions what the arguments must fulfil together
 * @param sensitivities one for each argument, in their order
 * @param sources where the definition comes from
 * @param example an executable one
 * @param revisions from the first to the current one
 * @param cellForm how a plain spreadsheet computes it
 */
public record FunctionEntry(
        String name,
        Family family,
        String title,
        String formula,
        String note,
        List<Argument> arguments,
        Result result,
        Kernel kernel,
        List<Condition> conditions,
        List<Sensitivity> sensitivities,
        List<Source> sources,
        Example example,
        List<Revision> revisions,
        CellForm cellForm) {
    private static final int LONGEST_NAME = 40;

    public FunctionEntry {
        arguments = List.copyOf(arguments);
        conditions = List.copyOf(conditions);
        sensitivities = List.copyOf(sensitivities);
        sources = List.copyOf(sources);
        revisions = List.copyOf(revisions);
        require(
                name,
                name.matches("[a-z][a-z0-9]*(_[a-z0-9]+)+") && name.length() <= LONGEST_NAME,
                "a name by the grammar");
        require(name, !title.isEmpty() && !formula.isEmpty(), "a title and a formula");
        require(name, kernel.arity() == arguments.size(), "a kernel of " + arguments.size() + " arguments");
        require(name, sensitivities.size() == arguments.size(), "a sensitivity for each argument");
        require(name, !sources.isEmpty(), "a source");
        Set<String> names = new TreeSet<>();
        arguments.forEach(argument -> names.add(argument.name()));
        require(name, names.size() == arguments.size(), "a name of its own for each argument");
        require(name, !revisions.isEmpty(), "a revision");
        for (int i = 0; i < revisions.size(); i++) {
            require(name, revisions.get(i).number() == i + 1, "revisions that count up from 1");
        }
        conditions.forEach(condition ->
                require(name, names.contains(condition.argument()), "the argument " + condition.argument()));
        sensitivities.forEach(s -> require(
                name,
                !(s instanceof Sensitivity.Exact exact) || exact.derivative().arity() == names.size(),
                "a partial of " + names.size() + " arguments"));
        checkExample(name, arguments, example);
        checkCellForm(name, names, cellForm);
    }

    private static void checkExample(String name, List<Argument> arguments, Example example) {
        require(name, example.arguments().size() == arguments.size(), "an example with every argument");
        for (int i = 0; i < arguments.size(); i++) {
            Argument argument = arguments.get(i);
            Object given = example.arguments().get(i);
            boolean fits = argument.isText()
                    ? argument.choices().contains(given)
                    : given instanceof Double x && argument.interval().contains(x);
            require(name, fits, "an example with an admissible " + argument.name());
        }
    }

    private static void checkCellForm(String name, Set<String> arguments, CellForm form) {
        Set<String> known = new TreeSet<>(arguments);
        for (CellForm.Helper helper : form.helpers()) {
            require(
                    name,
                    known.containsAll(CellForm.holes(helper.formula())),
                    "known names in its cell form's helper " + helper.name());
            require(name, known.add(helper.name()), "a new name for its cell form's helper " + helper.name());
        }
        require(name, known.containsAll(CellForm.holes(form.formula())), "known names in its cell form");
    }

    private static void require(String name, boolean held, String what) {
        if (!held) {
            throw new IllegalStateException(name + " lacks " + what);
        }
    }

    /** The place of an argument in the order of the entry, or -1. */
    public int place(String argument) {
        for (int i = 0; i < arguments.size(); i++) {
            if (arguments.get(i).name().equals(argument)) {
                return i;
            }
        }
        return -1;
    }

    /**
     * The partial derivative with respect to one argument, in coherent units: exact where the entry keeps it, else by
     * differences.
     *
     * @param argument the argument's place
     * @param row the arguments in order, each in its interval
     * @throws IllegalArgumentException if the argument is a word, or the function gives one
     */
    public double partial(int argument, double... row) {
        Argument by = arguments.get(argument);
        if (by.isText() || result.isText()) {
            throw new IllegalArgumentException(name + " has no derivative by " + by.name() + ": words do not vary");
        }
        return sensitivities.get(argument) instanceof Sensitivity.Exact exact
                ? exact.derivative().at(row)
                : new Differences(kernel, argument, row).within(by.interval());
    }

    /** The current revision's number. */
    public int revision() {
        return revisions.get(revisions.size() - 1).number();
    }

    @Override
    public String toString() {
        return name;
    }
}
