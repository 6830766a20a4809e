package hemline.casefile.edit;

import hemline.boundary.Track;
import hemline.geometry.Point;
import java.time.Instant;
import java.util.Locale;

/** How places, times and tracks are put into words; the same on every machine. */
final class Words {
    private Words() {
    }

    static String time(long timeMs) {
        return Instant.ofEpochMilli(timeMs).toString();
    }

    static String place(Point place) {
        return String.format(Locale.ROOT, "%.1f km east, %.1f km north", place.xKm(), place.yKm());
    }

    /** A track in short: sweeps, stretches, length of all of them together. */
    static String track(String id, Track track) {
        if (track == null) {
            return id + ": none";
        }
        double lengthKm = 0;
        for (var piece : track.pieces()) {
            lengthKm += new Course(piece).lengthKm();
        }
        return String.format(Locale.ROOT, "%s: %d sweeps, %d stretches, %.2f km", id, track.sweepCount(),
                track.pieces().size(), lengthKm);
    }
}
