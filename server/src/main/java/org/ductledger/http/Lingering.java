package org.ductledger.http;

import io.undertow.server.HttpServerExchange;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.ByteBuffer;
import java.time.Duration;
import org.xnio.channels.StreamSourceChannel;

/**
 * Answers a request whose body is not read to its end, and closes the connection. A client that still sends would lose
 * the answer with a connection closed at once (the unread bytes reset it), so that what comes is read away for a while.
 */
final class Lingering {
    private static final long NANOS = Duration.ofSeconds(2).toNanos();
    private static final int SCRATCH_BYTES = 16 * 1024;

    private Lingering() {}

    /** Sends the answer, whose status and header are set; blocks, so that it must run on a worker. */
    static void send(HttpServerExchange exchange, byte[] body) throws IOException {
        exchange.setPersistent(false);
        exchange.setResponseContentLength(body.length);
        OutputStream out = exchange.getOutputStream();
        out.write(body);
        out.flush();
        StreamSourceChannel channel = Bodies.channel(exchange);
        if (channel != null) {
            readAway(channel);
        }
    }

    private static void readAway(StreamSourceChannel channel) throws IOException {
        ByteBuffer scratch = ByteBuffer.allocate(SCRATCH_BYTES);
        long deadline = System.nanoTime() + NANOS;
        while (System.nanoTime() < deadline) {
            int count = channel.read(scratch.clear());
            if (count < 0 || (count == 0 && !Waiting.readable(channel, deadline))) {
                return;
            }
        }
    }
}
