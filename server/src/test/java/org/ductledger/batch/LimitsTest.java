package org.ductledger.batch;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/** Each limit takes what is at it, and refuses what is one beyond. */
class LimitsTest {
    private static final LedgerReader READER = new LedgerReader(new Limits(3, 20, 45, 2, 7, 8, 10));

    @Test
    void calls() {
        taken(ledger(call("a", "1"), call("b", "1"), call("c", "1")));
        refused("/ledger/3", ledger(call("a", "1"), call("b", "1"), call("c", "1"), call("d", "1")));
    }

    @Test
    void rows() {
        taken(ledger(call("a", ones(20))));
        refused("/ledger/0/with/x/20", ledger(call("a", ones(21))));
    }

    @Test
    void valuesOfOneDocument() {
        taken(ledger(call("a", ones(20)), call("b", ones(20)), call("c", ones(5))));
        refused("/ledger/2/with/x", ledger(call("a", ones(20)), call("b", ones(20)), call("c", ones(6))));
    }

    @Test
    void resultsThatReferencesSpread() {
        LedgerReader reader = new LedgerReader(new Limits(3, 20, 45, 9, 7, 8, 10));
        assertDoesNotThrow(() -> reader.read(ledger(call("a", ones(15)), call("b", ref("a")), call("c", ref("b")))));
        DocumentRefusedException refused = assertThrows(
                DocumentRefusedException.class,
                () -> reader.read(ledger(call("a", ones(16)), call("b", ref("a")), call("c", ref("b")))));
        assertEquals("/ledger/2", refused.reasons().get(0).pointer());
    }

    @Test
    void references() {
        taken(ledger(call("a", "1"), call("b", ref("a")), call("c", ref("a"))));
        refused(
                "/ledger/2/with/y",
                ledger(call("a", "1"), call("b", ref("a")), call("c", ref("a") + ", \"y\": " + ref("a"))));
    }

    @Test
    void lengthsOfTextsAndNames() {
        taken(ledger(call("a", "\"12345678\"")));
        refused("/ledger/0/with/x", ledger(call("a", "\"123456789\"")));
        refused("/ledger/0/with/x", ledger(call("a", "\"" + "1".repeat(1000) + "\"")));
        refused("/ledger/0/with/abcdefghi", ledger(call("a", "1, \"abcdefghi\": 1")));
    }

    @Test
    void lengthsOfNumbers() {
        taken(ledger(call("a", "123456789.5")));
        refused("/ledger/0/with/x", ledger(call("a", "123456789.55")));
        refused("/ledger/0/with/x", ledger(call("a", "1" + "0".repeat(100_000))));
    }

    @Test
    void nesting() {
        LedgerReader reader = new LedgerReader(new Limits(3, 20, 45, 9, 5, 8, 10));
        byte[] six = ledger(call("a", "{\"value\": [1], \"unit\": \"m\"}"));
        DocumentRefusedException refused = assertThrows(DocumentRefusedException.class, () -> reader.read(six));
        assertEquals("limit_exceeded", refused.reasons().get(0).kind());
        assertDoesNotThrow(() -> reader.read(ledger(call("a", "{\"value\": 1, \"unit\": \"m\"}"))));
    }

    private static void taken(byte[] document) {
        assertDoesNotThrow(() -> READER.read(document));
    }

    private static void refused(String pointer, byte[] document) {
        DocumentRefusedException refused = assertThrows(DocumentRefusedException.class, () -> READER.read(document));
        Reason reason = refused.reasons().get(0);
        assertEquals("limit_exceeded", reason.kind(), reason::toString);
        assertEquals(pointer, reason.pointer(), reason::toString);
        assertTrue(refused.isTooLarge());
    }

    private static String call(String id, String x) {
        return "{\"id\": \"" + id + "\", \"call\": \"f_of_x\", \"with\": {\"x\": " + x + "}}";
    }

    private static String ref(String id) {
        return "{\"ref\": \"" + id + "\"}";
    }

    private static String ones(int count) {
        return "[" + "1,".repeat(count - 1) + "1]";
    }

    private static byte[] ledger(String... calls) {
        return ("{\"ledger\": [" + String.join(",", calls) + "]}").getBytes(UTF_8);
    }
}
