package hemline.kinematics;

import hemline.boundary.Track;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Measures how tracks move: normal speeds with their uncertainty, the track's own speed, its arc through time. */
public final class Kinematics {
    /** Sweep intervals on either side that a speed is fitted over at least. */
    private static final double LEAST_INTERVALS = 1.3;

    /** A shape that slides slower than this along itself is fitted as one that does not, m s⁻¹. */
    private static final double LEAST_SLIDE_MS = 2;

    private Kinematics() {
    }

    /**
     * The same tracks with speeds and arcs.
     *
     * @param frames every sweep of the loop, by rising index from 0
     */
    public static List<Track> measure(List<Track> tracks, List<SweepFrame> frames, KinematicsSettings settings) {
        if (tracks.isEmpty()) {
            return List.of();
        }
        long originMs = frames.get(0).meanTimeMs();
        double span = LEAST_INTERVALS * intervalS(frames);
        TrackPoints[] points = tracks.stream().map(t -> new TrackPoints(t, originMs)).toArray(TrackPoints[]::new);
        OpposedLines opposed = new OpposedLines(points, settings.opposedKm());
        List<Track> measured = new ArrayList<>(tracks.size());
        for (int k = 0; k < points.length; k++) {
            measured.add(measure(tracks.get(k), points[k], k, opposed, span, originMs, settings));
        }
        return measured;
    }

    private static Track measure(Track track, TrackPoints points, int number, OpposedLines opposed, double leastSpanS,
                                 long originMs, KinematicsSettings settings) {
        LocalMotion local = new LocalMotion(points, settings.halfLengthKm(), settings.halfSpanS(), leastSpanS);
        LocalMotion.Local[] found = new LocalMotion.Local[points.size];
        for (int i = 0; i < points.size; i++) {
            found[i] = opposed.near(number, i) ? null : local.at(i, 0);
        }
        double[] slide = new Sliding(points, found).alongMs();
        for (int i = 0; i < points.size; i++) {
            if (found[i] != null && Math.abs(slide[i]) >= LEAST_SLIDE_MS) {
                found[i] = local.at(i, slide[i]);
            }
        }
        VertexMotion[] motion = new VertexMotion[points.size];
        double sum = 0;
        int known = 0;
        for (int i = 0; i < points.size; i++) {
            LocalMotion.Local one = found[i];
            motion[i] = one == null ? VertexMotion.unknown(points.normalX[i], points.normalY[i])
                    : VertexMotion.along(points.normalX[i], points.normalY[i], one.speedMs(), one.sdMs());
            if (one != null) {
                sum += one.speedMs();
                known++;
            }
        }
        VertexMotion whole = TrackMotion.of(motion, points);
        Arcs.Outcome arc = Arcs.of(points, originMs, known == 0 ? 8 : sum / known, settings.maxRelativeRadiusSd());
        return new Track(track.id(), points.withMotion(motion), whole.speed(), whole.bearingDeg(), arc.arc(),
                arc.refusal(), track.score());
    }

    /** Median time from one sweep to the next, s. */
    private static double intervalS(List<SweepFrame> frames) {
        if (frames.size() < 2) {
            return 0;
        }
        double[] steps = new double[frames.size() - 1];
        for (int k = 1; k < frames.size(); k++) {
            steps[k - 1] = (frames.get(k).meanTimeMs() - frames.get(k - 1).meanTimeMs()) / 1000.0;
        }
        Arrays.sort(steps);
        return steps[steps.length / 2];
    }
}
