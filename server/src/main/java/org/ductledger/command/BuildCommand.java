package org.ductledger.command;

import java.nio.file.Path;
import java.util.Map;
import java.util.concurrent.Callable;
import org.ductledger.batch.DocumentRefusedException;
import org.ductledger.batch.LedgerReader;
import org.ductledger.batch.Limits;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Given;
import org.ductledger.template.InputsRefusedException;
import org.ductledger.template.Template;
import org.ductledger.template.UnitSystem;
import org.ductledger.template.WorkbookBuilder;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

@Command(
        name = "build",
        description = "Builds a workbook of a template, with the template's defaults where no input is given.")
final class BuildCommand implements Callable<Integer> {
    private final Streams streams;

    @Parameters(paramLabel = "TEMPLATE", description = "the template, as the catalogue lists it")
    private String template = "";

    @Option(
            names = "--inputs",
            paramLabel = "F.json",
            description = "inputs by name, as in {\"p0\": {\"value\": 7, \"unit\": \"bar\"}}; - reads standard input")
    private @Nullable String inputs;

    @Option(
            names = "--units",
            paramLabel = "si|us",
            description = "the units that the workbook shows (default: ${DEFAULT-VALUE})")
    private String units = UnitSystem.SI.label();

    @Option(names = "-o", required = true, paramLabel = "F.xlsx", description = "the workbook to write")
    private Path output = Path.of("");

    @Option(names = "--force", description = "replaces a file that is there already")
    private boolean force;

    BuildCommand(Streams streams) {
        this.streams = streams;
    }

    @Override
    public Integer call() throws CommandException {
        Template known = Lookup.template(template);
        UnitSystem system = UnitSystem.find(units)
                .orElseThrow(() -> CommandException.usage("--units must be si or us, got '" + units + "'"));
        Evaluator evaluator = new Evaluator(StandardCatalogue.get());
        try {
            byte[] workbook = new WorkbookBuilder(evaluator).build(known, inputs(), system);
            NewFile.write(output, workbook, force);
        } catch (InputsRefusedException | DocumentRefusedException e) {
            throw CommandException.unreadable(e.getMessage());
        }
        streams.out().println(output);
        return ExitCode.DONE;
    }

    private Map<String, Given.Values> inputs() throws CommandException, DocumentRefusedException {
        return inputs == null
                ? Map.of()
                : new LedgerReader(Limits.STANDARD).readInputs(GivenFile.read(inputs, streams));
    }
}
