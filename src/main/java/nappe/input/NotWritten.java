package nappe.input;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.nio.file.NotDirectoryException;
import java.nio.file.Path;

/** Something that could not be written; the message says why and what to do. */
public final class NotWritten extends IOException {
    private static final long serialVersionUID = 1L;

    /**
     * @param path what was to be written, as the user knows it
     * @param cause what the system said
     */
    public NotWritten(Path path, IOException cause) {
        super(path + " could not be written: " + why(cause) + " Nothing was changed.", cause);
    }

    private static String why(IOException cause) {
        if (cause instanceof AccessDeniedException) {
            return "there is no right to write there, or the file is open in another program. Close it, get the right,"
                    + " or name another place.";
        }
        if (cause instanceof NoSuchFileException) {
            return "the folder it would go into is not there. Make it first, or name another.";
        }
        if (cause instanceof FileAlreadyExistsException || cause instanceof NotDirectoryException) {
            return "a file of that name is in the way. Name another place.";
        }
        String said = cause instanceof FileSystemException system && system.getReason() != null
                ? system.getReason()
                : String.valueOf(cause.getMessage());
        return "the system says \"" + said + "\". Make room and give the right to write there, or name another place.";
    }
}
