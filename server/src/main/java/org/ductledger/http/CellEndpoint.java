package org.ductledger.http;

import io.undertow.server.HttpServerExchange;
import io.undertow.util.Headers;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.ductledger.batch.DocumentRefusedException;
import org.ductledger.batch.Reason;
import org.ductledger.batch.Results;
import org.ductledger.batch.Typed;
import org.ductledger.ledger.Call;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Given;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.LedgerRefusedException;
import org.ductledger.ledger.Outcome;
import org.ductledger.ledger.Refusal;
import org.jspecify.annotations.Nullable;

/**
 * One value for one spreadsheet cell: {@code /v1/cell/p_over_p0?mach=2&gamma=1.4}. A spreadsheet shows nothing of an
 * answer but that of status 200, so that a fault is a text of its own. Runs on the I/O thread: one row is quick.
 */
final class CellEndpoint implements Endpoint {
    /** The parameter that names the result's unit; no argument of a function has this name. */
    private static final String UNIT = "unit";

    private static final String FAULT = "fault: ";

    /** The plus sign of an exponent, as in 1E+20, reads as a space where the sheet did not encode it. */
    private static final Pattern LOST_PLUS = Pattern.compile("^([-+\\s]*[0-9.,]+[eE]) (?=[0-9])");

    private final Evaluator evaluator;

    CellEndpoint(Evaluator evaluator) {
        this.evaluator = evaluator;
    }

    @Override
    public void answer(HttpServerExchange exchange, String name) {
        exchange.getResponseHeaders().put(Headers.CACHE_CONTROL, "no-store");
        Answers.send(
                exchange, Answers.TEXT, text(name, exchange.getQueryString()).getBytes(StandardCharsets.UTF_8));
    }

    private String text(String name, String query) {
        try {
            return evaluate(name, Query.parse(query));
        } catch (ProblemException e) {
            return FAULT + e.problem().detail();
        } catch (DocumentRefusedException e) {
            return FAULT + e.reasons().stream().map(Reason::detail).collect(Collectors.joining("; "));
        } catch (LedgerRefusedException e) {
            return FAULT + e.refusals().stream().map(Refusal::detail).collect(Collectors.joining("; "));
        } catch (RuntimeException e) {
            return FAULT + Problems.problem(e).detail();
        }
    }

    private String evaluate(String name, Map<String, String> parameters)
            throws DocumentRefusedException, LedgerRefusedException {
        Map<String, Given> arguments = new LinkedHashMap<>();
        for (Map.Entry<String, String> parameter : parameters.entrySet()) {
            if (!parameter.getKey().equals(UNIT)) {
                String value = LOST_PLUS.matcher(parameter.getValue()).replaceFirst("$1+");
                arguments.put(parameter.getKey(), Typed.cell(parameter.getKey(), value));
            }
        }
        @Nullable String unit = parameters.get(UNIT);
        Ledger ledger = new Ledger(List.of(new Call(name, name, arguments, unit)), List.of());
        Outcome outcome = evaluator.evaluate(ledger).get(0);
        return outcome.isClean()
                ? Results.text(outcome, 0)
                : FAULT + outcome.faults().get(0).detail();
    }
}
