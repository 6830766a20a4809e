package hemline.pipeline;

import hemline.boundary.Meeting;
import hemline.boundary.ObservedBoundary;
import hemline.boundary.Track;
import hemline.detection.Detection;
import hemline.kinematics.Kinematics;
import hemline.meeting.Meetings;
import hemline.numerics.Workers;
import hemline.screening.Screening;
import hemline.sweep.Loop;
import hemline.sweep.Progress;
import hemline.sweep.RadarSite;
import hemline.sweep.ScreenedLoop;
import hemline.sweep.Sweep;
import hemline.sweep.SweepFrame;
import hemline.tracking.Tracking;
import java.util.List;

/** The stages, one after the other, from the sweeps of a loop to its tracks and meetings. */
public final class Pipeline {
    private Pipeline() {
    }

    /**
     * Analyses a loop. Sweeps are asked for one at a time and let go; the result does not depend on the number of
     * threads.
     *
     * @param loop at least one sweep, all of one radar
     * @throws IllegalArgumentException                   if the loop is empty
     * @throws java.util.concurrent.CancellationException if cancelled
     */
    public static Analysis run(Loop loop, Settings settings, Workers workers, Progress progress) {
        return analyse(loop, screen(loop, settings, workers, progress), settings, workers, progress);
    }

    /** The first stage alone: what the loop teaches about its gates. */
    public static ScreenedLoop screen(Loop loop, Settings settings, Workers workers, Progress progress) {
        if (loop.size() == 0) {
            throw new IllegalArgumentException("a loop needs at least one sweep, got 0");
        }
        return Screening.learn(loop, settings.screening(), workers, progress);
    }

    /** The stages after screening. */
    public static Analysis analyse(Loop loop, ScreenedLoop screened, Settings settings, Workers workers,
                                   Progress progress) {
        List<SweepFrame> frames = frames(loop, workers, progress);
        RadarSite site = loop.sweep(0).site();
        List<ObservedBoundary> found = Detection.detect(screened, settings.detection(), workers, progress);
        List<Track> linked = Tracking.link(found, frames, settings.tracking(), progress);
        progress.check();
        List<Track> tracks = Kinematics.measure(linked, frames, settings.kinematics());
        progress.check();
        List<Meeting> meetings = Meetings.find(tracks, frames, settings.meeting());
        return new Analysis(site, frames, tracks, meetings, Counts.of(frames.size(), found.size(), tracks, meetings),
                Cautions.of(site, frames, settings));
    }

    /** Where and when each sweep looked. */
    public static List<SweepFrame> frames(Loop loop, Workers workers, Progress progress) {
        return workers.map(loop.size(), progress::cancelled, index -> {
            Sweep sweep = loop.sweep(index);
            return SweepFrame.of(index, sweep);
        });
    }
}
