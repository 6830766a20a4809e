package hemline.casefile;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.casefile.edit.Sweeps;
import hemline.geometry.Point;
import hemline.geometry.Polyline;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Finds out which track of one state is which of another, by where their lines are. */
final class TrackMatching {
    /** Two lines farther apart are not the same boundary, km. */
    private static final double SAME_LINE_KM = 4;
    /** At least this share of the shorter one must lie along the other. */
    private static final double SAME_TRACK_SHARE = 0.3;

    private final Sweeps before;
    private final Sweeps after;

    TrackMatching(Sweeps before, Sweeps after) {
        this.before = before;
        this.after = after;
    }

    /** Pairs of tracks, best first; each track in at most one pair. */
    List<Pair> match(List<Track> olds, List<Track> news) {
        List<Pair> candidates = new ArrayList<>();
        for (Track old : olds) {
            for (Track now : news) {
                Pair pair = compare(old, now);
                if (pair.share() >= SAME_TRACK_SHARE) {
                    candidates.add(pair);
                }
            }
        }
        candidates.sort((a, b) -> Double.compare(b.share(), a.share()));
        List<Track> taken = new ArrayList<>();
        List<Pair> pairs = new ArrayList<>();
        for (Pair pair : candidates) {
            boolean free = taken.stream().noneMatch(track -> track == pair.before() || track == pair.after());
            if (free) {
                taken.add(pair.before());
                taken.add(pair.after());
                pairs.add(pair);
            }
        }
        return pairs;
    }

    /** How far one track lies from another where both are present. */
    Pair compare(Track old, Track now) {
        Map<Long, List<Line>> oldLines = lines(old, before);
        Map<Long, List<Line>> newLines = lines(now, after);
        List<Double> distances = new ArrayList<>();
        int newVertices = 0;
        int oldVertices = oldLines.values().stream().flatMap(List::stream).mapToInt(l -> l.places().size()).sum();
        for (Map.Entry<Long, List<Line>> sweep : newLines.entrySet()) {
            for (Line line : sweep.getValue()) {
                newVertices += line.places().size();
                for (Line other : oldLines.getOrDefault(sweep.getKey(), List.of())) {
                    line.nearOnes(other, distances);
                }
            }
        }
        double share = Math.min(1, distances.size() / (double) Math.max(1, Math.min(oldVertices, newVertices)));
        return new Pair(old, now, share, median(distances));
    }

    private static double median(List<Double> values) {
        double[] sorted = values.stream().mapToDouble(Double::doubleValue).sorted().toArray();
        if (sorted.length == 0) {
            return Double.NaN;
        }
        return (sorted[(sorted.length - 1) / 2] + sorted[sorted.length / 2]) / 2;
    }

    private static Map<Long, List<Line>> lines(Track track, Sweeps sweeps) {
        Map<Long, List<Line>> lines = new HashMap<>();
        for (TrackPiece piece : track.pieces()) {
            lines.computeIfAbsent(sweeps.meanMs(piece.sweep()), time -> new ArrayList<>()).add(Line.of(piece));
        }
        return lines;
    }

    /**
     * Two tracks and how well they agree.
     *
     * @param share   of the vertices of the shorter one that lie along the other, 0 to 1
     * @param shiftKm median distance of those, km; NaN where there are none
     */
    record Pair(Track before, Track after, double share, double shiftKm) {
    }

    private record Line(List<Point> places, double[] box) {
        static Line of(TrackPiece piece) {
            double[] box = {Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY,
                Double.NEGATIVE_INFINITY};
            for (TrackVertex vertex : piece.vertices()) {
                box[0] = Math.min(box[0], vertex.position().xKm());
                box[1] = Math.min(box[1], vertex.position().yKm());
                box[2] = Math.max(box[2], vertex.position().xKm());
                box[3] = Math.max(box[3], vertex.position().yKm());
            }
            return new Line(piece.points(), box);
        }

        void nearOnes(Line other, List<Double> distances) {
            boolean apart = box[0] > other.box[2] + SAME_LINE_KM || other.box[0] > box[2] + SAME_LINE_KM
                    || box[1] > other.box[3] + SAME_LINE_KM || other.box[1] > box[3] + SAME_LINE_KM;
            if (apart || Arrays.stream(other.box).anyMatch(Double::isNaN)) {
                return;
            }
            Polyline line = new Polyline(other.places);
            for (Point place : places) {
                double distance = line.nearest(place).distanceKm();
                if (distance <= SAME_LINE_KM) {
                    distances.add(distance);
                }
            }
        }
    }
}
