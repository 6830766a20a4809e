package hemline.casefile.store;

import java.io.Closeable;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/** The few things a case asks of a file system; tests put one in its place that fails on demand. */
public interface CaseFiles {
    boolean exists(Path file);

    long size(Path file) throws IOException;

    byte[] read(Path file) throws IOException;

    /** Names in a folder, sorted; empty where there is no folder. */
    List<String> list(Path folder) throws IOException;

    void createFolders(Path folder) throws IOException;

    /** Writes a whole file and forces it to disk; a crash may leave any part of it. */
    void write(Path file, byte[] bytes) throws IOException;

    /** Renames over whatever has the name; after a crash there is the old or the new file, never a mixture. */
    void moveOver(Path from, Path to) throws IOException;

    void delete(Path file) throws IOException;

    /** Forces names in a folder to disk: new files, renames, deletions. */
    void forceFolder(Path folder) throws IOException;

    /** Opens a file for appending; it is made if there is none. */
    Appending append(Path file) throws IOException;

    /** Takes hold of a lock file until closed or until the process ends; empty when another holds it. */
    Optional<Closeable> hold(Path lockFile) throws IOException;

    /** A file open at its end. */
    interface Appending extends Closeable {
        /** Adds bytes at the end and forces them to disk. */
        void append(byte[] bytes) throws IOException;

        /** Cuts the file to a length and forces that to disk. */
        void truncate(long length) throws IOException;

        long length() throws IOException;
    }
}
