package org.ductledger.command;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;

/** Reads the files that a command is given. */
final class GivenFile {
    private static final String STANDARD_INPUT = "-";

    private GivenFile() {}

    /** All bytes of a file, or of standard input where the name is a hyphen. */
    static byte[] read(String name, Streams streams) throws CommandException {
        try {
            return name.equals(STANDARD_INPUT) ? streams.in().readAllBytes() : Files.readAllBytes(Path.of(name));
        } catch (NoSuchFileException e) {
            throw CommandException.unreadable("there is no file " + name);
        } catch (IOException e) {
            throw CommandException.unreadable(name + " could not be read: " + e.getMessage());
        }
    }
}
