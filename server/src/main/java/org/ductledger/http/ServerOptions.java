package org.ductledger.http;

import java.time.Duration;
import org.ductledger.batch.Limits;

/**
 * What the service allows.
 *
 * @param limits of ledgers and other documents
 * @param bodyBytes of one request's body, however it is framed
 * @param headerBytes of one request's line and header
 * @param headerTime from a request's first byte to the end of its header
 * @param bodyTime from there to the end of its body
 * @param requestTime from there to the end of the answer; then the connection is closed
 * @param idleTime of a connection between requests
 * @param concurrent requests worked on at once; single cells are not among them
 * @param shutdownTime that running requests have when the service ends
 * @param requestLog whether each request is logged
 */
public record ServerOptions(
        Limits limits,
        int bodyBytes,
        int headerBytes,
        Duration headerTime,
        Duration bodyTime,
        Duration requestTime,
        Duration idleTime,
        int concurrent,
        Duration shutdownTime,
        boolean requestLog) {
    private static final int MEBIBYTE = 1 << 20;

    public static final ServerOptions STANDARD = new ServerOptions(
            Limits.STANDARD,
            64 * MEBIBYTE,
            16 * 1024,
            Duration.ofSeconds(10),
            Duration.ofSeconds(60),
            Duration.ofSeconds(180),
            Duration.ofSeconds(75),
            32,
            Duration.ofSeconds(20),
            true);

    public ServerOptions withBodyBytes(int most) {
        return new ServerOptions(
                limits,
                most,
                headerBytes,
                headerTime,
                bodyTime,
                requestTime,
                idleTime,
                concurrent,
                shutdownTime,
                requestLog);
    }

    public ServerOptions withTimes(Duration header, Duration body, Duration request) {
        return new ServerOptions(
                limits, bodyBytes, headerBytes, header, body, request, idleTime, concurrent, shutdownTime, requestLog);
    }

    public ServerOptions withConcurrent(int most) {
        return new ServerOptions(
                limits,
                bodyBytes,
                headerBytes,
                headerTime,
                bodyTime,
                requestTime,
                idleTime,
                most,
                shutdownTime,
                requestLog);
    }

    public ServerOptions withoutRequestLog() {
        return new ServerOptions(
                limits,
                bodyBytes,
                headerBytes,
                headerTime,
                bodyTime,
                requestTime,
                idleTime,
                concurrent,
                shutdownTime,
                false);
    }
}
