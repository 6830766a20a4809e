package hemline.launcher;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.List;
import java.util.SortedMap;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Good and bad input, folders in the way, and stopping: exit codes, one line each, and nothing lost. */
class InputsIT {
    @TempDir
    private Path temp;
    private Path loop;
    private Path out;

    @BeforeEach
    void aShortLoop() throws IOException {
        loop = Files.createDirectory(temp.resolve("loop"));
        out = temp.resolve("out");
        try (Stream<Path> files = Files.list(Launched.SAMPLE)) {
            for (Path file : files.filter(f -> f.toString().matches(".*\\.(nc|h5)")).sorted().limit(3).toList()) {
                Files.copy(file, loop.resolve(file.getFileName()));
            }
        }
    }

    private List<Path> sweeps() throws IOException {
        try (Stream<Path> files = Files.list(loop)) {
            return files.sorted().toList();
        }
    }

    private static void cut(Path file, double share) throws IOException {
        try (RandomAccessFile bytes = new RandomAccessFile(file.toFile(), "rw")) {
            bytes.setLength((long) (bytes.length() * share));
        }
    }

    @Test
    void someUnreadableInputsAreNamedOneLineEachAndTheRunGoesOn() throws IOException {
        List<Path> good = sweeps();
        Path cutHdf = Files.copy(good.get(0), temp.resolve("loop/zz-cut.nc"));
        cut(cutHdf, 0.6);
        Path text = Files.writeString(temp.resolve("notes.h5"), "not radar data\n");
        Path empty = Files.createFile(temp.resolve("empty.nc"));
        Path missing = temp.resolve("missing.nc");
        Launched run = Launched.of("run", loop, text, empty, missing, "--out", out, "--pictures", "none");
        assertThat(run.exitCode()).as(run.err()).isEqualTo(3);
        for (Path bad : List.of(cutHdf, text, empty, missing)) {
            assertThat(run.err().lines().filter(line -> line.startsWith("hemline: " + bad + ": "))).as(run.err())
                    .hasSize(1).allMatch(line -> line.contains("; "));
        }
        JsonNode inputs = new ObjectMapper().readTree(out.resolve("run.json").toFile()).get("inputs");
        assertThat(inputs).hasSize(3 + 4);
        long refused = 0;
        for (JsonNode input : inputs) {
            refused += input.get("fate").asText().equals("refused") ? 1 : 0;
            assertThat(input.get("fate").asText().equals("refused")).isEqualTo(input.get("sweeps").asInt() == 0);
        }
        assertThat(refused).isEqualTo(4);
        assertThat(run.out()).contains("3 sweeps");
    }

    @Test
    void nothingReadableIsExitCodeFourAndWritesNothing() throws IOException {
        Path text = Files.writeString(temp.resolve("notes.h5"), "not radar data\n");
        Launched run = Launched.of("run", text, "--out", out);
        assertThat(run.exitCode()).isEqualTo(4);
        assertThat(run.out()).isEmpty();
        assertThat(run.err().lines()).hasSize(2);
        assertThat(out).doesNotExist();
        assertThat(Launched.of("inspect", text).exitCode()).isEqualTo(4);
    }

    @Test
    void wrongUsageIsExitCodeTwoAndOneLine() {
        for (String line : List.of("run", "run x", "run x --out y --elevation 5", "run x --out y --threads 0",
                "run x --out y --position 91,0,0", "run x --out y --pictures some", "run x --out y --ceiling -1",
                "run x --out y --settings /nowhere.json", "simulate", "simulate x --scene unheard", "inspect",
                "view --elevation x")) {
            Launched wrong = Launched.of((Object[]) line.split(" "));
            assertThat(wrong.exitCode()).as(line).isEqualTo(2);
            assertThat(wrong.out()).as(line).isEmpty();
            assertThat(wrong.err().lines()).as(line + wrong.err()).hasSize(1);
        }
        assertThat(Path.of("y")).doesNotExist();
    }

    @Test
    void aRunTakesASettingsFileAndTheRecordOfAnEarlierRun() throws IOException {
        Path settings = Files.writeString(temp.resolve("s.json"), "{\"screening\": {\"heightCeilingM\": 900}}");
        assertThat(Launched.of("run", loop, "--out", out, "--settings", settings, "--pictures", "none").exitCode())
                .isZero();
        SortedMap<String, String> first = Folders.state(out, false);
        Path second = temp.resolve("second");
        assertThat(Launched.of("run", loop, "--out", second, "--settings", out.resolve("run.json"), "--pictures",
                "none").exitCode()).isZero();
        assertThat(Folders.state(second, false)).isEqualTo(first);
        assertThat(new ObjectMapper().readTree(out.resolve("run.json").toFile()).at("/settings/screening/heightCeilingM")
                .asDouble()).isEqualTo(900);
    }

    @Test
    void aFolderInUseIsRefusedAndItsResultsStay() throws IOException {
        Files.createDirectory(out);
        Files.writeString(out.resolve("tracks.csv"), "earlier");
        try (FileChannel channel = FileChannel.open(out.resolve(".hemline-lock"), StandardOpenOption.CREATE,
                StandardOpenOption.WRITE);
                FileLock held = channel.lock(1L << 40, 1, false)) {
            assertThat(held.isValid()).isTrue();
            Launched run = Launched.of("run", loop, "--out", out, "--pictures", "none");
            assertThat(run.exitCode()).isEqualTo(2);
            assertThat(run.err()).contains("another run is writing here");
        }
        assertThat(out.resolve("tracks.csv")).hasContent("earlier");
    }

    @Test
    void aFileInPlaceOfTheFolderIsNamed() throws IOException {
        Files.writeString(out, "mine");
        Launched run = Launched.of("run", loop, "--out", out);
        assertThat(run.exitCode()).isEqualTo(2);
        assertThat(run.err().lines()).hasSize(1);
        assertThat(run.err()).contains(out.toString());
        assertThat(out).hasContent("mine");
    }

    @Test
    void anInterruptLeavesEarlierResultsAsTheyWere() throws Exception {
        assertThat(Launched.of("run", loop, "--out", out, "--pictures", "none").exitCode()).isZero();
        SortedMap<String, String> before = Folders.state(out, true);
        Path said = temp.resolve("said.txt");
        Process process = Launched.start(temp.resolve("ignored.txt"), said, "run", Launched.SAMPLE, "--out", out);
        while (!Files.exists(out.resolve(".hemline-staging")) && process.isAlive()) {
            Thread.sleep(20);
        }
        assertThat(process.isAlive()).as(Files.readString(said)).isTrue();
        // As Ctrl-C, which a test started in the background may have to ignore.
        new ProcessBuilder("kill", "-TERM", Long.toString(process.pid())).start().waitFor();
        assertThat(process.waitFor(60, TimeUnit.SECONDS)).isTrue();
        assertThat(process.exitValue()).isEqualTo(128 + 15);
        assertThat(Folders.state(out, true)).isEqualTo(before);
        assertThat(Files.readString(said)).contains("stopped; earlier results are as they were");
    }

    @Test
    void inspectSaysWhatEachFormatHolds() throws IOException {
        List<Path> good = sweeps();
        Launched inspected = Launched.of("inspect", good.get(0), good.get(1), good.get(2));
        assertThat(inspected.exitCode()).isZero();
        assertThat(inspected.out()).contains("CfRadial", "ODIM_H5", "lornfield", "360 rays", "dBZ", " *");
    }

    @Test
    void simulatingTwiceGivesTheSameBytes() throws IOException {
        Path a = temp.resolve("a");
        Path b = temp.resolve("b");
        assertThat(Launched.of("simulate", a, "--scene", "straight-line", "--radar", "sennick", "--seed", 3,
                "--threads", 2).exitCode()).isZero();
        Launched second = Launched.of("simulate", b, "--scene", "straight-line", "--radar", "sennick", "--seed", 3,
                "--threads", 1);
        assertThat(second.out()).startsWith("Invented, never measured: ");
        assertThat(Folders.state(a, false)).isEqualTo(Folders.state(b, false));
    }
}
