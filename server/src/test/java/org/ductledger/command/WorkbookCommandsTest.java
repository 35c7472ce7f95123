package org.ductledger.command;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** build and audit. */
class WorkbookCommandsTest {
    @TempDir
    private Path folder = Path.of("");

    @Test
    void buildsOnlyWhereThereIsNoFileUnlessForced() throws IOException {
        Path file = folder.resolve("nozzle.xlsx");
        assertEquals(new CommandRun(0, file + "\n", ""), build(file));
        byte[] first = Files.readAllBytes(file);
        CommandRun again = build(file);
        assertEquals(2, again.code());
        assertTrue(again.err().contains("is there already"), again.err());
        Files.writeString(file, "something else");
        assertEquals(2, build(file).code());
        assertEquals("something else", Files.readString(file));
        assertEquals(
                0,
                CommandRun.of("build", "nozzle_sizing", "-o", file.toString(), "--force")
                        .code());
        assertArrayEquals(first, Files.readAllBytes(file), "the same inputs give the same bytes");
        try (Stream<Path> files = Files.list(folder)) {
            assertEquals(List.of(file), files.toList(), "nothing is left beside it");
        }
    }

    @Test
    void takesInputsAndUnits() throws IOException {
        Path inputs = Files.writeString(folder.resolve("in.json"), "{\"p0\": {\"value\": 9, \"unit\": \"bar\"}}");
        Path si = folder.resolve("si.xlsx");
        Path us = folder.resolve("us.xlsx");
        assertEquals(0, build(si, "--inputs", inputs.toString()).code());
        assertEquals(
                0, build(us, "--inputs", inputs.toString(), "--units", "us").code());
        assertFalse(java.util.Arrays.equals(Files.readAllBytes(si), Files.readAllBytes(us)));
    }

    @Test
    void refusesNamingTheReason() {
        Path file = folder.resolve("a.xlsx");
        refused(
                2,
                "no template is named nozzle_size; near it: nozzle_sizing",
                CommandRun.of("build", "nozzle_size", "-o", file.toString()));
        refused(2, "--units must be si or us, got 'metric'", build(file, "--units", "metric"));
        refused(2, "Missing required option: '-o=F.xlsx'", CommandRun.of("build", "nozzle_sizing"));
        refused(2, "there is no folder for", build(folder.resolve("none").resolve("a.xlsx")));
        refused(3, "there is no file none.json", build(file, "--inputs", "none.json"));
        refused(3, "is not valid JSON", input("{", file));
        refused(3, "p0 requires", input("{\"p0\": {\"value\": 1, \"unit\": \"psig\"}}", file));
        refused(3, "p0 requires", input("{\"p0\": -1}", file));
        refused(3, "nothing requires", input("{\"nothing\": 1}", file));
        assertFalse(Files.exists(file));
    }

    @Test
    void auditsFilesAndSaysWhichCouldNotBeRead() throws IOException {
        Path file = folder.resolve("nozzle.xlsx");
        assertEquals(0, build(file).code());
        CommandRun clean = CommandRun.of("audit", file.toString());
        assertEquals(0, clean.code(), clean.out() + clean.err());
        assertTrue(clean.out().contains("no difference"), clean.out());

        Path noZip = Files.writeString(folder.resolve("no.xlsx"), "no zip");
        CommandRun mixed = CommandRun.of("audit", file.toString(), noZip.toString(), "none.xlsx", "--json");
        assertEquals(3, mixed.code());
        assertTrue(mixed.out().contains("\"clean\":true"), mixed.out());
        assertTrue(mixed.err().contains(noZip + ": the file must be an XLSX workbook"), mixed.err());
        assertTrue(mixed.err().contains("there is no file none.xlsx"), mixed.err());
    }

    private static CommandRun build(Path file, String... options) {
        return CommandRun.of(
                Stream.concat(Stream.of("build", "nozzle_sizing", "-o", file.toString()), Stream.of(options))
                        .toArray(String[]::new));
    }

    private static CommandRun input(String json, Path file) {
        return CommandRun.withInput(json, "build", "nozzle_sizing", "--inputs", "-", "-o", file.toString());
    }

    private static void refused(int code, String reason, CommandRun run) {
        assertEquals(code, run.code(), run.err());
        assertTrue(run.err().contains(reason), run.err());
        assertEquals("", run.out());
    }
}
