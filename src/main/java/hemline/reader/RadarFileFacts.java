package hemline.reader;

import hemline.sweep.RadarSite;
import java.nio.file.Path;
import java.util.List;

/**
 * What a file holds.
 *
 * @param file   the file
 * @param format format and version in words, for example {@code ODIM_H5 2.2 PVOL}
 * @param site   the radar as stated; its altitude is that of the ground in Level II, of the antenna elsewhere
 * @param antennaAboveSiteM height of the antenna above that altitude, m
 * @param sweeps its sweeps in the order of the file
 * @param notes  what had to be assumed about the file as a whole
 */
public record RadarFileFacts(Path file, String format, RadarSite site, double antennaAboveSiteM,
                             List<SweepFacts> sweeps, List<String> notes) {
    public RadarFileFacts {
        sweeps = List.copyOf(sweeps);
        notes = List.copyOf(notes);
    }
}
