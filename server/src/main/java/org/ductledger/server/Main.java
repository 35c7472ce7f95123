package org.ductledger.server;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.InputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import org.ductledger.command.Commands;

/** The program: {@code ductledger COMMAND ...}. */
public final class Main {
    private Main() {}

    public static void main(String[] args) {
        PrintStream out = utf8(FileDescriptor.out);
        PrintStream err = utf8(FileDescriptor.err);
        System.exit(run(System.in, out, err, args));
    }

    private static PrintStream utf8(FileDescriptor descriptor) {
        return new PrintStream(new FileOutputStream(descriptor), false, StandardCharsets.UTF_8);
    }

    /**
     * Runs one command.
     *
     * @return the exit code: 0 done; 1 done, and differences or faults were found; 2 wrong usage; 3 an input could not
     *     be read; 4 internal error
     */
    public static int run(InputStream in, PrintStream out, PrintStream err, String... args) {
        int code = Commands.run(in, out, err, args);
        out.flush();
        err.flush();
        return code;
    }
}
