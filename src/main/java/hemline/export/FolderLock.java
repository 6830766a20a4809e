package hemline.export;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.OverlappingFileLockException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.UUID;

/**
 * An exclusive hold on a folder through a lock file in it. The system lets go of it when the process ends, however
 * it ends, so no stale lock can remain; the file itself goes when the hold is given up.
 */
final class FolderLock implements AutoCloseable {
    private static final String NAME = ".hemline-lock";
    /** The locked byte lies far beyond the content, which can then be read on systems whose locks forbid reading. */
    private static final long LOCKED_BYTE = 1L << 40;

    private final Path file;
    private final FileChannel channel;

    private FolderLock(Path file, FileChannel channel) {
        this.file = file;
        this.channel = channel;
    }

    static FolderLock take(Path folder) throws IOException {
        Path file = folder.resolve(NAME);
        while (true) {
            FileChannel channel = FileChannel.open(file, StandardOpenOption.CREATE, StandardOpenOption.WRITE);
            try {
                if (channel.tryLock(LOCKED_BYTE, 1, false) == null) {
                    throw new FolderInUseException(folder);
                }
                if (standsUnderItsName(file, channel)) {
                    return new FolderLock(file, channel);
                }
                channel.close();
            } catch (OverlappingFileLockException e) {
                channel.close();
                throw new FolderInUseException(folder);
            } catch (IOException e) {
                channel.close();
                throw e;
            }
        }
    }

    /** The holder before us may have removed the file after we opened it; then what we locked is a file of no name. */
    private static boolean standsUnderItsName(Path file, FileChannel channel) throws IOException {
        byte[] mark = UUID.randomUUID().toString().getBytes(StandardCharsets.US_ASCII);
        channel.truncate(0);
        channel.write(ByteBuffer.wrap(mark), 0);
        try {
            return java.util.Arrays.equals(mark, Files.readAllBytes(file));
        } catch (NoSuchFileException e) {
            return false;
        }
    }

    @Override
    public void close() throws IOException {
        try {
            Files.deleteIfExists(file);
        } finally {
            channel.close();
        }
    }
}
