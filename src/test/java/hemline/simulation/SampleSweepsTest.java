package hemline.simulation;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.sweep.Progress;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SampleSweepsTest {
    private static final Path KEPT = Path.of(System.getProperty("hemline.basedir", "."), "sample-sweeps");
    private static final long LARGEST_BYTES = 12_000_000;

    /** The line in sample-sweeps/README.md: hemline simulate sample-sweeps --scene sample --radar lornfield --seed 7. */
    @Test
    void makingTheSampleLoopAgainGivesTheSameBytes(@TempDir Path dir) throws IOException {
        WrittenLoop made = Simulation.write(dir, SimulationRequest.mixed("sample", "lornfield", 7), Progress.NONE);
        for (Path file : made.sweeps()) {
            assertThat(file).hasSameBinaryContentAs(KEPT.resolve(file.getFileName()));
        }
        assertThat(made.truth()).hasSameBinaryContentAs(KEPT.resolve("truth.json"));
        assertThat(names(KEPT)).containsExactlyElementsOf(
                Stream.concat(names(dir).stream(), Stream.of("README.md")).sorted().toList());
    }

    @Test
    void theSampleLoopIsSmallAndHoldsAMeetingOfTwoPoolsAndAThirdLine() throws IOException {
        long bytes = 0;
        for (String name : names(KEPT)) {
            bytes += Files.size(KEPT.resolve(name));
        }
        assertThat(bytes).isLessThanOrEqualTo(LARGEST_BYTES);
        SimulatedLoop loop = Simulation.of("sample", "lornfield", 7);
        assertThat(loop.size()).isGreaterThanOrEqualTo(14);
        assertThat(loop.truth().boundaries()).extracting(b -> b.id()).containsExactly("west-pool", "east-pool", "south-line");
        assertThat(loop.truth().meetings()).hasSize(1).allMatch(m -> m.detectable());
    }

    private static List<String> names(Path folder) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(file -> file.getFileName().toString()).sorted().toList();
        }
    }
}
