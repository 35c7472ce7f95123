package org.ductledger.command;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import org.ductledger.batch.CsvBatch;
import org.ductledger.batch.DocumentRefusedException;
import org.ductledger.batch.LedgerReader;
import org.ductledger.batch.Limits;
import org.ductledger.batch.Refusals;
import org.ductledger.batch.Results;
import org.ductledger.batch.ResultsWriter;
import org.ductledger.batch.Typed;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.ledger.Call;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Fault;
import org.ductledger.ledger.Given;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.LedgerRefusedException;
import org.ductledger.ledger.Outcome;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

@Command(
        name = "evaluate",
        description = "Evaluates one function for arguments as typed or for a table, or a whole ledger.",
        synopsisHeading = "",
        customSynopsis = {
            "Usage: ductledger evaluate NAME ARG=VALUE... [--unit U] [--json]",
            "       ductledger evaluate NAME --csv F.csv [ARG=VALUE...] [--unit U]",
            "       ductledger evaluate --ledger F.json"
        })
final class EvaluateCommand implements Callable<Integer> {
    private final Streams streams;
    private final Evaluator evaluator = new Evaluator(StandardCatalogue.get());

    @Parameters(
            arity = "0..*",
            paramLabel = "NAME ARG=VALUE",
            description = "the function and its arguments: p0=7bar, mach=1,2,3, branch=subsonic")
    private List<String> words = List.of();

    @Option(names = "--ledger", paramLabel = "F.json", description = "a ledger; - reads standard input")
    private @Nullable String ledger;

    @Option(
            names = "--csv",
            paramLabel = "F.csv",
            description = "a table with a column an argument, headed by its name, or by name [unit]; - reads standard"
                    + " input")
    private @Nullable String csv;

    @Option(names = "--unit", paramLabel = "U", description = "the unit of the result, as in kg/h")
    private @Nullable String unit;

    @Option(names = "--json", description = "writes the result as the service does")
    private boolean json;

    EvaluateCommand(Streams streams) {
        this.streams = streams;
    }

    @Override
    public Integer call() throws CommandException {
        if (ledger != null) {
            if (!words.isEmpty() || csv != null || unit != null) {
                throw CommandException.usage("--ledger takes no function, arguments, --csv or --unit beside it");
            }
            return ofLedger(GivenFile.read(ledger, streams));
        }
        if (words.isEmpty()) {
            throw CommandException.usage("evaluate needs a function's name, or --ledger");
        }
        FunctionEntry entry = Lookup.function(words.get(0));
        Map<String, Given> arguments = arguments(words.subList(1, words.size()));
        return csv == null ? ofArguments(entry, arguments) : ofTable(entry, GivenFile.read(csv, streams), arguments);
    }

    private static Map<String, Given> arguments(List<String> words) throws CommandException {
        Map<String, Given> arguments = new LinkedHashMap<>();
        for (String word : words) {
            int equals = word.indexOf('=');
            if (equals < 1) {
                throw CommandException.usage("arguments are typed ARG=VALUE, got '" + word + "'");
            }
            String name = word.substring(0, equals);
            try {
                if (arguments.put(name, Typed.list(name, word.substring(equals + 1))) != null) {
                    throw CommandException.usage(name + " is given twice");
                }
            } catch (DocumentRefusedException e) {
                throw CommandException.usage(e.getMessage());
            }
        }
        return arguments;
    }

    private int ofArguments(FunctionEntry entry, Map<String, Given> arguments) throws CommandException {
        Ledger one = new Ledger(List.of(new Call(entry.name(), entry.name(), arguments, unit)), List.of());
        List<Outcome> outcomes;
        try {
            outcomes = evaluator.evaluate(one);
        } catch (LedgerRefusedException e) {
            throw CommandException.usage(e.getMessage());
        }
        if (json) {
            writeJson(outcomes);
        } else {
            writeLines(outcomes.get(0));
        }
        return code(outcomes);
    }

    private void writeLines(Outcome outcome) {
        Map<Integer, String> faults = new LinkedHashMap<>();
        for (Fault fault : outcome.faults()) {
            faults.put(fault.row(), "fault: " + fault.detail());
        }
        String suffix = outcome.unit().isOne() ? "" : " " + outcome.unit();
        for (int i = 0; i < outcome.values().rows(); i++) {
            String fault = faults.get(i);
            streams.out().println(fault == null ? Results.text(outcome, i) + suffix : fault);
        }
    }

    private int ofLedger(byte[] document) throws CommandException {
        try {
            Ledger read = new LedgerReader(Limits.STANDARD).read(document);
            List<Outcome> outcomes = evaluate(read);
            writeJson(outcomes);
            return code(outcomes);
        } catch (DocumentRefusedException e) {
            throw CommandException.unreadable(e.getMessage());
        }
    }

    private int ofTable(FunctionEntry entry, byte[] document, Map<String, Given> constants) throws CommandException {
        if (json) {
            throw CommandException.usage("--csv answers in CSV; --json does not go with it");
        }
        try {
            CsvBatch batch = CsvBatch.read(entry, document, Limits.STANDARD);
            List<Outcome> outcomes = evaluate(batch.ledger(constants, unit));
            batch.write(outcomes.get(0), streams.out());
            return code(outcomes);
        } catch (DocumentRefusedException e) {
            throw CommandException.unreadable(e.getMessage());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private List<Outcome> evaluate(Ledger whole) throws DocumentRefusedException {
        try {
            return evaluator.evaluate(whole);
        } catch (LedgerRefusedException e) {
            throw Refusals.placed(whole, e);
        }
    }

    private void writeJson(List<Outcome> outcomes) {
        try {
            ResultsWriter.write(evaluator.catalogue().version(), outcomes, streams.out());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        streams.out().println();
    }

    private static int code(List<Outcome> outcomes) {
        return outcomes.stream().allMatch(Outcome::isClean) ? ExitCode.DONE : ExitCode.FOUND;
    }
}
