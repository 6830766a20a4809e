package hemline.launcher;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HexFormat;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Stream;

/** What folders hold, for comparison. */
final class Folders {
    private Folders() {
    }

    /** Every file below a folder with its bytes in hexadecimal and its time of change. */
    static SortedMap<String, String> state(Path folder, boolean withTimes) throws IOException {
        SortedMap<String, String> state = new TreeMap<>();
        try (Stream<Path> tree = Files.walk(folder)) {
            for (Path path : tree.toList()) {
                String name = folder.relativize(path).toString();
                String time = withTimes ? " " + Files.getLastModifiedTime(path) : "";
                state.put(name, (Files.isRegularFile(path) ? HexFormat.of().formatHex(Files.readAllBytes(path)) : "")
                        + time);
            }
        }
        return state;
    }

    static void copy(Path from, Path to) throws IOException {
        Files.createDirectories(to);
        try (Stream<Path> list = Files.list(from)) {
            for (Path path : list.filter(Files::isRegularFile).toList()) {
                Files.copy(path, to.resolve(path.getFileName()));
            }
        }
    }
}
