package org.ductledger.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.net.InetAddress;
import java.net.ServerSocket;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ServeCommandTest {
    @TempDir
    private Path folder = Path.of("");

    @Test
    void servesUntilItIsEndedAndTellsWhereInItsPortFile() throws Exception {
        Path portFile = folder.resolve("port.json");
        ExecutorService thread = Executors.newSingleThreadExecutor();
        try {
            Future<CommandRun> serving =
                    thread.submit(() -> CommandRun.of("serve", "--port", "0", "--port-file", portFile.toString()));
            JsonNode told = new ObjectMapper().readTree(await(portFile, serving));
            assertEquals(ProcessHandle.current().pid(), told.get("pid").asLong());
            if (FileSystems.getDefault().supportedFileAttributeViews().contains("posix")) {
                assertEquals("rw-------", PosixFilePermissions.toString(Files.getPosixFilePermissions(portFile)));
            }
            HttpResponse<String> health = HttpClient.newHttpClient()
                    .send(
                            HttpRequest.newBuilder(
                                            URI.create(told.get("address").asText() + "/v1/health"))
                                    .build(),
                            HttpResponse.BodyHandlers.ofString());
            assertEquals(200, health.statusCode());
        } finally {
            thread.shutdownNow();
        }
        assertTrue(thread.awaitTermination(30, TimeUnit.SECONDS));
        assertFalse(Files.exists(portFile));
    }

    private static String await(Path file, Future<CommandRun> serving) throws Exception {
        while (!Files.exists(file)) {
            try {
                throw new AssertionError("it ended: " + serving.get(50, TimeUnit.MILLISECONDS));
            } catch (TimeoutException e) {
                assertFalse(serving.isDone());
            }
        }
        return Files.readString(file);
    }

    @Test
    void aTakenPortIsSaidPlainly() throws IOException {
        try (ServerSocket taken = new ServerSocket(0, 1, InetAddress.getLoopbackAddress())) {
            CommandRun run = CommandRun.of("serve", "--port", Integer.toString(taken.getLocalPort()));
            assertEquals(4, run.code());
            assertTrue(
                    run.err().contains("port " + taken.getLocalPort() + " of 127.0.0.1 is not to be had"), run.err());
            assertFalse(run.err().contains("\tat "), run.err());
        }
    }

    @Test
    void aPortThatIsNoneIsWrongUsage() {
        assertEquals(2, CommandRun.of("serve", "--port", "65536").code());
        assertEquals(2, CommandRun.of("serve", "--port", "http").code());
    }

    @Test
    void aPortFileThatCannotBeWrittenEndsIt() {
        Path nowhere = folder.resolve("none").resolve("port.json");
        CommandRun run = CommandRun.of("serve", "--port", "0", "--port-file", nowhere.toString());
        assertEquals(4, run.code());
        assertTrue(run.err().contains("the port file"), run.err());
    }
}
