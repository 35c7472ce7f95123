package org.ductledger.command;

import java.io.IOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.time.Duration;

/** Posts to a service of this program, and takes nothing but success for an answer. */
final class LoopbackClient {
    private static final Duration PATIENCE = Duration.ofSeconds(60);
    private static final int OK = 200;

    private final String address;
    private final HttpClient client =
            HttpClient.newBuilder().version(HttpClient.Version.HTTP_1_1).build();

    LoopbackClient(String address) {
        this.address = address;
    }

    byte[] post(String path, String mediaType, byte[] body) throws IOException, InterruptedException, CommandException {
        HttpResponse<byte[]> response = client.send(
                HttpRequest.newBuilder(URI.create(address + path))
                        .timeout(PATIENCE)
                        .header("Content-Type", mediaType)
                        .POST(HttpRequest.BodyPublishers.ofByteArray(body))
                        .build(),
                HttpResponse.BodyHandlers.ofByteArray());
        if (response.statusCode() != OK) {
            throw CommandException.machine(path + " answered " + response.statusCode() + ": "
                    + new String(response.body(), StandardCharsets.UTF_8));
        }
        return response.body();
    }
}
