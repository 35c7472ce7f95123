package org.ductledger.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class EvaluateCommandTest {
    private static final String LEDGER =
            "{\"ledger\":[{\"id\":\"t\",\"call\":\"t_over_t0\",\"with\":{\"mach\":[0,2],\"gamma\":1.4}}]}";

    @TempDir
    private Path folder = Path.of("");

    @Test
    void oneValue() {
        CommandRun run = CommandRun.of("evaluate", "t_over_t0", "mach=2", "gamma=1.4");
        assertEquals(new CommandRun(0, "0.5555555555555556\n", ""), run);
    }

    @Test
    void aColumnWithUnitsAndAFaultInItsLine() {
        CommandRun run = CommandRun.of("evaluate", "t_over_t0", "mach=200,-100,0 %", "gamma=1.4", "--unit", "%");
        assertEquals(1, run.code());
        assertEquals("55.55555555555556 %\nfault: mach must be at least 0 %, got -100 %\n100.0 %\n", run.out());
        assertEquals("", run.err());
    }

    @Test
    void asTheServiceAnswers() {
        CommandRun run = CommandRun.of("evaluate", "t_over_t0", "mach=2", "gamma=1.4", "--json");
        assertEquals(0, run.code());
        assertEquals(
                "{\"library\":\"1.0.0\",\"results\":[{\"id\":\"t_over_t0\",\"call\":\"t_over_t0\",\"revision\":1,"
                        + "\"unit\":\"1\",\"values\":[0.5555555555555556],\"faults\":[]}]}\n",
                run.out());
    }

    @Test
    void aLedgerFromAFileOrStandardInput() throws IOException {
        Path file = Files.writeString(folder.resolve("ledger.json"), LEDGER);
        CommandRun fromFile = CommandRun.of("evaluate", "--ledger", file.toString());
        CommandRun fromInput = CommandRun.withInput(LEDGER, "evaluate", "--ledger", "-");
        assertEquals(0, fromFile.code());
        assertEquals(fromFile, fromInput);
        assertTrue(fromFile.out().contains("\"values\":[1.0,0.5555555555555556]"), fromFile.out());
        assertEquals(
                1,
                CommandRun.withInput(LEDGER.replace("[0,2]", "[0,-2]"), "evaluate", "--ledger", "-")
                        .code());
    }

    @Test
    void aTableWithConstantsBesideIt() throws IOException {
        Path file = Files.writeString(folder.resolve("table.csv"), "mach\n0\n2\n-1\n");
        CommandRun run = CommandRun.of("evaluate", "t_over_t0", "--csv", file.toString(), "gamma=1.4");
        assertEquals(1, run.code());
        assertEquals("""
                mach,t_over_t0,fault\r
                0,1.0,\r
                2,0.5555555555555556,\r
                -1,,"mach must be at least 0, got -1"\r
                """, run.out());
    }

    /** Wrong usage is 2, an input that could not be read 3; the reason goes to standard error. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
        evaluate                                             | 2 | evaluate needs a function's name
        evaluate t_over_t mach=1                             | 2 | no function is named t_over_t; near it: t_over_t0
        evaluate t_over_t0 mach=1                            | 2 | t_over_t0 requires gamma
        evaluate t_over_t0 mach                              | 2 | arguments are typed ARG=VALUE, got 'mach'
        evaluate t_over_t0 mach=1 mach=2 gamma=1.4           | 2 | mach is given twice
        evaluate t_over_t0 mach= gamma=1.4                   | 2 | mach is given without a value
        evaluate t_over_t0 mach=fast gamma=1.4               | 2 | mach must be a number, got text
        evaluate t_over_t0 mach=1psig gamma=1.4              | 2 | is a gauge unit
        evaluate t_over_t0 mach=1 gamma=1.4 --unit K         | 2 | got K
        evaluate t_over_t0 mach=1,2 gamma=1.4,1.4,1.4        | 2 | same number of rows
        evaluate t_over_t0 --ledger x.json                   | 2 | --ledger takes no function
        evaluate t_over_t0 --nothing                         | 2 | Unknown option: '--nothing'
        evaluate --ledger no-such-file.json                  | 3 | there is no file no-such-file.json
        evaluate t_over_t0 --csv no-such-file.csv            | 3 | there is no file no-such-file.csv
        evaluate --ledger -                                  | 3 | the document is empty
        evaluate t_over_t0 --csv -                           | 3 | the document is empty
        """)
    void refuses(String arguments, int code, String reason) {
        CommandRun run = CommandRun.of(arguments.split(" +", -1));
        assertEquals(code, run.code(), run.err());
        assertTrue(run.err().contains(reason), run.err());
        assertEquals("", run.out());
    }

    @Test
    void anUnsoundLedgerIsRefusedWithItsPlace() {
        CommandRun run = CommandRun.withInput(LEDGER.replace("t_over_t0", "t_over_t"), "evaluate", "--ledger", "-");
        assertEquals(3, run.code());
        assertTrue(run.err().contains("/ledger/0/call: no function is named t_over_t"), run.err());
    }
}
