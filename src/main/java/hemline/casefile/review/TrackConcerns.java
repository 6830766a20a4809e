package hemline.casefile.review;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.casefile.edit.Sweeps;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.SortedMap;

/** What speaks against a track taken by itself. Bounds are common practice, no source. */
final class TrackConcerns {
    private static final int FEW_SWEEPS = 3;
    private static final double MUCH_FILLED = 0.4;
    /** A change of speed between sweeps counts from this many standard deviations, and from this size, m s⁻¹. */
    private static final double KINK_SDS = 3;
    private static final double KINK_MS = 3;
    private static final double LENGTH_FACTOR = 2;
    private static final double LENGTH_CHANGE_KM = 10;
    private static final double UNSURE_SHARE = 0.5;
    private static final double UNSURE_MS = 2;

    private final Track track;
    private final Sweeps sweeps;
    private final List<Concern> found = new ArrayList<>();

    private TrackConcerns(Track track, Sweeps sweeps) {
        this.track = track;
        this.sweeps = sweeps;
    }

    static List<Concern> of(List<Track> tracks, Sweeps sweeps) {
        double[] scores = tracks.stream().mapToDouble(Track::score).filter(s -> !Double.isNaN(s)).sorted().toArray();
        List<Concern> all = new ArrayList<>();
        for (Track track : tracks) {
            TrackConcerns concerns = new TrackConcerns(track, sweeps);
            concerns.weak(scores);
            concerns.presence();
            concerns.speeds();
            concerns.lengths();
            all.addAll(concerns.found);
        }
        return all;
    }

    private void add(ReviewReason reason, int sweep, double weight, String words, Object... values) {
        found.add(new Concern(track.id(), reason, sweep, Math.max(0, Math.min(0.95, weight)),
                String.format(Locale.ROOT, words, values)));
    }

    /** Scores have no fixed scale, so they are compared within the loop: the weaker half, most the weakest. */
    private void weak(double[] scores) {
        if (scores.length < 4 || Double.isNaN(track.score())) {
            return;
        }
        int below = Arrays.binarySearch(scores, track.score());
        while (below > 0 && scores[below - 1] == track.score()) {
            below--;
        }
        double rank = below / (double) (scores.length - 1);
        if (rank < 0.5) {
            add(ReviewReason.WEAK, longestSweep(), 0.8 * (1 - 2 * rank), "score %.3g, weaker than %.0f %% of the tracks",
                    track.score(), 100 * (1 - rank));
        }
    }

    private void presence() {
        SortedMap<Integer, List<TrackPiece>> bySweep = track.bySweep();
        int seen = 0;
        int vertices = 0;
        int seenVertices = 0;
        for (List<TrackPiece> pieces : bySweep.values()) {
            boolean any = false;
            for (TrackPiece piece : pieces) {
                for (TrackVertex vertex : piece.vertices()) {
                    vertices++;
                    seenVertices += vertex.seen() ? 1 : 0;
                    any |= vertex.seen();
                }
            }
            seen += any ? 1 : 0;
        }
        if (seen <= FEW_SWEEPS && sweeps.frames().size() > FEW_SWEEPS) {
            add(ReviewReason.FEW_SWEEPS, bySweep.firstKey(), 0.7 - 0.15 * seen, "seen in %d sweeps", seen);
        }
        double filled = 1 - seenVertices / (double) vertices;
        if (filled > MUCH_FILLED) {
            add(ReviewReason.MOSTLY_FILLED, longestSweep(), 0.5 * filled, "%.0f %% filled in", 100 * filled);
        }
        int missing = bySweep.lastKey() - bySweep.firstKey() + 1 - bySweep.size();
        if (missing > 0) {
            int before = bySweep.firstKey();
            while (bySweep.containsKey(before + 1)) {
                before++;
            }
            add(ReviewReason.GAP, before, Math.min(0.5, 0.2 * missing), "missing from %d sweeps in between", missing);
        }
    }

    private void speeds() {
        if (!track.speed().isKnown()) {
            if (track.sweepCount() >= FEW_SWEEPS) {
                add(ReviewReason.NO_SPEED, longestSweep(), 0.5, "no speed over %d sweeps", track.sweepCount());
            }
            return;
        }
        double speed = track.speed().speedMs();
        double sd = track.speed().sdMs();
        if (sd > UNSURE_MS && sd > UNSURE_SHARE * Math.abs(speed)) {
            add(ReviewReason.UNSURE_SPEED, longestSweep(), 0.4, "speed %.1f ± %.1f m/s", speed, sd);
        }
        int beforeSweep = -1;
        double[] before = null;
        for (var sweep : track.bySweep().entrySet()) {
            double[] now = medianSpeed(sweep.getValue());
            if (before != null && now != null) {
                double change = now[0] - before[0];
                double sds = Math.abs(change) / Math.max(1e-9, Math.hypot(now[1], before[1]));
                if (Math.abs(change) >= KINK_MS && sds >= KINK_SDS) {
                    add(ReviewReason.SPEED_KINK, sweep.getKey(), Math.abs(change) / (Math.abs(change) + 5),
                            "speed %.1f to %.1f m/s between sweeps %d and %d", before[0], now[0], beforeSweep,
                            sweep.getKey());
                }
            }
            if (now != null) {
                before = now;
                beforeSweep = sweep.getKey();
            }
        }
    }

    /** Median speed of a sweep's vertices and the median of their standard deviations, m s⁻¹; null where none is. */
    private static double[] medianSpeed(List<TrackPiece> pieces) {
        List<TrackVertex> known = pieces.stream().flatMap(piece -> piece.vertices().stream())
                .filter(vertex -> vertex.speed().isKnown()).toList();
        if (known.isEmpty()) {
            return null;
        }
        double[] speeds = known.stream().mapToDouble(vertex -> vertex.speed().speedMs()).sorted().toArray();
        double[] sds = known.stream().mapToDouble(vertex -> vertex.speed().sdMs()).sorted().toArray();
        return new double[] {speeds[speeds.length / 2], sds[sds.length / 2]};
    }

    private void lengths() {
        double before = Double.NaN;
        int beforeSweep = -2;
        for (var sweep : track.bySweep().entrySet()) {
            double now = sweep.getValue().stream().mapToDouble(piece -> piece.line().lengthKm()).sum();
            double longer = Math.max(now, before);
            double shorter = Math.min(now, before);
            if (sweep.getKey() == beforeSweep + 1 && longer > LENGTH_FACTOR * shorter
                    && longer - shorter > LENGTH_CHANGE_KM) {
                add(ReviewReason.LENGTH_JUMP, sweep.getKey(), 0.3 * (1 - shorter / longer),
                        "length %.0f to %.0f km between sweeps %d and %d", before, now, beforeSweep, sweep.getKey());
            }
            before = now;
            beforeSweep = sweep.getKey();
        }
    }

    private int longestSweep() {
        TrackPiece longest = track.pieces().get(0);
        for (TrackPiece piece : track.pieces()) {
            if (piece.line().lengthKm() > longest.line().lengthKm()) {
                longest = piece;
            }
        }
        return longest.sweep();
    }
}
