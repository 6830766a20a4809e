package hemline.casefile.edit;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import java.util.List;
import java.util.Optional;

/**
 * A place on a stretch of a track.
 *
 * @param index   of the stretch among the track's
 * @param alongKm from the start of the stretch
 * @param rank    how ill it fits the anchor: its distance, km, more where the id differs
 */
record Spot(Track track, int index, double alongKm, double rank) {
    /** A line found again by another run lies within a few gates and half a beam's width of the first, km. */
    static final double WITHIN_KM = 4;
    /** What a differing id costs, km: the same id wins among neighbours, but not from far. */
    private static final double OTHER_ID_KM = 1;

    TrackPiece piece() {
        return track.pieces().get(index);
    }

    Course course() {
        return new Course(piece());
    }

    /** The best of the stretches of some tracks on one sweep, if any lies near enough; the first of equals. */
    static Optional<Spot> nearest(List<Track> tracks, int sweep, Anchor anchor) {
        Spot best = null;
        for (Track track : tracks) {
            double extra = anchor.id().isEmpty() || track.id().equals(anchor.id()) ? 0 : OTHER_ID_KM;
            for (int i = 0; i < track.pieces().size(); i++) {
                TrackPiece piece = track.pieces().get(i);
                if (piece.sweep() == sweep && Course.mayLieWithin(piece, anchor.place(), WITHIN_KM)) {
                    Course.Foot foot = new Course(piece).nearest(anchor.place());
                    double rank = foot.distanceKm() + extra;
                    if (foot.distanceKm() <= WITHIN_KM && (best == null || rank < best.rank())) {
                        best = new Spot(track, i, foot.alongKm(), rank);
                    }
                }
            }
        }
        return Optional.ofNullable(best);
    }
}
