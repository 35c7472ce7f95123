package org.ductledger.http;

import io.undertow.server.HttpServerExchange;
import io.undertow.util.StatusCodes;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Function;

/** Fixed documents under names, and one of them all under none; each is made when it is first asked for. */
final class NamedDocuments implements Endpoint {
    private final String kind;
    private final Function<String, byte[]> maker;
    private final Function<String, List<String>> near;
    private final Map<String, FixedDocument> made = new ConcurrentHashMap<>();

    /**
     * Documents of one kind.
     *
     * @param kind in the singular, as in {@code no function is named ...}
     * @param maker makes the document of a name; no bytes where there is none of that name
     * @param near names that a mistyped one may have meant
     */
    NamedDocuments(String kind, Function<String, byte[]> maker, Function<String, List<String>> near) {
        this.kind = kind;
        this.maker = maker;
        this.near = near;
    }

    @Override
    public void answer(HttpServerExchange exchange, String name) throws ProblemException {
        FixedDocument document = made.get(name);
        if (document == null) {
            byte[] body = maker.apply(name);
            if (body.length == 0) {
                throw unknown(kind, name, near.apply(name));
            }
            document = new FixedDocument(Answers.JSON, body);
            made.put(name, document);
        }
        document.answer(exchange, name);
    }

    static ProblemException unknown(String kind, String name, List<String> near) {
        String hint = near.isEmpty() ? "" : "; near it: " + String.join(", ", near);
        return new ProblemException(
                StatusCodes.NOT_FOUND, "Unknown " + kind, "no " + kind + " is named " + name + hint);
    }
}
