package hemline.reader;

import hemline.sweep.RadarSite;
import hemline.sweep.Sweep;
import java.nio.file.Path;
import java.util.Optional;

/**
 * Where to read one sweep of a loop, and what is known of it without its values.
 *
 * @param file     its file
 * @param cut      its place in the file
 * @param span     where its file keeps it, for formats in which finding it takes long
 * @param donor    a sweep of another file that gives the velocity
 * @param site     the radar as this file names it
 * @param fieldRank how good its reflectivity field is, 0 the best
 */
record SweepTicket(Path file, LowSweeps.Cut cut, Optional<SweepSpan> span, Optional<Donor> donor, RadarSite site, double elevationDeg,
                   long startMs, long endMs, int fieldRank) {

    /** A sweep that has velocity and no reflectivity. */
    record Donor(Path file, int sweep, RadarSite site, double elevationDeg, long startMs, long endMs) {
    }

    SweepTicket withDonor(Donor from) {
        return new SweepTicket(file, cut, span, Optional.of(from), site, elevationDeg, startMs, endMs, fieldRank);
    }

    boolean hasVelocity() {
        return cut.velocity() >= 0 || donor.isPresent();
    }

    Sweep load(FieldChoice choice) throws UnreadableFileException {
        try (RadarFile opened = RadarFiles.reopen(file, span)) {
            if (donor.isEmpty()) {
                return opened.read(cut, choice);
            }
            try (RadarFile other = RadarFiles.open(donor.get().file())) {
                return opened.read(cut, choice, other, donor.get().sweep());
            }
        }
    }
}
