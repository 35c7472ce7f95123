package org.ductledger.http;

import io.undertow.server.HttpHandler;
import io.undertow.server.HttpServerExchange;
import io.undertow.util.WorkerUtils;
import java.util.concurrent.TimeUnit;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.xnio.IoUtils;
import org.xnio.XnioExecutor;

/**
 * Ends a request with a body that takes too long as a whole, by closing its connection: against clients that send or
 * take a byte now and then. One without a body is answered at once and needs no watch.
 */
final class Deadline implements HttpHandler {
    private static final Logger LOG = LoggerFactory.getLogger(Deadline.class);

    private final HttpHandler next;
    private final long millis;

    Deadline(ServerOptions options, HttpHandler next) {
        this.next = next;
        millis = options.requestTime().toMillis();
    }

    @Override
    public void handleRequest(HttpServerExchange exchange) throws Exception {
        if (!exchange.isRequestComplete()) {
            XnioExecutor.Key alarm = WorkerUtils.executeAfter(
                    exchange.getIoThread(), () -> end(exchange), millis, TimeUnit.MILLISECONDS);
            exchange.addExchangeCompleteListener((done, following) -> {
                alarm.remove();
                following.proceed();
            });
        }
        next.handleRequest(exchange);
    }

    private static void end(HttpServerExchange exchange) {
        LOG.warn("a request took longer than it may; its connection is closed");
        IoUtils.safeClose(exchange.getConnection());
    }
}
