package hemline.meeting;

import hemline.boundary.ArcHistory;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;

/**
 * Where a track is at the end of the loop: its lines of the last sweep that shows it, and what earlier sweeps showed
 * of it elsewhere.
 */
final class CurrentLines {
    /** A track that was last seen this many sweeps before the end is over. */
    private static final int MOST_MISSED = 2;
    /** Sweeps whose lines may still stand for the present. */
    private static final int BACK = 3;
    /** An earlier line this near to a later one, carried on to its time, is the same, km. */
    private static final double SAME_KM = 4;

    private CurrentLines() {
    }

    /** The radius of a track's arc at a sweep, km; NaN where it has none. */
    static double radiusKm(Track track, int sweep) {
        return track.arc().stream().flatMap(arc -> arc.radii().stream()).filter(r -> r.sweep() == sweep)
                .mapToDouble(ArcHistory.RadiusAt::radiusKm).findFirst().orElse(Double.NaN);
    }

    /** The lines of one sweep. */
    static List<MovingLine> of(Track track, List<TrackPiece> pieces, long originMs, double extendKm) {
        double fallback = track.speed().isKnown() ? track.speed().speedMs() : 5;
        List<MovingLine> lines = new ArrayList<>();
        for (TrackPiece piece : pieces) {
            lines.add(MovingLine.of(piece, originMs, extendKm, fallback, radiusKm(track, piece.sweep())));
        }
        return lines;
    }

    /** The lines of the present; empty for a track that is over. */
    static List<MovingLine> atEnd(Track track, List<SweepFrame> frames, double extendKm) {
        SortedMap<Integer, List<TrackPiece>> bySweep = track.bySweep();
        int last = bySweep.lastKey();
        if (last < frames.size() - 1 - MOST_MISSED) {
            return List.of();
        }
        long originMs = frames.get(0).meanTimeMs();
        List<MovingLine> present = new ArrayList<>(of(track, bySweep.get(last), originMs, extendKm));
        for (int k = last - 1; k >= Math.max(0, last - BACK); k--) {
            if (bySweep.containsKey(k)) {
                List<MovingLine> later = List.copyOf(present);
                for (MovingLine line : of(track, bySweep.get(k), originMs, 0)) {
                    present.addAll(line.apartFrom(later, SAME_KM));
                }
            }
        }
        return present;
    }
}
