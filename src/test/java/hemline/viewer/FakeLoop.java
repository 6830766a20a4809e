package hemline.viewer;

import hemline.boundary.ArcHistory;
import hemline.boundary.ArcHistory.RadiusAt;
import hemline.boundary.BoundaryKind;
import hemline.boundary.Meeting;
import hemline.boundary.Origin;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geodesy.GeoPoint;
import hemline.geometry.Point;
import hemline.sweep.Field;
import hemline.sweep.GateMask;
import hemline.sweep.MaskReason;
import hemline.sweep.RadarSite;
import hemline.sweep.RayGeometry;
import hemline.sweep.ScreenedSweep;
import hemline.sweep.Sweep;
import hemline.sweep.SweepFrame;
import hemline.workflow.LoopSession;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;

/**
 * An invented loop made by hand in memory: two growing circles and a straight line over speckled clear air, with
 * clutter and one cell, one missing sweep in the middle, and the tracks that a perfect analysis would find.
 */
public final class FakeLoop implements LoopSession {
    /** 2031-07-14T21:00Z. */
    public static final long START_MS = 1_941_829_200_000L;
    public static final long STEP_MS = 300_000L;
    /** A missed sweep after this one. */
    public static final int HOLE_AFTER = 5;
    private static final double GATE_M = 250;
    private static final int MASTS_KM = 12;

    private final int sweeps;
    private final int rays;
    private final int gates;
    private final boolean analysed;
    private final RadarSite site = new RadarSite("Marrow Flat (invented)", Optional.of(new GeoPoint(38.5, -101.25)),
            1050);
    private final List<SweepFrame> frames = new ArrayList<>();
    private final List<Track> tracks;

    public FakeLoop(int sweeps, int rays, int gates, boolean analysed) {
        this.sweeps = sweeps;
        this.rays = rays;
        this.gates = gates;
        this.analysed = analysed;
        for (int i = 0; i < sweeps; i++) {
            frames.add(new SweepFrame(i, geometry(i), new hemline.geodesy.BeamGeometry(0.5, 1050)));
        }
        tracks = analysed ? List.of(circle("T01", new Point(-30, 15), 9, 11.5, 30, 150),
                circle("T02", new Point(28, -18), 6, 9, 240, 350), line("T03")) : List.of();
    }

    /** Small enough for fast tests. */
    public static FakeLoop small(boolean analysed) {
        return new FakeLoop(12, 180, 240, analysed);
    }

    public static long timeMs(int sweep) {
        return START_MS + STEP_MS * (sweep + (sweep > HOLE_AFTER ? 1 : 0));
    }

    private RayGeometry geometry(int sweep) {
        double[] azimuth = new double[rays];
        double[] elevation = new double[rays];
        long[] time = new long[rays];
        for (int i = 0; i < rays; i++) {
            azimuth[i] = (i + 0.5) * 360 / rays;
            elevation[i] = 0.5;
            time[i] = timeMs(sweep) + Math.round(18_000.0 * i / rays);
        }
        return new RayGeometry(azimuth, elevation, time);
    }

    private static double radiusKm(double firstKm, double speedMs, int sweep) {
        return firstKm + speedMs * (timeMs(sweep) - START_MS) / 1e6;
    }

    private Track circle(String id, Point centre, double firstKm, double speedMs, double fromDeg, double toDeg) {
        List<TrackPiece> pieces = new ArrayList<>();
        List<RadiusAt> radii = new ArrayList<>();
        for (int s = 0; s < sweeps; s++) {
            double radius = radiusKm(firstKm, speedMs, s);
            List<TrackVertex> vertices = new ArrayList<>();
            int count = (int) Math.ceil(Math.toRadians(toDeg - fromDeg) * radius);
            for (int i = 0; i <= count; i++) {
                double bearing = fromDeg + (toDeg - fromDeg) * i / count;
                vertices.add(vertex(s, centre.plus(Point.towards(bearing).times(radius)), bearing, speedMs, i > 2));
            }
            pieces.add(new TrackPiece(s, id.equals("T02") ? BoundaryKind.ARC : BoundaryKind.THIN_LINE, Origin.AUTO,
                    vertices));
            radii.add(new RadiusAt(s, frames.get(s).meanTimeMs(), radius, 0.4));
        }
        return new Track(id, pieces, new Speed(speedMs, 0.5), (fromDeg + toDeg) / 2, Optional.of(new ArcHistory(centre,
                0.8, START_MS, 0, 0, 0.3, radii, new Speed(speedMs, 0.4), toDeg - fromDeg, 0.3)), "", 12);
    }

    private Track line(String id) {
        List<TrackPiece> pieces = new ArrayList<>();
        for (int s = 2; s < sweeps - 1; s++) {
            List<TrackVertex> vertices = new ArrayList<>();
            for (int i = -25; i <= 5; i++) {
                vertices.add(vertex(s, new Point(i, 60 - 6.5 * (timeMs(s) - START_MS) / 1e6), 180, 6.5, true));
            }
            pieces.add(new TrackPiece(s, BoundaryKind.THIN_LINE, Origin.HAND, vertices));
        }
        return new Track(id, pieces, new Speed(6.5, 0.7), 180, Optional.empty(), "curvature is not significant", 5);
    }

    private TrackVertex vertex(int sweep, Point at, double bearing, double speedMs, boolean seen) {
        SweepFrame frame = frames.get(sweep);
        return new TrackVertex(at, frame.timeAtMs(at), 12, frame.beamHeightM(at), bearing, new Speed(speedMs, 0.9),
                seen);
    }

    @Override
    public Sweep sweep(int index) {
        float[] dbz = new float[rays * gates];
        float[] velocity = new float[rays * gates];
        SplittableRandom random = new SplittableRandom(1000 + index);
        for (int ray = 0; ray < rays; ray++) {
            Point way = Point.towards((ray + 0.5) * 360 / rays);
            for (int gate = 0; gate < gates; gate++) {
                double km = (gate + 0.5) * GATE_M / 1000;
                Point at = way.times(km);
                double echo = echoDbz(index, at, km, random);
                dbz[ray * gates + gate] = echo < -18 ? Field.BELOW_DETECTION : (float) echo;
                velocity[ray * gates + gate] = echo < -18 ? Field.BELOW_DETECTION
                        : (float) (6 * way.dot(new Point(0.6, 0.8)) + random.nextDouble(-1.5, 1.5));
            }
        }
        return new Sweep(site, "invented sweep " + (index + 1), 0.5, 1, GATE_M / 2, GATE_M, frames.get(index).rays(),
                new Field("DBZH", "dBZ", rays, gates, dbz), Optional.of(new Field("VRADH", "m s-1", rays, gates,
                        velocity)),
                24);
    }

    private static double echoDbz(int sweep, Point at, double km, SplittableRandom random) {
        double air = 4 - 0.16 * km + random.nextDouble(-4, 4);
        double first = radiusKm(9, 11.5, sweep);
        double second = radiusKm(6, 9, sweep);
        air = Math.max(air, ridge(at.minus(new Point(-30, 15)), first, 20, 30, 150) + random.nextDouble(-2, 2));
        air = Math.max(air, ridge(at.minus(new Point(28, -18)), second, 16, 240, 350) + random.nextDouble(-2, 2));
        double y = 60 - 6.5 * (timeMs(sweep) - START_MS) / 1e6;
        if (at.xKm() > -25 && at.xKm() < 5) {
            air = Math.max(air, 14 - 8 * Math.pow(at.yKm() - y, 2) + random.nextDouble(-2, 2));
        }
        double cell = 58 - 0.5 * Math.pow(at.distanceKm(new Point(-32 + 0.4 * sweep, 14 + 0.2 * sweep)), 2);
        double masts = Math.abs(at.xKm() - MASTS_KM) < 1.5 && Math.abs(at.yKm() - MASTS_KM) < 1.5 ? 45 : -99;
        return Math.max(air, Math.max(cell, masts));
    }

    private static double ridge(Point offset, double radiusKm, double peakDbz, double fromDeg, double toDeg) {
        boolean inside = offset.bearingDeg() >= fromDeg && offset.bearingDeg() <= toDeg;
        return inside ? peakDbz - 9 * Math.pow(offset.lengthKm() - radiusKm, 2) : -99;
    }

    @Override
    public Optional<ScreenedSweep> screened(int index) {
        if (!analysed) {
            return Optional.empty();
        }
        Sweep raw = sweep(index);
        byte[] bits = new byte[rays * gates];
        for (int ray = 0; ray < rays; ray++) {
            for (int gate = 0; gate < gates; gate++) {
                Point at = Point.towards(raw.rays().azimuthDeg(ray)).times((gate + 0.5) * GATE_M / 1000);
                float dbz = raw.reflectivity().at(ray, gate);
                if (Math.abs(at.xKm() - MASTS_KM) < 1.5 && Math.abs(at.yKm() - MASTS_KM) < 1.5) {
                    bits[ray * gates + gate] = (byte) MaskReason.CLUTTER.bit();
                } else if (dbz > 35) {
                    bits[ray * gates + gate] = (byte) MaskReason.DEEP_CONVECTION.bit();
                }
            }
        }
        return Optional.of(new ScreenedSweep(raw, new GateMask(rays, gates, bits)));
    }

    @Override
    public List<Meeting> meetings() {
        return !analysed ? List.of() : List.of(
                new Meeting("M1", "T01", "T02", timeMs(8), 90, new Point(1, 2), new Meeting.Ellipse(2.5, 1.2, 60), 25,
                        new Speed(20.5, 1), Meeting.Status.OBSERVED, 1),
                new Meeting("M2", "T01", "T03", timeMs(sweeps - 1) + 900_000, 240, new Point(-12, 30),
                        new Meeting.Ellipse(4, 2, 120), 70, new Speed(15, 1.5), Meeting.Status.EXPECTED, 0.7));
    }

    @Override
    public String title() {
        return site.name();
    }

    @Override
    public RadarSite site() {
        return site;
    }

    @Override
    public List<SweepFrame> frames() {
        return List.copyOf(frames);
    }

    @Override
    public boolean analysed() {
        return analysed;
    }

    @Override
    public List<Track> tracks() {
        return tracks;
    }

    @Override
    public List<String> cautions() {
        return List.of("This loop is invented.");
    }

    @Override
    public double heightCeilingM() {
        return 1500;
    }
}
