package org.ductledger.http;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.net.http.HttpResponse;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Pages of other sites are kept away, by whatever name they call the service. */
class GuardTest {
    private static final LiveService service = new LiveService();

    @AfterAll
    static void end() {
        service.close();
    }

    @ParameterizedTest
    @ValueSource(strings = {"127.0.0.1:PORT", "localhost:PORT", "[::1]:PORT"})
    void takesTheLoopbackNamesWithThePort(String host) throws IOException {
        assertStatus(200, raw("Host: " + host));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "Host: evil.example",
                "Host: evil.example:PORT",
                "Host: 127.0.0.1",
                "Host: localhost",
                "Host: 127.0.0.1:1",
                "Host: 127.0.0.2:PORT",
                "Host: 0.0.0.0:PORT",
                "Host: [::]:PORT",
                "Host:",
            })
    void refusesEveryOtherHost(String header) throws IOException {
        String answer = raw(header);
        assertStatus(403, answer);
        assertTrue(answer.contains("\"urn:ductledger:problem:foreign-host\""), answer);
    }

    /** What RFC 9112, 3.2, has every server refuse with 400 does not even come to the guard. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "Host: 127.0.0.1:PORT\r\nHost: evil.example",
                "Host: 127.0.0.1:PORT.evil.example",
                "Host: 127.0.0.1:PORT@evil.example",
                "X-Forwarded-Host: 127.0.0.1:PORT"
            })
    void refusesWhatIsNoHostAtAll(String header) throws IOException {
        assertStatus(400, raw(header));
    }

    @ParameterizedTest
    @CsvSource({
        "http://127.0.0.1:PORT, 200",
        "http://localhost:PORT, 200",
        "http://localhost:1, 403",
        "https://localhost:PORT, 403",
        "http://evil.example, 403",
        "null, 403",
        "'', 403",
    })
    void takesNoForeignOrigin(String origin, int status) throws IOException {
        assertStatus(status, raw("Host: 127.0.0.1:PORT\r\nOrigin: " + origin));
    }

    @ParameterizedTest
    @CsvSource({"cross-site, 403", "Cross-Site, 403", "same-origin, 200", "none, 200"})
    void takesNoCallFromAPageOfAnotherSite(String site, int status) throws IOException {
        assertStatus(status, raw("Host: 127.0.0.1:PORT\r\nSec-Fetch-Site: " + site));
    }

    @Test
    void refusesAForeignHostForAnyPathAndMethodAndBody() throws IOException {
        for (String line : new String[] {"GET /", "POST /v1/evaluate", "OPTIONS /v1/evaluate", "GET /nothing"}) {
            assertStatus(
                    403,
                    service.raw(line + " HTTP/1.1\r\nHost: evil.example\r\nConnection: close\r\n"
                            + "Content-Length: 2\r\nContent-Type: application/json\r\n\r\n{}"));
        }
    }

    @Test
    void refusesATargetThatNamesAHost() throws IOException {
        assertStatus(
                400,
                service.raw("GET http://evil.example/v1/health HTTP/1.1\r\nHost: 127.0.0.1:" + service.port()
                        + "\r\nConnection: close\r\n\r\n"));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "Content-Length: 2\r\nContent-Length: 3",
                "Content-Length: 2\r\nTransfer-Encoding: chunked",
                "Transfer-Encoding: chunked\r\nTransfer-Encoding: identity",
            })
    void refusesTwoStatementsOfTheBodysLength(String headers) throws IOException {
        String answer = service.raw("POST /v1/evaluate HTTP/1.1\r\nHost: 127.0.0.1:" + service.port() + "\r\n" + headers
                + "\r\nContent-Type: application/json\r\nConnection: close\r\n\r\n{}");
        assertStatus(400, answer);
    }

    @Test
    void neverSendsACorsHeader() throws IOException, InterruptedException {
        HttpResponse<String> response =
                service.send(service.request("/v1/health").header("Origin", "http://127.0.0.1:" + service.port()));
        assertEquals(200, response.statusCode());
        assertTrue(response.headers().map().keySet().stream()
                .noneMatch(name -> name.toLowerCase(java.util.Locale.ROOT).startsWith("access-control")));
    }

    private static String raw(String headers) throws IOException {
        String port = Integer.toString(service.port());
        return service.raw(
                "GET /v1/health HTTP/1.1\r\n" + headers.replace("PORT", port) + "\r\nConnection: close\r\n\r\n");
    }

    private static void assertStatus(int status, String answer) {
        assertTrue(answer.startsWith("HTTP/1.1 " + status + " "), answer);
    }
}
