package hemline.reader;

import hemline.sweep.RadarSite;
import java.util.List;
import java.util.Optional;

/** An opened file of one format: what it holds, and the values of one field of one sweep at a time. */
interface FormatFile extends AutoCloseable {
    /** Format and version in words, for example {@code ODIM_H5 2.2 PVOL}. */
    String format();

    /** The radar as the file states it. */
    RadarSite site();

    /** Height of the antenna above the altitude that {@link #site()} states, m; 0 where that is the antenna's. */
    default double antennaAboveSiteM() {
        return 0;
    }

    List<SweepHead> sweeps();

    /** Index in its volume of the first of {@link #sweeps()}; above 0 only where a part of a volume was opened. */
    default int firstIndex() {
        return 0;
    }

    /** Where some neighbouring sweeps lie, for formats in which finding them takes a walk through the file. */
    default Optional<SweepSpan> span(int first, int last) {
        return Optional.empty();
    }

    /** What had to be assumed about the file as a whole. */
    List<String> notes();

    /**
     * Values {@code [ray][gate]} in the order of the file; NaN not measured, −∞ below detection.
     *
     * @param sweep index into {@link #sweeps()}
     * @param field one of that sweep's fields
     */
    float[] values(int sweep, FieldHead field) throws UnreadableFileException;

    @Override
    void close();
}
