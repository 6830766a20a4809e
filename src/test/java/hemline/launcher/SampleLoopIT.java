package hemline.launcher;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import hemline.boundary.truth.Truth;
import hemline.geodesy.BeamGeometry;
import hemline.geometry.Point;
import hemline.scoring.Measure;
import hemline.scoring.RunScoring;
import hemline.scoring.Score;
import hemline.scoring.ScoreSettings;
import hemline.scoring.TruthFile;
import java.io.IOException;
import java.io.Reader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.SortedMap;
import javax.imageio.ImageIO;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The main job on the sample loop, as the README starts it: what it says, what it writes, and how good it is. */
class SampleLoopIT {
    @TempDir
    private static Path temp;
    private static Path results;
    private static Launched run;
    private static SortedMap<String, String> inputBefore;

    @BeforeAll
    static void runOnTwoThreads() throws IOException {
        inputBefore = Folders.state(Launched.SAMPLE, true);
        results = temp.resolve("two");
        run = Launched.of("run", Launched.SAMPLE, "--out", results, "--threads", 2, "--pictures");
    }

    private static List<CSVRecord> table(String name) throws IOException {
        try (Reader in = Files.newBufferedReader(results.resolve(name))) {
            return CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true).build().parse(in).getRecords();
        }
    }

    private static double number(CSVRecord row, String column) {
        return Double.parseDouble(row.get(column));
    }

    @Test
    void theRunEndsWellAndSaysWhatItFound() throws IOException {
        assertThat(run.exitCode()).as(run.err()).isZero();
        assertThat(run.out()).contains("track", "toward", "meeting", "observed", "Results: " + results);
        for (CSVRecord track : table("tracks.csv")) {
            assertThat(run.out()).contains("  " + track.get("track_id") + " ");
        }
        assertThat(run.err()).doesNotContain("hemline:");
    }

    @Test
    void recallPrecisionSpeedExpansionAndMeetingsReachTheirBars() throws Exception {
        Score score = RunScoring.againstTruth(results, Launched.SAMPLE.resolve("truth.json"),
                ScoreSettings.defaults().withToleranceKm(2).withMeetings(8, 10));
        assertThat(score.value(Measure.RECALL)).as("recall").isGreaterThanOrEqualTo(0.80);
        assertThat(score.value(Measure.PRECISION)).as("precision").isGreaterThanOrEqualTo(0.85);
        assertThat(score.value(Measure.SPEED_MEDIAN)).as("speed").isLessThanOrEqualTo(1.5);
        assertThat(score.value(Measure.EXPANSION_RMSE)).as("expansion").isLessThanOrEqualTo(1.5);
        assertThat(score.value(Measure.MEETING_MISSES)).as("missed meetings").isZero();
        assertThat(score.value(Measure.MEETING_FALSE)).as("false meetings").isLessThanOrEqualTo(1);
    }

    @Test
    void oneThreadGivesTheSameBytes() throws IOException {
        Path single = temp.resolve("one");
        Launched again = Launched.of("run", Launched.SAMPLE, "--out", single, "--threads", 1, "--pictures");
        assertThat(again.exitCode()).isZero();
        assertThat(Folders.state(single, false)).isEqualTo(Folders.state(results, false));
        assertThat(again.out().replace(single.toString(), "")).isEqualTo(run.out().replace(results.toString(), ""));
    }

    @Test
    void verticesAreAtMostOneKilometreApartAndBelowTheCeiling() throws IOException {
        JsonNode record = new ObjectMapper().readTree(results.resolve("run.json").toFile());
        double altitude = record.get("radar").get("altitude_m").asDouble();
        List<CSVRecord> rows = table("boundaries.csv");
        assertThat(rows).isNotEmpty();
        CSVRecord before = null;
        for (CSVRecord row : rows) {
            assertThat(number(row, "beam_height_m") - altitude).isBetween(-1.0, 1501.0);
            if (before != null && !row.get("vertex").equals("0")) {
                assertThat(Math.hypot(number(row, "x_km") - number(before, "x_km"),
                        number(row, "y_km") - number(before, "y_km"))).isLessThanOrEqualTo(1.0);
            }
            before = row;
        }
    }

    /** Doviak and Zrnic (1993), eq. 2.28, with the elevation and altitude the truth was made with. */
    @Test
    void beamHeightsFollowTheFourThirdsEarth() throws IOException {
        JsonNode record = new ObjectMapper().readTree(results.resolve("run.json").toFile());
        double altitude = record.get("radar").get("altitude_m").asDouble();
        double elevation = record.get("sweeps").get(0).get("elevation_deg").asDouble();
        BeamGeometry beam = new BeamGeometry(elevation, altitude);
        for (CSVRecord row : table("boundaries.csv")) {
            double ground = 1000 * new Point(number(row, "x_km"), number(row, "y_km")).lengthKm();
            assertThat(number(row, "beam_height_m")).isCloseTo(beam.heightAboveSeaM(beam.slantRangeM(ground)),
                    within(2.0));
        }
    }

    @Test
    void vertexTimesLieWithinTheSweeps() throws Exception {
        Truth truth = TruthFile.read(Launched.SAMPLE.resolve("truth.json"));
        for (CSVRecord row : table("boundaries.csv")) {
            Truth.TruthSweep sweep = truth.sweeps().get(Integer.parseInt(row.get("sweep")));
            long time = java.time.Instant.parse(row.get("time_utc")).toEpochMilli();
            assertThat(time).isBetween(sweep.startMs() - 1000, sweep.endMs() + 1000);
        }
    }

    @Test
    void theRecordHasEveryInputAndEveryResultWithItsCheckSum() throws Exception {
        JsonNode record = new ObjectMapper().readTree(results.resolve("run.json").toFile());
        assertThat(record.get("version").asText()).isNotEmpty();
        assertThat(record.get("settings").get("screening").get("heightCeilingM").asDouble()).isEqualTo(1500);
        int read = 0;
        for (JsonNode input : record.get("inputs")) {
            assertThat(input.get("sha256").asText())
                    .isEqualTo(Folders.sha256(Launched.BASE.resolve(input.get("path").asText())));
            read += input.get("fate").asText().equals("read") ? 1 : 0;
        }
        assertThat(read).isGreaterThanOrEqualTo(14).isEqualTo(record.get("counts").get("sweeps").asInt());
        for (JsonNode result : record.get("results")) {
            assertThat(result.get("sha256").asText()).isEqualTo(Folders.sha256(results.resolve(result.get("name").asText())));
        }
        assertThat(record.get("results").findValuesAsText("name")).contains("boundaries.csv", "tracks.csv",
                "meetings.csv", "boundaries.geojson", "summary.html", "overview.png", "pictures/sweep-000.png");
    }

    @Test
    void picturesAreThere() throws IOException {
        assertThat(ImageIO.read(results.resolve("overview.png").toFile()).getWidth()).isGreaterThan(800);
        assertThat(results.resolve("pictures/sweep-013.png")).exists();
    }

    @Test
    void theInputFolderIsLeftAsItWas() throws IOException {
        assertThat(Folders.state(Launched.SAMPLE, true)).isEqualTo(inputBefore);
    }

    @Test
    void nothingIsLeftBesideTheResults() throws IOException {
        assertThat(Folders.state(results, false).keySet()).noneMatch(name -> name.contains(".hemline"));
    }

    @Test
    void scoringFromTheCommandLineGivesATableAndJson() throws IOException {
        Path truth = Launched.SAMPLE.resolve("truth.json");
        Launched table = Launched.of("score", results, "--truth", truth);
        assertThat(table.exitCode()).isZero();
        assertThat(table.out()).contains("recall of detectable length", "precision of found length");
        Launched json = Launched.of("score", results, "--truth", truth, "--json");
        assertThat(new ObjectMapper().readTree(json.out()).isObject()).isTrue();
    }
}
