package org.ductledger.template;

import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.ductledger.catalogue.Unit;

/** The two families of units in which a workbook shows its quantities; it computes in coherent units under both. */
public enum UnitSystem {
    SI,
    US;

    private static final Map<String, String> SI_SHOWN = Map.of("Pa", "kPa", "m", "mm", "m2", "mm2");
    private static final Map<String, String> US_SHOWN = Map.ofEntries(
            Map.entry("Pa", "psi"),
            Map.entry("K", "degR"),
            Map.entry("delta_K", "delta_degR"),
            Map.entry("m", "in"),
            Map.entry("m2", "in2"),
            Map.entry("m3", "ft3"),
            Map.entry("kg", "lbm"),
            Map.entry("kg/s", "lbm/s"),
            Map.entry("m/s", "ft/s"),
            Map.entry("kg/m3", "lbm/ft3"),
            Map.entry("N", "lbf"),
            Map.entry("J/(kg K)", "ft.lbf/(lbm.R)"),
            Map.entry("Pa.s", "lbm/(ft.s)"));

    /** The system as it is typed: {@code si}, {@code us}. */
    public String label() {
        return name().toLowerCase(Locale.ROOT);
    }

    public static Optional<UnitSystem> find(String label) {
        for (UnitSystem system : values()) {
            if (system.label().equals(label)) {
                return Optional.of(system);
            }
        }
        return Optional.empty();
    }

    /** The unit in which this system shows a quantity of the given kind; its own unit where nothing else is usual. */
    public Unit shown(Unit ofKind) {
        Unit coherent = ofKind.coherent();
        String symbol = (this == SI ? SI_SHOWN : US_SHOWN).get(coherent.symbol());
        return symbol == null ? coherent : Unit.named(symbol);
    }
}
