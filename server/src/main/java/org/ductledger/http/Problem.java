package org.ductledger.http;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.util.List;
import java.util.Locale;
import org.ductledger.batch.Json;
import org.ductledger.batch.Reason;

/**
 * What went wrong with a request, as RFC 9457 has it.
 *
 * @param status of the response
 * @param title one line, the same for every problem of its kind; between hyphens it ends the type's URI
 * @param detail what is required and what was given, this time
 * @param errors each place in the request's document that is to blame
 */
record Problem(int status, String title, String detail, List<Reason> errors) {
    static final String MEDIA_TYPE = "application/problem+json";

    private static final String TYPE = "urn:ductledger:problem:";

    Problem {
        errors = List.copyOf(errors);
    }

    Problem(int status, String title, String detail) {
        this(status, title, detail, List.of());
    }

    byte[] json() {
        return Json.bytes(this::write);
    }

    private void write(JsonGenerator json) throws IOException {
        json.writeStartObject();
        json.writeStringField("type", TYPE + title.toLowerCase(Locale.ROOT).replace(' ', '-'));
        json.writeStringField("title", title);
        json.writeNumberField("status", status);
        json.writeStringField("detail", Json.whole(detail));
        if (!errors.isEmpty()) {
            json.writeArrayFieldStart("errors");
            for (Reason reason : errors) {
                json.writeStartObject();
                json.writeStringField("kind", reason.kind());
                json.writeStringField("pointer", Json.whole(reason.pointer()));
                json.writeStringField("detail", Json.whole(reason.detail()));
                json.writeEndObject();
            }
            json.writeEndArray();
        }
        json.writeEndObject();
    }
}
