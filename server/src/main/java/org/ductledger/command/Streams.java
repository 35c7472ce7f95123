package org.ductledger.command;

import java.io.InputStream;
import java.io.PrintStream;

/**
 * A command's standard streams.
 *
 * @param out for results alone
 * @param err for everything else
 */
record Streams(InputStream in, PrintStream out, PrintStream err) {}
