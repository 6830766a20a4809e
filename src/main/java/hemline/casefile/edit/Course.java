package hemline.casefile.edit;

import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geometry.Point;
import java.util.List;

/** A stretch measured along its vertices, which keep their numbers even where two of them coincide. */
final class Course {
    private final List<TrackVertex> vertices;
    private final double[] alongKm;

    Course(TrackPiece piece) {
        vertices = piece.vertices();
        alongKm = new double[vertices.size()];
        for (int i = 1; i < alongKm.length; i++) {
            alongKm[i] = alongKm[i - 1] + place(i).distanceKm(place(i - 1));
        }
    }

    /** Cheap first look: false only where no point of the stretch can be that near. */
    static boolean mayLieWithin(TrackPiece piece, Point of, double km) {
        double west = Double.POSITIVE_INFINITY;
        double east = Double.NEGATIVE_INFINITY;
        double south = Double.POSITIVE_INFINITY;
        double north = Double.NEGATIVE_INFINITY;
        for (TrackVertex vertex : piece.vertices()) {
            west = Math.min(west, vertex.position().xKm());
            east = Math.max(east, vertex.position().xKm());
            south = Math.min(south, vertex.position().yKm());
            north = Math.max(north, vertex.position().yKm());
        }
        return of.xKm() >= west - km && of.xKm() <= east + km && of.yKm() >= south - km && of.yKm() <= north + km;
    }

    int size() {
        return alongKm.length;
    }

    TrackVertex vertex(int i) {
        return vertices.get(i);
    }

    Point place(int i) {
        return vertices.get(i).position();
    }

    double alongKm(int i) {
        return alongKm[i];
    }

    double lengthKm() {
        return alongKm[alongKm.length - 1];
    }

    /** The place {@code sKm} along; beyond the ends, the end itself. */
    Point at(double sKm) {
        int i = segment(sKm);
        double span = alongKm[i + 1] - alongKm[i];
        double share = span > 0 ? Math.max(0, Math.min(1, (sKm - alongKm[i]) / span)) : 0;
        return share == 0 ? place(i) : share == 1 ? place(i + 1)
                : place(i).plus(place(i + 1).minus(place(i)).times(share));
    }

    /** Direction of travel there; of no fixed length, zero where the line stands still. */
    Point heading(double sKm) {
        int i = segment(sKm);
        return place(i + 1).minus(place(i));
    }

    private int segment(double sKm) {
        int i = 0;
        while (i < alongKm.length - 2 && alongKm[i + 1] <= sKm) {
            i++;
        }
        return i;
    }

    Foot nearest(Point to) {
        double bestKm = Double.POSITIVE_INFINITY;
        double bestAlong = 0;
        for (int i = 0; i + 1 < alongKm.length; i++) {
            Point step = place(i + 1).minus(place(i));
            double square = step.dot(step);
            double share = square > 0 ? Math.max(0, Math.min(1, to.minus(place(i)).dot(step) / square)) : 0;
            double distance = place(i).plus(step.times(share)).distanceKm(to);
            if (distance < bestKm) {
                bestKm = distance;
                bestAlong = alongKm[i] + share * (alongKm[i + 1] - alongKm[i]);
            }
        }
        return new Foot(bestKm, bestAlong);
    }

    /** The place of a stretch nearest to a point: how far from it, and how far along, km. */
    record Foot(double distanceKm, double alongKm) {
    }
}
