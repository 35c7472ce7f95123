package org.ductledger.http;

import io.undertow.server.HttpServerExchange;
import io.undertow.util.StatusCodes;
import java.io.IOException;
import java.util.List;
import org.ductledger.batch.DocumentRefusedException;
import org.ductledger.batch.LedgerReader;
import org.ductledger.batch.Refusals;
import org.ductledger.batch.ResultsWriter;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.LedgerRefusedException;
import org.ductledger.ledger.Outcome;

/** Evaluates a posted ledger. */
final class EvaluateEndpoint implements Endpoint {
    private final Bodies bodies;
    private final LedgerReader reader;
    private final Evaluator evaluator;

    EvaluateEndpoint(Bodies bodies, LedgerReader reader, Evaluator evaluator) {
        this.bodies = bodies;
        this.reader = reader;
        this.evaluator = evaluator;
    }

    @Override
    public void answer(HttpServerExchange exchange, String name)
            throws IOException, ProblemException, DocumentRefusedException {
        Ledger ledger = reader.read(bodies.read(exchange, Answers.JSON));
        List<Outcome> outcomes = evaluate(ledger);
        Answers.type(exchange, Answers.JSON);
        AnswerStream out = new AnswerStream(exchange);
        ResultsWriter.write(evaluator.catalogue().version(), outcomes, out);
        // Closed only here: what goes wrong on the way must not end as a whole answer.
        out.close();
    }

    private List<Outcome> evaluate(Ledger ledger) throws ProblemException {
        try {
            return evaluator.evaluate(ledger);
        } catch (LedgerRefusedException e) {
            throw new ProblemException(
                    Problems.refused(StatusCodes.UNPROCESSABLE_ENTITY, "Unsound ledger", Refusals.placed(ledger, e)));
        }
    }
}
