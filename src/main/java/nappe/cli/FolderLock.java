package nappe.cli;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.BasicFileAttributes;
import java.nio.file.attribute.PosixFilePermissions;
import java.time.Duration;
import org.jspecify.annotations.Nullable;

/**
 * Lets one run at a time write into a folder. The system takes the lock back however the run ends, so that whoever holds it
 * knows that nobody else is at work there.
 */
final class FolderLock {
    static final String FILE = ".nappe.lock";
    private static final long PAUSE_MILLIS = 20;

    private final Path file;
    private final FileChannel channel;

    private FolderLock(Path file, FileChannel channel) {
        this.file = file;
        this.channel = channel;
    }

    /** What is done while the lock is held. */
    interface Work {
        void run() throws IOException;
    }

    /**
     * Waits for the lock, works, and gives it back.
     *
     * @throws Refusal where another run has not ended after that time
     */
    static void hold(Path folder, Duration patience, Work work) throws IOException {
        FolderLock lock = take(folder, patience);
        try {
            work.run();
        } finally {
            lock.giveBack();
        }
    }

    private static FolderLock take(Path folder, Duration patience) throws IOException {
        Path file = folder.resolve(FILE);
        long end = System.nanoTime() + patience.toNanos();
        while (true) {
            FolderLock lock = tried(file);
            if (lock != null) {
                return lock;
            }
            if (System.nanoTime() > end) {
                throw new Refusal(
                        ExitStatus.INTERNAL_FAULT,
                        "another run of nappe is writing into " + folder
                                + "; wait until it has ended and run again (fault: at-work)");
            }
            pause();
        }
    }

    /**
     * The file is deleted by whoever held it. So a lock counts only where the file stood there before it was opened and still does:
     * otherwise it is the lock of a file that is gone, and another run may hold the one that is there now.
     */
    private static @Nullable FolderLock tried(Path file) throws IOException {
        create(file);
        Object before = key(file);
        if (before == null) {
            return null;
        }
        FileChannel channel = FileChannel.open(file, StandardOpenOption.CREATE, StandardOpenOption.WRITE);
        boolean held = false;
        try {
            held = locked(channel) != null && before.equals(key(file));
        } finally {
            if (!held) {
                channel.close();
            }
        }
        return held ? new FolderLock(file, channel) : null;
    }

    /** After a killed run a colleague must be able to take it. */
    private static void create(Path file) throws IOException {
        try {
            Files.createFile(file);
            Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("rw-rw-rw-"));
        } catch (FileAlreadyExistsException | NoSuchFileException | UnsupportedOperationException e) {
            // there already, gone again, or on a system without such rights
        }
    }

    private static @Nullable FileLock locked(FileChannel channel) throws IOException {
        try {
            return channel.tryLock();
        } catch (OverlappingFileLockException e) {
            return null;
        }
    }

    /** What tells one file from another of the same name, where the system has such a thing. */
    private static @Nullable Object key(Path file) {
        try {
            Object key = Files.readAttributes(file, BasicFileAttributes.class).fileKey();
            return key == null ? FILE : key;
        } catch (IOException e) {
            return null;
        }
    }

    private static void pause() throws IOException {
        try {
            Thread.sleep(PAUSE_MILLIS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new java.io.InterruptedIOException("interrupted while another run was writing");
        }
    }

    private void giveBack() throws IOException {
        try {
            Files.deleteIfExists(file);
        } finally {
            channel.close();
        }
    }
}
