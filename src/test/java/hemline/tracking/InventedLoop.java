package hemline.tracking;

import hemline.boundary.BoundaryKind;
import hemline.boundary.Evidence;
import hemline.boundary.ObservedBoundary;
import hemline.boundary.ObservedVertex;
import hemline.geodesy.BeamGeometry;
import hemline.geometry.Point;
import hemline.sweep.RayGeometry;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;

/**
 * Found boundaries made from fronts known exactly: each vertex at its own ray's time, with a position error shared by
 * its neighbours, gaps, missing sweeps and false lines. Everything is invented.
 */
public final class InventedLoop {
    private static final long START_MS = 1_700_000_000_000L;
    private static final double SWEEP_S = 24;

    private final List<InventedFront> fronts;
    private final long seed;
    private Random random;
    private double[] sweepTimesS;
    private double noiseKm = 0.35;
    private double gapShare = 0.1;
    private int falseLines = 2;
    private boolean hints = true;
    private double rangeKm = 110;
    private final List<Integer> missing = new ArrayList<>();

    public InventedLoop(long seed, InventedFront... fronts) {
        this.fronts = List.of(fronts);
        this.seed = seed;
        every(300, 12);
    }

    public InventedLoop every(double intervalS, int sweeps) {
        sweepTimesS = new double[sweeps];
        for (int k = 0; k < sweeps; k++) {
            sweepTimesS[k] = k * intervalS;
        }
        return this;
    }

    public InventedLoop at(double... timesS) {
        sweepTimesS = timesS.clone();
        return this;
    }

    /** Standard deviation of a vertex across the line, km. */
    public InventedLoop noise(double km) {
        noiseKm = km;
        return this;
    }

    /** Share of each line hidden in gaps of some 6 km. */
    public InventedLoop gaps(double share) {
        gapShare = share;
        return this;
    }

    /** False lines a sweep. */
    public InventedLoop falseLines(int perSweep) {
        falseLines = perSweep;
        return this;
    }

    /** Whether vertices suggest their motion. */
    public InventedLoop hints(boolean given) {
        hints = given;
        return this;
    }

    /** Sweeps in which nothing is found. */
    public InventedLoop missing(int... sweeps) {
        for (int k : sweeps) {
            missing.add(k);
        }
        return this;
    }

    public List<SweepFrame> frames() {
        List<SweepFrame> frames = new ArrayList<>();
        for (int k = 0; k < sweepTimesS.length; k++) {
            double[] azimuth = new double[360];
            double[] elevation = new double[360];
            long[] time = new long[360];
            for (int ray = 0; ray < 360; ray++) {
                azimuth[ray] = ray + 0.5;
                elevation[ray] = 0.5;
                time[ray] = START_MS + Math.round(1000 * (sweepTimesS[k] + SWEEP_S * ray / 360));
            }
            frames.add(new SweepFrame(k, new RayGeometry(azimuth, elevation, time), new BeamGeometry(0.5, 100)));
        }
        return frames;
    }

    /** Seconds from the loop's start to a time. */
    public static double secondsAt(long timeMs) {
        return (timeMs - START_MS) / 1000.0;
    }

    /** The same boundaries at every call. */
    public List<ObservedBoundary> found() {
        random = new Random(seed);
        List<ObservedBoundary> found = new ArrayList<>();
        List<SweepFrame> frames = frames();
        for (SweepFrame frame : frames) {
            if (missing.contains(frame.index())) {
                continue;
            }
            for (InventedFront front : fronts) {
                seen(front, frame, found);
            }
            for (int i = 0; i < falseLines; i++) {
                falseLine(frame, found);
            }
        }
        return found;
    }

    private void seen(InventedFront front, SweepFrame frame, List<ObservedBoundary> found) {
        List<InventedFront.Place> places = front.at(sweepTimesS[frame.index()]);
        double error = random.nextGaussian();
        double keep = Math.exp(-1 / 4.0);
        boolean hidden = false;
        List<ObservedVertex> run = new ArrayList<>();
        Point last = null;
        for (InventedFront.Place place : places) {
            error = keep * error + Math.sqrt(1 - keep * keep) * random.nextGaussian();
            hidden = hidden ? random.nextDouble() > 1 / 6.0 : random.nextDouble() < gapShare / 6 / (1 - gapShare);
            boolean apart = last != null && last.distanceKm(place.at()) > 2.5;
            if (hidden || apart || place.at().lengthKm() > rangeKm) {
                close(run, frame, found);
            }
            if (!hidden && place.at().lengthKm() <= rangeKm) {
                // The front moves on while the antenna turns: seen where it is when the ray passes.
                double late = (frame.timeAtMs(place.at()) - START_MS) / 1000.0 - sweepTimesS[frame.index()];
                Point at = place.at().plus(place.normal().times(place.speedMs() * late / 1000 + noiseKm * error));
                run.add(vertex(at, frame, place.normal(), hints ? place.speedMs() + 1.5 * random.nextGaussian()
                        : Double.NaN, 3.5));
            }
            last = place.at();
        }
        close(run, frame, found);
    }

    private void falseLine(SweepFrame frame, List<ObservedBoundary> found) {
        Point at = new Point(160 * random.nextDouble() - 80, 160 * random.nextDouble() - 80);
        double bearing = 360 * random.nextDouble();
        double bend = 4 * random.nextGaussian();
        int length = 6 + random.nextInt(12);
        List<ObservedVertex> run = new ArrayList<>();
        for (int i = 0; i < length; i++) {
            bearing += bend;
            at = at.plus(Point.towards(bearing + 90));
            run.add(vertex(at, frame, Point.towards(bearing), hints ? 15 * random.nextDouble() : Double.NaN, 1.5));
        }
        close(run, frame, found);
    }

    private static ObservedVertex vertex(Point at, SweepFrame frame, Point normal, double motionMs, double strength) {
        return new ObservedVertex(at, frame.timeAtMs(at), 12, normal, motionMs, strength, 5, 2);
    }

    private static void close(List<ObservedVertex> run, SweepFrame frame, List<ObservedBoundary> found) {
        if (run.size() >= 4) {
            found.add(new ObservedBoundary(frame.index(), BoundaryKind.THIN_LINE, run,
                    new Evidence(-3, 3, 5, 2, 1, 0, 0)));
        }
        run.clear();
    }
}
