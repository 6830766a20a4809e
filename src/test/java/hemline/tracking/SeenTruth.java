package hemline.tracking;

import hemline.boundary.BoundaryKind;
import hemline.boundary.Evidence;
import hemline.boundary.ObservedBoundary;
import hemline.boundary.ObservedVertex;
import hemline.boundary.truth.Truth;
import hemline.boundary.truth.Truth.TruthBoundary;
import hemline.boundary.truth.Truth.TruthLine;
import hemline.boundary.truth.Truth.TruthVertex;
import hemline.geometry.Point;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;

/**
 * What a good but imperfect detector would find of a truth: plain stretches with a position error that neighbours
 * share, gaps, and false lines. It parts the skill of linking and measuring from that of detection.
 */
final class SeenTruth {
    private final Random random;
    private final double noiseKm;
    private final double gapShare;
    private final int falseLines;

    SeenTruth(long seed, double noiseKm, double gapShare, int falseLines) {
        random = new Random(seed);
        this.noiseKm = noiseKm;
        this.gapShare = gapShare;
        this.falseLines = falseLines;
    }

    List<ObservedBoundary> of(Truth truth, List<SweepFrame> frames) {
        List<ObservedBoundary> found = new ArrayList<>();
        for (TruthBoundary boundary : truth.boundaries()) {
            for (TruthLine line : boundary.lines()) {
                seen(line, frames.get(line.sweep()), found);
            }
        }
        for (SweepFrame frame : frames) {
            for (int i = 0; i < falseLines; i++) {
                falseLine(frame, found);
            }
        }
        return found;
    }

    private void seen(TruthLine line, SweepFrame frame, List<ObservedBoundary> found) {
        List<ObservedVertex> run = new ArrayList<>();
        double error = random.nextGaussian();
        boolean hidden = false;
        for (TruthVertex vertex : line.vertices()) {
            error = 0.8 * error + 0.6 * random.nextGaussian();
            hidden = hidden ? random.nextDouble() > 1 / 8.0 : random.nextDouble() < gapShare / 8 / (1 - gapShare);
            if (hidden || vertex.detectability() < 0.4) {
                close(run, frame, found);
                continue;
            }
            Point normal = Point.towards(vertex.normalBearingDeg());
            Point at = new Point(vertex.xKm(), vertex.yKm()).plus(normal.times(noiseKm * error));
            run.add(new ObservedVertex(at, frame.timeAtMs(at), vertex.peakDbz(), normal,
                    vertex.speedMs() + 1.5 * random.nextGaussian(), 2 + 2 * vertex.detectability(), 4, 2));
        }
        close(run, frame, found);
    }

    private void falseLine(SweepFrame frame, List<ObservedBoundary> found) {
        Point at = new Point(160 * random.nextDouble() - 80, 160 * random.nextDouble() - 80);
        double bearing = 360 * random.nextDouble();
        double bend = 4 * random.nextGaussian();
        List<ObservedVertex> run = new ArrayList<>();
        int length = 6 + random.nextInt(12);
        for (int i = 0; i < length; i++) {
            bearing += bend;
            at = at.plus(Point.towards(bearing + 90));
            run.add(new ObservedVertex(at, frame.timeAtMs(at), 5, Point.towards(bearing), 15 * random.nextDouble(),
                    1.5, 3, 0));
        }
        close(run, frame, found);
    }

    private static void close(List<ObservedVertex> run, SweepFrame frame, List<ObservedBoundary> found) {
        if (run.size() >= 6) {
            found.add(new ObservedBoundary(frame.index(), BoundaryKind.THIN_LINE, run,
                    new Evidence(-3, 3, 4, 2, 1, 0, 0)));
        }
        run.clear();
    }
}
