package hemline.casefile.edit;

import hemline.boundary.BoundaryKind;
import hemline.boundary.Origin;
import hemline.boundary.Speed;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geometry.Point;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;

/**
 * Makes stretches by hand. A vertex put where none was takes its time and beam height from the sweep; its
 * reflectivity is NaN until it is read from the sweep again, never guessed from its neighbours.
 */
final class Strokes {
    /** Vertices lie at most this far apart, km. */
    static final double SPACING_KM = 1;
    /** What is left of a stretch below this is nothing, km: less than a gate. */
    static final double SHORTEST_KM = 0.1;
    private static final double SAME_PLACE_KM = 1e-6;

    private Strokes() {
    }

    static TrackPiece drawn(SweepFrame frame, BoundaryKind kind, List<Point> line) {
        List<TrackVertex> vertices = new ArrayList<>();
        line.forEach(point -> addDense(vertices, frame, vertexAt(frame, point)));
        return new TrackPiece(frame.index(), kind, Origin.HAND, vertices);
    }

    /** What lies between two distances along a stretch; empty where it is shorter than {@link #SHORTEST_KM}. */
    static Optional<TrackPiece> between(TrackPiece piece, SweepFrame frame, double fromKm, double toKm) {
        Course course = new Course(piece);
        double start = Math.max(0, fromKm);
        double end = Math.min(course.lengthKm(), toKm);
        if (end - start < SHORTEST_KM) {
            return Optional.empty();
        }
        List<TrackVertex> kept = new ArrayList<>();
        for (int i = 0; i < course.size(); i++) {
            double along = course.alongKm(i);
            if (along >= start - SAME_PLACE_KM && along <= end + SAME_PLACE_KM) {
                if (kept.isEmpty() && along > start + SAME_PLACE_KM) {
                    kept.add(vertexAt(frame, course.at(start)));
                }
                kept.add(still(course.vertex(i)));
            }
        }
        if (kept.isEmpty()) {
            kept.add(vertexAt(frame, course.at(start)));
        }
        Point last = course.at(end);
        if (kept.get(kept.size() - 1).position().distanceKm(last) > SAME_PLACE_KM) {
            kept.add(vertexAt(frame, last));
        }
        return Optional.of(new TrackPiece(piece.sweep(), piece.kind(), Origin.HAND, kept));
    }

    /** The stretch pulled so that the place {@code alongKm} along it comes to lie at {@code to}. */
    static TrackPiece nudged(TrackPiece piece, SweepFrame frame, double alongKm, Point to, double reachKm) {
        Course course = new Course(piece);
        Point shift = to.minus(course.at(alongKm));
        List<TrackVertex> vertices = new ArrayList<>();
        boolean held = false;
        for (int i = 0; i < course.size(); i++) {
            double along = course.alongKm(i);
            if (!held && along >= alongKm - SAME_PLACE_KM) {
                addDense(vertices, frame, vertexAt(frame, to));
                held = true;
                if (along <= alongKm + SAME_PLACE_KM) {
                    continue;
                }
            }
            double weight = biweight((along - alongKm) / reachKm);
            addDense(vertices, frame, weight == 0 ? still(course.vertex(i))
                    : vertexAt(frame, course.place(i).plus(shift.times(weight))));
        }
        return new TrackPiece(piece.sweep(), piece.kind(), Origin.HAND, vertices);
    }

    /** Smooth to both ends, so that a pulled line has no kink: 1 in the middle, 0 from one reach away. */
    private static double biweight(double u) {
        double rest = 1 - u * u;
        return rest <= 0 ? 0 : rest * rest;
    }

    /** Both stretches as one, in the direction of the first, over a straight line between their nearest ends. */
    static TrackPiece joined(TrackPiece first, TrackPiece second, SweepFrame frame) {
        Point head = first.vertices().get(0).position();
        Point tail = last(first).position();
        Point otherHead = second.vertices().get(0).position();
        Point otherTail = last(second).position();
        double after = Math.min(tail.distanceKm(otherHead), tail.distanceKm(otherTail));
        double ahead = Math.min(head.distanceKm(otherHead), head.distanceKm(otherTail));
        List<TrackVertex> vertices = new ArrayList<>();
        if (after <= ahead) {
            append(vertices, frame, first.vertices());
            append(vertices, frame, tail.distanceKm(otherHead) <= tail.distanceKm(otherTail)
                    ? second.vertices() : reversed(second.vertices()));
        } else {
            append(vertices, frame, head.distanceKm(otherTail) <= head.distanceKm(otherHead)
                    ? second.vertices() : reversed(second.vertices()));
            append(vertices, frame, first.vertices());
        }
        return new TrackPiece(first.sweep(), first.kind(), Origin.HAND, vertices);
    }

    /** The same stretch without speeds: they belonged to its track as it was. */
    static TrackPiece still(TrackPiece piece) {
        return as(piece, piece.kind(), piece.origin());
    }

    /** The same stretch, now of that kind. */
    static TrackPiece ofKind(TrackPiece piece, BoundaryKind kind) {
        return as(piece, kind, Origin.HAND);
    }

    /** The same stretch, now where it is by a person's word. */
    static TrackPiece byHand(TrackPiece piece) {
        return as(piece, piece.kind(), Origin.HAND);
    }

    private static TrackPiece as(TrackPiece piece, BoundaryKind kind, Origin origin) {
        return new TrackPiece(piece.sweep(), kind, origin, piece.vertices().stream().map(Strokes::still).toList());
    }

    private static void append(List<TrackVertex> to, SweepFrame frame, List<TrackVertex> more) {
        more.forEach(vertex -> addDense(to, frame, still(vertex)));
    }

    /** Adds a vertex, with more before it where it is far from the last; one at the same place is left out. */
    private static void addDense(List<TrackVertex> to, SweepFrame frame, TrackVertex next) {
        if (!to.isEmpty()) {
            Point from = to.get(to.size() - 1).position();
            double gap = from.distanceKm(next.position());
            if (gap == 0) {
                return;
            }
            int steps = (int) Math.ceil(gap / SPACING_KM - 1e-9);
            for (int i = 1; i < steps; i++) {
                to.add(vertexAt(frame, from.plus(next.position().minus(from).times((double) i / steps))));
            }
        }
        to.add(next);
    }

    private static TrackVertex vertexAt(SweepFrame frame, Point place) {
        return new TrackVertex(place, frame.timeAtMs(place), Double.NaN, frame.beamHeightM(place), Double.NaN,
                Speed.UNKNOWN, true);
    }

    private static TrackVertex still(TrackVertex vertex) {
        return vertex.withMotion(Double.NaN, Speed.UNKNOWN);
    }

    private static List<TrackVertex> reversed(List<TrackVertex> vertices) {
        List<TrackVertex> back = new ArrayList<>(vertices);
        Collections.reverse(back);
        return back;
    }

    private static TrackVertex last(TrackPiece piece) {
        return piece.vertices().get(piece.vertices().size() - 1);
    }
}
