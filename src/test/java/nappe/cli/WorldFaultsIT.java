package nappe.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import nappe.Tools;
import nappe.input.SampleStations;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What goes wrong around the packed program: what stood before stays whole, and the message says what to do. */
class WorldFaultsIT {
    private static final String NAME = "LF-W-004_rev-0";

    @TempDir
    Path folder;

    private Jar jar;

    @BeforeEach
    void jar() throws IOException {
        jar = Jar.in(folder);
    }

    private Path input(String subject, String status) throws IOException {
        return SampleStations.weir()
                .project("Subject", subject)
                .project("Status", status)
                .save(folder.resolve(subject + ".xlsx"));
    }

    /** A small package in the place of the one to be written, as an earlier run would have left it. */
    private Path earlier(Path parent) throws IOException {
        Path made = Files.createDirectories(parent.resolve(NAME));
        Files.writeString(made.resolve("old.pdf"), "of before");
        Files.writeString(
                made.resolve("contents.txt"),
                "calculation: LF-W-004\nrevision: 0\nstatus: preliminary\nsha256 "
                        + Contents.hash("of before".getBytes()) + "  old.pdf\n");
        assertThat(Contents.of(made).isWhole(made)).isTrue();
        return made;
    }

    private static boolean isOld(Path made) {
        return Files.exists(made.resolve("old.pdf"));
    }

    private List<String> names(Path parent) throws IOException {
        try (Stream<Path> all = Files.list(parent)) {
            return all.map(file -> file.getFileName().toString()).sorted().toList();
        }
    }

    private void assertWhole(Path parent) throws IOException {
        assertThat(names(parent)).containsExactly(NAME);
        Path made = parent.resolve(NAME);
        assertThat(names(made)).containsExactly(NAME + ".pdf", NAME + ".xlsx", NAME + "_W1-rating.csv", "contents.txt");
        assertThat(Contents.of(made).isWhole(made)).isTrue();
    }

    @Test
    void killedWhileWritingItLeavesThePackageWhole() throws Exception {
        Path out = folder.resolve("out");
        Path made = earlier(out);
        Path input = input("new", "preliminary");
        Path fresh = out.resolve("." + NAME + ".new");
        for (Path sign : List.of(out.resolve(FolderLock.FILE), fresh, fresh.resolve(NAME + ".xlsx"))) {
            if (!isOld(made)) {
                break;
            }
            Jar.Started run = jar.start("issue", input, "-o", out);
            // The lock is also taken for a moment before anything is computed; the rest of the signs come at the end.
            while (run.process().isAlive() && !Files.exists(sign)) {
                Thread.sleep(1);
            }
            run.process().destroyForcibly().waitFor();
            Path there = Files.exists(made) ? made : out.resolve("." + NAME + ".old");
            assertThat(Contents.of(there).isWhole(there)).as(sign.toString()).isTrue();
        }
        Jar.Said said = jar.run("issue", input, "-o", out);
        assertThat(said.status()).as(said.err()).isZero();
        assertWhole(out);
    }

    @Test
    void aFileThatCannotBeWrittenToItsEndLeavesThePackageOfBefore() throws IOException {
        Tools.require("bash", "bash");
        Path out = folder.resolve("out");
        earlier(out);
        Map<String, String> before = Jar.listing(folder);
        Path input = input("new", "preliminary");
        // A limit on the size of a file is what a full disk is to the program: writing fails in the middle.
        Jar limited = jar.after("bash", "-c", "ulimit -f 20; exec \"$@\"", "bash");
        Jar.Said said = limited.run("issue", input, "-o", out);
        Files.delete(input);
        assertThat(said.status()).isEqualTo(ExitStatus.INTERNAL_FAULT);
        assertThat(said.err())
                .contains(out.resolve(NAME) + " could not be written", "Nothing was changed.", "(fault: file)")
                .doesNotContain("\tat ", "Exception");
        assertThat(Jar.listing(folder)).isEqualTo(before);
        Jar.Said blank = limited.run("blank", "W1=rectangular-weir", "-o", "station.xlsx");
        assertThat(blank.status()).isEqualTo(ExitStatus.INTERNAL_FAULT);
        assertThat(blank.err()).contains("station.xlsx could not be written", "Nothing was changed.");
        assertThat(Jar.listing(folder)).isEqualTo(before);
    }

    @Test
    void aFullDiskLeavesThePackageOfBefore() throws IOException {
        Path disk = Files.createDirectory(folder.resolve("disk"));
        mount(disk, "size=64k");
        try {
            earlier(disk);
            Map<String, String> before = Jar.listing(disk);
            Jar.Said said = jar.run("issue", input("new", "preliminary"), "-o", disk);
            assertThat(said.status()).isEqualTo(ExitStatus.INTERNAL_FAULT);
            assertThat(said.err())
                    .contains("could not be written: the system says \"", "Make room", "(fault: file)")
                    .doesNotContain("\tat ", "Exception");
            assertThat(Jar.listing(disk)).isEqualTo(before);
        } finally {
            Tools.run("umount", disk.toString());
        }
    }

    /** A small disk of its own, where the user may mount one. */
    private static void mount(Path disk, String options) {
        try {
            Tools.run("mount", "-t", "tmpfs", "-o", options, "tmpfs", disk.toString());
        } catch (IOException e) {
            System.err.println(
                    "NOT PROVEN: a full disk, because no disk may be mounted here; the limit on a file stands for it");
            Assumptions.abort("no disk may be mounted");
        }
    }

    @Test
    void aFolderWithoutTheRightToWriteIsToldBeforeAnythingIsComputed() throws IOException {
        Path work = Files.createDirectory(folder.resolve("work"));
        earlier(work);
        Path sound = input("new", "preliminary");
        Path faulty = SampleStations.weir().set("Flows", "D9", "4,0").save(folder.resolve("faulty.xlsx"));
        Jar nobody = withoutRights(work);
        Map<String, String> before = Jar.listing(work);
        Jar.Said issue = nobody.run("issue", sound, "-o", work);
        assertThat(issue.status()).isEqualTo(ExitStatus.INTERNAL_FAULT);
        assertThat(issue.err())
                .contains("there is no right to write in the folder " + work, "name another folder with -o");
        Jar.Said blank = nobody.run("blank", "W1=rectangular-weir", "-o", work.resolve("station.xlsx"));
        assertThat(blank.status()).isEqualTo(ExitStatus.INTERNAL_FAULT);
        assertThat(blank.err()).contains("station.xlsx could not be written: there is no right to write there");
        Jar.Said marked = nobody.run("inspect", faulty, "--marked", work.resolve("copy.xlsx"));
        assertThat(marked.status()).isEqualTo(ExitStatus.INPUT_REFUSED);
        assertThat(marked.err())
                .contains(
                        "no marked copy was written: " + work.resolve("copy.xlsx") + " could not be written",
                        "write 4.0",
                        "1 fault;");
        for (Jar.Said said : List.of(issue, blank, marked)) {
            assertThat(said.err()).doesNotContain("\tat ", "Exception");
        }
        assertThat(Jar.listing(work)).isEqualTo(before);
    }

    /** The program run by a user who may read all and write nothing; the root of the system may always write. */
    private Jar withoutRights(Path work) throws IOException {
        for (Path one : List.of(folder, folder.resolve("tmp"))) {
            Files.setPosixFilePermissions(one, PosixFilePermissions.fromString("rwxr-xr-x"));
        }
        Files.setPosixFilePermissions(work, PosixFilePermissions.fromString("r-xr-xr-x"));
        Jar copied = jar.copiedTo(folder.resolve("nappe.jar"));
        if (!System.getProperty("user.name").equals("root")) {
            return copied;
        }
        Tools.require("setpriv", "setpriv of util-linux");
        return copied.after("setpriv", "--reuid=65534", "--regid=65534", "--clear-groups");
    }

    @Test
    void twoRunsAtOnceLeaveOneWholePackage() throws IOException {
        Path out = folder.resolve("out");
        Path input = input("new", "preliminary");
        Jar.Started one = jar.start("issue", input, "-o", out);
        Jar.Started two = jar.start("issue", input, "-o", out);
        assertThat(List.of(one.said().status(), two.said().status())).containsOnly(0);
        assertWhole(out);
    }

    @Test
    void ofTwoRunsAtOnceThatIssueOneDoesAndTheOtherSaysSo() throws IOException {
        Path out = folder.resolve("out");
        Path input = input("final", "issued");
        Jar.Started one = jar.start("issue", input, "-o", out);
        Jar.Started two = jar.start("issue", input, "-o", out);
        List<Jar.Said> said = List.of(one.said(), two.said());
        assertThat(said).extracting(Jar.Said::status).containsExactlyInAnyOrder(0, ExitStatus.WOULD_OVERWRITE);
        assertThat(said.get(0).err() + said.get(1).err()).contains("holds an issued revision");
        assertWhole(out);
    }

    @Test
    void aNameThatTheLanguageOfTheShellHasNoLettersForIsTold() throws IOException {
        Path input = SampleStations.weir().save(folder.resolve("Зуб.xlsx"));
        Jar.Said said = jar.inLanguage("C").run("inspect", input);
        assertThat(said.status()).isEqualTo(ExitStatus.WRONG_USAGE);
        assertThat(said.err())
                .contains("set one that has, such as LC_ALL=C.UTF-8")
                .doesNotContain("Exception", "java.");
    }
}
