package org.ductledger.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

/** Names of cells that every spreadsheet takes, and the ones that some do not. */
final class BookTest {
    @Test
    void namesThatReadAsCellsAreNotLegal() {
        for (String name :
                List.of("t1", "m1", "p02", "pb2", "abc123", "r", "c", "r1c1", "r2", "true", "T0", "1st", "p-0", "")) {
            assertFalse(Book.isLegalName(name), name);
        }
    }

    @Test
    void namesOfQuantitiesAreLegal() {
        for (String name :
                List.of("p0", "t0", "gamma", "p_over_p0", "pb", "contour_x_4", "gas_constant", "shock_p1", "regime")) {
            assertTrue(Book.isLegalName(name), name);
        }
    }

    @Test
    void aNameStandsForOneCell() {
        Book book = new Book();
        Grid grid = book.sheet("Sheet");
        book.name("p0", grid.address(0, 0));
        book.name("p0", grid.address(0, 0));
        assertThrows(IllegalArgumentException.class, () -> book.name("p0", grid.address(0, 1)));
        assertThrows(IllegalArgumentException.class, () -> book.name("p02", grid.address(0, 1)));
        assertEquals(1, book.poi().getAllNames().size());
    }

    @Test
    void aSheetIsMadeOnce() {
        Book book = new Book();
        assertSame(book.sheet("Sheet"), book.sheet("Sheet"));
        assertFalse(book.sheet("Sheet").poi().isDisplayGridlines());
    }
}
