package org.ductledger.command;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import org.ductledger.batch.Json;
import org.ductledger.http.DuctledgerServer;

/** The file that tells scripts where the service listens: {@code {"port", "address", "pid"}}, for its owner alone. */
final class PortFile {
    private PortFile() {}

    /** Writes it beside its place, readable by the owner alone as temporary files are, and moves it there. */
    static void write(Path file, DuctledgerServer server) throws CommandException {
        byte[] content = Json.bytes(json -> {
            json.writeStartObject();
            json.writeNumberField("port", server.port());
            json.writeStringField("address", server.address());
            json.writeNumberField("pid", ProcessHandle.current().pid());
            json.writeEndObject();
        });
        try {
            Path beside = Files.createTempFile(file.toAbsolutePath().getParent(), ".port", ".part");
            try {
                Files.write(beside, content);
                Files.move(beside, file, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
            } finally {
                Files.deleteIfExists(beside);
            }
        } catch (IOException e) {
            throw CommandException.machine("the port file " + file + " could not be written: " + e.getMessage());
        }
    }

    static void remove(Path file) {
        try {
            Files.deleteIfExists(file);
        } catch (IOException e) {
            throw new UncheckedIOException("the port file " + file + " could not be removed", e);
        }
    }
}
