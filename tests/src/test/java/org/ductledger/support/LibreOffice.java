package org.ductledger.support;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;

/** LibreOffice Calc without a screen, made to recalculate every formula of what it loads. */
public final class LibreOffice {
    /** Calc keeps an XLSX file's cached values unless its own profile says "always recalculate" (0). */
    private static final String ALWAYS_RECALCULATE = """
            <?xml version="1.0" encoding="UTF-8"?>
            <oor:items xmlns:oor="http://openoffice.org/2001/registry">
              <item oor:path="/org.openoffice.Office.Calc/Formula/Load">
                <prop oor:name="OOXMLRecalcMode" oor:op="fuse"><value>0</value></prop>
              </item>
            </oor:items>
            """;

    private static final long MINUTES = 5;

    private final Path work;

    /** An instance with a profile of its own in a folder that is the test's to delete. */
    public LibreOffice(Path work) throws IOException {
        this.work = work;
        Path user = Files.createDirectories(work.resolve("profile/user"));
        Files.writeString(user.resolve("registrymodifications.xcu"), ALWAYS_RECALCULATE);
    }

    /** Loads, recalculates and saves again; the results bear the same names, in the folder that is returned. */
    public Path recalculated(List<Path> workbooks) throws IOException, InterruptedException {
        return converted("xlsx", workbooks);
    }

    /** The pages as PDF files of the same names, in the folder that is returned. */
    public Path printed(List<Path> workbooks) throws IOException, InterruptedException {
        return converted("pdf", workbooks);
    }

    private Path converted(String format, List<Path> workbooks) throws IOException, InterruptedException {
        Path out = Files.createDirectories(work.resolve("out-" + format));
        List<String> command = new ArrayList<>(List.of(
                "soffice",
                "-env:UserInstallation=" + work.resolve("profile").toUri(),
                "--headless",
                "--convert-to",
                format,
                "--outdir",
                out.toString()));
        workbooks.forEach(workbook -> command.add(workbook.toString()));
        Path log = work.resolve("soffice.log");
        Process process = new ProcessBuilder(command)
                .redirectErrorStream(true)
                .redirectOutput(log.toFile())
                .start();
        assertTrue(process.waitFor(MINUTES, TimeUnit.MINUTES), "LibreOffice did not end");
        assertEquals(0, process.exitValue(), Files.readString(log));
        return out;
    }
}
