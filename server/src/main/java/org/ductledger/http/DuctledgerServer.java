package org.ductledger.http;

import io.undertow.Undertow;
import io.undertow.UndertowOptions;
import java.io.IOException;
import java.net.BindException;
import java.net.InetSocketAddress;
import java.util.concurrent.atomic.AtomicBoolean;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.ledger.Evaluator;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.xnio.Options;

/** The service, listening on this machine's loopback address alone. */
public final class DuctledgerServer implements AutoCloseable {
    public static final int DEFAULT_PORT = 4717;

    private static final Logger LOG = LoggerFactory.getLogger(DuctledgerServer.class);
    private static final String LOOPBACK = "127.0.0.1";

    private final Undertow undertow;
    private final Admission admission;
    private final ServerOptions options;
    private final AtomicBoolean closed = new AtomicBoolean();

    private DuctledgerServer(Undertow undertow, Admission admission, ServerOptions options) {
        this.undertow = undertow;
        this.admission = admission;
        this.options = options;
    }

    /**
     * Starts the service with the standard catalogue.
     *
     * @param port 0 takes any free one
     * @throws IOException if the port is taken or not to be had
     */
    public static DuctledgerServer start(int port, ServerOptions options) throws IOException {
        return start(port, options, new Evaluator(StandardCatalogue.get()));
    }

    /** Starts the service with an evaluator of one's own. */
    public static DuctledgerServer start(int port, ServerOptions options, Evaluator evaluator) throws IOException {
        Admission admission = new Admission(options.concurrent());
        Undertow undertow = builder(options)
                .addHttpListener(port, LOOPBACK)
                .setHandler(new Service(options, evaluator, admission).handler())
                .build();
        try {
            undertow.start();
        } catch (RuntimeException e) {
            if (e.getCause() instanceof BindException bind) {
                throw new IOException(
                        "port " + port + " of " + LOOPBACK + " is not to be had: " + bind.getMessage(), e);
            }
            throw e;
        }
        return new DuctledgerServer(undertow, admission, options);
    }

    private static Undertow.Builder builder(ServerOptions options) {
        int idle = Math.toIntExact(options.idleTime().toMillis());
        int whole = Math.toIntExact(options.requestTime().toMillis());
        return Undertow.builder()
                .setIoThreads(Math.max(2, Runtime.getRuntime().availableProcessors()))
                .setWorkerThreads(options.concurrent())
                .setServerOption(UndertowOptions.ENABLE_HTTP2, false)
                // The limit is ours to hold, with an answer; this one would only drop the connection.
                .setServerOption(UndertowOptions.MAX_ENTITY_SIZE, Long.MAX_VALUE)
                .setServerOption(UndertowOptions.MAX_HEADER_SIZE, options.headerBytes())
                .setServerOption(UndertowOptions.NO_REQUEST_TIMEOUT, idle)
                .setServerOption(
                        UndertowOptions.REQUEST_PARSE_TIMEOUT,
                        Math.toIntExact(options.headerTime().toMillis()))
                // The parser's own decoding is lenient and answers what it cannot decode without a word.
                .setServerOption(UndertowOptions.DECODE_URL, false)
                .setSocketOption(Options.READ_TIMEOUT, whole)
                .setSocketOption(Options.WRITE_TIMEOUT, whole);
    }

    /** The port that it listens on. */
    public int port() {
        return ((InetSocketAddress) undertow.getListenerInfo().get(0).getAddress()).getPort();
    }

    public String address() {
        return "http://" + LOOPBACK + ":" + port();
    }

    /** Ends the service: running requests end first, new ones are refused. Once ended, it stays so. */
    @Override
    public void close() {
        if (closed.getAndSet(true)) {
            return;
        }
        if (!admission.end(options.shutdownTime())) {
            LOG.warn("requests still run after {}; they are cut short", options.shutdownTime());
        }
        undertow.stop();
    }
}
