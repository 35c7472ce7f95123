package org.ductledger.batch;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.io.OutputStream;
import java.util.List;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Fault;
import org.ductledger.ledger.Outcome;
import org.jspecify.annotations.Nullable;

/** Writes outcomes as JSON: doubles in their shortest round-trip form, {@code null} in a row with a fault. */
public final class ResultsWriter {
    private ResultsWriter() {}

    /**
     * Writes {@code {"library": ..., "results": [{"id", "call", "revision", "unit", "values", "faults"}, ...]}}.
     *
     * @param library the library's version
     * @param out stays open
     */
    public static void write(String library, List<Outcome> outcomes, OutputStream out) throws IOException {
        Json.write(
                json -> {
                    json.writeStartObject();
                    json.writeStringField("library", library);
                    json.writeArrayFieldStart("results");
                    for (Outcome outcome : outcomes) {
                        write(outcome, json);
                    }
                    json.writeEndArray();
                    json.writeEndObject();
                },
                out);
    }

    private static void write(Outcome outcome, JsonGenerator json) throws IOException {
        json.writeStartObject();
        json.writeStringField("id", outcome.id());
        json.writeStringField("call", outcome.entry().name());
        json.writeNumberField("revision", outcome.entry().revision());
        json.writeStringField("unit", outcome.unit().symbol());
        json.writeArrayFieldStart("values");
        if (outcome.values() instanceof Column.Texts texts) {
            write(texts.values(), json);
        } else {
            write(outcome.numbers(), json);
        }
        json.writeEndArray();
        json.writeArrayFieldStart("faults");
        for (Fault fault : outcome.faults()) {
            write(fault, json);
        }
        json.writeEndArray();
        json.writeEndObject();
    }

    private static void write(double[] values, JsonGenerator json) throws IOException {
        for (double value : values) {
            if (Double.isNaN(value)) {
                json.writeNull();
            } else {
                json.writeNumber(value);
            }
        }
    }

    private static void write(List<@Nullable String> words, JsonGenerator json) throws IOException {
        for (String word : words) {
            json.writeString(word);
        }
    }

    private static void write(Fault fault, JsonGenerator json) throws IOException {
        json.writeStartObject();
        json.writeNumberField("row", fault.row());
        json.writeStringField("kind", fault.kind().label());
        if (fault.argument() != null) {
            json.writeStringField("argument", fault.argument());
        }
        if (fault.given() instanceof String word) {
            json.writeStringField("given", word);
        } else if (fault.given() instanceof Double number && Double.isFinite(number)) {
            json.writeNumberField("given", number);
        }
        json.writeStringField("detail", Characters.whole(fault.detail()));
        json.writeEndObject();
    }
}
