package hemline.boundary;

import hemline.geometry.Point;
import hemline.geometry.Polyline;
import java.util.List;

/**
 * A boundary found in one sweep.
 *
 * @param sweep    index of the sweep in the loop
 * @param kind     how it shows
 * @param vertices in order along the line, at least two, about 1 km apart
 * @param evidence why it is believed
 */
public record ObservedBoundary(int sweep, BoundaryKind kind, List<ObservedVertex> vertices, Evidence evidence) {
    public ObservedBoundary {
        vertices = List.copyOf(vertices);
        if (vertices.size() < 2) {
            throw new IllegalArgumentException("a boundary needs two vertices, got " + vertices.size());
        }
    }

    public List<Point> points() {
        return vertices.stream().map(ObservedVertex::position).toList();
    }

    public Polyline line() {
        return new Polyline(points());
    }
}
