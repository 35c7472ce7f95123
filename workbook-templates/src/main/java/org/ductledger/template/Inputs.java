package org.ductledger.template;

import java.util.Arrays;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import org.ductledger.catalogue.Unit;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Given;

/** The inputs of one workbook: complete, each admissible, and in the units in which the workbook shows them. */
public final class Inputs {
    private final UnitSystem units;
    private final Map<String, Given.Values> values;

    Inputs(UnitSystem units, Map<String, Given.Values> values) {
        this.units = units;
        this.values = Collections.unmodifiableMap(new LinkedHashMap<>(values));
    }

    public UnitSystem units() {
        return units;
    }

    /** Whether this one was chosen; of a group of alternatives only one is. */
    public boolean has(String name) {
        return values.containsKey(name);
    }

    /**
     * The values of one input, in the unit shown.
     *
     * @throws IllegalArgumentException if it was not chosen
     */
    public Given.Values get(String name) {
        Given.Values given = values.get(name);
        if (given == null) {
            throw new IllegalArgumentException("no input " + name + " was chosen");
        }
        return given;
    }

    /** The numbers of one input in the coherent unit. */
    public double[] coherent(String name) {
        Given.Values given = get(name);
        double[] numbers = ((Column.Numbers) given.column()).values();
        String symbol = given.unit();
        return symbol == null
                ? numbers.clone()
                : Arrays.stream(numbers).map(Unit.named(symbol)::toCoherent).toArray();
    }
}
