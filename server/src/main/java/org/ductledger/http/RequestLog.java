package org.ductledger.http;

import io.undertow.server.HttpHandler;
import io.undertow.server.HttpServerExchange;
import io.undertow.util.HttpString;
import io.undertow.util.Methods;
import java.util.Set;
import java.util.concurrent.TimeUnit;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/** Logs one line a request, with nothing in it that the user chose: the route, not the path. */
final class RequestLog implements HttpHandler {
    private static final Logger LOG = LoggerFactory.getLogger(RequestLog.class);
    private static final Set<HttpString> KNOWN_METHODS = Set.of(
            Methods.GET, Methods.HEAD, Methods.POST, Methods.OPTIONS, Methods.PUT, Methods.DELETE, Methods.PATCH);

    private final HttpHandler next;

    RequestLog(HttpHandler next) {
        this.next = next;
    }

    @Override
    public void handleRequest(HttpServerExchange exchange) throws Exception {
        if (LOG.isInfoEnabled()) {
            long start = System.nanoTime();
            exchange.addExchangeCompleteListener((done, following) -> {
                log(done, System.nanoTime() - start);
                following.proceed();
            });
        }
        next.handleRequest(exchange);
    }

    private static void log(HttpServerExchange exchange, long nanos) {
        String path = exchange.getAttachment(Router.PATH);
        HttpString method = exchange.getRequestMethod();
        LOG.info(
                "{} {} {} {} B {} us",
                KNOWN_METHODS.contains(method) ? method : "other",
                path == null ? "-" : path,
                exchange.getStatusCode(),
                exchange.getResponseBytesSent(),
                TimeUnit.NANOSECONDS.toMicros(nanos));
    }
}
