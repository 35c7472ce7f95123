package org.ductledger.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;

class EntryBuilderTest {
    private static final Argument X = Argument.number("x", "x", "m", Interval.atLeast(0), "a length");
    private static final Argument SIDE = Argument.choice("side", "which side", "left", "right");
    private static final Source SOURCE = new Source("A. Body", "A Standard", 2001, "eq. (1)");

    private static EntryBuilder whole(String name) {
        return new EntryBuilder(new Family("made_up", "Made up for a test"), name)
                .title("A signed length")
                .formula("y = +-x^2")
                .takes(X, SIDE)
                .gives("y", "m2", Interval.anyNumber())
                .kernel((x, side) -> side == 0 ? -x * x : x * x)
                .sources(SOURCE)
                .example("-4", 2.0, "left")
                .cell("IF({side}=\"left\",-1,1)*{x}^2");
    }

    private static void refused(String missing, UnaryOperator<EntryBuilder> change) {
        EntryBuilder builder = change.apply(whole("signed_square"));
        String message =
                assertThrows(IllegalStateException.class, builder::build).getMessage();
        assertEquals("signed_square lacks " + missing, message);
    }

    @Test
    void aWholeEntryIsBuilt() {
        FunctionEntry entry = whole("signed_square").build();
        assertEquals(1, entry.revision());
        assertEquals(1, entry.place("side"));
        assertEquals(-1, entry.place("mach"));
        assertInstanceOf(Sensitivity.Numeric.class, entry.sensitivities().get(0));
        assertInstanceOf(Sensitivity.None.class, entry.sensitivities().get(1));
    }

    @Test
    void anEntryThatSaysTooLittleIsRefused() {
        String message = assertThrows(
                        IllegalStateException.class,
                        () -> new EntryBuilder(new Family("made_up", "Made up"), "bare_entry").build())
                .getMessage();
        assertEquals("bare_entry lacks a result", message);
        refused("a title and a formula", b -> b.title(""));
        refused("a title and a formula", b -> b.formula(""));
        refused("a source", b -> b.sources());
        refused("a kernel of 2 arguments", b -> b.kernel(x -> x));
        refused("a partial, or null, for each argument", b -> b.partials(Kernel.of((x, side) -> 2 * x)));
        refused("a partial of 2 arguments", b -> b.partials(Kernel.of(x -> 2 * x), null));
        refused("a name of its own for each argument", b -> b.takes(X, X).example("4", 2.0, 2.0));
    }

    @Test
    void anExampleMustBeAdmissible() {
        refused("an example with every argument", b -> b.example("4", 2.0));
        refused("an example with an admissible x", b -> b.example("4", -2.0, "left"));
        refused("an example with an admissible x", b -> b.example("4", "2", "left"));
        refused("an example with an admissible side", b -> b.example("4", 2.0, "top"));
        refused("an example with an admissible side", b -> b.example("4", 2.0, 1.0));
    }

    @Test
    void aCellFormMayNameOnlyWhatIsKnown() {
        refused("known names in its cell form", b -> b.cell("{y}"));
        refused(
                "known names in its cell form's helper h",
                b -> b.cell(CellForm.steps()
                        .helper("h", "{later}")
                        .helper("later", "{x}")
                        .result("{h}")));
        refused(
                "a new name for its cell form's helper x",
                b -> b.cell(CellForm.steps().helper("x", "1").result("{x}")));
    }

    @Test
    void aConditionMustBlameAnArgument() {
        refused("the argument z", b -> b.requires(FaultKind.NO_SOLUTION, "z", row -> true, row -> ""));
        assertThrows(
                IllegalArgumentException.class,
                () -> whole("signed_square")
                        .requiresBelow(FaultKind.NO_SOLUTION, "z", Kernel.of((x, s) -> 1), "the end"));
    }

    @Test
    void aNameKeepsToTheGrammar() {
        for (String name : List.of("mach", "Mach_one", "m1_", "1m_x", "_m", "p__p0", "p-p0", "x_".repeat(20) + "y")) {
            String message = assertThrows(
                            IllegalStateException.class, () -> whole(name).build())
                    .getMessage();
            assertEquals(name + " lacks a name by the grammar", message);
        }
    }

    @Test
    void revisionsCountUpFromOne() {
        FunctionEntry entry = whole("signed_square")
                .revision(1, "first release")
                .revision(2, "nearer to the truth")
                .build();
        assertEquals(2, entry.revision());
        refused("revisions that count up from 1", b -> b.revision(2, "no first one"));
    }

    @Test
    void aBoundIsSaidInWordsWithItsValue() {
        Condition condition = whole("signed_square")
                .requiresAtMost(FaultKind.NO_SOLUTION, "x", Kernel.of((x, side) -> 3), "the end of the rig")
                .build()
                .conditions()
                .get(0);
        assertTrue(condition.holds().test(new double[] {3, 0}));
        assertTrue(!condition.holds().test(new double[] {Math.nextUp(3.0), 0}));
        assertEquals(
                "must be at most 3 m (the end of the rig)", condition.wording().of(new double[] {4, 0}));
    }

    @Test
    void eachBoundKeepsItsSideAndItsEnd() {
        FunctionEntry entry = whole("signed_square")
                .requiresBelow(FaultKind.NO_SOLUTION, "x", Kernel.of((x, side) -> 3), "a")
                .requiresAtLeast(FaultKind.NO_SOLUTION, "x", Kernel.of((x, side) -> 1), "b")
                .requiresAbove(FaultKind.NO_SOLUTION, "x", Kernel.of((x, side) -> 2), "c")
                .build();
        assertEquals(List.of(false, true, true), held(entry, 3));
        assertEquals(List.of(true, true, false), held(entry, 1));
        assertEquals(List.of(true, true, false), held(entry, 2));
        assertEquals(List.of(true, true, true), held(entry, 2.5));
    }

    private static List<Boolean> held(FunctionEntry entry, double x) {
        return entry.conditions().stream()
                .map(condition -> condition.holds().test(new double[] {x, 0}))
                .toList();
    }
}
