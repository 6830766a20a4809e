package hemline.workflow;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.sweep.RadarSite;
import java.nio.file.Path;
import java.util.List;

/**
 * What a run came to.
 *
 * @param site     the radar
 * @param sweeps   sweeps analysed
 * @param firstMs  time of the earliest ray, ms since 1970-01-01T00:00Z
 * @param lastMs   time of the latest ray, ms since 1970-01-01T00:00Z
 * @param tracks   boundaries through time
 * @param meetings where two of them met or are expected to meet
 * @param notes    what was decided while reading
 * @param refused  inputs that could not be read
 * @param cautions what a user must know before trusting the result
 * @param out      folder of the results
 * @param files    names of the results in it
 */
public record RunOutcome(RadarSite site, int sweeps, long firstMs, long lastMs, List<Track> tracks,
                         List<Meeting> meetings, List<String> notes, List<Refusal> refused, List<String> cautions,
                         Path out, List<String> files) {
    public RunOutcome {
        tracks = List.copyOf(tracks);
        meetings = List.copyOf(meetings);
        notes = List.copyOf(notes);
        refused = List.copyOf(refused);
        cautions = List.copyOf(cautions);
        files = List.copyOf(files);
    }

    /**
     * An input that could not be read.
     *
     * @param path   as given
     * @param reason what is wrong and what to do
     */
    public record Refusal(String path, String reason) {
    }
}
