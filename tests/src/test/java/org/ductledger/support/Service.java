package org.ductledger.support;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import org.ductledger.http.DuctledgerServer;
import org.ductledger.http.ServerOptions;

/** The real service on a free port, and a client that asks it over its socket. */
public final class Service implements AutoCloseable {
    public static final String JSON = "application/json";

    private static final ObjectMapper MAPPER = new ObjectMapper();

    private final DuctledgerServer server;
    private final HttpClient client = HttpClient.newHttpClient();

    private Service(DuctledgerServer server) {
        this.server = server;
    }

    public static Service start() {
        try {
            return new Service(DuctledgerServer.start(0, ServerOptions.STANDARD));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Override
    public void close() {
        server.close();
    }

    public URI uri(String path) {
        return URI.create("http://127.0.0.1:" + server.port() + path);
    }

    public HttpResponse<String> get(String path) {
        return send(HttpRequest.newBuilder(uri(path)).build(), HttpResponse.BodyHandlers.ofString());
    }

    public HttpResponse<String> post(String path, String type, byte[] body) {
        return send(
                HttpRequest.newBuilder(uri(path))
                        .header("Content-Type", type)
                        .POST(HttpRequest.BodyPublishers.ofByteArray(body))
                        .build(),
                HttpResponse.BodyHandlers.ofString());
    }

    private <T> HttpResponse<T> send(HttpRequest request, HttpResponse.BodyHandler<T> body) {
        try {
            return client.send(request, body);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        }
    }

    /** Posts a ledger that must be evaluated. */
    public JsonNode evaluate(String ledger) {
        HttpResponse<String> response = post("/v1/evaluate", JSON, ledger.getBytes(StandardCharsets.UTF_8));
        assertEquals(200, response.statusCode(), response.body());
        return tree(response.body());
    }

    public static JsonNode tree(String json) {
        try {
            return MAPPER.readTree(json);
        } catch (JsonProcessingException e) {
            throw new IllegalStateException(e);
        }
    }

    /** The single value of the call with this id, in a ledger that must be evaluated without a fault. */
    public double wanted(String ledger, String id) {
        for (JsonNode result : evaluate(ledger).get("results")) {
            if (result.get("id").asText().equals(id)) {
                assertEquals(0, result.get("faults").size(), result.toString());
                return result.get("values").get(0).doubleValue();
            }
        }
        throw new IllegalArgumentException("no result " + id);
    }

    /** The column of one call with these arguments, lists or single values, that must have no fault. */
    public double[] values(String function, Map<String, ?> arguments) {
        ObjectNode call = MAPPER.createObjectNode();
        call.put("id", "asked").put("call", function);
        call.set("with", MAPPER.valueToTree(arguments));
        ObjectNode ledger = MAPPER.createObjectNode();
        ledger.putArray("ledger").add(call);
        JsonNode result = evaluate(ledger.toString()).get("results").get(0);
        assertEquals(0, result.get("faults").size(), result.get("faults").toString());
        double[] values = new double[result.get("values").size()];
        for (int i = 0; i < values.length; i++) {
            values[i] = result.get("values").get(i).doubleValue();
        }
        return values;
    }
}
