package org.ductledger.batch;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import org.ductledger.audit.AuditReport;
import org.ductledger.audit.Finding;

/** Writes what an audit came to as JSON. */
public final class AuditWriter {
    private AuditWriter() {}

    /**
     * The document {@code {"template", "template_version", "library_then", "library_now", "calls", "cells", "clean",
     * "verdict", "findings": [...]}}.
     */
    public static byte[] document(AuditReport report) {
        return Json.bytes(json -> write(report, json));
    }

    private static void write(AuditReport report, JsonGenerator json) throws IOException {
        json.writeStartObject();
        writeMembers(report, json);
        json.writeEndObject();
    }

    /** The members of a report, into an object that may have others. */
    public static void writeMembers(AuditReport report, JsonGenerator json) throws IOException {
        json.writeStringField("template", Json.whole(report.template()));
        json.writeNumberField("template_version", report.templateVersion());
        json.writeStringField("library_then", Json.whole(report.libraryThen()));
        json.writeStringField("library_now", report.libraryNow());
        json.writeNumberField("calls", report.calls());
        json.writeNumberField("cells", report.cells());
        json.writeBooleanField("clean", report.isClean());
        json.writeStringField("verdict", report.verdict());
        json.writeArrayFieldStart("findings");
        for (Finding finding : report.findings()) {
            write(finding, json);
        }
        json.writeEndArray();
    }

    private static void write(Finding finding, JsonGenerator json) throws IOException {
        json.writeStartObject();
        json.writeStringField("kind", finding.kind().label());
        json.writeStringField("sheet", Json.whole(finding.sheet()));
        json.writeStringField("cell", Json.whole(finding.cell()));
        json.writeStringField("quantity", Json.whole(finding.quantity()));
        json.writeStringField("recorded", Json.whole(finding.recorded()));
        json.writeStringField("found", Json.whole(finding.found()));
        json.writeStringField("detail", Json.whole(finding.detail()));
        json.writeEndObject();
    }
}
