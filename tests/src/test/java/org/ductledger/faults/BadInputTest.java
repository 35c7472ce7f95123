package org.ductledger.faults;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.ductledger.support.Service;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Bad input over the socket: each message names the place, what is required and what was given; the service goes on. */
final class BadInputTest {
    private static final String XLSX = "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet";

    private static Service service;

    @BeforeAll
    static void start() {
        service = Service.start();
    }

    @AfterAll
    static void stop() {
        service.close();
    }

    @AfterEach
    void theServiceGoesOn() {
        String good = """
                {"ledger": [{"id": "t", "call": "t_over_t0", "with": {"mach": 2, "gamma": 1.4}}]}""";
        // T/T0 at Mach 2: 1/1.8, NACA Report 1135, eq. (43).
        assertEquals(1 / 1.8, service.wanted(good, "t"), 1e-15);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            t_over_t0            | {"mach": 2, "gamma": 1}                                              | gamma      | greater than 1 | got 1
            t_over_t0            | {"mach": -1, "gamma": 1.4}                                           | mach       | at least 0     | got -1
            mach_from_area_ratio | {"area_ratio": 0.5, "gamma": 1.4, "branch": "subsonic"}              | area_ratio | at least 1     | got 0.5
            mach_from_area_ratio | {"area_ratio": 2, "gamma": 1.4, "branch": "sideways"}                | branch     | subsonic, supersonic | 'sideways'
            shock_mach2          | {"mach1": 0.9, "gamma": 1.4}                                         | mach1      | at least 1     | got 0.9
            gas_density          | {"p": {"value": -2, "unit": "bar"}, "t": 300, "gas_constant": 287}   | p          | greater than 0 bar | got -2 bar
            """)
    void aRowOutsideItsDomainHasAFault(String function, String with, String argument, String required, String given) {
        String ledger = "{\"ledger\": [{\"id\": \"x\", \"call\": \"" + function + "\", \"with\": " + with + "}]}";
        JsonNode result = service.evaluate(ledger).get("results").get(0);
        assertTrue(result.get("values").get(0).isNull(), result.toString());
        JsonNode fault = result.get("faults").get(0);
        assertEquals("outside_domain", fault.get("kind").asText());
        assertEquals(0, fault.get("row").asInt());
        assertEquals(argument, fault.get("argument").asText());
        String detail = fault.get("detail").asText();
        assertTrue(detail.contains(required) && detail.contains(given), detail);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', textBlock = """
            {"ledger": [{"id": "x", "call": "t_over_t0", "with": {"mach": NaN, "gamma": 1.4}}]}                     | /ledger/0/with/mach
            {"ledger": [{"id": "x", "call": "t_over_t0", "with": {"mach": 1e400, "gamma": 1.4}}]}                   | /ledger/0/with/mach
            {"ledger": [{"id": "x", "call": "t_over_t0", "with": {"mach": [1, null], "gamma": 1.4}}]}               | /ledger/0/with/mach/1
            {"ledger": [{"id": "x", "call": "t_over_t0", "with": {"mach": "2", "gamma": 1.4}}]}                     | /ledger/0/with/mach
            {"ledger": [{"id": "x", "call": "t_over_t0", "with": {"mach": 2}}]}                                     | /ledger/0/with
            {"ledger": [{"id": "x", "call": "t_over_t9", "with": {"mach": 2, "gamma": 1.4}}]}                       | /ledger/0/call
            {"ledger": [{"id": "x", "call": "t_over_t0", "with": {"mach": {"value": 2, "unit": "bar"}, "gamma": 1.4}}]} | /ledger/0/with/mach
            {"ledger": [{"id": "x", "call": "gas_density", "with": {"p": {"value": 2, "unit": "psig"}, "t": 300, "gas_constant": 287}}]} | /ledger/0/with/p
            {"ledger": [{"id": "x", "call": "gas_density", "with": {"p": 1e5, "t": {"value": 3, "unit": "delta_K"}, "gas_constant": 287}}]} | /ledger/0/with/t
            {"ledger": [{"id": "a", "call": "t_over_t0", "with": {"mach": {"ref": "b"}, "gamma": 1.4}}, {"id": "b", "call": "t_over_t0", "with": {"mach": {"ref": "a"}, "gamma": 1.4}}]} | /ledger/0/with/mach
            {"ledger": [{"id": "x", "call": "t_over_t0", "with": {"mach": [1, 2], "gamma": [1.4, 1.3, 1.2]}}]}      | /ledger/0
            {"ledger": [{"id": "x", "call": "t_over_t0", "with": {"mach": 2, "gamma": 1.4}, "also": 1}]}            | /ledger/0/also
            {"ledger": [{"id": "x", "call": "t_over_t0", "with": {"mach": 2, "mach": 3, "gamma": 1.4}}]}            | /ledger/0/with/mach
            {"ledger": [{"id": "x", "call": "t_over_t0", "with": {"mach": 2, "gamma": 1.4}}]                        | ~~
            {"ledger": [{"id": "x", "call": "t_over_t0", "with": {"mach": 2, "gamma": 1.4}}]} {}                    | ~~
            """)
    void anUnsoundLedgerIsRefusedWithThePlace(String ledger, String pointer) {
        HttpResponse<String> response =
                service.post("/v1/evaluate", Service.JSON, ledger.getBytes(StandardCharsets.UTF_8));
        JsonNode problem = problem(response);
        List<String> pointers = new ArrayList<>();
        problem.path("errors")
                .forEach(error -> pointers.add(error.path("pointer").asText()));
        assertTrue(
                pointers.stream().anyMatch(found -> found.startsWith(pointer)),
                () -> "expected " + pointer + ": " + response.body());
    }

    private static JsonNode problem(HttpResponse<String> response) {
        assertTrue(response.statusCode() >= 400 && response.statusCode() < 500, response.body());
        assertTrue(
                response.headers().firstValue("Content-Type").orElse("").startsWith("application/problem+json"),
                response.headers().toString());
        JsonNode problem = Service.tree(response.body());
        assertEquals(response.statusCode(), problem.get("status").asInt());
        assertTrue(problem.get("detail").asText().length() > 10, response.body());
        return problem;
    }

    @Test
    void aFileThatIsNoZipIsRefused() {
        JsonNode problem = problem(service.post("/v1/audit", XLSX, "a plain text".getBytes(StandardCharsets.UTF_8)));
        assertTrue(problem.get("detail").asText().contains("XLSX"), problem.toString());
    }

    @Test
    void aWorkbookWithoutALedgerIsRefused() throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try (XSSFWorkbook book = new XSSFWorkbook()) {
            book.createSheet("Anything").createRow(0).createCell(0).setCellValue(1);
            book.write(out);
        }
        JsonNode problem = problem(service.post("/v1/audit", XLSX, out.toByteArray()));
        assertTrue(problem.get("detail").asText().contains("Ledger"), problem.toString());
    }
}
