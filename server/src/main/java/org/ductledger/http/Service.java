package org.ductledger.http;

import io.undertow.server.HttpHandler;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.ductledger.audit.AuditReport;
import org.ductledger.audit.Auditor;
import org.ductledger.batch.AuditWriter;
import org.ductledger.batch.EntryWriter;
import org.ductledger.batch.Json;
import org.ductledger.batch.LedgerReader;
import org.ductledger.batch.TemplateWriter;
import org.ductledger.catalogue.Catalogue;
import org.ductledger.ledger.Evaluator;
import org.ductledger.template.Templates;

/** The table of the service's routes. */
final class Service {
    private static final byte[] NONE = {};

    private final ServerOptions options;
    private final Evaluator evaluator;
    private final Catalogue catalogue;
    private final Admission admission;

    Service(ServerOptions options, Evaluator evaluator, Admission admission) {
        this.options = options;
        this.evaluator = evaluator;
        this.catalogue = evaluator.catalogue();
        this.admission = admission;
    }

    HttpHandler handler() {
        HttpHandler handler = new Deadline(options, new Router(new Guard(), admission, routes()));
        return options.requestLog() ? new RequestLog(handler) : handler;
    }

    private List<Route> routes() {
        LedgerReader reader = new LedgerReader(options.limits());
        Bodies bodies = new Bodies(options);
        List<Route> routes = new ArrayList<>();
        routes.add(Route.get("/v1/cell/{name}", new CellEndpoint(evaluator)));
        routes.add(Route.post("/v1/evaluate", work(new EvaluateEndpoint(bodies, reader, evaluator))));
        Endpoint functions = new NamedDocuments("function", this::function, catalogue::near);
        routes.add(Route.get("/v1/functions", functions));
        routes.add(Route.get("/v1/functions/{name}", functions));
        Endpoint templates = new NamedDocuments("template", this::template, Templates::near);
        routes.add(Route.get("/v1/templates", templates));
        routes.add(Route.get("/v1/templates/{name}", templates));
        routes.add(Route.post("/v1/workbooks/{name}", work(new WorkbookEndpoint(bodies, reader, evaluator))));
        routes.add(Route.post("/v1/audit", work(audit(bodies))));
        routes.add(Route.get("/v1/health", health()));
        routes.add(Route.get("/", welcome(routes)));
        return routes;
    }

    private Endpoint work(Endpoint endpoint) {
        return new Work(admission, endpoint);
    }

    private byte[] function(String name) {
        return name.isEmpty()
                ? EntryWriter.all(catalogue)
                : catalogue.find(name).map(EntryWriter::one).orElse(NONE);
    }

    private byte[] template(String name) {
        return name.isEmpty()
                ? TemplateWriter.all(catalogue.version(), Templates.all())
                : Templates.find(name).map(TemplateWriter::one).orElse(NONE);
    }

    private Endpoint audit(Bodies bodies) {
        Auditor auditor = new Auditor(evaluator);
        return (exchange, name) -> {
            AuditReport report = auditor.audit(bodies.read(exchange, Answers.XLSX));
            Answers.send(exchange, Answers.JSON, AuditWriter.document(report));
        };
    }

    private Endpoint health() {
        byte[] state = Json.bytes(json -> {
            json.writeStartObject();
            json.writeStringField("status", "ok");
            json.writeStringField("library", catalogue.version());
            json.writeNumberField("functions", catalogue.entries().size());
            json.writeNumberField("templates", Templates.all().size());
            json.writeEndObject();
        });
        return (exchange, name) -> Answers.send(exchange, Answers.JSON, state);
    }

    private Endpoint welcome(List<Route> routes) {
        StringBuilder text = new StringBuilder("Ductledger ")
                .append(catalogue.version())
                .append(": gas-dynamics functions, design workbooks and their audits\n\n");
        for (Route route : routes) {
            text.append(route.allow(), 0, route.allow().indexOf(','))
                    .append(' ')
                    .append(route.path())
                    .append('\n');
        }
        return new FixedDocument(Answers.TEXT, text.toString().getBytes(StandardCharsets.UTF_8));
    }
}
