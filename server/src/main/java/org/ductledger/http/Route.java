package org.ductledger.http;

import io.undertow.util.HttpString;
import io.undertow.util.Methods;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * One path and its methods.
 *
 * @param path as documents write it: {@code /v1/cell/{name}}
 * @param methods what answers each; HEAD goes with GET
 */
record Route(String path, Map<HttpString, Endpoint> methods) {
    private static final String HOLE = "{name}";

    Route {
        methods = Map.copyOf(methods);
    }

    static Route get(String path, Endpoint endpoint) {
        Map<HttpString, Endpoint> methods = new LinkedHashMap<>();
        methods.put(Methods.GET, endpoint);
        methods.put(Methods.HEAD, endpoint);
        return new Route(path, methods);
    }

    static Route post(String path, Endpoint endpoint) {
        return new Route(path, Map.of(Methods.POST, endpoint));
    }

    /** What stands in a requested path's place for the name, if this is its route; empty where the route has no name. */
    Optional<String> match(String requested) {
        if (!path.endsWith(HOLE)) {
            return path.equals(requested) ? Optional.of("") : Optional.empty();
        }
        int prefix = path.length() - HOLE.length();
        boolean matches = requested.length() > prefix
                && requested.startsWith(path.substring(0, prefix))
                && requested.indexOf('/', prefix) < 0;
        return matches ? Optional.of(requested.substring(prefix)) : Optional.empty();
    }

    /** The value of an Allow header. */
    String allow() {
        return methods.containsKey(Methods.GET) ? "GET, HEAD, OPTIONS" : "POST, OPTIONS";
    }
}
