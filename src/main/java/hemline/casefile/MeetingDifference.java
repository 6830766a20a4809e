package hemline.casefile;

import java.util.Locale;
import java.util.Optional;

/**
 * How one meeting differs between two states of a case.
 *
 * @param before as it was; empty when it is new
 * @param after  as it is; empty when it is gone
 */
public record MeetingDifference(Optional<CaseMeeting> before, Optional<CaseMeeting> after) {
    public MeetingDifference {
        if (before.isEmpty() && after.isEmpty()) {
            throw new IllegalArgumentException("a difference needs a meeting before or after");
        }
    }

    /** In one line, for a list or a status bar. */
    public String words() {
        CaseMeeting named = after.orElseGet(before::get);
        String pair = "meeting of " + named.meeting().trackA() + " and " + named.meeting().trackB();
        if (before.isEmpty()) {
            return pair + " is new";
        }
        if (after.isEmpty()) {
            return pair + " is gone";
        }
        CaseMeeting was = before.get();
        double seconds = (named.meeting().timeMs() - was.meeting().timeMs()) / 1000.0;
        double km = named.meeting().place().distanceKm(was.meeting().place());
        String verdict = was.verdict() == named.verdict() ? ""
                : ", " + was.verdict().label() + " → " + named.verdict().label();
        return pair + String.format(Locale.ROOT, ": %+.0f s, %.1f km", seconds, km) + verdict;
    }
}
