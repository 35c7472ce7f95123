package org.ductledger.http;

import io.undertow.server.HttpServerExchange;
import io.undertow.util.Headers;
import io.undertow.util.HttpString;
import java.nio.ByteBuffer;

/** Sends small answers: header and body leave in one write. */
final class Answers {
    static final String JSON = "application/json";
    static final String TEXT = "text/plain; charset=utf-8";
    static final String XLSX = "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet";

    private static final HttpString CONTENT_TYPE_OPTIONS = new HttpString("X-Content-Type-Options");

    private Answers() {}

    static void send(HttpServerExchange exchange, String mediaType, byte[] body) {
        type(exchange, mediaType);
        exchange.setResponseContentLength(body.length);
        exchange.getResponseSender().send(ByteBuffer.wrap(body));
    }

    /** Names the media type, which no client is to guess otherwise. */
    static void type(HttpServerExchange exchange, String mediaType) {
        exchange.getResponseHeaders().put(Headers.CONTENT_TYPE, mediaType);
        exchange.getResponseHeaders().put(CONTENT_TYPE_OPTIONS, "nosniff");
    }
}
