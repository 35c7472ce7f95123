package org.ductledger.http;

import io.undertow.server.HttpServerExchange;

/** Runs an endpoint on a worker, where it may block and take its time, as one of the requests worked on at once. */
final class Work implements Endpoint {
    private final Admission admission;
    private final Endpoint endpoint;

    Work(Admission admission, Endpoint endpoint) {
        this.admission = admission;
        this.endpoint = endpoint;
    }

    @Override
    public void answer(HttpServerExchange exchange, String name) throws ProblemException {
        admission.enter();
        exchange.dispatch(() -> {
            try {
                exchange.startBlocking();
                endpoint.answer(exchange, name);
            } catch (Throwable e) {
                Problems.answer(exchange, e);
            } finally {
                admission.leave();
            }
        });
    }
}
