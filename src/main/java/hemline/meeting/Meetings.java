package hemline.meeting;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;

/** Finds where and when tracks met within the loop, or are expected to after its end. */
public final class Meetings {
    private Meetings() {
    }

    /**
     * Meetings by rising time; ids {@code M1}, {@code M2}, … in that order.
     *
     * @param tracks with speeds measured
     * @param frames every sweep of the loop, by rising index from 0
     */
    public static List<Meeting> find(List<Track> tracks, List<SweepFrame> frames, MeetingSettings settings) {
        List<Meeting> found = new ArrayList<>();
        if (!frames.isEmpty()) {
            ObservedMeetings observed = new ObservedMeetings(frames, settings);
            ExpectedMeetings expected = new ExpectedMeetings(frames, settings);
            for (int a = 0; a < tracks.size(); a++) {
                for (int b = a + 1; b < tracks.size(); b++) {
                    Track first = tracks.get(a);
                    Track second = tracks.get(b);
                    observed.of(first, second).or(() -> expected.of(first, second)).ifPresent(found::add);
                }
            }
        }
        found.sort(Comparator.comparingLong(Meeting::timeMs).thenComparing(Meeting::trackA)
                .thenComparing(Meeting::trackB));
        List<Meeting> named = new ArrayList<>(found.size());
        for (int i = 0; i < found.size(); i++) {
            Meeting m = found.get(i);
            named.add(new Meeting(String.format(Locale.ROOT, "M%d", i + 1), m.trackA(), m.trackB(), m.timeMs(),
                    m.timeSdS(), m.place(), m.ellipse(), m.crossingAngleDeg(), m.closing(), m.status(),
                    m.probability()));
        }
        return named;
    }
}
