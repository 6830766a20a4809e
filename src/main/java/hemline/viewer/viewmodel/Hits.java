package hemline.viewer.viewmodel;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.geometry.Point;
import hemline.workflow.LoopSession;
import java.util.Optional;

/** What lies under a place of the plane. */
public final class Hits {
    private Hits() {
    }

    /** The track whose stretch in this sweep is nearest, within {@code reachKm}. */
    public static Optional<Track> track(LoopSession session, int sweep, Point place, double reachKm) {
        Track best = null;
        double nearest = reachKm;
        for (Track track : session.tracks()) {
            for (TrackPiece piece : track.pieces()) {
                if (piece.sweep() == sweep) {
                    double distance = piece.line().nearest(place).distanceKm();
                    if (distance <= nearest) {
                        nearest = distance;
                        best = track;
                    }
                }
            }
        }
        return Optional.ofNullable(best);
    }

    /** The nearest meeting within {@code reachKm}. */
    public static Optional<Meeting> meeting(LoopSession session, Point place, double reachKm) {
        return session.meetings().stream().filter(m -> m.place().distanceKm(place) <= reachKm)
                .min((a, b) -> Double.compare(a.place().distanceKm(place), b.place().distanceKm(place)));
    }
}
