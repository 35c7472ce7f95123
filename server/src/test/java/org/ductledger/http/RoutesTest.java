package org.ductledger.http;

import static org.ductledger.http.EvaluateTest.assertProblem;
import static org.ductledger.http.LiveService.json;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import org.ductledger.flow.StandardCatalogue;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class RoutesTest {
    private static final LiveService service = new LiveService();

    @AfterAll
    static void end() {
        service.close();
    }

    @Test
    void healthTellsStateAndVersion() throws IOException, InterruptedException {
        JsonNode health = json(service.get("/v1/health"));
        assertEquals("ok", health.get("status").asText());
        assertEquals(StandardCatalogue.VERSION, health.get("library").asText());
        assertEquals(
                StandardCatalogue.get().entries().size(),
                health.get("functions").asInt());
    }

    @Test
    void theRootListsTheRoutes() throws IOException, InterruptedException {
        String text = service.get("/").body();
        assertTrue(text.contains("POST /v1/evaluate\n"), text);
        assertTrue(text.contains("GET /v1/cell/{name}\n"), text);
    }

    @Test
    void functionsAndTemplatesByListAndByName() throws IOException, InterruptedException {
        JsonNode all = json(service.get("/v1/functions")).get("functions");
        assertEquals(StandardCatalogue.get().entries().size(), all.size());
        for (JsonNode function : all) {
            assertEquals(
                    function,
                    json(service.get("/v1/functions/" + function.get("name").asText())));
        }
        JsonNode templates = json(service.get("/v1/templates")).get("templates");
        assertTrue(templates.size() > 0);
        for (JsonNode template : templates) {
            assertEquals(
                    template,
                    json(service.get("/v1/templates/" + template.get("name").asText())));
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"/v1/functions", "/v1/functions/t_over_t0", "/v1/templates", "/"})
    void whatStaysTheSameIsNotSentTwice(String path) throws IOException, InterruptedException {
        String tag = service.get(path).headers().firstValue("ETag").orElse("");
        assertTrue(tag.matches("\"[0-9a-f]{32}\""), tag);
        for (String known : new String[] {tag, "\"other\", " + tag, "W/" + tag, "*"}) {
            HttpResponse<String> again = service.send(service.request(path).header("If-None-Match", known));
            assertEquals(304, again.statusCode());
            assertEquals(tag, again.headers().firstValue("ETag").orElse(""));
        }
        assertEquals(
                200,
                service.send(service.request(path).header("If-None-Match", "\"other\""))
                        .statusCode());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "/nothing",
                "/v1",
                "/v1/",
                "/v1/cell",
                "/v1/cell/",
                "/v1/cell/a/b",
                "/v1/functions/",
                "/v1/functions/no_such_function",
                "/v1/functions/..%2f..%2fetc%2fpasswd",
                "/v1/templates/no_such_template",
                "//v1/health",
                "/v1/health/",
                "/V1/health"
            })
    void anUnknownPathOrNameIsNotFound(String path) throws IOException, InterruptedException {
        assertProblem(service.get(path), 404);
    }

    @Test
    void aMistypedNameIsToldWhatIsNear() throws IOException, InterruptedException {
        assertTrue(json(service.get("/v1/functions/t_over_t"))
                .get("detail")
                .asText()
                .contains("near it: t_over_t0"));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
        GET    | /v1/evaluate   | POST, OPTIONS
        PUT    | /v1/evaluate   | POST, OPTIONS
        DELETE | /v1/health     | GET, HEAD, OPTIONS
        POST   | /v1/functions  | GET, HEAD, OPTIONS
        POST   | /v1/cell/t_over_t0 | GET, HEAD, OPTIONS
        TRACE  | /v1/cell/t_over_t0 | GET, HEAD, OPTIONS
        """)
    void aWrongMethodIsToldTheRightOnes(String method, String path, String allow) throws IOException {
        String answer = service.raw(method + " " + path + " HTTP/1.1\r\nHost: 127.0.0.1:" + service.port()
                + "\r\nConnection: close\r\n\r\n");
        assertTrue(answer.startsWith("HTTP/1.1 405 "), answer);
        assertTrue(answer.contains("\r\nAllow: " + allow + "\r\n"), answer);
    }

    @Test
    void headAndOptionsAnswerAsHttpAsks() throws IOException, InterruptedException {
        for (String path : new String[] {"/", "/v1/health", "/v1/functions", "/v1/templates"}) {
            HttpResponse<String> get = service.get(path);
            HttpResponse<String> head =
                    service.send(service.request(path).method("HEAD", HttpRequest.BodyPublishers.noBody()));
            assertEquals(200, head.statusCode());
            assertEquals("", head.body());
            assertEquals(
                    get.headers().firstValue("Content-Length"), head.headers().firstValue("Content-Length"));
        }
        HttpResponse<String> options =
                service.send(service.request("/v1/evaluate").method("OPTIONS", HttpRequest.BodyPublishers.noBody()));
        assertEquals(200, options.statusCode());
        assertEquals("POST, OPTIONS", options.headers().firstValue("Allow").orElse(""));
    }

    @Test
    void aGetWithABodyIsRefused() throws IOException {
        String answer = service.raw("GET /v1/health HTTP/1.1\r\nHost: 127.0.0.1:" + service.port()
                + "\r\nContent-Length: 2\r\nConnection: close\r\n\r\n{}");
        assertTrue(answer.startsWith("HTTP/1.1 400 "), answer);
    }
}
