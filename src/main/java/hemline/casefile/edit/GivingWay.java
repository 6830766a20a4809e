package hemline.casefile.edit;

import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.casefile.edit.Course.Foot;
import hemline.geometry.Point;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Where a found stretch runs along a drawn one, and so gives way to it. A line that only crosses stays whole:
 * boundaries that meet do cross.
 *
 * @param covered what gives way, as it was
 * @param left    what stays on either side; ends below {@link #SHORTEST_LEFT_KM} go with what gives way
 */
record GivingWay(List<TrackPiece> covered, List<TrackPiece> left) {
    /** A thin line is 1 to 3 km wide: a drawn line so near a found one is the same line, km. */
    private static final double ALONGSIDE_KM = 1.5;
    private static final double ALONGSIDE_DEG = 30;
    /** A shorter run alongside may be chance, unless it is most of the stretch, km. */
    private static final double SHORTEST_RUN_KM = 3;
    private static final double MOST = 0.7;
    private static final double SHORTEST_LEFT_KM = 2;

    static Optional<GivingWay> of(TrackPiece found, TrackPiece drawn, SweepFrame frame) {
        if (apart(found, drawn)) {
            return Optional.empty();
        }
        Course course = new Course(found);
        List<double[]> runs = runs(course, new Course(drawn));
        if (runs.isEmpty()) {
            return Optional.empty();
        }
        List<TrackPiece> covered = new ArrayList<>();
        List<TrackPiece> left = new ArrayList<>();
        double done = 0;
        for (double[] run : runs) {
            Strokes.between(found, frame, done, run[0]).ifPresent(left::add);
            Strokes.between(found, frame, run[0], run[1]).ifPresent(covered::add);
            done = run[1];
        }
        Strokes.between(found, frame, done, course.lengthKm()).ifPresent(left::add);
        boolean all = runs.size() == 1 && runs.get(0)[0] == 0 && runs.get(0)[1] == course.lengthKm();
        return Optional.of(new GivingWay(all ? List.of(found) : covered, left));
    }

    /** Stretches of the found line, from and to km along it, that run along the drawn one. */
    private static List<double[]> runs(Course found, Course drawn) {
        List<double[]> runs = new ArrayList<>();
        int start = -1;
        for (int i = 0; i <= found.size(); i++) {
            boolean beside = i < found.size() && alongside(found, i, drawn);
            if (beside && start < 0) {
                start = i;
            } else if (!beside && start >= 0) {
                addRun(runs, found, found.alongKm(start), found.alongKm(i - 1));
                start = -1;
            }
        }
        return runs;
    }

    private static void addRun(List<double[]> runs, Course found, double fromKm, double toKm) {
        double length = toKm - fromKm;
        if (length < SHORTEST_RUN_KM && length < MOST * found.lengthKm()) {
            return;
        }
        double from = fromKm < SHORTEST_LEFT_KM ? 0 : fromKm;
        double to = found.lengthKm() - toKm < SHORTEST_LEFT_KM ? found.lengthKm() : toKm;
        double[] last = runs.isEmpty() ? null : runs.get(runs.size() - 1);
        if (last != null && from - last[1] < SHORTEST_LEFT_KM) {
            last[1] = to;
        } else {
            runs.add(new double[] {from, to});
        }
    }

    private static boolean alongside(Course found, int vertex, Course drawn) {
        Foot foot = drawn.nearest(found.place(vertex));
        if (foot.distanceKm() > ALONGSIDE_KM) {
            return false;
        }
        Point a = found.heading(found.alongKm(vertex));
        Point b = drawn.heading(foot.alongKm());
        // Lines have no direction of travel to compare, so opposite headings count as parallel.
        double angleDeg = Math.toDegrees(Math.atan2(Math.abs(a.cross(b)), Math.abs(a.dot(b))));
        return angleDeg <= ALONGSIDE_DEG;
    }

    private static boolean apart(TrackPiece found, TrackPiece drawn) {
        for (TrackVertex vertex : drawn.vertices()) {
            if (Course.mayLieWithin(found, vertex.position(), ALONGSIDE_KM)) {
                return false;
            }
        }
        // A found stretch so short that it fits between two drawn vertices is caught from its own side.
        for (TrackVertex vertex : found.vertices()) {
            if (Course.mayLieWithin(drawn, vertex.position(), ALONGSIDE_KM)) {
                return false;
            }
        }
        return true;
    }
}
