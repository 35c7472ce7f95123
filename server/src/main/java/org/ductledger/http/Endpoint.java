package org.ductledger.http;

import io.undertow.server.HttpServerExchange;

/** What answers one method of one path. */
@FunctionalInterface
interface Endpoint {
    /**
     * Answers a request.
     *
     * @param name what stands in the path's place for a name; empty where it has none
     * @throws Exception what {@link Problems} turns into an answer
     */
    void answer(HttpServerExchange exchange, String name) throws Exception;
}
