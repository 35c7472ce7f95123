package org.ductledger.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

class CatalogueTest {
    private static FunctionEntry entry(String name) {
        return new EntryBuilder(new Family("made_up", "Made up for a test"), name)
                .title("The number itself")
                .formula("x")
                .takes(Argument.number("x", "x", "1", Interval.anyNumber(), "a number"))
                .gives("x", "1", Interval.anyNumber())
                .kernel(x -> x)
                .sources(new Source("A. Body", "A Standard", 2001, ""))
                .example("1", 1.0)
                .cell("{x}")
                .build();
    }

    @Test
    void entriesAreFoundByNameAndKeepTheirOrder() {
        FunctionEntry second = entry("second_one");
        Catalogue catalogue = new Catalogue("1.2.3", List.of(second, entry("first_one")));
        assertEquals("1.2.3", catalogue.version());
        assertEquals(second, catalogue.find("second_one").orElseThrow());
        assertTrue(catalogue.find("third_one").isEmpty());
        assertEquals(
                List.of("second_one", "first_one"),
                catalogue.entries().stream().map(FunctionEntry::name).toList());
        assertEquals(List.of("first_one"), catalogue.near("frist_one"));
    }

    @Test
    void aNameStandsOnce() {
        List<FunctionEntry> twice = List.of(entry("same_name"), entry("same_name"));
        assertThrows(IllegalArgumentException.class, () -> new Catalogue("1.2.3", twice));
    }

    @Test
    void theEntriesCannotBeChangedFromOutside() {
        Catalogue catalogue = new Catalogue("1.2.3", List.of(entry("only_one")));
        assertThrows(
                UnsupportedOperationException.class, () -> catalogue.entries().clear());
    }
}
