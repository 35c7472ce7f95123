package org.ductledger.audit;

import java.util.Locale;
import org.ductledger.ledger.Column;
import org.jspecify.annotations.Nullable;

/** Single values out of columns and cells, and how findings show them. */
final class Values {
    /**
     * How far a recalculated formula may lie from the library's value, relative. A cell form and a kernel differ by
     * rounding only, a few 1e-14 where the flow is not close to sonic; anything that matters is far larger.
     */
    private static final double RECALCULATED = 1e-9;

    private Values() {}

    /** The value of a row: a {@code Double}, a {@code String}, or null where it has none. */
    static @Nullable Object row(Column column, int row) {
        if (column instanceof Column.Numbers numbers) {
            double x = numbers.values()[row];
            return Double.isNaN(x) ? null : (Object) x;
        }
        return ((Column.Texts) column).values().get(row);
    }

    /** The same to the bit, or the same word. */
    static boolean same(@Nullable Object a, @Nullable Object b) {
        return a == null
                ? b == null
                : a.equals(b) || (a instanceof Double x && b instanceof Double y && x + 0.0 == y + 0.0);
    }

    /**
     * Whether a recalculated value agrees with the library's.
     *
     * @param size the size of the largest value in the column, for values that cancel to about zero
     */
    static boolean agree(@Nullable Object library, @Nullable Object recalculated, double size) {
        if (library instanceof Double x && recalculated instanceof Double y) {
            return Math.abs(x - y) <= RECALCULATED * Math.max(Math.abs(x), 1e-6 * size);
        }
        // A row without a value: the live formula shows words in its place.
        return library == null ? !(recalculated instanceof Double) : library.equals(recalculated);
    }

    static double size(Column column) {
        double size = 0;
        if (column instanceof Column.Numbers numbers) {
            for (double x : numbers.values()) {
                size = Math.max(size, Double.isNaN(x) ? 0 : Math.abs(x));
            }
        }
        return size;
    }

    static String shown(@Nullable Object value, String unit) {
        if (value == null) {
            return "no value";
        }
        return value instanceof Double && !unit.isEmpty() && !unit.equals("1") ? value + " " + unit : value.toString();
    }

    /** The relative difference of two numbers in words, or nothing. */
    static String difference(@Nullable Object before, @Nullable Object after) {
        if (before instanceof Double x && after instanceof Double y && x != 0) {
            return String.format(Locale.ROOT, "; relative difference %.2g", Math.abs(y - x) / Math.abs(x));
        }
        return "";
    }
}
