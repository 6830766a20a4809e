package hemline.reader;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Assumptions;

/**
 * Real files in the open formats with facts read from them by other means: netCDF4-python, h5py and a byte-level
 * decode of the Level II archive. The folder is no part of this project; tests that need it are skipped, with a
 * printed reason, where the system property {@code hemline.realSweeps} names no such folder.
 */
final class RealSweeps {
    private RealSweeps() {
    }

    static Path folder() {
        Path folder = Path.of(System.getProperty("hemline.realSweeps", "absent"));
        Assumptions.assumeTrue(Files.isRegularFile(folder.resolve("expected.tsv")), "skipped: no real sweeps at "
                + folder + " (system property hemline.realSweeps)");
        return folder;
    }

    static Path file(String name) {
        return folder().resolve(name);
    }

    /** Rows of {@code expected.tsv}, column by name. */
    static List<Map<String, String>> expected() throws IOException {
        List<String> lines = Files.readAllLines(folder().resolve("expected.tsv"));
        String[] columns = lines.get(0).split("\t", -1);
        List<Map<String, String>> rows = new ArrayList<>();
        for (String line : lines.subList(1, lines.size())) {
            String[] cells = line.split("\t", -1);
            Map<String, String> row = new HashMap<>();
            for (int i = 0; i < columns.length; i++) {
                row.put(columns[i], i < cells.length ? cells[i] : "");
            }
            rows.add(row);
        }
        return rows;
    }
}
