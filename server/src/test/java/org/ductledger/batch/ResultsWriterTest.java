package org.ductledger.batch;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.List;
import org.ductledger.catalogue.Catalogue;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.LedgerRefusedException;
import org.ductledger.ledger.Outcome;
import org.junit.jupiter.api.Test;

/** Documents in and out of the evaluator, as scripts see them. */
class ResultsWriterTest {
    private static final Catalogue CATALOGUE = StandardCatalogue.get();
    private static final Evaluator EVALUATOR = new Evaluator(CATALOGUE);

    @Test
    void writesValuesInTheirShortestForm() throws Exception {
        assertEquals(
                """
                {"library":"1.0.0","results":[{"id":"t","call":"t_over_t0","revision":1,"unit":"1",\
                "values":[1.0,0.8333333333333334,0.5555555555555556],"faults":[]}]}""",
                answer(
                        "{\"ledger\":[{\"id\":\"t\",\"call\":\"t_over_t0\",\"with\":{\"mach\":[0,1,2],\"gamma\":1.4}}]}"));
    }

    @Test
    void aRowWithAFaultIsNullAndSpoilsNoOther() throws Exception {
        assertEquals(
                """
                {"library":"1.0.0","results":[{"id":"t","call":"t_over_t0","revision":1,"unit":"1",\
                "values":[null,0.5555555555555556],"faults":[{"row":0,"kind":"outside_domain","argument":"mach",\
                "given":-1.0,"detail":"mach must be at least 0, got -1"}]}]}""",
                answer(
                        "{\"ledger\":[{\"id\":\"t\",\"call\":\"t_over_t0\",\"with\":{\"mach\":[-1,2],\"gamma\":1.4}}]}"));
    }

    @Test
    void placesWhatTheEvaluatorRefuses() throws Exception {
        assertEquals(
                List.of(
                        "unknown_function /ledger/0/call",
                        "missing_argument /ledger/1/with/gamma",
                        "missing_argument /ledger/2/with/speed",
                        "unknown_unit /ledger/3/with/mach/unit",
                        "unknown_unit /ledger/4/unit",
                        "bad_reference /ledger/5/with/mach/ref",
                        "not_a_number /ledger/6/with/gamma",
                        "bad_reference /ledger/7",
                        "bad_reference /want"),
                refusals("""
                        {"ledger": [
                          {"id": "a", "call": "t_over_t00", "with": {}},
                          {"id": "b", "call": "t_over_t0", "with": {"mach": 1}},
                          {"id": "c", "call": "t_over_t0", "with": {"mach": 1, "gamma": 1.4, "speed": 1}},
                          {"id": "d", "call": "t_over_t0", "with": {"mach": {"value": 1, "unit": "bar"}, "gamma": 1.4}},
                          {"id": "e", "call": "t_over_t0", "with": {"mach": 1, "gamma": 1.4}, "unit": "K"},
                          {"id": "f", "call": "t_over_t0", "with": {"mach": {"ref": "f"}, "gamma": 1.4}},
                          {"id": "g", "call": "t_over_t0", "with": {"mach": 1, "gamma": "1.4"}},
                          {"id": "h", "call": "t_over_t0", "with": {"mach": [1, 2], "gamma": [1.4, 1.4, 1.4]}}],
                         "want": ["z"]}
                        """));
    }

    private static String answer(String document) throws IOException, DocumentRefusedException, LedgerRefusedException {
        Ledger ledger = new LedgerReader(Limits.STANDARD).read(document.getBytes(UTF_8));
        List<Outcome> outcomes = EVALUATOR.evaluate(ledger);
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ResultsWriter.write(CATALOGUE.version(), outcomes, out);
        return out.toString(UTF_8);
    }

    private static List<String> refusals(String document) throws DocumentRefusedException {
        Ledger ledger = new LedgerReader(Limits.STANDARD).read(document.getBytes(UTF_8));
        LedgerRefusedException refused = assertThrows(LedgerRefusedException.class, () -> EVALUATOR.evaluate(ledger));
        return Refusals.placed(ledger, refused).reasons().stream()
                .map(reason -> reason.kind() + " " + reason.pointer())
                .toList();
    }
}
