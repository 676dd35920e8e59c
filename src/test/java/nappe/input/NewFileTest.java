package nappe.input;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A single file stands whole or not at all, and takes the place of none. */
class NewFileTest {
    @TempDir
    Path folder;

    private final ExecutorService runs = Executors.newFixedThreadPool(6);

    @AfterEach
    void end() {
        runs.shutdownNow();
    }

    private List<Path> all() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.toList();
        }
    }

    @Test
    void aFileThatIsThereStays() throws IOException {
        Path file = Files.writeString(folder.resolve("a.xlsx"), "mine");
        assertThatThrownBy(() -> NewFile.write(file, new byte[9])).isInstanceOf(FileAlreadyExistsException.class);
        assertThat(file).hasContent("mine");
        assertThat(all()).containsExactly(file);
    }

    @Test
    void whatAKilledRunLeftIsUsedAnew() throws IOException {
        Path file = folder.resolve("a.xlsx");
        Path left = folder.resolve(".nappe-" + Integer.toHexString("a.xlsx".hashCode()) + ".new");
        Files.writeString(left, "half of a longer file");
        NewFile.write(file, "whole".getBytes());
        assertThat(all()).containsExactly(file);
        assertThat(file).hasContent("whole");
    }

    @Test
    void theFileOfARunAtWorkIsNotTouched() throws IOException {
        Path file = folder.resolve("a.xlsx");
        Path left = folder.resolve(".nappe-" + Integer.toHexString("a.xlsx".hashCode()) + ".new");
        try (FileChannel other = FileChannel.open(Files.writeString(left, "at work"), StandardOpenOption.WRITE)) {
            other.lock();
            assertThatThrownBy(() -> NewFile.write(file, "whole".getBytes()))
                    .isInstanceOf(NotWritten.class)
                    .hasMessageContaining("another run of nappe is writing it");
        }
        assertThat(left).hasContent("at work");
        assertThat(file).doesNotExist();
    }

    @Test
    void ofManyAtOnceOneWritesWhole() throws Exception {
        for (int round = 0; round < 30; round++) {
            Path file = folder.resolve(round + ".xlsx");
            List<Future<?>> tries = new ArrayList<>();
            for (int i = 0; i < 6; i++) {
                byte[] bytes = ("run " + i).repeat(20_000).getBytes();
                tries.add(runs.submit(() -> {
                    NewFile.write(file, bytes);
                    return null;
                }));
            }
            int written = 0;
            for (Future<?> one : tries) {
                try {
                    one.get();
                    written++;
                } catch (ExecutionException e) {
                    assertThat(e.getCause()).isInstanceOf(IOException.class);
                }
            }
            assertThat(written).isEqualTo(1);
            assertThat(Files.size(file)).isEqualTo(100_000);
        }
        assertThat(all()).hasSize(30);
    }

    @Test
    void aFolderThatIsNotThereIsTold() {
        Path file = folder.resolve("no/such/a.xlsx");
        assertThatThrownBy(() -> NewFile.write(file, new byte[3]))
                .isInstanceOf(NotWritten.class)
                .hasMessage(file + " could not be written: the folder it would go into is not there. Make it first, or"
                        + " name another. Nothing was changed.");
    }

    @Test
    void aNameOfTheGreatestLengthIsWritten() throws IOException {
        Path file = folder.resolve("x".repeat(250) + ".xlsx");
        NewFile.write(file, new byte[3]);
        assertThat(all()).containsExactly(file);
    }
}
