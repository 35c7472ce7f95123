package org.ductledger.command;

/** What a command says by its exit code. */
final class ExitCode {
    static final int DONE = 0;
    /** The work was done, and found differences or faults. */
    static final int FOUND = 1;

    static final int USAGE = 2;
    static final int UNREADABLE = 3;
    static final int INTERNAL = 4;

    private ExitCode() {}
}
