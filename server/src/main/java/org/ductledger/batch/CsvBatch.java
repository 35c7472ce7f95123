package org.ductledger.batch;

import de.siegmar.fastcsv.writer.CsvWriter;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.ductledger.catalogue.FaultKind;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.ledger.Call;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Fault;
import org.ductledger.ledger.Given;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.Outcome;
import org.jspecify.annotations.Nullable;

/**
 * A table of one function's arguments: a column an argument, its header the name, or the name and a unit as in
 * {@code p0 [bar]}. It is read as a ledger of one call and written back with the result and the faults beside it.
 */
public final class CsvBatch {
    private static final Pattern HEADER = Pattern.compile("\\s*([^\\[\\]\\s]+)\\s*(?:\\[\\s*([^\\[\\]]+?)\\s*])?\\s*");

    private final FunctionEntry entry;
    private final CsvTable table;
    private final Map<String, Integer> places = new LinkedHashMap<>();
    private final Map<String, Given> arguments = new LinkedHashMap<>();

    private CsvBatch(FunctionEntry entry, CsvTable table) {
        this.entry = entry;
        this.table = table;
    }

    /**
     * Reads a table. A field that is no number makes a fault of its row, not a refusal of the table.
     *
     * @param csv RFC 4180, UTF-8
     * @throws DocumentRefusedException if it is no CSV, is ragged, or its header names no arguments of the function
     */
    public static CsvBatch read(FunctionEntry entry, byte[] csv, Limits limits) throws DocumentRefusedException {
        CsvBatch batch = new CsvBatch(entry, CsvTable.read(csv, limits));
        for (int i = 0; i < batch.table.header().size(); i++) {
            batch.take(i, batch.table.header().get(i));
        }
        return batch;
    }

    private void take(int place, String header) throws DocumentRefusedException {
        Matcher name = HEADER.matcher(header);
        if (!name.matches()) {
            throw refused(
                    Reason.MALFORMED,
                    "column " + (place + 1) + " must be headed by an argument's name, or name [unit], got "
                            + Characters.brief(header));
        }
        String argument = name.group(1);
        if (places.putIfAbsent(argument, place) != null) {
            throw refused(Reason.DUPLICATE_MEMBER, "the header names " + argument + " twice");
        }
        int known = entry.place(argument);
        boolean text = known >= 0 && entry.arguments().get(known).isText();
        arguments.put(argument, new Given.Values(text ? texts(place) : numbers(place), false, name.group(2)));
    }

    private Column texts(int place) {
        List<@Nullable String> words = new ArrayList<>();
        for (List<String> row : table.rows()) {
            words.add(row.get(place).strip());
        }
        return new Column.Texts(words);
    }

    private Column numbers(int place) {
        double[] values = new double[table.rows().size()];
        for (int i = 0; i < values.length; i++) {
            values[i] = Decimal.parse(table.rows().get(i).get(place).strip());
        }
        return new Column.Numbers(values);
    }

    /**
     * The table as a ledger of one call.
     *
     * @param constants arguments that are the same in every row, beside the table's columns
     * @param unit the unit wanted for the result; {@code null} means the function's own
     */
    public Ledger ledger(Map<String, ? extends Given> constants, @Nullable String unit)
            throws DocumentRefusedException {
        Map<String, Given> all = new HashMap<>(arguments);
        for (Map.Entry<String, ? extends Given> constant : constants.entrySet()) {
            if (all.put(constant.getKey(), constant.getValue()) != null) {
                throw refused(Reason.DUPLICATE_MEMBER, constant.getKey() + " is a column of the table already");
            }
        }
        return new Ledger(List.of(new Call(entry.name(), entry.name(), all, unit)), List.of());
    }

    /**
     * Writes the table with a column of results, under the function's name, and one of faults, under {@code fault}.
     *
     * @param out stays open
     */
    public void write(Outcome outcome, OutputStream out) throws IOException {
        Map<Integer, Fault> faults = new HashMap<>();
        outcome.faults().forEach(fault -> faults.put(fault.row(), fault));
        CsvWriter writer = CsvWriter.builder().build(out, StandardCharsets.UTF_8);
        boolean ownUnit = outcome.unit().equals(entry.result().unit());
        writer.writeRecord(row(table.header(), entry.name() + (ownUnit ? "" : " [" + outcome.unit() + "]"), "fault"));
        for (int i = 0; i < table.rows().size(); i++) {
            Fault fault = faults.get(i);
            writer.writeRecord(row(
                    table.rows().get(i),
                    fault == null ? Results.text(outcome, i) : "",
                    fault == null ? "" : detail(fault)));
        }
        writer.flush();
    }

    private static List<String> row(List<String> fields, String value, String fault) {
        List<String> row = new ArrayList<>(fields.size() + 2);
        row.addAll(fields);
        row.add(value);
        row.add(fault);
        return row;
    }

    /** A field that is no number reached the evaluator as NaN; its fault shows the field itself. */
    private String detail(Fault fault) {
        Integer place = fault.argument() == null ? null : places.get(fault.argument());
        if (fault.kind() != FaultKind.NOT_A_NUMBER || place == null) {
            return fault.detail();
        }
        String field = table.rows().get(fault.row()).get(place);
        return fault.argument() + " must be a number with a decimal point, got " + Characters.brief(field);
    }

    private static DocumentRefusedException refused(String kind, String detail) {
        return new DocumentRefusedException(new Reason(kind, "", detail));
    }
}
