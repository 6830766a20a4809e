package hemline.casefile.edit;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.sweep.RadarSite;
import hemline.sweep.SweepFrame;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;

/**
 * What a run found, before any hand touched it.
 *
 * @param site     the radar
 * @param frames   where and when each sweep looked, 0 the earliest; never empty
 * @param tracks   boundaries through time, measured; no two with the same id
 * @param meetings where two of them met or are expected to meet
 * @param cautions what a user must know before trusting the result; each one sentence
 */
public record Found(RadarSite site, List<SweepFrame> frames, List<Track> tracks, List<Meeting> meetings,
                    List<String> cautions) {
    public Found {
        Objects.requireNonNull(site);
        frames = List.copyOf(frames);
        tracks = List.copyOf(tracks);
        meetings = List.copyOf(meetings);
        cautions = List.copyOf(cautions);
        if (frames.isEmpty()) {
            throw new IllegalArgumentException("a case needs at least one sweep");
        }
        for (int i = 0; i < frames.size(); i++) {
            if (frames.get(i).index() != i) {
                throw new IllegalArgumentException("sweep " + i + " is numbered " + frames.get(i).index());
            }
        }
        Set<String> ids = new HashSet<>();
        for (Track track : tracks) {
            if (!ids.add(track.id())) {
                throw new IllegalArgumentException("two tracks have the id " + track.id());
            }
            int last = track.pieces().get(track.pieces().size() - 1).sweep();
            if (track.pieces().get(0).sweep() < 0 || last >= frames.size()) {
                throw new IllegalArgumentException("track " + track.id() + " lies on sweep " + last + " of "
                        + frames.size());
            }
        }
    }
}
