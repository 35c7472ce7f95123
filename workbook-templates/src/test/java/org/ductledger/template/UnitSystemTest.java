package org.ductledger.template;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import org.ductledger.catalogue.Unit;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** The units in which workbooks show their quantities. */
final class UnitSystemTest {
    @ParameterizedTest
    @EnumSource(UnitSystem.class)
    void everyUnitIsShownInOneOfItsKindByAFactorAlone(UnitSystem system) {
        for (Unit unit : Unit.all()) {
            Unit shown = system.shown(unit);
            assertTrue(shown.measuresSameKindAs(unit), unit + " as " + shown);
            assertEquals(0, shown.offset(), "cells convert by a factor: " + shown);
        }
    }

    @ParameterizedTest
    @EnumSource(UnitSystem.class)
    void aSystemIsFoundByItsLabel(UnitSystem system) {
        assertEquals(Optional.of(system), UnitSystem.find(system.label()));
        assertEquals(Optional.empty(), UnitSystem.find(system.name()));
    }
}
