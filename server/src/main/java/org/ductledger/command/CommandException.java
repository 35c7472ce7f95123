package org.ductledger.command;

import org.jspecify.annotations.Nullable;

/** Ends a command with a message for its user and an exit code. */
final class CommandException extends Exception {
    private static final long serialVersionUID = 1L;

    private final int exitCode;

    private CommandException(int exitCode, @Nullable String message) {
        super(message);
        this.exitCode = exitCode;
    }

    static CommandException usage(@Nullable String message) {
        return new CommandException(ExitCode.USAGE, message);
    }

    static CommandException unreadable(@Nullable String message) {
        return new CommandException(ExitCode.UNREADABLE, message);
    }

    /** What the machine refused: a port, a folder, a full disk. */
    static CommandException machine(@Nullable String message) {
        return new CommandException(ExitCode.INTERNAL, message);
    }

    int exitCode() {
        return exitCode;
    }
}
