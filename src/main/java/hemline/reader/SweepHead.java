package hemline.reader;

import java.util.List;

/**
 * A sweep before its values are read, rays in the order of the file.
 *
 * @param place        where it is in its file, for example {@code /dataset1}
 * @param elevationDeg nominal elevation where the format gives one that is trusted, else the median of the rays
 * @param beamWidthDeg half-power beam width; NaN when not stated
 * @param nyquistMs    unambiguous velocity, m s⁻¹; NaN when not stated
 * @param startMs      start of the sweep, ms since 1970-01-01T00:00Z
 * @param endMs        end of the sweep
 * @param notes        what had to be assumed
 */
record SweepHead(String place, ScanMode mode, double elevationDeg, double beamWidthDeg, double nyquistMs,
                 RayTable rays, long startMs, long endMs, List<FieldHead> fields, List<String> notes) {
    SweepHead {
        fields = List.copyOf(fields);
        notes = List.copyOf(notes);
    }
}
