package nappe.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.io.InputStream;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.Duration;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.stream.Stream;
import nappe.input.NotWritten;
import nappe.results.Furniture;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** A package stands whole or not at all, and takes the place of nothing that anybody could miss. */
class PackageFolderTest {
    @TempDir
    Path out;

    private final ExecutorService runs = Executors.newFixedThreadPool(6);

    @AfterEach
    void end() {
        runs.shutdownNow();
    }

    private static Furniture furniture(String number, String revision, String status) {
        return new Furniture(
                "Invented works",
                "",
                "",
                number,
                "Flume",
                revision,
                LocalDate.of(2030, 1, 31),
                status,
                "0000 0000",
                "0.0.0",
                true,
                List.of(),
                "");
    }

    private static Map<String, byte[]> files(String text) {
        return Map.of(
                "a.pdf",
                text.getBytes(StandardCharsets.UTF_8),
                "b.csv",
                (text + text).getBytes(StandardCharsets.UTF_8));
    }

    private void write(String text, String status) throws IOException {
        write("C-1", text, status);
    }

    private void write(String number, String text, String status) throws IOException {
        PackageFolder folder = PackageFolder.of(out, number, "A");
        folder.prepare();
        folder.write(files(text), furniture(number, "A", status));
    }

    private Path made() {
        return out.resolve("C-1_rev-A");
    }

    private List<String> names(Path folder) throws IOException {
        try (Stream<Path> all = Files.list(folder)) {
            return all.map(file -> file.getFileName().toString()).sorted().toList();
        }
    }

    private void assertWhole(String text) throws IOException {
        assertThat(names(out)).containsExactly("C-1_rev-A");
        assertThat(names(made())).containsExactly("a.pdf", "b.csv", "contents.txt");
        assertThat(made().resolve("a.pdf")).hasContent(text);
        assertThat(Contents.of(made()).isWhole(made())).isTrue();
    }

    @Test
    void nothingIsLeftBesideThePackage() throws IOException {
        write("first", "preliminary");
        write("second", "preliminary");
        assertWhole("second");
    }

    @Test
    void whatAKilledRunLeftIsCleared() throws IOException {
        write("first", "preliminary");
        Files.createFile(out.resolve(FolderLock.FILE));
        Files.writeString(Files.createDirectory(out.resolve(".C-1_rev-A.new")).resolve("a.pdf"), "ha");
        write("second", "preliminary");
        assertWhole("second");
    }

    @Test
    void aRunKilledBetweenTheTwoMovesLosesNothing() throws IOException {
        write("first", "preliminary");
        Files.move(made(), out.resolve(".C-1_rev-A.old"));
        PackageFolder.of(out, "C-1", "A").prepare();
        assertWhole("first");
    }

    @Test
    void aRunKilledWhileClearingTheOldPackageKeepsTheNewOne() throws IOException {
        write("first", "preliminary");
        Files.writeString(Files.createDirectory(out.resolve(".C-1_rev-A.old")).resolve("b.csv"), "ha");
        PackageFolder.of(out, "C-1", "A").prepare();
        assertWhole("first");
        Files.writeString(Files.createDirectory(out.resolve(".C-1_rev-B.old")).resolve("b.csv"), "ha");
        PackageFolder.of(out, "C-1", "B").prepare();
        assertWhole("first");
    }

    @Test
    void whatLooksLikeTheRestOfAnotherCalculationStays() throws IOException {
        Path other = Files.createDirectory(out.resolve(".C-1_rev-A.new.new"));
        Path third = Files.createDirectory(out.resolve(".C-1_rev-A2.old"));
        write("first", "preliminary");
        assertThat(other).exists();
        assertThat(third).exists();
    }

    @Test
    void theFilesOfARunAtWorkAreNotTouched() throws IOException {
        Path fresh = Files.createDirectory(out.resolve(".C-1_rev-A.new"));
        Files.writeString(fresh.resolve("a.pdf"), "at work");
        FolderLock.hold(
                out,
                Duration.ZERO,
                () -> assertThatThrownBy(() -> FolderLock.hold(out, Duration.ofMillis(50), () -> {
                            throw new AssertionError("two at once");
                        }))
                        .isInstanceOf(Refusal.class)
                        .hasMessage("another run of nappe is writing into " + out
                                + "; wait until it has ended and run again (fault: at-work)"));
        assertThat(fresh.resolve("a.pdf")).hasContent("at work");
        assertThat(names(out)).containsExactly(".C-1_rev-A.new");
    }

    @Test
    void aLockThatNobodyHoldsIsTaken() throws IOException {
        Path left = Files.createFile(out.resolve(FolderLock.FILE));
        write("first", "preliminary");
        assertWhole("first");
        assertThat(left).doesNotExist();
    }

    @Test
    void manyAtOnceLeaveOneWholePackage() throws Exception {
        List<Future<?>> all = new ArrayList<>();
        for (int i = 0; i < 60; i++) {
            String text = "run " + i;
            all.add(runs.submit(() -> {
                write(text, "preliminary");
                return null;
            }));
        }
        for (Future<?> one : all) {
            one.get();
        }
        assertWhole(Files.readString(made().resolve("a.pdf")));
    }

    @Test
    void ofManyAtOnceThatIssueOneDoes() throws Exception {
        List<Future<?>> all = new ArrayList<>();
        for (int i = 0; i < 12; i++) {
            String text = "run " + i;
            all.add(runs.submit(() -> {
                write(text, "issued");
                return null;
            }));
        }
        int done = 0;
        for (Future<?> one : all) {
            try {
                one.get();
                done++;
            } catch (ExecutionException e) {
                assertThat(e.getCause()).isInstanceOf(Refusal.class).hasMessageContaining("holds an issued revision");
            }
        }
        assertThat(done).isEqualTo(1);
        assertWhole(Files.readString(made().resolve("a.pdf")));
    }

    private Refusal refused() throws IOException {
        List<String> before = names(made());
        Refusal refusal = catchThrowableOfType(Refusal.class, () -> write("second", "preliminary"));
        assertThat(refusal).isNotNull();
        assertThat(refusal.status()).isEqualTo(ExitStatus.WOULD_OVERWRITE);
        assertThat(names(made())).isEqualTo(before);
        assertThat(names(out)).containsExactly("C-1_rev-A");
        return refusal;
    }

    @Test
    void aFileThatSomebodyPutIntoThePackageIsNotLost() throws IOException {
        write("first", "preliminary");
        Path notes = Files.writeString(made().resolve("notes.txt"), "mine");
        assertThat(refused())
                .hasMessage(made() + " holds notes.txt, which nappe did not write. Move it away and run again"
                        + " (fault: would-overwrite)");
        assertThat(notes).hasContent("mine");
    }

    @Test
    void aFileThatSomebodyChangedIsNotLost() throws IOException {
        write("first", "preliminary");
        Files.writeString(made().resolve("a.pdf"), "first, with marks of the checker");
        assertThat(refused()).hasMessageContaining("holds the file a.pdf, which was changed since nappe wrote it");
        Files.delete(made().resolve("a.pdf"));
        write("second", "preliminary");
        assertWhole("second");
    }

    @ParameterizedTest
    @ValueSource(strings = {".~lock.b.xlsx#", "~$b.xlsx"})
    void aFileThatIsOpenInAnotherProgramIsTold(String sign) throws IOException {
        write("first", "preliminary");
        Files.createFile(made().resolve(sign));
        assertThat(refused()).hasMessageContaining("is open in another program. Close it and run again");
    }

    @Test
    void whatTheSystemLeavesInAFolderDoesNotHinder() throws IOException {
        write("first", "preliminary");
        Files.createFile(made().resolve(".DS_Store"));
        Files.createFile(made().resolve("Thumbs.db"));
        write("second", "preliminary");
        assertWhole("second");
    }

    @Test
    void aReaderKeepsTheOldFileThatItHasOpen() throws IOException {
        write("first", "preliminary");
        try (InputStream open = Files.newInputStream(made().resolve("a.pdf"))) {
            write("second", "preliminary");
            assertThat(open.readAllBytes()).asString().isEqualTo("first");
        }
    }

    @Test
    void anotherCalculationOfTheSameFolderNameIsNotWrittenOver() throws IOException {
        write("C/1", "first", "preliminary");
        assertThatThrownBy(() -> write("C 1", "second", "preliminary"))
                .isInstanceOf(Refusal.class)
                .hasMessageContaining("holds another calculation: number C/1, revision A.");
        assertWhole("first");
    }

    @Test
    void aFileWhereAFolderShouldBeIsToldBeforeAnythingIsComputed() throws IOException {
        Path file = Files.writeString(out.resolve("there"), "mine");
        for (Path parent : List.of(file, file.resolve("deeper/still"))) {
            Refusal refusal = catchThrowableOfType(
                    Refusal.class, () -> PackageFolder.of(parent, "C-1", "A").prepare());
            assertThat(refusal)
                    .hasMessage(file.toAbsolutePath()
                            + " is a file, not a folder; name a folder with -o (fault: folder-expected)");
            assertThat(refusal.status()).isEqualTo(ExitStatus.WRONG_USAGE);
        }
        assertThat(file).hasContent("mine");
    }

    @Test
    void aFolderNameThatIsTooLongIsTold() {
        Path parent = out.resolve("x".repeat(300));
        assertThatThrownBy(
                        () -> PackageFolder.of(parent, "C-1", "A").write(files("x"), furniture("C-1", "A", "issued")))
                .isInstanceOf(NotWritten.class)
                .hasMessageContaining("could not be written")
                .hasMessageContaining("name another place. Nothing was changed.");
        assertThat(out).isEmptyDirectory();
    }

    @Test
    void whatCannotBeWrittenLeavesTheOldPackageAndNothingBeside() throws IOException {
        write("first", "preliminary");
        Map<String, byte[]> files = Map.of("a.pdf", new byte[3], "no/such/folder.csv", new byte[3]);
        assertThatThrownBy(() -> PackageFolder.of(out, "C-1", "A").write(files, furniture("C-1", "A", "preliminary")))
                .isInstanceOf(NotWritten.class);
        assertWhole("first");
    }

    @ParameterizedTest
    @CsvSource({
        "C/001 b,        C-001-b_rev-A",
        "..,             0_rev-A",
        "../../etc,      etc_rev-A",
        "'C:\\x',        C-x_rev-A",
        "CON,            CON_rev-A",
        "con.5,          con-5_rev-A",
        "Lpt1.a.b,       Lpt1-a.b_rev-A",
        ".hidden,        hidden_rev-A",
        "水路-12,         12_rev-A",
        "a*?\"<>|b,      a-b_rev-A"
    })
    void anyNumberGivesAFolderInItsPlace(String number, String name) throws IOException {
        write(number, "first", "preliminary");
        assertThat(names(out)).containsExactly(name);
    }

    @Test
    void whoeverMayReadTheFolderMayTakeALockThatWasLeft() throws IOException {
        FolderLock.hold(out, Duration.ZERO, () -> {
            try (FileChannel other = FileChannel.open(out.resolve(FolderLock.FILE), StandardOpenOption.WRITE)) {
                assertThat(other.isOpen()).isTrue();
            }
            assertThat(Files.getPosixFilePermissions(out.resolve(FolderLock.FILE)))
                    .hasSize(6);
        });
    }
}
