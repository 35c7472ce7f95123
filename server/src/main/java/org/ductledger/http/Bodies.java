package org.ductledger.http;

import io.undertow.server.HttpServerExchange;
import io.undertow.server.protocol.http.HttpContinue;
import io.undertow.util.AttachmentKey;
import io.undertow.util.Headers;
import io.undertow.util.StatusCodes;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.util.Arrays;
import java.util.Locale;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import org.xnio.channels.StreamSourceChannel;

/** Reads the bodies of requests: of the declared type, up to a size, within a time, however they are framed. */
final class Bodies {
    private static final AttachmentKey<StreamSourceChannel> CHANNEL = AttachmentKey.create(StreamSourceChannel.class);
    private static final int FIRST_BYTES = 16 * 1024;
    private static final Pattern UTF_8_PARAMETER =
            Pattern.compile("\\s*(?:charset\\s*=\\s*\"?utf-8\"?)?\\s*", Pattern.CASE_INSENSITIVE);

    private final int most;
    private final long nanos;

    Bodies(ServerOptions options) {
        most = options.bodyBytes();
        nanos = options.bodyTime().toNanos();
    }

    /**
     * Reads the whole body; blocks, so that it must run on a worker.
     *
     * @param mediaType the one that the route takes
     */
    byte[] read(HttpServerExchange exchange, String mediaType) throws IOException, ProblemException {
        checkType(exchange, mediaType);
        checkCoding(exchange);
        if (exchange.getRequestContentLength() > most) {
            throw tooLarge(exchange);
        }
        if (HttpContinue.requiresContinueResponse(exchange)) {
            HttpContinue.sendContinueResponseBlocking(exchange);
        }
        StreamSourceChannel channel = channel(exchange);
        return channel == null ? new byte[0] : read(exchange, channel);
    }

    /** The body's channel, which the exchange hands out only once; null where the body is read to its end. */
    static @Nullable StreamSourceChannel channel(HttpServerExchange exchange) {
        StreamSourceChannel channel = exchange.getAttachment(CHANNEL);
        if (channel == null) {
            channel = exchange.getRequestChannel();
            exchange.putAttachment(CHANNEL, channel);
        }
        return channel;
    }

    private static void checkType(HttpServerExchange exchange, String mediaType) throws ProblemException {
        String given = exchange.getRequestHeaders().getFirst(Headers.CONTENT_TYPE);
        if (given != null) {
            String[] parts = given.split(";", 2);
            if (parts[0].strip().toLowerCase(Locale.ROOT).equals(mediaType)
                    && (parts.length == 1 || UTF_8_PARAMETER.matcher(parts[1]).matches())) {
                return;
            }
        }
        throw refused(
                exchange,
                StatusCodes.UNSUPPORTED_MEDIA_TYPE,
                "Unsupported media type",
                "the Content-Type must be " + mediaType + ", got " + (given == null ? "none" : given));
    }

    private static void checkCoding(HttpServerExchange exchange) throws ProblemException {
        String given = exchange.getRequestHeaders().getFirst(Headers.CONTENT_ENCODING);
        if (given != null && !given.strip().equalsIgnoreCase("identity")) {
            throw refused(
                    exchange,
                    StatusCodes.UNSUPPORTED_MEDIA_TYPE,
                    "Unsupported content coding",
                    "a body must come without a Content-Encoding, got " + given);
        }
    }

    private byte[] read(HttpServerExchange exchange, StreamSourceChannel channel) throws IOException, ProblemException {
        long deadline = System.nanoTime() + nanos;
        // What is declared is not yet sent: the array grows with what comes.
        long declared = exchange.getRequestContentLength();
        int ceiling = declared >= 0 ? (int) declared : most;
        ByteBuffer buffer = ByteBuffer.allocate(Math.min(FIRST_BYTES, ceiling));
        while (true) {
            if (!buffer.hasRemaining()) {
                if (buffer.capacity() == ceiling) {
                    return atCeiling(exchange, channel, buffer.array(), deadline);
                }
                long doubled = Math.min(2L * buffer.capacity(), ceiling);
                buffer = ByteBuffer.wrap(Arrays.copyOf(buffer.array(), (int) doubled))
                        .position(buffer.position());
            }
            int count = channel.read(buffer);
            if (count < 0) {
                return Arrays.copyOf(buffer.array(), buffer.position());
            }
            if (count == 0) {
                await(exchange, channel, deadline);
            }
        }
    }

    /** The body is as long as it may be: it must end here. */
    private byte[] atCeiling(HttpServerExchange exchange, StreamSourceChannel channel, byte[] body, long deadline)
            throws IOException, ProblemException {
        ByteBuffer next = ByteBuffer.allocate(1);
        while (true) {
            int count = channel.read(next);
            if (count < 0) {
                return body;
            }
            if (count > 0) {
                throw tooLarge(exchange);
            }
            await(exchange, channel, deadline);
        }
    }

    private static void await(HttpServerExchange exchange, StreamSourceChannel channel, long deadline)
            throws IOException, ProblemException {
        if (!Waiting.readable(channel, deadline)) {
            throw refused(
                    exchange,
                    StatusCodes.REQUEST_TIME_OUT,
                    "Body too slow",
                    "the request's body did not come to its end in time");
        }
    }

    private ProblemException tooLarge(HttpServerExchange exchange) {
        return refused(
                exchange,
                StatusCodes.REQUEST_ENTITY_TOO_LARGE,
                "Body too large",
                "a request's body may have at most " + most + " bytes");
    }

    /** Whatever of the body is still to come is not wanted: the connection ends with the answer. */
    private static ProblemException refused(HttpServerExchange exchange, int status, String title, String detail) {
        exchange.setPersistent(false);
        return new ProblemException(status, title, detail);
    }
}
