package org.ductledger.http;

import io.undertow.server.HttpServerExchange;
import io.undertow.util.Headers;
import io.undertow.util.StatusCodes;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import org.jspecify.annotations.Nullable;

/** A document that stays the same as long as the program does, under a strong ETag. */
final class FixedDocument implements Endpoint {
    private static final int TAG_DIGITS = 32;

    private final byte[] body;
    private final String mediaType;
    private final String tag;

    FixedDocument(String mediaType, byte[] body) {
        this.body = body.clone();
        this.mediaType = mediaType;
        tag = '"' + digest(body).substring(0, TAG_DIGITS) + '"';
    }

    private static String digest(byte[] body) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(body));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }

    @Override
    public void answer(HttpServerExchange exchange, String name) {
        exchange.getResponseHeaders().put(Headers.ETAG, tag);
        exchange.getResponseHeaders().put(Headers.CACHE_CONTROL, "no-cache");
        if (isKnown(exchange.getRequestHeaders().getFirst(Headers.IF_NONE_MATCH))) {
            exchange.setStatusCode(StatusCodes.NOT_MODIFIED);
            exchange.endExchange();
            return;
        }
        Answers.send(exchange, mediaType, body);
    }

    /** If-None-Match holds a star or tags between commas; a weak tag matches like a strong one (RFC 9110, 13.1.2). */
    private boolean isKnown(@Nullable String ifNoneMatch) {
        if (ifNoneMatch == null) {
            return false;
        }
        for (String given : ifNoneMatch.split(",", -1)) {
            String known = given.strip();
            if (known.equals("*") || known.equals(tag) || known.equals("W/" + tag)) {
                return true;
            }
        }
        return false;
    }
}
