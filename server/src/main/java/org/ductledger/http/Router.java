package org.ductledger.http;

import io.undertow.server.HttpHandler;
import io.undertow.server.HttpServerExchange;
import io.undertow.util.AttachmentKey;
import io.undertow.util.Headers;
import io.undertow.util.Methods;
import io.undertow.util.StatusCodes;
import java.util.List;
import java.util.Optional;

/** Takes every request: guard, path, method, endpoint, and the one way out for what goes wrong. */
final class Router implements HttpHandler {
    /** The path of the route taken, for the log. */
    static final AttachmentKey<String> PATH = AttachmentKey.create(String.class);

    private final Guard guard;
    private final Admission admission;
    private final List<Route> routes;

    Router(Guard guard, Admission admission, List<Route> routes) {
        this.guard = guard;
        this.admission = admission;
        this.routes = List.copyOf(routes);
    }

    @Override
    public void handleRequest(HttpServerExchange exchange) {
        try {
            route(exchange);
        } catch (Throwable e) {
            Problems.answer(exchange, e);
        }
    }

    private void route(HttpServerExchange exchange) throws Exception {
        String path = exchange.getRequestPath();
        for (Route route : routes) {
            Optional<String> name = route.match(path);
            if (name.isPresent()) {
                exchange.putAttachment(PATH, route.path());
                guard.check(exchange);
                admission.checkOpen();
                take(exchange, route, name.get());
                return;
            }
        }
        guard.check(exchange);
        throw new ProblemException(
                StatusCodes.NOT_FOUND, "Unknown path", "no such path here; GET / lists those that there are");
    }

    private static void take(HttpServerExchange exchange, Route route, String name) throws Exception {
        Endpoint endpoint = route.methods().get(exchange.getRequestMethod());
        if (endpoint != null) {
            if (!exchange.getRequestMethod().equals(Methods.POST)) {
                refuseBody(exchange);
            }
            endpoint.answer(exchange, name);
            return;
        }
        exchange.getResponseHeaders().put(Headers.ALLOW, route.allow());
        if (!exchange.getRequestMethod().equals(Methods.OPTIONS)) {
            throw new ProblemException(
                    StatusCodes.METHOD_NOT_ALLOWED, "Method not allowed", route.path() + " takes " + route.allow());
        }
        exchange.setResponseContentLength(0);
        exchange.endExchange();
    }

    private static void refuseBody(HttpServerExchange exchange) throws ProblemException {
        if (!exchange.isRequestComplete()) {
            exchange.setPersistent(false);
            throw new ProblemException(
                    StatusCodes.BAD_REQUEST, "Unexpected body", "a request of this method has no body");
        }
    }
}
