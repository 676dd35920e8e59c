package nappe.cli;

import java.nio.file.Path;
import java.util.Collection;
import nappe.source.HouseLibrary;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine;
import picocli.CommandLine.Option;

/** The option that names a folder of the house's own methods. */
final class HouseOption {
    @Option(
            names = "--house",
            paramLabel = "FOLDER",
            description =
                    "a folder of the house's own methods, read beside the built-in ones: in it methods/NAME.txt, tables/NAME.csv,"
                            + " checks/NAME.csv, figures/NAME.txt")
    private @Nullable Path folder;

    @CommandLine.Spec(CommandLine.Spec.Target.MIXEE)
    private CommandLine.Model.CommandSpec spec;

    /** The desk with the methods of the house, where a folder is named. */
    Desk desk() {
        return new Desk(folder);
    }

    /** The option again, for an example of the next command. */
    String asTyped() {
        return folder == null ? "" : " --house " + inShell(folder);
    }

    /** A path as it can be typed in a shell: in quotation marks where it holds a blank. */
    static String inShell(Path path) {
        String text = path.toString();
        return text.chars().anyMatch(Character::isWhitespace) ? "\"" + text + "\"" : text;
    }

    /** Tells what is wrong in the folder and does not hinder the methods that are used. */
    void tellRemarks(Desk desk, Collection<String> used) {
        desk.remarks(used).forEach(remark -> spec.commandLine().getErr().println("remark: " + remark));
    }

    /** Behind the title of a method in a list: whose it is, and whether it can be used. */
    String mark(Desk desk, String method) {
        HouseLibrary house = desk.house();
        return house == null || house.house("methods/" + method + ".txt").isEmpty()
                ? ""
                : " (house method, folder " + house.name() + ")";
    }

    /** Why a method is not known that the user expects to be. */
    String hint(Desk desk, String method) {
        HouseLibrary house = desk.house();
        if (house == null) {
            return "; a method of the house's own is read where its folder is named: --house FOLDER";
        }
        String path = "methods/" + method + ".txt";
        return house.house(path).isEmpty()
                ? "; the house has no " + house.shown(path)
                : "; " + house.shown(path) + " does not start with the statement \"method\"";
    }
}
