package hemline.reader;

import java.util.List;

/**
 * What one sweep of a file is, in the order and the numbers of the file.
 *
 * @param index              0-based place in the file
 * @param place              where it is inside the file
 * @param mode               how the antenna moved
 * @param elevationDeg       elevation: the nominal one of ODIM_H5, else the median of the rays, degrees
 * @param rays               rays as stored
 * @param gates              gates of the reflectivity field (of the first field where there is none)
 * @param gateSpacingM       gate length, m
 * @param firstGateCentreM   slant range of the centre of gate 0, m
 * @param firstRayAzimuthDeg centre azimuth of the first stored ray, degrees clockwise from north in [0, 360)
 * @param startMs            start, ms since 1970-01-01T00:00Z
 * @param endMs              end, ms since 1970-01-01T00:00Z
 * @param fields             its fields
 * @param notes              what had to be assumed
 */
public record SweepFacts(int index, String place, ScanMode mode, double elevationDeg, int rays, int gates,
                         double gateSpacingM, double firstGateCentreM, double firstRayAzimuthDeg, long startMs,
                         long endMs, List<FieldFacts> fields, List<String> notes) {
    public SweepFacts {
        fields = List.copyOf(fields);
        notes = List.copyOf(notes);
    }
}
