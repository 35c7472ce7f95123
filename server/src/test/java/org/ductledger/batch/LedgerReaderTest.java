package org.ductledger.batch;

import static java.nio.charset.StandardCharsets.UTF_8;
import static java.util.Objects.requireNonNull;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.ductledger.ledger.Call;
import org.ductledger.ledger.Column;
import org.ductledger.ledger.Given;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.Reference;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class LedgerReaderTest {
    private static final LedgerReader READER = new LedgerReader(Limits.STANDARD);

    @Test
    void readsEveryFormOfArgument() throws DocumentRefusedException {
        Ledger ledger = READER.read(utf8("""
                {"ledger": [{"id": "a", "call": "f_of_x", "unit": "kg/h", "with": {
                    "number": 1.5, "word": "subsonic", "column": [1, 2.5, -3e-2], "words": ["weak", "strong"],
                    "unit": {"value": 7, "unit": "bar"}, "units": {"unit": "in2", "value": [1, 2]},
                    "ref": {"ref": "b"}}}],
                 "want": ["a"]}
                """));
        Call call = ledger.calls().get(0);
        assertEquals("a", call.id());
        assertEquals("f_of_x", call.function());
        assertEquals("kg/h", call.unit());
        assertEquals(List.of("a"), ledger.want());
        assertArrayEquals(new double[] {1.5}, numbers(call, "number"));
        assertTrue(values(call, "number").spread());
        assertEquals(List.of("subsonic"), ((Column.Texts) values(call, "word").column()).values());
        assertArrayEquals(new double[] {1, 2.5, -3e-2}, numbers(call, "column"));
        assertEquals(
                List.of("weak", "strong"), ((Column.Texts) values(call, "words").column()).values());
        assertArrayEquals(new double[] {7}, numbers(call, "unit"));
        assertEquals("bar", values(call, "unit").unit());
        assertArrayEquals(new double[] {1, 2}, numbers(call, "units"));
        assertEquals("in2", values(call, "units").unit());
        assertEquals(new Reference("b"), call.arguments().get("ref"));
    }

    @Test
    void aSingleValueInAnArrayIsAColumnAndNotSpread() throws DocumentRefusedException {
        Ledger ledger = READER.read(call("{\"x\": [1]}"));
        assertEquals(false, values(ledger.calls().get(0), "x").spread());
        assertNull(values(ledger.calls().get(0), "x").unit());
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 15, 16, 17, 1000})
    void columnsOfAnyLengthKeepTheirValues(int rows) throws DocumentRefusedException {
        StringBuilder text = new StringBuilder("[");
        for (int i = 0; i < rows; i++) {
            text.append(i == 0 ? "" : ",").append(i + 0.5);
        }
        double[] read =
                numbers(READER.read(call("{\"x\": " + text + "]}")).calls().get(0), "x");
        assertEquals(rows, read.length);
        for (int i = 0; i < rows; i++) {
            assertEquals(i + 0.5, read[i]);
        }
    }

    /** Each is refused with its kind and a JSON Pointer (RFC 6901) to the place. */
    @ParameterizedTest
    @CsvSource(quoteCharacter = '`', delimiter = '|', textBlock = """
        # document                                                           | kind             | pointer
        [1]                                                                  | wrong_type       | ``
        {}                                                                   | missing_member   | ``
        {"ledger": {}}                                                       | wrong_type       | /ledger
        {"ledger": []}                                                       | missing_member   | /ledger
        {"ledger": [1]}                                                      | wrong_type       | /ledger/0
        {"ledger": [null]}                                                   | wrong_type       | /ledger/0
        {"ledger": null}                                                     | wrong_type       | /ledger
        {"Ledger": []}                                                       | unknown_member   | /Ledger
        {"ledger": [{"id": "a", "call": "f_x"}]}                             | missing_member   | /ledger/0
        {"ledger": [{"id": "a", "with": {}}]}                                | missing_member   | /ledger/0
        {"ledger": [{"call": "f_x", "with": {}}]}                            | missing_member   | /ledger/0
        {"ledger": [{"id": 1, "call": "f_x", "with": {}}]}                   | wrong_type       | /ledger/0/id
        {"ledger": [{"id": "", "call": "f_x", "with": {}}]}                  | wrong_type       | /ledger/0/id
        {"ledger": [{"id": "a", "id": "b", "call": "f_x", "with": {}}]}      | duplicate_member | /ledger/0/id
        {"ledger": [{"id": "a", "call": "f_x", "with": {}, "note": ""}]}     | unknown_member   | /ledger/0/note
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": 1, "x": 2}}]}   | duplicate_member | /ledger/0/with/x
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": null}}]}        | wrong_type       | /ledger/0/with/x
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": true}}]}        | wrong_type       | /ledger/0/with/x
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": 1e400}}]}       | not_a_number     | /ledger/0/with/x
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": -1e400}}]}      | not_a_number     | /ledger/0/with/x
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": 1e-400}}]}      | not_a_number     | /ledger/0/with/x
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": [1, null]}}]}   | not_a_number     | /ledger/0/with/x/1
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": [1, "2"]}}]}    | not_a_number     | /ledger/0/with/x/1
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": [[1]]}}]}       | not_a_number     | /ledger/0/with/x/0
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": ["a", 2]}}]}    | wrong_type       | /ledger/0/with/x/1
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": ["a", null]}}]} | wrong_type       | /ledger/0/with/x/1
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": [1, 1e999]}}]}  | not_a_number     | /ledger/0/with/x/1
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": {}}}]}          | missing_member   | /ledger/0/with/x
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": {"value": 1}}}]}  | missing_member | /ledger/0/with/x
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": {"unit": "m"}}}]} | missing_member | /ledger/0/with/x
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": {"value": "1", "unit": "m"}}}]} | not_a_number | /ledger/0/with/x/value
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": {"value": 1, "unit": 2}}}]}   | wrong_type | /ledger/0/with/x/unit
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": {"value": 1, "units": "m"}}}]} | unknown_member | /ledger/0/with/x/units
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": {"ref": "b", "value": 1}}}]}  | unknown_member | /ledger/0/with/x
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": {"ref": 1}}}]}  | wrong_type       | /ledger/0/with/x/ref
        {"ledger": [{"id": "a", "call": "f_x", "with": {"a/b~c": null}}]}    | wrong_type       | /ledger/0/with/a~1b~0c
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": 1}}], "want": []}    | missing_member | /want
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": 1}}], "want": [1]}   | wrong_type     | /want/0
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": 1}}]} 1         | malformed        | ``
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": 1}}]} {}        | malformed        | ``
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": NaN}}]}         | malformed        | /ledger/0/with/x
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": Infinity}}]}    | malformed        | /ledger/0/with/x
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": [01]}}]}        | malformed        | /ledger/0/with/x/0
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": [1.]}}]}        | malformed        | /ledger/0/with/x/0
        {"ledger": [{"id": "a", "call": "f_x", "with": {"x": [1,]}}]}        | malformed        | /ledger/0/with/x/1
        {"ledger": [{'id': 1}]}                                              | malformed        | /ledger/0
        {"ledger": [                                                         | malformed        | /ledger
        {"ledger": [{"id": "a", // remark                                    | malformed        | /ledger/0/id
        `"text"`                                                             | wrong_type       | ``
        """)
    void refusesWithThePlace(String document, String kind, String pointer) {
        Reason reason = refusal(utf8(document));
        assertEquals(kind, reason.kind(), reason::toString);
        assertEquals(pointer, reason.pointer(), reason::toString);
    }

    @Test
    void refusesAnEmptyDocumentAndWhatIsNoUtf8() {
        assertEquals(
                "the document is empty; JSON is required", refusal(new byte[0]).detail());
        assertEquals(
                "malformed",
                refusal(new byte[] {'{', '"', (byte) 0xff, '"', ':', '1', '}'}).kind());
        assertEquals(
                "malformed",
                refusal("{\"ledger\": []}".getBytes(java.nio.charset.StandardCharsets.UTF_16))
                        .kind());
    }

    @Test
    void refusesHalfASurrogatePairForNoAnswerCouldWriteItBack() {
        Reason reason = refusal(utf8("{\"ledger\": [{\"id\": \"\\ud800\", \"call\": \"f_x\", \"with\": {}}]}"));
        assertEquals(new Reason("malformed", "/ledger/0/id", reason.detail()), reason);
    }

    @Test
    void aMalformedDocumentIsRefusedByLineAndColumnWithoutTalkOfTheLibrary() {
        assertEquals(
                "is not valid JSON: Unexpected close marker '}': expected ']' (for Array starting at line 1, column 12)"
                        + " (line 1, column 14)",
                refusal(utf8("{\"ledger\": [}]}")).detail());
        assertEquals(
                "is not valid JSON: Unexpected end-of-input: expected close marker for Array (start marker at"
                        + " line 1, column 12) (line 1, column 13)",
                refusal(utf8("{\"ledger\": [")).detail());
    }

    @Test
    void readsTheInputsOfATemplate() throws DocumentRefusedException {
        Map<String, Given.Values> inputs = READER.readInputs(utf8("""
                {"gamma": 1.4, "p0": {"value": 7, "unit": "bar"}, "contour_x": [0, 0.1], "purpose": ""}
                """));
        assertEquals(List.of("gamma", "p0", "contour_x", "purpose"), List.copyOf(inputs.keySet()));
        assertEquals("bar", requireNonNull(inputs.get("p0")).unit());
        assertEquals(2, requireNonNull(inputs.get("contour_x")).column().rows());
        assertEquals(
                List.of(""),
                ((Column.Texts) requireNonNull(inputs.get("purpose")).column()).values());
    }

    @Test
    void aTemplatesInputsHaveNothingToReferTo() {
        DocumentRefusedException refused = assertThrows(
                DocumentRefusedException.class, () -> READER.readInputs(utf8("{\"p0\": {\"ref\": \"a\"}}")));
        assertEquals("/p0/ref", refused.reasons().get(0).pointer());
    }

    private static Reason refusal(byte[] document) {
        DocumentRefusedException refused = assertThrows(DocumentRefusedException.class, () -> READER.read(document));
        assertEquals(1, refused.reasons().size());
        return refused.reasons().get(0);
    }

    private static byte[] call(String with) {
        return utf8("{\"ledger\": [{\"id\": \"a\", \"call\": \"f_of_x\", \"with\": " + with + "}]}");
    }

    private static Given.Values values(Call call, String argument) {
        return assertInstanceOf(Given.Values.class, call.arguments().get(argument));
    }

    private static double[] numbers(Call call, String argument) {
        return ((Column.Numbers) values(call, argument).column()).values();
    }

    private static byte[] utf8(String text) {
        return text.getBytes(UTF_8);
    }
}
