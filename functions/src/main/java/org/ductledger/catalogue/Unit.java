package org.ductledger.catalogue;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;

/**
 * A unit as engineers type it, and the way to the coherent unit of its kind: {@code coherent = (x + offset) * scale}.
 *
 * <p>The kinds are told apart by their coherent unit: an absolute temperature ({@code K}) is not a temperature
 * difference ({@code delta_K}), an angle ({@code deg}) is not a pure number ({@code 1}).
 */
public final class Unit {
    private static final Map<String, Unit> BY_SYMBOL = new LinkedHashMap<>();

    static {
        UnitTable.all().forEach(row -> BY_SYMBOL.put(row.symbol(), new Unit(row)));
    }

    public static final Unit ONE = Unit.named("1");

    private final String symbol;
    private final String coherent;
    private final double scale;
    private final double offset;

    private Unit(UnitTable.Row row) {
        symbol = row.symbol();
        coherent = row.coherent();
        scale = row.scale();
        offset = row.offset();
    }

    /**
     * Finds a unit by its symbol or one of its spellings.
     *
     * @throws UnknownUnitException if there is none, naming the reason (a gauge unit) or what is near
     */
    public static Unit named(String symbol) {
        return Objects.requireNonNull(BY_SYMBOL.get(UnitTable.find(symbol).symbol()));
    }

    /** Every unit, in the order of the table: kind by kind, the coherent one first. */
    public static List<Unit> all() {
        return List.copyOf(BY_SYMBOL.values());
    }

    public String symbol() {
        return symbol;
    }

    /** The coherent unit of this unit's kind, in which kernels compute. */
    public Unit coherent() {
        return symbol.equals(coherent) ? this : named(coherent);
    }

    public boolean isCoherent() {
        return symbol.equals(coherent);
    }

    public boolean isOne() {
        return symbol.equals("1");
    }

    public boolean measuresSameKindAs(Unit other) {
        return coherent.equals(other.coherent);
    }

    public double toCoherent(double x) {
        return (x + offset) * scale;
    }

    public double fromCoherent(double x) {
        return x / scale - offset;
    }

    /** The factor to the coherent unit, correctly rounded. */
    public double scale() {
        return scale;
    }

    /** What is added before the factor: 459.67 for degF, 0 for nearly all. */
    public double offset() {
        return offset;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Unit unit && unit.symbol.equals(symbol);
    }

    @Override
    public int hashCode() {
        return symbol.hashCode();
    }

    @Override
    public String toString() {
        return symbol;
    }
}
