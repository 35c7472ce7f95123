package org.ductledger.http;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.net.Socket;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CellTest {
    private static final LiveService service = new LiveService();

    @AfterAll
    static void end() {
        service.close();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
        t_over_t0?mach=2&gamma=1.4            | 0.5555555555555556
        t_over_t0?mach=2,0&gamma=1,4          | 0.5555555555555556
        t_over_t0?gamma=1.4&mach=2            | 0.5555555555555556
        t_over_t0?mach=%32&gamma=1%2E4        | 0.5555555555555556
        t_over_t0?mach=+2+&gamma=1.4          | 0.5555555555555556
        t_over_t0?mach=2E+0&gamma=1.4         | 0.5555555555555556
        t_over_t0?mach=200%25&gamma=1.4       | 0.5555555555555556
        t_over_t0?mach=200+%25&gamma=1.4      | 0.5555555555555556
        t_over_t0?mach=2&gamma=1.4&unit=%25   | 55.55555555555556
        t_over_t0?mach=-1&gamma=1.4           | fault: mach must be at least 0, got -1
        t_over_t0?mach=NaN&gamma=1.4          | fault: mach must be a number, got text
        t_over_t0?mach=&gamma=1.4             | fault: mach is given without a value
        t_over_t0?mach=2                      | fault: t_over_t0 requires gamma, greater than 1 and at most 100, and it is not given
        t_over_t0?mach=2&mach=3&gamma=1.4     | fault: mach is given twice
        t_over_t0?mach=2&gamma=1.4&v=1        | fault: t_over_t0 takes no argument v; it takes mach, gamma
        t_over_t0?mach=2bar&gamma=1.4         | fault: mach is a pure number, got bar
        t_over_t0?mach=1e400&gamma=1.4        | fault: mach must be a number within the range of a double (about 4.9e-324 to 1.8e308), got '1e400'
        t_over_t0?mach                        | fault: a query is made of name=value, got 'mach'
        t_over_t0?mach=%ff                    | fault: a query is encoded in UTF-8, got '%ff'
        no_such_function_here?mach=2          | fault: no function is named no_such_function_here
        """)
    void answersTheNumberOrTheFaultInWords(String call, String text) throws IOException {
        // By a bare socket: a client's library would not send a malformed query.
        String answer = service.raw("GET /v1/cell/" + call + " HTTP/1.1\r\nHost: 127.0.0.1:" + service.port()
                + "\r\nConnection: close\r\n\r\n");
        assertTrue(answer.startsWith("HTTP/1.1 200 "), answer);
        assertEquals(text, answer.substring(answer.indexOf("\r\n\r\n") + 4));
    }

    @Test
    void isPlainTextThatNoOneStores() throws IOException, InterruptedException {
        HttpResponse<String> response = service.get("/v1/cell/t_over_t0?mach=2&gamma=1.4");
        assertEquals(
                "text/plain; charset=utf-8",
                response.headers().firstValue("Content-Type").orElse(""));
        assertEquals("no-store", response.headers().firstValue("Cache-Control").orElse(""));
    }

    /** A spreadsheet's WEBSERVICE asks OPTIONS and HEAD before GET. */
    @Test
    void answersWhatASpreadsheetAsksFirst() throws IOException, InterruptedException {
        HttpResponse<String> options = service.send(service.request("/v1/cell/t_over_t0?mach=2&gamma=1.4")
                .method("OPTIONS", HttpRequest.BodyPublishers.noBody()));
        assertEquals(200, options.statusCode());
        assertEquals("GET, HEAD, OPTIONS", options.headers().firstValue("Allow").orElse(""));
        HttpResponse<String> head = service.send(service.request("/v1/cell/t_over_t0?mach=2&gamma=1.4")
                .method("HEAD", HttpRequest.BodyPublishers.noBody()));
        assertEquals(200, head.statusCode());
        assertEquals("18", head.headers().firstValue("Content-Length").orElse(""));
        assertEquals("", head.body());
    }

    /** Header and body must leave in one write, or each cell of a sheet waits for a delayed acknowledgement. */
    @Test
    void answersInOneSegment() throws IOException {
        try (Socket socket = service.connect()) {
            byte[] request = ("GET /v1/cell/t_over_t0?mach=2&gamma=1.4 HTTP/1.1\r\nHost: 127.0.0.1:" + service.port()
                            + "\r\n\r\n")
                    .getBytes(java.nio.charset.StandardCharsets.US_ASCII);
            for (int i = 0; i < 20; i++) {
                socket.getOutputStream().write(request);
                byte[] buffer = new byte[4096];
                int count = socket.getInputStream().read(buffer);
                String answer = new String(buffer, 0, count, java.nio.charset.StandardCharsets.US_ASCII);
                assertTrue(answer.endsWith("\r\n\r\n0.5555555555555556"), answer);
            }
        }
    }
}
