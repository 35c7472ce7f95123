package org.ductledger.acceptance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** README's commands, as a user types them. */
final class LauncherTest {
    private static final Path TOP = Path.of("..").toAbsolutePath().normalize();

    private record Ended(int code, String out, String err) {}

    private static Ended run(Path folder, String... arguments) throws IOException, InterruptedException {
        List<String> command =
                new ArrayList<>(List.of(TOP.resolve("server/ductledger").toString()));
        command.addAll(List.of(arguments));
        Path out = Files.createTempFile(folder, "out", ".txt");
        Path err = Files.createTempFile(folder, "err", ".txt");
        Process process = new ProcessBuilder(command)
                .directory(folder.toFile())
                .redirectOutput(out.toFile())
                .redirectError(err.toFile())
                .start();
        assertTrue(process.waitFor(5, TimeUnit.MINUTES), "the command did not end");
        return new Ended(process.exitValue(), Files.readString(out), Files.readString(err));
    }

    @Test
    void demoDoesTheMainJobAndShowsIt(@TempDir Path folder) throws Exception {
        Ended demo = run(folder, "demo");
        assertEquals(0, demo.code, demo.err);
        assertTrue(demo.out.contains("p_over_p0"), demo.out);
        assertTrue(demo.out.contains(".xlsx"), demo.out);
        assertTrue(demo.out.contains("no difference"), demo.out);
    }

    @Test
    void aWorkbookIsBuiltAuditedAndNeverOverwritten(@TempDir Path folder) throws Exception {
        assertEquals(0, run(folder, "build", "nozzle_sizing", "-o", "nozzle.xlsx").code);
        byte[] first = Files.readAllBytes(folder.resolve("nozzle.xlsx"));
        assertEquals(0, run(folder, "audit", "nozzle.xlsx").code);
        Ended again = run(folder, "build", "nozzle_sizing", "-o", "nozzle.xlsx");
        assertTrue(again.code != 0 && again.err.contains("nozzle.xlsx"), again.err);
        assertEquals(first.length, Files.size(folder.resolve("nozzle.xlsx")));
    }

    @Test
    void exitCodesTellWhatHappened(@TempDir Path folder) throws Exception {
        assertEquals(0, run(folder, "evaluate", "t_over_t0", "mach=2", "gamma=1.4").code);
        assertEquals(1, run(folder, "evaluate", "t_over_t0", "mach=-2", "gamma=1.4").code);
        assertEquals(2, run(folder, "no-such-command").code);
        Path text = Files.writeString(folder.resolve("no.xlsx"), "a plain text");
        Ended unread = run(folder, "audit", text.toString());
        assertEquals(3, unread.code, unread.err);
        assertTrue(unread.err.contains("no.xlsx"), unread.err);
    }
}
