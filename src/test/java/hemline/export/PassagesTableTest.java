package hemline.export;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.boundary.Speed;
import hemline.boundary.station.AirChange;
import hemline.boundary.station.AirMeans;
import hemline.boundary.station.Onset;
import hemline.boundary.station.StationPassage;
import hemline.boundary.station.StationSignal;
import hemline.boundary.station.TheoryCheck;
import hemline.numerics.Estimate;
import java.io.IOException;
import java.io.StringWriter;
import java.time.Instant;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class PassagesTableTest {
    private static final long NOON = Instant.parse("2026-06-01T12:00:00Z").toEpochMilli();

    private static StationPassage full() {
        Onset wind = new Onset(NOON, 20, NOON, new Estimate(11, 0.8));
        Onset pressure = new Onset(NOON - 180_000, 30, NOON + 180_000, new Estimate(1.5, 0.1));
        AirMeans before = new AirMeans(10, 30, 17, 960, 308.2, 345, 2.2, 333);
        AirMeans after = new AirMeans(9, 24, 17, 961.5, 301.9, 338, 9.1, 186);
        return new StationPassage("S1", "T03", NOON + 30_000, 22, 0, new Speed(10, 0.5),
                Optional.of(new StationSignal(NOON, 20, "wind", Optional.of(wind), Optional.empty(), Optional.of(pressure))),
                Optional.of(new AirChange(before, after, new Estimate(6, 0.3), new Estimate(6.3, 0.4),
                        new Estimate(7, 0.9), new Estimate(1.5, 0.15), new Estimate(-147, 12), false)),
                Optional.of(new TheoryCheck(new Estimate(7.8, 2.4), new Estimate(0.95, 0.15), 0.9, "pressure rise",
                        "words")), "");
    }

    private static Map<String, String> written(StationPassage passage) throws IOException {
        StringWriter out = new StringWriter();
        PassagesTable.TABLE.write(out, List.of(passage));
        List<String> lines = out.toString().lines().toList();
        String[] names = lines.get(0).split(",", -1);
        String[] cells = lines.get(1).split(",", -1);
        assertThat(cells).hasSameSizeAs(names);
        Map<String, String> row = new LinkedHashMap<>();
        for (int i = 0; i < names.length; i++) {
            row.put(names[i], cells[i]);
        }
        return row;
    }

    @Test
    void aFullPassageFillsItsRow() throws IOException {
        Map<String, String> row = written(full());
        assertThat(row).containsEntry("station", "S1").containsEntry("track_id", "T03")
                .containsEntry("time_utc", "2026-06-01T12:00:30.000Z").containsEntry("time_sd_s", "22")
                .containsEntry("signal_utc", "2026-06-01T12:00:00.000Z").containsEntry("signal_of", "wind")
                .containsEntry("wind_rise_ms", "11.00").containsEntry("temperature_start_utc", "")
                .containsEntry("pressure_start_utc", "2026-06-01T11:57:00.000Z")
                .containsEntry("theta_v_fall_k", "6.30").containsEntry("pressure_rise_hpa", "1.50")
                .containsEntry("wind_shift_deg", "-147.00").containsEntry("theory_ms", "7.80")
                .containsEntry("z_score", "0.90").containsEntry("note", "");
    }

    @Test
    void whatIsNotKnownStaysEmpty() throws IOException {
        Map<String, String> row = written(new StationPassage("S1", "T03", NOON, 22, 0, Speed.UNKNOWN, Optional.empty(),
                Optional.empty(), Optional.empty(), "the station's record does not cover the passage"));
        row.forEach((name, cell) -> {
            if (!List.of("station", "track_id", "time_utc", "time_sd_s", "bearing_deg", "note").contains(name)) {
                assertThat(cell).as(name).isEmpty();
            }
        });
        assertThat(row.get("note")).contains("does not cover");
    }
}
