package hemline.casefile.store;

import java.util.regex.Pattern;

/**
 * A file that the result was made from, known by its content rather than by its place.
 *
 * @param path   where it was, with {@code /}; relative to the case folder where that can be said
 * @param sha256 of its content, lower-case hexadecimal
 * @param bytes  its length
 */
public record SourceFile(String path, String sha256, long bytes) {
    private static final Pattern HASH = Pattern.compile("[0-9a-f]{64}");

    public SourceFile {
        if (path.isBlank() || path.length() > 4096 || path.indexOf('\0') >= 0) {
            throw new IllegalArgumentException("a source needs a path of 1..4096 characters, got " + path.length());
        }
        if (!HASH.matcher(sha256).matches()) {
            throw new IllegalArgumentException("a SHA-256 has 64 hexadecimal digits, got " + sha256.length());
        }
        if (bytes < 0) {
            throw new IllegalArgumentException("a file cannot have " + bytes + " bytes");
        }
    }
}
