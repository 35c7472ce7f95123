package org.ductledger.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.ductledger.catalogue.Argument;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Source;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.template.Template;
import org.ductledger.template.TemplateInput;
import org.ductledger.template.Templates;
import org.junit.jupiter.api.Test;

class CatalogueCommandTest {
    @Test
    void listsEveryFunctionUnderItsFamilyAndEveryTemplate() {
        CommandRun run = CommandRun.of("catalogue");
        assertEquals(0, run.code());
        for (FunctionEntry entry : StandardCatalogue.get().entries()) {
            assertTrue(run.out().contains("\n  " + entry.name() + "("), entry.name());
            assertTrue(
                    run.out().contains(entry.family().title() + " ["),
                    entry.family().name());
        }
        for (Template template : Templates.all()) {
            assertTrue(run.out().contains("\n  " + template.name() + "\n"), template.name());
        }
    }

    @Test
    void showsAllOfEveryFunction() {
        for (FunctionEntry entry : StandardCatalogue.get().entries()) {
            CommandRun run = CommandRun.of("catalogue", entry.name());
            assertEquals(0, run.code());
            String words = run.out().replaceAll("\\s+", " ");
            assertTrue(words.startsWith(entry.name() + ": " + entry.title()), run.out());
            assertTrue(words.contains(entry.formula().replaceAll("\\s+", " ")), run.out());
            for (Argument argument : entry.arguments()) {
                assertTrue(words.contains(argument.name() + " (" + argument.symbol() + "): "), run.out());
            }
            for (Source source : entry.sources()) {
                assertTrue(words.contains(source.title()), run.out());
            }
            assertTrue(words.contains("gives " + entry.example().printed()), run.out());
        }
    }

    /** The example that is shown is a command that runs. */
    @Test
    void everyExampleShownRuns() {
        for (FunctionEntry entry : StandardCatalogue.get().entries()) {
            String text = CommandRun.of("catalogue", entry.name()).out().replaceAll("\\s+", " ");
            int start = text.indexOf("ductledger evaluate ") + "ductledger ".length();
            String command = text.substring(start, text.indexOf(" gives ", start));
            CommandRun run = CommandRun.of(command.strip().split(" ", -1));
            assertEquals(0, run.code(), command + "\n" + run.err() + run.out());
        }
    }

    @Test
    void showsAllOfATemplate() {
        for (Template template : Templates.all()) {
            CommandRun run = CommandRun.of("catalogue", template.name());
            assertEquals(0, run.code());
            for (TemplateInput input : template.inputs()) {
                assertTrue(run.out().contains("\n  " + input.name() + ": "), run.out());
            }
        }
    }

    @Test
    void listsOneFamily() {
        CommandRun run = CommandRun.of("catalogue", "isentropic");
        assertEquals(0, run.code());
        assertTrue(run.out().contains("  t_over_t0(mach, gamma)\n      Static over stagnation temperature\n"));
    }

    @Test
    void anUnknownNameIsWrongUsage() {
        CommandRun run = CommandRun.of("catalogue", "t_over_t");
        assertEquals(2, run.code());
        assertTrue(run.err().contains("near it: t_over_t0"), run.err());
        assertEquals("", run.out());
    }
}
