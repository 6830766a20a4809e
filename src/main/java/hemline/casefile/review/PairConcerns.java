package hemline.casefile.review;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.casefile.edit.Sweeps;
import hemline.geometry.Point;
import hemline.geometry.Polyline;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.SortedMap;

/** What speaks for two tracks being one. Bounds are common practice, no source. */
final class PairConcerns {
    private static final int MOST_SWEEPS_BETWEEN = 3;
    /** A line moved on by its speed lands this near to where it is next seen, km. */
    private static final double GOES_ON_KM = 6;
    private static final double ALONGSIDE_KM = 4;
    private static final double SHARE = 0.5;

    private PairConcerns() {
    }

    static List<Concern> of(List<Track> tracks, Sweeps sweeps) {
        List<Concern> found = new ArrayList<>();
        for (int i = 0; i < tracks.size(); i++) {
            for (int j = 0; j < tracks.size(); j++) {
                if (i != j) {
                    goesOn(tracks.get(i), tracks.get(j), sweeps, found);
                }
                if (i < j) {
                    alongside(tracks.get(i), tracks.get(j), found);
                }
            }
        }
        return found;
    }

    private static void goesOn(Track ended, Track begun, Sweeps sweeps, List<Concern> found) {
        SortedMap<Integer, List<TrackPiece>> before = ended.bySweep();
        SortedMap<Integer, List<TrackPiece>> after = begun.bySweep();
        int last = before.lastKey();
        int first = after.firstKey();
        if (first <= last || first > last + MOST_SWEEPS_BETWEEN || !ended.speed().isKnown()) {
            return;
        }
        double seconds = (sweeps.meanMs(first) - sweeps.meanMs(last)) / 1000.0;
        Point moved = Point.towards(ended.bearingDeg()).times(ended.speed().speedMs() * seconds / 1000);
        double share = share(after.get(first), before.get(last), moved, GOES_ON_KM);
        if (share >= SHARE) {
            String words = String.format(Locale.ROOT, "%s goes on where %s ends, %.0f s later", begun.id(), ended.id(),
                    seconds);
            found.add(new Concern(ended.id(), ReviewReason.BROKEN, last, 0.6 * share, words));
            found.add(new Concern(begun.id(), ReviewReason.BROKEN, first, 0.6 * share, words));
        }
    }

    private static void alongside(Track one, Track other, List<Concern> found) {
        SortedMap<Integer, List<TrackPiece>> ones = one.bySweep();
        SortedMap<Integer, List<TrackPiece>> others = other.bySweep();
        int sweeps = 0;
        int at = -1;
        for (var sweep : ones.entrySet()) {
            List<TrackPiece> beside = others.get(sweep.getKey());
            Point still = new Point(0, 0);
            if (beside != null && Math.max(share(sweep.getValue(), beside, still, ALONGSIDE_KM),
                    share(beside, sweep.getValue(), still, ALONGSIDE_KM)) >= SHARE) {
                sweeps++;
                at = at < 0 ? sweep.getKey() : at;
            }
        }
        int shorter = Math.min(ones.size(), others.size());
        if (sweeps >= 2 && sweeps >= SHARE * shorter) {
            double weight = 0.6 * Math.min(1, sweeps / (double) shorter);
            String words = String.format(Locale.ROOT, "%s and %s run side by side on %d sweeps", one.id(), other.id(),
                    sweeps);
            found.add(new Concern(one.id(), ReviewReason.DOUBLED, at, weight, words));
            found.add(new Concern(other.id(), ReviewReason.DOUBLED, at, weight, words));
        }
    }

    /** Share of the vertices of some lines that lie near others moved by a displacement. */
    private static double share(List<TrackPiece> of, List<TrackPiece> near, Point moved, double withinKm) {
        List<Polyline> lines = near.stream().map(TrackPiece::line).toList();
        int all = 0;
        int close = 0;
        for (TrackPiece piece : of) {
            for (TrackVertex vertex : piece.vertices()) {
                Point place = vertex.position().minus(moved);
                all++;
                close += lines.stream().anyMatch(line -> line.nearest(place).distanceKm() <= withinKm) ? 1 : 0;
            }
        }
        return close / (double) all;
    }
}
