package org.ductledger.http;

import static java.nio.charset.StandardCharsets.ISO_8859_1;
import static java.nio.charset.StandardCharsets.UTF_8;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.InetAddress;
import java.net.Socket;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.net.http.HttpResponse.BodyHandlers;
import java.time.Duration;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.ledger.Evaluator;

/** The real service on a free port, and clients for it: a well-behaved one, and a bare socket. */
public final class LiveService implements AutoCloseable {
    private static final ObjectMapper MAPPER = new ObjectMapper();
    private static final int SOCKET_MILLIS = 20_000;

    private final DuctledgerServer server;
    private final HttpClient client =
            HttpClient.newBuilder().version(HttpClient.Version.HTTP_1_1).build();

    public LiveService() {
        this(ServerOptions.STANDARD, new Evaluator(StandardCatalogue.get()));
    }

    public LiveService(ServerOptions options, Evaluator evaluator) {
        try {
            server = DuctledgerServer.start(0, options, evaluator);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    public int port() {
        return server.port();
    }

    public HttpRequest.Builder request(String path) {
        return HttpRequest.newBuilder(URI.create(server.address() + path)).timeout(Duration.ofSeconds(30));
    }

    public HttpResponse<String> send(HttpRequest.Builder request) throws IOException, InterruptedException {
        return client.send(request.build(), BodyHandlers.ofString(UTF_8));
    }

    public HttpResponse<String> get(String path) throws IOException, InterruptedException {
        return send(request(path));
    }

    public HttpResponse<String> post(String path, String json) throws IOException, InterruptedException {
        return post(path, "application/json", json.getBytes(UTF_8));
    }

    public HttpResponse<String> post(String path, String mediaType, byte[] body)
            throws IOException, InterruptedException {
        return send(request(path).header("Content-Type", mediaType).POST(HttpRequest.BodyPublishers.ofByteArray(body)));
    }

    public HttpResponse<byte[]> postForBytes(String path, String json) throws IOException, InterruptedException {
        return client.send(
                request(path)
                        .header("Content-Type", "application/json")
                        .POST(HttpRequest.BodyPublishers.ofString(json))
                        .build(),
                BodyHandlers.ofByteArray());
    }

    /** What the service answers to these bytes on one connection, until it closes it. */
    public String raw(String... chunks) throws IOException {
        try (Socket socket = connect()) {
            for (String chunk : chunks) {
                socket.getOutputStream().write(chunk.getBytes(ISO_8859_1));
                socket.getOutputStream().flush();
            }
            return new String(socket.getInputStream().readAllBytes(), UTF_8);
        }
    }

    public Socket connect() throws IOException {
        Socket socket = new Socket(InetAddress.getLoopbackAddress(), port());
        socket.setSoTimeout(SOCKET_MILLIS);
        return socket;
    }

    public static JsonNode json(HttpResponse<String> response) throws IOException {
        return MAPPER.readTree(response.body());
    }

    @Override
    public void close() {
        server.close();
    }
}
