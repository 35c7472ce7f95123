package org.ductledger.catalogue;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * How a plain spreadsheet computes a function: a formula, before it as many helper cells as it needs, or the word that
 * it has none. Formulas use only functions that every OOXML spreadsheet has. {@code {name}} stands for the cell (or
 * the literal) of an argument or of an earlier helper.
 */
public final class CellForm {
    private static final Pattern HOLE = Pattern.compile("\\{([a-z][a-z0-9_]*)}");

    /** A helper cell: its name and its formula. */
    public record Helper(String name, String formula) {}

    private final List<Helper> helpers;
    private final String formula;
    private final String reason;

    private CellForm(List<Helper> helpers, String formula, String reason) {
        this.helpers = List.copyOf(helpers);
        this.formula = formula;
        this.reason = reason;
    }

    /** One formula, no helper cells. */
    public static CellForm closed(String formula) {
        return new CellForm(List.of(), formula, "");
    }

    /** No plain spreadsheet computes it well; the reason is shown where the filled value stands alone. */
    public static CellForm none(String reason) {
        return new CellForm(List.of(), "", reason);
    }

    public static Builder steps() {
        return new Builder();
    }

    public boolean exists() {
        return reason.isEmpty();
    }

    /** Why there is none; empty where there is one. */
    public String reason() {
        return reason;
    }

    public List<Helper> helpers() {
        return helpers;
    }

    /** The formula of the result, without a leading equals sign. */
    public String formula() {
        return formula;
    }

    /** The names that stand in a formula's braces. */
    public static Set<String> holes(String formula) {
        Set<String> names = new HashSet<>();
        Matcher m = HOLE.matcher(formula);
        while (m.find()) {
            names.add(m.group(1));
        }
        return names;
    }

    /**
     * Puts cells or literals in the place of the names.
     *
     * @throws IllegalArgumentException if a name has no cell
     */
    public static String render(String formula, Map<String, String> cells) {
        return HOLE.matcher(formula).replaceAll(match -> {
            String cell = cells.get(match.group(1));
            if (cell == null) {
                throw new IllegalArgumentException("no cell for {" + match.group(1) + "} in " + formula);
            }
            return Matcher.quoteReplacement(cell);
        });
    }

    /** Collects helper cells in their order. */
    public static final class Builder {
        private final Map<String, String> helpers = new LinkedHashMap<>();

        private Builder() {}

        /** A helper cell; a name is given once. */
        public Builder helper(String name, String formula) {
            if (helpers.putIfAbsent(name, formula) != null) {
                throw new IllegalArgumentException("helper " + name + " is given twice");
            }
            return this;
        }

        /**
         * Another function's form: its helpers under {@code name_...}, its result as helper {@code name}.
         *
         * @param bindings for each argument of the other form, what stands for it here: {@code {x}} or an expression
         */
        public Builder use(String name, CellForm other, Map<String, String> bindings) {
            if (!other.exists()) {
                throw new IllegalArgumentException(name + ": " + other.reason());
            }
            Map<String, String> cells = new HashMap<>();
            bindings.forEach((argument, expression) ->
                    cells.put(argument, expression.matches("\\{\\w+}") ? expression : "(" + expression + ")"));
            for (Helper helper : other.helpers()) {
                helper(name + "_" + helper.name(), render(helper.formula(), cells));
                cells.put(helper.name(), "{" + name + "_" + helper.name() + "}");
            }
            return helper(name, render(other.formula(), cells));
        }

        /** The formula of the result. */
        public CellForm result(String formula) {
            List<Helper> list = new ArrayList<>();
            helpers.forEach((name, text) -> list.add(new Helper(name, text)));
            return new CellForm(list, formula, "");
        }
    }
}
