package org.ductledger.command;

import org.ductledger.template.Template;
import org.ductledger.template.TemplateInput;
import org.ductledger.template.UnitSystem;

/** All there is to say of a template, for a terminal. */
final class TemplateText {
    private TemplateText() {}

    static String of(Template template) {
        Paragraphs text = new Paragraphs();
        text.line(template.name() + ", version " + template.version() + ": " + template.title());
        text.item(template.purpose());
        text.heading("Inputs");
        for (TemplateInput input : template.inputs()) {
            text.item(input(input));
        }
        text.heading("Limits");
        template.limits().forEach(text::item);
        text.heading("Cautions");
        template.cautions().forEach(text::item);
        return text.toString();
    }

    private static String input(TemplateInput input) {
        String units =
                input.kind() == TemplateInput.Kind.NUMBER && !input.coherent().isOne()
                        ? "; shown in " + input.unit(UnitSystem.SI) + " or " + input.unit(UnitSystem.US)
                        : "";
        String alternative = input.group().isEmpty() ? "" : "; one of the alternatives '" + input.group() + "'";
        return input.name() + ": " + input.meaning() + "; " + input.requirement(input.coherent()) + units + alternative;
    }
}
