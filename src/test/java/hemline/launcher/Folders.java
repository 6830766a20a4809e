package hemline.launcher;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Stream;

/** What folders hold, for comparison. */
final class Folders {
    private Folders() {
    }

    /** Every file below a folder with the check sum of its bytes and, if asked for, its time of change. */
    static SortedMap<String, String> state(Path folder, boolean withTimes) throws IOException {
        SortedMap<String, String> state = new TreeMap<>();
        try (Stream<Path> tree = Files.walk(folder)) {
            for (Path path : tree.filter(Files::isRegularFile).toList()) {
                state.put(folder.relativize(path).toString(),
                        sha256(path) + (withTimes ? " " + Files.getLastModifiedTime(path) : ""));
            }
        }
        return state;
    }

    static String sha256(Path file) throws IOException {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(Files.readAllBytes(file)));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException(e);
        }
    }
}
