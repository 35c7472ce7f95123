package org.ductledger.http;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.ductledger.http.EvaluateTest.assertProblem;
import static org.ductledger.http.LiveService.json;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.net.http.HttpResponse;
import java.util.Arrays;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;

/** Workbooks out of the service, and back into its audit. */
class WorkbookRoutesTest {
    private static final LiveService service = new LiveService();
    private static final String PATH = "/v1/workbooks/nozzle_sizing";

    @AfterAll
    static void end() {
        service.close();
    }

    @Test
    void aWorkbookIsAnAttachmentWithTheSameBytesForTheSameInputs() throws IOException, InterruptedException {
        HttpResponse<byte[]> response = service.postForBytes(PATH, "{\"p0\": {\"value\": 9, \"unit\": \"bar\"}}");
        assertEquals(200, response.statusCode());
        assertEquals(Answers.XLSX, response.headers().firstValue("Content-Type").orElse(""));
        assertEquals(
                "attachment; filename=\"nozzle_sizing.xlsx\"",
                response.headers().firstValue("Content-Disposition").orElse(""));
        try (XSSFWorkbook book = new XSSFWorkbook(new ByteArrayInputStream(response.body()))) {
            assertTrue(book.getSheetIndex("Inputs") >= 0);
        }
        assertArrayEquals(
                response.body(),
                service.postForBytes(PATH, "{\"p0\": {\"value\": 9, \"unit\": \"bar\"}}")
                        .body());
        assertFalse(Arrays.equals(
                response.body(),
                service.postForBytes(PATH + "?units=us", "{\"p0\": {\"value\": 9, \"unit\": \"bar\"}}")
                        .body()));
    }

    @Test
    void refusesInputsNamingEach() throws IOException, InterruptedException {
        HttpResponse<String> response = service.post(PATH, "{\"p0\": -1, \"t0\": {\"value\": 1, \"unit\": \"bar\"}}");
        assertProblem(response, 422);
        JsonNode errors = json(response).get("errors");
        assertEquals("/p0", errors.get(0).get("pointer").asText());
        assertEquals("unfit_input", errors.get(0).get("kind").asText());
        assertEquals("/t0", errors.get(1).get("pointer").asText());
        assertProblem(service.post(PATH, "{\"p0\": {\"ref\": \"a\"}}"), 400);
        assertProblem(service.post(PATH, "[]"), 400);
        assertProblem(service.post(PATH, ""), 400);
        assertProblem(service.post(PATH + "?units=metric", "{}"), 400);
        assertProblem(service.post(PATH + "?unit=us", "{}"), 400);
        assertProblem(service.post(PATH + "?units=us&units=us", "{}"), 400);
        assertProblem(service.post("/v1/workbooks/nozzle_size", "{}"), 404);
    }

    @Test
    void auditsWhatItBuilt() throws IOException, InterruptedException {
        byte[] workbook = service.postForBytes(PATH, "{}").body();
        JsonNode report = json(service.post("/v1/audit", Answers.XLSX, workbook));
        assertEquals("nozzle_sizing", report.get("template").asText());
        assertTrue(report.get("clean").asBoolean(), report::toString);
        assertTrue(report.get("calls").asInt() > 10 && report.get("cells").asInt() > 50, report::toString);
    }

    @Test
    void refusesWhatIsNoWorkbookOfItsOwn() throws IOException, InterruptedException {
        assertProblem(service.post("/v1/audit", Answers.XLSX, "no zip".getBytes(UTF_8)), 422);
        assertProblem(service.post("/v1/audit", Answers.XLSX, new byte[0]), 422);
        assertProblem(service.post("/v1/audit", "application/zip", "PK".getBytes(UTF_8)), 415);
        try (XSSFWorkbook book = new XSSFWorkbook();
                ByteArrayOutputStream out = new ByteArrayOutputStream()) {
            book.createSheet("Inputs");
            book.write(out);
            HttpResponse<String> response = service.post("/v1/audit", Answers.XLSX, out.toByteArray());
            assertProblem(response, 422);
            assertTrue(json(response).get("detail").asText().contains("Ledger"), response.body());
        }
    }
}
