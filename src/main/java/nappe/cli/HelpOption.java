package nappe.cli;

import picocli.CommandLine.Option;

/** The option that every command has. */
final class HelpOption {
    @Option(
            names = {"-h", "--help"},
            usageHelp = true,
            description = "tell how the command is used, with examples")
    private boolean asked;
}
