package org.ductledger.http;

import io.undertow.server.HttpServerExchange;
import io.undertow.util.Headers;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;

/**
 * The body of an answer of any length: a short one leaves whole with its length, a long one in chunks, so that its
 * reader can tell a whole answer from one that was cut short. Blocks, so that it must run on a worker.
 */
final class AnswerStream extends OutputStream {
    private static final int SHORT_BYTES = 256 * 1024;

    private final HttpServerExchange exchange;
    private final ByteArrayOutputStream head = new ByteArrayOutputStream();
    private boolean isLong;

    AnswerStream(HttpServerExchange exchange) {
        this.exchange = exchange;
    }

    @Override
    public void write(int b) throws IOException {
        write(new byte[] {(byte) b}, 0, 1);
    }

    @Override
    public void write(byte[] bytes, int offset, int length) throws IOException {
        if (!isLong && head.size() + length <= SHORT_BYTES) {
            head.write(bytes, offset, length);
            return;
        }
        if (!isLong) {
            isLong = true;
            if (exchange.isHttp11()) {
                exchange.getResponseHeaders().put(Headers.TRANSFER_ENCODING, Headers.CHUNKED.toString());
            }
            head.writeTo(exchange.getOutputStream());
            head.reset();
        }
        exchange.getOutputStream().write(bytes, offset, length);
    }

    @Override
    public void close() throws IOException {
        if (!isLong) {
            exchange.setResponseContentLength(head.size());
            head.writeTo(exchange.getOutputStream());
        }
        exchange.getOutputStream().close();
    }
}
