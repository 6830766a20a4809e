package hemline.export;

import hemline.boundary.ArcHistory;
import hemline.boundary.BoundaryKind;
import hemline.boundary.Meeting;
import hemline.boundary.Origin;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geodesy.BeamGeometry;
import hemline.geodesy.GeoPoint;
import hemline.geometry.Point;
import hemline.pipeline.Analysis;
import hemline.pipeline.Counts;
import hemline.sweep.RadarSite;
import hemline.sweep.RayGeometry;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A small hand-made result: one growing ring piece and one straight line that meets it. */
final class InventedAnalysis {
    static final long START_MS = 1_780_308_000_000L;
    static final long STEP_MS = 300_000;
    static final RadarSite PLACED = new RadarSite("Lone Hill", Optional.of(new GeoPoint(48, 9)), 420);
    static final RadarSite UNPLACED = new RadarSite("Lone Hill", Optional.empty(), Double.NaN);

    private InventedAnalysis() {
    }

    static Analysis at(RadarSite site) {
        List<SweepFrame> frames = new ArrayList<>();
        for (int i = 0; i < 3; i++) {
            frames.add(frame(i));
        }
        List<Track> tracks = List.of(ring(), line());
        List<Meeting> meetings = List.of(new Meeting("M1", "T01", "T02", START_MS + 540_250, 61.4,
                new Point(-12.345, 6.5), new Meeting.Ellipse(1.5, 0.4, 35), 72.25, new Speed(14.2, 0.9),
                Meeting.Status.OBSERVED, 1));
        return new Analysis(site, frames, tracks, meetings, Counts.of(3, 7, tracks, meetings),
                List.of("Two sweeps are missing."));
    }

    static SweepFrame frame(int index) {
        double[] azimuth = new double[360];
        double[] elevation = new double[360];
        long[] time = new long[360];
        for (int i = 0; i < 360; i++) {
            azimuth[i] = i + 0.5;
            elevation[i] = 0.5;
            time[i] = START_MS + index * STEP_MS + i * 50L;
        }
        return new SweepFrame(index, new RayGeometry(azimuth, elevation, time), new BeamGeometry(0.5, 420));
    }

    private static Track ring() {
        List<TrackPiece> pieces = new ArrayList<>();
        List<ArcHistory.RadiusAt> radii = new ArrayList<>();
        Point centre = new Point(-30, -5);
        for (int sweep = 0; sweep < 3; sweep++) {
            double radius = 10 + 3 * sweep;
            List<TrackVertex> vertices = new ArrayList<>();
            for (int bearing = 20; bearing <= 140; bearing += 4) {
                vertices.add(vertex(sweep, centre.plus(Point.towards(bearing).times(radius)), bearing, 10, 0.5, 12.3));
            }
            pieces.add(new TrackPiece(sweep, BoundaryKind.ARC, Origin.AUTO, vertices));
            radii.add(new ArcHistory.RadiusAt(sweep, START_MS + sweep * STEP_MS, radius, 0.3));
        }
        ArcHistory arc = new ArcHistory(centre, 0.5, START_MS + STEP_MS, 1.2, -0.3, 0.4, radii,
                new Speed(10, 0.45), 120, 0.21);
        return new Track("T01", pieces, new Speed(10, 0.5), 80, Optional.of(arc), "", 8.5);
    }

    private static Track line() {
        List<TrackPiece> pieces = new ArrayList<>();
        for (int sweep = 1; sweep < 3; sweep++) {
            for (int part = 0; part < 2; part++) {
                List<TrackVertex> vertices = new ArrayList<>();
                for (int i = 0; i <= 10; i++) {
                    vertices.add(vertex(sweep, new Point(12 - 4.0 * sweep, 15 * part + i), 270, 13.3, 0.4,
                            i == 3 ? Double.NaN : 8));
                }
                pieces.add(new TrackPiece(sweep, BoundaryKind.THIN_LINE, part == 0 ? Origin.AUTO : Origin.HAND,
                        vertices));
            }
        }
        return new Track("T02", pieces, Speed.UNKNOWN, Double.NaN, Optional.empty(), "too straight to tell", 4.25);
    }

    private static TrackVertex vertex(int sweep, Point place, double bearing, double speed, double sd, double dbz) {
        SweepFrame frame = frame(sweep);
        return new TrackVertex(place, frame.timeAtMs(place), dbz, frame.beamHeightM(place), bearing,
                new Speed(speed, sd), true);
    }
}
