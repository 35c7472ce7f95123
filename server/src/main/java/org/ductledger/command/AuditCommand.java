package org.ductledger.command;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import org.ductledger.audit.AuditReport;
import org.ductledger.audit.Auditor;
import org.ductledger.audit.Finding;
import org.ductledger.batch.AuditWriter;
import org.ductledger.batch.Json;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.ledger.Evaluator;
import org.ductledger.record.UnreadableWorkbookException;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

@Command(name = "audit", description = "Evaluates the ledgers of workbooks again and names every cell that differs.")
final class AuditCommand implements Callable<Integer> {
    private final Streams streams;

    @Parameters(arity = "1..*", paramLabel = "F.xlsx", description = "workbooks")
    private List<String> files = List.of();

    @Option(names = "--json", description = "writes the findings as JSON")
    private boolean json;

    AuditCommand(Streams streams) {
        this.streams = streams;
    }

    @Override
    public Integer call() {
        Auditor auditor = new Auditor(new Evaluator(StandardCatalogue.get()));
        Map<String, AuditReport> reports = new LinkedHashMap<>();
        int code = ExitCode.DONE;
        for (String file : files) {
            try {
                AuditReport report = auditor.audit(GivenFile.read(file, streams));
                reports.put(file, report);
                code = Math.max(code, report.isClean() ? ExitCode.DONE : ExitCode.FOUND);
            } catch (CommandException e) {
                streams.err().println("ductledger: " + e.getMessage());
                code = ExitCode.UNREADABLE;
            } catch (UnreadableWorkbookException e) {
                streams.err().println("ductledger: " + file + ": " + e.getMessage());
                code = ExitCode.UNREADABLE;
            }
        }
        if (json) {
            writeJson(reports);
        } else {
            reports.forEach(this::writeLines);
        }
        return code;
    }

    private void writeLines(String file, AuditReport report) {
        streams.out().println(file + ": " + report.verdict());
        for (Finding finding : report.findings()) {
            streams.out()
                    .println("  " + finding.place() + " " + finding.kind().label() + ": " + finding.detail()
                            + " (recorded " + finding.recorded() + ", found " + finding.found() + ")");
        }
    }

    private void writeJson(Map<String, AuditReport> reports) {
        try {
            Json.write(
                    out -> {
                        out.writeStartArray();
                        for (Map.Entry<String, AuditReport> report : reports.entrySet()) {
                            out.writeStartObject();
                            out.writeStringField("file", report.getKey());
                            AuditWriter.writeMembers(report.getValue(), out);
                            out.writeEndObject();
                        }
                        out.writeEndArray();
                    },
                    streams.out());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        streams.out().println();
    }
}
