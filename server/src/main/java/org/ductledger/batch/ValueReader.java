package org.ductledger.batch;

import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Given;
import org.ductledger.ledger.Reference;
import org.jspecify.annotations.Nullable;

/**
 * Reads what a document gives an argument or an input: a number, a text, an array of either, or an object of such
 * values and their unit. Counts the values of its document.
 */
final class ValueReader {
    private static final String VALUE_IN_WORDS =
            "a number, a text, an array of them, or an object with a value and its unit";
    private static final int FIRST_CAPACITY = 16;

    private final StrictJson json;
    private int values;

    ValueReader(StrictJson json) {
        this.json = json;
    }

    /** Takes values, or a reference to an earlier call. */
    Given given() throws IOException, DocumentRefusedException {
        return json.at(JsonToken.START_OBJECT) ? object(true) : bare();
    }

    /** Takes values; there is nothing to refer to. */
    Given.Values values() throws IOException, DocumentRefusedException {
        return json.at(JsonToken.START_OBJECT) ? (Given.Values) object(false) : bare();
    }

    private Given.Values bare() throws IOException, DocumentRefusedException {
        if (json.at(JsonToken.START_ARRAY)) {
            return new Given.Values(array(), false, null);
        }
        if (json.at(JsonToken.VALUE_STRING)) {
            return word(json.textOrBlank("a word"));
        }
        if (json.at(JsonToken.VALUE_NUMBER_INT) || json.at(JsonToken.VALUE_NUMBER_FLOAT)) {
            return number(json.number());
        }
        throw json.wrongType(VALUE_IN_WORDS);
    }

    private static Given.Values number(double value) {
        return new Given.Values(new Column.Numbers(value), true, null);
    }

    private static Given.Values word(String word) {
        return new Given.Values(new Column.Texts(List.of(word)), true, null);
    }

    /** The members of an object in the place of a value, as far as they are read. */
    private static final class Parts {
        Given.@Nullable Values value;

        @Nullable
        String unit;

        @Nullable
        String ref;
    }

    private Given object(boolean mayRefer) throws IOException, DocumentRefusedException {
        Parts parts = new Parts();
        json.object("a value with its unit", name -> {
            switch (name) {
                case "value" -> parts.value = numeric();
                case "unit" -> parts.unit = json.text("a unit's symbol");
                case "ref" -> parts.ref = reference(mayRefer);
                default -> throw json.unknown(name, mayRefer ? "value, unit, ref" : "value, unit");
            }
        });
        if (parts.ref != null) {
            if (parts.value != null || parts.unit != null) {
                throw json.refused(Reason.UNKNOWN_MEMBER, "a reference has no value or unit beside it");
            }
            return new Reference(parts.ref);
        }
        Given.Values value = json.required(parts.value, "value");
        String unit = json.required(parts.unit, "unit");
        return new Given.Values(value.column(), value.spread(), unit);
    }

    private String reference(boolean mayRefer) throws IOException, DocumentRefusedException {
        if (!mayRefer) {
            throw json.refused(Reason.UNKNOWN_MEMBER, "there is no call to refer to here");
        }
        return json.text("an earlier call's id");
    }

    /** What a unit can stand beside: a number or an array of them. */
    private Given.Values numeric() throws IOException, DocumentRefusedException {
        if (json.at(JsonToken.START_ARRAY)) {
            json.next();
            return new Given.Values(numbers(), false, null);
        }
        return number(json.number());
    }

    private Column array() throws IOException, DocumentRefusedException {
        json.next();
        return json.at(JsonToken.VALUE_STRING) ? texts() : numbers();
    }

    private Column.Texts texts() throws IOException, DocumentRefusedException {
        List<@Nullable String> words = new ArrayList<>();
        while (!json.at(JsonToken.END_ARRAY)) {
            checkSize(words.size());
            words.add(json.text("a word"));
            json.next();
        }
        count(words.size());
        return new Column.Texts(words);
    }

    private Column.Numbers numbers() throws IOException, DocumentRefusedException {
        int most = json.limits().rows();
        double[] column = new double[Math.min(FIRST_CAPACITY, most)];
        int rows = 0;
        while (!json.at(JsonToken.END_ARRAY)) {
            if (rows == column.length) {
                checkSize(rows);
                column = Arrays.copyOf(column, Math.min(2 * rows, most));
            }
            column[rows++] = json.number();
            json.next();
        }
        count(rows);
        return new Column.Numbers(rows == column.length ? column : Arrays.copyOf(column, rows));
    }

    private void checkSize(int rows) throws DocumentRefusedException {
        if (rows >= json.limits().rows()) {
            throw json.refused(
                    Reason.LIMIT_EXCEEDED,
                    "a column may have at most " + json.limits().rows() + " rows");
        }
    }

    private void count(int rows) throws DocumentRefusedException {
        values += rows;
        if (values > json.limits().results()) {
            throw json.refused(
                    Reason.LIMIT_EXCEEDED,
                    "a document may have at most " + json.limits().results() + " values; post it in parts");
        }
    }
}
