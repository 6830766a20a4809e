package hemline.scoring;

import static hemline.scoring.Cases.SETTINGS;
import static hemline.scoring.Cases.boundary;
import static hemline.scoring.Cases.line;
import static hemline.scoring.Cases.truth;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.json.JsonMapper;
import hemline.boundary.Track;
import hemline.boundary.truth.Truth;
import hemline.boundary.truth.Truth.TruthArc;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class RunScoringTest {
    @TempDir
    private Path folder;
    private Path truthFile;

    @BeforeEach
    void writeTruth() throws IOException {
        Truth truth = Cases.with(truth(2, Cases.withArcs(boundary("A", line(0, 0, 4, 0), line(1, 0, 4, 3)),
                new TruthArc(0, Cases.timeMs(0), 0, -20, 20, 6), new TruthArc(1, Cases.timeMs(1), 0, -20, 23, 8))),
                List.of(), List.of(Cases.trueMeeting(2, 3, Cases.timeMs(1), true)));
        truthFile = folder.resolve("truth.json");
        Files.writeString(truthFile, new JsonMapper().writeValueAsString(truth));
    }

    private static String utc(int sweep) {
        return Instant.ofEpochMilli(Cases.timeMs(sweep)).toString();
    }

    private void writeRun(boolean withSweep, double y, String speed) throws IOException {
        StringBuilder rows = new StringBuilder("track_id,time_utc,vertex,x_km,y_km,latitude,longitude,beam_height_m,"
                + "reflectivity_dbz,normal_bearing_deg,speed_ms,speed_sd_ms,kind,origin"
                + (withSweep ? ",sweep,stretch,seen" : "") + "\n");
        for (int sweep = 0; sweep < 2; sweep++) {
            for (int x = 0; x <= 4; x++) {
                rows.append(String.join(",", "T1", utc(sweep), "" + x, "" + x, "" + (y + 3 * sweep), "", "", "500",
                        "9.5", "0.0", speed, "1.00", "thin-line", "auto"));
                rows.append(withSweep ? "," + sweep + ",0,true\n" : "\n");
            }
        }
        write("boundaries.csv", rows.toString());
        write("tracks.csv", "track_id,first_utc,last_utc,first_radius_km,last_radius_km,expansion_ms,expansion_sd_ms\n"
                + "T1," + utc(0) + "," + utc(1) + ",20,23,7.5,1\n");
        write("meetings.csv", "meeting_id,track_a,track_b,time_utc,x_km,y_km,status\n"
                + "M1,T1,T2," + utc(1) + ",2,5,observed\nM2,T1,T3," + utc(1) + ",2,5,expected\n");
    }

    private void write(String name, String text) throws IOException {
        Files.writeString(folder.resolve(name), text);
    }

    private Score score() throws InputFileException {
        return RunScoring.againstTruth(folder, truthFile, SETTINGS);
    }

    @Test
    void theTablesOfARunAreScoredAgainstATruth() throws Exception {
        writeRun(true, 0.5, "12");
        Score score = score();
        assertThat(score.value(Measure.RECALL)).isEqualTo(1);
        assertThat(score.value(Measure.POSITION_MEDIAN)).isCloseTo(0.5, within(1e-9));
        assertThat(score.value(Measure.SPEED_BIAS)).isCloseTo(2, within(1e-9));
        assertThat(score.value(Measure.EXPANSION_BIAS)).isCloseTo(0.5, within(1e-9));
        assertThat(score.value(Measure.MEETING_HITS)).isEqualTo(1);
        assertThat(score.value(Measure.MEETING_FALSE)).isEqualTo(0);
        assertThat(score.value(Measure.MEETING_PLACE)).isCloseTo(2, within(1e-9));
        assertThat(score.cautions()).isEmpty();
    }

    @Test
    void tablesWithTheRequiredColumnsOnlyGiveTheSame() throws Exception {
        writeRun(true, 0.5, "12");
        String full = ScoreText.table(score());
        writeRun(false, 0.5, "12");
        assertThat(ScoreText.table(score())).isEqualTo(full);
        assertThat(RunTables.read(folder).tracks()).singleElement().extracting(Track::sweepCount).isEqualTo(2);
    }

    @Test
    void missingTablesAreToldOf() throws Exception {
        writeRun(true, 0.5, "12");
        Files.delete(folder.resolve("meetings.csv"));
        Files.delete(folder.resolve("tracks.csv"));
        Score score = score();
        assertThat(score.value(Measure.MEETING_MISSES)).isEqualTo(1);
        assertThat(score.value(Measure.EXPANSION_GIVEN)).isEqualTo(0);
        assertThat(score.cautions()).hasSize(2).anyMatch(c -> c.contains("no meetings.csv"));
    }

    @Test
    void aRunScoredAgainstItselfAgreesInAll() throws Exception {
        writeRun(true, 0.5, "12");
        Score score = RunScoring.againstReference(folder, folder, SETTINGS);
        for (Measure whole : List.of(Measure.RECALL, Measure.PRECISION, Measure.PURITY, Measure.CONTINUITY,
                Measure.MEETING_FOUND_SHARE, Measure.EXPANSION_GIVEN)) {
            assertThat(score.value(whole)).as(whole.key()).isEqualTo(1);
        }
        for (Measure none : List.of(Measure.POSITION_90, Measure.SPEED_RMSE, Measure.EXPANSION_RMSE,
                Measure.MEETING_PLACE, Measure.FALSE_KM_PER_SWEEP)) {
            assertThat(score.value(none)).as(none.key()).isCloseTo(0, within(1e-9));
        }
    }

    @Test
    void twoRunsAreComparedByWhatTheyDifferIn(@TempDir Path other) throws Exception {
        writeRun(true, 0.5, "12");
        for (String name : List.of("boundaries.csv", "tracks.csv", "meetings.csv")) {
            Files.copy(folder.resolve(name), other.resolve(name));
        }
        writeRun(true, 1.5, "11");
        Score score = RunScoring.againstReference(folder, other, SETTINGS);
        assertThat(score.value(Measure.POSITION_MEDIAN)).isCloseTo(1, within(1e-9));
        assertThat(score.value(Measure.SPEED_BIAS)).isCloseTo(-1, within(1e-9));
    }

    @Test
    void aReferenceWithoutSpeedsLeavesSpeedsUncompared(@TempDir Path hand) throws Exception {
        writeRun(true, 0.5, "");
        Files.copy(folder.resolve("boundaries.csv"), hand.resolve("boundaries.csv"));
        writeRun(true, 0.5, "12");
        Score score = RunScoring.againstReference(folder, hand, SETTINGS);
        assertThat(score.value(Measure.RECALL)).isEqualTo(1);
        assertThat(score.value(Measure.SPEED_BIAS)).isNaN();
    }

    @Test
    void brokenTablesNameFileLineColumnAndMend() throws Exception {
        writeRun(true, 0.5, "twelve");
        assertThatThrownBy(this::score).isInstanceOf(InputFileException.class)
                .hasMessageContaining("boundaries.csv, line 2, column speed_ms: expected a number with a decimal point, "
                        + "found \"twelve\"; write it like 12.5");
        write("boundaries.csv", "track_id,time_utc,vertex,x_km\nT1,2026-06-01T12:00:00Z,0,1\n");
        assertThatThrownBy(this::score).hasMessageContaining("line 1: expected a column y_km");
        write("boundaries.csv", "track_id,time_utc,vertex,x_km,y_km\nT1,noon,0,1,2\n");
        assertThatThrownBy(this::score).hasMessageContaining("line 2, column time_utc: expected an ISO 8601 time");
        write("boundaries.csv", "track_id,time_utc,vertex,x_km,y_km\nT1,2026-06-01T12:00:00Z,0,1\n");
        assertThatThrownBy(this::score).hasMessageContaining("line 2: expected 5 cells, found 4");
        write("boundaries.csv", "");
        assertThatThrownBy(this::score).hasMessageContaining("expected a header row");
        Files.write(folder.resolve("boundaries.csv"), new byte[] {(byte) 0xff, (byte) 0xfe, 0, 1});
        assertThatThrownBy(this::score).hasMessageContaining("expected UTF-8 text");
        Files.delete(folder.resolve("boundaries.csv"));
        assertThatThrownBy(this::score).hasMessageContaining("no such file");
    }

    @Test
    void brokenTruthsNameThePlaceAndMend() throws Exception {
        writeRun(true, 0.5, "12");
        Files.writeString(truthFile, "{\"scene\": \"x\", ");
        assertThatThrownBy(this::score).isInstanceOf(InputFileException.class).hasMessageContaining("truth.json, line 1");
        Files.writeString(truthFile, "{\"scene\": \"x\", \"seed\": 1}");
        assertThatThrownBy(this::score).hasMessageContaining("expected the fields of a truth")
                .hasMessageContaining("sweeps");
        Files.writeString(truthFile, "{\"scene\": \"x\", \"seed\": 1, \"sweeps\": [], \"boundaries\": [], "
                + "\"decoys\": [], \"meetings\": []}");
        assertThatThrownBy(this::score).hasMessageContaining("expected at least one sweep");
        Files.delete(truthFile);
        assertThatThrownBy(this::score).hasMessageContaining("no such file");
    }
}
