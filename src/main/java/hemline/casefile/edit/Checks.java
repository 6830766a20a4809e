package hemline.casefile.edit;

import hemline.geometry.Point;
import java.util.List;

/** Bounds of what an edit may hold; a log from elsewhere may hold anything. */
final class Checks {
    /** No weather radar sees farther, km. */
    static final double FARTHEST_KM = 1000;
    /** More clicks than any hand makes in one go. */
    static final int MOST_POINTS = 20_000;
    static final int LONGEST_ID = 64;
    static final int LONGEST_WORDS = 10_000;
    private static final long EARLIEST_MS = -631_152_000_000L;
    private static final long LATEST_MS = 7_258_118_400_000L;

    private Checks() {
    }

    static void time(long timeMs) {
        if (timeMs < EARLIEST_MS || timeMs > LATEST_MS) {
            throw new IllegalArgumentException("a time must lie within 1950..2200, got " + timeMs + " ms");
        }
    }

    static void place(Point place) {
        if (!(Math.abs(place.xKm()) <= FARTHEST_KM && Math.abs(place.yKm()) <= FARTHEST_KM)) {
            throw new IllegalArgumentException("a place must lie within " + FARTHEST_KM + " km of the radar, got "
                    + place.xKm() + ", " + place.yKm());
        }
    }

    static List<Point> line(List<Point> points) {
        List<Point> line = List.copyOf(points);
        if (line.size() < 2 || line.size() > MOST_POINTS) {
            throw new IllegalArgumentException("a drawn line needs 2.." + MOST_POINTS + " points, got " + line.size());
        }
        line.forEach(Checks::place);
        if (line.stream().distinct().count() < 2) {
            throw new IllegalArgumentException("the points of a drawn line are all the same");
        }
        return line;
    }

    static void reach(double reachKm) {
        if (!(reachKm > 0 && reachKm <= FARTHEST_KM)) {
            throw new IllegalArgumentException("a nudge must reach above 0 and at most " + FARTHEST_KM + " km, got "
                    + reachKm);
        }
    }

    static void shortText(String what, String text) {
        length(what, text, LONGEST_ID);
    }

    static void words(String what, String text) {
        length(what, text, LONGEST_WORDS);
    }

    private static void length(String what, String text, int most) {
        if (text.length() > most) {
            throw new IllegalArgumentException(what + " may have " + most + " characters, got " + text.length());
        }
    }

    static void sequence(int sequence) {
        if (sequence < 1) {
            throw new IllegalArgumentException("an edit's number starts at 1, got " + sequence);
        }
    }
}
