package org.ductledger.command;

import java.io.IOException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

/** Writes files whole or not at all: beside their place first, then moved there. */
final class NewFile {
    private NewFile() {}

    /**
     * Writes a file.
     *
     * @param overwrite whether a file that is there may be replaced
     */
    static void write(Path file, byte[] content, boolean overwrite) throws CommandException {
        try {
            if (overwrite) {
                place(file, content);
            } else {
                // Taking the name first keeps two writers from replacing each other's file.
                Files.createFile(file);
                placeOrGiveBack(file, content);
            }
        } catch (FileAlreadyExistsException e) {
            throw CommandException.usage(file + " is there already; take another name, or --force");
        } catch (NoSuchFileException e) {
            throw CommandException.usage("there is no folder for " + file);
        } catch (IOException e) {
            throw CommandException.machine(file + " could not be written: " + e.getMessage());
        }
    }

    private static void placeOrGiveBack(Path file, byte[] content) throws IOException {
        try {
            place(file, content);
        } catch (IOException e) {
            Files.deleteIfExists(file);
            throw e;
        }
    }

    private static void place(Path file, byte[] content) throws IOException {
        Path folder = file.toAbsolutePath().getParent();
        Path beside = Files.createTempFile(folder, "." + file.getFileName(), ".part");
        try {
            Files.write(beside, content);
            Files.move(beside, file, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } finally {
            Files.deleteIfExists(beside);
        }
    }
}
