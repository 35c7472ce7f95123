package org.ductledger.http;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import ch.qos.logback.classic.Logger;
import ch.qos.logback.classic.spi.ILoggingEvent;
import ch.qos.logback.core.read.ListAppender;
import java.io.IOException;
import java.net.Socket;
import java.net.http.HttpResponse;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.Catalogue;
import org.ductledger.catalogue.EntryBuilder;
import org.ductledger.catalogue.Family;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Kernel;
import org.ductledger.catalogue.Source;
import org.ductledger.ledger.Evaluator;
import org.junit.jupiter.api.Test;
import org.slf4j.LoggerFactory;

/** Bodies too large, too slow or too many, and errors of the service's own: each ends in a clear answer. */
class HardPressTest {
    private static final String GOOD = ledger("t_over_t0", "\"mach\": 2, \"gamma\": 1.4");

    @Test
    void aBodyOverTheLimitIs413HoweverItIsFramed() throws IOException {
        try (LiveService service = service(ServerOptions.STANDARD.withBodyBytes(1000))) {
            String fill = " ".repeat(1000 - GOOD.length());
            assertStatus(200, service.raw(fixed(service, GOOD + fill)));
            assertStatus(200, service.raw(chunked(service, GOOD + fill)));
            for (int extra : new int[] {1, 900, 2500, 100_000}) {
                assertStatus(413, service.raw(fixed(service, GOOD + fill + " ".repeat(extra))));
                assertStatus(413, service.raw(chunked(service, GOOD + fill + " ".repeat(extra))));
            }
        }
    }

    @Test
    void aClientThatAsksFirstIsAnsweredBeforeItSends() throws IOException {
        try (LiveService service = service(ServerOptions.STANDARD.withBodyBytes(1000));
                Socket socket = service.connect()) {
            String header = head(service) + "Expect: 100-continue\r\nContent-Length: ";
            socket.getOutputStream().write((header + GOOD.length() + "\r\n\r\n").getBytes(UTF_8));
            byte[] first = new byte[4096];
            String go = new String(first, 0, socket.getInputStream().read(first), UTF_8);
            assertStatus(100, go);
            socket.getOutputStream().write(GOOD.getBytes(UTF_8));
            assertStatus(200, new String(socket.getInputStream().readAllBytes(), UTF_8));
            assertStatus(413, service.raw(header + "1001\r\n\r\n"));
        }
    }

    @Test
    void aStalledOrDribbledBodyIs408() throws IOException, InterruptedException {
        ServerOptions hasty =
                ServerOptions.STANDARD.withTimes(Duration.ofSeconds(1), Duration.ofMillis(600), Duration.ofSeconds(5));
        try (LiveService service = service(hasty)) {
            assertStatus(408, service.raw(head(service) + "Content-Length: 100\r\n\r\n{\"ledger\""));
            try (Socket socket = service.connect()) {
                socket.getOutputStream().write((head(service) + "Content-Length: 100\r\n\r\n").getBytes(UTF_8));
                for (int i = 0; i < 12 && socket.getInputStream().available() == 0; i++) {
                    socket.getOutputStream().write(' ');
                    Thread.sleep(100);
                }
                byte[] status = socket.getInputStream().readNBytes(13);
                assertStatus(408, new String(status, UTF_8));
            }
            assertStatus(200, service.raw(fixed(service, GOOD)));
        }
    }

    @Test
    void aHeaderTooLongOrNeverEndingIsRefused() throws IOException {
        ServerOptions hasty =
                ServerOptions.STANDARD.withTimes(Duration.ofMillis(600), Duration.ofSeconds(1), Duration.ofSeconds(5));
        try (LiveService service = service(hasty)) {
            String answer = service.raw("GET /v1/health HTTP/1.1\r\nHost: 127.0.0.1:" + service.port() + "\r\nX-Long: "
                    + "x".repeat(20_000) + "\r\n\r\n");
            assertTrue(answer.isEmpty() || answer.startsWith("HTTP/1.1 4"), answer);
            assertEquals("", service.raw("GET /v1/health HTTP/1.1\r\nHost: 127."));
            assertStatus(200, service.raw(fixed(service, GOOD)));
        }
    }

    @Test
    void oneRequestTooManyIs503WithATimeToRetry() throws Exception {
        CountDownLatch started = new CountDownLatch(2);
        CountDownLatch go = new CountDownLatch(1);
        Evaluator slow = new Evaluator(catalogue(x -> {
            started.countDown();
            await(go);
            return x;
        }));
        ExecutorService clients = Executors.newFixedThreadPool(2);
        try (LiveService service = new LiveService(ServerOptions.STANDARD.withConcurrent(2), slow)) {
            List<Future<HttpResponse<String>>> running = new ArrayList<>();
            for (int i = 0; i < 2; i++) {
                running.add(clients.submit(() -> service.post("/v1/evaluate", ledger("test_kernel", "\"mach\": 2"))));
            }
            await(started);
            HttpResponse<String> refused = service.post("/v1/evaluate", ledger("test_kernel", "\"mach\": 2"));
            EvaluateTest.assertProblem(refused, 503);
            assertEquals("1", refused.headers().firstValue("Retry-After").orElse(""));
            assertEquals(200, service.get("/v1/health").statusCode());
            go.countDown();
            for (Future<HttpResponse<String>> response : running) {
                assertEquals(200, response.get().statusCode());
            }
            assertEquals(
                    200,
                    service.post("/v1/evaluate", ledger("test_kernel", "\"mach\": 2"))
                            .statusCode());
        } finally {
            clients.shutdown();
        }
    }

    @Test
    void whatRunsWhenTheServiceEndsIsFinished() throws Exception {
        CountDownLatch started = new CountDownLatch(1);
        CountDownLatch go = new CountDownLatch(1);
        Evaluator slow = new Evaluator(catalogue(x -> {
            started.countDown();
            await(go);
            return x;
        }));
        ExecutorService threads = Executors.newFixedThreadPool(2);
        try (LiveService service = new LiveService(ServerOptions.STANDARD, slow);
                Socket kept = service.connect()) {
            Future<HttpResponse<String>> running =
                    threads.submit(() -> service.post("/v1/evaluate", ledger("test_kernel", "\"mach\": 2")));
            await(started);
            Future<?> closing = threads.submit(service::close);
            String answer = "";
            while (!answer.startsWith("HTTP/1.1 503")) {
                kept.getOutputStream()
                        .write(("GET /v1/health HTTP/1.1\r\nHost: 127.0.0.1:" + service.port() + "\r\n\r\n")
                                .getBytes(UTF_8));
                byte[] buffer = new byte[4096];
                answer = new String(buffer, 0, kept.getInputStream().read(buffer), UTF_8);
            }
            go.countDown();
            assertEquals(200, running.get().statusCode());
            closing.get();
        } finally {
            threads.shutdown();
        }
    }

    @Test
    void anUnexpectedErrorIsAPlain500ThatTheLogExplains() throws Exception {
        ListAppender<ILoggingEvent> log = new ListAppender<>();
        log.list = new CopyOnWriteArrayList<>();
        log.start();
        Logger logger = (Logger) LoggerFactory.getLogger("org.ductledger");
        logger.addAppender(log);
        Evaluator broken = new Evaluator(catalogue(x -> {
            throw new IllegalStateException("the secret of the kernel");
        }));
        try (LiveService service = new LiveService(ServerOptions.STANDARD, broken)) {
            HttpResponse<String> response = service.post("/v1/evaluate", ledger("test_kernel", "\"mach\": 31337"));
            EvaluateTest.assertProblem(response, 500);
            String detail = LiveService.json(response).get("detail").asText();
            String id = detail.substring(detail.lastIndexOf(' ') + 1);
            assertTrue(!response.body().contains("secret") && !response.body().contains("Exception"), response.body());
            assertTrue(
                    log.list.stream()
                            .anyMatch(event -> event.getFormattedMessage().contains(id)
                                    && event.getThrowableProxy().getMessage().contains("secret")),
                    log.list::toString);
            HttpResponse<String> cell = service.get("/v1/cell/test_kernel?mach=31337");
            assertEquals(200, cell.statusCode());
            assertTrue(cell.body().startsWith("fault: the request met an error of the service itself"), cell.body());
            assertEquals(200, service.get("/v1/health").statusCode());
        } finally {
            logger.detachAppender(log);
        }
        assertTrue(
                log.list.stream().noneMatch(event -> event.getFormattedMessage().contains("31337")));
        assertTrue(
                log.list.stream().anyMatch(event -> event.getFormattedMessage().startsWith("POST /v1/evaluate 500 ")));
        assertTrue(log.list.stream()
                .anyMatch(event -> event.getFormattedMessage().startsWith("GET /v1/cell/{name} 200 ")));
    }

    @Test
    void manyClientsAtOnceEachGetTheirOwnAnswer() throws Exception {
        ExecutorService clients = Executors.newFixedThreadPool(16);
        try (LiveService service = new LiveService()) {
            List<Future<Boolean>> answers = new ArrayList<>();
            for (int i = 0; i < 16; i++) {
                int client = i;
                answers.add(clients.submit(() -> {
                    boolean right = true;
                    for (int n = 0; n < 40; n++) {
                        String mach = Double.toString(client + n / 64.0);
                        double expected = 1 / (1 + 0.2 * Double.parseDouble(mach) * Double.parseDouble(mach));
                        String cell = service.get("/v1/cell/t_over_t0?gamma=1.4&mach=" + mach)
                                .body();
                        String batch = service.post(
                                        "/v1/evaluate", ledger("t_over_t0", "\"gamma\": 1.4, \"mach\": " + mach))
                                .body();
                        right &= Math.abs(Double.parseDouble(cell) / expected - 1) < 1e-14;
                        right &= batch.contains("\"values\":[" + cell + "]");
                    }
                    return right;
                }));
            }
            for (Future<Boolean> answer : answers) {
                assertTrue(answer.get());
            }
        } finally {
            clients.shutdown();
        }
    }

    private static LiveService service(ServerOptions options) {
        return new LiveService(options, new Evaluator(org.ductledger.flow.StandardCatalogue.get()));
    }

    private static void await(CountDownLatch latch) {
        try {
            assertTrue(latch.await(20, java.util.concurrent.TimeUnit.SECONDS));
        } catch (InterruptedException e) {
            throw new IllegalStateException(e);
        }
    }

    private static Catalogue catalogue(Kernel.Of1 kernel) {
        FunctionEntry entry = new EntryBuilder(new Family("test", "Kernels for tests"), "test_kernel")
                .title("A kernel for a test")
                .formula("y = x")
                .takes(Argument.number("mach", "M", "1", Interval.atLeast(0), "a number"))
                .gives("y", "1", Interval.anyNumber())
                .kernel(kernel)
                .sources(new Source("none", "made up for this test", 2026, ""))
                .example("2", 2.0)
                .cell("{mach}")
                .build();
        return new Catalogue("1.0.0", List.of(entry));
    }

    private static String ledger(String function, String with) {
        return "{\"ledger\": [{\"id\": \"a\", \"call\": \"" + function + "\", \"with\": {" + with + "}}]}";
    }

    private static String head(LiveService service) {
        return "POST /v1/evaluate HTTP/1.1\r\nHost: 127.0.0.1:" + service.port()
                + "\r\nContent-Type: application/json\r\nConnection: close\r\n";
    }

    private static String fixed(LiveService service, String body) {
        return head(service) + "Content-Length: " + body.length() + "\r\n\r\n" + body;
    }

    private static String chunked(LiveService service, String body) {
        StringBuilder chunks = new StringBuilder(head(service)).append("Transfer-Encoding: chunked\r\n\r\n");
        for (int i = 0; i < body.length(); i += 300) {
            String chunk = body.substring(i, Math.min(body.length(), i + 300));
            chunks.append(Integer.toHexString(chunk.length()))
                    .append("\r\n")
                    .append(chunk)
                    .append("\r\n");
        }
        return chunks.append("0\r\n\r\n").toString();
    }

    private static void assertStatus(int status, String answer) {
        assertTrue(answer.startsWith("HTTP/1.1 " + status), answer);
    }
}
