package hemline.casefile.store;

import java.io.Closeable;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.Stream;

/** The file system of this machine. */
public final class DiskFiles implements CaseFiles {
    /**
     * Lock files held by this process. On POSIX systems closing any channel on a file drops every lock the process
     * has on it, so a second opener in the same process must not even open the lock file.
     */
    private static final Set<Path> HELD_HERE = ConcurrentHashMap.newKeySet();
    private static final boolean FOLDERS_CAN_BE_FORCED =
            !System.getProperty("os.name").toLowerCase(Locale.ROOT).contains("windows");

    @Override
    public boolean exists(Path file) {
        return Files.exists(file);
    }

    @Override
    public long size(Path file) throws IOException {
        return Files.size(file);
    }

    @Override
    public byte[] read(Path file) throws IOException {
        return Files.readAllBytes(file);
    }

    @Override
    public List<String> list(Path folder) throws IOException {
        if (!Files.isDirectory(folder)) {
            return List.of();
        }
        try (Stream<Path> names = Files.list(folder)) {
            return names.map(path -> path.getFileName().toString()).sorted().toList();
        }
    }

    @Override
    public void createFolders(Path folder) throws IOException {
        Files.createDirectories(folder);
    }

    @Override
    public void write(Path file, byte[] bytes) throws IOException {
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.CREATE, StandardOpenOption.WRITE,
                StandardOpenOption.TRUNCATE_EXISTING)) {
            writeAll(channel, bytes);
            channel.force(true);
        }
    }

    @Override
    public void moveOver(Path from, Path to) throws IOException {
        Files.move(from, to, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    }

    @Override
    public void delete(Path file) throws IOException {
        Files.deleteIfExists(file);
    }

    @Override
    public void forceFolder(Path folder) throws IOException {
        // Windows has no such call; there the rename itself is made durable by the journal.
        if (FOLDERS_CAN_BE_FORCED) {
            try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
                channel.force(true);
            }
        }
    }

    @Override
    public Appending append(Path file) throws IOException {
        FileChannel channel = FileChannel.open(file, StandardOpenOption.CREATE, StandardOpenOption.WRITE);
        channel.position(channel.size());
        return new DiskAppending(channel);
    }

    @Override
    public Optional<Closeable> hold(Path lockFile) throws IOException {
        Path key = lockFile.toAbsolutePath().getParent().toRealPath().resolve(lockFile.getFileName());
        if (!HELD_HERE.add(key)) {
            return Optional.empty();
        }
        FileChannel channel = null;
        FileLock lock = null;
        try {
            channel = FileChannel.open(lockFile, StandardOpenOption.CREATE, StandardOpenOption.WRITE);
            lock = channel.tryLock();
        } catch (OverlappingFileLockException e) {
            // Held through another class loader of this process: the same as held elsewhere.
            lock = null;
        } finally {
            if (lock == null) {
                HELD_HERE.remove(key);
                if (channel != null) {
                    channel.close();
                }
            }
        }
        FileChannel held = channel;
        return lock == null ? Optional.empty() : Optional.of(() -> {
            held.close();
            HELD_HERE.remove(key);
        });
    }

    private static void writeAll(FileChannel channel, byte[] bytes) throws IOException {
        ByteBuffer buffer = ByteBuffer.wrap(bytes);
        while (buffer.hasRemaining()) {
            channel.write(buffer);
        }
    }

    private record DiskAppending(FileChannel channel) implements Appending {
        @Override
        public void append(byte[] bytes) throws IOException {
            writeAll(channel, bytes);
            channel.force(false);
        }

        @Override
        public void truncate(long length) throws IOException {
            channel.truncate(length);
            channel.position(length);
            channel.force(true);
        }

        @Override
        public long length() throws IOException {
            return channel.size();
        }

        @Override
        public void close() throws IOException {
            channel.close();
        }
    }
}
