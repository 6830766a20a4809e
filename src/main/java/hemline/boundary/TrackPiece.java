package hemline.boundary;

import hemline.geometry.Point;
import hemline.geometry.Polyline;
import java.util.List;

/**
 * One connected stretch of a track in one sweep; a track can have several in a sweep, with gaps between them.
 *
 * @param sweep    index of the sweep in the loop
 * @param kind     how it shows there
 * @param origin   found or drawn
 * @param vertices in order along the line, at least two, at most 1 km apart
 */
public record TrackPiece(int sweep, BoundaryKind kind, Origin origin, List<TrackVertex> vertices) {
    public TrackPiece {
        vertices = List.copyOf(vertices);
        if (vertices.size() < 2) {
            throw new IllegalArgumentException("a stretch of a track needs two vertices, got " + vertices.size());
        }
    }

    public List<Point> points() {
        return vertices.stream().map(TrackVertex::position).toList();
    }

    public Polyline line() {
        return new Polyline(points());
    }

    /** Mean of the vertices' times, ms since 1970-01-01T00:00Z. */
    public long meanTimeMs() {
        long first = vertices.get(0).timeMs();
        double sum = 0;
        for (TrackVertex vertex : vertices) {
            sum += vertex.timeMs() - first;
        }
        return first + Math.round(sum / vertices.size());
    }
}
