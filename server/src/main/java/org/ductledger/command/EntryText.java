package org.ductledger.command;

import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.CellForm;
import org.ductledger.catalogue.Condition;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Interval;
import org.ductledger.catalogue.Result;
import org.ductledger.catalogue.Revision;
import org.ductledger.catalogue.Sensitivity;
import org.ductledger.catalogue.Source;
import org.ductledger.catalogue.Unit;

/** All there is to say of a function, for a terminal. */
final class EntryText {
    private final FunctionEntry entry;
    private final Paragraphs text = new Paragraphs();

    private EntryText(FunctionEntry entry) {
        this.entry = entry;
    }

    static String of(FunctionEntry entry) {
        return new EntryText(entry).render();
    }

    private String render() {
        text.line(entry.name() + ": " + entry.title());
        text.item(entry.formula());
        if (!entry.note().isEmpty()) {
            text.item(entry.note());
        }
        text.heading("Arguments");
        for (int i = 0; i < entry.arguments().size(); i++) {
            argument(entry.arguments().get(i), entry.sensitivities().get(i));
        }
        text.heading("Result");
        Result result = entry.result();
        text.item(result.symbol() + ", "
                + values(result.isText(), String.join(", ", result.choices()), result.unit(), result.range()));
        conditions();
        example();
        text.heading("Sources");
        for (Source source : entry.sources()) {
            text.item(source.toString());
        }
        text.heading("Revisions");
        for (Revision revision : entry.revisions()) {
            text.item(revision.number() + ": " + revision.reason());
        }
        cellForm();
        return text.toString();
    }

    private void argument(Argument argument, Sensitivity sensitivity) {
        String derivative = sensitivity instanceof Sensitivity.Exact
                ? "; exact derivative"
                : sensitivity instanceof Sensitivity.Numeric ? "; numeric derivative" : "";
        text.item(argument.name() + " (" + argument.symbol() + "): " + argument.meaning() + "; "
                + values(argument.isText(), String.join(", ", argument.choices()), argument.unit(), argument.interval())
                + derivative);
    }

    private static String values(boolean words, String choices, Unit unit, Interval interval) {
        return words
                ? "one of " + choices
                : interval.inWords(unit) + (unit.isOne() ? "" : " (in " + unit.symbol() + ")");
    }

    private void conditions() {
        if (entry.conditions().isEmpty()) {
            return;
        }
        text.heading("Faults of arguments that do not go together");
        for (Condition condition : entry.conditions()) {
            text.item(condition.kind().label() + ", by " + condition.argument());
        }
    }

    private void example() {
        text.heading("Example");
        StringBuilder command = new StringBuilder("ductledger evaluate ").append(entry.name());
        for (int i = 0; i < entry.arguments().size(); i++) {
            command.append(' ')
                    .append(entry.arguments().get(i).name())
                    .append('=')
                    .append(entry.example().arguments().get(i));
        }
        text.item(command + "   gives " + entry.example().printed());
    }

    private void cellForm() {
        text.heading("In a spreadsheet");
        CellForm form = entry.cellForm();
        if (!form.exists()) {
            text.item("no cell form: " + form.reason());
            return;
        }
        for (CellForm.Helper helper : form.helpers()) {
            text.item(helper.name() + " = " + helper.formula());
        }
        text.item("= " + form.formula());
    }
}
