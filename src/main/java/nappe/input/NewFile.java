package nappe.input;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import org.jspecify.annotations.Nullable;

/** Writes a file that stands whole or not at all, and never in place of another. */
final class NewFile {
    private NewFile() {}

    /**
     * Writes beside the place and moves there. What a killed run left beside it is used anew; of two runs at once, one writes.
     *
     * @throws FileAlreadyExistsException where there is a file
     * @throws NotWritten with what hinders it
     */
    static void write(Path path, byte[] bytes) throws IOException {
        Path fresh = path.resolveSibling(".nappe-"
                + Integer.toHexString(String.valueOf(path.getFileName()).hashCode()) + ".new");
        refuseExisting(path);
        try (FileChannel channel = FileChannel.open(fresh, StandardOpenOption.CREATE, StandardOpenOption.WRITE)) {
            if (locked(channel) == null) {
                throw new FileSystemException(path.toString(), null, "another run of nappe is writing it");
            }
            try {
                // Once more: what was just opened may be the file of a run that has moved it to its place since.
                refuseExisting(path);
                fill(channel, bytes);
                Files.move(fresh, path);
            } catch (IOException e) {
                Files.deleteIfExists(fresh);
                throw e;
            }
        } catch (FileAlreadyExistsException e) {
            throw e;
        } catch (IOException e) {
            throw new NotWritten(path, e);
        }
    }

    private static void refuseExisting(Path path) throws FileAlreadyExistsException {
        if (Files.exists(path)) {
            throw new FileAlreadyExistsException(path.toString());
        }
    }

    private static void fill(FileChannel channel, byte[] bytes) throws IOException {
        channel.truncate(0);
        ByteBuffer rest = ByteBuffer.wrap(bytes);
        while (rest.hasRemaining()) {
            channel.write(rest);
        }
    }

    private static @Nullable FileLock locked(FileChannel channel) throws IOException {
        try {
            return channel.tryLock();
        } catch (OverlappingFileLockException e) {
            return null;
        }
    }
}
