package hemline.workflow;

import hemline.sweep.RadarSite;
import java.nio.file.Path;
import java.util.List;

/**
 * What a radar file holds.
 *
 * @param path   the file
 * @param format format and version in words
 * @param site   the radar
 * @param sweeps its sweeps in the order of the file
 * @param notes  what had to be assumed
 */
public record InspectedFile(Path path, String format, RadarSite site, List<InspectedSweep> sweeps,
                            List<String> notes) {
    public InspectedFile {
        sweeps = List.copyOf(sweeps);
        notes = List.copyOf(notes);
    }

    /**
     * @param index            0-based place in the file
     * @param mode             how the antenna moved, in words
     * @param elevationDeg     nominal elevation, degrees
     * @param rays             number of rays
     * @param gates            gates of each
     * @param gateSpacingM     gate length, m
     * @param firstGateCentreM slant range of the centre of gate 0, m
     * @param startMs          start, ms since 1970-01-01T00:00Z
     * @param endMs            end, ms since 1970-01-01T00:00Z
     * @param fields           its fields
     * @param notes            what had to be assumed
     */
    public record InspectedSweep(int index, String mode, double elevationDeg, int rays, int gates,
                                 double gateSpacingM, double firstGateCentreM, long startMs, long endMs,
                                 List<InspectedField> fields, List<String> notes) {
        public InspectedSweep {
            fields = List.copyOf(fields);
            notes = List.copyOf(notes);
        }
    }

    /**
     * @param name        its name in the file
     * @param quantity    standard name or quantity; may be empty
     * @param units       may be empty
     * @param chosen      whether it is the reflectivity that would be taken
     * @param valid       gates with a detected value
     * @param below       gates measured, below detection
     * @param notMeasured gates not measured
     * @param min         smallest detected value; NaN when there is none
     * @param max         largest detected value; NaN when there is none
     */
    public record InspectedField(String name, String quantity, String units, boolean chosen, int valid, int below,
                                 int notMeasured, double min, double max) {
    }
}
