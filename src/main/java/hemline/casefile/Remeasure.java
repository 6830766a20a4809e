package hemline.casefile;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.casefile.edit.CaseState;
import hemline.sweep.SweepFrame;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Measures tracks anew after edits: speeds, arcs, meetings. Given by whoever joins the stages; must be pure: the same
 * request gives the same result. Vertices put by hand come with a NaN reflectivity, which it may fill from the sweeps.
 */
@FunctionalInterface
public interface Remeasure {

    Measured measure(Request request);

    /**
     * What is to be measured.
     *
     * @param tracks  all that count, by id; touched ones without measured values
     * @param frames  where and when each sweep looked
     * @param centres arcs whose centre is held by hand, by track id
     * @param changed ids of tracks whose lines or centre differ from {@code before}; the others may be taken over
     * @param before  the last measurement; what the run found where there is none
     */
    record Request(List<Track> tracks, List<SweepFrame> frames, Map<String, CaseState.FixedCentre> centres,
                   Set<String> changed, Measured before) {
    }

    /**
     * The same tracks, measured, and where they meet.
     *
     * @param tracks   in the order of the request
     * @param meetings found among them
     */
    record Measured(List<Track> tracks, List<Meeting> meetings) {
        public Measured {
            tracks = List.copyOf(tracks);
            meetings = List.copyOf(meetings);
        }
    }
}
