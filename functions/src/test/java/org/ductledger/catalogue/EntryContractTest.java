package org.ductledger.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.ductledger.flow.StandardCatalogue;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What every entry of the catalogue owes its readers; a new one is found by itself. */
class EntryContractTest {
    private static final Pattern WORD = Pattern.compile("[a-z][a-z0-9]*(_[a-z0-9]+)*");
    private static final Pattern CALLED = Pattern.compile("([A-Z][A-Z0-9.]*)\\(");
    /** A minus sign that a spreadsheet applies before the power: -x^2 is (-x)^2 there. */
    private static final Pattern MINUS_BEFORE_POWER = Pattern.compile("(^|[(,=<>*/^])-(\\{\\w+}|[0-9.]+)\\^");

    private static final Set<String> IN_EVERY_SPREADSHEET = Set.of(
            "ABS",
            "ACOS",
            "AND",
            "ASIN",
            "ATAN",
            "COS",
            "COSH",
            "EXP",
            "IF",
            "INDEX",
            "INT",
            "LN",
            "LOG10",
            "MATCH",
            "MAX",
            "MIN",
            "MOD",
            "NA",
            "NOT",
            "OR",
            "PI",
            "POWER",
            "ROUND",
            "SIGN",
            "SIN",
            "SINH",
            "SQRT",
            "SUM",
            "SUMPRODUCT",
            "TAN",
            "TANH");

    static Collection<FunctionEntry> entries() {
        return StandardCatalogue.get().entries();
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void theExampleHolds(FunctionEntry entry) {
        double result = entry.kernel().at(Draws.example(entry));
        String printed = entry.example().printed();
        if (entry.result().isText()) {
            assertEquals(printed, entry.result().choices().get((int) result));
        } else {
            BigDecimal expected = new BigDecimal(printed);
            double error = new BigDecimal(result).subtract(expected).abs().doubleValue();
            assertTrue(
                    error <= 0.5000001 * expected.ulp().doubleValue(),
                    () -> entry + " gives " + result + ", not " + printed);
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void everyPartIsSaid(FunctionEntry entry) {
        assertTrue(WORD.matcher(entry.family().name()).matches(), entry.family().name());
        assertFalse(entry.family().title().isBlank());
        assertTrue(
                Character.isUpperCase(entry.title().charAt(0)) && !entry.title().endsWith("."), entry.title());
        assertTrue(entry.formula().chars().allMatch(c -> c < 128), entry.formula());
        assertTrue(entry.note().isEmpty() || entry.note().endsWith("."), entry.note());
        assertFalse(entry.result().symbol().isBlank());
        for (Argument argument : entry.arguments()) {
            assertTrue(WORD.matcher(argument.name()).matches(), argument.name());
            assertFalse(argument.symbol().isBlank(), argument.name());
            assertFalse(argument.meaning().isBlank(), argument.name());
            assertTrue(argument.unit().isCoherent(), argument.name());
            argument.choices().forEach(word -> assertTrue(WORD.matcher(word).matches(), word));
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void sourcesNameABodyAWorkAndAYear(FunctionEntry entry) {
        for (Source source : entry.sources()) {
            assertFalse(source.author().isBlank(), source.toString());
            assertFalse(source.title().isBlank(), source.toString());
            assertTrue(source.year() > 1800 && source.year() < 2100, source.toString());
        }
        entry.revisions().forEach(revision -> assertFalse(revision.reason().isBlank()));
    }

    @Test
    void anArgumentsNameMeansTheSameQuantityEverywhere() {
        Map<String, Argument> first = new HashMap<>();
        for (FunctionEntry entry : entries()) {
            for (Argument argument : entry.arguments()) {
                Argument other = first.putIfAbsent(argument.name(), argument);
                if (other != null) {
                    assertEquals(other.unit(), argument.unit(), entry + ": " + argument.name());
                    assertEquals(other.isText(), argument.isText(), entry + ": " + argument.name());
                }
            }
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("entries")
    void theCellFormIsAPlainFormulaOfAllArguments(FunctionEntry entry) {
        CellForm form = entry.cellForm();
        if (!form.exists()) {
            assertFalse(form.reason().isBlank());
            return;
        }
        StringBuilder whole = new StringBuilder(form.formula());
        form.helpers().forEach(helper -> whole.append('\n').append(helper.formula()));
        List<String> unused = entry.arguments().stream()
                .map(Argument::name)
                .filter(name -> !CellForm.holes(whole.toString()).contains(name))
                .toList();
        assertEquals(List.of(), unused);
        whole.toString().lines().forEach(EntryContractTest::assertPlain);
    }

    private static void assertPlain(String formula) {
        assertFalse(formula.startsWith("="), formula);
        assertFalse(MINUS_BEFORE_POWER.matcher(formula).find(), formula);
        Matcher called = CALLED.matcher(formula);
        while (called.find()) {
            assertTrue(IN_EVERY_SPREADSHEET.contains(called.group(1)), called.group(1) + " in " + formula);
        }
        int open = 0;
        for (int i = 0; i < formula.length(); i++) {
            char c = formula.charAt(i);
            open += c == '(' ? 1 : c == ')' ? -1 : 0;
            assertTrue(open >= 0, formula);
        }
        assertEquals(0, open, formula);
    }
}
