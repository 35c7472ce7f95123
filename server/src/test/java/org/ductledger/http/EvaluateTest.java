package org.ductledger.http;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.ductledger.http.LiveService.json;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class EvaluateTest {
    private static final LiveService service = new LiveService();

    private static final String GOOD = """
            {"ledger":[{"id":"t","call":"t_over_t0","with":{"mach":[0,2],"gamma":1.4}}]}""";

    @AfterAll
    static void end() {
        service.close();
    }

    @Test
    void answersALedger() throws IOException, InterruptedException {
        HttpResponse<String> response = service.post("/v1/evaluate", GOOD);
        assertEquals(200, response.statusCode(), response.body());
        assertEquals(
                "application/json",
                response.headers().firstValue("Content-Type").orElse(""));
        assertEquals("""
                {"library":"1.0.0","results":[{"id":"t","call":"t_over_t0","revision":1,"unit":"1",\
                "values":[1.0,0.5555555555555556],"faults":[]}]}""", response.body());
    }

    @Test
    void aRowThatFailsIsAFaultOfAnAnsweredRequest() throws IOException, InterruptedException {
        HttpResponse<String> response = service.post("/v1/evaluate", GOOD.replace("[0,2]", "[-1,2]"));
        assertEquals(200, response.statusCode());
        JsonNode result = json(response).at("/results/0");
        assertEquals("[null,0.5555555555555556]", result.get("values").toString());
        assertEquals("""
                [{"row":0,"kind":"outside_domain","argument":"mach","given":-1.0,\
                "detail":"mach must be at least 0, got -1"}]""", result.get("faults").toString());
    }

    /** References, columns, spread values, words and units in one ledger, and only what is wanted in the answer. */
    @Test
    void answersAWholeChain() throws IOException, InterruptedException {
        HttpResponse<String> response = service.post("/v1/evaluate", """
                {"ledger": [
                  {"id": "m_exit", "call": "mach_from_area_ratio",
                   "with": {"area_ratio": [1.439, 2.0, 4.0], "gamma": 1.4, "branch": "supersonic"}},
                  {"id": "p_exit", "call": "p_over_p0", "with": {"mach": {"ref": "m_exit"}, "gamma": 1.4}},
                  {"id": "flow", "call": "choked_mass_flow",
                   "with": {"p0": {"value": 7, "unit": "bar"}, "t0": 293.15, "area": {"value": 1.2, "unit": "in2"},
                            "gamma": 1.4, "gas_constant": 296.8}, "unit": "kg/h"},
                  {"id": "role", "call": "passage_role", "with": {"mach": {"ref": "m_exit"}, "area_change": 1}}],
                 "want": ["p_exit", "flow", "role"]}""");
        assertEquals(200, response.statusCode(), response.body());
        JsonNode results = json(response).get("results");
        assertEquals(3, results.size());
        JsonNode p = results.get(0);
        assertEquals("p_exit", p.get("id").asText());
        // NACA Report 1135, table II (from memory): at M = 1.80, A/A* is 1.439 and p/pt is .1740.
        assertEquals(0.1740, p.at("/values/0").asDouble(), 2e-4);
        assertEquals(3, p.get("values").size());
        JsonNode flow = results.get(1);
        assertEquals("kg/h", flow.get("unit").asText());
        assertEquals(1, flow.get("values").size());
        assertEquals(
                "[\"nozzle\",\"nozzle\",\"nozzle\"]",
                results.get(2).get("values").toString());
        assertEquals("1", results.get(2).get("unit").asText());
        for (JsonNode result : results) {
            assertEquals("[]", result.get("faults").toString());
        }
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
        t_over_t0            | {"mach": 1, "gamma": 1}                                             | gamma      | greater than 1
        t_over_t0            | {"mach": -1, "gamma": 1.4}                                          | mach       | at least 0, got -1
        mach_from_area_ratio | {"area_ratio": 0.5, "gamma": 1.4, "branch": "subsonic"}             | area_ratio | at least 1, got 0.5
        mach_from_area_ratio | {"area_ratio": 2, "gamma": 1.4, "branch": "transonic"}              | branch     | got 'transonic'
        choked_mass_flow     | {"p0": {"value": -1, "unit": "bar"}, "t0": 293.15, "area": 1, "gamma": 1.4, "gas_constant": 287} | p0 | greater than 0 bar, got -1 bar
        """)
    void aRowOutsideTheDomainSaysWhatIsRequiredAndGiven(String call, String with, String argument, String detail)
            throws IOException, InterruptedException {
        HttpResponse<String> response = service.post(
                "/v1/evaluate", "{\"ledger\":[{\"id\":\"a\",\"call\":\"" + call + "\",\"with\":" + with + "}]}");
        assertEquals(200, response.statusCode(), response.body());
        JsonNode fault = json(response).at("/results/0/faults/0");
        assertEquals("outside_domain", fault.get("kind").asText());
        assertEquals(argument, fault.get("argument").asText());
        assertTrue(fault.get("detail").asText().contains(detail), response.body());
        assertEquals("[null]", json(response).at("/results/0/values").toString());
    }

    /** Issue by issue what an engineer or a script gets wrong; each answer names the place and what is required. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
        # arguments or function                     | status | kind             | pointer                    | detail says
        {"mach": 1}                                 | 422    | missing_argument | /ledger/0/with/gamma       | t_over_t0 requires gamma
        {"mach": 1, "gamma": "1.4"}                 | 422    | not_a_number     | /ledger/0/with/gamma       | gamma must be a number, got text
        {"mach": {"value": 1, "unit": "bar"}, "gamma": 1.4} | 422 | unknown_unit | /ledger/0/with/mach/unit | mach is a pure number, got bar
        {"mach": {"value": 1, "unit": "psig"}, "gamma": 1.4} | 422 | unknown_unit | /ledger/0/with/mach/unit | is a gauge unit
        {"mach": {"ref": "t"}, "gamma": 1.4}        | 422    | bad_reference    | /ledger/0/with/mach/ref    | which is not an earlier call
        {"mach": {"ref": "x"}, "gamma": 1.4}        | 422    | bad_reference    | /ledger/0/with/mach/ref    | no call has that id
        {"mach": [1, 2], "gamma": [1.4, 1.4, 1.4]}  | 422    | bad_reference    | /ledger/0                  | same number of rows
        {"mach": [], "gamma": 1.4}                  | 422    | missing_argument | /ledger/0/with/mach        | has no rows
        {"mach": NaN, "gamma": 1.4}                 | 400    | malformed        | /ledger/0/with/mach        | is not valid JSON
        {"mach": 1e400, "gamma": 1.4}               | 400    | not_a_number     | /ledger/0/with/mach        | range of a double
        {"mach": null, "gamma": 1.4}                | 400    | wrong_type       | /ledger/0/with/mach        | got null
        {"mach": [1, null], "gamma": 1.4}           | 400    | not_a_number     | /ledger/0/with/mach/1      | must be a number, got null
        {"mach": [1, "2"], "gamma": 1.4}            | 400    | not_a_number     | /ledger/0/with/mach/1      | must be a number, got a text
        {"mach": 1, "mach": 1, "gamma": 1.4}        | 400    | duplicate_member | /ledger/0/with/mach        | 'mach' is given twice
        {"mach": 1, "gamma": 1.4                    | 400    | malformed        | /ledger/0/with             | is not valid JSON
        """)
    void refusesWithThePlaceAndWhatIsRequired(String with, int status, String kind, String pointer, String detail)
            throws IOException, InterruptedException {
        HttpResponse<String> response = service.post(
                "/v1/evaluate", "{\"ledger\":[{\"id\":\"t\",\"call\":\"t_over_t0\",\"with\":" + with + "}]}");
        assertProblem(response, status);
        JsonNode error = json(response).at("/errors/0");
        assertEquals(kind, error.get("kind").asText(), response.body());
        assertEquals(pointer, error.get("pointer").asText(), response.body());
        assertTrue(error.get("detail").asText().contains(detail), response.body());
        assertEquals(200, service.post("/v1/evaluate", GOOD).statusCode());
    }

    @Test
    void refusesACircleAnUnknownFunctionAndNamesEveryReason() throws IOException, InterruptedException {
        HttpResponse<String> response = service.post("/v1/evaluate", """
                {"ledger":[
                 {"id":"a","call":"t_over_t0","with":{"mach":{"ref":"b"},"gamma":1.4}},
                 {"id":"b","call":"t_over_t0","with":{"mach":{"ref":"a"},"gamma":1.4}},
                 {"id":"c","call":"t_over_t","with":{}}]}""");
        assertProblem(response, 422);
        JsonNode errors = json(response).get("errors");
        assertEquals("/ledger/0/with/mach/ref", errors.get(0).get("pointer").asText());
        assertEquals("/ledger/2/call", errors.get(1).get("pointer").asText());
        assertTrue(errors.get(1).get("detail").asText().contains("near it: t_over_t0"), response.body());
    }

    /** An answer that is cut short must not look whole: a short one has its length, a long one its last chunk. */
    @Test
    void everyAnswerTellsItsEnd() throws IOException, InterruptedException {
        for (int rows : new int[] {1, 1_000, 100_000}) {
            String column = "[" + "0,".repeat(rows - 1) + "0]";
            String body = GOOD.replace("[0,2]", column);
            String answer = service.raw("POST /v1/evaluate HTTP/1.1\r\nHost: 127.0.0.1:" + service.port()
                    + "\r\nContent-Type: application/json\r\nConnection: close\r\nContent-Length: " + body.length()
                    + "\r\n\r\n" + body);
            String head = answer.substring(0, answer.indexOf("\r\n\r\n") + 2);
            assertTrue(
                    rows < 100_000
                            ? head.contains("\r\nContent-Length: ")
                            : head.contains("\r\nTransfer-Encoding: chunked\r\n") && answer.endsWith("\r\n0\r\n\r\n"),
                    head);
            JsonNode values = json(service.post("/v1/evaluate", body)).at("/results/0/values");
            assertEquals(rows, values.size());
        }
    }

    @Test
    void refusesWhatIsNoJsonByItsType() throws IOException, InterruptedException {
        for (String type : new String[] {"text/plain", "application/json; charset=latin1", "text/json", "a;;b"}) {
            assertProblem(service.post("/v1/evaluate", type, GOOD.getBytes(UTF_8)), 415);
        }
        assertProblem(
                service.send(service.request("/v1/evaluate").POST(HttpRequest.BodyPublishers.ofString(GOOD))), 415);
        assertEquals(
                200,
                service.post("/v1/evaluate", "Application/JSON; Charset=\"UTF-8\"", GOOD.getBytes(UTF_8))
                        .statusCode());
        assertProblem(
                service.send(service.request("/v1/evaluate")
                        .header("Content-Type", "application/json")
                        .header("Content-Encoding", "gzip")
                        .POST(HttpRequest.BodyPublishers.ofString(GOOD))),
                415);
    }

    @Test
    void refusesAnEmptyAndADeepDocument() throws IOException, InterruptedException {
        assertProblem(service.post("/v1/evaluate", ""), 400);
        assertProblem(service.post("/v1/evaluate", "[".repeat(200_000)), 400);
        assertProblem(service.post("/v1/evaluate", "{\"ledger\":".repeat(50_000)), 400);
        assertProblem(service.post("/v1/evaluate", GOOD.replace("[0,2]", "1" + "0".repeat(1_000_000))), 413);
    }

    static void assertProblem(HttpResponse<String> response, int status) throws IOException {
        assertEquals(status, response.statusCode(), response.body());
        assertEquals(
                "application/problem+json",
                response.headers().firstValue("Content-Type").orElse(""));
        JsonNode problem = json(response);
        assertEquals(status, problem.get("status").asInt());
        assertTrue(problem.get("type").asText().startsWith("urn:ductledger:problem:"), response.body());
        assertTrue(!problem.get("title").asText().isEmpty()
                && !problem.get("detail").asText().isEmpty());
    }
}
