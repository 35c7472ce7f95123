package org.ductledger.command;

import java.io.IOException;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import java.util.concurrent.CountDownLatch;
import org.ductledger.http.DuctledgerServer;
import org.ductledger.http.ServerOptions;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

@Command(
        name = "serve",
        description = "Serves the catalogue, workbooks and audits on this machine's loopback address, until ended.")
final class ServeCommand implements Callable<Integer> {
    private final Streams streams;

    @Option(
            names = "--port",
            paramLabel = "N",
            description = "the port; 0 takes any free one (default: ${DEFAULT-VALUE})")
    private int port = DuctledgerServer.DEFAULT_PORT;

    @Option(
            names = "--port-file",
            paramLabel = "F",
            description = "a file to hold the port and the process id while the service runs, as JSON")
    private @Nullable Path portFile;

    ServeCommand(Streams streams) {
        this.streams = streams;
    }

    @Override
    public Integer call() throws CommandException {
        if (port < 0 || port > 65_535) {
            throw CommandException.usage("--port must be 0 to 65535, got " + port);
        }
        DuctledgerServer server = start();
        CountDownLatch ended = new CountDownLatch(1);
        Thread ending = new Thread(() -> endOnSignal(server, ended), "ending");
        try {
            if (portFile != null) {
                PortFile.write(portFile, server);
            }
            Runtime.getRuntime().addShutdownHook(ending);
            streams.err().println("Ductledger serves on " + server.address() + "; Ctrl-C ends it");
            streams.err().flush();
            ended.await();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            Runtime.getRuntime().removeShutdownHook(ending);
        } finally {
            end(server, ended);
        }
        return ExitCode.DONE;
    }

    private DuctledgerServer start() throws CommandException {
        try {
            return DuctledgerServer.start(port, ServerOptions.STANDARD);
        } catch (IOException e) {
            throw CommandException.machine(e.getMessage());
        }
    }

    /** What a signal asked for is done once the running requests are: the process ends well, and not as if killed. */
    private void endOnSignal(DuctledgerServer server, CountDownLatch ended) {
        end(server, ended);
        Runtime.getRuntime().halt(ExitCode.DONE);
    }

    private void end(DuctledgerServer server, CountDownLatch ended) {
        if (portFile != null) {
            PortFile.remove(portFile);
        }
        server.close();
        ended.countDown();
    }
}
