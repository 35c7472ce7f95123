package org.ductledger.template;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.ductledger.catalogue.Catalogue;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.ledger.Column;
import org.ductledger.record.RecordedArgument.FromCall;
import org.ductledger.record.RecordedArgument.FromQuantity;
import org.ductledger.record.RecordedArgument.FromRows;
import org.ductledger.record.RecordedArgument.Row;

/**
 * A calculation in the making: a template writes its calls on it, in their order, and where each is shown. Each result
 * is a call of the catalogue, and each argument an input, a constant or an earlier result.
 */
public final class Draft {
    private final Catalogue catalogue;
    private final Inputs inputs;
    private final Map<String, Column> constants = new LinkedHashMap<>();
    private final Map<String, DraftCall> calls = new LinkedHashMap<>();
    private final Map<String, Term> bindings = new HashMap<>();
    private final List<Section> sections = new ArrayList<>();
    private final List<Table> tables = new ArrayList<>();
    private final List<Requirement> requirements = new ArrayList<>();
    private final List<String> headlines = new ArrayList<>();

    Draft(Catalogue catalogue, Inputs inputs) {
        this.catalogue = catalogue;
        this.inputs = inputs;
    }

    /**
     * Something that the inputs must fulfil together.
     *
     * @param words what is required, as it follows the word "requires"
     * @param lesser must be less than {@code greater}
     */
    record Requirement(String words, Term lesser, Term greater) {}

    /** Results under one heading. */
    record Section(String title, List<DraftCall> calls) {}

    /** Whether this input was chosen among its alternatives. */
    public boolean has(String input) {
        return inputs.has(input);
    }

    /** A whole input. */
    public Term input(String name) {
        inputs.get(name);
        return new Term(new FromQuantity(name));
    }

    /** One value of an input that is a column, by its row from 0. */
    public Term input(String name, int row) {
        inputs.get(name);
        return new Term(new FromRows(List.of(new Row(name, row))));
    }

    /** A column of single values, each an input's or a constant's, one for each row of a table. */
    public static Term each(List<Term> singles) {
        List<Row> rows = new ArrayList<>();
        for (Term single : singles) {
            if (single.origin() instanceof FromRows from && from.rows().size() == 1) {
                rows.add(from.rows().get(0));
            } else if (single.origin() instanceof FromQuantity from) {
                rows.add(new Row(from.quantity(), 0));
            } else {
                throw new IllegalArgumentException("a column is made of inputs and constants, not of " + single);
            }
        }
        return new Term(new FromRows(rows));
    }

    /** A constant of the template that stands in the formulas as a number. */
    public Term constant(String name, double value) {
        return constant(name, new Column.Numbers(value));
    }

    /** A constant word that stands in the formulas. */
    public Term word(String name, String word) {
        return constant(name, new Column.Texts(List.of(word)));
    }

    private Term constant(String name, Column values) {
        if (inputs.has(name) || calls.containsKey(name)) {
            throw new IllegalArgumentException(name + " is the name of two quantities");
        }
        constants.putIfAbsent(name, values);
        return new Term(new FromQuantity(name));
    }

    /** Begins a heading of the results; the results that follow stand under it. */
    public void section(String title) {
        sections.add(new Section(title, new ArrayList<>()));
    }

    /** Binds an argument's name: calls that follow take this for it, unless they are given something else. */
    public void bind(String argument, Term term) {
        bindings.put(argument, term);
    }

    /**
     * What an argument's name is bound to.
     *
     * @throws IllegalArgumentException if it is not bound
     */
    public Term bound(String argument) {
        Term term = bindings.get(argument);
        if (term == null) {
            throw new IllegalArgumentException(argument + " is not bound");
        }
        return term;
    }

    /**
     * A single result under the last heading.
     *
     * @param with arguments by name, beside those that are bound
     */
    public Term result(String id, String label, String symbol, String function, Map<String, Term> with) {
        DraftCall call = call(id, label, symbol, function, with);
        sections.get(sections.size() - 1).calls().add(call);
        return new Term(new FromCall(id));
    }

    /** A column of a table: numbers or words that the template gives, one a row. */
    public Term column(Table table, String name, String label, Column values) {
        if (values.rows() != table.rows()) {
            throw new IllegalArgumentException(
                    name + " has " + values.rows() + " values; the table has " + table.rows() + " rows");
        }
        table.add(new Table.FixedColumn(name, label));
        return constant(name, values);
    }

    /**
     * A column of results in a table.
     *
     * @param with arguments by name, beside those that are bound
     */
    public Term column(Table table, String id, String label, String symbol, String function, Map<String, Term> with) {
        table.add(new Table.CalledColumn(call(id, label, symbol, function, with)));
        return new Term(new FromCall(id));
    }

    private DraftCall call(String id, String label, String symbol, String function, Map<String, Term> with) {
        if (inputs.has(id)
                || constants.containsKey(id)
                || calls.containsKey(id)
                || catalogue.find(id).isPresent()) {
            throw new IllegalArgumentException(
                    id + " is taken: by another quantity, or by a function, which a cell of" + " that name would hide");
        }
        FunctionEntry entry = catalogue
                .find(function)
                .orElseThrow(() -> new IllegalArgumentException("the catalogue has no function " + function));
        List<Term> terms = entry.arguments().stream()
                .map(argument -> term(id, argument.name(), with))
                .toList();
        for (String name : with.keySet()) {
            if (entry.place(name) < 0) {
                throw new IllegalArgumentException(function + " takes no " + name + " for " + id);
            }
        }
        DraftCall call = new DraftCall(id, label, symbol, entry, terms);
        calls.put(id, call);
        return call;
    }

    private Term term(String id, String argument, Map<String, Term> with) {
        Term term = with.containsKey(argument) ? with.get(argument) : bindings.get(argument);
        if (term == null) {
            throw new IllegalArgumentException(id + " lacks " + argument);
        }
        return term;
    }

    /** A sheet with a table, each of its columns a constant or a call of so many rows. */
    public Table table(String sheet, String title, int rows) {
        Table table = new Table(sheet, title, rows);
        tables.add(table);
        return table;
    }

    /**
     * Requires one quantity to be less than another; a workbook whose inputs break it is refused.
     *
     * @param words what is required, as it follows the word "requires"
     */
    public void requires(String words, Term lesser, Term greater) {
        requirements.add(new Requirement(words, lesser, greater));
    }

    /** Shows a single result on the front sheet as well. */
    public void headline(Term result) {
        headlines.add(((FromCall) result.origin()).id());
    }

    Catalogue catalogue() {
        return catalogue;
    }

    Inputs inputs() {
        return inputs;
    }

    Map<String, Column> constants() {
        return Collections.unmodifiableMap(constants);
    }

    Map<String, DraftCall> calls() {
        return Collections.unmodifiableMap(calls);
    }

    List<Section> sections() {
        return Collections.unmodifiableList(sections);
    }

    List<Table> tables() {
        return Collections.unmodifiableList(tables);
    }

    List<Requirement> requirements() {
        return Collections.unmodifiableList(requirements);
    }

    List<String> headlines() {
        return Collections.unmodifiableList(headlines);
    }
}
