package hemline.pipeline;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import java.util.List;

/**
 * How much was found at each stage.
 *
 * @param sweeps           sweeps analysed
 * @param observed         boundaries found sweep by sweep, before linking
 * @param tracks           boundaries followed through time
 * @param arcs             tracks with an arc fitted through time
 * @param meetingsObserved meetings within the loop
 * @param meetingsExpected meetings foreseen after its end
 */
public record Counts(int sweeps, int observed, int tracks, int arcs, int meetingsObserved, int meetingsExpected) {

    public static Counts of(int sweeps, int observed, List<Track> tracks, List<Meeting> meetings) {
        int seen = (int) meetings.stream().filter(m -> m.status() == Meeting.Status.OBSERVED).count();
        int arcs = (int) tracks.stream().filter(t -> t.arc().isPresent()).count();
        return new Counts(sweeps, observed, tracks.size(), arcs, seen, meetings.size() - seen);
    }

    Counts with(List<Track> newTracks, List<Meeting> newMeetings) {
        return of(sweeps, observed, newTracks, newMeetings);
    }
}
