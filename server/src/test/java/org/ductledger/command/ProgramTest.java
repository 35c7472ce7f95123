package org.ductledger.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.ductledger.flow.StandardCatalogue;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class ProgramTest {
    @Test
    void withoutACommandOrWithAnUnknownOneItIsWrongUsage() {
        assertEquals(2, CommandRun.of().code());
        CommandRun run = CommandRun.of("evalute");
        assertEquals(2, run.code());
        assertTrue(run.err().contains("ductledger --help"), run.err());
        assertEquals("", run.out());
    }

    @Test
    void tellsItsVersionAndExitCodes() {
        assertEquals(
                "Ductledger " + StandardCatalogue.VERSION + "\n",
                CommandRun.of("--version").out());
        CommandRun help = CommandRun.of("--help");
        assertEquals(0, help.code());
        assertTrue(help.out().contains("3   an input could not be read"), help.out());
    }

    @ParameterizedTest
    @ValueSource(strings = {"serve", "catalogue", "evaluate", "build", "audit", "demo"})
    void everyCommandHasItsHelp(String command) {
        assertTrue(CommandRun.of("--help").out().contains("\n  " + command + " "));
        CommandRun help = CommandRun.of(command, "--help");
        assertEquals(0, help.code());
        assertTrue(help.out().startsWith("Usage: ductledger " + command), help.out());
    }

    @Test
    void theDemoShowsTheWholeWay() {
        CommandRun run = CommandRun.of("demo");
        assertEquals(0, run.code(), run.out() + run.err());
        assertTrue(run.out().contains("\"faults\":[]"), run.out());
        assertTrue(run.out().contains("nozzle_sizing.xlsx"), run.out());
        assertTrue(run.out().contains("\"clean\":true"), run.out());
        assertEquals("", run.err());
    }
}
