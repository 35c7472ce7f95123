package org.ductledger.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;

class SpellingTest {
    private static final List<String> NAMES = List.of("p_over_p0", "t_over_t0", "rho_over_rho0", "mach_angle", "bar");

    @Test
    void theNearestStandsFirst() {
        assertEquals(List.of("p_over_p0", "t_over_t0"), Spelling.near("p_ovr_p0", NAMES, 3));
        assertEquals(List.of("p_over_p0"), Spelling.near("p_over_po", NAMES, 1));
    }

    @Test
    void theCaseOfLettersCountsLast() {
        assertEquals(List.of("mach_angle"), Spelling.near("MACH_ANGLE", NAMES, 3));
        assertEquals(List.of("pa", "PA"), Spelling.near("pa", List.of("PA", "pa"), 3));
    }

    @Test
    void whatIsFarIsNotOffered() {
        assertEquals(List.of(), Spelling.near("viscosity", NAMES, 3));
        assertEquals(List.of(), Spelling.near("", NAMES, 3));
        assertEquals(List.of(), Spelling.near("q", NAMES, 3));
        assertEquals(List.of(), Spelling.near("p_over_p0".repeat(10_000), NAMES, 3));
    }
}
