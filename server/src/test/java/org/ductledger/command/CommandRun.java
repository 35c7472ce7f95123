package org.ductledger.command;

import static java.nio.charset.StandardCharsets.UTF_8;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import org.ductledger.server.Main;

/** One run of the program in this JVM, as a shell would see it. */
record CommandRun(int code, String out, String err) {
    static CommandRun of(String... args) {
        return withInput("", args);
    }

    static CommandRun withInput(String input, String... args) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int code = Main.run(
                new ByteArrayInputStream(input.getBytes(UTF_8)),
                new PrintStream(out, false, UTF_8),
                new PrintStream(err, false, UTF_8),
                args);
        return new CommandRun(
                code,
                out.toString(UTF_8).replace(System.lineSeparator(), "\n"),
                err.toString(UTF_8).replace(System.lineSeparator(), "\n"));
    }
}
