package hemline.workflow;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.pipeline.Analysis;
import hemline.reader.OpenedLoop;
import hemline.sweep.Loop;
import hemline.sweep.RadarSite;
import hemline.sweep.ScreenedLoop;
import hemline.sweep.ScreenedSweep;
import hemline.sweep.Sweep;
import hemline.sweep.SweepFrame;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/** A loop read from files, before or after its analysis. */
final class FileSession implements LoopSession {
    private final String title;
    private final OpenedLoop opened;
    private final List<SweepFrame> frames;
    private final double heightCeilingM;
    private final Optional<ScreenedLoop> screened;
    private final Optional<Analysis> analysis;

    private FileSession(String title, OpenedLoop opened, List<SweepFrame> frames, double heightCeilingM,
                        Optional<ScreenedLoop> screened, Optional<Analysis> analysis) {
        this.title = title;
        this.opened = opened;
        this.frames = List.copyOf(frames);
        this.heightCeilingM = heightCeilingM;
        this.screened = screened;
        this.analysis = analysis;
    }

    static FileSession read(String title, OpenedLoop opened, List<SweepFrame> frames, double heightCeilingM) {
        return new FileSession(title, opened, frames, heightCeilingM, Optional.empty(), Optional.empty());
    }

    FileSession analysed(ScreenedLoop screening, Analysis result) {
        return new FileSession(title, opened, frames, heightCeilingM, Optional.of(screening), Optional.of(result));
    }

    Loop loop() {
        return opened.loop();
    }

    @Override
    public String title() {
        return title;
    }

    @Override
    public RadarSite site() {
        return opened.site();
    }

    @Override
    public List<SweepFrame> frames() {
        return frames;
    }

    @Override
    public Sweep sweep(int index) {
        return opened.loop().sweep(index);
    }

    @Override
    public Optional<ScreenedSweep> screened(int index) {
        return screened.map(loop -> loop.screened(index));
    }

    @Override
    public boolean analysed() {
        return analysis.isPresent();
    }

    @Override
    public List<Track> tracks() {
        return analysis.map(Analysis::tracks).orElse(List.of());
    }

    @Override
    public List<Meeting> meetings() {
        return analysis.map(Analysis::meetings).orElse(List.of());
    }

    /** Inputs that could not be read come first: what is missing matters more than how the rest was taken. */
    @Override
    public List<String> cautions() {
        return Stream.concat(
                LoopReading.refusals(opened).stream().map(r -> "Not read: " + r.path() + ": " + r.reason() + "."),
                analysis.map(Analysis::cautions).orElse(List.of()).stream()).toList();
    }

    @Override
    public double heightCeilingM() {
        return heightCeilingM;
    }
}
