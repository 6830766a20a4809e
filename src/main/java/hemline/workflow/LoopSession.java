package hemline.workflow;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.sweep.RadarSite;
import hemline.sweep.ScreenedSweep;
import hemline.sweep.Sweep;
import hemline.sweep.SweepFrame;
import java.util.List;
import java.util.Optional;

/**
 * An open loop as a skin sees it: what was read and, once it is analysed, what was found. A session never changes;
 * a later stage is a new session. Safe for use by several threads. {@link #sweep} and {@link #screened} may read
 * files afresh at each call, so ask off the thread that draws.
 */
public interface LoopSession {
    /** A few words for a window title, for example the folder and the radar. */
    String title();

    RadarSite site();

    /** Where and when each sweep looked, 0 the earliest; never empty. */
    List<SweepFrame> frames();

    /** Sweep {@code index} as measured. */
    Sweep sweep(int index);

    /** Sweep {@code index} with the reasons for its masked gates; empty before the loop is screened. */
    Optional<ScreenedSweep> screened(int index);

    /** Whether the stages have run; before that there are no tracks and no meetings. */
    boolean analysed();

    List<Track> tracks();

    List<Meeting> meetings();

    /** What a user must know before trusting the result, in words; each one sentence. */
    List<String> cautions();

    /** Height above the radar beyond which nothing is claimed, m. */
    double heightCeilingM();
}
