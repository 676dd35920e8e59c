package nappe.cli;

import java.util.List;
import java.util.Set;
import nappe.input.Near;
import picocli.CommandLine;
import picocli.CommandLine.Model.CommandSpec;

/** Says in words what was wrong with a command line, what was most likely meant, and how it is written. */
final class WrongUsage implements CommandLine.IParameterExceptionHandler {
    @Override
    public int handleParseException(CommandLine.ParameterException e, String[] args) {
        CommandLine line = e.getCommandLine();
        line.getErr().println("nappe: " + inWords(e));
        line.getErr().println("How it is used:  " + line.getCommandSpec().qualifiedName() + " --help");
        return ExitStatus.WRONG_USAGE;
    }

    private static String inWords(CommandLine.ParameterException e) {
        CommandSpec command = e.getCommandLine().getCommandSpec();
        if (e instanceof CommandLine.UnmatchedArgumentException unmatched
                && !unmatched.getUnmatched().isEmpty()) {
            return unmatched(unmatched.getUnmatched().get(0), command);
        }
        if (e instanceof CommandLine.MissingParameterException missing
                && !missing.getMissing().isEmpty()) {
            return missing(missing.getMissing().get(0), command);
        }
        if (e instanceof CommandLine.OverwrittenOptionException twice && twice.getOverwritten() != null) {
            return "the option " + name(twice.getOverwritten()) + " is given twice (fault: option-twice)";
        }
        return String.valueOf(e.getMessage());
    }

    private static String unmatched(String word, CommandSpec command) {
        if (word.startsWith("-")) {
            String option = word.split("=")[0];
            return "there is no option " + option + " here" + option(option, command) + " (fault: option-unknown)";
        }
        if (command.parent() == null) {
            Set<String> known = command.subcommands().keySet();
            String question = Near.question(word, known);
            if (question.isEmpty() && isFile(word)) {
                return "\"" + word + "\" is a file; say what is to be done with it: nappe inspect " + word
                        + " (fault: command-missing)";
            }
            return "there is no command \"" + word + "\""
                    + (question.isEmpty() ? "; there are " + String.join(", ", known) : question)
                    + " (fault: command-unknown)";
        }
        return "\"" + word + "\" is one too many; " + command.name() + " takes one input workbook at a time"
                + " (a name with blanks stands in quotation marks) (fault: argument-unexpected)";
    }

    private static String option(String option, CommandSpec command) {
        List<String> known = List.copyOf(command.optionsMap().keySet());
        String near = Near.question(option, known);
        return near.isEmpty() ? "; there are " + String.join(", ", known) : near;
    }

    private static boolean isFile(String word) {
        return word.matches("(?i).*\\.(xls[xmb]?|csv|ods|txt|pdf)");
    }

    private static String missing(CommandLine.Model.ArgSpec missing, CommandSpec command) {
        if (missing instanceof CommandLine.Model.OptionSpec option) {
            return option.longestName() + " is followed by " + option.paramLabel() + ", "
                    + String.join(" ", option.description()) + " (fault: option-incomplete)";
        }
        return "name " + String.join(" ", missing.description()) + ", such as: nappe " + command.name()
                + " station.xlsx (fault: file-unnamed)";
    }

    private static String name(CommandLine.Model.ArgSpec spec) {
        return spec instanceof CommandLine.Model.OptionSpec option ? option.longestName() : spec.paramLabel();
    }
}
