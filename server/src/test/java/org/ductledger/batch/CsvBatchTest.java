package org.ductledger.batch;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.ByteArrayOutputStream;
import java.util.Map;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Given;
import org.ductledger.ledger.Outcome;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CsvBatchTest {
    private static final FunctionEntry ENTRY =
            StandardCatalogue.get().find("t_over_t0").orElseThrow();

    @Test
    void addsAColumnOfResultsAndOneOfFaults() throws Exception {
        assertEquals("""
                mach,gamma,t_over_t0,fault\r
                0,1.4,1.0,\r
                2.0,1.4,0.5555555555555556,\r
                -1,1.4,,"mach must be at least 0, got -1"\r
                fast,1.4,,"mach must be a number with a decimal point, got 'fast'"\r
                "2,5",1.4,,"mach must be a number with a decimal point, got '2,5'"\r
                ,1.4,,"mach must be a number with a decimal point, got ''"\r
                """, answer("mach,gamma\n0,1.4\n2.0,1.4\n-1,1.4\nfast,1.4\n\"2,5\",1.4\n,1.4\n", Map.of()));
    }

    @Test
    void takesAByteOrderMarkUnitsInTheHeaderAndConstants() throws Exception {
        assertEquals(
                "mach [%],t_over_t0,fault\r\n200,0.5555555555555556,\r\n",
                answer("\uFEFFmach [%]\r\n200\r\n", Map.of("gamma", Given.number(1.4))));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
        ``                        | the document is empty; a header with the arguments' names is required
        mach,mach;1,2             | the header names mach twice
        mach,;1,2                 | column 2 must be headed by an argument's name, or name [unit], got ''
        mach,gamma;1              | line 2 must have 2 fields as the header has, got 1
        mach,gamma;1,2,3          | line 2 must have 2 fields as the header has, got 3
        """)
    void refusesWhatIsNoTableOfArguments(String lines, String detail) {
        DocumentRefusedException refused = assertThrows(
                DocumentRefusedException.class,
                () -> CsvBatch.read(ENTRY, lines.replace(';', '\n').getBytes(UTF_8), Limits.STANDARD));
        assertEquals(detail, refused.reasons().get(0).detail());
    }

    @Test
    void refusesAnUnclosedQuoteWhatIsNoUtf8AndTooManyRows() {
        for (byte[] csv : new byte[][] {"mach\n\"1".getBytes(UTF_8), {'m', '\n', (byte) 0xff}}) {
            DocumentRefusedException refused =
                    assertThrows(DocumentRefusedException.class, () -> CsvBatch.read(ENTRY, csv, Limits.STANDARD));
            assertEquals("malformed", refused.reasons().get(0).kind());
        }
        DocumentRefusedException refused = assertThrows(
                DocumentRefusedException.class,
                () -> CsvBatch.read(ENTRY, "mach\n1\n2\n".getBytes(UTF_8), new Limits(1, 1, 1, 1, 8, 9, 9)));
        assertEquals("a table may have at most 1 rows", refused.getMessage());
    }

    @Test
    void refusesAConstantThatIsAColumnAlready() throws DocumentRefusedException {
        CsvBatch batch = CsvBatch.read(ENTRY, "mach,gamma\n1,1.4\n".getBytes(UTF_8), Limits.STANDARD);
        assertThrows(DocumentRefusedException.class, () -> batch.ledger(Map.of("gamma", Given.number(1.4)), null));
    }

    private static String answer(String csv, Map<String, Given> constants) throws Exception {
        CsvBatch batch = CsvBatch.read(ENTRY, csv.getBytes(UTF_8), Limits.STANDARD);
        Outcome outcome = new Evaluator(StandardCatalogue.get())
                .evaluate(batch.ledger(constants, null))
                .get(0);
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        batch.write(outcome, out);
        return out.toString(UTF_8);
    }
}
