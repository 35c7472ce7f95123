package org.ductledger.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;

class CellFormTest {
    private static final CellForm SPEED =
            CellForm.steps().helper("root", "SQRT({gamma}*{t})").result("{mach}*{root}");

    @Test
    void cellsTakeThePlaceOfTheNames() {
        CellForm form = CellForm.closed("1/(1+({gamma}-1)/2*{mach}^2)");
        assertEquals(Set.of("gamma", "mach"), CellForm.holes(form.formula()));
        assertEquals(
                "1/(1+(1.4-1)/2*Inputs!$C$7^2)",
                CellForm.render(form.formula(), Map.of("gamma", "1.4", "mach", "Inputs!$C$7")));
        assertTrue(form.exists());
        assertEquals(List.of(), form.helpers());
    }

    @Test
    void aCellNameWithADollarSignOrABackslashStaysAsItIs() {
        assertEquals("$A$1+\\1", CellForm.render("{x}+{y}", Map.of("x", "$A$1", "y", "\\1")));
    }

    @Test
    void aNameWithoutACellIsRefused() {
        String message = assertThrows(
                        IllegalArgumentException.class, () -> CellForm.render("{mach}*{a}", Map.of("mach", "B2")))
                .getMessage();
        assertEquals("no cell for {a} in {mach}*{a}", message);
    }

    @Test
    void whereThereIsNoFormTheReasonIsGiven() {
        CellForm none = CellForm.none("a differential equation is integrated");
        assertFalse(none.exists());
        assertEquals("a differential equation is integrated", none.reason());
    }

    @Test
    void anotherFormIsUsedWithItsHelpersUnderItsName() {
        CellForm form = CellForm.steps()
                .use("v", SPEED, Map.of("gamma", "{gamma}", "t", "{t0}*0.9", "mach", "2"))
                .result("{v}/{area}");
        assertEquals(
                List.of(
                        new CellForm.Helper("v_root", "SQRT({gamma}*({t0}*0.9))"),
                        new CellForm.Helper("v", "(2)*{v_root}")),
                form.helpers());
        assertEquals("{v}/{area}", form.formula());
    }

    @Test
    void formsNestWithoutMixingTheirHelpers() {
        CellForm inner = CellForm.steps()
                .use("v", SPEED, Map.of("gamma", "{gamma}", "t", "{t}", "mach", "{mach}"))
                .result("{v}^2");
        CellForm outer = CellForm.steps()
                .use("first", inner, Map.of("gamma", "{gamma}", "t", "{t}", "mach", "{mach1}"))
                .use("second", inner, Map.of("gamma", "{gamma}", "t", "{t}", "mach", "{mach2}"))
                .result("{first}-{second}");
        assertEquals(
                List.of("first_v_root", "first_v", "first", "second_v_root", "second_v", "second"),
                outer.helpers().stream().map(CellForm.Helper::name).toList());
        assertEquals("{mach2}*{second_v_root}", outer.helpers().get(4).formula());
    }

    @Test
    void aFormWithAnUnboundNameOrNoFormCannotBeUsed() {
        Map<String, String> tooFew = Map.of("gamma", "{gamma}", "t", "{t}");
        assertThrows(IllegalArgumentException.class, () -> CellForm.steps().use("v", SPEED, tooFew));
        assertThrows(IllegalArgumentException.class, () -> CellForm.steps().use("v", CellForm.none("no"), Map.of()));
    }

    @Test
    void aHelperIsNamedOnce() {
        CellForm.Builder steps = CellForm.steps().helper("root", "SQRT({x})");
        assertThrows(IllegalArgumentException.class, () -> steps.helper("root", "1"));
    }
}
