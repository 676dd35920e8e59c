package nappe.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Properties;
import java.util.TreeMap;
import java.util.function.Consumer;
import java.util.function.Supplier;
import picocli.CommandLine;
import picocli.CommandLine.Command;

/** The command line. */
@Command(
        name = "nappe",
        versionProvider = Nappe.Version.class,
        description = {
            "Calculation packages for flow-measurement stations: from one input workbook to a PDF and a workbook with live formulas.",
            ""
        },
        footer = {
            "",
            "Examples:",
            "  nappe blank F1=parshall-flume A1=approach-channel --units US -o station.xlsx",
            "  nappe inspect station.xlsx",
            "  nappe issue station.xlsx -o output",
            "",
            "nappe blank --help, and so on, tells of each command with examples.",
            "",
            "Exit status:",
            "  0  done; limits that are not met are results, not errors",
            "  1  a file could not be written, or a fault of the program itself",
            "  2  the command line was not understood",
            "  3  the input was refused, or a check value was not met",
            "  4  an issued revision would have been written over"
        })
public final class Nappe implements Runnable {
    @CommandLine.Spec
    private CommandLine.Model.CommandSpec spec;

    /** What to do next, for whoever typed the name of the program only. */
    private static final List<String> NEXT = List.of(
            "Nappe makes the calculation package of a flow-measurement station from one input workbook.",
            "",
            "  nappe blank --methods",
            "      the methods for flumes, weirs, meters and channels",
            "  nappe blank F1=parshall-flume A1=approach-channel --units US -o station.xlsx",
            "      an input workbook to fill in, for the devices of your station from the downstream end up",
            "  nappe inspect station.xlsx",
            "      what is wrong in it, cell by cell; else the verdict on every limit",
            "  nappe issue station.xlsx -o output",
            "      the package: a PDF, a workbook with live formulas, rating tables",
            "",
            "Help: nappe --help, and nappe blank --help and so on. A guide with pictures: README.md.");

    private static final Map<String, Supplier<Object>> COMMANDS = new TreeMap<>(Map.of(
            "blank",
            BlankCommand::new,
            "inspect",
            InspectCommand::new,
            "issue",
            IssueCommand::new,
            "verify",
            VerifyCommand::new));

    /** So long a person waits before being told what the program is busy with. */
    private static final long PATIENCE_MILLIS = 1000;

    @CommandLine.Mixin
    private HelpOption help = new HelpOption();

    @CommandLine.Option(
            names = {"-V", "--version"},
            versionHelp = true,
            description = "tell the version")
    private boolean versionAsked;

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
                line::stage, args, new PrintWriter(line.before(out), true), new PrintWriter(line.before(err), true)));
    }

    /** Runs one command; results go to the first writer, messages to the second. */
    public static int run(String[] args, PrintWriter out, PrintWriter err) {
        return run(words -> {}, args, out, err);
    }

    /** The same, telling in words what it is busy with. */
    static int run(Consumer<String> stage, String[] args, PrintWriter out, PrintWriter err) {
        System.setProperty("java.awt.headless", "true");
        System.setProperty("log4j.provider", "org.apache.logging.log4j.simple.internal.SimpleProvider");
        System.setProperty("org.apache.logging.log4j.simplelog.level", "OFF");
        Locale.setDefault(Locale.ROOT);
        if (args.length > 1 && args[0].equals("issue")) {
            Rehearsal.ofPages();
        }
        String[] typed = asHelp(args);
        CommandLine line = new CommandLine(new Nappe(stage));
        // a command takes a while to set up, and one that is named needs no other
        Supplier<Object> named = typed.length == 0 ? null : COMMANDS.get(typed[0]);
        (named == null ? COMMANDS.values() : List.of(named)).forEach(command -> line.addSubcommand(command.get()));
        line.setOut(out)
                .setErr(err)
                .setUsageHelpWidth(110)
                .setParameterExceptionHandler(new WrongUsage())
                .setExecutionExceptionHandler(new Failures());
        line.registerConverter(Path.class, Nappe::path);
        try {
            return line.execute(typed);
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

    /** {@code nappe help issue} is {@code nappe issue --help}. */
    private static String[] asHelp(String[] args) {
        if (args.length == 0 || !args[0].equals("help")) {
            return args;
        }
        return args.length == 1 ? new String[] {"--help"} : new String[] {args[1], "--help"};
    }

    /** Without a command: what to do next. */
    @Override
    public void run() {
        spec.commandLine().getOut().println(String.join(System.lineSeparator(), NEXT));
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
