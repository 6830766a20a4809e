package hemline.casefile.edit;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.geometry.Point;
import hemline.sweep.SweepFrame;
import java.util.List;

/**
 * Names a stretch of a boundary by where and when it is; its track's id only helps to choose, since a new run may
 * give other ids.
 *
 * @param id     the track's id when the edit was made; empty when it does not matter
 * @param timeMs mean time of the sweep, ms since 1970-01-01T00:00Z
 * @param place  on the stretch, km east and north of the radar
 */
public record Anchor(String id, long timeMs, Point place) {
    public Anchor {
        Checks.shortText("id of an anchor", id);
        Checks.time(timeMs);
        Checks.place(place);
    }

    /** The anchor of a stretch at the place of it nearest to {@code near}. */
    public static Anchor of(String trackId, TrackPiece piece, List<SweepFrame> frames, Point near) {
        Point foot = piece.line().nearest(near).foot();
        return new Anchor(trackId, frames.get(piece.sweep()).meanTimeMs(), foot);
    }

    /** An anchor for a track as a whole: the middle of its longest stretch, the earliest of equals. */
    public static Anchor of(Track track, List<SweepFrame> frames) {
        TrackPiece longest = track.pieces().get(0);
        for (TrackPiece piece : track.pieces()) {
            if (piece.line().lengthKm() > longest.line().lengthKm()) {
                longest = piece;
            }
        }
        return of(track.id(), longest, frames, longest.line().at(longest.line().lengthKm() / 2));
    }
}
