package hemline.export;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.channels.Channels;
import java.nio.channels.FileChannel;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;

/**
 * A folder of results held by one run at a time. Results are first written whole into a staging folder inside it,
 * forced to disk, and only {@link #publish} moves them to their names, each in one atomic step; until then, and
 * when anything fails before, what an earlier run left there stays as it was.
 */
public final class ResultFolder implements AutoCloseable {
    private static final String STAGING = ".hemline-staging";

    private final Path folder;
    private final Path staging;
    private final FolderLock lock;
    private final List<String> staged = new ArrayList<>();

    private ResultFolder(Path folder, FolderLock lock) {
        this.folder = folder;
        this.staging = folder.resolve(STAGING);
        this.lock = lock;
    }

    /**
     * Makes the folder where it is missing and takes hold of it.
     *
     * @throws FolderInUseException if another run holds it
     * @throws IOException          if it cannot be made or written to
     */
    public static ResultFolder open(Path folder) throws IOException {
        Files.createDirectories(folder);
        FolderLock lock = FolderLock.take(folder);
        try {
            ResultFolder opened = new ResultFolder(folder, lock);
            // A run that was killed may have left its staging behind; we hold the lock, so nobody else uses it.
            removeTree(opened.staging);
            Files.createDirectory(opened.staging);
            return opened;
        } catch (IOException e) {
            lock.close();
            throw e;
        }
    }

    public Path path() {
        return folder;
    }

    /** Writes one result in full, {@code name} being its path inside the folder with {@code /} between parts. */
    public void stage(String name, Body body) throws IOException {
        Path file = staging.resolve(name);
        Files.createDirectories(file.getParent());
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE);
                OutputStream out = new BufferedOutputStream(Channels.newOutputStream(channel), 1 << 16)) {
            body.writeTo(out);
            out.flush();
            channel.force(true);
        }
        staged.add(name);
    }

    /** The same for a library that writes to a file of its own. */
    void stageFile(String name, FileBody body) throws IOException {
        Path file = staging.resolve(name);
        Files.createDirectories(file.getParent());
        body.writeTo(file);
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.WRITE)) {
            channel.force(true);
        }
        staged.add(name);
    }

    /** The file of a staged result. */
    Path stagedFile(String name) {
        return staging.resolve(name);
    }

    /** Names of all staged results in the order of staging. */
    List<String> staged() {
        return List.copyOf(staged);
    }

    /** Moves all staged results to their names, in the order of staging. */
    public void publish() throws IOException {
        for (String name : staged) {
            Path target = folder.resolve(name);
            Files.createDirectories(target.getParent());
            try {
                Files.move(staging.resolve(name), target, StandardCopyOption.ATOMIC_MOVE);
            } catch (AtomicMoveNotSupportedException e) {
                throw new IOException(target + ": this file system cannot replace a file in one step; choose a folder "
                        + "on a local disk", e);
            }
        }
        staged.clear();
        forceFolder(folder);
    }

    /** Drops what was staged and not published, and lets go of the folder. */
    @Override
    public void close() throws IOException {
        try {
            removeTree(staging);
        } finally {
            lock.close();
        }
    }

    /** Makes renames durable where the system can; one that cannot open folders says so with an exception. */
    private static void forceFolder(Path folder) throws IOException {
        if (System.getProperty("os.name").startsWith("Windows")) {
            return;
        }
        try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
            channel.force(true);
        }
    }

    static void removeTree(Path root) throws IOException {
        if (!Files.exists(root, java.nio.file.LinkOption.NOFOLLOW_LINKS)) {
            return;
        }
        List<Path> all;
        try (Stream<Path> tree = Files.walk(root)) {
            all = tree.sorted(Comparator.reverseOrder()).toList();
        }
        for (Path path : all) {
            Files.delete(path);
        }
    }

    /** Writes the bytes of one result. */
    @FunctionalInterface
    public interface Body {
        void writeTo(OutputStream out) throws IOException;
    }

    /** Writes one result to a file that does not exist yet. */
    @FunctionalInterface
    interface FileBody {
        void writeTo(Path file) throws IOException;
    }
}
