package hemline.casefile;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.casefile.TrackMatching.Pair;
import hemline.casefile.edit.SameMeeting;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Stream;

/**
 * What differs between two states of a case.
 *
 * @param tracks   boundaries that changed, are new or are gone
 * @param meetings meetings that changed, are new or are gone
 */
public record Differences(List<TrackDifference> tracks, List<MeetingDifference> meetings) {
    public Differences {
        tracks = List.copyOf(tracks);
        meetings = List.copyOf(meetings);
    }

    public static Differences none() {
        return new Differences(List.of(), List.of());
    }

    public boolean isEmpty() {
        return tracks.isEmpty() && meetings.isEmpty();
    }

    /** Each difference in one line. */
    public List<String> words() {
        return Stream.concat(tracks.stream().map(TrackDifference::words),
                meetings.stream().map(MeetingDifference::words)).toList();
    }

    /** Tracks with the same id are compared where their lines agree; the rest is matched by place and time. */
    static Differences between(CaseView before, CaseView after) {
        return new Differences(tracks(before, after), meetings(before.meetings(), after.meetings()));
    }

    private static List<TrackDifference> tracks(CaseView before, CaseView after) {
        TrackMatching matching = new TrackMatching(before.state().sweeps(), after.state().sweeps());
        Map<String, Track> olds = new TreeMap<>();
        before.tracks().forEach(track -> olds.put(track.id(), track));
        List<TrackDifference> found = new ArrayList<>();
        List<Track> unmatched = new ArrayList<>();
        boolean sameRun = before.state().sweeps() == after.state().sweeps();
        for (Track track : after.tracks()) {
            Track old = olds.get(track.id());
            if (track.equals(old)) {
                olds.remove(track.id());
            } else if (old != null && sameRun) {
                olds.remove(track.id());
                found.add(difference(matching.compare(old, track)));
            } else {
                unmatched.add(track);
            }
        }
        for (Pair pair : matching.match(List.copyOf(olds.values()), unmatched)) {
            olds.remove(pair.before().id());
            unmatched.remove(pair.after());
            found.add(difference(pair));
        }
        unmatched.forEach(track -> found.add(new TrackDifference(Optional.empty(), Optional.of(track), Double.NaN)));
        olds.values().forEach(old -> found.add(new TrackDifference(Optional.of(old), Optional.empty(), Double.NaN)));
        return found;
    }

    private static TrackDifference difference(Pair pair) {
        return new TrackDifference(Optional.of(pair.before()), Optional.of(pair.after()), pair.shiftKm());
    }

    private static List<MeetingDifference> meetings(List<CaseMeeting> before, List<CaseMeeting> after) {
        List<Meeting> olds = before.stream().map(CaseMeeting::meeting).toList();
        Set<Integer> seen = new HashSet<>();
        List<MeetingDifference> found = new ArrayList<>();
        for (CaseMeeting now : after) {
            OptionalInt at = SameMeeting.in(olds, now.meeting());
            if (at.isEmpty() || !seen.add(at.getAsInt())) {
                found.add(new MeetingDifference(Optional.empty(), Optional.of(now)));
            } else if (!before.get(at.getAsInt()).equals(now)) {
                found.add(new MeetingDifference(Optional.of(before.get(at.getAsInt())), Optional.of(now)));
            }
        }
        for (int i = 0; i < before.size(); i++) {
            if (!seen.contains(i)) {
                found.add(new MeetingDifference(Optional.of(before.get(i)), Optional.empty()));
            }
        }
        return found;
    }
}
