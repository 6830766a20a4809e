package hemline.viewer.viewmodel;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.sweep.RadarSite;
import hemline.sweep.ScreenedSweep;
import hemline.sweep.Sweep;
import hemline.sweep.SweepFrame;
import hemline.viewer.FakeLoop;
import hemline.workflow.LoopSession;
import java.io.FileNotFoundException;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Optional;

/** A loop one of whose sweeps cannot be read any more. */
record BrokenSweep(FakeLoop loop, int broken) implements LoopSession {
    @Override
    public Sweep sweep(int index) {
        if (index == broken) {
            throw new UncheckedIOException("the file is gone", new FileNotFoundException());
        }
        return loop.sweep(index);
    }

    @Override
    public Optional<ScreenedSweep> screened(int index) {
        return index == broken ? Optional.of(new ScreenedSweep(sweep(index), null)) : loop.screened(index);
    }

    @Override
    public String title() {
        return loop.title();
    }

    @Override
    public RadarSite site() {
        return loop.site();
    }

    @Override
    public List<SweepFrame> frames() {
        return loop.frames();
    }

    @Override
    public boolean analysed() {
        return loop.analysed();
    }

    @Override
    public List<Track> tracks() {
        return loop.tracks();
    }

    @Override
    public List<Meeting> meetings() {
        return loop.meetings();
    }

    @Override
    public List<String> cautions() {
        return loop.cautions();
    }

    @Override
    public double heightCeilingM() {
        return loop.heightCeilingM();
    }
}
