package hemline.workflow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import hemline.boundary.BoundaryKind;
import hemline.boundary.Origin;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.boundary.station.StationPassage;
import hemline.geodesy.BeamGeometry;
import hemline.geodesy.GeoPoint;
import hemline.geometry.Point;
import hemline.pipeline.Analysis;
import hemline.pipeline.Counts;
import hemline.sweep.RadarSite;
import hemline.sweep.RayGeometry;
import hemline.sweep.SweepFrame;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class StationWorkTest {
    private static final long NOON = Instant.parse("2026-06-01T12:00:00Z").toEpochMilli();
    @TempDir
    private Path folder;

    /** A line 30 km north of the radar at noon, moving north at 10 m/s. */
    private static Analysis analysis(Optional<GeoPoint> radar) {
        List<TrackPiece> pieces = new ArrayList<>();
        List<SweepFrame> frames = new ArrayList<>();
        for (int sweep = 0; sweep < 4; sweep++) {
            long time = NOON + (sweep - 2) * 300_000L + 60_000;
            List<TrackVertex> vertices = new ArrayList<>();
            for (int x = -10; x <= 10; x++) {
                vertices.add(new TrackVertex(new Point(x, 30 + 0.01 * (time - NOON) / 1000), time, 12, 600, 0,
                        new Speed(10, 0.5), true));
            }
            pieces.add(new TrackPiece(sweep, BoundaryKind.THIN_LINE, Origin.AUTO, vertices));
            frames.add(new SweepFrame(sweep, new RayGeometry(new double[] {0}, new double[] {0.5}, new long[] {time}),
                    new BeamGeometry(0.5, 100)));
        }
        List<Track> tracks = List.of(Track.linked("T1", pieces, 1));
        return new Analysis(new RadarSite("unknown", radar, 100), frames, tracks, List.of(),
                Counts.of(4, 4, tracks, List.of()), List.of());
    }

    private Path table() throws Exception {
        StringBuilder rows = new StringBuilder("station,time_utc,latitude,longitude,temperature_c\n");
        for (int minute = -40; minute <= 40; minute++) {
            rows.append("S1,").append(Instant.ofEpochMilli(NOON + minute * 60_000L)).append(",48.2698,9.0,")
                    .append(minute < 0 ? 30 : Math.max(24, 30 - minute)).append('\n');
        }
        Path file = folder.resolve("stations.csv");
        Files.writeString(file, rows);
        return file;
    }

    @Test
    void passagesOverTheStationsOfATableAreFound() throws Exception {
        List<StationPassage> passages = new StationWork(table()).passages(analysis(Optional.of(new GeoPoint(48, 9))));
        assertThat(passages).hasSize(1);
        assertThat(Math.abs(passages.get(0).trackTimeMs() - NOON)).isLessThan(10_000);
        assertThat(passages.get(0).signal()).isPresent();
    }

    @Test
    void aRadarWithoutPlaceIsToldWhatToGive() throws Exception {
        StationWork work = new StationWork(table());
        assertThatThrownBy(() -> work.passages(analysis(Optional.empty()))).isInstanceOf(UserProblem.class)
                .hasMessageContaining("give --position");
    }
}
