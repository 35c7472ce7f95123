package org.ductledger.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The same bits from the interpreter, from either compiler, and on every newer JDK that is installed. */
class SameBitsTest {
    private static final Path INSTALLED = Path.of("/usr/lib/jvm");
    private static final Pattern MAJOR = Pattern.compile("JAVA_VERSION=\"(\\d+)");
    private static final int OLDEST = 17;

    private static final List<List<String>> MODES = List.of(
            List.of("-Xint"),
            List.of("-Xbatch", "-XX:TieredStopAtLevel=1", "-XX:Tier3InvocationThreshold=100"),
            List.of("-Xbatch", "-XX:-TieredCompilation", "-XX:CompileThreshold=100"));

    @TempDir
    Path folder;

    static List<List<String>> commands() throws IOException {
        List<List<String>> commands = new ArrayList<>();
        for (Path home : homes()) {
            for (List<String> mode : MODES) {
                List<String> command = new ArrayList<>();
                command.add(home.resolve("bin/java").toString());
                command.addAll(mode);
                commands.add(command);
            }
        }
        return commands;
    }

    /** This JDK, and those of version 17 and newer among the installed ones. */
    private static Set<Path> homes() throws IOException {
        Set<Path> homes = new TreeSet<>();
        homes.add(Path.of(System.getProperty("java.home")).toRealPath());
        if (Files.isDirectory(INSTALLED)) {
            try (Stream<Path> found = Files.list(INSTALLED)) {
                for (Path home : found.toList()) {
                    if (major(home) >= OLDEST && Files.isExecutable(home.resolve("bin/java"))) {
                        homes.add(home.toRealPath());
                    }
                }
            }
        }
        return homes;
    }

    private static int major(Path home) throws IOException {
        Path release = home.resolve("release");
        Matcher version = MAJOR.matcher(Files.isRegularFile(release) ? Files.readString(release) : "");
        return version.find() ? Integer.parseInt(version.group(1)) : 0;
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("commands")
    void theBitsAreThoseOfThisProcess(List<String> command) throws IOException, InterruptedException {
        List<String> whole = new ArrayList<>(command);
        String rounds = command.contains("-Xint") ? "1" : "8";
        whole.addAll(List.of("-cp", classPath(), BitsDigest.class.getName(), rounds));
        Path printed = folder.resolve("bits.txt");
        Process process = new ProcessBuilder(whole)
                .redirectOutput(printed.toFile())
                .redirectError(ProcessBuilder.Redirect.INHERIT)
                .start();
        assertTrue(process.waitFor(10, TimeUnit.MINUTES), "it ends");
        assertEquals(0, process.exitValue());
        List<String> lines = Files.readAllLines(printed, StandardCharsets.UTF_8);
        assertFalse(lines.isEmpty());
        assertEquals(BitsDigest.lines(), lines);
    }

    /** The class path that the tests run with; their runner may hide it in a manifest and name it in this property. */
    private static String classPath() {
        return System.getProperty("surefire.test.class.path", System.getProperty("java.class.path"));
    }
}
