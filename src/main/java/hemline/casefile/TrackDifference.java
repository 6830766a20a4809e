package hemline.casefile;

import hemline.boundary.Speed;
import hemline.boundary.Track;
import java.util.Locale;
import java.util.Optional;

/**
 * How one boundary differs between two states of a case.
 *
 * @param before  as it was; empty when it is new
 * @param after   as it is; empty when it is gone
 * @param shiftKm median distance of the new line from the old one, km; NaN when either is missing
 */
public record TrackDifference(Optional<Track> before, Optional<Track> after, double shiftKm) {
    public TrackDifference {
        if (before.isEmpty() && after.isEmpty()) {
            throw new IllegalArgumentException("a difference needs a track before or after");
        }
    }

    /** In one line, for a list or a status bar. */
    public String words() {
        if (before.isEmpty()) {
            return after.get().id() + " is new: " + facts(after.get());
        }
        if (after.isEmpty()) {
            return before.get().id() + " is gone: " + facts(before.get());
        }
        String was = before.get().id();
        String is = after.get().id();
        return is + (was.equals(is) ? "" : " (was " + was + ")") + ": " + facts(before.get()) + " → "
                + facts(after.get()) + (shiftKm >= 0.05 ? String.format(Locale.ROOT, ", moved %.1f km", shiftKm) : "");
    }

    private static String facts(Track track) {
        Speed speed = track.speed();
        String motion = speed.isKnown()
                ? String.format(Locale.ROOT, "%.1f ± %.1f m s⁻¹", speed.speedMs(), speed.sdMs()) : "speed unknown";
        return String.format(Locale.ROOT, "%d sweeps, %.1f km, %s", track.sweepCount(), track.maxLengthKm(), motion);
    }
}
