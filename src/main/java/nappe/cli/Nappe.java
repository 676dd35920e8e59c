package nappe.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.PrintWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Properties;
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

    /** Runs the program and ends with its exit status. */
    public static void main(String[] args) {
        System.exit(run(
                args,
                new PrintWriter(new java.io.OutputStreamWriter(System.out, StandardCharsets.UTF_8), true),
                new PrintWriter(new java.io.OutputStreamWriter(System.err, StandardCharsets.UTF_8), true)));
    }

    /** Runs one command; results go to the first writer, messages to the second. */
    public static int run(String[] args, PrintWriter out, PrintWriter err) {
        System.setProperty("java.awt.headless", "true");
        System.setProperty("log4j.provider", "org.apache.logging.log4j.simple.internal.SimpleProvider");
        System.setProperty("org.apache.logging.log4j.simplelog.level", "OFF");
        Locale.setDefault(Locale.ROOT);
        CommandLine line = new CommandLine(new Nappe())
                .setOut(out)
                .setErr(err)
                .setUsageHelpWidth(110)
                .setParameterExceptionHandler(Nappe::wrongUsage)
                .setExecutionExceptionHandler(new Failures());
        line.registerConverter(Path.class, Nappe::path);
        try {
            return line.execute(args);
        } catch (OutOfMemoryError | StackOverflowError e) {
            return Failures.internal(err, e);
        }
    }

    private static Path path(String typed) {
        try {
            return Path.of(typed);
        } catch (InvalidPathException e) {
            throw new CommandLine.TypeConversionException("\"" + typed
                    + "\" has signs that a file name cannot have here. If it looks right, the language set in this shell has no"
                    + " such letters: set one that has, such as LC_ALL=C.UTF-8, and run again");
        }
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
