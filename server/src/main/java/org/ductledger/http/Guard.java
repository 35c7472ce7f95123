package org.ductledger.http;

import io.undertow.server.HttpServerExchange;
import io.undertow.util.HeaderValues;
import io.undertow.util.Headers;
import io.undertow.util.HttpString;
import io.undertow.util.StatusCodes;
import java.net.InetSocketAddress;
import java.util.List;

/**
 * Keeps web pages of other sites away from a service that trusts whoever is on this machine: a request must name the
 * service by its loopback address, and must not come from a page of another origin.
 */
final class Guard {
    private static final HttpString SEC_FETCH_SITE = new HttpString("Sec-Fetch-Site");

    /** The names of the service on one port. */
    private record Names(int port, List<String> hosts, List<String> origins) {
        static Names on(int port) {
            List<String> hosts = List.of("127.0.0.1:" + port, "localhost:" + port, "[::1]:" + port);
            return new Names(
                    port, hosts, hosts.stream().map(host -> "http://" + host).toList());
        }
    }

    private volatile Names names = Names.on(0);

    /** Refuses a request that did not come straight to this service. */
    void check(HttpServerExchange exchange) throws ProblemException {
        Names own = names(exchange);
        checkFraming(exchange);
        if (exchange.isHostIncludedInRequestURI()) {
            throw new ProblemException(
                    StatusCodes.BAD_REQUEST, "Absolute request target", "the request line must name a path alone");
        }
        HeaderValues host = exchange.getRequestHeaders().get(Headers.HOST);
        if (host == null || host.size() != 1 || !own.hosts().contains(host.getFirst())) {
            throw new ProblemException(
                    StatusCodes.FORBIDDEN,
                    "Foreign host",
                    "the Host header must be one of " + String.join(", ", own.hosts()));
        }
        HeaderValues origin = exchange.getRequestHeaders().get(Headers.ORIGIN);
        if (origin != null && (origin.size() != 1 || !own.origins().contains(origin.getFirst()))) {
            throw new ProblemException(
                    StatusCodes.FORBIDDEN,
                    "Foreign origin",
                    "a request with an Origin header must come from one of " + String.join(", ", own.origins()));
        }
        HeaderValues site = exchange.getRequestHeaders().get(SEC_FETCH_SITE);
        if (site != null && site.stream().anyMatch(value -> value.equalsIgnoreCase("cross-site"))) {
            throw new ProblemException(
                    StatusCodes.FORBIDDEN, "Foreign site", "a page of another site must not call this service");
        }
    }

    /** Two statements of a body's length are how one request hides in another. */
    private static void checkFraming(HttpServerExchange exchange) throws ProblemException {
        HeaderValues length = exchange.getRequestHeaders().get(Headers.CONTENT_LENGTH);
        HeaderValues coding = exchange.getRequestHeaders().get(Headers.TRANSFER_ENCODING);
        if ((length != null && (length.size() > 1 || coding != null)) || (coding != null && coding.size() > 1)) {
            exchange.setPersistent(false);
            throw new ProblemException(
                    StatusCodes.BAD_REQUEST,
                    "Ambiguous length",
                    "a request must state the length of its body once, by Content-Length or by chunks");
        }
    }

    private Names names(HttpServerExchange exchange) {
        int port = exchange.getConnection()
                .getLocalAddress(InetSocketAddress.class)
                .getPort();
        Names known = names;
        if (known.port() != port) {
            known = Names.on(port);
            names = known;
        }
        return known;
    }
}
