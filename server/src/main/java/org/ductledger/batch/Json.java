package org.ductledger.batch;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;

/** Writes JSON as every face of the program does. */
public final class Json {
    /** Writes one document into a generator. */
    @FunctionalInterface
    public interface Document {
        void write(JsonGenerator json) throws IOException;
    }

    private Json() {}

    /** Writes a document in UTF-8; the stream stays open. */
    public static void write(Document document, OutputStream out) throws IOException {
        try (JsonGenerator json = JsonDocuments.WRITING.createGenerator(out)) {
            json.disable(JsonGenerator.Feature.AUTO_CLOSE_TARGET);
            document.write(json);
        }
    }

    /** A small document in UTF-8. */
    public static byte[] bytes(Document document) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try {
            write(document, out);
        } catch (IOException e) {
            throw new UncheckedIOException("a document could not be written to memory", e);
        }
        return out.toByteArray();
    }

    /** A text of someone else's as JSON can carry it: half a surrogate pair, which is no character, becomes {@code ?}. */
    public static String whole(String text) {
        return Characters.whole(text);
    }
}
