package hemline.reader;

import java.io.BufferedInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.util.ArrayList;
import java.util.List;
import java.util.zip.GZIPInputStream;
import org.apache.commons.compress.compressors.bzip2.BZip2CompressorInputStream;
import org.apache.commons.compress.compressors.z.ZCompressorInputStream;

/**
 * The bytes of a file without the gzip, bzip2 or compress around them. Nothing is written anywhere; unpacked bytes
 * are streamed, or held in memory up to a bound.
 */
final class Content {
    private static final int MAX_WRAPPERS = 2;
    private static final int BUFFER = 1 << 16;
    /** Compress tables over 16 bits do not exist; kilobytes. */
    private static final int COMPRESS_MEMORY_KB = 1 << 14;

    private final InputFile file;
    private final List<ContentKind> wrappers;
    private final ContentKind kind;
    private final long fileBytes;

    private Content(InputFile file, List<ContentKind> wrappers, ContentKind kind, long fileBytes) {
        this.file = file;
        this.wrappers = wrappers;
        this.kind = kind;
        this.fileBytes = fileBytes;
    }

    static Content of(InputFile file) throws UnreadableFileException {
        try {
            if (!Files.isRegularFile(file.path())) {
                throw file.fault("", Files.exists(file.path()) ? "is not a file" : "does not exist", "check the path");
            }
            long size = Files.size(file.path());
            if (size > Limits.MAX_FILE_BYTES) {
                throw file.fault("", "has " + size + " bytes, at most " + Limits.MAX_FILE_BYTES + " are read",
                        "split the file");
            }
            List<ContentKind> wrappers = new ArrayList<>();
            while (true) {
                ContentKind kind = ContentKind.of(head(file, wrappers));
                if (!kind.isWrapper()) {
                    return new Content(file, List.copyOf(wrappers), kind, size);
                }
                if (wrappers.size() == MAX_WRAPPERS) {
                    throw file.fault("", "is packed more than " + MAX_WRAPPERS + " times", "unpack it first");
                }
                wrappers.add(kind);
            }
        } catch (NoSuchFileException e) {
            throw file.fault("", "does not exist", "check the path");
        } catch (AccessDeniedException e) {
            throw file.fault("", "may not be read", "change its permissions");
        } catch (IOException e) {
            throw new UnreadableFileException(file.path(), "", "cannot be read (" + e.getMessage() + ")",
                    "check the file and its disk", e);
        }
    }

    private static byte[] head(InputFile file, List<ContentKind> wrappers) throws IOException {
        try (InputStream in = unwrapped(file, wrappers)) {
            return in.readNBytes(ContentKind.HEAD_BYTES);
        } catch (IOException e) {
            if (wrappers.isEmpty()) {
                throw e;
            }
            throw new IOException("its " + wrappers.get(wrappers.size() - 1) + " packing is damaged: "
                    + e.getMessage(), e);
        } catch (RuntimeException e) {
            throw new IOException("its packing is damaged", e);
        }
    }

    private static InputStream unwrapped(InputFile file, List<ContentKind> wrappers) throws IOException {
        InputStream in = new BufferedInputStream(Files.newInputStream(file.path()), BUFFER);
        try {
            for (ContentKind wrapper : wrappers) {
                in = switch (wrapper) {
                    case GZIP -> new GZIPInputStream(in, BUFFER);
                    case BZIP2 -> new BZip2CompressorInputStream(in, true);
                    default -> new ZCompressorInputStream(in, COMPRESS_MEMORY_KB);
                };
            }
            return in;
        } catch (IOException | RuntimeException e) {
            in.close();
            throw e;
        }
    }

    ContentKind kind() {
        return kind;
    }

    /** "gzip" and the like, for the words that describe a format; empty when not packed. */
    List<ContentKind> wrappers() {
        return wrappers;
    }

    /** A fresh stream of the unpacked bytes. */
    InputStream stream() throws IOException {
        return wrappers.isEmpty() ? new BufferedInputStream(Files.newInputStream(file.path()), BUFFER)
                : new BufferedInputStream(unwrapped(file, wrappers), BUFFER);
    }

    /** All unpacked bytes, refused beyond a third of the heap. */
    byte[] bytes() throws UnreadableFileException {
        long most = Math.min(Limits.MAX_FILE_BYTES, Runtime.getRuntime().maxMemory() / 3);
        if (fileBytes > most) {
            throw tooLarge(most);
        }
        return file.shield("", () -> {
            if (wrappers.isEmpty()) {
                return Files.readAllBytes(file.path());
            }
            try (InputStream in = stream()) {
                byte[] all = in.readNBytes((int) most);
                if (in.read() >= 0) {
                    throw tooLarge(most);
                }
                return all;
            }
        });
    }

    /** All unpacked bytes as a buffer; large plain files are mapped rather than loaded. */
    ByteBuffer buffer() throws UnreadableFileException {
        if (!wrappers.isEmpty() || fileBytes <= Limits.MAX_LOADED_BYTES) {
            return ByteBuffer.wrap(bytes());
        }
        return file.shield("", () -> {
            try (var channel = java.nio.channels.FileChannel.open(file.path())) {
                return channel.map(java.nio.channels.FileChannel.MapMode.READ_ONLY, 0, channel.size());
            }
        });
    }

    private UnreadableFileException tooLarge(long most) {
        return file.fault("", "needs more than " + (most >> 20) + " MB unpacked",
                "give the program more memory (-Xmx) or split the file");
    }
}
