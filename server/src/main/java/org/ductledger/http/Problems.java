package org.ductledger.http;

import io.undertow.server.HttpServerExchange;
import io.undertow.util.Headers;
import io.undertow.util.StatusCodes;
import java.io.IOException;
import java.util.UUID;
import org.ductledger.batch.DocumentRefusedException;
import org.ductledger.record.UnreadableWorkbookException;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.xnio.IoUtils;

/** The one place where what went wrong becomes a response. */
final class Problems {
    private static final Logger LOG = LoggerFactory.getLogger(Problems.class);
    private static final String RETRY_SECONDS = "1";

    private Problems() {}

    /** Answers a request that could not be done. */
    static void answer(HttpServerExchange exchange, Throwable cause) {
        if (exchange.isResponseStarted()) {
            // Half an answer is on its way: only the end of the connection can tell that it is not whole.
            LOG.warn("an answer was cut short: {}", cause.toString());
            close(exchange);
        } else if (cause instanceof IOException) {
            LOG.debug("the client is gone: {}", cause.toString());
            close(exchange);
        } else {
            send(exchange, problem(cause));
        }
    }

    private static void send(HttpServerExchange exchange, Problem problem) {
        exchange.setStatusCode(problem.status());
        if (problem.status() == StatusCodes.SERVICE_UNAVAILABLE) {
            exchange.getResponseHeaders().put(Headers.RETRY_AFTER, RETRY_SECONDS);
        }
        if (exchange.isInIoThread() || exchange.isRequestComplete()) {
            Answers.send(exchange, Problem.MEDIA_TYPE, problem.json());
            return;
        }
        Answers.type(exchange, Problem.MEDIA_TYPE);
        try {
            Lingering.send(exchange, problem.json());
        } catch (IOException e) {
            LOG.debug("the client is gone: {}", e.toString());
        }
        close(exchange);
    }

    private static void close(HttpServerExchange exchange) {
        IoUtils.safeClose(exchange.getConnection());
        exchange.endExchange();
    }

    static Problem problem(Throwable cause) {
        if (cause instanceof ProblemException known) {
            return known.problem();
        }
        if (cause instanceof DocumentRefusedException refused) {
            return refused.isTooLarge()
                    ? refused(StatusCodes.REQUEST_ENTITY_TOO_LARGE, "Document too large", refused)
                    : refused(StatusCodes.BAD_REQUEST, "Document refused", refused);
        }
        if (cause instanceof UnreadableWorkbookException unreadable) {
            return new Problem(
                    StatusCodes.UNPROCESSABLE_ENTITY, "Unreadable workbook", String.valueOf(unreadable.getMessage()));
        }
        return internal(cause);
    }

    /** The problem of a document with its reasons. */
    static Problem refused(int status, String title, DocumentRefusedException refused) {
        return new Problem(status, title, refused.reasons().get(0).detail(), refused.reasons());
    }

    /** An error of the service's own: the answer says nothing but where the log explains it. */
    private static Problem internal(Throwable cause) {
        String id = UUID.randomUUID().toString();
        LOG.error("internal error {}", id, cause);
        return new Problem(
                StatusCodes.INTERNAL_SERVER_ERROR,
                "Internal error",
                "the request met an error of the service itself; the service's log explains it under " + id);
    }
}
