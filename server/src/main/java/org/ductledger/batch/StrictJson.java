package org.ductledger.batch;

import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.util.HashSet;
import java.util.Set;
import org.ductledger.catalogue.FaultKind;
import org.jspecify.annotations.Nullable;

/**
 * A JSON document as it is read, token by token and with no leniency: each method takes the value at hand and refuses
 * any other, naming its place.
 */
final class StrictJson {
    /** Reads the value of one member of an object. */
    @FunctionalInterface
    interface Member {
        void read(String name) throws IOException, DocumentRefusedException;
    }

    /** Reads one element of an array. */
    @FunctionalInterface
    interface Element {
        void read(int index) throws IOException, DocumentRefusedException;
    }

    private final JsonParser parser;
    private final Limits limits;

    StrictJson(JsonParser parser, Limits limits) {
        this.parser = parser;
        this.limits = limits;
    }

    Limits limits() {
        return limits;
    }

    boolean at(JsonToken token) {
        return parser.currentToken() == token;
    }

    void next() throws IOException {
        parser.nextToken();
    }

    /** The place of the value at hand. */
    String pointer() {
        return parser.getParsingContext().pathAsPointer().toString();
    }

    DocumentRefusedException refused(String kind, String detail) {
        return new DocumentRefusedException(new Reason(kind, pointer(), detail));
    }

    DocumentRefusedException wrongType(String required) {
        return refused(Reason.WRONG_TYPE, "must be " + required + ", got " + inWords(parser.currentToken()));
    }

    DocumentRefusedException unknown(String member, String known) {
        return refused(Reason.UNKNOWN_MEMBER, "'" + member + "' is not known here; known: " + known);
    }

    /** A member that its object must have, once the object is read. */
    <T> T required(@Nullable T value, String member) throws DocumentRefusedException {
        if (value == null) {
            throw refused(Reason.MISSING_MEMBER, "'" + member + "' is required and not given");
        }
        return value;
    }

    /** Takes an object, every name in it at most once. */
    void object(String what, Member member) throws IOException, DocumentRefusedException {
        if (!at(JsonToken.START_OBJECT)) {
            throw wrongType(what + ", an object");
        }
        Set<String> seen = new HashSet<>();
        while (parser.nextToken() == JsonToken.FIELD_NAME) {
            String name = wellFormed(parser.currentName());
            if (!seen.add(name)) {
                throw refused(Reason.DUPLICATE_MEMBER, "'" + name + "' is given twice");
            }
            parser.nextToken();
            member.read(name);
        }
    }

    /** Takes an array of at most so many elements. */
    void array(String what, int most, Element element) throws IOException, DocumentRefusedException {
        if (!at(JsonToken.START_ARRAY)) {
            throw wrongType(what + ", an array");
        }
        int index = 0;
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            if (index == most) {
                throw refused(Reason.LIMIT_EXCEEDED, what + " may have at most " + most + " elements");
            }
            element.read(index++);
        }
    }

    /** Takes a text, which is never empty. */
    String text(String what) throws IOException, DocumentRefusedException {
        String text = textOrBlank(what);
        if (text.isEmpty()) {
            throw refused(Reason.WRONG_TYPE, "must be " + what + ", got an empty text");
        }
        return text;
    }

    String textOrBlank(String what) throws IOException, DocumentRefusedException {
        if (!at(JsonToken.VALUE_STRING)) {
            throw wrongType(what + ", a text");
        }
        return wellFormed(parser.getText());
    }

    /** Takes a number: finite, and not so small that a double would lose it. */
    double number() throws IOException, DocumentRefusedException {
        if (!at(JsonToken.VALUE_NUMBER_FLOAT) && !at(JsonToken.VALUE_NUMBER_INT)) {
            throw refused(FaultKind.NOT_A_NUMBER.label(), "must be a number, got " + inWords(parser.currentToken()));
        }
        double value = parser.getDoubleValue();
        if (!Double.isFinite(value) || (value == 0 && !Decimal.isZero(parser.getText()))) {
            throw refused(
                    FaultKind.NOT_A_NUMBER.label(),
                    "must lie within the range of a double (about 4.9e-324 to 1.8e308), got " + parser.getText());
        }
        return value;
    }

    private String wellFormed(String text) throws DocumentRefusedException {
        if (text.length() > limits.textLength()) {
            throw refused(
                    Reason.LIMIT_EXCEEDED, "a text or name may have at most " + limits.textLength() + " characters");
        }
        if (!text.equals(Characters.whole(text))) {
            throw refused(Reason.MALFORMED, "holds half of a surrogate pair, which is no character");
        }
        return text;
    }

    private static String inWords(JsonToken token) {
        return switch (token) {
            case VALUE_NULL -> "null";
            case VALUE_TRUE, VALUE_FALSE -> "true or false";
            case VALUE_STRING -> "a text";
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> "a number";
            case START_ARRAY -> "an array";
            case START_OBJECT -> "an object";
            default -> "the end of it";
        };
    }
}
