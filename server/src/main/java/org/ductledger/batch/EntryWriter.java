package org.ductledger.batch;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.util.List;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.Catalogue;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.Condition;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Result;
import org.ductledger.catalogue.Revision;
import org.ductledger.catalogue.Sensitivity;
import org.ductledger.catalogue.Source;
import org.ductledger.catalogue.Unit;

/** Writes the catalogue as JSON: everything an entry says. */
public final class EntryWriter {
    private EntryWriter() {}

    /** The document {@code {"library": ..., "functions": [...]}}, in the order of the families. */
    public static byte[] all(Catalogue catalogue) {
        return Json.bytes(json -> {
            json.writeStartObject();
            json.writeStringField("library", catalogue.version());
            json.writeArrayFieldStart("functions");
            for (FunctionEntry entry : catalogue.entries()) {
                write(entry, json);
            }
            json.writeEndArray();
            json.writeEndObject();
        });
    }

    public static byte[] one(FunctionEntry entry) {
        return Json.bytes(json -> write(entry, json));
    }

    private static void write(FunctionEntry entry, JsonGenerator json) throws IOException {
        json.writeStartObject();
        json.writeStringField("name", entry.name());
        json.writeStringField("family", entry.family().name());
        json.writeStringField("family_title", entry.family().title());
        json.writeStringField("title", entry.title());
        json.writeStringField("formula", entry.formula());
        json.writeStringField("note", entry.note());
        json.writeNumberField("revision", entry.revision());
        json.writeArrayFieldStart("arguments");
        for (int i = 0; i < entry.arguments().size(); i++) {
            write(entry.arguments().get(i), entry.sensitivities().get(i), json);
        }
        json.writeEndArray();
        json.writeFieldName("result");
        write(entry.result(), json);
        writeConditions(entry.conditions(), json);
        writeSources(entry.sources(), json);
        writeExample(entry, json);
        writeRevisions(entry.revisions(), json);
        writeCellForm(entry.cellForm(), json);
        json.writeEndObject();
    }

    private static void write(Argument argument, Sensitivity sensitivity, JsonGenerator json) throws IOException {
        json.writeStartObject();
        json.writeStringField("name", argument.name());
        json.writeStringField("symbol", argument.symbol());
        json.writeStringField("meaning", argument.meaning());
        writeValues(argument.unit(), argument.interval(), argument.choices(), json);
        json.writeStringField("sensitivity", kind(sensitivity));
        json.writeEndObject();
    }

    private static String kind(Sensitivity sensitivity) {
        if (sensitivity instanceof Sensitivity.Exact) {
            return "exact";
        }
        return sensitivity instanceof Sensitivity.Numeric ? "numeric" : "none";
    }

    private static void write(Result result, JsonGenerator json) throws IOException {
        json.writeStartObject();
        json.writeStringField("symbol", result.symbol());
        writeValues(result.unit(), result.range(), result.choices(), json);
        json.writeEndObject();
    }

    /** The unit and interval of a number, or the choices of a word. An end that is no limit is left out. */
    static void writeValues(Unit unit, Interval interval, List<String> choices, JsonGenerator json) throws IOException {
        if (!choices.isEmpty()) {
            json.writeFieldName("choices");
            json.writeArray(choices.toArray(String[]::new), 0, choices.size());
            return;
        }
        json.writeStringField("unit", unit.symbol());
        json.writeObjectFieldStart("interval");
        if (Double.isFinite(interval.lower())) {
            json.writeNumberField(interval.lowerTaken() ? "at_least" : "above", interval.lower());
        }
        if (Double.isFinite(interval.upper())) {
            json.writeNumberField(interval.upperTaken() ? "at_most" : "below", interval.upper());
        }
        json.writeEndObject();
    }

    private static void writeConditions(List<Condition> conditions, JsonGenerator json) throws IOException {
        json.writeArrayFieldStart("conditions");
        for (Condition condition : conditions) {
            json.writeStartObject();
            json.writeStringField("kind", condition.kind().label());
            json.writeStringField("argument", condition.argument());
            json.writeEndObject();
        }
        json.writeEndArray();
    }

    private static void writeSources(List<Source> sources, JsonGenerator json) throws IOException {
        json.writeArrayFieldStart("sources");
        for (Source source : sources) {
            json.writeStartObject();
            json.writeStringField("author", source.author());
            json.writeStringField("title", source.title());
            json.writeNumberField("year", source.year());
            json.writeStringField("locator", source.locator());
            json.writeEndObject();
        }
        json.writeEndArray();
    }

    /** The example as a call's {@code with}, and what it gives as it is printed. */
    private static void writeExample(FunctionEntry entry, JsonGenerator json) throws IOException {
        json.writeObjectFieldStart("example");
        json.writeObjectFieldStart("with");
        for (int i = 0; i < entry.arguments().size(); i++) {
            json.writeFieldName(entry.arguments().get(i).name());
            Object value = entry.example().arguments().get(i);
            if (value instanceof Double number) {
                json.writeNumber(number);
            } else {
                json.writeString((String) value);
            }
        }
        json.writeEndObject();
        json.writeStringField("gives", entry.example().printed());
        json.writeEndObject();
    }

    private static void writeRevisions(List<Revision> revisions, JsonGenerator json) throws IOException {
        json.writeArrayFieldStart("revisions");
        for (Revision revision : revisions) {
            json.writeStartObject();
            json.writeNumberField("number", revision.number());
            json.writeStringField("reason", revision.reason());
            json.writeEndObject();
        }
        json.writeEndArray();
    }

    private static void writeCellForm(CellForm form, JsonGenerator json) throws IOException {
        json.writeObjectFieldStart("cell_form");
        if (!form.exists()) {
            json.writeStringField("none", form.reason());
        } else {
            json.writeArrayFieldStart("helpers");
            for (CellForm.Helper helper : form.helpers()) {
                json.writeStartObject();
                json.writeStringField("name", helper.name());
                json.writeStringField("formula", helper.formula());
                json.writeEndObject();
            }
            json.writeEndArray();
            json.writeStringField("formula", form.formula());
        }
        json.writeEndObject();
    }
}
