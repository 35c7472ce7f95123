package org.ductledger.batch;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.core.StreamWriteFeature;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import java.io.IOException;
import java.io.UncheckedIOException;

/** The JSON library as this program sets it. */
final class JsonDocuments {
    /** For writing: numbers in their shortest round-trip form on every JVM. */
    static final JsonFactory WRITING = JsonFactory.builder()
            .enable(StreamWriteFeature.USE_FAST_DOUBLE_WRITER)
            .build();

    /** Reads a whole document, the parser at its first token. */
    @FunctionalInterface
    interface Root<T> {
        T read(StrictJson json) throws IOException, DocumentRefusedException;
    }

    private final JsonFactory factory;
    private final Limits limits;

    JsonDocuments(Limits limits) {
        this.limits = limits;
        factory = JsonFactory.builder()
                .enable(StreamReadFeature.USE_FAST_DOUBLE_PARSER)
                .disable(JsonFactory.Feature.CHARSET_DETECTION)
                .disable(JsonFactory.Feature.INTERN_FIELD_NAMES)
                .streamReadConstraints(StreamReadConstraints.builder()
                        .maxNestingDepth(limits.nesting())
                        .maxNumberLength(limits.numberLength())
                        .maxNameLength(limits.textLength() + 1)
                        .maxStringLength(limits.textLength() + 1)
                        .build())
                .build();
    }

    /**
     * Reads a document that is one value and nothing after it.
     *
     * @param document UTF-8
     * @throws DocumentRefusedException if it is no JSON, or not what {@code root} takes
     */
    <T> T read(byte[] document, Root<T> root) throws DocumentRefusedException {
        try (JsonParser parser = factory.createParser(document)) {
            StrictJson json = new StrictJson(parser, limits);
            try {
                if (parser.nextToken() == null) {
                    throw json.refused(Reason.MALFORMED, "the document is empty; JSON is required");
                }
                T value = root.read(json);
                if (parser.nextToken() != null) {
                    throw new DocumentRefusedException(
                            new Reason(Reason.MALFORMED, "", "the document goes on after its end" + place(parser)));
                }
                return value;
            } catch (StreamConstraintsException e) {
                throw json.refused(Reason.LIMIT_EXCEEDED, inOurWords(e) + place(parser));
            } catch (JsonProcessingException e) {
                throw json.refused(Reason.MALFORMED, "is not valid JSON: " + inOurWords(e) + place(parser));
            }
        } catch (IOException e) {
            throw new UncheckedIOException("a document in memory could not be read", e);
        }
    }

    private static String place(JsonParser parser) {
        var location = parser.currentLocation();
        return " (line " + location.getLineNr() + ", column " + location.getColumnNr() + ")";
    }

    /** The library's message without what concerns only its own settings. */
    private static String inOurWords(JsonProcessingException e) {
        return e.getOriginalMessage()
                .replaceAll("\\[Source: [^;]*; line: (\\d+), column: (\\d+)]", "line $1, column $2")
                .replaceAll(", from `[^`]*`", "");
    }
}
