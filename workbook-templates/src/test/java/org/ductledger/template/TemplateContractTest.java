package org.ductledger.template;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What every template of the program must say of itself. */
final class TemplateContractTest {
    static Stream<Template> templates() {
        return Templates.all().stream();
    }

    @ParameterizedTest
    @MethodSource("templates")
    void itSaysWhatItIsForWhereItEndsAndWhatToHeed(Template template) {
        assertTrue(template.name().matches("[a-z]+(_[a-z0-9]+)+"), template.name());
        assertEquals(Optional.of(template), Templates.find(template.name()));
        assertTrue(template.version() >= 1);
        assertFalse(template.title().isEmpty() || template.purpose().isEmpty());
        assertFalse(template.limits().isEmpty());
        String cautions = String.join(" ", template.cautions()).toLowerCase(Locale.ROOT);
        assertTrue(cautions.contains("local codes") && cautions.contains("licensed"), cautions);
    }

    @ParameterizedTest
    @MethodSource("templates")
    void itsDefaultsAreAdmissibleInBothSystemsOfUnits(Template template) throws InputsRefusedException {
        for (UnitSystem units : UnitSystem.values()) {
            Inputs inputs = InputReader.read(template, Map.of(), units);
            for (TemplateInput input : template.inputs()) {
                assertEquals(input.rows(), input.preset().column().rows(), input.name());
                assertTrue(!inputs.has(input.name())
                        || inputs.get(input.name()).column().rows() == input.rows());
                assertFalse(input.meaning().isEmpty(), input.name());
            }
        }
    }

    @ParameterizedTest
    @MethodSource("templates")
    void noTwoInputsShareAName(Template template) {
        Set<String> names = new HashSet<>();
        template.inputs().forEach(input -> assertTrue(names.add(input.name()), input.name()));
    }

    @Test
    void aMistypedNameIsGuessed() {
        assertEquals(Optional.empty(), Templates.find("nozzle_size"));
        assertEquals("nozzle_sizing", Templates.near("nozzle_siznig").get(0));
    }
}
