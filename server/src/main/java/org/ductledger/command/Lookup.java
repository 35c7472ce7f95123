package org.ductledger.command;

import java.util.List;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.template.Template;
import org.ductledger.template.Templates;

/** Finds what a command names. */
final class Lookup {
    private Lookup() {}

    static FunctionEntry function(String name) throws CommandException {
        return StandardCatalogue.get()
                .find(name)
                .orElseThrow(
                        () -> unknown("function", name, StandardCatalogue.get().near(name)));
    }

    static Template template(String name) throws CommandException {
        return Templates.find(name).orElseThrow(() -> unknown("template", name, Templates.near(name)));
    }

    static CommandException unknown(String kind, String name, List<String> near) {
        return CommandException.usage(
                "no " + kind + " is named " + name + (near.isEmpty() ? "" : "; near it: " + String.join(", ", near)));
    }
}
