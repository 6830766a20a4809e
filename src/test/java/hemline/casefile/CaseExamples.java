package hemline.casefile;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import hemline.boundary.ArcHistory;
import hemline.boundary.BoundaryKind;
import hemline.boundary.Meeting;
import hemline.boundary.Origin;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.casefile.edit.Anchor;
import hemline.casefile.edit.CaseState;
import hemline.casefile.edit.Found;
import hemline.casefile.store.SourceFile;
import hemline.geodesy.BeamGeometry;
import hemline.geodesy.GeoPoint;
import hemline.geometry.Point;
import hemline.sweep.RadarSite;
import hemline.sweep.RayGeometry;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleFunction;

/** An invented case of six sweeps: two lines that close on each other and a growing arc. */
public final class CaseExamples {
    public static final long START_MS = 1_750_000_000_000L;
    public static final long STEP_MS = 300_000;
    public static final int SWEEPS = 6;

    private CaseExamples() {
    }

    public static List<SweepFrame> frames(int count) {
        return frames(count, 72);
    }

    private static List<SweepFrame> frames(int count, int rays) {
        List<SweepFrame> frames = new ArrayList<>();
        for (int index = 0; index < count; index++) {
            double[] azimuth = new double[rays];
            double[] elevation = new double[rays];
            long[] time = new long[rays];
            for (int ray = 0; ray < rays; ray++) {
                azimuth[ray] = 360.0 / rays * ray + 0.1;
                elevation[ray] = 0.5;
                time[ray] = START_MS + index * STEP_MS + ray * 18_000L / rays;
            }
            frames.add(new SweepFrame(index, new RayGeometry(azimuth, elevation, time), new BeamGeometry(0.5, 312)));
        }
        return frames;
    }

    public static Found found() {
        return found(frames(SWEEPS), List.of("T1", "T2", "T3"), 0);
    }

    /** The same boundaries under other ids and moved east, as another run might find them. */
    public static Found found(List<SweepFrame> frames, List<String> ids, double eastKm) {
        List<Track> tracks = new ArrayList<>();
        tracks.add(track(ids.get(0), frames, BoundaryKind.THIN_LINE,
                sweep -> s -> new Point(10 + 3 * sweep + eastKm, 40 * s - 20), 40));
        tracks.add(track(ids.get(1), frames, BoundaryKind.THIN_LINE,
                sweep -> s -> new Point(42 - 3 * sweep + eastKm, 30 * s - 5), 30));
        tracks.add(track(ids.get(2), frames, BoundaryKind.ARC, sweep -> s -> new Point(-50 + eastKm, -10)
                .plus(Point.towards(90 * s).times(12 + 2 * sweep)), 40));
        Meeting meeting = new Meeting("M1", ids.get(0), ids.get(1), START_MS + 5 * STEP_MS + 1234, 61.5,
                new Point(25.9 + eastKm, 7.1), new Meeting.Ellipse(2.5, 1.25, 33), 0.1, new Speed(20.1, 1.7),
                Meeting.Status.OBSERVED, 1);
        return new Found(new RadarSite("invented", Optional.of(new GeoPoint(39.5, -98.25)), 312), frames, tracks,
                List.of(meeting), List.of("The scene is invented."));
    }

    /** As little as a case can hold, where only its files matter. */
    public static Found tiny(double eastKm) {
        List<SweepFrame> frames = frames(1, 4);
        Track track = track("T1", frames, BoundaryKind.THIN_LINE, sweep -> s -> new Point(10 + eastKm, 2 * s), 2);
        return new Found(new RadarSite("invented", Optional.empty(), Double.NaN), frames, List.of(track), List.of(),
                List.of());
    }

    private static Track track(String id, List<SweepFrame> frames, BoundaryKind kind,
                               DoubleFunction<DoubleFunction<Point>> lineAt, int steps) {
        List<TrackPiece> pieces = new ArrayList<>();
        for (SweepFrame frame : frames) {
            List<TrackVertex> vertices = new ArrayList<>();
            for (int i = 0; i <= steps; i++) {
                Point place = lineAt.apply(frame.index()).apply(i / (double) steps);
                vertices.add(new TrackVertex(place, frame.timeAtMs(place), i % 7 == 0 ? Double.NaN : 11.1 + i / 3.0,
                        frame.beamHeightM(place), 89.9, new Speed(10.0 / 3 + i, 0.7), i % 5 != 0));
            }
            pieces.add(new TrackPiece(frame.index(), kind, Origin.AUTO, vertices));
        }
        Optional<ArcHistory> arc = kind == BoundaryKind.THIN_LINE ? Optional.empty()
                : Optional.of(new ArcHistory(new Point(-50, -10), 1.5, START_MS, 0.1, -0.2, 0.3,
                        List.of(new ArcHistory.RadiusAt(0, START_MS, 12, 0.8)), new Speed(6.7, 0.4), 90, 0.3));
        return new Track(id, pieces, new Speed(10, 0.5), 90, arc, arc.isPresent() ? "" : "too straight", 4.2);
    }

    /** The stretch of a track on a sweep, taken hold of near a place. */
    public static Anchor at(CaseState state, String track, int sweep, double xKm, double yKm) {
        TrackPiece piece = state.track(track).orElseThrow().bySweep().get(sweep).stream()
                .min((a, b) -> Double.compare(a.line().nearest(new Point(xKm, yKm)).distanceKm(),
                        b.line().nearest(new Point(xKm, yKm)).distanceKm())).orElseThrow();
        return Anchor.of(track, piece, state.sweeps().frames(), new Point(xKm, yKm));
    }

    public static ObjectNode settings() {
        ObjectNode settings = JsonNodeFactory.instance.objectNode();
        settings.put("heightCeilingM", 1500.5);
        settings.putObject("detection").put("lineDb", 0.1);
        return settings;
    }

    public static List<SourceFile> sources() {
        return List.of(new SourceFile("../sweeps/one.nc", "ab".repeat(32), 1234),
                new SourceFile("../sweeps/two.nc", "cd".repeat(32), 99));
    }

    /** Speeds from the mean eastward step; no meetings: enough to see that measuring happens. */
    public static Remeasure.Measured measure(Remeasure.Request request) {
        List<Track> tracks = request.tracks().stream().map(track -> {
            TrackPiece first = track.pieces().get(0);
            TrackPiece last = track.pieces().get(track.pieces().size() - 1);
            double seconds = (last.meanTimeMs() - first.meanTimeMs()) / 1000.0;
            Point step = last.line().at(last.line().lengthKm() / 2).minus(first.line().at(first.line().lengthKm() / 2));
            Speed speed = seconds < 1 ? Speed.UNKNOWN : new Speed(1000 * step.lengthKm() / seconds, 0.5);
            return new Track(track.id(), track.pieces(), speed, speed.isKnown() ? step.bearingDeg() : Double.NaN,
                    Optional.empty(), "not asked for", track.score());
        }).toList();
        return new Remeasure.Measured(tracks, request.before().meetings());
    }
}
