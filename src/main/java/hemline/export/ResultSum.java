package hemline.export;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.DigestInputStream;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/**
 * The check sum of one file.
 *
 * @param name   its path inside the result folder
 * @param bytes  its size
 * @param sha256 in hexadecimal
 */
record ResultSum(String name, long bytes, String sha256) {

    static ResultSum of(String name, Path file) throws IOException {
        MessageDigest digest = sha256Digest();
        long bytes;
        try (InputStream in = new DigestInputStream(Files.newInputStream(file), digest)) {
            bytes = in.transferTo(java.io.OutputStream.nullOutputStream());
        }
        return new ResultSum(name, bytes, HexFormat.of().formatHex(digest.digest()));
    }

    private static MessageDigest sha256Digest() {
        try {
            return MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }
}
