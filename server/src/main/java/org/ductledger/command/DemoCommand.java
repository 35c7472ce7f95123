package org.ductledger.command;

import java.io.FileNotFoundException;
import java.io.IOException;
import java.io.InputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.http.DuctledgerServer;
import org.ductledger.http.ServerOptions;
import picocli.CommandLine.Command;

@Command(
        name = "demo",
        description = "Shows the program at work: a batch over a socket of its own, a workbook, and its audit.")
final class DemoCommand implements Callable<Integer> {
    private static final String JSON = "application/json";
    private static final String XLSX = "application/vnd.openxmlformats-officedocument.spreadsheetml.sheet";
    private static final String TEMPLATE = "nozzle_sizing";

    private final PrintStream out;

    DemoCommand(Streams streams) {
        out = streams.out();
    }

    @Override
    public Integer call() throws CommandException {
        try (DuctledgerServer server = DuctledgerServer.start(0, ServerOptions.STANDARD.withoutRequestLog())) {
            out.println("Ductledger " + StandardCatalogue.VERSION + " serves on " + server.address() + ".");
            LoopbackClient client = new LoopbackClient(server.address());
            boolean batchIsGood = showBatch(client);
            boolean good = showWorkbook(client) && batchIsGood;
            out.println();
            out.println(good ? "All as it should be. Next:" : "Not as it should be: see the answers above.");
            if (good) {
                showNextSteps();
            }
            return good ? ExitCode.DONE : ExitCode.FOUND;
        } catch (IOException e) {
            throw CommandException.machine(e.getMessage());
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw CommandException.machine("the demo was interrupted");
        }
    }

    private boolean showBatch(LoopbackClient client) throws IOException, InterruptedException, CommandException {
        byte[] ledger = resource("demo-ledger.json");
        String answer = text(client.post("/v1/evaluate", JSON, ledger));
        out.println();
        out.println("1. POST /v1/evaluate: three exits for the nitrogen nozzle of an invented stand, Skarrow Bay 2");
        out.print(text(ledger).indent(3));
        out.println("   and its answer");
        out.print(answer.replace("{\"id\"", "\n {\"id\"").indent(3));
        return !answer.contains("\"row\":");
    }

    private boolean showWorkbook(LoopbackClient client) throws IOException, InterruptedException, CommandException {
        byte[] inputs = resource("demo-inputs.json");
        byte[] workbook = client.post("/v1/workbooks/" + TEMPLATE, JSON, inputs);
        Path file = Files.createTempDirectory("ductledger-demo-").resolve(TEMPLATE + ".xlsx");
        NewFile.write(file, workbook, false);
        out.println();
        out.println("2. POST /v1/workbooks/" + TEMPLATE);
        out.print(text(inputs).indent(3));
        out.println("   is now " + file);
        String report = text(client.post("/v1/audit", XLSX, Files.readAllBytes(file)));
        out.println();
        out.println("3. POST /v1/audit, with that file");
        out.print(report.replace("{\"kind\"", "\n {\"kind\"").indent(3));
        return report.contains("\"clean\":true");
    }

    private void showNextSteps() {
        out.println("   open the workbook, change an input, and see its checks speak");
        showCommand("serve", "the service, on port " + DuctledgerServer.DEFAULT_PORT);
        showCommand("catalogue", "every function and template");
        showCommand("build " + TEMPLATE + " -o my.xlsx", "a workbook of your own");
        showCommand("--help", "the rest");
    }

    private void showCommand(String command, String what) {
        out.printf("   ductledger %-36s%s%n", command, what);
    }

    private static byte[] resource(String name) throws IOException {
        try (InputStream in = DemoCommand.class.getResourceAsStream(name)) {
            if (in == null) {
                throw new FileNotFoundException(name + " is missing from the program");
            }
            return in.readAllBytes();
        }
    }

    private static String text(byte[] utf8) {
        return new String(utf8, StandardCharsets.UTF_8);
    }
}
