package org.ductledger.http;

import io.undertow.server.HttpServerExchange;
import io.undertow.util.Headers;
import io.undertow.util.StatusCodes;
import java.io.IOException;
import java.util.Map;
import org.ductledger.batch.DocumentRefusedException;
import org.ductledger.batch.LedgerReader;
import org.ductledger.batch.Refusals;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Given;
import org.ductledger.template.InputsRefusedException;
import org.ductledger.template.Template;
import org.ductledger.template.Templates;
import org.ductledger.template.UnitSystem;
import org.ductledger.template.WorkbookBuilder;

/** Builds a workbook of the posted inputs; {@code ?units=us} shows it in US units. */
final class WorkbookEndpoint implements Endpoint {
    private static final String UNITS = "units";

    private final Bodies bodies;
    private final LedgerReader reader;
    private final WorkbookBuilder builder;

    WorkbookEndpoint(Bodies bodies, LedgerReader reader, Evaluator evaluator) {
        this.bodies = bodies;
        this.reader = reader;
        builder = new WorkbookBuilder(evaluator);
    }

    @Override
    public void answer(HttpServerExchange exchange, String name)
            throws IOException, ProblemException, DocumentRefusedException {
        Template template =
                Templates.find(name).orElseThrow(() -> NamedDocuments.unknown("template", name, Templates.near(name)));
        UnitSystem units = units(Query.parse(exchange.getQueryString()));
        Map<String, Given.Values> inputs = reader.readInputs(bodies.read(exchange, Answers.JSON));
        byte[] workbook = build(template, inputs, units);
        exchange.getResponseHeaders()
                .put(Headers.CONTENT_DISPOSITION, "attachment; filename=\"" + template.name() + ".xlsx\"");
        Answers.send(exchange, Answers.XLSX, workbook);
    }

    private static UnitSystem units(Map<String, String> parameters) throws ProblemException {
        for (String parameter : parameters.keySet()) {
            if (!parameter.equals(UNITS)) {
                throw refused("the query takes units, got " + parameter);
            }
        }
        String label = parameters.getOrDefault(UNITS, UnitSystem.SI.label());
        return UnitSystem.find(label).orElseThrow(() -> refused("units must be si or us, got '" + label + "'"));
    }

    private static ProblemException refused(String detail) {
        return new ProblemException(StatusCodes.BAD_REQUEST, "Query refused", detail);
    }

    private byte[] build(Template template, Map<String, Given.Values> inputs, UnitSystem units)
            throws ProblemException {
        try {
            return builder.build(template, inputs, units);
        } catch (InputsRefusedException e) {
            throw new ProblemException(
                    Problems.refused(StatusCodes.UNPROCESSABLE_ENTITY, "Unfit inputs", Refusals.placed(e)));
        }
    }
}
