package org.ductledger.command;

import java.io.InputStream;
import java.io.OutputStreamWriter;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import org.ductledger.flow.StandardCatalogue;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.OptionSpec;

/** The table of commands. */
public final class Commands {
    private static final int HELP_WIDTH = 100;

    private Commands() {}

    /** The program without a command. */
    @Command(
            name = "ductledger",
            description = "Gas-dynamics functions, a local service, design workbooks and their audits.",
            synopsisSubcommandLabel = "COMMAND",
            mixinStandardHelpOptions = true,
            version = "Ductledger " + StandardCatalogue.VERSION,
            exitCodeListHeading = "%nExit codes:%n",
            exitCodeList = {
                "0:done",
                "1:done, and differences or faults were found",
                "2:wrong usage",
                "3:an input could not be read",
                "4:internal error"
            })
    private static final class Program {}

    /** Runs one command and returns its exit code. */
    public static int run(InputStream in, PrintStream out, PrintStream err, String... args) {
        Streams streams = new Streams(in, out, err);
        CommandLine line = new CommandLine(new Program())
                .addSubcommand(new ServeCommand(streams))
                .addSubcommand(new CatalogueCommand(streams))
                .addSubcommand(new EvaluateCommand(streams))
                .addSubcommand(new BuildCommand(streams))
                .addSubcommand(new AuditCommand(streams))
                .addSubcommand(new DemoCommand(streams))
                .setOut(new PrintWriter(new OutputStreamWriter(out, StandardCharsets.UTF_8), true))
                .setErr(new PrintWriter(new OutputStreamWriter(err, StandardCharsets.UTF_8), true));
        line.getSubcommands()
                .values()
                .forEach(command -> command.getCommandSpec().addOption(helpOption()));
        line.setUsageHelpWidth(HELP_WIDTH);
        line.setParameterExceptionHandler((exception, given) -> misused(exception, err));
        line.setExecutionExceptionHandler((exception, command, parsed) -> failed(exception, err));
        return line.execute(args);
    }

    private static OptionSpec helpOption() {
        return OptionSpec.builder("-h", "--help")
                .usageHelp(true)
                .description("shows this help")
                .build();
    }

    private static int misused(CommandLine.ParameterException exception, PrintStream err) {
        String command = exception.getCommandLine().getCommandSpec().qualifiedName();
        err.println(command + ": " + exception.getMessage());
        err.println("See '" + command + " --help'.");
        return ExitCode.USAGE;
    }

    private static int failed(Exception exception, PrintStream err) {
        if (exception instanceof CommandException known) {
            err.println("ductledger: " + known.getMessage());
            return known.exitCode();
        }
        err.println("ductledger: internal error");
        exception.printStackTrace(err);
        return ExitCode.INTERNAL;
    }
}
