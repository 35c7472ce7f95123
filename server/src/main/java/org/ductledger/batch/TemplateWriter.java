package org.ductledger.batch;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.util.List;
import java.util.Locale;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Given;
import org.ductledger.template.Template;
import org.ductledger.template.TemplateInput;
import org.ductledger.template.UnitSystem;

/** Writes templates as JSON: what each asks for, assumes and cautions about. */
public final class TemplateWriter {
    private TemplateWriter() {}

    /** The document {@code {"library": ..., "templates": [...]}}. */
    public static byte[] all(String library, List<Template> templates) {
        return Json.bytes(json -> {
            json.writeStartObject();
            json.writeStringField("library", library);
            json.writeArrayFieldStart("templates");
            for (Template template : templates) {
                write(template, json);
            }
            json.writeEndArray();
            json.writeEndObject();
        });
    }

    public static byte[] one(Template template) {
        return Json.bytes(json -> write(template, json));
    }

    private static void write(Template template, JsonGenerator json) throws IOException {
        json.writeStartObject();
        json.writeStringField("name", template.name());
        json.writeStringField("title", template.title());
        json.writeStringField("purpose", template.purpose());
        json.writeNumberField("version", template.version());
        json.writeArrayFieldStart("inputs");
        for (TemplateInput input : template.inputs()) {
            write(input, json);
        }
        json.writeEndArray();
        writeSentences("limits", template.limits(), json);
        writeSentences("cautions", template.cautions(), json);
        json.writeEndObject();
    }

    private static void writeSentences(String name, List<String> sentences, JsonGenerator json) throws IOException {
        json.writeFieldName(name);
        json.writeArray(sentences.toArray(String[]::new), 0, sentences.size());
    }

    private static void write(TemplateInput input, JsonGenerator json) throws IOException {
        json.writeStartObject();
        json.writeStringField("name", input.name());
        json.writeStringField("label", input.label());
        json.writeStringField("symbol", input.symbol());
        json.writeStringField("meaning", input.meaning());
        json.writeStringField("kind", input.kind().name().toLowerCase(Locale.ROOT));
        json.writeNumberField("rows", input.rows());
        if (!input.group().isEmpty()) {
            json.writeStringField("one_of", input.group());
        }
        if (input.kind() != TemplateInput.Kind.REMARK) {
            EntryWriter.writeValues(input.coherent(), input.interval(), input.choices(), json);
        }
        if (input.kind() == TemplateInput.Kind.NUMBER) {
            json.writeObjectFieldStart("shown_in");
            for (UnitSystem system : UnitSystem.values()) {
                json.writeStringField(system.label(), input.unit(system).symbol());
            }
            json.writeEndObject();
        }
        writeDefault(input.preset(), json);
        json.writeEndObject();
    }

    /** The default, as it could be given. */
    private static void writeDefault(Given.Values preset, JsonGenerator json) throws IOException {
        json.writeFieldName("default");
        String unit = preset.unit();
        if (unit == null) {
            writeValue(preset, json);
            return;
        }
        json.writeStartObject();
        json.writeFieldName("value");
        writeValue(preset, json);
        json.writeStringField("unit", unit);
        json.writeEndObject();
    }

    private static void writeValue(Given.Values values, JsonGenerator json) throws IOException {
        if (!values.spread()) {
            json.writeStartArray();
        }
        if (values.column() instanceof Column.Texts texts) {
            for (String word : texts.values()) {
                json.writeString(word);
            }
        } else {
            for (double number : ((Column.Numbers) values.column()).values()) {
                json.writeNumber(number);
            }
        }
        if (!values.spread()) {
            json.writeEndArray();
        }
    }
}
