package org.ductledger.command;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.Catalogue;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.template.Template;
import org.ductledger.template.Templates;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

@Command(
        name = "catalogue",
        description = "Lists the functions by family and the templates, or shows all there is to say of one.")
final class CatalogueCommand implements Callable<Integer> {
    private final Streams streams;
    private final Catalogue catalogue = StandardCatalogue.get();

    @Parameters(arity = "0..1", paramLabel = "NAME", description = "a function, a family or a template")
    private String name = "";

    CatalogueCommand(Streams streams) {
        this.streams = streams;
    }

    @Override
    public Integer call() throws CommandException {
        if (name.isEmpty()) {
            list(List.copyOf(catalogue.entries()));
            listTemplates();
            return ExitCode.DONE;
        }
        List<FunctionEntry> family = catalogue.entries().stream()
                .filter(entry -> entry.family().name().equals(name))
                .toList();
        Optional<FunctionEntry> entry = catalogue.find(name);
        Optional<Template> template = Templates.find(name);
        if (entry.isPresent()) {
            streams.out().print(EntryText.of(entry.get()));
        } else if (template.isPresent()) {
            streams.out().print(TemplateText.of(template.get()));
        } else if (!family.isEmpty()) {
            list(family);
        } else {
            throw Lookup.unknown("function, family or template", name, catalogue.near(name));
        }
        return ExitCode.DONE;
    }

    private void list(List<FunctionEntry> entries) {
        String family = "";
        for (FunctionEntry entry : entries) {
            if (!entry.family().name().equals(family)) {
                family = entry.family().name();
                streams.out().println(entry.family().title() + " [" + family + "]");
            }
            String call = entry.name() + "("
                    + String.join(
                            ", ", entry.arguments().stream().map(Argument::name).toList()) + ")";
            streams.out().println("  " + call);
            streams.out().println("      " + entry.title());
        }
    }

    private void listTemplates() {
        streams.out().println("Templates of workbooks");
        for (Template template : Templates.all()) {
            streams.out().println("  " + template.name());
            streams.out().println("      " + template.title());
        }
    }
}
