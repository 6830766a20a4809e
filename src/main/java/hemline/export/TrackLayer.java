package hemline.export;

import hemline.boundary.Meeting;
import hemline.boundary.Origin;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geometry.Point;
import java.awt.Color;
import java.awt.geom.Path2D;
import java.util.List;

/** Boundaries and meetings: found lines whole, hand-drawn ones dashed; meetings as diamonds, filled when observed. */
final class TrackLayer {
    private static final float[] SOLID = {};
    private static final float[] DASHED = {9, 5};
    /** Length of an arrow: the way covered in this time. */
    private static final double ARROW_S = 600;
    private static final int ARROW_EVERY = 12;

    private final Ink ink;
    private final PlaneView view;

    TrackLayer(Ink ink, PlaneView view) {
        this.ink = ink;
        this.view = view;
    }

    /** The stretches of one track in one sweep. */
    void stretches(List<TrackPiece> pieces, Color color, double width) {
        for (TrackPiece piece : pieces) {
            ink.rimmedLine(PlaneLayer.line(view, piece.points()), color, width,
                    piece.origin() == Origin.HAND ? DASHED : SOLID);
        }
    }

    /** Arrows along the normal, as long as the way of ten minutes. */
    void arrows(List<TrackPiece> pieces, Color color) {
        for (TrackPiece piece : pieces) {
            List<TrackVertex> vertices = piece.vertices();
            for (int i = Math.min(ARROW_EVERY, vertices.size()) / 2; i < vertices.size(); i += ARROW_EVERY) {
                TrackVertex vertex = vertices.get(i);
                if (vertex.speed().isKnown() && vertex.speed().speedMs() > 0) {
                    arrow(vertex, color);
                }
            }
        }
    }

    private void arrow(TrackVertex vertex, Color color) {
        double km = vertex.speed().speedMs() * ARROW_S / 1000;
        Point along = Point.towards(vertex.normalBearingDeg());
        Point tip = vertex.position().plus(along.times(km));
        Point side = new Point(-along.yKm(), along.xKm());
        double head = 7 / view.pxPerKm();
        Path2D path = PlaneLayer.line(view, List.of(vertex.position(), tip));
        path.append(PlaneLayer.line(view, List.of(tip.minus(along.times(head)).plus(side.times(head / 2)), tip,
                tip.minus(along.times(head)).minus(side.times(head / 2)))), false);
        ink.rimmedLine(path, color, 1.4);
    }

    /** The name of a track beside the middle of its longest stretch. */
    void label(Track track, List<TrackPiece> pieces, Color color) {
        TrackPiece longest = pieces.get(0);
        for (TrackPiece piece : pieces) {
            longest = piece.vertices().size() > longest.vertices().size() ? piece : longest;
        }
        Point at = longest.vertices().get(longest.vertices().size() / 2).position();
        ink.rimmedWords(track.id(), view.x(at) + 7, view.y(at) - 7, 11, color);
    }

    void meeting(Meeting meeting) {
        double x = view.x(meeting.place());
        double y = view.y(meeting.place());
        Path2D diamond = new Path2D.Double();
        diamond.moveTo(x, y - 8);
        diamond.lineTo(x + 8, y);
        diamond.lineTo(x, y + 8);
        diamond.lineTo(x - 8, y);
        diamond.closePath();
        ink.rimmedLine(PlaneLayer.line(view, MeetingsGeoJson.ellipse(meeting)), Ink.MEETING, 1);
        if (meeting.status() == Meeting.Status.OBSERVED) {
            ink.graphics().setColor(Ink.MEETING);
            ink.graphics().fill(diamond);
        }
        ink.rimmedLine(diamond, Ink.MEETING, 1.8);
        ink.rimmedWords(meeting.id() + " " + Times.clock(meeting.timeMs()).substring(0, 5), x + 12, y + 4, 11,
                Ink.MEETING);
    }
}
