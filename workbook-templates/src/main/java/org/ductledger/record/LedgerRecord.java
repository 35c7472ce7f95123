package org.ductledger.record;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.ductledger.ledger.Call;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Given;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.Reference;
import org.ductledger.record.RecordedArgument.FromCall;
import org.ductledger.record.RecordedArgument.FromQuantity;
import org.ductledger.record.RecordedArgument.FromRows;
import org.ductledger.record.RecordedArgument.Row;
import org.ductledger.record.RecordedQuantity.Role;
import org.jspecify.annotations.Nullable;

/**
 * The machine-readable record of a workbook, as its {@code Ledger} sheet holds it.
 *
 * @param template the template's name
 * @param templateVersion the template's version
 * @param library the library's version at the fill
 * @param units the unit system, {@code si} or {@code us}
 * @param quantities what the calls take that no call gives; inputs and remarks stand before the template's constants
 * @param calls in their order
 * @param digest as the sheet holds it; {@link RecordDigest#of} says what it ought to be
 */
public record LedgerRecord(
        String template,
        int templateVersion,
        String library,
        String units,
        List<RecordedQuantity> quantities,
        List<RecordedCall> calls,
        String digest) {
    public LedgerRecord {
        quantities = quantities.stream()
                .sorted(Comparator.comparing(quantity -> quantity.role() == Role.FIXED))
                .toList();
        calls = List.copyOf(calls);
    }

    /** The same record under another digest. */
    public LedgerRecord withDigest(String other) {
        return new LedgerRecord(template, templateVersion, library, units, quantities, calls, other);
    }

    /**
     * The ledger that the record stands for, ready to be evaluated again.
     *
     * @throws IllegalArgumentException if an argument names a quantity that the record does not have
     */
    public Ledger ledger() {
        return new Ledger(calls.stream().map(this::call).toList(), List.of());
    }

    /**
     * The quantity of that name.
     *
     * @throws IllegalArgumentException if there is none
     */
    public RecordedQuantity quantity(String name) {
        return quantities.stream()
                .filter(quantity -> quantity.name().equals(name))
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException("no quantity is named " + name));
    }

    private Call call(RecordedCall recorded) {
        Map<String, Given> arguments = new LinkedHashMap<>();
        for (RecordedArgument argument : recorded.arguments()) {
            arguments.put(argument.name(), given(argument.origin()));
        }
        String unit = recorded.unit().isEmpty() ? null : recorded.unit();
        return new Call(recorded.id(), recorded.function(), arguments, unit);
    }

    private Given given(RecordedArgument.Origin origin) {
        if (origin instanceof FromCall call) {
            return new Reference(call.id());
        }
        if (origin instanceof FromRows from) {
            return values(
                    rows(from.rows()), quantity(from.rows().get(0).quantity()).unit());
        }
        RecordedQuantity quantity = quantity(((FromQuantity) origin).quantity());
        return values(quantity.values(), quantity.unit());
    }

    private static Given values(Column column, String unit) {
        return new Given.Values(column, column.rows() == 1, unit.isEmpty() ? null : unit);
    }

    /** Single rows, of quantities that share their unit. */
    private Column rows(List<Row> rows) {
        if (quantity(rows.get(0).quantity()).values() instanceof Column.Numbers) {
            return new Column.Numbers(rows.stream().mapToDouble(this::number).toArray());
        }
        List<@Nullable String> words = new ArrayList<>();
        rows.forEach(row -> words.add(
                ((Column.Texts) quantity(row.quantity()).values()).values().get(row.row())));
        return new Column.Texts(words);
    }

    private double number(Row row) {
        return ((Column.Numbers) quantity(row.quantity()).values()).values()[row.row()];
    }
}
