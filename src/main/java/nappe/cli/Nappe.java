package nappe.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.Properties;
import java.util.function.Consumer;
import picocli.CommandLine;
import picocli.CommandLine.Command;

/** The command line. */
@Command(
        name = "nappe",
        mixinStandardHelpOptions = true,
        versionProvider = Nappe.Version.class,
        description = {
            "Calculation packages for flow-measurement stations: from one input workbook to a PDF and a workbook with live formulas.",
            ""
        },
        footer = {
            "",
            "Exit status: 0 done (limits not met are results, not errors), 1 internal fault, 2 wrong usage, 3 input refused or a check value not met, 4 would overwrite"
                    + " an issued revision.",
            "",
            "Start with:  nappe blank F1=parshall-flume -o station.xlsx"
        },
        subcommands = {BlankCommand.class, InspectCommand.class, IssueCommand.class, VerifyCommand.class})
public final class Nappe implements Runnable {
    @CommandLine.Spec
    private CommandLine.Model.CommandSpec spec;

    /** So long a person waits before being told what the program is busy with. */
    private static final long PATIENCE_MILLIS = 1000;

    private final Consumer<String> stage;

    private Nappe(Consumer<String> stage) {
        this.stage = stage;
    }

    /** Runs the program and ends with its exit status. */
    public static void main(String[] args) {
        Writer out = new OutputStreamWriter(System.out, StandardCharsets.UTF_8);
        Writer err = new OutputStreamWriter(System.err, StandardCharsets.UTF_8);
        if (!Terminal.isWatched()) {
            System.exit(run(args, new PrintWriter(out, true), new PrintWriter(err, true)));
        }
        ProgressLine line = ProgressLine.on(err, PATIENCE_MILLIS);
        Runtime.getRuntime().addShutdownHook(new Thread(line::end, "progress-end"));
        System.exit(run(
                new Nappe(line::stage),
                args,
                new PrintWriter(line.before(out), true),
                new PrintWriter(line.before(err), true)));
    }

    /** Runs one command; results go to the first writer, messages to the second. */
    public static int run(String[] args, PrintWriter out, PrintWriter err) {
        return run(new Nappe(words -> {}), args, out, err);
    }

    private static int run(Nappe nappe, String[] args, PrintWriter out, PrintWriter err) {
        System.setProperty("java.awt.headless", "true");
        System.setProperty("log4j.provider", "org.apache.logging.log4j.simple.internal.SimpleProvider");
        System.setProperty("org.apache.logging.log4j.simplelog.level", "OFF");
        Locale.setDefault(Locale.ROOT);
        CommandLine line = new CommandLine(nappe)
                .setOut(out)
                .setErr(err)
                .setUsageHelpWidth(110)
                .setParameterExceptionHandler(Nappe::wrongUsage)
                .setExecutionExceptionHandler(new Failures());
        return line.execute(args);
    }

    private static int wrongUsage(CommandLine.ParameterException e, String[] args) {
        CommandLine line = e.getCommandLine();
        line.getErr().println("nappe: " + e.getMessage());
        line.getErr().println("How it is used:  " + line.getCommandSpec().qualifiedName() + " --help");
        return ExitStatus.WRONG_USAGE;
    }

    /** Without a command: what to do next. */
    @Override
    public void run() {
        spec.commandLine().usage(spec.commandLine().getOut());
    }

    /** Where a command tells, in words, what it is busy with; shown only to a person who waits. */
    static Consumer<String> stage(CommandLine.Model.CommandSpec command) {
        return command.root().userObject() instanceof Nappe nappe ? nappe.stage : words -> {};
    }

    /** The version, from the build. */
    static String version() {
        try (InputStream in = Nappe.class.getResourceAsStream("/nappe.properties")) {
            Properties properties = new Properties();
            properties.load(in);
            return properties.getProperty("version");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Tells picocli the version. */
    static final class Version implements CommandLine.IVersionProvider {
        @Override
        public String[] getVersion() {
            return new String[] {"nappe " + version()};
        }
    }
}
