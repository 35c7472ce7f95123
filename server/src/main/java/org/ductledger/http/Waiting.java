package org.ductledger.http;

import java.io.IOException;
import java.util.concurrent.TimeUnit;
import org.xnio.channels.StreamSourceChannel;

/** Waits for the bytes of a body. */
final class Waiting {
    private Waiting() {}

    /**
     * Waits until there is something to read, or until the deadline.
     *
     * @param deadline by {@link System#nanoTime()}
     * @return whether the deadline is still to come
     */
    static boolean readable(StreamSourceChannel channel, long deadline) throws IOException {
        long left = deadline - System.nanoTime();
        if (left <= 0) {
            return false;
        }
        // At least one: the channel cuts to whole milliseconds, and waits for ever where none are left.
        channel.awaitReadable(TimeUnit.NANOSECONDS.toMillis(left) + 1, TimeUnit.MILLISECONDS);
        return true;
    }
}
