package hemline.reader;

import hemline.sweep.Loop;
import hemline.sweep.RadarSite;
import java.util.List;
import java.util.Objects;

/**
 * A loop read from files.
 *
 * @param loop   its sweeps in order of time, read from the files when asked for; empty when nothing could be read
 * @param site   the radar
 * @param inputs every input and its fate, in the order of their paths as expanded
 * @param notes  what was chosen and assumed, for people
 */
public record OpenedLoop(Loop loop, RadarSite site, List<InputFate> inputs, List<String> notes) {
    public OpenedLoop {
        Objects.requireNonNull(loop);
        Objects.requireNonNull(site);
        inputs = List.copyOf(inputs);
        notes = List.copyOf(notes);
    }
}
