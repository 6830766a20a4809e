package hemline.pipeline;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.sweep.RadarSite;
import hemline.sweep.SweepFrame;
import java.util.List;
import java.util.Objects;

/**
 * The result of one run.
 *
 * @param site     the radar
 * @param frames   where and when each sweep looked, 0 the earliest; never empty
 * @param tracks   boundaries through time, measured
 * @param meetings where two of them met or are expected to meet
 * @param counts   how much was found at each stage
 * @param cautions what a user must know before trusting the result; each one sentence
 */
public record Analysis(RadarSite site, List<SweepFrame> frames, List<Track> tracks, List<Meeting> meetings,
                       Counts counts, List<String> cautions) {
    public Analysis {
        Objects.requireNonNull(site);
        Objects.requireNonNull(counts);
        frames = List.copyOf(frames);
        tracks = List.copyOf(tracks);
        meetings = List.copyOf(meetings);
        cautions = List.copyOf(cautions);
        if (frames.isEmpty()) {
            throw new IllegalArgumentException("an analysis needs at least one sweep");
        }
    }

    /** The same run with other tracks and what follows from them. */
    public Analysis withFound(List<Track> newTracks, List<Meeting> newMeetings) {
        return new Analysis(site, frames, newTracks, newMeetings, counts.with(newTracks, newMeetings), cautions);
    }
}
