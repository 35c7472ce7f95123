package org.ductledger.catalogue;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;

/** Everything the catalogue knows of one function; help, page, errors, workbooks and tests are rendered from it. */
public final class FunctionEntry {
    private final String name;
    private final Family family;
    private final String title;
    private final String formula;
    private final String note;
    private final List<Argument> arguments;
    private final Result result;
    private final Kernel kernel;
    private final List<Condition> conditions;
    private final List<Sensitivity> sensitivities;
    private final List<Source> sources;
    private final Example example;
    private final List<Revision> revisions;
    private final CellForm cellForm;

    FunctionEntry(EntryBuilder b) {
        name = b.name;
        family = b.family;
        title = b.title;
        formula = b.formula;
        note = b.note;
        arguments = b.arguments;
        result = said(b.result, "a result");
        kernel = said(b.kernel, "a kernel");
        conditions = List.copyOf(b.conditions);
        sensitivities = sensitivities(b);
        sources = b.sources;
        example = said(b.example, "an example");
        revisions = b.revisions.isEmpty() ? List.of(new Revision(1, "first release")) : List.copyOf(b.revisions);
        cellForm = said(b.cellForm, "a cell form");
        check();
    }

    private <T> T said(@Nullable T part, String what) {
        if (part == null) {
            throw new IllegalStateException(name + " lacks " + what);
        }
        return part;
    }

    private static List<Sensitivity> sensitivities(EntryBuilder b) {
        List<Sensitivity> list = new ArrayList<>();
        for (int i = 0; i < b.arguments.size(); i++) {
            list.add(
                    b.arguments.get(i).isText()
                            ? new Sensitivity.None()
                            : i < b.sensitivities.size() ? b.sensitivities.get(i) : new Sensitivity.Numeric());
        }
        return List.copyOf(list);
    }

    private void check() {
        require(name.matches("[a-z][a-z0-9]*(_[a-z0-9]+)+") && name.length() <= 40, "a name by the grammar");
        require(!title.isEmpty() && !formula.isEmpty(), "a title and a formula");
        require(kernel.arity() == arguments.size(), "a kernel of " + arguments.size() + " arguments");
        require(!sources.isEmpty(), "a source");
        require(example.arguments().size() == arguments.size(), "an example with every argument");
        Set<String> known = new TreeSet<>();
        arguments.forEach(a -> known.add(a.name()));
        for (CellForm.Helper helper : cellForm.helpers()) {
            require(known.containsAll(CellForm.holes(helper.formula())), "names in its cell form's " + helper.name());
            require(known.add(helper.name()), "a new name for helper " + helper.name());
        }
        require(known.containsAll(CellForm.holes(cellForm.formula())), "names in its cell form");
    }

    private void require(boolean held, String what) {
        if (!held) {
            throw new IllegalStateException(name + " lacks " + what);
        }
    }

    public String name() {
        return name;
    }

    public Family family() {
        return family;
    }

    public String title() {
        return title;
    }

    public String formula() {
        return formula;
    }

    /** What a user must know beside the formula; may be empty. */
    public String note() {
        return note;
    }

    public List<Argument> arguments() {
        return arguments;
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

    public Result result() {
        return result;
    }

    public Kernel kernel() {
        return kernel;
    }

    public List<Condition> conditions() {
        return conditions;
    }

    /** One for each argument, in their order. */
    public List<Sensitivity> sensitivities() {
        return sensitivities;
    }

    public List<Source> sources() {
        return sources;
    }

    public Example example() {
        return example;
    }

    /** From the first to the current one. */
    public List<Revision> revisions() {
        return revisions;
    }

    /** The current revision's number. */
    public int revision() {
        return revisions.get(revisions.size() - 1).number();
    }

    public CellForm cellForm() {
        return cellForm;
    }

    @Override
    public String toString() {
        return name;
    }
}
